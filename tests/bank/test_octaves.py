"""Octaves of an edge bank: the plain bank inside it, exact kernels, honest limits."""

from __future__ import annotations

import numpy as np
import pytest

from patchlab.bank import octaves
from patchlab.bank.choose import BankSettings, choose_bank
from patchlab.bank.disk import read_bank, write_bank
from patchlab.bank.plan import make_plan
from patchlab.errors import UsageError
from patchlab.families import noise_gain, render
from patchlab.settings import Settings
from tests.bank.banks import picture

COLOUR = np.array([[0.01, 0.1, 0.01], [0.1, 1, 0.1], [0.01, 0.1, 0.01]])


def chosen(stand, around=None, **settings):
    atoms = stand.edge_atoms(0)
    return choose_bank(
        stand.dictionary(atoms),
        stand.good_fits(80),
        around or stand.survey(),
        BankSettings(kernels=8, **settings),
    )


@pytest.fixture(scope="module")
def both(stand):
    return chosen(stand), chosen(stand, octaves=2)


def test_the_plain_bank_stands_in_it_unchanged(both):
    plain, more = both
    rim = (more.size - plain.size) // 2
    assert more.kernels[: len(plain)] == plain.kernels
    np.testing.assert_array_equal(
        more.taps[: len(plain)], np.pad(plain.taps, ((0, 0), (rim, rim), (rim, rim)))
    )
    assert (plain.octaves, more.octaves) == (0, 2)
    assert more.scales == (0, 1, 2)
    assert len({k.name for k in more.kernels}) == len(more) == 3 * len(plain)


def test_widths_double(both):
    _, more = both
    across = [more.kernels[more.members(s, "odd")[0]].parameters["sigma_u_px"] for s in more.scales]
    np.testing.assert_allclose(np.diff(np.log2(across)), 1, atol=2e-3)


def test_zeros_around_small_kernels_cost_nothing(both):
    plain, more = both
    alone, whole = make_plan(plain), make_plan(more)
    wide = [k for k in whole.groups if k not in alone.groups]
    assert len(wide) == len(whole.groups) - len(alone.groups)  # the plain groups are all there
    assert whole.multiplies > 8 * alone.multiplies  # and each octave takes about four times more


@pytest.mark.parametrize("colour", [None, COLOUR])
def test_octave_kernels_are_exact(stand, colour):
    around = stand.survey(autocovariance=colour)
    bank = chosen(stand, around, octaves=2)
    wide = [i for s in bank.scales[1:] for i in bank.members(s, "odd")]
    assert (bank.taps[wide].astype(np.float64).sum(axis=(1, 2)) == 0).all()
    gains = [bank.table.noise_sd * noise_gain(bank.taps[i], colour) for i in wide]
    np.testing.assert_allclose(gains, 1, rtol=2e-3)
    for scale in bank.scales[1:]:
        members = bank.members(scale, "odd")
        for j in range(1, len(members)):
            mirrored = bank.taps[members[len(members) - j]][:, ::-1]
            np.testing.assert_array_equal(bank.taps[members[j]], mirrored)


def test_the_narrowest_reach_cuts_a_thousandth_of_the_energy():
    sigma = octaves.SIDE // 2 / octaves.LEAST_REACH
    p = {"theta_rad": 0.3, "sigma_u_px": sigma / 1.2, "sigma_v_px": sigma}
    whole = render("gd1", p, 2 * octaves.SIDE + 1)
    c, r = octaves.SIDE, octaves.SIDE // 2
    inner = whole[c - r : c + r + 1, c - r : c + r + 1]
    assert 1 - (inner**2).sum() / (whole**2).sum() < 2e-3


def test_octaves_that_do_not_fit_are_left_out_with_a_warning(stand):
    bank = chosen(stand, octaves=2, widths=((4.1, 4.9),))
    assert bank.octaves == 1
    assert bank.size <= octaves.SIDE
    assert any("1 of 2 octaves fit" in w for w in bank.warnings)


def test_lines_have_octaves_too(stand):
    atoms = stand.edge_atoms(0)
    asked = BankSettings(kernels=16, lines=True, octaves=1)
    bank = choose_bank(stand.dictionary(atoms), stand.good_fits(80), stand.survey(), asked)
    assert [len(bank.members(s, "even")) for s in bank.scales] == [8, 8]


def test_a_bank_on_disk_keeps_its_octaves(both, tmp_path):
    _, more = both
    plan = make_plan(more)
    write_bank(tmp_path / "b", more, plan, {})
    again, _, head = read_bank(tmp_path / "b")
    assert again.octaves == head["octaves"] == 2
    np.testing.assert_array_equal(again.taps, more.taps)


@pytest.mark.parametrize(
    "settings",
    [
        {"octaves": 1, "purpose": "features"},
        {"octaves": 1, "as_learned": True},
        {"octaves": 4},
        {"octaves": -1},
    ],
)
def test_octaves_of_other_banks_are_refused(settings):
    with pytest.raises(UsageError, match="octaves"):
        Settings(**settings)
    if "as_learned" not in settings:
        with pytest.raises(UsageError, match="octaves"):
            BankSettings(**settings)


def test_a_picture_smaller_than_the_largest_kernel_is_refused_with_its_size(both):
    from patchlab.bank.apply import responses
    from patchlab.errors import InputError

    _, more = both
    small = picture((more.size - 1, more.size + 5), more.contract.pixels)
    with pytest.raises(InputError, match=str(more.size)):
        responses(more, small)
