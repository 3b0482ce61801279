"""Sparse codes: the l1-penalised least squares of many patches at once.

``a = argmin 1/2 |z - B a|^2 + penalty |a|_1`` by greedy coordinate descent over the
Gram matrix B'B, compiled: each step moves the coordinate that moves furthest. Where more
than three digits are asked for, exact steps on the active set finish it.
"""

from __future__ import annotations

from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab._jit import jit
from patchlab.errors import InputError, UsageError
from patchlab.learn.likelihood import Mapper
from patchlab.types import F64

ROUGH = 1e-4
"""Tolerance down to which float32 rows are coded by coordinate descent alone."""
COARSE = 6e-3
"""Tolerance at which descent hands over to exact steps, where more is asked for."""
CODES = 1024
"""Patches that are coded together."""


@jit
def _descend(
    gram: NDArray[Any],
    correlation: NDArray[Any],
    penalty: np.floating[Any],
    tolerance: np.floating[Any],
    codes: NDArray[Any],
    settled: NDArray[np.bool_],
    move: NDArray[Any],
    bits: NDArray[Any],
    low: np.integer[Any],
) -> None:
    """Code each row; ``correlation`` holds B'z and ends as the correlation of the residual.

    gram : (K, K); correlation, codes : (n, K), codes start at zero; all of one float type.
    A row is settled when no coordinate would move its residual correlation by more than
    ``tolerance``; after 20 K steps it is left as it stands.

    move : (K,) scratch; ``bits`` is the same memory as whole numbers. Floats that are not
    negative are ordered as their bits are, so with the index in the ``low`` bits one maximum
    of whole numbers, which the compiler can vectorise, finds the largest move and its place
    (of moves that differ in those last bits alone, any).
    """
    n, k = correlation.shape
    diagonal = np.empty_like(gram[0])
    inverse = np.empty_like(gram[0])
    own = np.empty_like(gram[0])
    one = np.divide(penalty, penalty)
    zero = one - one
    for j in range(k):
        diagonal[j] = gram[j, j]
        inverse[j] = np.divide(one, diagonal[j]) if diagonal[j] > 0 else zero
    high = ~low
    for i in range(n):
        q, a = correlation[i], codes[i]
        own[:] = zero
        best, step = low & high, zero
        for _ in range(20 * k):
            row = gram[best]
            for j in range(k):
                r = q[j] - row[j] * step
                q[j] = r
                u = r + own[j]
                aim = max(u - penalty, zero) + min(u + penalty, zero)
                move[j] = abs(aim - own[j])
            top = low & high
            for j in range(k):
                top = max(top, (bits[j] & high) | (low & j))
            best = top & low
            if move[best] <= tolerance:
                rest = k
                for j in range(k):  # what is all but zero becomes zero, or the KKT would not hold
                    if a[j] != 0 and abs(q[j] + own[j]) <= penalty:
                        rest = j
                if rest == k:
                    settled[i] = True
                    break
                best = rest
            u = q[best] + own[best]
            aim = max(u - penalty, zero) + min(u + penalty, zero)
            step = (aim - own[best]) * inverse[best]
            own[best] = aim
            a[best] = aim * inverse[best]


@jit
def _polish(
    gram: NDArray[Any],
    target: NDArray[Any],
    penalty: np.floating[Any],
    tolerance: np.floating[Any],
    codes: NDArray[Any],
    settled: NDArray[np.bool_],
) -> None:
    """Finish rows that stand near their optimum, by exact steps on the active set.

    A step solves for the active coefficients with their signs held (Cholesky); where one would
    change its sign, the step ends there and it leaves; then the coefficient that violates the
    conditions most comes in. The objective falls with each step, so it ends (active-set method
    for convex quadratic programs, Nocedal & Wright 2006, section 16.5). A row whose active set
    is singular, or that takes too long, stays unsettled.

    gram : (K, K); target, codes : (n, K); all float64; ``codes`` holds the start.
    """
    n, k = target.shape
    on, sign = np.empty(k, np.int64), np.empty(k)
    x, q, upper = np.empty(k), np.empty(k), np.zeros((k, k))
    for i in range(n):
        a, m, fresh = codes[i], 0, -1
        for j in range(k):
            if a[j] != 0:
                on[m], sign[m] = j, np.sign(a[j])
                m += 1
        for _ in range(4 * k):
            singular = -1
            for r in range(m):
                row = gram[on[r]]
                x[r] = target[i, on[r]] - penalty * sign[r]
                for c in range(m):
                    upper[r, c] = row[on[c]]
            for c in range(m):  # Cholesky by rows, with the forward half of the solution
                pivot = upper[c, c]
                if not pivot > 1e-10 * gram[on[c], on[c]]:
                    singular = c
                    break
                inverse = np.divide(1.0, np.sqrt(pivot))
                head = upper[c]
                for s in range(m):
                    head[s] *= inverse
                head[c] = inverse  # its reciprocal is what is used
                x[c] *= inverse
                for r in range(c + 1, m):
                    factor, below = head[r], upper[r]
                    x[r] -= factor * x[c]
                    for s in range(m):  # from zero, as the compiler can vectorise; s < r is idle
                        below[s] -= factor * head[s]
            if singular >= 0 and singular == fresh:
                break  # without the newest one it would only come back
            if singular >= 0:  # descent left more of them than can be told apart
                a[on[singular]] = 0.0
                m -= 1
                for r in range(singular, m):
                    on[r], sign[r] = on[r + 1], sign[r + 1]
                continue
            fresh = -1
            for r in range(m - 1, -1, -1):
                head = upper[r]
                total = x[r]
                for s in range(r + 1, m):
                    total -= head[s] * x[s]
                x[r] = total * head[r]
            length, leaves = 1.0, -1
            for r in range(m):
                if x[r] * sign[r] <= 0:
                    old = a[on[r]]
                    gap = old - x[r]
                    share = np.divide(old, gap) if gap != 0 else 0.0
                    if share < length or leaves < 0:
                        length, leaves = share, r
            for r in range(m):
                j = on[r]
                a[j] = x[r] if leaves < 0 else a[j] + length * (x[r] - a[j])
            if leaves >= 0:
                a[on[leaves]] = 0.0
                m -= 1
                for r in range(leaves, m):
                    on[r], sign[r] = on[r + 1], sign[r + 1]
                continue
            q[:] = target[i]
            for r in range(0, m - m % 2, 2):
                one, two = gram[on[r]], gram[on[r + 1]]
                first, second = a[on[r]], a[on[r + 1]]
                for j in range(k):
                    q[j] -= one[j] * first + two[j] * second
            if m % 2:
                one, first = gram[on[m - 1]], a[on[m - 1]]
                for j in range(k):
                    q[j] -= one[j] * first
            best, worst = -1, penalty + tolerance
            for j in range(k):
                if a[j] == 0 and abs(q[j]) > worst:
                    best, worst = j, abs(q[j])
            if best < 0:
                settled[i] = True
                break
            on[m], sign[m] = best, np.sign(q[best])
            fresh = m
            m += 1


def _settle(
    gram: NDArray[Any], target: NDArray[Any], start: NDArray[Any], penalty: float, tolerance: float
) -> F64:
    """Finish a row that descent left: Newton steps on the active set, cut at changes of sign.

    Feature-sign search (Lee, Battle, Raina & Ng 2006, NIPS 19). A ridge of rounding size
    lets a step leave a singular set of atoms.
    """
    G, b, a = gram.astype(np.float64), target.astype(np.float64), start.astype(np.float64)
    ridge = 1e-12 * np.trace(G) * np.eye(len(G))
    for _ in range(20 * len(G)):
        q, sign = b - G @ a, np.sign(a)
        wrong = np.where(sign != 0, np.abs(q - penalty * sign), np.abs(q) - penalty)
        if wrong.max() <= tolerance:
            break
        if not np.any(wrong[sign != 0] > tolerance):  # these are settled: let another one in
            j = int(np.argmax(wrong))
            sign[j] = np.sign(q[j])
        on = np.flatnonzero(sign)
        step = np.zeros_like(a)
        step[on] = np.linalg.solve((G + ridge)[np.ix_(on, on)], (q - penalty * sign)[on])
        a = _best_along(G, q, a, step, penalty)
    return a


def _best_along(G: F64, q: F64, a: F64, step: F64, penalty: float) -> F64:
    """The best of ``a + step`` and of all points before it where a coefficient turns zero."""
    with np.errstate(divide="ignore", invalid="ignore"):
        cross = np.where(step != 0, -a / step, 0.0)
    times = np.append(cross[(cross > 0) & (cross < 1)], 1.0)
    slope, bend = -float(q @ step), float(step @ G @ step) / 2
    points = a + times[:, None] * step
    cost = times * slope + times**2 * bend + penalty * np.abs(points).sum(axis=1)
    best = int(np.argmin(cost))
    out = points[best]
    out[cross == times[best]] = 0.0
    return np.asarray(out)


def lasso(
    z: NDArray[Any],
    B: F64,
    penalty: float,
    *,
    tolerance: float = 1e-6,
    mapper: Mapper = map,
) -> NDArray[Any]:
    """Codes of the rows of z over the columns of B.

    At the end the optimality (KKT) conditions hold to ``tolerance * penalty`` times the
    squared norm of an atom: with r = z - B a, ``|b_j' r - penalty sign(a_j)|`` where a_j is
    not zero, ``|b_j' r| <= penalty`` elsewhere.

    Parameters
    ----------
    z : ndarray (n, m), float32 or float64; the codes have its type
    B : ndarray (m, K), columns of any norm; a column of zeros gets codes of zero
    penalty : positive, in the units of z
    tolerance : relative to the penalty

    Returns
    -------
    ndarray (n, K)

    Raises
    ------
    UsageError : penalty or tolerance not positive, shapes that do not fit.
    InputError : a value that is not finite.

    Sources: Wu & Lange 2008, Ann. Appl. Stat. 2:224 (greedy coordinate descent in float32);
    from there, for float64 rows and tight tolerances, an active-set method in float64; rows
    that both leave unsettled are finished by feature-sign search (Lee et al. 2006, NIPS 19).

    Examples
    --------
    >>> lasso(np.array([[3.0, -0.5]]), np.eye(2), 1.0).tolist()
    [[2.0, 0.0]]
    """
    if not (penalty > 0 and tolerance > 0):
        raise UsageError("penalty and tolerance are positive", where="penalty")
    if z.ndim != 2 or B.ndim != 2 or z.shape[1] != B.shape[0]:
        raise UsageError(f"rows of {z.shape} cannot be coded over atoms of {B.shape}")
    if not (np.isfinite(z).all() and np.isfinite(B).all()):
        raise InputError("a value is not a finite number")
    kind: type[Any] = np.float32 if z.dtype == np.float32 else np.float64
    low = np.int32((1 << max(B.shape[1] - 1, 1).bit_length()) - 1)
    exact = np.ascontiguousarray(B.T @ B, np.float64)
    gram, atoms = exact.astype(np.float32), np.ascontiguousarray(B, kind)
    codes = np.zeros((len(z), B.shape[1]), kind)
    rough = kind is np.float32 and tolerance >= ROUGH
    limit = np.float32(penalty * (tolerance if rough else COARSE))

    def task(start: int) -> None:
        rows: NDArray[Any] = np.ascontiguousarray(z[start : start + CODES], kind)
        target, settled = rows @ atoms, np.zeros(len(rows), np.bool_)
        left, part = target.astype(np.float32), np.zeros(target.shape, np.float32)
        move = np.zeros(B.shape[1], np.float32)
        _descend(
            gram, left, np.float32(penalty), limit, part, settled, move, move.view(np.int32), low
        )
        fine: NDArray[Any] = part
        if not rough:
            target, fine = target.astype(np.float64), part.astype(np.float64)
            settled[:] = False
            _polish(
                exact, target, np.float64(penalty), np.float64(penalty * tolerance), fine, settled
            )
        for i in np.flatnonzero(~settled):
            fine[i] = _settle(exact, target[i], fine[i], penalty, penalty * tolerance)
        codes[start : start + CODES] = fine

    for _ in mapper(task, range(0, len(z), CODES)):
        pass
    return codes
