"""What a person at a terminal sees: notes and bars on stderr, tables, and the stop."""

from __future__ import annotations

import signal
import sys
import threading
from collections.abc import Iterator, Sequence
from contextlib import contextmanager
from types import FrameType
from typing import TYPE_CHECKING, Any

import click

from patchlab.errors import Interrupted

if TYPE_CHECKING:
    from rich.progress import Progress, TaskID


class Terminal:
    """Progress and notes on stderr; bars only where stderr is a terminal.

    The first Ctrl-C asks the running step to end at its next report (finished stages
    are kept), the second one stops at once.
    """

    def __init__(self, quiet: bool = False) -> None:
        self.quiet = quiet
        self.stopping = False
        self.resume_hint = ""
        self._bars: Progress | None = None
        self._tasks: dict[str, TaskID] = {}

    def __call__(self, stage: str, done: float, total: float, note: str = "") -> None:
        """Show progress; raise Interrupted when a stop was asked for."""
        if self.stopping:
            raise Interrupted(f"stopped during {stage}; finished stages are kept{self.resume_hint}")
        if self._bars is None:
            return
        if stage not in self._tasks:
            self._tasks[stage] = self._bars.add_task(stage, total=total, note="")
        self._bars.update(self._tasks[stage], completed=done, total=total, note=note)

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
        """Draw bars and take over Ctrl-C while the work goes on."""
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
        if threading.current_thread() is not threading.main_thread():
            yield
            return

        def stop(number: int, frame: FrameType | None) -> None:
            if self.stopping:
                raise KeyboardInterrupt
            self.stopping = True
            self._say("patchlab: ending this step (Ctrl-C again stops at once)")

        before = signal.signal(signal.SIGINT, stop)
        try:
            yield
        finally:
            signal.signal(signal.SIGINT, before)


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
