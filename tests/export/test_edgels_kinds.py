"""Edgels of the compiled code are those of Python: the same elements, in the same places."""

from dataclasses import replace
from functools import cache

import numpy as np
import pytest
from scipy import ndimage

from patchlab import edges, export
from patchlab.bank.native import NativeBank
from patchlab.bank.plan import make_plan
from patchlab.export.edgel_vectors import SAME_PX
from patchlab.pipeline.edgel_rules import edgel_rules
from patchlab.store import sha256
from patchlab.types import InputContract, InputTable
from tests.bank.banks import lattice_bank, random_bank
from tests.edges.conftest import build_bank, root_table
from tests.export.folders import scene

OPEN = 1e-4
"""How far roundings may move a place that is not known to a pixel, in its standard errors."""
SMOOTH = np.convolve([1, 2, 1], [1, 2, 1]) / 6
SCALES = ((1.1, 1.6), (1.8, 2.4))
OCTAVES = ((2.4, 3.2), (4.8, 6.4))


def srgb_table():
    """A table that bends the other way, with codes that stand for no light at either end."""
    values = np.clip(20 * np.sqrt(np.arange(256.0)), 40, 300).astype(np.float32)
    return InputTable("stabilised", InputContract("Mono8", 10, 240, "srgb"), values, 1.0)


BOTH = {"parities": ("odd", "even"), "table": root_table()}
BLUR = {"blur_sigma_px": 0.75}

# name: bank, threshold, what is looked for
BANKS = {
    "steps_and_lines": (replace(build_bank(SCALES, **BOTH), provenance=BLUR), 5.0,
                        (None, "step", "line", "both")),
    "unknown_blur": (build_bank(SCALES, **BOTH), 5.0, ("both",)),
    "lines": (build_bank(SCALES, **BOTH, strength="line"), 5.0, (None,)),
    "energy": (build_bank(SCALES, **BOTH, strength="energy"), 5.0, (None,)),
    "coloured_noise": (build_bank(SCALES, table=root_table(),
                                  autocovariance=np.outer(SMOOTH, SMOOTH)), 6.0, (None,)),
    "srgb": (build_bank(SCALES, table=srgb_table()), 5.0, (None,)),
    "float": (build_bank(SCALES), 0.03, (None,)),
    "mono12": (lattice_bank(families=("gd1", "gd2"), count=6, size=9, pixels="Mono12",
                            kind="stabilised", border="wrap"), 10.0, ("both",)),
    "octaves": (replace(build_bank(SCALES + OCTAVES, 4, **BOTH), provenance=BLUR, octaves=2), 5.0,
                (None, "line", "both")),
}  # fmt: skip


def compiled(bank, flags=("-O1",)):
    plan = make_plan(bank)
    library = export.compile_library(
        export.emit(bank, plan, edgel_rules(bank)), bank.name, flags=flags
    )
    return NativeBank(bank, plan, library, sha256(library))


@cache
def compiled_case(name):
    bank, threshold, kinds = BANKS[name]
    bank = replace(bank, name=name)
    return bank, compiled(bank), threshold, kinds


@pytest.fixture(params=BANKS)
def case(request):
    return compiled_case(request.param)


def both_edgels(bank, native, pixels, what, threshold):
    """The compiled edgels, and Python's on the compiled responses."""
    found = edges.find(
        bank, pixels, native.responses, what=what, threshold=threshold,
        blur_px=bank.provenance.get("blur_sigma_px"),
    )  # fmt: skip
    levels = edges.levels_of(bank, what, None, threshold)
    own = levels.get(bank.strength, (0.0, 0.0))[0]
    lines = levels.get("line", (0.0, 0.0))[0] if bank.strength == "step" else 0.0
    return native.edgels(pixels, own, lines), found.edgels


def assert_same(got, want, least=1):
    """The same elements; places the same but for roundings, which count in proportion to what
    is known of a place: in noise the pixels may leave it open by thousands of pixels."""
    assert len(got) == len(want) >= least
    for word in ("scale", "kind", "strength"):
        np.testing.assert_array_equal(got[word], want[word])
    x, y = want["x"].astype(float), want["y"].astype(float)
    rounding = np.spacing(np.maximum(np.abs(want["x"]), np.abs(want["y"])))
    far = np.hypot(got["x"] - x, got["y"] - y) - 1.5 * rounding
    assert (far <= np.maximum(SAME_PX, OPEN * want["sd"])).all()
    np.testing.assert_allclose(got["sd"], want["sd"], rtol=0.05, atol=1e-6)
    sure = want["sd"] < 1
    assert (far[sure] <= SAME_PX).all()
    got, want = got[sure], want[sure]
    np.testing.assert_allclose(got["sd"], want["sd"], rtol=1e-4, atol=1e-6)
    np.testing.assert_allclose(got["width"], want["width"], rtol=1e-4, atol=2e-2)
    turn = (got["theta"].astype(float) - want["theta"] + 1) % np.pi - 1
    assert np.abs(turn).max(initial=0.0) < 1e-5


def noise(bank, shape, seed=0):
    """Noise about a middle grey, a few of its standard deviations apart from code to code."""
    form = bank.contract.format
    size = np.random.default_rng(seed).normal(0.4, 0.1, shape) * form.full_scale
    return (np.rint(np.clip(size, 0, form.full_scale)) if form.integer else size).astype(form.dtype)


def drawn(bank, shape):
    """The scene with dark bars."""
    y, x = np.mgrid[: shape[0], : shape[1]]
    pixels = scene(bank, shape)
    return np.where((2 * x - y) % 67 < 4, 0.75 * pixels, pixels).astype(pixels.dtype)


def softened(bank, shape, sigma=5.0):
    """The scene with a soft copy of itself."""
    pixels = scene(bank, shape)
    soft = ndimage.gaussian_filter(pixels.astype(float), sigma)
    return ((pixels + soft) / 2).astype(pixels.dtype)


def test_a_scene_has_the_same_edgels(case):
    bank, native, threshold, kinds = case
    for what in kinds:
        got, want = both_edgels(bank, native, drawn(bank, (110, 161)), what, threshold)
        assert_same(got, want, 100)
        if what == "both":
            assert len(set(got["kind"])) == 3


@pytest.mark.parametrize("extra", [(0, 0), (1, 0), (2, 5)])
def test_small_pictures_of_odd_sides(case, extra):
    bank, native, threshold, kinds = case
    shape = bank.size + extra[0], bank.size + extra[1]
    for what in kinds:
        got, want = both_edgels(bank, native, drawn(bank, shape), what, threshold / 3)
        assert_same(got, want, 0)


def test_noise_has_the_same_edgels(case):
    bank, native, threshold, kinds = case
    got, want = both_edgels(bank, native, noise(bank, (131, 140)), kinds[-1], threshold)
    assert_same(got, want, 20)


def test_soft_edges_are_left_to_the_same_octaves():
    bank, native, threshold, _ = compiled_case("octaves")
    got, want = both_edgels(bank, native, softened(bank, (140, 203)), None, threshold)
    assert_same(got, want, 100)
    assert set(got["scale"][got["sd"] > 0]) >= {0, 2}
    _, other = both_edgels(
        replace(bank, octaves=0), native, softened(bank, (140, 203)), None, threshold
    )
    assert len(other) != len(got)  # the octaves' rules change what is found


@pytest.mark.parametrize("lanes", [1, 4, 8])
def test_every_instruction_set_places_alike(lanes):
    bank, threshold, _ = BANKS["steps_and_lines"]
    native = compiled(bank, ("-O1", f"-D{bank.name}_MAX_LANES={lanes}"))
    got, want = both_edgels(bank, native, drawn(bank, (60, 83)), "both", threshold)
    assert_same(got, want, 50)


def test_banks_without_a_model_of_edges_have_no_edgels():
    assert edgel_rules(random_bank(3, 5)) is None
    native = compiled(random_bank(3, 5))
    assert native.has_edgels is False
