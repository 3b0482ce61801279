"""Where the learner stands, as plain arrays: enough to go on to the same bytes."""

from __future__ import annotations

from collections.abc import Mapping
from dataclasses import dataclass
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.errors import InputError
from patchlab.learn.solver import State
from patchlab.learn.watch import Watch
from patchlab.types import F64


@dataclass(frozen=True, eq=False)
class Run:
    """One finished restart.

    Parameters
    ----------
    W : ndarray (k, k), scaled unmixing of whitened patches
    signs : ndarray (k,), +1 heavy tails, -1 light
    iterations : accepted steps over all stages
    curve : objective of the last stage, nats per patch, one entry a step
    outcome : "converged", "overfitting", "stalled" or "limit"
    held : ndarray (m, 2), step and held-out log-likelihood of the last stage
    """

    W: F64
    signs: F64
    iterations: int
    curve: tuple[float, ...]
    outcome: str
    held: F64


@dataclass(frozen=True, eq=False)
class Checkpoint:
    """Where a learner stands; handed back as ``resume``, it goes on to the same bytes.

    Parameters
    ----------
    restart, stage, round : what is under way
    spent : accepted steps of this restart's earlier stages and rounds
    state : the solver's
    signs : ndarray (k,), density of each component
    finished : the restarts before this one
    watch : what was seen of held-out patches, where there are any
    """

    restart: int
    stage: int
    round: int
    spent: int
    state: State
    signs: F64
    finished: tuple[Run, ...] = ()
    watch: Watch | None = None

    def arrays(self) -> dict[str, NDArray[Any]]:
        """Everything as named arrays, for ``numpy.savez``."""
        s = self.state
        out: dict[str, NDArray[Any]] = {
            "place": np.array([self.restart, self.stage, self.round, self.spent, s.iterations]),
            "signs": self.signs,
            "W": s.W,
            "steps": np.array(s.steps).reshape(-1, *s.W.shape),
            "changes": np.array(s.changes).reshape(-1, *s.W.shape),
            "curve": np.array(s.curve),
            "decrement": np.array(s.decrement),
            "outcome": np.array(s.outcome),
            "runs": np.array(len(self.finished)),
        }
        if self.watch is not None:
            out |= self.watch.arrays("watch.")
        for i, run in enumerate(self.finished):
            out |= {
                f"run{i}.W": run.W,
                f"run{i}.signs": run.signs,
                f"run{i}.iterations": np.array(run.iterations),
                f"run{i}.curve": np.array(run.curve),
                f"run{i}.outcome": np.array(run.outcome),
                f"run{i}.held": run.held,
            }
        return out

    @staticmethod
    def from_arrays(data: Mapping[str, NDArray[Any]]) -> Checkpoint:
        """Rebuild what :meth:`arrays` gave.

        Raises
        ------
        InputError : an array is missing or has the wrong shape.
        """
        try:
            restart, stage, turn, spent, iterations = (int(v) for v in data["place"])
            state = State(
                W=data["W"],
                steps=tuple(data["steps"]),
                changes=tuple(data["changes"]),
                iterations=iterations,
                curve=tuple(float(v) for v in data["curve"]),
                decrement=float(data["decrement"]),
                outcome=str(data["outcome"]),
            )
            finished = tuple(_run(data, f"run{i}.") for i in range(int(data["runs"])))
            watch = Watch.from_arrays(data, "watch.")
            return Checkpoint(restart, stage, turn, spent, state, data["signs"], finished, watch)
        except (KeyError, ValueError, TypeError) as error:
            raise InputError(
                f"damaged checkpoint ({error})", remedy="start again without resuming"
            ) from None


def _run(data: Mapping[str, NDArray[Any]], at: str) -> Run:
    return Run(
        data[at + "W"],
        data[at + "signs"],
        int(data[at + "iterations"]),
        tuple(float(v) for v in data[at + "curve"]),
        str(data[at + "outcome"]),
        data[at + "held"],
    )
