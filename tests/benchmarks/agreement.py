"""How far this package's edges and those of libraries agree on photographs; no truth is claimed.

    python tests/benchmarks/agreement.py [--photos FOLDER] [--rate RATE] [-o TABLE.json]

Each photograph is light for a simulated camera, so that its noise is known. Our bank has its
thresholds from that noise and one promised rate. Every library detector gets the same tabled
picture and the setting of its grid that finds about as many elements as ours, so that nobody
looks better by saying more. Told are the shares of ours that the library has within a pixel, one
to one, and of the library's that we have.
"""

import argparse
import dataclasses
import json
from pathlib import Path

import numpy as np
import photographs

from patchlab import bank as banks
from patchlab import camera
from patchlab.bank import lattice
from patchlab.edges import calibrate, detect_edgels, rivals
from patchlab.edges.matching import count_pairs
from patchlab.export import bench
from patchlab.images.scenes import Camera
from patchlab.types import Bank, NoiseModel

SIDE = 256
"""What is taken of each photograph, from its top left, pixels."""
DEVICE = Camera(bits=10, gain=0.5, full_well=1900, read_noise=3.0, blur_sigma_px=0.8)


def known_noise() -> NoiseModel:
    """The simulated camera's own law: photons, read noise, rounding."""
    levels = np.linspace(DEVICE.black, DEVICE.black + DEVICE.gain * DEVICE.full_well, 64)
    variance = DEVICE.gain * levels + (DEVICE.gain * DEVICE.read_noise) ** 2 + 1 / 12
    return NoiseModel(True, levels=levels, sd=np.sqrt(variance))


def our_bank() -> Bank:
    """Two sizes of eight step kernels in units of that noise, with thresholds."""
    table = camera.make_table("stabilised", DEVICE.contract, known_noise())
    widths = ((1.1, 1.32), (2.0, 2.4))
    kernels, taps = lattice.lattice_bank((8, 8), widths, ("odd",), None, table.noise_sd)
    bank = Bank("agreement", kernels, taps, table)
    return dataclasses.replace(bank, thresholds=calibrate(bank, megapixels=4))


def inner(points: np.ndarray, shape: tuple[int, int], margin: int) -> np.ndarray:
    """Elements clear of the rim, where rules differ."""
    x, y = points.T
    keep = (x > margin) & (y > margin) & (x < shape[1] - margin) & (y < shape[0] - margin)
    return points[keep]


def places(mask: np.ndarray) -> np.ndarray:
    """Pixels of an edge map as points (x, y)."""
    y, x = np.nonzero(mask)
    return np.column_stack([x, y]).astype(np.float64)


def detectors() -> dict[str, rivals.Detector]:
    """Those of the libraries that are installed."""
    known = dict(rivals.DETECTORS)
    canny = bench.canny()
    if canny is not None:
        known["Canny, OpenCV"] = rivals.by_gradients(canny)
    return known


def agreements(bank: Bank, light: np.ndarray, rate: float, seed: int) -> dict[str, dict]:
    """Shares of agreement with every detector on one photograph."""
    codes = DEVICE.capture(0.9 * DEVICE.full_well * light, np.random.default_rng(seed))
    plan, margin = banks.make_plan(bank), bank.radius + 1
    _, found = detect_edgels(
        bank, codes, lambda p: banks.responses(bank, p, plan), rate=rate, blur_px=0.8
    )
    ours = inner(np.column_stack([found["x"], found["y"]]).astype(float), codes.shape, margin)
    tabled = bank.table.apply(codes)
    out = {}
    for name, detect in detectors().items():
        runs = [
            (setting, inner(places(mask), codes.shape, margin))
            for setting, mask in detect(tabled, rivals.Grid(quick=True))
        ]
        setting, theirs = min(runs, key=lambda run: abs(len(run[1]) - len(ours)))
        both = count_pairs(ours, theirs)
        out[name] = {
            "setting": setting,
            "ours": len(ours),
            "theirs": len(theirs),
            "ours_that_they_have": round(both / max(len(ours), 1), 3),
            "theirs_that_we_have": round(both / max(len(theirs), 1), 3),
        }
    return out


def main() -> None:
    """Print one line a detector, averaged over the photographs; write all of it when asked."""
    asked = argparse.ArgumentParser(description=__doc__.splitlines()[0])
    asked.add_argument("--photos", type=Path)
    asked.add_argument("--rate", type=float, default=10.0)
    asked.add_argument("-o", "--out", type=Path)
    words = asked.parse_args()
    bank, names = our_bank(), photographs.NAMES
    planes = photographs.pictures(words.photos)
    told = {}
    for k, plane in enumerate(planes):
        name = names[k] if words.photos is None and k < len(names) else f"picture {k}"
        told[name] = agreements(bank, plane[:SIDE, :SIDE], words.rate, k)
    print(f"{len(planes)} photographs, {words.rate:g} false elements per Mpx promised")
    for detector in next(iter(told.values())):
        rows = [t[detector] for t in told.values()]
        ours, theirs = (
            np.mean([r[key] for r in rows])
            for key in ("ours_that_they_have", "theirs_that_we_have")
        )
        print(f"{detector:24} {ours:.2f} of ours, {theirs:.2f} of theirs")
    if words.out is not None:
        words.out.write_text(json.dumps(told, indent=2) + "\n", encoding="utf-8")


if __name__ == "__main__":
    main()
