"""Made pictures whose edges are known: a simulated camera looks at a scene of leaves.

The scene is painted with exact area coverage, blurred by a Gaussian, sampled at the
pixel centres, and given photon noise, read noise, quantisation and clipping. An
edge in the picture lies within 0.005 pixels of where its formula says.
Dead leaves: Matheron 1968; the scale-free size law r^-3: Lee, Mumford and Huang
2001, Int. J. Comput. Vision 41:35-59 (from memory). Camera: the linear model of
EMVA 1288.
"""

from __future__ import annotations

import math
from collections.abc import Callable
from dataclasses import dataclass

import numpy as np
from numpy.typing import NDArray

from patchlab.conventions import PIXEL_FORMATS, rng
from patchlab.errors import UsageError
from patchlab.images.canvas import (
    JUNCTION,
    TRUE_EDGE,
    Leaf,
    Paint,
    Scene,
    blur,
    grain_tile,
    paint,
    truth,
)
from patchlab.images.leaves import Blob, Polygon, Shape
from patchlab.types import F64, Frame, InputContract


@dataclass(frozen=True)
class Camera:
    """A camera by the linear model of EMVA 1288.

    Parameters
    ----------
    name : for people
    bits : 8, 10, 12 or 16
    gain : DN per electron
    full_well : electrons, where a pixel saturates
    read_noise : electrons, one standard deviation
    blur_sigma_px : of the whole point spread, pixel aperture included; 0.3 and up
    black : DN added to every code
    row_noise : electrons, one standard deviation, the same along each row
    neighbour : correlation put into the noise, 0 to 0.25: the weight of each of two
        neighbours along either axis (0 leaves it white)

    Raises
    ------
    UsageError : a value outside its range.
    """

    name: str = "Ombrel K2"
    bits: int = 8
    gain: float = 0.5
    full_well: float = 600.0
    read_noise: float = 2.0
    blur_sigma_px: float = 0.8
    black: float = 0.0
    row_noise: float = 0.0
    neighbour: float = 0.0

    def __post_init__(self) -> None:
        if f"Mono{self.bits}" not in PIXEL_FORMATS:
            raise UsageError(f"a camera has 8, 10, 12 or 16 bits, not {self.bits}")
        if not self.blur_sigma_px >= 0.3:
            raise UsageError("blur below 0.3 pixels cannot be sampled")
        if not (self.gain > 0 and self.full_well > 0 and 0 <= self.neighbour <= 0.25):
            raise UsageError("gain and full well must be positive, neighbour 0 to 0.25")
        if min(self.read_noise, self.row_noise, self.black) < 0:
            raise UsageError("noise and black level must not be negative")

    @property
    def contract(self) -> InputContract:
        """The pixels it gives; white is where it saturates."""
        full = (1 << self.bits) - 1
        white = min(full, math.floor(self.black + self.gain * self.full_well))
        return InputContract(f"Mono{self.bits}", self.black, float(white))

    def capture(self, electrons: F64, draw: np.random.Generator) -> NDArray[np.generic]:
        """Codes (h, w) of one exposure: photon, read and row noise, clipping, rounding."""
        noisy = draw.poisson(np.maximum(electrons, 0.0)).astype(np.float64)
        noisy += self.read_noise * draw.standard_normal(electrons.shape)
        if self.row_noise:
            noisy += self.row_noise * draw.standard_normal((electrons.shape[0], 1))
        if self.neighbour:
            noisy = electrons + _mix(noisy - electrons, self.neighbour)
        codes = np.rint(self.black + self.gain * np.minimum(noisy, self.full_well))
        form = self.contract.format
        return np.clip(codes, 0, self.contract.white).astype(form.dtype)


def _mix(noise: F64, weight: float) -> F64:
    for axis in (0, 1):
        pair = np.roll(noise, 1, axis) + np.roll(noise, -1, axis)
        noise = (1 - 2 * weight) * noise + weight * pair
    return noise


@dataclass(frozen=True, eq=False)
class Rendered:
    """A made picture and the truth about it.

    Parameters
    ----------
    frame : Frame, the camera's codes
    clean : float64 (h, w), electrons expected in each pixel, blur included
    edges : TRUE_EDGE array, visible samples of every outline
    junctions : JUNCTION array
    boundary : bool (h, w), pixels with a true edge in them
    camera : Camera
    """

    frame: Frame
    clean: F64
    edges: NDArray[np.void]
    junctions: NDArray[np.void]
    boundary: NDArray[np.bool_]
    camera: Camera


# ---------------------------------------------------------------- the picture


def expose(
    scene: Scene,
    camera: Camera,
    *,
    light: float,
    seed: int = 0,
    shot: int = 0,
    path: str = "scene",
    edges: bool = True,
) -> Rendered:
    """Take a picture of a scene.

    Parameters
    ----------
    scene : Scene
    camera : Camera
    light : electrons that a reflectance of 1 gives
    seed, shot : key of the noise; other shots of one seed are frames of a static scene
    path : the frame's name
    edges : find the true edges too; without them a picture takes about half the time

    Returns
    -------
    Rendered
    """
    if not light > 0:
        raise UsageError("the light must be positive")
    margin = math.ceil(4.5 * camera.blur_sigma_px) + 1
    grain = grain_tile(scene.seed)
    canvas = paint(scene, margin, grain)
    clean = light * blur(canvas.level, camera.blur_sigma_px, margin)
    found, junctions = np.zeros(0, TRUE_EDGE), np.zeros(0, JUNCTION)
    if edges:
        found, junctions = truth(scene, canvas, grain, light)
    boundary = np.zeros(scene.shape, dtype=bool)
    boundary[np.rint(found["y"]).astype(int), np.rint(found["x"]).astype(int)] = True
    codes = camera.capture(clean, rng(seed, "shot", str(shot)))
    frame = Frame(path, codes, camera.contract, notes=("made by the scene maker",))
    return Rendered(frame, clean, found, junctions, boundary, camera)


def radii(draw: np.random.Generator, count: int, smallest: float, largest: float) -> F64:
    """Radii with density r^-3 between two bounds: no size is special in the picture."""
    u = draw.random(count)
    return np.asarray(1 / np.sqrt(smallest**-2 - u * (smallest**-2 - largest**-2)))


Maker = Callable[[np.random.Generator, float, float, float], Shape]


def disk(draw: np.random.Generator, x: float, y: float, r: float) -> Shape:
    """A disk."""
    return Blob(x, y, r, r)


def mixed(draw: np.random.Generator, x: float, y: float, r: float) -> Shape:
    """An ellipse, a pebble, a rectangle or a polygon, of about the area of the disk."""
    kind, turn, squash = draw.integers(4), draw.random() * math.pi, 1 + draw.random()
    phases = draw.random(2) * 2 * math.pi
    if kind == 0:
        return Blob(x, y, r * math.sqrt(squash), r / math.sqrt(squash), turn)
    if kind == 1:
        bumps = ((2, 0.12, float(phases[0])), (3, 0.07, float(phases[1])))
        return Blob(x, y, r * math.sqrt(squash), r / math.sqrt(squash), turn, bumps)
    if kind == 2:
        side = r * math.sqrt(math.pi)
        return Polygon.box(x, y, side * math.sqrt(squash), side / math.sqrt(squash), turn)
    return Polygon.regular(x, y, 1.1 * r, int(draw.integers(3, 7)), turn)


def dead_leaves(
    seed: int,
    shape: tuple[int, int] = (256, 256),
    *,
    smallest: float = 2.0,
    largest: float = 120.0,
    layers: float = 5.0,
    maker: Maker = mixed,
    texture: float = 0.05,
) -> Scene:
    """Leaves of every size over one another, until the ground is covered.

    Parameters
    ----------
    seed : of the scene
    shape : (height, width), pixels
    smallest, largest : radii, pixels
    layers : mean number of leaves over a point; ``exp(-layers)`` of the ground stays bare
    maker : :func:`disk`, :func:`mixed` or any other
    texture : strength of grain and shading inside the leaves; 0 makes them even

    Returns
    -------
    Scene
    """
    if not 0 < smallest < largest:
        raise UsageError("leaf sizes must be positive, the smallest first")
    draw = rng(seed, "leaves")
    height, width = (side + 2 * largest for side in shape)
    area = 2 * math.pi * math.log(largest / smallest) / (smallest**-2 - largest**-2)
    count = math.ceil(layers * height * width / area)
    sizes = radii(draw, count, smallest, largest)
    places = draw.random((count, 2)) * (width, height) - largest
    tones = 0.08 + 0.9 * draw.random(count)
    leaves = []
    for r, (x, y), tone in zip(sizes, places, tones, strict=True):
        figure = maker(draw, float(x), float(y), float(r))
        paint = _coat(draw, float(tone), float(r), texture) if texture else Paint(float(tone))
        if _in_view(figure, shape):
            leaves.append(Leaf(figure, paint))
    return Scene(shape, tuple(leaves), Paint(0.5), seed)


def _coat(draw: np.random.Generator, tone: float, r: float, texture: float) -> Paint:
    sx, sy, bulge, grain, size, u, v = draw.random(7)
    return Paint(
        tone,
        4 * texture * (sx - 0.5) / r,
        4 * texture * (sy - 0.5) / r,
        4 * texture * bulge,
        texture * grain,
        1.5 + 2.5 * size,
        (256 * u, 256 * v),
    )


def _in_view(figure: Shape, shape: tuple[int, int], margin: float = 8.0) -> bool:
    left, top, right, bottom = figure.bounds
    return (
        right > -margin
        and bottom > -margin
        and left < shape[1] + margin
        and top < shape[0] + margin
    )


def render_scene(
    seed: int,
    shape: tuple[int, int] = (256, 256),
    camera: Camera | None = None,
    *,
    light: float = 400.0,
    shot: int = 0,
    texture: float = 0.05,
    smallest: float = 4.0,
    largest: float = 80.0,
) -> Rendered:
    """A picture of mixed leaves with its true edges: one call for tests and proofs.

    Parameters
    ----------
    seed : of the scene and its noise
    shape : (height, width), pixels
    camera : Camera; None is the invented Ombrel K2
    light : electrons of the brightest leaf
    shot : another exposure of the same scene
    texture, smallest, largest : as for :func:`dead_leaves`

    Returns
    -------
    Rendered
    """
    scene = dead_leaves(seed, shape, smallest=smallest, largest=largest, texture=texture)
    return expose(scene, camera or Camera(), light=light, seed=seed, shot=shot)
