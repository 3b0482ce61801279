"""What every command shares: its common options, how it prints, what it takes."""

from __future__ import annotations

import functools
import json
from collections.abc import Callable
from pathlib import Path
from typing import Any

import click

from patchlab.cli.stopping import Stop
from patchlab.cli.terminal import Terminal

FOLDER = click.Path(path_type=Path)


class _Photos(click.ParamType):  # type: ignore[type-arg]
    """A folder of this machine, or an address."""

    name = "photos"

    def convert(self, value: Any, param: Any, ctx: Any) -> Any:
        """The place itself."""
        from patchlab.images.address import place

        return place(value)


PHOTOS = _Photos()
Command = Callable[..., Any]


def shared(command: Command) -> Command:
    """The options every command has; hands the command a ``terminal``."""

    @click.option("--json", "as_json", is_flag=True, help="Print the result as one JSON object.")
    @click.option("-q", "--quiet", is_flag=True, help="No notes and no bars.")
    @click.option("-v", "--verbose", is_flag=True, help="Show where a fault arose.")
    @functools.wraps(command)
    def call(*args: Any, quiet: bool, verbose: bool, **kwargs: Any) -> Any:
        stop = click.get_current_context().find_object(Stop)
        return command(*args, terminal=Terminal(quiet, stop), **kwargs)

    return call


def fills_a_run(command: Command) -> Command:
    """The options of commands that write a run's folder."""
    for option in (
        click.option("--dry-run", is_flag=True, help="Say what would be done, write nothing."),
        click.option("--force", is_flag=True, help="Start anew where a run stands."),
        click.option("--resume", is_flag=True, help="Go on with the run that stands there."),
        click.option("-o", "--out", type=FOLDER, required=True, help="The run's folder."),
    ):
        command = option(command)
    return command


def printed(result: Any, as_json: bool, people: Callable[[Any], None]) -> None:
    """Print a result: as one JSON object, or as people read it."""
    if as_json:
        click.echo(json.dumps(result, indent=1, sort_keys=True, allow_nan=False))
    else:
        people(result)


def rows(pairs: dict[str, Any]) -> None:
    """Print names and values, a line each."""
    width = max(map(len, pairs))
    for name, value in pairs.items():
        click.echo(f"{name.ljust(width)}  {value}")
