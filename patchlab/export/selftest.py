"""The C self-test of a bank: small cases with their expected values in the source.

It proves, on the machine it runs on, that the compiled bank equals the float64
reference within the stated tolerances, that bands, odd strides and pictures
stored bottom-up give the same bits, and that wrong arguments are refused.
"""

from __future__ import annotations

from collections.abc import Sequence
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.errors import UsageError
from patchlab.export.c_colour import steps
from patchlab.export.c_text import (
    double_literal,
    fill,
    identifier,
    licence,
    lines,
    numbers,
    template,
)
from patchlab.export.edgel_vectors import COLUMNS, TOLERANCE_PX, EdgelCase
from patchlab.types import Bank, Plan

Case = tuple[str, NDArray[Any], NDArray[np.float64], NDArray[np.float64]]
"""A name, pixels (h, w), expected responses (n, h, w), tolerance of each kernel (n,)."""


def emit_selftest(
    bank: Bank, plan: Plan, cases: Sequence[Case], edgels: EdgelCase | None = None
) -> dict[str, bytes]:
    """The self-test program of a bank.

    Parameters
    ----------
    bank : Bank
    plan : Plan made from it
    cases : pictures with their float64 responses and the tolerance of each kernel; names are
        C identifiers
    edgels : a picture with its edgels; None leaves ``NAME_edgels`` untried

    Returns
    -------
    dict : ``NAME_selftest.c``; the program prints one line a check and returns 0 when all hold

    Raises
    ------
    UsageError : no case, a name that is not an identifier, or arrays that do not fit the bank.
    """
    if not cases:
        raise UsageError("a self-test needs at least one case")
    for case in cases:
        _check_case(bank, case)
    fixed = plan.detail["fixed"]
    text = fill(
        template("selftest.c.in"),
        {
            "N": bank.name,
            "LICENCE": licence(" * "),
            "COUNT": len(bank),
            "SIZE": bank.size,
            "ARRAYS": "\n".join(
                _arrays(i, case, bank.name) + _counts(i, case, fixed)
                for i, case in enumerate(cases)
            ),
            "CASES": ",\n".join(_entry(i, case, fixed) for i, case in enumerate(cases)),
            **steps(bank),
            "FIXED": _fixed_text(bank, fixed),
            "CHECK_FIXED": _CHECK_FIXED.replace("@N@", bank.name) if fixed is not None else "",
            "EDGELS": _edgels_text(bank, edgels),
            "CHECK_EDGELS": "    check_all_edgels();\n" if edgels is not None else "",
            "CASE_COUNT": len(cases),
            "MEMBERS": _members(plan),
            "MEMBER_COUNT": max(sum(len(s) for s in plan.detail["strength"]), 1),
            **_bad_code_texts(bank),
        },
    )
    return {f"{bank.name}_selftest.c": text}


def _check_case(bank: Bank, case: Case) -> None:
    name, pixels, expected, tolerance = case
    identifier(name, "case name")
    form = bank.contract.format
    size = form.size_of(pixels)
    fits = (
        pixels.ndim == (3 if form.interleaved else 2)
        and pixels.dtype == np.dtype(form.dtype)
        and min(size) >= bank.size
        and expected.shape == (len(bank), *size)
        and tolerance.shape == (len(bank),)
    )
    if not fits:
        raise UsageError("the arrays of this case do not fit the bank", where=name)


def _bad_code(bank: Bank) -> int | None:
    """A pixel code that the format forbids and its container allows, or None."""
    form = bank.contract.format
    if not form.integer or form.full_scale == np.iinfo(form.dtype).max:
        return None
    return form.full_scale + 1


def _bad_code_texts(bank: Bank) -> dict[str, object]:
    bad = _bad_code(bank)
    return {"BAD_CODE": f"{bad}u" if bad else "0", "HAS_BAD_CODE": int(bad is not None)}


def _edgels_text(bank: Bank, case: EdgelCase | None) -> str:
    """The part of the program that tries the edgels."""
    if case is None:
        return ""
    h, w = case.pixels.shape
    columns = np.stack([case.expected[c].astype(np.float64) for c in COLUMNS], axis=1)
    rows = ",\n".join(f"    {{{', '.join(double_literal(v) for v in row)}}}" for row in columns)
    text = [
        f"static const {bank.name}_pixel edgel_pixels[{case.pixels.size}] = {{",
        numbers(case.pixels),
        "};",
        f"static const double edgels_expected[{len(columns)}][8] = {{\n{rows}\n}};",
        f"static const struct edgel_case edgel_picture = {{{w}, {h}, edgel_pixels, "
        f"{double_literal(case.threshold)}, {double_literal(case.line_threshold)},",
        f"    {len(columns)}, edgels_expected}};",
    ]
    values = {"N": bank.name, "SIZE": bank.size, "EDGEL_ARRAYS": lines(text),
              "TOLERANCE": double_literal(TOLERANCE_PX), "LINES": int(case.line_threshold > 0),
              **_bad_code_texts(bank)}  # fmt: skip
    return fill(template("selftest_edgels.c.in"), values).decode()


def _arrays(number: int, case: Case, name: str) -> str:
    _, pixels, expected, tolerance = case
    rows = [
        f"static const {name}_pixel pixels{number}[{pixels.size}] = {{\n{numbers(pixels)}\n}};",
        f"static const double expected{number}[{expected.size}] = {{",
        numbers(np.asarray(expected, dtype=np.float64)),
        "};",
        f"static const double tolerance{number}[{tolerance.size}] = {{",
        numbers(np.asarray(tolerance, dtype=np.float64)),
        "};",
    ]
    return lines(rows) + "\n"


_CHECK_FIXED = """\
        check_fixed(c, scratch + 1);
        for (scale = 0; scale < @N@_SCALE_COUNT; ++scale) {
            check_edges(c, @N@_edges_q, fixed_tolerance, scale, scratch + 1);
        }
        if (i == 0) check_fixed_refusals(c, scratch + 1);
"""


def _fixed_text(bank: Bank, fixed: Any) -> str:
    if fixed is None:
        return ""
    tolerance = numbers(np.array(fixed.bound, dtype=np.float64))
    values = {"N": bank.name, "COUNT": len(bank), "Q_TOLERANCE": tolerance}
    return fill(template("selftest_fixed.c.in"), values).decode()


def _counts(number: int, case: Case, fixed: Any) -> str:
    """The fixed-point counts of a case, exactly."""
    if fixed is None:
        return ""
    counts, _ = fixed.counts(case[1])
    return f"static const int16_t counts{number}[{counts.size}] = {{\n{numbers(counts)}\n}};\n"


def _entry(number: int, case: Case, fixed: Any) -> str:
    h, w = case[2].shape[1:]
    counts = "NULL, 0" if fixed is None else f"counts{number}, {fixed.counts(case[1])[1]}"
    arrays = f"pixels{number}, expected{number}, tolerance{number}, {counts}"
    return f'    {{"{case[0]}", {w}, {h}, {arrays}}}'


def _members(plan: Plan) -> str:
    """Rows of (scale, orientation, even kernel, odd kernel), -1 where there is none."""
    rows = [
        f"    {{{scale}, {turn}, {-1 if even is None else even}, {-1 if odd is None else odd}}}"
        for scale, members in enumerate(plan.detail["strength"])
        for turn, even, odd in members
    ]
    return ",\n".join(rows) or "    {-1, 0, -1, -1}"
