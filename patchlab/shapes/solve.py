"""Least-squares fits of all kernels from all starts, in one compiled loop.

A Levenberg-Marquardt descent with analytic derivatives and simple bounds: a parameter
that sits on its bound and is pushed outwards is held, and every step is cut at the
bounds (a projected method; Kanzow, Yamashita and Fukushima 2004). The damping follows
Nielsen 1999 (report IMM-REP-1999-05), scaled by the diagonal of the normal matrix
(Marquardt 1963).

The solver's own parameters are the family's, but for the surround of centre_surround,
which is held as its ratio to the centre so that it stays the wider of the two.
"""

from __future__ import annotations

import math

import numpy as np
from numpy.typing import NDArray

from patchlab._jit import jit
from patchlab.conventions import Array
from patchlab.families import PARAMETERS
from patchlab.shapes.edge import centre_surround_model, gd_model
from patchlab.shapes.gabor import gabor_model

CODES = {"gabor": 0, "gd1": 1, "gd2": 2, "centre_surround": 3}

STARTS_TOLERANCE = 1e-6
"""Relative fall of the squared error at which a start rests; only the best one goes on."""

FINAL_TOLERANCE = 1e-13
STARTS_STEPS = 100
FINAL_STEPS = 400


@jit
def model(code: int, q: Array, r: Array, value: Array, jac: Array) -> None:
    """Evaluate a family in the solver's parameters, with derivatives by them."""
    if code == 0:
        gabor_model(q, r, value, jac)
    elif code < 3:
        gd_model(code, q, r, value, jac)
    else:
        natural = q.copy()
        natural[4] = q[3] * q[4]
        centre_surround_model(natural, r, value, jac)
        for n in range(value.shape[0]):
            jac[3, n] += q[4] * jac[4, n]
            jac[4, n] *= q[3]


@jit
def _dot(a: Array, b: Array) -> float:
    # four running sums, in a fixed order, so that the processor can overlap them
    s0 = s1 = s2 = s3 = 0.0
    whole = a.shape[0] // 4 * 4
    for i in range(0, whole, 4):
        s0 += a[i] * b[i]
        s1 += a[i + 1] * b[i + 1]
        s2 += a[i + 2] * b[i + 2]
        s3 += a[i + 3] * b[i + 3]
    for i in range(whole, a.shape[0]):
        s0 += a[i] * b[i]
    return (s0 + s1) + (s2 + s3)


@jit
def _normal_equations(jac: Array, left: Array, normal: Array, pull: Array) -> None:
    for a in range(pull.shape[0]):
        pull[a] = _dot(jac[a], left)
        for b in range(a + 1):
            normal[a, b] = _dot(jac[a], jac[b])
            normal[b, a] = normal[a, b]


@jit
def _damped_step(
    normal: Array, pull: Array, held: NDArray[np.bool_], damping: float, low: Array, step: Array
) -> bool:
    """Solve (N + damping diag N) step = pull over the free parameters by Cholesky."""
    n = pull.shape[0]
    top = 0.0
    for a in range(n):
        top = max(top, normal[a, a])
    for a in range(n):
        for b in range(a + 1):
            s = normal[a, b] if not (held[a] or held[b]) else 0.0
            if a == b:
                s = 1.0 if held[a] else s + damping * max(s, 1e-14 * top)
            for c in range(b):
                s -= low[a, c] * low[b, c]
            if a == b:
                if not s > 0.0:
                    return False
                low[a, a] = math.sqrt(s)
            else:
                low[a, b] = s / low[b, b]
    for a in range(n):
        s = 0.0 if held[a] else pull[a]
        for c in range(a):
            s -= low[a, c] * step[c]
        step[a] = s / low[a, a]
    for a in range(n - 1, -1, -1):
        s = step[a]
        for c in range(a + 1, n):
            s -= low[c, a] * step[c]
        step[a] = s / low[a, a]
    return True


@jit
def _try_step(q: Array, step: Array, lower: Array, upper: Array, trial: Array) -> None:
    """Move to ``trial``, cut at the bounds; ``step`` becomes what was really walked."""
    for a in range(q.shape[0]):
        trial[a] = min(max(q[a] + step[a], lower[a]), upper[a])
        step[a] = trial[a] - q[a]


@jit
def _predicted(normal: Array, pull: Array, step: Array) -> float:
    """Fall of the squared error that the linear model promises for a step."""
    fall = 0.0
    for a in range(pull.shape[0]):
        curved = 0.0
        for b in range(pull.shape[0]):
            curved += normal[a, b] * step[b]
        fall += step[a] * (2.0 * pull[a] - curved)
    return fall


@jit
def descend(
    code: int,
    target: Array,
    r: Array,
    q: Array,
    lower: Array,
    upper: Array,
    tolerance: float,
    limit: int,
) -> float:
    """Walk ``q`` downhill in place; return the squared error reached."""
    n, pixels = q.shape[0], target.shape[0]
    value, trial_value = np.empty(pixels), np.empty(pixels)
    jac, trial_jac = np.empty((n, pixels)), np.empty((n, pixels))
    normal, low = np.empty((n, n)), np.zeros((n, n))
    pull, step, trial = np.empty(n), np.empty(n), np.empty(n)
    held = np.zeros(n, dtype=np.bool_)
    model(code, q, r, value, jac)
    left = target - value
    cost = _dot(left, left)
    _normal_equations(jac, left, normal, pull)
    damping, growth = 1e-2, 2.0
    for _ in range(limit):
        for a in range(n):
            held[a] = (q[a] <= lower[a] and pull[a] < 0) or (q[a] >= upper[a] and pull[a] > 0)
        if damping > 1e14:
            break
        if not _damped_step(normal, pull, held, damping, low, step):
            damping *= 10.0
            continue
        _try_step(q, step, lower, upper, trial)
        promised = _predicted(normal, pull, step)
        model(code, trial, r, trial_value, trial_jac)
        for i in range(pixels):
            trial_value[i] = target[i] - trial_value[i]
        trial_cost = _dot(trial_value, trial_value)
        if not trial_cost < cost:
            if abs(promised) <= 1e-15 * cost:
                break
            damping *= growth
            growth *= 2.0
            continue
        fall = cost - trial_cost
        gain = fall / promised if promised > 0.0 else 0.0
        damping = max(damping * max(1.0 / 3.0, 1.0 - (2.0 * gain - 1.0) ** 3), 1e-12)
        growth = 2.0
        q[:] = trial
        left, trial_value = trial_value, left
        jac, trial_jac = trial_jac, jac
        cost = trial_cost
        _normal_equations(jac, left, normal, pull)
        if fall <= tolerance * cost and promised <= 10.0 * tolerance * cost:
            break
    return cost


@jit
def fit_batch(
    code: int, kernels: Array, starts: Array, r: Array, lower: Array, upper: Array
) -> tuple[Array, Array]:
    """Fit every kernel from every start and polish the best.

    Parameters
    ----------
    code : of the family, from :data:`CODES`
    kernels : ndarray (k, size * size)
    starts : ndarray (k, s, n), in the solver's parameters; not changed
    r : ndarray (size,), pixel coordinates about the window's middle
    lower, upper : ndarray (n,), bounds

    Returns
    -------
    best : ndarray (k, n), in the solver's parameters
    squared_error : ndarray (k,)
    """
    count, tries, n = starts.shape
    best, error = np.empty((count, n)), np.empty(count)
    for k in range(count):
        error[k] = np.inf
        for s in range(tries):
            q = starts[k, s].copy()
            reached = descend(code, kernels[k], r, q, lower, upper, STARTS_TOLERANCE, STARTS_STEPS)
            if s == 0 or reached < error[k]:
                error[k] = reached
                best[k] = q
        error[k] = descend(code, kernels[k], r, best[k], lower, upper, FINAL_TOLERANCE, FINAL_STEPS)
    return best, error


@jit
def evaluate_batch(code: int, q: Array, r: Array, value: Array, jac: Array) -> None:
    """Fill ``value`` (m, size * size) and ``jac`` for ``q`` (m, n).

    ``jac`` is (m, n, size * size), or (1, n, size * size) for scratch space.
    """
    for k in range(q.shape[0]):
        model(code, q[k], r, value[k], jac[min(k, jac.shape[0] - 1)])


def to_solver(family: str, parameters: Array) -> Array:
    """The solver's parameters (..., n) of a family's own."""
    q = np.array(parameters, dtype=np.float64)
    if family == "centre_surround":
        q[..., 4] /= q[..., 3]
    return q


def from_solver(family: str, q: Array) -> Array:
    """A family's own parameters (..., n) of the solver's."""
    p = np.array(q, dtype=np.float64)
    if family == "centre_surround":
        p[..., 4] *= p[..., 3]
    return p


def evaluate(family: str, parameters: Array, size: int) -> tuple[Array, Array]:
    """Sample many kernels of a family and their derivatives by parameter.

    Parameters
    ----------
    family : gabor, gd1, gd2 or centre_surround
    parameters : ndarray (m, n), columns in the order of ``families.PARAMETERS``
    size : window side, pixels

    Returns
    -------
    values : ndarray (m, size, size), what ``families.render`` gives, to rounding
    derivatives : ndarray (m, n, size, size)
    """
    p = np.ascontiguousarray(parameters, dtype=np.float64)
    m, n = p.shape[0], len(PARAMETERS[family])
    r = np.arange(size, dtype=np.float64) - (size - 1) / 2
    value, jac = np.empty((m, size * size)), np.empty((m, n, size * size))
    evaluate_batch(CODES[family], to_solver(family, p), r, value, jac)
    if family == "centre_surround":  # derivatives back from (s, t / s) to (s, t)
        jac[:, 4] /= p[:, 3, None]
        jac[:, 3] -= (p[:, 4] / p[:, 3])[:, None] * jac[:, 4]
    return value.reshape(m, size, size), jac.reshape(m, n, size, size)


def sample(family: str, q: Array, size: int) -> Array:
    """Sample many kernels (m, size * size) from the solver's parameters (m, n)."""
    r = np.arange(size, dtype=np.float64) - (size - 1) / 2
    value, scratch = np.empty((len(q), size * size)), np.empty((1, q.shape[1], size * size))
    evaluate_batch(CODES[family], np.ascontiguousarray(q), r, value, scratch)
    return value
