"""The rules that every room keeps, each written once.

Operation: correlation (no flip), ``r(y, x) = sum k(j, i) p(y + j - c, x + i - c)``.
Axes: arrays are (row, column); geometry is x right, y down, pixel centres at
whole numbers. ``theta``: direction of the carrier's wave vector, from +x towards
+y, radians, folded to [0, pi). ``frequency``: cycles per pixel. ``sigma``: one
standard deviation, pixels. ``phase``: cosine convention at the kernel's centre.
"""

from __future__ import annotations

import math
from dataclasses import dataclass
from typing import Any, Literal

import numpy as np
from numpy.typing import NDArray

from patchlab.errors import UsageError

Array = NDArray[np.float64]

# ---------------------------------------------------------------- borders

BorderName = Literal["zero", "edge", "mirror101", "mirror", "wrap"]


@dataclass(frozen=True)
class Border:
    """One border rule under the names that other libraries give it.

    ``onnx`` is the Pad operator's mode where one exists; a None in any column
    means that the library cannot do this border and must be refused.
    """

    numpy: str
    scipy: str
    opencv: str
    onnx: str | None


BORDERS: dict[str, Border] = {
    "zero": Border("constant", "constant", "BORDER_CONSTANT", "constant"),
    "edge": Border("edge", "nearest", "BORDER_REPLICATE", "edge"),
    "mirror101": Border("reflect", "mirror", "BORDER_REFLECT_101", "reflect"),
    "mirror": Border("symmetric", "reflect", "BORDER_REFLECT", None),
    "wrap": Border("wrap", "grid-wrap", "BORDER_WRAP", None),  # ONNX has it from opset 19 only
}
DEFAULT_BORDER: BorderName = "mirror101"


def border_index(border: str, index: NDArray[np.int64], size: int) -> NDArray[np.int64]:
    """Map coordinates outside ``0 .. size - 1`` to the pixel a border rule reads there.

    Parameters
    ----------
    border : one of the five names
    index : ndarray of int, any shape; at most ``size - 1`` beyond either end
    size : int

    Returns
    -------
    ndarray of int64: source coordinates; -1 where the rule reads a constant zero.
    """
    i = np.asarray(index, dtype=np.int64)
    outside = (i < 0) | (i >= size)
    if border == "zero":
        return np.where(outside, -1, i)
    if border == "edge":
        return np.clip(i, 0, size - 1)
    if border == "wrap":
        return i % size
    if border == "mirror":
        folded = i % (2 * size)
        return np.where(folded < size, folded, 2 * size - 1 - folded)
    if border == "mirror101":
        if size == 1:
            return np.zeros_like(i)
        period = 2 * (size - 1)
        folded = i % period
        return np.where(folded < size, folded, period - folded)
    raise UsageError(f"unknown border {border!r}", remedy=f"choose one of {', '.join(BORDERS)}")


def pad(image: NDArray[np.generic], margin: int, border: str) -> NDArray[np.generic]:
    """Extend a (h, w) plane by ``margin`` pixels on every side under a border rule."""
    rows = border_index(border, np.arange(-margin, image.shape[0] + margin), image.shape[0])
    cols = border_index(border, np.arange(-margin, image.shape[1] + margin), image.shape[1])
    out = image[np.ix_(np.maximum(rows, 0), np.maximum(cols, 0))]
    out[rows < 0] = 0
    out[:, cols < 0] = 0
    return np.asarray(out)


# ---------------------------------------------------------------- angles


def fold_theta(theta: float, phase: float = 0.0) -> tuple[float, float]:
    """Fold a direction to [0, pi) and carry the phase along.

    A wave seen from the other side runs backwards: (theta + pi, phase) and
    (theta, -phase) are one kernel. The phase comes back in (-pi, pi].
    """
    turns = math.floor(theta / math.pi)
    folded = max(theta - turns * math.pi, 0.0)  # a theta just below 0 rounds to turn 0
    if folded >= math.pi:  # rounding just below a multiple of pi
        folded -= math.pi
        turns += 1
    if turns % 2:
        phase = -phase
    return folded, math.pi - (math.pi - phase) % (2 * math.pi)


def orientation_lattice(count: int) -> Array:
    """``count`` evenly spread directions ``pi j / count``: closed under mirroring.

    For every theta on the lattice, pi - theta lies on it too (0 and pi/2 are
    their own mirrors), which is what lets a plan share work between kernels.
    """
    if count < 1:
        raise UsageError("a bank needs at least one orientation")
    return np.pi * np.arange(count) / count


def grid(size: int) -> tuple[Array, Array]:
    """Coordinates (x, y) of a ``size`` x ``size`` kernel or patch about its middle."""
    r = np.arange(size, dtype=np.float64) - (size - 1) / 2
    x, y = np.meshgrid(r, r)
    return x, y


# ---------------------------------------------------------------- transfer and luminance

REC709 = (0.2126, 0.7152, 0.0722)


def srgb_decode(value: Array) -> Array:
    """sRGB-coded value in [0, 1] to linear light (IEC 61966-2-1:1999)."""
    v = np.asarray(value, dtype=np.float64)
    return np.where(v <= 0.04045, v / 12.92, ((np.maximum(v, 0.04045) + 0.055) / 1.055) ** 2.4)


def srgb_encode(linear: Array) -> Array:
    """Linear light in [0, 1] to the sRGB-coded value (IEC 61966-2-1:1999)."""
    v = np.asarray(linear, dtype=np.float64)
    return np.where(
        v <= 0.0031308, v * 12.92, 1.055 * np.maximum(v, 0.0031308) ** (1 / 2.4) - 0.055
    )


# ---------------------------------------------------------------- pixel formats


@dataclass(frozen=True)
class PixelFormat:
    """A pixel format under its GenICam PFNC name.

    ``float32`` is not a PFNC name; it stands for a plane of floats.

    Parameters
    ----------
    name, bits, dtype, ctype : PFNC name, depth of a sample, its types in numpy and C
    colours : a letter for each sample of a pixel, "" for monochrome. A Bayer sensor is read as
        pixels too: each is a cell of 2 x 2 samples, row by row ("RGGB"), so that what is
        learned or run knows the phase of the mosaic and nothing is interpolated
    cell : rows and columns of samples in one pixel, 2 for a Bayer cell
    """

    name: str
    bits: int
    dtype: str
    ctype: str
    colours: str = ""
    cell: int = 1

    @property
    def integer(self) -> bool:
        """True when pixels are codes that index an input table."""
        return self.name != "float32"

    @property
    def planes(self) -> int:
        """Samples of a pixel."""
        return len(self.colours) or 1

    @property
    def row_samples(self) -> int:
        """Samples of a pixel that stand side by side in one row of memory."""
        return self.planes // self.cell

    @property
    def interleaved(self) -> bool:
        """True when a picture is an array (h, w, samples) and not one plane."""
        return self.planes > 1 and self.cell == 1

    def size_of(self, picture: NDArray[Any]) -> tuple[int, int]:
        """Height and width of a picture, in pixels (of a Bayer sensor, in cells)."""
        return picture.shape[0] // self.cell, picture.shape[1] // self.cell

    def stored(self, shape: tuple[int, int]) -> tuple[int, ...]:
        """Shape of the array that holds a picture of (height, width) pixels."""
        rows = (shape[0] * self.cell, shape[1] * self.cell)
        return (*rows, self.planes) if self.interleaved else rows

    def split(self, picture: NDArray[Any]) -> NDArray[Any]:
        """A picture as (h, w, samples); one plane gets a last axis of length 1.

        >>> bayer = pixel_format("BayerRG8")
        >>> bayer.split(np.array([[1, 2, 5, 6], [3, 4, 7, 8]], np.uint8)).tolist()
        [[[1, 2, 3, 4], [5, 6, 7, 8]]]
        """
        if self.interleaved:
            return picture
        h, w = self.size_of(picture)
        c = self.cell
        cells = picture[: h * c, : w * c].reshape(h, c, w, c).swapaxes(1, 2)
        return cells.reshape(h, w, self.planes)

    def joined(self, samples: NDArray[Any]) -> NDArray[Any]:
        """The picture of which :meth:`split` gives these samples (h, w, samples)."""
        if self.interleaved:
            return samples
        h, w, c = *samples.shape[:2], self.cell
        return np.ascontiguousarray(samples.reshape(h, w, c, c).swapaxes(1, 2)).reshape(h * c, -1)

    @property
    def full_scale(self) -> int:
        """Largest code of the format (1 for float32)."""
        return (1 << self.bits) - 1 if self.integer else 1


PIXEL_FORMATS: dict[str, PixelFormat] = {
    "Mono8": PixelFormat("Mono8", 8, "uint8", "uint8_t"),
    "Mono10": PixelFormat("Mono10", 10, "uint16", "uint16_t"),
    "Mono12": PixelFormat("Mono12", 12, "uint16", "uint16_t"),
    "Mono16": PixelFormat("Mono16", 16, "uint16", "uint16_t"),
    "float32": PixelFormat("float32", 32, "float32", "float"),
}
"""Monochrome formats, by name."""

COLOUR_FORMATS: dict[str, PixelFormat] = {
    f"{kind}{mono.bits}": PixelFormat(
        f"{kind}{mono.bits}", mono.bits, mono.dtype, mono.ctype, colours, cell
    )
    for kind, colours, cell in (
        ("RGB", "RGB", 1),
        ("BGR", "BGR", 1),
        ("BayerRG", "RGGB", 2),
        ("BayerGR", "GRBG", 2),
        ("BayerGB", "GBRG", 2),
        ("BayerBG", "BGGR", 2),
    )
    for mono in PIXEL_FORMATS.values()
    if mono.integer
}
"""Formats whose pixels have colours: interleaved, or cells of a Bayer mosaic."""


def pixel_format(name: str) -> PixelFormat:
    """Look up a pixel format; an unknown name is refused with the known ones."""
    found = PIXEL_FORMATS.get(name) or COLOUR_FORMATS.get(name)
    if found is None:
        known = (*PIXEL_FORMATS, *COLOUR_FORMATS)
        raise UsageError(
            f"unknown pixel format {name!r}", remedy=f"choose one of {', '.join(known)}"
        )
    return found


# ---------------------------------------------------------------- colour

LUMINANCE_AXIS = (1 / math.sqrt(3),) * 3
"""Direction of grey in the space of (R, G, B) working values."""


def tile_shape(size: int, length: int) -> tuple[int, ...]:
    """Shape of the patch that a row of ``length`` values holds.

    One plane: (size, size). Colour: (size, size, samples), as in an interleaved picture, so the
    samples of a pixel stand side by side in a row of a patch set, of a filter and of an atom.

    >>> tile_shape(8, 64), tile_shape(8, 192)
    ((8, 8), (8, 8, 3))
    """
    planes = length // size**2
    return (size, size) if planes == 1 else (size, size, planes)


def rgb_weights(colours: str) -> Array:
    """Matrix (3, samples) that takes a pixel's samples to (R, G, B): equal ones are averaged.

    >>> rgb_weights("RGGB").tolist()
    [[1.0, 0.0, 0.0, 0.0], [0.0, 0.5, 0.5, 0.0], [0.0, 0.0, 0.0, 1.0]]
    """
    found = np.array([[float(c == letter) for c in colours] for letter in "RGB"])
    return np.asarray(found / found.sum(axis=1, keepdims=True))


# ---------------------------------------------------------------- precision

UNIT_ROUNDOFF = 2.0**-24
"""Half a unit in the last place of float32, the u of every error bound."""


def gamma(n: int) -> float:
    """Error constant of a float32 sum of ``n`` products: n u / (1 - n u).

    Higham 2002, Accuracy and Stability of Numerical Algorithms, section 3.1.
    """
    return n * UNIT_ROUNDOFF / (1 - n * UNIT_ROUNDOFF)


# ---------------------------------------------------------------- randomness


def rng(seed: int, *key: str) -> np.random.Generator:
    """The generator that belongs to (seed, key): the same on every machine and order.

    The key is usually a frame's relative path, so a frame's patches do not
    depend on which other frames there are.
    """
    words = [int.from_bytes(part.encode(), "little") for part in ("\0".join(key),) if key]
    return np.random.Generator(np.random.PCG64(np.random.SeedSequence([seed, *words])))


# ---------------------------------------------------------------- comparing kernels


def shift_cosine(a: Array, b: Array) -> float:
    """Largest |cos| between two kernels over all whole-pixel shifts.

    Parameters
    ----------
    a, b : ndarray of shape (h, w) and (h', w'), or (h, w, planes) and (h', w', planes)

    Returns
    -------
    float in [0, 1]; the full norms are used, so what a shift pushes out counts against. 0 for
    kernels of different numbers of planes.
    """
    if a.shape[2:] != b.shape[2:]:
        return 0.0
    from scipy.signal import correlate2d

    norm = float(np.linalg.norm(a) * np.linalg.norm(b))
    if not norm:
        return 0.0
    if a.ndim == 2:
        return float(np.abs(correlate2d(a, b, mode="full")).max() / norm)
    planes = range(a.shape[2])
    moved = np.sum([correlate2d(a[..., m], b[..., m], mode="full") for m in planes], axis=0)
    return float(np.abs(moved).max() / norm)
