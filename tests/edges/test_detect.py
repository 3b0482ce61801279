"""One picture in, edges out: the request, the contract, the promise on a grey ramp."""

import dataclasses
import math

import numpy as np
import pytest

from patchlab.edges import calibrate, detect, detect_edgels, match, strength_for, threshold_of
from patchlab.errors import InputError, UsageError
from patchlab.types import Thresholds

TABLE = Thresholds(
    rate=np.array([0.1, 1.0, 10.0, 100.0, 1000.0]),
    strength=np.array([6.03, 5.63, 5.2, 4.73, 4.21]),
    rice=np.ones(5),
    hysteresis=0.7,
    megapixels=12.0,
    noise="white",
)


@pytest.fixture
def camera(make_bank, stabilised, engine):
    """A Mono8 bank with thresholds, its engine, and photons to codes."""
    bank = dataclasses.replace(make_bank(table=stabilised(0.5, 1.5)), thresholds=TABLE)
    correlate = engine(bank)

    def expose(electrons, seed):
        g = np.random.default_rng(seed)
        signal = g.poisson(electrons) + 1.5 * g.standard_normal(electrons.shape)
        return np.clip(np.rint(0.5 * signal), 0, 255).astype(np.uint8)

    return bank, (lambda pixels: correlate(bank.table.apply(pixels))), expose


def test_a_request_becomes_a_threshold(camera):
    bank, _, _ = camera
    assert threshold_of(bank) == (pytest.approx(5.2), 0.7)
    assert threshold_of(bank, rate=100)[0] == pytest.approx(4.73)
    assert threshold_of(bank, threshold=3.3) == (3.3, 0.7)
    other = dataclasses.replace(TABLE, strength=TABLE.strength + 1, hysteresis=0.5)
    assert threshold_of(bank, thresholds=other) == (pytest.approx(6.2), 0.5)


def test_requests_that_cannot_be_met(camera):
    bank, respond, _ = camera
    with pytest.raises(UsageError, match="not both"):
        threshold_of(bank, rate=1, threshold=4)
    with pytest.raises(UsageError, match="outside this bank"):
        threshold_of(bank, rate=1e5)
    with pytest.raises(UsageError, match="must be positive"):
        threshold_of(bank, threshold=-1)
    with pytest.raises(UsageError, match="this bank has no thresholds") as refused:
        threshold_of(dataclasses.replace(bank, thresholds=None))
    assert "noise" not in refused.value.what  # a bank as learned lacks them for another reason
    for value in (np.inf, np.nan):
        with pytest.raises(UsageError, match="must be positive and finite"):
            threshold_of(bank, threshold=value)
        with pytest.raises(UsageError, match="must be a finite number"):
            threshold_of(bank, rate=value)
    with pytest.raises(InputError, match="too small"):
        detect(bank, np.zeros((5, 40), np.uint8), respond)
    with pytest.raises(InputError, match="takes Mono8"):
        detect(bank, np.zeros((64, 64), np.uint16), respond)
    with pytest.raises(UsageError, match="engine answered"):
        detect(bank, np.zeros((64, 64), np.uint8), lambda p: np.zeros((2, 64, 64), np.float32))


def test_a_photographed_step_is_found_where_it_is(camera, step):
    bank, respond, expose = camera
    theta, x0, y0 = 0.6, 60.4, 58.7
    pixels = expose(60 + step((120, 120), x0, y0, theta, 300.0, 0.9), 3)
    found, got = detect_edgels(bank, pixels, respond, rate=1, blur_px=0.9)
    assert found.threshold == pytest.approx(5.63)
    assert got.size == found.edges.sum()
    along = np.arange(-50.0, 51)
    truth = np.column_stack([x0 - along * math.sin(theta), y0 + along * math.cos(theta)])
    near = (np.abs(truth - 59.5) < 52).all(axis=1)
    scored = match(np.column_stack([got["x"], got["y"]]), truth[near])
    assert scored.recall > 0.97
    across = (got["x"] - x0) * math.cos(theta) + (got["y"] - y0) * math.sin(theta)
    assert np.median(np.abs(across)) < 0.05
    assert np.abs(across).max() < 0.3
    same = detect(bank, pixels, respond, rate=1)
    np.testing.assert_array_equal(same.edges, found.edges)


def test_false_edges_on_a_grey_ramp_keep_their_promise(camera):
    # codes with photon and read noise: the table makes the noise one at every level
    bank, respond, expose = camera
    table = calibrate(bank, megapixels=6, rates=(100, 1000))
    counts, area = [], 0.0
    for seed, level in enumerate((60, 150, 240, 330, 400)):
        pixels = expose(np.full((448, 448), float(level)), seed)
        found = detect(bank, pixels, respond, rate=1000, thresholds=table)
        r = bank.radius
        counts.append(found.edges[r:-r, r:-r].sum())
        area = (448 - 2 * r) ** 2 / 1e6
    rate = np.array(counts) / area
    assert rate.mean() == pytest.approx(1000, rel=0.3)
    # elements come in groups of about seven, so counts scatter by more than Poisson
    assert (np.abs(rate - 1000) < 4 * math.sqrt(10 * 1000 / area)).all()


def test_more_false_edges_are_allowed_at_a_lower_threshold(camera, step):
    bank, respond, expose = camera
    pixels = expose(60 + step((200, 200), 100.0, 100.0, 1.0, 25.0, 0.9), 8)
    sizes = [detect(bank, pixels, respond, rate=r).edges.sum() for r in (0.1, 10, 1000)]
    assert sizes[0] < sizes[1] < sizes[2]
    assert strength_for(TABLE, 0.1) > strength_for(TABLE, 1000)


def test_invalid_pixels_reach_the_chain(camera, step):
    bank, respond, expose = camera
    pixels = expose(60 + step((120, 120), 60.0, 60.0, 0.0, 300.0, 0.9), 4)
    invalid = np.zeros(pixels.shape, bool)
    invalid[:60] = True
    found, got = detect_edgels(bank, pixels, respond, invalid=invalid)
    assert found.edges.any()
    assert got["y"].min() > 60
