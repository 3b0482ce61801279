"""The stop: what Ctrl-C and SIGTERM do, from the program's first line to its last.

Only the standard library's quick modules are imported here, so that the handler stands
before anything slow is loaded.
"""

from __future__ import annotations

import contextlib
import os
import signal
import sys
import threading

TYPE_CHECKING = False
if TYPE_CHECKING:
    from collections.abc import Callable, Iterator, Sequence
    from types import FrameType

SIGNALS = (signal.SIGINT, signal.SIGTERM)


class Stop:
    """Whether, how often and by which signal a person asked the program to end.

    While ``notice`` is set a step is at work that looks at ``asked`` with each of its
    reports: the first signal calls ``notice`` and the step ends in good order. Without
    one, and from the second Ctrl-C on, the signal raises KeyboardInterrupt; the
    third Ctrl-C ends the process whatever it does. Once all is said and only workers are
    waited for (``leaving``), the second one does.

    Parameters
    ----------
    words : the command line as typed, without the program's name
    """

    def __init__(self, words: Sequence[str] = ()) -> None:
        self.words = tuple(words)
        self.asked = 0
        self.kept = "finished stages are kept"
        self.notice: Callable[[], None] | None = None
        self.ending = False
        self.at_once = False
        self.leaving = False
        self._times = 0

    @property
    def exit_code(self) -> int:
        """130 after Ctrl-C, 143 after SIGTERM, as shells count."""
        return 128 + (self.asked or signal.SIGINT)

    @contextlib.contextmanager
    def listening(self, keep: bool) -> Iterator[None]:
        """Take over the signals; give them back at the end unless ``keep``."""
        if threading.current_thread() is not threading.main_thread():
            yield
            return
        before = {number: signal.signal(number, self._told) for number in SIGNALS}
        hook = sys.unraisablehook
        sys.unraisablehook = lambda lost: None if self.asked else hook(lost)
        try:
            yield
        finally:
            if not keep:
                sys.unraisablehook = hook
                for number, handler in before.items():
                    signal.signal(number, handler)

    def _told(self, number: int, frame: FrameType | None) -> None:
        if self.asked and number == signal.SIGTERM:
            return  # sent to a process and to its group, it comes twice
        self.asked = self.asked or number
        self._times += 1
        if self._times > 2 or (self._times == 2 and self.leaving):
            self._end_now()
        if self.ending:
            return
        if self._times == 1 and self.notice is not None:
            self.notice()
            return
        raise KeyboardInterrupt

    def _end_now(self) -> None:
        if not self.ending:
            text = f"patchlab: stopped at once; {self.kept}\n"
            os.write(2, text.encode(errors="backslashreplace"))
        os._exit(self.exit_code)

    def end_workers(self) -> None:
        """Kill the worker processes, so that nobody waits for them."""
        if "multiprocessing" in sys.modules:
            import multiprocessing

            for child in multiprocessing.active_children():
                child.kill()

    def resume_words(self) -> str:
        """The command as typed, quoted for a shell, and ``--resume``."""
        words = [word for word in self.words if word not in ("--force", "--resume")]
        at = words.index("--") if "--" in words else len(words)
        words = ["patchlab", *words[:at], "--resume", *words[at:]]
        if os.name == "nt":
            import subprocess

            return subprocess.list2cmdline(words)
        import shlex

        return shlex.join(words)
