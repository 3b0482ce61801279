"""How fast a bank is: its plans side by side, its targets, and the libraries beside them."""

from __future__ import annotations

import math
import time
from collections.abc import Iterator, Mapping
from pathlib import Path
from typing import Any, Literal

import numpy as np

from patchlab import bank as banks
from patchlab import export, store
from patchlab.bank.lattice import lattice_bank
from patchlab.bank.plan import KINDS
from patchlab.errors import UsageError
from patchlab.export.bench import Entrant, Timing
from patchlab.families import render
from patchlab.pipeline.bundle import open_native
from patchlab.pipeline.loaded import need_one_plane
from patchlab.progress import Progress, silent
from patchlab.types import F32, F64, Bank, InputContract, InputTable, Kernel, Plan

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
    built = list(_built(bank))
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
    for _, about in built:
        name = f"plan {about['asked']}"
        about["median_ms"] = round(alone[name].median_ms, 3)
        del about["plan"]
    return {
        "bank": bank.name,
        "size": list(size),
        "kernels": len(bank),
        "kernel_size": bank.size,
        "plans": [about for _, about in built],
        "targets": [_row(t, alone) for t in timings],
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


def _built(bank: Bank) -> Iterator[tuple[banks.NativeBank, dict[str, Any]]]:
    """Every plan that differs from those before it, compiled; none without a compiler."""
    compiler = export.find_compiler()
    chosen, seen = banks.make_plan(bank), set()
    for kind in KINDS[1:]:
        plan = banks.make_plan(bank, kind)
        if compiler is None or (plan.kind, plan.groups) in seen:
            continue
        seen.add((plan.kind, plan.groups))
        start = time.perf_counter()
        library = export.compile_library(export.emit(bank, plan), bank.name, compiler=compiler)
        assert library is not None
        compiled = time.perf_counter()
        native = banks.NativeBank(bank, plan, library, store.sha256(library))
        native.responses(export.bench.picture(bank, bank.size, bank.size))
        yield (
            native,
            {
                "asked": kind,
                "kind": plan.kind,
                "chosen": plan.kind == chosen.kind and plan.groups == chosen.groups,
                "groups": list(plan.groups),
                "multiplies_per_pixel": plan.multiplies,
                "adds_per_pixel": plan.adds,
                "scratch_bytes": native.scratch_bytes(1920, 1080),
                "error_bound": max(plan.error_bound),
                "compile_s": round(compiled - start, 2),
                "library_bytes": len(library),
                "first_call_ms": round(1e3 * (time.perf_counter() - compiled), 3),
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


# ---------------------------------------------------------------- fixed cases


def cases(
    width: int, height: int, repeats: int, *, peers: bool = False, progress: Progress = silent
) -> dict[str, Any]:
    """The banks that benchmarks are quoted for, each as :func:`bench`; plain data."""
    found = []
    for bank, what in fixed_cases():
        result = _bench(
            bank, banks.make_plan(bank), None, (width, height), repeats, peers, progress
        )
        found.append({"what": what, **result})
    return {"cases": found}


def fixed_cases() -> Iterator[tuple[Bank, str]]:
    """The fixed banks, all for 8-bit pixels as they are, and what each stands for."""
    yield (
        _mirrored("a", "gabor", 8, 11),
        "16 Gabors 11 x 11, 8 orientations, even and odd, mirrored",
    )
    yield _arbitrary("b", 32, 15), "32 kernels 15 x 15, arbitrary"
    yield _mirrored("c", "gd", 12, 9), "24 Gaussian derivatives 9 x 9, 12 orientations, mirrored"
    kernels, taps = lattice_bank((8, 8), ((1.2, 1.8), (2.0, 3.0)), ("odd",))
    yield (
        Bank("edges", kernels, taps, _table(), strength="step"),
        "edge bank: 8 orientations, 2 sizes",
    )
    for size in (7, 9, 11, 15, 21, 31):
        yield _arbitrary(f"size_{size}", 16, size), f"16 kernels {size} x {size}, arbitrary"


def _table() -> InputTable:
    contract = InputContract("Mono8", 0.0, 255.0)
    return InputTable("identity", contract, np.arange(256, dtype=np.float32), None)


def _arbitrary(name: str, count: int, size: int) -> Bank:
    taps = np.random.default_rng(size).standard_normal((count, size, size)) / size
    kernels = tuple(Kernel(f"k{i}", "given", "none", None, None, {}, 1.0) for i in range(count))
    return Bank(name, kernels, taps.astype(np.float32), _table(), purpose="taps")


def _mirrored(name: str, family: str, count: int, size: int) -> Bank:
    """Even and odd kernels of one size, mirror images tap for tap."""
    kernels, taps = [], []
    parities: tuple[Literal["even", "odd"], ...] = ("even", "odd")
    for parity in parities:
        planes: list[F32] = []
        for j in range(count):
            if 2 * j > count:
                planes.append(planes[count - j][:, ::-1])
            else:
                planes.append(_drawn(family, parity, j, count, size).astype(np.float32))
            about = {"theta_rad": math.pi * j / count}
            kernels.append(Kernel(f"{parity}_{j}", family, parity, 0, j, about, 1.0))
        taps += planes
    return Bank(name, tuple(kernels), np.stack(taps), _table(), strength="energy")


def _drawn(family: str, parity: str, j: int, count: int, size: int) -> F64:
    """Orientation j of the first quarter turn, with its exact symmetries."""
    p = {"theta_rad": math.pi * j / count, "sigma_u_px": size / 6, "sigma_v_px": size / 5}
    if family == "gabor":
        p |= {"frequency_cpp": 0.15, "phase_rad": 0.0 if parity == "even" else math.pi / 2}
        plane = render("gabor", p, size)
    else:
        plane = render("gd2" if parity == "even" else "gd1", p, size)
    sign = 1 if parity == "even" else -1
    plane = (plane + sign * plane[::-1, ::-1]) / 2
    if j == 0:
        plane = (plane + plane[::-1]) / 2
    if 2 * j == count:
        plane = (plane + plane[:, ::-1]) / 2
    return plane
