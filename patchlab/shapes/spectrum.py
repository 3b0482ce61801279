"""Bandwidths of a kernel, measured on its spectrum at half amplitude.

The spectrum is the Fourier transform of the parametric kernel itself, not of its samples
in one window: a patch that cuts the kernel would widen the bands. Half-amplitude points
are found on a fine grid and refined by bisection, so both lobes of a real kernel count,
unlike in the closed forms for the complex Gabor (:mod:`patchlab.shapes.gabor`).
"""

from __future__ import annotations

import math
from collections.abc import Callable, Mapping

import numpy as np

from patchlab.conventions import Array

GRID = 4096


def amplitude_spectrum(
    family: str, parameters: Mapping[str, float], f: Array, turn: Array
) -> Array:
    """Absolute spectrum of a kernel of amplitude 1, up to a factor, about its own centre.

    Parameters
    ----------
    family : gabor, gd1, gd2 or centre_surround
    parameters : as in ``families.PARAMETERS``; amplitude and centre do not matter
    f : ndarray, spatial frequency, cycles per pixel
    turn : ndarray, direction from the kernel's theta, radians; broadcast with ``f``

    Returns
    -------
    ndarray of the broadcast shape
    """
    w = 2 * math.pi * np.asarray(f)
    if family == "centre_surround":
        s, t = parameters["sigma_px"], parameters["surround_px"]
        wide = parameters["ratio"] * np.exp(-0.5 * (t * w) ** 2)
        return np.abs(np.exp(-0.5 * (s * w) ** 2) - wide) + 0 * np.asarray(turn)
    su, sv = parameters["sigma_u_px"], parameters["sigma_v_px"]
    wu, wv = su * w * np.cos(turn), sv * w * np.sin(turn)
    if family != "gabor":
        return np.asarray(np.abs(wu) ** int(family[2]) * np.exp(-0.5 * (wu * wu + wv * wv)))
    carrier = 2 * math.pi * parameters["frequency_cpp"] * su
    wave = np.exp(1j * parameters["phase_rad"])
    lobes = wave * np.exp(-0.5 * (wu - carrier) ** 2) + np.exp(-0.5 * (wu + carrier) ** 2) / wave
    return np.asarray(np.abs(lobes) * np.exp(-0.5 * wv * wv))


def bandwidths(family: str, parameters: Mapping[str, float]) -> tuple[float | None, float | None]:
    """Half-amplitude bandwidths of a kernel.

    Parameters
    ----------
    family, parameters : as :func:`amplitude_spectrum`

    Returns
    -------
    octaves : width along theta, or None where the response at zero frequency is still above
        half the peak (the low-pass side is open)
    orientation : full width in radians on the circle of the peak's frequency, or None where
        the whole circle stays above half amplitude

    Examples
    --------
    A step is broad: its spectrum is f times a Gaussian.

    >>> step = {"sigma_u_px": 1.0, "sigma_v_px": 2.0}
    >>> round(bandwidths("gd1", step)[0], 2)
    2.59
    """
    narrow = parameters["sigma_px" if family == "centre_surround" else "sigma_u_px"]
    top = parameters.get("frequency_cpp", 0.0) + 5 / (2 * math.pi * narrow)

    def radial(f: Array) -> Array:
        return amplitude_spectrum(family, parameters, f, np.zeros(1))

    f = np.linspace(0, top, GRID)
    peak, half = _peak(radial, f)

    def circle(turn: Array) -> Array:
        return amplitude_spectrum(family, parameters, np.full(1, peak), turn)

    low = _crossing(radial, f[f < peak][::-1], half)
    high = _crossing(radial, f[f > peak], half)
    octaves = math.log2(high / low) if low and high else None
    edge = _crossing(circle, np.linspace(0, math.pi / 2, GRID), half)
    return octaves, 2 * edge if edge else None


def _peak(curve: Callable[[Array], Array], grid: Array) -> tuple[float, float]:
    """Place of the maximum, refined by a parabola, and half its height."""
    y = curve(grid)
    i = int(y.argmax())
    if not 0 < i < len(grid) - 1:
        return float(grid[i]), float(y[i]) / 2
    bend = y[i - 1] - 2 * y[i] + y[i + 1]
    shift = 0.5 * (y[i - 1] - y[i + 1]) / bend if bend < 0 else 0.0
    at = float(grid[i] + shift * (grid[1] - grid[0]))
    return at, float(curve(np.array([at]))[0]) / 2


def _crossing(curve: Callable[[Array], Array], grid: Array, level: float) -> float | None:
    """First place along the grid where the curve falls under the level, by bisection."""
    under = np.flatnonzero(curve(grid) < level)
    if not len(under) or under[0] == 0:
        return None
    above, below = float(grid[under[0] - 1]), float(grid[under[0]])
    for _ in range(40):
        middle = (above + below) / 2
        if curve(np.array([middle]))[0] < level:
            below = middle
        else:
            above = middle
    return (above + below) / 2
