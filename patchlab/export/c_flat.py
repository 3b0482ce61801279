"""The part of a bank's C source that finds edges above a threshold and skips what is flat."""

from __future__ import annotations

from patchlab.export.c_text import float_literal, template
from patchlab.types import Bank, Plan

TOKENS = ("FLAT_VECTOR", "FLAT", "FLAT_DATA", "FLAT_SCRATCH")
ISAS = ("base", "avx2", "avx512")

_SKIPPING = """\
    {
        struct @N@_flat flat;
        flat.threshold = threshold;
        flat.skipped = 0;
        code = @N@_walk_flat(&p, &job, &flat, first_row, row_count, scratch);
        if (skipped != NULL) *skipped = flat.skipped;
    }
"""
_PLAIN = """\
    (void)threshold;
    if (skipped != NULL) *skipped = 0;
    code = @N@_walk(&p, &job, first_row, row_count, scratch);
"""


_SCRATCH = """\
    {
        const size_t flat = (@N@_FLAT_ROWS * (@N@_flat_pitch(width)
            + 32 * @N@_flat_stretches(width)) + @N@_SCRATCH) * sizeof(float) + 64;
        if (flat > bytes) bytes = flat;
    }
"""


def sections(bank: Bank, plan: Plan, chunk: int) -> dict[str, str]:
    """The texts for the templates.

    A bank without scales, or with float pixels, which may be no numbers, has the calls alone.
    """
    bounds = plan.detail["flat"]
    skips = bool(bounds) and bank.contract.format.integer
    parts = {
        "FLAT_WALK": _SKIPPING if skips else _PLAIN,
        "FLAT_WORDS": "" if skips else " This bank has none.",
    }
    shared = {
        "FLAT_CALLS": _put(template("flat_calls.c.in"), parts),
        "FLAT_HEADER": _put(template("flat.h.in"), parts),
        **{
            f"FLAT_{isa}": f"@N@_range_{isa}, @N@_spread_{isa}" if skips else "NULL, NULL"
            for isa in ISAS
        },
    }
    if not skips:
        return shared | dict.fromkeys(TOKENS, "")
    rows = ", ".join("{" + ", ".join(float_literal(v) for v in b) + "}" for b in bounds)
    span = -(-(chunk + 2 * bank.radius + 2) // chunk)
    text = _put(
        template("flat.c.in"), {"FLAT_BOUNDS": rows, "SCALES_OR_ONE": str(max(len(bounds), 1))}
    )
    return shared | {
        "FLAT_VECTOR": template("flat_vector.c.in"),
        "FLAT": text,
        "FLAT_DATA": (
            f"#define @N@_FLAT_ROWS {bank.size + 2} /* a kernel's, one above, one below */\n"
            f"#define @N@_FLAT_SPAN {span} /* stretches that a chunk depends on */\n"
        ),
        "FLAT_SCRATCH": _SCRATCH,
    }  # fmt: skip


def _put(text: str, parts: dict[str, str]) -> str:
    for token, value in parts.items():
        text = text.replace(f"@{token}@", value)
    return text
