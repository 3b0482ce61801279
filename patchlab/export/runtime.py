"""The single-file Python module that goes into a bank's folder: numpy is all it needs.

``patchlab_bank.py`` beside this file is that module, word for word: nothing of patchlab
is imported by it, and it is the same for every bank.
"""

from __future__ import annotations

from collections.abc import Mapping
from importlib import resources
from types import ModuleType
from typing import Any

from patchlab.errors import InputError
from patchlab.store import canonical_json
from patchlab.types import Bundle

RUNTIME = "patchlab_bank.py"
RULES = "edges.json"


def runtime_files(rules: Mapping[str, Any] | None) -> Bundle:
    """The runtime and what it must know to find edges.

    Parameters
    ----------
    rules : plain data: hysteresis, dilation_px, window_sigmas, and scales with scale,
        angles_rad, sigma_px, reach_px, floor (share of the largest strength around), and
        rival_kernels with rival_share (share of their largest response around) each, and softer
        (place of an octave, share of its largest strength around, what comes on top) and apart_px
        (in place of dilation_px) where there are octaves; None for
        a bank that finds no edges
    """
    source = resources.files("patchlab.export").joinpath(RUNTIME).read_bytes()
    files = {RUNTIME: source}
    if rules is not None:
        files[RULES] = canonical_json(dict(rules))
    return files


def open_runtime(source: bytes) -> ModuleType:
    """The module in a runtime's source. It is run: hand in only bytes whose hash was checked.

    Raises
    ------
    InputError : it does not run.
    """
    module = ModuleType("patchlab_bank")
    try:
        exec(compile(source, RUNTIME, "exec"), vars(module))
    except Exception as error:  # foreign code
        raise InputError(f"does not run ({type(error).__name__}: {error})", where=RUNTIME) from None
    return module
