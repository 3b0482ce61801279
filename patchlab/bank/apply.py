"""The in-process engine: a bank applied in float32 with numpy alone.

It follows a plan in bands of rows that fit in the cache. Every step is an
elementwise numpy operation in a fixed order, so the same picture gives the same
bits on every machine, whatever the number of threads or the size of the bands.
"""

from __future__ import annotations

import functools
from collections.abc import Callable, Iterator
from functools import partial
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.bank.plan import make_plan
from patchlab.bank.planes import mixed
from patchlab.bank.products import EVERY
from patchlab.bank.reference import check_picture
from patchlab.conventions import border_index
from patchlab.errors import UsageError
from patchlab.types import F32, Bank, Plan

BAND_PIXELS = 12_288
"""Pixels of a band: its intermediate planes (48 kB each) stay in the second-level cache."""


def responses(bank: Bank, pixels: NDArray[Any], plan: Plan | None = None) -> F32:
    """Responses of every kernel of a bank.

    Parameters
    ----------
    bank : Bank
    pixels : ndarray (h, w) of the contract's dtype, both sides at least ``bank.size``
    plan : Plan, optional
        Made from the bank when not given.

    Returns
    -------
    float32 ndarray (n, h, w), within ``plan.error_bound`` of the exact responses

    Raises
    ------
    InputError : the picture does not fit the bank.
    """
    check_picture(bank, pixels)
    plan = plan or make_plan(bank)
    size = bank.contract.format.size_of(pixels)
    out = np.empty((len(bank), *size), dtype=np.float32)
    every = range(len(bank))
    for rows, planes in _bands(bank, plan, pixels, every):
        for index in every:
            out[index, rows] = planes(index)
    return out


def strength(
    bank: Bank, pixels: NDArray[Any], scale: int, plan: Plan | None = None
) -> tuple[F32, NDArray[np.uint8]]:
    """Strength of one scale and the direction that won, without keeping the planes.

    Parameters
    ----------
    bank : Bank
    pixels : ndarray (h, w) of the contract's dtype
    scale : position among ``bank.scales``, 0 the finest
    plan : Plan, optional
        Made from the bank when not given.

    Returns
    -------
    float32 ndarray (h, w) and uint8 ndarray (h, w), as in
    :func:`patchlab.bank.reference.strength`

    Raises
    ------
    InputError, UsageError : the picture does not fit, or there is no such scale.
    """
    check_picture(bank, pixels)
    plan = plan or make_plan(bank)
    scales = plan.detail["strength"]
    if not 0 <= scale < len(scales):
        raise UsageError(f"scale {scale} is not in this bank, which has {len(scales)}")
    members = scales[scale]
    out = np.empty(bank.contract.format.size_of(pixels), dtype=np.float32)
    turns = np.empty(out.shape, dtype=np.uint8)
    needed = [i for _, even, odd in members for i in (even, odd) if i is not None]
    for rows, planes in _bands(bank, plan, pixels, needed):
        best, winner = out[rows], turns[rows]
        best.fill(-1)
        for turn, even, odd in members:
            value = _magnitude(planes, even, odd)
            np.copyto(winner, np.uint8(turn), where=value > best)
            np.maximum(best, value, out=best)
        if bank.strength == "energy":
            np.sqrt(best, out=best)
    return out, turns


def _magnitude(planes: Callable[[int], F32], even: int | None, odd: int | None) -> F32:
    """Absolute response, or the energy's square."""
    if even is None or odd is None:
        return np.abs(planes(odd if even is None else even))  # type: ignore[arg-type]
    e, o = planes(even), planes(odd)
    return np.asarray(e * e + o * o)


def _bands(
    bank: Bank, plan: Plan, pixels: NDArray[Any], needed: Any
) -> Iterator[tuple[slice, Callable[[int], F32]]]:
    """Bands of rows, each with a function from kernel index to its (rows, w) response."""
    samples = bank.contract.format.split(pixels)
    h, w = samples.shape[:2]
    wanted = {p for index in needed for p, _ in plan.detail["sums"][index]}
    groups = [g for g in plan.detail["product_groups"] if wanted.intersection(g)]
    step = max(1, BAND_PIXELS // w)
    for top in range(0, h, step):
        count = min(step, h - top)
        padded = _working_rows(bank, samples, top, count)
        products: dict[int, F32] = {}
        folds: list[dict[tuple[str, int], F32]] = [{} for _ in padded]
        for group in groups:
            basis, plane = plan.detail["bases"][group[0]], plan.detail["planes"][group[0]]
            factors = [plan.detail["factors"][p] for p in group]
            if factors[0] is None:
                taps = np.stack([plan.detail["coefficients"][p] for p in group])
                sums = _whole(padded, plane, basis, taps, bank.radius, folds)
            else:
                sums = _separable(padded[plane], basis, factors, bank.radius, folds[plane])
            products.update(zip(group, sums, strict=True))
        joined = partial(_joined, plan, products, (count, w))
        yield slice(top, top + count), joined


def _whole(
    padded: list[F32],
    plane: int,
    basis: str,
    taps: F32,
    radius: int,
    folds: list[dict[tuple[str, int], F32]],
) -> Any:
    """Products of one working plane, or of every plane, added in the planes' order."""
    if plane != EVERY:
        return _products(padded[plane], basis, taps, radius, folds[plane])
    parts = (
        _products(p, basis, np.ascontiguousarray(taps[:, m]), radius, {})
        for m, p in enumerate(padded)
    )
    return functools.reduce(np.add, parts)


def _joined(plan: Plan, products: dict[int, F32], shape: tuple[int, int], kernel: int) -> F32:
    """A kernel's response in a band: its signed sum of products."""
    terms = plan.detail["sums"][kernel]
    if not terms:
        return np.zeros(shape, dtype=np.float32)
    (first, sign), *rest = terms
    total = products[first] if sign > 0 else -products[first]
    for product, sign in rest:
        total = total + products[product] if sign > 0 else total - products[product]
    return total


def _working_rows(bank: Bank, samples: NDArray[Any], top: int, count: int) -> list[F32]:
    """Working values of some rows (h, w, samples) with their halo, (count + 2c, w + 2c) each."""
    rows = border_index(
        bank.border, np.arange(top - bank.radius, top + count + bank.radius), samples.shape[0]
    )
    tabled = bank.table.apply(samples[np.maximum(rows, 0)])
    return [_haloed(bank, plane, rows) for plane in mixed(bank, tabled)]


def _haloed(bank: Bank, plane: F32, rows: NDArray[np.int64]) -> F32:
    """Rows of one working plane with their columns outside the picture."""
    c, w = bank.radius, plane.shape[1]
    out = np.empty((len(rows), w + 2 * c), dtype=np.float32)
    out[:, c : c + w] = plane
    out[rows < 0] = 0
    rim = np.concatenate([np.arange(-c, 0), np.arange(w, w + c)])
    source = border_index(bank.border, rim, w)
    out[:, rim + c] = np.where(source < 0, 0, out[:, np.maximum(source, 0) + c])
    return out


def _products(padded: F32, basis: str, taps: F32, c: int, folds: dict[tuple[str, int], F32]) -> F32:
    """A group of products with one basis, (products, rows, w)."""
    shape = padded.shape[0] - 2 * c, padded.shape[1] - 2 * c
    total = np.zeros((taps.shape[0], *shape), dtype=np.float32)
    scaled = np.empty_like(total)
    value = np.empty(shape, dtype=np.float32)
    factors = np.ascontiguousarray(taps.transpose(1, 2, 0))[..., None, None]
    # the taps as they are may reach less far than the bank's kernels; they stay centred
    top, left = ((c - n // 2) * (basis == "all") for n in taps.shape[1:])
    for j, row in enumerate(factors, top):
        lines = _fold_rows(padded, basis, j, c, shape[0], folds)
        for i, factor in enumerate(row, left):
            np.multiply(factor, _fold_columns(lines, basis, i, c, value), out=scaled)
            np.add(total, scaled, out=total)
    return total


def _separable(
    padded: F32, basis: str, factors: Any, c: int, folds: dict[tuple[str, int], F32]
) -> F32:
    """A group of separable products: columns first, then along the rows; (products, rows, w)."""
    shape = padded.shape[0] - 2 * c, padded.shape[1] - 2 * c
    total = np.zeros((len(factors), *shape), dtype=np.float32)
    value = np.empty(shape, dtype=np.float32)
    for out, (column, row) in zip(total, factors, strict=True):
        top, left = ((c - n.size // 2) * (basis == "all") for n in (column, row))
        lines = np.zeros((shape[0], padded.shape[1]), dtype=np.float32)
        for j, factor in enumerate(column, top):
            lines += factor * _fold_rows(padded, basis, j, c, shape[0], folds)
        for i, factor in enumerate(row, left):
            out += factor * _fold_columns(lines, basis, i, c, value)
    return total


def _fold_rows(
    padded: F32, basis: str, j: int, c: int, count: int, folds: dict[tuple[str, int], F32]
) -> F32:
    """Rows y + j and y - j added or subtracted, made once a band."""
    if basis == "all":
        return padded[j : j + count]
    even = basis[0] == "e"
    j += not even
    key = (basis[0], j)
    if key not in folds:
        below, above = padded[c + j : c + j + count], padded[c - j : c - j + count]
        folds[key] = below if j == 0 else below + above if even else below - above
    return folds[key]


def _fold_columns(lines: F32, basis: str, i: int, c: int, out: F32) -> F32:
    """Columns x + i and x - i added or subtracted."""
    w = lines.shape[1] - 2 * c
    if basis == "all":
        return lines[:, i : i + w]
    even = basis[1] == "e"
    i += not even
    right = lines[:, c + i : c + i + w]
    if i == 0:
        return right
    left = lines[:, c - i : c - i + w]
    return np.add(right, left, out=out) if even else np.subtract(right, left, out=out)
