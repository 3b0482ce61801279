"""How many components: chosen from the data, with the curve that it was chosen by."""

from __future__ import annotations

import math
from dataclasses import replace

import numpy as np
from numpy.typing import NDArray

from patchlab.errors import InputError
from patchlab.learn.ica import components_of, unmix
from patchlab.learn.likelihood import Rows
from patchlab.learn.solver import Orthogonal
from patchlab.learn.sure import found_again, relearned
from patchlab.learn.trust import split
from patchlab.learn.whiten import leading, one_thread, threads
from patchlab.progress import Progress, silent
from patchlab.types import F64, ComponentChoice, PatchSet, Whitening

SHARES = (0.15, 0.25, 0.4, 0.55, 0.7, 0.85, 1.0)
"""Numbers of components that are tried, as shares of the whitening's rank."""
ENOUGH = 30_000
"""Patches that are learned from for each number tried, at most."""
TOLERANCE = 1e-5


def choose_components(
    patch_set: PatchSet,
    whitening: Whitening,
    *,
    seed: int = 0,
    jobs: int = 1,
    progress: Progress = silent,
) -> ComponentChoice:
    """Choose the number of components by the likelihood of held-out patches.

    Each number k takes the leading k directions of the whitening. Its model has independent
    components in them and independent normal values, of each direction's own variance, in
    the others, so every number is judged on the same directions. The smallest number is
    taken whose held-out likelihood is within one standard error of the best one's, by the
    differences patch by patch (the one-standard-error rule of Breiman, Friedman, Olshen &
    Stone 1984, Classification and Regression Trees). The whitening itself ends at the
    noise floor, where the camera's noise is known.

    Parameters
    ----------
    patch_set : PatchSet
    whitening : pca form, the widest that is to be considered
    seed : key of the starts and of the held-out patches
    jobs : threads; results do not depend on them
    progress : told stage "components"

    Raises
    ------
    InputError : a whitening of fewer than two directions.
    """
    if whitening.rank < 2:
        raise InputError("there is no number of components to choose among fewer than two")
    widest = leading(whitening, None)
    train, held = split(len(patch_set), seed)
    counts = sorted({max(2, round(s * widest.rank)) for s in SHARES})
    fresh = Rows.of(patch_set.patches, widest).whitened(held)
    gains, again = [], []
    for done, k in enumerate(counts, 1):
        rows = Rows.of(patch_set.patches, leading(widest, k)).whitened(train[:ENOUGH])
        gain, found = _try(rows, fresh, leading(widest, k), seed, jobs)
        gains.append(gain)
        again.append(found)
        progress("components", done, len(counts), f"{k} components")
    chosen, gain, error = _within_one_error(counts, np.array(gains))
    pixels = whitening.mean.size
    return ComponentChoice(
        counts=np.array(counts, dtype=np.int64),
        gain=gain / pixels,
        error=error / pixels,
        found_again=np.array(again),
        chosen=chosen,
        reason=(
            f"{chosen} of {widest.rank} directions: the fewest whose held-out likelihood is "
            "within one standard error of the best"
        ),
    )


def _try(rows: Rows, fresh: Rows, used: Whitening, seed: int, jobs: int) -> tuple[F64, float]:
    """Held-out gain over normal values, patch by patch, and the median |cos| over halves."""
    k = used.rank
    white = replace(used, K=np.eye(k), D=np.eye(k), mean=np.zeros(k))
    run = unmix(rows, white, seed=seed, tolerance=TOLERANCE, jobs=jobs)
    with one_thread(), threads(jobs) as mapper:
        anew = relearned(
            rows,
            run.W,
            run.signs,
            Orthogonal(),
            count=2,
            tolerance=TOLERANCE * k,
            limit=200,
            mapper=mapper,
        )
        atoms = components_of(run.W, used)[1]
        again = found_again(atoms, [components_of(W, used)[1] for W in anew])
        z = fresh.data[:, :k].astype(np.float64)
        y = np.abs(z @ run.W.T)
    independent = -(y + np.log1p(np.exp(-2 * y)) - math.log(2) + math.log(math.pi)).sum(axis=1)
    normal = -(z**2 + math.log(2 * math.pi)).sum(axis=1) / 2
    gain = independent + np.linalg.slogdet(run.W)[1] - normal
    return np.asarray(gain), float(np.median(again))


def _within_one_error(counts: list[int], gains: NDArray[np.float64]) -> tuple[int, F64, F64]:
    """The smallest number within one standard error of the best; means; errors of the gaps."""
    means = gains.mean(axis=1)
    best = int(np.argmax(means))
    gaps = gains[best] - gains
    errors = gaps.std(axis=1) / math.sqrt(gains.shape[1])
    near = means >= means[best] - errors
    return counts[int(np.flatnonzero(near)[0])], means, errors
