"""How far the noise law and the input table are right: many simulated cameras.

    python tests/benchmarks/noise.py [--folders N] [--seed S] [-o TABLE.json] [--only PART]

Cameras are drawn: 8, 10, 12 or 16 bits, 0.05 to 4 DN per electron, 60 to 100,000 electrons of
full well, 1 to 8 electrons of read noise, black level 0 or well above the noise. Each sees ten
photographs (up to 10,000 electrons: beyond, the photographs' own noise counts) or ten views of
the scene maker, at a light level of its own. Parts: photos, static, dark, table, white.

Columns: accepted folders; of those, gain and read noise within their promise, the worst, and
the share whose truth lies within two of the standard errors that were told.
"""

import argparse
import json
import math
import time
from collections.abc import Callable
from dataclasses import dataclass
from pathlib import Path
from typing import Any

import numpy as np
from photographs import pictures
from scipy import ndimage

from patchlab.camera import (
    make_table,
    measure_noise,
    measure_noise_dark,
    measure_noise_static,
    noise_of_table,
    survey,
)
from patchlab.errors import InputError
from patchlab.images import demo
from patchlab.images.scenes import Camera as Sensor
from patchlab.images.scenes import dead_leaves, expose
from patchlab.types import Frame, InputContract, NoiseModel

SIDE = 512
PHOTOGRAPHS_UP_TO = 10_000.0
Row = dict[str, Any]


@dataclass(frozen=True)
class Camera:
    """A drawn camera; read noise and black level in DN."""

    bits: int
    gain: float
    full_well: float
    read: float
    black: float

    @property
    def contract(self) -> InputContract:
        full = (1 << self.bits) - 1
        white = min(full, math.floor(self.black + self.gain * self.full_well + 1e-6))
        return InputContract(f"Mono{self.bits}", self.black, float(white))

    @property
    def law(self) -> NoiseModel:
        """What a perfect survey would say."""
        contract = self.contract
        levels = contract.black + (contract.white - contract.black) * np.linspace(0, 0.95, 39)
        variance = self.gain * (levels - self.black) + self.read**2 + 1 / 12
        return NoiseModel(
            True, gain=self.gain, read_noise=self.read, levels=levels, sd=np.sqrt(variance)
        )

    def shoot(self, electrons: np.ndarray, seed: list[int], name: str) -> Frame:
        r = np.random.default_rng(seed)
        codes = self.gain * np.minimum(r.poisson(np.maximum(electrons, 0)), self.full_well)
        codes = np.rint(codes + self.read * r.standard_normal(codes.shape) + self.black)
        codes = np.clip(codes, 0, self.contract.white).astype(self.contract.format.dtype)
        return Frame(name, codes, self.contract)


def draw(seed: int, dark: bool) -> Camera:
    """A camera; ``dark`` puts its black level well above its noise."""
    r = np.random.default_rng([seed, int(dark)])
    bits = int(r.choice([8, 10, 12, 16]))
    top = (1 << bits) - 1
    low, high = max(0.05, top / 1e5), min(4.0, top / 60)
    gain = float(np.exp(r.uniform(np.log(low), np.log(high))))
    read = max(gain * float(np.exp(r.uniform(0, np.log(8)))), 0.45)
    black = float(math.ceil(6 * read + 2)) if dark else 0.0
    return Camera(bits, gain, (top - black) / gain, read, black)


def scenes() -> list[np.ndarray]:
    """Light of made scenes, white 1, without any noise."""
    lens = Sensor(blur_sigma_px=0.7)
    views = [demo.tile_works(view, number) for number in (51, 52) for view in demo.VIEWS]
    leaves = [dead_leaves(500 + k, (400, 400)) for k in range(8)]
    return [expose(s, lens, light=1.0, edges=False).clean for s in views + leaves]


def lights(photographs: list[np.ndarray], made: list[np.ndarray], camera: Camera, r: Any) -> list:
    """Ten views, 0 to 1: photographs where their own noise does not count."""
    if camera.full_well > PHOTOGRAPHS_UP_TO or r.random() < 0.4:
        return [made[i] for i in r.choice(len(made), 10, replace=False)]
    found = []
    for i in r.choice(len(photographs), 10, replace=False):
        y, x = (max(0, (n - SIDE) // 2) for n in photographs[i].shape)
        plane = photographs[i][y : y + SIDE, x : x + SIDE]
        found.append(ndimage.gaussian_filter(plane, r.uniform(0.5, 1.2)))
    return found


# ---------------------------------------------------------------- the parts


def one(camera: Camera, found: NoiseModel) -> Row:
    row: Row = {"camera": camera.__dict__, "accepted": found.measurable, "why": found.reason}
    if found.measurable and found.gain is not None:
        row["gain"] = found.gain / camera.gain - 1
        row["gain z"] = (found.gain - camera.gain) / found.gain_error
    if found.measurable and found.read_noise is not None:
        row["read"] = found.read_noise / camera.read - 1
        row["read z"] = (found.read_noise - camera.read) / found.read_noise_error
    return row


def from_photos(seed: int, dark: bool, stock: Any) -> Row:
    camera, r = draw(seed, dark), np.random.default_rng([seed, 7])
    level = 0.95 * camera.full_well * r.uniform(0.5, 1.0)
    planes = lights(*stock, camera, r)
    frames = [camera.shoot(level * p, [seed, i], f"{i:02d}.png") for i, p in enumerate(planes)]
    return one(camera, measure_noise(frames))


def from_static(seed: int, dark: bool, stock: Any) -> Row:
    camera, r = draw(seed, dark), np.random.default_rng([seed, 8])
    level = 0.95 * camera.full_well * r.uniform(0.5, 1.0)
    planes = lights(*stock, camera, r)[:3]
    pairs = [
        [camera.shoot(level * p, [seed, i, k], f"{i}-{k}.png") for k in range(2)]
        for i, p in enumerate(planes)
    ]
    return one(camera, measure_noise_static(pairs))


def from_dark(seed: int, dark: bool, stock: Any) -> Row:
    camera = draw(seed, dark)
    frames = [camera.shoot(np.zeros((400, 400)), [seed, k], f"{k}.png") for k in range(4)]
    return one(camera, measure_noise_dark(frames))


def of_table(camera: Camera, law: NoiseModel) -> Row:
    """Standard deviation of the table's values under the true camera, 1 to 85 % of the range."""
    contract = camera.contract
    levels = contract.black + (contract.white - contract.black) * np.linspace(0.01, 0.85, 60)
    sd = noise_of_table(make_table("stabilised", contract, law), camera.law, levels)
    return {"sd low": float(sd.min()), "sd high": float(sd.max()), "sd": sd.tolist()}


def table_from_law(seed: int, dark: bool, stock: Any) -> Row:
    camera = draw(seed, dark)
    return {"camera": camera.__dict__, "accepted": True, **of_table(camera, camera.law)}


def table_from_photos(seed: int, dark: bool, stock: Any) -> Row:
    camera, r = draw(seed, dark), np.random.default_rng([seed, 7])
    level = 0.95 * camera.full_well * r.uniform(0.5, 1.0)
    planes = lights(*stock, camera, r)
    found = measure_noise(
        [camera.shoot(level * p, [seed, i], f"{i:02d}.png") for i, p in enumerate(planes)]
    )
    row: Row = {"camera": camera.__dict__, "accepted": found.measurable, "why": found.reason}
    return row | of_table(camera, found) if found.measurable else row


def folder_of(cameras: list[Camera], seed: int, stock: Any) -> list[Frame]:
    """Ten views, each in a light of its own, one camera after the other."""
    r = np.random.default_rng([seed, 9])
    planes = lights(*stock, cameras[0], r)
    return [
        c.shoot(0.95 * c.full_well * r.uniform(0.3, 1.0) * p, [seed, i], f"{i:02d}.png")
        for i, (p, c) in enumerate(zip(planes, cameras * 5, strict=False))
    ]


def refused(frames: list[Frame]) -> Row:
    try:
        found = survey(lambda: iter(frames), frames[0].contract)
    except InputError as error:
        return {"accepted": True, "refused": "different cameras" in error.what, "why": error.what}
    return {"accepted": found.noise.measurable, "refused": False, "why": found.noise.reason}


def of_mixed(seed: int, other: bool, stock: Any) -> Row:
    """Whether a folder is refused; ``other``: half its frames are of another gain."""
    r = np.random.default_rng([seed, 11])
    bits, black = int(r.choice([8, 10, 12])), 24.0
    top = (1 << bits) - 1 - black
    well = float(np.exp(r.uniform(np.log(100), np.log(3000))))
    one = Camera(bits, top / well, well, max(2 * top / well, 0.5), black)
    ratio = float(r.uniform(2.0, 4.0)) ** float(r.choice([-1, 1]))
    two = Camera(bits, one.gain * ratio, top / one.gain / ratio, one.read * ratio, black)
    found = refused(folder_of([one, two] if other else [one], seed, stock))
    return {"camera": one.__dict__, "ratio": ratio if other else 1.0, **found}


# ---------------------------------------------------------------- the table of results

PARTS: dict[str, tuple[Callable[[int, bool, Any], Row], float, float]] = {
    "photos": (from_photos, 0.05, 0.03),
    "static": (from_static, 0.02, 0.10),
    "dark": (from_dark, 0.0, 0.02),
    "table": (table_from_law, 0.0, 0.0),
    "table from photos": (table_from_photos, 0.0, 0.0),
    "mixed": (of_mixed, 0.0, 0.0),
}


def within(rows: list[Row], key: str, limit: float) -> str:
    """Share within the limit, the worst, and how often the truth is within two errors."""
    values = np.array([r[key] for r in rows if key in r])
    if not values.size:
        return "| | |"
    z = np.abs(np.array([r[f"{key} z"] for r in rows if key in r]))
    worst = values[np.argmax(np.abs(values))]
    return (
        f"{values.size}: {np.mean(np.abs(values) <= limit):.0%} within {limit:.0%} | "
        f"{worst:+.1%} | {np.mean(z <= 2):.0%} |"
    )


def stable(rows: list[Row]) -> str:
    """Share of cameras whose table gives unit noise, and the widest range."""
    good = [r for r in rows if "sd low" in r]
    limits = [0.06 if r["camera"]["bits"] == 8 and r["camera"]["gain"] > 1 else 0.03 for r in good]
    off = np.array([max(1 - r["sd low"], r["sd high"] - 1) for r in good])
    low, high = min(r["sd low"] for r in good), max(r["sd high"] for r in good)
    return f"{np.mean(off <= limits):.0%} within 3 % (6 %) | {low:.3f} to {high:.3f} | | | | |"


def main() -> None:
    parser = argparse.ArgumentParser(description=__doc__.splitlines()[0])
    parser.add_argument("--folders", type=int, default=40, help="of each kind")
    parser.add_argument("--seed", type=int, default=0)
    parser.add_argument("--only", action="append", choices=list(PARTS))
    parser.add_argument("-o", "--out", type=Path)
    options = parser.parse_args()
    began, everything = time.process_time(), {}
    stock = (pictures(), scenes())
    print("| from | accepted | gain | worst | in 2 se | read noise | worst | in 2 se |")
    print("|---" * 8 + "|")
    for part in options.only or PARTS:
        make, gain, read = PARTS[part]
        for dark in (True, False):
            seeds = range(options.seed, options.seed + options.folders)
            rows = [make(seed, dark, stock) for seed in seeds]
            title = f"{part}, black level {'above 0' if dark else '0'}"
            accepted = [r for r in rows if r["accepted"]]
            if part == "mixed":
                title = "two cameras, gains 2 to 4 apart" if dark else "one camera, light varies"
                told = [r["refused"] for r in rows if r["accepted"]]
                print(f"| {title} | {len(told)} of {len(rows)} told, {sum(told)} refused | |")
                everything[title] = rows
                continue
            head = f"| {title} | {len(accepted)} of {len(rows)} | "
            if part.startswith("table"):
                print(head + stable(accepted), flush=True)
            else:
                told = within(accepted, "gain", gain) + " " + within(accepted, "read", read)
                print(head + told, flush=True)
            everything[title] = rows
    print(f"\n{time.process_time() - began:.0f} s")
    if options.out:
        options.out.write_text(json.dumps(everything, indent=1) + "\n")


if __name__ == "__main__":
    main()
