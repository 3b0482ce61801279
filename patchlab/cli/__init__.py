"""The command line: click in, exit codes out. Results go to stdout, all else to stderr."""

from __future__ import annotations

import sys
from collections.abc import Sequence

import click

from patchlab.cli.commands import patchlab
from patchlab.errors import Interrupted, PatchlabError


def main(argv: Sequence[str] | None = None) -> None:
    """Run the command line and exit with the code that fits (see ``patchlab --help``)."""
    try:
        code = patchlab.main(
            args=None if argv is None else list(argv), prog_name="patchlab", standalone_mode=False
        )
    except Interrupted as stop:
        _say(str(stop))
        sys.exit(stop.exit_code)
    except PatchlabError as error:
        _say(f"error: {error}")
        sys.exit(error.exit_code)
    except click.ClickException as error:
        error.show()
        sys.exit(error.exit_code)
    except (KeyboardInterrupt, click.Abort):
        _say("stopped at once; finished stages are kept")
        sys.exit(Interrupted.exit_code)
    except BrokenPipeError:  # the reader of stdout went away: not our failure
        sys.stderr.close()
        sys.exit(0)
    except MemoryError:
        _say("error: out of memory; lower --patches or --jobs")
        sys.exit(1)
    except OSError as error:
        _say(f"error: {error.filename or 'file system'}: {error.strerror or error}")
        sys.exit(1)
    except Exception as error:
        if "-v" in (argv or sys.argv) or "--verbose" in (argv or sys.argv):
            raise
        _say(
            f"error: a fault of patchlab itself ({type(error).__name__}: {error}); "
            "run again with -v to see where, and report it"
        )
        sys.exit(1)
    sys.exit(code if isinstance(code, int) else 0)


def _say(text: str) -> None:
    click.echo(f"patchlab: {text}", err=True)
