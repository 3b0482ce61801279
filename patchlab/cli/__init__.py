"""The command line: click in, exit codes out. Results go to stdout, all else to stderr."""

from __future__ import annotations

import os
import sys

from patchlab.cli.stopping import Stop

TYPE_CHECKING = False
if TYPE_CHECKING:
    from collections.abc import Sequence


def main(argv: Sequence[str] | None = None) -> None:
    """Run the command line and exit with the code that fits (see ``patchlab --help``)."""
    stop = Stop(sys.argv[1:] if argv is None else argv)
    with stop.listening(keep=argv is None):
        try:
            code = _outcome(stop)
        except KeyboardInterrupt:  # whenever it comes, even while a failure is told
            code = _stopped(stop)
        stop.ending = True
    if stop.at_once and argv is None:  # the interpreter's own ending may wait for workers
        sys.stdout.flush()
        sys.stderr.flush()
        os._exit(code)
    stop.leaving = True  # the interpreter waits for workers that are at a task
    sys.exit(code)


def _outcome(stop: Stop) -> int:
    """Do what was asked, tell of what went wrong, give the exit code."""
    try:
        return _call(stop)
    except BrokenPipeError:  # the reader of stdout went away: not our failure
        sys.stderr.close()
        return 0
    except Exception as error:
        from patchlab.errors import Interrupted

        if isinstance(error, Interrupted):
            _say(str(error))
            return stop.exit_code
        if stop.asked:  # what fails after a stop was asked for, fails because of it
            return _stopped(stop)
        return _failed(error, stop)


def _call(stop: Stop) -> int:
    """Load the commands, which takes a while, and run the one that was named."""
    from patchlab.cli.commands import patchlab

    code = patchlab.main(
        args=list(stop.words), prog_name="patchlab", standalone_mode=False, obj=stop
    )
    return code if isinstance(code, int) else 0


def _stopped(stop: Stop) -> int:
    told, stop.ending = stop.ending, True
    stop.at_once = True
    stop.end_workers()
    if not told:
        _say(f"stopped at once; {stop.kept}")
    return stop.exit_code


def _failed(error: Exception, stop: Stop) -> int:
    """Say in one sentence what went wrong."""
    import click

    from patchlab.errors import PatchlabError

    if isinstance(error, PatchlabError):
        _say(f"error: {error}")
        return error.exit_code
    if isinstance(error, click.ClickException):
        error.show()
        return error.exit_code
    if isinstance(error, MemoryError):
        _say("error: out of memory; lower --patches or --jobs")
    elif isinstance(error, OSError):
        _say(f"error: {error.filename or 'file system'}: {error.strerror or error}")
    else:
        if "-v" in stop.words or "--verbose" in stop.words:
            raise error
        _say(
            f"error: a fault of patchlab itself ({type(error).__name__}: {error}); "
            "run again with -v to see where, and report it"
        )
    return 1


def _say(text: str) -> None:
    print(f"patchlab: {text}", file=sys.stderr, flush=True)
