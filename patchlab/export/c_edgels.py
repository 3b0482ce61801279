"""The edgels of a bank's C source: elements found by the calibrated chain, placed by least squares.

The chain and the fit are those of :mod:`patchlab.edges`; every number of theirs comes in as
:class:`~patchlab.export.c_edge_model.EdgelRules`. Elements are found on the compiled float32
responses with comparisons and roundings that no compiler may change, so the set is the one
that Python finds on the same responses; places are computed in float64.
"""

from __future__ import annotations

import math
from collections.abc import Sequence

import numpy as np

from patchlab.export import c_edge_model
from patchlab.export.c_edge_model import EdgelRules, EdgelScale, inside, put
from patchlab.export.c_text import double_literal, float_literal, lines, numbers, template
from patchlab.types import F64, Bank, Plan

BAND = 48
"""Rows of responses that are held at once."""
TOKENS = ("EDGELS_HEADER", "EDGELS_DATA", "EDGELS_VECTOR", "EDGELS")


def sections(bank: Bank, plan: Plan, rules: EdgelRules | None) -> dict[str, str]:
    """The texts for the templates; all empty for a bank without edgels."""
    if rules is None:
        return dict.fromkeys(TOKENS, "")
    kinds = 2 if rules.lines else 1
    planes, maps = _maps(rules)
    tiles = plan.detail.get("fft")
    radii = [radius for pair in _pairs(rules) for radius in pair]
    far = math.ceil(max(s.slack for s in (*rules.own, *rules.lines)))
    parts = {
        "PER_PIXEL": f"{len(planes) * 5 + kinds + 5} bytes",
        "OWN_WORDS": _own_words(bank),
        "LINE_WORDS": _line_words(bank, kinds),
        "RATIO": double_literal(rules.hysteresis),
        "LINE_RATIO": double_literal(rules.line_hysteresis),
        **c_edge_model.tail(),
        **c_edge_model.curve(rules),
        **c_edge_model.to_light(bank, rules),
        "WINDOW": max(map(c_edge_model.padded_count, radii)),
        "ABOVE": far + 1,
        "BELOW": far + 2,
        "DISKS": c_edge_model.disk_texts(radii),
        "LARGEST_STEP": inside(np.where(np.isfinite(rules.largest_step), rules.largest_step, 0)),
        "PRIOR": inside(rules.prior),
        "CURVE_TABLES": c_edge_model.curve_tables(bank, rules),
        "CORRELATION": c_edge_model.correlation(rules),
        "ITERATIONS": rules.iterations,
        "ASKS": double_literal(rules.asks),
        "SETTLED": double_literal(rules.settled),
        "DAMPING": double_literal(rules.damping),
        "KEPT": double_literal(rules.kept),
        "CAREFUL": double_literal(rules.careful),
        "RUNAWAY": double_literal(rules.runaway_px),
        "LEVEL_ROUNDING": double_literal(rules.level_rounding),
        "SOFT_NOISE": float_literal(rules.soft_noise),
        "BAND": tiles.rows * -(-BAND // tiles.rows) if tiles else BAND,
        "KINDS": kinds,
        "PLANES": len(planes),
        "MAPS": _map_text(rules, planes, maps),
        "BLUR_KNOWN": int(rules.blur_px is not None),
        "BLUR_SQUARED": double_literal((rules.blur_px or 0.0) ** 2),
        "WEIGHT": double_literal(1.0 / (rules.noise_sd or 1.0)),
        "LEASH": double_literal(rules.leash_px),
        "MISFIT": double_literal(rules.misfit),
        "SCATTER": "f->misfit > 1.0 ? f->misfit : 1.0" if rules.noise_sd else "f->misfit",
        "ORDER": _ORDER if kinds == 2 else "",
        "SORT": "    if (s->lines_too) @N@_sort(out, done);\n" if kinds == 2 else "",
    }
    return {
        "EDGELS_HEADER": put(template("edgels.h.in"), parts),
        "EDGELS_DATA": put(template("edgels_data.c.in"), parts),
        "EDGELS_VECTOR": put(template("edgels_vector.c.in"), parts),
        "EDGELS": put(template("edgels.c.in"), parts),
    }


def _own_words(bank: Bank) -> str:
    if bank.thresholds is None:
        return "this bank's noise is not known, so nothing is\n *                    promised."
    return "one of\n *                    @N@_STRENGTH_THRESHOLDS, or any other."


def _line_words(bank: Bank, kinds: int) -> str:
    if kinds == 1:
        return "0, as this bank looks for one kind of edges only"
    table = "one of @N@_LINE_STRENGTH_THRESHOLDS" if bank.line_thresholds else "the same"
    return (
        f"{table} for lines; 0 looks for none. Where\n"
        " *                    it is not, threshold may be 0 to look for lines alone."
    )


# ---------------------------------------------------------------- planes and maps

Plane = tuple[tuple[int, ...], tuple[int, ...]]
"""Odd and even kernels whose largest response is held."""


def _maps(rules: EdgelRules) -> tuple[list[Plane], list[tuple[EdgelScale, int, int]]]:
    """The planes that are needed, and each scale with its plane and its rival's (or -1)."""
    planes: list[Plane] = []

    def place(plane: Plane) -> int:
        if plane not in planes:
            planes.append(plane)
        return planes.index(plane)

    maps = []
    for s in (*rules.own, *rules.lines):
        own = place((s.odd, s.even))
        rival: Plane = ((), s.rival) if s.odd else (s.rival, ())
        maps.append((s, own, place(rival) if s.rival else -1))
    return planes, maps


def _ints(name: str, values: Sequence[int]) -> str:
    return f"static const int @N@_{name}[{len(values)}] = {{{', '.join(map(str, values))}}};"


def _doubles(name: str, values: F64) -> str:
    return f"static const double @N@_{name}[{len(values)}] = {{\n{numbers(values)}\n}};"


def _steps(name: str, angles: F64) -> list[str]:
    """One pixel along each direction, as :func:`patchlab.edges.thin.thin` takes it."""
    dx, dy = np.cos(angles), np.sin(angles)
    x0, y0 = np.where(dx < 0, -1, 0), np.where(dy < 0, -1, 0)
    u, v = (dx - x0).astype(np.float32), (dy - y0).astype(np.float32)
    one = np.float32(1)
    rows = [
        f"    {{{x}, {y}, {', '.join(float_literal(f) for f in (p, q, one - p, one - q))}}},"
        for x, y, p, q in zip(x0, y0, u, v, strict=True)
    ]
    rows[-1] = rows[-1].removesuffix(",")
    return [f"static const struct @N@_along @N@_{name}[{len(rows)}] = {{", *rows, "};"]


def _structs(kind: str, name: str, entries: list[str]) -> list[str]:
    head = f"static const struct @N@_{kind} @N@_{name}[{len(entries)}] = {{"
    return [head, ",\n".join(entries), "};"]


def _pairs(rules: EdgelRules) -> list[tuple[float, float]]:
    """Radii of a wide and a narrow disk, each pair once."""
    return list(dict.fromkeys(s.radii for s in (*rules.own, *rules.lines)))


def _apart(rules: EdgelRules, s: EdgelScale, k: int) -> str:
    """What sets a scale apart from finer and softer ones, and how its elements are placed."""
    place, around, least = s.softer or (-1, 0, 0.0)
    softer = place if place < 0 else place + (0 if k < len(rules.own) else len(rules.own))
    blur = s.blur_px or rules.blur_px or rules.start_blur_px
    blurs = [v for b in (blur, max(blur, 1.0)) for v in (b, math.log(b))]
    disk = 2 * _pairs(rules).index(s.radii)
    return (
        f"{s.apart_px}, {softer}, {around}, {float_literal(least)}, {disk}, "
        f"{int(s.blur_px is not None)},\n     {inside([s.slack, *blurs])}"
    )


def _map_text(
    rules: EdgelRules, planes: list[Plane], maps: list[tuple[EdgelScale, int, int]]
) -> str:
    text, entries = [], []
    for k, (odd, even) in enumerate(planes):
        text += [_ints(f"odd{k}", odd)] if odd else []
        text += [_ints(f"even{k}", even)] if even else []
        sides = [f"@N@_{word}{k}" if kernels else "NULL"
                 for word, kernels in (("even", even), ("odd", odd))]  # fmt: skip
        entries.append(f"    {{{len(odd or even)}, {', '.join(sides)}}}")
    text += [
        f"static const struct @N@_plane @N@_planes[{len(planes)}] = {{",
        ",\n".join(entries),
        "};",
    ]
    entries = []
    for k, (s, plane, rival) in enumerate(maps):
        text += _steps(f"ahead{k}", s.angles) + _steps(f"behind{k}", s.angles + np.pi)
        arrays = {"angle": s.angles, "cosine": np.cos(s.angles), "sine": np.sin(s.angles),
                  "slope_odd": s.slope_odd, "slope_even": s.slope_even}  # fmt: skip
        text += [_doubles(f"{word}{k}", v) for word, v in arrays.items() if len(v)]
        names = ", ".join(f"@N@_{w}{k}" if len(v) else "NULL" for w, v in arrays.items())
        entries.append(
            f"    {{{s.scale}, {plane}, {rival}, {int(s.rival_of_lines)}, {s.reach_px}, "
            f"{s.around_px}, {float_literal(s.own)}, {float_literal(s.other)},\n"
            f"     @N@_ahead{k}, @N@_behind{k}, {_apart(rules, s, k)},\n     {names}}}"
        )
    text += _structs("map", "maps", entries)
    first = [0, len(rules.own), len(maps)] if rules.lines else [0, len(maps)]
    return lines([*text, _ints("first_map", first), ""])


_ORDER = """\
/* The row that an element lies in; halves go to the even one. */
static int @N@_row_of(const struct @N@_edgel *e)
{
    const double y = (double)e->y;
    const int k = (int)(y + 8.0) - 8;
    const double part = y - k;
    return part > 0.5 || (part == 0.5 && k % 2 != 0) ? k + 1 : k;
}

static int @N@_later(const struct @N@_edgel *a, const struct @N@_edgel *b)
{
    const int i = @N@_row_of(a), j = @N@_row_of(b);
    if (i != j) return i > j;
    if (a->x != b->x) return a->x > b->x;
    return a->kind != @N@_STEP && b->kind == @N@_STEP;
}

/* By rows, then from left to right: they are nearly in order already. */
static void @N@_sort(struct @N@_edgel *out, size_t count)
{
    size_t i, j;
    for (i = 1; i < count; ++i) {
        const struct @N@_edgel e = out[i];
        for (j = i; j > 0 && @N@_later(&out[j - 1], &e); --j) out[j] = out[j - 1];
        out[j] = e;
    }
}

"""
