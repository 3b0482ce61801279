"""From responses to thin edge elements: one strength a scale, thinning, hysteresis, cascade.

The chain works on *candidates*: planes that hold the strength of each thinned
element and 0 elsewhere. Which pixels are candidates does not depend on the
threshold, so a calibration can try many thresholds on one set of candidates and
a detection runs exactly the same code.
"""

from __future__ import annotations

import math
from collections.abc import Iterable, Sequence
from dataclasses import dataclass, replace
from typing import Any, Literal

import numpy as np
from numpy.typing import NDArray
from scipy import ndimage

from patchlab.errors import UsageError
from patchlab.types import F32, F64, Bank, EdgeMap

Kind = Literal["step", "line", "energy"]
Mask = NDArray[np.bool_]

DILATION_PX = 2
"""A coarser scale may only add elements farther than this from what finer ones found."""
APART = 1.0
"""The same for an octave, in widths of its kernels."""
RELATIVE_FLOOR = 0.35
"""Coarse elements below this share of the strongest response around are tails of another edge."""
WINDOW_SIGMAS = 2.5
"""Half-width of "around", in widths of the kernel."""
LINE_FLOOR = 0.6
"""A line stands at least so high against the largest line response around it: its own side
lobes reach 0.45 of its middle."""
LINE_OVER_STEP = 0.8
"""And so high against the largest step response: the lobes of a step reach 0.5 of the step, while
the flanks of a bar reach 1 / 0.8 of its middle when it is about four kernel widths wide. Where
both kinds are looked for, it is a line up to there and two steps beyond."""
SOFT = 1.2
"""An edge whose blur is more than so many widths of a kernel is left to an octave, and ..."""
SOFT_CAMERA = 2.0
"""... more than so many times the camera's own."""
SOFT_NOISE = 0.5
"""How much larger than that share a scale's own response must be, noise units: noise adds about
so much to the largest response around."""
HYSTERESIS = 0.7
"""Low threshold over high threshold."""


@dataclass(frozen=True, eq=False)
class ScaleShape:
    """What the chain needs to know about one scale of a bank.

    Parameters
    ----------
    scale : index in the bank, 0 the finest
    odd, even : kernel indices in order of orientation (empty when the bank has none)
    angles : ndarray (n,), normal directions, radians in [0, pi)
    sigma_px : width of the kernels across the edge
    reach_px : pixels beyond which the kernels hold less than a thousandth of their energy
    octave : whether it is one of the octaves added for soft and large edges
    soft_px : blur from which edges are left to such an octave
    """

    scale: int
    odd: tuple[int, ...]
    even: tuple[int, ...]
    angles: F64
    sigma_px: float
    reach_px: int
    octave: bool = False
    soft_px: float = math.inf

    @property
    def apart_px(self) -> int:
        """How far its elements must be from those of finer scales, pixels."""
        return max(DILATION_PX, round(APART * self.sigma_px)) if self.octave else DILATION_PX


@dataclass(frozen=True, eq=False)
class ScaleMap:
    """Strength of one scale: float32 (h, w), and uint8 (h, w) index of the winning direction.

    An element must have the share ``own`` of the largest strength around it, and the share
    ``other`` of the largest response of the other parity, ``rival``, where that has a say, and
    the largest strength around it must have the share ``least`` of that of an octave, ``softer``.
    """

    shape: ScaleShape
    strength: F32
    orientation: NDArray[np.uint8]
    own: float = 0.0
    rival: F32 | None = None
    other: float = 0.0
    softer: ScaleMap | None = None
    least: float = 0.0


def _sigma(bank: Bank, index: int) -> float:
    known = bank.kernels[index].parameters.get("sigma_u_px")
    if known is not None:
        return float(known)
    # the mean square radius of a Gaussian derivative's energy is twice its variance
    energy = _energy(bank, [index])
    y, x = np.mgrid[: bank.size, : bank.size] - bank.radius
    return math.sqrt(float((energy * (x * x + y * y)).sum() / energy.sum()) / 2)


def _energy(bank: Bank, members: Sequence[int]) -> F64:
    """Squared taps (h, h) of some kernels together, over all planes."""
    found = (np.asarray(bank.taps[list(members)], dtype=np.float64) ** 2).sum(axis=0)
    return np.asarray(found if bank.planes == 1 else found.sum(axis=-1))


def _reach(bank: Bank, members: Sequence[int]) -> int:
    energy = _energy(bank, members)
    c = bank.radius
    for r in range(c):
        if energy[c - r : c + r + 1, c - r : c + r + 1].sum() >= 0.999 * energy.sum():
            return r
    return c


def shapes_of(bank: Bank, kind: Kind | None = None) -> tuple[ScaleShape, ...]:
    """The scales of a bank that can find edges of a kind, finest first.

    Parameters
    ----------
    bank : Bank with kernels on an orientation lattice
    kind : step needs odd kernels, line even ones, energy both; None means ``bank.strength``

    Raises
    ------
    UsageError : the bank has no kernels of that parity, or an energy pair is incomplete.
    """
    wanted = kind or bank.strength
    found = []
    for scale in bank.scales:
        odd, even = bank.members(scale, "odd"), bank.members(scale, "even")
        if wanted == "energy" and len(odd) != len(even):
            raise UsageError(
                f"scale {scale} has {len(odd)} odd and {len(even)} even kernels",
                where=bank.name,
                remedy="energy needs a pair for each orientation",
            )
        lead = even if wanted == "line" else odd
        if not lead:
            continue
        angles = np.array(
            [
                bank.kernels[i].parameters.get("theta_rad", math.pi * j / len(lead))
                for j, i in enumerate(lead)
            ]
        )
        members = odd + even if wanted == "energy" else lead
        sigma, octaves = _sigma(bank, lead[0]), bank.scales[len(bank.scales) - bank.octaves :]
        blur = SOFT_CAMERA * float(bank.provenance.get("blur_sigma_px") or 0)
        found.append(
            ScaleShape(
                scale,
                odd,
                even,
                angles,
                sigma,
                _reach(bank, members),
                scale in octaves,
                max(SOFT * sigma, blur),
            )
        )
    if not found:
        raise UsageError(
            f"this bank has no kernels that find {wanted} edges",
            where=bank.name,
            remedy="edges need oriented kernels: choose a bank with --purpose edges",
        )
    return tuple(found)


# ---------------------------------------------------------------- strength


def _magnitudes(shape: ScaleShape, plane: Any, kind: Kind) -> Iterable[F32]:
    """Non-negative response planes in order of orientation; ``plane(i)`` is kernel i's response."""
    if kind == "energy":
        for o, e in zip(shape.odd, shape.even, strict=True):
            # rounded once, by no library's own rule, so that compiled code gives the same bits
            odd, even = (plane(i).astype(np.float64) for i in (o, e))
            yield np.sqrt(odd * odd + even * even).astype(np.float32)
    else:
        for i in shape.even if kind == "line" else shape.odd:
            yield np.abs(plane(i))


def _largest(members: Sequence[int], plane: Any) -> F32 | None:
    """Largest absolute response over some kernels; None for no kernels."""
    best: F32 | None = None
    for i in members:
        response = np.abs(plane(i))
        best = response if best is None else np.maximum(best, response, out=best)
    return best


def strongest(shape: ScaleShape, plane: Any, kind: Kind, *, no_flanks: bool = False) -> ScaleMap:
    """Largest response over the orientations of one scale; the first wins a tie.

    Parameters
    ----------
    shape : ScaleShape
    plane : callable, kernel index -> float32 (h, w) response; called once for each kernel
    kind : step (\\|odd\\|), line (\\|even\\|) or energy (root of the sum of squares)
    no_flanks : let steps stand only where no line response near is large enough to make a
        line, so that the two flanks of a line are not told as steps beside it
    """
    best: F32 | None = None
    winner: NDArray[np.uint8] = np.empty(0, np.uint8)
    for j, response in enumerate(_magnitudes(shape, plane, kind)):
        if best is None:
            best, winner = response, np.zeros(response.shape, np.uint8)
            continue
        better = response > best
        winner[better] = j
        np.maximum(best, response, out=best)
    assert best is not None  # shapes_of promises members
    own = RELATIVE_FLOOR if shape.scale > 0 else 0.0
    if kind == "line":
        return ScaleMap(shape, best, winner, LINE_FLOOR, _largest(shape.odd, plane), LINE_OVER_STEP)
    if kind == "step" and no_flanks:
        return ScaleMap(shape, best, winner, own, _largest(shape.even, plane), 1 / LINE_OVER_STEP)
    return ScaleMap(shape, best, winner, own)


def softer_of(shapes: Sequence[ScaleShape], kind: Kind) -> list[tuple[int, float] | None]:
    """For each scale the place of the octave it leaves soft edges to, and the share of that
    octave's strength that its own must have; None where there is none.

    A kernel of width s answers a step of blur b by ``s^2 / sqrt(s^2 + b^2)``, in noise units: an
    octave q times as wide sees a sharp edge q times as strong, a very soft one q^2 times. The
    share is the one at the blur ``soft_px`` of the scale.
    """
    out: list[tuple[int, float] | None] = []
    for k, shape in enumerate(shapes):
        later = [j for j in range(k + 1, len(shapes)) if shapes[j].octave]
        if kind != "step" or not later:
            out.append(None)
            continue
        own, wide = shape.sigma_px, shapes[later[0]].sigma_px
        ratio = math.hypot(wide, shape.soft_px) / math.hypot(own, shape.soft_px)
        out.append((later[0], (own / wide) ** 2 * ratio))
    return out


def scale_maps(
    shapes: Sequence[ScaleShape], plane: Any, kind: Kind, *, no_flanks: bool = False
) -> list[ScaleMap]:
    """Strength of every scale, finest first; parameters as for :func:`strongest`."""
    maps = [strongest(s, plane, kind, no_flanks=no_flanks) for s in shapes]
    return [
        m if found is None else replace(m, softer=maps[found[0]], least=found[1])
        for m, found in zip(maps, softer_of(shapes, kind), strict=True)
    ]


# ---------------------------------------------------------------- thinning


def _corners(angles: F64, width: int) -> tuple[NDArray[np.int64], F32, F32]:
    """Flat offset of the cell one pixel along each direction, and the place inside it."""
    dx, dy = np.cos(angles), np.sin(angles)
    x0, y0 = np.where(dx < 0, -1, 0), np.where(dy < 0, -1, 0)
    offset = (y0 * width + x0).astype(np.int64)
    return offset, (dx - x0).astype(np.float32), (dy - y0).astype(np.float32)


def _beside(
    flat: F32, at: NDArray[np.int64], turn: NDArray[np.uint8], angles: F64, width: int
) -> F32:
    """Bilinear samples one pixel along ``angles[turn]`` from the flat positions ``at``."""
    offset, fx, fy = _corners(angles, width)
    corner, u, v = at + offset[turn], fx[turn], fy[turn]
    one = np.float32(1)
    upper = (one - u) * flat[corner] + u * flat[corner + 1]
    lower = (one - u) * flat[corner + width] + u * flat[corner + width + 1]
    return np.asarray((one - v) * upper + v * lower)


def thin(strength: F32, orientation: NDArray[np.uint8], angles: F64, floor: float = 0.0) -> Mask:
    """Local maxima of the strength along the winning normal.

    A pixel stays when it exceeds the bilinear sample one pixel ahead along its own normal
    and is not below the one behind; so one of two equal neighbours stays. The outermost
    ring of pixels has no neighbours and never stays.

    Parameters
    ----------
    strength : float32 ndarray (h, w)
    orientation : uint8 ndarray (h, w), index into ``angles``
    angles : ndarray (n,), radians
    floor : pixels below this strength are not looked at

    Returns
    -------
    bool ndarray (h, w)
    """
    keep = np.zeros(strength.shape, bool)
    if min(strength.shape) < 3:
        return keep
    look = np.zeros(strength.shape, bool)
    look[1:-1, 1:-1] = strength[1:-1, 1:-1] >= max(floor, 1e-30)
    at = np.flatnonzero(look)
    flat, width = np.ascontiguousarray(strength).ravel(), strength.shape[1]
    turn, own = orientation.ravel()[at], flat[at]
    ahead = _beside(flat, at, turn, angles, width)
    behind = _beside(flat, at, turn, angles + np.pi, width)
    keep.ravel()[at[(own > ahead) & (own >= behind)]] = True
    return keep


def candidates(scale_map: ScaleMap, floor: float, *, margin: int | None = None) -> F32:
    """Strength of the thinned elements of one scale, 0 elsewhere.

    On every scale but the finest, elements below :data:`RELATIVE_FLOOR` of the largest
    strength within :data:`WINDOW_SIGMAS` widths are dropped: they are tails of another edge.
    Lines, and steps that must not be flanks of lines, are held against the other parity too.

    Parameters
    ----------
    scale_map : ScaleMap
    floor : elements below this strength are left out
    margin : elements nearer than this to the frame's border are left out; None means the
        kernels' reach. Inside it a mirrored border shows the same noise twice, which raises
        the false alarms of kernels along the border.

    Returns
    -------
    float32 ndarray (h, w)
    """
    shape, strength = scale_map.shape, scale_map.strength
    keep = thin(strength, scale_map.orientation, shape.angles, floor)
    edge = shape.reach_px if margin is None else margin
    if edge:
        inner = np.zeros_like(keep)
        inner[edge:-edge, edge:-edge] = True
        keep &= inner
    window = 2 * math.ceil(WINDOW_SIGMAS * shape.sigma_px) + 1
    for field, share in ((strength, scale_map.own), (scale_map.rival, scale_map.other)):
        if field is not None and share:
            around = ndimage.maximum_filter(field, size=window, mode="nearest")
            keep &= strength >= np.float32(share) * around
    soft = scale_map.softer
    if soft is not None:
        size = 2 * math.ceil(soft.shape.sigma_px) + 1
        own, theirs = (
            ndimage.maximum_filter(s, size=size, mode="nearest") for s in (strength, soft.strength)
        )
        keep &= own >= np.float32(scale_map.least) * theirs + np.float32(SOFT_NOISE)
    return np.where(keep, strength, np.float32(0))


# ---------------------------------------------------------------- hysteresis and cascade

_EIGHT = np.ones((3, 3), bool)


def hysteresis(strength: F32, low: float, high: float) -> Mask:
    """Elements at or above ``low`` that hang together (8 neighbours) with one at or above ``high``.

    Parameters
    ----------
    strength : float32 ndarray (h, w), 0 where there is no element
    low, high : thresholds, 0 < low <= high

    Raises
    ------
    UsageError : the thresholds are not in order.
    """
    if not 0 < low <= high:
        raise UsageError(f"hysteresis needs 0 < low <= high, not {low:g} and {high:g}")
    strong = strength >= high
    if low == high or not strong.any():
        return np.asarray(strong)
    label, count = ndimage.label(strength >= low, structure=_EIGHT)
    keep = np.zeros(count + 1, bool)
    keep[label[strong]] = True
    return np.asarray(keep[label])


def dilate(mask: Mask, radius: int) -> Mask:
    """Pixels whose distance to a True pixel is below ``radius + 1/2``."""
    out = mask.copy()
    h, w = mask.shape
    for dy in range(-radius, radius + 1):
        for dx in range(-radius, radius + 1):
            if 0 < dx * dx + dy * dy < (radius + 0.5) ** 2:
                to = np.s_[max(dy, 0) : h + min(dy, 0), max(dx, 0) : w + min(dx, 0)]
                at = np.s_[max(-dy, 0) : h + min(-dy, 0), max(-dx, 0) : w + min(-dx, 0)]
                out[to] |= mask[at]
    return out


def cascade(
    planes: Sequence[F32], low: float, high: float, apart: Sequence[int] | None = None
) -> tuple[Mask, NDArray[np.uint8]]:
    """Join scales, finest first: a coarser one adds only where finer ones found nothing.

    Parameters
    ----------
    planes : candidates of each scale, finest first, float32 (h, w)
    low, high : hysteresis thresholds
    apart : for each scale, how far its elements must be from those of finer ones, pixels; None
        means :data:`DILATION_PX`

    Returns
    -------
    edges : bool ndarray (h, w)
    level : uint8 ndarray (h, w), place in ``planes`` that found the element, 0 elsewhere
    """
    edges = hysteresis(planes[0], low, high)
    level = np.zeros(edges.shape, np.uint8)
    for k, plane in enumerate(planes[1:], 1):
        more = hysteresis(plane, low, high)
        if more.any():
            more &= ~dilate(edges, DILATION_PX if apart is None else apart[k])
            edges |= more
            level[more] = k
    return edges, level


def edge_map(
    bank: Bank,
    responses: F32,
    threshold: float,
    *,
    hysteresis_ratio: float = HYSTERESIS,
    kind: Kind | None = None,
    invalid: Mask | None = None,
    no_flanks: bool = False,
) -> EdgeMap:
    """The whole chain on one picture's responses.

    Parameters
    ----------
    bank : Bank
    responses : float32 ndarray (n, h, w), one plane a kernel
    threshold : high threshold, in units of the responses (noise units for a stabilised bank)
    hysteresis_ratio : low threshold over high threshold
    kind : step, line or energy; None means ``bank.strength``
    invalid : bool ndarray (h, w); elements whose kernel touches such a pixel are dropped
    no_flanks : as for :func:`strongest`

    Returns
    -------
    EdgeMap; away from elements ``strength`` is the largest over the scales.

    Raises
    ------
    UsageError : no kernels for this kind, a threshold that is not positive, planes that do
        not belong to the bank.
    """
    if responses.ndim != 3 or responses.shape[0] != len(bank):
        raise UsageError(f"responses must be ({len(bank)}, h, w), not {responses.shape}")
    if not threshold > 0:
        raise UsageError(f"the strength threshold must be positive, not {threshold:g}")
    wanted = kind or bank.strength
    low = hysteresis_ratio * threshold
    shapes = shapes_of(bank, wanted)
    maps = scale_maps(shapes, responses.__getitem__, wanted, no_flanks=no_flanks)
    planes = [candidates(m, low) for m in maps]
    if invalid is not None and invalid.any():
        for m, plane in zip(maps, planes, strict=True):
            plane[ndimage.maximum_filter(invalid, size=2 * m.shape.reach_px + 1)] = 0
    edges, level = cascade(planes, low, threshold, [s.apart_px for s in shapes])
    return _joined(maps, edges, level, threshold)


def _joined(
    maps: Sequence[ScaleMap], edges: Mask, level: NDArray[np.uint8], threshold: float
) -> EdgeMap:
    strength, orientation = maps[0].strength.copy(), maps[0].orientation.copy()
    scale = np.full(edges.shape, maps[0].shape.scale, np.uint8)
    for k, m in enumerate(maps[1:], 1):
        take = np.where(edges, level == k, m.strength > strength)
        strength[take], orientation[take] = m.strength[take], m.orientation[take]
        scale[take] = m.shape.scale
    return EdgeMap(strength, orientation, scale, edges, float(threshold))
