"""A bank as a folder: ``bank.json``, its arrays, and the files of its exports.

``bank.json`` is written for people too: every kernel with its parameters, whose
names carry their units, the input contract, the plan with its error bounds.
Reading runs no code and trusts nothing: every file's hash is checked, arrays
hold no pickle, and names must be C identifiers before they reach any text.
"""

from __future__ import annotations

import math
from collections.abc import Mapping
from pathlib import Path
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab import __version__
from patchlab.bank.costs import read_costs
from patchlab.bank.lattice import check_name
from patchlab.bank.plan import KINDS, make_plan
from patchlab.conventions import BORDERS
from patchlab.errors import InputError, UsageError, VerificationError
from patchlab.store import (
    canonical_json,
    npy_array,
    npy_bytes,
    read_file,
    read_manifest,
    sha256,
    shown,
    write_artefact,
)
from patchlab.types import (
    F64,
    Bank,
    Bundle,
    Coverage,
    InputContract,
    InputTable,
    Kernel,
    Plan,
    Thresholds,
)

MANIFEST = "bank.json"
LAYOUT = 2
"""Raised whenever the same kernels would be planned or laid out otherwise."""
TAPS, TABLE, NOISE = "kernels.npy", "input_table.npy", "autocovariance.npy"
MIX = "mix.npy"
FIXED_TAPS, FIXED_CODES = "fixed_kernels.npy", "fixed_codes.npy"
OPERATION = "correlation: r(y, x) = sum k(j, i) p(y + j - c, x + i - c), p the working values"

COLOUR_OPERATION = (
    "correlation: r(y, x) = sum k(j, i, m) p_m(y + j - c, x + i - c), p_m the working planes: "
    "sum over samples of mix(m, s) table(s), or the tabled samples where there is no mix"
)


def check_names(bank: Bank) -> None:
    """Refuse a bank whose name, or a kernel's, cannot stand in C and in a path.

    Raises
    ------
    UsageError
    """
    for name in (bank.name, *(kernel.name for kernel in bank.kernels)):
        check_name(str(name))


# ---------------------------------------------------------------- writing


def bank_files(
    bank: Bank, plan: Plan, extra: Bundle | None = None
) -> tuple[dict[str, bytes], dict[str, Any]]:
    """The files of a bank and the body of its manifest.

    Parameters
    ----------
    bank : Bank
    plan : Plan made from it
    extra : further files (C source, libraries, ONNX, vectors), relative path to bytes

    Returns
    -------
    dict of relative path to bytes, and dict of plain data for ``bank.json``

    Raises
    ------
    UsageError : a name that is not an identifier, or an extra file that takes a bank's own name.
    """
    check_names(bank)
    files = {TAPS: npy_bytes(bank.taps)}
    if bank.table.values is not None:
        files[TABLE] = npy_bytes(bank.table.values)
    if bank.noise_autocovariance is not None:
        files[NOISE] = npy_bytes(bank.noise_autocovariance)
    if bank.mix is not None:
        files[MIX] = npy_bytes(bank.mix)
    fixed = plan.detail["fixed"]
    if fixed is not None:
        files[FIXED_TAPS] = npy_bytes(fixed.taps.astype(np.int32))
        files[FIXED_CODES] = npy_bytes(fixed.codes)
    for name, data in (extra or {}).items():
        if name in (MANIFEST, TAPS, TABLE, NOISE, MIX, FIXED_TAPS, FIXED_CODES):
            raise UsageError(f"{name} is the bank's own file", where=bank.name)
        files[name] = data
    return files, _body(bank, plan)


def _body(bank: Bank, plan: Plan) -> dict[str, Any]:
    return {
        "name": bank.name,
        "purpose": bank.purpose,
        "octaves": bank.octaves,
        "strength": bank.strength,
        "border": bank.border,
        "operation": OPERATION if bank.planes == 1 else COLOUR_OPERATION,
        "kernel_size": bank.size,
        "kernels": [_kernel_entry(k) for k in bank.kernels],
        "input": _input_entry(bank.table),
        "thresholds": _thresholds_entry(bank.thresholds),
        "line_thresholds": _thresholds_entry(bank.line_thresholds),
        "coverage": _coverage_entry(bank.coverage),
        "noise_autocovariance": None if bank.noise_autocovariance is None else NOISE,
        **({} if bank.mix is None else {"mix": MIX}),
        "plan": {
            "kind": plan.kind,
            "asked": plan.detail["asked"],
            "groups": list(plan.groups),
            "multiplies_per_pixel": plan.multiplies,
            "adds_per_pixel": plan.adds,
            "loads_per_pixel": plan.loads,
            "tolerance": plan.detail["tolerance"],
            "prices_ns": plan.detail["costs"].plain(),
            "error_bound": list(plan.error_bound),
        },
        "fixed_point": _fixed_entry(plan.detail["fixed"]),
        "interface": plan.detail["abi"],
        "layout": LAYOUT,
        "provenance": dict(bank.provenance),
        "warnings": list(bank.warnings),
    }


def _fixed_entry(fixed: Any) -> dict[str, Any] | None:
    return (
        None
        if fixed is None
        else {
            "operation": "count = floor((sum of whole products + 2^(shift-1)) / 2^shift)",
            "shift": list(fixed.shift),
            "value_of_a_count": list(fixed.step),
            "error_bound": list(fixed.bound),
            "can_saturate": list(fixed.clips),
        }
    )


def _kernel_entry(kernel: Kernel) -> dict[str, Any]:
    return {
        "name": kernel.name,
        "family": kernel.family,
        "parity": kernel.parity,
        "scale": None if kernel.scale is None else int(kernel.scale),
        "orientation": None if kernel.orientation is None else int(kernel.orientation),
        "parameters": {k: float(v) for k, v in kernel.parameters.items()},
        "gain": float(kernel.gain),
        "r2": None if kernel.r2 is None else float(kernel.r2),
    }


def _input_entry(table: InputTable) -> dict[str, Any]:
    about = table.contract
    return {
        "pixels": about.pixels,
        "bits": about.format.bits,
        "black": float(about.black),
        "white": float(about.white),
        "transfer": about.transfer,
        "plane": about.plane,
        "table": {
            "kind": table.kind,
            "file": None if table.values is None else TABLE,
            "slope": float(table.slope),
            "offset": float(table.offset),
            "scale": float(table.scale),
            "noise_sd": None if table.noise_sd is None else float(table.noise_sd),
            # JSON has no infinity: null is "no limit"
            "valid_codes": [float(v) if math.isfinite(v) else None for v in table.valid_codes],
        },
        **(
            {"samples": about.format.colours, "cell": about.format.cell}
            if about.format.planes > 1
            else {}
        ),
    }


def _thresholds_entry(known: Thresholds | None) -> dict[str, Any] | None:
    return (
        None
        if known is None
        else {
            "false_edges_per_megapixel": known.rate.tolist(),
            "strength": known.strength.tolist(),
            "rice": known.rice.tolist(),
            "groups_per_megapixel": known.groups.tolist(),
            "hysteresis": float(known.hysteresis),
            "megapixels": float(known.megapixels),
            "noise": known.noise,
        }
    )


def _coverage_entry(known: Coverage | None) -> dict[str, Any] | None:
    return (
        None
        if known is None
        else {
            "learned": float(known.learned),
            "rotated": float(known.rotated),
            "untrained": float(known.untrained),
            "budget": known.budget.tolist(),
            "curve": known.curve.tolist(),
        }
    )


def write_bank(
    folder: Path,
    bank: Bank,
    plan: Plan,
    bundle: Bundle | None = None,
    *,
    force: bool = False,
    seed: int | None = None,
    settings: Mapping[str, Any] | None = None,
    inputs: Mapping[str, str] | None = None,
    parents: Mapping[str, str] | None = None,
) -> dict[str, Any]:
    """Write a bank folder, whole or not at all.

    Parameters
    ----------
    folder : where it will stand
    bank, plan : the bank and the plan made from it
    bundle : further files, as in :func:`bank_files`
    force, seed, settings, inputs, parents : as :func:`patchlab.store.write_artefact`

    Returns
    -------
    dict : the manifest as written

    Raises
    ------
    UsageError : a bad name, or something stands there already.
    """
    files, body = bank_files(bank, plan, bundle)
    return write_artefact(
        folder, "bank", files, body=body, settings=settings, seed=seed, inputs=inputs,
        parents=parents, manifest=MANIFEST, force=force,
    )  # fmt: skip


# ---------------------------------------------------------------- reading


def _version(head: Mapping[str, Any]) -> Any:
    made_by = head.get("environment")
    return made_by.get("patchlab") if isinstance(made_by, dict) else None


def _made_elsewhere(head: Mapping[str, Any]) -> VerificationError:
    version = _version(head)
    return VerificationError(
        f"this bank was exported by another patchlab (version {shown(version)}, layout "
        f"{shown(head.get('layout'))}; here is {__version__}, layout {LAYOUT}), which planned it "
        "otherwise",
        where=str(head.get("name", "")),
        remedy="export it again with this version, or use the one that made it",
    )


def read_bank(folder: Path) -> tuple[Bank, Plan, dict[str, Any]]:
    """Read a bank, its plan and its manifest; nothing of it is run.

    Parameters
    ----------
    folder : a bank's folder

    Returns
    -------
    Bank, Plan, dict (the manifest)

    Raises
    ------
    InputError : no bank here, a newer major version, or content that makes no sense.
    VerificationError : a file, or the manifest itself, is missing or was changed, or a file
        name leads out of the folder.
    """
    folder = Path(folder)
    head = read_manifest(folder, "bank", manifest=MANIFEST)
    _check_id(folder, head)
    if head.get("layout") != LAYOUT:
        raise _made_elsewhere(head)
    try:
        bank = _bank(folder, head)
        check_names(bank)
        plan = _plan(folder, head, bank)
    except (KeyError, TypeError, ValueError, AttributeError, OverflowError) as error:
        raise InputError(
            f"the manifest makes no sense ({type(error).__name__}: {shown(error, 200)})",
            where=str(folder / MANIFEST),
        ) from None
    except UsageError as error:
        what = shown(error.what, 300)
        raise InputError(what, where=str(folder / MANIFEST), remedy=error.remedy) from None
    return bank, plan, head


def check_files(folder: Path, head: Mapping[str, Any]) -> None:
    """Check the hash of every file the manifest names.

    Raises
    ------
    VerificationError : for the first one that is missing or was changed.
    """
    for name in sorted(head["files"]):
        read_file(folder, head, name)


def _check_id(folder: Path, head: Mapping[str, Any]) -> None:
    content = {k: v for k, v in head.items() if k != "id"}
    try:
        own = sha256(canonical_json(content))[:16]
    except ValueError:
        own = ""
    if own != head.get("id"):
        raise VerificationError(
            "was changed after it was written (its content id differs)",
            where=str(folder / MANIFEST),
            remedy="export the bank again, or restore the file",
        )


def _array(folder: Path, head: Mapping[str, Any], name: str) -> NDArray[Any]:
    return npy_array(read_file(folder, head, name), str(folder / name))


def _one_of(value: Any, known: Any, what: str) -> Any:
    if value not in known:
        raise InputError(f"unknown {what} {shown(value)!r}", remedy=f"known are {', '.join(known)}")
    return value


def _bank(folder: Path, head: Mapping[str, Any]) -> Bank:
    taps = _array(folder, head, TAPS)
    if taps.ndim not in (3, 4) or taps.dtype != np.float32:
        raise InputError(
            "kernels must be float32 (n, h, h), or (n, h, h, planes)", where=str(folder / TAPS)
        )
    noise = head["noise_autocovariance"]
    return Bank(
        name=str(head["name"]),
        kernels=tuple(_kernel(entry) for entry in head["kernels"]),
        taps=np.ascontiguousarray(taps),
        table=_table(folder, head),
        border=_one_of(head["border"], BORDERS, "border"),
        strength=_one_of(head["strength"], ("step", "line", "energy"), "strength"),
        purpose=str(head["purpose"]),
        octaves=int(head.get("octaves", 0)),
        thresholds=_thresholds(head["thresholds"]),
        line_thresholds=_thresholds(head.get("line_thresholds")),
        coverage=_coverage(head["coverage"]),
        noise_autocovariance=None if noise is None else _autocovariance(folder, head),
        provenance=dict(head["provenance"]),
        warnings=tuple(str(w) for w in head["warnings"]),
        mix=_array(folder, head, MIX) if head.get("mix") else None,
    )


def _kernel(entry: Mapping[str, Any]) -> Kernel:
    def whole(value: Any) -> int | None:
        return None if value is None else int(value)

    return Kernel(
        name=str(entry["name"]),
        family=str(entry["family"]),
        parity=_one_of(entry["parity"], ("odd", "even", "none"), "parity"),
        scale=whole(entry["scale"]),
        orientation=whole(entry["orientation"]),
        parameters={str(k): float(v) for k, v in entry["parameters"].items()},
        gain=float(entry["gain"]),
        r2=None if entry["r2"] is None else float(entry["r2"]),
    )


def _table(folder: Path, head: Mapping[str, Any]) -> InputTable:
    entry = head["input"]
    about = InputContract(
        str(entry["pixels"]),
        float(entry["black"]),
        float(entry["white"]),
        _one_of(entry["transfer"], ("linear", "srgb"), "transfer"),
        str(entry.get("plane", "")),
    )
    table = entry["table"]
    values = None
    if about.format.integer:
        values = _array(folder, head, TABLE)
        if values.dtype != np.float32 or not bool(np.isfinite(values).all()):
            raise InputError("working values must be finite float32", where=str(folder / TABLE))
    low, high = table["valid_codes"]
    return InputTable(
        kind=_one_of(table["kind"], ("identity", "linear", "log", "stabilised"), "table"),
        contract=about,
        values=values,
        noise_sd=None if table["noise_sd"] is None else float(table["noise_sd"]),
        slope=float(table["slope"]),
        offset=float(table["offset"]),
        scale=float(table["scale"]),
        valid_codes=(
            -math.inf if low is None else float(low),
            math.inf if high is None else float(high),
        ),
    )


def _autocovariance(folder: Path, head: Mapping[str, Any]) -> F64:
    found = _array(folder, head, NOISE)
    if found.ndim != 2 or found.shape[0] != found.shape[1] or found.shape[0] % 2 == 0:
        raise InputError("an autocovariance is square and odd", where=str(folder / NOISE))
    return found.astype(np.float64)


def _thresholds(entry: Mapping[str, Any] | None) -> Thresholds | None:
    if entry is None:
        return None
    rate, strength, rice, groups = (
        np.array(entry[k], dtype=np.float64)
        for k in ("false_edges_per_megapixel", "strength", "rice", "groups_per_megapixel")
    )
    if not rate.ndim == 1 or not rate.shape == strength.shape == rice.shape:
        raise InputError("thresholds need one strength for each rate")
    if groups.shape not in (rate.shape, (0,)):
        raise InputError("thresholds need one count of groups for each rate, or none")
    return Thresholds(
        rate, strength, rice, float(entry["hysteresis"]), float(entry["megapixels"]),
        str(entry["noise"]), groups,
    )  # fmt: skip


def _coverage(entry: Mapping[str, Any] | None) -> Coverage | None:
    if entry is None:
        return None
    return Coverage(
        float(entry["learned"]),
        float(entry["rotated"]),
        float(entry["untrained"]),
        np.array(entry["budget"], dtype=np.int64),
        np.array(entry["curve"], dtype=np.float64),
    )


def _plan(folder: Path, head: Mapping[str, Any], bank: Bank) -> Plan:
    """The plan made again from the kernels; it must be the one the exports were made from."""
    entry = head["plan"]
    plan = make_plan(
        bank,
        _one_of(entry["asked"], KINDS, "plan"),
        tolerance=float(entry["tolerance"]),
        costs=read_costs(entry["prices_ns"], str(folder / MANIFEST)),
    )
    stored = np.array(entry["error_bound"], dtype=np.float64)
    # what is fitted to a kernel may differ by a rounding between libraries of linear algebra
    fits = plan.detail["halved"] is not None or any(plan.detail["factors"])
    near = 1e-2 if fits else 1e-9
    same = stored.shape == (len(bank),) and np.allclose(stored, plan.error_bound, near, 0)
    if not same or head["interface"] != plan.detail["abi"]:
        if _version(head) != __version__:
            raise _made_elsewhere(head)
        raise VerificationError(
            "the plan in the manifest does not belong to these kernels",
            where=bank.name,
            remedy="export the bank again",
        )
    return plan
