"""Curves, outlines and their area integrals, for the expected values of the test drawings.

Everything here is written apart from MeshSection and from the program that writes the drawings: curves are evaluated
from their definitions in 80-bit floating point, and integrals over an area are turned into integrals along its boundary
(Green), each smooth piece by 24-point Gauss-Legendre quadrature on 16 parts. For lines, polynomials and arcs of less than
a full turn that leaves nothing but rounding; the closed forms that exist are asserted by make_drawings.py.
"""
import math
import numpy as np

LD = np.longdouble
PI = LD("3.14159265358979323846264338327950288")


def _gauss(n):
    x = np.polynomial.legendre.leggauss(n)[0].astype(LD)
    for _ in range(4):  # Newton, to the last digit of the longer type
        p0, p1 = np.ones(n, LD), x.copy()
        for k in range(2, n + 1):
            p0, p1 = p1, ((2 * k - 1) * x * p1 - (k - 1) * p0) / LD(k)
        d = n * (x * p1 - p0) / (x * x - 1)
        x = x - p1 / d
    return x, 2 / ((1 - x * x) * d * d)


_NODES, _WEIGHTS = _gauss(24)
_PARTS = 16


class Seg:
    """A curve from breaks[0] to breaks[-1], smooth between breaks; f(t) gives x, y, dx/dt, dy/dt."""

    def __init__(self, f, breaks, a=((1, 0), (0, 1)), b=(0, 0)):
        self.f, self.breaks, self.a, self.b = f, [LD(t) for t in breaks], np.array(a, LD), np.array(b, LD)

    def at(self, t):
        x, y, u, v = self.f(t)
        a, b = self.a, self.b
        return (a[0, 0] * x + a[0, 1] * y + b[0], a[1, 0] * x + a[1, 1] * y + b[1],
                a[0, 0] * u + a[0, 1] * v, a[1, 0] * u + a[1, 1] * v)

    def moved(self, a, b):
        a, b = np.array(a, LD), np.array(b, LD)
        return Seg(self.f, self.breaks, a @ self.a, a @ self.b + b)

    def reversed(self):
        return Seg(self.f, self.breaks[::-1], self.a, self.b)

    def end(self, which):
        # just inside the end, so that a spline is read from its own span
        lo, hi = (self.breaks[0], self.breaks[1]) if which == 0 else (self.breaks[-1], self.breaks[-2])
        x, y, _, _ = self.at(np.array([lo], LD), ) if not hasattr(self.f, "span") else self._span_at(lo, hi)
        return float(x[0]), float(y[0])

    def _span_at(self, t, towards):
        self.f.span((t + towards) / 2)
        return self.at(np.array([t], LD))


def line(p, q):
    px, py, qx, qy = LD(p[0]), LD(p[1]), LD(q[0]), LD(q[1])
    return Seg(lambda t: (px + (qx - px) * t, py + (qy - py) * t, (qx - px) + 0 * t, (qy - py) + 0 * t), [0, 1])


def arc(c, r, a0, a1):
    """Angles in radians; a1 < a0 runs clockwise."""
    cx, cy, r = LD(c[0]), LD(c[1]), LD(r)
    return Seg(lambda t: (cx + r * np.cos(t), cy + r * np.sin(t), -r * np.sin(t), r * np.cos(t)), [a0, a1])


def arc_deg(c, r, a0, a1):
    return arc(c, r, LD(a0) * PI / 180, LD(a1) * PI / 180)


def circle(c, r):
    return [arc(c, r, 0, 2 * PI)]


def ellipse(c, major, ratio, t0=LD(0), t1=2 * PI, flip=False):
    """flip: extrusion along -z, the minor axis lies on the other side."""
    cx, cy, mx, my, k = LD(c[0]), LD(c[1]), LD(major[0]), LD(major[1]), LD(ratio)
    nx, ny = (my * k, -mx * k) if flip else (-my * k, mx * k)
    return Seg(lambda t: (cx + mx * np.cos(t) + nx * np.sin(t), cy + my * np.cos(t) + ny * np.sin(t),
                          -mx * np.sin(t) + nx * np.cos(t), -my * np.sin(t) + ny * np.cos(t)), [t0, t1])


class _BSpline:
    def __init__(self, degree, knots, points, weights=None):
        self.p = degree
        self.u = np.array(knots, LD)
        w = np.ones(len(points), LD) if weights is None else np.array(weights, LD)
        self.c = np.column_stack([np.array([LD(q[0]) for q in points]) * w,
                                  np.array([LD(q[1]) for q in points]) * w, w])
        assert len(self.u) == len(points) + degree + 1
        d = self.u[degree + 1:degree + len(points)] - self.u[1:len(points)]
        with np.errstate(divide="ignore", invalid="ignore"):
            self.d = np.where(d[:, None] > 0, degree * (self.c[1:] - self.c[:-1]) / d[:, None], 0)
        self.k = None

    def breaks(self):
        inner = self.u[self.p:len(self.u) - self.p]
        return [t for i, t in enumerate(inner) if i == 0 or t > inner[i - 1]]

    def span(self, t):
        self.k = int(np.searchsorted(self.u, t, side="right")) - 1

    @staticmethod
    def _deboor(t, k, p, u, c):
        d = [c[k - p + j][None, :] + 0 * t[:, None] for j in range(p + 1)]
        for r in range(1, p + 1):
            for j in range(p, r - 1, -1):
                lo, hi = u[j + k - p], u[j + 1 + k - r]
                a = ((t - lo) / (hi - lo))[:, None]
                d[j] = (1 - a) * d[j - 1] + a * d[j]
        return d[p]

    def __call__(self, t):
        c = self._deboor(t, self.k, self.p, self.u, self.c)
        d = self._deboor(t, self.k - 1, self.p - 1, self.u[1:-1], self.d)
        w = c[:, 2]
        x, y = c[:, 0] / w, c[:, 1] / w
        return x, y, (d[:, 0] - x * d[:, 2]) / w, (d[:, 1] - y * d[:, 2]) / w


def spline(degree, knots, points, weights=None):
    f = _BSpline(degree, knots, points, weights)
    return Seg(f, f.breaks())


def polygon(points):
    return [line(p, q) for p, q in zip(points, points[1:] + points[:1])]


def rectangle(x, y, w, h):
    return polygon([(x, y), (x + w, y), (x + w, y + h), (x, y + h)])


def bulged(vertices):
    """A closed outline of (x, y, bulge), bulge = tan(quarter of the arc's angle)."""
    out = []
    for (x0, y0, b), (x1, y1, _) in zip(vertices, vertices[1:] + vertices[:1]):
        if b == 0:
            out.append(line((x0, y0), (x1, y1)))
            continue
        x0, y0, x1, y1, b = map(LD, (x0, y0, x1, y1, b))
        dx, dy = x1 - x0, y1 - y0
        h = (1 - b * b) / (4 * b)  # from the chord's middle to the centre, in chords, to the left
        cx, cy = (x0 + x1) / 2 - dy * h, (y0 + y1) / 2 + dx * h
        a0 = np.arctan2(y0 - cy, x0 - cx)
        out.append(arc((cx, cy), np.hypot(x0 - cx, y0 - cy), a0, a0 + 4 * np.arctan(b)))
    return out


def filleted(corners):
    """A closed polygon (x, y, radius) with rounded corners, as a list of
    ('L', p, q) and ('A', centre, radius, degrees from, degrees to); 'to' < 'from' where the arc runs clockwise."""
    n, tangents = len(corners), []
    for i, (x, y, r) in enumerate(corners):
        (px, py, _), (qx, qy, _) = corners[i - 1], corners[(i + 1) % n]
        u = np.array([px - x, py - y]) / math.hypot(px - x, py - y)
        v = np.array([qx - x, qy - y]) / math.hypot(qx - x, qy - y)
        if r == 0:
            tangents.append(((x, y), (x, y), None))
            continue
        half = math.acos(max(-1.0, min(1.0, float(u @ v)))) / 2
        d = r / math.tan(half)
        m = (u + v) / np.linalg.norm(u + v)
        c = np.array([x, y]) + m * r / math.sin(half)
        p, q = np.array([x, y]) + u * d, np.array([x, y]) + v * d
        a0 = math.degrees(math.atan2(p[1] - c[1], p[0] - c[0]))
        turn = 180 - math.degrees(2 * half)
        sign = 1 if u[1] * v[0] - u[0] * v[1] > 0 else -1
        a0, c, p, q = (round(z, 12) + 0.0 if isinstance(z, float) else np.round(z, 12) + 0.0 for z in (a0, c, p, q))
        tangents.append((tuple(map(float, p)), tuple(map(float, q)), (tuple(map(float, c)), float(r), a0, a0 + sign * round(turn, 12))))
    out = []
    for i in range(n):
        if tangents[i][2]:
            out.append(("A",) + tangents[i][2])
        p, q = tangents[i][1], tangents[(i + 1) % n][0]
        if p != q:
            out.append(("L", p, q))
    return out


def seg_of(piece):
    return line(*piece[1:]) if piece[0] == "L" else arc_deg(*piece[1:])


def moved(loop, a, b=(0, 0)):
    return [s.moved(a, b) for s in loop]


def rotation(deg):
    t = LD(deg) * PI / 180
    return [[np.cos(t), -np.sin(t)], [np.sin(t), np.cos(t)]]


def _loop_integrals(loop, shift):
    total = np.zeros(7, LD)
    for s in loop:
        for t0, t1 in zip(s.breaks, s.breaks[1:]):
            if hasattr(s.f, "span"):
                s.f.span((t0 + t1) / 2)
            for i in range(_PARTS):
                lo, hi = t0 + (t1 - t0) * i / _PARTS, t0 + (t1 - t0) * (i + 1) / _PARTS
                h = (hi - lo) / 2
                x, y, u, v = s.at((lo + hi) / 2 + h * _NODES)
                x, y, w = x - LD(shift[0]), y - LD(shift[1]), _WEIGHTS * h
                total += np.array([
                    ((x * v - y * u) / 2 * w).sum(), (x * x * v / 2 * w).sum(), (-y * y * u / 2 * w).sum(),
                    (-y * y * y * u / 3 * w).sum(), (x * x * x * v / 3 * w).sum(),
                    ((x * x * y * v - x * y * y * u) / 4 * w).sum(), (np.hypot(u, v) * abs(w)).sum()])
    return total


def integrals(solids, holes=()):
    """Area, centroid, [Ix, Iy, Ixy] about it and perimeter of all solids less all holes."""
    for loop in list(solids) + list(holes):
        for s, t in zip(loop, loop[1:] + loop[:1]):
            p, q = s.end(1), t.end(0)
            size = max(1.0, abs(p[0]), abs(p[1]))
            assert math.hypot(p[0] - q[0], p[1] - q[1]) < 1e-9 * size, (p, q)
    first = solids[0][0].end(0)
    for _ in range(2):  # the second time about the centroid, so that no digits are lost
        total, perimeter = np.zeros(6, LD), LD(0)
        for loops, sign in ((solids, 1), (holes, -1)):
            for loop in loops:
                i = _loop_integrals(loop, first)
                total += sign * (i[:6] if i[0] > 0 else -i[:6])
                perimeter += i[6]
        a, cx, cy = total[0], total[1] / total[0], total[2] / total[0]
        centroid = (LD(first[0]) + cx, LD(first[1]) + cy)
        first = tuple(map(float, centroid))
    return (float(a), [float(c) for c in centroid],
            [float(total[3] - a * cy * cy), float(total[4] - a * cx * cx), float(total[5] - a * cx * cy)], float(perimeter))
