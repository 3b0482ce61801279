"""The commands: each checks its words, calls the pipeline, and prints one result."""

from __future__ import annotations

import functools
import json
import tempfile
from collections.abc import Callable
from pathlib import Path
from typing import Any

import click

from patchlab import __version__
from patchlab.cli.options import print_config, resolve, settings_options
from patchlab.cli.stopping import Stop
from patchlab.cli.terminal import Terminal, table
from patchlab.errors import InputError, QualityError, UsageError, VerificationError

FOLDER = click.Path(path_type=Path)
Command = Callable[..., Any]


def _shared(command: Command) -> Command:
    """The options every command has; hands the command a ``terminal``."""

    @click.option("--json", "as_json", is_flag=True, help="Print the result as one JSON object.")
    @click.option("-q", "--quiet", is_flag=True, help="No notes and no bars.")
    @click.option("-v", "--verbose", is_flag=True, help="Show where a fault arose.")
    @functools.wraps(command)
    def call(*args: Any, quiet: bool, verbose: bool, **kwargs: Any) -> Any:
        stop = click.get_current_context().find_object(Stop)
        return command(*args, terminal=Terminal(quiet, stop), **kwargs)

    return call


def _fills_a_run(command: Command) -> Command:
    """The options of commands that write a run's folder."""
    for option in (
        click.option("--dry-run", is_flag=True, help="Say what would be done, write nothing."),
        click.option("--force", is_flag=True, help="Start anew where a run stands."),
        click.option("--resume", is_flag=True, help="Go on with the run that stands there."),
        click.option("-o", "--out", type=FOLDER, required=True, help="The run's folder."),
    ):
        command = option(command)
    return command


def _print(result: Any, as_json: bool, people: Callable[[Any], None]) -> None:
    if as_json:
        click.echo(json.dumps(result, indent=1, sort_keys=True, allow_nan=False))
    else:
        people(result)


def _rows(pairs: dict[str, Any]) -> None:
    width = max(map(len, pairs))
    for name, value in pairs.items():
        click.echo(f"{name.ljust(width)}  {value}")


@click.group(context_settings={"help_option_names": ["-h", "--help"], "max_content_width": 100})
@click.version_option(__version__, message="patchlab %(version)s")
def patchlab() -> None:
    """Learn a camera's own kernels from its photographs and export them compiled.

    `patchlab run PHOTOS -o OUT` does the whole job. Each stage is a command too, and a
    run's folder fills stage by stage.

    Exit codes: 0 done, 1 failure, 2 usage, 3 input unusable, 4 below the quality asked for
    (--strict), 5 verification mismatch, 130 interrupted, 143 terminated.
    """


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


@patchlab.command()
@click.argument("photos", type=FOLDER)
@_fills_a_run
@settings_options("photos", "survey", "measure", "patches", "learn", "bank", "common")
@_shared
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
    _print(result, as_json, functools.partial(_say_run, by_detection=by_detection))
    if not options["dry_run"]:
        _hold_to_quality(settings.strict, result)


def _frames(frames: dict[str, int]) -> str:
    return f"{frames['used']} used, {frames['quarantined']} quarantined"


def _say_run(result: dict[str, Any], by_detection: bool) -> None:
    if "bank" not in result:
        _rows(result)
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
    _rows(lines)


def _hold_to_quality(strict: bool, result: dict[str, Any]) -> None:
    short = result["warnings"]
    if strict and short:
        raise QualityError(f"--strict: {len(short)} warnings, the first: {short[0]}")


@patchlab.command()
@click.argument("photos", type=FOLDER)
@click.option("-o", "--out", type=FOLDER, help="Keep the survey in this run's folder.")
@click.option("--resume", is_flag=True, help="Go on with the run that stands there.")
@click.option("--force", is_flag=True, help="Start anew where a run stands.")
@click.option("--dry-run", is_flag=True, help="Say what would be done, write nothing.")
@settings_options("photos", "survey", "measure", "common")
@_shared
def survey(photos: Path, terminal: Terminal, as_json: bool, **options: Any) -> None:
    """Say what the camera itself does to PHOTOS: noise, blur, spectrum, marks.

    Without -o the survey is only printed. Static scenes, dark frames and a slanted edge tell
    more than photographs can.
    """
    if options["out"] is not None:
        result = _work(photos, "survey", terminal, options)
    else:
        with tempfile.TemporaryDirectory(prefix="patchlab-") as folder:
            passing = {**options, "out": Path(folder) / "run", "passing": True}
            result = _work(photos, "survey", terminal, passing)
        if result is not None:
            result.pop("out", None)
    if result is not None:
        _print(result, as_json, _say_survey)


def _say_survey(result: dict[str, Any]) -> None:
    if "noise" not in result:
        _rows(result)
        return
    noise, blur = result["noise"], result["blur"]
    if noise["measurable"] and noise["gain_dn_per_electron"] is not None:
        law = (
            f"gain {noise['gain_dn_per_electron']:.4g} DN/e- "
            f"(se {noise['gain_standard_error']:.2g}), read noise {noise['read_noise_dn']:.3g} DN"
        )
    else:
        law = "measured as a curve" if noise["measurable"] else noise["reason"]
    _rows(
        {
            "frames": _frames(result["frames"]),
            "pixels": result["pixels"],
            "noise": law,
            "blur": f"{blur['sigma_px']:.2f} px" if blur["sigma_px"] else blur["note"],
            "spectrum": result["spectrum"]["exponent"],
            "table": result["table"],
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


@patchlab.command()
@click.argument("photos", type=FOLDER)
@_fills_a_run
@settings_options("photos", "survey", "measure", "patches", "learn", "common")
@_shared
def learn(photos: Path, terminal: Terminal, as_json: bool, **options: Any) -> None:
    """Survey PHOTOS, sample and whiten patches, and learn their basis."""
    result = _work(photos, "learn", terminal, options)
    if result is not None:
        _print(result, as_json, _rows)


@patchlab.command()
@click.argument("run", type=FOLDER)
@click.option("--force", is_flag=True, help="Fit again where fits stand.")
@settings_options("common")
@_shared
def fit(run: Path, terminal: Terminal, as_json: bool, **options: Any) -> None:
    """Describe each component of a RUN's dictionary by a parametric kernel."""
    settings = resolve(options, options["config"])
    from patchlab.pipeline.desk import Desk
    from patchlab.pipeline.run import fit_run

    with terminal.working():
        result = fit_run(Desk(run, settings, not options["force"], terminal, terminal.note))
    _print(result, as_json, _rows)


@patchlab.command()
@click.argument("run", type=FOLDER, required=False)
@click.option("--taps", type=FOLDER, help="A .npy file of kernels (n, h, h): a bank of your own.")
@click.option("-o", "--out", type=FOLDER, help="The bank's folder; by default RUN/bank.")
@click.option("--force", is_flag=True, help="Replace the bank that stands there.")
@settings_options("photos", "bank", "common")
@_shared
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
    _print(result, as_json, _rows)


@patchlab.command()
@click.argument("bank", type=FOLDER)
@_shared
def verify(bank: Path, terminal: Terminal, as_json: bool) -> None:
    """Run every target that a BANK holds against the oracle; exit 5 on a mismatch."""
    from patchlab.pipeline import use

    with terminal.working():
        result = use.verify(bank, terminal)
    _print(result, as_json, _say_verify)
    if not result["passed"]:
        bad = [c["target"] for c in result["checks"] if c["passed"] is False]
        raise VerificationError(f"{', '.join(bad)} differ from the oracle", where=str(bank))


def _say_verify(result: dict[str, Any]) -> None:
    word = {True: "equal", False: "DIFFERS", None: "not run"}
    table(
        [
            (
                c["target"],
                c["what"],
                "" if c["worst_error"] is None else f"{c['worst_error']:.3g}",
                "" if c["bound"] is None else f"{c['bound']:.3g}",
                word[c["passed"]],
                c["note"],
            )
            for c in result["checks"]
        ],
        ("target", "what", "worst error", "bound", "verdict", "note"),
    )


@patchlab.command()
@click.argument("bank", type=FOLDER)
@click.argument("pictures", type=FOLDER)
@click.option("-o", "--out", type=FOLDER, required=True, help="Folder for maps and edgels.")
@click.option("--false-edges", type=float, help="False elements per megapixel of flat area.")
@click.option("--threshold", type=float, help="A strength in noise units instead of a rate.")
@click.option(
    "--edges",
    "what",
    type=click.Choice(["step", "line", "both"]),
    help="What is looked for, each kind at the rate; by default what the bank is made for.",
)
@click.option("--pictures/--no-pictures", "drawn", default=True, help="Draw maps and overlays.")
@click.option(
    "--table",
    type=click.Choice(["csv", "parquet"]),
    default="csv",
    help="Form of the one table of all edgels; parquet needs the extra [parquet].",
)
@click.option("--jobs", type=click.IntRange(0, 1024), default=1, help="Worker processes; 0: all.")
@click.option("--force", is_flag=True, help="Replace what stands there.")
@click.option("--resume", is_flag=True, help="Go on with what stands there.")
@click.option("--max-bad", type=float, default=0.1, help="Share of pictures that may be unusable.")
@_shared
def detect(bank: Path, pictures: Path, terminal: Terminal, as_json: bool, **options: Any) -> None:
    """Find edges in PICTURES with a BANK: one table of edgels, maps and overlays.

    PICTURES is a folder, a picture or a video; of a video every frame is taken.

    Edges that steer a machine or gauge a safety part need the usual care: validate on your own
    parts and light, and follow the codes and qualified practice that apply.
    """
    terminal.may_resume()
    from patchlab import report
    from patchlab.pipeline import detect as job
    from patchlab.workers import usable_cores

    out = options["out"]
    with terminal.working():
        result = job.detect(
            bank,
            pictures,
            out,
            job.Request(options["what"], options["false_edges"], options["threshold"]),
            jobs=options["jobs"] or usable_cores(),
            draw=report.edge_pictures if options["drawn"] else None,
            max_bad=options["max_bad"],
            force=options["force"],
            resume=options["resume"],
            table=options["table"],
            progress=terminal,
        )
    for bad in result["quarantined"]:
        terminal.warn(f"{bad['path']}: {bad['reason']}")
    _print(result, as_json, _say_detect)


def _say_detect(result: dict[str, Any]) -> None:
    table(
        [(i["path"], i["edgels"], round(i["strength_threshold"], 3)) for i in result["images"]],
        ("picture", "edgels", "threshold"),
    )


@patchlab.command()
@click.argument("bank", type=FOLDER)
@click.option(
    "-o", "--out", type=FOLDER, help="Folder for figures, plots and a page; of a run: RUN/assess."
)
@click.option("--false-edges", type=float, default=10.0, help="The one setting that is proved.")
@click.option("--quick", is_flag=True, help="Small pictures and few settings: a look, no proof.")
@click.option("--force", is_flag=True, help="Replace what stands there.")
@click.option("--seed", type=click.IntRange(0, 2**31 - 1), default=0, help="Of scenes and noise.")
@click.option("--jobs", type=click.IntRange(0, 1024), default=0, help="Worker processes; 0: all.")
@_shared
def assess(bank: Path, terminal: Terminal, as_json: bool, **options: Any) -> None:
    """Prove a BANK on made pictures of its own camera, beside the detectors of libraries.

    False elements promised and found, edgels against the Cramer-Rao bound, and F on scenes
    with true edges at five light levels: one setting of the bank, the libraries at their best
    fixed setting and tuned to each picture. About a minute on two cores. `patchlab report RUN`
    then shows it on the run's page.
    """
    from patchlab.pipeline.assess import assess_bank
    from patchlab.report.assess import pictures
    from patchlab.workers import usable_cores

    out = options["out"]
    if out is None and (bank / "survey").is_dir():
        out = bank / "assess"
    with terminal.working():
        result = assess_bank(
            bank,
            out,
            rate=options["false_edges"],
            seed=options["seed"],
            jobs=options["jobs"] or usable_cores(),
            quick=options["quick"],
            force=options["force"],
            pictures=pictures,
            progress=terminal,
        )
    _print(result, as_json, _say_assess)


def _say_assess(result: dict[str, Any]) -> None:
    table(
        [
            (f"{r['asked']:g}", f"{r['found']:g}", f"{r['groups']:g}", "yes" if r["flat"] else "NO")
            for r in result["rates"]
        ],
        ("false / Mpx asked", "found", "groups", "even over grey"),
    )
    click.echo()
    table(
        [
            (
                f"{r['contrast']:g}",
                *(r[k] for k in ("rms_px", "bound_px", "ratio", "bias_px")),
                *(r[k] for k in ("direction_rms_deg", "direction_bound_deg")),
            )
            for r in result["location"]
        ],
        ("contrast, noise sd", "rms px", "bound px", "ratio", "bias px", "turn deg", "bound deg"),
    )
    click.echo()
    found = result["detection"]
    rows = [*found["ours"], *found["fixed"], *found["tuned"]]
    table(
        [(r["detector"], r["picture"], r["setting"], *r["f"], f"{r['mean_f']:.3f}") for r in rows],
        ("detector", "picture", "setting", *(f"{x:g} e-" for x in found["light_electrons"]), "F"),
    )


@patchlab.command()
@click.argument("bank", type=FOLDER, required=False)
@click.option("--size", default="1920x1080", help="Width x height of the picture.")
@click.option("--repeats", default=7, type=click.IntRange(3, 100), help="Timed runs of each.")
@click.option("--against-libraries", is_flag=True, help="Run the installed libraries too.")
@click.option("--cases", is_flag=True, help="Time the fixed banks in place of a BANK.")
@_shared
def bench(
    bank: Path | None,
    size: str,
    repeats: int,
    against_libraries: bool,
    cases: bool,
    terminal: Terminal,
    as_json: bool,
) -> None:
    """Time a BANK's plans and targets side by side, one thread and two, as ratios of one run."""
    from patchlab.pipeline import bench as timed
    from patchlab.pipeline.loaded import bank_folder

    try:
        width, height = (int(part) for part in size.lower().split("x"))
    except ValueError:
        raise UsageError(
            f"--size {size!r} is not WIDTHxHEIGHT", remedy="for example 1920x1080"
        ) from None
    if cases == (bank is not None):
        raise UsageError("name a BANK or give --cases, and not both")
    with terminal.working():
        if bank is None:
            result = timed.cases(width, height, repeats, peers=against_libraries, progress=terminal)
        else:
            result = timed.bench(
                bank_folder(bank), width, height, repeats,
                peers=against_libraries, progress=terminal,
            )  # fmt: skip
    _print(result, as_json, _say_bench)


def _say_bench(result: dict[str, Any]) -> None:
    for case in result.get("cases", [result]):
        table(
            [
                (
                    f"{case['bank']}: {p['kind']}{' (chosen)' if p['chosen'] else ''}",
                    f"{p['multiplies_per_pixel']:.0f}",
                    f"{p['adds_per_pixel']:.0f}",
                    f"{p['scratch_bytes'] / 1024:.0f}",
                    f"{p['error_bound']:.2g}",
                    f"{p['compile_s']:.1f}",
                    f"{p['median_ms']:.1f}",
                )
                for p in case["plans"]
            ],
            ("plan", "multiplies", "additions", "scratch kB", "bound", "compiled s", "median ms"),
        )
        table(
            [
                (
                    r["target"],
                    r["threads"],
                    f"{r['median_ms']:.1f}",
                    f"{r['cpu_ms']:.1f}",
                    f"{r['ratio']:.2f}",
                    "" if r["error_of_bound"] is None else f"{r['error_of_bound']:.2g}",
                    r["note"],
                )
                for r in case["targets"]
            ],
            (
                "target",
                "threads",
                "median ms",
                "processor ms",
                "times the first",
                "error / bound",
                "note",
            ),
        )


@patchlab.command()
@click.argument("run", type=FOLDER)
@_shared
def report(run: Path, terminal: Terminal, as_json: bool) -> None:
    """Write (again) the page of a RUN."""
    from patchlab import report as pages

    with terminal.working():
        seconds = pages.write(run, terminal)
    result = {"page": str(run / "report" / "index.html"), "seconds": seconds}
    _print(result, as_json, _rows)


@patchlab.command()
@click.argument("first", type=FOLDER)
@click.argument("second", type=FOLDER)
@click.option("-o", "--out", type=FOLDER, help="Folder for pictures of the pairs and differences.")
@click.option("--force", is_flag=True, help="Replace what stands there.")
@_shared
def compare(first: Path, second: Path, terminal: Terminal, as_json: bool, **options: Any) -> None:
    """Match two dictionaries, fits or banks: bit-equal, equivalent or different.

    They may come from different cameras: their shapes are compared as crowds too.
    """
    from patchlab.pipeline import compare as pairs
    from patchlab.pipeline.desk import may_write

    if options["out"] is not None:
        may_write(options["out"], options["force"])
    found = pairs.compare(first, second)
    result = found.plain()
    if options["out"] is not None:
        from patchlab import report, store

        for name, data in report.comparison_pictures(found).items():
            store.write_file(options["out"] / name, data)
        result["pictures"] = str(options["out"])
    _print(result, as_json, _rows)


@patchlab.command()
@click.option("-o", "--out", type=FOLDER, required=True, help="Folder for the frames.")
@click.option("--count", default=24, type=click.IntRange(1, 1000), help="Frames to render.")
@_shared
def scenes(out: Path, count: int, terminal: Terminal, as_json: bool) -> None:
    """Render frames of an invented camera at an invented place, with noise and blur known."""
    from patchlab.pipeline import use

    if out.exists() and not out.is_dir():
        raise InputError("the output is a file", where=str(out))
    with terminal.working():
        result = use.scenes(out, count, terminal)
    _print(result, as_json, _rows)
