"""Where the fits start: directions from the spectrum, places and widths from moments.

The objective has several valleys: a kernel of two subfields can be read as a wide wave or
as a narrow edge, and a broad spectrum has more than one plausible peak. So each family
starts from every pairing of a few readings of the kernel, and amplitude and phase, which
enter linearly, start at their least-squares values.
"""

from __future__ import annotations

import math

import numpy as np

from patchlab.conventions import Array, grid
from patchlab.shapes.solve import sample

NARROWEST_PX = 0.4
"""Lower bound of every width: a narrower Gaussian is one sampled pixel, whatever its width."""

SURROUND_RATIO = (1.1, 8.0)
"""Bounds of the surround's width over the centre's."""

FREQUENCY_FLOOR = 0.005
"""Lower bound of a Gabor's frequency, cycles per pixel: at 0 an odd one has no amplitude."""


def bounds(family: str, size: int) -> tuple[Array, Array]:
    """Lower and upper bounds of a family, in the solver's parameters.

    Centres may lie up to 1 px outside the patch, widths range from :data:`NARROWEST_PX`
    to twice the patch's side, frequencies from :data:`FREQUENCY_FLOOR` to 0.5.

    Returns
    -------
    lower, upper : ndarray (n,); infinite where a parameter is free
    """
    free, reach, widest = math.inf, (size - 1) / 2 + 1, 2.0 * size
    lower = [-free, -reach, -reach]
    upper = [free, reach, reach]
    if family == "centre_surround":
        lower += [NARROWEST_PX, SURROUND_RATIO[0], 0.0]
        upper += [widest, SURROUND_RATIO[1], 4.0]
    else:
        lower += [-free, NARROWEST_PX, NARROWEST_PX]
        upper += [free, widest, widest]
    if family == "gabor":
        lower += [FREQUENCY_FLOOR, -free]
        upper += [0.5, free]
    return np.array(lower), np.array(upper)


def starts(family: str, kernels: Array) -> Array:
    """Starts of a family for every kernel.

    Parameters
    ----------
    family : gabor, gd1, gd2 or centre_surround
    kernels : ndarray (k, size, size)

    Returns
    -------
    ndarray (k, s, n), in the solver's parameters: 12 starts, 6 for centre_surround
    """
    size = kernels.shape[1]
    centres = _centres(kernels)
    if family == "centre_surround":
        rows = _round_starts(centres)
    else:
        rows = _oriented_starts(family, kernels, centres)
    lower, upper = bounds(family, size)
    rows[..., 1:] = np.clip(rows[..., 1:], lower[1:], upper[1:])
    return _linear_start(family, kernels, rows)


def _centres(kernels: Array) -> Array:
    """(k, 2, 2): the centroid of the energy, and the peak of the blurred energy, as (x, y)."""
    size = kernels.shape[1]
    x, y = grid(size)
    energy = kernels**2
    total = np.maximum(energy.sum((1, 2)), np.finfo(float).tiny)
    middle = np.stack([(energy * x).sum((1, 2)), (energy * y).sum((1, 2))], 1) / total[:, None]
    soft = energy
    for axis in (1, 2):
        wide = np.pad(soft, [(1, 1) if a == axis else (0, 0) for a in range(3)])
        before, after = np.take(wide, range(size), axis), np.take(wide, range(2, size + 2), axis)
        soft = soft + (before + after) / 2
    at = soft.reshape(len(kernels), -1).argmax(1)
    return np.stack([middle, np.stack([x.ravel()[at], y.ravel()[at]], 1)], 1)


def _peaks(kernels: Array) -> Array:
    """(k, 3, 2): (theta, frequency) of the two strongest spectral peaks and of the mean axis."""
    size = kernels.shape[1]
    n = 64 if size <= 16 else 128
    power = np.abs(np.fft.rfft2(kernels, (n, n))) ** 2
    fy, fx = np.meshgrid(np.fft.fftfreq(n), np.fft.rfftfreq(n), indexing="ij")
    radius = np.hypot(fx, fy)
    power[:, radius > 0.5] = 0.0
    power[:, 0, 0] = 0.0
    out = np.empty((len(kernels), 3, 2))
    for k, spectrum in enumerate(power):
        out[k, 2] = _mean_axis(spectrum, fx, fy)
        for rank in range(2):
            i, j = np.unravel_index(int(spectrum.argmax()), spectrum.shape)
            fx0, fy0 = fx[i, j], fy[i, j]
            out[k, rank] = math.atan2(fy0, fx0), math.hypot(fx0, fy0)
            # what lies within the patch's own resolution belongs to the same peak
            near = np.hypot(fx - fx0, fy - fy0) < 1.2 / size
            spectrum = np.where(near | (np.hypot(fx + fx0, fy + fy0) < 1.2 / size), 0, spectrum)
    return out


def _mean_axis(power: Array, fx: Array, fy: Array) -> tuple[float, float]:
    """Main axis of the spectrum's second moments, and the mean frequency along it."""
    total = max(float(power.sum()), np.finfo(float).tiny)
    xx, yy, xy = ((power * a).sum() / total for a in (fx * fx, fy * fy, fx * fy))
    theta = 0.5 * math.atan2(2 * xy, xx - yy)
    along = np.abs(fx * math.cos(theta) + fy * math.sin(theta))
    return theta, float((power * along).sum() / total)


def _widths(kernels: Array, centres: Array, theta: Array) -> tuple[Array, Array]:
    """Standard deviations of the energy along and across ``theta`` (k, t), about the centroid."""
    x, y = grid(kernels.shape[1])
    energy = kernels**2
    energy = energy / np.maximum(energy.sum((1, 2), keepdims=True), np.finfo(float).tiny)
    dx = x - centres[:, 0, 0, None, None]
    dy = y - centres[:, 0, 1, None, None]
    xx, yy, xy = ((energy * a).sum((1, 2))[:, None] for a in (dx * dx, dy * dy, dx * dy))
    c, s = np.cos(theta), np.sin(theta)
    along = c * c * xx + 2 * c * s * xy + s * s * yy
    across = s * s * xx - 2 * c * s * xy + c * c * yy
    return np.sqrt(np.maximum(along, 0.05)), np.sqrt(np.maximum(across, 0.05))


def _oriented_starts(family: str, kernels: Array, centres: Array) -> Array:
    peaks = _peaks(kernels)
    theta, frequency = peaks[..., 0], np.maximum(peaks[..., 1], 0.02)
    along, across = _widths(kernels, centres, theta)
    sv = math.sqrt(2) * across  # the energy of a Gaussian is 1 / sqrt(2) as wide as the Gaussian
    rows = []
    for c in range(2):
        for t in range(3):
            for su in _carrier_widths(family, along[:, t], frequency[:, t]):
                row = [np.ones(len(kernels)), centres[:, c, 0], centres[:, c, 1]]
                row += [theta[:, t], su, sv[:, t]]
                if family == "gabor":
                    row += [frequency[:, t], np.zeros(len(kernels))]
                rows.append(np.stack(row, 1))
    return np.stack(rows, 1)


def _carrier_widths(family: str, along: Array, frequency: Array) -> tuple[Array, Array]:
    """Two readings of sigma_u: from the energy's width, and from the spectral peak."""
    if family == "gabor":
        return math.sqrt(2) * along, 0.35 / frequency
    # <z^2> of the energy is 3/2 for z g and 7/6 for (1 - z^2) g; peaks at sqrt(order)/(2 pi sigma)
    spread, peak = (1.5, 1.0) if family == "gd1" else (7 / 6, math.sqrt(2))
    return along / math.sqrt(spread), peak / (2 * math.pi * frequency)


def _round_starts(centres: Array) -> Array:
    one = np.ones(len(centres))
    rows = [
        np.stack([one, centres[:, c, 0], centres[:, c, 1], s * one, 1.8 * one, 0.9 * one], 1)
        for c in range(2)
        for s in (0.7, 1.4, 2.8)
    ]
    return np.stack(rows, 1)


def _linear_start(family: str, kernels: Array, rows: Array) -> Array:
    """Set amplitude (and a Gabor's phase) to their least-squares values."""
    k, s, n = rows.shape
    flat, size = kernels.reshape(k, 1, -1), kernels.shape[1]
    q = rows.reshape(-1, n).copy()
    even = sample(family, q, size).reshape(k, s, -1)
    ee, ek = (even * even).sum(-1), (even * flat).sum(-1)
    if family != "gabor":
        rows[..., 0] = ek / np.maximum(ee, 1e-30)
        return rows
    q[:, 7] = np.pi / 2  # cos(z + pi / 2) = -sin z
    odd = sample(family, q, size).reshape(k, s, -1)
    oo, eo, ok = (odd * odd).sum(-1), (even * odd).sum(-1), (odd * flat).sum(-1)
    ridge = 1e-9 * (ee + oo) + 1e-30
    det = (ee + ridge) * (oo + ridge) - eo * eo
    a, b = ((oo + ridge) * ek - eo * ok) / det, ((ee + ridge) * ok - eo * ek) / det
    rows[..., 0], rows[..., 7] = np.hypot(a, b), np.arctan2(b, a)
    return rows
