#!/usr/bin/python3
"""Reads every drawing back, with ezdxf and ezdxf.recover, flattens what is in it to chords, chains them, and compares
area, centroid, second moments and the number of boundaries with expected.json, to the accuracy of the chords. It knows
neither the curves of shapes.py nor the lists of make_drawings.py. Entries marked "meant" are read, but not compared:
they need linework repaired or chosen."""
import fnmatch
import json
import math
import os
import re
import sys

sys.dont_write_bytecode = True
import ezdxf
from ezdxf import path as P, recover

os.chdir(os.path.dirname(os.path.abspath(__file__)))
SAG = 2e-5


def entities(space):
    for e in space:
        if e.dxftype() == "INSERT":
            if e.block() is None:
                continue
            for part in (e.multi_insert() if e.mcount > 1 else [e]):
                # content on layer 0 takes the layer of the insert
                for v in entities(part.virtual_entities()):
                    if v.dxf.layer == "0":
                        v.dxf.layer = e.dxf.layer
                    yield v
        else:
            yield e


def plain(layer):
    return re.sub(r"\\U\+([0-9A-Fa-f]{4})", lambda m: chr(int(m[1], 16)), layer)


def chains(doc, options):
    wanted = options.get("layers")
    plane = {"XZ": (0, 2), "YZ": (1, 2)}.get(options.get("plane"), (0, 1))
    for e in entities(doc.modelspace()):
        kind, layer = e.dxftype(), e.dxf.layer
        if kind not in {"LINE", "ARC", "CIRCLE", "ELLIPSE", "SPLINE", "LWPOLYLINE", "POLYLINE", "HATCH", "SOLID", "TRACE"}:
            continue
        if wanted:
            if not any(fnmatch.fnmatchcase(plain(layer).lower(), w.lower()) for w in wanted):
                continue
        elif layer in doc.layers:
            entry = doc.layers.get(layer)
            if entry.is_off() or entry.is_frozen() or not entry.dxf.get("plot", 1):
                continue
        if options.get("colors") and e.dxf.get("color", 256) not in options["colors"]:
            continue
        if kind in {"ARC", "CIRCLE", "ELLIPSE"}:
            yield [(v[plane[0]], v[plane[1]]) for v in e.flattening(SAG)]
            continue
        if kind == "SPLINE" and len(e.control_points):
            b = e.construction_tool()
            knots, p, n = b.knots(), b.order - 1, b.count  # the domain of a spline that is not clamped is shorter
            ts = sorted({knots[k] + (knots[k + 1] - knots[k]) * i / 400 for k in range(p, n) for i in range(401)})
            yield [(v[plane[0]], v[plane[1]]) for v in b.points(ts)]
            continue
        for p in P.from_hatch(e) if kind == "HATCH" else [P.make_path(e)]:
            for q in (p.sub_paths() if p.has_sub_paths else [p]):
                points = [(v[plane[0]], v[plane[1]]) for v in q.flattening(SAG, segments=16)]
                if len(points) > 1:
                    yield points


def loops(pieces, eps):
    out, rest = [], []
    for c in pieces:
        if max(math.dist(c[0], p) for p in c) < eps:
            continue  # Inkscape writes lines of no length
        (out if math.dist(c[0], c[-1]) < eps and len(c) > 2 else rest).append(c)
    while rest:
        c = rest.pop()
        while math.dist(c[0], c[-1]) >= eps:
            for i, d in enumerate(rest):
                if math.dist(d[0], c[-1]) < eps:
                    c = c + rest.pop(i)[1:]
                elif math.dist(d[-1], c[-1]) < eps:
                    c = c + rest.pop(i)[-2::-1]
                else:
                    continue
                break
            else:
                return None
        out.append(c)
    return out


def inside(p, loop):
    n = False
    for (x0, y0), (x1, y1) in zip(loop, loop[1:] + loop[:1]):
        if (y0 > p[1]) != (y1 > p[1]) and p[0] < x0 + (p[1] - y0) * (x1 - x0) / (y1 - y0):
            n = not n
    return n


def moments(loop, o):
    t = [0.0] * 6
    for (x0, y0), (x1, y1) in zip(loop, loop[1:] + loop[:1]):
        x0, y0, x1, y1 = x0 - o[0], y0 - o[1], x1 - o[0], y1 - o[1]
        c = x0 * y1 - x1 * y0
        t[0] += c / 2
        t[1] += c * (x0 + x1) / 6
        t[2] += c * (y0 + y1) / 6
        t[3] += c * (y0 * y0 + y0 * y1 + y1 * y1) / 12
        t[4] += c * (x0 * x0 + x0 * x1 + x1 * x1) / 12
        t[5] += c * (x0 * y1 + 2 * x0 * y0 + 2 * x1 * y1 + x1 * y0) / 24
    return t if t[0] > 0 else [-v for v in t]


def main():
    bad = compared = 0
    for e in json.load(open("expected.json", encoding="utf-8")):
        name = e["file"] + (" " + json.dumps(e["options"], ensure_ascii=False) if e["options"] else "")
        try:
            doc = ezdxf.readfile(e["file"])
            if "binary" not in e["file"]:  # recover is for text
                for text in sorted({x.message.split(" in ")[0] for x in recover.readfile(e["file"])[1].errors}):
                    print(name, "recover:", text)
        except Exception as x:
            print(name, "NOT READ:", x)
            bad += 1
            continue
        if e["area"] is None or e.get("meant"):
            print(name, "- read, not compared")
            continue
        pieces = list(chains(doc, e["options"]))
        size = max((math.dist(p, c[0]) for c in pieces for p in c), default=1)
        found = loops(pieces, 1e-6 * max(size, 1e-3))
        if found is None:
            print(name, "OPEN")
            bad += 1
            continue
        o = e["centroid"]
        total, holes = [0.0] * 6, 0
        for i, c in enumerate(found):
            mid = ((c[0][0] + c[1][0]) / 2, (c[0][1] + c[1][1]) / 2)
            depth = sum(inside(mid, d) for j, d in enumerate(found) if j != i)
            holes += depth % 2
            total = [a + (-b if depth % 2 else b) for a, b in zip(total, moments(c, o))]
        scale = math.sqrt(e["area"])
        tol = 1e-3 if any(x.dxftype() in {"HATCH", "LWPOLYLINE", "POLYLINE"} for x in entities(doc.modelspace())) else 5e-5  # ezdxf makes cubics of their arcs
        errors = [abs(total[0] / e["area"] - 1), abs(total[1]) / e["area"] / scale, abs(total[2]) / e["area"] / scale]
        errors += [abs(a - b) / max(e["secondMoment"]) for a, b in zip(total[3:], e["secondMoment"])]
        per = sum(math.dist(p, q) for c in found for p, q in zip(c, c[1:] + c[:1]))
        if e["perimeter"]:
            errors.append(abs(per / e["perimeter"] - 1))
        compared += 1
        if max(errors) > tol or len(found) != e["boundaries"] or holes != e["holes"]:
            print(name, "DIFFERS", ["%.2g" % x for x in errors], len(found), holes)
            bad += 1
    print(compared, "compared,", bad, "bad")
    return bad


if __name__ == "__main__":
    sys.exit(1 if main() else 0)
