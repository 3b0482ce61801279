"""Atoms and filters as parametric kernels: fits, evidence, errors and verdicts.

Every family is fitted to every kernel by least squares on the plain pixels, with no offset,
so that ``families.render`` of the parameters is the fit. R2 is one minus the squared error
over the squared deviation from the kernel's mean (learned kernels have mean zero).

Families are compared by the BIC ``n ln(E / S) + q ln n``: E the squared error, S as above,
q the family's parameters and n the *effective* number of samples. Neighbouring residuals
are alike, so pixels count for less than one sample each; with n too large the richest
family always wins. By default n is read off the residuals
(:func:`effective_sample_count`), and the same n widens the standard errors.
"""

from __future__ import annotations

import math
from collections.abc import Mapping, Sequence
from dataclasses import dataclass
from typing import Literal, get_args

import numpy as np
from numpy.typing import NDArray

from patchlab.conventions import Array, fold_theta
from patchlab.errors import InputError, UsageError
from patchlab.families import PARAMETERS
from patchlab.progress import Progress, silent
from patchlab.shapes.solve import CODES, evaluate, fit_batch, from_solver
from patchlab.shapes.spectrum import bandwidths
from patchlab.shapes.starts import bounds, starts
from patchlab.types import FamilyName, KernelFit, KernelFits

Mask = NDArray[np.bool_]

GOOD_R2, POOR_R2 = 0.8, 0.5

LENGTH = 5
"""Place of sigma_v among an oriented family's parameters."""

N_U_LIMIT = 0.15
"""Smallest sigma_u times frequency at which a Gabor can be told from an edge or a blob.

At 0.15 cycles an odd Gabor and the best gd1 differ by 1.4e-4 of the energy (computed; 6e-3 at
0.25), and the wave's frequency and its envelope's width trade against each other.
"""

FREQUENCY_MARGIN = 0.005
"""How far from 0.5 cycles per pixel a Gabor's frequency must stay to be chosen."""

RESIDUAL_FLOOR = 1e-6
"""Share of unexplained energy below which families are not told apart by it."""

CHUNK = 16
"""Kernels between two calls of ``progress``."""


@dataclass(frozen=True, eq=False)
class _FamilyFit:
    """One family fitted to all kernels: canonical parameters (k, n) and what judges them."""

    family: FamilyName
    parameters: Array
    unit_variance: Array
    squared_error: Array
    left: Array
    inside: Mask
    eligible: Mask


def fit_kernels(
    kernels: Array,
    of: Literal["atoms", "filters"],
    *,
    effective_samples: float | None = None,
    families: Sequence[FamilyName] = get_args(FamilyName),
    progress: Progress = silent,
) -> KernelFits:
    """Fit every kernel by every family and keep the one with the most evidence.

    Parameters
    ----------
    kernels : ndarray of shape (k, size, size), float64; size at least 4
    of : what the kernels are, "atoms" or "filters"
    effective_samples : in [1, size * size], for BIC and standard errors; by default estimated
        from the residuals
    families : which to try, default all four
    progress : told after every few kernels

    Returns
    -------
    KernelFits : in the kernels' order. Verdict "good" means R2 over 0.8 with every parameter
        inside its bounds (but for the length of an edge that runs right through the patch),
        "poor" R2 over 0.5, "failed" the rest. A standard error is
        infinite where a parameter sits on its bound or is not determined.

    Raises
    ------
    UsageError : wrong shape, unknown family, a count out of range.
    InputError : a value that is not finite.

    Notes
    -----
    A Gabor is not chosen when its frequency runs to a bound or its sigma_u times frequency
    is below :data:`N_U_LIMIT`, unless it is the only family asked for; then it is at best
    poor. Bandwidths are those of the fitted kernel, see :mod:`patchlab.shapes.spectrum`.
    Standard errors: the inverse normal matrix times the squared error over (effective samples
    less parameters). Exact for white residuals; on 3 x 3 smoothed noise within a factor of
    1.5, small for a wave whose frequency the residuals favour, large for others (measured).
    BIC: Schwarz 1978, Ann. Statist. 6:461-464.
    """
    flat = _checked(kernels, of, effective_samples, families)
    size = kernels.shape[1]
    if not len(flat):
        return KernelFits(of, size, (), float(effective_samples or size**2))
    progress("fit", 0, len(families) * len(flat), "the first use compiles for some ten seconds")
    tried = [_fit_family(f, flat, size, i, len(families), progress) for i, f in enumerate(families)]
    ratio = _unexplained(flat, np.stack([t.squared_error for t in tried]))
    if effective_samples is None:
        effective_samples = _from_residuals(tried, ratio, size)
    n = float(effective_samples)
    q = np.array([len(PARAMETERS[t.family]) for t in tried])[:, None]
    bic = n * np.log(np.maximum(ratio, RESIDUAL_FLOOR)) + q * math.log(n)
    eligible = np.stack([t.eligible for t in tried])
    chosen = np.where(eligible | ~eligible.any(0), bic, np.inf).argmin(0)
    fits = tuple(
        _kernel_fit(k, tried[c], 1 - ratio[c, k], bic[c, k], n) for k, c in enumerate(chosen)
    )
    return KernelFits(of, size, fits, n)


def _checked(
    kernels: Array, of: str, effective: float | None, families: Sequence[FamilyName]
) -> Array:
    if kernels.ndim != 3 or kernels.shape[1] != kernels.shape[2] or kernels.shape[1] < 4:
        raise UsageError(f"kernels must be (k, size, size) with size >= 4, not {kernels.shape}")
    if of not in ("atoms", "filters"):
        raise UsageError(f"of must be atoms or filters, not {of!r}")
    unknown = set(families) - set(CODES)
    if unknown or not families:
        raise UsageError(f"unknown families {sorted(unknown)}", remedy=f"choose of {list(CODES)}")
    pixels = kernels.shape[1] ** 2
    if effective is not None and not 1 <= effective <= pixels:
        raise UsageError(f"effective samples must be in 1 to {pixels}, not {effective}")
    flat = np.array(kernels, dtype=np.float64).reshape(len(kernels), pixels)
    bad = np.flatnonzero(~np.isfinite(flat).all(1))
    if len(bad):
        raise InputError("a kernel has values that are not finite", where=f"kernel {bad[0]}")
    return flat


# ---------------------------------------------------------------- one family


def _fit_family(
    family: FamilyName, flat: Array, size: int, turn: int, turns: int, progress: Progress
) -> _FamilyFit:
    """Fit one family to all kernels; kernels are brought to unit size for the solver."""
    scale = np.sqrt((flat**2).mean(1))
    scale[scale == 0] = 1.0
    unit = flat / scale[:, None]
    r = np.arange(size, dtype=np.float64) - (size - 1) / 2
    lower, upper = bounds(family, size)
    q = np.empty((len(flat), len(lower)))
    for a in range(0, len(flat), CHUNK):
        part = unit[a : a + CHUNK]
        first = starts(family, part.reshape(-1, size, size))
        q[a : a + CHUNK], _ = fit_batch(CODES[family], part, first, r, lower, upper)
        done = turn * len(flat) + min(a + CHUNK, len(flat))
        progress("fit", done, turns * len(flat), family)
    on_bound = np.logical_or(q <= lower, q >= upper)
    parameters = np.stack([canonical(family, p) for p in from_solver(family, q)])
    parameters[:, 0] *= scale
    value, jac = evaluate(family, parameters, size)
    left = flat - value.reshape(flat.shape)
    squared = (left**2).sum(1)
    variance = np.stack([_unit_variance(j, held) for j, held in zip(jac, on_bound, strict=True)])
    inside = np.logical_not(_without_length(family, q, upper, on_bound).any(1))
    eligible = _eligible(family, q)
    return _FamilyFit(family, parameters, variance, squared, left, inside, eligible)


def _without_length(family: str, q: Array, upper: Array, on_bound: Mask) -> Mask:
    """Bounds hit, but for a length on its upper one: an edge that runs right through the patch."""
    hit = on_bound.copy()
    if family != "centre_surround":
        hit[:, LENGTH] &= q[:, LENGTH] < upper[LENGTH]
    return hit


def canonical(family: str, parameters: Array) -> Array:
    """Fold the parameters (n,) of one kernel to the one name it goes by.

    theta in [0, pi); a Gabor's amplitude positive and phase in (-pi, pi]; gd1's amplitude
    carries the sign of the step along +u. The kernel stays the same.
    """
    p = np.array(parameters, dtype=np.float64)
    if family == "gabor":
        phase = p[7] if p[0] >= 0 else p[7] + math.pi
        p[0] = abs(p[0])
        p[3], p[7] = fold_theta(p[3], phase)
    elif family == "gd1":
        p[3], mirror = fold_theta(p[3], 1.0)
        p[0] *= mirror
    elif family == "gd2":
        p[3], _ = fold_theta(p[3])
    return p


def _eligible(family: str, q: Array) -> Mask:
    if family != "gabor":
        return np.ones(len(q), dtype=bool)
    return np.asarray((q[:, 4] * q[:, 6] >= N_U_LIMIT) & (q[:, 6] <= 0.5 - FREQUENCY_MARGIN))


def _unit_variance(jac: Array, held: Mask) -> Array:
    """Diagonal (n,) of the inverse normal matrix; infinite where nothing determines it."""
    n = len(jac)
    jac = jac.reshape(n, -1)
    out = np.full(n, np.inf)
    free = np.flatnonzero(~held)
    length = np.sqrt((jac[free] ** 2).sum(1))
    free, length = free[length > 0], length[length > 0]
    if len(free):
        unit = jac[free] / length[:, None]
        values, vectors = np.linalg.eigh(unit @ unit.T)
        if values[0] > 1e-12:
            out[free] = (vectors**2 / values).sum(1) / length**2
    return out


# ---------------------------------------------------------------- evidence


def _unexplained(flat: Array, squared_error: Array) -> Array:
    """Squared error over the deviation from the mean; 1 for a flat kernel, which shows nothing."""
    spread = ((flat - flat.mean(1, keepdims=True)) ** 2).sum(1)
    shows = spread > 1e-20 * (flat**2).sum(1)
    return np.where(shows, squared_error / np.where(shows, spread, 1.0), 1.0)


def effective_sample_count(residuals: Array) -> float:
    """Effective number of independent pixels of stationary residuals.

    With R the correlation matrix of the pixels, ``(tr R)^2 / tr(R^2)``: the number of
    independent samples that would know the variance as well (Bayley and Hammersley 1946,
    Suppl. J. R. Stat. Soc. 8:184-197, in two dimensions). R comes from the autocorrelation
    pooled over the kernels, and what chance adds to its square is taken off. A single smooth
    residual still reads low, down to the floor of ``size``; ten or more settle it.

    Parameters
    ----------
    residuals : ndarray of shape (k, size, size), k at least 1

    Returns
    -------
    float in [size, size * size]
    """
    k, size = len(residuals), residuals.shape[1]
    energy = (residuals**2).sum((1, 2), keepdims=True)
    unit = residuals / np.sqrt(np.maximum(energy, np.finfo(float).tiny))
    n = 2 * size
    power = (np.abs(np.fft.rfft2(unit, (n, n))) ** 2).mean(0)
    lag = np.abs(np.fft.fftfreq(n, 1 / n))
    pairs = np.outer(np.maximum(size - lag, 0), np.maximum(size - lag, 0))
    seen = pairs > 0
    products = np.fft.irfft2(power, (n, n))[seen] * size**2
    pairs = pairs[seen]
    # sum over lags of pairs * rho^2, less the 1 / (k pairs) variance of each rho under chance
    squares = products**2 / pairs - 1 / k
    total = size**2 + max(float(squares.sum() - squares[0]), 0.0)
    return float(np.clip(size**4 / total, size, size**2))


def _from_residuals(tried: Sequence[_FamilyFit], ratio: Array, size: int) -> float:
    """Effective samples of the closest family's residuals, over kernels that were caught at all."""
    best = ratio.argmin(0)
    caught = np.flatnonzero(ratio.min(0) < 1 - POOR_R2)
    use = caught if len(caught) else np.arange(len(best))
    left = np.stack([tried[best[k]].left[k] for k in use])
    return effective_sample_count(left.reshape(-1, size, size))


# ---------------------------------------------------------------- results


def _kernel_fit(k: int, fit: _FamilyFit, r2: float, bic: float, n: float) -> KernelFit:
    names = PARAMETERS[fit.family]
    parameters: Mapping[str, float] = dict(zip(names, map(float, fit.parameters[k]), strict=True))
    unit, noise = fit.unit_variance[k], fit.squared_error[k] / max(n - len(names), 1.0)
    sd = np.sqrt(np.multiply(unit, noise, where=np.isfinite(unit), out=unit.copy()))
    within = bool(fit.inside[k] and fit.eligible[k])
    octaves, orientation = bandwidths(fit.family, parameters)
    return KernelFit(
        index=k,
        family=fit.family,
        parameters=parameters,
        errors=dict(zip(names, map(float, sd), strict=True)),
        r2=float(r2),
        bic=float(bic),
        verdict=verdict(float(r2), within),
        octaves=octaves,
        orientation_rad=orientation,
    )


def verdict(r2: float, inside: bool) -> Literal["good", "poor", "failed"]:
    """Judge a fit: good above 0.8 and inside its bounds, poor above 0.5, failed otherwise."""
    if r2 > GOOD_R2 and inside:
        return "good"
    return "poor" if r2 > POOR_R2 else "failed"
