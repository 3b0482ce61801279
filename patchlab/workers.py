"""Mapping one function over frames: in this process or in several.

Results come back in the order of the input whatever the number of workers, and
inside a worker every numerical library runs on one thread, so ``--jobs`` is the
only knob and a result never depends on it.
"""

from __future__ import annotations

import multiprocessing
import os
import signal
import threading
from collections.abc import Callable, Iterable, Iterator
from concurrent.futures import Future, ProcessPoolExecutor
from contextlib import contextmanager
from multiprocessing import connection
from typing import TypeVar

from patchlab import cluster
from patchlab.progress import Progress, silent

A = TypeVar("A")
B = TypeVar("B")


def usable_cores() -> int:
    """Processors this process may run on (its affinity, not the machine's count)."""
    if hasattr(os, "sched_getaffinity"):
        return len(os.sched_getaffinity(0))
    return os.cpu_count() or 1


def _begin() -> None:
    """What a worker does first: one thread a library, and its life bound to the parent's."""
    signal.signal(signal.SIGINT, signal.SIG_IGN)  # Ctrl-C is the parent's business
    _mask(signal.SIG_UNBLOCK)
    threading.Thread(target=_end_with_parent, daemon=True).start()
    import threadpoolctl

    threadpoolctl.threadpool_limits(1)


def _end_with_parent() -> None:
    """Wait for the parent's death, however it dies, and follow it."""
    parent = multiprocessing.parent_process()
    if parent is not None:
        connection.wait([parent.sentinel])
        os._exit(1)


def _mask(how: int) -> None:
    if hasattr(signal, "pthread_sigmask"):
        signal.pthread_sigmask(how, {signal.SIGINT})


@contextmanager
def _ctrl_c_waits() -> Iterator[None]:
    """Hold Ctrl-C back: a worker started meanwhile is deaf to it until it is ready."""
    _mask(signal.SIG_BLOCK)
    try:
        yield
    finally:
        _mask(signal.SIG_UNBLOCK)


def map_ordered(
    function: Callable[[A], B],
    items: Iterable[A],
    *,
    jobs: int = 1,
    stage: str = "",
    progress: Progress = silent,
) -> Iterator[B]:
    """Yield ``function(item)`` for each item, in order.

    Parameters
    ----------
    function : callable
        A top-level function (it is sent to other processes by name).
    items : iterable
        What it is called with; at most ``2 * jobs`` are in flight at once.
    jobs : int
        Worker processes; 1 (the default) runs here. More run on the cluster in place of this
        machine, inside of :func:`patchlab.cluster.using`.
    stage, progress
        Told after every item.

    Yields
    ------
    The results, in the order of ``items``.
    """
    work = list(items)
    total = len(work)
    if jobs <= 1 or total <= 1:
        for done, item in enumerate(work, 1):
            yield function(item)
            progress(stage, done, total)
        return
    farm = cluster.current()
    if farm is not None:
        for done, result in enumerate(farm.map_ordered(function, work), 1):
            yield result
            progress(stage, done, total)
        return
    # spawn: safe with threads in the parent, and the same on every system
    context = multiprocessing.get_context("spawn")
    with ProcessPoolExecutor(min(jobs, total), context, initializer=_begin) as pool:
        waiting: list[Future[B]] = []
        sent = done = 0
        try:
            while done < total:
                while sent < total and len(waiting) < 2 * jobs:
                    with _ctrl_c_waits():
                        waiting.append(pool.submit(function, work[sent]))
                    sent += 1
                yield waiting.pop(0).result()
                done += 1
                progress(stage, done, total)
        except (KeyboardInterrupt, GeneratorExit):  # do not wait for what the workers hold
            pool.shutdown(wait=False, cancel_futures=True)
            raise
        finally:
            for future in waiting:
                future.cancel()
