"""How far camera and lens spread a sharp edge: from ordinary photographs, or from a chart.

``sigma`` is everywhere the standard deviation of the total line spread in the picture,
the pixel's own aperture (1/12 px squared) included: the width of the edges that a
detector will meet. The lens alone is ``sqrt(sigma^2 - 1/12)``.
"""

from __future__ import annotations

from collections.abc import Iterable

import numpy as np
from numpy.typing import NDArray
from scipy import ndimage
from scipy.special import ndtr

from patchlab.camera.pixels import TOO_SMALL, Region, limited, regions
from patchlab.camera.table import sd_of
from patchlab.types import F64, Frame, InputContract, NoiseModel

RADIUS = 5
CELL = 12
PER_FRAME = 250
MIN_CONTRAST = 0.05
MIN_SNR = 8.0
MAX_ERROR = 0.3
MAX_RESIDUAL = 0.03
MAX_STRUCTURE = 14.0
MODEL_ERROR = 0.007
SHARPEST = 0.16
MIN_EDGES = 16
STEPS = 10

_Y, _X = (
    g.ravel().astype(np.float64) for g in np.mgrid[-RADIUS : RADIUS + 1, -RADIUS : RADIUS + 1]
)
_DISK = np.hypot(_X, _Y) <= RADIUS + 0.3


# ---------------------------------------------------------------- edges of ordinary frames


def _thinned(size: F64, gx: F64, gy: F64) -> NDArray[np.bool_]:
    """Local maxima of the gradient's size along its own direction (four of them)."""
    turn = np.rint(np.arctan2(gy, gx) / (np.pi / 4)).astype(np.int64) % 4
    best = np.zeros(size.shape, bool)
    for k, (dy, dx) in enumerate(((0, 1), (1, 1), (1, 0), (1, -1))):
        ahead = np.roll(size, (-dy, -dx), (0, 1))
        behind = np.roll(size, (dy, dx), (0, 1))
        best |= (turn == k) & (size >= ahead) & (size > behind)
    return best


def _light_noise(
    light: F64, region: Region, contract: InputContract, noise: NoiseModel | None
) -> F64:
    """Standard deviation of the noise in light at every pixel (0 where not known)."""
    if noise is None or not noise.measurable:
        return np.zeros_like(light)
    codes = np.linspace(contract.black, contract.white, 512)
    slope = np.gradient(contract.light(codes), codes)
    sd = sd_of(noise, contract, codes) * slope
    return np.interp(ndimage.uniform_filter(region.codes, 3), codes, sd)


def _candidates(light: F64, sd: F64, usable: NDArray[np.bool_]) -> NDArray[np.intp]:
    """(n, 2) rows and columns of strong edges, at most one in a 12 x 12 cell."""
    gx = ndimage.gaussian_filter(light, 1.0, order=[0, 1])
    gy = ndimage.gaussian_filter(light, 1.0, order=[1, 0])
    size = np.hypot(gx, gy)
    # a step of height 1 blurred by about 0.8 px and this derivative peaks near 0.31
    contrast = size / 0.31
    inside = np.zeros(light.shape, bool)
    margin = RADIUS + 2
    inside[margin:-margin, margin:-margin] = True
    good = inside & usable & _thinned(size, gx, gy)
    good &= contrast > np.maximum(MIN_CONTRAST, MIN_SNR / 2 * sd)
    y, x = np.nonzero(good)
    order = np.argsort(-size[y, x], kind="stable")
    cell = (y[order] // CELL) * (light.shape[1] // CELL + 1) + x[order] // CELL
    _, first = np.unique(cell, return_index=True)
    kept = order[np.sort(first)[:PER_FRAME]]
    return np.stack([y[kept], x[kept]], axis=1)


def _edge_model(p: F64) -> tuple[F64, F64]:
    """Blurred steps (n, m) and their derivatives (n, m, 5) for (low, height, d, theta, sigma)."""
    low, height, d, theta, sigma = (p[:, i : i + 1] for i in range(5))
    x, y = _X[_DISK][None], _Y[_DISK][None]
    c, s = np.cos(theta), np.sin(theta)
    u = (x * c + y * s - d) / sigma
    step = ndtr(u)
    bell = height * np.exp(-(u**2) / 2) / (np.sqrt(2 * np.pi) * sigma)
    parts = [np.ones_like(u), step, -bell, bell * (y * c - x * s), -bell * u]
    return low + height * step, np.stack(parts, axis=2)


def _fit_edges(patches: F64, theta: F64) -> tuple[F64, F64, F64]:
    """Levenberg-Marquardt on all edges at once: parameters, sigma's standard error, residual."""
    n = len(patches)
    p = np.stack(
        [patches.min(axis=1), np.ptp(patches, axis=1), np.zeros(n), theta, np.full(n, 0.9)], axis=1
    )
    damping = np.full(n, 1e-2)
    value, slope = _edge_model(p)
    cost = ((patches - value) ** 2).sum(axis=1)
    eye = np.eye(5)[None]
    for _ in range(STEPS):
        normal = slope.transpose(0, 2, 1) @ slope
        scale = np.einsum("nii->ni", normal)[:, :, None] * eye + 1e-12 * eye
        right = slope.transpose(0, 2, 1) @ (patches - value)[:, :, None]
        step = np.linalg.solve(normal + damping[:, None, None] * scale, right)[:, :, 0]
        trial = p + step
        trial[:, 4] = np.clip(trial[:, 4], 0.15, 6.0)
        trial[:, 2] = np.clip(trial[:, 2], -3, 3)
        fresh, fresh_slope = _edge_model(trial)
        fresh_cost = ((patches - fresh) ** 2).sum(axis=1)
        better = fresh_cost < cost
        p[better], value[better], slope[better] = trial[better], fresh[better], fresh_slope[better]
        cost = np.where(better, fresh_cost, cost)
        damping = np.clip(np.where(better, damping / 5, damping * 5), 1e-9, 1e6)
    residual = cost / (patches.shape[1] - 5)
    normal = slope.transpose(0, 2, 1) @ slope + 1e-9 * eye
    error = np.sqrt(np.maximum(np.linalg.inv(normal)[:, 4, 4] * residual, 0))
    return p, error, np.sqrt(residual)


def _structure(patches: F64, p: F64, own: F64) -> F64:
    """Chi-square of the residual's means over strips along the edge (7 degrees of freedom).

    A joint or a ridge beside a step makes it look narrower; on single pixels that is
    hidden by the noise, on strips it is not.
    """
    model, _ = _edge_model(p)
    rest = patches - model
    distance = _X[_DISK] * np.cos(p[:, 3:4]) + _Y[_DISK] * np.sin(p[:, 3:4]) - p[:, 2:3]
    strip = np.clip(np.rint(distance), -RADIUS, RADIUS).astype(np.intp) + RADIUS
    total = np.zeros(len(patches))
    for k in range(2 * RADIUS + 1):
        inside = strip == k
        count = inside.sum(axis=1)
        mean = (rest * inside).sum(axis=1) / np.maximum(count, 1)
        excess = np.maximum(np.abs(mean) - MODEL_ERROR * np.abs(p[:, 1]), 0)
        total += count * (excess / own) ** 2
    return total


def edge_widths(region: Region, contract: InputContract, noise: NoiseModel | None) -> F64:
    """Blur sigma of a region's isolated, straight, well-lit edges and its error, (n, 2) pixels."""
    light = contract.light(region.codes)
    sd = _light_noise(light, region, contract, noise)
    at = _candidates(light, sd, region.usable)
    if not len(at):
        return np.empty((0, 2))
    rows = at[:, :1] + _Y[_DISK].astype(np.intp)
    cols = at[:, 1:] + _X[_DISK].astype(np.intp)
    patches = light[rows, cols]
    gx = (patches * _X[_DISK]).sum(axis=1)
    gy = (patches * _Y[_DISK]).sum(axis=1)
    p, error, residual = _fit_edges(patches, np.arctan2(gy, gx))
    own = np.sqrt((sd[rows, cols] ** 2).mean(axis=1))
    good = residual < np.hypot(1.2 * own, MAX_RESIDUAL * p[:, 1])
    # chosen by contrast over noise: choosing by sigma's error would favour wide or narrow fits
    good &= p[:, 1] > MIN_SNR * np.maximum(own, residual)
    good &= _structure(patches, p, np.where(own > 0, own, residual)) < MAX_STRUCTURE
    good &= (p[:, 1] > MIN_CONTRAST) & (np.abs(p[:, 2]) < 1.5)
    good &= (error < MAX_ERROR * p[:, 4]) & (p[:, 4] > 0.2) & (p[:, 4] < 5.0)
    return np.stack([p[good, 4], error[good]], axis=1)


class BlurMeter:
    """Collects edge widths, frame by frame."""

    def __init__(self, noise: NoiseModel | None) -> None:
        self.noise = noise
        self.widths: list[F64] = []
        self._regions = 0

    def add(self, frame: Frame) -> None:
        """Look at one frame."""
        found = [edge_widths(r, frame.contract, self.noise) for r in regions(frame)]
        self.widths.append(np.concatenate([*found, np.empty((0, 2))]))
        self._regions += len(found)

    @property
    def all_widths(self) -> F64:
        """Every edge's sigma, pixels."""
        return np.concatenate([*self.widths, np.empty((0, 2))])[:, 0].copy()

    def result(self) -> tuple[float | None, str]:
        """Sigma and a sentence about it."""
        widths = np.concatenate([*self.widths, np.empty((0, 2))])
        if self.widths and not self._regions:
            return None, f"not measurable here: {TOO_SMALL}"
        if len(widths) < MIN_EDGES:
            return None, (
                f"not measurable here: {len(widths)} isolated straight edges were found, "
                f"{MIN_EDGES} are needed"
            )
        middle = float(np.median(widths[:, 0]))
        # the lower half's spread holds the scene's soft edges and the fits' own errors
        seen = middle - float(np.quantile(widths[:, 0], SHARPEST))
        own = float(np.median(widths[:, 1]))
        sigma = middle - float(np.sqrt(max(seen**2 - own**2, 0.0)))
        return sigma, (
            f"standard deviation of the line spread, pixel aperture included, of the sharpest "
            f"of {len(widths)} isolated edges (16 % quantile; median {middle:.2f} px)"
        )


def measure_blur(frames: Iterable[Frame], noise: NoiseModel | None) -> tuple[float | None, str]:
    """Point-spread width from the sharpest isolated edges of ordinary frames.

    A blurred step is fitted by least squares, in linear light, in a disk of 5 px around
    each strong straight edge; edges with structured residuals are dropped, and the 16 %
    quantile of the widths, freed of the fits' own errors, is the camera's, since scenes
    hold soft edges too.

    Parameters
    ----------
    frames : at most 64 are used; consumed once
    noise : the measured law, or None

    Returns
    -------
    sigma : pixels, pixel aperture included; None where fewer than 16 edges serve
    note : a sentence about it

    Raises
    ------
    InputError : no frame, or frames of different contracts.
    """
    meter = BlurMeter(noise)
    for frame in limited(frames):
        meter.add(frame)
    return meter.result()
