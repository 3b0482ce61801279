"""The part of a bank's C source that works at half resolution.

The small kernels' products are written by the code that writes those of the bank, under names
of their own: a row of halves is to them what a row of working values is to the others.
"""

from __future__ import annotations

from typing import Any

from patchlab.export import c_code
from patchlab.export.c_text import lines, numbers, template
from patchlab.types import Plan

TOKENS = ("HALF_VECTOR", "HALF", "HALF_DATA", "HALF_SCRATCH", "HALF_CALL")


def _own_names(text: str) -> str:
    """The bank's texts, renamed for the small kernels."""
    for old, new in (
        ("@N@_FN(group", "@N@_FN(half_group"),
        ("@N@_group", "@N@_half_group"),
        ("@N@_FN(fold)", "@N@_FN(half_fold)"),
        ("@N@_RADIUS", "@N@_HALF_RADIUS"),
        ("@N@_LINE", "@N@_HALF_LINE"),
    ):
        text = text.replace(old, new)
    return text


def _small(halved: Any) -> Plan:
    """The small kernels as a plan of their own."""
    products = halved.products
    return Plan(
        kind="parity",
        groups=(),
        multiplies=0.0,
        adds=0.0,
        error_bound=(),
        detail={
            "bases": tuple(p.basis for p in products),
            "coefficients": tuple(p.rounded for p in products),
            "factors": (None,) * len(products),
            "planes": (0,) * len(products),
            "sums": halved.sums,
            "product_groups": halved.groups,
            "strength": (),
            "fft": None,
            "halved": None,
        },
    )


def sections(plan: Plan, chunk: int, line: int) -> dict[str, str]:
    """The texts for the templates; all empty for a plan without half resolution."""
    halved = plan.detail["halved"]
    if halved is None:
        return dict.fromkeys(TOKENS, "")
    small, p, radius = _small(halved), halved.flatness, halved.radius
    groups = c_code.used_groups(small)
    every = range(len(halved.kernels))
    small_line = -(-(chunk + 2 * radius) // 16) * 16
    out = halved.rows // 2 + 2 * p - 1
    rows, full = out + 2 * radius, 2 * small_line + 32
    block_rows, pitch = 2 * rows + 4 * p - 2, full + line
    products = len(halved.products)
    rest = max(2 * full, (2 * radius + 1) * small_line + products * chunk, 5 * chunk + 16)
    work = rows * small_line + len(halved.kernels) * out * chunk + rest
    parts = {
        "SMALL_FOLD": _own_names(c_code.fold(small)),
        "SMALL_GROUPS": _own_names("\n".join(c_code.group_code(g, small, radius) for g in groups)),
        "SMALL_CALLS": _own_names(
            lines(
                [
                    "@N@_FN(fold)(rows, 0, work);",
                    *(f"@N@_FN(group{g})(work, t);" for g in groups),
                ],
                4,
            )
        ),
        "SMALL_SUMS": lines(
            [
                f"@N@_STORE(q + {k} * @N@_HALF_OUT * @N@_CHUNK + x, "
                f"{c_code.expression(halved.sums[k])});"
                for k in every
            ],
            8,
        ),
        "KERNELS": ", ".join(map(str, halved.kernels)),
    }
    data = "\n".join(c_code.coefficients(g, small) for g in groups)
    return {
        "HALF_VECTOR": _put(template("halved_vector.c.in"), parts),
        "HALF": template("halved.c.in"),
        "HALF_CALL": "    if (code == @N@_OK || code == @N@_BAD_PIXEL) {\n"
        "        const int other = @N@_walk_half(&p, &job, first_row, row_count, scratch);\n"
        "        if (other != @N@_OK) code = other;\n    }\n",
        "HALF_SCRATCH": "    if (@N@_HALF_SCRATCH > bytes) bytes = @N@_HALF_SCRATCH;\n",
        "HALF_DATA": lines([
            f"#define @N@_HALF_COUNT {len(halved.kernels)} /* kernels at half resolution */",
            f"#define @N@_HALF_TAPS {2 * p} /* of the interpolator */",
            f"#define @N@_HALF_RADIUS {radius} /* of the small kernels */",
            f"#define @N@_HALF_REACH {halved.reach} /* pixels that an output depends on */",
            f"#define @N@_HALF_LINE {small_line} /* halves of a row of a block */",
            f"#define @N@_HALF_VALID {halved.rows} /* rows of output of a block */",
            f"#define @N@_HALF_WIDTH {2 * (chunk - 2 * p)} /* and its columns */",
            f"#define @N@_HALF_OUT {out} /* rows of the small kernels' responses */",
            f"#define @N@_HALF_ROWS {rows} /* rows of halves */",
            f"#define @N@_HALF_FULL {full} /* working values of a row that is halved */",
            f"#define @N@_HALF_BLOCK_ROWS {block_rows} /* rows of working values of a block */",
            f"#define @N@_HALF_PITCH {pitch} /* from one to the next */",
            f"#define @N@_HALF_SCRATCH ({block_rows * pitch + work} * sizeof(float) + 64)",
            "",
            "/* Odd taps of the half-band filter, exact. */",
            f"static const float @N@_half_taps[{2 * p}] = {{",
            numbers(halved.taps.astype("float32")),
            "};",
            _own_names(data),
            "",
        ]),
    }  # fmt: skip


def _put(text: str, parts: dict[str, str]) -> str:
    for token, value in parts.items():
        text = text.replace(f"@{token}@", value)
    return text
