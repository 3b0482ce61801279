"""Proof of a bank on pictures whose edges are known: one picture or one level of light at a time.

What is measured: how many false elements flat pictures show against the number promised; how
far edgels lie from straight edges against the Cramer-Rao bound; precision, recall and F on
scenes with true edges, beside detectors of general libraries. Whoever calls brings the camera
and the scenes.
"""

from __future__ import annotations

import math
from collections.abc import Callable, Mapping, Sequence
from dataclasses import dataclass
from typing import Any

import numpy as np
from numpy.typing import NDArray
from scipy import ndimage
from scipy.special import ndtr

from patchlab.edges import model, thin
from patchlab.edges.detect import Respond, detect_edgels
from patchlab.edges.locate import RADIUS_PX as DISK_PX
from patchlab.edges.locate import edgels
from patchlab.edges.matching import count_pairs, direction_error
from patchlab.edges.rivals import Detector, Grid
from patchlab.edges.threshold import strength_for
from patchlab.types import F64, Bank, InputTable, Thresholds

VISIBLE = 0.75
"""True edges below this contrast, in noise units, need not be found (finding them is no fault)."""
CROWDED = 3
"""Maps with so many elements a true one are not matched but given the best they could have."""
PICTURES = ("raw", "stretched", "tabled")
"""What the libraries get: codes over the camera's range, codes over the picture's own range
(its half per cent of brightest pixels left out), and the bank's working values."""


@dataclass(frozen=True, eq=False)
class Scene:
    """A picture with its true edges.

    Parameters
    ----------
    pixels : ndarray (h, w), codes of the bank's camera
    truth : ndarray (n, 2), true elements (x, y), about a pixel apart along each outline
    contrast : ndarray (n,), their heights in noise units
    margin : pixels next to the rim that are not scored
    """

    pixels: NDArray[Any]
    truth: F64
    contrast: F64
    margin: int


@dataclass(frozen=True)
class Score:
    """Precision, recall and their harmonic mean on one picture."""

    precision: float
    recall: float

    @property
    def f(self) -> float:
        """F measure; 0 when nothing was found."""
        both = self.precision + self.recall
        return 2 * self.precision * self.recall / both if both else 0.0


def _inner(points: F64, scene: Scene) -> NDArray[np.bool_]:
    h, w = scene.pixels.shape
    m = scene.margin
    x, y = points[:, 0], points[:, 1]
    return np.asarray((x > m) & (y > m) & (x < w - 1 - m) & (y < h - 1 - m))


def score(found: F64, scene: Scene) -> Score:
    """Score elements by one-to-one matching within a pixel.

    Precision is the share of elements that have a true edge of their own, however faint;
    recall the share of visible true elements that have a found one of their own.

    Parameters
    ----------
    found : ndarray (n, 2), elements (x, y), pixels
    scene : Scene
    """
    found = found[_inner(found, scene)]
    inside = _inner(scene.truth, scene)
    seen = scene.truth[inside & (scene.contrast > VISIBLE)]
    if not len(found) or not len(seen):
        return Score(0.0, 0.0)
    if len(found) > CROWDED * inside.sum():
        return Score(float(inside.sum()) / len(found), 1.0)
    right = count_pairs(found, scene.truth) / len(found)
    return Score(right, count_pairs(found, seen) / len(seen))


def _pixels_of(mask: NDArray[np.bool_]) -> F64:
    y, x = np.nonzero(mask)
    return np.column_stack([x, y]).astype(np.float64)


def _places(found: NDArray[np.void]) -> F64:
    return np.column_stack([found["x"], found["y"]]).astype(np.float64)


def score_bank(
    bank: Bank, scene: Scene, respond: Respond, rates: Sequence[float], blur_px: float | None
) -> dict[float, Score]:
    """Scores of the bank's edgels at several promised rates."""
    assert bank.thresholds is not None
    table, responses = bank.thresholds, respond(scene.pixels)
    values = bank.table.apply(scene.pixels)
    out = {}
    for rate in rates:
        found = thin.edge_map(
            bank, responses, strength_for(table, rate), hysteresis_ratio=table.hysteresis
        )
        out[rate] = score(_places(edgels(bank, values, found, responses, blur_px=blur_px)), scene)
    return out


def score_rivals(
    table: InputTable, scene: Scene, detectors: Mapping[str, Detector], grid: Grid
) -> dict[tuple[str, str], dict[str, Score]]:
    """Scores of every setting of every detector, by (detector, picture it was given)."""
    contract = table.contract
    light = scene.pixels.astype(np.float64) - contract.black
    pictures = {
        "raw": 100 * light / (contract.white - contract.black),
        "stretched": 100 * light / max(1e-9, float(np.quantile(light, 0.995))),
        "tabled": table.apply(scene.pixels) / (table.noise_sd or 1.0),
    }
    return {
        (name, kind): {
            setting: score(_pixels_of(mask), scene)
            for setting, mask in detect(pictures[kind].astype(np.float32), grid)
        }
        for name, detect in detectors.items()
        for kind in PICTURES
    }


# ---------------------------------------------------------------- flat pictures


@dataclass(frozen=True, eq=False)
class FlatCounts:
    """False elements and groups of them on flat pictures of one grey level, by promised rate."""

    elements: NDArray[np.int64]
    groups: NDArray[np.int64]
    megapixels: float


def count_flat(
    bank: Bank,
    pixels: NDArray[Any],
    respond: Respond,
    rates: Sequence[float],
    *,
    kind: thin.Kind | None = None,
    thresholds: Thresholds | None = None,
) -> FlatCounts:
    """Run the whole chain on a picture that shows nothing.

    Parameters
    ----------
    bank : Bank
    pixels : ndarray (h, w), codes of an evenly lit field
    respond : the engine
    rates : promised false elements per megapixel
    kind, thresholds : of what is looked for; None means the bank's own
    """
    table = thresholds or bank.thresholds
    assert table is not None
    responses = respond(pixels)
    elements, groups = [], []
    for rate in rates:
        found = thin.edge_map(
            bank,
            responses,
            strength_for(table, rate),
            hysteresis_ratio=table.hysteresis,
            kind=kind,
        )
        elements.append(int(found.edges.sum()))
        groups.append(ndimage.label(found.edges, structure=np.ones((3, 3)))[1])
    cut = 2 * min(s.reach_px for s in thin.shapes_of(bank, kind))
    area = (pixels.shape[0] - cut) * (pixels.shape[1] - cut) / 1e6
    return FlatCounts(np.array(elements), np.array(groups), area)


@dataclass(frozen=True)
class Flatness:
    """Chi-square test that a rate is the same at every grey level.

    Parameters
    ----------
    chi2 : of the counts of connected groups over their mean (groups are nearly independent,
        the elements within one are not)
    freedom : degrees of freedom
    limit : chi-square that an even rate exceeds once in a hundred times
    """

    chi2: float
    freedom: int
    limit: float

    @property
    def flat(self) -> bool:
        """Whether the counts agree with one rate."""
        return self.chi2 <= self.limit


def flatness(groups: NDArray[np.int64]) -> Flatness:
    """Test counts of groups at equal areas for evenness; at least two counts.

    >>> flatness(np.array([9, 11, 10, 10])).flat, flatness(np.array([2, 30, 10, 10])).flat
    (True, False)
    """
    from scipy.stats import chi2

    mean = max(float(groups.mean()), 1e-9)
    freedom = len(groups) - 1
    value = float(((groups - mean) ** 2).sum() / mean)
    return Flatness(value, freedom, float(chi2.ppf(0.99, freedom)))


# ---------------------------------------------------------------- location


def step_bounds(
    table: InputTable, low: float, high: float, blur_px: float, theta: float, offset: float
) -> tuple[float, float]:
    """Cramer-Rao bounds of a straight step: position, direction and both levels are unknown.

    From finite differences of the tabled edge over the disk that edgels are fitted in, for
    white noise.

    Parameters
    ----------
    table : InputTable with a known noise
    low, high : light on either side, code units
    blur_px : one standard deviation
    theta : normal, radians
    offset : distance of the edge from the disk's middle pixel, pixels

    Returns
    -------
    standard deviation along the normal, pixels; of the direction, radians

    Notes
    -----
    Rao 1945, Cramer 1946; for a step alone ``var = 2 sqrt(pi) blur noise^2 / contrast^2`` for
    each pixel of edge length.
    """
    disk, curve = model.Window.disk(DISK_PX), model.curve_of(table)

    def values(q: F64) -> F64:
        d = disk.x * math.cos(q[1]) + disk.y * math.sin(q[1]) - q[0]
        return curve.at(q[2] + (q[3] - q[2]) * ndtr(d / blur_px))[0]

    at = np.array([offset, theta, low, high])
    step = np.array([0.02, 0.01, 0.02 * (high - low), 0.02 * (high - low)])
    slopes = [
        (values(at + d) - values(at - d)) / (2 * s)
        for s, d in zip(step, np.diag(step), strict=True)
    ]
    jacobian = np.column_stack(slopes) / (table.noise_sd or 1.0)
    variance = np.diag(np.linalg.inv(jacobian.T @ jacobian))
    return math.sqrt(float(variance[0])), math.sqrt(float(variance[1]))


Shoot = Callable[[F64, np.random.Generator], NDArray[Any]]
"""Light in code units (h, w) to the camera's codes."""


@dataclass(frozen=True)
class Located:
    """Errors of edgels along straight edges of one contrast.

    ``rms_px`` and ``bias_px`` along the normal, ``bound_px`` the Cramer-Rao bound, ``ratio``
    the one over the other, ``sd_ratio`` the errors' scatter over the standard errors told;
    ``turn_deg`` and ``turn_bound_deg`` the rms error of the direction and its bound.
    """

    contrast: float
    rms_px: float
    bias_px: float
    bound_px: float
    sd_ratio: float
    edgels: int
    turn_deg: float
    turn_bound_deg: float

    @property
    def ratio(self) -> float:
        """Error over its bound."""
        return self.rms_px / self.bound_px


def locate_steps(
    bank: Bank,
    respond: Respond,
    shoot: Shoot,
    contrast: float,
    *,
    base: float,
    blur_px: float,
    pictures: int,
    draw: np.random.Generator,
    side: int = 72,
) -> Located:
    """Edgels of straight steps at random places and directions, against the bound.

    Parameters
    ----------
    bank, respond : what is proved
    shoot : the camera
    contrast : step height in working values, noise units
    base : light of the dark side, code units
    blur_px : of the camera
    pictures : how many
    draw : random generator
    side : of a picture, pixels
    """
    curve, sd = model.curve_of(bank.table), bank.table.noise_sd or 1.0
    top = float(curve.inverse(curve.at(np.array([base]))[0][0] + sd * contrast))
    y, x = np.mgrid[:side, :side] - side // 2
    errors, told, turns, bounds = [], [], [], []
    for _ in range(pictures):
        theta, p = draw.uniform(-math.pi, math.pi), draw.uniform(-0.5, 0.5)
        across = x * math.cos(theta) + y * math.sin(theta) - p
        codes = shoot(base + (top - base) * ndtr(across / blur_px), draw)
        _, found = detect_edgels(bank, codes, respond, rate=10.0, blur_px=blur_px)
        dx, dy = found["x"] - side // 2, found["y"] - side // 2
        off = dx * math.cos(theta) + dy * math.sin(theta) - p
        near = (np.abs(off) < 1.5) & (np.hypot(dx, dy) < side // 2 - bank.radius - 2)
        errors.append(off[near])
        told.append(found["sd"][near])
        turns.append(direction_error(found["theta"][near], np.array(theta)))
        bounds.append(step_bounds(bank.table, base, top, blur_px, theta, p))
    e, s = np.concatenate(errors).astype(np.float64), np.concatenate(told).astype(np.float64)
    bound, turn_bound = np.sqrt(np.mean(np.square(bounds), axis=0)).tolist()
    turn_bound = math.degrees(turn_bound)
    if not e.size:
        return Located(contrast, math.nan, math.nan, bound, math.nan, 0, math.nan, turn_bound)
    turn = math.degrees(_rms(np.concatenate(turns)))
    bias = float(e.mean())
    return Located(contrast, _rms(e), bias, bound, _rms(e / s), e.size, turn, turn_bound)


def _rms(values: F64) -> float:
    return math.sqrt(float((values**2).mean()))
