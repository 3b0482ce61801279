"""Independent components by preconditioned quasi-Newton maximum likelihood.

The start is drawn in pixel space and mapped through the whitening, so the signs and
the rotation of the whitening's rows do not matter. A course of stochastic steps over
batches comes first (:mod:`patchlab.learn.incremental`): early steps need direction, not
precision. The solver then goes on over all patches to the stated tolerance.
"""

from __future__ import annotations

import math
from collections.abc import Callable
from dataclasses import dataclass, replace
from typing import Literal

import numpy as np
from numpy.typing import NDArray

from patchlab.conventions import rng
from patchlab.errors import UsageError
from patchlab.learn.checkpoint import Checkpoint, Run
from patchlab.learn.incremental import STEPS, course
from patchlab.learn.likelihood import Likelihood, Mapper, Rows
from patchlab.learn.order import canonical, dictionary
from patchlab.learn.solver import Free, Orthogonal, Solver, State
from patchlab.learn.sure import found_again, relearned
from patchlab.learn.trust import identified, kurtosis, split, warnings_for
from patchlab.learn.watch import Watch, Watcher
from patchlab.learn.whiten import leading, one_thread, threads
from patchlab.progress import Progress, silent
from patchlab.types import F64, Dictionary, PatchSet, Whitening

FEWEST = 8192
"""With fewer patches there is no course of batches: all of them are quickly seen."""
CACHE_BYTES = 1 << 28
"""Whitened patches are kept up to this size; beyond it every pass whitens them anew."""
ROUNDS = (30, 60, 120)
"""Steps of the course after which the densities are chosen anew."""
FIRST_ROUNDS = (10, 20, 40)
"""The same for the solver's steps where there is no course."""
EVERY = 20
"""Steps between two checkpoints."""


def learn_ica(
    patch_set: PatchSet,
    whitening: Whitening,
    *,
    components: int | None = None,
    seed: int = 0,
    orthogonal: bool = True,
    restarts: int = 3,
    tolerance: float = 1e-6,
    max_iterations: int = 1000,
    density: Literal["tanh", "adaptive"] = "tanh",
    resamples: int = 0,
    jobs: int = 1,
    progress: Progress = silent,
    checkpoint: Callable[[Checkpoint], None] | None = None,
    resume: Checkpoint | None = None,
) -> Dictionary:
    """Learn independent components of whitened patches by maximum likelihood.

    The densities and their free scales are those of :mod:`patchlab.learn.likelihood`.
    A restart ends when the Newton decrement, half of g' H^-1 g, falls below ``tolerance``
    nats per patch and component, or when held-out patches say that it overfits (the rule of
    :mod:`patchlab.learn.watch`): it then goes back to the step that they like best. The
    restart with the best objective is returned (where one was stopped, the best on held-out
    patches); the atoms of all are pooled. A keyed tenth of the patches is held out of learning
    (:func:`~patchlab.learn.trust.split`) and gives ``held_out_curve`` and ``log_likelihood``:
    nats per patch, in whitened coordinates, log|det W| included.

    Coefficients are ``filter . (patch - whitening.mean)``; atoms rebuild the patch on the
    directions the whitening kept. The sums do not depend on ``jobs``.

    Parameters
    ----------
    patch_set : PatchSet
    whitening : of this patch set
    components : how many, in the leading directions of the whitening; default its rank
    seed : key of the starts and of the held-out patches
    orthogonal : keep components uncorrelated; without it that solution is relaxed further
    restarts : how many starts
    tolerance : nats per patch and component, positive
    max_iterations : accepted steps of one restart over all patches; the course of batches that
        comes before them is not counted
    density : "tanh" (heavy tails) or "adaptive" (heavy or light, chosen per component)
    resamples : halves of the patches on which the best restart is learned anew, from where it
        stands, to measure how sure its components are
    jobs : threads
    progress : told stage "learn" in restarts done
    checkpoint : told where the learner stands every twenty steps and between stages
    resume : a checkpoint of the same call

    Raises
    ------
    UsageError : a parameter out of its range, or a whitening of another patch size.

    Sources: Ablin, Cardoso & Gramfort 2018, IEEE Trans. Signal Process. 66:4040 and ICASSP
    2018; the choice of densities, Lee, Girolami & Sejnowski 1999, Neural Comput. 11:417.
    """
    if whitening.mean.size != patch_set.patches.shape[1]:
        raise UsageError("the whitening belongs to another patch size", where="whitening")
    _check_options(restarts, tolerance, max_iterations, density, jobs)
    if resamples < 0:
        raise UsageError("resamples is at least 0", where="resamples")
    used = leading(whitening, components)
    with one_thread(), threads(jobs) as mapper:
        learner = _Learner(
            Rows.of(patch_set.patches, used),
            used,
            *split(len(patch_set), seed),
            seed=seed,
            orthogonal=orthogonal,
            adaptive=density == "adaptive",
            restarts=restarts,
            tolerance=tolerance * used.rank,
            limit=max_iterations,
            mapper=mapper,
            progress=progress,
            checkpoint=checkpoint or (lambda where: None),
        )
        runs = learner.run(resume)
        return _result(learner, runs, tolerance, resamples)


def unmix(
    rows: Rows,
    whitening: Whitening,
    *,
    seed: int = 0,
    orthogonal: bool = True,
    restarts: int = 1,
    tolerance: float = 1e-6,
    max_iterations: int = 1000,
    density: Literal["tanh", "adaptive"] = "tanh",
    jobs: int = 1,
) -> Run:
    """The best restart of :func:`learn_ica` over bare rows, none of them held out.

    Parameters
    ----------
    rows : of the whitening's length, not necessarily patches
    whitening : pca form
    seed, orthogonal, restarts, tolerance, max_iterations, density, jobs : as there

    Raises
    ------
    UsageError : a parameter out of its range.
    """
    _check_options(restarts, tolerance, max_iterations, density, jobs)
    order = rng(seed, "rows").permutation(len(rows)).astype(np.int64)
    with one_thread(), threads(jobs) as mapper:
        learner = _Learner(
            rows,
            whitening,
            order,
            order[:0],
            seed=seed,
            orthogonal=orthogonal,
            adaptive=density == "adaptive",
            restarts=restarts,
            tolerance=tolerance * whitening.rank,
            limit=max_iterations,
            mapper=mapper,
            progress=silent,
            checkpoint=lambda where: None,
        )
        runs = learner.run(None)
    return runs[_best(runs)]


def _check_options(restarts: int, tolerance: float, limit: int, density: str, jobs: int) -> None:
    if restarts < 1 or limit < 1 or jobs < 1:
        raise UsageError("restarts, max_iterations and jobs are at least 1")
    if not tolerance > 0:
        raise UsageError(f"tolerance {tolerance} is not positive", where="tolerance")
    if density not in ("tanh", "adaptive"):
        raise UsageError(
            f"unknown density {density!r}", where="density", remedy="choose tanh or adaptive"
        )


@dataclass(eq=False)
class _Learner:
    """One call of :func:`learn_ica`: its rows, its stages, its restarts."""

    rows: Rows
    whitening: Whitening
    train: NDArray[np.int64]
    held: NDArray[np.int64]
    seed: int
    orthogonal: bool
    adaptive: bool
    restarts: int
    tolerance: float
    limit: int
    mapper: Mapper
    progress: Progress
    checkpoint: Callable[[Checkpoint], None]

    def run(self, resume: Checkpoint | None) -> tuple[Run, ...]:
        """Every restart, from the beginning or from a checkpoint."""
        self.stages = self._stages()
        self.fresh = self.rows.whitened(np.sort(self.held))
        where = resume or self._start(0, ())
        while True:
            run = self._restart(where)
            finished = (*where.finished, run)
            if len(finished) == self.restarts:
                return finished
            where = self._start(len(finished), finished)
            self.checkpoint(where)

    def _stages(self) -> list[Rows]:
        """Rows of each stage: of the course, when there are enough, and of the solver.

        ``train`` is in random order, so batches and a head of it are fair samples.
        """
        n, room = self.train.size, CACHE_BYTES // (4 * self.whitening.rank)
        if n <= room:
            whole = self.rows.whitened(self.train)
            return [whole, whole] if n >= FEWEST else [whole]
        head = self.train[: max(room, FEWEST)]
        # sorted, for the disk: even and odd places are still fair halves
        whole = replace(self.rows, index=np.sort(self.train))
        return [self.rows.whitened(head), whole] if n >= FEWEST else [whole]

    def _start(self, restart: int, finished: tuple[Run, ...]) -> Checkpoint:
        """A random start in pixel space, uniform over rotations of the kept directions."""
        d, k = self.whitening.D.shape
        pixels = rng(self.seed, "ica", str(restart)).standard_normal((k, d))
        left, _, right = np.linalg.svd(self.whitening.K, full_matrices=False)
        left, _, right = np.linalg.svd(pixels @ (left @ right).T)
        # pi / 2 is the gain that gives unit variance the spread of the heavy-tailed density
        return Checkpoint(restart, 0, 0, 0, State(math.pi / 2 * left @ right), np.ones(k), finished)

    def _restart(self, where: Checkpoint) -> Run:
        """All stages of one restart, from where it stands."""
        if self.held.size and where.watch is None:
            begun = Watcher.begin(self._held(where.signs), where.state.W)
            where = replace(where, watch=begun)
        while True:
            where = self._solve(where)
            following = self._next(where)
            if following is None:
                state = where.state
                return Run(
                    state.W,
                    where.signs,
                    where.spent + state.iterations,
                    state.curve,
                    state.outcome,
                    np.empty((0, 2)) if where.watch is None else where.watch.curve(),
                )
            where = following
            self.checkpoint(where)

    def _solve(self, where: Checkpoint) -> Checkpoint:
        """One round: of the course of batches, or of the solver."""
        if where.stage < len(self.stages) - 1:
            return self._walk(where)
        limit = self.limit - where.spent
        if self.adaptive and len(self.stages) == 1 and where.round < len(FIRST_ROUNDS):
            limit = min(limit, FIRST_ROUNDS[where.round])
        first: list[float] = []
        watcher = None
        if where.watch is not None:
            watcher = Watcher(self._held(where.signs), where.watch)
            watcher.judge(where.state)  # the first look is at no step at all

        def seen() -> Watch | None:
            return None if watcher is None else watcher.watch

        def after(state: State) -> None:
            first.append(state.decrement)
            self._tell(where.restart, first[0], state)
            if state.iterations % EVERY == 0 and not state.outcome:
                self.checkpoint(replace(where, state=state, watch=seen()))

        solver = Solver(
            Likelihood(self.stages[-1], where.signs, self.mapper),
            Orthogonal() if self.orthogonal else Free(),
            self.tolerance,
            limit,
            after,
        )
        if watcher is not None:
            solver.judge = watcher.judge
        state = solver.run(where.state)
        return replace(where, state=state, watch=seen())

    def _walk(self, where: Checkpoint) -> Checkpoint:
        """Steps over batches, up to the next choice of the densities."""
        ends = (0, *ROUNDS, STEPS) if self.adaptive else (0, STEPS)

        def after(step: int) -> None:
            if step % EVERY == 0:
                self.progress(
                    "learn",
                    where.restart + 0.3 * step / STEPS,
                    self.restarts,
                    f"restart {where.restart + 1} of {self.restarts}, batch {step} of {STEPS}",
                )

        W = course(
            Likelihood(self.stages[0], where.signs, self.mapper),
            where.state.W,
            start=ends[where.round],
            stop=ends[where.round + 1],
            after=after,
        )
        return replace(where, state=State(W))

    def _next(self, where: Checkpoint) -> Checkpoint | None:
        """The next round (other densities) or stage; None when the restart is finished."""
        spent, state = where.spent + where.state.iterations, where.state
        last = where.stage == len(self.stages) - 1
        if state.outcome == "overfitting":
            return None
        if last and spent >= self.limit and state.outcome != "converged":
            return None
        watch = where.watch and where.watch.anew()
        early = ROUNDS if not last else FIRST_ROUNDS if len(self.stages) == 1 else ()
        if self.adaptive and where.round < len(early) + 3 * last:
            signs = self._signs(self.stages[where.stage], state.W)
            if where.round < len(early) or not np.array_equal(signs, where.signs):
                where = replace(where, state=State(state.W), signs=signs, watch=watch)
                return replace(where, round=where.round + 1, spent=spent)
        if last:
            return None
        where = replace(where, state=State(state.W), watch=watch)
        return replace(where, stage=where.stage + 1, round=0, spent=spent)

    def _held(self, signs: F64) -> Likelihood:
        return Likelihood(self.fresh, signs, self.mapper)

    def relearned(self, run: Run, count: int) -> list[F64]:
        """A restart's W, learned anew on halves of the patches; none where it was stopped early.

        Half of too few patches would only say that they are too few.
        """
        if run.outcome == "overfitting":
            return []
        return relearned(
            self.stages[-1],
            run.W,
            run.signs,
            Orthogonal() if self.orthogonal else Free(),
            count=count,
            tolerance=self.tolerance,
            limit=self.limit,
            mapper=self.mapper,
        )

    def _signs(self, rows: Rows, W: F64) -> F64:
        """+1 where ``E[sech^2 y] E[y^2] > E[y tanh y]`` at unit variance, -1 elsewhere."""
        unit = W / np.linalg.norm(W, axis=1, keepdims=True)
        at = Likelihood(rows, np.ones(len(W)), self.mapper)(unit)
        return np.where(at.slope * at.energy >= np.diag(at.score), 1.0, -1.0)

    def _tell(self, restart: int, first: float, state: State) -> None:
        ratio = max(first / self.tolerance, 1 + 1e-9)
        left = math.log(max(state.decrement / self.tolerance, 1.0)) / math.log(ratio)
        before = 0.3 * (len(self.stages) - 1)
        self.progress(
            "learn",
            restart + before + min(max(1 - left, 0.0), 1.0) * (0.99 - before),
            self.restarts,
            f"restart {restart + 1} of {self.restarts}, {self.train.size} patches, "
            f"step {state.iterations}, decrement {state.decrement:.1e}",
        )


def _result(
    learner: _Learner, runs: tuple[Run, ...], tolerance: float, resamples: int
) -> Dictionary:
    """The best restart as a Dictionary, with what can be said about its certainty."""
    best = _best(runs)
    run = runs[best]
    filters, atoms, order = components_of(run.W, learner.whitening)
    others = tuple(
        components_of(r.W, learner.whitening)[1] for i, r in enumerate(runs) if i != best
    )
    whole = Likelihood(learner.rows, run.signs, learner.mapper)
    held = Likelihood(learner.fresh, run.signs, learner.mapper)
    seen = identified(whole, held, run.W)
    unit = run.W / np.linalg.norm(run.W, axis=1, keepdims=True)
    found = dictionary(
        "ica",
        learner.whitening,
        filters,
        atoms,
        order,
        kurtosis=kurtosis(learner.rows, unit),
        identified=seen,
        converged=run.outcome == "converged",
        iterations=run.iterations,
        tolerance=tolerance,
        curve=np.array(run.curve),
        log_likelihood=-held(run.W).value,
        pooled=others,
        warnings=warnings_for(runs, best, seen, kurtosis(held.rows, unit)),
    )
    sets = list(found.pooled_atoms.reshape(-1, *found.atoms.shape))
    anew = [components_of(W, learner.whitening)[1] for W in learner.relearned(run, resamples)]
    return replace(
        found,
        held_out_curve=run.held,
        stopped_at=run.iterations if run.outcome == "overfitting" else None,
        over_restarts=found_again(found.atoms, sets[1:]),
        over_resamples=found_again(found.atoms, [a.reshape(found.atoms.shape) for a in anew]),
    )


def _best(runs: tuple[Run, ...]) -> int:
    """The restart with the best objective; once one overfitted, the best on held-out patches."""
    if any(run.outcome == "overfitting" for run in runs):
        return max(range(len(runs)), key=lambda i: (float(runs[i].held[:, 1].max()), -i))
    return min(range(len(runs)), key=lambda i: (runs[i].curve[-1], i))


def components_of(W: F64, whitening: Whitening) -> tuple[F64, F64, NDArray[np.int64]]:
    """Canonical filters and atoms (k, d) of an unmixing W of whitened patches."""
    unit = W / np.linalg.norm(W, axis=1, keepdims=True)
    atoms = (whitening.D @ np.linalg.inv(unit)).T
    return canonical(unit @ whitening.K, atoms, np.ones(len(W)))
