"""Pictures for inspection: stamped brackets, all in one place, each a little different.

The brackets and their maker, the "Tessary works, Port Hallan", are invented; so is the camera.
Every bracket has the same nine features, and each differs from bracket to bracket on its
own, by a normal tolerance: what varies, where, and by how much is known.
"""

from __future__ import annotations

from collections.abc import Callable, Iterator
from dataclasses import dataclass
from pathlib import Path

import numpy as np

from patchlab.conventions import rng
from patchlab.images.canvas import Leaf, Paint, Scene
from patchlab.images.demo import OMBREL_K2
from patchlab.images.formats import png_bytes
from patchlab.images.leaves import Blob, Polygon
from patchlab.images.scenes import Rendered, expose
from patchlab.progress import Progress, silent
from patchlab.store import write_file
from patchlab.types import F64

SHAPE = (52, 68)
LIGHT = 900.0
"""Electrons that a white surface gives."""
METAL, DARK, SHINE = 0.62, 0.08, 0.92


@dataclass(frozen=True)
class Feature:
    """One thing that varies.

    Parameters
    ----------
    name : for people
    region : left, top, right, bottom in pixels: nothing outside of it varies with the feature
    tolerance : standard deviation of its value, in the units of ``draw``
    draw : value, as a deviation from the drawing, to leaves
    """

    name: str
    region: tuple[float, float, float, float]
    tolerance: float
    draw: Callable[[float], tuple[Leaf, ...]]


def _hole(x: float, y: float, r: float) -> Callable[[float], tuple[Leaf, ...]]:
    return lambda v: (Leaf(Blob(x, y, r + v, r + v), Paint(DARK)),)


def _slot(v: float) -> tuple[Leaf, ...]:
    half = 6.0 + v
    left, right = 34 - half, 34 + half
    bar = Polygon.box(34, 26, 2 * half, 5.0)
    ends = (Blob(left, 26, 2.5, 2.5), Blob(right, 26, 2.5, 2.5))
    return tuple(Leaf(shape, Paint(DARK)) for shape in (bar, *ends))


def _notch(v: float) -> tuple[Leaf, ...]:
    return (Leaf(Polygon.box(58, 26, 2 * (4.0 + v), 7.0), Paint(DARK)),)


def _tab(v: float) -> tuple[Leaf, ...]:
    return (Leaf(Polygon.box(10, 26, 2 * (4.0 + v), 8.0), Paint(METAL)),)


def _stamp(v: float) -> tuple[Leaf, ...]:
    tone = Paint(float(np.clip(0.4 + v, 0.02, 1.0)))
    return tuple(Leaf(Polygon.box(x, 40, 2.0, 5.0), tone) for x in (30.0, 34.0, 38.0))


def _weld(v: float) -> tuple[Leaf, ...]:
    return (Leaf(Blob(50, 40, 3.0, 2.4), Paint(float(np.clip(0.8 + v, 0.02, 1.0)))),)


def _bend(v: float) -> tuple[Leaf, ...]:
    return (Leaf(Polygon.box(34, 12.5 + v, 12.0, 1.8), Paint(SHINE)),)


def _corner(v: float) -> tuple[Leaf, ...]:
    cut = 6.0 + v
    return (Leaf(Polygon(((9.0, 46.0 - cut), (10.0 + cut, 47.0), (9.0, 47.0))), Paint(DARK)),)


FEATURES = (
    Feature("left hole", (12, 8, 24, 20), 0.30, _hole(18, 14, 3.2)),
    Feature("right hole", (44, 8, 56, 20), 0.30, _hole(50, 14, 3.2)),
    Feature("slot", (20, 21, 48, 31), 0.45, _slot),
    Feature("notch", (48, 20, 63, 32), 0.55, _notch),
    Feature("tab", (3, 20, 16, 32), 0.45, _tab),
    Feature("stamp", (27, 35, 41, 45), 0.10, _stamp),
    Feature("weld", (44, 35, 56, 45), 0.09, _weld),
    Feature("bend", (25, 8, 43, 17), 0.55, _bend),
    Feature("corner", (6, 34, 22, 50), 0.75, _corner),
)
"""Left to right and top to bottom on the invented drawing; in the order of painting."""


def deviations(count: int, seed: int = 0) -> F64:
    """What each bracket's features deviate by, (count, 9): normal, independent."""
    draw = rng(seed, "brackets").standard_normal((count, len(FEATURES)))
    return np.asarray(draw * np.array([f.tolerance for f in FEATURES]))


def bracket(deviation: F64) -> Scene:
    """One bracket on its dark table."""
    body = Leaf(Polygon.box(34, 26, 48, 40), Paint(METAL, bulge=0.05))
    leaves = [body]
    for feature, value in zip(FEATURES, deviation, strict=True):
        leaves += feature.draw(float(value))
    return Scene(SHAPE, tuple(leaves), Paint(DARK))


def brackets(count: int = 300, seed: int = 0) -> Iterator[Rendered]:
    """Pictures of brackets by the invented Ombrel K2, aligned, in one light."""
    for k, deviation in enumerate(deviations(count, seed)):
        yield expose(
            bracket(deviation),
            OMBREL_K2,
            light=LIGHT,
            seed=seed,
            shot=k,
            path=f"bracket-{k + 1:04d}.png",
            edges=False,
        )


NOTE = """\
# Pictures for inspection

The {count} pictures in this folder are invented: rendered by patchlab's scene maker, not taken
by any camera. Camera "Ombrel K2", the brackets and their maker, "Tessary works, Port Hallan",
do not exist.

All brackets lie in one place and one light. Nine features differ from bracket to bracket, each
on its own, by a normal tolerance: {features}.

They are dedicated to the public domain under CC0 1.0; use them for anything.

    patchlab scenes --kind brackets --count {count} -o FOLDER

makes them again, byte for byte (with the same NumPy; another version may round a few pixels
otherwise).
"""


def make_brackets(folder: Path, count: int = 300, *, progress: Progress = silent) -> list[Path]:
    """Write pictures of brackets and the note that says what they are.

    Parameters
    ----------
    folder : where; files of the same names are replaced
    count : pictures
    progress : as everywhere

    Returns
    -------
    list of Path : the pictures
    """
    written = []
    for done, made in enumerate(brackets(count), 1):
        path = Path(folder) / made.frame.path
        write_file(path, png_bytes(made.frame.pixels))
        written.append(path)
        progress("rendering", done, count)
    names = ", ".join(f.name for f in FEATURES)
    note = NOTE.format(count=count, features=names)
    write_file(Path(folder) / "NOTE.md", note.encode())
    return written
