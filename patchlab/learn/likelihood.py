"""The likelihood of independent components, one fused pass over the patches.

Model: ``y = W z`` for whitened patches z, independent components, each with its
own free scale (the rows of W carry it). Two densities, chosen per component:

- heavy tails (sign +1): ``p(y) = 1 / (pi cosh y)``, score ``tanh y``;
- light tails (sign -1): ``p(y) = exp(-(y^2 + 1) / 2) cosh(y) / sqrt(2 pi)``, the even
  mixture of two unit normals at -1 and +1, score ``y - tanh y``.

The objective is the negative mean log-likelihood in nats per patch, in whitened
coordinates: ``sum_i E[-log p_i(y_i)] - log|det W|``.

A pass reads patches in blocks that stay in the cache: a matrix product, one
compiled loop for score, slope and density, a second matrix product. Blocks are
summed in float64 in one fixed order, whatever the number of threads.
"""

from __future__ import annotations

import math
import threading
from collections.abc import Callable, Iterable, Iterator
from dataclasses import dataclass
from itertools import chain, islice, pairwise
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab import cluster
from patchlab._jit import jit
from patchlab.types import F32, F64, Whitening

BLOCK = 1024
"""Rows that go through the cache at once."""
TASK = 8 * BLOCK
"""Rows that one thread sums before it hands over: part of the order of summation."""
GROUP = 32
"""Tasks that are summed together before they join the rest: part of it too, so that a block of
this size can be summed elsewhere."""

Mapper = Callable[[Callable[[int], Any], Iterable[int]], Iterable[Any]]
"""``map`` or a thread pool's ``map``: results in the order of the input."""

# tanh as a ratio of polynomials on |x| < 7.905, within 4e-7 (minimax, in wide use for float32)
_CLIP, _ONE = np.float32(7.90531110763549805), np.float32(1)
_P1, _P3, _P5 = (
    np.float32(4.89352455891786e-03),
    np.float32(6.37261928875436e-04),
    np.float32(1.48572235717979e-05),
)
_P7, _P9 = np.float32(5.12229709037114e-08), np.float32(-8.60467152213735e-11)
_P11, _P13 = np.float32(2.00018790482477e-13), np.float32(-2.76076847742355e-16)
_Q0, _Q2 = np.float32(4.89352518554385e-03), np.float32(2.26843463243900e-03)
_Q4, _Q6 = np.float32(1.18534705686654e-04), np.float32(1.19825839466702e-06)


@jit
def _score(y: F32, offset: F32, t: F32, part: F32, sums: F64) -> None:
    """Centre y in place, write t = tanh(y), add each column's sums to ``sums``.

    The sums are log cosh, tanh^2 and y^2. ``log cosh y = |y| - log(1 + |tanh y|)``: a
    product of factors between 1 and 2 stands for the sum of logarithms. It is read,
    with the other float32 sums, after every 64 rows, long before it could overflow.
    """
    n, k = y.shape
    product, absolute, square, energy = part[0], part[1], part[2], part[3]
    for start in range(0, n, 64):
        product[:] = _ONE
        part[1:] = np.float32(0)
        for i in range(start, min(start + 64, n)):
            for j in range(k):
                v = y[i, j] - offset[j]
                x = min(max(v, -_CLIP), _CLIP)
                s = x * x
                p = _P1 + s * (_P3 + s * (_P5 + s * (_P7 + s * (_P9 + s * (_P11 + s * _P13)))))
                q = _Q0 + s * (_Q2 + s * (_Q4 + s * _Q6))
                r = np.divide(x * p, q)  # the ufunc tests for no zero: the loop vectorises
                y[i, j] = v
                t[i, j] = r
                product[j] *= _ONE + abs(r)
                absolute[j] += abs(v)
                square[j] += r * r
                energy[j] += v * v
        for j in range(k):
            sums[0, j] += np.float64(absolute[j]) - math.log(np.float64(product[j]))
            sums[1, j] += np.float64(square[j])
            sums[2, j] += np.float64(energy[j])


@jit
def _slope(y: F32, t: F32) -> None:
    """Turn y into y^2 and t into 1 - t^2, in place."""
    n, k = y.shape
    for i in range(n):
        for j in range(k):
            y[i, j] *= y[i, j]
            t[i, j] = _ONE - t[i, j] * t[i, j]


@dataclass(frozen=True, eq=False)
class Rows:
    """Patches as the learner reads them.

    Parameters
    ----------
    data : float32 ndarray (N, m), may be memory-mapped
    index : rows of ``data`` to use; None for all
    basis, offset : ``z = basis @ row - offset``; None when rows are whitened already
    """

    data: F32
    index: NDArray[np.int64] | None = None
    basis: F64 | None = None
    offset: F64 | None = None

    @staticmethod
    def of(patches: F32, whitening: Whitening) -> Rows:
        """All patches, to be whitened as they are read."""
        return Rows(patches, None, whitening.K, whitening.K @ whitening.mean)

    def __len__(self) -> int:
        return int(self.data.shape[0] if self.index is None else self.index.size)

    def read(self, start: int, stop: int) -> F32:
        """Rows ``start .. stop`` as they are stored."""
        if self.index is None:
            return self.data[start:stop]
        return self.data[self.index[start:stop]]

    def cut(self, start: int, stop: int) -> Rows:
        """Some of the rows, alone, to be sent elsewhere."""
        return Rows(np.ascontiguousarray(self.read(start, stop)), None, self.basis, self.offset)

    def project(self, W: F64) -> tuple[F32, F32]:
        """Matrix and offset that take a stored row to ``W z``."""
        if self.basis is None or self.offset is None:
            return np.ascontiguousarray(W.T, np.float32), np.zeros(W.shape[0], np.float32)
        A = np.ascontiguousarray((W @ self.basis).T, np.float32)
        return A, (W @ self.offset).astype(np.float32)

    def whitened(self, take: NDArray[np.int64] | None = None) -> Rows:
        """A whitened copy of all rows, or of some (positions in this view)."""
        if take is not None:
            rows = take if self.index is None else self.index[take]
            return Rows(self.data, rows, self.basis, self.offset).whitened()
        if self.basis is None or self.offset is None:
            return Rows(np.ascontiguousarray(self.read(0, len(self))))
        A, b = self.project(np.eye(self.basis.shape[0]))
        out = np.empty((len(self), A.shape[1]), np.float32)
        for start in range(0, len(self), BLOCK):
            stop = min(start + BLOCK, len(self))
            np.matmul(self.read(start, stop), A, out=out[start:stop])
            out[start:stop] -= b
        return Rows(out)


@dataclass(frozen=True, eq=False)
class Evaluation:
    """The objective and what its gradient and curvature need, at one W.

    Parameters
    ----------
    W : ndarray (k, k)
    value : nats per patch, negative mean log-likelihood
    score : ndarray (k, k), ``T_ij = E[psi_i(y_i) y_j]``; the relative gradient is T - I
    slope : ndarray (k,), ``E[psi_i'(y_i)]``
    energy : ndarray (k,), ``E[y_i^2]``
    """

    W: F64
    value: float
    score: F64
    slope: F64
    energy: F64


class Likelihood:
    """The objective over some rows.

    Parameters
    ----------
    rows : Rows
    signs : ndarray (k,) of +1 and -1, the density of each component
    mapper : how tasks are run; the sum does not depend on it
    """

    def __init__(self, rows: Rows, signs: F64, mapper: Mapper = map) -> None:
        self.rows, self.signs, self.mapper = rows, signs, mapper
        self._local = threading.local()

    def __call__(self, W: F64, start: int = 0, stop: int | None = None) -> Evaluation:
        """Value, score moments and slopes at W (k, k), over all rows or ``start .. stop``."""
        k = W.shape[0]
        stop = len(self.rows) if stop is None else stop
        A, b = self.rows.project(W)
        n = stop - start
        farm = cluster.current()
        if farm is not None and n == len(self.rows) > TASK:
            T, sums = _far_sums(farm, self.rows, A, b)
        else:
            tasks = range(start, stop, TASK)
            parts = self.mapper(lambda at: self._task(A, b, at, stop), tasks)
            T, sums = _added(parts, k, GROUP)
        return self._finish(W, T / n, sums / n)

    def batch(self, W: F64, start: int, stop: int) -> Evaluation:
        """As a call over ``start .. stop``, block by block on the threads, no second moments.

        Rows are taken for white: ``E[z z'] = I``. For steps that see a batch at a time; the
        value is not computed.
        """
        A, b = self.rows.project(W)
        k, n = W.shape[0], stop - start
        T, sums = np.zeros((k, k)), np.zeros((3, k))
        blocks = range(start, stop, BLOCK)
        for part, partial in self.mapper(lambda at: self._task(A, b, at, stop, BLOCK), blocks):
            T += part
            sums += partial
        score, slope, energy = T / n, 1.0 - sums[1] / n, sums[2] / n
        light = self.signs < 0
        score[light] = (W[light] @ W.T) - score[light]
        slope[light] = 1.0 - slope[light]
        return Evaluation(W, math.nan, score, slope, energy)

    def values(self, W: F64, edges: list[int]) -> F64:
        """The value at W over each of the groups of rows between ``edges``, nothing else."""
        A, b = self.rows.project(W)
        size = float(np.linalg.slogdet(W)[1])
        out = []
        for start, stop in pairwise(edges):
            sums = np.zeros((3, W.shape[0]))
            for _ in self._blocks(A, b, start, stop, sums):
                pass
            out.append(self._density(sums / (stop - start)) - size)
        return np.array(out)

    def pairs(self, W: F64, start: int = 0, stop: int | None = None) -> tuple[F64, F64]:
        """Curvatures ``h_ij = E[psi_i'(y_i) y_j^2]`` (k, k) and ``E[psi_i y_i]`` (k,).

        Over the rows ``start .. stop``; ``h_ij`` is the exact second derivative of the
        objective along the single entry E_ij, i and j different.
        """
        k = W.shape[0]
        stop = len(self.rows) if stop is None else stop
        A, b = self.rows.project(W)
        H, own, sums = np.zeros((k, k)), np.zeros(k), np.zeros((3, k))
        energy = np.zeros(k)
        for y, t in self._blocks(A, b, start, stop, sums):
            own += np.sum(t * y, axis=0, dtype=np.float64)
            _slope(y, t)
            H += t.T @ y
            energy += y.sum(axis=0, dtype=np.float64)
        H, own, energy = H / (stop - start), own / (stop - start), energy / (stop - start)
        light = self.signs < 0
        H[light] = energy - H[light]
        own[light] = energy[light] - own[light]
        return H, own

    def _task(self, A: F32, b: F32, start: int, end: int, size: int = TASK) -> tuple[F64, F64]:
        k = A.shape[1]
        T, sums = np.zeros((k, k)), np.zeros((3, k))
        for y, t in self._blocks(A, b, start, min(start + size, end), sums):
            T += t.T @ y
        return T, sums

    def _blocks(
        self, A: F32, b: F32, start: int, stop: int, sums: F64
    ) -> Iterator[tuple[F32, F32]]:
        """Go over blocks: y and tanh(y); ``sums`` gathers the column sums of _score."""
        k = A.shape[1]
        buffers = getattr(self._local, "buffers", None)
        if buffers is None:
            buffers = self._local.buffers = np.empty((2, BLOCK, k), np.float32)
        part = np.empty((4, k), np.float32)
        for at in range(start, stop, BLOCK):
            size = min(BLOCK, stop - at)
            y, t = buffers[0, :size], buffers[1, :size]
            np.matmul(self.rows.read(at, at + size), A, out=y)
            _score(y, b, t, part, sums)
            yield y, t

    def _finish(self, W: F64, T: F64, sums: F64) -> Evaluation:
        _, square, energy = sums
        light = self.signs < 0
        score, slope = T.copy(), 1.0 - square
        if light.any():
            # E[y_i y_j] of the light rows, from the moments that are at hand
            score[light] = (W @ self.second_moment() @ W.T)[light] - T[light]
            slope[light] = square[light]
        value = self._density(sums) - float(np.linalg.slogdet(W)[1])
        return Evaluation(W, value, score, slope, energy)

    def _density(self, sums: F64) -> float:
        logcosh, _, energy = sums
        light = energy / 2 - logcosh + 0.5 * (1 + math.log(2 * math.pi))
        return float(np.where(self.signs < 0, light, logcosh + math.log(math.pi)).sum())

    def second_moment(self) -> F64:
        """``E[z z']`` over the rows, summed once."""
        known: F64 | None = getattr(self, "_second", None)
        if known is None:
            k = self.signs.size
            A, b = self.rows.project(np.eye(k))
            known = np.zeros((k, k))
            for at in range(0, len(self.rows), BLOCK):
                z = self.rows.read(at, min(at + BLOCK, len(self.rows))) @ A - b
                known += z.T @ z
            known /= len(self.rows)
            self._second = known
        return known


def _added(parts: Iterable[tuple[F64, F64]], k: int, group: int) -> tuple[F64, F64]:
    """The sums of tasks, in order, ``group`` of them first among themselves."""
    T, sums = np.zeros((k, k)), np.zeros((3, k))
    for some in _grouped(parts, group):
        together, beside = np.zeros((k, k)), np.zeros((3, k))
        for part, partial in some:
            together += part
            beside += partial
        T += together
        sums += beside
    return T, sums


def _grouped(parts: Iterable[Any], size: int) -> Iterator[Iterable[Any]]:
    parts = iter(parts)
    for first in parts:
        yield chain([first], islice(parts, size - 1))


def _block_sums(rows: Rows, A: F32, b: F32, whole: bool) -> list[tuple[F64, F64]]:
    """Runs where the rows are: the sums of each task, or of all together."""
    at = Likelihood(rows, np.empty(0))
    parts = [at._task(A, b, start, len(rows)) for start in range(0, len(rows), TASK)]
    return [_added(parts, A.shape[1], GROUP)] if whole else parts


def _far_sums(farm: cluster.Cluster, rows: Rows, A: F32, b: F32) -> tuple[F64, F64]:
    """The sums over all rows, block by block on a cluster that holds them."""
    units = cluster.blocks_of(len(rows), TASK, farm.workers, GROUP)
    size = units * TASK
    held = farm.hold(
        rows, lambda rows, i: rows.cut(i * size, min((i + 1) * size, len(rows))),
        -(-len(rows) // size),
    )  # fmt: skip
    whole = units == GROUP
    parts = chain.from_iterable(farm.over(held, _block_sums, A, b, whole))
    return _added(parts, A.shape[1], 1 if whole else GROUP)
