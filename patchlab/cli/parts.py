"""The command that finds the parts of aligned pictures."""

from __future__ import annotations

from pathlib import Path
from typing import Any

import click

from patchlab.cli.shared import FOLDER, PHOTOS, printed, shared
from patchlab.cli.terminal import Terminal, table


@click.command()
@click.argument("pictures", type=PHOTOS)
@click.option(
    "-o", "--out", type=FOLDER, required=True, help="Folder of the result; RUN/parts for its page."
)
@click.option(
    "--samples",
    default="pixels",
    type=click.Choice(["pixels", "pictures"]),
    help="Which side of the matrix is sampled: pixels give local parts.",
)
@click.option("--components", type=click.IntRange(2), help="Default: up to the largest gap.")
@click.option("--seed", type=click.IntRange(0, 2**31 - 1), default=0, help="Of the starts.")
@click.option("--jobs", type=click.IntRange(0, 1024), default=0, help="Worker processes; 0: all.")
@click.option("--force", is_flag=True, help="Replace what stands there.")
@shared
def parts(pictures: Path, terminal: Terminal, as_json: bool, **options: Any) -> None:
    """Find the parts of an object in aligned PICTURES of it.

    Independent components of the pixels are local where principal components spread over the
    whole object. Every component's locality, the pictures side by side and what each picture
    holds of each part (codes.csv) are kept.
    """
    from patchlab import report
    from patchlab.pipeline import parts as work
    from patchlab.pipeline.desk import may_write
    from patchlab.workers import usable_cores

    out = options.pop("out")
    may_write(out, options["force"])
    options["jobs"] = options["jobs"] or usable_cores()
    with terminal.working():
        pair = work.find_parts(
            pictures, out, pages=report.parts_pages, progress=terminal, **options
        )
    result = {"folder": str(out), **work.told(*pair)}
    for text in result["warnings"]:
        terminal.warn(text)
    printed(result, as_json, _say)


def _say(result: dict[str, Any]) -> None:
    width, rows = len("components"), {k: result[k] for k in ("pictures", "samples", "components")}
    for name, value in rows.items():
        click.echo(f"{name.ljust(width)}  {value}")
    click.echo()
    table(
        [
            (name, f"{r['mean_locality']:.2f}", " ".join(f"{v:.2f}" for v in r["locality"]))
            for name in ("independent", "principal")
            for r in (result[name],)
        ],
        ("components", "mean locality", "each"),
    )
