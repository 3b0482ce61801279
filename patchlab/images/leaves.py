"""Shapes that lie in a made scene: outlines by formula, coverage by area.

A shape answers three questions: how much of a small square it covers, whether
it covers a point, and where its outline runs. Outlines are analytic, so the true
position of every edge is known far better than any detector can find it.
Geometry is x right, y down; normals point out of the shape.
"""

from __future__ import annotations

import math
from dataclasses import dataclass
from typing import NamedTuple, Protocol

import numpy as np

from patchlab.types import F64


class Outline(NamedTuple):
    """Samples along a closed outline, in order.

    ``x``, ``y`` position, ``nx``, ``ny`` outward unit normal, ``curvature`` 1/px, positive
    where the shape is convex; all ndarray (n,).
    """

    x: F64
    y: F64
    nx: F64
    ny: F64
    curvature: F64


class Shape(Protocol):
    """What the scene maker asks of a shape."""

    @property
    def centre(self) -> tuple[float, float]:
        """A point to measure shading from, (x, y)."""

    @property
    def bounds(self) -> tuple[float, float, float, float]:
        """Box around it: left, top, right, bottom."""

    @property
    def width(self) -> float:
        """Width of a line, pixels; 0 for a shape with an inside."""

    @property
    def corners(self) -> F64:
        """Corner points (n, 2)."""

    def reach(self, x: F64, y: F64) -> F64:
        """0 at the middle, 1 on the outline, larger outside."""

    def distance(self, x: F64, y: F64) -> F64:
        """Signed distance to the outline, pixels, positive outside; exact to second order."""

    def coverage(self, x: F64, y: F64, side: float) -> F64:
        """Share of a square of that side, centred at (x, y), that the shape covers."""

    def outline(self, step: float) -> Outline:
        """The outline sampled about every ``step`` pixels."""


def half_plane(distance: F64, nx: F64, ny: F64, side: float) -> F64:
    """Share of a square that lies behind a straight line.

    Parameters
    ----------
    distance : signed distance of the line from the square's centre, negative when behind
    nx, ny : the line's unit normal
    side : of the square, pixels

    Returns
    -------
    ndarray in [0, 1]. A line's distance over a square spreads like the sum of two uniform
    variables of widths ``|nx|`` and ``|ny|``; this is the distribution of that sum.
    """
    covered = (distance < 0).astype(np.float64)
    near = np.abs(distance) < 0.75 * side  # half a diagonal is 0.71
    across = np.broadcast_to(np.abs(nx), distance.shape)[near]
    down = np.broadcast_to(np.abs(ny), distance.shape)[near]
    a, b = np.maximum(across, down), np.maximum(np.minimum(across, down), 1e-9)
    t = -distance[near] / side

    def ramp(value: F64) -> F64:
        return np.maximum(value, 0.0) ** 2

    mid, flank = (a + b) / 2, (a - b) / 2
    area = ramp(t + mid) - ramp(t + flank) - ramp(t - flank) + ramp(t - mid)
    upright = t / a + 0.5  # where b is too small to divide by, and too small to matter
    covered[near] = np.clip(np.where(b > 1e-6, area / (2 * a * b), upright), 0.0, 1.0)
    return covered


@dataclass(frozen=True)
class Blob:
    """An ellipse whose radius may swell and shrink along the way: a disk, a pebble.

    Parameters
    ----------
    x, y : centre, pixels
    a, b : half axes, pixels
    angle : of the first axis, from +x towards +y, radians
    bumps : (order from 1 up, amplitude, phase) of each swelling; the unit circle's radius becomes
        ``1 + sum amplitude cos(order phi + phase)``
    """

    x: float
    y: float
    a: float
    b: float
    angle: float = 0.0
    bumps: tuple[tuple[int, float, float], ...] = ()

    @property
    def centre(self) -> tuple[float, float]:
        """Centre (x, y)."""
        return self.x, self.y

    @property
    def width(self) -> float:
        """Always 0: a blob has an inside."""
        return 0.0

    @property
    def corners(self) -> F64:
        """None at all."""
        return np.zeros((0, 2))

    @property
    def bounds(self) -> tuple[float, float, float, float]:
        """Box around the largest swelling."""
        swell = 1 + sum(abs(e) for _, e, _ in self.bumps)
        cos, sin = math.cos(self.angle), math.sin(self.angle)
        rx = swell * math.hypot(self.a * cos, self.b * sin)
        ry = swell * math.hypot(self.a * sin, self.b * cos)
        return self.x - rx, self.y - ry, self.x + rx, self.y + ry

    def _unit(self, x: F64, y: F64) -> tuple[F64, F64, F64]:
        cos, sin = math.cos(self.angle), math.sin(self.angle)
        u = ((x - self.x) * cos + (y - self.y) * sin) / self.a
        v = ((y - self.y) * cos - (x - self.x) * sin) / self.b
        return u, v, np.maximum(np.sqrt(u * u + v * v), 1e-9)

    def _radius(self, cos: F64, sin: F64) -> tuple[F64, F64]:
        """The unit circle's swollen radius towards (cos, sin), and its rate by angle."""
        radius, rate = np.ones_like(cos), np.zeros_like(cos)
        order, c, s = 1, cos, sin
        for k, amplitude, phase in sorted(self.bumps):
            while order < k:  # cos and sin of the next multiple, without a libm call
                c, s, order = c * cos - s * sin, s * cos + c * sin, order + 1
            p, q = amplitude * math.cos(phase), amplitude * math.sin(phase)
            radius += p * c - q * s
            rate -= k * (p * s + q * c)
        return radius, rate

    def reach(self, x: F64, y: F64) -> F64:
        """Radius over the outline's radius in the same direction."""
        u, v, rho = self._unit(x, y)
        return rho / self._radius(u / rho, v / rho)[0] if self.bumps else rho

    def _field(self, x: F64, y: F64) -> tuple[F64, F64, F64]:
        """Signed distance to first order, ``f / |grad f|``, and the gradient's direction."""
        u, v, rho = self._unit(x, y)
        fu, fv, f = u / rho, v / rho, rho - 1.0
        if self.bumps:
            radius, rate = self._radius(fu, fv)
            f = rho - radius
            fu, fv = fu + rate * v / rho**2, fv - rate * u / rho**2
        cos, sin = math.cos(self.angle), math.sin(self.angle)
        fu, fv = fu / self.a, fv / self.b
        gx, gy = fu * cos - fv * sin, fu * sin + fv * cos
        norm = np.maximum(np.sqrt(gx * gx + gy * gy), 1e-12)  # 0 in the very middle
        return f / norm, gx / norm, gy / norm

    def distance(self, x: F64, y: F64) -> F64:
        """Signed distance to the outline."""
        return self._field(x, y)[0]

    def coverage(self, x: F64, y: F64, side: float) -> F64:
        """Covered share of a square: the outline is straight over so small a side."""
        return half_plane(*self._field(x, y), side)

    def _points(self, phi: F64) -> tuple[F64, F64]:
        u, v = np.cos(phi), np.sin(phi)
        radius = self._radius(u, v)[0]
        u, v = self.a * radius * u, self.b * radius * v
        cos, sin = math.cos(self.angle), math.sin(self.angle)
        return self.x + u * cos - v * sin, self.y + u * sin + v * cos

    def outline(self, step: float) -> Outline:
        """Samples at equal arc length."""
        around = max(64, math.ceil(16 * math.pi * max(self.a, self.b) / step))
        phi = 2 * np.pi * np.arange(around + 1) / around
        x, y = self._points(phi)
        length = np.concatenate([[0.0], np.cumsum(np.hypot(np.diff(x), np.diff(y)))])
        count = max(12, math.ceil(length[-1] / step))
        at = np.interp(np.arange(count) * length[-1] / count, length, phi)
        x, y = self._points(at)
        _, nx, ny = self._field(x, y)
        turn = np.roll(nx, 1) * np.roll(ny, -1) - np.roll(ny, 1) * np.roll(nx, -1)
        return Outline(x, y, nx, ny, np.arcsin(turn) * count / (2 * length[-1]))


@dataclass(frozen=True)
class Polygon:
    """A convex polygon, its points clockwise as seen (x right, y down).

    ``line`` is the width when the polygon is a thin line, else 0.
    """

    points: tuple[tuple[float, float], ...]
    line: float = 0.0

    @classmethod
    def box(cls, x: float, y: float, w: float, h: float, angle: float = 0.0) -> Polygon:
        """A rectangle about (x, y), turned by ``angle`` from +x towards +y."""
        cos, sin = math.cos(angle), math.sin(angle)
        corners = ((-w, -h), (w, -h), (w, h), (-w, h))
        return cls(
            tuple((x + (u * cos - v * sin) / 2, y + (u * sin + v * cos) / 2) for u, v in corners)
        )

    @classmethod
    def strip(cls, x0: float, y0: float, x1: float, y1: float, width: float) -> Polygon:
        """A thin line from one point to another."""
        length, angle = math.hypot(x1 - x0, y1 - y0), math.atan2(y1 - y0, x1 - x0)
        body = cls.box((x0 + x1) / 2, (y0 + y1) / 2, length, width, angle)
        return cls(body.points, width)

    @classmethod
    def regular(cls, x: float, y: float, r: float, sides: int, angle: float = 0.0) -> Polygon:
        """A regular polygon with its corners on a circle of radius r."""
        turns = [angle + 2 * math.pi * k / sides for k in range(sides)]
        return cls(tuple((x + r * math.cos(t), y + r * math.sin(t)) for t in turns))

    @property
    def centre(self) -> tuple[float, float]:
        """Mean of the corners."""
        x, y = self.corners.mean(axis=0)
        return float(x), float(y)

    @property
    def width(self) -> float:
        """Width of a thin line, else 0."""
        return self.line

    @property
    def corners(self) -> F64:
        """Corner points (n, 2)."""
        return np.array(self.points)

    @property
    def bounds(self) -> tuple[float, float, float, float]:
        """Box around the corners."""
        (left, top), (right, bottom) = self.corners.min(axis=0), self.corners.max(axis=0)
        return float(left), float(top), float(right), float(bottom)

    def _sides(self) -> list[tuple[float, float, float]]:
        """(nx, ny, offset) of each side: outside where ``nx x + ny y > offset``."""
        sides = []
        for (x0, y0), (x1, y1) in zip(self.points, (*self.points[1:], self.points[0]), strict=True):
            length = math.hypot(x1 - x0, y1 - y0)
            nx, ny = (y1 - y0) / length, (x0 - x1) / length
            sides.append((nx, ny, nx * x0 + ny * y0))
        return sides

    def reach(self, x: F64, y: F64) -> F64:
        """Largest distance in units of the sides' own distances from the centre."""
        cx, cy = self.centre
        parts = [
            (nx * (x - cx) + ny * (y - cy)) / (c - nx * cx - ny * cy) for nx, ny, c in self._sides()
        ]
        return np.asarray(np.maximum.reduce(parts))

    def distance(self, x: F64, y: F64) -> F64:
        """Signed distance to the nearest side's line."""
        return np.asarray(np.maximum.reduce([nx * x + ny * y - c for nx, ny, c in self._sides()]))

    def coverage(self, x: F64, y: F64, side: float) -> F64:
        """Covered share of a square: exact but where a corner lies in it."""
        lost = np.zeros(np.broadcast_shapes(x.shape, y.shape))
        for nx, ny, c in self._sides():
            d = nx * x + ny * y - c
            lost += 1.0 - half_plane(d, np.array(nx), np.array(ny), side)
        return np.maximum(1.0 - lost, 0.0)

    def outline(self, step: float) -> Outline:
        """Samples inside every side, never on a corner."""
        runs = []
        ends = (*self.points[1:], self.points[0])
        for (x0, y0), (x1, y1), (nx, ny, _) in zip(self.points, ends, self._sides(), strict=True):
            count = max(1, math.ceil(math.hypot(x1 - x0, y1 - y0) / step))
            t = (np.arange(count) + 0.5) / count
            one = np.ones(count)
            runs.append((x0 + t * (x1 - x0), y0 + t * (y1 - y0), nx * one, ny * one, 0 * one))
        return Outline(*(np.concatenate(column) for column in zip(*runs, strict=True)))
