"""One callback out of the library, which can also say stop.

The library never prints. A stage that takes time calls
``progress(stage, done, total, note)``; a callback that raises
:class:`~patchlab.errors.Interrupted` ends the work there, with everything
finished so far kept by whoever owns the artefact.
"""

from __future__ import annotations

from typing import Protocol


class Progress(Protocol):
    """What a stage calls as it goes on."""

    def __call__(self, stage: str, done: float, total: float, note: str = "") -> None:
        """Tell that ``done`` of ``total`` units of ``stage`` are finished."""


def silent(stage: str, done: float, total: float, note: str = "") -> None:
    """Listen to nothing: the default, so that no stage needs an ``if``."""
