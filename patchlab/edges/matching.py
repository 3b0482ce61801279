"""Scoring found edges against true ones: one-to-one matching, F, Pratt's figure of merit.

For proofs with scenes whose edges are known; detection itself does not use it.
"""

from __future__ import annotations

from dataclasses import dataclass

import numpy as np
from numpy.typing import NDArray
from scipy.sparse import coo_array
from scipy.sparse.csgraph import maximum_bipartite_matching, min_weight_full_bipartite_matching
from scipy.spatial import cKDTree

from patchlab.errors import UsageError
from patchlab.types import F64

RADIUS_PX = 1.0
"""Farthest a found element may lie from the true one it is matched to."""


@dataclass(frozen=True, eq=False)
class Matching:
    """A one-to-one matching of found to true elements.

    Parameters
    ----------
    found, truth : int64 ndarray (k,), indices of the matched pairs, by rising ``found``
    distance : ndarray (k,), pixels
    n_found, n_truth : how many there were on either side
    """

    found: NDArray[np.int64]
    truth: NDArray[np.int64]
    distance: F64
    n_found: int
    n_truth: int

    @property
    def precision(self) -> float:
        """Share of the found elements that are true (1 when nothing was found)."""
        return len(self.found) / self.n_found if self.n_found else 1.0

    @property
    def recall(self) -> float:
        """Share of the true elements that were found (1 when there are none)."""
        return len(self.truth) / self.n_truth if self.n_truth else 1.0

    @property
    def f(self) -> float:
        """Harmonic mean of precision and recall."""
        both = self.n_found + self.n_truth
        return 2 * len(self.found) / both if both else 1.0


def _points(name: str, xy: NDArray[np.floating]) -> F64:
    points = np.asarray(xy, dtype=np.float64)
    if points.ndim != 2 or points.shape[1] != 2 or not np.isfinite(points).all():
        raise UsageError(f"{name} points must be finite and of shape (n, 2), not {points.shape}")
    return points


def match(
    found: NDArray[np.floating], truth: NDArray[np.floating], radius: float = RADIUS_PX
) -> Matching:
    """Match as many pairs as possible within a radius, at the least total distance.

    Parameters
    ----------
    found, truth : ndarray (n, 2) and (m, 2), positions (x, y) in pixels
    radius : largest distance of a pair, pixels

    Returns
    -------
    Matching: of largest size, and of least total distance among those

    Raises
    ------
    UsageError : points that are not (n, 2), a radius that is not positive.

    Notes
    -----
    Each found point may also go to a column of its own at a price above any detour, so a
    full matching of least weight is one of largest size (Jonker and Volgenant 1987,
    Computing 38:325-340, as scipy has it for sparse graphs).

    >>> m = match(np.array([[0.0, 0.0], [0.4, 0.0]]), np.array([[0.3, 0.0]]))
    >>> m.found.tolist(), m.precision, m.recall
    ([1], 0.5, 1.0)
    """
    a, b = _points("found", found), _points("true", truth)
    if not radius > 0:
        raise UsageError(f"the matching radius must be positive, not {radius:g}")
    empty = np.empty(0, np.int64)
    if not len(a) or not len(b):
        return Matching(empty, empty, np.empty(0), len(a), len(b))
    near = cKDTree(a).sparse_distance_matrix(cKDTree(b), radius, output_type="ndarray")
    rows, cols, far = near["i"].astype(np.int64), near["j"].astype(np.int64), near["v"]
    price = (min(len(a), len(b)) + 2.0) * (1 + radius)
    alone = np.arange(len(a))
    weight = np.concatenate([1 + far, np.full(len(a), 1 + price)])  # zero would mean no edge
    graph = coo_array(
        (weight, (np.concatenate([rows, alone]), np.concatenate([cols, len(b) + alone]))),
        shape=(len(a), len(b) + len(a)),
    ).tocsr()
    i, j = min_weight_full_bipartite_matching(graph)
    real = j < len(b)
    pairs = np.asarray(i[real], dtype=np.int64), np.asarray(j[real], dtype=np.int64)
    between = a[pairs[0]] - b[pairs[1]]
    return Matching(*pairs, np.hypot(between[:, 0], between[:, 1]), len(a), len(b))


def count_pairs(
    found: NDArray[np.floating], truth: NDArray[np.floating], radius: float = RADIUS_PX
) -> int:
    """How many pairs :func:`match` would find; much quicker, where the pairs do not matter.

    Parameters are those of :func:`match`.

    Notes
    -----
    Hopcroft and Karp 1973, SIAM J. Comput. 2:225-231, as scipy has it.

    >>> count_pairs(np.array([[0.0, 0.0], [0.4, 0.0]]), np.array([[0.3, 0.0]]))
    1
    """
    a, b = _points("found", found), _points("true", truth)
    if not len(a) or not len(b):
        return 0
    near = cKDTree(a).sparse_distance_matrix(cKDTree(b), radius, output_type="ndarray")
    graph = coo_array((np.ones(len(near)), (near["i"], near["j"])), shape=(len(a), len(b))).tocsr()
    return int((maximum_bipartite_matching(graph) >= 0).sum())


def spaced(points: NDArray[np.floating], step: float = 1.0) -> NDArray[np.int64]:
    """Every ``step`` pixels along outlines: which of their dense samples to keep.

    A thinned edge map has one element for each pixel of length on average; for one-to-one
    matching the truth must be as dense.

    Parameters
    ----------
    points : ndarray (n, 2), samples in order along one outline after the other; a jump of
        more than ``step`` starts a new outline
    step : length between kept samples, pixels

    Returns
    -------
    int64 ndarray, indices into ``points``, rising

    >>> spaced(np.column_stack([np.arange(0, 3, 0.25), np.zeros(12)])).tolist()
    [0, 4, 8]
    """
    p = _points("true", points)
    if not len(p):
        return np.empty(0, np.int64)
    far = np.hypot(*np.diff(p, axis=0).T)
    begins = np.concatenate([[True], far > step])
    length = np.concatenate([[0.0], np.cumsum(np.where(begins[1:], 0.0, far))])
    first = np.flatnonzero(begins)
    run = np.cumsum(begins) - 1
    place = np.floor((length - length[first][run]) / step + 1e-9)
    new = np.concatenate([[True], (np.diff(place) > 0) | begins[1:]])
    return np.flatnonzero(new)


def pratt_merit(
    found: NDArray[np.floating], truth: NDArray[np.floating], alpha: float = 1 / 9
) -> float:
    """Pratt's figure of merit: 1 for a perfect edge map, 0 for one with nothing in common.

    ``sum over found of 1 / (1 + alpha d^2) / max(n found, n true)`` with d the distance to
    the nearest true element (Pratt 1978, Digital Image Processing).

    Parameters
    ----------
    found, truth : ndarray (n, 2) and (m, 2), positions (x, y) in pixels
    alpha : 1 / pixels^2; a ninth is the usual choice
    """
    a, b = _points("found", found), _points("true", truth)
    if not len(a) or not len(b):
        return 1.0 if len(a) == len(b) else 0.0
    distance = np.asarray(cKDTree(b).query(a)[0])
    return float((1 / (1 + alpha * distance**2)).sum() / max(len(a), len(b)))


def direction_error(
    found: NDArray[np.floating], truth: NDArray[np.floating], *, signed: bool = True
) -> F64:
    """Smallest turn from true to found directions, radians.

    Parameters
    ----------
    found, truth : ndarrays of angles, radians; they broadcast
    signed : True tells a direction from its opposite (steps); False does not (lines)

    Returns
    -------
    ndarray in [-pi, pi) or, for ``signed=False``, [-pi/2, pi/2)
    """
    period = 2 * np.pi if signed else np.pi
    turn = np.asarray(found, np.float64) - np.asarray(truth, np.float64)
    return np.asarray((turn + period / 2) % period - period / 2)
