"""From a bank to its folder: plan, C source, library, ONNX, vectors, and the proof."""

from __future__ import annotations

from collections.abc import Mapping
from dataclasses import dataclass
from pathlib import Path
from typing import Any

from patchlab import bank as banks
from patchlab import export
from patchlab.pipeline.desk import Desk
from patchlab.progress import Progress, silent
from patchlab.types import Bank, Plan


@dataclass(frozen=True, eq=False)
class Written:
    """A bank that stands in its folder, with the proof that its targets agree."""

    folder: Path
    bank: Bank
    plan: Plan
    head: Mapping[str, Any]
    verification: export.Verification
    library: str
    onnx: str

    @property
    def worst_error(self) -> float:
        """Largest difference from the oracle over all targets and vectors."""
        ran = [c for c in self.verification.checks if c.passed is not None]
        return max((c.worst_error for c in ran if c.what.startswith("responses")), default=0.0)

    @property
    def error_bound(self) -> float:
        """The proven bound, largest over the kernels."""
        return max(self.plan.error_bound)


def write_bundle(
    folder: Path,
    bank: Bank,
    desk: Desk,
    *,
    parents: Mapping[str, str],
    inputs: Mapping[str, str],
    crop: Any = None,
    force: bool = True,
) -> Written:
    """Plan a bank, generate and build every target, write the folder, prove it equal.

    Raises
    ------
    VerificationError : a target differs from the oracle; the folder stays for inspection.
    """
    plan = banks.make_plan(bank)
    cases = export.make_cases(bank, plan, banks.oracle, crop=crop)
    small = export.make_cases(bank, plan, banks.oracle, small=True)
    files = dict(export.emit_c(bank, plan, small))
    desk.progress("export", 1, 4, "C source")
    library, said = _library(files, bank.name, desk.settings.library)
    files |= library
    desk.progress("export", 2, 4, "library")
    graph = export.emit_onnx(bank)
    files |= graph.files
    files |= export.vector_files(bank, cases)
    desk.progress("export", 3, 4, "ONNX and vectors")
    head = banks.write_bank(
        folder,
        bank,
        plan,
        files,
        force=force,
        seed=desk.settings.seed,
        settings=desk.settings.plain("bank"),
        inputs=inputs,
        parents=parents,
    )
    desk.progress("export", 4, 4)
    proof = prove(folder, bank, plan, head, desk.progress)
    error = proof.error()
    if error is not None:
        raise error
    onnx = "; ".join(graph.notes) or "written"
    return Written(folder, bank, plan, head, proof, said, onnx)


def _library(files: Mapping[str, bytes], name: str, wanted: bool) -> tuple[export.Files, str]:
    if not wanted:
        return {}, "not built, as it was not asked for"
    return export.compile_library(files, name)


def prove(
    folder: Path, bank: Bank, plan: Plan, head: Mapping[str, Any], progress: Progress = silent
) -> export.Verification:
    """Run every target of a bank's folder against the oracle."""
    engine = export.Target(
        "in-process engine",
        lambda pixels: banks.responses(bank, pixels, plan),
        lambda pixels, scale: banks.strength(bank, pixels, scale, plan),
    )

    def open_library(path: Path) -> export.Target:
        native = banks.NativeBank(path, bank)
        return export.Target(path.name, native.responses, native.edges)

    return export.verify(
        folder,
        bank,
        plan,
        head,
        oracle=banks.oracle,
        engines={"engine": engine},
        open_library=open_library,
        run_selftest=lambda where: export.run_selftest(where, bank.name),
        progress=progress,
    )
