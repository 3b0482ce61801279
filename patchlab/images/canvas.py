"""A scene on its fine grid: leaves painted over one another, and the truth about it.

Painting goes back to front with exact area coverage on cells of a quarter of a
pixel. The true edges come from the shapes' formulas, not from the painted cells;
those only say which leaves meet where.
"""

from __future__ import annotations

import math
from dataclasses import dataclass, field

import numpy as np
from numpy.typing import NDArray

from patchlab.conventions import rng
from patchlab.images.leaves import Shape
from patchlab.types import F64

TRUE_EDGE = np.dtype(
    [
        ("x", "f8"), ("y", "f8"),  # position, pixels
        ("theta", "f8"),  # normal direction towards the brighter side, radians, [-pi, pi)
        ("contrast", "f8"),  # bright side less dark side, electrons, before blur
        ("dark", "f8"),  # level of the dark side, electrons
        ("curvature", "f8"),  # 1/pixel, positive when the edge bends round its bright side
        ("width", "f8"),  # of the thin line it belongs to, pixels; 0 for a step
        ("leaf", "i4"),  # which leaf's outline it lies on
    ]
)  # fmt: skip
"""One sample of a true edge: visible, about a quarter of a pixel from the next."""

JUNCTION = np.dtype([("x", "f8"), ("y", "f8"), ("corner", "?")])
"""Where an outline turns (corner) or goes under another leaf (a T-junction)."""

SUPER = 4  # cells per pixel along each axis
_STEP = 0.25  # pixels between samples of a true edge


@dataclass(frozen=True)
class Paint:
    """How bright a leaf is from place to place.

    Parameters
    ----------
    tone : reflectance, 0 to 1
    slope_x, slope_y : relative change per pixel from the centre
    bulge : how much darker the rim is than the middle, 0 to 1
    grain : standard deviation of the texture, relative
    grain_px : size of its smallest features, pixels
    offset : where on the scene's grain it lies
    """

    tone: float
    slope_x: float = 0.0
    slope_y: float = 0.0
    bulge: float = 0.0
    grain: float = 0.0
    grain_px: float = 2.0
    offset: tuple[float, float] = (0.0, 0.0)

    def value(self, shape: Shape | None, x: F64, y: F64, grain: F64) -> F64:
        """Reflectance at points; ``shape`` None is the background."""
        cx, cy = shape.centre if shape else (0.0, 0.0)
        tone = self.tone * (1 + self.slope_x * (x - cx) + self.slope_y * (y - cy))
        if self.bulge and shape:
            tone = tone * (1 - self.bulge * np.minimum(shape.reach(x, y), 1.0) ** 2)
        if self.grain:
            u, v = x / self.grain_px + self.offset[0], y / self.grain_px + self.offset[1]
            tone = tone * (1 + self.grain * _bilinear(grain, u, v))
        return np.clip(tone, 0.01, 1.0)


@dataclass(frozen=True)
class Leaf:
    """A painted shape. ``shadow`` darkens what lies beneath by that share, fading over
    ``shadow_px`` beyond the outline."""

    shape: Shape
    paint: Paint
    shadow: float = 0.0
    shadow_px: float = 4.0


@dataclass(frozen=True)
class Scene:
    """Leaves from back to front on a background.

    ``shape`` is (height, width); ``seed`` makes the grain that every texture is cut from.
    """

    shape: tuple[int, int]
    leaves: tuple[Leaf, ...]
    background: Paint = field(default_factory=lambda: Paint(0.5))
    seed: int = 0


# ---------------------------------------------------------------- grain


def grain_tile(seed: int) -> F64:
    """A tile of texture, (256, 256), mean 0, standard deviation 1, features of several sizes."""
    total = np.zeros((256, 256))
    draw = rng(seed, "grain")
    for size in (1, 3, 9):
        noise = draw.integers(-128, 128, (256, 256)).astype(np.float64)
        for axis in (0, 1, 0, 1):  # sums of whole numbers: the same bits everywhere
            noise = sum((np.roll(noise, k, axis) for k in range(size)), np.zeros_like(noise))
        total += noise / noise.std()
    total -= total.mean()
    return np.asarray(np.clip(total / total.std(), -2.5, 2.5))


def _bilinear(tile: F64, u: F64, v: F64) -> F64:
    u, v = np.broadcast_arrays(u, v)
    i, j = np.floor(u).astype(np.int64), np.floor(v).astype(np.int64)
    fu, fv = u - i, v - j
    i0, i1, j0, j1 = i & 255, (i + 1) & 255, j & 255, (j + 1) & 255
    upper = tile[j0, i0] * (1 - fu) + tile[j0, i1] * fu
    lower = tile[j1, i0] * (1 - fu) + tile[j1, i1] * fu
    return np.asarray(upper * (1 - fv) + lower * fv)


# ---------------------------------------------------------------- painting


@dataclass(frozen=True, eq=False)
class Canvas:
    """The fine grid: brightness, who lies on top (0: background), the shadow upon it."""

    margin: int
    level: F64
    label: NDArray[np.int32]
    shade: F64

    def place(self, index: NDArray[np.int64]) -> F64:
        """Coordinate in pixels of cell indices."""
        return np.asarray((index + 0.5) / SUPER - 0.5 - self.margin)

    def cell(self, position: F64) -> NDArray[np.int64]:
        """Cell index of coordinates in pixels."""
        return np.floor((position + 0.5 + self.margin) * SUPER).astype(np.int64)


_Window = tuple[slice, slice]


def paint(scene: Scene, margin: int, grain: F64) -> Canvas:
    """Paint a scene, and ``margin`` pixels around its view, on the fine grid."""
    height, width = ((side + 2 * margin) * SUPER for side in scene.shape)
    canvas = Canvas(
        margin,
        np.empty((height, width)),
        np.zeros((height, width), np.int32),
        np.ones((height, width)),
    )
    x, y = canvas.place(np.arange(width))[None], canvas.place(np.arange(height))[:, None]
    canvas.level[...] = scene.background.value(None, x, y, grain)
    windows = _windows(scene, margin)
    for number, (leaf, window) in enumerate(zip(scene.leaves, windows, strict=True), 1):
        if window is not None:
            _lay(canvas, number, leaf, window, grain)
    return canvas


def _windows(scene: Scene, margin: int) -> list[_Window | None]:
    """Which (rows, columns) of pixels, margin included, show each leaf at all.

    Found from front to back, so that what lies hidden is never painted.
    """
    height, width = (side + 2 * margin for side in scene.shape)
    covered = np.zeros((height, width), dtype=bool)
    windows: list[_Window | None] = []
    for leaf in reversed(scene.leaves):
        left, top, right, bottom = leaf.shape.bounds
        reach = 3 * leaf.shadow_px if leaf.shadow else 0.0
        rows = _range(top - reach + margin, bottom + reach + margin, height)
        cols = _range(left - reach + margin, right + reach + margin, width)
        part = covered[rows, cols]
        open_rows, open_cols = np.flatnonzero(~part.all(axis=1)), np.flatnonzero(~part.all(axis=0))
        if not len(open_rows):
            windows.append(None)
            continue
        windows.append((_narrow(rows, open_rows), _narrow(cols, open_cols)))
        x = np.arange(cols.start, cols.stop)[None] - float(margin)
        y = np.arange(rows.start, rows.stop)[:, None] - float(margin)
        part |= leaf.shape.distance(x, y) < -1.0  # the whole pixel, with room to spare
    return windows[::-1]


def _range(first: float, last: float, size: int) -> slice:
    return slice(min(max(math.floor(first), 0), size), min(max(math.ceil(last) + 1, 0), size))


def _narrow(span: slice, used: NDArray[np.int64]) -> slice:
    return slice(span.start + int(used[0]), span.start + int(used[-1]) + 1)


def _lay(canvas: Canvas, number: int, leaf: Leaf, window: _Window, grain: F64) -> None:
    """Paint one leaf, and the shadow it throws, over what lies behind."""
    rows, cols = (slice(w.start * SUPER, w.stop * SUPER) for w in window)
    x = canvas.place(np.arange(cols.start, cols.stop))[None]
    y = canvas.place(np.arange(rows.start, rows.stop))[:, None]
    level, shade = canvas.level[rows, cols], canvas.shade[rows, cols]
    if leaf.shadow:
        gap = np.maximum(leaf.shape.distance(x, y) / leaf.shadow_px, 0.0)
        dimmed = 1 - leaf.shadow / (1 + gap * gap) ** 2
        level *= dimmed
        shade *= dimmed
    share = leaf.shape.coverage(x, y, 1 / SUPER)
    level += (leaf.paint.value(leaf.shape, x, y, grain) - level) * share
    shade += (1 - shade) * share
    canvas.label[rows, cols][share >= 0.5] = number


def blur(fine: F64, sigma: float, margin: int) -> F64:
    """Gaussian blur, sampled at the pixel centres of the view.

    A cell is already a box, so its variance is taken off the Gaussian's: the point spread has
    ``sigma`` in all. Pixel centres lie between cells, hence an even number of taps.
    """
    spread = math.sqrt((sigma * SUPER) ** 2 - 1 / 12)
    half = math.ceil(4.5 * spread)
    at = np.arange(-half, half) + 0.5
    taps = np.exp(-(at**2) / (2 * spread**2))
    taps /= taps.sum()
    for _ in range(2):
        size = fine.shape[0] // SUPER - 2 * margin
        first = margin * SUPER + SUPER // 2 - half
        rows = [fine[first + k : first + k + size * SUPER : SUPER] for k in range(2 * half)]
        fine = sum((t * r for t, r in zip(taps, rows, strict=True)), np.zeros_like(rows[0])).T
    return np.ascontiguousarray(fine)


# ---------------------------------------------------------------- truth


def truth(
    scene: Scene, canvas: Canvas, grain: F64, light: float
) -> tuple[NDArray[np.void], NDArray[np.void]]:
    """True edges and junctions of a painted scene; ``light`` turns reflectance to electrons."""
    edges, junctions = [], []
    for number in np.unique(canvas.label):
        if number:
            found, ends = _visible(scene, canvas, int(number), grain, light)
            edges.append(found)
            junctions.append(ends)
    if not edges:
        return np.zeros(0, TRUE_EDGE), np.zeros(0, JUNCTION)
    return np.concatenate(edges), np.concatenate(junctions)


def _visible(
    scene: Scene, canvas: Canvas, number: int, grain: F64, light: float
) -> tuple[NDArray[np.void], NDArray[np.void]]:
    """True edges and junctions on one leaf's outline."""
    shape = scene.leaves[number - 1].shape
    line = shape.outline(_STEP)
    seen = _uncovered(scene, canvas, number, line.x, line.y)
    pairs = np.flatnonzero(seen != np.roll(seen, -1))
    after = (pairs + 1) % len(seen)
    near = np.hypot(line.x[pairs] - line.x[after], line.y[pairs] - line.y[after]) < 2 * _STEP
    ends = [
        (line.x[[i, j]].mean(), line.y[[i, j]].mean(), False)
        for i, j in zip(pairs[near], after[near], strict=True)
    ]
    corners = shape.corners
    open_corner = _uncovered(scene, canvas, number, corners[:, 0], corners[:, 1])
    ends += [(x, y, True) for x, y in corners[open_corner]]
    junctions = np.array([e for e in ends if _inside(scene, *e[:2])], dtype=JUNCTION)

    view = seen & _inside(scene, line.x, line.y)
    x, y, nx, ny, curvature = (column[view] for column in line)
    inner = _level(scene, canvas, np.full(len(x), number), x, y, -nx, -ny, grain)
    outside = canvas.label[_cells(canvas, x, y, nx, ny)]
    outer = _level(scene, canvas, outside, x, y, nx, ny, grain)
    sign = np.where(inner > outer, -1.0, 1.0)  # towards the brighter side
    found = np.zeros(len(x), TRUE_EDGE)
    found["x"], found["y"] = x, y
    found["theta"] = np.arctan2(sign * ny, sign * nx)
    found["theta"][found["theta"] >= np.pi] = -np.pi
    found["contrast"] = light * np.abs(inner - outer)
    found["dark"] = light * np.minimum(inner, outer)
    found["curvature"] = -sign * curvature
    found["width"], found["leaf"] = shape.width, number
    return found[outside != number], junctions


def _inside(scene: Scene, x: F64, y: F64) -> NDArray[np.bool_]:
    height, width = scene.shape
    return (x >= -0.5) & (x < width - 0.5) & (y >= -0.5) & (y < height - 0.5)


def _cells(
    canvas: Canvas, x: F64, y: F64, nx: F64 | float = 0.0, ny: F64 | float = 0.0
) -> tuple[NDArray[np.int64], NDArray[np.int64]]:
    """(rows, columns) of the cells one and a half cells along the normal: wholly on one side."""
    away = 1.5 / SUPER
    rows, cols = canvas.cell(y + away * ny), canvas.cell(x + away * nx)
    height, width = canvas.label.shape
    return np.clip(rows, 0, height - 1), np.clip(cols, 0, width - 1)


def _uncovered(scene: Scene, canvas: Canvas, number: int, x: F64, y: F64) -> NDArray[np.bool_]:
    """Which points of a leaf no leaf in front of it covers, by the leaves' formulas.

    Only leaves on top in a cell at or beside the point can be the ones that cover it.
    """
    rows, cols = _cells(canvas, x, y)
    height, width = canvas.label.shape
    steps = (-1, 0, 1)
    around = np.stack(
        [
            canvas.label[np.clip(rows + j, 0, height - 1), np.clip(cols + i, 0, width - 1)]
            for j in steps
            for i in steps
        ]
    )
    seen = np.ones(len(x), dtype=bool)
    for front in np.unique(around[around > number]):
        at = np.flatnonzero((around == front).any(axis=0))
        seen[at] &= scene.leaves[front - 1].shape.distance(x[at], y[at]) > 0
    return seen


def _level(
    scene: Scene,
    canvas: Canvas,
    labels: NDArray[np.int64] | NDArray[np.int32],
    x: F64,
    y: F64,
    nx: F64,
    ny: F64,
    grain: F64,
) -> F64:
    """Brightness at outline points of the leaves that lie on one side of it."""
    level = np.empty(len(x))
    for number in np.unique(labels):
        at = labels == number
        leaf = scene.leaves[number - 1] if number else None
        paint = leaf.paint if leaf else scene.background
        level[at] = paint.value(leaf.shape if leaf else None, x[at], y[at], grain)
    return level * canvas.shade[_cells(canvas, x, y, nx, ny)]
