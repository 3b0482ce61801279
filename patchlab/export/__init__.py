"""Plan to files: C99, shared library, ONNX, vectors; and the proof that all agree."""

from patchlab.export import bench
from patchlab.export.build import (
    NO_COMPILER,
    compile_library,
    find_compiler,
    library_name,
    run_selftest,
    target_name,
)
from patchlab.export.c99 import emit
from patchlab.export.c_edge_model import EdgelRules, EdgelScale
from patchlab.export.compare import Check, Target, Verification
from patchlab.export.edgel_vectors import (
    TOLERANCE_PX,
    EdgelCase,
    EdgelFinder,
    edgel_files,
    make_edgel_cases,
)
from patchlab.export.onnx import emit as emit_onnx
from patchlab.export.runtime import RUNTIME, open_runtime, runtime_files
from patchlab.export.selftest import Case as SelftestCase
from patchlab.export.selftest import emit_selftest
from patchlab.export.targets import (
    HOST,
    TARGETS,
    cross_compile,
    library_path,
    parse_targets,
)
from patchlab.export.vectors import make_cases, vector_files
from patchlab.export.verify import broken_target, verify
from patchlab.export.wasm import find_node, wasm_target

__all__ = [
    "HOST",
    "NO_COMPILER",
    "RUNTIME",
    "TARGETS",
    "TOLERANCE_PX",
    "Check",
    "EdgelCase",
    "EdgelFinder",
    "EdgelRules",
    "EdgelScale",
    "SelftestCase",
    "Target",
    "Verification",
    "bench",
    "broken_target",
    "compile_library",
    "cross_compile",
    "edgel_files",
    "emit",
    "emit_onnx",
    "emit_selftest",
    "find_compiler",
    "find_node",
    "library_name",
    "library_path",
    "make_cases",
    "make_edgel_cases",
    "open_runtime",
    "parse_targets",
    "run_selftest",
    "runtime_files",
    "target_name",
    "vector_files",
    "verify",
    "wasm_target",
]
