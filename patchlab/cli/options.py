"""Options made from the settings: each setting is one option, one TOML key, one default."""

from __future__ import annotations

import dataclasses
from collections.abc import Callable
from pathlib import Path
from typing import Any

import click

from patchlab.errors import UsageError
from patchlab.settings import Settings, from_toml, option_name, to_toml

Command = Callable[..., Any]


class _NumberOrWord(click.ParamType):  # type: ignore[type-arg]
    """A whole number, or one of some words; what is neither is left to the settings."""

    name = "number"

    def convert(self, value: Any, param: Any, ctx: Any) -> Any:
        """The number, or the text as it stands."""
        try:
            return int(value)
        except ValueError:
            return value


def _click_type(f: dataclasses.Field[Any]) -> Any:
    if f.metadata["words"]:
        return _NumberOrWord()
    if f.metadata["choices"]:
        return click.Choice(list(f.metadata["choices"]))
    return {"int": int, "float": float}.get(str(f.type).replace(" | None", ""), str)


def _plain(number: float) -> str:
    """Every digit of a whole number, the shortest form of another."""
    return str(int(number)) if number == int(number) else f"{number:g}"


def _option(f: dataclasses.Field[Any]) -> Callable[[Command], Command]:
    default = "" if f.default is None else f"  [default: {f.default}]"
    if f.type == "bool":
        names = f"{option_name(f.name)}/--no-{f.name.replace('_', '-')}"
        default = f"  [default: {'on' if f.default else 'off'}]"
        return click.option(names, f.name, default=None, help=f.metadata["help"] + default)
    span = ""
    if f.metadata["high"] is not None and f.metadata["low"] is not None:
        span = f" ({_plain(f.metadata['low'])} to {_plain(f.metadata['high'])})"
    return click.option(
        option_name(f.name),
        f.name,
        type=_click_type(f),
        default=None,
        help=f.metadata["help"] + span + default,
        metavar=None if f.metadata["choices"] else "VALUE",
    )


def settings_options(*groups: str) -> Callable[[Command], Command]:
    """Add the options of some groups of settings, and ``--config`` and ``--print-config``."""

    def decorate(command: Command) -> Command:
        for f in reversed(dataclasses.fields(Settings)):
            if f.metadata["group"] in groups:
                command = _option(f)(command)
        command = click.option(
            "--print-config", is_flag=True, help="Print the resolved settings as TOML and stop."
        )(command)
        return click.option(
            "--config",
            type=click.Path(dir_okay=False, path_type=Path),
            help="TOML file with settings; options on the command line win.",
        )(command)

    return decorate


def resolve(given: dict[str, Any], config: Path | None) -> Settings:
    """Settings from the defaults, then the file, then the command line.

    Raises
    ------
    UsageError : the file cannot be read, an unknown key, a value out of range.
    """
    values: dict[str, Any] = {}
    if config is not None:
        try:
            text = config.read_text(encoding="utf-8")
        except (OSError, UnicodeDecodeError) as error:
            reason = getattr(error, "strerror", None) or "it is not UTF-8 text"
            raise UsageError(f"cannot be read: {reason}", where=str(config)) from None
        values = from_toml(text, str(config))
    names = {f.name for f in dataclasses.fields(Settings)}
    values |= {k: v for k, v in given.items() if k in names and v is not None}
    return Settings(**values)


def print_config(settings: Settings) -> None:
    """Write the settings as TOML to stdout."""
    click.echo(to_toml(settings), nl=False)
