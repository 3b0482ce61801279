"""Run a convolution bank with numpy alone, or with its compiled library where there is one.

    import patchlab_bank

    bank = patchlab_bank.load("path/to/the/bank")
    planes = bank.responses(picture)  # float32 (kernels, height, width)
    found = bank.edges(picture)       # found.edges, found.strength, found.orientation, ...
    points = bank.edgels(picture)     # points["x"], points["y"], ... (takes the library)

This one file is all it takes beside the bank's folder: Python 3.10 or newer and numpy.

What is the same with and without the library: responses lie within the bank's stated
``error_bound`` of the exact ones either way, so they differ by at most twice that. With the
library, bands and threads change no bit, and the bits are those that any other caller of that
library gets. Without it, sums are made in float64 and rounded to float32 once, so nearly every
value is the exact one rounded; the order of those sums is the processor's, so the last bit of
a few may differ between machines. Edge elements are found by the same rules from either.

The content of this folder is its maker's own. The parts that come from patchlab's templates are
granted to everyone for any use, without conditions or attribution.
"""

from __future__ import annotations

import contextlib
import ctypes
import hashlib
import io
import itertools
import json
import math
import os
import platform
import re
import tempfile
from collections.abc import Iterator, Mapping, Sequence
from concurrent.futures import ThreadPoolExecutor
from pathlib import Path
from typing import Any, NamedTuple

import numpy as np

Array = Any
"""A numpy array; its shape and dtype stand in the docstrings."""

MANIFEST = "bank.json"
FORMATS = {
    "Mono8": ("uint8", 8),
    "Mono10": ("uint16", 10),
    "Mono12": ("uint16", 12),
    "Mono16": ("uint16", 16),
    "float32": ("float32", 32),
}
COLOURS = {"RGB": 1, "BGR": 1, "BayerRG": 2, "BayerGR": 2, "BayerGB": 2, "BayerBG": 2}
"""Kinds of colour pixels, with the rows and columns of samples in one: 2 for a mosaic's cell."""
PARITIES = {"step": ("odd",), "line": ("even",), "energy": ("even", "odd")}
PAD_MODES = {
    "zero": "constant",
    "edge": "edge",
    "mirror101": "reflect",
    "mirror": "symmetric",
    "wrap": "wrap",
}
RATE = 10.0
"""Default promise, false edge elements per megapixel of flat picture."""
BAND_VALUES = 1 << 19
"""Values that numpy sums at a time (4 MB)."""


EDGEL = np.dtype(
    {
        "names": ["x", "y", "theta", "strength", "sd", "width", "scale", "kind"],
        "formats": ["f4"] * 6 + ["u1"] * 2,
        "offsets": [0, 4, 8, 12, 16, 20, 24, 25],
        "itemsize": 28,
    }
)
"""One edge element, as the C header describes it: position (pixels), normal direction (radians,
towards the brighter side of a step), strength, standard error of the position along the normal,
width of a line, scale, kind (0 step, 1 bright line, 2 dark line)."""


class BankError(ValueError):
    """A bank, a picture or a request that cannot be served: one sentence."""


class Edges(NamedTuple):
    """Edges of one picture.

    ``edges`` : bool (h, w), thinned elements at or above the threshold, with hysteresis.
    ``strength`` : float32 (h, w), in noise units when the camera's noise is known.
    ``orientation`` : uint8 (h, w), number of the winning direction; ``angles`` of the bank tells
    its normal. ``scale`` : uint8 (h, w), the scale it was found on. ``threshold`` : what was used.
    """

    edges: Array
    strength: Array
    orientation: Array
    scale: Array
    threshold: float


class FixedPoint(NamedTuple):
    """A bank in 16-bit fixed point.

    ``step`` : float32 (n,), working value of one count of a kernel. ``error_bound`` : (n,), largest
    error of ``step * count``. ``taps`` : the whole kernels; ``codes`` : of every pixel value;
    ``shift`` : bits that a sum is shifted by.
    """

    step: Array
    error_bound: Array
    taps: Array
    codes: Array
    shift: Array


def load(folder: str | os.PathLike[str], library: bool | None = None) -> Bank:
    """Load a bank from its folder; the hash of every file is checked before its use.

    Parameters
    ----------
    folder : the bank's folder, with ``bank.json``
    library : None takes the compiled library of this machine where the folder holds one, True
        insists on it, False leaves it alone and uses numpy

    Raises
    ------
    BankError : no bank, a damaged or changed one, one of a newer format; no library where one
        is insisted on.
    """
    where = Path(folder)
    bank = Bank(where, _manifest(where))
    path = f"lib/{_machine()}/{_library_file(bank.name)}"
    if library is False:
        return bank
    if path in bank.manifest["files"]:
        bank.compiled = _Library(bank, _read(where, bank.manifest, path))
    elif library:
        raise BankError(f"{where}: there is no {path}; compile {bank.name}.c for this machine")
    return bank


class Bank:
    """A loaded bank; :func:`load` makes it.

    Attributes: ``name``; ``kernels`` (names, in the order of the planes); ``taps`` float32
    (n, h, h), of colour pixels (n, h, h, planes); ``size`` (side of a kernel); ``pixels`` (format
    by its GenICam name) and ``dtype``; ``border``; ``error_bound`` (one a kernel); ``scales`` and
    ``angles`` (radians, one a direction, by scale); ``manifest``; ``compiled`` (the library in
    use, or None); ``fixed`` (fixed point, or None): its ``step`` (value of one count) and
    ``error_bound``, one a kernel.
    """

    compiled: _Library | None = None

    def __init__(self, folder: Path, manifest: dict[str, Any]) -> None:
        self.folder, self.manifest = folder, manifest
        try:
            self._fill()
        except (LookupError, TypeError, ValueError, AttributeError, OverflowError) as error:
            if isinstance(error, BankError):
                raise
            raise BankError(
                f"{folder / MANIFEST}: makes no sense ({type(error).__name__})"
            ) from None

    def _fill(self) -> None:
        head = self.manifest
        self.name = _identifier(head["name"])
        self.kernels = tuple(_identifier(k["name"]) for k in head["kernels"])
        self.border = _known(head["border"], PAD_MODES, "border")
        self.strength = _known(head["strength"], PARITIES, "strength")
        self._fill_pixels(str(head["input"]["pixels"]))
        self.taps = self._array("kernels.npy")
        self._mix = self._array("mix.npy") if head.get("mix") else None
        planes = self.samples if self._mix is None else self._mix.shape[0]
        if self.taps.shape[3:] != (() if self.samples == 1 else (planes,)):
            raise BankError(f"{self.folder}: the kernels do not fit the pixel format")
        if self._mix is not None and self._mix.shape[1:] != (self.samples,):
            raise BankError(f"{self.folder}: the mix does not fit the pixel format")
        n, h, w = self.taps.shape[:3]
        if n != len(self.kernels) or h != w or h % 2 == 0 or n == 0:
            raise BankError(f"{self.folder}: the kernels do not fit the manifest")
        self.size, self.radius = h, h // 2
        self.error_bound = tuple(float(b) for b in head["plan"]["error_bound"])
        self._table = self._array("input_table.npy") if self.bits < 32 else None
        if self._table is not None and self._table.shape != (1 << self.bits,):
            raise BankError(f"{self.folder}: the input table does not fit the pixel format")
        self.fixed = self._fixed_point()
        self._members = _members(head["kernels"], self.strength)
        self.scales = tuple(sorted(self._members))
        self.angles = {s: _angles(head["kernels"], self._members[s]) for s in self.scales}

    def _fill_pixels(self, pixels: str) -> None:
        """What a pixel is: its samples, their depth, and the rows they stand in."""
        kind = pixels.rstrip("0123456789")
        self.cell = COLOURS.get(kind, 1)
        self.samples = (3 if self.cell == 1 else 4) if kind in COLOURS else 1
        mono = f"Mono{pixels[len(kind) :]}" if kind in COLOURS else pixels
        self.pixels = pixels
        self.dtype = np.dtype(FORMATS[_known(mono, FORMATS, "pixel format")][0])
        self.bits = FORMATS[mono][1]

    def size_of(self, image: Array) -> tuple[int, int]:
        """Height and width of a picture, in pixels (of a mosaic, in cells)."""
        return image.shape[0] // self.cell, image.shape[1] // self.cell

    def _fixed_point(self) -> FixedPoint | None:
        about = self.manifest["fixed_point"]
        if about is None:
            return None
        taps, codes = (self._whole(n) for n in ("fixed_kernels.npy", "fixed_codes.npy"))
        shift, step, bound = (
            np.array(about[k]) for k in ("shift", "value_of_a_count", "error_bound")
        )
        fits = taps.shape == self.taps.shape and codes.shape == (1 << self.bits,)
        if not fits or any(v.shape != (len(taps),) for v in (shift, step, bound)):
            raise BankError(f"{self.folder}: the fixed point does not fit the kernels")
        if shift.dtype.kind != "i" or not ((shift >= 0) & (shift < 32)).all():
            raise BankError(f"{self.folder}: the fixed point's shifts make no sense")
        return FixedPoint(step.astype(np.float32), bound.astype(float), taps, codes, shift)

    def _whole(self, name: str) -> Array:
        found = _npy(_read(self.folder, self.manifest, name), self.folder / name)
        if found.dtype.kind != "i":
            raise BankError(f"{self.folder / name}: holds other things than whole numbers")
        return found.astype(np.int64)

    def _array(self, name: str) -> Array:
        data = _read(self.folder, self.manifest, name)
        found = _npy(data, self.folder / name)
        if found.dtype != np.float32 or not np.isfinite(found).all():
            raise BankError(f"{self.folder / name}: holds other things than finite float32")
        return np.ascontiguousarray(found)

    def __repr__(self) -> str:
        how = "compiled" if self.compiled else "numpy"
        return (
            f"<bank {self.name}: {len(self.kernels)} kernels of {self.size} x {self.size}, "
            f"{self.pixels}, {how}>"
        )

    # ------------------------------------------------------------ responses

    def responses(self, image: Array, threads: int = 1) -> Array:
        """Responses of every kernel.

        Parameters
        ----------
        image : (h, w) of the bank's dtype, both sides at least ``size``; (h, w, 3) where pixels
            are RGB or BGR; of a Bayer bank the mosaic (2 h, 2 w), and h, w count its cells
        threads : bands of rows computed side by side by the compiled library

        Returns
        -------
        float32 (n, h, w)

        Raises
        ------
        BankError : the picture does not fit the bank.
        """
        image = self._checked(image)
        if self.compiled is not None:
            return self.compiled.responses(image, threads)
        return self._planes(image, range(len(self.kernels)))

    def responses_fixed(self, image: Array, threads: int = 1) -> tuple[Array, int]:
        """Responses in 16-bit fixed point, the same bits with the library and without.

        Parameters
        ----------
        image, threads : as :meth:`responses`

        Returns
        -------
        int16 (n, h, w) : counts; ``fixed.step[k] * counts[k]`` are responses
        int : how many counts stand at the ends of the range

        Raises
        ------
        BankError : the picture does not fit, or the bank has no fixed point.
        """
        image = self._checked(image)
        self._need_fixed()
        if self.compiled is not None:
            return self.compiled.responses_fixed(image, threads)
        out = self._counts(image, range(len(self.kernels)))
        return out, int((np.abs(out.astype(np.int32)) == 32767).sum())

    def _need_fixed(self) -> FixedPoint:
        if self.fixed is None:
            raise BankError(f"bank {self.name} has no fixed point: it takes {self.pixels} pixels")
        return self.fixed

    def _counts(self, image: Array, kernels: Sequence[int]) -> Array:
        """Some kernels' counts by numpy: whole numbers below 2^53, exact in float64."""
        fixed = self._need_fixed()
        self._working(image)  # refuses codes beyond the format
        sums = self._sums(
            fixed.codes[image].astype(np.float64)[None], fixed.taps[list(kernels)], np.int64
        )
        for plane, k in zip(sums, kernels, strict=True):
            b = int(fixed.shift[k])
            plane[:] = (plane + (1 << b >> 1)) >> b
        return np.clip(sums, -32767, 32767).astype(np.int16)

    def _checked(self, image: Array) -> Array:
        flat = self.samples == 1 or self.cell > 1
        tail = () if flat else (self.samples,)
        if not isinstance(image, np.ndarray) or image.ndim < 2 or image.shape[2:] != tail:
            shape = getattr(image, "shape", type(image).__name__)
            what = "one plane (height, width)" if flat else f"(height, width, {self.samples})"
            raise BankError(f"a picture is {what}, not {shape}")
        if image.dtype != self.dtype:
            raise BankError(
                f"bank {self.name} takes {self.pixels} pixels ({self.dtype}), not {image.dtype}"
            )
        height, width = self.size_of(image)
        if (height * self.cell, width * self.cell) != image.shape[:2]:
            raise BankError(
                f"a mosaic of cells of {self.cell} x {self.cell} has cells that are cut"
            )
        if min(height, width) < self.size:
            raise BankError(
                f"a picture of {width} x {height} pixels is smaller than the "
                f"bank's {self.size} x {self.size} kernels"
            )
        return image

    def _working_planes(self, image: Array) -> Array:
        """Working planes in float64, (planes, h, w)."""
        tabled = self._working(image).astype(np.float64)
        if self.samples == 1:
            return tabled[None]
        if self.cell > 1:
            (h, w), c = self.size_of(image), self.cell
            cells = tabled.reshape(h, c, w, c).swapaxes(1, 2)
            tabled = cells.reshape(h, w, self.samples)
        if self._mix is not None:
            tabled = tabled @ self._mix.astype(np.float64).T
        return np.moveaxis(tabled, -1, 0)

    def _working(self, image: Array) -> Array:
        """Working values: the input table, or its formula for float pixels."""
        if self._table is not None:
            if self.bits < 8 * image.itemsize and int(image.max()) >> self.bits:
                raise BankError(f"a pixel code {int(image.max())} is beyond {self.pixels}")
            return self._table[image]
        table = self.manifest["input"]["table"]
        if table["kind"] == "identity":
            return image
        slope, offset, scale = (np.float32(table[k]) for k in ("slope", "offset", "scale"))
        return scale * np.sqrt(np.maximum(slope * image + offset, np.float32(0)))

    def _planes(self, image: Array, kernels: Sequence[int]) -> Array:
        """Some kernels' responses by numpy: float64 sums, rounded once."""
        planes = self._working_planes(image)
        return self._sums(planes, self.taps[list(kernels)], np.float32)

    def _sums(self, planes: Array, some: Array, dtype: Any) -> Array:
        """Correlations with working planes (planes, h, w), summed in float64."""
        h, w = planes.shape[1:]
        mode: Any = PAD_MODES[self.border]
        padded = [np.pad(plane, self.radius, mode=mode) for plane in planes]
        area = self.size**2
        some = some.reshape(-1, area, len(planes)).astype(np.float64)
        out = np.empty((len(some), h, w), dtype)
        step = max(1, BAND_VALUES // (w * area))
        for top in range(0, h, step):
            sums: Array = 0.0
            for plane, taps in zip(padded, np.moveaxis(some, -1, 0), strict=True):
                rows = plane[top : min(top + step, h) + 2 * self.radius]
                view = np.lib.stride_tricks.sliding_window_view(rows, (self.size, self.size))
                sums = sums + taps @ view.reshape(-1, area).T
            out[:, top : top + step] = sums.reshape(len(some), -1, w)
        return out

    # ------------------------------------------------------------ edges

    def strengths(
        self, image: Array, scale: int, threads: int = 1, fixed: bool = False
    ) -> tuple[Array, Array]:
        """Strength of one scale and the number of the winning direction.

        Parameters
        ----------
        image : as :meth:`responses`
        scale : one of ``scales``
        threads : as :meth:`responses`
        fixed : in 16-bit fixed point

        Returns
        -------
        float32 (h, w), uint8 (h, w)

        Raises
        ------
        BankError : the picture does not fit the bank, or there is no such scale.
        """
        image = self._checked(image)
        if scale not in self.scales:
            raise BankError(f"bank {self.name} has no scale {scale}")
        if fixed:
            self._need_fixed()
        if self.compiled is not None:
            return self.compiled.edges(image, self.scales.index(scale), threads, fixed)
        if fixed:
            return self._strengths_fixed(image, scale)
        best = np.full(self.size_of(image), -1, np.float32)
        winner = np.zeros(best.shape, np.uint8)
        for turn, members in self._members[scale]:
            planes = self._planes(image, members)
            size = np.abs(planes[0]) if len(planes) == 1 else planes[0] ** 2 + planes[1] ** 2
            winner[size > best] = turn
            np.maximum(best, size, out=best)
        return (np.sqrt(best) if self.strength == "energy" else best), winner

    def _strengths_fixed(self, image: Array, scale: int) -> tuple[Array, Array]:
        best = np.full(image.shape, -1, np.int32)
        winner = np.zeros(image.shape, np.uint8)
        for turn, members in self._members[scale]:
            planes = self._counts(image, members).astype(np.int32)
            size = np.abs(planes[0]) if len(planes) == 1 else planes[0] ** 2 + planes[1] ** 2
            winner[size > best] = turn
            np.maximum(best, size, out=best)
        strength = best.astype(np.float32)
        if self.strength == "energy":
            strength = np.sqrt(strength)
        return self._need_fixed().step[self._members[scale][0][1][0]] * strength, winner

    def threshold(self, rate: float = RATE) -> float:
        """The strength that promises ``rate`` false elements per megapixel of flat picture.

        Raises
        ------
        BankError : the bank has no thresholds, or the rate is beyond them.
        """
        known = self.manifest["thresholds"]
        if known is None:
            raise BankError(f"bank {self.name} has no thresholds; give threshold= instead")
        rates = np.array(known["false_edges_per_megapixel"], dtype=np.float64)
        strength = np.array(known["strength"], dtype=np.float64)
        if not rates[0] <= rate <= rates[-1]:
            raise BankError(
                f"{rate:g} false edges per megapixel is outside this bank's thresholds; "
                f"ask for {rates[0]:g} to {rates[-1]:g}"
            )
        return math.sqrt(float(np.interp(math.log(rate), np.log(rates), strength**2)))

    def edges(
        self,
        image: Array,
        rate: float | None = None,
        threshold: float | None = None,
        threads: int = 1,
        invalid: Array | None = None,
        fixed: bool = False,
    ) -> Edges:
        """Edges of one picture.

        Parameters
        ----------
        image : as :meth:`responses`
        rate : false elements per megapixel of flat picture; 10 when nothing is given
        threshold : a strength instead of a rate
        threads : as :meth:`responses`
        invalid : bool (h, w); elements whose kernel touches such a pixel are dropped
        fixed : strengths in 16-bit fixed point

        Returns
        -------
        Edges

        Raises
        ------
        BankError : the picture does not fit, the bank finds no edges, both or neither are known.
        """
        image = self._checked(image)
        rules = self._rules()
        high = self._high(rate, threshold)
        low = float(rules["hysteresis"]) * high
        maps = [self.strengths(image, s["scale"], threads, fixed) for s in rules["scales"]]
        planes = [
            _candidates(strength, turn, about, rules, low, self._rival(image, about, threads))
            for (strength, turn), about in zip(maps, rules["scales"], strict=True)
        ]
        for k, about in enumerate(rules["scales"]):
            if about["softer"] is not None:  # soft edges are left to an octave
                place, share, more = about["softer"]
                half = math.ceil(float(rules["scales"][place]["sigma_px"]))
                own, theirs = (_largest_around(maps[n][0], half) for n in (k, place))
                planes[k][own < np.float32(share) * theirs + np.float32(more)] = 0
        if invalid is not None:
            _drop(planes, _mask(invalid, image), rules)
        edges, level = _cascade(planes, low, high, [s["apart_px"] for s in rules["scales"]])
        return _joined(maps, [s["scale"] for s in rules["scales"]], edges, level, high)

    def edgels(
        self,
        image: Array,
        rate: float | None = None,
        threshold: float | None = None,
        line_threshold: float = 0.0,
    ) -> Array:
        """Edge elements of one picture, placed below the pixel. Only the library finds them.

        Parameters
        ----------
        image : as :meth:`responses`
        rate, threshold : as :meth:`edges`
        line_threshold : a strength from which lines are found beside steps; 0 looks for none

        Returns
        -------
        structured array of :data:`EDGEL`, row by row

        Raises
        ------
        BankError : as :meth:`edges`; no compiled library, or one that finds no edgels.
        """
        image = self._checked(image)
        high = self._high(rate, threshold)
        if self.compiled is None or not self.compiled.has_edgels:
            raise BankError(
                f"bank {self.name}: edgels take a compiled library that finds them; "
                f"compile {self.name}.c for this machine"
            )
        return self.compiled.edgels(image, high, float(line_threshold))

    def _rival(self, image: Array, about: Mapping[str, Any], threads: int) -> Array | None:
        """The largest response of the kernels that a scale's elements are held against."""
        kernels = about["rival_kernels"]
        if not kernels:
            return None
        if self.compiled is not None:
            planes = self.compiled.responses(image, threads)[kernels]
        else:
            planes = self._planes(image, kernels)
        return np.abs(planes).max(axis=0)

    def last_turn(self, scale: int) -> int:
        """The largest number that names a direction of a scale."""
        return max(turn for turn, _ in self._members[scale])

    def _high(self, rate: float | None, threshold: float | None) -> float:
        if threshold is None:
            return self.threshold(RATE if rate is None else rate)
        if rate is not None:
            raise BankError("give a rate or a threshold, not both")
        if not threshold > 0:
            raise BankError(f"the threshold must be positive, not {threshold:g}")
        return float(threshold)

    def _rules(self) -> dict[str, Any]:
        if "edges.json" not in self.manifest["files"]:
            raise BankError(f"bank {self.name} has no kernels that find edges")
        data = _read(self.folder, self.manifest, "edges.json")
        try:
            rules = _checked_rules(json.loads(data), self)
        except (KeyError, TypeError, ValueError, OverflowError, RecursionError):
            raise BankError(f"{self.folder / 'edges.json'}: makes no sense") from None
        return rules


def _checked_rules(given: Mapping[str, Any], bank: Bank) -> dict[str, Any]:
    """How strengths become edges, every number within its range; anything else is an error."""

    def number(value: Any, low: float, high: float) -> float:
        if not low <= float(value) <= high:
            raise ValueError("out of range")
        return float(value)

    scales = []
    for entry in given["scales"]:
        angles = [number(a, -7, 7) for a in entry["angles_rad"]]
        if entry["scale"] not in bank.scales or len(angles) < 1 + bank.last_turn(entry["scale"]):
            raise ValueError("does not fit the bank")
        scales.append(
            {
                "scale": int(entry["scale"]),
                "angles_rad": angles,
                "sigma_px": number(entry["sigma_px"], 0, bank.size),
                "reach_px": int(number(entry["reach_px"], 0, bank.radius)),
                "floor": number(entry["floor"], 0, 1),
                "rival_kernels": [
                    int(number(k, 0, len(bank.kernels) - 1)) for k in entry["rival_kernels"]
                ],
                "rival_share": number(entry["rival_share"], 0, 4),
                "softer": None
                if "softer" not in entry
                else (
                    int(number(entry["softer"][0], 0, len(given["scales"]) - 1)),
                    number(entry["softer"][1], 0, 1),
                    number(entry["softer"][2], 0, 4),
                ),
                "apart_px": int(number(entry.get("apart_px", given["dilation_px"]), 0, 64)),
            }
        )
    if not scales:
        raise ValueError("no scales")
    return {
        "hysteresis": number(given["hysteresis"], 1e-3, 1),
        "dilation_px": int(number(given["dilation_px"], 0, 64)),
        "window_sigmas": number(given["window_sigmas"], 0, 16),
        "scales": scales,
    }


def _members(
    kernels: Sequence[Mapping[str, Any]], strength: str
) -> dict[int, list[tuple[int, tuple[int, ...]]]]:
    """For every scale its directions, each with the kernels whose size is its strength."""
    found: dict[int, dict[str, list[tuple[int, int]]]] = {}
    for i, kernel in enumerate(kernels):
        if kernel["scale"] is not None and kernel["parity"] in PARITIES[strength]:
            sides = found.setdefault(int(kernel["scale"]), {})
            turn = int(kernel["orientation"] or 0)
            if not 0 <= turn <= 255:
                raise ValueError("an orientation is numbered from 0 to 255")
            sides.setdefault(kernel["parity"], []).append((turn, i))
    out = {}
    for scale, sides in found.items():
        if len(sides) == len(PARITIES[strength]):
            columns = [sorted(sides[p]) for p in PARITIES[strength]]
            turns = zip(*columns, strict=True)
            out[scale] = [(pair[0][0], tuple(i for _, i in pair)) for pair in turns]
    return out


def _angles(kernels: Sequence[Mapping[str, Any]], members: list[Any]) -> tuple[float, ...]:
    count = len(members)
    return tuple(
        float(kernels[own[-1]]["parameters"].get("theta_rad", math.pi * j / count))
        for j, (_, own) in enumerate(members)
    )


# ---------------------------------------------------------------- from strength to edges


def _beside(flat: Array, at: Array, turn: Array, angles: Array, width: int) -> Array:
    """Bilinear samples one pixel along ``angles[turn]``."""
    dx, dy = np.cos(angles), np.sin(angles)
    x0, y0 = np.where(dx < 0, -1, 0), np.where(dy < 0, -1, 0)
    corner = at + (y0 * width + x0).astype(np.int64)[turn]
    u, v = (dx - x0).astype(np.float32)[turn], (dy - y0).astype(np.float32)[turn]
    one = np.float32(1)
    upper = (one - u) * flat[corner] + u * flat[corner + 1]
    lower = (one - u) * flat[corner + width] + u * flat[corner + width + 1]
    return (one - v) * upper + v * lower


def _thin(strength: Array, turn: Array, angles: Array, floor: float) -> Array:
    """Local maxima along the winning normal; of two equal neighbours one stays."""
    keep = np.zeros(strength.shape, bool)
    if min(strength.shape) < 3:
        return keep
    look = np.zeros(strength.shape, bool)
    look[1:-1, 1:-1] = strength[1:-1, 1:-1] >= max(floor, 1e-30)
    at = np.flatnonzero(look)
    flat, width, turns = strength.ravel(), strength.shape[1], turn.ravel()[at]
    ahead = _beside(flat, at, turns, angles, width)
    behind = _beside(flat, at, turns, angles + np.pi, width)
    keep.ravel()[at[(flat[at] > ahead) & (flat[at] >= behind)]] = True
    return keep


def _candidates(
    strength: Array,
    turn: Array,
    about: Mapping[str, Any],
    rules: Mapping[str, Any],
    low: float,
    rival: Array | None,
) -> Array:
    """Strength of the thinned elements of one scale, 0 elsewhere."""
    keep = _thin(strength, turn, np.array(about["angles_rad"], dtype=np.float64), low)
    reach = int(about["reach_px"])
    if reach:
        inner = np.zeros_like(keep)
        inner[reach:-reach, reach:-reach] = True
        keep &= inner
    half = math.ceil(float(rules["window_sigmas"]) * float(about["sigma_px"]))
    # weak beside a strong one: a tail of another edge
    for field, share in ((strength, about["floor"]), (rival, about["rival_share"])):
        if field is not None and share:
            keep &= strength >= np.float32(share) * _largest_around(field, half)
    return np.where(keep, strength, np.float32(0))


def _mask(invalid: Array, image: Array) -> Array:
    if not isinstance(invalid, np.ndarray) or invalid.dtype != bool:
        raise BankError("invalid is an array of bool, one a pixel")
    if invalid.shape != image.shape:
        raise BankError(f"invalid is {invalid.shape}, the picture {image.shape}")
    return invalid


def _drop(planes: list[Array], invalid: Array, rules: Mapping[str, Any]) -> None:
    """Remove the elements whose kernel touches a pixel that does not count."""
    for plane, about in zip(planes, rules["scales"], strict=True):
        plane[_largest_around(invalid, int(about["reach_px"]))] = 0


def _largest_around(plane: Array, half: int) -> Array:
    """The largest value of every (2 half + 1) square, the rim repeated outwards."""
    out, size = np.pad(plane, half, mode="edge"), 2 * half + 1
    for axis in (0, 1):
        out = np.moveaxis(out, axis, 0)
        length, span = out.shape[0] - size + 1, 1
        while 2 * span <= size:
            out = np.maximum(out[:-span], out[span:])
            span *= 2
        out = np.maximum(out[:length], out[size - span : size - span + length])
        out = np.moveaxis(out, 0, axis)
    return out


def _hysteresis(strength: Array, low: float, high: float) -> Array:
    """Elements of ``low`` or more that hang together with one of ``high`` or more."""
    weak = np.pad(strength >= low, 1)
    keep = np.pad(strength >= high, 1)
    width = weak.shape[1]
    near = np.array([dy * width + dx for dy in (-1, 0, 1) for dx in (-1, 0, 1) if dy or dx])
    front = np.flatnonzero(keep)
    while front.size:
        more = (front[:, None] + near).ravel()
        front = np.unique(more[weak.ravel()[more] & ~keep.ravel()[more]])
        keep.ravel()[front] = True
    return keep[1:-1, 1:-1]


def _dilate(mask: Array, radius: int) -> Array:
    out = mask.copy()
    h, w = mask.shape
    for dy in range(-radius, radius + 1):
        for dx in range(-radius, radius + 1):
            if 0 < dx * dx + dy * dy < (radius + 0.5) ** 2:
                to = np.s_[max(dy, 0) : h + min(dy, 0), max(dx, 0) : w + min(dx, 0)]
                at = np.s_[max(-dy, 0) : h + min(-dy, 0), max(-dx, 0) : w + min(-dx, 0)]
                out[to] |= mask[at]
    return out


def _cascade(planes: list[Array], low: float, high: float, apart: list[int]) -> tuple[Array, Array]:
    """Finest scale first; a coarser one adds only where finer ones found nothing."""
    edges = _hysteresis(planes[0], low, high)
    level = np.zeros(edges.shape, np.uint8)
    for k, plane in enumerate(planes[1:], 1):
        more = _hysteresis(plane, low, high) & ~_dilate(edges, apart[k])
        edges |= more
        level[more] = k
    return edges, level


def _joined(
    maps: list[tuple[Array, Array]], scales: list[int], edges: Array, level: Array, high: float
) -> Edges:
    strength, turn = maps[0][0].copy(), maps[0][1].copy()
    scale = np.full(edges.shape, scales[0], np.uint8)
    for k, (size, direction) in enumerate(maps[1:], 1):
        take = np.where(edges, level == k, size > strength)
        strength[take], turn[take], scale[take] = size[take], direction[take], scales[k]
    return Edges(edges, strength, turn, scale, high)


# ---------------------------------------------------------------- the compiled library


def _machine() -> str:
    machine = platform.machine().lower().replace("amd64", "x86_64").replace("arm64", "aarch64")
    return f"{machine or 'unknown'}-{platform.system().lower() or 'unknown'}"


def _library_file(name: str) -> str:
    names = {"Windows": f"{name}.dll", "Darwin": f"lib{name}.dylib"}
    return names.get(platform.system(), f"lib{name}.so")


class _Library:
    """The compiled code, loaded from bytes whose hash was checked."""

    def __init__(self, bank: Bank, data: bytes) -> None:
        self.kernels, self.name, self.size_of = len(bank.kernels), bank.name, bank.size_of
        self._code = _open(data, bank.name)
        pointer, stride, number = ctypes.c_void_p, ctypes.c_ssize_t, ctypes.c_int
        picture = [pointer, stride, number, number, number, number]
        self._scratch = self._function("scratch_bytes", ctypes.c_size_t, number, number)
        self._message = self._function("message", ctypes.c_char_p, number)
        self._responses = self._function(
            "responses_rows", number, *picture, pointer, stride, stride, pointer
        )
        self._edges = self._function(
            "edges_rows", number, *picture, number, pointer, stride, pointer, stride, pointer
        )
        if bank.fixed is not None:
            self._counts = self._function(
                "responses_q_rows", number, *picture, pointer, stride, stride, pointer, pointer
            )
            self._edges_q = self._function(
                "edges_q_rows", number, *picture, number, pointer, stride, pointer, stride, pointer
            )
        self.has_edgels = hasattr(self._code, f"{self.name}_edgels")
        if self.has_edgels:
            size, real = ctypes.c_size_t, ctypes.c_double
            self._edgels_scratch = self._function("edgels_scratch_bytes", size, number, number)
            self._edgels = self._function(
                "edgels", number, *picture[:4], real, real, pointer, size, pointer, pointer
            )
        if self._function("abi", number)() != bank.manifest["interface"]:
            raise BankError(f"the library in {bank.folder} belongs to another bank")

    def _function(self, name: str, result: Any, *arguments: Any) -> Any:
        try:
            function = getattr(self._code, f"{self.name}_{name}")
        except AttributeError:
            raise BankError(f"the library has no {self.name}_{name}") from None
        function.restype, function.argtypes = result, list(arguments)
        return function

    def responses(self, image: Array, threads: int) -> Array:
        out = np.empty((self.kernels, *self.size_of(image)), np.float32)

        def band(place: tuple[Any, ...], first: int, count: int, scratch: Array) -> int:
            to = out.ctypes.data + first * out.strides[1]
            strides = out.strides[1], out.strides[0]
            code = self._responses(*place, first, count, to, *strides, scratch.ctypes.data)
            return int(code)

        self._run(image, threads, band)
        return out

    def responses_fixed(self, image: Array, threads: int) -> tuple[Array, int]:
        out, ends = np.empty((self.kernels, *image.shape), np.int16), []

        def band(place: tuple[Any, ...], first: int, count: int, scratch: Array) -> int:
            found = ctypes.c_uint64(0)
            code = self._counts(
                *place, first, count, out.ctypes.data + first * out.strides[1], out.strides[1],
                out.strides[0], ctypes.addressof(found), scratch.ctypes.data,
            )  # fmt: skip
            ends.append(int(found.value))
            return int(code)

        self._run(image, threads, band)
        return out, sum(ends)

    def edges(
        self, image: Array, place_of_scale: int, threads: int, fixed: bool
    ) -> tuple[Array, Array]:
        call = self._edges_q if fixed else self._edges
        size = self.size_of(image)
        strength, turn = np.empty(size, np.float32), np.empty(size, np.uint8)

        def band(place: tuple[Any, ...], first: int, count: int, scratch: Array) -> int:
            code = call(
                *place, first, count, place_of_scale,
                strength[first:].ctypes.data, strength.strides[0],
                turn[first:].ctypes.data, turn.strides[0], scratch.ctypes.data,
            )  # fmt: skip
            return int(code)

        self._run(image, threads, band)
        return strength, turn

    def edgels(self, image: Array, high: float, lines: float) -> Array:
        image, place = self._placed(image)
        scratch = np.empty(self._edgels_scratch(*place[2:]), np.uint8)
        count, capacity = ctypes.c_size_t(0), image.size // 2
        while True:
            out = np.empty(capacity, EDGEL)
            code = self._edgels(
                *place, high, lines, out.ctypes.data, capacity, ctypes.addressof(count),
                scratch.ctypes.data,
            )  # fmt: skip
            if count.value <= capacity:
                self._check(code)
                return out[: count.value].copy()
            capacity = count.value

    def _placed(self, image: Array) -> tuple[Array, tuple[int, int, int, int]]:
        """A picture whose rows the code can walk, with its address, row stride, width, height."""
        if not image[0].flags.c_contiguous or abs(image.strides[0]) < image[0].nbytes:
            image = np.ascontiguousarray(image)
        h, w = self.size_of(image)
        return image, (image.ctypes.data, image.strides[0], w, h)

    def _check(self, code: int) -> None:
        if code:
            raise BankError(f"bank {self.name}: {self._message(code).decode('ascii')}")

    def _run(self, image: Array, threads: int, band: Any) -> None:
        image, place = self._placed(image)
        w, h = place[2:]

        def one(rows: tuple[int, int]) -> int:
            return int(band(place, *rows, np.empty(self._scratch(w, h), np.uint8)))

        bands = list(_bands(h, max(1, threads)))
        if len(bands) == 1:
            codes = [one(bands[0])]
        else:
            with ThreadPoolExecutor(len(bands)) as pool:
                codes = list(pool.map(one, bands))
        for code in codes:
            self._check(code)


def _bands(height: int, count: int) -> Iterator[tuple[int, int]]:
    """(first row, rows) of up to ``count`` bands."""
    seams = [height * i // count for i in range(count + 1)]
    for first, end in itertools.pairwise(seams):
        if end > first:
            yield first, end - first


def _open(data: bytes, name: str) -> ctypes.CDLL:
    """Load a library from bytes by way of a private file, gone afterwards where possible."""
    handle, path = tempfile.mkstemp(prefix=f"{name}-", suffix=".dll" if os.name == "nt" else ".so")
    try:
        with os.fdopen(handle, "wb") as file:
            file.write(data)
        return ctypes.CDLL(path)
    except OSError as error:
        raise BankError(f"the library does not load here ({error}); load with library=False") from (
            None
        )
    finally:
        with contextlib.suppress(OSError):  # Windows keeps a loaded file until the process ends
            os.unlink(path)


# ---------------------------------------------------------------- files


def _manifest(folder: Path) -> dict[str, Any]:
    path = folder / MANIFEST
    try:
        head = json.loads(_bytes(path))
    except FileNotFoundError:
        raise BankError(f"{folder}: there is no bank here") from None
    except (OSError, ValueError, RecursionError) as error:
        raise BankError(f"{path}: cannot be read ({type(error).__name__})") from None
    if not isinstance(head, dict) or head.get("format") != "patchlab" or head.get("kind") != "bank":
        raise BankError(f"{path}: this is not a bank's manifest")
    if str(head.get("version", "")).split(".")[0] != "1":
        version = str(head.get("version"))[:20]
        raise BankError(f"{path}: its format version {version!r} is not known here")
    content = {k: v for k, v in head.items() if k != "id"}
    try:
        text = json.dumps(content, sort_keys=True, indent=1, ensure_ascii=False, allow_nan=False)
        own = hashlib.sha256((text + "\n").encode()).hexdigest()[:16]
    except ValueError:
        own = ""
    if own != head.get("id"):
        raise BankError(f"{path}: was changed after it was written")
    if not isinstance(head.get("files"), dict):
        raise BankError(f"{path}: lists no files")
    return head


def _bytes(path: Path) -> bytes:
    if path.exists() and not path.is_file():  # a pipe or a device would never end
        raise OSError(0, "it is not a plain file")
    return path.read_bytes()


def _read(folder: Path, head: Mapping[str, Any], name: str) -> bytes:
    """A file of the bank, by one of the names this module asks for, after its hash was checked."""
    try:
        data = _bytes(folder / name)
    except OSError as error:
        raise BankError(f"{folder / name}: cannot be read ({error.strerror})") from None
    if hashlib.sha256(data).hexdigest() != head["files"].get(name):
        raise BankError(f"{folder / name}: was changed after it was written")
    return data


def _npy(data: bytes, where: Path) -> Array:
    """The array in a ``.npy`` file: no pickle, and no more than the bytes that are there."""
    try:
        file = io.BytesIO(data)
        np.lib.format.read_magic(file)
        shape, _, dtype = np.lib.format.read_array_header_1_0(file)
        if dtype.hasobject or math.prod(shape) * dtype.itemsize != len(data) - file.tell():
            raise ValueError("its header does not fit its size")
        file.seek(0)
        return np.lib.format.read_array(file, allow_pickle=False)
    except Exception as error:  # numpy's reader raises many kinds over a damaged header
        raise BankError(f"{where}: is not a plain array ({type(error).__name__})") from None


def _identifier(name: Any) -> str:
    if not isinstance(name, str) or not re.fullmatch(r"[A-Za-z_][A-Za-z0-9_]{0,62}", name):
        raise BankError("a name in the manifest is not an identifier")
    return name


def _known(value: Any, known: Mapping[str, Any], what: str) -> str:
    if value not in known:
        raise BankError(f"{what} {str(value)[:40]!r} is not known here")
    return str(value)
