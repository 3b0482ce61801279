"""Preconditioned L-BFGS for the likelihood of independent components.

Two geometries, one solver. *Free*: ``W <- (I + E) W``. *Orthogonal*: W is a diagonal
of free gains times an orthogonal matrix; E is skew (a rotation, by Cayley's map)
plus a diagonal (the gains). A direction is a k x k matrix E, the gradient one of the
same kind, the inner product the sum over all entries.

The preconditioner is the Hessian that independent components would have,
``h_ij = E[psi_i'] E[y_j^2]``. The exact pair curvatures were tried too: on photographs,
whose components share their variance, they are smaller, the steps too long, and the
line search had to be called three times a step.

Sources: Ablin, Cardoso & Gramfort 2018, Faster independent component analysis by
preconditioning with Hessian approximations, IEEE Trans. Signal Process. 66:4040;
the same authors 2018, Faster ICA under orthogonal constraint, ICASSP; Nocedal &
Wright 2006, Numerical Optimization, algorithm 7.4 (two-loop recursion).
"""

from __future__ import annotations

from collections.abc import Callable
from dataclasses import dataclass, field, replace
from typing import Protocol

import numpy as np

from patchlab.learn.likelihood import Evaluation
from patchlab.types import F64

MEMORY = 10
"""Pairs that L-BFGS remembers."""
FLOOR = 1e-2
"""Smallest curvature the preconditioner believes in."""
ROUNDING = 1e-8
"""Noise of the objective, nats per patch and component."""


class Geometry(Protocol):
    """Where W lives: its gradient, preconditioner and steps."""

    def gradient(self, at: Evaluation) -> F64:
        """Derivative of the objective for E, as a k x k matrix."""

    def curvature(self, at: Evaluation) -> F64:
        """What :meth:`solve` divides by, from the curvatures of independent components."""

    def solve(self, curvature: F64, direction: F64) -> F64:
        """Apply the inverse of the approximate Hessian, made positive by the floor."""

    def move(self, W: F64, E: F64) -> F64:
        """W after a step E."""


class Free:
    """Any invertible W; E is any matrix."""

    def gradient(self, at: Evaluation) -> F64:
        """Relative gradient ``E[psi(y) y'] - I``."""
        return at.score - np.eye(len(at.score))

    def curvature(self, at: Evaluation) -> F64:
        """``h_ij``, lifted so that each block ``[[h_ij, 1], [1, h_ji]]`` is positive."""
        pairs = np.outer(at.slope, at.energy)
        mean, half = (pairs + pairs.T) / 2, (pairs - pairs.T) / 2
        smallest = mean - np.sqrt(half**2 + 1)
        lifted = pairs + np.maximum(FLOOR - smallest, 0)
        np.fill_diagonal(lifted, np.maximum(np.diag(pairs), 0) + 1)
        return lifted

    def solve(self, curvature: F64, direction: F64) -> F64:
        """Invert every block ``[[h_ij, 1], [1, h_ji]]``."""
        determinant = curvature * curvature.T - 1
        np.fill_diagonal(determinant, 1)
        out = (curvature.T * direction - direction.T) / determinant
        np.fill_diagonal(out, np.diag(direction) / np.diag(curvature))
        return np.asarray(out)

    def move(self, W: F64, E: F64) -> F64:
        """``(I + E) W``."""
        return W + E @ W


class Orthogonal:
    """W = gains times an orthogonal matrix; E is skew plus diagonal."""

    def gradient(self, at: Evaluation) -> F64:
        """Skew part of the rotation's derivative, with the gains' on the diagonal."""
        gain = np.linalg.norm(at.W, axis=1)
        rotation = at.score * (gain[:, None] / gain)
        out = (rotation - rotation.T) / 2
        np.fill_diagonal(out, np.diag(at.score) - 1)
        return np.asarray(out)

    def curvature(self, at: Evaluation) -> F64:
        """Half the second derivative for turning each pair; the gains' on the diagonal."""
        pairs = np.outer(at.slope, at.energy)
        out = np.maximum(turning(at.W, pairs, np.diag(at.score)) / 2, FLOOR)
        np.fill_diagonal(out, np.maximum(np.diag(pairs) + np.diag(at.score), FLOOR))
        return np.asarray(out)

    def solve(self, curvature: F64, direction: F64) -> F64:
        """Divide entry by entry."""
        return np.asarray(direction / curvature)

    def move(self, W: F64, E: F64) -> F64:
        """Turn by Cayley's map of the skew part, stretch by the diagonal's exponential."""
        gain = np.linalg.norm(W, axis=1)
        half = E / 2
        np.fill_diagonal(half, 0)
        eye = np.eye(len(W))
        turned = np.linalg.solve(eye - half, (eye + half) @ (W / gain[:, None]))
        return np.asarray((gain * np.exp(np.diag(E)))[:, None] * turned)


def turning(W: F64, pairs: F64, own: F64) -> F64:
    """Second derivative of the objective for turning component i towards j, (k, k).

    ``h_ij g_i^2 / g_j^2 + h_ji g_j^2 / g_i^2 - E[psi_i y_i] - E[psi_j y_j]`` with gains g:
    zero for two Gaussians, whose rotation the data cannot see.

    Parameters
    ----------
    W : ndarray (k, k)
    pairs : ndarray (k, k), ``h_ij``
    own : ndarray (k,), ``E[psi_i y_i]``
    """
    gain = np.linalg.norm(W, axis=1)
    one = pairs * (gain[:, None] / gain) ** 2
    return np.asarray(one + one.T - own[:, None] - own)


@dataclass(frozen=True, eq=False)
class State:
    """Where a solver stands: enough to go on as if it had never stopped.

    Parameters
    ----------
    W : ndarray (k, k)
    steps, changes : L-BFGS memory, steps and gradient differences, oldest first
    iterations : accepted steps so far
    curve : objective after each accepted step, first entry before any
    decrement : the last Newton decrement
    outcome : "" while it goes on; "converged", "stalled" or "limit"; a judge may end it
        with a word of its own
    """

    W: F64
    steps: tuple[F64, ...] = ()
    changes: tuple[F64, ...] = ()
    iterations: int = 0
    curve: tuple[float, ...] = ()
    decrement: float = np.inf
    outcome: str = ""


@dataclass
class Solver:
    """Minimise an objective over one geometry.

    Parameters
    ----------
    objective : W to Evaluation
    geometry : Free() or Orthogonal()
    tolerance : stop when the Newton decrement, half of g' H^-1 g in nats per patch, is below
    limit : accepted steps at most
    after : told the state after every accepted step
    judge : sees it first, and may end learning with another one
    """

    objective: Callable[[F64], Evaluation]
    geometry: Geometry
    tolerance: float
    limit: int
    after: Callable[[State], None] = field(default=lambda state: None)
    judge: Callable[[State], State] = field(default=lambda state: state)

    def run(self, state: State) -> State:
        """Go on from ``state`` until the rule, the limit or a stall ends it."""
        at = self.objective(state.W)
        if not state.curve:
            state = replace(state, curve=(at.value,))
        while not state.outcome:
            state, at = self._step(state, at)
            state = self.judge(state)
            self.after(state)
        return state

    def _step(self, state: State, at: Evaluation) -> tuple[State, Evaluation]:
        gradient = self.geometry.gradient(at)
        curvature = self.geometry.curvature(at)
        plain = -self.geometry.solve(curvature, gradient)
        decrement = -float(np.sum(gradient * plain)) / 2
        state = replace(state, decrement=decrement)
        if decrement <= self.tolerance:
            return replace(state, outcome="converged"), at
        if state.iterations >= self.limit:
            return replace(state, outcome="limit"), at
        quasi = self._two_loops(state, curvature, gradient)
        for direction in (quasi, plain):  # a failed search forgets the past once, then stops
            found = self._search(at, gradient, direction)
            if found is not None:
                break
            state = replace(state, steps=(), changes=())
        else:
            return replace(state, outcome="stalled"), at
        E, new = found
        change = self.geometry.gradient(new) - gradient
        if float(np.sum(E * change)) > 0:  # a pair of negative curvature would turn the model
            state = replace(
                state,
                steps=(*state.steps, E)[-MEMORY:],
                changes=(*state.changes, change)[-MEMORY:],
            )
        state = replace(
            state,
            W=new.W,
            iterations=state.iterations + 1,
            curve=(*state.curve, new.value),
        )
        return state, new

    def _two_loops(self, state: State, curvature: F64, gradient: F64) -> F64:
        q, weights = gradient.copy(), []
        for s, y in zip(reversed(state.steps), reversed(state.changes), strict=True):
            a = float(np.sum(s * q) / np.sum(s * y))
            weights.append(a)
            q -= a * y
        r = self.geometry.solve(curvature, q)
        for s, y, a in zip(state.steps, state.changes, reversed(weights), strict=True):
            r += s * (a - float(np.sum(y * r) / np.sum(s * y)))
        return -r

    def _search(
        self, at: Evaluation, gradient: F64, direction: F64
    ) -> tuple[F64, Evaluation] | None:
        """Backtrack with a parabola until the objective falls enough (Armijo, 1e-4).

        Below the rounding of the float32 pass the derivative decides instead (the approximate
        condition of Hager & Zhang 2005, SIAM J. Optim. 16:170).
        """
        slope = float(np.sum(gradient * direction))
        if not slope < 0:
            return None
        step = min(1.0, len(at.W) ** 0.5 / float(np.linalg.norm(direction)))
        for _ in range(12):
            E = step * direction
            new = self.objective(self.geometry.move(at.W, E))
            rise = new.value - at.value
            if rise <= 1e-4 * step * slope:
                return E, new
            if rise <= ROUNDING * len(at.W):
                after = float(np.sum(self.geometry.gradient(new) * direction))
                if abs(after) < 0.9 * abs(slope):
                    return E, new
            bend = rise - step * slope
            step *= min(max(-step * slope / (2 * bend), 0.1), 0.5) if np.isfinite(bend) else 0.1
        return None
