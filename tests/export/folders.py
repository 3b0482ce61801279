"""Bank folders for tests: written as the pipeline writes them, quickly compiled."""

from __future__ import annotations

import json
from dataclasses import replace
from pathlib import Path

import numpy as np

from patchlab import export
from patchlab.bank.disk import write_bank
from patchlab.bank.plan import make_plan
from patchlab.pipeline import bundle
from patchlab.pipeline.edgel_rules import edgel_rules
from patchlab.store import canonical_json, sha256
from patchlab.types import Bank, Thresholds
from tests.bank.banks import lattice_bank, random_bank

TABLE = Thresholds(
    np.array([0.1, 1.0, 10.0, 100.0]), np.array([60.0, 50.0, 42.0, 33.0]),
    np.array([60.0, 50.0, 42.0, 33.0]), 0.7, 6.0, "white",
)  # fmt: skip

BANKS = {
    "step": replace(lattice_bank("step", count=8, size=11), thresholds=TABLE),
    "energy": lattice_bank(
        "energy", families=("gd1", "gd2"), widths=((1.2, 2.0),), count=4, size=7,
        strength="energy", border="wrap", pixels="Mono12", kind="stabilised",
    ),
    "line": lattice_bank(
        "line", families=("gd2",), count=4, size=9, strength="line", pixels="float32",
        kind="stabilised", border="zero",
    ),
    "both": lattice_bank(
        "both", families=("gd1", "gd2"), count=4, size=9, kind="stabilised", border="edge"
    ),
    "arbitrary": random_bank(5, 7, border="mirror"),
}  # fmt: skip


def write(folder: Path, bank: Bank, *, library: bool = True) -> Path:
    """A bank's folder with its C source, library and runtime."""
    plan = make_plan(bank)
    files = dict(export.emit(bank, plan, edgel_rules(bank)))
    files |= export.runtime_files(bundle.edge_rules(bank))
    if library:
        data = export.compile_library(files, bank.name, flags=("-O1",))
        files[bundle.own_library(bank)] = data
    write_bank(folder, bank, plan, files)
    return folder


def reseal(folder: Path, change, manifest: str = "bank.json") -> None:
    """Change a manifest as someone would who also repairs its content id."""
    head = json.loads((folder / manifest).read_bytes())
    head.pop("id")
    change(head)
    head["id"] = sha256(canonical_json(head))[:16]
    (folder / manifest).write_bytes(canonical_json(head))


def put(folder: Path, name: str, data: bytes) -> None:
    """Replace a file and its hash in the manifest."""
    (folder / name).parent.mkdir(parents=True, exist_ok=True)
    (folder / name).write_bytes(data)
    reseal(folder, lambda head: head["files"].update({name: sha256(data)}))


def scene(bank, shape=(90, 121), seed=3):
    """Bars and discs of many contrasts in noise, in the bank's pixels."""
    rng = np.random.default_rng(seed)
    y, x = np.mgrid[: shape[0], : shape[1]]
    light = 0.4 + 0.15 * (x > 50) + 0.2 * (np.hypot(x - 85, y - 40) < 22)
    light = light + 0.1 * ((x + 2 * y) % 61 < 4) + rng.normal(0, 0.02, shape)
    form = bank.contract.format
    codes = np.clip(light, 0, 1) * form.full_scale
    return (np.rint(codes) if form.integer else codes).astype(form.dtype)
