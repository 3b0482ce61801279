"""The cost model fitted to the machine it runs on."""

from __future__ import annotations

import json
import time
from pathlib import Path
from typing import Any

import numpy as np

from patchlab import bank as banks
from patchlab import export, store
from patchlab.bank.costs import STANDING, Costs, Work, fitted, read_costs
from patchlab.errors import InputError, UsageError
from patchlab.pipeline.bench_banks import calibration_banks
from patchlab.progress import Progress, silent
from patchlab.settings import Settings, option_name
from patchlab.types import Bank

FORMAT = "patchlab costs 1"
PICTURE = (640, 480)
"""Width and height of the picture that is timed, pixels: planes larger than the caches."""


def calibrate(path: Path, repeats: int, *, progress: Progress = silent) -> dict[str, Any]:
    """Time plans that strain each price, fit the prices, write them to a file; plain data.

    Parameters
    ----------
    path : JSON file to write; ``patchlab export --costs`` takes it
    repeats : calls of each plan; the least time counts, of the processor and not of the clock

    Raises
    ------
    UsageError : something stands at the path, or there is no compiler.
    """
    if path.exists():
        raise UsageError("stands already", where=str(path), remedy="name another file")
    compiler = export.find_compiler()
    if compiler is None:
        raise UsageError(export.NO_COMPILER, remedy="install a C compiler to calibrate with")
    names, work, measured = [], [], []
    jobs = [(bank, kind) for bank, kinds in calibration_banks() for kind in kinds]
    for done, (bank, kind) in enumerate(jobs):
        progress("calibrate", done, len(jobs), f"{bank.name}, {kind}")
        counted, spent = _timed(bank, kind, repeats, compiler)
        names.append(f"{bank.name}, {kind}")
        work.append(counted)
        measured.append(spent)
    progress("calibrate", len(jobs), len(jobs))
    prices, error = fitted(work, measured)
    rows = [
        {"plan": n, "measured_ns": round(t, 3), "model_ns": round(prices.time(w), 3)}
        for n, t, w in zip(names, measured, work, strict=True)
    ]
    result = {
        "format": FORMAT, "prices_ns": prices.plain(), "largest_relative_error": error,
        "plans": rows,
    }  # fmt: skip
    path.write_bytes(store.canonical_json(result))
    return {"file": str(path), **result}


def _timed(bank: Bank, kind: str, repeats: int, compiler: Any) -> tuple[Work, float]:
    """Counted work of a plan, and its nanoseconds a pixel on one thread."""
    plan = banks.make_plan(bank, kind)
    library = export.compile_library(export.emit(bank, plan), bank.name, compiler=compiler)
    assert library is not None
    native = banks.NativeBank(bank, plan, library, store.sha256(library))
    pixels = export.bench.picture(bank, *PICTURE)
    out = np.empty((len(bank), *pixels.shape), dtype=np.float32)
    spent = []
    for _ in range(repeats + 1):
        start = time.process_time()
        native.responses(pixels, out=out)
        spent.append(time.process_time() - start)
    return plan.detail["work"], 1e9 * min(spent[1:]) / pixels.size


def costs_file(path: Path) -> Costs:
    """Prices from a file that :func:`calibrate` wrote.

    Raises
    ------
    InputError : no such file, or not prices.
    """
    try:
        found = json.loads(path.read_bytes())
    except OSError as error:
        raise InputError(f"cannot be read: {error.strerror}", where=str(path)) from None
    except (ValueError, RecursionError):
        raise InputError("is not JSON", where=str(path)) from None
    if not isinstance(found, dict) or found.get("format") != FORMAT:
        raise InputError(
            "is no cost model", where=str(path), remedy="write one with patchlab bench --calibrate"
        )
    return read_costs(found.get("prices_ns"), str(path))


def chosen_costs(settings: Settings) -> Costs:
    """The prices that plans go by: of the file that is named, else the standing ones."""
    return costs_file(Path(settings.costs)) if settings.costs else STANDING


def refuse_planning(settings: Settings) -> None:
    """Refuse settings of the plan where a bank's own stands.

    Raises
    ------
    UsageError
    """
    for name in ("plan", "tolerance", "costs"):
        if getattr(settings, name) != getattr(Settings(), name):
            raise UsageError(
                f"{option_name(name)} has no effect here: the bank's plan stands",
                remedy="export the run again with it, or export --taps",
            )
