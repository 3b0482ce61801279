"""The Gabor kernel: its compiled model, its bandwidths in closed form, and other people's names.

The formula belongs to :mod:`patchlab.families`; here it is evaluated together with
its derivatives, for the solver. The closed forms hold for the complex Gabor, a single
Gaussian in frequency; a real kernel has two, and its bandwidths are measured
(:mod:`patchlab.shapes.spectrum`).
"""

from __future__ import annotations

import math
from collections.abc import Mapping

import numpy as np

from patchlab._jit import jit
from patchlab.conventions import Array, fold_theta
from patchlab.errors import UsageError

HALF_AMPLITUDE = math.sqrt(math.log(2) / 2) / math.pi
"""Half-amplitude half-width of a Gaussian's spectrum, times sigma: sqrt(ln 2 / 2) / pi."""


@jit
def gabor_model(p: Array, r: Array, value: Array, jac: Array) -> None:
    """Evaluate one Gabor and its derivatives at every pixel of a square window.

    Parameters
    ----------
    p : ndarray (8,), parameters in the order of ``families.PARAMETERS``
    r : ndarray (size,), pixel coordinates about the window's middle
    value : ndarray (size * size,), overwritten
    jac : ndarray (8, size * size), overwritten with d value / d p
    """
    cos, sin = math.cos(p[3]), math.sin(p[3])
    su, sv, omega = p[4], p[5], 2.0 * math.pi * p[6]
    size = r.shape[0]
    # cos(a + b) from the sines of rows and columns: two per line instead of two per pixel
    col_cos = np.empty(size)
    col_sin = np.empty(size)
    for j in range(size):
        col_cos[j] = math.cos(omega * cos * (r[j] - p[1]))
        col_sin[j] = math.sin(omega * cos * (r[j] - p[1]))
    for i in range(size):
        dy = r[i] - p[2]
        row_cos = math.cos(omega * sin * dy + p[7])
        row_sin = math.sin(omega * sin * dy + p[7])
        for j in range(size):
            dx = r[j] - p[1]
            u, v = dx * cos + dy * sin, dy * cos - dx * sin
            zu, zv = u / su, v / sv
            e = math.exp(-0.5 * (zu * zu + zv * zv))
            even = row_cos * col_cos[j] - row_sin * col_sin[j]
            odd = p[0] * e * (row_sin * col_cos[j] + row_cos * col_sin[j])
            m = p[0] * e * even
            by_u = -m * zu / su - omega * odd
            by_v = -m * zv / sv
            n = i * size + j
            value[n] = m
            jac[0, n] = e * even
            jac[1, n] = sin * by_v - cos * by_u
            jac[2, n] = -sin * by_u - cos * by_v
            jac[3, n] = v * by_u - u * by_v
            jac[4, n] = m * zu * zu / su
            jac[5, n] = m * zv * zv / sv
            jac[6, n] = -2.0 * math.pi * u * odd
            jac[7, n] = -odd


# ---------------------------------------------------------------- closed forms


def bandwidth_octaves(sigma_f: float) -> float | None:
    """Half-amplitude bandwidth of a complex Gabor in octaves.

    ``log2((sigma f + a) / (sigma f - a))`` with ``a`` = :data:`HALF_AMPLITUDE`.

    Parameters
    ----------
    sigma_f : sigma along the wave times frequency, cycles

    Returns
    -------
    float, or None where the lower half-amplitude point lies below zero frequency
    (``sigma_f <= a``, about 0.187): the low-pass side is open.

    Examples
    --------
    >>> round(bandwidth_octaves(0.5621719), 6)
    1.0
    >>> bandwidth_octaves(0.18) is None
    True
    """
    if not sigma_f > HALF_AMPLITUDE:
        return None
    return math.log2((sigma_f + HALF_AMPLITUDE) / (sigma_f - HALF_AMPLITUDE))


def sigma_f_from_octaves(octaves: float) -> float:
    """Sigma times frequency of a complex Gabor with this half-amplitude bandwidth.

    The inverse of :func:`bandwidth_octaves`.

    Raises
    ------
    UsageError : a bandwidth that is not positive and finite.
    """
    if not 0 < octaves < math.inf:
        raise UsageError(f"a bandwidth of {octaves} octaves is not positive and finite")
    ratio = math.pow(2.0, octaves)
    return HALF_AMPLITUDE * (ratio + 1) / (ratio - 1)


def orientation_bandwidth(sigma_u_f: float, sigma_v_f: float) -> float | None:
    """Half-amplitude orientation bandwidth of a complex Gabor, full width in radians.

    Exact on the circle of the peak's frequency, where the spectrum is
    ``exp(-2 pi^2 ((su f)^2 (1 - cos t)^2 + (sv f)^2 sin^2 t))``.

    Parameters
    ----------
    sigma_u_f, sigma_v_f : sigma along the wave and across it, times frequency, cycles

    Returns
    -------
    float in (0, 2 pi], or None where the whole circle stays above half amplitude.

    Examples
    --------
    A published example (BMC Neuroscience 6:12, 2005): 1.5 octaves, aspect 1.5.

    >>> n = sigma_f_from_octaves(1.5)
    >>> round(math.degrees(orientation_bandwidth(n, 1.5 * n)), 2)
    36.91
    """
    a, b, level = sigma_u_f**2, sigma_v_f**2, HALF_AMPLITUDE**2
    if math.isclose(a, b, rel_tol=1e-12):
        cosine = 1 - level / (2 * a) if a > 0 else -math.inf
    else:
        # (a - b) c^2 - 2 a c + (a + b - level) = 0; this root is the first met from c = 1
        inner = b * b + level * (a - b)
        if inner < 0:
            return None
        cosine = (a + b - level) / (a + math.sqrt(inner))
    return 2 * math.acos(cosine) if cosine >= -1 else None


# ---------------------------------------------------------------- other dialects


def to_wavelength(parameters: Mapping[str, float], *, reflected: bool = False) -> dict[str, float]:
    """Name a Gabor by (wavelength, theta, psi, sigma, gamma).

    ``exp(-(u^2 + gamma^2 v^2) / (2 sigma^2)) cos(2 pi u / wavelength + psi)``.

    Parameters
    ----------
    parameters : of the family gabor; frequency above zero
    reflected : True for builders that store the kernel point-reflected, as OpenCV's
        ``getGaborKernel`` does: the sign of psi turns

    Returns
    -------
    dict : wavelength_px, theta_rad, psi_rad, sigma_px, gamma

    Raises
    ------
    UsageError : a frequency of zero, which has no wavelength.
    """
    if not parameters["frequency_cpp"] > 0:
        raise UsageError("a frequency of zero has no wavelength")
    phase = parameters["phase_rad"]
    return {
        "wavelength_px": 1 / parameters["frequency_cpp"],
        "theta_rad": parameters["theta_rad"],
        "psi_rad": -phase if reflected else phase,
        "sigma_px": parameters["sigma_u_px"],
        "gamma": parameters["sigma_u_px"] / parameters["sigma_v_px"],
    }


def from_wavelength(
    wavelength: float,
    theta: float,
    psi: float,
    sigma: float,
    gamma: float,
    *,
    reflected: bool = False,
) -> dict[str, float]:
    """Parameters of the family gabor from (wavelength, theta, psi, sigma, gamma).

    The inverse of :func:`to_wavelength`, with the direction folded to [0, pi).

    Raises
    ------
    UsageError : a wavelength under 2 px (above Nyquist), a sigma or gamma not positive.
    """
    if not (wavelength > 0 and sigma > 0 and gamma > 0):
        raise UsageError("wavelength, sigma and gamma must be positive")
    folded, phase = fold_theta(theta, -psi if reflected else psi)
    return {
        "theta_rad": folded,
        "sigma_u_px": sigma,
        "sigma_v_px": sigma / gamma,
        "frequency_cpp": _below_nyquist(1 / wavelength),
        "phase_rad": phase,
    }


def to_octaves(parameters: Mapping[str, float]) -> dict[str, float]:
    """Name a Gabor by (frequency, theta, bandwidth in octaves, aspect, offset).

    Aspect is sigma across the wave over sigma along it.

    Returns
    -------
    dict : frequency_cpp, theta_rad, octaves, aspect, offset_rad

    Raises
    ------
    UsageError : sigma times frequency so small that the bandwidth does not exist.
    """
    octaves = bandwidth_octaves(parameters["sigma_u_px"] * parameters["frequency_cpp"])
    if octaves is None:
        raise UsageError(
            "this Gabor has no bandwidth in octaves: its low-pass side is open",
            remedy=f"sigma times frequency must exceed {HALF_AMPLITUDE:.4f}",
        )
    return {
        "frequency_cpp": parameters["frequency_cpp"],
        "theta_rad": parameters["theta_rad"],
        "octaves": octaves,
        "aspect": parameters["sigma_v_px"] / parameters["sigma_u_px"],
        "offset_rad": parameters["phase_rad"],
    }


def from_octaves(
    frequency: float, theta: float, octaves: float, aspect: float = 1.0, offset: float = 0.0
) -> dict[str, float]:
    """Parameters of the family gabor from (frequency, theta, octaves, aspect, offset).

    The inverse of :func:`to_octaves`, with the direction folded to [0, pi). With aspect 1
    it is what scikit-image's ``gabor_kernel`` builds from ``frequency`` and ``bandwidth``.

    Raises
    ------
    UsageError : a frequency outside (0, 0.5] cycles per pixel, an aspect not positive.
    """
    if not (frequency > 0 and aspect > 0):
        raise UsageError("frequency and aspect must be positive")
    sigma = sigma_f_from_octaves(octaves) / _below_nyquist(frequency)
    folded, phase = fold_theta(theta, offset)
    return {
        "theta_rad": folded,
        "sigma_u_px": sigma,
        "sigma_v_px": sigma * aspect,
        "frequency_cpp": frequency,
        "phase_rad": phase,
    }


def _below_nyquist(frequency: float) -> float:
    if frequency > 0.5:
        raise UsageError(
            f"{frequency} cycles per pixel is above the Nyquist limit of 0.5",
            remedy="a wave needs at least 2 pixels",
        )
    return frequency
