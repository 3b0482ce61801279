"""Least squares of a blurred edge run through the input table, many edge elements at once.

The scene holds a step (or a line) that the lens blurs *in light*; the bank sees it
through its input table. A model fitted to table values directly is pulled to the dark
side, by up to a third of a pixel. So the model is ``table(low + (high - low) profile(d / blur))``
with ``d`` the distance to the edge, and Gauss-Newton steps go through the table's slope.

Six parameters a fit: position along the normal, normal direction, low, high, curvature,
log blur. The last two stay fixed unless the residual of the straight, known-blur fit asks
for them by a score test.
"""

from __future__ import annotations

import math
from dataclasses import dataclass
from functools import cached_property
from typing import Any, Literal, NamedTuple

import numpy as np
from numpy.typing import NDArray
from scipy.special import ndtr

from patchlab.conventions import srgb_decode
from patchlab.types import F32, F64, InputTable

Profile = Literal["step", "line"]

ITERATIONS = 12
SETTLED = 1e-3
"""Fall of the chi-square, over its value a degree of freedom, that a last step may promise."""
DAMPING = 1e-3
"""Least damping, as a share of the normal matrix's diagonal."""
RUNAWAY_PX = 2.02
"""A fit that moves farther than this from its start is given up. No whole number of largest steps,
so that no rounding decides it."""
ASKS = 9.0
"""Fall of the chi-square that frees a further parameter: by chance, three straight edges in a
thousand, which costs them a third of their precision."""
CURVATURE_PRIOR = 0.25
"""Standard deviation of the curvature before looking, 1 / pixels."""
BLUR_PRIOR = 0.7
"""The same of log blur about the blur given."""
LEVEL_ROUNDING = 1e-9
"""Levels on either side that differ by less than this share are equal."""
PLACE_PRIOR = 1.0
"""The same of the place about the start, pixels: it keeps faint edges from running away."""
PRIOR = np.array([PLACE_PRIOR**-2, 0, 0, 0, CURVATURE_PRIOR**-2, BLUR_PRIOR**-2])
"""One over the variance of each parameter before looking."""
LARGEST_STEP = np.array([0.5, 0.3, np.inf, np.inf, 0.1, 0.4])
"""What a round may change of each parameter."""
KEPT = 0.25
"""Share of its promised fall that a step must keep; after one that does not ..."""
CAREFUL = 0.3
"""... the damping is at least so much."""
CHUNK = 2048


@dataclass(frozen=True, eq=False)
class Curve:
    """Working value against linear light (in code units), piecewise linear.

    Parameters
    ----------
    light : increasing ndarray (n,)
    value : ndarray (n,)
    clipped : True when the camera saturates at both ends; otherwise the ends run on straight
    """

    light: F64
    value: F64
    clipped: bool

    @cached_property
    def slope(self) -> F64:
        """Slope of each piece, (n - 1,)."""
        return np.asarray(np.diff(self.value) / np.diff(self.light))

    @cached_property
    def pitch(self) -> float:
        """Distance of the knots when they are evenly spread, else 0."""
        steps = np.diff(self.light)
        even = np.ptp(steps) <= 1e-9 * steps[0]
        return float(steps[0]) if even else 0.0

    def _piece(self, light: F64) -> NDArray[np.int64]:
        if self.pitch:
            i = np.floor((light - self.light[0]) / self.pitch).astype(np.int64)
        else:
            i = np.searchsorted(self.light, light, "right") - 1
        return np.asarray(np.clip(i, 0, self.light.size - 2))

    def at(self, light: F64) -> tuple[F64, F64]:
        """Working values and their slope against light."""
        inside = np.clip(light, self.light[0], self.light[-1]) if self.clipped else light
        i = self._piece(inside)
        slope = self.slope[i]
        value = self.value[i] + slope * (inside - self.light[i])
        if self.clipped:
            slope = np.where(inside == light, slope, 0.0)
        return value, slope

    def inverse(self, value: Any) -> F64:
        """Light whose working value this is (the nearest end beyond the table)."""
        rising = np.maximum.accumulate(self.value)
        return np.interp(np.asarray(value, np.float64), rising, self.light)


def curve_of(table: InputTable) -> Curve:
    """The curve from linear light to working values that an input table implies."""
    contract = table.contract
    if table.values is not None:
        codes = np.arange(table.values.size, dtype=np.float64)
        value = table.values.astype(np.float64)
        if contract.transfer == "linear":
            return Curve(codes, value, clipped=True)
        span = contract.white - contract.black
        use = (codes >= contract.black) & (codes <= contract.white)
        unit = (codes[use] - contract.black) / span
        return Curve(srgb_decode(unit) * span, value[use], clipped=True)
    if table.kind == "identity":
        ends = np.array([contract.black, contract.white], np.float64)
        return Curve(ends, ends.copy(), clipped=False)
    # squares spread the knots evenly over the root's values
    ends = np.linspace(0, 1, 2049) ** 2 * (contract.white - contract.black) + contract.black
    return Curve(ends, table.apply(ends.astype(np.float32)).astype(np.float64), clipped=False)


@dataclass(frozen=True, eq=False)
class Window:
    """A disk of pixels: offsets (m,) from its centre pixel."""

    x: NDArray[np.int64]
    y: NDArray[np.int64]

    @classmethod
    def disk(cls, radius: float) -> Window:
        """Pixels at most ``radius`` from the centre, in row order."""
        r = math.floor(radius)
        y, x = np.mgrid[-r : r + 1, -r : r + 1]
        keep = x * x + y * y <= radius * radius
        return cls(x[keep].astype(np.int64), y[keep].astype(np.int64))


@dataclass(frozen=True, eq=False)
class Fits:
    """Fitted edges, one entry an element.

    Parameters
    ----------
    parameters : ndarray (n, 6): position along the normal from the element's pixel (px),
        direction towards ``high`` (radians), low, high (light in code units), curvature
        (1 / px, positive when the edge bends towards the normal), log of the blur (px)
    sd : ndarray (n, 6), standard errors; 0 for a parameter that was held
    chi2 : ndarray (n,), residual sum of squares over the noise variance, per degree of freedom
    ok : bool ndarray (n,), False where the fit did not settle
    """

    parameters: F64
    sd: F64
    chi2: F64
    ok: NDArray[np.bool_]


def _profile(u: F64, profile: Profile) -> tuple[F64, F64]:
    """The blurred edge's shape at ``u`` blurs from it, and its slope."""
    bell = np.exp(-u * u / 2)
    if profile == "step":
        return np.asarray(ndtr(u)), bell / math.sqrt(2 * math.pi)
    return bell, -u * bell


class _Problem:
    """One chunk of windows with their data; all arrays (n, m) or (n, k, m)."""

    def __init__(
        self,
        data: F64,
        weight: F64,
        window: Window,
        curve: Curve,
        profile: Profile,
        blur: float,
        place: F64,
        slack: float = 1.0,
    ) -> None:
        self.data, self.weight, self.curve, self.profile = data, weight, curve, profile
        self.x, self.y = window.x[None].astype(float), window.y[None].astype(float)
        self.slack = slack
        self.prior = PRIOR.copy()
        self.prior[0] /= slack**2
        self.centre = np.zeros((len(data), 6))
        self.centre[:, 0], self.centre[:, 5] = place, math.log(blur)

    def take(self, index: NDArray[Any]) -> _Problem:
        """The same for some of the windows."""
        part = object.__new__(_Problem)
        part.__dict__.update(self.__dict__)
        part.data, part.weight = self.data[index], self.weight[index]
        part.centre = self.centre[index]
        return part

    def residual(self, q: F64, count: int = 6) -> tuple[F64, F64]:
        """Weighted data minus model (n, m), and the model's derivatives in the first ``count``
        parameters (n, count, m)."""
        p, theta, low, high, bend, log_blur = (q[:, i, None] for i in range(6))
        cos, sin, inverse = np.cos(theta), np.sin(theta), np.exp(-log_blur)
        along = self.y * cos - self.x * sin
        across = self.x * cos + self.y * sin
        squared = along * along / 2
        u = (across - p - bend * squared) * inverse
        shape, slope = _profile(u, self.profile)
        value, gain = self.curve.at(low + (high - low) * shape)
        left = self.weight * (self.data - value)
        gain = gain * self.weight
        by_d = gain * slope * ((high - low) * inverse)
        jac = np.empty((len(q), count, self.x.size))
        np.negative(by_d, out=jac[:, 0])
        np.multiply(by_d, along * (1 + bend * across), out=jac[:, 1])
        np.multiply(gain, shape, out=jac[:, 3])
        np.subtract(gain, jac[:, 3], out=jac[:, 2])
        if count > 4:
            np.multiply(jac[:, 0], squared, out=jac[:, 4])
            np.multiply(jac[:, 0], u * np.exp(log_blur), out=jac[:, 5])
        return left, jac

    def freedom(self, active: NDArray[np.bool_]) -> F64:
        """Degrees of freedom (n,), at least one."""
        return np.asarray(np.maximum((self.weight > 0).sum(axis=1) - active.sum(axis=1), 1.0))

    def cost(self, q: F64, left: F64, active: NDArray[np.bool_]) -> F64:
        """Sum of squares with the priors of the active parameters."""
        off = (q - self.centre) ** 2 * self.prior * active
        return np.asarray(np.einsum("nm,nm->n", left, left) + off.sum(axis=1))


def _normal(
    problem: _Problem, q: F64, left: F64, jac: F64, active: NDArray[np.bool_]
) -> tuple[F64, F64]:
    """Normal matrix (n, k, k) and right side; held parameters get a unit row and no step."""
    k = jac.shape[1]
    prior, active = problem.prior[:k], active[:, :k]
    matrix = jac @ jac.transpose(0, 2, 1)
    right = (jac @ left[:, :, None])[:, :, 0] - prior * (q - problem.centre)[:, :k]
    diagonal = np.arange(k)
    matrix[:, diagonal, diagonal] += prior
    if not active.all():
        matrix = np.where(active[:, :, None] & active[:, None, :], matrix, 0.0)
    # a ridge relative to the largest entry: parameters that the pixels cannot tell apart get
    # no step and a huge standard error instead of a singular matrix
    ridge = 1e-12 + 1e-10 * matrix[:, diagonal, diagonal].max(axis=1, keepdims=True)
    matrix[:, diagonal, diagonal] += np.where(active, ridge, 1.0)
    return matrix, np.where(active, right, 0.0)


def _descend(problem: _Problem, q: F64, active: NDArray[np.bool_]) -> tuple[F64, NDArray[np.bool_]]:
    """Damped Gauss-Newton for every window; windows that settled are left out of later rounds.

    A window settles with the step that promises to lower its chi-square by less than
    :data:`SETTLED` of the scatter: such a step is a small share of a standard error. Where a
    step keeps less than a quarter of its promise the next one is shorter (Marquardt 1963,
    J. Soc. Indust. Appl. Math. 11:431-441). One that has run away is given up.
    """
    q, damping, settled = q.copy(), np.full(len(q), DAMPING), np.zeros(len(q), bool)
    origin, count = q[:, 0].copy(), 6 if active[:, 4:].any() else 4
    live, part, i = np.arange(len(q)), problem, np.arange(count)
    left, jac = part.residual(q, count)
    cost = part.cost(q, left, active)
    free = problem.freedom(active)
    for _ in range(ITERATIONS):
        start, on = q[live], active[live]
        matrix, right = _normal(part, start, left, jac, on)
        matrix[:, i, i] *= 1 + damping[live, None]
        step = np.linalg.solve(matrix, right[:, :, None])[:, :, 0]
        share = (LARGEST_STEP[:count] / np.maximum(np.abs(step), 1e-30)).min(axis=1)
        step *= np.minimum(1, share)[:, None]
        promise = np.einsum("nk,nk->n", step, right)
        trial = start.copy()
        trial[:, :count] += step
        ahead, slopes = part.residual(trial, count)
        after = part.cost(trial, ahead, on)
        better, kept = after <= cost, cost - after >= KEPT * promise
        q[live[better]] = trial[better]
        damping[live] = np.where(
            kept, np.maximum(damping[live] / 5, DAMPING), np.maximum(damping[live] * 5, CAREFUL)
        )
        settled[live] = promise < SETTLED * np.maximum(1.0, cost / free[live])
        near = np.abs(q[live, 0] - origin[live]) <= problem.slack * RUNAWAY_PX
        going = np.flatnonzero(~settled[live] & near)
        if not going.size:
            break
        keep = better[going]
        left = np.where(keep[:, None], ahead[going], left[going])
        jac = np.where(keep[:, None, None], slopes[going], jac[going])
        cost = np.where(keep, after[going], cost[going])
        live, part = live[going], part.take(going)
    return q, settled


class _Look(NamedTuple):
    """What the residual of a finished fit tells: see :func:`_look`."""

    sd: F64
    chi2: F64
    asks: NDArray[np.bool_]


def _look(problem: _Problem, q: F64, active: NDArray[np.bool_], correlation: F64 | None) -> _Look:
    """Standard errors (n, 6) for unit noise, chi-square per degree of freedom, and whether the
    residual asks for curvature or blur (n, 2) by the fall of the chi-square they would bring."""
    left, jac = problem.residual(q)
    matrix, _ = _normal(problem, q, left, jac, active)
    matrix[:, 0, 0] -= problem.prior[0]  # the start saw the same noise: it adds no knowledge
    inverse = np.linalg.inv(matrix)
    turned = jac.transpose(0, 2, 1)
    column = jac[:, 4:]
    cross = np.where(active[:, None], column @ turned, 0.0)
    explained = ((cross @ inverse) * cross).sum(axis=2)
    room = np.einsum("nkm,nkm->nk", column, column) - explained
    push = (column @ left[:, :, None])[:, :, 0]
    asks = (push**2 > ASKS * np.maximum(room, 1e-9)) & ~active[:, 4:]
    if correlation is not None:  # least squares under noise that is not white
        inverse = inverse @ ((jac @ correlation) @ turned) @ inverse
    spread = np.sqrt(np.maximum(np.diagonal(inverse, axis1=1, axis2=2), 0.0))
    chi2 = np.einsum("nm,nm->n", left, left) / problem.freedom(active)
    return _Look(np.where(active, spread, 0.0), chi2, asks)


def _levels(problem: _Problem, q: F64) -> F64:
    """Fill in low and high from the pixels on either side of the starting edge."""
    light = problem.curve.inverse(problem.data)
    p, theta, blur = q[:, 0, None], q[:, 1, None], np.exp(q[:, 5, None])
    u = (problem.x * np.cos(theta) + problem.y * np.sin(theta) - p) / blur
    low, high = u < -1.0, u > 1.0
    if problem.profile == "line":
        low, high = np.abs(u) > 2.0, np.abs(u) < 0.7
    out = q.copy()
    for column, side in ((2, low), (3, high)):
        weight = problem.weight * side + 1e-6
        out[:, column] = (weight * light).sum(axis=1) / weight.sum(axis=1)
    # levels that differ by a rounding are equal: its sign must not choose the first step
    gap = np.abs(out[:, 3] - out[:, 2])
    out[:, 3] = np.where(gap <= LEVEL_ROUNDING * np.abs(out[:, 2]), out[:, 2], out[:, 3])
    return out


def correlation_of(window: Window, autocovariance: F64 | None) -> F64 | None:
    """Noise correlation between the pixels of a window, (m, m); None when white."""
    if autocovariance is None:
        return None
    m = autocovariance.shape[0] // 2
    dy, dx = window.y[:, None] - window.y[None], window.x[:, None] - window.x[None]
    near = (np.abs(dy) <= m) & (np.abs(dx) <= m)
    rows, cols = np.clip(dy + m, 0, 2 * m), np.clip(dx + m, 0, 2 * m)
    return np.where(near, autocovariance[rows, cols], 0.0)


def fit_edges(
    values: F32,
    rows: NDArray[np.int64],
    cols: NDArray[np.int64],
    position: F64,
    theta: F64,
    *,
    curve: Curve,
    profile: Profile = "step",
    blur_px: float = 0.8,
    blur_known: bool = True,
    noise_sd: float = 1.0,
    radius: float = 4,
    autocovariance: F64 | None = None,
    invalid: NDArray[np.bool_] | None = None,
    slack: float = 1.0,
) -> Fits:
    """Fit a blurred step or line in a disk about each element.

    Parameters
    ----------
    values : float32 ndarray (h, w), working values (table output)
    rows, cols : ndarray (n,), the elements' pixels
    position : ndarray (n,), start along the normal, pixels
    theta : ndarray (n,), start direction, radians, towards ``high``
    curve : light to working value
    profile : step or line
    blur_px : one standard deviation of the blur (for a line: of its blurred profile)
    blur_known : False lets the blur free everywhere
    noise_sd : of the working values
    radius : of the disk, pixels
    autocovariance : of the noise, for honest errors when it is not white
    invalid : bool ndarray (h, w), pixels that do not count
    slack : how many times farther than usual the edge may lie from its start

    Returns
    -------
    Fits

    Notes
    -----
    Rao 1945 and Cramer 1946 for the bound that the standard errors state.
    """
    window = Window.disk(radius)
    correlation = correlation_of(window, autocovariance)
    parts = []
    for begin in range(0, len(rows), CHUNK):
        cut = slice(begin, begin + CHUNK)
        data, weight = _gather(values, rows[cut], cols[cut], window, noise_sd, invalid)
        problem = _Problem(data, weight, window, curve, profile, blur_px, position[cut], slack)
        q = np.zeros((len(data), 6))
        q[:, 0], q[:, 1], q[:, 5] = position[cut], theta[cut], math.log(blur_px)
        parts.append(_fit_chunk(problem, _levels(problem, q), blur_known, correlation))
    if not parts:
        return Fits(np.empty((0, 6)), np.empty((0, 6)), np.empty(0), np.empty(0, bool))
    return Fits(*(np.concatenate(column) for column in zip(*parts, strict=True)))


def _gather(
    values: F32,
    rows: NDArray[np.int64],
    cols: NDArray[np.int64],
    window: Window,
    noise_sd: float,
    invalid: NDArray[np.bool_] | None,
) -> tuple[F64, F64]:
    h, w = values.shape
    y, x = rows[:, None] + window.y, cols[:, None] + window.x
    inside = (y >= 0) & (y < h) & (x >= 0) & (x < w)
    y, x = np.clip(y, 0, h - 1), np.clip(x, 0, w - 1)
    if invalid is not None:
        inside &= ~invalid[y, x]
    return values[y, x].astype(np.float64), inside / noise_sd


def _fit_chunk(
    problem: _Problem, q: F64, blur_known: bool, correlation: F64 | None
) -> tuple[F64, F64, F64, NDArray[np.bool_]]:
    active = np.ones(q.shape, bool)
    active[:, 4], active[:, 5] = False, not blur_known
    q, ok = _descend(problem, q, active)
    seen = _look(problem, q, active, correlation)
    for extra in (0, 1):
        again = np.flatnonzero(seen.asks[:, extra])
        if again.size:
            part = problem.take(again)
            active[again, 4 + extra] = True
            q[again], ok[again] = _descend(part, q[again], active[again])
            parts = _look(part, q[again], active[again], correlation)
            for whole, found in zip(seen, parts, strict=True):
                whole[again] = found
    ok &= np.isfinite(q).all(axis=1) & np.isfinite(seen.sd).all(axis=1)
    return q, seen.sd, seen.chi2, ok
