"""The parts of a bank's C source that know of colours: how a pixel becomes working values.

A row of the ring holds one row of every working plane. Each product of the plan reads one plane,
so the rest of the code is that of one plane.
"""

from __future__ import annotations

from patchlab.export.c_text import float_literal, lines, template
from patchlab.types import Bank

_WORDS = {
    "one plane": """\
 *   Every pixel goes through the bank's input table (@PIXELS@ codes to working
 *   values), then every kernel is correlated with the working values, without
 *   flipping: r(y, x) = sum k(j, i) p(y + j - @RADIUS@, x + i - @RADIUS@).""",
    "interleaved": """\
 *   Every sample of a pixel goes through the bank's input table (@PIXELS@ codes, samples
 *   side by side), the working planes are weighted sums of a pixel's samples, and every
 *   kernel is correlated with them, without flipping:
 *   r(y, x) = sum k(j, i, m) p_m(y + j - @RADIUS@, x + i - @RADIUS@).""",
    "cells": """\
 *   The picture is a mosaic (@PIXELS@ codes); a pixel of the bank is a cell of 2 x 2 samples.
 *   Every sample goes through the bank's input table and its place in the cell is a plane
 *   of its own; every kernel is correlated with the planes, without flipping:
 *   r(y, x) = sum k(j, i, m) p_m(y + j - @RADIUS@, x + i - @RADIUS@), y and x in cells.""",
}
_IMAGE = {
    "one plane": " *   image            first pixel of the first row",
    "interleaved": " *   image            first sample of the first pixel of the first row",
    "cells": """\
 *   image            first sample of the mosaic's first row; width and height count cells,
 *                    row_bytes leads from one row of samples to the next""",
}
_ONE_RING_ROW = """\
                rows[j] = ring + (size_t)((y + j) % @N@_SIZE) * width;"""
_RING_ROW = """\
                const size_t place = (size_t)((y + j) % @N@_SIZE) * @N@_PLANES;
                size_t m;
                for (m = 0; m < @N@_PLANES; ++m) {
                    rows[m * @N@_SIZE + (size_t)j] = ring + (place + m) * width;
                }"""
_ONE_NEXT_ROW = """\
            bad |= @N@_fill(p, first + y + @N@_RADIUS, from, part, ring + (size_t)last * width);"""
_NEXT_ROW = """\
            bad |= @N@_fill(p, first + y + @N@_RADIUS, from, part,
                ring + (size_t)last * @N@_PLANES * width, width);"""


def sections(bank: Bank) -> dict[str, object]:
    """What the templates of source and header say of pixels and their planes."""
    form = bank.contract.format
    kind = "one plane" if form.planes == 1 else "interleaved" if form.cell == 1 else "cells"
    about: dict[str, object] = {
        "INPUT_WORDS": _WORDS[kind],
        "IMAGE_WORDS": _IMAGE[kind],
        **steps(bank),
    }
    if form.planes == 1:
        return about | {
            "FILL": template("fill.c.in"),
            "PLANES_DEFINE": "",
            "TIMES": "",
            "PLANE": "",
            "NEXT_ROW": _ONE_NEXT_ROW,
            "RING_ROW": _ONE_RING_ROW,
        }
    fill = template("fill_colour.c.in")
    return about | {
        "FILL": fill.replace("@SAMPLES@", _samples(bank)).replace("@MIX@", _mix(bank)),
        "PLANES_DEFINE": f"#define @N@_PLANES {bank.planes} /* working planes */\n",
        "TIMES": " * @N@_PLANES",
        "PLANE": ", width",
        "NEXT_ROW": _NEXT_ROW,
        "RING_ROW": _RING_ROW,
    }


def steps(bank: Bank) -> dict[str, object]:
    """Factors from pixels to samples along a row and down the rows, as C text."""
    form = bank.contract.format
    across = f"{form.row_samples} * " if form.row_samples > 1 else ""
    tiled = "c->pixels[y * w + x % w]"
    if across:
        tiled = f"c->pixels[{across}y * w + x % ({across}w)]"
    return {"ACROSS": across, "DOWN": f"{form.cell} * " if form.cell > 1 else "", "TILED": tiled}


def _samples(bank: Bank) -> str:
    """Statements that take a pixel's samples through the table."""
    form = bank.contract.format
    rows = []
    for r in range(form.cell):
        line = f"((ptrdiff_t)y * {form.cell} + {r})" if form.cell > 1 else "(ptrdiff_t)y"
        rows += [
            f"const @N@_pixel *const row{r} = (const @N@_pixel *)(const void *)",
            f"    (p->pixels + {line} * p->row_bytes) + (ptrdiff_t)i * {form.row_samples};",
        ]
    for c in range(form.planes):
        r, place = divmod(c, form.row_samples)
        rows.append(f"const float s{c} = @N@_value(row{r}[{place}], bad);")
    return lines(rows, 4)


def _mix(bank: Bank) -> str:
    """Statements that write the working values of a pixel."""
    terms = [f"s{c}" for c in range(bank.contract.format.planes)]
    sums = terms
    if bank.mix is not None:
        weighted = ([f"{float_literal(w)} * {s}" for w, s in zip(row, terms, strict=True)]
                    for row in bank.mix)  # fmt: skip
        sums = [" + ".join(row) for row in weighted]
    return lines([f"to[{m} * plane] = {total};" for m, total in enumerate(sums)], 4)
