"""Sparse coding: a dictionary, complete or overcomplete, under an l1 penalty.

``min over B, a of mean 1/2 |z - B a|^2 + penalty |a|_1`` for whitened patches z and
atoms (columns of B) of unit norm, by online dictionary learning: patches are coded
in batches, sums of ``a a'`` and ``z a'`` stand for all that was seen, and the atoms
are renewed one by one from these sums.

Source: Mairal, Bach, Ponce & Sapiro 2010, Online learning for matrix factorization and
sparse coding, J. Mach. Learn. Res. 11:19.
"""

from __future__ import annotations

import math
from collections.abc import Callable, Mapping
from dataclasses import dataclass, fields, replace
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.conventions import rng
from patchlab.errors import InputError, UsageError
from patchlab.learn.coding import lasso
from patchlab.learn.likelihood import BLOCK, Mapper, Rows
from patchlab.learn.order import canonical, dictionary
from patchlab.learn.trust import split
from patchlab.learn.whiten import leading, one_thread, threads
from patchlab.progress import Progress, silent
from patchlab.types import F32, F64, Dictionary, PatchSet, Whitening

PENALTY = 1.2
"""Default penalty: Mairal et al. 2010 take 1.2 / sqrt(m) for patches of unit norm, and m
whitened directions have norm sqrt(m)."""
LEAST_PENALTY, LARGEST_PENALTY = 0.3, 3.0
"""Bounds of a penalty that is chosen from the noise."""
STAGES = ((8192, 512, 3e-2), (32768, 1024, 1e-2))
"""Early stages: patches, batch, and the relative gain of a pass that ends them."""
WINDOW = 0.3
"""Share of a pass that the sums stand for; older codes belong to atoms that have moved on."""
BATCH = 2048
"""Patches coded between two renewals of the atoms, in the last stage."""
CODING = 1e-3
"""KKT tolerance while learning, relative to the penalty."""
DEAD = 10
"""An atom that fewer patches of a pass use is dead: the worst-coded patch takes its place."""


def learn_sparse(
    patch_set: PatchSet,
    whitening: Whitening,
    *,
    atoms: int,
    penalty: float | None = None,
    seed: int = 0,
    tolerance: float = 1e-3,
    max_iterations: int = 50,
    jobs: int = 1,
    progress: Progress = silent,
    checkpoint: Callable[[SparseState], None] | None = None,
    resume: SparseState | None = None,
) -> Dictionary:
    """Learn a sparse-coding dictionary of whitened patches.

    Learning ends when a pass over all patches lowers the held-out objective by less than
    ``tolerance`` of it. ``curve`` is the held-out objective after each pass of the last stage.

    Atoms are scaled so that the sparse codes of the learning patches have unit variance.
    Filters are dual to them: the minimum-norm pseudo-inverse of the whitened atoms
    (ridge 1e-9 of the largest eigenvalue), so that summing atoms times filter responses
    rebuilds a patch on the kept directions. The sparse codes themselves come from
    :func:`encode`; they are not linear in the patch.

    Parameters
    ----------
    patch_set : PatchSet
    whitening : of this patch set
    atoms : how many, from one to four times the rank
    penalty : in units of whitened patches (each direction has variance 1); default 1.2
    seed : key of the start, the order of patches and the held-out patches
    tolerance : relative gain of a pass
    max_iterations : passes over all patches
    jobs : threads; results do not depend on them
    progress : told stage "learn"
    checkpoint : told the state after every pass
    resume : a state of the same call

    Raises
    ------
    UsageError : a parameter out of its range.
    """
    used = leading(whitening, None)
    penalty = PENALTY if penalty is None else penalty
    if used.mean.size != patch_set.patches.shape[1]:
        raise UsageError("the whitening belongs to another patch size", where="whitening")
    check_options(used, atoms, penalty, tolerance, max_iterations, jobs)
    with one_thread(), threads(jobs) as mapper:
        learner = Learner(patch_set.patches, used, atoms, penalty, seed, tolerance, mapper)

        def after(state: SparseState) -> None:
            progress("learn", state.passes, max_iterations, f"objective {state.curve[-1]:.4f}")
            if checkpoint is not None:
                checkpoint(state)

        state = learner.run(resume or learner.start(), max_iterations, after)
        return learner.result(state, tolerance)


def penalty_from_noise(whitening: Whitening, noise: F64, atoms: int) -> float:
    """The penalty at which noise alone would hardly use an atom.

    ``sd * sqrt(2 log atoms)`` (Chen, Donoho & Saunders 1998, SIAM J. Sci. Comput. 20:33) with
    sd the root of the noise's mean variance over the whitened directions; kept within
    ``LEAST_PENALTY`` and ``LARGEST_PENALTY``, since almost no noise would let every atom in.

    Parameters
    ----------
    whitening : Whitening
    noise : ndarray (d, d), covariance (:func:`patchlab.learn.noise_covariance`)
    atoms : how many there will be

    Examples
    --------
    >>> from patchlab.learn import Moments, whitening
    >>> w = whitening(Moments(100, np.zeros(3), np.diag([1.0, 2.0, 3.0])))
    >>> round(penalty_from_noise(w, 0.5 * np.eye(3), 8), 2)
    1.07
    """
    inside = np.einsum("ij,jk,ik->", whitening.K, noise, whitening.K) / whitening.rank
    asked = math.sqrt(max(float(inside), 0.0) * 2 * math.log(max(atoms, 2)))
    return min(max(asked, LEAST_PENALTY), LARGEST_PENALTY)


def encode(
    known: Dictionary, patches: F32, penalty: float = PENALTY, *, tolerance: float = 1e-6
) -> F64:
    """Sparse codes of patches over a dictionary's atoms.

    Minimises ``1/2 |z - B a|^2 + penalty |a|_1`` for z the whitened patch and B the whitened
    atoms at unit norm, then scales the codes so that ``codes @ atoms`` rebuilds the patch.

    Parameters
    ----------
    known : Dictionary
    patches : ndarray (n, size * size), as in a PatchSet
    penalty : in units of whitened patches
    tolerance : of the KKT conditions, relative to the penalty

    Returns
    -------
    ndarray (n, k), float64

    Raises
    ------
    UsageError : patches of another size, or a penalty that is not positive.
    """
    mean = known.whitening.mean
    if patches.ndim != 2 or patches.shape[1] != mean.size:
        raise UsageError(f"patches of this dictionary have {mean.size} pixels", where="patches")
    atoms = known.atoms.reshape(len(known), -1)
    return codes_of(patches, known.whitening, atoms, penalty, tolerance)


def codes_of(
    rows: NDArray[Any], through: Whitening, atoms: NDArray[Any], penalty: float, tolerance: float
) -> F64:
    """Sparse codes (n, k) of rows (n, d) over atoms (k, d): what :func:`encode` gives."""
    with one_thread():
        B = through.K @ atoms.T.astype(np.float64)
        norm = np.maximum(np.linalg.norm(B, axis=0), 1e-300)
        z = (rows.astype(np.float64) - through.mean) @ through.K.T
        return np.asarray(lasso(z, B / norm, penalty, tolerance=tolerance) / norm)


def check_options(
    whitening: Whitening, atoms: int, penalty: float, tolerance: float, limit: int, jobs: int
) -> None:
    """Refuse options of :func:`learn_sparse` that are out of their range."""
    if not 1 <= atoms <= 4 * whitening.rank:
        raise UsageError(
            f"{atoms} atoms are not in 1 to {4 * whitening.rank}, four times the rank",
            where="atoms",
        )
    if not (penalty > 0 and tolerance > 0):
        raise UsageError("penalty and tolerance are positive")
    if limit < 1 or jobs < 1:
        raise UsageError("max_iterations and jobs are at least 1")


@dataclass(frozen=True, eq=False)
class SparseState:
    """Where the learner stands.

    Parameters
    ----------
    B : ndarray (m, K), atoms of unit norm
    A, C : ndarray (K, K) and (m, K), sums of ``a a'`` and ``z a'``, weighted towards the recent
    seen : patches that went into them, from the start
    stage, passes : what is under way; passes count the last stage's
    draws : passes over any stage, key of the next order of patches
    curve : held-out objective after each pass of this stage
    revived : atoms replaced so far
    outcome : "" while it goes on; "converged" or "limit"
    """

    B: F64
    A: F64
    C: F64
    seen: int = 0
    stage: int = 0
    passes: int = 0
    draws: int = 0
    curve: tuple[float, ...] = ()
    revived: int = 0
    outcome: str = ""

    def arrays(self) -> dict[str, NDArray[Any]]:
        """Everything as named arrays, for ``numpy.savez``."""
        return {f.name: np.asarray(getattr(self, f.name)) for f in fields(self)}

    @staticmethod
    def from_arrays(data: Mapping[str, NDArray[Any]]) -> SparseState:
        """Rebuild what :meth:`arrays` gave.

        Raises
        ------
        InputError : an array is missing.
        """
        try:
            return SparseState(
                B=data["B"],
                A=data["A"],
                C=data["C"],
                seen=int(data["seen"]),
                stage=int(data["stage"]),
                passes=int(data["passes"]),
                draws=int(data["draws"]),
                curve=tuple(float(v) for v in data["curve"]),
                revived=int(data["revived"]),
                outcome=str(data["outcome"]),
            )
        except (KeyError, ValueError, TypeError) as error:
            raise InputError(
                f"damaged checkpoint ({error})", remedy="start again without resuming"
            ) from None


class Learner:
    """One call of :func:`learn_sparse`."""

    def __init__(
        self,
        patches: F32,
        whitening: Whitening,
        atoms: int,
        penalty: float,
        seed: int,
        tolerance: float,
        mapper: Mapper,
    ) -> None:
        rows = Rows.of(patches, whitening)
        self.train, held = split(len(patches), seed)
        self.whitening, self.rows, self.atoms = whitening, rows, atoms
        self.penalty, self.seed, self.mapper = penalty, seed, mapper
        self.held = rows.whitened(np.sort(held)).data
        n = self.train.size
        early = [s for s in STAGES if s[0] < 0.6 * n]
        self.stages = [*early, (n, BATCH, tolerance)]

    def start(self) -> SparseState:
        """Atoms are whitened patches, drawn without repetition, noise where there are too few."""
        m, count = self.whitening.rank, self.atoms
        drawn = self.train[:count]
        B = np.zeros((m, count))
        B[:, : drawn.size] = self._read(drawn).T
        if drawn.size < count:
            d = self.whitening.mean.size
            noise = rng(self.seed, "sparse").standard_normal((count - drawn.size, d))
            B[:, drawn.size :] = self.whitening.K @ noise.T
        return SparseState(_unit(B), np.zeros((count, count)), np.zeros((m, count)))

    def run(
        self,
        state: SparseState,
        limit: int,
        after: Callable[[SparseState], None] = lambda state: None,
    ) -> SparseState:
        """Pass after pass, until learning ends; ``after`` is told each state."""
        while not state.outcome:
            state = self.follow(state, self.turn(state), limit)
            after(state)
        return state

    def turn(self, state: SparseState) -> SparseState:
        """One pass over the patches of a stage."""
        size, batch, _ = self.stages[state.stage]
        order = rng(self.seed, "sparse", "pass", str(state.draws)).permutation(size)
        used = np.zeros(self.atoms, dtype=np.int64)
        worst: tuple[F64, F32] = (np.empty(0), np.empty((0, self.whitening.rank), np.float32))
        for at in range(0, size, batch):
            z = self._read(self.train[order[at : at + batch]])
            codes = self._code(z, state.B)
            used += np.count_nonzero(codes, axis=0)
            state = self._renew(state, z, codes, memory=size)
            worst = _worse(worst, z, codes, state.B)
        state = self._revive(state, used, worst[1])
        return replace(state, draws=state.draws + 1, curve=(*state.curve, self._objective(state.B)))

    def follow(self, before: SparseState, state: SparseState, limit: int) -> SparseState:
        """Decide what comes after a pass: another, the next stage, or the end.

        A pass of the last stage that raises the held-out objective is undone and ends it.
        """
        last = state.stage == len(self.stages) - 1
        state = replace(state, passes=state.passes + last)
        gain = 1.0 if len(state.curve) < 2 else 1 - state.curve[-1] / state.curve[-2]
        if last and gain < 0:
            return replace(before, passes=state.passes, outcome="converged")
        if gain < self.stages[state.stage][2]:
            if last:
                return replace(state, outcome="converged")
            return replace(state, stage=state.stage + 1, curve=state.curve[-1:])
        return replace(state, outcome="limit") if state.passes >= limit else state

    def _read(self, which: NDArray[np.int64]) -> F32:
        A, b = self.rows.project(np.eye(self.whitening.rank))
        return np.asarray(self.rows.data[which] @ A - b)

    def _code(self, z: F32, B: F64) -> F32:
        return np.asarray(lasso(z, B, self.penalty, tolerance=CODING, mapper=self.mapper))

    def _renew(self, state: SparseState, z: F32, codes: F32, memory: float) -> SparseState:
        """Fade the sums, add a batch, renew every atom once.

        What fades is older than half of what was seen, and than ``WINDOW`` of a pass.
        """
        window = min(state.seen / 2, WINDOW * memory)
        kept = max(1 - len(z) / window, 0.0) if window else 0.0
        A = kept * state.A + codes.T @ codes
        C = kept * state.C + z.T @ codes
        return replace(state, A=A, C=C, seen=state.seen + len(z), B=_renewed(state.B, A, C))

    def _revive(self, state: SparseState, used: NDArray[np.int64], worst: F32) -> SparseState:
        """Replace dead atoms by the residuals of the worst-coded patches."""
        dead = np.flatnonzero(used < DEAD)[: len(worst)]
        if not dead.size:
            return state
        B, A, C = state.B.copy(), state.A.copy(), state.C.copy()
        B[:, dead] = _unit(worst[: dead.size].T.astype(np.float64))
        A[dead], A[:, dead], C[:, dead] = 0, 0, 0
        return replace(state, B=B, A=A, C=C, revived=state.revived + int(dead.size))

    def _objective(self, B: F64) -> float:
        """Mean held-out objective."""
        total = 0.0
        for at in range(0, len(self.held), BLOCK):
            z = self.held[at : at + BLOCK]
            total += float(objective(z, B, self._code(z, B), self.penalty).sum())
        return total / len(self.held)

    def statistics(self, B: F64) -> tuple[F64, F64, NDArray[np.int64]]:
        """Sums of the codes' second and fourth powers, and how often each atom is used."""
        second, fourth = np.zeros(self.atoms), np.zeros(self.atoms)
        used = np.zeros(self.atoms, dtype=np.int64)
        rows = np.sort(self.train)
        for at in range(0, rows.size, BATCH):
            codes = self._code(self._read(rows[at : at + BATCH]), B)
            second += np.sum(codes**2, axis=0, dtype=np.float64)
            fourth += np.sum(codes**4, axis=0, dtype=np.float64)
            used += np.count_nonzero(codes, axis=0)
        return second, fourth, used

    def result(self, state: SparseState, tolerance: float) -> Dictionary:
        """The dictionary in canonical form, its code statistics from one more pass."""
        second, fourth, used = self.statistics(state.B)
        n = self.train.size
        K, D = self.whitening.K, self.whitening.D
        filters, atoms, order = canonical(_dual(state.B) @ K, (D @ state.B).T, second / n)
        alone = np.abs(state.B.T @ state.B - np.eye(self.atoms)).max(axis=1) < 0.99
        return dictionary(
            "sparse",
            self.whitening,
            filters,
            atoms,
            order,
            kurtosis=fourth * n / np.maximum(second**2, 1e-300),
            identified=alone & (used >= DEAD),
            converged=state.outcome == "converged",
            iterations=state.passes,
            tolerance=tolerance,
            curve=np.array(state.curve),
            warnings=_warnings(state, int(np.sum(used < DEAD)), float(used.sum() / n)),
        )


def objective(z: F32, B: F64, codes: F32, penalty: float) -> F64:
    """``1/2 |z - B a|^2 + penalty |a|_1`` of each row, (n,)."""
    residual = z - codes @ B.T
    return np.asarray(0.5 * np.sum(residual**2, axis=1) + penalty * np.abs(codes).sum(axis=1))


def _renewed(B: F64, A: F64, C: F64) -> F64:
    """One sweep over the atoms: each becomes the best of unit norm with the others held."""
    B = B.copy()
    for j in np.flatnonzero(np.diag(A) > 0):
        u = C[:, j] - B @ A[:, j] + B[:, j] * A[j, j]
        norm = float(np.linalg.norm(u))
        if norm > 0:
            B[:, j] = u / norm
    return B


def _worse(known: tuple[F64, F32], z: F32, codes: F32, B: F64, keep: int = 32) -> tuple[F64, F32]:
    """The residuals of the worst-coded patches so far, worst first."""
    residual = (z - codes @ B.T).astype(np.float32)
    size = np.concatenate([known[0], np.sum(residual.astype(np.float64) ** 2, axis=1)])
    best = np.argsort(-size, kind="stable")[:keep]
    return size[best], np.concatenate([known[1], residual])[best]


def _dual(B: F64) -> F64:
    """``B' (B B' + r I)^-1`` with a ridge r of 1e-9 of the largest eigenvalue, (K, m)."""
    if B.shape[1] < B.shape[0]:
        gram = B.T @ B
        return np.asarray(np.linalg.solve(_ridged(gram), B.T))
    return np.asarray(np.linalg.solve(_ridged(B @ B.T), B).T)


def _ridged(gram: F64) -> F64:
    return np.asarray(gram + 1e-9 * np.linalg.norm(gram, 2) * np.eye(len(gram)))


def _unit(B: F64) -> F64:
    return np.asarray(B / np.maximum(np.linalg.norm(B, axis=0), 1e-300))


def _warnings(state: SparseState, dead: int, active: float) -> tuple[str, ...]:
    out = []
    if state.outcome != "converged":
        out.append(f"not converged after {state.passes} passes; raise max_iterations or resume")
    if dead:
        out.append(f"{dead} atoms are used by fewer than {DEAD} patches; ask for fewer atoms")
    if active < 1:
        out.append(
            f"a patch uses {active:.2g} atoms on average: the penalty is too high for these patches"
        )
    return tuple(out)
