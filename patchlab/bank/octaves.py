"""Further octaves of an edge bank: the coarsest size again at doubled widths.

Structures much larger than the bank's kernels (penumbras, defocus, large surfaces that meet
softly) rise so slowly that a small kernel hardly answers: a step blurred by b gives a kernel of
width s only ``s / sqrt(s^2 + b^2)`` of its height. A kernel twice as wide also averages the
noise of four times the area. The wider sizes are further scales of the same cascade, so the
finer ones keep their places and everything else, thresholds, code, proofs, goes on as before;
only the work grows, about fourfold with each octave.
"""

from __future__ import annotations

import dataclasses
import math
from collections.abc import Sequence
from dataclasses import dataclass
from typing import Literal

import numpy as np

from patchlab.bank.lattice import REACH, lattice_bank
from patchlab.types import F32, F64, Kernel

MOST = 3
"""Octaves that can be asked for."""
SIDE = 63
"""Largest kernel side of an octave, pixels."""
LEAST_REACH = 2.5
"""Standard deviations of its envelope that a kernel must hold. At 2.5 the cut rim holds a
thousandth of the energy of a first derivative."""


@dataclass(frozen=True, eq=False)
class Octaves:
    """A bank's kernels with its octaves.

    Parameters
    ----------
    kernels : the bank's own first, unchanged, then each octave's
    taps : float32 ndarray (n, h, h), zeros around the smaller kernels
    widths : (across, along) of each octave, pixels
    warnings : sentences for people
    """

    kernels: tuple[Kernel, ...]
    taps: F32
    widths: tuple[tuple[float, float], ...]
    warnings: tuple[str, ...]


def fitting(widest: tuple[float, float], octaves: int) -> tuple[tuple[float, float], ...]:
    """Doubled widths whose kernels fit in the largest side.

    Parameters
    ----------
    widest : (across, along) of the bank's coarsest size, pixels
    octaves : how many are asked for

    >>> fitting((1.5, 1.8), 3)
    ((3.0, 3.6), (6.0, 7.2))
    """
    row = (tuple(round(w * 2**k, 3) for w in widest) for k in range(1, octaves + 1))
    return tuple((u, v) for u, v in row if LEAST_REACH * max(u, v) <= SIDE // 2)


def side_of(widths: tuple[float, float]) -> int:
    """Odd kernel side that holds three standard deviations, as far as the largest side allows.

    >>> side_of((3.0, 3.6)), side_of((9.0, 10.8))
    (23, 63)
    """
    return min(2 * math.ceil(REACH * max(widths) - 1e-9) + 1, SIDE)


def with_octaves(
    kernels: Sequence[Kernel],
    taps: F32,
    octaves: int,
    orientations: int,
    widest: tuple[float, float],
    parities: Sequence[Literal["odd", "even"]],
    autocovariance: F64 | None = None,
    noise_sd: float | None = None,
) -> Octaves:
    """Add octaves to a lattice bank's kernels.

    Parameters
    ----------
    kernels, taps : the bank's own, as :func:`patchlab.bank.lattice.lattice_bank` makes them
    octaves : how many to add, at least 0
    orientations : of each octave
    widest : (across, along) of the bank's coarsest size, pixels
    parities, autocovariance, noise_sd : as for the bank's own kernels

    Returns
    -------
    Octaves; fewer than asked for where wider kernels do not fit, with a warning
    """
    widths = fitting(widest, octaves)
    made, planes = list(kernels), [taps]
    first = 1 + max(k.scale or 0 for k in kernels)
    for scale, pair in enumerate(widths, first):
        found, drawn = lattice_bank(
            (orientations,), (pair,), parities, autocovariance, noise_sd, side_of(pair)
        )
        made += [
            dataclasses.replace(k, scale=scale, name=k.name.replace("_s0_", f"_s{scale}_"))
            for k in found
        ]
        planes.append(drawn)
    side = max(p.shape[1] for p in planes)
    rims = ((side - p.shape[1]) // 2 for p in planes)
    whole = [np.pad(p, ((0, 0), (r, r), (r, r))) for p, r in zip(planes, rims, strict=True)]
    return Octaves(tuple(made), np.concatenate(whole), widths, _warnings(octaves, widths, widest))


def _warnings(
    octaves: int, widths: tuple[tuple[float, float], ...], widest: tuple[float, float]
) -> tuple[str, ...]:
    if len(widths) == octaves:
        return ()
    across = widest[0] * 2 ** (len(widths) + 1)
    return (
        f"{len(widths)} of {octaves} octaves fit: the next one, {across:.1f} px wide, needs "
        f"kernels of more than {SIDE} px",
    )
