"""Watching held-out patches while components are learned, to stop before overfitting.

Every five steps the held-out log-likelihood is taken, in 32 groups of patches. A look is
*bad* when the log-likelihood lies below its best so far by more than a tenth of all that
learning had gained there over its random start, and by more than one standard error of the
difference (from the groups). Six bad looks in a row, or a bad look where learning ends, mean
overfitting: learning goes back to the best look and ends there.

The loss is measured against the gain because the two differ by orders where there are enough
patches, whatever their number, so ample data never stop early. A family of such rules:
Prechelt 1998, Early stopping - but when?, Lect. Notes Comput. Sci. 1524:55 (generalisation
loss, with patience; from memory).
"""

from __future__ import annotations

from collections.abc import Mapping
from dataclasses import dataclass, fields, replace
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.learn.likelihood import Likelihood
from patchlab.learn.solver import State
from patchlab.types import F64

EVERY = 5
"""Accepted steps between two looks."""
SHARE = 0.1
"""Share of the gain that may be lost again."""
PATIENCE = 6
"""Bad looks in a row that end learning."""
GROUPS = 32
"""Groups of held-out patches whose spread tells the error of a difference."""


@dataclass(frozen=True, eq=False)
class Watch:
    """What was seen of the held-out patches so far; log-likelihoods in nats per patch.

    Parameters
    ----------
    began : at the random start
    steps, values : steps of this round that were looked at, and what was seen
    best : groups (m,) of the best look
    W : ndarray (k, k), where that was
    bad : bad looks in a row, up to now
    """

    began: float
    steps: tuple[int, ...] = ()
    values: tuple[float, ...] = ()
    best: F64 | None = None
    W: F64 | None = None
    bad: int = 0

    @property
    def best_step(self) -> int:
        """The step of the best look."""
        return self.steps[int(np.argmax(self.values))]

    def anew(self) -> Watch:
        """For the next round: only the start is remembered."""
        return Watch(self.began)

    def curve(self) -> F64:
        """Ndarray (m, 2): step and log-likelihood."""
        return np.column_stack([np.array(self.steps, dtype=np.float64), np.array(self.values)])

    def arrays(self, at: str) -> dict[str, NDArray[Any]]:
        """Everything as named arrays, the names led by ``at``; what is not there is left out."""
        values = {f.name: getattr(self, f.name) for f in fields(self)}
        return {at + name: np.asarray(v) for name, v in values.items() if v is not None}

    @staticmethod
    def from_arrays(data: Mapping[str, NDArray[Any]], at: str) -> Watch | None:
        """Rebuild what :meth:`arrays` gave; None where nothing was watched.

        Raises
        ------
        KeyError : an array is missing.
        """
        if at + "began" not in data:
            return None
        return Watch(
            float(data[at + "began"]),
            tuple(int(v) for v in data[at + "steps"]),
            tuple(float(v) for v in data[at + "values"]),
            data.get(at + "best"),
            data.get(at + "W"),
            int(data[at + "bad"]),
        )


@dataclass(eq=False)
class Watcher:
    """Looks at the held-out patches from step to step of one round.

    Parameters
    ----------
    held : Likelihood over them
    watch : Watch so far
    """

    held: Likelihood
    watch: Watch

    @staticmethod
    def begin(held: Likelihood, W: F64) -> Watch:
        """A Watch that has seen only the start."""
        return Watch(_seen(held, W)[1])

    def judge(self, state: State) -> State:
        """The state as it is, or ended by overfitting and gone back to the best look."""
        if state.outcome or state.iterations % EVERY == 0:
            self._look(state)
        ended = state.outcome in ("converged", "stalled")
        if self.watch.bad < (1 if ended else PATIENCE):
            return state
        assert self.watch.W is not None
        best = self.watch.best_step
        return replace(
            state,
            W=self.watch.W,
            iterations=best,
            curve=state.curve[: best + 1],
            outcome="overfitting",
        )

    def _look(self, state: State) -> None:
        w = self.watch
        if w.steps and w.steps[-1] >= state.iterations:
            return
        groups, value = _seen(self.held, state.W)
        seen = replace(w, steps=(*w.steps, state.iterations), values=(*w.values, value))
        if w.best is None or value > max(w.values):
            self.watch = replace(seen, best=groups, W=state.W, bad=0)
            return
        lost = w.best - groups
        error = float(lost.std()) / max(lost.size - 1, 1) ** 0.5
        gain = max(max(w.values) - w.began, 0.0)
        bad = lost.mean() > max(SHARE * gain, error)
        self.watch = replace(seen, bad=w.bad + 1 if bad else 0)


def _seen(held: Likelihood, W: F64) -> tuple[F64, float]:
    """Log-likelihood of each group of held-out patches and of all, nats per patch."""
    n = len(held.rows)
    edges = np.linspace(0, n, min(GROUPS, n) + 1).astype(int)
    groups = -held.values(W, edges.tolist())
    return groups, float(groups @ np.diff(edges)) / n
