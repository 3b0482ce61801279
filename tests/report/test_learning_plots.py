"""The plot of convergence says how learning ended."""

import warnings
from dataclasses import replace

import numpy as np
import pytest

from patchlab.learn import learn_ica, whiten
from patchlab.report import plots
from patchlab.types import PatchSet


@pytest.fixture(scope="module")
def learned():
    r = np.random.default_rng(0)
    rows = r.laplace(size=(600, 5)) @ r.normal(size=(5, 16))
    rows -= rows.mean(axis=1, keepdims=True)
    none, one = np.zeros(600, np.int32), np.ones(600, np.float32)
    patches = PatchSet(
        rows.astype(np.float32), 4, none, np.zeros((600, 2), np.int32), one, one, ("made",), {}
    )
    return learn_ica(patches, whiten(patches, rank=5), restarts=1)


@pytest.mark.parametrize(
    "change",
    [
        {},
        {"stopped_at": 5, "converged": False},
        {"stopped_at": 0, "converged": False, "curve": np.array([3.0])},
        {"held_out_curve": np.empty((0, 2))},
        {"held_out_curve": np.array([[0.0, -4.0]])},
    ],
)
def test_every_ending_is_drawn_without_a_warning(learned, change):
    with warnings.catch_warnings():
        warnings.simplefilter("error")
        drawn = plots.convergence(replace(learned, **change))
    assert drawn.startswith(b"\x89PNG")
    assert (drawn == plots.convergence(learned)) == (not change)
