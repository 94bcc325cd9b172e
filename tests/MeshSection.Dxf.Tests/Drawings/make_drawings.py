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
    if not full and release != "R12":
        # variables and objects that carry no geometry: half of the file otherwise
        keep = {"$ACADVER", "$ACADMAINTVER", "$DWGCODEPAGE", "$INSUNITS", "$MEASUREMENT", "$HANDSEED", "$EXTMIN",
                "$EXTMAX", "$INSBASE", "$LUNITS", "$AUNITS", "$ANGBASE", "$ANGDIR"}
        for name in [n for n in doc.header.varnames() if n not in keep]:
            del doc.header[name]
        for material in [o for o in doc.objects if o.dxftype() == "MATERIAL"]:
            doc.objects.delete_entity(material)
        doc.materials.clear()
    return doc, doc.modelspace()


def save(doc, file, fmt="asc"):
    doc.saveas(file, fmt=fmt)
    auditor = ezdxf.readfile(file).audit()
    for problem in auditor.errors:
        print(f"{file}: {problem.message}")


def number(v, scale):
    v = float(v)
    return 0.0 if abs(v) < 1e-15 * scale else v


def expect(file, solids=None, holes=(), options=None, boundaries=None, source=GAUSS, exact=1e-13, closed=None, **more):
    """closed: (area, [cx, cy], [Ix, Iy, Ixy]) in closed form; asserted against the quadrature and written instead of it."""
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


GROUPS = {1: group_1, 2: group_2, 3: group_3, 4: group_4}


def main():
    for n, group in sorted(GROUPS.items()):
        group()
    with open("expected.json", "w", encoding="utf-8", newline="\n") as f:
        f.write("[\n" + ",\n".join("  " + json.dumps(e, ensure_ascii=False) for e in EXPECTED) + "\n]\n")
    print(len(EXPECTED), "expectations")


if __name__ == "__main__":
    sys.dont_write_bytecode = True
    main()
