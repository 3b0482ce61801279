"""The density of rows under learned components: comparable over numbers of components."""

from __future__ import annotations

import math
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.types import F64, Whitening


def log_density(rows: NDArray[Any], through: Whitening, W: F64, signs: F64) -> F64:
    """Log density of rows in nats, with respect to the rows' own coordinates.

    Components have the densities of :mod:`patchlab.learn.likelihood` on the directions the
    whitening kept. What it cut is given a variance, not a shape: each row's squared distance
    from the kept directions, spread evenly, a Gaussian of the cut directions' mean variance
    (the residual of probabilistic principal components, Tipping & Bishop 1999, J. R. Stat.
    Soc. B 61:611). Directions without variance beyond rounding, the constant one among them,
    do not count. So dictionaries of different size compare on the same rows.

    Parameters
    ----------
    rows : ndarray (n, d)
    through : Whitening, pca form
    W : ndarray (k, k), unmixing of white coordinates
    signs : ndarray (k,), +1 heavy tails, -1 light

    Returns
    -------
    ndarray (n,)
    """
    centred = np.asarray(rows, dtype=np.float64) - through.mean
    z = centred @ through.K.T
    y = np.abs(z @ W.T)
    logcosh = y + np.log1p(np.exp(-2 * y)) - math.log(2)
    light = -(y**2 + 1) / 2 + logcosh - math.log(2 * math.pi) / 2
    inside = np.where(signs > 0, -logcosh - math.log(math.pi), light).sum(axis=1)
    inside += np.linalg.slogdet(W)[1] - np.linalg.slogdet(through.D.T @ through.D)[1] / 2
    return np.asarray(inside + _rest(centred - z @ through.D.T, through))


def _rest(residual: F64, through: Whitening) -> F64:
    spectrum = through.spectrum
    numeric = int(np.sum(spectrum > spectrum[0] * 1e-10))
    count = numeric - through.rank
    if count <= 0:
        return np.zeros(len(residual))
    if abs(through.K.sum(axis=1)).max() < 1e-8 * abs(through.K).sum(axis=1).max():
        residual = residual - residual.mean(axis=1, keepdims=True)  # the constant was cut
    variance = float(spectrum[through.rank : numeric].mean())
    square = np.sum(residual**2, axis=1)
    return np.asarray(-square / (2 * variance) - count / 2 * math.log(2 * math.pi * variance))
