"""How fast a bank is: its plans side by side, its targets, and the libraries beside them."""

from __future__ import annotations

import math
import time
from collections.abc import Iterator, Mapping
from pathlib import Path
from typing import Any

import numpy as np

from patchlab import bank as banks
from patchlab import export, store
from patchlab.bank.plan import KINDS
from patchlab.errors import UsageError
from patchlab.export.bench import Entrant, Timing
from patchlab.pipeline.bench_banks import fixed_cases
from patchlab.pipeline.bench_learned import learned_bank
from patchlab.pipeline.bundle import open_native
from patchlab.pipeline.loaded import need_one_plane
from patchlab.progress import Progress, silent
from patchlab.types import F32, Bank, Plan

SMALL = (131, 257)
"""Rows and columns of the picture on which results are compared with the exact ones."""


def bench(
    folder: Path,
    width: int,
    height: int,
    repeats: int,
    *,
    peers: bool = False,
    progress: Progress = silent,
) -> dict[str, Any]:
    """Times of a bank's plans and targets, one thread and two; plain data.

    Parameters
    ----------
    folder : the bank's
    width, height : of the picture, pixels
    repeats : timed rounds, interleaved
    peers : run the installed libraries beside them

    Raises
    ------
    UsageError : the picture is smaller than the kernels, or the bank takes colours.
    VerificationError : something gave a wrong result.
    """
    bank, plan, head = banks.read_bank(folder)
    need_one_plane(bank.contract, "bench")
    if min(width, height) < bank.size:
        raise UsageError(f"--size must be at least {bank.size}x{bank.size}")
    native = open_native(folder, bank, plan, head)
    return _bench(bank, plan, native, (width, height), repeats, peers, progress)


def _bench(
    bank: Bank,
    plan: Plan,
    native: banks.NativeBank | None,
    size: tuple[int, int],
    repeats: int,
    peers: bool,
    progress: Progress,
) -> dict[str, Any]:
    built = list(_built(bank, plan))
    first = [native] if native is not None else [b for b, about in built if about["chosen"]]
    entrants = [e for n in first for e in _compiled(n, plan)]
    entrants += [_planes(b, about["plan"], f"plan {about['asked']}") for b, about in built]
    entrants.append(
        Entrant("numpy engine", "float32 planes", lambda p, _: banks.responses(bank, p, plan),
                plan.error_bound, threaded=False)
    )  # fmt: skip
    if peers:
        entrants += export.bench.libraries(bank, *size)
    small = export.bench.picture(bank, max(SMALL[1], bank.size), max(SMALL[0], bank.size))
    timings = export.bench.measure(
        entrants,
        export.bench.picture(bank, *size),
        repeats,
        threads=(1, 2),
        small=(small, banks.exact_responses(bank, small)),
        progress=progress,
    )
    alone = {t.target: t for t in timings if t.threads == 1}
    flat = skipped(first[0], export.bench.picture(bank, *size)) if first else None
    for _, about in built:
        name = f"plan {about['asked']}"
        about["expected_ms"] = round(about["plan"].detail["expected_ns"] * math.prod(size) / 1e6, 3)
        about["median_ms"] = round(alone[name].median_ms, 3)
        about["cpu_ms"] = round(alone[name].cpu_ms, 3)
        del about["plan"]
    return {
        "bank": bank.name,
        "size": list(size),
        "kernels": len(bank),
        "kernel_size": bank.size,
        "plan": banks.describe(plan),
        "plans": [about for _, about in built],
        "targets": [_row(t, alone) for t in timings],
        "skipped": flat,
    }


def _row(t: Timing, alone: Mapping[str, Timing]) -> dict[str, Any]:
    return {
        "target": t.target,
        "threads": t.threads,
        "median_ms": round(t.median_ms, 3),
        "low_ms": round(t.low_ms, 3),
        "high_ms": round(t.high_ms, 3),
        "cpu_ms": round(t.cpu_ms, 3),
        "ratio": round(t.ratio, 3),
        "times_one_thread": round(alone[t.target].median_ms / t.median_ms, 3),
        "error_of_bound": None if t.error is None else float(t.error),
        "note": t.note,
    }


# ---------------------------------------------------------------- our own targets


def _built(bank: Bank, chosen: Plan) -> Iterator[tuple[banks.NativeBank, dict[str, Any]]]:
    """Every plan that differs from those before it, compiled; none without a compiler."""
    compiler, seen = export.find_compiler(), set()
    about = chosen.detail
    asked = [
        banks.make_plan(bank, kind, tolerance=about["tolerance"], costs=about["costs"])
        for kind in KINDS
        if kind != "auto"
    ]
    for plan in (*asked, chosen):
        if compiler is None or (plan.kind, plan.groups) in seen:
            continue
        seen.add((plan.kind, plan.groups))
        start = time.perf_counter()
        library = export.compile_library(export.emit(bank, plan), bank.name, compiler=compiler)
        assert library is not None
        compiled = time.perf_counter()
        native = banks.NativeBank(bank, plan, library, store.sha256(library))
        native.responses(export.bench.picture(bank, bank.size, bank.size))
        first = 1e3 * (time.perf_counter() - compiled)
        yield (
            native,
            {
                "asked": plan.detail["asked"],
                "kind": plan.kind,
                "chosen": plan.kind == chosen.kind and plan.groups == chosen.groups,
                "groups": list(plan.groups),
                "multiplies_per_pixel": plan.multiplies,
                "adds_per_pixel": plan.adds,
                "loads_per_pixel": plan.loads,
                "scratch_bytes": native.scratch_bytes(1920, 1080),
                "error_bound": max(plan.error_bound),
                "compile_s": round(compiled - start, 2),
                "library_bytes": len(library),
                "first_call_ms": round(first, 3),
                "plan": plan,
            },
        )


def _planes(native: banks.NativeBank, plan: Plan, name: str) -> Entrant:
    room: dict[tuple[int, ...], F32] = {}

    def run(pixels: Any, threads: int) -> Any:
        shape = (len(native.bank), *pixels.shape)
        out = room.setdefault(shape, np.empty(shape, dtype=np.float32))
        return native.responses(pixels, out=out, threads=threads)

    return Entrant(name, "float32 planes", run, plan.error_bound)


def _compiled(native: banks.NativeBank, plan: Plan) -> Iterator[Entrant]:
    """A library's responses and edges, in float and in fixed point."""
    yield _planes(native, plan, "compiled library")
    fixed = plan.detail["fixed"]
    scales = range(len(native.bank.scales))
    if scales:
        yield Entrant(
            "compiled library, edges", "all scales, float32",
            lambda p, n: [native.edges(p, s, threads=n) for s in scales],
        )  # fmt: skip
    if len(scales) > 1:
        yield Entrant(
            "compiled library, edges in one pass", "all scales, float32",
            lambda p, n: native.edges_all(p, threads=n),
        )  # fmt: skip
    yield from _above(native)
    if fixed is None:
        return
    room: dict[tuple[int, ...], Any] = {}

    def counts(pixels: Any, threads: int) -> Any:
        shape = (len(native.bank), *pixels.shape)
        out = room.setdefault(shape, np.empty(shape, dtype=np.int16))
        return native.responses_q(pixels, out=out, threads=threads)[0]

    yield Entrant(
        "compiled library, fixed point", "int16 planes", counts, fixed.bound, step=fixed.step
    )
    if scales:
        yield Entrant(
            "compiled library, fixed-point edges", "all scales, 16 bits",
            lambda p, n: [native.edges_q(p, s, threads=n) for s in scales],
        )  # fmt: skip


def _above(native: banks.NativeBank) -> Iterator[Entrant]:
    """Edges above the bank's own threshold; its note tells the share that was skipped."""
    known = native.bank.thresholds
    if known is None:
        return
    low = known.hysteresis * float(np.interp(10.0, known.rate, known.strength))
    scales = range(len(native.bank.scales))

    def run(pixels: Any, threads: int) -> Any:
        return [native.edges_above(pixels, s, low, threads=threads) for s in scales]

    yield Entrant(
        "compiled library, edges above a threshold", f"all scales, strength {low:.3g}", run
    )


def skipped(native: banks.NativeBank, pixels: Any) -> dict[str, Any] | None:
    """The share of a picture that is provably too flat, by scale; None without thresholds."""
    for entrant in _above(native):
        found = entrant.run(pixels, 1)
        return {"note": entrant.note, "share": [round(n / pixels.size, 4) for *_, n in found]}
    return None


# ---------------------------------------------------------------- fixed cases


def cases(
    width: int, height: int, repeats: int, *, peers: bool = False, progress: Progress = silent
) -> dict[str, Any]:
    """The banks that benchmarks are quoted for, each as :func:`bench`; plain data."""
    found = []
    learned = "32 filters 12 x 12, learned from the photographs of scikit-image"
    for bank, what in (*fixed_cases(), (learned_bank(), learned)):
        result = _bench(
            bank, banks.make_plan(bank), None, (width, height), repeats, peers, progress
        )
        found.append({"what": what, **result})
    return {"cases": found}
