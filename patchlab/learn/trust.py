"""What can be said about how sure components are."""

from __future__ import annotations

from collections.abc import Iterator
from itertools import pairwise

import numpy as np
from numpy.typing import NDArray

from patchlab.conventions import rng
from patchlab.errors import InputError
from patchlab.learn.checkpoint import Run
from patchlab.learn.likelihood import BLOCK, Evaluation, Likelihood, Rows
from patchlab.learn.solver import turning
from patchlab.types import F64

HELD_OUT = 0.1
"""Share of the patches that no learner sees."""
LEAST_HELD, MOST_HELD = 500, 0.25
"""Fewer than this many are not held out, as long as they are no more than this share."""
GROUPS = 32
"""Groups of patches whose spread tells the error of a curvature."""
SURE = 3.0
"""Standard errors that a curvature must stand above zero."""
LATE = ("stalled", "limit")
"""Outcomes that leave something to be learned."""
NOISE_KURTOSIS = 3.15
"""Median held-out kurtosis below which components look like Gaussian noise."""


def split(n: int, seed: int) -> tuple[NDArray[np.int64], NDArray[np.int64]]:
    """Patches to learn from and patches held out, both in a keyed random order.

    The last tenth of a random permutation keyed by (seed, "held-out") is held out; of fewer
    than 5,000 patches 500, but never more than a quarter: a handful would tell nothing.

    Raises
    ------
    InputError : too few patches to hold any out.
    """
    if n < 10:
        raise InputError(f"{n} patches are too few to learn from")
    order = rng(seed, "held-out").permutation(n).astype(np.int64)
    kept = n - max(int(n * HELD_OUT), min(LEAST_HELD, int(n * MOST_HELD)))
    return order[:kept], order[kept:]


def kurtosis(rows: Rows, W: F64) -> F64:
    """Kurtosis (k,) of the coefficients ``W z``: fourth moment over squared second."""
    second, fourth = np.zeros(len(W)), np.zeros(len(W))
    A, b = rows.project(W)
    for at in range(0, len(rows), BLOCK):
        square = (rows.read(at, min(at + BLOCK, len(rows))) @ A - b) ** 2
        second += square.sum(axis=0, dtype=np.float64)
        fourth += (square**2).sum(axis=0, dtype=np.float64)
    return np.asarray(fourth * len(rows) / np.maximum(second**2, 1e-300))


def identified(whole: Likelihood, held: Likelihood, W: F64) -> NDArray[np.bool_]:
    """Which components the data can tell from every other one.

    Turning a component towards another must raise the objective: the second derivative for
    turning the pair has to stand three standard errors above zero. Two Gaussian sources give
    zero (Comon 1994, Signal Processing 36:287). It is asked twice: of the exact curvature
    over all patches, and of the curvature that independent components would have over
    held-out ones, since a learner turns noise until it looks curved on what it learned from.
    Standard errors come from the spread over 32 groups of patches.

    Parameters
    ----------
    whole, held : over all patches and over the held-out ones
    W : ndarray (k, k)

    Returns
    -------
    bool ndarray (k,)
    """
    exact = [turning(W, *whole.pairs(W, a, b)) for a, b in _groups(len(whole.rows))]
    fresh = [_alone(held(W, a, b)) for a, b in _groups(len(held.rows))]
    clear = _above_zero(exact) & _above_zero(fresh)
    np.fill_diagonal(clear, True)
    return np.asarray(clear.all(axis=1))


def _alone(at: Evaluation) -> F64:
    return turning(at.W, np.outer(at.slope, at.energy), np.diag(at.score))


def _groups(n: int) -> Iterator[tuple[int, int]]:
    return pairwise(np.linspace(0, n, min(GROUPS, n) + 1).astype(int).tolist())


def _above_zero(values: list[F64]) -> NDArray[np.bool_]:
    error = np.std(values, axis=0) / max(len(values) - 1, 1) ** 0.5
    return np.asarray(np.mean(values, axis=0) > SURE * error)


def warnings_for(
    runs: tuple[Run, ...], best: int, seen: NDArray[np.bool_], tails: F64
) -> tuple[str, ...]:
    """Sentences for people about a finished learner.

    Parameters
    ----------
    runs, best : the restarts and which one is returned
    seen : which components are identified
    tails : kurtosis of the coefficients of held-out patches
    """
    out = []
    outcome = runs[best].outcome
    if outcome == "limit":
        out.append(
            f"not converged after {runs[best].iterations} iterations; raise max_iterations "
            "or resume"
        )
    if outcome == "overfitting":
        out.append(
            f"stopped at step {runs[best].iterations}, before overfitting: beyond it held-out "
            "patches became less likely; use more patches or fewer components"
        )
    if outcome == "stalled":
        out.append(
            "not converged: the line search could not lower the objective further; "
            "loosen the tolerance or use more patches"
        )
    late = sum(run.outcome in LATE for i, run in enumerate(runs) if i != best)
    if late:
        out.append(f"{late} of {len(runs)} restarts did not converge")
    if float(np.median(tails)) < NOISE_KURTOSIS:
        out.append(
            f"the patches look like Gaussian noise (median kurtosis {np.median(tails):.2f}, "
            "3 for a Gaussian): the components are arbitrary"
        )
    lost = int(np.sum(~seen))
    if lost > seen.size / 4:
        out.append(
            f"{lost} of {seen.size} components are not identified: the data cannot tell them "
            "from one another"
        )
    return tuple(out)
