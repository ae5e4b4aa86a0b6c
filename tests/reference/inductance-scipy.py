"""Inductances from their defining integrals by scipy.integrate, and elliptic integrals by scipy.special, as JSON.

The inputs come as JSON on standard input; nothing here is shared with the code under test.
"""

import json
import sys

import numpy as np
from scipy.integrate import quad
from scipy.special import ellipe, ellipk

PER_FOUR_PI = 1e-7
TIGHT = {"epsabs": 0, "epsrel": 1e-11, "limit": 400}


def neumann(segment_a, segment_b):
    """Double integral of cos / R, both by adaptive quadrature; broken beside the other segment's ends."""
    a0, a1 = (np.array(p, float) for p in segment_a)
    b0, b1 = (np.array(p, float) for p in segment_b)
    cosine = (a1 - a0) @ (b1 - b0)
    if cosine == 0:
        return 0.0

    def beside(point, start, end):
        at = ((point - start) @ (end - start)) / ((end - start) @ (end - start))
        return [at] if 0 < at < 1 else None

    def inner(s):
        point = a0 + s * (a1 - a0)
        return quad(
            lambda t: 1 / np.sqrt(((point - b0 - t * (b1 - b0)) ** 2).sum()),
            0, 1, points=beside(point, b0, b1), **TIGHT,
        )[0]

    breaks = [p for end in (b0, b1) for p in beside(end, a0, a1) or []]
    return PER_FOUR_PI * cosine * quad(inner, 0, 1, points=breaks or None, epsabs=0, epsrel=1e-9, limit=200)[0]


def polygon(corners, apart):
    """A loop and its copy, displaced normal to its plane."""
    lower = [[x, y, 0] for x, y in corners]
    upper = [[x, y, apart] for x, y in corners]
    sides = lambda points: list(zip(points, points[1:] + points[:1]))
    return sum(neumann(a, b) for a in sides(lower) for b in sides(upper))


def circles(a, b, z):
    """The angle integral, once integrated by parts, so that nothing cancels for circles far apart."""
    f = lambda p: a * b * np.sin(p) ** 2 / (a * a + b * b + z * z - 2 * a * b * np.cos(p)) ** 1.5
    return 4 * np.pi * PER_FOUR_PI * a * b * quad(f, 0, np.pi, **TIGHT)[0]


def filaments(length, distance):
    f = lambda x: (length - x) / np.hypot(x, distance)
    return 2 * PER_FOUR_PI * quad(f, 0, length, points=[min(distance, length / 2)], epsabs=0, epsrel=1e-9, limit=200)[0]


def tube(length, radius):
    f = lambda p: filaments(length, 2 * radius * np.sin(p / 2))
    return quad(f, 0, np.pi, epsabs=0, epsrel=1e-9, limit=200)[0] / np.pi


def bar(width, thickness, length):
    """Mean of the filaments over the distances of two points of the section."""
    def row(x):
        f = lambda y: (thickness - y) * filaments(length, np.hypot(x, y))
        return (width - x) * quad(f, 0, thickness, epsabs=0, epsrel=1e-7, limit=100)[0]
    return 4 / (width * thickness) ** 2 * quad(row, 0, width, epsabs=0, epsrel=1e-6, limit=100)[0]


wanted = json.load(sys.stdin)
json.dump(
    {
        "elliptic": [[ellipk(k * k), ellipe(k * k)] for k in wanted["moduli"]],
        "segments": [neumann(a, b) for a, b in wanted["segments"]],
        "polygon": polygon(**wanted["polygon"]),
        "circles": [circles(*c) for c in wanted["circles"]],
        "tubes": [tube(*t) for t in wanted["tubes"]],
        "bar": bar(*wanted["bar"]),
    },
    sys.stdout,
)
