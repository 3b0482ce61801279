"""From many edges' widths to the camera's: shading freed from width, sharp from soft.

A scene's edges are hardly ever bare steps. A shadow or a glow beside a step slopes the
light there and makes the step look narrower or wider; soft things make it wider. The
first is told by slopes on either side, as far as the folder shows that there are any,
the second by a mixture of widths.
"""

from __future__ import annotations

from dataclasses import dataclass
from itertools import product

import numpy as np
from scipy.special import log_ndtr

from patchlab.types import F64

MIN_EDGES = 16
LEAST_SLOPE = 0.004
"""Smallest usual slope beside a step, heights a pixel, that a folder is credited with."""
MAX_WIDTHS = 600
GRID = 72
SCATTERS = (0.01, 0.02, 0.04, 0.08)
TAILS = (0.1, 0.25, 0.6, 1.2)
SHARES = (0.05, 0.2, 0.4, 0.6, 0.8, 0.95)
STRAY = 0.01


@dataclass(frozen=True, eq=False)
class Edges:
    """Fitted edges of a folder.

    Parameters
    ----------
    height : ndarray (n,), light
    fit : ndarray (n, 3), sigma (pixels), slopes on the dark and the bright side (light a pixel)
    covariance : ndarray (n, 3, 3), of ``fit``
    """

    height: F64
    fit: F64
    covariance: F64

    def __len__(self) -> int:
        return len(self.height)


def join(parts: list[Edges]) -> Edges:
    """All edges of several regions."""
    if not parts:
        return Edges(np.empty(0), np.empty((0, 3)), np.empty((0, 3, 3)))
    names = Edges.__dataclass_fields__
    return Edges(*(np.concatenate([getattr(p, name) for p in parts]) for name in names))


def freed(edges: Edges) -> tuple[F64, F64]:
    """Widths freed of the shading beside the edges, and their standard errors, pixels.

    The slopes' usual size is the folder's own (a robust variance, less the fits' errors); each
    edge's slopes are drawn towards zero by it, and its width goes along by their covariance
    (empirical Bayes, linear step). Without shading that is the fit of a bare step.
    """
    if not len(edges):
        return np.empty(0), np.empty(0)
    slopes = edges.fit[:, 1:] / edges.height[:, None]
    errors = np.stack([edges.covariance[:, k, k] for k in (1, 2)], axis=1)
    own = np.median(errors / edges.height[:, None] ** 2, axis=0)
    usual = np.maximum(np.median(slopes**2, axis=0) / 0.455 - own, LEAST_SLOPE**2)
    prior = edges.height[:, None, None] ** 2 * np.diag(usual)[None]
    across = edges.covariance[:, 1:, 0]
    gain = np.linalg.solve(edges.covariance[:, 1:, 1:] + prior, across[:, :, None])[:, :, 0]
    width = edges.fit[:, 0] - (gain * edges.fit[:, 1:]).sum(axis=1)
    variance = edges.covariance[:, 0, 0] - (gain * across).sum(axis=1)
    error = np.sqrt(np.maximum(variance, 1e-8))
    sane = (width > 0.2) & (width < 5.0) & (error < 0.3 * width)
    return width[sane], error[sane]


def _log_likelihoods(widths: F64, errors: F64, sigma: F64, scatter: float, tail: float) -> F64:
    """Log likelihood (grid, shares) of widths under sigmas (grid,).

    Sharp edges scatter about sigma as a Gaussian, soft ones have an exponential added.
    """
    at = sigma[:, None]
    sd = np.hypot(errors[None], scatter * at)
    z = (widths[None] - at) / sd
    rate = 1 / (tail * at)
    sharp = np.exp(-(z**2) / 2) / (np.sqrt(2 * np.pi) * sd)
    reach = rate * sd
    soft = rate * np.exp(np.minimum(reach**2 / 2 - reach * z + log_ndtr(z - reach), 300.0))
    return np.stack(
        [np.log((1 - share) * sharp + share * soft + STRAY / 5).sum(axis=1) for share in SHARES],
        axis=1,
    )


def sharpest(widths: F64, errors: F64) -> tuple[float, float]:
    """Width of the sharp edges among all, and its standard error.

    The mean over the posterior of a mixture of sharp and soft edges, on a fixed grid.
    """
    every = -(-len(widths) // MAX_WIDTHS)  # choosing by the error would favour wide edges
    widths, errors = widths[::every], errors[::every]
    low, high = np.quantile(widths, [0.02, 0.75])
    sigma = np.geomspace(0.9 * low, 1.1 * high, GRID)
    found = [
        _log_likelihoods(widths, errors, sigma, scatter, tail)
        for scatter, tail in product(SCATTERS, TAILS)
    ]
    log = np.concatenate(found, axis=1)
    weight = np.exp(log - log.max()).sum(axis=1)
    weight /= weight.sum()
    mean = float(weight @ np.log(sigma))
    spread = float(np.sqrt(weight @ (np.log(sigma) - mean) ** 2))
    return float(np.exp(mean)), float(np.exp(mean)) * spread
