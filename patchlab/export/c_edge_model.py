"""The rules of edgels, and their edge model in C: its tables, and the curve from light to values.

A stage does not import another, so the rules of :mod:`patchlab.edges` come in as plain numbers.
"""

from __future__ import annotations

import math
from collections.abc import Iterable
from dataclasses import dataclass
from typing import Any

import numpy as np
from numpy.polynomial import chebyshev
from numpy.typing import NDArray
from scipy.special import erfcx

from patchlab.export.c_text import double_literal, lines, numbers
from patchlab.types import F64, Bank


@dataclass(frozen=True, eq=False)
class EdgelScale:
    """One scale of one kind of edges.

    Parameters
    ----------
    scale : index in the bank
    odd, even : kernels whose largest response is the strength; both for energy
    angles : normal directions, radians
    reach_px : pixels at the border left out
    around_px : half side of the square that ``own`` and ``other`` look at
    own, other : share of the largest strength around, and of the rival's, that an element needs
    rival : kernels of the other parity; empty where they have no say
    rival_of_lines : the rival has a say only where lines are looked for beside steps
    slope_odd, slope_even : root mean square slope of each kernel's noise along its normal
    apart_px : how far its elements must be from those of finer scales
    radii : of the two disks that an edge is fitted in, pixels
    blur_px : where the fit's blur starts; None means the camera's
    slack : spacing of the parabola's samples, and how many pixels more the edge may be off
    softer : place of the scale among those of its kind that soft edges are left to, half side
        of the square that is looked at, and the share of its strength that this one's must
        have; None where there is none
    """

    scale: int
    odd: tuple[int, ...]
    even: tuple[int, ...]
    angles: F64
    reach_px: int
    around_px: int
    own: float
    other: float
    rival: tuple[int, ...]
    rival_of_lines: bool
    slope_odd: F64
    slope_even: F64
    apart_px: int
    radii: tuple[float, float]
    blur_px: float | None
    slack: float
    softer: tuple[int, int, float] | None


@dataclass(frozen=True, eq=False)
class EdgelRules:
    """How a bank's responses become edgels.

    Parameters
    ----------
    own, lines : scales of the bank's own kind, and of lines beside steps, finest first
    hysteresis, line_hysteresis : low threshold over high threshold
    light, value, clipped : the curve from light to working values, piecewise linear
    noise_sd : of the working values; None when not known
    autocovariance : of the noise; None when white
    blur_px : of the camera; None when not known
    start_blur_px : where to start then
    misfit : above it the narrow disk is tried
    leash_px, runaway_px : a fit that moves farther is not trusted, or given up
    soft_noise : what a scale's strength must have beside the share of an octave's
    iterations, settled, damping, kept, careful, level_rounding, asks, largest_step, prior : of
        the least squares
    """

    own: tuple[EdgelScale, ...]
    lines: tuple[EdgelScale, ...]
    hysteresis: float
    line_hysteresis: float
    light: F64
    value: F64
    clipped: bool
    noise_sd: float | None
    autocovariance: F64 | None
    blur_px: float | None
    start_blur_px: float
    misfit: float
    leash_px: float
    runaway_px: float
    soft_noise: float
    iterations: int
    settled: float
    damping: float
    kept: float
    careful: float
    level_rounding: float
    asks: float
    largest_step: F64
    prior: F64


def put(text: str, parts: dict[str, Any]) -> str:
    """Fill in this module's tokens and leave all others."""
    for token, value in parts.items():
        text = text.replace(f"@{token}@", str(value))
    return text


def inside(values: Any) -> str:
    """Float64 numbers on one line, as they stand inside an initialiser."""
    return ", ".join(double_literal(v) for v in np.asarray(values, np.float64))


def tail() -> dict[str, str]:
    """The normal distribution's upper tail over its density, as a polynomial.

    ``t = start - span / (a + 4)`` runs from -1 to 1 for a from 0 to 8.5; the error of the tail
    is below 4e-15, most of it from the density.
    """
    middle, half = (-1 + 4.5 / 12.5) / 2, (1 + 4.5 / 12.5) / 2
    t = np.cos((np.arange(400) + 0.5) * np.pi / 400)
    s = middle + half * t
    mills = math.sqrt(math.pi / 2) * erfcx(4 * (1 + s) / (1 - s) / math.sqrt(2))
    *lower, text = (double_literal(v) for v in _polynomial(t, mills))
    for k, coefficient in enumerate(reversed(lower)):
        text = f"({coefficient} + t * {text})" + ("\n" + 12 * " ") * (k % 3 == 2)
    return {
        "TAIL": text.rstrip(),
        "TAIL_START": double_literal((1 - middle) / half),
        "TAIL_SPAN": double_literal(8 / half),
    }


def _polynomial(t: F64, value: F64) -> list[float]:
    """Coefficients, by rising power, of a near-minimax polynomial on [-1, 1]."""
    fitted = chebyshev.cheb2poly(chebyshev.chebfit(t, value, 16))
    return [float(c) for c in fitted]


def disk(radius: float) -> tuple[NDArray[np.int64], NDArray[np.int64]]:
    """Columns and rows of the pixels at most ``radius`` from the middle, in row order."""
    r = math.floor(radius)
    y, x = np.mgrid[-r : r + 1, -r : r + 1]
    keep = x * x + y * y <= radius * radius
    return x[keep], y[keep]


def disk_texts(radii: Iterable[float]) -> str:
    """The disks as C arrays, their offsets padded with zeros to whole eights."""
    text, entries = [], []
    for k, radius in enumerate(radii):
        x, y = disk(radius)
        padded = padded_count(radius)
        for word, v in (("x", x), ("y", y)):
            values = np.pad(v, (0, padded - len(v))).astype(np.float64)
            text += [
                f"static const double @N@_disk_{word}{k}[{padded}] = {{",
                numbers(values),
                "};",
            ]
        entries.append(f"    {{{len(x)}, {padded}, @N@_disk_x{k}, @N@_disk_y{k}}}")
    text += [f"static const struct @N@_disk @N@_disks[{len(entries)}] = {{", ",\n".join(entries)]
    return lines([*text, "};", ""])


def padded_count(radius: float) -> int:
    """Pixels of a disk, in whole eights."""
    return -(-len(disk(radius)[0]) // 8) * 8


def _table_first(bank: Bank, rules: EdgelRules) -> int | None:
    """The code at which the curve's values begin in the input table; None when they do not."""
    table = bank.table.values
    if table is None:
        return None
    first = math.ceil(bank.contract.black) if bank.contract.transfer == "srgb" else 0
    part = table[first : first + rules.value.size]
    return first if np.array_equal(part, rules.value) else None


def curve_tables(bank: Bank, rules: EdgelRules) -> str:
    """Light and value of the curve's knots; the input table serves where it holds them."""
    text, light, value = "", rules.light, rules.value
    if _pitch(light):
        begin, pitch = double_literal(light[0]), double_literal(_pitch(light))
        names = {"LIGHT": f"({begin} + {pitch} * (double)(i))"}
    else:
        text += _array("light", light)
        names = {"LIGHT": "@N@_light[i]"}
    first = _table_first(bank, rules)
    if first is None:
        text += _array("curve", value)
        names["KNOT"] = "@N@_curve[i]"
    elif np.array_equal(value, first + np.arange(value.size)):
        names["KNOT"] = f"((double)(i) + {double_literal(first)})"
    else:
        names["KNOT"] = f"((double)@N@_table[(i) + {first}])"
    rising = np.maximum.accumulate(value)
    if bank.table.values is None and np.array_equal(rising, value):
        names["RISING"] = "@N@_KNOT(i)"
    elif bank.table.values is None:
        text += _array("rising", rising)
        names["RISING"] = "@N@_rising[i]"
    return text + lines([f"#define @N@_{word}(i) {what}" for word, what in names.items()] + [""])


def _array(name: str, values: F64) -> str:
    return f"static const double @N@_{name}[{values.size}] = {{\n{numbers(values)}\n}};\n"


def _pitch(light: F64) -> float:
    """Distance of the knots when they are evenly spread, else 0."""
    steps = np.diff(light)
    return float(steps[0]) if np.ptp(steps) <= 1e-9 * steps[0] else 0.0


def curve(rules: EdgelRules) -> dict[str, str]:
    """Pieces of the C function that runs light through the curve."""
    last, pitch = rules.light.size - 2, _pitch(rules.light)
    body = ["for (i = 0; i < n; ++i) light[i] = q[2] + step * shape[i];"]
    inside = "light[i]"
    if rules.clipped:
        body += [
            f"for (i = 0; i < n; ++i) a[i] = {_least('light[i]', '@N@_LIGHT(0)', '>')};",
        ]
        inside = _least("a[i]", f"@N@_LIGHT({last + 1})", "<")
    body += [f"for (i = 0; i < n; ++i) inside[i] = {inside};"]
    body += _even(last, pitch) if pitch else _uneven(last)
    rise = "@N@_KNOT(at[i] + 1) - from[i]"
    if pitch != 1:
        rise = f"({rise}) / (@N@_LIGHT(at[i] + 1) - @N@_LIGHT(at[i]))"
    body += [
        "for (i = 0; i < n; ++i) {",
        "    from[i] = @N@_KNOT(at[i]);",
        f"    rises[i] = {rise};",
        "}",
    ]
    gain = "rises[i] * (double)(inside[i] == light[i])" if rules.clipped else "rises[i]"
    body += [f"for (i = 0; i < n; ++i) gains[i] = {gain};", ""]
    return {"CURVE": lines(body, 4), "PLACE": "@N@_LIGHT(at[i])"}


def _least(value: str, end: str, order: str) -> str:
    return f"{value} {order} {end} ? {value} : {end}"


def _even(last: int, pitch: float) -> list[str]:
    """The knot to the left, where knots are evenly spread."""
    scaled = "inside[i] - @N@_LIGHT(0)"
    scaled = scaled if pitch == 1 else f"({scaled}) / {double_literal(pitch)}"
    return [
        f"for (i = 0; i < n; ++i) a[i] = {scaled};",
        f"for (i = 0; i < n; ++i) a[i] = {_least('a[i]', '0.0', '>')};",
        f"for (i = 0; i < n; ++i) a[i] = {_least('a[i]', f'{last}.0', '<')};",
        "for (i = 0; i < n; ++i) at[i] = (int)a[i];",
    ]


def _uneven(last: int) -> list[str]:
    """The same for others, by halving."""
    return [
        "for (i = 0; i < n; ++i) {",
        f"    int k = 0, end = {last + 1};",
        "    while (end - k > 1) {",
        "        const int middle = k + (end - k) / 2;",
        "        if (@N@_LIGHT(middle) <= inside[i]) k = middle;",
        "        else end = middle;",
        "    }",
        "    at[i] = k;",
        "}",
    ]


_SEARCH = """\
/* Light of a working value; the nearest end beyond the table. */
static double @N@_to_light(double value)
{
    int low = 0, high = @LAST@;
    if (!(value >= @N@_RISING(0))) return @N@_LIGHT(0);
    if (value >= @N@_RISING(high)) return @N@_LIGHT(high);
    while (high - low > 1) {
        const int middle = low + (high - low) / 2;
        if (@N@_RISING(middle) <= value) low = middle;
        else high = middle;
    }
    return (@N@_LIGHT(low + 1) - @N@_LIGHT(low)) / (@N@_RISING(low + 1) - @N@_RISING(low))
        * (value - @N@_RISING(low)) + @N@_LIGHT(low);
}
"""


def to_light(bank: Bank, rules: EdgelRules) -> dict[str, str]:
    """C function from a pixel, or from its working value, to the light that it stands for."""
    if bank.table.values is None:
        text = _SEARCH.replace("@LAST@", str(rules.light.size - 1))
        return {"TO_LIGHT": text, "LIGHT_OF": "work->data[i]"}
    light = np.interp(bank.table.values, np.maximum.accumulate(rules.value), rules.light)
    head = "/* Light that a pixel stands for. */\n"
    if np.array_equal(light, np.arange(light.size)):
        body = "static double @N@_to_light(@N@_pixel p) { return (double)p; }\n"
    else:
        body = _array("light_of", light)
        body += "\nstatic double @N@_to_light(@N@_pixel p) { return @N@_light_of[p]; }\n"
    return {"TO_LIGHT": head + body, "LIGHT_OF": "pixel"}


_WHITE = """\
/* Variance of the position for white noise; x is its row of the inverse normal matrix. */
static double @N@_variance(const struct @N@_problem *p, const struct @N@_slopes *s,
    const double *x)
{
    (void)p;
    (void)s;
    return x[0] > 0.0 ? x[0] : 0.0;
}
"""
_COLOURED = """\
/* Autocovariance of the noise. */
static const double @N@_noise[@SIDE@][@SIDE@] = {
@NOISE@
};

/* Variance of the position under noise that is not white; x is its row of the inverse normal
 * matrix. */
static double @N@_variance(const struct @N@_problem *p, const struct @N@_slopes *s,
    const double *x)
{
    double *const pull = p->work->a;
    double sum = 0.0;
    const int n = p->disk->count;
    int i, j;
    for (i = 0; i < n; ++i) {
        pull[i] = x[0] * s->by[0][i] + x[1] * s->by[1][i] + x[2] * s->by[2][i]
            + x[3] * s->by[3][i] + x[4] * s->by[4][i] + x[5] * s->by[5][i];
    }
    for (i = 0; i < n; ++i) {
        double row = 0.0;
        for (j = 0; j < n; ++j) {
            const int dx = (int)(p->disk->x[i] - p->disk->x[j]);
            const int dy = (int)(p->disk->y[i] - p->disk->y[j]);
            if (dx >= -@LAGS@ && dx <= @LAGS@ && dy >= -@LAGS@ && dy <= @LAGS@)
                row += @N@_noise[dy + @LAGS@][dx + @LAGS@] * pull[j];
        }
        sum += pull[i] * row;
    }
    return sum > 0.0 ? sum : 0.0;
}
"""


def correlation(rules: EdgelRules) -> str:
    """C function for the variance of a fitted position, under the noise's autocovariance."""
    noise = rules.autocovariance
    if noise is None:
        return _WHITE
    side = noise.shape[0]
    rows = ",\n".join(f"    {{{inside(row)}}}" for row in noise)
    return put(_COLOURED, {"SIDE": side, "LAGS": side // 2, "NOISE": rows})
