"""Fixed point and invalid pixels through the bundle's runtime: the bits of every other target."""

from __future__ import annotations

import json

import numpy as np
import pytest
from scipy import ndimage

from patchlab import edges
from patchlab.bank import load_native, read_bank
from patchlab.export import patchlab_bank
from patchlab.export.patchlab_bank import BankError
from patchlab.pipeline import bundle
from patchlab.store import npy_bytes, sha256
from tests.bank.banks import picture
from tests.export.folders import BANKS, reseal, scene, write

FIXED = sorted(n for n, b in BANKS.items() if b.contract.format.bits <= 12)


@pytest.fixture(scope="module")
def folders(tmp_path_factory):
    root = tmp_path_factory.mktemp("banks")
    return {name: write(root / name, bank) for name, bank in BANKS.items()}


@pytest.mark.parametrize("name", FIXED)
def test_counts_are_the_same_bits_everywhere(folders, name):
    bank, plan, head = read_bank(folders[name])
    fixed = plan.detail["fixed"]
    pixels = picture((40, 33), bank.contract.pixels)
    expected, ends = fixed.counts(pixels)
    native = load_native(folders[name], bank, plan, head, bundle.own_library(bank))
    for library in (True, False):
        loaded = patchlab_bank.load(folders[name], library=library)
        np.testing.assert_array_equal(loaded.fixed.step, np.float32(fixed.step))
        for threads in (1, 3):
            counts, at_the_ends = loaded.responses_fixed(pixels, threads)
            assert counts.dtype == np.int16
            np.testing.assert_array_equal(counts, expected)
            assert at_the_ends == ends
        for place, scale in enumerate(loaded.scales):
            strength, turn = loaded.strengths(pixels, scale, fixed=True)
            wanted, winner = native.edges_q(pixels, place)
            np.testing.assert_array_equal(strength, wanted)
            np.testing.assert_array_equal(turn, winner)


@pytest.mark.parametrize("name", FIXED)
def test_counts_are_within_their_bound(folders, name):
    loaded = patchlab_bank.load(folders[name], library=False)
    pixels = picture((30, 35), BANKS[name].contract.pixels, 7)
    counts, _ = loaded.responses_fixed(pixels)
    exact = loaded.responses(pixels).astype(float)
    error = np.abs(loaded.fixed.step[:, None, None] * counts - exact).max(axis=(1, 2))
    assert (error <= loaded.fixed.error_bound + np.array(loaded.error_bound)).all()


def test_a_bank_of_floats_has_none(folders):
    name = next(n for n, b in BANKS.items() if not b.contract.format.integer)
    loaded = patchlab_bank.load(folders[name], library=False)
    pixels = picture((40, 40), "float32")
    assert loaded.fixed is None
    with pytest.raises(BankError, match="no fixed point"):
        loaded.responses_fixed(pixels)
    if loaded.scales:
        with pytest.raises(BankError, match="no fixed point"):
            loaded.strengths(pixels, loaded.scales[0], fixed=True)


def edge_bank(folders):
    for name, bank in BANKS.items():
        loaded = patchlab_bank.load(folders[name], library=False)
        if "edges.json" in loaded.manifest["files"] and bank.contract.format.integer:
            return bank, loaded
    raise AssertionError("no bank here finds edges")


def test_invalid_pixels_drop_the_elements_they_touch(folders):
    bank, loaded = edge_bank(folders)
    pixels = scene(bank)
    draw = np.random.default_rng(0)
    invalid = draw.random(pixels.shape) < 3e-3
    whole = loaded.edges(pixels, threshold=5.0)
    masked = loaded.edges(pixels, threshold=5.0, invalid=invalid)
    expected = edges.detect(bank, pixels, loaded.responses, threshold=5.0, invalid=invalid)
    np.testing.assert_array_equal(masked.edges, expected.edges)
    assert 0 < masked.edges.sum() < whole.edges.sum()
    near = ndimage.binary_dilation(invalid, np.ones((3, 3)))
    assert not (masked.edges & near).any()
    none = loaded.edges(pixels, threshold=5.0, invalid=np.zeros(pixels.shape, bool))
    np.testing.assert_array_equal(none.edges, whole.edges)


def test_a_wrong_mask_is_refused(folders):
    bank, loaded = edge_bank(folders)
    pixels = scene(bank)
    for wrong in (np.zeros((3, 3), bool), np.zeros(pixels.shape, np.uint8), [True]):
        with pytest.raises(BankError, match="invalid is"):
            loaded.edges(pixels, threshold=5.0, invalid=wrong)


def test_edges_in_fixed_point(folders):
    bank, loaded = edge_bank(folders)
    pixels = scene(bank)
    ours = loaded.edges(pixels, threshold=5.0, fixed=True)
    other = loaded.edges(pixels, threshold=5.0)
    assert ours.edges.sum() > 0
    assert (ours.edges == other.edges).mean() > 0.99


@pytest.mark.parametrize(
    ("file", "data", "words"),
    [
        ("fixed_kernels.npy", np.zeros((1, 3, 3), np.int32), "does not fit"),
        ("fixed_kernels.npy", np.zeros((1, 3, 3), np.float32), "whole numbers"),
        ("fixed_codes.npy", np.zeros(7, np.int16), "does not fit"),
    ],
)
def test_a_strange_fixed_point_is_refused(tmp_path, file, data, words):
    folder = write(tmp_path / "bank", BANKS[FIXED[0]])
    (folder / file).write_bytes(npy_bytes(data))

    def change(head):
        head["files"][file] = sha256(npy_bytes(data))

    reseal(folder, change)
    with pytest.raises(BankError, match=words):
        patchlab_bank.load(folder, library=False)


@pytest.mark.parametrize("shift", [[-1], [99], ["a"], None])
def test_strange_shifts_are_refused(tmp_path, shift):
    folder = write(tmp_path / "bank", BANKS[FIXED[0]])
    count = len(json.loads((folder / "bank.json").read_bytes())["kernels"])

    def change(head):
        head["fixed_point"]["shift"] = shift and shift * count

    reseal(folder, change)
    with pytest.raises(BankError):
        patchlab_bank.load(folder, library=False)
