"""The vector code of a bank: what is computed on one chunk of pixels.

Each group of products is one function; sums and the edges' winner follow. All of
it is written once and read once for every instruction set (see the template).
"""

from __future__ import annotations

from typing import Any

import numpy as np

from patchlab.export import c_separable
from patchlab.export.c_text import lines, numbers
from patchlab.types import Bank, Plan


def folds(plan: Plan) -> bool:
    """Does the plan read folded rows?"""
    return any(plan.detail["bases"][p] != "all" for p in needed(plan))


def columns(plan: Plan) -> int:
    """Lines of columns that separable products keep at a time."""
    groups = [plan.detail["product_groups"][g] for g in used_groups(plan)]
    return max((len(g) for g in groups if plan.detail["factors"][g[0]] is not None), default=0)


def about(number: int, plan: Plan) -> str:
    """A group of products in words."""
    group = plan.detail["product_groups"][number]
    rows, cols = plan.detail["coefficients"][group[0]].shape[-2:]
    basis = plan.detail["bases"][group[0]]
    if basis == "all":
        return f"{len(group)} x {rows} x {cols} coefficients, taps as they are"
    words = {"e": "even", "o": "odd"}
    return (
        f"{len(group)} x {rows} x {cols} coefficients, {words[basis[0]]} in y, "
        f"{words[basis[1]]} in x"
    )


def coefficients(number: int, plan: Plan) -> str:
    """The coefficients of a group: by row, column, product, as they are read."""
    group = plan.detail["product_groups"][number]
    if plan.detail["factors"][group[0]] is not None:
        return c_separable.coefficients(number, plan)
    stack = np.stack([plan.detail["coefficients"][p] for p in group], axis=-1)
    return (
        f"/* {about(number, plan)} */\n"
        f"static const float @N@_group{number}_taps[{stack.size}] = {{\n"
        f"{numbers(np.ascontiguousarray(stack, dtype=np.float32))}\n}};\n"
    )


_FOLD_TEXT = """\
/* The middle row, then the sums and then the differences of the rows about it. */
static @N@_TARGET void @N@_FN(fold)(const float *const *rows, ptrdiff_t at, float *s)
{
    int j, x;
    for (x = 0; x < @N@_LINE; x += @N@_LANES) {
        @N@_STORE(s + x, @N@_LOAD(rows[@N@_RADIUS] + at + x));
    }
    for (j = 1; j <= @N@_RADIUS; ++j) {
        const float *const below = rows[@N@_RADIUS + j] + at;
        const float *const above = rows[@N@_RADIUS - j] + at;
        float *const sum = s + (ptrdiff_t)j * @N@_LINE;
        float *const difference = s + (ptrdiff_t)(@N@_RADIUS + j) * @N@_LINE;
        for (x = 0; x < @N@_LINE; x += @N@_LANES) {
            const @N@_FN(vec) b = @N@_LOAD(below + x), a = @N@_LOAD(above + x);
            @N@_STORE(sum + x, b + a);
            @N@_STORE(difference + x, b - a);
        }
    }
}

"""


def fold(plan: Plan) -> str:
    """C function that folds the rows of a chunk, where the plan reads folded rows."""
    return _FOLD_TEXT if folds(plan) else ""


def _step(group: Any, left: str, right: str) -> list[str]:
    """Two vectors of basis values go into every product of a group."""
    adds = [
        f"@N@_MUL_ADD({sums}{n}, {value}, k[{n}]);"
        for n in range(len(group))
        for sums, value in (("a", "p"), ("b", "q"))
    ]
    return [
        f"const @N@_FN(vec) p = {left};",
        f"const @N@_FN(vec) q = {right};",
        *adds,
        f"k += {len(group)};",
    ]


def group_code(number: int, plan: Plan, radius: int) -> str:
    """C function that computes a group of products on one chunk."""
    group = plan.detail["product_groups"][number]
    if plan.detail["factors"][group[0]] is not None:
        return c_separable.group_code(number, plan, radius)
    basis = plan.detail["bases"][group[0]]
    height, width = plan.detail["coefficients"][group[0]].shape[-2:]
    every = plan.detail["planes"][group[0]] < 0
    second = " + @N@_LANES"
    if basis == "all":
        arguments, first = "const float *const *rows, ptrdiff_t at, float *t", radius - height // 2
        source = f"rows[{'m * @N@_SIZE + ' if every else ''}j] + at + x"
        pre: list[str] = []
        start = radius - width // 2
        values = ("@N@_LOAD(r + i)", f"@N@_LOAD(r{second} + i)")
    else:
        even_y, even_x = basis[0] == "e", basis[1] == "e"
        arguments = "const float *s, float *t"
        first = 0 if even_y else radius + 1
        source = "s + (ptrdiff_t)j * @N@_LINE + x + @N@_RADIUS"
        pre = _step(group, "@N@_LOAD(r)", f"@N@_LOAD(r{second})") if even_x else []
        start, width = 1, width - even_x
        sign = "+" if even_x else "-"
        values = (
            f"@N@_LOAD(r + i) {sign} @N@_LOAD(r - i)",
            f"@N@_LOAD(r{second} + i) {sign} @N@_LOAD(r{second} - i)",
        )
    loop = f"for (i = {start}; i < {start + width}; ++i) {{"
    inner = [loop, *_in(_step(group, *values)), "}"] if width else []  # or the middle one alone
    block = ["{", *_in(pre), "}"] if pre else []
    rows = [
        f"for (j = {first}; j < {first + height}; ++j) {{",
        f"    const float *const r = {source};",
        *_in(block),
        *_in(inner),
        "}",
    ]
    over_planes = ["for (m = 0; m < @N@_PLANES; ++m) {", *_in(rows), "}"] if every else rows
    body = [
        "int x;",
        "for (x = 0; x < @N@_CHUNK; x += 2 * @N@_LANES) {",
        f"    const float *k = @N@_group{number}_taps;",
        *(f"    @N@_FN(vec) a{n} = {{0.0f}}, b{n} = {{0.0f}};" for n in range(len(group))),
        f"    int {'m, ' if every else ''}j{', i' if inner else ''};",
        *_in(over_planes),
        *(
            f"    @N@_STORE(t + {p} * @N@_CHUNK + x{tail}, {v}{n});"
            for n, p in enumerate(group)
            for v, tail in (("a", ""), ("b", second))
        ),
        "}",
    ]
    head = f"static @N@_TARGET void @N@_FN(group{number})({arguments})"
    return f"/* {about(number, plan)} */\n{head}\n{{\n{lines(body, 4)}\n}}\n"


def _in(rows: list[str], by: int = 4) -> list[str]:
    return [" " * by + row for row in rows]


def _calls(plan: Plan, wanted: set[int]) -> list[str]:
    """Calls that compute the groups in which some of these products are."""
    chosen = [
        (plan.detail["planes"][group[0]], g, plan.detail["bases"][group[0]] == "all")
        for g, group in enumerate(plan.detail["product_groups"])
        if wanted.intersection(group)
    ]
    calls = []
    for plane in sorted({plane for plane, _, _ in chosen}):
        rows = f"rows + {plane} * @N@_SIZE" if plane > 0 else "rows"
        own = [(g, direct) for at, g, direct in chosen if at == plane]
        if not all(direct for _, direct in own):
            calls.append(f"@N@_FN(fold)({rows}, at, work);")
        calls += [
            f"@N@_FN(group{g})({rows}, at, t);" if direct else f"@N@_FN(group{g})(work, t);"
            for g, direct in own
        ]
    return calls


# ---------------------------------------------------------------- sums


def _join(terms: Any) -> tuple[str, list[str]]:
    """Where a kernel's response stands, and the calls that put it there."""
    if not terms:
        return "r", ["zero(r)"]
    at = [f"t + {p} * @N@_CHUNK" for p, _ in terms]
    if len(terms) == 1:
        return (at[0], []) if terms[0][1] > 0 else ("r", [f"negate(r, {at[0]})"])
    (_, first), (_, second), *rest = terms
    calls = []
    if first > 0:
        calls.append(f"{'add' if second > 0 else 'subtract'}(r, {at[0]}, {at[1]})")
    elif second > 0:
        calls.append(f"subtract(r, {at[1]}, {at[0]})")
    else:
        calls += [f"negate(r, {at[0]})", f"subtract(r, r, {at[1]})"]
    for (_, sign), where in zip(rest, at[2:], strict=True):
        calls.append(f"{'add' if sign > 0 else 'subtract'}(r, r, {where})")
    return "r", calls


_JOIN_TEXTS = {
    "negate": ("float *to, const float *a", "-@N@_LOAD(a + x)"),
    "add": ("float *to, const float *a, const float *b", "@N@_LOAD(a + x) + @N@_LOAD(b + x)"),
    "subtract": ("float *to, const float *a, const float *b", "@N@_LOAD(a + x) - @N@_LOAD(b + x)"),
}


_ZERO_TEXT = """\
static @N@_TARGET void @N@_FN(zero)(float *to)
{
    memset(to, 0, @N@_CHUNK * sizeof(float));
}

"""


def joins(plan: Plan) -> str:
    """The joining functions that this bank needs, and no others."""
    used = {call.split("(")[0] for k in by_rows(plan) for call in _join(plan.detail["sums"][k])[1]}
    return (_ZERO_TEXT if "zero" in used else "") + "".join(
        f"static @N@_TARGET void @N@_FN({word})({arguments})\n{{\n    int x;\n"
        f"    for (x = 0; x < @N@_CHUNK; x += @N@_LANES) @N@_STORE(to + x, {value});\n}}\n\n"
        for word, (arguments, value) in _JOIN_TEXTS.items()
        if word in used
    )


def by_rows(plan: Plan) -> list[int]:
    """Kernels that are computed row by row; the others go by transforms or half resolution."""
    others = {k for way in ("fft", "halved") if plan.detail[way] for k in plan.detail[way].kernels}
    return [k for k in range(len(plan.detail["sums"])) if k not in others]


def needed(plan: Plan) -> set[int]:
    """Products that the code uses: those of strengths, and of responses computed row by row."""
    members = {k for scale in plan.detail["strength"] for _, *pair in scale for k in pair}
    kernels = members.union(by_rows(plan)) - {None}
    return {p for k in kernels for p, _ in plan.detail["sums"][k]}


def used_groups(plan: Plan) -> list[int]:
    """Groups of products that the code uses."""
    wanted = needed(plan)
    return [g for g, group in enumerate(plan.detail["product_groups"]) if wanted & set(group)]


def responses(plan: Plan) -> str:
    """Body of the C function that writes every plane of a chunk."""
    kernels = by_rows(plan)
    wanted = {p for k in kernels for p, _ in plan.detail["sums"][k]}
    body = ["float *const t = work + @N@_FOLDED; /* products */"]
    if any(_join(plan.detail["sums"][k])[0] == "r" for k in kernels):
        body.append(f"float *const r = t + {len(plan.detail['bases'])} * @N@_CHUNK; /* a sum */")
    body += _calls(plan, wanted)
    for k in kernels:
        terms = plan.detail["sums"][k]
        where, calls = _join(terms)
        body += [f"@N@_FN({call.replace('(', ')(', 1)};" for call in calls]
        target = f"(float *)(void *)(out + {k} * plane)"
        body.append(f"@N@_FN(put)({where}, {target}, n, stream);")
    if not wanted:
        body += ["(void)rows;", "(void)at;"]
    if not kernels:
        body += ["(void)t;", "(void)out;", "(void)plane;", "(void)stream;", "(void)n;"]
    return lines(body, 4)


# ---------------------------------------------------------------- edges


TAKE = {
    "TAKE_16": """\
#define @N@_TAKE(v, turn)                                                            \\
    do {                                                                             \\
        const __mmask16 m = _mm512_cmp_ps_mask((__m512)(v), (__m512)best, _CMP_GT_OQ); \\
        best = (@N@_FN(vec))_mm512_mask_mov_ps((__m512)best, m, (__m512)(v));        \\
        who = (@N@_FN(vec))_mm512_mask_mov_ps((__m512)who, m, _mm512_set1_ps(turn)); \\
    } while (0)
""",
    "TAKE_8": """\
#define @N@_TAKE(v, turn)                                                            \\
    do {                                                                             \\
        const __m256 m = _mm256_cmp_ps((__m256)(v), (__m256)best, _CMP_GT_OQ);       \\
        best = (@N@_FN(vec))_mm256_blendv_ps((__m256)best, (__m256)(v), m);          \\
        who = (@N@_FN(vec))_mm256_blendv_ps((__m256)who, _mm256_set1_ps(turn), m);   \\
    } while (0)
""",
    "TAKE_ANY": """
/* Keep the largest value so far and whose it is; among equals the first stays. */
#if @N@_LANES == 1
#define @N@_TAKE(v, turn)        \\
    do {                         \\
        if ((v) > best) {        \\
            best = (v);          \\
            who = (turn);        \\
        }                        \\
    } while (0)
#define @N@_ABS(v) ((v) < 0.0f ? -(v) : (v))
#else
typedef int @N@_FN(bits) __attribute__((vector_size(4 * @N@_LANES)));
#ifndef @N@_TAKE
#define @N@_TAKE(v, turn)                                                            \\
    do {                                                                             \\
        const @N@_FN(bits) m = (v) > best;                                           \\
        const @N@_FN(vec) t_ = (v) - (v) + (turn);                                   \\
        best = (@N@_FN(vec))(((@N@_FN(bits))(v) & m) | ((@N@_FN(bits))best & ~m));   \\
        who = (@N@_FN(vec))(((@N@_FN(bits))t_ & m) | ((@N@_FN(bits))who & ~m));      \\
    } while (0)
#endif
#define @N@_ABS(v) ((@N@_FN(vec))((@N@_FN(bits))(v) & 0x7fffffff))
#endif
""",
}
"""Keeping the winner, by instruction set; left out of a bank without a strength."""


def expression(terms: Any) -> str:
    """A kernel's response at x."""
    text = "".join(
        f"{' + ' if s > 0 else ' - '}@N@_LOAD(t + {p} * @N@_CHUNK + x)" for p, s in terms
    )
    return text[3:] if text.startswith(" + ") else text.strip() or "zero"


def _magnitude(plan: Plan, member: Any) -> list[str]:
    """Statements that leave an orientation's absolute response, or squared energy, in v."""
    _, even, odd = member
    sums = plan.detail["sums"]
    if even is None or odd is None:
        only = expression(sums[odd if even is None else even])
        return [f"v = {only};", "v = @N@_ABS(v);"]
    return [
        f"e = {expression(sums[even])};",
        f"o = {expression(sums[odd])};",
        "v = e * e + o * o;",
    ]


def edges(bank: Bank, plan: Plan, scale: int) -> str:
    """C function for the strength and the winner of one scale on one chunk."""
    body = [
        *_edge_work(plan),
        "int x;",
        *_calls(plan, _of_scale(plan, scale)),
        *_winner(bank, plan, scale, "strength", "orientation"),
    ]
    if not _of_scale(plan, scale):
        body += ["(void)rows;", "(void)at;"]
    return (
        f"/* Strength and winner of scale {scale}. */\n"
        f"static @N@_TARGET void @N@_FN(edges{scale})(const float *const *rows, ptrdiff_t at,\n"
        "    int n, float *work, float *strength, unsigned char *orientation)\n"
        f"{{\n{lines(body, 4)}\n}}\n\n"
    )


def every_edge(bank: Bank, plan: Plan) -> str:
    """C function for the strengths and the winners of all scales on one chunk."""
    scales = range(len(plan.detail["strength"]))
    wanted = {p for scale in scales for p in _of_scale(plan, scale)}
    body = [*_edge_work(plan), "int x;", *_calls(plan, wanted)]
    for scale in scales:
        strength = f"(float *)(void *)(strength + {scale} * plane)"
        body += _winner(bank, plan, scale, strength, f"(orientation + {scale} * turns)")
    if not wanted:
        body += ["(void)rows;", "(void)at;"]
    return (
        "/* Strengths and winners of all scales. */\n"
        "static @N@_TARGET void @N@_FN(edges_all)(const float *const *rows, ptrdiff_t at, int n,\n"
        "    float *work, char *strength, ptrdiff_t plane, unsigned char *orientation,\n"
        f"    ptrdiff_t turns)\n{{\n{lines(body, 4)}\n}}\n\n"
    )


def _of_scale(plan: Plan, scale: int) -> set[int]:
    """Products that a scale's strength is made of."""
    pairs = [pair for _, *pair in plan.detail["strength"][scale]]
    kernels = [k for pair in pairs for k in pair if k is not None]
    return {p for k in kernels for p, _ in plan.detail["sums"][k]}


def _edge_work(plan: Plan) -> list[str]:
    return [
        "float *const t = work + @N@_FOLDED; /* products */",
        f"float *const top = t + {len(plan.detail['bases'])} * @N@_CHUNK;",
        "float *const winner = top + @N@_CHUNK;",
    ]


def _winner(bank: Bank, plan: Plan, scale: int, strength: str, orientation: str) -> list[str]:
    """Statements that find the largest response of a scale and send it to the caller."""
    members = plan.detail["strength"][scale]
    kernels = [i for _, even, odd in members for i in (even, odd) if i is not None]
    energy = bank.strength == "energy"
    loop = [*_magnitude(plan, members[0]), "best = v;"]
    for member in members[1:]:
        loop += [*_magnitude(plan, member), f"@N@_TAKE(v, {member[0]}.0f);"]
    empty = any(not plan.detail["sums"][k] for k in kernels)
    return [
        "for (x = 0; x < @N@_CHUNK; x += @N@_LANES) {",
        f"    @N@_FN(vec) v, best{', e, o' if energy else ''}, who = {{0.0f}};",
        *(["    const @N@_FN(vec) zero = {0.0f};"] if empty else []),
        *([f"    who += {members[0][0]}.0f;"] if members[0][0] else []),
        *_in(loop),
        "    @N@_STORE(top + x, best);",
        "    @N@_STORE(winner + x, who);",
        "}",
        *(["for (x = 0; x < @N@_CHUNK; ++x) top[x] = sqrtf(top[x]);"] if energy else []),
        f"memcpy({strength}, top, (size_t)n * sizeof(float));",
        f"for (x = 0; x < n; ++x) {orientation}[x] = (unsigned char)winner[x];",
    ]
