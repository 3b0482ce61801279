"""A bank as C99 source that also compiles as C++17: one header, one source file.

The generator knows a plan only as products and sums (``Plan.detail``), never how
the plan was found. The fixed parts of the source are the templates in
``templates/``; this module writes what depends on the bank.
"""

from __future__ import annotations

import numpy as np

from patchlab.conventions import BORDERS
from patchlab.errors import UsageError
from patchlab.export import c_code, c_colour, c_edgels, c_fft, c_fixed, c_flat, c_halved
from patchlab.export.c_edge_model import EdgelRules
from patchlab.export.c_text import (
    fill,
    float_literal,
    identifier,
    licence,
    lines,
    numbers,
    template,
)
from patchlab.export.selftest import Case, emit_selftest
from patchlab.store import VERSION
from patchlab.types import Bank, InputTable, Plan

__all__ = ["CODES", "Case", "emit", "emit_selftest"]

CHUNK = 64
"""Output pixels that are computed together: their intermediate values stay in the first cache."""
RING_BYTES = 196_608
"""What the ring of rows may take: it should stay in the second cache."""

ISAS = ("base", "avx2", "avx512")
MATHEMATICS = {"INCLUDES": "#include <math.h>\n", "LIBM": "-lm"}
ROWS_CALL = "    code = @N@_walk(&p, &job, first_row, row_count, scratch);\n"

CODES = (
    ("OK", "success"),
    ("NO_IMAGE", "image is NULL"),
    ("BAD_WIDTH", "width is smaller than a kernel, or larger than 16777216"),
    ("BAD_HEIGHT", "height is smaller than a kernel, or larger than 16777216"),
    ("IMAGE_MISALIGNED", "image or row_bytes is not a multiple of the pixel's size"),
    ("BAD_ROW_BYTES", "row_bytes is smaller than a row of pixels"),
    ("BAD_ROWS", "first_row and row_count do not lie inside the picture"),
    ("BAD_SCALE", "there is no such scale in this bank"),
    ("NO_OUTPUT", "out is NULL"),
    (
        "OUTPUT_MISALIGNED",
        "out, out_row_bytes or out_plane_bytes is not a multiple of a value's size",
    ),
    ("BAD_OUTPUT_ROW_BYTES", "out_row_bytes is smaller than a row of values"),
    ("BAD_OUTPUT_PLANE_BYTES", "out_plane_bytes makes the planes overlap"),
    ("NO_STRENGTH", "strength is NULL"),
    ("STRENGTH_MISALIGNED", "strength or strength_row_bytes is not a multiple of 4"),
    ("BAD_STRENGTH_ROW_BYTES", "strength_row_bytes is smaller than a row of floats"),
    ("NO_ORIENTATION", "orientation is NULL"),
    ("BAD_ORIENTATION_ROW_BYTES", "orientation_row_bytes is smaller than a row"),
    ("NO_SCRATCH", "scratch is NULL"),
    ("BAD_PIXEL", "a pixel code is beyond the pixel format; the output is not to be used"),
    ("NO_COUNT", "count is NULL"),
    ("BAD_THRESHOLD", "a threshold is not between 1e-20 and 1e30, or no kernels find such edges"),
    ("NO_EDGELS", "out is NULL and capacity is not 0"),
    ("EDGELS_MISALIGNED", "out is not a multiple of 4"),
    ("TOO_MANY", "there are more edgels than capacity; those that had room were written"),
    ("TOO_LARGE", "the picture has too many pixels for the edgels' scratch memory"),
    ("BAD_STRENGTH_PLANE_BYTES", "strength_plane_bytes: planes overlap, or no multiple of 4"),
    ("BAD_ORIENTATION_PLANE_BYTES", "orientation_plane_bytes makes the planes overlap"),
)
"""Names and messages of the return codes, by value."""

_BORDER_WORDS = {
    "zero": "Working values outside the picture are 0.",
    "edge": "Outside, the nearest pixel of the rim is repeated.",
    "mirror101": "Outside, the picture is mirrored about its outermost pixels.",
    "mirror": "Outside, the picture is mirrored about its edge, the rim doubled.",
    "wrap": "Outside, the picture begins again at its other end.",
}
_BORDER_CODE = {
    "zero": ("return i < 0 || i >= size ? -1 : i;",),
    "edge": ("return i < 0 ? 0 : i >= size ? size - 1 : i;",),
    "mirror101": ("return i < 0 ? -i : i >= size ? 2 * size - 2 - i : i;",),
    "mirror": ("return i < 0 ? -1 - i : i >= size ? 2 * size - 1 - i : i;",),
    "wrap": ("return i < 0 ? i + size : i >= size ? i - size : i;",),
}
_STRENGTH_WORDS = {
    "step": "the largest absolute odd response over the orientations.",
    "line": "the largest absolute even response over the orientations.",
    "energy": "the largest sqrt(even^2 + odd^2) over the orientations.",
}


def emit(bank: Bank, plan: Plan, edgels: EdgelRules | None = None) -> dict[str, bytes]:
    """The C source of a bank.

    Parameters
    ----------
    bank : Bank
    plan : Plan made from it
    edgels : how responses become edgels; None leaves ``NAME_edgels`` out

    Returns
    -------
    dict : ``NAME.h``, ``NAME.c``, ``CMakeLists.txt``, ``NAME.pc``; the CMake file also builds
        ``NAME_selftest.c`` of :func:`emit_selftest`

    Raises
    ------
    UsageError : a name that is not a C identifier.

    Notes
    -----
    Numbers are written so that they read back bit for bit. The code's result lies within
    ``plan.error_bound`` of the exact responses, with fused multiply-adds or without.
    """
    name = identifier(bank.name, "bank name")
    for kernel in bank.kernels:
        identifier(kernel.name, "kernel name")
    if bank.border not in BORDERS:
        raise UsageError(f"unknown border {bank.border!r}")
    about = _about(bank, plan) | _sections(bank, plan) | c_fixed.sections(bank, plan, CHUNK)
    about |= c_fft.sections(plan, bank.radius, CHUNK, _line(bank.radius))
    about |= c_edgels.sections(bank, plan, edgels)
    if edgels is not None:
        about |= MATHEMATICS
    about |= {k: _told(v, about) for k, v in c_colour.sections(bank).items()}
    about |= c_flat.sections(bank, plan, CHUNK)
    about["ALL_CALLS"], about["ALL_HEADER"] = template("all.c.in"), template("all.h.in")
    about |= c_halved.sections(plan, CHUNK, _line(bank.radius))

    # texts with tokens of their own are filled before they are put in place
    about |= {k: fill(str(v), {"N": name}).decode() for k, v in about.items() if "@N@" in str(v)}

    def one(text: str, comment: str) -> bytes:
        return fill(template(text), {**about, "LICENCE": licence(comment)})

    return {
        f"{name}.h": one("bank.h.in", " * "),
        f"{name}.c": one("bank.c.in", " * "),
        "CMakeLists.txt": one("CMakeLists.txt.in", "# "),
        f"{name}.pc": one("bank.pc.in", "# "),
    }


def _told(text: object, about: dict[str, object]) -> str:
    """A text with the tokens of the bank's plain facts filled in; the name's comes later."""
    return fill(str(text), {**about, "N": "@N@"}).decode()


# ---------------------------------------------------------------- facts


def _about(bank: Bank, plan: Plan) -> dict[str, object]:
    """The plain facts that the templates mention."""
    form, plane = bank.contract.format, bank.contract.plane
    line = _line(bank.radius)
    products = len(plan.detail["bases"])
    scales = len(plan.detail["strength"])
    tile = max(256, RING_BYTES // (4 * bank.size * bank.planes) // CHUNK * CHUNK)
    folded = (2 * bank.radius + 1) * line if c_code.folds(plan) else 0
    roots = bank.strength == "energy" or (bank.table.kind == "stabilised" and not form.integer)
    return {
        "N": bank.name,
        "ABI": plan.detail["abi"],
        "COUNT": len(bank),
        "SIZE": bank.size,
        "RADIUS": bank.radius,
        "PIXELS": f"{form.name} ({plane})" if plane else form.name,
        "PIXEL": form.ctype,
        "BORDER": bank.border,
        "BORDER_WORDS": _BORDER_WORDS[bank.border],
        "BORDER_CODE": lines(_BORDER_CODE[bank.border], 4),
        "STRENGTH_WORDS": _STRENGTH_WORDS[bank.strength] if scales else "this bank has none.",
        "SCALES": scales,
        "SCALES_OR_ONE": max(scales, 1),
        "CHUNK": CHUNK,
        "LINE": line,
        "TILE": tile,
        "FOLDED": folded,
        "COLUMNS": (products + 2) * CHUNK,
        "WORK": folded + (products + 2) * CHUNK + c_code.columns(plan) * line,
        "PLAN": f"{plan.kind}, {plan.multiplies:.0f} multiplies a pixel.",
        **(MATHEMATICS if roots else dict.fromkeys(MATHEMATICS, "")),
        "VERSION": VERSION,
    }


def _line(radius: int) -> int:
    """Floats of a chunk with its halo, in whole vectors."""
    return -(-(CHUNK + 2 * radius) // 16) * 16


def _sections(bank: Bank, plan: Plan) -> dict[str, object]:
    """The parts of the source that depend on the bank."""
    scales = range(len(plan.detail["strength"]))
    fft, half = plan.detail["fft"], plan.detail["halved"]
    return {
        "THRESHOLDS": _thresholds(bank),
        "CODES": ",\n".join(f"    @N@_{word} = {i}" for i, (word, _) in enumerate(CODES)),
        "MESSAGES": lines([f'case @N@_{word}: return "{text}";' for word, text in CODES], indent=4),
        "KERNELS": lines([f" *   {i}  {k.name}" for i, k in enumerate(bank.kernels)]),
        "NAMES": ",\n".join(f'    "{k.name}"' for k in bank.kernels),
        "TABLE": _table(bank.table),
        "VALUE": _value(bank.table),
        "COEFFICIENTS": "\n".join(c_code.coefficients(g, plan) for g in c_code.used_groups(plan)),
        "FOLD": c_code.fold(plan),
        "GROUPS": "\n".join(
            c_code.group_code(g, plan, bank.radius) for g in c_code.used_groups(plan)
        ),
        "JOINS": c_code.joins(plan),
        "RESPONSES": c_code.responses(plan),
        "EDGES": "".join(c_code.edges(bank, plan, s) for s in scales)
        + (c_code.every_edge(bank, plan) if scales else ""),
        **{f"ALL_{isa}": f"@N@_edges_all_{isa}" if scales else "NULL" for isa in ISAS},
        **{f"HALF_{isa}": f"@N@_half_block_{isa}" if half else "NULL" for isa in ISAS},
        **{f"FFT_{isa}": f"@N@_fft_block_{isa}" if fft else "NULL" for isa in ISAS},
        "ROWS_CALL": ROWS_CALL if c_code.by_rows(plan) else "",
        **(c_code.TAKE if scales else dict.fromkeys(c_code.TAKE, "")),
        **{
            f"EDGES_{isa}": ", ".join(f"@N@_edges{s}_{isa}" for s in scales) or "NULL"
            for isa in ISAS
        },
    }


def _thresholds(bank: Bank) -> str:
    known = bank.thresholds
    if known is None:
        return ""
    rates = ", ".join(float_literal(v) for v in known.rate)
    strengths = ", ".join(float_literal(v) for v in known.strength)
    return lines(
        [
            "/* Strength thresholds for a promised number of false edge elements a megapixel,",
            " * found on pure noise through the whole chain (thinning and hysteresis included).",
            " * Use them as initialisers: static const float t[] = @N@_STRENGTH_THRESHOLDS; */",
            f"#define @N@_THRESHOLD_COUNT {len(known.rate)}",
            f"#define @N@_FALSE_EDGES_PER_MEGAPIXEL {{{rates}}}",
            f"#define @N@_STRENGTH_THRESHOLDS {{{strengths}}}",
            f"#define @N@_HYSTERESIS {float_literal(known.hysteresis)}",
            *_more_thresholds(bank),
            "",
        ]
    )


def _more_thresholds(bank: Bank) -> list[str]:
    """How many connected groups the false elements come in, and the thresholds for lines."""
    out, known, for_lines = [], bank.thresholds, bank.line_thresholds
    if known is not None and known.groups.size:
        groups = ", ".join(float_literal(v) for v in known.groups)
        out = [f"#define @N@_FALSE_GROUPS_PER_MEGAPIXEL {{{groups}}}"]
    if for_lines is not None:
        strengths = ", ".join(float_literal(v) for v in for_lines.strength)
        out += [
            "/* The same promises for lines, on the even responses. */",
            f"#define @N@_LINE_STRENGTH_THRESHOLDS {{{strengths}}}",
        ]
    return out


# ---------------------------------------------------------------- the input table


def _is_identity(table: InputTable) -> bool:
    return table.values is not None and bool(
        np.array_equal(table.values, np.arange(table.values.size))
    )


def _table(table: InputTable) -> str:
    if table.values is None or _is_identity(table):
        return "/* The input table: working values are the pixels as they are. */" * (
            table.kind == "identity"
        )
    return (
        f"/* The input table: working value of every {table.contract.pixels} code. */\n"
        f"static const float @N@_table[{table.values.size}] = {{\n{numbers(table.values)}\n}};\n"
    )


def _value(table: InputTable) -> str:
    """C function from a pixel to its working value; notes a code beyond the format."""
    form = table.contract.format
    body: list[str] = []
    if form.integer and form.full_scale < np.iinfo(form.dtype).max:
        body += [f"if (p > {form.full_scale}u) {{", "    *bad = 1;", "    return 0.0f;", "}"]
    else:
        body += ["(void)bad;"]
    if form.integer:
        body += ["return (float)p;" if _is_identity(table) else "return @N@_table[p];"]
    elif table.kind == "identity":
        body += ["return p;"]
    else:
        body = [
            "/* volatile: every step is rounded to float, as in the reference, never fused */",
            f"volatile float v = {float_literal(table.slope)} * p;",
            f"v = v + {float_literal(table.offset)};",
            "v = v < 0.0f ? 0.0f : v;",
            "v = sqrtf(v);",
            f"v = {float_literal(table.scale)} * v;",
            *body,
            "return v;",
        ]
    return f"static float @N@_value(@N@_pixel p, int *bad)\n{{\n{lines(body, 4)}\n}}\n"
