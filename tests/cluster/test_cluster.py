"""Work on a dask cluster gives the bytes of the serial run, also when a worker dies."""

import gc
import os
import signal
import time

import numpy as np
import pytest
from distributed import Client, LocalCluster
from PIL import Image

from patchlab import cluster
from patchlab.cli import main
from patchlab.errors import InputError, UsageError
from patchlab.learn import likelihood, moments
from patchlab.learn.likelihood import Likelihood, Rows
from patchlab.pipeline import desk as desks
from patchlab.pipeline import run as runs
from patchlab.settings import Settings
from patchlab.workers import map_ordered

OPTIONS = {
    "patches": 20_000,
    "patch_size": 8,
    "restarts": 1,
    "resamples": 0,
    "max_iterations": 12,
    "jobs": 1,
    "table": "linear",
}


@pytest.fixture(scope="module")
def address():
    """A scheduler with two workers of one thread."""
    with LocalCluster(
        n_workers=2, threads_per_worker=1, processes=True, dashboard_address=":0"
    ) as local:
        yield local.scheduler_address


def pids(address):
    with Client(address, timeout="30s") as client:
        client.wait_for_workers(2, timeout=60)
        return list(client.run(os.getpid).values())


def kill_one(address):
    """Kill a worker's process; its nanny starts another one in a while."""
    os.kill(pids(address)[0], signal.SIGKILL)


@pytest.fixture(scope="module")
def photos(tmp_path_factory):
    """Frames of overlapping squares, invented here."""
    folder = tmp_path_factory.mktemp("frames")
    r = np.random.default_rng(0)
    for i in range(6):
        plane = np.full((150, 200), 120.0)
        for _ in range(300):
            y, x, h = r.integers(0, 150), r.integers(0, 200), r.integers(4, 30)
            plane[y : y + h, x : x + h + r.integers(0, 20)] = r.uniform(20, 230)
        noisy = plane + r.normal(size=plane.shape)
        Image.fromarray(np.clip(noisy, 0, 255).astype(np.uint8)).save(folder / f"{i}.png")
    return folder


def learn(photos, out, *, progress=lambda *a: None, **options):
    """Bytes of everything that learning leaves."""
    settings = Settings(**{**OPTIONS, **options})
    runs.work(photos, desks.Desk(out, settings, False, progress), "learn")
    rooms = ("survey", "patches", "dictionary")
    return {f"{r}/{p.name}": p.read_bytes() for r in rooms for p in sorted((out / r).iterdir())}


@pytest.fixture(scope="module")
def serial(photos, tmp_path_factory):
    return learn(photos, tmp_path_factory.mktemp("serial") / "run")


def test_the_bytes_of_the_serial_run(photos, serial, address, tmp_path, monkeypatch):
    passes = []
    far = likelihood._far_sums
    monkeypatch.setattr(
        likelihood,
        "_far_sums",
        lambda farm, rows, *a: (passes.append(len(rows)), far(farm, rows, *a))[1],
    )
    assert learn(photos, tmp_path / "run", cluster=address) == serial
    assert len(passes) >= OPTIONS["max_iterations"]


@pytest.mark.parametrize("stage", ["sampling", "learn"])
def test_a_worker_that_is_killed_changes_nothing(photos, serial, address, tmp_path, stage):
    killed = []

    def listen(now, done, total, note=""):
        if now == stage and not killed and done > 0.4 * total:
            killed.append(done)
            kill_one(address)

    assert learn(photos, tmp_path / "run", cluster=address, progress=listen) == serial
    assert len(killed) == 1


# ---------------------------------------------------------------- the pieces


def slow(n):
    time.sleep(0.02)
    return n, os.getpid()


def test_mapping_keeps_order_over_several_processes(address):
    here, seen = os.getpid(), []
    with cluster.using(address):
        found = list(map_ordered(slow, range(12), jobs=2, progress=lambda *a: seen.append(a[1])))
    assert [n for n, _ in found] == list(range(12)) == [n - 1 for n in seen]
    assert here not in {pid for _, pid in found}
    assert cluster.current() is None


def wrong(n):
    raise InputError("unusable", where=str(n))


def test_failures_come_back_as_they_are(address):
    with cluster.using(address), pytest.raises(InputError, match="3: unusable"):
        list(map_ordered(wrong, [3, 4], jobs=2))


def test_moments_are_the_same_bytes(address):
    rows = np.random.default_rng(1).normal(size=(10_000, 20)).astype(np.float32)
    alone = moments(rows)
    with cluster.using(address):
        shared = moments(rows)
    assert shared.samples == alone.samples
    assert shared.mean.tobytes() == alone.mean.tobytes()
    assert shared.covariance.tobytes() == alone.covariance.tobytes()


@pytest.mark.parametrize("group", [1, 2, 32])
def test_passes_are_the_same_bytes_for_any_cut_into_blocks(address, monkeypatch, group):
    """Also where whole groups of tasks are summed on a worker."""
    r = np.random.default_rng(2)
    data, W = r.laplace(size=(70_000, 6)).astype(np.float32), r.normal(size=(6, 6))
    monkeypatch.setattr(likelihood, "GROUP", group)
    alone = Likelihood(Rows(data), np.ones(6))(W)
    lazy = Rows(data, r.permutation(70_000)[:60_000], r.normal(size=(6, 6)), r.normal(size=6))
    sorted_out = Likelihood(lazy, np.ones(6))(W)
    with cluster.using(address):
        shared = Likelihood(Rows(data), np.ones(6))(W)
        far = Likelihood(lazy, np.ones(6))(W)
    for a, b in ((alone, shared), (sorted_out, far)):
        assert a.value == b.value
        assert a.score.tobytes() == b.score.tobytes()


def test_blocks_that_die_with_their_worker_are_sent_again(address):
    data = np.random.default_rng(3).laplace(size=(40_000, 5)).astype(np.float32)
    known = Likelihood(Rows(data), np.ones(5))
    alone = known(np.eye(5)).value
    with cluster.using(address):
        assert known(np.eye(5)).value == alone
        held = cluster.current()._held[known.rows]
        before, client = [f.key for f in held.futures], cluster.current()._client
        ((holder, *_),) = client.who_has(held.futures[:1]).values()
        os.kill(client.run(os.getpid, workers=[holder])[holder], signal.SIGKILL)
        assert known(np.eye(5)).value == alone
        assert [f.key for f in held.futures] != before
        del held, known
        gc.collect()
        assert len(cluster.current()._held) == 0


# ---------------------------------------------------------------- addresses


def test_a_local_cluster_is_started_and_ended():
    with cluster.using("local", 2):
        assert cluster.current().workers == 2
        found = list(map_ordered(slow, range(4), jobs=2))
        known = {pid for _, pid in found}
    assert [n for n, _ in found] == list(range(4))
    deadline = time.monotonic() + 20
    while any(os.path.exists(f"/proc/{pid}/exe") for pid in known) and time.monotonic() < deadline:
        time.sleep(0.05)
    assert not any(os.path.exists(f"/proc/{pid}/exe") for pid in known)


def test_other_words_are_refused():
    with pytest.raises(UsageError, match="neither local nor an address"), cluster.using("here"):
        pass


def test_nobody_there(monkeypatch):
    monkeypatch.setattr(cluster, "SILENCE", "1s")
    with (
        pytest.raises(UsageError, match="nobody answers"),
        cluster.using("tcp://127.0.0.1:9"),
    ):
        pass


def test_without_dask_it_says_what_to_install(monkeypatch):
    monkeypatch.setitem(__import__("sys").modules, "distributed", None)
    with pytest.raises(UsageError, match=r"patchlab-bank\[cluster\]"), cluster.using("local"):
        pass


def test_the_command(photos, serial, address, tmp_path, capsys):
    words = ["learn", str(photos), "-o", str(tmp_path / "run"), "-q", "--cluster", address]
    for name, value in OPTIONS.items():
        words += [f"--{name.replace('_', '-')}", str(value)]
    with pytest.raises(SystemExit) as end:
        main(words)
    assert end.value.code == 0
    ours = (tmp_path / "run" / "dictionary" / "manifest.json").read_bytes()
    assert ours == serial["dictionary/manifest.json"]
