"""The commands that use a bank that stands: each checks its words and prints one result."""

from __future__ import annotations

from pathlib import Path
from typing import Any

import click

from patchlab.cli.shared import FOLDER, printed, rows, shared
from patchlab.cli.terminal import Terminal, table
from patchlab.errors import InputError, UsageError, VerificationError


@click.command()
@click.argument("bank", type=FOLDER)
@shared
def verify(bank: Path, terminal: Terminal, as_json: bool) -> None:
    """Run every target that a BANK holds against the oracle; exit 5 on a mismatch."""
    from patchlab.pipeline import use

    with terminal.working():
        result = use.verify(bank, terminal)
    printed(result, as_json, _say_verify)
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


@click.command()
@click.argument("bank", type=FOLDER)
@click.argument("photos", type=FOLDER)
@click.option("--false-edges", type=float, default=10.0, help="The rate that production asks for.")
@click.option("--max-bad", type=float, default=0.1, help="Share of bad files that is let pass.")
@click.option("--jobs", type=click.IntRange(0, 1024), default=0, help="Worker processes; 0: all.")
@shared
def drift(bank: Path, photos: Path, terminal: Terminal, as_json: bool, **options: Any) -> None:
    """Tell whether new PHOTOS still come from the camera that a BANK was made for.

    Surveys them as the first ones were, and holds noise, blur and marks against the bank.
    Exit 5 when the camera has drifted, 3 when the photographs cannot tell.
    """
    from patchlab.pipeline.drift import drift as measured
    from patchlab.workers import usable_cores

    with terminal.working():
        result = measured(
            bank,
            photos,
            rate=options["false_edges"],
            max_bad=options["max_bad"],
            jobs=options["jobs"] or usable_cores(),
            progress=terminal,
        )
    for bad in result["frames"]["quarantined"]:
        terminal.warn(f"{bad['path']}: {bad['reason']}")
    printed(result, as_json, _say_drift)
    named = ", ".join(c["name"] for c in result["changes"] if c["verdict"] == result["verdict"])
    if result["verdict"] == "drifted":
        raise VerificationError(
            f"the camera has drifted from its bank ({named})",
            where=str(bank),
            remedy="look at the camera and its light; if the change is to stay, run anew",
        )
    if result["verdict"] == "cannot tell":
        raise InputError(
            f"these photographs cannot tell whether the camera has drifted ({named})",
            where=str(photos),
            remedy="take ten or more, sharp, with flat areas, at the bank's setting",
        )


def _say_drift(result: dict[str, Any]) -> None:
    def told(value: float | None) -> str:
        return "" if value is None else f"{value:.3g}"

    table(
        [
            (c["name"], c["unit"], told(c["before"]), told(c["now"]), c["verdict"], c["note"])
            for c in result["changes"]
        ],
        ("what", "unit", "bank", "now", "verdict", "note"),
    )
    if result["false_edges"]["now"] is not None:
        asked, now = (result["false_edges"][k] for k in ("asked", "now"))
        click.echo(f"\nfalse edges per megapixel at the setting for {asked:g}: about {now:.3g} now")
    click.echo(f"verdict: {result['verdict']}")


@click.command()
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
@click.option("--raw-format", help="PFNC name of the pixels in .raw files without a sidecar.")
@click.option("--raw-width", type=click.IntRange(1), help="Width of .raw files, pixels.")
@click.option("--raw-height", type=click.IntRange(1), help="Height of .raw files, pixels.")
@shared
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
            job.Request(
                options["what"],
                options["false_edges"],
                options["threshold"],
                job.raw_layout(*(options[f"raw_{k}"] for k in ("format", "width", "height"))),
            ),
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
    printed(result, as_json, _say_detect)


def _say_detect(result: dict[str, Any]) -> None:
    table(
        [(i["path"], i["edgels"], round(i["strength_threshold"], 3)) for i in result["images"]],
        ("picture", "edgels", "threshold"),
    )


@click.command()
@click.argument("bank", type=FOLDER)
@click.option(
    "-o", "--out", type=FOLDER, help="Folder for figures, plots and a page; of a run: RUN/assess."
)
@click.option("--false-edges", type=float, default=10.0, help="The one setting that is proved.")
@click.option("--quick", is_flag=True, help="Small pictures and few settings: a look, no proof.")
@click.option("--force", is_flag=True, help="Replace what stands there.")
@click.option("--seed", type=click.IntRange(0, 2**31 - 1), default=0, help="Of scenes and noise.")
@click.option("--jobs", type=click.IntRange(0, 1024), default=0, help="Worker processes; 0: all.")
@shared
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
    printed(result, as_json, _say_assess)


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


@click.command()
@click.argument("bank", type=FOLDER, required=False)
@click.option("--size", default="1920x1080", help="Width x height of the picture.")
@click.option("--repeats", default=7, type=click.IntRange(3, 100), help="Timed runs of each.")
@click.option("--against-libraries", is_flag=True, help="Run the installed libraries too.")
@click.option("--cases", is_flag=True, help="Time the fixed banks in place of a BANK.")
@click.option(
    "--calibrate",
    type=click.Path(dir_okay=False, path_type=Path),
    metavar="FILE",
    help="Fit the planner's prices to this machine and write them to FILE, for export --costs.",
)
@shared
def bench(
    bank: Path | None,
    size: str,
    repeats: int,
    against_libraries: bool,
    cases: bool,
    calibrate: Path | None,
    terminal: Terminal,
    as_json: bool,
) -> None:
    """Time a BANK's plans and targets side by side, one thread and two, as ratios of one run."""
    from patchlab.pipeline import bench as timed
    from patchlab.pipeline.calibrate import calibrate as fit_costs
    from patchlab.pipeline.loaded import bank_folder

    if calibrate is not None:
        if cases or bank is not None or against_libraries:
            raise UsageError("--calibrate stands alone: it times banks of its own")
        with terminal.working():
            fit = fit_costs(calibrate, repeats, progress=terminal)
        printed(fit, as_json, _say_costs)
        return

    try:
        width, height = (int(part) for part in size.lower().split("x"))
    except ValueError:
        raise UsageError(
            f"--size {size!r} is not WIDTHxHEIGHT", remedy="for example 1920x1080"
        ) from None
    if cases == (bank is not None):
        raise UsageError("name a BANK, or give --cases or --calibrate, and only one of them")
    with terminal.working():
        if bank is None:
            result = timed.cases(width, height, repeats, peers=against_libraries, progress=terminal)
        else:
            result = timed.bench(
                bank_folder(bank), width, height, repeats,
                peers=against_libraries, progress=terminal,
            )  # fmt: skip
    printed(result, as_json, _say_bench)


def _say_costs(result: dict[str, Any]) -> None:
    rows = [(r["plan"], f"{r['measured_ns']:.2f}", f"{r['model_ns']:.2f}") for r in result["plans"]]
    table(rows, ("plan", "measured ns a pixel", "model"))
    prices = ", ".join(f"{name} {value:.3g}" for name, value in result["prices_ns"].items())
    click.echo(f"prices in ns: {prices}")
    click.echo(f"written to {result['file']}: patchlab export --costs {result['file']} goes by it")


def _say_bench(result: dict[str, Any]) -> None:
    for case in result.get("cases", [result]):
        click.echo(f"{case['bank']}: {case['plan']}")
        table(
            [
                (
                    f"{case['bank']}: {p['kind']}{' (chosen)' if p['chosen'] else ''}",
                    f"{p['multiplies_per_pixel']:.0f}",
                    f"{p['adds_per_pixel']:.0f}",
                    f"{p['loads_per_pixel']:.0f}",
                    f"{p['scratch_bytes'] / 1024:.0f}",
                    f"{p['error_bound']:.2g}",
                    f"{p['compile_s']:.1f}",
                    f"{p['library_bytes'] / 1024:.0f}",
                    f"{p['first_call_ms']:.2f}",
                    f"{p['expected_ms']:.1f}",
                    f"{p['median_ms']:.1f}",
                    f"{p['cpu_ms']:.1f}",
                )
                for p in case["plans"]
            ],
            (
                "plan", "multiplies", "additions", "loads", "scratch kB", "bound", "compiled s",
                "library kB", "first call ms", "expected ms", "median ms", "processor ms",
            ),
        )  # fmt: skip
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
        if case["skipped"] is not None:
            shares = ", ".join(f"{100 * share:.1f} %" for share in case["skipped"]["share"])
            click.echo(f"skipped as provably flat, by scale: {shares}")


@click.command()
@click.argument("first", type=FOLDER)
@click.argument("second", type=FOLDER)
@click.option("-o", "--out", type=FOLDER, help="Folder for pictures of the pairs and differences.")
@click.option("--force", is_flag=True, help="Replace what stands there.")
@shared
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
    printed(result, as_json, rows)
