"""Working planes: what a bank's kernels are correlated with, of one plane or of colours.

Every sample of a pixel goes through the input table. The working planes of a colour bank are
weighted sums of a pixel's tabled samples, the rows of ``Bank.mix``, or the samples themselves. A
kernel that is a product of a direction of colour and a spatial kernel reads one working plane
and nothing else, so it costs what a monochrome kernel costs.
"""

from __future__ import annotations

from collections.abc import Mapping
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.errors import InputError, UsageError
from patchlab.types import F32, F64, Bank

AXES: Mapping[str, tuple[float, float, float]] = {
    "blue_yellow": (-1.0, -1.0, 2.0),
    "red_green": (1.0, -1.0, 0.0),
}
"""Directions in (R, G, B) that the opponent planes start from; grey gives 0 in both."""


def check_picture(bank: Bank, pixels: NDArray[Any]) -> None:
    """Refuse a picture that this bank cannot take.

    Raises
    ------
    InputError : not one picture of the bank's format, or a side shorter than the kernels'.
    """
    form = bank.contract.format
    if form.interleaved:
        if pixels.ndim != 3 or pixels.shape[2] != form.planes:
            raise InputError(
                f"a picture is (h, w, {form.planes}), not an array of shape {pixels.shape}"
            )
    elif pixels.ndim != 2:
        raise InputError(f"a picture is one plane (h, w), not an array of shape {pixels.shape}")
    if pixels.dtype != np.dtype(form.dtype):
        raise InputError(
            f"bank {bank.name} takes {form.name} pixels ({form.dtype}), not {pixels.dtype}",
            remedy="convert the picture, or make a bank for this camera's format",
        )
    if pixels.shape[0] % form.cell or pixels.shape[1] % form.cell:
        raise InputError(
            f"a mosaic of {pixels.shape[1]} x {pixels.shape[0]} samples has cells that are cut",
            remedy=f"give a multiple of {form.cell} rows and columns",
        )
    height, width = form.size_of(pixels)
    if min(height, width) < bank.size:
        raise InputError(
            f"a picture of {width} x {height} pixels is smaller than the "
            f"bank's {bank.size} x {bank.size} kernels",
            remedy="both sides must be at least as long as a kernel's",
        )


def exact_planes(bank: Bank, pixels: NDArray[Any]) -> F64:
    """Working planes of a picture in float64, (h, w, planes)."""
    tabled = bank.table.apply(bank.contract.format.split(pixels)).astype(np.float64)
    return tabled if bank.mix is None else tabled @ bank.mix.astype(np.float64).T


def mixed(bank: Bank, tabled: F32) -> list[F32]:
    """Working planes of tabled samples (..., samples) in float32, one array each.

    Products are added in the order of the samples, so the bits are the same everywhere.
    """
    if bank.mix is None:
        return [tabled[..., c] for c in range(tabled.shape[-1])]
    planes = []
    for weights in bank.mix:
        total = weights[0] * tabled[..., 0]
        for c in range(1, tabled.shape[-1]):
            total = total + weights[c] * tabled[..., c]
        planes.append(total)
    return planes


def opponent_mix(colours: str, sample_noise: F64 | None = None) -> tuple[tuple[str, ...], F32]:
    """Weights of grey, blue-yellow and red-green planes whose noise has standard deviation 1.

    Grey is the weighting of the samples in which a grey edge stands out of the noise most; the
    two others give exactly zero where all samples are equal. The noise of the three is
    uncorrelated where that of the samples is.

    Parameters
    ----------
    colours : a letter for each sample: R, G and B in any order
    sample_noise : ndarray (3,), standard deviation of each in the unit that is to be 1; None
        means 1

    Returns
    -------
    names, and float32 ndarray (3, 3)

    Raises
    ------
    UsageError : other samples than R, G and B.

    >>> names, mix = opponent_mix("RGB")
    >>> names, (3 * mix[0] ** 2).round(6).tolist()
    (('grey', 'blue_yellow', 'red_green'), [1.0, 1.0, 1.0])
    """
    if sorted(colours) != ["B", "G", "R"]:
        raise UsageError(
            f"opponent planes need samples R, G and B, not {colours or 'one plane'}",
            remedy="the samples of a mosaic lie in four places: see mosaic_bank",
        )
    sd = np.ones(3) if sample_noise is None or not sample_noise.size else sample_noise
    place = ["RGB".index(letter) for letter in colours]
    return ("grey", *AXES), _blind(weights(np.array(list(AXES.values()))[:, place], sd))


def weights(opponents: F64, sample_noise: F64) -> F64:
    """Weights of the samples for grey, then for each opponent, of unit noise and uncorrelated.

    Parameters
    ----------
    opponents : ndarray (n, samples), each adding up to zero, taken in order
    sample_noise : ndarray (samples,), standard deviations

    Returns
    -------
    ndarray (1 + n, samples)
    """
    covariance = np.diag(np.asarray(sample_noise, dtype=np.float64) ** 2)
    rows = [np.linalg.solve(covariance, np.ones(len(covariance)))]
    for opponent in opponents:
        row = opponent
        for before in rows[1:]:
            row = row - before * (row @ covariance @ before) / (before @ covariance @ before)
        rows.append(row)
    return np.array([row / np.sqrt(row @ covariance @ row) for row in rows])


def _blind(rows: F64) -> F32:
    """The rows as float32 that still sum to exactly zero from the second on.

    Weights become whole multiples of 2^-22; what rounding left is taken from the largest.
    """
    quantum = 2.0**-22
    units = np.rint(rows / quantum)
    for row in units[1:]:
        row[np.argmax(np.abs(row))] -= row.sum()
    return np.asarray(units * quantum, dtype=np.float32) + np.float32(0)


def coloured(taps: F32, plane: int, planes: int) -> F32:
    """Kernels (n, h, h) that read one of the working planes, as (n, h, h, planes)."""
    out = np.zeros((*taps.shape, planes), dtype=np.float32)
    out[..., plane] = taps
    return out
