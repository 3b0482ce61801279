"""Real Fourier transforms as straight C: written out by recursion, only what is needed.

Decimation in time forward, its mirror image backward; every operation works on a vector
of neighbouring columns.
"""

from __future__ import annotations

import math
import re
from typing import Any

import numpy as np

from patchlab.export.c_text import float_literal, lines, numbers, template
from patchlab.types import Plan

LENGTH = 64
BINS = LENGTH // 2 + 1
Complex = tuple[str, str]


class _Code:
    """Statements, one value a name; a value is written when it is first asked for."""

    def __init__(self) -> None:
        self.rows: list[str] = []

    def name(self, expression: str) -> str:
        name = f"v{len(self.rows)}"
        self.rows.append(f"const @N@_FN(vec) {name} = {expression};")
        return name

    def text(self) -> str:
        """The statements, without values that nothing asks for."""
        kept: list[str] = []
        asked: set[str] = set()
        for row in reversed(self.rows):
            known = re.match(r"const \S+ (v\d+) = ", row)
            if known is None or known[1] in asked:
                asked.update(re.findall(r"\bv\d+\b", row))
                kept.append(row)
        return lines(reversed(kept), 4)

    def turned(self, real: str, imaginary: str, angle: float) -> Complex:
        """A complex value times exp(i angle)."""
        c, s = math.cos(angle), math.sin(angle)
        return (
            self.name(
                f"@N@_FN(turn)({real}, {imaginary}, {float_literal(c)}, {float_literal(-s)})"
            ),
            self.name(f"@N@_FN(turn)({imaginary}, {real}, {float_literal(c)}, {float_literal(s)})"),
        )


def _forward(code: _Code, rows: list[int]) -> list[Complex]:
    """Bins 0 .. n/2 of the rows; the first and the last are real ("" stands for zero)."""
    n = len(rows)
    if n == 1:
        return [(code.name(f"@N@_LOAD(x + {rows[0]} * @N@_FFT_ROW)"), "")]
    even, odd = _forward(code, rows[0::2]), _forward(code, rows[1::2])
    found: list[Complex] = [("", "")] * (n // 2 + 1)
    found[0] = code.name(f"{even[0][0]} + {odd[0][0]}"), ""
    found[n // 2] = code.name(f"{even[0][0]} - {odd[0][0]}"), ""
    for k in range(1, n // 4):
        a, b = code.turned(*odd[k], -2 * math.pi * k / n)
        found[k] = code.name(f"{even[k][0]} + {a}"), code.name(f"{even[k][1]} + {b}")
        found[n // 2 - k] = code.name(f"{even[k][0]} - {a}"), code.name(f"{b} - {even[k][1]}")
    if n >= 4:
        found[n // 4] = even[n // 4][0], code.name(f"-{odd[n // 4][0]}")
    return found


def _backward(code: _Code, bins: list[Complex], rows: list[int], wanted: int) -> None:
    """Rows of the inverse transform, times its length; rows from ``wanted`` on are left out."""
    n = len(rows)
    if min(rows) >= wanted:
        return
    if n == 1:
        code.rows.append(f"@N@_STORE(x + {rows[0]} * @N@_CHUNK, {bins[0][0]});")
        return
    half = n // 2
    even: list[Complex] = [(code.name(f"{bins[0][0]} + {bins[half][0]}"), "")]
    odd: list[Complex] = [(code.name(f"{bins[0][0]} - {bins[half][0]}"), "")]
    for k in range(1, n // 4):
        (a, b), (c, d) = bins[k], bins[half - k]
        even.append((code.name(f"{a} + {c}"), code.name(f"{b} - {d}")))
        odd.append(
            code.turned(code.name(f"{a} - {c}"), code.name(f"{b} + {d}"), 2 * math.pi * k / n)
        )
    if n >= 4:
        a, b = bins[n // 4]
        even.append((code.name(f"{a} + {a}"), ""))
        odd.append((code.name(f"-({b} + {b})"), ""))
    _backward(code, even, rows[0::2], wanted)
    _backward(code, odd, rows[1::2], wanted)


def _forward_text() -> str:
    code = _Code()
    found = _forward(code, list(range(LENGTH)))
    zero = code.name(f"{found[0][0]} - {found[0][0]}")
    for f, (a, b) in enumerate(found):
        code.rows += [
            f"@N@_STORE(s + {2 * f} * @N@_LINE, {a});",
            f"@N@_STORE(s + {2 * f + 1} * @N@_LINE, {b or zero});",
        ]
    return code.text()


def _backward_text(wanted: int) -> str:
    code = _Code()
    bins = [
        (
            code.name(f"@N@_LOAD(s + {2 * f} * @N@_CHUNK)"),
            code.name(f"@N@_LOAD(s + {2 * f + 1} * @N@_CHUNK)") if 0 < f < BINS - 1 else "",
        )
        for f in range(BINS)
    ]
    _backward(code, bins, list(range(LENGTH)), wanted)
    return code.text()


def _product_text(vectors: int) -> str:
    """Sums over the columns of two kernels for one bin, some vectors at a time."""
    every = [(k, n) for k in (0, 1) for n in range(vectors)]
    body = [
        f"for (x = 0; x < @N@_CHUNK; x += {vectors} * @N@_LANES) {{",
        "    const float *k = taps;",
        "    int i;",
        *(f"    @N@_FN(vec) a{k}{n} = {{0.0f}}, b{k}{n} = {{0.0f}};" for k, n in every),
        "    for (i = 0; i < @N@_FFT_SIZE; ++i, k += 4) {",
        "        const float *const re = s + @N@_FFT_FIRST + x + i, *const im = re + @N@_LINE;",
    ]
    for n in range(vectors):
        body.append("        {")
        body.append(f"            const @N@_FN(vec) p = @N@_LOAD(re + {n} * @N@_LANES);")
        body.append(f"            const @N@_FN(vec) q = @N@_LOAD(im + {n} * @N@_LANES);")
        for k in (0, 1):
            body += [
                f"            @N@_MUL_ADD(a{k}{n}, p, k[{2 * k}]);",
                f"            @N@_MUL_ADD(b{k}{n}, q, k[{2 * k}]);",
                f"            @N@_MUL_SUB(a{k}{n}, q, k[{2 * k + 1}]);",
                f"            @N@_MUL_ADD(b{k}{n}, p, k[{2 * k + 1}]);",
            ]
        body.append("        }")
    body.append("    }")
    for k, n in every:
        to = f"r + {k} * @N@_FFT_BINS * @N@_CHUNK + x + {n} * @N@_LANES"
        body += [
            f"    @N@_STORE({to}, a{k}{n});",
            f"    @N@_STORE({to} + @N@_CHUNK, b{k}{n});",
        ]
    return lines([*body, "}"], 4)


def sections(plan: Plan, radius: int, chunk: int, line: int) -> dict[str, str]:
    """The texts for the templates; all empty for a plan without tile transforms."""
    tiles = plan.detail.get("fft")
    if tiles is None:
        return dict.fromkeys(("FFT_VECTOR", "FFT", "FFT_DATA", "FFT_SCRATCH", "FFT_CALL"), "")
    count = len(tiles.kernels)
    parts = {
        "FORWARD": _forward_text(),
        "BACKWARD": _backward_text(tiles.rows),
        "PRODUCT_4": _product_text(4),
        "PRODUCT_2": _product_text(2),
        "KERNELS": ", ".join(map(str, tiles.kernels)),
    }
    row = chunk + line
    work = LENGTH * row + 2 * BINS * (line + 2 * chunk) + tiles.rows * chunk
    return {
        "FFT_VECTOR": _put(template("fft_vector.c.in"), parts),
        "FFT": _put(template("fft.c.in"), parts),
        "FFT_CALL": "    if (code == @N@_OK || code == @N@_BAD_PIXEL) {\n"
        "        const int other = @N@_walk_fft(&p, &job, first_row, row_count, scratch);\n"
        "        if (other != @N@_OK) code = other;\n    }\n",
        "FFT_SCRATCH": "    if (@N@_FFT_SCRATCH > bytes) bytes = @N@_FFT_SCRATCH;\n",
        "FFT_DATA": lines([
            f"#define @N@_FFT_COUNT {count} /* kernels by tile transforms */",
            f"#define @N@_FFT_SIZE {tiles.size}",
            f"#define @N@_FFT_FIRST {radius - tiles.size // 2}",
            f"#define @N@_FFT_LENGTH {LENGTH} /* rows of a block */",
            f"#define @N@_FFT_VALID {tiles.rows} /* rows of its output */",
            f"#define @N@_FFT_BINS {2 * BINS} /* real numbers of a spectrum */",
            f"#define @N@_FFT_ROW {row} /* floats of a row of a block */",
            f"#define @N@_FFT_SCRATCH ({work} * sizeof(float) + 64)",
            "",
            "/* Spectra of the kernels' columns, two kernels together: by bin, column, kernel. */",
            f"static const float @N@_spectra[{_paired(tiles).size}] = {{",
            numbers(_paired(tiles)),
            "};",
            "",
        ]),
    }  # fmt: skip


def _paired(tiles: Any) -> Any:
    spectra = tiles.spectra
    if len(spectra) % 2:
        spectra = np.concatenate([spectra, np.zeros_like(spectra[:1])])
    pairs = spectra.reshape(-1, 2, *spectra.shape[1:])
    return np.ascontiguousarray(pairs.transpose(0, 2, 3, 1, 4))


def _put(text: str, parts: dict[str, str]) -> str:
    for token, value in parts.items():
        text = text.replace(f"@{token}@", value)
    return text
