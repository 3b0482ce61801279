"""The slow, obvious oracle: float64, one tap after the other.

Everything faster is checked against this module, so it is kept free of tricks.
Operation: the input table, then the border, then correlation (no flip):
``r(y, x) = sum k(j, i) p(y + j - c, x + i - c)``.
"""

from __future__ import annotations

from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.bank.plan import strength_members
from patchlab.conventions import pad
from patchlab.errors import InputError
from patchlab.types import F64, Bank


def check_picture(bank: Bank, pixels: NDArray[Any]) -> None:
    """Refuse a picture that this bank cannot take.

    Raises
    ------
    InputError : not one plane, another dtype, or a side shorter than the kernels'.
    """
    form = bank.contract.format
    if pixels.ndim != 2:
        raise InputError(f"a picture is one plane (h, w), not an array of shape {pixels.shape}")
    if pixels.dtype != np.dtype(form.dtype):
        raise InputError(
            f"bank {bank.name} takes {form.name} pixels ({form.dtype}), not {pixels.dtype}",
            remedy="convert the picture, or make a bank for this camera's format",
        )
    if min(pixels.shape) < bank.size:
        raise InputError(
            f"a picture of {pixels.shape[1]} x {pixels.shape[0]} pixels is smaller than the "
            f"bank's {bank.size} x {bank.size} kernels",
            remedy="both sides must be at least as long as a kernel's",
        )


def responses(bank: Bank, pixels: NDArray[Any]) -> F64:
    """Responses of every kernel in float64.

    Parameters
    ----------
    bank : Bank
    pixels : ndarray (h, w) of the contract's dtype, both sides at least ``bank.size``

    Returns
    -------
    float64 ndarray (n, h, w): correlations of the float32 taps with the float32 working values

    Raises
    ------
    InputError : the picture does not fit the bank.
    """
    check_picture(bank, pixels)
    padded = pad(bank.table.apply(pixels), bank.radius, bank.border).astype(np.float64)
    h, w = pixels.shape
    out = np.zeros((len(bank), h, w))
    for plane, kernel in zip(out, bank.taps.astype(np.float64), strict=True):
        for j in range(bank.size):
            for i in range(bank.size):
                plane += kernel[j, i] * padded[j : j + h, i : i + w]
    return out


def strength(bank: Bank, pixels: NDArray[Any], scale: int) -> tuple[F64, NDArray[np.uint8]]:
    """Edge strength of one scale and the direction that won.

    ``step``: the largest absolute odd response over the orientations; ``line``: the largest
    absolute even one; ``energy``: the largest ``sqrt(even^2 + odd^2)``. Among equals the
    first orientation wins.

    Parameters
    ----------
    bank : Bank
    pixels : ndarray (h, w) of the contract's dtype
    scale : position among ``bank.scales``, 0 the finest

    Returns
    -------
    float64 ndarray (h, w) and uint8 ndarray (h, w), the winner's orientation

    Raises
    ------
    InputError, UsageError : the picture does not fit, or there is no such scale.
    """
    members = strength_members(bank, scale)
    planes = responses(bank, pixels)
    squares = [
        sum((planes[i] ** 2 for i in (even, odd) if i is not None), np.zeros(pixels.shape))
        for _, even, odd in members
    ]
    winner = np.argmax(squares, axis=0)
    turns = np.array([turn for turn, _, _ in members], dtype=np.uint8)
    return np.sqrt(np.max(squares, axis=0)), turns[winner]
