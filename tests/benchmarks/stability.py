"""How steady a bank is: over seeds, over random halves of the folder, and that blur moves it.

    python tests/benchmarks/stability.py [--photos FOLDER] [--purpose edges] [-o OUT.json]

The whole way is walked each time: survey, sampling, learning, fits, choice, with the default
settings (but for ``--patches``). Columns: share of kernels with a counterpart at |cos| >= 0.95
over shifts, the worst |cos|, and the mean loss of coverage when one bank serves the other's
atoms in place of its own. The last line compares with a bank of the same photographs after a
Gaussian blur. A half too small to tell its camera's noise gives a bank by other rules, and says
so.
"""

import argparse
import json
import tempfile
from pathlib import Path
from typing import Any

import numpy as np
from scipy.ndimage import gaussian_filter
from threadpoolctl import threadpool_limits

from patchlab import bank as banks
from patchlab import images, store
from patchlab.bank.coverage import coverage_of
from patchlab.images.formats import png_bytes
from patchlab.pipeline import desk as desks
from patchlab.pipeline import run as runs
from patchlab.settings import Settings

HERE = Path(__file__).resolve().parents[2] / "sample_images"


def made(photos: Path, files: list[str], work: Path, name: str, **options: Any):
    """Bank and atoms of some files of a folder."""
    folder = work / name / "photos"
    folder.mkdir(parents=True)
    for file in files:
        (folder / file).write_bytes((photos / file).read_bytes())
    settings = Settings(library=False, **options)
    desk = desks.Desk(work / name / "run", settings)
    intake = runs.take_in(folder, desk)
    found, head = runs.survey(intake, desk)
    patches, head = runs.sample(intake, found, head, desk)
    (dictionary, _), head = runs.learn_basis(patches, found, head, desk)
    fits, _ = runs.fit(dictionary, head, desk)
    chosen = banks.BankSettings(
        kernels=settings.kernels, purpose=settings.purpose, name="b", seed=settings.seed
    )
    bank = banks.choose_bank(dictionary, fits[0], found, chosen, patch_contrast=patches.contrast)
    return bank, dictionary.pooled_atoms, found.noise.measurable


def covered(bank, atoms) -> float:
    found: dict[Any, list[Any]] = {}
    for kernel, taps in zip(bank.kernels, bank.taps, strict=True):
        found.setdefault((kernel.scale, kernel.orientation), []).append(taps)
    return float(coverage_of([np.stack(g) for g in found.values()], atoms).mean())


def compared(one, two) -> dict[str, float]:
    (first, atoms, _), (second, others, _) = one, two
    cosine = np.concatenate(
        [banks.compare_banks(first, second), banks.compare_banks(second, first)]
    )
    loss = [
        covered(own, a) - covered(other, a)
        for own, other, a in ((first, second, atoms), (second, first, others))
    ]
    return {
        "share at 0.95": float(np.mean(cosine >= 0.95)),
        "worst cos": float(cosine.min()),
        "cross loss": float(np.mean(loss)),
    }


def blurred(photos: Path, files: list[str], folder: Path, sigma: float) -> None:
    folder.mkdir()
    for frame in images.iterate(images.take_in(images.list_photos(photos))):
        if frame.path in files:
            soft = gaussian_filter(frame.pixels.astype(np.float64), sigma)
            codes = np.rint(soft).astype(frame.pixels.dtype)
            store.write_file(folder / frame.path, png_bytes(codes))


def main() -> None:
    parser = argparse.ArgumentParser(description=__doc__.splitlines()[0])
    parser.add_argument("--photos", type=Path, default=HERE)
    parser.add_argument("--purpose", default="edges", choices=["edges", "features"])
    parser.add_argument("--patches", type=int, default=60_000)
    parser.add_argument("--restarts", type=int, default=3)
    parser.add_argument("--seeds", type=int, default=3)
    parser.add_argument("--splits", type=int, default=2)
    parser.add_argument("-o", "--out", type=Path)
    options = parser.parse_args()
    files = list(images.list_photos(options.photos).files)
    common = {
        "purpose": options.purpose,
        "patches": options.patches,
        "restarts": options.restarts,
        "resamples": 0,
        "jobs": 1,
    }
    table = []

    def tell(name: str, line: dict[str, float]) -> None:
        if not table:
            print("| banks | " + " | ".join(line) + " |\n|---" + "|---" * len(line) + "|")
        print(f"| {name} | " + " | ".join(f"{v:.3g}" for v in line.values()) + " |", flush=True)
        table.append({"banks": name, **line})

    with tempfile.TemporaryDirectory() as folder, threadpool_limits(1):
        work = Path(folder)
        first = made(options.photos, files, work, "seed0", seed=0, **common)
        for seed in range(1, options.seeds):
            other = made(options.photos, files, work, f"seed{seed}", seed=seed, **common)
            tell(f"seed 0 and seed {seed}", compared(first, other))
        for split in range(options.splits):
            order = np.random.default_rng(split).permutation(files).tolist()
            halves = [order[: len(order) // 2], order[len(order) // 2 :]]
            pair = [
                made(options.photos, half, work, f"half{split}{i}", seed=i, **common)
                for i, half in enumerate(halves)
            ]
            refused = "" if pair[0][2] and pair[1][2] else " (noise not measurable in one)"
            tell(f"random halves {split}{refused}", compared(*pair))
        blurred(options.photos, files, work / "soft", 1.0)
        soft = made(work / "soft", files, work, "blurred", seed=0, **common)
        tell("sharp and blurred by 1 px", compared(first, soft))
    if options.out:
        options.out.write_text(json.dumps(table, indent=1) + "\n")


if __name__ == "__main__":
    main()
