"""Bands of rows computed side by side."""

from __future__ import annotations

from collections.abc import Callable
from threading import Lock, Thread

Band = Callable[[int, int], int]
"""Computes some rows, (first, count); returns a code."""


def side_by_side(band: Band, parts: list[tuple[int, int]], threads: int) -> list[int]:
    """Compute bands, from row to row, in this thread and some more; their codes.

    The next band goes to whoever is free. A thread is started for the call: that takes some
    50 us, less than a pool does.
    """
    codes: list[int] = []
    failed: list[BaseException] = []
    waiting = iter(parts)
    lock = Lock()

    def work() -> None:
        while not failed:
            with lock:
                first, end = next(waiting, (0, 0))
            if end == 0:
                return
            try:
                codes.append(band(first, end - first))
            except BaseException as error:  # told by the thread that asked
                failed.append(error)

    others = [Thread(target=work) for _ in range(threads - 1)]
    for thread in others:
        thread.start()
    work()
    for thread in others:
        thread.join()
    if failed:
        raise failed[0]
    return codes
