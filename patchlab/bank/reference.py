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
from patchlab.bank.planes import check_picture, exact_planes
from patchlab.conventions import pad
from patchlab.types import F64, Bank

__all__ = ["check_picture", "responses", "strength"]


def responses(bank: Bank, pixels: NDArray[Any]) -> F64:
    """Responses of every kernel in float64.

    Parameters
    ----------
    bank : Bank
    pixels : ndarray (h, w) of the contract's dtype, both sides at least ``bank.size``; (h, w, 3)
        for interleaved colour, (2 h, 2 w) for the cells of a Bayer sensor

    Returns
    -------
    float64 ndarray (n, h, w): correlations of the float32 taps with the working values, which
    are float32 after the table, and mixed in float64

    Raises
    ------
    InputError : the picture does not fit the bank.
    """
    check_picture(bank, pixels)
    working = exact_planes(bank, pixels)
    h, w, count = working.shape
    taps = bank.taps.astype(np.float64).reshape(len(bank), bank.size, bank.size, count)
    out = np.zeros((len(bank), h, w))
    for m in range(count):
        padded = pad(working[..., m], bank.radius, bank.border)
        for plane, kernel in zip(out, taps[..., m], strict=True):
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
        sum((planes[i] ** 2 for i in (even, odd) if i is not None), np.zeros(planes.shape[1:]))
        for _, even, odd in members
    ]
    winner = np.argmax(squares, axis=0)
    turns = np.array([turn for turn, _, _ in members], dtype=np.uint8)
    return np.sqrt(np.max(squares, axis=0)), turns[winner]
