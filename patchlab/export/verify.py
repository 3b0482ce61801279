"""Prove that every target of a bank gives the same answers.

Each target found in a bank's folder, or handed in, is run on the stored test
vectors and on larger probes made on the spot, and its worst error is put beside
the bound that it must keep. What could not be run is listed with the reason and
never counts as passed.
"""

from __future__ import annotations

from collections.abc import Callable, Iterator, Mapping
from dataclasses import dataclass, replace
from pathlib import Path
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab import store
from patchlab.errors import PatchlabError, UsageError, VerificationError
from patchlab.export.build import target_name
from patchlab.export.compare import (
    Check,
    Target,
    Verification,
    failed,
    judged,
    largest,
    lines,
    nearest,
    not_run,
    run_target,
)
from patchlab.export.edgel_vectors import (
    EdgelCase,
    EdgelFinder,
    edgel_checks,
    load_edgel_cases,
)
from patchlab.export.onnx import Runner, conv_bound, fed, reference_runner
from patchlab.export.vectors import (
    Case,
    Oracle,
    Pixels,
    array_in,
    load_cases,
    make_probes,
    strongest,
)
from patchlab.export.wasm import wasm_target
from patchlab.progress import Progress, silent
from patchlab.types import F32, Bank, Plan

SelfTestRunner = Callable[[Path], tuple[bool, str]]

__all__ = ["Check", "Target", "Verification", "broken_target", "lines", "verify"]


def verify(
    folder: Path,
    bank: Bank,
    plan: Plan,
    head: Mapping[str, Any],
    *,
    oracle: Oracle,
    engines: Mapping[str, Target] | None = None,
    open_library: Callable[[Path], Target] | None = None,
    run_selftest: SelfTestRunner | None = None,
    library: str | None = None,
    find_edgels: EdgelFinder | None = None,
    progress: Progress = silent,
) -> Verification:
    """Run every target of a bank against the oracle.

    Parameters
    ----------
    folder, head : the bank's folder and its manifest
    bank, plan : as loaded from it
    oracle : callable, float64 responses
    engines : further targets by any key, such as the in-process engine
    open_library : callable, loads a shared library as a target; it is called only after the
        file's hash was checked. Without it libraries are listed as not run
    run_selftest : callable, compiles and runs the C self-test of a folder: (passed, note).
        May raise UsageError where there is no compiler: then it is not run
    library : path of this machine's library in the folder; None looks for it under ``lib/``
    find_edgels : callable, Python's own edgels, which those of targets are compared with

    Returns
    -------
    Verification : with one check a line; nothing is raised for a mismatch, see
        :meth:`Verification.error`
    """
    files = _Files(folder, head)
    checks = [files.check()]
    cases, stored = _stored(bank, files, oracle)
    checks.extend(stored)
    checks.extend(_stored_counts(plan, cases))
    edgels, broken = _stored_edgels(files)
    checks.extend(broken)
    cases += make_probes(bank, plan, oracle)
    targets = [
        *(engines or {}).values(),
        *_libraries(files, open_library, library),
        *_wasm(bank, files),
        *_onnx_targets(bank, files),
    ]
    targets += [further for target in targets for further in target.also]
    for done, target in enumerate(targets):
        progress("verify", done, len(targets) + 1, target.name)
        checks.extend(run_target(bank, plan, target, cases))
        checks.extend(edgel_checks(target, edgels, find_edgels))
    progress("verify", len(targets), len(targets) + 1, "C self-test")
    checks.append(_selftest(bank, files, run_selftest))
    progress("verify", len(targets) + 1, len(targets) + 1)
    return Verification(tuple(checks))


# ---------------------------------------------------------------- the folder


@dataclass(frozen=True)
class _Files:
    """The bank's files, each read only through its hash."""

    folder: Path
    head: Mapping[str, Any]

    def read(self, name: str) -> bytes:
        return store.read_file(self.folder, self.head, name)

    def names(self, start: str = "", end: str = "") -> list[str]:
        return sorted(n for n in self.head["files"] if n.startswith(start) and n.endswith(end))

    def check(self) -> Check:
        wrong = []
        for name in self.names():
            try:
                self.read(name)
            except VerificationError as error:
                wrong.append(f"{name} {error.what}")
        body = {k: v for k, v in self.head.items() if k != "id"}
        if store.sha256(store.canonical_json(body))[:16] != self.head.get("id"):
            wrong.append("the manifest was changed after it was written")
        note = "; ".join(wrong) or f"{len(self.names())} files are as they were written"
        return judged("folder", "hashes", float(len(wrong)), 0.0, note)


def _stored(
    bank: Bank, files: _Files, oracle: Oracle
) -> tuple[tuple[Case, ...], tuple[Check, ...]]:
    """The stored vectors, and whether the oracle still gives their answers."""
    target, what = "oracle, float64", "stored vectors"
    if "vectors/cases.json" not in files.head["files"]:
        return (), (not_run(target, what, "the bank holds no test vectors"),)
    terms = bank.size**2 * bank.planes + (0 if bank.mix is None else bank.mix.shape[1])
    reach = bank.reach * bank.table.span
    bounds = reach * (terms + 1) * np.finfo(np.float64).eps  # two float64 sums, any order
    try:
        cases = load_cases(files.read)
        errors = [largest(np.asarray(oracle(bank, c.pixels)), c.expected) for c in cases]
        strengths = [np.abs(c.strength - strongest(bank, c.expected)[0]).max()
                     for c in cases if c.strength is not None]  # fmt: skip
    except (PatchlabError, ValueError) as error:
        return (), (failed(target, what, str(error)),)
    if not cases:
        return (), (failed(target, what, "the list of vectors is empty"),)
    note = f"{len(cases)} pictures"
    found = [nearest(target, what, np.max(errors, axis=0), bounds, note)]
    if strengths:
        limit = 2 * float(bounds.max())
        found.append(judged(target, "stored strength", float(max(strengths)), limit, note))
    return cases, tuple(found)


def _stored_counts(plan: Plan, cases: tuple[Case, ...]) -> Iterator[Check]:
    """Are the stored fixed-point counts the ones that the plan's integers make?"""
    fixed = plan.detail.get("fixed")
    stored = [(c.pixels, c.counts) for c in cases if c.counts is not None]
    if fixed is not None and stored:
        wrong = sum(not np.array_equal(fixed.counts(p)[0], counts) for p, counts in stored)
        note = f"{len(stored)} pictures, bit for bit"
        yield judged("oracle, integers", "stored counts", float(wrong), 0.0, note)


def _stored_edgels(files: _Files) -> tuple[tuple[EdgelCase, ...], tuple[Check, ...]]:
    """The stored pictures with edgels."""
    if "vectors/cases.json" not in files.head["files"]:
        return (), ()
    try:
        return load_edgel_cases(files.read, array_in), ()
    except PatchlabError as error:
        return (), (failed("oracle, float64", "stored edgels", str(error)),)


def _libraries(
    files: _Files, open_library: Callable[[Path], Target] | None, library: str | None
) -> Iterator[Target]:
    """Every shared library of the folder; the one of this machine is loaded."""
    found = [n for n in files.names("lib/") if n.endswith((".so", ".dylib", ".dll"))]
    if not found:
        yield Target("compiled library", not_run="none is in the folder")
    for name in found:
        mine = name == library if library else name.split("/")[1] == target_name()
        if not mine:
            yield Target(f"compiled library {name}", not_run="built for another machine")
        elif open_library is None:
            yield Target(f"compiled library {name}", not_run="loading it was not asked for")
        else:
            yield _opened(files, name, open_library)


def _opened(files: _Files, name: str, open_library: Callable[[Path], Target]) -> Target:
    title = f"compiled library {name}"
    try:
        files.read(name)  # the hash, before any of its code can run
        opened = open_library(files.folder / name)
    except UsageError as error:
        return Target(title, not_run=str(error))
    except (PatchlabError, OSError) as error:
        return broken_target(title, error)
    return replace(opened, name=title)


def broken_target(title: str, error: Exception) -> Target:
    """A target that cannot be opened: it fails as soon as it is run."""

    def refuse(pixels: Pixels) -> F32:
        raise VerificationError(str(error))

    return Target(title, refuse)


def _wasm(bank: Bank, files: _Files) -> Iterator[Target]:
    """The WebAssembly module, where the folder holds one, in Node."""
    module, loader = (f"lib/wasm32/{bank.name}.{end}" for end in ("wasm", "mjs"))
    if module in files.head["files"]:
        title = f"WebAssembly {module}"
        try:
            yield wasm_target(bank, files.read(module), files.read(loader))
        except UsageError as error:
            yield Target(title, not_run=str(error))
        except PatchlabError as error:
            yield broken_target(title, error)


# ---------------------------------------------------------------- ONNX


def _onnx_targets(bank: Bank, files: _Files) -> Iterator[Target]:
    """The ONNX files in onnxruntime and in the reference evaluator."""
    runners = {"onnxruntime": _runtime_runner, "onnx reference": reference_runner}
    for title, runner in runners.items():
        if f"{bank.name}.onnx" not in files.head["files"]:
            yield Target(title, not_run=f"the bank holds no {bank.name}.onnx")
            continue
        try:
            plain = runner(files.read(f"{bank.name}.onnx"))
            fused = f"{bank.name}_edges.onnx"
            edges = runner(files.read(fused)) if fused in files.head["files"] else None
        except UsageError as error:
            yield Target(title, not_run=str(error))
            continue
        except Exception as error:  # a damaged file makes each runtime raise its own kind
            yield broken_target(title, error)
            continue
        yield _onnx_target(title, bank, plain, edges, slow=title == "onnx reference")


def _onnx_target(
    title: str, bank: Bank, plain: Runner, edges: Runner | None, *, slow: bool
) -> Target:
    def responses(pixels: Pixels) -> F32:
        return plain(pixels)[0]

    def strongest(pixels: Pixels, place: int) -> tuple[F32, NDArray[np.uint8]]:
        assert edges is not None
        strength, orientation = edges(pixels)
        return strength[place], orientation[place]

    return Target(title, responses, strongest if edges else None, conv_bound(bank), slow)


def _runtime_runner(model: bytes) -> Runner:
    """Run a graph in onnxruntime on one thread of the processor.

    Raises
    ------
    UsageError : onnxruntime is not installed.
    """
    try:
        import onnxruntime
    except ImportError:
        raise UsageError("onnxruntime is not installed") from None
    options = onnxruntime.SessionOptions()
    options.intra_op_num_threads = options.inter_op_num_threads = 1
    options.log_severity_level = 4  # failures are told by exception, not on stderr
    session = onnxruntime.InferenceSession(model, options, providers=["CPUExecutionProvider"])

    def run(pixels: Pixels) -> tuple[NDArray[Any], ...]:
        return tuple(out[0] for out in session.run(None, {"image": fed(pixels)}))

    return run


# ---------------------------------------------------------------- the C self-test


def _selftest(bank: Bank, files: _Files, run: SelfTestRunner | None) -> Check:
    target, what = "C self-test", "own vectors"
    if f"{bank.name}_selftest.c" not in files.head["files"]:
        return not_run(target, what, f"the bank holds no {bank.name}_selftest.c")
    if run is None:
        return not_run(target, what, "compiling it was not asked for")
    try:
        for end in (".c", ".h"):
            for name in files.names(end=end):
                files.read(name)  # unchanged, before it is compiled and run
        passed, note = run(files.folder)
    except UsageError as error:
        return not_run(target, what, str(error))
    except Exception as error:  # a compiler and a program of unknown behaviour
        return failed(target, what, str(error))
    return Check(target, what, 0.0, 0.0, 0.0, True, note) if passed else failed(target, what, note)
