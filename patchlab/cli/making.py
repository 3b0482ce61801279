"""The commands that make a bank, stage by stage: each checks its words and prints one result."""

from __future__ import annotations

import functools
import tempfile
from pathlib import Path
from typing import Any

import click

from patchlab.cli.options import print_config, resolve, settings_options
from patchlab.cli.shared import FOLDER, PHOTOS, fills_a_run, printed, rows, shared
from patchlab.cli.terminal import Terminal, table
from patchlab.errors import InputError, QualityError, UsageError


def _work(
    photos: Path, until: str, terminal: Terminal, options: dict[str, Any]
) -> dict[str, Any] | None:
    """Fill a run's folder up to a stage; None when the words asked for something else."""
    settings = resolve(options, options["config"])
    if options["print_config"]:
        print_config(settings)
        return None
    if options.get("passing"):
        terminal.stop.kept = "nothing is kept without -o"
    else:
        terminal.may_resume()
    from patchlab.pipeline import desk, run

    out = options["out"]
    desk.prepare(
        out,
        photos,
        resume=options["resume"],
        force=options["force"],
        dry_run=options["dry_run"],
    )
    with terminal.working():
        place = desk.Desk(out, settings, options["resume"], terminal, terminal.note)
        if options["dry_run"]:
            return run.foresee(photos, place)
        result = run.work(photos, place, until)
    _warn_of(result, out, terminal)
    return result


NAMED = 10
"""Quarantined files that are named one by one; a folder may hold thousands."""


def _warn_of(result: dict[str, Any], out: Path, terminal: Terminal) -> None:
    """Tell the warnings of a run and the files that could not serve, even under -q."""
    from patchlab import store

    bad = store.read_manifest(out / "survey", "survey")["photos"]["quarantined"]
    for file in bad[:NAMED]:
        terminal.warn(f"{file['path']}: {file['reason']}")
    if len(bad) > NAMED:
        terminal.warn(f"and {len(bad) - NAMED} more files that could not serve")
    for text in result.get("warnings", ()):
        terminal.warn(text)


@click.command()
@click.argument("photos", type=PHOTOS)
@fills_a_run
@settings_options("photos", "survey", "measure", "patches", "learn", "bank", "cluster", "common")
@shared
def run(photos: Path, terminal: Terminal, as_json: bool, **options: Any) -> None:
    """Do the whole job: PHOTOS to a compiled bank and a page."""
    result = _work(photos, "run", terminal, options)
    if result is None:
        return
    if not options["dry_run"]:
        from patchlab import report

        with terminal.working():
            result["seconds"]["report"] = report.write(options["out"], terminal)
        result["page"] = str(options["out"] / "report" / "index.html")
    settings = resolve(options, options["config"])
    by_detection = settings.purpose == "edges" and not settings.as_learned
    printed(result, as_json, functools.partial(_say_run, by_detection=by_detection))
    if not options["dry_run"]:
        _hold_to_quality(settings.strict, result)


def _frames(frames: dict[str, int]) -> str:
    return f"{frames['used']} used, {frames['quarantined']} quarantined"


def _say_run(result: dict[str, Any], by_detection: bool) -> None:
    if "bank" not in result:
        rows(result)
        return
    bank, fits, frames = result["bank"], result["fits"], result["frames"]
    state = "converged" if result["converged"] else "NOT converged"
    lines = {
        "frames": _frames(frames),
        "patches": f"{result['patches']} of {result['patch_size']}x{result['patch_size']}",
        "components": f"{result['components']}, {state}",
        "fits": f"{fits['good']} good, {fits['poor']} poor, median R2 {fits['median_r2']:.2f}",
        "bank": f"{bank['path']}: {bank['kernels']} kernels of {bank['size']}x{bank['size']}, "
        f"{bank['multiplies_per_pixel']:.0f} multiplies a pixel",
        "error": f"worst {bank['worst_error']:.2g}, proven bound {bank['error_bound']:.2g}",
        "library": bank["library"],
        "page": result.get("page", ""),
        "time": f"{sum(result['seconds'].values()):.0f} s",
    }
    if bank["coverage"] is not None:
        lines["coverage"] = (
            f"{bank['coverage']:.2f} of the atoms; "
            f"the best of its size {bank['coverage_best']:.2f}, "
            f"the best on a rotated basis {bank['coverage_rotated']:.2f}"
        )
        if by_detection:
            lines["coverage"] += " (an edge bank is not chosen for its coverage)"
    rows(lines)


def _hold_to_quality(strict: bool, result: dict[str, Any]) -> None:
    short = result["warnings"]
    if strict and short:
        raise QualityError(f"--strict: {len(short)} warnings, the first: {short[0]}")


@click.command()
@click.argument("photos", type=PHOTOS)
@click.option("-o", "--out", type=FOLDER, help="Keep the survey in this run's folder.")
@click.option("--resume", is_flag=True, help="Go on with the run that stands there.")
@click.option("--force", is_flag=True, help="Start anew where a run stands.")
@click.option("--dry-run", is_flag=True, help="Say what would be done, write nothing.")
@settings_options("photos", "survey", "measure", "cluster", "common")
@shared
def survey(photos: Path, terminal: Terminal, as_json: bool, **options: Any) -> None:
    """Say what the camera itself does to PHOTOS: noise, blur, spectrum, marks.

    Without -o the survey is only printed; with it, a page is written too (OUT/report), unless
    a whole run's page stands there. Static scenes, dark frames and a slanted edge tell more
    than photographs can.
    """
    if options["out"] is not None:
        result = _work(photos, "survey", terminal, options)
        if result is not None and not options["dry_run"]:
            result["page"] = _survey_page(options["out"], terminal)
    else:
        with tempfile.TemporaryDirectory(prefix="patchlab-") as folder:
            passing = {**options, "out": Path(folder) / "run", "passing": True}
            result = _work(photos, "survey", terminal, passing)
        if result is not None:
            result.pop("out", None)
    if result is not None:
        printed(result, as_json, _say_survey)


def _survey_page(out: Path, terminal: Terminal) -> str:
    """Where the page is: a survey's own, or that of the run of which it is a stage."""
    from patchlab import report

    page = out / "report" / "index.html"
    if not (out / "bank").exists() or not page.exists():
        with terminal.working():
            report.write_survey(out, terminal)
    return str(page)


def _say_survey(result: dict[str, Any]) -> None:
    if "noise" not in result:
        rows(result)
        return
    noise, blur = result["noise"], result["blur"]
    if noise["measurable"] and noise["gain_dn_per_electron"] is not None:
        read = noise["read_noise_dn"]
        law = (
            f"gain {noise['gain_dn_per_electron']:.4g} DN/e- "
            f"(se {noise['gain_standard_error']:.2g}), "
            + (f"read noise {read:.3g} DN" if read is not None else noise["reason"])
        )
    else:
        law = "measured as a curve" if noise["measurable"] else noise["reason"]
    rows(
        {
            "frames": _frames(result["frames"]),
            "pixels": result["pixels"],
            "noise": law,
            "blur": f"{blur['sigma_px']:.2f} px" if blur["sigma_px"] else blur["note"],
            "spectrum": result["spectrum"]["exponent"],
            "table": result["table"],
            **({"page": result["page"]} if "page" in result else {}),
            **{f"note {k}": text for k, text in enumerate(result["notes"], 1)},
        }
    )
    found = {True: "found", False: "no", None: "cannot tell"}
    click.echo()
    table(
        [
            (
                m["name"],
                found[m["found"]],
                f"{m['value']:.3g}",
                f"{m['threshold']:.3g}",
                m["remedy"],
            )
            for m in result["marks"]
        ],
        ("mark", "found", "value", "threshold", "remedy"),
    )


@click.command()
@click.argument("photos", type=PHOTOS)
@fills_a_run
@settings_options("photos", "survey", "measure", "patches", "learn", "cluster", "common")
@shared
def learn(photos: Path, terminal: Terminal, as_json: bool, **options: Any) -> None:
    """Survey PHOTOS, sample and whiten patches, and learn their basis."""
    result = _work(photos, "learn", terminal, options)
    if result is not None:
        printed(result, as_json, rows)


@click.command()
@click.argument("run", type=FOLDER)
@click.option("--force", is_flag=True, help="Fit again where fits stand.")
@settings_options("common")
@shared
def fit(run: Path, terminal: Terminal, as_json: bool, **options: Any) -> None:
    """Describe each component of a RUN's dictionary by a parametric kernel."""
    settings = resolve(options, options["config"])
    from patchlab.pipeline.desk import Desk
    from patchlab.pipeline.run import fit_run

    with terminal.working():
        result = fit_run(Desk(run, settings, not options["force"], terminal, terminal.note))
    printed(result, as_json, rows)


@click.command()
@click.argument("run", type=FOLDER, required=False)
@click.option("--taps", type=FOLDER, help="A .npy file of kernels (n, h, h): a bank of your own.")
@click.option("-o", "--out", type=FOLDER, help="The bank's folder; by default RUN/bank.")
@click.option("--force", is_flag=True, help="Replace the bank that stands there.")
@settings_options("photos", "bank", "common")
@shared
def export(run: Path | None, terminal: Terminal, as_json: bool, **options: Any) -> None:
    """Choose a bank from a RUN's fits and export it, or export your own kernels (--taps).

    Where RUN is a bank's folder, the bank stays and the libraries of --target are added.
    """
    settings = resolve(options, options["config"])
    if (run is None) == (options["taps"] is None):
        raise UsageError("export takes either a RUN or --taps FILE.npy")
    if run is None and options["out"] is None:
        raise UsageError("export --taps needs an output folder", remedy="add -o BANK")
    from patchlab.pipeline.desk import Desk
    from patchlab.pipeline.exports import export_run, export_taps

    with terminal.working():
        desk = Desk(run or options["out"], settings, True, terminal, terminal.note)
        if run is not None:
            result = export_run(desk, options["out"], force=options["force"])
        else:
            result = export_taps(options["taps"], desk, force=options["force"])
    printed(result, as_json, rows)


@click.command()
@click.argument("run", type=FOLDER)
@shared
def report(run: Path, terminal: Terminal, as_json: bool) -> None:
    """Write (again) the page of a RUN."""
    from patchlab import report as pages

    with terminal.working():
        seconds = pages.write(run, terminal)
    result = {"page": str(run / "report" / "index.html"), "seconds": seconds}
    printed(result, as_json, rows)


@click.command()
@click.option("-o", "--out", type=FOLDER, required=True, help="Folder for the frames.")
@click.option("--count", default=24, type=click.IntRange(1, 1000), help="Frames to render.")
@click.option(
    "--kind",
    default="views",
    type=click.Choice(["views", "brackets"]),
    help="Views of a tile works, or aligned pictures of stamped brackets.",
)
@click.option(
    "--pixels",
    default="Mono8",
    type=click.Choice(["Mono8", "RGB8", "BayerRG8"]),
    help="What a pixel of a view is; with colours the surfaces are glazed.",
)
@shared
def scenes(
    out: Path, count: int, kind: str, pixels: str, terminal: Terminal, as_json: bool
) -> None:
    """Render frames of an invented camera at an invented place, with noise and blur known."""
    from patchlab.pipeline import use

    if out.exists() and not out.is_dir():
        raise InputError("the output is a file", where=str(out))
    with terminal.working():
        result = use.scenes(out, count, terminal, kind=kind, pixels=pixels)
    printed(result, as_json, rows)
