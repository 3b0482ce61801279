"""Compiled models of the other families: step, line and centre-surround.

gd1 is the first derivative of an oriented Gaussian (a step), gd2 the second (a line),
centre_surround the difference of two round Gaussians. The formulas belong to
:mod:`patchlab.families`; here they are evaluated together with their derivatives.
"""

from __future__ import annotations

import math

from patchlab._jit import jit
from patchlab.conventions import Array


@jit
def gd_model(order: int, p: Array, r: Array, value: Array, jac: Array) -> None:
    """Evaluate a Gaussian derivative of order 1 or 2 and its derivatives by parameter.

    Parameters
    ----------
    order : 1 (step) or 2 (line)
    p : ndarray (6,), parameters in the order of ``families.PARAMETERS``
    r : ndarray (size,), pixel coordinates about the window's middle
    value : ndarray (size * size,), overwritten
    jac : ndarray (6, size * size) or more rows, the first 6 overwritten with d value / d p
    """
    cos, sin = math.cos(p[3]), math.sin(p[3])
    su, sv = p[4], p[5]
    size = r.shape[0]
    for i in range(size):
        dy = r[i] - p[2]
        for j in range(size):
            dx = r[j] - p[1]
            u, v = dx * cos + dy * sin, dy * cos - dx * sin
            zu, zv = u / su, v / sv
            e = math.exp(-0.5 * (zu * zu + zv * zv))
            # shape h(zu) and its slope: z and 1 for the step, 1 - z^2 and -2 z for the line
            if order == 1:
                h, slope = zu, 1.0
            else:
                h, slope = 1.0 - zu * zu, -2.0 * zu
            m = p[0] * e * h
            by_zu = p[0] * e * (slope - zu * h)
            by_u, by_v = by_zu / su, -m * zv / sv
            n = i * size + j
            value[n] = m
            jac[0, n] = e * h
            jac[1, n] = sin * by_v - cos * by_u
            jac[2, n] = -sin * by_u - cos * by_v
            jac[3, n] = v * by_u - u * by_v
            jac[4, n] = -by_zu * zu / su
            jac[5, n] = m * zv * zv / sv


@jit
def centre_surround_model(p: Array, r: Array, value: Array, jac: Array) -> None:
    """Evaluate a centre-surround kernel and its derivatives by parameter.

    Parameters
    ----------
    p : ndarray (6,), parameters in the order of ``families.PARAMETERS``
    r : ndarray (size,), pixel coordinates about the window's middle
    value : ndarray (size * size,), overwritten
    jac : ndarray (6, size * size) or more rows, the first 6 overwritten with d value / d p
    """
    a, s, t, ratio = p[0], p[3], p[4], p[5]
    share = (s / t) * (s / t)
    size = r.shape[0]
    for i in range(size):
        dy = r[i] - p[2]
        for j in range(size):
            dx = r[j] - p[1]
            r2 = dx * dx + dy * dy
            centre = math.exp(-r2 / (2.0 * s * s))
            wide = share * math.exp(-r2 / (2.0 * t * t))
            pull = a * (centre / (s * s) - ratio * wide / (t * t))
            n = i * size + j
            value[n] = a * (centre - ratio * wide)
            jac[0, n] = centre - ratio * wide
            jac[1, n] = pull * dx
            jac[2, n] = pull * dy
            jac[3, n] = a * (centre * r2 / (s * s * s) - 2.0 * ratio * wide / s)
            jac[4, n] = a * ratio * wide * (2.0 / t - r2 / (t * t * t))
            jac[5, n] = -a * wide
