"""The in-process engine against the oracle, and the packages it must do without."""

from __future__ import annotations

import subprocess
import sys
import textwrap

import numpy as np
import pytest

from patchlab.bank import apply, reference
from patchlab.bank.plan import make_plan
from patchlab.conventions import BORDERS
from patchlab.errors import InputError, UsageError
from tests.bank.banks import given_bank, lattice_bank, picture, random_bank

FORMATS = [
    ("Mono8", "identity"),
    ("Mono10", "stabilised"),
    ("Mono12", "stabilised"),
    ("Mono16", "identity"),
    ("float32", "identity"),
    ("float32", "stabilised"),
]


def worst(bank, plan, pixels):
    """Largest error over its bound."""
    found = apply.responses(bank, pixels, plan)
    assert found.dtype == np.float32
    error = np.abs(found - reference.responses(bank, pixels)).max(axis=(1, 2))
    return (error / np.array(plan.error_bound)).max()


@pytest.mark.parametrize("kind", ["direct", "parity"])
@pytest.mark.parametrize(("pixels", "table"), FORMATS)
def test_within_the_bound_for_every_format(pixels, table, kind):
    for bank in (
        lattice_bank(count=4, size=9, pixels=pixels, kind=table),
        random_bank(3, 5, pixels=pixels, kind=table),
    ):
        share = worst(bank, make_plan(bank, kind), picture((23, 31), pixels))
        assert 0 < share < 1


@pytest.mark.parametrize("kind", ["direct", "parity"])
@pytest.mark.parametrize("border", BORDERS)
@pytest.mark.parametrize("shape", [(5, 5), (6, 5), (5, 6), (6, 40)])
def test_every_border_and_smallest_sizes(border, shape, kind):
    bank = random_bank(2, 5, border=border)
    assert worst(bank, make_plan(bank, kind), picture(shape)) < 1


@pytest.mark.parametrize("border", BORDERS)
def test_impulses_in_the_corners(border):
    bank = given_bank([np.arange(1.0, 10.0).reshape(3, 3)], border=border)
    for at in [(0, 0), (0, 8), (6, 0), (6, 8)]:
        pixels = np.zeros((7, 9), dtype=np.uint8)
        pixels[at] = 1
        np.testing.assert_array_equal(
            apply.responses(bank, pixels), reference.responses(bank, pixels)
        )


@pytest.mark.parametrize("kind", ["direct", "parity"])
def test_the_worst_picture_for_a_kernel_stays_within_the_bound(kind):
    # black and white where the taps are negative and positive: the largest sum|k x|
    bank = random_bank(1, 7, border="zero")
    pixels = np.where(bank.taps[0] > 0, 255, 0).astype(np.uint8)
    assert 0 < worst(bank, make_plan(bank, kind), pixels) < 1


def test_parity_and_direct_agree_within_their_bounds():
    bank = lattice_bank()
    pixels = picture((40, 50))
    plans = [make_plan(bank, kind) for kind in ("parity", "direct")]
    a, b = (apply.responses(bank, pixels, plan) for plan in plans)
    room = sum(np.array(plan.error_bound) for plan in plans)
    assert (np.abs(a - b).max(axis=(1, 2)) <= room).all()


def test_mirrored_pictures_give_mirrored_responses_bit_for_bit():
    bank = lattice_bank(widths=((1.5, 2.5),))
    pixels = picture((30, 33))
    plain = apply.responses(bank, pixels)
    mirrored = apply.responses(bank, np.ascontiguousarray(pixels[:, ::-1]))[:, :, ::-1]
    for turn in range(1, 8):
        np.testing.assert_array_equal(plain[turn], mirrored[8 - turn])


@pytest.mark.parametrize("kind", ["direct", "parity"])
def test_the_size_of_a_band_does_not_reach_the_bits(kind, monkeypatch):
    bank = lattice_bank(count=4, size=7)
    plan = make_plan(bank, kind)
    pixels = picture((37, 29))
    whole = apply.responses(bank, pixels, plan)
    for band in (1, 29 * 2, 29 * 5):
        monkeypatch.setattr(apply, "BAND_PIXELS", band)
        np.testing.assert_array_equal(apply.responses(bank, pixels, plan), whole)


@pytest.mark.parametrize("strength", ["step", "line", "energy"])
def test_strength_is_made_of_the_responses(strength):
    bank = lattice_bank(families=("gd1", "gd2"), count=8, strength=strength)
    plan = make_plan(bank)
    pixels = picture((40, 41))
    for scale in (0, 1):
        found, turn = apply.strength(bank, pixels, scale)
        exact, _ = reference.strength(bank, pixels, scale)
        room = 2 * max(plan.error_bound)
        np.testing.assert_allclose(found, exact, rtol=3e-7, atol=room)
        planes = reference.responses(bank, pixels)
        members = plan.detail["strength"][scale]
        every = np.stack(
            [
                np.sqrt(sum(planes[i] ** 2 for i in (even, odd) if i is not None))
                for _, even, odd in members
            ]
        )
        chosen = np.take_along_axis(every, turn[None].astype(int), axis=0)[0]
        # the winner may differ where two directions are equal within the bound
        assert (exact - chosen <= 2 * room).all()


def test_among_equals_the_first_orientation_wins():
    bank = lattice_bank(count=4)
    _, turn = apply.strength(bank, np.full((20, 20), 7, np.uint8), 0)
    assert (turn == 0).all()


def test_a_flat_picture_of_one_kernel_without_dc():
    bank = lattice_bank()
    assert (apply.responses(bank, np.full((20, 20), 200, np.uint8)) == 0).all()


@pytest.mark.parametrize(
    ("pixels", "words"),
    [
        (np.zeros((30, 30), np.int16), "takes Mono8"),
        (np.zeros((30, 10), np.uint8), "smaller"),
        (np.zeros(30, np.uint8), "one plane"),
    ],
)
def test_pictures_that_do_not_fit_are_refused(pixels, words):
    with pytest.raises(InputError, match=words):
        apply.responses(lattice_bank(), pixels)
    with pytest.raises(InputError, match=words):
        apply.strength(lattice_bank(), pixels, 0)


def test_wrong_scales_are_refused():
    for scale in (-1, 2):
        with pytest.raises(UsageError, match="scale"):
            apply.strength(lattice_bank(), picture((20, 20)), scale)
    with pytest.raises(UsageError, match="scale"):
        apply.strength(random_bank(), picture((20, 20)), 0)


def test_a_zero_kernel_answers_zero():
    bank = given_bank([np.zeros((3, 3)), np.ones((3, 3))])
    found = apply.responses(bank, picture((9, 9)))
    assert (found[0] == 0).all()
    assert (found[1] > 0).all()


def test_a_bank_loads_and_runs_without_the_learner(tmp_path):
    from patchlab.bank.disk import write_bank

    bank = lattice_bank(count=4, size=7)
    write_bank(tmp_path / "bank", bank, make_plan(bank))
    np.save(tmp_path / "in.npy", picture((20, 21)))
    script = """
    import sys
    blocked = ("numba", "sklearn", "dask", "matplotlib", "click", "rich", "onnx", "skimage")
    class Block:
        def find_spec(self, name, path=None, target=None):
            if name.split(".")[0] in blocked:
                raise ImportError(name + " is blocked")
    sys.meta_path.insert(0, Block())
    import numpy as np
    from pathlib import Path
    from patchlab.bank.disk import read_bank
    from patchlab.bank import apply
    here = Path(sys.argv[1])
    bank, plan, _ = read_bank(here / "bank")
    np.save(here / "out.npy", apply.responses(bank, np.load(here / "in.npy"), plan))
    assert not set(blocked) & {name.split(".")[0] for name in sys.modules}
    """
    done = subprocess.run(
        [sys.executable, "-c", textwrap.dedent(script), str(tmp_path)],
        capture_output=True, text=True, timeout=120, check=False,
    )  # fmt: skip
    assert done.returncode == 0, done.stderr
    np.testing.assert_array_equal(
        np.load(tmp_path / "out.npy"), apply.responses(bank, picture((20, 21)))
    )
