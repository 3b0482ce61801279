"""What is compared when a bank is verified, and how close it must come.

A target is one way to compute a bank. Its float32 responses may be as far from the
exact ones as its proven bound says, kernel by kernel, the interior and the border
apart. Strength moves no further than the responses; the winning orientation must
be one whose exact strength is within twice that of the best.
"""

from __future__ import annotations

import math
from collections.abc import Callable, Iterator
from dataclasses import dataclass, field
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.errors import VerificationError
from patchlab.export.vectors import (
    Case,
    Pixels,
    edges_lacking,
    magnitudes,
    orientations,
    strength_tolerance,
)
from patchlab.types import F32, F64, Bank, Plan

Responses = Callable[[Pixels], F32]
"""(h, w) pixels to float32 (n, h, w)."""
Edges = Callable[[Pixels, int], tuple[F32, NDArray[np.uint8]]]
"""(h, w) pixels and a place in ``bank.scales`` to float32 strength and uint8 orientation."""

Edgels = Callable[[Pixels, float, float], NDArray[np.void]]
"""(h, w) pixels, threshold, threshold for lines (0: none) to edgels."""


@dataclass(frozen=True)
class Target:
    """One way to compute a bank.

    Parameters
    ----------
    name : for people
    responses, edges : callables, or None where it has none
    bounds : largest error allowed for each kernel; None means the plan's
    edgels : callable, edge elements, or None where it has none
    slow : run it on small pictures only
    not_run : why it cannot be run here ("" when it can)
    also : further ways that came with this one
    """

    name: str
    responses: Responses | None = None
    edges: Edges | None = None
    bounds: tuple[float, ...] | None = None
    slow: bool = False
    not_run: str = ""
    also: tuple[Target, ...] = ()
    edgels: Edgels | None = None


@dataclass(frozen=True)
class Check:
    """One comparison. ``passed`` is None when it was not run; ``note`` says why.

    ``worst_error`` and ``bound`` belong to the kernel (or scale) that comes nearest to its
    bound; ``ratio`` is the one over the other.
    """

    target: str
    what: str
    worst_error: float
    bound: float
    ratio: float
    passed: bool | None
    note: str = ""


@dataclass(frozen=True)
class Verification:
    """All checks of one bank, in the order they were made."""

    checks: tuple[Check, ...]

    @property
    def passed(self) -> bool:
        """True when nothing failed and at least one target was run on responses."""
        ran = [c for c in self.checks if c.passed is not None]
        compared = any(c.what.startswith("responses") for c in ran)
        return compared and all(c.passed for c in ran)

    @property
    def failed(self) -> tuple[Check, ...]:
        """The checks that did not hold."""
        return tuple(c for c in self.checks if c.passed is False)

    @property
    def worst(self) -> Check | None:
        """The response check nearest to its bound."""
        ran = [c for c in self.checks if c.passed is not None and c.what.startswith("responses")]
        return max(ran, key=lambda c: c.ratio, default=None)

    def error(self) -> VerificationError | None:
        """What a caller raises: None when all held."""
        if self.passed:
            return None
        if not self.failed:
            return VerificationError("no target of this bank could be run")
        first = self.failed[0]
        more = f" (and {len(self.failed) - 1} more)" if len(self.failed) > 1 else ""
        what = f"{first.target}, {first.what}: {first.note or 'error above its bound'}{more}"
        return VerificationError(what, remedy="do not use this bank; export it again")


def lines(verification: Verification) -> tuple[str, ...]:
    """A verification as a plain text table: one line a check, then the verdict."""
    rows: list[tuple[str, ...]] = [("target", "what", "worst error", "bound", "ratio", "")]
    for c in verification.checks:
        if c.passed is None:
            rows.append((c.target, c.what, "", "", "", f"not run: {c.note}"))
            continue
        numbers = tuple(f"{v:.3g}" for v in (c.worst_error, c.bound, c.ratio))
        verdict = "ok" if c.passed else "FAILED"
        rows.append((c.target, c.what, *numbers, f"{verdict}: {c.note}" if c.note else verdict))
    width = [max(len(row[i]) for row in rows) for i in range(5)]
    table = [
        "  ".join(
            [row[i].ljust(width[i]) if i < 2 else row[i].rjust(width[i]) for i in range(5)]
            + [row[5]]
        ).rstrip()
        for row in rows
    ]
    return (*table, _verdict(verification))


def _verdict(verification: Verification) -> str:
    ran = sum(c.passed is not None for c in verification.checks)
    idle = len(verification.checks) - ran
    left = f"; {idle} not run" if idle else ""
    if verification.passed:
        return f"{ran} checks hold{left}"
    if not verification.failed:
        return f"nothing was proven: no target could be run{left}"
    return f"{len(verification.failed)} of {ran} checks FAILED{left}"


# ---------------------------------------------------------------- comparing

SLOW_PRODUCTS = 30_000_000
"""A slow target is spared pictures that take more multiplications than this."""


@dataclass
class _Errors:
    """Worst errors of one target so far, by what was compared."""

    bounds: dict[str, F64] = field(default_factory=dict)
    errors: dict[str, F64] = field(default_factory=dict)

    def add(self, what: str, errors: F64, bounds: F64) -> None:
        self.bounds[what] = bounds
        before = self.errors.get(what, np.zeros_like(errors))
        self.errors[what] = np.maximum(before, errors)  # keeps a NaN


def run_target(bank: Bank, plan: Plan, target: Target, cases: tuple[Case, ...]) -> Iterator[Check]:
    """All checks of one target. Whatever it raises becomes a failed check."""
    if target.not_run or target.responses is None:
        yield not_run(target.name, "responses", target.not_run or "it computes none")
        return
    found = _Errors()
    pictures = [c for c in cases if not target.slow or _products(bank, c) <= SLOW_PRODUCTS]
    if not pictures:
        yield not_run(target.name, "responses", "every picture is too large for it")
        return
    try:
        for case in pictures:
            _compare_responses(bank, plan, target, case, found)
            if target.edges is not None and case.strength is not None:
                _compare_edges(bank, plan, target, case, found)
    except Exception as error:  # a target is foreign code: nothing it does may end the run
        yield failed(target.name, "responses and edges", f"{case.name}: {error}")
        return
    for what, errors in found.errors.items():
        yield nearest(target.name, what, errors, found.bounds[what], f"{len(pictures)} pictures")
    if target.edges is None and not edges_lacking(bank):
        yield not_run(target.name, "strength", "it computes no edges")


def _products(bank: Bank, case: Case) -> int:
    return int(bank.taps.size * case.expected[0].size)


def _compare_responses(bank: Bank, plan: Plan, target: Target, case: Case, found: _Errors) -> None:
    assert target.responses is not None
    got = target.responses(case.pixels)
    _like(got, "responses", np.float32, case.expected.shape)
    bounds = np.array(target.bounds or plan.error_bound)
    error = np.abs(got.astype(np.float64) - case.expected)
    inside = np.zeros(case.expected.shape[1:], dtype=bool)
    r, h, w = bank.radius, *case.expected.shape[1:]
    inside[r : h - r, r : w - r] = True
    for what, where in (("responses, interior", inside), ("responses, border", ~inside)):
        if where.any():
            found.add(what, error[:, where].max(axis=1), bounds)


def _compare_edges(bank: Bank, plan: Plan, target: Target, case: Case, found: _Errors) -> None:
    """Strength against the exact one; the winner's exact strength against the best's."""
    assert target.edges is not None
    assert case.strength is not None
    for place, scale in enumerate(bank.scales):
        strength, orientation = target.edges(case.pixels, place)
        _like(strength, "strength", np.float32, case.expected.shape[1:])
        _like(orientation, "orientation", np.uint8, case.expected.shape[1:])
        bound = strength_tolerance(bank, target.bounds or plan.error_bound, scale)
        error = np.abs(strength.astype(np.float64) - case.strength[place]).max()
        found.add(f"strength, scale {scale}", np.array([error]), np.array([bound]))
        loss = case.strength[place] - _chosen(bank, case, scale, orientation)
        found.add(f"orientation, scale {scale}", np.array([loss.max()]), np.array([2 * bound]))


def _chosen(bank: Bank, case: Case, scale: int, orientation: NDArray[np.uint8]) -> F64:
    """Exact strength of the orientation that a target chose at each pixel."""
    numbers = orientations(bank, scale)
    if not np.isin(orientation, numbers).all():
        raise VerificationError(f"an orientation that scale {scale} does not have")
    position = np.zeros(256, dtype=np.intp)
    position[list(numbers)] = np.arange(len(numbers))
    sizes = magnitudes(bank, case.expected, scale)
    return np.asarray(np.take_along_axis(sizes, position[orientation][None], axis=0)[0])


def _like(got: NDArray[Any], what: str, dtype: type, shape: tuple[int, ...]) -> None:
    """Refuse an array of another type or shape."""
    if got.dtype != dtype or got.shape != shape:
        wanted = f"{np.dtype(dtype)} {shape}"
        raise VerificationError(f"{what} are {got.dtype} {got.shape}, not {wanted}")


def largest(got: F64, expected: F64) -> F64:
    """Largest difference of each kernel's plane."""
    _like(got, "responses", np.float64, expected.shape)
    return np.asarray(np.abs(got - expected).max(axis=(1, 2)))


def nearest(target: str, what: str, errors: F64, bounds: F64, note: str = "") -> Check:
    """The check of the kernel that comes nearest to its bound (a NaN is beyond any)."""
    if errors.shape != bounds.shape:
        return failed(target, what, f"{errors.size} kernels, not {bounds.size}")
    ratios = [_ratio(float(e), float(b)) for e, b in zip(errors, bounds, strict=True)]
    k = int(np.argmax(ratios))
    return judged(target, what, float(errors[k]), float(bounds[k]), note)


def _ratio(error: float, bound: float) -> float:
    if math.isnan(error):
        return math.inf
    if bound > 0:
        return error / bound
    return 0.0 if error == 0 else math.inf


def judged(target: str, what: str, error: float, bound: float, note: str = "") -> Check:
    """A check that holds when the error is within its bound."""
    ratio = _ratio(error, bound)
    return Check(target, what, error, bound, ratio, ratio <= 1, note)


def not_run(target: str, what: str, note: str) -> Check:
    """A check that was not made, and why."""
    return Check(target, what, math.nan, math.nan, math.nan, None, note)


def failed(target: str, what: str, note: str) -> Check:
    """A check that could not even be compared."""
    return Check(target, what, math.inf, math.nan, math.inf, False, note)
