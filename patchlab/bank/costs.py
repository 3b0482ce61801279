"""What a plan costs: its counted work, and a model of the time that the work takes.

Work is counted for each pixel of the picture, whole bank:

- multiplies, adds: as they stand in the sums; most additions ride on a fused multiply-add;
- loads: values read for the sums (basis values once for each group of products that shares them,
  what
  was kept in between, products at the joins); coefficients are not counted, a vector of pixels
  shares them;
- stores: values kept in between and planes written.

The model is a price for each: multiplies (with the addition that rides on it), additions that ride
on none, loads, stores of planes, and operations of transforms, which the compiler keeps in
registers less well. The standing prices were fitted on an x86-64 core with AVX-512 by ``patchlab
bench --calibrate``, which fits them anew on any machine: non-negative least squares on relative
errors (Lawson & Hanson 1974) over banks that strain each of them. A plan records the prices that
chose it.
"""

from __future__ import annotations

import math
from collections.abc import Iterable, Mapping, Sequence
from dataclasses import dataclass, fields
from typing import Any

import numpy as np

from patchlab.bank.halved import BLOCK, Halved
from patchlab.bank.products import GROUP, Product, Sum
from patchlab.bank.tile_fft import LENGTH, TileFFT
from patchlab.bank.tile_fft import work as tile_work
from patchlab.errors import InputError

CHUNK = 64
"""Output pixels that compiled code computes together (as in the C source)."""


@dataclass(frozen=True)
class Work:
    """Operations for each pixel, whole bank; see the top of this file."""

    multiplies: float = 0.0
    adds: float = 0.0
    loads: float = 0.0
    stores: float = 0.0
    transforms: float = 0.0

    def __add__(self, other: Work) -> Work:
        return Work(*(getattr(self, f.name) + getattr(other, f.name) for f in fields(self)))

    def times(self, share: float) -> Work:
        """The same work on another share of the pixels."""
        return Work(*(getattr(self, f.name) * share for f in fields(self)))

    def priced(self) -> tuple[float, ...]:
        """What the prices are for, in their order."""
        lone = max(self.adds - self.multiplies, 0.0)
        return self.multiplies, lone, self.loads, self.stores, self.transforms, 1.0


@dataclass(frozen=True)
class Costs:
    """Prices in nanoseconds; ``fill`` is for each pixel, the input table and what goes with it."""

    multiply: float
    add: float
    load: float
    store: float
    transform: float
    fill: float

    def time(self, work: Work) -> float:
        """Nanoseconds a pixel."""
        prices = (getattr(self, f.name) for f in fields(self))
        return float(sum(p * n for p, n in zip(prices, work.priced(), strict=True)))

    def beyond_fill(self, work: Work) -> float:
        """Nanoseconds a pixel of this work alone, where others fill in the working values."""
        return self.time(work) - self.fill

    def plain(self) -> dict[str, float]:
        """As plain data for the manifest and for a file."""
        return {f.name: float(getattr(self, f.name)) for f in fields(self)}


def read_costs(found: Any, where: str) -> Costs:
    """Prices from plain data.

    Raises
    ------
    InputError : something else than one non-negative, finite number for each price.
    """
    names = {f.name for f in fields(Costs)}
    if not isinstance(found, Mapping) or set(found) != names:
        raise InputError(
            "these are no prices of a cost model",
            where=where,
            remedy="write them with patchlab bench --calibrate",
        )
    prices = {}
    for name, value in found.items():
        number = isinstance(value, int | float) and not isinstance(value, bool)
        if not number or not math.isfinite(value) or not 0 <= value <= 1e6:
            raise InputError(f"the price {name!r} is not a number from 0 to a million", where=where)
        prices[name] = float(value)
    return Costs(**prices)


STANDING = Costs(0.0065, 0.001, 0.014, 0.003, 0.008, 0.8)
"""Prices when none are given."""


def fitted(work: Sequence[Work], measured: Sequence[float]) -> tuple[Costs, float]:
    """Prices from measured times.

    Parameters
    ----------
    work : of every plan that was timed
    measured : its nanoseconds a pixel

    Returns
    -------
    Costs, and the largest relative error of the model on these plans
    """
    from scipy.optimize import nnls

    times = np.asarray(measured, dtype=np.float64)
    rows = np.array([w.priced() for w in work], dtype=np.float64)
    prices, _ = nnls(rows / times[:, None], np.ones(len(times)))
    error = float(np.abs(rows @ prices / times - 1).max())
    return Costs(*(float(p) for p in prices)), error


# ---------------------------------------------------------------- counting


def of_products(
    products: Sequence[Product],
    groups: Iterable[Sequence[int]],
    sums: Iterable[Sum],
    radius: int,
    *,
    among: bool = False,
) -> Work:
    """Products in their groups, the folded rows they read, and the joins of the sums.

    ``among`` others of their kind, in a larger bank, they share folded rows and full groups.
    """
    groups = [list(g) for g in groups]
    wide = _line(radius) / CHUNK
    total = Work()
    rows_read = set()
    for group in groups:
        first = products[group[0]]
        rows = first.exact.shape[-2]
        if first.basis != "all":
            rows_read.add((first.plane, first.basis[0], rows - (first.basis[0] == "e")))
        shared = len(group) / GROUP if among else 1.0
        make = _separable if first.factors else _dense
        total += make(len(group), first, wide, shared)
    rows_added = sum(count for _, _, count in rows_read) * wide * (not among)
    total += Work(adds=rows_added, loads=2 * rows_added, stores=rows_added)
    for terms in sums:
        join = max(len(terms) - 1, 0)
        total += Work(adds=join, loads=len(terms))
    return total


def _dense(n: int, first: Product, wide: float, shared: float) -> Work:
    rows, cols = first.exact.shape[-2:]
    lone = 0 if first.basis == "all" else rows * (cols - (first.basis[1] == "e"))
    size = first.exact.size
    return Work(n * size, n * (size - 1) + shared * lone, shared * (size + lone), n)


def _separable(n: int, first: Product, wide: float, shared: float) -> Work:
    """Columns over the chunk and its halo, then rows."""
    rows, cols = first.exact.shape
    lone = 0 if first.basis == "all" else cols - (first.basis[1] == "e")
    down = Work(n * rows, n * (rows - 1), shared * rows, n).times(wide)
    return down + Work(n * cols, n * (cols - 1 + lone), n * (cols + lone), n)


def _line(radius: int) -> int:
    return -(-(CHUNK + 2 * radius) // 16) * 16


def of_mixing(planes: int, samples: int) -> Work:
    """Working planes as weighted sums of a pixel's samples."""
    return Work(planes * samples, planes * (samples - 1), samples, planes)


def of_planes(kernels: int) -> Work:
    """Planes that are written."""
    return Work(loads=kernels, stores=kernels)


def of_tiles(tiles: TileFFT) -> Work:
    """Tile transforms: the products of spectra are fused, the transforms are not."""
    count, rows = len(tiles.kernels), tiles.rows
    multiplies, adds = tile_work(tiles.size, count)
    product = 4 * tiles.size * (LENGTH // 2 + 1) * count / rows
    # a pair of kernels loads each value once, and keeps a spectrum in between
    between = count * 2 * (LENGTH + 2) / rows
    return Work(
        multiplies, adds, product / 4 + between, between + count * LENGTH / rows,
        (multiplies - product) + (adds - product),
    )  # fmt: skip


def of_halved(halved: Halved) -> Work:
    """Halving, the small kernels' products, and the interpolation of each kernel."""
    p, count = halved.flatness, len(halved.kernels)
    columns = CHUNK - 2 * p
    width, rows = 2 * columns, BLOCK // 2 + 2 * p - 1
    pixels = BLOCK * width
    small = of_products(halved.products, halved.groups, halved.sums, halved.radius)
    small = (small + of_planes(count)).times(rows * CHUNK / pixels)
    taps, line = 2 * p + 1, _line(halved.radius)
    halves = rows + 2 * halved.radius
    down = halves * (2 * line + 4 * p) + halves * line
    halving = Work(taps, taps - 1, taps, 1).times(down / pixels)
    # half of the rows between others, then half of the columns
    between = (BLOCK // 2 * CHUNK + BLOCK * CHUNK) / pixels
    up = Work(2 * p, 2 * p - 1, 2 * p, 1).times(count * between) + Work(stores=count)
    return small + halving + up
