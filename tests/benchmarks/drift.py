"""How surely drift is told: new folders of the demo camera, as it was and changed.

    python tests/benchmarks/drift.py [--folders 10] [-o TABLE.json]

Each folder is ten views of the invented tile works that the bank in filters/ has never seen. The
camera is the bank's own, or the same with more or less gain, more read noise, or another blur.
"""

import argparse
import json
from dataclasses import replace
from pathlib import Path

from patchlab import bank as banks
from patchlab import camera
from patchlab.images.demo import LIGHTS, OMBREL_K2, VIEWS, tile_works
from patchlab.images.scenes import expose
from patchlab.pipeline.drift import noise_changes
from patchlab.types import InputContract, InputTable, Survey

BANK = Path(__file__).parents[2] / "filters" / "tessary_edges"
CAMERAS = {
    "as it was": OMBREL_K2,
    "gain 15 % up": replace(OMBREL_K2, gain=0.25 * 1.15),
    "gain 15 % down": replace(OMBREL_K2, gain=0.25 / 1.15),
    "read noise twice": replace(OMBREL_K2, read_noise=2 * OMBREL_K2.read_noise),
    "blur 1.3 times": replace(OMBREL_K2, blur_sigma_px=1.3 * OMBREL_K2.blur_sigma_px),
    "blur 1 / 1.4 times": replace(OMBREL_K2, blur_sigma_px=OMBREL_K2.blur_sigma_px / 1.4),
}


def scenes_of(number):
    names = list(VIEWS)
    return [tile_works(names[i % 6], 100 + 2 * number + i // 6) for i in range(10)]


def judged(bank, scenes, own, seed):
    """Verdict on one folder, and the noise in its three greys over what it was."""
    frames = [
        expose(s, own, light=LIGHTS[i % 4], seed=seed + i, path=str(i), edges=False).frame
        for i, s in enumerate(scenes)
    ]
    noise = noise_changes(bank, lambda: iter(frames))
    law = camera.measure_noise(frames)
    sigma, note = camera.measure_blur(frames, law)
    contract = InputContract("float32", 0, 1)
    table = InputTable("identity", contract, None, None)
    found = Survey(contract, law, table, sigma, note)
    blur = camera.blur_change(bank.provenance["blur_sigma_px"], found)
    return {
        "noise": camera.verdict_of(noise),
        "ratios": [c.now for c in noise],
        "blur": blur.verdict,
        "sigma_px": sigma,
    }


def main():
    asked = argparse.ArgumentParser(description=__doc__.splitlines()[0])
    asked.add_argument("--folders", type=int, default=10)
    asked.add_argument("-o", dest="out", type=Path)
    options = asked.parse_args()
    bank, _, _ = banks.read_bank(BANK)
    scenes = [scenes_of(k) for k in range(options.folders)]
    table = {}
    print("| camera | noise drifted | noise cannot tell | blur drifted | blur cannot tell |")
    print("|---|---|---|---|---|")
    for name, own in CAMERAS.items():
        rows = [judged(bank, s, own, 1000 * k) for k, s in enumerate(scenes)]
        table[name] = rows
        cells = [
            f"{sum(r[what] == verdict for r in rows)} of {len(rows)}"
            for what in ("noise", "blur")
            for verdict in ("drifted", "cannot tell")
        ]
        print(f"| {name} | {' | '.join(cells)} |", flush=True)
    if options.out:
        options.out.write_text(json.dumps(table, indent=1))


if __name__ == "__main__":
    main()
