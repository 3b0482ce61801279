"""The parametric kernel families: how a set of parameters becomes taps.

With (u, v) the coordinates turned so that u runs along theta, and
``g = exp(-u^2 / (2 sigma_u^2) - v^2 / (2 sigma_v^2))``:

========================  ===================================================
gabor                     ``amplitude g cos(2 pi frequency u + phase)``
gd1 (step)                ``amplitude (u / sigma_u) g``
gd2 (line)                ``amplitude (1 - u^2 / sigma_u^2) g``
centre_surround           ``amplitude (exp(-r^2 / 2 s^2) - ratio (s/t)^2 exp(-r^2 / 2 t^2))``
========================  ===================================================

gd1 answers positively, under correlation, to brightness that rises along +u;
gd2 to a bright line. In centre_surround s is ``sigma_px``, t ``surround_px``
and ratio the volume of the surround over that of the centre.
"""

from __future__ import annotations

import math
from collections.abc import Mapping

import numpy as np

from patchlab.conventions import Array, grid
from patchlab.errors import UsageError

PARAMETERS: dict[str, tuple[str, ...]] = {
    "gabor": (
        "amplitude", "x_px", "y_px", "theta_rad", "sigma_u_px", "sigma_v_px",
        "frequency_cpp", "phase_rad",
    ),
    "gd1": ("amplitude", "x_px", "y_px", "theta_rad", "sigma_u_px", "sigma_v_px"),
    "gd2": ("amplitude", "x_px", "y_px", "theta_rad", "sigma_u_px", "sigma_v_px"),
    "centre_surround": ("amplitude", "x_px", "y_px", "sigma_px", "surround_px", "ratio"),
}  # fmt: skip
"""Parameter names of each family, with their units, in the order fits use."""


def render(family: str, parameters: Mapping[str, float], size: int) -> Array:
    """Sample a kernel at the pixel centres of a ``size`` x ``size`` window.

    Parameters
    ----------
    family : gabor, gd1, gd2 or centre_surround
    parameters : as listed in :data:`PARAMETERS`; x_px and y_px default to 0 (the window's
        middle), amplitude to 1
    size : window side, pixels

    Returns
    -------
    ndarray (size, size), float64

    Raises
    ------
    UsageError : an unknown family, a width that is not positive, a frequency above Nyquist.
    """
    p = {"amplitude": 1.0, "x_px": 0.0, "y_px": 0.0, **parameters}
    if family not in PARAMETERS:
        raise UsageError(f"unknown kernel family {family!r}", remedy=", ".join(PARAMETERS))
    for name in ("sigma_u_px", "sigma_v_px", "sigma_px", "surround_px"):
        if name in PARAMETERS[family] and not p[name] > 0:
            raise UsageError(f"{name} must be positive, not {p[name]}")
    x, y = grid(size)
    x, y = x - p["x_px"], y - p["y_px"]
    if family == "centre_surround":
        s, t = p["sigma_px"], p["surround_px"]
        r2 = x * x + y * y
        surround = p["ratio"] * (s / t) ** 2 * np.exp(-r2 / (2 * t * t))
        return np.asarray(p["amplitude"] * (np.exp(-r2 / (2 * s * s)) - surround))
    cos, sin = math.cos(p["theta_rad"]), math.sin(p["theta_rad"])
    u, v = x * cos + y * sin, -x * sin + y * cos
    su, sv = p["sigma_u_px"], p["sigma_v_px"]
    envelope = p["amplitude"] * np.exp(-(u * u) / (2 * su * su) - (v * v) / (2 * sv * sv))
    if family == "gd1":
        return np.asarray(envelope * u / su)
    if family == "gd2":
        return np.asarray(envelope * (1 - u * u / (su * su)))
    if not 0 <= p["frequency_cpp"] <= 0.5:
        raise UsageError(
            f"frequency {p['frequency_cpp']} cycles per pixel is outside 0 to 0.5",
            remedy="frequencies are in cycles per pixel; 0.5 is the Nyquist limit",
        )
    return np.asarray(envelope * np.cos(2 * np.pi * p["frequency_cpp"] * u + p["phase_rad"]))


def without_dc(kernel: Array, envelope: Array | None = None) -> Array:
    """Remove a kernel's mean response to a flat field.

    The correction follows ``envelope`` (the kernel's own window) so that it leaves no
    pedestal at the rim; without one the taps' mean is subtracted.
    """
    if envelope is None:
        return np.asarray(kernel - kernel.mean())
    return np.asarray(kernel - envelope * (kernel.sum() / envelope.sum()))


def noise_gain(kernel: Array, autocovariance: Array | None = None) -> float:
    """Standard deviation of a kernel's response to unit-variance noise.

    Parameters
    ----------
    kernel : ndarray (h, h), or (h, h, planes) with independent noise in each plane
    autocovariance : ndarray (2m + 1, 2m + 1) of the noise, centre 1; None means white

    Returns
    -------
    float : sqrt(sum over lags of R(lag) * (k correlated with k)(lag)); the norm when white
    """
    if autocovariance is None:
        return float(np.linalg.norm(kernel))
    if kernel.ndim == 3:
        planes = np.moveaxis(kernel, -1, 0)
        return math.hypot(*(noise_gain(plane, autocovariance) for plane in planes))
    from scipy.signal import correlate2d

    own = correlate2d(kernel, kernel, mode="full")
    m, c = autocovariance.shape[0] // 2, kernel.shape[0] - 1
    reach = min(m, c)
    own = own[c - reach : c + reach + 1, c - reach : c + reach + 1]
    lags = autocovariance[m - reach : m + reach + 1, m - reach : m + reach + 1]
    return math.sqrt(max(float((own * lags).sum()), 0.0))
