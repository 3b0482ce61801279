"""The order of the stages, and what is done with what they leave."""

from patchlab.pipeline.desk import Desk, bank_name, prepare
from patchlab.pipeline.run import foresee, work
from patchlab.pipeline.use import (
    RunContent,
    bench,
    compare,
    detect,
    export_run,
    export_taps,
    fit_run,
    open_run,
    scenes,
    verify,
)

__all__ = [
    "Desk",
    "RunContent",
    "bank_name",
    "bench",
    "compare",
    "detect",
    "export_run",
    "export_taps",
    "fit_run",
    "foresee",
    "open_run",
    "prepare",
    "scenes",
    "verify",
    "work",
]
