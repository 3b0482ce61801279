"""The fixed-point part of a bank's C source: 16-bit codes, exact 32-bit sums.

Two basis values are interleaved and dotted with two coefficients at once, which is one
instruction on most processors; where it is not, the same sums are made in plain C.
"""

from __future__ import annotations

from typing import Any

import numpy as np

from patchlab.export.c_text import float_literal, lines, numbers, template
from patchlab.types import Bank, InputTable, Plan

TOKENS = ("FIXED_VECTOR", "FIXED", "FIXED_HEADER", "Q_DATA", "Q_DEFINES", "Q_SCRATCH")


def sections(bank: Bank, plan: Plan, chunk: int) -> dict[str, str]:
    """The texts for the templates; all empty for a bank without fixed point."""
    fixed = plan.detail["fixed"]
    if fixed is None:
        return dict.fromkeys(TOKENS, "")
    radius = bank.radius
    line = -(-(chunk + 2 * radius) // 32) * 32
    folded = (2 * radius + 1) * line if _folds(fixed) else 0
    scales = range(len(plan.detail["strength"]))
    parts = {
        "COUNT": str(len(bank)),
        "SCALES_OR_ONE": str(max(len(scales), 1)),
        "Q_FOLD": _FOLD if _folds(fixed) else "",
        "Q_GROUPS": "\n".join(_group(g, fixed, radius) for g in range(len(fixed.groups))),
        "Q_RESPONSES": _responses(fixed),
        "Q_EDGES": (_take(bank) if scales else "") + "".join(
            _edges(bank, plan, s) for s in scales
        ),
        "Q_VALUE": _value(bank.table, fixed),
        "Q_STEPS": numbers(np.array(fixed.step, dtype=np.float32), indent=8),
        "Q_CLIPS": "" if any(fixed.clips) else ";\n * for this bank no input can reach them",
        **{
            f"Q_EDGES_{isa}": ", ".join(f"@N@_q_edges{s}_{isa}" for s in scales) or "NULL"
            for isa in ("base", "avx2", "avx512")
        },
    }  # fmt: skip
    work = 2 * folded + 4 * chunk * len(fixed.bases) + 12 * chunk  # best, who, two of counts
    return {
        "FIXED_VECTOR": _put(template("fixed_vector.c.in"), parts),
        "FIXED": _put(template("fixed.c.in"), parts),
        "FIXED_HEADER": _put(template("fixed.h.in"), parts),
        "Q_DATA": _data(bank.table, fixed),
        "Q_DEFINES": lines([
            f"#define @N@_LINE_Q {line} /* the same in 16-bit codes */",
            f"#define @N@_FOLDED_Q {folded} /* codes of the folded rows of a chunk */",
            f"#define @N@_SCRATCH_Q {work} /* bytes of scratch memory beside the ring of codes */",
            "",
        ]),
        "Q_SCRATCH": lines([
            "    {",
            "        const size_t codes = @N@_SIZE * @N@_ring_width_q(width) * sizeof(int16_t)",
            "            + @N@_SCRATCH_Q + 64;",
            "        if (codes > bytes) bytes = codes;",
            "    }",
            "",
        ]),
    }  # fmt: skip


def _put(text: str, parts: dict[str, str]) -> str:
    """Fill in this module's tokens and leave all others."""
    for token, value in parts.items():
        text = text.replace(f"@{token}@", value)
    return text


def _folds(fixed: Any) -> bool:
    return any(basis != "all" for basis in fixed.bases)


_FOLD = """\
/* The middle row, then the sums and then the differences of the rows about it. */
static @N@_TARGET_Q void @N@_FN(q_fold)(const int16_t *const *rows, ptrdiff_t at, int16_t *s)
{
    int j, x;
    for (x = 0; x < @N@_LINE_Q; x += @N@_WIDE) {
        @N@_FN(q_store)(s + x, @N@_FN(q_load)(rows[@N@_RADIUS] + at + x));
    }
    for (j = 1; j <= @N@_RADIUS; ++j) {
        const int16_t *const below = rows[@N@_RADIUS + j] + at;
        const int16_t *const above = rows[@N@_RADIUS - j] + at;
        int16_t *const sum = s + (ptrdiff_t)j * @N@_LINE_Q;
        int16_t *const difference = s + (ptrdiff_t)(@N@_RADIUS + j) * @N@_LINE_Q;
        for (x = 0; x < @N@_LINE_Q; x += @N@_WIDE) {
            const @N@_FN(q16) b = @N@_FN(q_load)(below + x), a = @N@_FN(q_load)(above + x);
            @N@_FN(q_store)(sum + x, @N@_FN(q_add)(b, a));
            @N@_FN(q_store)(difference + x, @N@_FN(q_sub)(b, a));
        }
    }
}

"""


# ---------------------------------------------------------------- data


def _data(table: InputTable, fixed: Any) -> str:
    text = "\n".join(_coefficients(g, fixed) for g in range(len(fixed.groups)))
    if not _plain(fixed):
        text += (
            f"\n/* Code of every {table.contract.pixels} value. */\n"
            f"static const int16_t @N@_codes[{fixed.codes.size}] = {{\n"
            f"{numbers(fixed.codes)}\n}};\n"
        )
    return text


def _plain(fixed: Any) -> bool:
    return bool(np.array_equal(fixed.codes, np.arange(fixed.codes.size)))


def _value(table: InputTable, fixed: Any) -> str:
    form = table.contract.format
    body = ["(void)bad;"]
    if form.full_scale < np.iinfo(form.dtype).max:
        body = [f"if (p > {form.full_scale}u) {{", "    *bad = 1;", "    return 0;", "}"]
    body.append("return (int16_t)p;" if _plain(fixed) else "return @N@_codes[p];")
    return lines(body, 4)


def _pairs(shape: tuple[int, int]) -> tuple[bool, list[tuple[int, int | None]]]:
    """Do pairs lie across rows? And the columns of the pairs of a row (or pair of rows)."""
    height, width = shape
    if width % 2 and height % 2 == 0:
        return True, [(i, i) for i in range(width)]
    return False, [(i, i + 1 if i + 1 < width else None) for i in range(0, width, 2)]


def _coefficients(number: int, fixed: Any) -> str:
    """The coefficients of a group: by row, pair, product, the two of a pair side by side."""
    stack = np.stack([fixed.coefficients[p] for p in fixed.groups[number]], axis=-1)
    across, pairs = _pairs(stack.shape[:2])
    found = []
    for j in range(0, stack.shape[0], 1 + across):
        for first, second in pairs:
            other = np.zeros_like(stack[0, 0])
            if second is not None:
                other = stack[j + across, second]
            found.append(np.stack([stack[j, first], other], axis=-1))
    values = np.ravel(found)
    head = f"static const int16_t @N@_group{number}_counts[{values.size}]"
    return f"{head} = {{\n{numbers(values)}\n}};\n"


# ---------------------------------------------------------------- products


def _value_at(basis: str, row: str, column: int, start: int) -> str:
    """The basis value of a column, as an expression."""
    if basis == "all":
        return f"@N@_FN(q_load)({row} + {start + column})"
    if basis[1] == "e" and column == 0:
        return f"@N@_FN(q_load)({row})"
    i = column + (basis[1] == "o")
    word = "q_add" if basis[1] == "e" else "q_sub"
    return f"@N@_FN({word})(@N@_FN(q_load)({row} + {i}), @N@_FN(q_load)({row} - {i}))"


def _group(number: int, fixed: Any, radius: int) -> str:
    """C function that computes a group of products on one chunk."""
    group = fixed.groups[number]
    basis = fixed.bases[group[0]]
    height, width = fixed.coefficients[group[0]].shape
    across, pairs = _pairs((height, width))
    if basis == "all":
        arguments = "const int16_t *const *rows, ptrdiff_t at, int32_t *t"
        first, start = radius - height // 2, radius - width // 2
        source = "rows[{}] + at + x"
    else:
        arguments, start = "const int16_t *s, int32_t *t", 0
        first = 0 if basis[0] == "e" else radius + 1
        source = "s + (ptrdiff_t)({}) * @N@_LINE_Q + x + @N@_RADIUS"
    steps = []
    for one, two in pairs:
        v = _value_at(basis, "r", one, start)
        w = "v" if two is None else _value_at(basis, "r2" if across else "r", two, start)
        steps += [
            "{",
            f"    const @N@_FN(q16) v = {v};",
            f"    const @N@_FN(q16) w = {w};",
            "    @N@_PAIR(v, w);",
            *(f"    @N@_MAC(a{n}, b{n}, k + {2 * n});" for n in range(len(group))),
            f"    k += {2 * len(group)};",
            "}",
        ]
    body = [
        "int x;",
        "for (x = 0; x < @N@_CHUNK; x += @N@_WIDE) {",
        f"    const int16_t *k = @N@_group{number}_counts;",
        *(f"    @N@_FN(q32) a{n} = @N@_FN(q_nought)(), b{n} = a{n};" for n in range(len(group))),
        "    int j;",
        f"    for (j = {first}; j < {first + height}; j += {1 + across}) {{",
        f"        const int16_t *const r = {source.format('j')};",
        *([f"        const int16_t *const r2 = {source.format('j + 1')};"] if across else []),
        *(" " * 8 + row for row in steps),
        "    }",
    ]
    for n, p in enumerate(group):
        body += [
            f"    @N@_FN(q_keep)(t + {p} * @N@_CHUNK + x, a{n});",
            f"    @N@_FN(q_keep)(t + {p} * @N@_CHUNK + x + @N@_WIDE / 2, b{n});",
        ]
    head = f"static @N@_TARGET_Q void @N@_FN(q_group{number})({arguments})"
    return f"{head}\n{{\n{lines([*body, '}'], 4)}\n}}\n"


# ---------------------------------------------------------------- counts


_WORK = [
    "int16_t *const s = (int16_t *)work; /* folded rows */",
    "int32_t *const t = (int32_t *)(void *)(s + @N@_FOLDED_Q); /* products */",
]


def _calls(fixed: Any, wanted: set[int]) -> list[str]:
    """Calls that compute the groups in which some of these products are."""
    calls = []
    for g, group in enumerate(fixed.groups):
        if wanted.intersection(group):
            direct = fixed.bases[group[0]] == "all"
            calls.append(f"@N@_FN(q_group{g})({'rows, at' if direct else 's'}, t);")
    if any("(s, t)" in call for call in calls):
        calls.insert(0, "@N@_FN(q_fold)(rows, at, s);")
    return calls or ["(void)rows;", "(void)at;", "(void)t;"]


def _sum(terms: Any, tail: str) -> str:
    """A kernel's sum in 32 bits."""
    text = ""
    for p, sign in terms:
        value = f"@N@_FN(q_sum)(t + {p} * @N@_CHUNK + x{tail})"
        if not text and sign > 0:
            text = value
            continue
        text = text or "@N@_FN(q_nought)()"
        text = f"@N@_FN({'q_plus' if sign > 0 else 'q_minus'})({text}, {value})"
    return text or "@N@_FN(q_nought)()"


def _count(fixed: Any, kernel: int, to: str) -> list[str]:
    """Statements that leave a kernel's counts of a chunk at ``to``."""
    return [
        "for (x = 0; x < @N@_CHUNK; x += @N@_WIDE) {",
        f"    const @N@_FN(q32) l = {_sum(fixed.sums[kernel], '')};",
        f"    const @N@_FN(q32) h = {_sum(fixed.sums[kernel], ' + @N@_WIDE / 2')};",
        f"    @N@_FN(q_store)({to} + x, @N@_FN(q_round)(l, h, {fixed.shift[kernel]}));",
        "}",
    ]


def _responses(fixed: Any) -> str:
    body = [
        *_WORK,
        f"int16_t *const r = (int16_t *)(void *)(t + {len(fixed.bases)} * @N@_CHUNK); /* counts */",
        "uint64_t ends = 0;",
        "int x;",
        *_calls(fixed, {p for terms in fixed.sums for p, _ in terms}),
    ]
    for k in range(len(fixed.sums)):
        body += _count(fixed, k, "r")
        if fixed.clips[k]:
            body.append("for (x = 0; x < n; ++x) ends += (r[x] == 32767) | (r[x] == -32767);")
        target = f"(int16_t *)(void *)(out + {k} * plane)"
        body.append(f"@N@_FN(q_put)(r, {target}, n, stream);")
    return lines([*body, "return ends;"], 4)


def _take(bank: Bank) -> str:
    """Keeping the winner; plain C that compilers vectorise, so the same bits everywhere."""
    energy = bank.strength == "energy"
    value = "(int32_t)e[x] * e[x] + (int32_t)o[x] * o[x]" if energy else "e[x] < 0 ? -e[x] : e[x]"
    more = " const int16_t *o," if energy else ""
    return (
        "/* Keep the largest value so far and whose it is; among equals the first stays. */\n"
        f"static @N@_TARGET_Q void @N@_FN(q_take)(const int16_t *e,{more} int turn,\n"
        "    int32_t *best, int32_t *who)\n{\n    int x;\n    for (x = 0; x < @N@_CHUNK; ++x) {\n"
        f"        const int32_t v = {value};\n"
        "        who[x] = v > best[x] ? turn : who[x];\n"
        "        best[x] = v > best[x] ? v : best[x];\n    }\n}\n\n"
    )


def _edges(bank: Bank, plan: Plan, scale: int) -> str:
    """C function for the strength and the winner of one scale on one chunk."""
    fixed, members = plan.detail["fixed"], plan.detail["strength"][scale]
    kernels = [k for _, even, odd in members for k in (even, odd) if k is not None]
    body = [
        *_WORK,
        f"int32_t *const best = t + {len(fixed.bases)} * @N@_CHUNK;",
        "int32_t *const who = best + @N@_CHUNK;",
        "int16_t *const r = (int16_t *)(void *)(who + @N@_CHUNK);",
        "int x;",
        *_calls(fixed, {p for k in kernels for p, _ in fixed.sums[k]}),
        "for (x = 0; x < @N@_CHUNK; ++x) best[x] = -1;",
        "for (x = 0; x < @N@_CHUNK; ++x) who[x] = 0;",
    ]
    for turn, even, odd in members:
        both = [k for k in (even, odd) if k is not None]
        for k, to in zip(both, ("r", "r + @N@_CHUNK"), strict=False):
            body += _count(fixed, k, to)
        second = " r + @N@_CHUNK," if len(both) == 2 else ""
        body.append(f"@N@_FN(q_take)(r,{second} {turn}, best, who);")
    step = float_literal(fixed.step[kernels[0]])
    value = "sqrtf((float)best[x])" if bank.strength == "energy" else "(float)best[x]"
    body += [
        f"for (x = 0; x < n; ++x) strength[x] = {step} * {value};",
        "for (x = 0; x < n; ++x) orientation[x] = (unsigned char)who[x];",
    ]
    return (
        f"/* Strength and winner of scale {scale}. */\n"
        f"static @N@_TARGET_Q void @N@_FN(q_edges{scale})(const int16_t *const *rows,\n"
        "    ptrdiff_t at, int n, void *work, float *strength, unsigned char *orientation)\n"
        f"{{\n{lines(body, 4)}\n}}\n\n"
    )
