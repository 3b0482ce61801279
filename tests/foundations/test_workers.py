"""Mapping over frames keeps order for any number of workers."""

import os
import subprocess
import sys
import time
from pathlib import Path

import numpy as np

from patchlab.workers import map_ordered


def square(n):
    return n * n


def total(n):
    return float(np.random.default_rng(n).normal(size=(200, 200)).sum())


def test_order_and_results_do_not_depend_on_workers():
    seen = []
    serial = list(map_ordered(square, range(7), stage="s", progress=lambda *a: seen.append(a[1])))
    assert serial == [n * n for n in range(7)]
    assert seen == [1, 2, 3, 4, 5, 6, 7]
    assert list(map_ordered(total, range(5), jobs=2)) == list(map_ordered(total, range(5)))


def sleepy(seconds):
    time.sleep(seconds)
    return os.getpid()


PARENT = """
import sys
sys.path.insert(0, {here!r})
from test_workers import sleepy
from patchlab.workers import map_ordered
if __name__ == "__main__":
    for pid in map_ordered(sleepy, [0.3, 0.3, 60, 60], jobs=2):
        print(pid, flush=True)
"""


def alive(pid):
    """Whether a process runs; one that has ended and is not yet collected does not."""
    try:
        return Path(f"/proc/{pid}/stat").read_text().rsplit(")", 1)[1].split()[0] != "Z"
    except OSError:
        return False


def test_workers_end_when_their_parent_is_killed(tmp_path):
    script = tmp_path / "parent.py"
    script.write_text(PARENT.format(here=str(Path(__file__).parent)))
    parent = subprocess.Popen([sys.executable, script], stdout=subprocess.PIPE, text=True)
    workers = {int(parent.stdout.readline()) for _ in range(2)}
    assert all(map(alive, workers))
    parent.kill()
    parent.wait()
    parent.stdout.close()
    deadline = time.monotonic() + 20
    while any(map(alive, workers)) and time.monotonic() < deadline:
        time.sleep(0.05)
    assert not any(map(alive, workers))
