"""The command line's words: one group, and every command in it."""

from __future__ import annotations

import click

from patchlab import __version__
from patchlab.cli import making, using
from patchlab.cli.parts import parts


@click.group(context_settings={"help_option_names": ["-h", "--help"], "max_content_width": 100})
@click.version_option(__version__, message="patchlab %(version)s")
def patchlab() -> None:
    """Learn a camera's own kernels from its photographs and export them compiled.

    `patchlab run PHOTOS -o OUT` does the whole job. Each stage is a command too, and a
    run's folder fills stage by stage.

    Exit codes: 0 done, 1 failure, 2 usage, 3 input unusable, 4 below the quality asked for
    (--strict), 5 verification mismatch, 130 interrupted, 143 terminated.
    """


for _command in (
    making.run,
    making.survey,
    making.learn,
    making.fit,
    making.export,
    making.report,
    making.scenes,
    parts,
    using.verify,
    using.detect,
    using.assess,
    using.drift,
    using.bench,
    using.compare,
):
    patchlab.add_command(_command)
