"""How far blur from photographs is right: simulated folders of known blur.

    python tests/benchmarks/blur.py [-o TABLE.json]

Scenes: views of the invented tile works (every edge has a shadow beside it), leaves of every
size with texture, even disks, and photographs reduced four times, which are blurred exactly
before they are reduced. Each kind is seen by five cameras at six blurs; the noise law is the
one that the folder tells (or none). An accepted folder is right within 10 %.
"""

import argparse
import json
import math
import time
from dataclasses import replace
from pathlib import Path

import numpy as np
from photographs import pictures

from patchlab.camera import measure_blur, measure_noise
from patchlab.images import demo
from patchlab.images.canvas import Scene, blur, grain_tile, paint
from patchlab.images.scenes import Camera, dead_leaves, disk
from patchlab.types import Frame

BLURS = (0.5, 0.65, 0.8, 1.0, 1.25, 1.5)
REDUCED = 4
OWN = 0.03
"""Variance, pixels squared, that reduced photographs have of their own."""
CAMERAS = {
    "8 bit, 0.25 DN/e-": Camera(bits=8, gain=0.25, full_well=980, read_noise=3, black=8),
    "8 bit, 0.5 DN/e-": Camera(bits=8, gain=0.5, full_well=490, read_noise=2, black=8),
    "8 bit, 2 DN/e-": Camera(bits=8, gain=2, full_well=122, read_noise=1, black=8),
    "10 bit, 1 DN/e-": Camera(bits=10, gain=1, full_well=950, read_noise=3, black=32),
    "12 bit, 0.25 DN/e-": Camera(bits=12, gain=0.25, full_well=16000, read_noise=10, black=64),
}

Planes = dict[float, np.ndarray]


def of_scene(scene: Scene) -> Planes:
    """Light of a scene at every blur, pixel aperture included."""
    margin = math.ceil(4.5 * max(BLURS)) + 1
    level = paint(scene, margin, grain_tile(scene.seed)).level
    return {b: blur(level, b, margin) for b in BLURS}


def of_photograph(light: np.ndarray) -> Planes:
    """Light of a reduced photograph: the Gaussian exactly, in the frequencies, then the pixels."""
    padded = np.pad(light, 64, mode="symmetric")
    fy, fx = np.fft.fftfreq(padded.shape[0])[:, None], np.fft.rfftfreq(padded.shape[1])[None]
    spectrum, found = np.fft.rfft2(padded), {}
    for b in BLURS:
        lens = REDUCED * math.sqrt(b * b - 1 / 12)
        soft = spectrum * np.exp(-2 * (np.pi * lens) ** 2 * (fx**2 + fy**2))
        plane = np.fft.irfft2(soft, padded.shape)[64:-64, 64:-64]
        h, w = (n // REDUCED * REDUCED for n in plane.shape)
        cells = plane[:h, :w].reshape(h // REDUCED, REDUCED, w // REDUCED, REDUCED)
        found[b] = np.clip(cells.mean(axis=(1, 3)), 0, 1)
    return found


def kinds() -> dict[str, list[Planes]]:
    views = [demo.tile_works(view, number) for number in (31, 32) for view in demo.VIEWS]
    leaves = [dead_leaves(300 + k, (360, 480)) for k in range(8)]
    disks = [
        dead_leaves(400 + k, (300, 400), maker=disk, texture=0.0, smallest=4) for k in range(6)
    ]
    return {
        "tile works": [of_scene(s) for s in views],
        "leaves": [of_scene(s) for s in leaves],
        "disks": [of_scene(s) for s in disks],
        "photographs": [of_photograph(light) for light in pictures()],
    }


def folder(planes: list[Planes], b: float, camera: Camera, seed: int) -> list[Frame]:
    camera = replace(camera, blur_sigma_px=b)
    shots = [
        camera.capture(p[b] * 0.9 * camera.full_well, np.random.default_rng([seed, i]))
        for i, p in enumerate(planes)
    ]
    return [Frame(f"{i:02d}.png", s, camera.contract) for i, s in enumerate(shots)]


def measure(seed: int, stock: dict[str, list[Planes]], known: bool) -> list[dict[str, object]]:
    rows = []
    for kind, planes in stock.items():
        own = OWN if kind == "photographs" else 0.0
        for name, camera in CAMERAS.items():
            for b in BLURS:
                frames = folder(planes, b, camera, seed)
                sigma, note = measure_blur(frames, measure_noise(frames) if known else None)
                error = None if sigma is None else sigma / math.hypot(b, math.sqrt(own)) - 1
                rows.append({"kind": kind, "camera": name, "blur": b, "error": error, "note": note})
    return rows


def line(title: str, rows: list[dict[str, object]]) -> str:
    errors = np.array([r["error"] for r in rows if r["error"] is not None])
    if not errors.size:
        return f"| {title} | {len(rows)} | 0 | | | |"
    return (
        f"| {title} | {len(rows)} | {errors.size} | {np.mean(np.abs(errors) <= 0.1):.0%} | "
        f"{np.sqrt(np.mean(errors**2)):.1%} | {errors.min():+.1%} to {errors.max():+.1%} |"
    )


def main() -> None:
    parser = argparse.ArgumentParser(description=__doc__.splitlines()[0])
    parser.add_argument("--seed", type=int, default=0)
    parser.add_argument("-o", "--out", type=Path)
    options = parser.parse_args()
    began, everything = time.process_time(), {}
    print("| folders | in all | accepted | within 10 % | rms error | range |")
    print("|---" * 6 + "|")
    stock = kinds()
    for known in (True, False):
        rows = measure(options.seed, stock, known)
        everything["known noise" if known else "no noise law"] = rows
        for kind in dict.fromkeys(r["kind"] for r in rows):
            mine = [r for r in rows if r["kind"] == kind]
            print(line(f"{kind}{'' if known else ', no noise law'}", mine), flush=True)
        print(line("all" if known else "all, no noise law", rows), flush=True)
    print(f"\n{time.process_time() - began:.0f} s")
    if options.out:
        options.out.write_text(json.dumps(everything, indent=1) + "\n")


if __name__ == "__main__":
    main()
