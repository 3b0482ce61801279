"""Assess a bank for its own camera: rates, places and detection on made pictures, as plain data.

The camera is simulated from what the bank itself holds: the noise law that its input table
undoes, the blur that was measured, the colour of the noise. Every number is drawn from the
seed; the same bank and seed give the same file whatever the number of workers.
"""

from __future__ import annotations

import functools
import math
from collections.abc import Callable, Iterator, Mapping, Sequence
from dataclasses import dataclass
from pathlib import Path
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab import bank as banks
from patchlab import export, store
from patchlab.conventions import rng
from patchlab.edges import assess, rivals, spaced
from patchlab.errors import InputError
from patchlab.images import scenes
from patchlab.pipeline.desk import may_write
from patchlab.pipeline.loaded import bank_folder
from patchlab.pipeline.use import responder
from patchlab.progress import Progress, silent
from patchlab.types import F64, Bank
from patchlab.workers import map_ordered

LEVELS = 5
DIMMEST = 8.0
"""Electrons of the brightest surface at the lowest light level."""
BRIGHTEST = 0.9
"""Share of the camera's range that the brightest surface fills at the highest."""
CONTRASTS = (5.0, 10.0, 20.0, 50.0)
"""Steps for location, noise units; those that the camera can hold."""
STEP_SPAN = (0.04, 0.8)
"""Darkest and brightest side of such a step, share of the range."""
GREYS = (0.01, 0.85)
"""Darkest and brightest flat picture, share of the range."""


@dataclass(frozen=True)
class Effort:
    """How much is rendered: side of a scene, scenes a light level, side of a flat picture, how
    many grey levels those have, pictures of steps a contrast; whether grids are cut short.
    """

    side: int
    scenes: int
    tile: int
    greys: int
    steps: int
    quick: bool


FULL = Effort(256, 2, 512, 16, 30, False)
QUICK = Effort(160, 1, 256, 8, 6, True)


# ---------------------------------------------------------------- the bank's own camera


def camera_of(bank: Bank) -> scenes.Camera:
    """The simulated camera that a bank's table, noise and blur belong to.

    A stabilising table's slope is one over the noise at each code, but for the 3/8 of an
    electron in Anscombe's root (Anscombe 1948, Biometrika 35:246-254), so the law
    ``var = gain (code - black) + read^2 + 1/12`` is read off it.

    Raises
    ------
    InputError : the noise or blur is not known, or codes do not follow light linearly.
    """
    table, c = bank.table, bank.contract
    blur = bank.provenance.get("blur_sigma_px")
    if not c.format.integer:
        raise InputError(
            f"assess simulates cameras of whole codes, and this bank takes {c.pixels} pixels",
            where=bank.name,
            remedy="prove it on your own pictures, or learn from the camera's own codes",
        )
    if c.transfer != "linear":
        raise InputError(
            f"assess simulates cameras whose codes follow light, and these follow {c.transfer}",
            where=bank.name,
            remedy="prove it on your own pictures, or learn from linear files of the camera",
        )
    if table.kind != "stabilised" or table.noise_sd is None or table.values is None:
        raise InputError(
            "only a bank whose camera's noise was measured can be assessed",
            where=bank.name,
            remedy="survey a folder whose noise can be measured, flat or static frames for sure",
        )
    if blur is None:
        raise InputError(
            "the camera's blur was not measured",
            where=bank.name,
            remedy="survey a folder with sharp edges, or give a slanted edge",
        )
    slope, read = _law(table.values, table.noise_sd, c.black, c.white)
    weight = _neighbour(bank.noise_autocovariance)
    kept = (1 - 2 * weight) ** 2 + 2 * weight**2  # of the variance, along either axis
    gain = slope / kept**2
    return scenes.Camera(
        name=bank.name,
        bits=c.format.bits,
        gain=gain,
        full_well=(c.white - c.black) / gain,
        read_noise=math.sqrt(max(read, 0.0)) / kept / gain,
        blur_sigma_px=max(float(blur), 0.3),
        black=c.black,
        neighbour=weight,
    )


def _law(values: Any, noise_sd: float, black: float, white: float) -> tuple[float, float]:
    """Slope and constant of variance against code, quantisation taken out of the constant."""
    span = white - black
    code = np.arange(math.ceil(black + 0.02 * span), math.floor(black + 0.85 * span))
    rise = np.gradient(np.asarray(values, np.float64))[code]
    variance = (noise_sd / np.maximum(rise, 1e-9)) ** 2
    design = np.column_stack([code - black, np.ones(code.size)]) / variance[:, None]
    slope, constant = np.linalg.lstsq(design, np.ones(code.size), rcond=None)[0]
    if not slope > 0:
        raise InputError("the bank's table belongs to no camera with photon noise")
    # a root that stabilises has 3/8 of an electron more inside than the variance has
    return float(slope), float(constant) - 3 / 8 * float(slope) ** 2 - 1 / 12


def _neighbour(autocovariance: F64 | None) -> float:
    """Weight of each neighbour in the mixing that gives the noise's correlation at lag 1."""
    if autocovariance is None:
        return 0.0
    m = autocovariance.shape[0] // 2
    wanted = float(autocovariance[m, m + 1] + autocovariance[m + 1, m]) / 2
    weights = np.linspace(0, 0.25, 501)
    lag = 2 * weights * (1 - 2 * weights) / ((1 - 2 * weights) ** 2 + 2 * weights**2)
    return float(weights[np.argmin(np.abs(lag - wanted))])


def light_levels(camera: scenes.Camera) -> list[float]:
    """Electrons of the brightest surface at each level, evenly spread in their logarithm."""
    top = BRIGHTEST * camera.full_well
    return [float(f"{x:.4g}") for x in np.geomspace(top, min(DIMMEST, top / 4), LEVELS)]


def step_contrasts(bank: Bank) -> list[float]:
    """Heights of the steps for location: as listed, and the largest that stays off white."""
    c, values = bank.contract, bank.table.values
    assert values is not None  # camera_of has seen to it
    dark, bright = (round(c.black + share * (c.white - c.black)) for share in STEP_SPAN)
    most = float(values[bright] - values[dark]) / (bank.table.noise_sd or 1.0)
    held = [x for x in CONTRASTS if x < most]
    return held if len(held) == len(CONTRASTS) else [*held, float(math.floor(most))]


# ---------------------------------------------------------------- tasks, each a picture or so


@dataclass(frozen=True)
class _Task:
    """One piece of the work, small enough to send to another process."""

    folder: str
    bank_id: str
    what: str
    number: int
    value: float
    rates: tuple[float, ...]
    seed: int
    effort: Effort


@functools.lru_cache(maxsize=2)
def _opened(folder: str, bank_id: str) -> tuple[Bank, Any, scenes.Camera]:
    path = Path(folder)
    bank, plan, head = banks.read_bank(path)
    return bank, responder(path, bank, plan, head), camera_of(bank)


def _work(task: _Task) -> Any:
    return {"scene": _scene, "flat": _flat, "step": _step}[task.what](task)


def _draw(task: _Task) -> np.random.Generator:
    return rng(task.seed, "assess", task.what, f"{task.value:g}", str(task.number))


def made_scene(bank: Bank, camera: scenes.Camera, light: float, seed: int, side: int) -> Any:
    """A picture of overlapping textured shapes and its truth, as the scoring takes it."""
    made = scenes.render_scene(
        seed, (side, side), camera, light=light, smallest=12.0, largest=110.0
    )
    where = np.column_stack([made.edges["x"], made.edges["y"]])
    kept = spaced(where)
    values = bank.table.values
    assert values is not None  # camera_of has seen to it
    dark, bright = (
        np.interp(camera.black + camera.gain * e, np.arange(values.size, dtype=float), values)
        for e in (made.edges["dark"], made.edges["dark"] + made.edges["contrast"])
    )
    height = (bright - dark)[kept] / (bank.table.noise_sd or 1.0)
    return assess.Scene(made.frame.pixels, where[kept], height, bank.radius)


def _scene(task: _Task) -> Any:
    bank, respond, camera = _opened(task.folder, task.bank_id)
    seed = task.seed * 1000 + task.number
    scene = made_scene(bank, camera, task.value, seed, task.effort.side)
    ours = assess.score_bank(bank, scene, respond, task.rates, camera.blur_sigma_px)
    known = dict(rivals.DETECTORS)
    canny = export.bench.canny()
    if canny is not None:
        known["Canny, OpenCV"] = rivals.by_gradients(canny)
    theirs = assess.score_rivals(bank.table, scene, known, rivals.Grid(task.effort.quick))
    return ours, theirs


def _flat(task: _Task) -> assess.FlatCounts:
    bank, respond, camera = _opened(task.folder, task.bank_id)
    side, draw = task.effort.tile, _draw(task)
    electrons = np.full((side, side), task.value * camera.full_well)
    return assess.count_flat(bank, camera.capture(electrons, draw), respond, task.rates)


def _step(task: _Task) -> assess.Located:
    bank, respond, camera = _opened(task.folder, task.bank_id)

    def shoot(light: F64, draw: np.random.Generator) -> NDArray[Any]:
        return camera.capture((light - camera.black) / camera.gain, draw)

    return assess.locate_steps(
        bank,
        respond,
        shoot,
        task.value,
        base=camera.black + STEP_SPAN[0] * (bank.contract.white - camera.black),
        blur_px=camera.blur_sigma_px,
        pictures=task.effort.steps,
        draw=_draw(task),
    )


# ---------------------------------------------------------------- the whole


def assess_bank(
    path: Path,
    out: Path | None,
    *,
    rate: float,
    seed: int,
    jobs: int,
    quick: bool,
    force: bool,
    pictures: Callable[[Mapping[str, Any]], Mapping[str, bytes]],
    progress: Progress = silent,
) -> dict[str, Any]:
    """Prove a bank on made pictures of its own camera.

    Parameters
    ----------
    path : a bank's folder, or a run's
    out : folder for ``assess.json``, pictures and a page; None writes nothing
    rate : false elements per megapixel that the bank's one setting promises
    seed : of every scene and every noise; the figures are reproducible from it
    jobs : worker processes
    quick : smaller pictures, fewer settings: a look, no proof
    force : replace what stands at ``out``
    pictures : the result to files, for people

    Raises
    ------
    InputError : the bank holds no noise law or no blur.
    UsageError : the output exists; the rate is outside the bank's table.
    """
    folder = bank_folder(path)
    bank, _, head = banks.read_bank(folder)
    camera = camera_of(bank)
    if bank.thresholds is None:
        raise InputError("this bank has no thresholds, so nothing is promised", where=bank.name)
    if out is not None:
        may_write(out, force)
    effort = QUICK if quick else FULL
    rates = tuple(sorted({rate, 10.0, 100.0, 1000.0}))
    tasks = list(_tasks(str(folder), head["id"], bank, camera, rates, seed, effort))
    done = list(map_ordered(_work, tasks, jobs=jobs, stage="assess", progress=progress))
    found = {w: [(t, r) for t, r in zip(tasks, done, strict=True) if t.what == w] for w in _ORDER}
    result = {
        "bank": bank.name,
        "id": head["id"],
        "seed": seed,
        "quick": quick,
        "rate": rate,
        "camera": _camera_told(camera),
        "rates": _rates_told(rates, found["flat"]),
        "location": [_located_told(r) for _, r in found["step"]],
        "detection": _detection_told(rate, found["scene"]),
    }
    if out is not None:
        files = {"assess.json": store.canonical_json(result), **pictures(result)}
        parents = {"bank": head["id"]}
        store.write_artefact(out, "assess", files, parents=parents, seed=seed, force=True)
    return result


_ORDER = ("scene", "flat", "step")


def _tasks(
    folder: str,
    bank_id: str,
    bank: Bank,
    camera: scenes.Camera,
    rates: tuple[float, ...],
    seed: int,
    effort: Effort,
) -> Iterator[_Task]:
    for light in light_levels(camera):
        for k in range(effort.scenes):
            yield _Task(folder, bank_id, "scene", k, light, rates, seed, effort)
    for grey in np.linspace(*GREYS, effort.greys):
        yield _Task(folder, bank_id, "flat", 0, float(grey), rates, seed, effort)
    for contrast in step_contrasts(bank):
        yield _Task(folder, bank_id, "step", 0, contrast, rates, seed, effort)


def _round(value: float, digits: int = 4) -> float | None:
    return None if not math.isfinite(value) else float(f"{value:.{digits}g}")


def _camera_told(camera: scenes.Camera) -> dict[str, Any]:
    return {
        "bits": camera.bits,
        "gain_dn_per_electron": _round(camera.gain),
        "full_well_electrons": _round(camera.full_well),
        "read_noise_electrons": _round(camera.read_noise),
        "blur_px": _round(camera.blur_sigma_px),
        "noise": "white" if camera.neighbour == 0 else f"coloured, {camera.neighbour:.3f}",
        "light_levels_electrons": light_levels(camera),
    }


def _rates_told(
    rates: Sequence[float], found: Sequence[tuple[_Task, assess.FlatCounts]]
) -> list[dict[str, Any]]:
    area = sum(c.megapixels for _, c in found)
    told = []
    for i, rate in enumerate(rates):
        elements, groups = (
            np.array([getattr(c, name)[i] for _, c in found]) for name in ("elements", "groups")
        )
        even = assess.flatness(groups)
        told.append(
            {
                "asked": rate,
                "found": _round(float(elements.sum()) / area),
                "groups": _round(float(groups.sum()) / area),
                "megapixels": _round(area),
                "by_grey": [int(n) for n in elements],
                "chi2_of_groups": _round(even.chi2),
                "chi2_limit": _round(even.limit),
                "flat": even.flat,
            }
        )
    return told


def _located_told(found: assess.Located) -> dict[str, Any]:
    return {
        "contrast": found.contrast,
        "edgels": found.edgels,
        "rms_px": _round(found.rms_px),
        "bias_px": _round(found.bias_px),
        "bound_px": _round(found.bound_px),
        "ratio": _round(found.ratio),
        "error_over_told_sd": _round(found.sd_ratio),
        "direction_rms_deg": _round(found.turn_deg),
        "direction_bound_deg": _round(found.turn_bound_deg),
    }


def _detection_told(rate: float, found: Sequence[tuple[_Task, tuple[Any, Any]]]) -> dict[str, Any]:
    lights = list(dict.fromkeys(t.value for t, _ in found))

    def row(name: str, kind: str, setting: str, scores: Sequence[assess.Score]) -> dict[str, Any]:
        at = [[s for s, (t, _) in zip(scores, found, strict=True) if t.value == x] for x in lights]

        def means(part: str) -> list[float | None]:
            return [_round(float(np.mean([getattr(s, part) for s in level]))) for level in at]

        return {
            "detector": name,
            "picture": kind,
            "setting": setting,
            "f": means("f"),
            "precision": means("precision"),
            "recall": means("recall"),
            "mean_f": _round(float(np.mean([s.f for s in scores]))),
        }

    ours = [
        row("this bank", "tabled", f"{r:g} false elements per Mpx", [o[r] for _, (o, _) in found])
        for r in found[0][1][0]
    ]
    fixed, tuned = [], []
    for key in found[0][1][1]:
        runs = [theirs[key] for _, (_, theirs) in found]
        best = max(runs[0], key=lambda setting: float(np.mean([run[setting].f for run in runs])))
        fixed.append(row(key[0], key[1], best, [run[best] for run in runs]))
        top = [max(run.values(), key=lambda s: s.f) for run in runs]
        tuned.append(row(key[0], key[1], "tuned to each picture by the truth", top))
    mine = next(r for r in ours if r["setting"].startswith(f"{rate:g} "))

    def best_of(rows: Sequence[Mapping[str, Any]], *kinds: str) -> float:
        return max(float(r["mean_f"]) for r in rows if r["picture"] in kinds)

    return {
        "light_electrons": lights,
        "scenes": len(found),
        "ours": ours,
        "fixed": fixed,
        "tuned": tuned,
        "lead": {
            "over_best_fixed_on_raw": _round(mine["mean_f"] - best_of(fixed, "raw")),
            "over_best_fixed_on_stretched": _round(mine["mean_f"] - best_of(fixed, "stretched")),
            "over_best_fixed_on_tabled": _round(mine["mean_f"] - best_of(fixed, "tabled")),
            "over_best_tuned": _round(mine["mean_f"] - best_of(tuned, *assess.PICTURES)),
        },
    }
