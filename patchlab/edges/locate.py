"""Edge elements at sub-pixel places, with standard errors.

A parabola through the response along the normal gives the start; a least-squares
edge model through the input table (:mod:`patchlab.edges.model`) gives the place.
Where that fit does not settle or runs away, the parabola stands.
"""

from __future__ import annotations

import csv
import io
import math
from dataclasses import dataclass

import numpy as np
from numpy.typing import NDArray

from patchlab.edges import model, thin
from patchlab.edges.noise import spectral_moments
from patchlab.errors import UsageError
from patchlab.types import EDGEL, F32, F64, Bank, EdgeMap

STEP, BRIGHT, DARK = 0, 1, 2
"""Kinds of an edgel: a step, a bright line, a dark line."""
RADIUS_PX = 4
"""Radius of the disk that the edge model is fitted in."""
NARROW_PX = 2.5
"""Radius of the disk where other edges are near."""
MISFIT = 1.8
"""Chi-square per degree of freedom above which the narrow disk is tried."""
LEASH_PX = 1.5
"""A fit that moves farther than this from the parabola's place is not trusted."""
BLUR_PX = 0.8
"""Where to start when the blur of the camera is not known."""

WIDE_DISK = 2.5
"""Radius of an octave's disk, in widths of its kernels: its edges are soft, and both levels must
be seen."""
WIDE_UNIT_PX = 2.5
"""A kernel so wide may be a pixel off; an octave's, in proportion more."""

Index = NDArray[np.int64]


@dataclass(frozen=True)
class Disk:
    """How elements of one scale are placed.

    Parameters
    ----------
    radius, narrow : of the disk that the model is fitted in, and of the one tried where other
        edges are near, pixels
    blur_px : where the blur starts; None means the camera's
    slack : spacing of the parabola's samples, and how many pixels more the edge may be off
    """

    radius: float
    narrow: float
    blur_px: float | None = None
    slack: float = 1.0


def disk_of(shape: thin.ScaleShape, radius: float) -> Disk:
    """The disk of a scale: the usual one, or an octave's, whose edges are as soft as it is wide."""
    if not shape.octave:
        return Disk(radius, NARROW_PX)
    wide = max(radius, WIDE_DISK * shape.sigma_px)
    return Disk(wide, 0.6 * wide, shape.sigma_px, max(1.0, shape.sigma_px / WIDE_UNIT_PX))


@dataclass(frozen=True, eq=False)
class Start:
    """Where the responses alone put the elements; all arrays (n,).

    Parameters
    ----------
    offset : along the normal from the element's pixel, px
    theta : direction, radians; towards the brighter side for steps
    sd : standard error of ``offset`` for a bank of unit noise gain
    kind : 0 step, 1 bright line, 2 dark line
    """

    offset: F64
    theta: F64
    sd: F64
    kind: NDArray[np.uint8]


# ---------------------------------------------------------------- responses beside a pixel


def _cubic(t: F64) -> F64:
    """Weights (4, n) of cubic convolution at fractions t, for samples -1, 0, 1, 2.

    Keys 1981, IEEE Transactions on Acoustics, Speech and Signal Processing 29:1153-1160.
    """
    return np.array(
        [
            ((-0.5 * t + 1) * t - 0.5) * t,
            (1.5 * t - 2.5) * t * t + 1,
            ((-1.5 * t + 2) * t + 0.5) * t,
            (0.5 * t - 0.5) * t * t,
        ]
    )


def sample(planes: F32, plane: Index, y: F64, x: F64) -> F64:
    """Cubic samples of stacked planes.

    Parameters
    ----------
    planes : float32 ndarray (n, h, w)
    plane : ndarray (m,), which plane each sample is taken from
    y, x : ndarray (m,), places in pixels; beyond the frame the border pixel is repeated

    Returns
    -------
    ndarray (m,)
    """
    h, w = planes.shape[1:]
    y0, x0 = np.floor(y).astype(np.int64), np.floor(x).astype(np.int64)
    wy, wx = _cubic(y - y0), _cubic(x - x0)
    total = np.zeros(y.shape)
    for j in range(4):
        row = np.clip(y0 + j - 1, 0, h - 1)
        line = np.zeros(y.shape)
        for i in range(4):
            line += wx[i] * planes[plane, row, np.clip(x0 + i - 1, 0, w - 1)]
        total += wy[j] * line
    return total


def _parabola(before: F64, here: F64, after: F64, reach: float) -> tuple[F64, F64]:
    """Place of the top of a parabola through samples at -1, 0, 1, and its curvature there."""
    bend = before - 2 * here + after
    safe = np.where(bend < 0, bend, -np.inf)
    return np.clip((before - after) / (2 * safe), -reach, reach), np.where(bend < 0, bend, 0.0)


def _turned(responses: F32, members: Index, turn: Index, y: Index, x: Index, flips: bool) -> F64:
    """Responses at whole pixels of lattice direction ``turn``, which may run off either end."""
    n = len(members)
    value = responses[members[turn % n], y, x].astype(np.float64)
    return np.where((turn // n) % 2, -value, value) if flips else value


def _start_scale(
    bank: Bank,
    responses: F32,
    shape: thin.ScaleShape,
    kind: thin.Kind,
    y: Index,
    x: Index,
    j: Index,
) -> Start:
    """Start of the elements of one scale; ``j`` is their winning direction."""
    odd = np.array(shape.odd, np.int64)
    even = np.array(shape.even, np.int64)
    is_step = np.full(y.shape, kind == "step")
    if kind == "energy":
        is_step = np.abs(responses[odd[j], y, x]) >= np.abs(responses[even[j], y, x])
    offset, theta, sd = (np.zeros(y.shape) for _ in range(3))
    sign, span = np.ones(y.shape), disk_of(shape, RADIUS_PX).slack
    for step, members in ((True, odd), (False, even)):
        at = np.flatnonzero(is_step == step)
        if at.size:
            part = _peak(bank, responses, members, shape.angles, y[at], x[at], j[at], step, span)
            offset[at], theta[at], sd[at], sign[at] = part
    code = np.where(is_step, STEP, np.where(sign > 0, BRIGHT, DARK)).astype(np.uint8)
    theta = np.where(is_step & (sign < 0), theta + math.pi, theta)
    offset = np.where(is_step & (sign < 0), -offset, offset)
    return Start(offset, theta, sd, code)


def _peak(
    bank: Bank,
    responses: F32,
    members: Index,
    angles: F64,
    y: Index,
    x: Index,
    j: Index,
    odd: bool,
    span: float,
) -> tuple[F64, F64, F64, F64]:
    """Offset and direction along the lattice normal, standard error, sign of the response."""
    here = responses[members[j], y, x].astype(np.float64)
    sign = np.where(here < 0, -1.0, 1.0)
    cos, sin = span * np.cos(angles[j]), span * np.sin(angles[j])
    before, after = (
        sign * sample(responses, members[j], y + s * sin, x + s * cos) for s in (-1, 1)
    )
    offset, bend = _parabola(before, sign * here, after, 1.0)
    count = len(members)
    left, right = (sign * _turned(responses, members, j + s, y, x, odd) for s in (-1, 1))
    turn, _ = _parabola(left, sign * here, right, 0.5) if count > 2 else (np.zeros(y.shape), here)
    slope = np.array(
        [
            math.sqrt(spectral_moments(bank.taps[i], float(a), bank.noise_autocovariance)[1])
            for i, a in zip(members, angles, strict=True)
        ]
    )
    # at most the reach of the parabola
    sd = span * np.minimum(span * slope[j] / np.maximum(-bend, 1e-9), 1.0)
    return span * offset, angles[j] + turn * math.pi / count, sd, sign


def start(
    bank: Bank, found: EdgeMap, responses: F32, kind: thin.Kind | None = None
) -> tuple[Index, Index, Start]:
    """Rows, columns and starting places of a picture's elements, in row order.

    Parameters
    ----------
    bank, found, responses : what :func:`patchlab.edges.thin.edge_map` took and gave
    kind : step, line or energy; None means ``bank.strength``
    """
    wanted = kind or bank.strength
    rows, cols = (a.astype(np.int64) for a in np.nonzero(found.edges))
    scale, turn = found.scale[rows, cols], found.orientation[rows, cols].astype(np.int64)
    n = rows.size
    out = Start(np.zeros(n), np.zeros(n), np.zeros(n), np.zeros(n, np.uint8))
    for shape in thin.shapes_of(bank, wanted):
        at = np.flatnonzero(scale == shape.scale)
        if at.size:
            part = _start_scale(bank, responses, shape, wanted, rows[at], cols[at], turn[at])
            out.offset[at], out.theta[at] = part.offset, part.theta
            out.sd[at], out.kind[at] = part.sd, part.kind
    return rows, cols, out


# ---------------------------------------------------------------- the place


def edgels(
    bank: Bank,
    values: F32,
    found: EdgeMap,
    responses: F32,
    *,
    blur_px: float | None = None,
    kind: thin.Kind | None = None,
    refine: bool = True,
    radius: float = RADIUS_PX,
    invalid: NDArray[np.bool_] | None = None,
) -> NDArray[np.void]:
    """Sub-pixel edge elements of one picture.

    Parameters
    ----------
    bank : Bank
    values : float32 ndarray (h, w), the picture after ``bank.table``
    found : EdgeMap of the picture
    responses : float32 ndarray (n, h, w), the bank's responses
    blur_px : the camera's blur, one standard deviation; None lets each element find its own
    kind : step, line or energy; None means ``bank.strength``
    refine : False keeps the parabola's place (quick; biased to the dark side on tables
        that bend)
    radius : of the disk that the edge model sees, pixels; octaves have wider ones
    invalid : bool ndarray (h, w), pixels that do not count

    Returns
    -------
    structured ndarray of :data:`patchlab.types.EDGEL`, in row order of the elements' pixels.
    ``width`` is what a line's profile is wider than the blur, as an even bar's width.
    ``sd`` is the standard error along the normal; where the model does not explain the
    pixels (corners, other edges close by) it is enlarged by the misfit.

    Raises
    ------
    UsageError : planes of different sizes, a blur or radius that cannot be.
    """
    if values.shape != found.edges.shape or responses.shape[1:] != values.shape:
        raise UsageError("values, edge map and responses must be of one picture")
    if radius < 2 or (blur_px is not None and not 0.1 <= blur_px <= 10):
        raise UsageError(f"cannot fit edges of blur {blur_px} px in a disk of {radius} px")
    rows, cols, begin = start(bank, found, responses, kind)
    offset, theta, sd = begin.offset.copy(), begin.theta.copy(), begin.sd.copy()
    spread = np.zeros(rows.size)
    if refine:
        picture = _Picture(bank, values, blur_px, invalid)
        scale = found.scale[rows, cols]
        for disk, scales in _disks(bank, kind, radius).items():
            for line in (False, True):
                at = np.flatnonzero(((begin.kind != STEP) == line) & np.isin(scale, scales))
                if at.size:
                    part = _refine(picture, rows, cols, begin, at, line, disk)
                    offset[at], theta[at], sd[at] = part[:3]
                    spread[at] = part[3] if line else 0.0
    out = np.zeros(rows.size, EDGEL)
    out["x"], out["y"] = cols + offset * np.cos(theta), rows + offset * np.sin(theta)
    lines = begin.kind != STEP
    out["theta"] = np.where(lines, theta % math.pi, (theta + math.pi) % (2 * math.pi) - math.pi)
    out["strength"], out["sd"] = found.strength[rows, cols], sd
    out["scale"], out["kind"] = found.scale[rows, cols], begin.kind
    out["width"] = _widths(spread, blur_px)
    return out


def _disks(bank: Bank, kind: thin.Kind | None, radius: float) -> dict[Disk, list[int]]:
    """The scales that are fitted in each kind of disk."""
    out: dict[Disk, list[int]] = {}
    for shape in thin.shapes_of(bank, kind):
        out.setdefault(disk_of(shape, radius), []).append(shape.scale)
    return out


def _widths(spread: F64, blur_px: float | None) -> F64:
    """Widths of evenly bright lines whose blurred profiles have these standard deviations.

    A bar of width w has variance w^2 / 12, and blur adds its own. 0 where nothing was fitted.
    """
    return np.asarray(np.sqrt(12 * np.maximum(spread**2 - (blur_px or 0.0) ** 2, 0.0)))


@dataclass(frozen=True, eq=False)
class _Picture:
    """What every fit of one picture needs."""

    bank: Bank
    values: F32
    blur_px: float | None
    invalid: NDArray[np.bool_] | None

    def fit(
        self,
        rows: Index,
        cols: Index,
        begin: Start,
        at: Index,
        line: bool,
        disk: Disk,
        radius: float,
    ) -> tuple[F64, F64, F64, F64, F64]:
        """Offset, direction, standard error (infinite where not to be trusted), misfit, blur."""
        bank, width = self.bank, disk.blur_px or self.blur_px or BLUR_PX
        fits = model.fit_edges(
            self.values,
            rows[at],
            cols[at],
            begin.offset[at],
            begin.theta[at],
            curve=model.curve_of(bank.table),
            profile="line" if line else "step",
            blur_px=max(width, 1.0) if line else width,
            blur_known=self.blur_px is not None and disk.blur_px is None and not line,
            noise_sd=bank.table.noise_sd or 1.0,
            radius=radius,
            autocovariance=bank.noise_autocovariance,
            invalid=self.invalid,
            slack=disk.slack,
        )
        q = fits.parameters
        rises = q[:, 3] > q[:, 2]
        if line:
            rises = rises == (begin.kind[at] == BRIGHT)
        good = fits.ok & rises & (np.abs(q[:, 0] - begin.offset[at]) <= disk.slack * LEASH_PX)
        # a misfit, or noise that is not measured, shows in the residual
        scatter = fits.chi2 if bank.table.noise_sd is None else np.maximum(fits.chi2, 1.0)
        sd = np.where(good, fits.sd[:, 0] * np.sqrt(scatter), np.inf)
        return q[:, 0], q[:, 1], sd, fits.chi2, np.exp(q[:, 5])


def _refine(
    picture: _Picture, rows: Index, cols: Index, begin: Start, at: Index, line: bool, disk: Disk
) -> tuple[F64, F64, F64, F64]:
    """Best place of the elements ``at``: the wide disk's, or a narrow one's, or the parabola's.

    Other edges inside the wide disk pull at the fit; where its residual is too large, a
    narrow disk is tried and the smaller standard error (misfit included) wins.
    """
    offset, theta, sd, misfit, spread = picture.fit(rows, cols, begin, at, line, disk, disk.radius)
    again = np.flatnonzero((misfit > MISFIT) | ~np.isfinite(sd))
    if again.size and disk.radius > disk.narrow:
        near = picture.fit(rows, cols, begin, at[again], line, disk, disk.narrow)
        better = near[2] < sd[again]
        for whole, part in zip((offset, theta, sd), near[:3], strict=True):
            whole[again[better]] = part[better]
        spread[again[better]] = near[4][better]
    lost = ~np.isfinite(sd)
    offset[lost], theta[lost] = begin.offset[at[lost]], begin.theta[at[lost]]
    sd[lost] = begin.sd[at[lost]]
    spread[lost] = 0.0
    return offset, theta, sd, spread


# ---------------------------------------------------------------- as text

CSV_COLUMNS = ("x_px", "y_px", "theta_deg", "strength", "sd_px", "scale", "kind", "width_px")
KIND_NAMES = ("step", "bright line", "dark line")


def edgels_csv(found: NDArray[np.void]) -> bytes:
    """Edgels as CSV (UTF-8, LF): x_px, y_px, theta_deg, strength, sd_px, scale, kind, width_px.

    The numbers are the shortest that read back to the same float32; ``theta_deg`` is the
    normal towards the brighter side, from +x towards +y.
    """
    out = io.StringIO()
    writer = csv.writer(out, lineterminator="\n")
    writer.writerow(CSV_COLUMNS)
    degrees = np.rad2deg(found["theta"])
    columns = (found["x"], found["y"], degrees, found["strength"], found["sd"])
    text = [[np.format_float_positional(v, trim="0") for v in column] for column in columns]
    names = [KIND_NAMES[k] for k in found["kind"]]
    widths = [np.format_float_positional(v, trim="0") for v in found["width"]]
    writer.writerows(zip(*text, found["scale"].tolist(), names, widths, strict=True))
    return out.getvalue().encode()
