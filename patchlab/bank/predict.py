"""Predicted edge detection of a step bank: how the sizes follow noise and blur.

A small analytic model, in units of the noise. A step of height A, blurred by a Gaussian of
sd b, crosses an oriented first derivative with widths s (across) and l (along) that has unit
noise gain and is turned against the edge by an angle d. Then, for continuous pictures,

- the response at the edge is ``2 A sqrt(s l) s cos d / sqrt(s^2 cos^2 d + l^2 sin^2 d + b^2)``;
- false elements per pixel above T number
  ``sum over orientations of sqrt((m2 - m1^2) / 2 pi) T exp(-T^2 / 2)``, m1 and m2 being the
  mean and mean square of the angular frequency under the kernel's power spectrum; for this
  kernel ``m2 - m1^2 = (3/2 - 4/pi) / s^2`` (Rice 1945 for the envelope; about twice too many
  for step responses alone, which errs on the safe side);
- the place of the maximum has sd ``sqrt(3/2) (s^2 + b^2)^1.5 / (2 A s^2.5 l^0.5)``, the
  localisation criterion of Canny 1986 for this kernel and a blurred step;
- another structure (a corner, an end, a neighbouring or bending edge) spoils the place when it
  lies in the kernel's footprint: with structures scattered at random this has probability
  ``1 - exp(-SPOILT l sqrt(s^2 + b^2))``. This is what makes long and wide kernels lose.

Sizes work as a cascade, finest first, coarser ones where finer found nothing. The prediction
is the F measure over a spread of contrasts, an element counting when it is within a pixel.
"""

from __future__ import annotations

import math
from collections.abc import Sequence
from dataclasses import dataclass

import numpy as np
from scipy.optimize import minimize
from scipy.special import erf, ndtr

from patchlab.types import F64, InputTable

SPOILT = 0.015
"""Structures per square pixel of footprint (sigma units), from scenes of large occluding shapes
at five light levels; scenes full of small shapes have up to 0.036. It sets the level of the
predicted F more than its order: on such scenes the widths chosen with it came within 0.01 in F
of the best among seven pairs of sizes, at four light levels and three blurs. No source."""
HYSTERESIS = 0.7
"""Elements join above this share of the threshold."""
EXPOSURES = 5
"""Light levels that a bank has to serve with its one pair of sizes."""
DIMMEST = 1 / 128
"""The lowest of them, as a share of full light: seven stops down. A bank chosen for three stops
reached a third of the F in eight electrons of light, and gained 0.014 of it in full light."""
FAINTEST = 2.5
"""Noise units between black and white below which no exposure is served: eight electrons and a
read noise of two or three."""
ASPECT = 1.2
"""Along over across. Between 1 and 1.5 detection changes little, beyond 2 corners and curves
lose more than straight edges gain."""
ACROSS = (0.7, 4.0)
"""Bounds of the width across, pixels: below, the pixel grid cannot hold the kernel; above, it
outgrows 31 taps."""
STEP = (1.4, 2.2)
"""Bounds of the ratio of neighbouring sizes: closer ones repeat, wider ones leave a gap."""
PIXEL_BLUR = 0.3
"""No picture is sharper than its pixel's own aperture (sd of a unit box: 0.289 px)."""
VISIBLE = 0.75
"""Steps below this height, in noise units, are no edges to be found."""
CONTRASTS = 64


@dataclass(frozen=True, eq=False)
class Conditions:
    """What an edge bank has to work in.

    Parameters
    ----------
    contrasts : ndarray (m,), step heights in noise units, equally likely
    blur_px : sd of the blur of a sharp edge, pixels
    false_edges : false elements allowed per megapixel
    autocovariance : of the working values' noise, centre 1; None means white
    """

    contrasts: F64
    blur_px: float
    false_edges: float
    autocovariance: F64 | None = None


def tone_contrasts(table: InputTable) -> F64:
    """Step heights, in working values, between surfaces of independent tone.

    The prior of the choice where no contrasts were measured: tones are uniform from 5 to 100
    per cent of full light, as on a scene of unrelated surfaces.

    Parameters
    ----------
    table : InputTable

    Returns
    -------
    ndarray (m,), ascending
    """
    c = table.contract
    if c.format.integer:
        codes = np.arange(c.format.full_scale + 1).astype(c.format.dtype)
    else:
        codes = np.linspace(c.black, c.white, 4096).astype(np.float32)
    tones = np.interp(
        0.05 + 0.95 * (np.arange(128) + 0.5) / 128, c.light(codes), table.apply(codes)
    )
    first, second = np.triu_indices(len(tones), 1)
    return np.sort(np.abs(tones[first] - tones[second]))


def tone_span(table: InputTable, light: float) -> float:
    """Working value of white above that of black, when light falls to a share of full light."""
    c = table.contract
    if c.format.integer:
        codes = np.arange(c.format.full_scale + 1).astype(c.format.dtype)
    else:
        codes = np.linspace(c.black, c.white, 4096).astype(np.float32)
    ends = np.interp([0.0, light], c.light(codes), table.apply(codes))
    return float(ends[1] - ends[0])


def dimming(table: InputTable) -> F64:
    """Factors on step heights for exposures from full light down to :data:`DIMMEST` of it.

    Light levels are evenly spread in their logarithm: one bank serves every exposure in which
    white stands :data:`FAINTEST` above black.

    Returns
    -------
    ndarray (EXPOSURES,), falling from 1
    """
    shares = np.geomspace(1, DIMMEST, 64)
    enough = [tone_span(table, float(x)) >= FAINTEST * (table.noise_sd or 1.0) for x in shares]
    lights = np.geomspace(1, shares[max(sum(enough), 1) - 1], EXPOSURES)
    return np.array([tone_span(table, float(x)) for x in lights]) / tone_span(table, 1.0)


def conditions(
    heights: F64,
    noise_sd: float,
    blur_px: float,
    false_edges: float,
    autocovariance: F64 | None = None,
) -> Conditions:
    """Reduce step heights in working values to equally likely visible contrasts."""
    a = np.sort(np.asarray(heights, dtype=np.float64)) / noise_sd
    a = a[a > VISIBLE]
    if not len(a):
        a = np.array([VISIBLE])
    contrasts = np.quantile(a, (np.arange(CONTRASTS) + 0.5) / CONTRASTS)
    return Conditions(contrasts, max(blur_px, PIXEL_BLUR), false_edges, autocovariance)


# ---------------------------------------------------------------- one size


def rice_threshold(across: float, orientations: int, false_edges: float) -> float:
    """Threshold, in noise units, for a rate of false elements per megapixel (Rice sum).

    >>> round(rice_threshold(1.2, 8, 10.0), 2)
    5.18
    """
    spread = math.sqrt((1.5 - 4 / math.pi) / (2 * math.pi)) / across
    wanted = 1e-6 * false_edges / (orientations * spread)
    t = 5.0
    for _ in range(40):  # t exp(-t^2 / 2) = wanted, on the falling side
        t = math.sqrt(max(2 * math.log(t / wanted), 1.0))
    return t


def colour_gain(across: float, along: float, autocovariance: F64 | None) -> float:
    """Noise gain under coloured noise over that under white noise, averaged over directions.

    From the kernel's own autocorrelation,
    ``(1 - p^2 / 2 s^2) exp(-p^2 / 4 s^2 - q^2 / 4 l^2)`` at the lag (p, q).
    """
    if autocovariance is None:
        return 1.0
    m = autocovariance.shape[0] // 2
    dy, dx = np.mgrid[-m : m + 1, -m : m + 1].astype(np.float64)
    total = 0.0
    for theta in np.pi * np.arange(8) / 8:
        p = dx * np.cos(theta) + dy * np.sin(theta)
        q = dy * np.cos(theta) - dx * np.sin(theta)
        own = (1 - p**2 / (2 * across**2)) * np.exp(
            -(p**2) / (4 * across**2) - q**2 / (4 * along**2)
        )
        total += float((own * autocovariance).sum()) / 8
    return math.sqrt(max(total, 1e-3))


def step_gain(across: float, along: float, blur: float, turned: float = 0.0) -> float:
    """Response of a unit-noise-gain step kernel to a unit step, continuous limit.

    Parameters
    ----------
    across, along : widths, pixels
    blur : sd of the step's blur, pixels
    turned : angle between kernel and edge, radians

    >>> round(step_gain(2.0, 2.0, 0.0) / 2, 6)  # 2 sqrt(s l) for a sharp step
    2.0
    """
    c, s = math.cos(turned), math.sin(turned)
    spread = math.sqrt(across**2 * c**2 + along**2 * s**2 + blur**2)
    return 2 * math.sqrt(across * along) * across * c / spread


def location_sd(across: float, along: float, blur: float) -> float:
    """Standard deviation, pixels, of where the response to a step of one noise unit peaks."""
    wide = math.hypot(across, blur)
    return math.sqrt(1.5 * wide**6 / (4 * across**5 * along))


def found_and_right(
    across: float, orientations: int, given: Conditions, false_edges: float
) -> tuple[F64, F64]:
    """For each contrast: the chance that one size finds a step, and then has it in place."""
    along = ASPECT * across
    louder = colour_gain(across, along, given.autocovariance)
    gain = step_gain(across, along, given.blur_px, math.pi / (4 * orientations)) / louder
    threshold = HYSTERESIS * rice_threshold(across, orientations, false_edges)
    found = ndtr(gain * given.contrasts - threshold)
    place = louder * location_sd(across, along, given.blur_px) / given.contrasts
    alone = math.exp(-SPOILT * along * math.hypot(across, given.blur_px))
    right = alone * erf(1 / (math.sqrt(2) * place))
    return np.asarray(found), np.asarray(right)


# ---------------------------------------------------------------- all sizes


def predicted_f(across: Sequence[float], structure: Sequence[int], given: Conditions) -> float:
    """Predicted F measure of a cascade of step kernels.

    Parameters
    ----------
    across : widths across the edge, finest first, pixels
    structure : orientations of each size
    given : Conditions

    Returns
    -------
    float in [0, 1]
    """
    left = np.ones_like(given.contrasts)
    elements = correct = 0.0
    for width, orientations in zip(across, structure, strict=True):
        rate = given.false_edges / len(structure)
        found, right = found_and_right(width, orientations, given, rate)
        elements += float((left * found).mean())
        correct += float((left * found * right).mean())
        left = left * (1 - found)
    return 2 * correct / (1 + elements)


@dataclass(frozen=True)
class ChosenWidths:
    """Sizes of an edge bank: widths across, finest first; which stand on a bound; predicted F."""

    across: tuple[float, ...]
    at_bound: tuple[bool, ...]
    predicted: float


def inside(across: float) -> bool:
    """Whether a width lies clear of its bounds.

    >>> inside(1.2), inside(0.7)
    (True, False)
    """
    return 1.002 * ACROSS[0] < across < 0.998 * ACROSS[1]


def ladder(finest: float, sizes: int, ratio: float) -> tuple[float, ...]:
    """Widths in a geometric row, kept within the bounds."""
    row = (finest * ratio**i for i in range(sizes))
    return tuple(round(min(max(w, ACROSS[0]), ACROSS[1]), 3) for w in row)


def best_widths(
    structure: Sequence[int], given: Conditions, starts: Sequence[float]
) -> ChosenWidths:
    """Choose the widths of a step cascade by predicted detection.

    Nelder-Mead on the logarithms of the finest width and of the ratios between sizes, from a
    ladder above each start; the best end wins.

    Parameters
    ----------
    structure : orientations of each size
    given : Conditions
    starts : finest widths to begin from, pixels

    Returns
    -------
    ChosenWidths, to a thousandth of a pixel
    """
    sizes = len(structure)
    bounds = [(math.log(a), math.log(b)) for a, b in (ACROSS, *[STEP] * (sizes - 1))]
    low = np.array([b[0] for b in bounds])
    high = np.array([b[1] for b in bounds])

    def widths(x: F64) -> tuple[float, ...]:
        row = np.exp(np.cumsum(x))
        return tuple(float(w) for w in np.minimum(row, ACROSS[1]))

    def loss(x: F64) -> float:
        return -predicted_f(widths(x), structure, given)

    ends = []
    for start in starts:
        x = np.clip(np.log([start, *[1.8] * (sizes - 1)]), low, high)
        steps = np.diag(np.where(x < high - 0.1, 0.1, -0.1))  # away from the upper bounds
        simplex = np.vstack([x, x + steps])
        ends.append(
            minimize(
                loss,
                x,
                method="Nelder-Mead",
                bounds=bounds,
                options={"initial_simplex": simplex, "xatol": 1e-5, "fatol": 1e-10},
            )
        )
    best = min(ends, key=lambda end: float(end.fun))
    across = tuple(round(w, 3) for w in widths(best.x))
    at_bound = tuple(not inside(w) for w in across)
    return ChosenWidths(across, at_bound, predicted_f(across, structure, given))
