"""Lines as well as steps: their own promise, their middle and width, and no flanks."""

import dataclasses
import math

import numpy as np
import pytest
from scipy.special import ndtr

from patchlab.edges import calibrate, find, strength_for
from patchlab.edges.threshold import count_on_noise
from patchlab.errors import UsageError
from patchlab.types import InputContract, InputTable, Thresholds

TABLE = InputTable("identity", InputContract("float32", 0.0, 100.0), None, 1.0)
SCALES = ((1.2, 1.5), (2.2, 2.7))


@pytest.fixture(scope="module")
def bank():
    from tests.edges.conftest import build_bank

    made = build_bank(scales=SCALES, parities=("odd", "even"), table=TABLE)
    steps = calibrate(made, megapixels=1, rates=(10, 100, 1000))
    lines = calibrate(made, kind="line", megapixels=2, rates=(10, 100, 1000))
    return dataclasses.replace(made, thresholds=steps, line_thresholds=lines)


def bar(theta, offset, width, height, blur=0.8, shape=(96, 96)):
    """A bar blurred by a Gaussian."""
    y, x = np.mgrid[: shape[0], : shape[1]] - 47.5
    d = x * math.cos(theta) + y * math.sin(theta) - offset
    return 50 + height * (ndtr((d + width / 2) / blur) - ndtr((d - width / 2) / blur))


def shot(clean, seed):
    g = np.random.default_rng(seed)
    return (clean + g.standard_normal(clean.shape)).astype(np.float32)


def across(found, theta, offset):
    x, y = found["x"] - 47.5, found["y"] - 47.5
    return x * math.cos(theta) + y * math.sin(theta) - offset


def test_lines_keep_a_promise_of_their_own(bank):
    assert strength_for(bank.line_thresholds, 100) != strength_for(bank.thresholds, 100)
    level = [strength_for(bank.line_thresholds, 1000)]
    counts = count_on_noise(bank, level=level, kind="line", megapixels=2, seed=77, key="fresh")
    # about five elements a group: relative sd of the count is about 5 %
    assert counts.elements[0] / counts.megapixels == pytest.approx(1000, rel=0.2)


@pytest.mark.parametrize(("height", "kind"), [(30.0, 1), (-30.0, 2)])
@pytest.mark.parametrize("width", [1.0, 2.5])
def test_a_wire_is_one_line_at_its_middle_with_its_width(bank, engine, height, kind, width):
    theta, offset = 0.5, 0.37
    pixels = shot(bar(theta, offset, width, height), 4)
    found = find(bank, pixels, engine(bank), what="both", rate=10, blur_px=0.8)
    assert set(found.maps) == {"step", "line"}
    d = across(found.edgels, theta, offset)
    assert (found.edgels["kind"] == kind).mean() > 0.95
    assert 75 < found.edgels.size < 120  # one a pixel of its length, which is 100 or so
    middle = found.edgels["kind"] == kind
    assert np.abs(np.median(d[middle])) < 0.03
    assert np.sqrt((d[middle] ** 2).mean()) < 0.25
    assert np.median(found.edgels["width"][middle]) == pytest.approx(width, abs=0.5)


def test_side_lobes_are_no_lines(bank, engine):
    pixels = shot(bar(1.1, 0.0, 1.5, 60.0), 5)
    found = find(bank, pixels, engine(bank), what="line", rate=10, blur_px=0.8)
    assert np.abs(across(found.edgels, 1.1, 0.0)).max() < 1.5
    assert (found.edgels["kind"] == 1).all()


def test_a_step_is_no_line_and_a_wire_no_step(bank, engine, step):
    edge = shot(50 + step((96, 96), 47.5, 47.5, 0.8, 30.0, 0.8), 6)
    respond = engine(bank)
    assert find(bank, edge, respond, what="line", rate=10).edgels.size < 4
    both = find(bank, edge, respond, what="both", rate=10, blur_px=0.8)
    steps = find(bank, edge, respond, what="step", rate=10, blur_px=0.8)
    assert (both.edgels["kind"] == 0).all()
    assert both.edgels.size > 0.95 * steps.edgels.size
    assert (both.edgels["width"] == 0).all()
    np.testing.assert_array_equal(both.shown.edges, both.maps["step"].edges)
    wire = shot(bar(0.8, 0.0, 1.0, 30.0), 7)
    flanks = find(bank, wire, respond, what="step", rate=10).edgels.size
    assert flanks > 100  # alone, steps are found on both sides
    assert (find(bank, wire, respond, what="both", rate=10).edgels["kind"] != 0).mean() > 0.95


def test_a_wide_bar_is_two_steps(bank, engine):
    pixels = shot(bar(0.3, 0.0, 14.0, 30.0), 8)
    found = find(bank, pixels, engine(bank), what="both", rate=10, blur_px=0.8).edgels
    assert (found["kind"] == 0).mean() > 0.95
    assert np.abs(np.abs(across(found, 0.3, 0.0)) - 7.0).max() < 1.0


def test_asking_for_lines_of_a_bank_without_them_is_refused(make_bank, engine):
    alone = make_bank(scales=SCALES, table=TABLE)
    pixels = np.zeros((64, 64), np.float32)
    with pytest.raises(UsageError, match="no kernels that find line"):
        find(alone, pixels, engine(alone), what="both", threshold=5.0)
    paired = make_bank(scales=SCALES, parities=("odd", "even"), table=TABLE)
    steps = Thresholds(np.array([10.0, 1000.0]), np.array([5.2, 4.2]), np.ones(2), 0.6, 1, "white")
    known = dataclasses.replace(paired, thresholds=steps)
    with pytest.raises(UsageError, match="no thresholds for line"):
        find(known, pixels, engine(known), what="line", rate=100)
