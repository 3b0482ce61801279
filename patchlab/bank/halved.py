"""Low-frequency kernels at half resolution: a quarter of the pixels, a quarter of the taps.

The working picture is smoothed and halved, ``s(m) = sum_a d(a) p(2m + a)`` along both axes; a small
kernel g is correlated with s; the result is interpolated, ``r(2m) = q(m)`` and
``r(2m + 1) = sum_t u(t) q(m + t)``. Smoothing and interpolating use one maximally flat half-band
filter of 2 P taps (Deslauriers & Dubuc 1989; its d is Daubechies' product filter): u its odd taps,
d half of it. The filters' coefficients are dyadic, so float32 holds them exactly.

The whole is linear. At an output of row phase a and column phase b (0 even, 1 odd) it computes a
correlation with ``K_ab = W_a g W_b'``, where ``W_a(s, j)`` sums the ways from the kernel's tap j
to the picture's offset s. Everything that is wrong with it, aliasing of the halved picture and
error of the interpolation alike, is ``E_ab = K_ab - K``. For working values in [lo, hi], the
largest error that any picture can give at that phase is

    max(|hi sum E+ + lo sum E-|, |lo sum E+ + hi sum E-|),

E+ and E- the positive and negative taps: it is reached by the picture that shows hi where E is
positive and lo where it is negative (:func:`worst`). The bound is its largest over the four
phases, plus the float32 sums: with ``n = 2 (2P + 1) + 4P + n_g`` roundings on the longest path,
``gamma_n |u|^2 |g| |d|^2 X`` with the filters' and the kernel's sums of absolute values (Higham
2002).

g is the least-squares fit over all phases, ``A g A = S' K S`` with ``A = sum W_a' W_a`` and
``S = sum W_a``, done for every parity part alone: the fit commutes with mirroring, so parts
that kernels share stay shared. The mean is kept: g sums to what K sums to.

Blocks start at whole multiples of their height and width, so a band gives the bits of the whole.
"""

from __future__ import annotations

from collections.abc import Mapping, Sequence
from dataclasses import dataclass, replace

import numpy as np

from patchlab.bank.products import (
    Product,
    Sum,
    in_groups,
    in_plane,
    parity_parts,
    share,
    unfold,
    uses_of,
)
from patchlab.conventions import gamma
from patchlab.types import F64

BLOCK = 64
"""Rows of output of a block."""
FLATNESS = (2, 3, 4, 5)
"""Half-band filters that are tried, by P."""
FORCED = 1e-2
"""Error over ``sum |k| X`` up to which a kernel goes at half resolution where that is asked for."""


@dataclass(frozen=True, eq=False)
class Halved:
    """The kernels of a bank that compiled code evaluates at half resolution.

    Parameters
    ----------
    kernels : their indices
    flatness : P of the half-band filter
    radius : of the small kernels
    taps : float64 (2 P,), the interpolator's
    products, sums : of the small kernels; one sum a kernel
    bound : largest error of every kernel
    """

    kernels: tuple[int, ...]
    flatness: int
    radius: int
    taps: F64
    products: tuple[Product, ...]
    sums: tuple[Sum, ...]
    bound: tuple[float, ...]

    def phases(self, place: int) -> F64:
        """``K_ab`` of one of the kernels, what is really computed: float64 (2, 2, n, n)."""
        return computed(small_taps(self.products, self.sums[place], self.radius), self.flatness)

    @property
    def groups(self) -> list[list[int]]:
        """Products that are computed together."""
        return in_groups({i: (p.basis, p.exact.shape) for i, p in enumerate(self.products)})

    @property
    def rows(self) -> int:
        """Rows of output of a block."""
        return BLOCK

    @property
    def reach(self) -> int:
        """Pixels that an output depends on, from its own."""
        return 2 * self.radius + 4 * self.flatness - 2


def interpolator(flatness: int) -> F64:
    """The 2 P odd taps of the half-band filter; they sum to 1.

    >>> (interpolator(2) * 16).tolist()
    [-1.0, 9.0, 9.0, -1.0]
    """
    p = flatness
    # Lagrange interpolation at the middle of 2 P points
    at = np.arange(1 - p, p + 1) - 0.5
    weights = [np.prod([-b / (a - b) for b in at if b != a]) for a in at]
    scale = 2.0 ** (4 * p)
    return np.rint(np.array(weights) * scale) / scale


def smoother(flatness: int) -> F64:
    """The 4 P - 1 taps that the picture is smoothed with before it is halved."""
    taps = np.zeros(4 * flatness - 1)
    taps[::2] = interpolator(flatness) / 2
    taps[2 * flatness - 1] = 0.5
    return taps


def ways(flatness: int, radius: int) -> F64:
    """``W_a(s, j)``: float64 (2, 2 reach + 1, 2 radius + 1)."""
    p, d = flatness, smoother(flatness)
    reach = 2 * radius + 4 * p - 2
    out = np.zeros((2, 2 * reach + 1, 2 * radius + 1))
    steps = ({0: 1.0}, dict(zip(range(1 - p, p + 1), interpolator(p), strict=True)))
    for phase, weights in enumerate(steps):
        for t, weight in weights.items():
            for j in range(-radius, radius + 1):
                first = 2 * (t + j) - (2 * p - 1) - phase + reach
                out[phase, first : first + d.size, j + radius] += weight * d
    return out


def _fitted(parts: Mapping[str, F64], through: F64, radius: int, c: int) -> dict[str, F64]:
    """Parity parts of a kernel to those of its small kernel."""
    middle = slice((through.shape[1] - 2 * c - 1) // 2, (through.shape[1] + 2 * c + 1) // 2)
    normal = sum(w.T @ w for w in through)
    back = np.linalg.solve(normal, through.sum(axis=0)[middle].T)
    back = (back + back[::-1, ::-1]) / 2  # mirrored bit for bit
    found = {}
    for basis, part in parts.items():
        taps = unfold(part, basis, c)
        small = parity_parts(back @ taps @ back.T)[basis]
        if basis == "ee":
            weight = np.abs(small) * uses_of(basis, (small.shape[0], small.shape[1]))
            missing = float(taps.sum()) - float((small * uses_of(basis, small.shape)).sum())
            small = small + missing * np.abs(small) / max(float(weight.sum()), 1e-300)
        found[basis] = small
    return found


def small_kernels(
    split: Mapping[int, Mapping[str, F64]], flatness: int, radius: int, c: int
) -> dict[int, dict[str, F64]]:
    """The small kernels' parity parts, for kernels of radius c by theirs.

    Parameters
    ----------
    split : parity parts of every kernel
    flatness : P of the half-band filter
    radius : of the small kernels
    c : of the kernels
    """
    through = ways(flatness, radius)
    return {k: _fitted(parts, through, radius, c) for k, parts in split.items()}


def small_taps(products: Sequence[Product], terms: Sum, radius: int) -> F64:
    """A small kernel, as its rounded products make it."""
    small = np.zeros((2 * radius + 1,) * 2)
    for number, sign in terms:
        p = products[number]
        small += sign * unfold(p.rounded.astype(np.float64), p.basis, radius)
    return small


def computed(small: F64, flatness: int) -> F64:
    """``K_ab`` of a small kernel: float64 (2, 2, n, n), n = 2 reach + 1."""
    through = ways(flatness, small.shape[0] // 2)
    return np.stack([[a @ small @ b.T for b in through] for a in through])


def off_by(phases: F64, kernel: F64) -> F64:
    """``E_ab``: what the four phases compute less the kernel, which reaches no further."""
    return np.asarray(phases - np.pad(kernel, (phases.shape[-1] - kernel.shape[0]) // 2))


def extent(values: F64, border: str) -> tuple[float, float]:
    """Least and largest working value, a border of zeros included."""
    low, high = float(values.min()), float(values.max())
    return (min(low, 0.0), max(high, 0.0)) if border == "zero" else (low, high)


def approximation(error: F64, low: float, high: float) -> float:
    """The largest error that any picture with values in [low, high] can give; see the top."""
    plus = np.where(error > 0, error, 0).sum(axis=(-2, -1))
    minus = np.where(error < 0, error, 0).sum(axis=(-2, -1))
    one, two = np.abs(high * plus + low * minus), np.abs(low * plus + high * minus)
    return float(np.maximum(one, two).max())


def worst(error: F64, low: float, high: float, most: bool = True) -> F64:
    """The picture, of the size of E, on which one phase errs most; False exchanges the extremes."""
    return np.where((error > 0) == most, high, low)


def rounding(products: list[Product], sums: Sum, flatness: int) -> float:
    """Share of X by which float32 sums can err."""
    up = float(np.abs(interpolator(flatness)).sum())
    down = float(np.abs(smoother(flatness)).sum())
    total = 0.0
    for number, _ in sums:
        p = products[number]
        uses = uses_of(p.basis, (p.exact.shape[0], p.exact.shape[1]))
        n = 8 * flatness + 2 + p.exact.size + 2 + len(sums) - 1
        total += gamma(n) * float((np.abs(p.rounded) * uses).sum())
    return total * up**2 * down**2


# ---------------------------------------------------------------- choosing


def settings(c: int) -> list[tuple[int, int]]:
    """(P, radius) that are tried for kernels of radius c.

    Outputs depend on no more than the kernels' radius twice over, so that every border's rule
    reaches as far in every picture that is large enough for the kernels.
    """
    found = []
    for p in FLATNESS:
        for radius in sorted({max(c // 2 - 1, 1), (c + 1) // 2, (c + 1) // 2 + 1}):
            if c <= 2 * radius + 4 * p - 2 <= 2 * c:
                found.append((p, radius))
    return found


def halve(
    split: Mapping[int, Mapping[str, F64]],
    allowed: Mapping[int, float],
    span: tuple[float, float],
    c: int,
    *,
    closest: bool = False,
) -> Halved | None:
    """The kernels whose proven error at half resolution is allowed.

    Parameters
    ----------
    split : parity parts of the kernels that may go
    allowed : largest error of each, working values
    span : least and largest working value, a border of zeros included
    c : radius of the kernels
    closest : of filters that equally many kernels fit, the most exact and not the shortest

    Returns
    -------
    Halved or None : with the filter that most kernels fit
    """
    best: Halved | None = None
    rank: tuple[float, float] = (0.0, 0.0)
    for p, radius in settings(c):
        found = _halved(split, allowed, span, c, p, radius)
        if found is not None:
            mine = float(len(found.kernels)), -max(found.bound) if closest else 0.0
            if best is None or mine > rank:
                best, rank = found, mine
    return best


def _halved(
    split: Mapping[int, Mapping[str, F64]],
    allowed: Mapping[int, float],
    span: tuple[float, float],
    c: int,
    flatness: int,
    radius: int,
) -> Halved | None:
    small_ones = small_kernels(split, flatness, radius, c)
    products, sums = share({k: in_plane(parts) for k, parts in small_ones.items()})
    kept, bounds = [], []
    for k, parts in split.items():
        kernel = np.zeros((2 * c + 1,) * 2)
        for basis, part in parts.items():
            kernel += unfold(part, basis, c)
        done = computed(small_taps(products, sums[k], radius), flatness)
        bound = approximation(off_by(done, kernel), *span)
        bound += rounding(products, sums[k], flatness) * max(abs(span[0]), abs(span[1]))
        if bound <= allowed[k]:
            kept.append(k)
            bounds.append(bound)
    if not kept:
        return None
    every = Halved(
        kernels=tuple(kept),
        flatness=flatness,
        radius=radius,
        taps=interpolator(flatness),
        products=tuple(products),
        sums=tuple(sums[k] for k in kept),
        bound=tuple(bounds),
    )
    return only(every, kept)


def only(halved: Halved, kernels: list[int]) -> Halved | None:
    """Some of the kernels; None for none."""
    kept = [i for i, k in enumerate(halved.kernels) if k in kernels]
    if not kept:
        return None
    used = sorted({number for i in kept for number, _ in halved.sums[i]})
    place = {number: i for i, number in enumerate(used)}
    return replace(
        halved,
        kernels=tuple(halved.kernels[i] for i in kept),
        products=tuple(halved.products[n] for n in used),
        sums=tuple(tuple((place[n], s) for n, s in halved.sums[i]) for i in kept),
        bound=tuple(halved.bound[i] for i in kept),
    )
