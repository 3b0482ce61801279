"""A bank's WebAssembly module run in Node, so that it can be compared like any other target."""

from __future__ import annotations

import re
import shutil
import subprocess
import tempfile
from pathlib import Path
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.errors import UsageError, VerificationError
from patchlab.export.compare import Target
from patchlab.export.edgel_vectors import COLUMNS
from patchlab.types import EDGEL, Bank

_DRIVER = """\
import { readFileSync, writeFileSync } from "node:fs";
import { load } from "./bank.mjs";
const [array, width, height, scale, lines] = process.argv.slice(2);
const bank = await load(readFileSync("bank.wasm"));
const raw = Uint8Array.from(readFileSync("image.bin"));
const picture = new globalThis[array](raw.buffer);
if (scale === undefined) writeFileSync("planes.bin", bank.responses(picture, +width, +height));
else if (lines !== undefined) {
  const found = bank.edgels(picture, +width, +height, +scale, +lines);
  const names = ["x", "y", "theta", "strength", "sd", "scale", "kind", "width"];
  writeFileSync("planes.bin", Float32Array.from(names.flatMap((name) => [...found[name]])));
} else {
  const found = bank.edges(picture, +width, +height, +scale);
  writeFileSync("planes.bin", found.strength);
  writeFileSync("turns.bin", found.orientation);
}
"""


def find_node() -> str | None:
    """The command of Node, or None where it is not installed."""
    return shutil.which("node")


def wasm_target(bank: Bank, module: bytes, loader: bytes) -> Target:
    """A WebAssembly module as a target. Node runs it: hand in only bytes whose hash was checked.

    Parameters
    ----------
    bank : the bank it was made from
    module, loader : ``NAME.wasm`` and ``NAME.mjs``

    Raises
    ------
    UsageError : Node is not installed.
    """
    node = find_node()
    if node is None:
        raise UsageError("Node, which could run it, is not installed")
    array = {"u1": "Uint8Array", "u2": "Uint16Array", "f4": "Float32Array"}
    kind = array[np.dtype(bank.contract.format.dtype).str[1:]]

    def run(pixels: NDArray[Any], *more: object) -> tuple[bytes, bytes]:
        h, w = pixels.shape
        with tempfile.TemporaryDirectory(prefix="bank-") as work:
            folder = Path(work)
            files = {"bank.wasm": module, "bank.mjs": loader, "run.mjs": _DRIVER.encode(),
                     "image.bin": pixels.tobytes(), "turns.bin": b""}  # fmt: skip
            for name, data in files.items():
                (folder / name).write_bytes(data)
            words = [node, "run.mjs", kind, str(w), str(h), *map(str, more)]
            done = subprocess.run(
                words, cwd=folder, capture_output=True, text=True, timeout=300, check=False,
                errors="replace",
            )  # fmt: skip
            if done.returncode:
                said = [row for row in done.stderr.splitlines() if re.match(r"\w*Error\b", row)]
                raise VerificationError(f"Node ended badly: {(said or [done.stderr])[0][:300]}")
            return (folder / "planes.bin").read_bytes(), (folder / "turns.bin").read_bytes()

    def responses(pixels: NDArray[Any]) -> NDArray[np.float32]:
        planes, _ = run(pixels)
        return np.frombuffer(planes, "<f4").reshape(-1, *pixels.shape)

    def edges(pixels: NDArray[Any], place: int) -> tuple[Any, Any]:
        strength, turns = run(pixels, place)
        shape = pixels.shape
        return (
            np.frombuffer(strength, "<f4").reshape(shape),
            np.frombuffer(turns, np.uint8).reshape(shape),
        )

    def edgels(pixels: NDArray[Any], threshold: float, line_threshold: float) -> NDArray[np.void]:
        planes, _ = run(pixels, repr(float(threshold)), repr(float(line_threshold)))
        columns = np.frombuffer(planes, "<f4").reshape(len(COLUMNS), -1)
        found = np.zeros(columns.shape[1], EDGEL)
        for name, column in zip(COLUMNS, columns, strict=True):
            found[name] = column
        return found

    has_edgels = f"{bank.name}_edgels".encode() in module
    name = f"WebAssembly lib/wasm32/{bank.name}.wasm"
    return Target(name, responses, edges, edgels=edgels if has_edgels else None)
