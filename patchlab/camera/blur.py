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
from patchlab.camera.widths import MIN_EDGES, Edges, freed, join, sharpest
from patchlab.types import F64, Frame, InputContract, NoiseModel

RADIUS = 5
CELL = 12
PER_FRAME = 250
MIN_CONTRAST = 0.05
MIN_SNR = 8.0
MAX_ERROR = 0.08
MAX_BLIND_ERROR = 0.05
"""Largest relative standard errors, with and without a noise law."""
MAX_SLOPE = 0.12
"""Heights a pixel: beside a step, light that slopes more is a ridge's or a joint's."""
MAX_RESIDUAL = 0.03
MAX_STRUCTURE = 14.0
MODEL_ERROR = 0.007
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
    """Blurred steps (n, m) and their derivatives (n, m, 7).

    Parameters of a step: low, height, distance, theta, sigma, and the slopes of the light on
    the dark and on the bright side, blurred like the step itself.
    """
    low, height, d, theta, sigma, dark, bright = (p[:, i : i + 1] for i in range(7))
    x, y = _X[_DISK][None], _Y[_DISK][None]
    c, s = np.cos(theta), np.sin(theta)
    v = x * c + y * s - d
    u = v / sigma
    step, bell = ndtr(u), np.exp(-(u**2) / 2) / np.sqrt(2 * np.pi)
    down, up = v * (1 - step) - sigma * bell, v * step + sigma * bell
    along = height / sigma * bell + dark * (1 - step) + bright * step
    wider = (bright - dark - height / sigma * u) * bell
    parts = [np.ones_like(u), step, -along, along * (y * c - x * s), wider, down, up]
    return low + height * step + dark * down + bright * up, np.stack(parts, axis=2)


def _descend(patches: F64, p: F64, free: int, steps: int) -> tuple[F64, F64]:
    """Levenberg-Marquardt on all edges at once, the first ``free`` parameters; and the cost."""
    p = p.copy()
    damping = np.full(len(p), 1e-2)
    value, slope = _edge_model(p)
    cost = ((patches - value) ** 2).sum(axis=1)
    eye = np.eye(free)[None]
    for _ in range(steps):
        jacobian = slope[:, :, :free]
        normal = jacobian.transpose(0, 2, 1) @ jacobian
        scale = np.einsum("nii->ni", normal)[:, :, None] * eye + 1e-12 * eye
        right = jacobian.transpose(0, 2, 1) @ (patches - value)[:, :, None]
        trial = p.copy()
        trial[:, :free] += np.linalg.solve(normal + damping[:, None, None] * scale, right)[:, :, 0]
        trial[:, 4] = np.clip(trial[:, 4], 0.15, 6.0)
        trial[:, 2] = np.clip(trial[:, 2], -3, 3)
        fresh, fresh_slope = _edge_model(trial)
        fresh_cost = ((patches - fresh) ** 2).sum(axis=1)
        better = fresh_cost < cost
        p[better], value[better], slope[better] = trial[better], fresh[better], fresh_slope[better]
        cost = np.where(better, fresh_cost, cost)
        damping = np.clip(np.where(better, damping / 5, damping * 5), 1e-9, 1e6)
    return p, cost


def _start(patches: F64) -> F64:
    """A step through the middle of each disk, along its mean gradient."""
    gx, gy = (patches * _X[_DISK]).sum(axis=1), (patches * _Y[_DISK]).sum(axis=1)
    p = np.zeros((len(patches), 7))
    p[:, 0], p[:, 1] = patches.min(axis=1), np.ptp(patches, axis=1)
    p[:, 3], p[:, 4] = np.arctan2(gy, gx), 0.9
    return p


def _fine_noise(rest: F64) -> F64:
    """Standard deviation of the noise by the diagonal band of residuals (n, pixels of the disk)."""
    side = 2 * RADIUS + 1
    plane = np.zeros((len(rest), side * side))
    plane[:, _DISK] = rest
    band = plane.reshape(-1, side, side)
    for axis in (1, 2):
        band = np.roll(band, 1, axis) + np.roll(band, -1, axis) - 2 * band
    inside = ndimage.binary_erosion(_DISK.reshape(side, side), np.ones((3, 3), bool))
    return np.asarray(np.maximum(np.sqrt((band[:, inside] ** 2).mean(axis=1)) / 6, 1e-9))


def _structure(rest: F64, p: F64, own: F64) -> F64:
    """Chi-square of the residual's means over strips along the edge (7 degrees of freedom).

    A joint or a ridge beside a step makes it look narrower; on single pixels that is
    hidden by the noise, on strips it is not.
    """
    distance = _X[_DISK] * np.cos(p[:, 3:4]) + _Y[_DISK] * np.sin(p[:, 3:4]) - p[:, 2:3]
    strip = np.clip(np.rint(distance), -RADIUS, RADIUS).astype(np.intp) + RADIUS
    total = np.zeros(len(rest))
    for k in range(2 * RADIUS + 1):
        inside = strip == k
        count = inside.sum(axis=1)
        mean = (rest * inside).sum(axis=1) / np.maximum(count, 1)
        excess = np.maximum(np.abs(mean) - MODEL_ERROR * np.abs(p[:, 1]), 0)
        total += count * (excess / own) ** 2
    return total


def fit_edges(patches: F64, own: F64) -> Edges:
    """Width and side slopes of isolated straight edges.

    Parameters
    ----------
    patches : ndarray (n, pixels of the disk), light
    own : ndarray (n,), standard deviation of the noise in light; 0 where not known, and then
        taken from the diagonal band of what the fit leaves
    """
    p, cost = _descend(patches, _start(patches), 5, STEPS)
    strong = p[:, 1] > np.maximum(MIN_CONTRAST, MIN_SNR * own) * 0.75
    patches, own = patches[strong], own[strong]
    p, cost = _descend(patches, p[strong], 7, STEPS)
    residual = np.sqrt(cost / (patches.shape[1] - 7))
    value, slope = _edge_model(p)
    own = np.where(own > 0, own, _fine_noise(patches - value))
    noise = np.maximum(own, residual)
    spread = np.linalg.inv(slope.transpose(0, 2, 1) @ slope + 1e-9 * np.eye(7)[None])
    spread *= noise[:, None, None] ** 2
    good = residual < np.hypot(1.2 * own, MAX_RESIDUAL * p[:, 1])
    # chosen by contrast over noise: choosing by sigma's error would favour wide or narrow fits
    good &= (p[:, 1] > MIN_CONTRAST) & (p[:, 1] > MIN_SNR * noise) & (np.abs(p[:, 2]) < 1.5)
    good &= _structure(patches - value, p, own) < MAX_STRUCTURE
    good &= (p[:, 4] > 0.2) & (p[:, 4] < 5.0)
    good &= (np.abs(p[:, 5:]) < MAX_SLOPE * p[:, 1:2]).all(axis=1)
    return Edges(*(v[good] for v in (p[:, 1], p[:, 4:], spread[:, 4:, 4:])))


def find_edges(region: Region, contract: InputContract, noise: NoiseModel | None) -> Edges:
    """A region's isolated, straight, well-lit edges."""
    light = contract.light(region.codes)
    sd = _light_noise(light, region, contract, noise)
    at = _candidates(light, sd, region.usable)
    rows = at[:, :1] + _Y[_DISK].astype(np.intp)
    cols = at[:, 1:] + _X[_DISK].astype(np.intp)
    return fit_edges(light[rows, cols], np.sqrt((sd[rows, cols] ** 2).mean(axis=1)))


class BlurMeter:
    """Collects edges, frame by frame."""

    def __init__(self, noise: NoiseModel | None) -> None:
        self.noise = noise
        self._edges: list[Edges] = []
        self._frames = 0

    def add(self, frame: Frame) -> None:
        """Look at one frame."""
        self._edges += [find_edges(r, frame.contract, self.noise) for r in regions(frame)]
        self._frames += 1

    @property
    def all_widths(self) -> F64:
        """Every edge's sigma, pixels."""
        return freed(join(self._edges))[0]

    def result(self) -> tuple[float | None, str]:
        """Sigma and a sentence about it."""
        if self._frames and not self._edges:
            return None, f"not measurable here: {TOO_SMALL}"
        widths, errors = freed(join(self._edges))
        if len(widths) < MIN_EDGES:
            return None, (
                f"not measurable here: {len(widths)} isolated straight edges were found, "
                f"{MIN_EDGES} are needed"
            )
        sigma, error = sharpest(widths, errors)
        known = self.noise is not None and self.noise.measurable
        most = MAX_ERROR if known else MAX_BLIND_ERROR
        if error > most * sigma:
            return None, (
                f"not measurable here: {len(widths)} isolated edges leave {error / sigma:.0%} of "
                f"doubt (one standard error), at most {most:.0%} is accepted"
            )
        return sigma, (
            f"standard deviation of the line spread, pixel aperture included, of the sharp ones "
            f"of {len(widths)} isolated edges (standard error {error:.2f} px; median of all "
            f"{float(np.median(widths)):.2f} px)"
        )


def measure_blur(frames: Iterable[Frame], noise: NoiseModel | None) -> tuple[float | None, str]:
    """Point-spread width from the sharp isolated edges of ordinary frames.

    A blurred step between two slopes is fitted by least squares, in linear light, in a disk
    of 5 px around each strong straight edge; edges with structured residuals are dropped.
    The widths are taken for a mixture of the camera's own edges and of the scene's softer
    ones, and the first part's width is the camera's.

    Parameters
    ----------
    frames : at most 64 are used; consumed once
    noise : the measured law, or None

    Returns
    -------
    sigma : pixels, pixel aperture included; None where fewer than 16 edges serve, or where
        their standard error exceeds 8 % (5 % where the noise is not known)
    note : a sentence about it

    Raises
    ------
    InputError : no frame, or frames of different contracts.
    """
    meter = BlurMeter(noise)
    for frame in limited(frames):
        meter.add(frame)
    return meter.result()
