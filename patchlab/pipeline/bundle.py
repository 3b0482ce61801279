"""From a bank to its folder: plan, C source, library, ONNX, vectors, and the proof."""

from __future__ import annotations

from collections.abc import Mapping
from dataclasses import dataclass
from pathlib import Path
from typing import Any

import numpy as np

from patchlab import bank as banks
from patchlab import edges, export, store
from patchlab.edges import thin
from patchlab.errors import PatchlabError, UsageError, VerificationError
from patchlab.pipeline.calibrate import chosen_costs, refuse_planning
from patchlab.pipeline.desk import Desk, may_write
from patchlab.pipeline.edgel_rules import edgel_cases, edgel_finder, edgel_rules
from patchlab.progress import Progress, silent
from patchlab.settings import Settings
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
        checks = [c for c in self.verification.checks if not c.target.endswith(FIXED)]
        ran = [c for c in checks if c.passed is not None]
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
) -> Written:
    """Plan a bank, generate and build every target, write the folder, prove it equal.

    An artefact that stands there is replaced.

    Raises
    ------
    VerificationError : a target differs from the oracle; the folder stays for inspection.
    """
    s = desk.settings
    plan = banks.make_plan(bank, s.plan, tolerance=s.tolerance, costs=chosen_costs(s))
    files = dict(export.emit(bank, plan, edgel_rules(bank)))
    edgels = edgel_cases(bank, plan, crop)
    files |= export.emit_selftest(
        bank, plan, _selftest_cases(bank, plan), edgels[0] if edgels else None
    )
    desk.progress("export", 1, 4, "C source")
    library, said = build_libraries(files, bank, plan, desk.settings)
    desk.progress("export", 2, 4, "library")
    graph = export.emit_onnx(bank)
    cases = export.make_cases(bank, plan, banks.exact_responses, crop=crop)
    files |= {**library, **graph.files, **_vector_files(bank, cases, edgels)}
    files |= export.runtime_files(edge_rules(bank))
    desk.progress("export", 3, 4, "ONNX and vectors")
    head = banks.write_bank(
        folder,
        bank,
        plan,
        files,
        force=True,
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


def _vector_files(bank: Bank, cases: Any, edgels: tuple[export.EdgelCase, ...]) -> dict[str, bytes]:
    if not edgels:
        return dict(export.vector_files(bank, cases))
    files, entries = export.edgel_files(edgels)
    about = {"tolerance_px": export.TOLERANCE_PX, "cases": entries}
    return {**files, **export.vector_files(bank, cases, about)}


def _selftest_cases(bank: Bank, plan: Plan) -> list[export.SelftestCase]:
    small = export.make_cases(bank, plan, banks.exact_responses, small=True)
    return [(case.name, case.pixels, case.expected, case.tolerance) for case in small]


def add_libraries(folder: Path, out: Path, desk: Desk, *, force: bool) -> Written:
    """Write a bank that stands anew, with the libraries of the targets asked for added.

    Raises
    ------
    UsageError : a target that cannot be built, or the output stands and may not be replaced.
    VerificationError : a file was changed since it was written, or a target differs.
    """
    export.parse_targets(desk.settings.target)
    refuse_planning(desk.settings)
    if out != folder:
        may_write(out, force)
    bank, plan, head = banks.read_bank(folder)
    files = {name: store.read_file(folder, head, name) for name in head["files"]}
    library, said = build_libraries(files, bank, plan, desk.settings)
    own = banks.bank_files(bank, plan)[0]
    files = {name: data for name, data in (files | library).items() if name not in own}
    about = {key: head[key] for key in ("seed", "settings", "inputs", "parents")}
    head = banks.write_bank(out, bank, plan, files, force=True, **about)
    proof = prove(out, bank, plan, head, desk.progress)
    error = proof.error()
    if error is not None:
        raise error
    graph = f"{bank.name}.onnx" in files
    return Written(out, bank, plan, head, proof, said, "kept" if graph else "none")


def edge_rules(bank: Bank) -> dict[str, Any] | None:
    """How responses become edges, as plain data for the runtime; None where they cannot."""
    try:
        shapes = edges.shapes_of(bank)
    except UsageError:
        return None
    known = bank.thresholds
    return {
        "hysteresis": thin.HYSTERESIS if known is None else known.hysteresis,
        "dilation_px": thin.DILATION_PX,
        "window_sigmas": thin.WINDOW_SIGMAS,
        "scales": [
            {
                "scale": s.scale,
                "angles_rad": s.angles.tolist(),
                "sigma_px": s.sigma_px,
                "reach_px": s.reach_px,
                **_rivals(bank, s),
                **_octaves(s, softer),
            }
            for s, softer in zip(shapes, thin.softer_of(shapes, bank.strength), strict=True)
        ],
    }


def _octaves(shape: thin.ScaleShape, softer: tuple[int, float] | None) -> dict[str, Any]:
    """What octaves add to the rules of a scale; nothing in a bank without them."""
    known: dict[str, Any] = {"apart_px": shape.apart_px} if shape.octave else {}
    if softer is not None:
        known["softer"] = [softer[0], softer[1], thin.SOFT_NOISE]
    return known


def _rivals(bank: Bank, shape: thin.ScaleShape) -> dict[str, Any]:
    """What an element of this scale is held against (see :func:`patchlab.edges.thin.strongest`)."""
    if bank.strength == "line":
        odd = [int(k) for k in shape.odd]
        return {"floor": thin.LINE_FLOOR, "rival_kernels": odd, "rival_share": thin.LINE_OVER_STEP}
    floor = thin.RELATIVE_FLOOR if shape.scale > 0 else 0.0
    return {"floor": floor, "rival_kernels": [], "rival_share": 0.0}


def build_library(
    files: Mapping[str, bytes], name: str, wanted: bool
) -> tuple[dict[str, bytes], str]:
    """This machine's shared library as a file of the bundle, and what to say of it."""
    if not wanted:
        return {}, "not built, as it was not asked for"
    compiler = export.find_compiler()
    built = export.compile_library(files, name, compiler=compiler) if compiler else None
    if compiler is None or built is None:
        return {}, f"not built: {export.NO_COMPILER}"
    path = f"lib/{export.target_name()}/{export.library_name(name)}"
    return {path: built}, f"{path}, by {compiler.version}"


def build_libraries(
    files: Mapping[str, bytes], bank: Bank, plan: Plan, settings: Settings
) -> tuple[dict[str, bytes], str]:
    """The libraries of every target asked for, and what to say of them."""
    targets = export.parse_targets(settings.target)
    wanted = settings.library and export.HOST in targets
    library, said = build_library(files, bank.name, wanted)
    for target in targets:
        if target != export.HOST:
            made = export.cross_compile(files, bank, plan, target)
            library |= {path: data for path, data in made.items() if path not in library}
            said += f"; {export.library_path(bank.name, target)}"
    return library, said


def own_library(bank: Bank) -> str:
    """Where the library of this machine stands in a bank's folder."""
    return f"lib/{export.target_name()}/{export.library_name(bank.name)}"


def open_native(
    folder: Path, bank: Bank, plan: Plan, head: Mapping[str, Any]
) -> banks.NativeBank | None:
    """The bank's library for this machine, or None where the folder holds none."""
    path = own_library(bank)
    if path not in head["files"]:
        return None
    return banks.load_native(folder, bank, plan, head, path)


FIXED = "fixed point"


def _fixed_target(name: str, counted: Any, strengths: Any, plan: Plan) -> export.Target:
    """A target's fixed-point part: bit for bit, and within its bound."""
    fixed = plan.detail["fixed"]
    step = np.array(fixed.step, dtype=np.float32)[:, None, None]

    def responses(pixels: Any) -> Any:
        counts, ends = counted(pixels)
        expected, at_the_ends = fixed.counts(pixels)
        if ends != at_the_ends or not np.array_equal(counts, expected):
            raise VerificationError("counts differ from the exact integer sums")
        return step * counts

    return export.Target(f"{name}, {FIXED}", responses, strengths, fixed.bound)


def prove(
    folder: Path, bank: Bank, plan: Plan, head: Mapping[str, Any], progress: Progress = silent
) -> export.Verification:
    """Run every target of a bank's folder against the oracle."""
    find = edgel_finder(bank)
    engine = export.Target(
        "in-process engine",
        lambda pixels: banks.responses(bank, pixels, plan),
        lambda pixels, scale: banks.strength(bank, pixels, scale, plan),
        edgels=lambda pixels, high, lines: find(
            pixels, banks.responses(bank, pixels, plan), high, lines
        ),
    )

    engines = {"engine": engine, **_runtimes(folder, bank, plan, head)}

    def open_library(path: Path) -> export.Target:
        relative = path.relative_to(folder).as_posix()
        native = banks.load_native(folder, bank, plan, head, relative)
        also: tuple[export.Target, ...] = ()
        if plan.detail["fixed"]:
            name = f"compiled library {relative}"
            also = (_fixed_target(name, native.responses_q, native.edges_q, plan),)
        edgels = native.edgels if native.has_edgels else None
        return export.Target(path.name, native.responses, native.edges, also=also, edgels=edgels)

    def selftest(where: Path) -> tuple[bool, str]:
        sources = [n for n in head["files"] if "/" not in n and n.endswith((".c", ".h"))]
        done = export.run_selftest(
            {name: store.read_file(where, head, name) for name in sources}, bank.name
        )
        if done.passed is None:
            raise UsageError(done.output)
        return done.passed, done.output.splitlines()[-1] if done.output else ""

    return export.verify(
        folder,
        bank,
        plan,
        head,
        oracle=banks.exact_responses,
        engines=engines,
        open_library=open_library,
        run_selftest=selftest,
        find_edgels=find,
        progress=progress,
    )


def _runtimes(
    folder: Path, bank: Bank, plan: Plan, head: Mapping[str, Any]
) -> dict[str, export.Target]:
    """The folder's Python runtime, with numpy alone and with this machine's library."""
    if export.RUNTIME not in head["files"]:
        return {"runtime": export.Target("Python runtime", not_run="the folder holds none")}
    try:
        module = export.open_runtime(store.read_file(folder, head, export.RUNTIME))
    except PatchlabError as error:
        return {"runtime": export.broken_target("Python runtime", error)}
    found = {"numpy": _runtime("Python runtime, numpy", module, folder, plan, False)}
    if own_library(bank) in head["files"]:
        found["library"] = _runtime("Python runtime, library", module, folder, plan, True)
    return found


def _runtime(name: str, module: Any, folder: Path, plan: Plan, library: bool) -> export.Target:
    try:
        loaded = module.load(folder, library=library)
    except Exception as error:  # the folder's code, and a folder that may be damaged
        return export.broken_target(name, error)
    strengths = counted = None
    if loaded.scales:

        def strengths(pixels: Any, place: int) -> Any:
            return loaded.strengths(pixels, loaded.scales[place])

        def counted(pixels: Any, place: int) -> Any:
            return loaded.strengths(pixels, loaded.scales[place], fixed=True)

    edgels = None
    if library and loaded.compiled.has_edgels:

        def edgels(pixels: Any, high: float, lines: float) -> Any:
            return banks.as_edgels(loaded.compiled.edgels(pixels, high, lines))

    also: tuple[export.Target, ...] = ()
    if plan.detail["fixed"]:
        also = (_fixed_target(name, loaded.responses_fixed, counted, plan),)
    return export.Target(name, loaded.responses, strengths, also=also, edgels=edgels)
