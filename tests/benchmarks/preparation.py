"""What preparing patches does to the bank: one choice changed at a time.

    python tests/benchmarks/preparation.py [--photos FOLDER] [--noise SD] [-o TABLE.json]

The photographs are halved (by picture, keyed); each half gives a dictionary, fits and a bank
of 16 feature kernels. Columns: components kept; share of atoms whose kernel fit has R2 above
0.8 and 0.9; the worst |cos| over shifts between kernels of the two halves' banks; the loss of
coverage when one half's bank serves the other half's atoms; coverage of reference atoms,
learned without noise from all photographs with the default preparation.

``--noise`` adds white Gaussian noise of so many grey levels of 255 to sRGB-coded pictures and
tries the two rules against it: the least contrast, in noise standard deviations, and the share
of a direction's variance that may be noise.
"""

import argparse
import json
import time
from dataclasses import dataclass, replace
from pathlib import Path
from typing import Any

import numpy as np
from photographs import pictures

from patchlab import bank as banks
from patchlab import camera, learn, shapes
from patchlab.bank.coverage import coverage_of
from patchlab.conventions import srgb_encode
from patchlab.types import InputContract, NoiseModel, PatchSet, Survey

CONTRACT = InputContract("float32", 0.0, 1.0)


@dataclass(frozen=True)
class Preparation:
    """The choices. ``multiple`` and ``share`` act only where there is noise."""

    tone: str = "log"
    normalise: bool = True
    flat: float = 0.3
    by_picture: bool = False
    retain: float = 0.98
    multiple: float = 2.0
    share: float = 0.5


VARIANTS: dict[str, dict[str, Any]] = {
    "default": {},
    "not normalised": {"normalise": False},
    "square root of light": {"tone": "sqrt"},
    "linear light": {"tone": "linear"},
    "no flattest dropped": {"flat": 0.0},
    "flattest 15 % dropped": {"flat": 0.15},
    "flattest 30 % of each picture dropped": {"by_picture": True},
    "flattest 60 % dropped": {"flat": 0.6},
    "retain 0.95": {"retain": 0.95},
    "retain 0.99": {"retain": 0.99},
    "retain 0.995": {"retain": 0.995},
}
AGAINST_NOISE: dict[str, dict[str, Any]] = {
    "contrast 2 sd, share 0.5": {},
    "contrast 1.25 sd, share 0.5": {"multiple": 1.25},
    "contrast 1.25 sd, share 0.5, flattest 15 % dropped": {"multiple": 1.25, "flat": 0.15},
    "contrast 2 sd, share 0.5, flattest 15 % dropped": {"flat": 0.15},
    "contrast 1.25 sd, share 0.5, no flattest dropped": {"multiple": 1.25, "flat": 0.0},
    "share 0.5 only": {"multiple": 0.0},
    "share 0.5 only, no flattest dropped": {"multiple": 0.0, "flat": 0.0},
    "share 0.3 only": {"multiple": 0.0, "share": 0.3},
    "neither rule": {"multiple": 0.0, "share": np.inf},
    "contrast 1.5 sd only": {"multiple": 1.5, "share": np.inf},
    "contrast 3 sd, share 0.5": {"multiple": 3.0},
}


def toned(plane: np.ndarray, tone: str) -> np.ndarray:
    """Light by its tone curve."""
    light = np.maximum(plane, 0)
    return {"log": np.log(light + 0.01), "sqrt": np.sqrt(light), "linear": light}[tone]


def steepest(rows: np.ndarray, flat: float) -> np.ndarray:
    """Without the flattest share."""
    return rows[np.argsort(-rows.std(axis=1))[: int(len(rows) * (1 - flat))]]


def draw(planes, how: Preparation, noise_sd: float, count: int, size: int, seed: int) -> PatchSet:
    """Patches; with noise, planes are sRGB-coded and the tone is left as it is."""
    r = np.random.default_rng(seed)
    each = int(np.ceil(count / (1 - how.flat) / len(planes) * 1.02))
    rows = []
    for plane in planes:
        values = plane if noise_sd else toned(plane, how.tone)
        y = r.integers(0, plane.shape[0] - size + 1, each * 3)
        x = r.integers(0, plane.shape[1] - size + 1, each * 3)
        windows = np.lib.stride_tricks.sliding_window_view(values, (size, size))
        found = windows[y, x].reshape(len(y), -1)
        found = found[found.std(axis=1) > max(how.multiple * noise_sd, 1e-9)][:each]
        rows.append(steepest(found, how.flat) if how.by_picture else found)
    all_rows = np.concatenate(rows)
    if not how.by_picture:
        all_rows = steepest(all_rows, how.flat)
    all_rows = all_rows[r.permutation(len(all_rows))]
    dc, contrast = all_rows.mean(axis=1), all_rows.std(axis=1)
    if not how.normalise:
        contrast = np.ones_like(contrast)
    n = len(all_rows)
    return PatchSet(
        np.ascontiguousarray((all_rows - dc[:, None]) / contrast[:, None], np.float32),
        size,
        np.zeros(n, np.int32),
        np.zeros((n, 2), np.int32),
        dc.astype(np.float32),
        contrast.astype(np.float32),
        ("drawn",),
        {},
    )


def learned(planes, how: Preparation, noise_sd: float, count: int, size: int, seed: int):
    patches = draw(planes, how, noise_sd, count, size, seed)
    known = learn.moments(patches.patches)
    through = learn.whitening(known, retain=how.retain)
    if noise_sd and np.isfinite(how.share):
        through = cut_at(known, patches, how, noise_sd)
    return learn.learn_ica(patches, through, seed=seed, restarts=1, tolerance=1e-5)


def cut_at(known, patches, how, noise_sd):
    """The whitening cut where noise makes up ``share`` of the variance: scale its covariance."""
    noise = learn.noise_covariance(patches, noise_sd) * (0.5 / how.share)
    return learn.whitening(known, retain=how.retain, noise=noise)


def bank_of(dictionary, fits):
    table = camera.make_table("identity", CONTRACT, None)
    survey = Survey(CONTRACT, NoiseModel(False, "not asked for"), table)
    settings = banks.BankSettings(kernels=16, purpose="features", name="b")
    return banks.choose_bank(dictionary, fits, survey, settings)


def covered(bank, atoms) -> float:
    found: dict[Any, list[Any]] = {}
    for kernel, taps in zip(bank.kernels, bank.taps, strict=True):
        found.setdefault((kernel.scale, kernel.orientation), []).append(taps)
    return float(coverage_of([np.stack(g) for g in found.values()], atoms).mean())


def measure(clean, how, noise, count, size, seed, reference) -> dict[str, float]:
    r = np.random.default_rng(seed)
    planes = [srgb_encode(p) for p in clean] if noise else clean
    planes = [p + r.normal(0, noise / 255, p.shape) for p in planes]
    order = r.permutation(len(planes))
    halves = []
    for i, half in enumerate((order[: len(order) // 2], order[len(order) // 2 :])):
        found = learned([planes[j] for j in half], how, noise / 255, count, size, seed + i)
        fits = shapes.fit_kernels(found.atoms, "atoms")
        halves.append((found, fits, bank_of(found, fits)))
    r2 = np.array([f.r2 for _, fits, _ in halves for f in fits.fits])
    (a, _, one), (b, _, two) = halves
    loss = [
        covered(own, d.atoms) - covered(other, d.atoms)
        for own, other, d in ((one, two, a), (two, one, b))
    ]
    return {
        "components": (len(a) + len(b)) / 2,
        "r2 > 0.8": float(np.mean(r2 > 0.8)),
        "r2 > 0.9": float(np.mean(r2 > 0.9)),
        "worst cos": float(banks.compare_banks(one, two).min()),
        "cross loss": float(np.mean(loss)),
        "reference": (covered(one, reference) + covered(two, reference)) / 2,
    }


def main() -> None:
    parser = argparse.ArgumentParser(description=__doc__.splitlines()[0])
    parser.add_argument("--photos", type=Path)
    parser.add_argument("--noise", type=float, default=0.0)
    parser.add_argument("--patches", type=int, default=20_000)
    parser.add_argument("--size", type=int, default=12)
    parser.add_argument("--seeds", type=int, default=2)
    parser.add_argument("-o", "--out", type=Path)
    parser.add_argument("--only", action="append", help="a variant's name; may be repeated")
    options = parser.parse_args()
    clean, base, table = pictures(options.photos), Preparation(), []
    reference = learned(clean, base, 0.0, options.patches, options.size, 0).atoms
    variants = AGAINST_NOISE if options.noise else VARIANTS
    for name in options.only or variants:
        change = variants[name]
        began = time.process_time()
        how = replace(base, **change)
        found = [
            measure(clean, how, options.noise, options.patches, options.size, seed, reference)
            for seed in range(options.seeds)
        ]
        line = {k: float(np.mean([f[k] for f in found])) for k in found[0]}
        line["worst cos"] = min(f["worst cos"] for f in found)
        if not table:
            print("| preparation | " + " | ".join(line) + " |\n|---" + "|---" * len(line) + "|")
        print(f"| {name} | " + " | ".join(f"{v:.3g}" for v in line.values()) + " |", flush=True)
        table.append({"preparation": name, **line, "cpu": time.process_time() - began})
    if options.out:
        options.out.write_text(json.dumps(table, indent=1) + "\n")


if __name__ == "__main__":
    main()
