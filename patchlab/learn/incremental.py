"""The early steps of independent components: many cheap ones, each over a batch of patches.

Far from the optimum a batch of two thousand patches shows the direction as well as all of
them do. So learning starts with preconditioned stochastic steps whose length falls, over
batches in a random order, and leaves the rest to the quasi-Newton solver, which sees every
patch. A step turns the orthogonal part of W by Cayley's map of

``-(1 - m) G / H`` plus ``m`` times the step before,

G the skew gradient over the batch and H the curvature that independent components would
have (see :mod:`patchlab.learn.solver`), from running means; the gains take damped Newton
steps. On photographs six passes stand where full passes by quasi-Newton take sixty.

Sources: Bottou, Curtis & Nocedal 2018, SIAM Review 60:223 (stochastic steps of falling
length, momentum); Ablin, Cardoso & Gramfort 2018, ICASSP (the preconditioner).
"""

from __future__ import annotations

from collections.abc import Callable
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.learn.likelihood import BLOCK, Likelihood
from patchlab.types import F64

BATCH = 2 * BLOCK
"""Patches of one step."""
STEPS = 260
"""Steps of a whole course: at 90,000 patches, six passes."""
FIRST, LAST, STEADY = 1.5, 0.1, 0.3
"""Length of the first and of the last step; the share of the course before it falls."""
MOMENTUM = 0.8
MEMORY = 0.2
"""Weight of the newest batch in the running curvatures and gains."""
FLOOR = 0.05
"""Smallest curvature that is divided by."""
LONGEST = 0.3
"""Longest step, as the norm of its skew matrix over the root of the components' number."""


def length(step: int, steps: int = STEPS) -> float:
    """The length of a step: steady at first, then falling geometrically."""
    steady = int(STEADY * steps)
    if step < steady:
        return FIRST
    return float(FIRST * (LAST / FIRST) ** ((step - steady) / max(steps - steady, 1)))


def course(
    objective: Likelihood,
    W: F64,
    *,
    start: int = 0,
    stop: int = STEPS,
    after: Callable[[int], None] = lambda step: None,
) -> F64:
    """W after the steps ``start .. stop`` of a course of ``STEPS``.

    Parameters
    ----------
    objective : over rows that are whitened and in random order, at least one batch
    W : ndarray (k, k), gains times an orthogonal matrix
    start, stop : which steps; a later part of a course takes shorter steps
    after : told the number of each step done

    Returns
    -------
    ndarray (k, k), gains times an orthogonal matrix to rounding
    """
    walker = _Walker(objective, W)
    size = min(BATCH, len(objective.rows))
    batches = len(objective.rows) // size
    for step in range(start, stop):
        at = step % batches * size
        walker.step(at, at + size, length(step))
        after(step + 1)
    left, _, right = np.linalg.svd(walker.turn.astype(np.float64))
    return np.asarray(walker.gain.astype(np.float64)[:, None] * (left @ right))


class _Walker:
    """W as gains and a rotation, float32, with the running means of a course."""

    def __init__(self, objective: Likelihood, W: F64) -> None:
        self.objective = objective
        gain = np.linalg.norm(W, axis=1)
        self.gain = gain.astype(np.float32)
        self.turn = (W / gain[:, None]).astype(np.float32)
        self.eye = np.eye(len(W), dtype=np.float32)
        self.moving = np.zeros_like(self.turn)
        self.means: NDArray[Any] | None = None

    def step(self, start: int, stop: int, length: float) -> None:
        """Take one step over the rows ``start .. stop``."""
        at = self.objective.batch((self.gain[:, None] * self.turn).astype(np.float64), start, stop)
        now = np.stack([at.slope, at.energy, np.diag(at.score)]).astype(np.float32)
        self.means = now if self.means is None else self.means + MEMORY * (now - self.means)
        slope, energy, own = self.means.astype(np.float32)
        wanted = self._direction(at.score.astype(np.float32), slope, energy, own)
        self.moving = MOMENTUM * self.moving + (1 - MOMENTUM) * wanted
        self._turn(length * self.moving)
        newton = (own - 1) / np.maximum(slope * energy + own, FLOOR)
        self.gain = self.gain * np.exp(-MEMORY * np.clip(newton, -1, 1)).astype(np.float32)

    def _direction(self, score: Any, slope: Any, energy: Any, own: Any) -> Any:
        rotation = score * (self.gain[:, None] / self.gain)
        half = np.outer(slope * self.gain**2, energy / self.gain**2)
        curvature = half + half.T - own[:, None] - own
        return (rotation.T - rotation) / np.maximum(curvature, 2 * FLOOR)

    def _turn(self, skew: Any) -> None:
        """Cayley's map of a step that is cut to the longest one."""
        norm = float(np.linalg.norm(skew))
        longest = LONGEST * len(skew) ** 0.5
        half = np.float32(0.5 * min(1.0, longest / max(norm, 1e-30))) * skew
        self.turn = np.linalg.solve(self.eye - half, (self.eye + half) @ self.turn)
