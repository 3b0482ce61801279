"""The sample frames: an invented camera at an invented place.

Camera "Ombrel K2" looks at the "Tessary tile works, Port Hallan". Neither exists.
Six kinds of view at four light levels: glazed walls, hexagon floors, pebble beds,
stacks of tiles, benches with dishes, yards where everything lies about.
"""

from __future__ import annotations

import math
from collections.abc import Callable, Iterator
from pathlib import Path

import numpy as np

from patchlab.conventions import rng
from patchlab.images.canvas import Leaf, Paint, Scene
from patchlab.images.formats import png_bytes
from patchlab.images.leaves import Blob, Polygon, Shape
from patchlab.images.scenes import Camera, Rendered, expose, mixed, radii
from patchlab.progress import Progress, silent
from patchlab.store import write_file

OMBREL_K2 = Camera(gain=0.25, full_well=1040.0, read_noise=3.0)
SHAPE = (360, 480)
LIGHTS = (1000.0, 800.0, 600.0, 400.0)
"""Electrons that a white surface gives, one light level after another."""

Draw = np.random.Generator
Leaves = Iterator[Leaf]


def _uniform(draw: Draw, low: float, high: float) -> float:
    return low + (high - low) * float(draw.random())


def _coat(draw: Draw, tone: float, r: float, *, bulge: float = 0.0, grain: float = 0.03) -> Paint:
    """A surface lit a little from one side, with a fine grain."""
    turn, tilt = _uniform(draw, 0, 2 * math.pi), _uniform(draw, 0.0, 0.14) / max(r, 4.0)
    offset = (_uniform(draw, 0, 256), _uniform(draw, 0, 256))
    size = _uniform(draw, 1.4, 3.5)
    return Paint(tone, tilt * math.cos(turn), tilt * math.sin(turn), bulge, grain, size, offset)


def _turned(x: float, y: float, angle: float) -> tuple[float, float]:
    """A place on a lattice about the picture's middle, turned by an angle."""
    cos, sin = math.cos(angle), math.sin(angle)
    return SHAPE[1] / 2 + x * cos - y * sin, SHAPE[0] / 2 + x * sin + y * cos


# ---------------------------------------------------------------- what lies in the views


def _tiles(draw: Draw) -> Leaves:
    """Glazed tiles in rows, some with an inlay, mortar between them."""
    pitch, joint = _uniform(draw, 46, 84), _uniform(draw, 2.0, 5.5)
    angle, aspect = _uniform(draw, -0.5, 0.5), (1.0, 1.0, 2.0)[int(draw.integers(3))]
    bond = 0.5 if aspect == 2.0 else 0.0
    base, spread = _uniform(draw, 0.4, 0.8), _uniform(draw, 0.05, 0.25)
    reach = math.ceil(320 / pitch)
    for row in range(-reach, reach + 1):
        for col in range(-reach, reach + 1):
            x, y = _turned((col + bond * (row % 2)) * pitch * aspect, row * pitch, angle)
            size = pitch * aspect
            if not (-size < x < SHAPE[1] + size and -size < y < SHAPE[0] + size):
                continue
            tone = float(np.clip(base + spread * draw.standard_normal(), 0.1, 0.97))
            body = Polygon.box(x, y, pitch * aspect - joint, pitch - joint, angle)
            yield Leaf(body, _coat(draw, tone, pitch), 0.25, 1.5)
            if draw.random() < 0.4:
                yield from _inlay(draw, x, y, 0.36 * pitch, angle, tone)


def _inlay(draw: Draw, x: float, y: float, r: float, angle: float, tone: float) -> Leaves:
    other = tone - 0.3 if tone > 0.5 else tone + 0.35
    shapes: list[Shape] = [
        Blob(x, y, r, r),
        Polygon.regular(x, y, r, 4, angle),
        Polygon.regular(x, y, r, 6, angle),
        Polygon.box(x, y, 1.9 * r, 0.35 * r, angle + math.pi / 4),
    ]
    kind = int(draw.integers(len(shapes)))
    yield Leaf(shapes[kind], _coat(draw, other, r))
    if kind < 2:
        yield Leaf(Blob(x, y, 0.62 * r, 0.62 * r), _coat(draw, tone, r))


def _hexagons(draw: Draw) -> Leaves:
    """A floor of hexagons."""
    r, joint = _uniform(draw, 20, 40), _uniform(draw, 1.2, 3.0)
    angle = _uniform(draw, 0, math.pi / 3)
    tones = [_uniform(draw, 0.2, 0.4), _uniform(draw, 0.5, 0.65), _uniform(draw, 0.75, 0.95)]
    wide, high = math.sqrt(3) * r, 1.5 * r
    reach = math.ceil(320 / high)
    for row in range(-reach, reach + 1):
        for col in range(-reach, reach + 1):
            x, y = _turned((col + 0.5 * (row % 2)) * wide, row * high, angle)
            if -r < x < SHAPE[1] + r and -r < y < SHAPE[0] + r:
                tone = tones[int(draw.integers(3))] * _uniform(draw, 0.92, 1.05)
                body = Polygon.regular(x, y, r - joint, 6, angle + math.pi / 6)
                yield Leaf(body, _coat(draw, tone, r, bulge=0.06), 0.2, 1.5)


def _pebbles(draw: Draw, count: int, smallest: float, largest: float) -> Leaves:
    """Rounded stones of every size."""
    for r in radii(draw, count, smallest, largest):
        x, y = _uniform(draw, -20, SHAPE[1] + 20), _uniform(draw, -20, SHAPE[0] + 20)
        squash, turn = math.sqrt(_uniform(draw, 1.0, 1.9)), _uniform(draw, 0, math.pi)
        bumps = tuple((k, _uniform(draw, 0, 0.24 / k), _uniform(draw, 0, 6.28)) for k in (2, 3, 4))
        tone = _uniform(draw, 0.25, 0.99)
        shape = Blob(x, y, float(r) * squash, float(r) / squash, turn, bumps)
        coat = _coat(draw, tone, float(r), bulge=_uniform(draw, 0.1, 0.4), grain=0.06)
        yield Leaf(shape, coat, 0.3, min(1.0 + 0.06 * float(r), 3.0))


def _stack(draw: Draw, count: int) -> Leaves:
    """Loose tiles, bars and boards, thrown over one another."""
    for r in sorted(radii(draw, count, 12, 100), reverse=True):
        x, y = _uniform(draw, -30, SHAPE[1] + 30), _uniform(draw, -30, SHAPE[0] + 30)
        angle, aspect = _uniform(draw, 0, math.pi), math.sqrt(_uniform(draw, 1.0, 5.0))
        tone = _uniform(draw, 0.12, 0.95)
        w, h = 1.6 * float(r) * aspect, 1.6 * float(r) / aspect
        yield Leaf(Polygon.box(x, y, w, h, angle), _coat(draw, tone, float(r)), 0.4, 4.0)
        if draw.random() < 0.35:
            inner = tone * 0.8 if tone > 0.5 else tone * 1.3
            yield Leaf(Polygon.box(x, y, 0.86 * w, 0.8 * h, angle), _coat(draw, inner, float(r)))


def _dishes(draw: Draw, count: int) -> Leaves:
    """Plates and bowls: rings within rings, seen a little from the side."""
    for _ in range(count):
        x, y = _uniform(draw, 30, SHAPE[1] - 30), _uniform(draw, 30, SHAPE[0] - 30)
        r, flat, turn = _uniform(draw, 22, 72), _uniform(draw, 0.7, 1.0), _uniform(draw, 0, 3.14)
        tone = _uniform(draw, 0.45, 0.97)
        for step, (share, gain) in enumerate(((1.0, 1.0), (0.86, 0.8), (0.78, 0.95), (0.3, 0.6))):
            if step < 3 or draw.random() < 0.5:
                shape = Blob(x, y, share * r, share * r * flat, turn)
                coat = _coat(draw, tone * gain, r, bulge=0.15 if step in (0, 2) else 0.0)
                yield Leaf(shape, coat, 0.5 if step == 0 else 0.0, 5.0)


def _wires(draw: Draw, count: int) -> Leaves:
    """Wires, cracks and pencil marks: thin lines across the view."""
    for _ in range(count):
        x, y = _uniform(draw, 0, SHAPE[1]), _uniform(draw, 0, SHAPE[0])
        angle, half = _uniform(draw, 0, math.pi), _uniform(draw, 30, 260)
        dx, dy = half * math.cos(angle), half * math.sin(angle)
        tone = _uniform(draw, 0.03, 0.15) if draw.random() < 0.6 else _uniform(draw, 0.85, 0.99)
        line = Polygon.strip(x - dx, y - dy, x + dx, y + dy, _uniform(draw, 1.0, 3.0))
        yield Leaf(line, Paint(tone))


def _litter(draw: Draw, count: int, largest: float) -> Leaves:
    """Shards of every kind and size."""
    for r in sorted(radii(draw, count, 3.0, largest), reverse=True):
        x, y = _uniform(draw, -10, SHAPE[1] + 10), _uniform(draw, -10, SHAPE[0] + 10)
        tone = _uniform(draw, 0.08, 0.96)
        yield Leaf(
            mixed(draw, x, y, float(r)),
            _coat(draw, tone, float(r), bulge=0.08, grain=0.05),
            0.3,
            2.0,
        )


# ---------------------------------------------------------------- the views


def _wall(draw: Draw) -> Leaves:
    yield from _tiles(draw)
    yield from _wires(draw, 2)


def _floor(draw: Draw) -> Leaves:
    yield from _hexagons(draw)
    yield from _litter(draw, 40, 16)


def _bed(draw: Draw) -> Leaves:
    yield from _pebbles(draw, 420, 9.0, 90.0)


def _store(draw: Draw) -> Leaves:
    yield from _stack(draw, 150)
    yield from _wires(draw, 3)


def _bench(draw: Draw) -> Leaves:
    yield from _tiles(draw)
    yield from _dishes(draw, 5)
    yield from _pebbles(draw, 30, 5.0, 20.0)
    yield from _wires(draw, 2)


def _yard(draw: Draw) -> Leaves:
    yield from _stack(draw, 40)
    yield from _litter(draw, 500, 70)
    yield from _dishes(draw, 2)
    yield from _wires(draw, 4)


VIEWS: dict[str, Callable[[Draw], Leaves]] = {
    "wall": _wall,
    "floor": _floor,
    "bed": _bed,
    "store": _store,
    "bench": _bench,
    "yard": _yard,
}
"""What there is to see at the Tessary tile works."""


def tile_works(view: str, number: int) -> Scene:
    """One view of the invented tile works; ``number`` tells apart views of one kind."""
    draw = rng(number, "tessary", view)
    ground = _coat(draw, _uniform(draw, 0.15, 0.6), 200.0, grain=0.08)
    return Scene(SHAPE, tuple(VIEWS[view](draw)), ground, number)


def sample_frames(count: int = 24, *, edges: bool = True) -> Iterator[Rendered]:
    """The sample frames in order, with their true edges if these are wanted."""
    names = list(VIEWS)
    for k in range(count):
        view, number = names[k % len(names)], k // len(names) + 1
        light = LIGHTS[(k + number) % len(LIGHTS)]
        path = f"{view}-{number:02d}.png"
        yield expose(
            tile_works(view, number), OMBREL_K2, light=light, seed=k, path=path, edges=edges
        )


NOTE = """\
# Sample images

The {count} pictures in this folder are invented: rendered by patchlab's scene maker, not taken
by any camera. Camera "Ombrel K2" and the place, "Tessary tile works, Port Hallan", do not exist.

- {width} x {height} pixels, 8 bit, grey, linear
- gain {camera.gain} DN per electron, read noise {camera.read_noise:g} electrons, blur
  {camera.blur_sigma_px} pixels (one standard deviation, pixel aperture included), black level 0
- a white surface gives {lights} electrons, one light level after another

They are dedicated to the public domain under CC0 1.0; use them for anything.

    patchlab scenes -o sample_images

makes them again, byte for byte (with the same NumPy; another version may round a few pixels
otherwise).
"""


def make_sample_images(folder: Path, count: int = 24, *, progress: Progress = silent) -> list[Path]:
    """Write the sample frames and the note that says what they are.

    Parameters
    ----------
    folder : where; files of the same names are replaced
    count : frames
    progress : as everywhere

    Returns
    -------
    list of Path : the pictures
    """
    written = []
    for done, made in enumerate(sample_frames(count, edges=False), 1):
        path = Path(folder) / made.frame.path
        write_file(path, png_bytes(made.frame.pixels))
        written.append(path)
        progress("rendering", done, count)
    height, width = SHAPE
    lights = ", ".join(f"{light:g}" for light in LIGHTS)
    note = NOTE.format(count=count, width=width, height=height, camera=OMBREL_K2, lights=lights)
    write_file(Path(folder) / "NOTE.md", note.encode())
    return written
