"""The vector code of separable products: columns over a chunk and its halo, then along the row.

The columns of a group are made together, so every row of the ring is read once for all of them;
along the row four vectors are summed at a time.
"""

from __future__ import annotations

import numpy as np

from patchlab.export.c_text import lines, numbers
from patchlab.types import Plan

VECTORS = 4
"""Vectors of a chunk that are summed side by side along a row."""


def _about(number: int, plan: Plan) -> str:
    group = plan.detail["product_groups"][number]
    column, row = plan.detail["factors"][group[0]]
    return f"{len(group)} columns of {column.size} times rows of {row.size}"


def coefficients(number: int, plan: Plan) -> str:
    """The columns of a group, tap by tap, then its rows, product by product."""
    group = plan.detail["product_groups"][number]
    columns = np.stack([plan.detail["factors"][p][0] for p in group], axis=-1)
    rows = np.stack([plan.detail["factors"][p][1] for p in group])
    return "".join(
        f"/* {_about(number, plan)} */\n"
        f"static const float @N@_group{number}_{name}[{values.size}] = {{\n"
        f"{numbers(np.ascontiguousarray(values, dtype=np.float32))}\n}};\n"
        for name, values in (("columns", columns), ("rows", rows))
    )


def group_code(number: int, plan: Plan, radius: int) -> str:
    """C function that computes a group of separable products on one chunk."""
    group = plan.detail["product_groups"][number]
    basis = plan.detail["bases"][group[0]]
    column, row = plan.detail["factors"][group[0]]
    height, width, count = column.size, row.size, len(group)
    if basis == "all":
        arguments, first = "const float *const *rows, ptrdiff_t at, float *t", radius - height // 2
        source, middle = "rows[j] + at + x", f"{radius - width // 2}"
    else:
        arguments, first = "const float *s, float *t", 0 if basis[0] == "e" else radius + 1
        source, middle = "s + (ptrdiff_t)j * @N@_LINE + x", "@N@_RADIUS"
    body = [
        "float *const columns = t + @N@_COLUMNS;",
        "const float *k;",
        "int x, j, n;",
        "for (x = 0; x < @N@_LINE; x += @N@_LANES) {",
        *(f"    @N@_FN(vec) a{n} = {{0.0f}};" for n in range(count)),
        f"    k = @N@_group{number}_columns;",
        f"    for (j = {first}; j < {first + height}; ++j, k += {count}) {{",
        f"        const @N@_FN(vec) p = @N@_LOAD({source});",
        *(f"        @N@_MUL_ADD(a{n}, p, k[{n}]);" for n in range(count)),
        "    }",
        *(f"    @N@_STORE(columns + {n} * @N@_LINE + x, a{n});" for n in range(count)),
        "}",
        f"k = @N@_group{number}_rows;",
        f"for (n = 0; n < {count}; ++n, k += {width}) {{",
        f"    for (x = 0; x < @N@_CHUNK; x += {VECTORS} * @N@_LANES) {{",
        f"        const float *const r = columns + n * @N@_LINE + x + {middle};",
        *("        " + line for line in _along(basis, width)),
        "    }",
        "}",
    ]
    places = ", ".join(map(str, group))
    body.insert(0, f"static const int places[{count}] = {{{places}}};")
    text = lines(body, 4)
    head = f"static @N@_TARGET void @N@_FN(group{number})({arguments})"
    return f"/* {_about(number, plan)} */\n{head}\n{{\n{text}\n}}\n"


def _along(basis: str, width: int) -> list[str]:
    """Statements that sum a row for some vectors and keep them."""
    every = range(VECTORS)
    body = [f"@N@_FN(vec) {', '.join(f'a{n} = {{0.0f}}' for n in every)};"]
    start, values = 0, "@N@_LOAD(r + i + {n} * @N@_LANES)"
    if basis != "all":
        even = basis[1] == "e"
        start, sign = (0, "+") if even else (1, "-")
        values = f"@N@_LOAD(r + i + {{n}} * @N@_LANES) {sign} @N@_LOAD(r - i + {{n}} * @N@_LANES)"
        if even:
            start = 1
            body += [
                f"@N@_MUL_ADD(a{n}, @N@_LOAD(r + {n} * @N@_LANES), k[0]);" for n in every
            ]  # the middle one has no partner
    taps = width if basis == "all" or basis[1] == "o" else width - 1
    shift = "" if basis == "all" or basis[1] == "e" else " - 1"
    if taps:
        body += [
            "{",
            "    int i;",
            f"    for (i = {start}; i < {start + taps}; ++i) {{",
            *(f"        @N@_MUL_ADD(a{n}, {values.format(n=n)}, k[i{shift}]);" for n in every),
            "    }",
            "}",
        ]
    return body + [
        f"@N@_STORE(t + places[n] * @N@_CHUNK + x + {n} * @N@_LANES, a{n});" for n in every
    ]
