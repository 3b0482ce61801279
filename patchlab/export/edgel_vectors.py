"""Test vectors of edgels: pictures whose elements no rounding of the responses can change.

Which pixels hold an element is decided by comparing responses. A picture serves when Python
finds the same elements on the exact responses and on ones that are off by as much as a
target's may be; then every target has to find them, within a tolerance of their place.
"""

from __future__ import annotations

import json
import math
from collections.abc import Callable, Iterator
from dataclasses import dataclass
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.conventions import rng
from patchlab.errors import InputError, VerificationError
from patchlab.export.compare import Check, Target, failed, judged
from patchlab.export.vectors import Oracle, Pixels, magnitudes, middle
from patchlab.store import npy_bytes
from patchlab.types import EDGEL, F32, F64, Bank, Bundle, Plan

EdgelFinder = Callable[[Pixels, F32, float, float], NDArray[np.void]]
"""Pixels, their responses, threshold, threshold for lines (0: none): Python's own edgels."""

COLUMNS = ("x", "y", "theta", "strength", "sd", "scale", "kind", "width")
TOLERANCE_PX = 2e-3
"""How far a place may be from that on exact responses: a fit settles to about a tenth of this."""
SAME_PX = 1e-6
"""How far from Python's on the very same responses, beside one rounding to float32."""
DRAWS = 12
"""Pictures that are tried until one serves."""


@dataclass(frozen=True, eq=False)
class EdgelCase:
    """One picture and its edgels.

    Parameters
    ----------
    name, what : for files and for people
    pixels : (h, w) of the contract's dtype
    threshold, line_threshold : what was asked for; 0 means not that kind
    expected : structured array of :data:`patchlab.types.EDGEL`
    """

    name: str
    what: str
    pixels: Pixels
    threshold: float
    line_threshold: float
    expected: NDArray[np.void]


def make_edgel_cases(
    bank: Bank,
    plan: Plan,
    oracle: Oracle,
    find: EdgelFinder,
    *,
    threshold: float | None = None,
    line_threshold: float | None = None,
    crop: Pixels | None = None,
) -> tuple[EdgelCase, ...]:
    """Pictures with the edgels that a bank finds in them.

    Parameters
    ----------
    bank, plan : the plan's ``error_bound`` is what responses may be off by
    oracle : callable, float64 responses
    find : callable, Python's own edgels
    threshold, line_threshold : strengths; None takes a third of the largest in the picture, and
        0 for lines looks for none
    crop : a piece of a real picture in the bank's pixels; its middle is used

    Returns
    -------
    tuple of EdgelCase : a drawn scene of a step, a disk and a bar in noise, and the crop; a
        picture in which a rounding could change what is found is left out
    """
    cases = []
    for draw in range(DRAWS):
        case = _case(bank, plan, oracle, find, "scene", _scene(bank, draw), threshold,
                     line_threshold)  # fmt: skip
        if case is not None:
            cases.append(case)
            break
    if crop is not None and min(crop.shape) >= bank.size + 16:
        piece = np.ascontiguousarray(middle(crop, max(72, bank.size + 16)))
        case = _case(bank, plan, oracle, find, "piece", piece, threshold, line_threshold)
        cases += [case] if case is not None else []
    return tuple(cases)


_WHAT = {"scene": "a step, a disk and a bar in noise", "piece": "a piece of a picture"}


def _case(
    bank: Bank,
    plan: Plan,
    oracle: Oracle,
    find: EdgelFinder,
    name: str,
    pixels: Pixels,
    threshold: float | None,
    line_threshold: float | None,
) -> EdgelCase | None:
    """A case, or None for a picture in which roundings decide, or that holds next to nothing."""
    exact = np.asarray(oracle(bank, pixels), dtype=np.float64)
    high = _third(bank, exact) if threshold is None else threshold
    lines = high if line_threshold is None else line_threshold
    expected = find(pixels, exact.astype(np.float32), high, lines)
    if len(expected) < 4:
        return None
    bound = np.array(plan.error_bound)[:, None, None]
    for k in range(4):
        off = rng(0, "edgels", f"{name} {k}").choice([-1.0, 1.0], exact.shape)
        other = find(pixels, (exact + off * bound).astype(np.float32), high, lines)
        if not _place_error(other, expected) <= TOLERANCE_PX / 4:
            return None
    return EdgelCase(name, _WHAT[name], pixels, high, lines, expected)


def _third(bank: Bank, responses: F64) -> float:
    """A third of the largest strength."""
    return max(float(magnitudes(bank, responses, s).max()) for s in bank.scales) / 3


def _scene(bank: Bank, draw: int) -> Pixels:
    """A blurred step, a disk and a bar with noise, of no symmetry, in the bank's pixels."""
    h, w = bank.size + 17, bank.size + 22
    y, x = np.mgrid[:h, :w].astype(np.float64)
    # logistic edges: their blur is near 0.8 px
    step = 1 / (1 + np.exp(-2.2 * (0.94 * x + 0.34 * y - 0.47 * w)))
    disk = 1 / (1 + np.exp(2.2 * (np.hypot(x - 0.7 * w, y - 0.62 * h) - 5.3)))
    bar = np.exp(-(((0.31 * x - 0.95 * y + 0.55 * h) / 1.1) ** 2) / 2)
    noise = rng(0, "edgels", f"scene {draw}").normal(0, 0.004, (h, w))
    light = np.clip(0.25 + 0.3 * step + 0.2 * disk - 0.12 * bar + noise, 0, 1)
    form, contract = bank.contract.format, bank.contract
    codes = contract.black + light * (contract.white - contract.black)
    return np.asarray((np.rint(codes) if form.integer else codes).astype(form.dtype))


# ---------------------------------------------------------------- files


def edgel_files(cases: tuple[EdgelCase, ...]) -> tuple[Bundle, list[dict[str, Any]]]:
    """Cases as ``.npy`` files under ``vectors/``, and their entries for ``cases.json``."""
    files, entries = {}, []
    for case in cases:
        names = {word: f"edgels_{case.name}.{word}.npy" for word in ("image", "edgels")}
        columns = np.stack([case.expected[c].astype(np.float64) for c in COLUMNS], axis=1)
        files[f"vectors/{names['image']}"] = npy_bytes(case.pixels)
        files[f"vectors/{names['edgels']}"] = npy_bytes(columns)
        about = {"name": case.name, "what": case.what, "threshold": case.threshold,
                 "line_threshold": case.line_threshold}  # fmt: skip
        entries.append({**about, **names})
    return files, entries


def load_edgel_cases(read: Callable[[str], bytes], array: Any) -> tuple[EdgelCase, ...]:
    """Read the cases that :func:`edgel_files` made.

    Parameters
    ----------
    read : callable, relative path to bytes; should check the hash
    array : callable, bytes to a plain array

    Raises
    ------
    InputError : a damaged list or array.
    """
    try:
        head = json.loads(read("vectors/cases.json"))
        cases = []
        for entry in head.get("edgels", {}).get("cases", []):
            columns = array(read(f"vectors/{entry['edgels']}"))
            expected = np.zeros(len(columns), EDGEL)
            for name, column in zip(COLUMNS, columns.T, strict=True):
                expected[name] = column
            cases.append(
                EdgelCase(
                    str(entry["name"]), str(entry["what"]),
                    array(read(f"vectors/{entry['image']}")), float(entry["threshold"]),
                    float(entry["line_threshold"]), expected,
                )
            )  # fmt: skip
    except (KeyError, TypeError, ValueError, AttributeError) as error:
        raise InputError(f"damaged edgel vectors: {error}", where="vectors/cases.json") from None
    return tuple(cases)


# ---------------------------------------------------------------- comparing


def _place_error(got: NDArray[np.void], expected: NDArray[np.void]) -> float:
    """Largest distance of places; infinite when they are not the same elements."""
    if len(got) != len(expected):
        return math.inf
    if any((got[c] != expected[c]).any() for c in ("scale", "kind")):
        return math.inf
    dx, dy = (got[c].astype(np.float64) - expected[c] for c in ("x", "y"))
    return float(np.hypot(dx, dy).max(initial=0.0))


def edgel_checks(
    target: Target, cases: tuple[EdgelCase, ...], find: EdgelFinder | None
) -> Iterator[Check]:
    """A target's edgels against the stored ones, and against Python's on its own responses."""
    if target.edgels is None or target.responses is None or not cases:
        return
    note = f"{len(cases)} pictures, {sum(len(c.expected) for c in cases)} edgels"
    stored = same = rounding = 0.0
    try:
        for case in cases:
            got = target.edgels(case.pixels, case.threshold, case.line_threshold)
            if got.dtype != EDGEL:
                raise VerificationError(f"edgels are {got.dtype}, not {EDGEL}")
            stored = max(stored, _place_error(got, case.expected))
            rounding = max(rounding, float(np.spacing(np.float32(max(case.pixels.shape)))))
            if find is not None:
                responses = target.responses(case.pixels)
                mine = find(case.pixels, responses, case.threshold, case.line_threshold)
                same = max(same, _place_error(got, mine))
    except Exception as error:  # a target is foreign code: nothing it does may end the run
        yield failed(target.name, "edgels", f"{case.name}: {error}")
        return
    yield judged(target.name, "edgels, px", stored, TOLERANCE_PX, note)
    if find is not None:
        bound = SAME_PX + rounding
        yield judged(target.name, "edgels, px from Python's", same, bound, note)
