"""Work on a dask cluster: frames mapped over it, blocks of patches held by it.

Whatever runs here gives the bytes of the serial run: results come back in the order of the
input, sums are made in the order of the serial run, every worker computes on one thread. A
worker that dies costs time only: what it held is sent anew, what it was doing is done again.

dask is imported when a cluster is asked for, and not before (extra ``cluster``).
"""

from __future__ import annotations

import weakref
from collections import deque
from collections.abc import Callable, Iterable, Iterator
from contextlib import contextmanager
from contextvars import ContextVar
from functools import partial
from typing import Any, TypeVar

from patchlab.errors import InputError, UsageError

A = TypeVar("A")
B = TypeVar("B")

ATTEMPTS = 5
"""Times that lost work is done again before the run gives up."""
SILENCE = "30s"
"""How long a scheduler may be silent when it is first called."""

_current: ContextVar[Cluster | None] = ContextVar("patchlab_cluster", default=None)


def current() -> Cluster | None:
    """The cluster that work is shared with, inside of :func:`using`."""
    return _current.get()


class Held:
    """Blocks of an owner that live on a cluster; ``make(owner, i)`` gives a lost one again."""

    def __init__(
        self, client: Any, owner: Any, make: Callable[[Any, int], Any], count: int
    ) -> None:
        self._client, self._owner, self._make = client, weakref.ref(owner), make
        self.futures = [self._send(i) for i in range(count)]

    def _send(self, i: int) -> Any:
        return self._client.scatter(self._make(self._owner(), i), hash=False)

    def renew(self, i: int) -> None:
        """Send block i anew."""
        self.futures[i] = self._send(i)


class Cluster:
    """A dask cluster, from a client of it.

    Parameters
    ----------
    client : distributed.Client
    workers : how many tasks run at once
    """

    def __init__(self, client: Any, workers: int) -> None:
        from concurrent.futures import CancelledError

        from distributed import KilledWorker
        from distributed.comm.core import CommClosedError

        self._client, self.workers = client, workers
        self._lost = (CancelledError, KilledWorker, CommClosedError)
        self._held: weakref.WeakKeyDictionary[Any, Held] = weakref.WeakKeyDictionary()

    def map_ordered(self, function: Callable[[A], B], items: Iterable[A]) -> Iterator[B]:
        """Yield ``function(item)`` for each item, in order; a few items are sent ahead."""
        ahead: deque[tuple[A, Any]] = deque()
        source = iter(items)
        try:
            while True:
                for item in source:
                    ahead.append((item, self._client.submit(function, item, pure=False)))
                    if len(ahead) > 2 * self.workers:
                        break
                if not ahead:
                    return
                item, future = ahead.popleft()
                yield self._result(future, partial(self._submit, function, item))
        finally:
            self._client.cancel([future for _, future in ahead])

    def hold(self, owner: Any, make: Callable[[Any, int], Any], count: int) -> Held:
        """Blocks ``make(owner, i)`` on the cluster, as long as ``owner`` lives; ``make`` must not
        keep it alive."""
        if owner not in self._held:
            self._held[owner] = Held(self._client, owner, make, count)
        return self._held[owner]

    def over(self, held: Held, function: Callable[..., B], *shared: Any) -> Iterator[B]:
        """Yield ``function(block, *shared)`` of every block, in order, all at work at once."""

        def again(i: int) -> Any:
            held.renew(i)
            return self._submit(function, held.futures[i], *shared)

        waiting = [self._submit(function, future, *shared) for future in held.futures]
        for i, future in enumerate(waiting):
            yield self._result(future, partial(again, i))

    def _submit(self, function: Callable[..., B], *arguments: Any) -> Any:
        return self._client.submit(function, *arguments, pure=False)

    def _result(self, future: Any, again: Callable[[], Any]) -> Any:
        """A future's result, asked for again where a worker took it along."""
        for _ in range(ATTEMPTS):
            try:
                return future.result()
            except self._lost:
                future = again()
        try:
            return future.result()
        except self._lost as error:
            raise InputError(
                f"the cluster lost a task {ATTEMPTS + 1} times ({type(error).__name__})",
                remedy="see the workers' logs; finished stages are kept, go on with --resume",
            ) from None


@contextmanager
def using(address: str | None, jobs: int = 1) -> Iterator[None]:
    """Share work with a cluster inside of the block.

    Parameters
    ----------
    address : "local" starts ``jobs`` workers on this machine; "tcp://HOST:PORT" (or tls, ucx,
        ws) joins a standing scheduler, whose workers have the same patchlab and see the
        photographs at the same place; None changes nothing
    jobs : workers of a local cluster

    Raises
    ------
    UsageError : an address of another kind, dask is missing, or nobody answers.
    """
    if address is None:
        yield
        return
    with _client(address, jobs) as client:
        workers = sum(client.nthreads().values())
        token = _current.set(Cluster(client, max(workers, 1)))
        try:
            yield
        finally:
            _current.reset(token)


@contextmanager
def _client(address: str, jobs: int) -> Iterator[Any]:
    if address != "local" and "://" not in address:
        raise UsageError(
            f"--cluster {address!r} is neither local nor an address",
            remedy="for example --cluster tcp://scheduler:8786",
        )
    try:
        import dask
        from distributed import Client, LocalCluster
    except ImportError:
        raise UsageError(
            "--cluster needs dask", remedy="pip install 'patchlab-bank[cluster]'"
        ) from None
    quiet = {
        "distributed.admin.large-graph-warning-threshold": "1GB",  # blocks are meant to travel
        "distributed.comm.timeouts.connect": SILENCE,
        "distributed.worker.daemon": True,
    }
    with dask.config.set(quiet):
        if address == "local":
            with (
                LocalCluster(
                    n_workers=jobs, threads_per_worker=1, processes=True, dashboard_address=":0"
                ) as local,
                Client(local) as client,
            ):
                yield _calm(client)
            return
        try:
            client = Client(address, timeout=SILENCE)
        except (OSError, TimeoutError, ValueError) as error:
            raise UsageError(
                f"nobody answers at --cluster {address} ({type(error).__name__})",
                remedy="start it with: dask scheduler, and dask worker ADDRESS --nthreads 1",
            ) from None
        with client:
            if not client.nthreads():
                raise UsageError(
                    f"the cluster at {address} has no worker",
                    remedy="start some with: dask worker ADDRESS --nthreads 1",
                )
            yield _calm(client)


def _calm(client: Any) -> Any:
    """Hold every library on every worker, also on those that come later, to one thread."""
    from distributed import WorkerPlugin

    class OneThread(WorkerPlugin):  # type: ignore[misc]
        """Travels to the workers."""

        name = "patchlab-one-thread"

        def setup(self, worker: Any) -> None:
            """What a worker does first."""
            import threadpoolctl

            threadpoolctl.threadpool_limits(1)

    client.register_plugin(OneThread())
    return client


def blocks_of(count: int, size: int, workers: int, most: int) -> int:
    """Units of ``size`` in one block: a power of two, two blocks a worker, at most ``most``.

    Examples
    --------
    >>> blocks_of(100_000, 8192, 2, 32), blocks_of(10_000_000, 8192, 8, 32)
    (2, 32)
    """
    units, out = -(-count // size), 1
    while 2 * out <= most and units >= 4 * workers * out:
        out *= 2
    return out
