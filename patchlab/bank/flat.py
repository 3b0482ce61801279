"""Where a picture is too flat for an edge, and the proof.

Let lo and hi be the least and the largest working value of the window that a response depends on,
P and M the sums of a kernel's positive and of its negative taps (both as positive numbers). Then

    r = sum k p <= P hi - M lo = P (hi - lo) + (P - M) lo,   -r <= M (hi - lo) + (M - P) lo,

so ``|r| <= W (hi - lo) + D |lo|`` with ``W = max(P, M)`` and ``D = |P - M|``, and what is computed
is at most E more, E the plan's error bound. For a strength that is one response, the largest W, D
and E over its kernels bound it. Energy is ``sqrt(e^2 + o^2)``, the 2-norm of two such bounds, and
a norm of sums is at most the sum of the norms (Minkowski): ``sqrt(We^2 + Wo^2) (hi - lo) + ...``.
The float32 sum of squares and its root err by at most four roundings, the evaluation of the bound
itself by four more; both are met by a factor of ``1 + 2^-20``, and the three numbers are rounded
upwards.

Where the bound, over the window of a stretch of pixels and of their neighbours, stays below a
threshold, none of these pixels reaches it and none touches one that does: their strength need not
be computed. Thinning compares an element with its neighbours only, so edges come out the same, bit
for bit. Not a number is not bounded: float pixels are never skipped.
"""

from __future__ import annotations

import math
from collections.abc import Sequence
from typing import Any

import numpy as np

from patchlab.types import Bank

Member = tuple[int, int | None, int | None]
"""(orientation, even kernel or None, odd kernel or None)."""
SLACK = 1 + 2.0**-20


def flat_bound(
    bank: Bank, members: Sequence[Member], error_bound: Sequence[float]
) -> tuple[float, float, float]:
    """(W, D, E): a strength is at most ``W (hi - lo) + D |lo| + E``; see the top of this file.

    Parameters
    ----------
    bank : Bank
    members : of one scale's strength
    error_bound : of every kernel

    Returns
    -------
    tuple of float32 values, rounded upwards

    >>> import numpy as np
    >>> from patchlab.types import Bank, InputContract, InputTable, Kernel
    >>> about = InputContract("Mono8", 0, 255)
    >>> table = InputTable("identity", about, np.arange(256, dtype=np.float32), None)
    >>> kernel = Kernel("k", "given", "odd", 0, 0, {}, 1.0)
    >>> bank = Bank("b", (kernel,), np.float32([[[0, 0, 0], [-1, 0, 1], [0, 0, 0]]]), table)
    >>> w, d, e = flat_bound(bank, [(0, None, 0)], [0.0])
    >>> 1 <= w < 1.00001, d, e
    (True, 0.0, 0.0)
    """
    taps = bank.taps.astype(np.float64)
    plus = np.where(taps > 0, taps, 0).sum(axis=(1, 2))
    minus = np.where(taps < 0, -taps, 0).sum(axis=(1, 2))
    ways: tuple[Any, ...] = (np.maximum(plus, minus), np.abs(plus - minus), np.array(error_bound))
    found = [
        max(math.hypot(*(way[k] for k in pair if k is not None)) for _, *pair in members)
        for way in ways
    ]
    return tuple(_up(SLACK * v) for v in found)  # type: ignore[return-value]


def _up(value: float) -> float:
    near = np.float32(value)
    return float(near if near >= value else np.nextafter(near, np.float32(np.inf)))
