"""Mapping over frames keeps order for any number of workers."""

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
