"""Principal components as a dictionary: the baseline to look at beside the others."""

from __future__ import annotations

import numpy as np
from numpy.typing import NDArray

from patchlab.learn.likelihood import Evaluation, Likelihood, Rows
from patchlab.learn.order import canonical, dictionary
from patchlab.learn.solver import Orthogonal, Solver, State
from patchlab.learn.trust import kurtosis, split
from patchlab.learn.whiten import leading, one_thread
from patchlab.types import F64, Dictionary, PatchSet, Whitening


def learn_pca(
    patch_set: PatchSet, whitening: Whitening, *, components: int | None = None, seed: int = 0
) -> Dictionary:
    """Principal components of the patches: the whitening's own directions.

    A component is identified when its eigenvalue stands clear of its neighbours', by four
    standard errors of a log eigenvalue, ``sqrt(2 / n)`` each (Anderson 1963, Ann. Math.
    Statist. 34:122). ``log_likelihood`` is that of :func:`~patchlab.learn.learn_ica` on the
    same held-out patches, with the components left as they are and their scales free, so
    that the two can be compared.

    Parameters
    ----------
    patch_set : PatchSet
    whitening : of this patch set
    components : how many; default the whitening's rank
    seed : key of the held-out patches

    Raises
    ------
    UsageError : more components than the whitening kept.
    """
    used = leading(whitening, components)
    with one_thread():
        rows = Rows.of(patch_set.patches, used)
        filters, atoms, order = canonical(used.K, used.D.T, np.ones(used.rank))
        train, held = split(len(patch_set), seed)
        return dictionary(
            "pca",
            used,
            filters,
            atoms,
            order,
            kurtosis=kurtosis(rows, np.eye(used.rank)),
            identified=_separate(used),
            converged=True,
            iterations=1,
            tolerance=0.0,
            curve=np.zeros(1),
            log_likelihood=_log_likelihood(rows, np.sort(train), np.sort(held), used.rank),
        )


def _separate(known: Whitening) -> NDArray[np.bool_]:
    """Which of the leading eigenvalues stand clear of both neighbours."""
    error = 4 * np.sqrt(4 / known.samples)
    values = np.log(np.maximum(known.spectrum[: known.rank + 1], 1e-300))
    gap = values[:-1] - values[1:] > error
    return np.asarray(gap & np.append(True, gap[:-1]))


def _log_likelihood(
    rows: Rows, train: NDArray[np.int64], held: NDArray[np.int64], rank: int
) -> float:
    """Held-out nats per patch, each component's scale fitted on the other patches."""
    objective = Likelihood(rows.whitened(train), np.ones(rank))
    fitted = Solver(objective, _Scales(), 1e-9 * rank, 100).run(State(np.eye(rank) * np.pi / 2))
    return -Likelihood(rows.whitened(held), np.ones(rank))(fitted.W).value


class _Scales(Orthogonal):
    """The orthogonal geometry with rotations held fast: only the gains move."""

    def gradient(self, at: Evaluation) -> F64:
        """The gains' part of the gradient."""
        return np.diag(np.diag(super().gradient(at)))
