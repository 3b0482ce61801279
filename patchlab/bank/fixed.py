"""A bank in 16-bit fixed point, for integer pixels of 8 to 12 bits.

Working values become whole *codes* q of at most 13 bits and a sign, coefficients whole numbers
of 16 bits. Products are summed in 32 bits, exactly; a response is then rounded to 16 bits:
``r = floor((a + 2^(b-1)) / 2^b)``, halves upwards. Nothing else rounds, so every
implementation gives the same bits.

No sum overflows, whatever the input: every partial sum of a kernel is at most
``sum |coefficient| uses max|q|`` over its products, ``uses`` being how many pixels a basis value
is made of, and that is kept below 2^31 by the choice of the scale. A basis value is at most
``4 max|q| < 2^15``. The shift b is the least for which the largest response that any input
can give stays below 32767, so nothing saturates unless finer counts are asked for.

Coefficients are re-balanced: after rounding, those of a basis that sees the mean are moved by
single units, the worst-rounded first, until their sum is the rounded sum of the exact ones. A
kernel without DC then sums to exactly zero, and a flat picture gives exactly zero.

The error against the exact responses is at most the sum of

- the taps' rounding, ``e = K_q / S - K``: the larger of ``|hi sum e+ + lo sum e-|`` and
  ``|lo sum e+ + hi sum e-|``, where [lo, hi] holds all working values. It is reached by the
  picture that shows hi where e is positive and lo where it is negative (:meth:`Fixed.worst`);
- the codes' rounding: ``sum |K_q| / S`` times the largest error of a code;
- half a count for the last rounding, and four float32 roundings of the largest count for
  a reader who multiplies counts by the float32 step.
"""

from __future__ import annotations

from collections.abc import Iterable
from dataclasses import dataclass
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.bank.products import Sum, clusters, unfold, uses_of
from patchlab.conventions import UNIT_ROUNDOFF, pad
from patchlab.types import F64, Bank

I16 = NDArray[np.int16]
I64 = NDArray[np.int64]

MOST_BITS = 12
CODE_LIMIT = 8191
"""Largest code: four of them still fit 16 bits."""
LIMIT = 32767


@dataclass(frozen=True, eq=False)
class Fixed:
    """What fixed-point code needs to know.

    Parameters
    ----------
    codes : int16 (2 ** bits,), code of every pixel value
    bases, coefficients : basis and int16 coefficients of every product
    sums : every kernel as ((product, +1 or -1), ...)
    groups : products that are computed together
    taps : int64 (n, h, h), the kernels that the products make
    shift : bits that every kernel's sum is shifted by
    step : working value of one count of every kernel
    bound : largest |step * count - exact response| of every kernel
    clips : may a kernel reach the end of the range? Only when finer counts were asked for
    tap_error : float64 (n, h, h), what the taps are off by, in working units
    border : the bank's
    """

    codes: I16
    bases: tuple[str, ...]
    coefficients: tuple[I16, ...]
    sums: tuple[Sum, ...]
    groups: tuple[tuple[int, ...], ...]
    taps: I64
    shift: tuple[int, ...]
    step: tuple[float, ...]
    bound: tuple[float, ...]
    clips: tuple[bool, ...]
    tap_error: F64
    border: str

    def counts(self, pixels: NDArray[Any]) -> tuple[I16, int]:
        """The obvious evaluation: whole numbers far below 2^53, so float64 sums are exact.

        Parameters
        ----------
        pixels : ndarray (h, w), values of the bank's format

        Returns
        -------
        int16 ndarray (n, h, w), and how many of them stand at the ends of the range
        """
        size = self.taps.shape[1]
        padded = pad(self.codes[pixels].astype(np.float32), size // 2, self.border)
        h, w = pixels.shape
        out = np.empty((len(self.taps), h, w), dtype=np.int64)
        taps = self.taps.reshape(len(self.taps), -1).astype(np.float64)
        for y in range(h):
            rows = padded[y : y + size].astype(np.float64)
            seen = np.lib.stride_tricks.sliding_window_view(rows, (size, size))[0]
            out[:, y] = taps @ seen.reshape(w, -1).T
        for plane, b in zip(out, self.shift, strict=True):
            plane[:] = _rounded(plane, b)
        at_the_end = int((np.abs(out) >= LIMIT).sum())
        return np.clip(out, -LIMIT, LIMIT).astype(np.int16), at_the_end

    def worst(self, kernel: int, values: NDArray[Any], most: bool = True) -> NDArray[Any]:
        """The picture of one kernel's size on which its taps' rounding does most harm.

        Parameters
        ----------
        kernel : its index
        values : the input table, working value of every pixel value
        most : False exchanges the two extremes

        Returns
        -------
        ndarray (h, h) of pixel values
        """
        high, low = int(values.argmax()), int(values.argmin())
        return np.where((self.tap_error[kernel] > 0) == most, high, low)


def fixed_point(
    bank: Bank,
    bases: Iterable[str],
    coefficients: Iterable[NDArray[Any]],
    sums: tuple[Sum, ...],
    groups: tuple[tuple[int, ...], ...],
    *,
    finer: int = 0,
) -> Fixed | None:
    """Put a bank's products into fixed point.

    Parameters
    ----------
    bank : Bank
    bases, coefficients, sums, groups : of a plan made from it
    finer : bits of resolution beyond what keeps every possible response in range

    Returns
    -------
    Fixed, or None where the pixels have more than 12 bits or are floats
    """
    form = bank.contract.format
    if not form.integer or form.bits > MOST_BITS or bank.table.values is None:
        return None
    bases, exact = tuple(bases), [c.astype(np.float64) for c in coefficients]
    values = bank.table.values.astype(np.float64)
    codes, per_value = _codes(values)
    largest = max(int(np.abs(codes.astype(np.int64)).max()), 1)
    whole: dict[int, I64] = {}
    shift, scale = [0] * len(sums), [1.0] * len(sums)
    for members in _families(bank, sums):
        used = sorted({p for k in members for p, _ in sums[k]})
        parts = [bases[p] for p in used], [exact[p] for p in used]
        terms = [[used.index(p) for p, _ in sums[k]] for k in members]
        mine, s = _scaled(*parts, terms, largest)
        whole.update(zip(used, mine, strict=True))
        tops = [_top(_taps(bases, whole, sums[k], bank.radius), codes, bank.border)
                for k in members]  # fmt: skip
        b = next(n for n in range(32) if _rounded(max(tops), n) < LIMIT)
        for k in members:
            shift[k], scale[k] = max(b - finer, 0), s
    taps = np.stack([_taps(bases, whole, terms, bank.radius) for terms in sums])
    step = [2.0**b / (s * per_value) for b, s in zip(shift, scale, strict=True)]
    error = taps / np.array(scale)[:, None, None] - bank.taps.astype(np.float64)
    return Fixed(
        codes=codes,
        bases=bases,
        coefficients=tuple(whole[p].astype(np.int16) for p in range(len(bases))),
        sums=sums,
        groups=groups,
        taps=taps,
        shift=tuple(shift),
        step=tuple(float(np.float32(v)) for v in step),
        bound=_bounds(values, codes, per_value, taps, scale, shift, error, bank.border),
        clips=tuple(
            _rounded(_top(k, codes, bank.border), b) >= LIMIT
            for k, b in zip(taps, shift, strict=True)
        ),
        tap_error=error,
        border=bank.border,
    )


def _rounded(value: Any, bits: int) -> Any:
    """``floor((value + 2^(bits-1)) / 2^bits)``, halves upwards."""
    return (value + (1 << bits >> 1)) >> bits


def _codes(values: F64) -> tuple[I16, float]:
    """Working values as whole codes, and codes for one working unit (1 where they are whole)."""
    top = float(np.abs(values).max())
    whole = top <= CODE_LIMIT and bool((values == np.rint(values)).all())
    scale = 1.0 if whole or top == 0 else CODE_LIMIT / top
    return np.rint(values * scale).astype(np.int16), scale


def _families(bank: Bank, sums: tuple[Sum, ...]) -> list[list[int]]:
    """Kernels that need one scale: they share products, or make one strength together."""
    joined: dict[int, Sum] = {}
    for k, terms in enumerate(sums):
        scale = bank.kernels[k].scale
        # a scale is a product of its own number here, below all real ones
        joined[k] = terms if scale is None else (*terms, (-1 - scale, 1))
    return clusters(joined)


def _scaled(
    bases: list[str], exact: list[F64], kernels: list[list[int]], largest: int
) -> tuple[list[I64], float]:
    """Whole coefficients with the largest scale that fits 16 bits and cannot overflow 32."""
    uses = [uses_of(b, (c.shape[0], c.shape[1])) for b, c in zip(bases, exact, strict=True)]

    def reach(parts: list[Any]) -> float:
        weights = [float((np.abs(c) * u).sum()) for c, u in zip(parts, uses, strict=True)]
        return max((sum(weights[p] for p in k) for k in kernels), default=0.0) * largest

    peak = max((float(np.abs(c).max()) for c in exact), default=0.0)
    if peak == 0:
        return [np.zeros(c.shape, dtype=np.int64) for c in exact], 1.0
    room = 2**31 - 1 - 2**16  # for the rounding constant, at most 2^15
    scale = min((LIMIT - 8) / peak, room / reach(exact))
    while True:
        whole = [_balanced(b, c * scale, u) for b, c, u in zip(bases, exact, uses, strict=True)]
        if max(int(np.abs(c).max()) for c in whole) <= LIMIT and reach(whole) <= room:
            return whole, scale
        scale *= 0.999


def _balanced(basis: str, wanted: F64, uses: F64) -> I64:
    """Round coefficients; where they see the mean, keep the rounded sum of the exact taps."""
    whole = np.rint(wanted).astype(np.int64)
    if basis not in ("ee", "all"):
        return whole
    weight = uses.astype(np.int64)
    left = int(np.rint((wanted * uses).sum())) - int((whole * weight).sum())
    while left:
        sign = 1 if left > 0 else -1
        gain = np.where(weight <= abs(left), sign * (wanted - whole), -np.inf)
        at = np.unravel_index(int(gain.argmax()), gain.shape)
        whole[at] += sign
        left -= sign * int(weight[at])
    return whole


def _taps(bases: tuple[str, ...], whole: dict[int, I64], terms: Sum, radius: int) -> I64:
    taps = np.zeros((2 * radius + 1,) * 2)
    for p, sign in terms:
        taps += sign * unfold(whole[p].astype(np.float64), bases[p], radius)
    return np.rint(taps).astype(np.int64)


def _span(values: Any, border: str) -> tuple[Any, Any]:
    """Least and largest of the values, a border of zeros included."""
    low, high = values.min(), values.max()
    return (min(low, 0), max(high, 0)) if border == "zero" else (low, high)


def _top(taps: I64, codes: I16, border: str) -> int:
    """Largest absolute sum that any input can give."""
    low, high = (int(v) for v in _span(codes, border))
    plus, minus = int(taps[taps > 0].sum()), int(taps[taps < 0].sum())
    return max(abs(high * plus + low * minus), abs(low * plus + high * minus))


def _bounds(
    values: F64, codes: I16, per_value: float, taps: I64, scale: list[float], shift: list[int],
    error: F64, border: str,
) -> tuple[float, ...]:  # fmt: skip
    """Largest error of every kernel; see the top of this file."""
    low, high = _span(values, border)
    off = float(np.abs(codes / per_value - values).max())
    bounds = []
    for k, (s, b) in enumerate(zip(scale, shift, strict=True)):
        plus, minus = error[k][error[k] > 0].sum(), error[k][error[k] < 0].sum()
        rounding = max(abs(high * plus + low * minus), abs(low * plus + high * minus))
        count = 2.0**b / (s * per_value)
        last = (0.5 if b else 0.0) + 4 * UNIT_ROUNDOFF * LIMIT
        bounds.append(float(rounding + np.abs(taps[k]).sum() / s * off + last * count))
    return tuple(bounds)
