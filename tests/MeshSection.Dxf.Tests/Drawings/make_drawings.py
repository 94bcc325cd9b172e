#!/usr/bin/python3
"""Writes the test drawings and expected.json beside this file. Run with /usr/bin/python3 (ezdxf 0.18.1).

    make_drawings.py              all drawings
    make_drawings.py --outside    also those of OpenSCAD and Inkscape, which need these programs
"""
import json
import math
import os
import random
import subprocess
import sys

import ezdxf
import numpy as np
from ezdxf.addons import r12writer

if os.environ.get("PYTHONHASHSEED") != "0":  # ezdxf writes some lists in the order of a set
    os.execve(sys.executable, [sys.executable] + sys.argv, dict(os.environ, PYTHONHASHSEED="0"))
sys.dont_write_bytecode = True
import shapes as S
from shapes import LD, PI

HERE = os.path.dirname(os.path.abspath(__file__))
os.chdir(HERE)
ezdxf.options.write_fixed_meta_data_for_testing = True
EXPECTED = []
GAUSS = "boundary integrals in 80-bit floating point, 24-point Gauss-Legendre on each smooth piece (shapes.py)"
MM, R2000 = 4, "R2000"


# ---------------------------------------------------------------- documents
def new(release="R2000", units=MM, measurement=1, full=False):
    doc = ezdxf.new(release, setup=False)
    doc.header["$INSUNITS"] = units
    doc.header["$MEASUREMENT"] = measurement
    if not full:
        # variables and objects that carry no geometry: half of the file otherwise
        keep = {"$ACADVER", "$ACADMAINTVER", "$DWGCODEPAGE", "$INSUNITS", "$MEASUREMENT", "$HANDSEED", "$EXTMIN",
                "$EXTMAX", "$INSBASE", "$LUNITS", "$AUNITS", "$ANGBASE", "$ANGDIR"}
        for name in [n for n in doc.header.varnames() if n not in keep]:
            del doc.header[name]
    return doc, doc.modelspace()


def save(doc, file, fmt="asc", full=False):
    if not full and doc.dxfversion > "AC1009":
        for material in [o for o in doc.objects if o.dxftype() == "MATERIAL"]:
            doc.objects.delete_entity(material)
        doc.materials.clear()
        for layer in doc.layers:
            layer.dxf.discard("material_handle")
        doc.classes.add_required_classes = lambda release: None
    doc.saveas(file, fmt=fmt)
    auditor = ezdxf.readfile(file).audit()
    for problem in auditor.errors:
        print(f"{file}: {problem.message}")


def number(v, scale):
    v = float(v)
    return 0.0 if abs(v) < 1e-15 * scale else v


def expect(file, solids=None, holes=(), options=None, boundaries=None, source=GAUSS, exact=1e-13, closed=None, offset=(0, 0), **more):
    """closed: (area, [cx, cy], [Ix, Iy, Ixy]) in closed form; asserted against the quadrature and written instead of it. offset: where the loops
    lie, kept apart so that no digits are lost."""
    e = {"file": file, "options": options or {}}
    if solids:
        a, c, m, p = S.integrals(solids, holes)
        S._PARTS = 8
        a2, c2, m2, p2 = S.integrals(solids, holes)
        S._PARTS = 16
        size = math.sqrt(a) + max(map(abs, c))
        assert abs(a - a2) < 1e-14 * a and max(abs(u - v) for u, v in zip(m, m2)) < 1e-13 * max(m), (file, a - a2)
        if closed:
            ca, cc, cm = closed
            assert abs(ca - a) < 1e-13 * a, (file, ca, a)
            assert max(abs(u - v) for u, v in zip(cc, c)) < 1e-13 * size, (file, cc, c)
            assert max(abs(u - v) for u, v in zip(cm, m)) < 1e-12 * max(m), (file, cm, m)
            a, c, m = float(ca), [float(v) for v in cc], [float(v) for v in cm]
        c = [v + d for v, d in zip(c, offset)]
        e.update(area=a, centroid=[number(v, size) for v in c], secondMoment=[number(v, max(m)) for v in m])
        e["perimeter"] = p if abs(p - p2) < 1e-13 * p else None
        e["boundaries"] = len(solids) + len(holes) if boundaries is None else boundaries
        e["holes"] = len(holes)
        e["source"] = source
        e["exactTo"] = exact
    else:
        e.update(area=None, centroid=None, secondMoment=None, perimeter=None, boundaries=boundaries,
                 holes=None, source=source, exactTo=None)
    e.update(more)
    EXPECTED.append(e)


# ---------------------------------------------------------------- the channel
CHANNEL_CORNERS = [(0, 0, 12), (45, 0, 3), (45, 8, 3), (8, 8, 4), (8, 92, 4), (60, 92, 3), (60, 100, 3), (0, 100, 12)]
AT = (30.0, -20.0)
PIECES = S.filleted([(x + AT[0], y + AT[1], r) for x, y, r in CHANNEL_CORNERS])
CHANNEL = [S.seg_of(p) for p in PIECES]


def placed(pieces, f, turn=0.0, mirror=False):
    """Pieces at other places: f moves points, turn adds to angles, mirror (in x, first) turns arcs over."""
    out = []
    for p in pieces:
        if p[0] == "L":
            out.append(("L", f(p[1]), f(p[2])))
        else:
            a, b = (180 - p[3], 180 - p[4]) if mirror else (p[3], p[4])
            out.append(("A", f(p[1]), p[2], a + turn, b + turn))
    return out


def bulges(pieces):
    """The vertices of a polyline with bulges, of pieces that follow one another."""
    out = []
    for p in pieces:
        if p[0] == "L":
            out.append((p[1][0], p[1][1], 0.0))
        else:
            a = math.radians(p[3])
            x, y = p[1][0] + p[2] * math.cos(a), p[1][1] + p[2] * math.sin(a)
            if abs(p[3] % 90) < 1e-9:
                x, y = round(x, 12), round(y, 12)
            out.append((x, y, math.tan(math.radians(p[4] - p[3]) / 4)))
    return out


def add_pieces(space, pieces, attribs=None, shuffle=None):
    items = list(pieces)
    rng = random.Random(shuffle)
    if shuffle is not None:
        rng.shuffle(items)
    for p in items:
        if p[0] == "L":
            a, b = (p[1], p[2]) if shuffle is None or rng.random() < 0.5 else (p[2], p[1])
            space.add_line(a, b, dxfattribs=attribs)
        else:
            a, b = sorted((p[3], p[4]))
            if a < 0:
                a, b = a + 360, b + 360
            space.add_arc(p[1], p[2], a, b, dxfattribs=attribs)


def add_poly(space, vertices, attribs=None):
    return space.add_lwpolyline(vertices, format="xyb", close=True, dxfattribs=attribs)


def hatch_edges(path, pieces):
    for p in pieces:
        if p[0] == "L":
            path.add_line(p[1], p[2])
        else:
            path.add_arc(p[1], p[2], min(p[3], p[4]), max(p[3], p[4]), ccw=p[4] > p[3])


def arc_spline(p):
    """A quarter circle or less as a rational quadratic: degree, knots, points, weights."""
    (cx, cy), r, a, b = p[1], p[2], math.radians(p[3]), math.radians(p[4])
    m, h = (a + b) / 2, (b - a) / 2
    return [(cx + r * math.cos(a), cy + r * math.sin(a)),
            (cx + r / math.cos(h) * math.cos(m), cy + r / math.cos(h) * math.sin(m)),
            (cx + r * math.cos(b), cy + r * math.sin(b))], [1.0, math.cos(h), 1.0]


def group_1():
    section = {"layer": "SECTION"}
    with r12writer("01-channel-lines-arcs.dxf") as w:
        rng = random.Random(1)
        items = list(PIECES)
        rng.shuffle(items)
        for p in items:
            if p[0] == "L":
                a, b = (p[1], p[2]) if rng.random() < 0.5 else (p[2], p[1])
                w.add_line(a, b, layer="SECTION")
            else:
                w.add_arc(p[1], p[2], min(p[3], p[4]), max(p[3], p[4]), layer="SECTION")
    expect("01-channel-lines-arcs.dxf", [CHANNEL], options={"unit": "mm"})

    doc, msp = new()
    add_poly(msp, bulges(PIECES), section)
    save(doc, "01-channel-lwpolyline.dxf")
    expect("01-channel-lwpolyline.dxf", [CHANNEL])

    doc, msp = new("R12")
    doc.layers.new("SECTION")
    msp.add_polyline2d(bulges(PIECES), format="xyb", close=True, dxfattribs=section)
    save(doc, "01-channel-polyline-r12.dxf")
    expect("01-channel-polyline-r12.dxf", [CHANNEL], options={"unit": "mm"})

    doc, msp = new()
    for p in PIECES:
        if p[0] == "L":
            s = msp.add_open_spline([p[1], p[2]], degree=1, knots=[0, 0, 1, 1], dxfattribs=section)
        else:
            points, weights = arc_spline(p)
            msp.add_rational_spline(points, weights, degree=2, knots=[0, 0, 0, 1, 1, 1], dxfattribs=section)
    save(doc, "01-channel-splines.dxf")
    expect("01-channel-splines.dxf", [CHANNEL])

    doc, msp = new()
    t, at = math.radians(30), (140.0, 55.0)
    back = lambda q: ((q[0] - at[0]) * math.cos(t) + (q[1] - at[1]) * math.sin(t),
                      -(q[0] - at[0]) * math.sin(t) + (q[1] - at[1]) * math.cos(t))
    block = doc.blocks.new("FENDER")
    add_pieces(block, placed(PIECES, back, turn=-30.0), section)
    msp.add_blockref("FENDER", at, dxfattribs={"rotation": 30.0, "layer": "SECTION"})
    save(doc, "01-channel-block-rotated.dxf")
    expect("01-channel-block-rotated.dxf", [CHANNEL])

    doc, msp = new()
    at = (10.0, -5.0)
    back = lambda q: (at[0] - q[0], q[1] - at[1])
    block = doc.blocks.new("FENDER_LEFT")
    mirrored = placed(PIECES, back, mirror=True)
    add_poly(block, bulges(mirrored), section)
    msp.add_blockref("FENDER_LEFT", at, dxfattribs={"xscale": -1.0, "layer": "SECTION"})
    save(doc, "01-channel-block-mirrored.dxf")
    expect("01-channel-block-mirrored.dxf", [CHANNEL])

    doc, msp = new()
    block = doc.blocks.new("FENDER_LEFT")
    add_pieces(block, mirrored, section)
    msp.add_blockref("FENDER_LEFT", at, dxfattribs={"xscale": -1.0, "layer": "SECTION"})
    save(doc, "01-channel-block-mirrored-arcs.dxf")
    expect("01-channel-block-mirrored-arcs.dxf", [CHANNEL])

    doc, msp = new()
    hatch = msp.add_hatch(color=8, dxfattribs=section)
    hatch_edges(hatch.paths.add_edge_path(), PIECES)
    save(doc, "01-channel-hatch-edges.dxf")
    expect("01-channel-hatch-edges.dxf", [CHANNEL])

    doc, msp = new()
    hatch = msp.add_hatch(color=8, dxfattribs=section)
    hatch.paths.add_polyline_path(bulges(PIECES), is_closed=True)
    save(doc, "01-channel-hatch-polyline.dxf")
    expect("01-channel-hatch-polyline.dxf", [CHANNEL])

    x, y, w, h = 15.0, 10.0, 90.0, 14.0
    box = [S.rectangle(x, y, w, h)]
    closed = (w * h, [x + w / 2, y + h / 2], [w * h**3 / 12, h * w**3 / 12, 0.0])
    for kind, file in (("SOLID", "01-plank-solid.dxf"), ("TRACE", "01-plank-trace.dxf")):
        doc, msp = new("R12")
        getattr(msp, "add_" + kind.lower())([(x, y), (x + w, y), (x, y + h), (x + w, y + h)])
        save(doc, file)
        expect(file, box, closed=closed, source="closed form", options={"unit": "mm"})
    doc, msp = new("R12")
    msp.add_solid([(x, y), (x + 40, y), (x, y + h), (x + 40, y + h)])
    msp.add_solid([(x + 40, y), (x + w, y), (x + 40, y + h), (x + w, y + h)])
    save(doc, "01-plank-two-solids.dxf")
    expect("01-plank-two-solids.dxf", box, closed=closed, source="closed form", options={"unit": "mm"},
           meant=True, note="two SOLIDs side by side, meant as one rectangle")


# ---------------------------------------------------------------- ellipses
def ellipse_values(c, major, ratio):
    a = math.hypot(*major)
    b, t = a * ratio, math.atan2(major[1], major[0])
    area, iu, iv = math.pi * a * b, math.pi * a * b**3 / 4, math.pi * a**3 * b / 4
    return (area, list(c), [iu * math.cos(t)**2 + iv * math.sin(t)**2, iu * math.sin(t)**2 + iv * math.cos(t)**2,
                            (iv - iu) * math.sin(t) * math.cos(t)])


def point(c, major, ratio, t, flip=False):
    s = -1 if flip else 1
    return (c[0] + major[0] * math.cos(t) - s * major[1] * ratio * math.sin(t),
            c[1] + major[1] * math.cos(t) + s * major[0] * ratio * math.sin(t))


def group_2():
    c, major, k = (5.0, 7.0), (40.0, 15.0), 0.6
    doc, msp = new()
    msp.add_ellipse(c, major, k)
    save(doc, "02-ellipse-full.dxf")
    expect("02-ellipse-full.dxf", [[S.ellipse(c, major, k)]], closed=ellipse_values(c, major, k), source="closed form")

    inner = ((7.0, 6.0), (10.0, -18.0), 0.7)
    doc, msp = new()
    msp.add_ellipse(c, major, k)
    msp.add_ellipse(*inner)
    save(doc, "02-ellipse-ring.dxf")
    expect("02-ellipse-ring.dxf", [[S.ellipse(c, major, k)]], [[S.ellipse(*inner)]])

    t0, t1 = 5.5, 5.5 + math.pi - 2 * math.pi  # runs through 0
    doc, msp = new()
    msp.add_ellipse(c, major, k, t0, t1)
    msp.add_line(point(c, major, k, t0), point(c, major, k, t1))
    save(doc, "02-ellipse-half.dxf")
    loop = [S.ellipse(c, major, k, t0, t1 + 2 * PI), S.line(point(c, major, k, t1), point(c, major, k, t0))]
    expect("02-ellipse-half.dxf", [loop], note="the start parameter is greater than the end parameter")

    t0, t1 = 0.4, 1.9
    doc, msp = new()
    msp.add_ellipse(c, major, k, t0, t1)
    msp.add_line(c, point(c, major, k, t0))
    msp.add_line(c, point(c, major, k, t1))
    save(doc, "02-ellipse-sector.dxf")
    loop = [S.line(c, point(c, major, k, t0)), S.ellipse(c, major, k, t0, t1), S.line(point(c, major, k, t1), c)]
    expect("02-ellipse-sector.dxf", [loop], note="parameters, not angles: the area is a*b*(t1 - t0)/2 = "
           + repr(float(LD(k) * (LD(1825) * (LD(t1) - LD(t0)) / 2))))

    doc, msp = new()
    doc.blocks.new("DISC").add_circle((2.0, 1.0), 10.0)
    msp.add_blockref("DISC", (50.0, 20.0), dxfattribs={"xscale": 3.0, "yscale": 1.5, "rotation": 25.0})
    save(doc, "02-circle-scaled-to-ellipse.dxf")
    t = math.radians(25)
    centre = (50 + 6 * math.cos(t) - 1.5 * math.sin(t), 20 + 6 * math.sin(t) + 1.5 * math.cos(t))
    major2 = (30 * math.cos(t), 30 * math.sin(t))
    expect("02-circle-scaled-to-ellipse.dxf", [[S.ellipse(centre, major2, 0.5)]],
           closed=ellipse_values(centre, major2, 0.5), source="closed form")

    doc, msp = new()
    block = doc.blocks.new("LUG")
    pieces = S.filleted([(0, 0, 0), (20, 0, 6), (20, 12, 5), (0, 12, 0)])
    add_pieces(block, pieces)
    msp.add_blockref("LUG", (-4.0, 3.0), dxfattribs={"xscale": 2.0, "yscale": -0.75, "rotation": -40.0})
    save(doc, "02-arcs-scaled-to-ellipses.dxf")
    a = np.array(S.rotation(-40)) @ np.array([[2, 0], [0, LD("-0.75")]], LD)
    expect("02-arcs-scaled-to-ellipses.dxf", [S.moved([S.seg_of(p) for p in pieces], a, (-4, 3))])

    doc, msp = new()
    down = {"extrusion": (0, 0, -1)}
    msp.add_ellipse(c, major, k, dxfattribs=down)
    save(doc, "02-ellipse-full-downward.dxf")
    expect("02-ellipse-full-downward.dxf", [[S.ellipse(c, major, k)]], closed=ellipse_values(c, major, k),
           source="closed form", note="centre and major axis of an ELLIPSE are world coordinates: nothing is mirrored")

    t0, t1 = 0.4, 2.2
    doc, msp = new()
    msp.add_ellipse(c, major, k, t0, t1, dxfattribs=down)
    msp.add_line(point(c, major, k, t0, True), point(c, major, k, t1, True))
    save(doc, "02-ellipse-segment-downward.dxf")
    loop = [S.ellipse(c, major, k, t0, t1, flip=True),
            S.line(point(c, major, k, t1, True), point(c, major, k, t0, True))]
    expect("02-ellipse-segment-downward.dxf", [loop], note="the minor axis is extrusion x major axis, so parameters run clockwise")


# ---------------------------------------------------------------- splines
def group_3():
    pts = [(0, 0), (40, -10), (75, 5), (80, 45), (40, 60), (20, 35), (-10, 40)]
    doc, msp = new()
    s = msp.add_spline()
    s.set_closed([(x, y, 0.0) for x, y in pts], degree=3)
    knots, ctrl = list(s.knots), [(p[0], p[1]) for p in s.control_points]
    save(doc, "03-spline-periodic.dxf")
    expect("03-spline-periodic.dxf", [[S.spline(3, knots, ctrl)]],
           note="flags 3, uniform knots, the first three control points again at the end; the curve is from knot 3 to knot n")

    ctrl = [(0, 0), (5, 30), (30, 45), (50, 20), (70, 40), (90, 0)]
    knots = [0, 0, 0, 0, 1, 2.5, 3, 3, 3, 3]
    doc, msp = new()
    msp.add_open_spline(ctrl, 3, knots)
    msp.add_line(ctrl[-1], ctrl[0])
    save(doc, "03-spline-cubic-and-line.dxf")
    expect("03-spline-cubic-and-line.dxf", [[S.spline(3, knots, ctrl), S.line(ctrl[-1], ctrl[0])]])

    h = math.sqrt(0.5)
    r, c = 25.0, (12.0, -7.0)
    ctrl = [(c[0] + r * x, c[1] + r * y) for x, y in [(1, 0), (1, 1), (0, 1), (-1, 1), (-1, 0), (-1, -1), (0, -1), (1, -1), (1, 0)]]
    weights, knots = [1, h, 1, h, 1, h, 1, h, 1], [0, 0, 0, 1, 1, 2, 2, 3, 3, 4, 4, 4]
    doc, msp = new()
    s = msp.add_rational_spline(ctrl, weights, 2, knots)
    s.dxf.flags |= s.CLOSED
    save(doc, "03-spline-circle.dxf")
    i = math.pi * r**4 / 4
    expect("03-spline-circle.dxf", [[S.spline(2, knots, ctrl, weights)]], closed=(math.pi * r * r, list(c), [i, i, 0.0]),
           source="closed form")

    ctrl = [(0, 0), (35, -20), (80, 0), (95, 40), (60, 70), (20, 75), (-25, 50), (-30, 15), (0, 0)]
    knots = [0] * 6 + [1, 2, 3] + [4] * 6
    doc, msp = new("R2010")
    s = msp.add_open_spline(ctrl, 5, knots)
    s.dxf.flags |= s.CLOSED
    save(doc, "03-spline-degree-5.dxf")
    expect("03-spline-degree-5.dxf", [[S.spline(5, knots, ctrl)]])

    ctrl = [(0, 0), (10, -25), (50, -20), (60, 0), (75, 30), (40, 55), (-15, 45), (0, 0)]
    knots = [0, 0, 0, 0, 1, 1, 1, 2, 3, 3, 3, 3]  # the knot 1 three times: a corner at the fourth control point
    doc, msp = new()
    msp.add_open_spline(ctrl, 3, knots)
    save(doc, "03-spline-corner-inside.dxf")
    expect("03-spline-corner-inside.dxf", [[S.spline(3, knots, ctrl)]],
           note="an inner knot as many times as the degree; not flagged as closed, though its ends meet")

    doc, msp = new()
    msp.add_spline([(0, 0), (30, 25), (60, 20), (90, 0)])
    msp.add_line((90, 0), (0, 0))
    save(doc, "03-spline-fit-points.dxf")
    expect("03-spline-fit-points.dxf", boundaries=1, source="none: a spline of fit points alone is not defined by the format")

    b, h, x0, y0 = 84.0, 33.0, -12.0, 4.0
    ctrl = [(x0, y0), (x0 + b / 2, y0 + 2 * h), (x0 + b, y0)]
    doc, msp = new()
    msp.add_open_spline(ctrl, 2, [0, 0, 0, 1, 1, 1])
    msp.add_line(ctrl[-1], ctrl[0])
    save(doc, "03-spline-parabola.dxf")
    area = 2 * b * h / 3
    expect("03-spline-parabola.dxf", [[S.spline(2, [0, 0, 0, 1, 1, 1], ctrl), S.line(ctrl[-1], ctrl[0])]],
           closed=(area, [x0 + b / 2, y0 + 2 * h / 5], [16 * b * h**3 / 105 - area * (2 * h / 5)**2, h * b**3 / 30, 0.0]),
           source="closed form: area 2/3 b h, Ix about the base 16/105 b h^3, Iy h b^3/30")

    ctrl = [(0, 0), (20, 40), (60, 40), (80, 0)]
    weights, knots = [1, 0.4, 2.5, 1], [-2, -2, -2, -2, 7, 7, 7, 7]
    doc, msp = new()
    msp.add_rational_spline(ctrl, weights, 3, knots)
    msp.add_line(ctrl[-1], ctrl[0])
    save(doc, "03-spline-rational-cubic.dxf")
    expect("03-spline-rational-cubic.dxf", [[S.spline(3, knots, ctrl, weights), S.line(ctrl[-1], ctrl[0])]],
           note="unequal weights, knots from -2 to 7")


# ---------------------------------------------------------------- hatches
def group_4():
    outer, inner = [(0, 0), (120, 0), (120, 60), (0, 60)], [(20, 15), (70, 15), (70, 45), (20, 45)]
    doc, msp = new()
    hatch = msp.add_hatch(color=8)
    hatch.paths.add_polyline_path(outer, is_closed=True, flags=1)
    hatch.paths.add_polyline_path(inner, is_closed=True, flags=16)
    save(doc, "04-hatch-island.dxf")
    expect("04-hatch-island.dxf", [S.polygon(outer)], [S.polygon(inner)])

    rim = [(0.0, 0.0, 0.0), (80.0, 0.0, 0.4), (80.0, 50.0, 0.0), (0.0, 50.0, -0.25)]
    bore = [(30.0, 25.0, 1.0), (54.0, 25.0, 1.0)]
    doc, msp = new()
    hatch = msp.add_hatch(color=8)
    hatch.paths.add_polyline_path(rim, is_closed=True, flags=1)
    hatch.paths.add_polyline_path(bore, is_closed=True, flags=16)
    save(doc, "04-hatch-bulges.dxf")
    expect("04-hatch-bulges.dxf", [S.bulged(rim)], [S.bulged(bore)])

    # a sluice-gate extrusion: bottom line, elliptic nose, top spline, back line
    ctrl, knots = [(60, 40), (45, 55), (15, 25), (0, 45)], [0, 0, 0, 0, 1, 1, 1, 1]
    doc, msp = new()
    hatch = msp.add_hatch(color=8)
    path = hatch.paths.add_edge_path()
    path.add_line((0, 0), (60, 0))
    path.add_ellipse((60, 20), major_axis=(0, -20), ratio=0.75, start_angle=0, end_angle=180, ccw=True)
    path.add_spline(control_points=ctrl, knot_values=knots, degree=3)
    path.add_line((0, 45), (0, 0))
    save(doc, "04-hatch-ellipse-spline.dxf")
    expect("04-hatch-ellipse-spline.dxf",
           [[S.line((0, 0), (60, 0)), S.ellipse((60, 20), (0, -20), 0.75, 0, PI), S.spline(3, knots, ctrl),
             S.line((0, 45), (0, 0))]],
           note="the ellipse edge ends at quarter points, where angle and parameter are the same")

    # the notch's arc and the ellipse run clockwise along a path that runs anticlockwise
    def clockwise(file, extrusion=None, note=None):
        doc, msp = new()
        hatch = msp.add_hatch(color=8, dxfattribs={"extrusion": extrusion} if extrusion else None)
        path = hatch.paths.add_edge_path()
        path.add_line((0, 0), (30, 0))
        path.add_arc((45, 0), 15, 0, 180, ccw=False)          # from 180 to 0 over the top: a notch in the bottom
        path.add_line((60, 0), (100, 0))
        path.add_line((100, 0), (100, 60))
        path.add_line((100, 60), (80, 60))
        path.add_ellipse((50, 60), (30, 0), 0.4, 180, 360, ccw=False)  # from 360 to 180 below: a hollow in the top
        path.add_line((20, 60), (0, 60))
        path.add_line((0, 60), (0, 0))
        save(doc, file)
        loop = [S.line((0, 0), (30, 0)), S.arc((45, 0), 15, PI, 0), S.line((60, 0), (100, 0)),
                S.line((100, 0), (100, 60)), S.line((100, 60), (80, 60)), S.ellipse((50, 60), (30, 0), LD("0.4"), 2 * PI, PI),
                S.line((20, 60), (0, 60)), S.line((0, 60), (0, 0))]
        if extrusion:
            loop = S.moved(loop, [[-1, 0], [0, 1]])
        area = 6000 - math.pi * 15**2 / 2 - math.pi * 30 * 12 / 2
        assert abs(S.integrals([loop])[0] - area) < 1e-10
        expect(file, [loop], note=note)

    clockwise("04-hatch-clockwise.dxf", note="edges with flag 73 = 0: the file holds 360 less the angle, for arc and ellipse")
    clockwise("04-hatch-downward.dxf", (0, 0, -1), note="the same with extrusion -z: x is turned over")

    # an arc whose clockwise angles are no multiples of 90
    r, c, a, b = 25.0, (50.0, 40.0), 200.0, 320.0
    p, q = [(c[0] + r * math.cos(math.radians(t)), c[1] + r * math.sin(math.radians(t))) for t in (a, b)]
    doc, msp = new()
    hatch = msp.add_hatch(color=8)
    path = hatch.paths.add_edge_path()
    corners = [p, (0.0, p[1]), (0.0, 0.0), (100.0, 0.0), (100.0, q[1]), q]
    for u, v in zip(corners, corners[1:]):
        path.add_line(u, v)
    path.add_arc(c, r, a, b, ccw=False)
    save(doc, "04-hatch-clockwise-arc.dxf")
    expect("04-hatch-clockwise-arc.dxf", [[S.line(u, v) for u, v in zip(corners, corners[1:])] + [S.arc_deg(c, r, b, a)]])

    # a corner hollowed by a quarter of an ellipse, clockwise from 270 to 180: the ends tell what the angles mean
    doc, msp = new()
    hatch = msp.add_hatch(color=8)
    path = hatch.paths.add_edge_path()
    corners = [(70.0, 60.0), (0.0, 60.0), (0.0, 0.0), (100.0, 0.0), (100.0, 48.0)]
    for u, v in zip(corners, corners[1:]):
        path.add_line(u, v)
    path.add_ellipse((100, 60), (30, 0), 0.4, 180, 270, ccw=False)
    save(doc, "04-hatch-clockwise-ellipse.dxf")
    loop = [S.line(u, v) for u, v in zip(corners, corners[1:])] + [S.ellipse((100, 60), (30, 0), LD("0.4"), PI * 3 / 2, PI)]
    assert abs(S.integrals([loop])[0] - (6000 - math.pi * 30 * 12 / 4)) < 1e-10
    expect("04-hatch-clockwise-ellipse.dxf", [loop])

    doc, msp = new()
    hatch = msp.add_hatch(color=8)
    hatch.paths.add_polyline_path(outer, is_closed=True, flags=1)
    path = hatch.paths.add_edge_path(flags=16)
    path.add_arc((60, 30), 18, 0, 360, ccw=True)
    path = hatch.paths.add_edge_path(flags=16)
    path.add_ellipse((100, 30), (0, 16), 0.5, 0, 360, ccw=True)
    save(doc, "04-hatch-full-circle-ellipse.dxf")
    expect("04-hatch-full-circle-ellipse.dxf", [S.polygon(outer)], [S.circle((60, 30), 18), [S.ellipse((100, 30), (0, 16), 0.5)]])

    doc, msp = new()
    hatch = msp.add_hatch(dxfattribs={"layer": "HATCH"})
    hatch.set_pattern_fill("ANSI31", scale=1.0)
    hatch.paths.add_polyline_path(bulges(PIECES), is_closed=True)
    add_poly(msp, bulges(PIECES), {"layer": "SECTION"})
    save(doc, "04-hatch-over-outline.dxf")
    expect("04-hatch-over-outline.dxf", [CHANNEL], options={"layers": ["SECTION"]})
    expect("04-hatch-over-outline.dxf", [CHANNEL], meant=True, note="a hatch inside its own outline: the outline is there twice")


# ---------------------------------------------------------------- blocks
def group_5():
    # a lock-gate rail: an angle of lines with a hole, in its own coordinates
    rail = [(0, 0), (30, 0), (30, 4), (4, 4), (4, 18), (0, 18)]
    hole = ((22.0, 2.0), 1.25)

    def draw(space, attribs=None):
        for p, q in zip(rail, rail[1:] + rail[:1]):
            space.add_line(p, q, dxfattribs=attribs)
        space.add_circle(*hole, dxfattribs=attribs)

    def loops(a=((1, 0), (0, 1)), b=(0, 0)):
        return [S.moved(S.polygon(rail), a, b)], [S.moved(S.circle(*hole), a, b)]

    doc, msp = new()
    draw(doc.blocks.new("RAIL"))
    doc.blocks.new("PAIR").add_blockref("RAIL", (5, 2), dxfattribs={"rotation": 90.0, "xscale": 2.0, "yscale": 2.0})
    doc.blocks.new("FRAME").add_blockref("PAIR", (-10, 40), dxfattribs={"xscale": -1.0})
    msp.add_blockref("FRAME", (100, 50), dxfattribs={"rotation": 15.0, "xscale": 0.5, "yscale": 0.5})
    save(doc, "05-nested-blocks.dxf")
    a1 = 2 * np.array([[0, -1], [1, 0]], LD)
    a2 = np.array([[-1, 0], [0, 1]], LD)
    a3 = np.array(S.rotation(15)) / 2
    a = a3 @ a2 @ a1
    b = a3 @ (a2 @ np.array([5, 2], LD) + np.array([-10, 40], LD)) + np.array([100, 50], LD)
    expect("05-nested-blocks.dxf", *loops(a, b), note="three deep: scale 2 turned by 90, mirrored in x, scale 0.5 turned by 15")

    def array(file, turn, release):
        doc, msp = new(release)
        block = doc.blocks.new("PILE")
        for p, q in zip([(0, 0), (6, 0), (6, 6), (0, 6)], [(6, 0), (6, 6), (0, 6), (0, 0)]):
            block.add_line(p, q)
        msp.add_blockref("PILE", (12, 5), dxfattribs={"column_count": 3, "row_count": 2, "column_spacing": 20.0,
                                                      "row_spacing": 15.0, "rotation": turn})
        save(doc, file)
        a = S.rotation(turn)
        squares = [S.moved(S.rectangle(20 * i, 15 * j, 6, 6), a, (12, 5)) for j in range(2) for i in range(3)]
        expect(file, squares, options={"unit": "mm"} if release == "R12" else {})

    array("05-minsert.dxf", 0.0, "R2000")
    array("05-minsert-rotated.dxf", 30.0, "R2000")
    array("05-minsert-r12.dxf", 0.0, "R12")

    doc, msp = new("R12")
    draw(doc.blocks.new("RAIL", base_point=(30, 4)))
    msp.add_blockref("RAIL", (70, 10), dxfattribs={"xscale": -1.0, "rotation": 60.0})
    save(doc, "05-mirrored-turned-base-point.dxf")
    a = np.array(S.rotation(60)) @ a2
    expect("05-mirrored-turned-base-point.dxf", *loops(a, np.array([70, 10], LD) - a @ np.array([30, 4], LD)),
           options={"unit": "mm"}, note="base point (30, 4); mirrored first, then turned")

    doc, msp = new("R12")
    draw(doc.blocks.new("RAIL", base_point=(-7, 3)))
    msp.add_blockref("RAIL", (20, -15))
    save(doc, "05-base-point.dxf")
    expect("05-base-point.dxf", *loops(b=(27, -18)), options={"unit": "mm"})

    doc, msp = new()
    doc.layers.new("SECTION")
    doc.layers.new("CENTRE")
    block = doc.blocks.new("RAIL")
    draw(block, {"layer": "0"})
    block.add_line((-5, 2), (35, 2), dxfattribs={"layer": "CENTRE"})
    msp.add_blockref("RAIL", (3, 4), dxfattribs={"layer": "SECTION"})
    save(doc, "05-layer-0-of-insert.dxf")
    expect("05-layer-0-of-insert.dxf", *loops(b=(3, 4)), options={"layers": ["SECTION"]},
           note="content on layer 0 takes the layer of the INSERT; the centre line keeps its own")

    doc, msp = new()
    doc.layers.new("SECTION")
    doc.layers.new("HIDDEN").off()
    doc.layers.new("COLD").freeze()
    block = doc.blocks.new("RAIL")
    draw(block, {"layer": "0"})
    msp.add_blockref("RAIL", (3, 4), dxfattribs={"layer": "SECTION"})
    msp.add_blockref("RAIL", (53, 4), dxfattribs={"layer": "HIDDEN"})
    msp.add_blockref("RAIL", (103, 4), dxfattribs={"layer": "COLD"})
    save(doc, "05-inserts-on-hidden-layers.dxf")
    expect("05-inserts-on-hidden-layers.dxf", *loops(b=(3, 4)))

    doc, msp = new()
    block = doc.blocks.new("RAIL")
    draw(block, {"color": 0})
    block.add_line((-5, 2), (35, 2), dxfattribs={"color": 3})
    msp.add_blockref("RAIL", (3, 4), dxfattribs={"color": 1})
    save(doc, "05-colour-by-block.dxf")
    expect("05-colour-by-block.dxf", *loops(b=(3, 4)), options={"colors": [1]}, meant=True,
           note="outline BYBLOCK in a red INSERT, a green centre line across; drawn colours: outline 1, centre line 3")

    doc, msp = new()
    block = doc.blocks.new("ROUND")
    add_poly(block, [(x, y, b) for x, y, b in [(0, 0, 0.0), (30, 0, 0.5), (30, 20, 0.0), (0, 20, -0.3)]])
    msp.add_blockref("ROUND", (8, 9), dxfattribs={"xscale": 1.5, "yscale": -1.5, "rotation": 200.0})
    save(doc, "05-mirrored-in-y-bulges.dxf")
    a = np.array(S.rotation(200)) @ np.array([[1.5, 0], [0, -1.5]], LD)
    expect("05-mirrored-in-y-bulges.dxf", [S.moved(S.bulged([(0, 0, 0), (30, 0, 0.5), (30, 20, 0), (0, 20, -0.3)]), a, (8, 9))])

    doc, msp = new()
    a, b = doc.blocks.new("A"), doc.blocks.new("B")
    draw(a)
    a.add_blockref("B", (40, 0))
    b.add_blockref("A", (40, 0))
    msp.add_blockref("A", (0, 0))
    save(doc, "05-block-in-itself.dxf")
    expect("05-block-in-itself.dxf", source="none: A holds B and B holds A, which no program may read without end", meant=True)

    doc, msp = new("R12")
    add_pieces(msp, PIECES, {"layer": "SECTION"})
    msp.add_blockref("MISSING", (0, 0))
    save(doc, "05-block-missing.dxf")
    expect("05-block-missing.dxf", [CHANNEL], options={"unit": "mm"}, note="an INSERT of a block that is not there")


# ---------------------------------------------------------------- planes
def group_6():
    down = {"extrusion": (0, 0, -1)}
    flip = lambda q: (-q[0] + 0.0, q[1])
    turned = placed(PIECES, flip, mirror=True)  # in the entities' own coordinates

    doc, msp = new()
    add_poly(msp, bulges(turned), down)
    save(doc, "06-downward-lwpolyline.dxf")
    expect("06-downward-lwpolyline.dxf", [CHANNEL])

    doc, msp = new("R12")
    for p, q in zip(PIECES, turned):
        if p[0] == "L":
            msp.add_line(p[1], p[2], dxfattribs=down)  # ends of lines are world coordinates whatever the extrusion
        else:
            msp.add_arc(q[1], q[2], min(q[3], q[4]), max(q[3], q[4]), dxfattribs=down)
    save(doc, "06-downward-arcs-lines.dxf")
    expect("06-downward-arcs-lines.dxf", [CHANNEL], options={"unit": "mm"})

    doc, msp = new("R12")
    msp.add_circle((-40, 12), 30, dxfattribs=down)
    msp.add_circle((33, 12), 9)
    save(doc, "06-downward-circle.dxf")
    expect("06-downward-circle.dxf", [S.circle((40, 12), 30)], [S.circle((33, 12), 9)], options={"unit": "mm"},
           note="the outer circle is turned over, the bore is not")

    doc, msp = new("R12")
    msp.add_polyline2d(bulges(turned), format="xyb", close=True, dxfattribs=down)
    save(doc, "06-downward-polyline-r12.dxf")
    expect("06-downward-polyline-r12.dxf", [CHANNEL], options={"unit": "mm"})

    doc, msp = new("R12")
    front = {"extrusion": (0, -1, 0)}
    for p in PIECES:
        if p[0] == "L":
            msp.add_line((p[1][0], 12, p[1][1]), (p[2][0], 12, p[2][1]))
        else:
            msp.add_arc((p[1][0], p[1][1], -12), p[2], min(p[3], p[4]), max(p[3], p[4]), dxfattribs=front)
    save(doc, "06-plane-xz.dxf")
    expect("06-plane-xz.dxf", [CHANNEL], options={"unit": "mm", "plane": "XZ"},
           note="drawn upright in the plane y = 12; coordinates here are (X, Z)")

    doc, msp = new("R12")
    side = {"extrusion": (1, 0, 0)}
    for p in PIECES:
        if p[0] == "L":
            msp.add_line((7, p[1][0], p[1][1]), (7, p[2][0], p[2][1]))
        else:
            msp.add_arc((p[1][0], p[1][1], 7), p[2], min(p[3], p[4]), max(p[3], p[4]), dxfattribs=side)
    save(doc, "06-plane-yz.dxf")
    expect("06-plane-yz.dxf", [CHANNEL], options={"unit": "mm", "plane": "YZ"},
           note="drawn upright in the plane x = 7; coordinates here are (Y, Z)")

    doc, msp = new()
    poly = msp.add_lwpolyline(bulges(PIECES), format="xyb", close=True, dxfattribs={"extrusion": (0, -1, 0), "elevation": -12.0})
    save(doc, "06-plane-xz-lwpolyline.dxf")
    expect("06-plane-xz-lwpolyline.dxf", [CHANNEL], options={"plane": "XZ"}, note="coordinates here are (X, Z)")

    corners = [(0, 0), (50, 0), (62, 25), (40, 44), (0, 30)]
    doc, msp = new("R12")
    msp.add_polyline3d([(x, y, 5) for x, y in corners], close=True)
    save(doc, "06-polyline3d-flat.dxf")
    expect("06-polyline3d-flat.dxf", [S.polygon(corners)], options={"unit": "mm"}, note="a 3D polyline, flat at z = 5")

    doc, msp = new()
    add_poly(msp, bulges(PIECES), {"elevation": -30.0})
    save(doc, "06-elevated-lwpolyline.dxf")
    expect("06-elevated-lwpolyline.dxf", [CHANNEL])

    # a plane at a slant about the x axis: what an oblique plane should give is the true shape or a refusal
    doc, msp = new()
    t = math.radians(30)
    add_poly(msp, bulges(PIECES), {"extrusion": (0, -math.sin(t), math.cos(t))})
    save(doc, "06-plane-slanted.dxf")
    expect("06-plane-slanted.dxf", [CHANNEL], meant=True,
           note="extrusion (0, -sin 30, cos 30): area and moments are those in its own plane; the projection has cos 30 times the area")


# ---------------------------------------------------------------- layers
def group_7():
    def plain(release, layer, file, encoding=None, edit=None, options=None, **more):
        doc, msp = new(release)
        if encoding:
            doc.encoding = encoding
        doc.layers.new(layer)
        doc.layers.new("CENTRE")
        add_pieces(msp, PIECES, {"layer": layer})
        msp.add_line((20, 30), (100, 30), dxfattribs={"layer": "CENTRE"})
        save(doc, file)
        if edit:
            with open(file, "rb") as f:
                data = f.read()
            with open(file, "wb") as f:
                f.write(data.replace(*edit))
        expect(file, [CHANNEL], options=dict(options or {"layers": [layer]}, **({"unit": "mm"} if release == "R12" else {})), **more)

    doc, msp = new()
    for name, colour in (("SECTION", 7), ("CENTRE", 2), ("DIMENSIONS", 3), ("TEXT", 4), ("COLD", 5), ("OFF", 6), ("GUIDE", 8)):
        doc.layers.new(name, dxfattribs={"color": colour})
    doc.layers.get("COLD").freeze()
    doc.layers.get("OFF").off()
    doc.layers.get("GUIDE").dxf.plot = 0
    add_poly(msp, bulges(PIECES), {"layer": "SECTION"})
    msp.add_line((20, 30), (100, 30), dxfattribs={"layer": "CENTRE"})
    msp.add_line((60, -30), (60, 90), dxfattribs={"layer": "CENTRE"})
    msp.add_linear_dim(base=(60, -35), p1=(30, -20), p2=(75, -20), dimstyle="Standard", dxfattribs={"layer": "DIMENSIONS"}).render()
    msp.add_linear_dim(base=(10, 30), p1=(30, -20), p2=(30, 80), angle=90, dimstyle="Standard", dxfattribs={"layer": "DIMENSIONS"}).render()
    msp.add_text("Dock fender channel", dxfattribs={"layer": "TEXT", "height": 5, "insert": (30, 95)})
    for layer, d in (("COLD", 3.0), ("OFF", 6.0)):
        msp.add_lwpolyline([(30 - d, -20 - d), (90 + d, -20 - d), (90 + d, 80 + d), (30 - d, 80 + d)], close=True, dxfattribs={"layer": layer})
    msp.add_lwpolyline([(25, -25), (95, -25), (95, 85), (25, 85)], close=True, dxfattribs={"layer": "GUIDE"})
    doc.layout("Layout1").add_lwpolyline([(0, 0), (420, 0), (420, 297), (0, 297)], close=True, dxfattribs={"layer": "SECTION"})
    save(doc, "07-working-drawing.dxf")
    expect("07-working-drawing.dxf", [CHANNEL], options={"layers": ["SECTION"]},
           note="centre lines, two DIMENSIONs with their blocks, text, a frozen and an off layer with another outline, a layer that is not plotted, and paper space")
    expect("07-working-drawing.dxf", [CHANNEL], meant=True, note="without a choice of layers: the centre lines cross the section")

    plain("R2000", "Pr\u00fcfma\u00df \u00e4\u00f6", "07-layer-ansi-1252.dxf")
    plain("R12", "Pr\u00fcfma\u00df \u00e4\u00f6", "07-layer-ansi-1252-r12.dxf", "cp1252")
    plain("R2000", "\u65ad\u9762\u8868", "07-layer-ansi-932.dxf", "cp932",
          note="the second byte of the last letter is a backslash")
    plain("R2000", "\u622a\u9762", "07-layer-ansi-936.dxf", "gbk")
    plain("R2000", "\u0421\u0435\u0447\u0435\u043d\u0438\u0435", "07-layer-ansi-1251.dxf", "cp1251")
    plain("R2010", "Pr\u00fcfma\u00df \u65ad\u9762 \u622a\u9762", "07-layer-utf-8.dxf")
    plain("R2000", "ROHR \u5f84", "07-layer-escaped.dxf", "cp1252",
          note=r"a letter outside of the code page: the writer put \U+5f84 in its place")
    plain("R2000", "ROHR @DIAMETER", "07-layer-escaped-diameter.dxf", edit=(b"@DIAMETER", rb"\U+00D8"),
          options={"layers": ["ROHR \u00d8"]}, note=r"the layer's name holds \U+00D8, put in afterwards, as other writers do")

    doc, msp = new()
    add_poly(msp, bulges(PIECES), {"color": 1})
    msp.add_line((20, 30), (100, 30), dxfattribs={"color": 3})
    msp.add_circle((60, 30), 3, dxfattribs={"color": 3})
    save(doc, "07-colours.dxf")
    expect("07-colours.dxf", [CHANNEL], options={"colors": [1]}, note="all on layer 0: the outline red, the rest green")

    doc, msp = new("R2004")
    outline = add_poly(msp, bulges(PIECES), {"color": 1})
    outline.rgb = (200, 30, 30)
    axis = msp.add_line((20, 30), (100, 30), dxfattribs={"color": 3})
    axis.rgb = (30, 160, 60)
    save(doc, "07-true-colours.dxf")
    expect("07-true-colours.dxf", [CHANNEL], options={"colors": [1]},
           note="all on layer 0: the outline has true colour 200,30,30 (and index 1), the centre line 30,160,60 (and index 3)")

    doc, msp = new()
    doc.layers.new("SECTION", dxfattribs={"color": 1})
    add_poly(msp, bulges(PIECES), {"layer": "SECTION"})
    msp.add_line((20, 30), (100, 30), dxfattribs={"layer": "SECTION", "color": 3})
    save(doc, "07-colour-by-layer.dxf")
    expect("07-colour-by-layer.dxf", [CHANNEL], options={"colors": [1]}, meant=True,
           note="the outline is red since its layer is; the centre line on the same layer is green by itself")


# ---------------------------------------------------------------- releases
def group_8():
    shape = [(0.0, 0.0, 0.0), (50.0, 0.0, 0.35), (50.0, 30.0, 0.0), (20.0, 30.0, -0.2), (0.0, 20.0, 0.0)]
    for release in ("R12", "R2000", "R2004", "R2007", "R2010", "R2013", "R2018"):
        for fmt in ("asc", "bin") if release in ("R12", "R2000", "R2018") else ("asc",):
            full = fmt == "asc" and release in ("R12", "R2000", "R2018")
            doc, msp = new(release, full=full)
            doc.layers.new("SECTION")
            if release == "R12":
                msp.add_polyline2d(shape, format="xyb", close=True, dxfattribs={"layer": "SECTION"})
            else:
                add_poly(msp, shape, {"layer": "SECTION"})
            msp.add_circle((20, 12), 5, dxfattribs={"layer": "SECTION"})
            file = f"08-{'binary' if fmt == 'bin' else 'ascii'}-{release.lower()}.dxf"
            save(doc, file, fmt, full)
            expect(file, [S.bulged(shape)], [S.circle((20, 12), 5)], options={"unit": "mm"} if release == "R12" else {})


# ---------------------------------------------------------------- units
def group_9():
    shape = [(0, 0), (6, 0), (6, 1), (1, 1), (1, 4), (0, 4)]
    for units, measurement, name in ((1, 0, "inches"), (2, 0, "feet"), (4, 1, "millimetres"), (5, 1, "centimetres"),
                                     (6, 1, "metres"), (0, 0, "none-english"), (0, 1, "none-metric"), (4, 0, "millimetres-english")):
        doc, msp = new("R2000", units, measurement)
        msp.add_lwpolyline(shape, close=True)
        file = f"09-units-{name}.dxf"
        save(doc, file)
        expect(file, [S.polygon(shape)], insunits=units, measurement=measurement,
               note="values in drawing units" + ("; the drawing does not state its unit" if units == 0 else ""))


# ---------------------------------------------------------------- other entities
SAT = """400 0 1 0
8 MeshTest 8 ACIS 4.0 24 Sat Jan 01 00:00:00 2000
1 9.9999999999999995e-007 1e-010
body $-1 $1 $-1 $-1 #
lump $-1 $-1 $2 $0 #
shell $-1 $-1 $-1 $3 $-1 $1 #
face $-1 $-1 $4 $2 $-1 $5 forward double out #
loop $-1 $-1 $6 $3 #
plane-surface $-1 0 0 0 0 0 1 1 0 0 forward_v I I I I #
coedge $-1 $7 $9 $-1 $10 forward $4 $-1 #
coedge $-1 $8 $6 $-1 $11 forward $4 $-1 #
coedge $-1 $9 $7 $-1 $12 forward $4 $-1 #
coedge $-1 $6 $8 $-1 $13 forward $4 $-1 #
edge $-1 $14 $15 $6 $18 forward #
edge $-1 $15 $16 $7 $19 forward #
edge $-1 $16 $17 $8 $20 forward #
edge $-1 $17 $14 $9 $21 forward #
vertex $-1 $10 $22 #
vertex $-1 $10 $23 #
vertex $-1 $11 $24 #
vertex $-1 $12 $25 #
straight-curve $-1 0 0 0 1 0 0 I I #
straight-curve $-1 80 0 0 0 1 0 I I #
straight-curve $-1 80 25 0 -1 0 0 I I #
straight-curve $-1 0 25 0 0 -1 0 I I #
point $-1 0 0 0 #
point $-1 80 0 0 #
point $-1 80 25 0 #
point $-1 0 25 0 #"""

PROXY = """0
ACAD_PROXY_ENTITY
5
FFF0
330
{owner}
100
AcDbEntity
8
WELDS
100
AcDbProxyEntity
90
498
91
500
95
0
70
0
92
0
93
64
310
0102030405060708
94
0
"""


def group_10():
    doc, msp = new()
    outer = [(0, 0), (100, 0), (100, 60), (0, 60)]
    msp.add_mline(outer, close=True, dxfattribs={"scale_factor": 8})
    save(doc, "10-mline-tube.dxf")
    expect("10-mline-tube.dxf", [S.rectangle(-8, -8, 116, 76)], [S.rectangle(0, 0, 100, 60)], meant=True,
           note="a closed MLINE of two lines 8 apart: the wall of a tube")

    doc, msp = new()
    add_poly(msp, bulges(PIECES), {"layer": "SECTION"})
    msp.add_wipeout([(25, 20), (65, 20), (65, 40), (25, 40)], dxfattribs={"layer": "NOTES"})
    save(doc, "10-wipeout.dxf")
    expect("10-wipeout.dxf", [CHANNEL], note="a WIPEOUT covers part of the web; it hides, it is no outline")

    for kind in ("REGION", "3DSOLID"):
        doc, msp = new()
        add = msp.add_region if kind == "REGION" else msp.add_3dsolid
        add(dxfattribs={"layer": "SECTION"}).sat = SAT.split("\n")
        save(doc, f"10-{kind.lower()}.dxf")
        expect(f"10-{kind.lower()}.dxf", [S.rectangle(0, 0, 80, 25)], meant=True,
               note=f"a {kind} alone, with hand-written SAT data of a rectangle's face (never opened in a CAD program): to be named as not read, or read")

    doc, msp = new()
    add_poly(msp, bulges(PIECES), {"layer": "SECTION"})
    from ezdxf.entities import factory
    from ezdxf.lldxf.extendedtags import ExtendedTags
    owner = msp.layout_key
    proxy = factory.load(ExtendedTags.from_text(PROXY.format(owner=owner)), doc)
    factory.bind(proxy, doc)
    msp.add_entity(proxy)
    save(doc, "10-proxy.dxf")
    expect("10-proxy.dxf", [CHANNEL], note="an ACAD_PROXY_ENTITY of an unknown program beside the outline")

    bars = [(45.0, 45.0, 20.0), (150.0, 45.0, 20.0), (255.0, 45.0, 20.0), (45.0, 455.0, 12.0), (255.0, 455.0, 12.0)]
    for kind in ("points", "circles"):
        doc, msp = new("R12")
        for name in ("CONCRETE", "BARS"):
            doc.layers.new(name)
        msp.add_polyline2d([(0, 0), (300, 0), (300, 500), (0, 500)], close=True, dxfattribs={"layer": "CONCRETE"})
        for x, y, d in bars:
            if kind == "points":
                msp.add_point((x, y), dxfattribs={"layer": "BARS"})
            else:
                msp.add_circle((x, y), d / 2, dxfattribs={"layer": "BARS"})
        save(doc, f"10-bars-{kind}.dxf")
        extra = {"bars": [list(b[:2]) + ([b[2]] if kind == "circles" else []) for b in bars]}
        expect(f"10-bars-{kind}.dxf", [S.rectangle(0, 0, 300, 500)], options={"unit": "mm", "layers": ["CONCRETE"]},
               closed=(150000, [150, 250], [300 * 500**3 / 12, 500 * 300**3 / 12, 0.0]), source="closed form",
               note="bars: x, y" + (", diameter" if kind == "circles" else ""), **extra)
    steel = [S.circle(b[:2], b[2] / 2) for b in bars]
    expect("10-bars-circles.dxf", steel, options={"unit": "mm", "layers": ["BARS"]}, note="the bars by themselves")

    doc, msp = new()
    add_poly(msp, bulges(PIECES), {"layer": "SECTION"})
    notes = {"layer": "NOTES"}
    msp.add_text("t = 8", dxfattribs={**notes, "height": 4, "insert": (40, 40)})
    msp.add_mtext("Dock fender\\Pchannel", dxfattribs={**notes, "char_height": 4, "insert": (50, 60)})
    msp.add_leader([(36, 30), (50, 38), (60, 38)], dimstyle="Standard", dxfattribs=notes)
    msp.add_point((60, 30), dxfattribs=notes)
    msp.add_ray((0, 30), (1, 0), dxfattribs=notes)
    msp.add_xline((60, 0), (0, 1), dxfattribs=notes)
    image = doc.add_image_def("photo.png", (64, 48))
    msp.add_image(image, insert=(100, 0), size_in_units=(64, 48), dxfattribs=notes)
    save(doc, "10-annotations.dxf")
    expect("10-annotations.dxf", [CHANNEL], note="TEXT, MTEXT, LEADER, POINT, RAY, XLINE and IMAGE on another layer")

    doc, msp = new("R12")
    msp.add_3dface([(0, 0), (80, 0), (80, 25), (0, 25)])
    save(doc, "10-3dface.dxf")
    expect("10-3dface.dxf", [S.rectangle(0, 0, 80, 25)], options={"unit": "mm"}, meant=True, note="a rectangle as one 3DFACE")


# ---------------------------------------------------------------- faults of linework
def group_11():
    unit = {"unit": "mm"}

    def fault(file, items, solids, holes=(), note=None, options=None, exact=1e-13, meant=True, **more):
        """items: ('L', p, q[, layer]), ('P', points, closed[, layer]), ('C', centre, r), ('A', centre, r, from, to)"""
        with r12writer(file) as w:
            for item in items:
                kind, layer = item[0], next((v for v in item[1:] if isinstance(v, str)), "SECTION")
                if kind == "L":
                    w.add_line(item[1], item[2], layer=layer)
                elif kind == "P":
                    w.add_polyline_2d(item[1], closed=item[2], layer=layer)
                elif kind == "C":
                    w.add_circle(item[1], item[2], layer=layer)
                else:
                    w.add_arc(item[1], item[2], item[3], item[4], layer=layer)
        expect(file, solids, holes, options=dict(unit, **(options or {})), exact=exact, note=note, **({"meant": True} if meant else {}), **more)

    def lines(points, layer="SECTION"):
        return [("L", p, q, layer) for p, q in zip(points, points[1:] + points[:1])]

    angle = [(0, 0), (90, 0), (90, 10), (12, 10), (12, 120), (0, 120)]

    def longer(p, q, d):
        n = math.dist(p, q)
        u = ((q[0] - p[0]) / n * d, (q[1] - p[1]) / n * d)
        return ("L", (p[0] - u[0], p[1] - u[1]), (q[0] + u[0], q[1] + u[1]))

    sides = list(zip(angle, angle[1:] + angle[:1]))
    fault("11-overshoot.dxf", [longer(p, q, 2) for p, q in sides], [S.polygon(angle)], note="every line 2 too long at both ends")
    fault("11-overshoot-small.dxf", [longer(p, q, 0.0005) for p, q in sides], [S.polygon(angle)], exact=1e-4,
          note="every line 0.0005 too long at both ends")
    fault("11-lines-twice.dxf", lines(angle) + [("L", (90, 0), (0, 0)), ("L", (0, 120), (0, 0)), ("L", (12, 10), (12, 120))],
          [S.polygon(angle)], note="three sides drawn twice, one of them reversed")
    split = [("L", (0, 0), (60, 0)), ("L", (90, 0), (40, 0))] + lines(angle)[1:]
    fault("11-lines-overlapping.dxf", split, [S.polygon(angle)], note="the bottom is two lines that overlap from 40 to 60, the second reversed")
    fault("11-line-over-part.dxf", lines(angle) + [("L", (0, 70), (0, 30))], [S.polygon(angle)],
          note="a short line on the back side, reversed")
    fault("11-circle-twice.dxf", [("C", (5, 5), 20), ("C", (5, 5), 20)], [S.circle((5, 5), 20)])
    fault("11-arcs-overlapping.dxf", [("A", (5, 5), 20, 0, 200), ("A", (5, 5), 20, 180, 360)], [S.circle((5, 5), 20)],
          note="two arcs of one circle that overlap by 20 degrees")
    fault("11-circle-and-arc.dxf", [("C", (5, 5), 20), ("A", (5, 5), 20, 30, 90)], [S.circle((5, 5), 20)])
    gaps = [("L", (p[0], p[1]), longer(p, q, -g)[2]) for (p, q), g in zip(sides, [0.001] * 6)]
    fault("11-gaps.dxf", gaps, [S.polygon(angle)], exact=1e-4, note="every line ends 0.001 short of the next")
    gaps = [("L", (p[0], p[1]), longer(p, q, -0.5)[2]) for p, q in sides]
    fault("11-gaps-large.dxf", gaps, [S.polygon(angle)], exact=3e-2, options={"tolerance": 1.0},
          note="every line ends 0.5 short of the next; the area is that of the angle with its corners")
    fault("11-centre-line.dxf", lines(angle) + [("L", (-10, 60), (100, 60))], [S.polygon(angle)],
          note="a centre line across, on the same layer: could be a cut as well")
    fault("11-stub-at-corner.dxf", lines(angle) + [("L", (90, 10), (95, 15))], [S.polygon(angle)])
    fault("11-stub-outside.dxf", lines(angle) + [("L", (0, 50), (-6, 50))], [S.polygon(angle)])
    fault("11-stub-inside.dxf", lines(angle) + [("L", (0, 50), (6, 50))], [S.polygon(angle)])
    fault("11-line-of-no-length.dxf", lines(angle) + [("L", (90, 10), (90, 10))], [S.polygon(angle)])

    timber, steel = [(0, 0), (60, 0), (60, 200), (0, 200)], [(60, 0), (68, 0), (68, 200), (60, 200)]
    items = [("P", timber, True, "TIMBER"), ("P", steel, True, "STEEL")]
    fault("11-shared-edge-two-layers.dxf", items, [S.rectangle(0, 0, 68, 200)], note="both together, as one outline")
    for layer, loop in (("TIMBER", timber), ("STEEL", steel)):
        expect("11-shared-edge-two-layers.dxf", [S.polygon(loop)], options={"unit": "mm", "layers": [layer]})
    items = lines(timber, "TIMBER") + lines(steel, "STEEL")
    fault("11-shared-edge-two-layers-lines.dxf", items, [S.rectangle(0, 0, 68, 200)],
          note="the same of loose lines: the shared edge is there twice, and both are wanted")
    for layer, loop in (("TIMBER", timber), ("STEEL", steel)):
        expect("11-shared-edge-two-layers-lines.dxf", [S.polygon(loop)], options={"unit": "mm", "layers": [layer]})

    flange, web = [(0, 40), (80, 40), (80, 50), (0, 50)], [(35, 0), (45, 0), (45, 40), (35, 40)]
    tee = [(35, 0), (45, 0), (45, 40), (80, 40), (80, 50), (0, 50), (0, 40), (35, 40)]
    fault("11-tee-of-two-polylines.dxf", [("P", flange, True), ("P", web, True)], [S.polygon(tee)],
          note="two closed polylines; the web's top is a part of the flange's bottom")
    fault("11-tee-loose-lines.dxf", lines(flange) + [("L", (35, 40), (35, 0)), ("L", (35, 0), (45, 0)), ("L", (45, 0), (45, 40))],
          [S.polygon(tee)], note="the web's lines end on the flange's bottom line, which is not split there")
    fault("11-tee-loose-lines-short.dxf", lines(flange) + [("L", (35, 39.9995), (35, 0)), ("L", (35, 0), (45, 0)), ("L", (45, 0), (45, 39.9995))],
          [S.polygon(tee)], exact=1e-4, note="the same; the web's lines end 0.0005 short of the flange")
    bottom = [(10, -10), (70, -10), (70, 0), (10, 0)]
    beam = [(10, -10), (70, -10), (70, 0), (45, 0), (45, 40), (80, 40), (80, 50), (0, 50), (0, 40), (35, 40), (35, 0), (10, 0)]
    fault("11-beam-loose-lines.dxf", lines(flange) + lines(bottom) + [("L", (35, 40), (35, 0)), ("L", (45, 0), (45, 40))],
          [S.polygon(beam)], note="two flanges of four lines and a web of two")
    fault("11-rectangles-overlapping.dxf", [("P", [(0, 0), (60, 0), (60, 40), (0, 40)], True), ("P", [(45, 25), (100, 25), (100, 70), (45, 70)], True)],
          [S.polygon([(0, 0), (60, 0), (60, 25), (100, 25), (100, 70), (45, 70), (45, 40), (0, 40)])],
          note="could also be meant with the overlap twice; this is the union")
    fault("11-corner-touch.dxf", [("P", [(0, 0), (30, 0), (30, 20), (0, 20)], True), ("P", [(30, 20), (55, 20), (55, 60), (30, 60)], True)],
          [S.rectangle(0, 0, 30, 20), S.rectangle(30, 20, 25, 40)], note="two rectangles that touch at one corner")
    radii = [60, 50, 40, 30, 20, 10]
    fault("11-rings.dxf", [("C", (12, -3), r) for r in radii], [S.circle((12, -3), r) for r in radii[::2]],
          [S.circle((12, -3), r) for r in radii[1::2]], meant=False, note="ring in ring in ring")
    u = [(0, 0), (60, 0), (60, 8), (8, 8), (8, 92), (60, 92), (60, 100), (0, 100)]
    fault("11-bar-in-mouth.dxf", [("P", u, True), ("P", [(50, 20), (56, 20), (56, 80), (50, 80)], True)],
          [S.polygon(u), S.rectangle(50, 20, 6, 60)], meant=False, note="a bar in the mouth of a channel touches nothing: two pieces, no hole")
    fault("11-bar-closes-mouth.dxf", [("P", u, True), ("P", [(50, 8), (56, 8), (56, 92), (50, 92)], True)],
          [S.polygon([(0, 0), (60, 0), (60, 8), (56, 8), (56, 92), (60, 92), (60, 100), (0, 100)])], [S.rectangle(8, 8, 42, 84)],
          note="the bar's ends lie on the flanges: one piece with a chamber")

    # coordinates of a national grid
    east, north = 500000.0, 5000000.0
    far = [(x + east, y + north, b) for x, y, b in bulges(PIECES)]
    doc, msp = new()
    add_poly(msp, far)
    save(doc, "11-grid-millimetres.dxf")
    near = [(x - east, y - north, b) for x, y, b in far]  # exact
    expect("11-grid-millimetres.dxf", [S.bulged(near)], offset=(east, north), source=GAUSS + ", of the coordinates as written")
    far = [(x / 1000 + east, y / 1000 + north, b) for x, y, b in bulges(PIECES)]
    doc, msp = new("R2000", 6)
    add_poly(msp, far)
    save(doc, "11-grid-metres.dxf")
    near = [(x - east, y - north, b) for x, y, b in far]
    expect("11-grid-metres.dxf", [S.bulged(near)], offset=(east, north), source=GAUSS + ", of the coordinates as written",
           note="a section of 0.1 m, 5000 km from the origin: the written coordinates have steps of 9e-10 m")
    doc, msp = new()
    add_pieces(msp, placed(PIECES, lambda q: (q[0] + east, q[1] + north)), shuffle=3)
    save(doc, "11-grid-lines-arcs.dxf")
    expect("11-grid-lines-arcs.dxf", [CHANNEL], offset=(east, north), exact=1e-10,
           note="lines and arcs; ends of arcs meet those of lines to rounding only")


# ---------------------------------------------------------------- OpenSCAD and Inkscape
def line_loops(file):
    """Closed chains of the LINEs of a file, read by their tags alone, ends equal to the letter."""
    with open(file, encoding="latin-1") as f:
        tags = [t.strip() for t in f.read().splitlines()]
    tags = list(zip(tags[::2], tags[1::2]))
    follow, entity = {}, None
    for code, value in tags + [("0", "")]:
        if code == "0":
            if entity and "11" in entity:
                p, q = (entity["10"], entity["20"]), (entity["11"], entity["21"])
                if p != q:
                    follow[p] = q
            entity = {} if value == "LINE" else None
        elif entity is not None and code in ("10", "20", "11", "21"):
            entity[code] = float(value)
    out = []
    while follow:
        p, q = follow.popitem()
        loop = [p]
        while q != loop[0]:
            loop.append(q)
            q = follow.pop(q)
        out.append(loop)
    return out


def by_nesting(loops_):
    def inside(p, loop):
        n = False
        for (x0, y0), (x1, y1) in zip(loop, loop[1:] + loop[:1]):
            if (y0 > p[1]) != (y1 > p[1]) and p[0] < x0 + (p[1] - y0) * (x1 - x0) / (y1 - y0):
                n = not n
        return n
    depth = [sum(inside(a[0], b) for b in loops_ if b is not a) for a in loops_]
    return [S.polygon(a) for a, d in zip(loops_, depth) if d % 2 == 0], [S.polygon(a) for a, d in zip(loops_, depth) if d % 2]


def group_12():
    if "--outside" in sys.argv:
        subprocess.run(["openscad", "-q", "-o", "12-openscad-plate.dxf", "12-openscad-plate.scad"], check=True)
        # Inkscape 1.2.2: its exporters need python3-cssselect. The R14 one stops when Inkscape starts it without a
        # display, so it is started by itself, with the options that Inkscape's dialogue offers by default
        subprocess.run(["inkscape", "12-inkscape-seal.svg", "--export-type=dxf", "--export-filename=12-inkscape-r12.dxf"],
                       stderr=subprocess.DEVNULL, check=True)
        for poly, name in (("true", "r14"), ("false", "r14-lines")):
            subprocess.run(["/usr/bin/python3", "-B", "/usr/share/inkscape/extensions/dxf_outlines.py", "--POLY=" + poly,
                            "--ROBO=false", "--unit_from_document=true", "--encoding=utf_8", "--layer_option=all",
                            f"--output=12-inkscape-{name}.dxf", "12-inkscape-seal.svg"], check=True)

    def disc(x, y, r, first=0, last=48):
        return [(x + r * math.cos(math.radians(7.5 * i)), y + r * math.sin(math.radians(7.5 * i))) for i in range(first, last)]

    plate = disc(108, 50, 10, 0, 13) + disc(12, 50, 10, 12, 25) + disc(12, 10, 10, 24, 37) + disc(108, 10, 10, 36, 49)
    slot = disc(75, 30, 6, -12, 13) + disc(45, 30, 6, 12, 37)
    ideal = S.integrals([S.polygon(plate)], [S.polygon(slot), S.polygon(disc(16, 30, 4.5)), S.polygon(disc(104, 30, 4.5))])
    solids, holes = by_nesting(line_loops("12-openscad-plate.dxf"))
    written = S.integrals(solids, holes)
    assert abs(written[0] / ideal[0] - 1) < 1e-6 and abs(written[2][1] / ideal[2][1] - 1) < 1e-5, (written, ideal)
    expect("12-openscad-plate.dxf", solids, holes, options={"unit": "mm"},
           source="exact polygon formulas by quadrature, of the coordinates as written (six digits)",
           note="of the program's own circles of 48 chords, with all digits: area " + repr(ideal[0]))

    # the paths of the drawing, y turned over on a page 80 high
    outer = [(10, 10), (110, 10), (110, 30)]
    curves = [[(110, 30), (110, 60), (80, 40), (70, 65)], [(70, 65), (60, 75), (25, 75), (10, 55)]]
    eye = [[(30, 45), (30, 35), (45, 30), (50, 40)], [(50, 40), (55, 50), (30, 55), (30, 45)]]
    bezier = lambda c: S.spline(3, [0] * 4 + [1] * 4, c)
    solid = [S.line(p, q) for p, q in zip(outer, outer[1:])] + [bezier(c) for c in curves] + [S.line((10, 55), (10, 10))]
    hole = [bezier(c) for c in eye]
    for name, note in (("r14", "lines as open LWPOLYLINEs, one of a single vertex; the drawing does not state its unit"),
                       ("r14-lines", "lines as LINEs, one of no length; the drawing does not state its unit")):
        expect(f"12-inkscape-{name}.dxf", [solid], [hole], options={"unit": "mm"}, note=note)
    solids, holes = by_nesting(line_loops("12-inkscape-r12.dxf"))
    assert abs(S.integrals(solids, holes)[0] / S.integrals([solid], [hole])[0] - 1) < 1e-3
    expect("12-inkscape-r12.dxf", solids, holes, options={"unit": "mm"},
           source="exact polygon formulas by quadrature, of the coordinates as written (six decimals)",
           note="the exporter for R12 makes lines of the curves")


GROUPS = {n: globals()[f"group_{n}"] for n in range(1, 13)}


def main():
    for n, group in sorted(GROUPS.items()):
        group()
    with open("expected.json", "w", encoding="utf-8", newline="\n") as f:
        f.write("[\n" + ",\n".join("  " + json.dumps(e, ensure_ascii=False) for e in EXPECTED) + "\n]\n")
    print(len(EXPECTED), "expectations")


if __name__ == "__main__":
    main()
