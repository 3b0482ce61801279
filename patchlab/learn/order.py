"""Order, sign and scale of components, and how two sets of them match."""

from __future__ import annotations

from typing import Literal

import numpy as np
from numpy.typing import NDArray

from patchlab.conventions import tile_shape
from patchlab.errors import UsageError
from patchlab.types import F64, Dictionary, Whitening


def canonical(filters: F64, atoms: F64, variance: F64) -> tuple[F64, F64, NDArray[np.int64]]:
    """Bring components to canonical scale, sign and order.

    Scale: coefficients have unit variance. Sign: the atom's pixel of largest absolute
    value is positive (the first one, when several tie). Order: falling contribution, the
    squared norm of the scaled atom; ties keep their order.

    Parameters
    ----------
    filters : ndarray (k, d), dotted with a patch
    atoms : ndarray (k, d), summed to rebuild it
    variance : ndarray (k,), of the coefficients as they stand

    Returns
    -------
    filters, atoms : ndarray (k, d)
    order : ndarray (k,), where each component was before
    """
    scale = np.sqrt(np.where(variance > 0, variance, 1.0))
    scale = scale * dominant_sign(atoms)
    filters, atoms = filters / scale[:, None], atoms * scale[:, None]
    order = np.argsort(-np.sum(atoms**2, axis=1), kind="stable")
    return filters[order], atoms[order], order


def dominant_sign(atoms: F64) -> F64:
    """+1 or -1 for each row: the sign of its largest absolute entry, the first of near ties.

    Entries within 1e-6 of the largest tie, so that rounding does not pick the sign.
    """
    size = np.abs(atoms)
    first = np.argmax(size >= size.max(axis=1, keepdims=True) * (1 - 1e-6), axis=1)
    return np.where(atoms[np.arange(len(atoms)), first] < 0, -1.0, 1.0)


def dictionary(
    method: Literal["ica", "sparse", "pca"],
    whitening: Whitening,
    filters: F64,
    atoms: F64,
    order: NDArray[np.int64],
    *,
    kurtosis: F64,
    identified: NDArray[np.bool_],
    converged: bool,
    iterations: int,
    tolerance: float,
    curve: F64,
    log_likelihood: float | None = None,
    pooled: tuple[F64, ...] = (),
    warnings: tuple[str, ...] = (),
) -> Dictionary:
    """A Dictionary from canonical rows; ``kurtosis`` and ``identified`` in the old order.

    ``pooled`` holds the atoms (k, d) of further restarts.
    """
    d = atoms.shape[1]
    tile = tile_shape(round((d / whitening.planes) ** 0.5), d)
    pool = np.concatenate([atoms, *pooled])
    pool = pool / np.maximum(np.linalg.norm(pool, axis=1, keepdims=True), 1e-300)
    return Dictionary(
        method=method,
        filters=np.ascontiguousarray(filters.reshape(-1, *tile)),
        atoms=np.ascontiguousarray(atoms.reshape(-1, *tile)),
        contribution=np.sum(atoms**2, axis=1) / whitening.spectrum.sum(),
        kurtosis=kurtosis[order],
        identified=identified[order],
        converged=converged,
        iterations=iterations,
        tolerance=tolerance,
        curve=curve,
        log_likelihood=log_likelihood,
        whitening=whitening,
        pooled_atoms=np.ascontiguousarray(pool.reshape(-1, *tile)),
        warnings=warnings,
    )


def amari_index(P: F64) -> float:
    """Distance of a square matrix from a scaled permutation, in [0, 1].

    ``P = W A`` for an unmixing W and a mixing A; 0 when W undoes A up to order and scale,
    1 when every entry has one size. Amari, Cichocki & Yang 1996, NIPS 8:757, divided by
    2 n (n - 1).

    Raises
    ------
    UsageError : not square, a single row, or a row or column of zeros.

    Examples
    --------
    >>> round(amari_index(np.array([[1, 0.1], [0.2, 1]])), 12)
    0.15
    """
    size = np.abs(np.asarray(P, dtype=np.float64))
    n = len(size)
    if size.shape != (n, n) or n < 2:
        raise UsageError("the Amari index needs a square matrix of two rows or more")
    if not (size.max(axis=0).all() and size.max(axis=1).all()):
        raise UsageError("the Amari index needs no row or column of zeros")
    rows = (size / size.max(axis=1, keepdims=True)).sum() - n
    columns = (size / size.max(axis=0)).sum() - n
    return float((rows + columns) / (2 * n * (n - 1)))


def match(a: F64, b: F64) -> tuple[NDArray[np.int64], F64]:
    """Pair the atoms of two sets so that the summed |cos| is largest.

    Parameters
    ----------
    a : ndarray (k, ...), at most as many as b
    b : ndarray (m, ...), the same trailing shape

    Returns
    -------
    partner : ndarray (k,), index into b for each atom of a
    cosine : ndarray (k,), signed cosine of each pair

    Raises
    ------
    UsageError : shapes that cannot match.

    Examples
    --------
    >>> partner, cosine = match(np.eye(3), -np.eye(3)[[2, 0, 1]])
    >>> partner.tolist(), cosine.tolist()
    ([1, 2, 0], [-1.0, -1.0, -1.0])
    """
    from scipy.optimize import linear_sum_assignment

    if a.shape[1:] != b.shape[1:] or len(a) > len(b):
        raise UsageError("atoms of one size are matched, the smaller set first")
    cosine = _unit(a) @ _unit(b).T
    rows, partner = linear_sum_assignment(-np.abs(cosine))
    return partner.astype(np.int64), np.asarray(cosine[rows, partner])


def _unit(atoms: F64) -> F64:
    flat = np.asarray(atoms, dtype=np.float64).reshape(len(atoms), -1)
    return np.asarray(flat / np.maximum(np.linalg.norm(flat, axis=1, keepdims=True), 1e-300))
