"""What a person at a terminal sees: notes and bars on stderr, tables, and the stop."""

from __future__ import annotations

import sys
from collections.abc import Iterator, Sequence
from contextlib import contextmanager, suppress
from typing import TYPE_CHECKING, Any

import click

from patchlab.cli.stopping import Stop
from patchlab.errors import Interrupted

if TYPE_CHECKING:
    from rich.progress import Progress, TaskID


class Terminal:
    """Progress and notes on stderr; bars only where stderr is a terminal.

    The first Ctrl-C asks the running step to end at its next report (finished stages
    are kept), the second one stops at once.
    """

    def __init__(self, quiet: bool = False, stop: Stop | None = None) -> None:
        self.quiet = quiet
        self.stop = stop or Stop()
        self._bars: Progress | None = None
        self._tasks: dict[str, TaskID] = {}

    def __call__(self, stage: str, done: float, total: float, note: str = "") -> None:
        """Show progress; raise Interrupted when a stop was asked for."""
        self._heed(f"during {stage}")
        if self._bars is None:
            return
        if stage not in self._tasks:
            self._tasks[stage] = self._bars.add_task(stage, total=total, note="")
        self._bars.update(self._tasks[stage], completed=done, total=total, note=note)

    def _heed(self, when: str) -> None:
        if self.stop.asked:
            raise Interrupted(f"stopped {when}; {self.stop.kept}")

    def may_resume(self) -> None:
        """Have a stop tell that the command as typed and ``--resume`` goes on with it."""
        self.stop.kept = f"finished stages are kept; go on with: {self.stop.resume_words()}"

    def note(self, text: str) -> None:
        """Tell one thing, unless ``-q``."""
        if not self.quiet:
            self._say(text)

    def warn(self, text: str) -> None:
        """Tell a warning, even under ``-q``."""
        self._say(f"patchlab: warning: {text}")

    def _say(self, text: str) -> None:
        if self._bars is not None:
            self._bars.console.print(text, markup=False, highlight=False, soft_wrap=True)
        else:
            click.echo(text, err=True)

    @contextmanager
    def working(self) -> Iterator[Terminal]:
        """Draw bars, and have a stop end the step in good order, while the work goes on."""
        with self._stoppable():
            if self.quiet or not sys.stderr.isatty():
                yield self
                return
            from rich.console import Console
            from rich.progress import BarColumn, Progress, TextColumn, TimeRemainingColumn

            columns = (
                TextColumn("  {task.description:<14}"),
                BarColumn(28),
                TextColumn("{task.percentage:3.0f} %"),
                TimeRemainingColumn(compact=True, elapsed_when_finished=True),
                TextColumn("{task.fields[note]}"),
            )
            with Progress(*columns, console=Console(stderr=True)) as self._bars:
                try:
                    yield self
                finally:
                    self._tasks.clear()
            self._bars = None

    @contextmanager
    def _stoppable(self) -> Iterator[None]:
        self._heed("before the work began")
        self.stop.notice = self._notice
        try:
            yield
        finally:
            self.stop.notice = None

    def _notice(self) -> None:
        with suppress(RuntimeError):  # the signal came in the middle of a line on stderr
            self._say("patchlab: ending this step (Ctrl-C again stops at once)")


def table(rows: Sequence[Sequence[Any]], head: Sequence[str]) -> None:
    """Print rows to stdout as a table: numbers to the right, words to the left."""
    from rich import box
    from rich.console import Console
    from rich.table import Table

    drawn = Table(box=box.SIMPLE_HEAD, pad_edge=False, show_edge=False)
    for i, title in enumerate(head):
        words = any(isinstance(row[i], str) for row in rows)
        drawn.add_column(title, justify="left" if words else "right", overflow="fold")
    for row in rows:
        drawn.add_row(*map(str, row))
    width = None if sys.stdout.isatty() else 120
    Console(width=width, highlight=False, markup=False, emoji=False).print(drawn)
