"""Rates and memory of one core: what the arithmetic for large folders starts from.

    python tests/benchmarks/scale.py [--photos FOLDER] [-o RATES.json]
    python tests/benchmarks/scale.py --million FOLDER [--tolerance 1e-5]

The first form measures, on one thread: reading a photograph and drawing patches from it,
moments, passes of learning. The second puts a million patches of 16x16 into an artefact in
FOLDER (1 GB), and learns 160 components from it in a process of its own, mapped into memory;
it prints that process's largest resident memory.
"""

import argparse
import json
import resource
import subprocess
import sys
import tempfile
import time
from pathlib import Path

import numpy as np
from photographs import draw, pictures
from threadpoolctl import threadpool_limits

from patchlab import images, learn, store
from patchlab.conventions import srgb_encode
from patchlab.learn.likelihood import Likelihood, Rows
from patchlab.types import InputTable, PatchSet

SIZE, COMPONENTS = 16, 160
FRAME = (1200, 1728)
"""Two megapixels."""


def best(task, repeats: int = 5) -> float:
    times = []
    for _ in range(repeats):
        began = time.process_time()
        task()
        times.append(time.process_time() - began)
    return min(times)


def reading(planes) -> dict[str, float]:
    """Processor seconds a photograph: first look, second look with 100 patches drawn."""
    from PIL import Image

    with tempfile.TemporaryDirectory() as work:
        folder = Path(work)
        for i, plane in enumerate(planes[:4]):
            times = [-(-a // b) for a, b in zip(FRAME, plane.shape, strict=True)]
            codes = np.rint(255 * srgb_encode(np.tile(plane, times)[: FRAME[0], : FRAME[1]]))
            Image.fromarray(codes.astype(np.uint8)).save(folder / f"{i}.jpg", quality=90)
        count = len(list(folder.iterdir()))
        listing = images.list_photos(folder)
        first = best(lambda: images.take_in(listing)) / count
        intake = images.take_in(listing)
        light = intake.contract.light(np.arange(256)).astype(np.float32)
        table = InputTable("linear", intake.contract, light, None)
        settings = images.SampleSettings(size=SIZE, patches=70 * count)
        second = best(lambda: images.sample_folder(intake, table, settings)) / count
        size = sum(p.stat().st_size for p in folder.iterdir()) / count
    return {"first_look_s": first, "sampling_s": second, "jpeg_bytes": size}


def rates(planes) -> dict[str, float]:
    count = 100_000
    patches = draw(planes, SIZE, count)
    through = learn.whiten(patches, rank=COMPONENTS)
    W = np.linalg.qr(np.random.default_rng(0).normal(size=(COMPONENTS, COMPONENTS)))[0] * 1.57
    white = Likelihood(Rows.of(patches.patches, through).whitened(), np.ones(COMPONENTS))
    lazy = Likelihood(Rows.of(patches.patches, through), np.ones(COMPONENTS))
    white(W)
    return {
        **reading(planes),
        "moments_patches_per_s": count / best(lambda: learn.moments(patches.patches)),
        "pass_patches_per_s": count / best(lambda: white(W)),
        "pass_unwhitened_patches_per_s": count / best(lambda: lazy(W)),
        "sums_bytes": float(8 * COMPONENTS * (COMPONENTS + 3)),
    }


def prepare(folder: Path, planes) -> None:
    if (folder / "patches" / "manifest.json").is_file():
        return
    found = draw(planes, SIZE, 1_000_000)
    n = len(found)
    noun = PatchSet(
        found.patches, SIZE, np.zeros(n, np.int32), np.zeros((n, 2), np.int32),
        found.dc, found.contrast, ("shipped",), {},
    )  # fmt: skip
    store.save(folder / "patches", "patches", noun)


def million(folder: Path, tolerance: float) -> dict[str, float]:
    """Runs in a process of its own."""
    began = time.process_time()
    patches, _ = store.load(folder / "patches", "patches", mapped=True)
    through = learn.whiten(patches, rank=COMPONENTS, held_out=0)
    found = learn.learn_ica(patches, through, restarts=1, tolerance=tolerance)
    return {
        "patches": len(patches),
        "components": len(found),
        "converged": found.converged,
        "iterations": found.iterations,
        "log_likelihood": found.log_likelihood,
        "cpu_s": time.process_time() - began,
        "largest_resident_GB": resource.getrusage(resource.RUSAGE_SELF).ru_maxrss / 1e6 * 1.024,
    }


def main() -> None:
    parser = argparse.ArgumentParser(description=__doc__.splitlines()[0])
    parser.add_argument("--photos", type=Path)
    parser.add_argument("--million", type=Path)
    parser.add_argument("--tolerance", type=float, default=1e-5)
    parser.add_argument("--inside", action="store_true", help=argparse.SUPPRESS)
    parser.add_argument("-o", "--out", type=Path)
    options = parser.parse_args()
    with threadpool_limits(1):
        if options.inside:
            result = million(options.million, options.tolerance)
        elif options.million:
            prepare(options.million, pictures(options.photos))
            subprocess.run([sys.executable, *sys.argv, "--inside"], check=True)
            return
        else:
            result = rates(pictures(options.photos))
    for name, value in result.items():
        print(f"{name:32}{value:.6g}")
    if options.out:
        options.out.write_text(json.dumps(result, indent=1) + "\n")


if __name__ == "__main__":
    main()
