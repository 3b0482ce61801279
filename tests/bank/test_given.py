"""Banks of given kernels: taken as they are, or refused with one sentence."""

from __future__ import annotations

import numpy as np
import pytest

from patchlab.bank.given import bank_as_learned, bank_from_taps
from patchlab.bank.plan import strength_members
from patchlab.errors import InputError, UsageError
from patchlab.families import noise_gain
from patchlab.types import KernelFit, KernelFits

SOBEL = np.outer([1, 2, 1], [-1, 0, 1])


@pytest.mark.parametrize("dtype", ["int8", "uint8", "int64", "float16", "float32", "float64"])
def test_taps_of_any_real_type_are_used_as_they_are(dtype):
    taps = np.abs(SOBEL) if dtype == "uint8" else SOBEL
    bank = bank_from_taps(taps.astype(dtype), "Mono8", "mine")
    np.testing.assert_array_equal(bank.taps, taps[None].astype(np.float32))
    assert bank.taps.dtype == np.float32
    assert bank.purpose == "taps"


@pytest.mark.parametrize("pixels", ["Mono8", "Mono10", "Mono12", "Mono16", "float32"])
def test_the_table_leaves_codes_alone(pixels):
    bank = bank_from_taps(SOBEL, pixels)
    form = bank.contract.format
    codes = np.array([0, 1, form.full_scale], dtype=form.dtype)
    np.testing.assert_array_equal(bank.table.apply(codes), codes.astype(np.float32))
    assert bank.table.noise_sd is None
    assert bank.contract.white == form.full_scale


def test_every_kernel_counts_in_the_strength():
    bank = bank_from_taps(np.random.default_rng(0).standard_normal((3, 5, 5)), "Mono8")
    assert bank.scales == (0,)
    assert strength_members(bank, 0) == ((0, None, 0), (1, None, 1), (2, None, 2))
    assert [k.name for k in bank.kernels] == ["kernel_0", "kernel_1", "kernel_2"]


def test_beyond_256_kernels_the_rest_stays_out_of_the_strength_and_this_is_said():
    bank = bank_from_taps(np.random.default_rng(0).standard_normal((258, 3, 3)), "Mono8")
    assert len(strength_members(bank, 0)) == 256
    assert "first 256 of 258" in bank.warnings[0]


def test_gain_is_the_response_to_an_impulse():
    assert bank_from_taps(-SOBEL, "Mono8").kernels[0].gain == 2.0
    assert bank_from_taps([[0, 0, 0], [0, -5, 0], [0, 0, 1]], "Mono8").kernels[0].gain == -5.0


NAN, HUGE = SOBEL.astype(float), SOBEL.astype(float)
NAN[0, 0], HUGE[0, 0] = np.nan, 1e300


@pytest.mark.parametrize(
    ("taps", "says"),
    [
        (NAN, "not a finite number"),
        (HUGE, "too large for float32"),
        (np.ones((2, 4, 4)), "even side 4.*5 x 5"),
        (np.ones((1, 3, 5)), "3 x 5 are not square"),
        (np.ones((0, 3, 3)), "no taps"),
        (np.ones((1, 65, 65)), "65 are beyond the limit of 63"),
        (np.ones(9), "are not kernels"),
        (np.ones((1, 1, 3, 3)), "are not kernels"),
        (SOBEL * 1j, "not real numbers"),
        (np.array([["a"]]), "not real numbers"),
        ([SOBEL, np.zeros((5, 5))], "one size"),
        ([SOBEL, 0 * SOBEL], "kernel 1 is zero everywhere"),
        (np.ones((4097, 1, 1)), "4097 kernels are beyond"),
    ],
)
def test_unusable_taps_are_refused_with_one_sentence(taps, says):
    with pytest.raises(InputError, match=says) as caught:
        bank_from_taps(taps, "Mono8", where="my.npy")
    assert str(caught.value).startswith("my.npy: ")
    assert "\n" not in str(caught.value)


@pytest.mark.parametrize(
    "wrong",
    [
        {"pixels": "Mono9"},
        {"border": "reflect"},
        {"name": "3d"},
        {"name": "int"},
        {"name": "a-b"},
        {"name": "x" * 49},
        {"name": "naïve"},
        {"name": ""},
        {"black": 300.0},
        {"white": -1.0},
    ],
)
def test_wrong_parameters_are_usage_errors(wrong):
    with pytest.raises(UsageError):
        bank_from_taps(SOBEL, **{"pixels": "Mono8", **wrong})


# ---------------------------------------------------------------- as learned


@pytest.mark.parametrize(("size", "side", "offset"), [(12, 13, -0.5), (11, 11, 0.0)])
def test_learned_filters_keep_their_place(stand, size, side, offset):
    atoms = stand.edge_atoms(1, 10, size=size)
    bank = bank_as_learned(stand.dictionary(atoms, basis=atoms), stand.survey())
    assert bank.size == side
    window = bank.taps[:, :size, :size].astype(float)
    for k, atom in zip(window, atoms, strict=True):
        assert k.ravel() @ atom.ravel() / np.linalg.norm(k) == pytest.approx(1, abs=1e-6)
    if side > size:
        assert not bank.taps[:, -1].any()
        assert not bank.taps[:, :, -1].any()
    assert {k.parameters["x_px"] for k in bank.kernels} == {offset}


def test_learned_filters_have_no_dc_and_unit_noise_gain(stand):
    atoms = stand.edge_atoms(2, 12) + 0.3
    smooth = np.array([0.25, 0.5, 0.25])
    r = np.convolve(smooth, smooth) / (smooth @ smooth)
    around = stand.survey(autocovariance=np.outer(r, r))
    bank = bank_as_learned(stand.dictionary(atoms, basis=atoms), around)
    for k in bank.taps.astype(float):
        assert k.sum() == 0
        assert noise_gain(k, np.outer(r, r)) == pytest.approx(1, abs=1e-6)


def test_without_noise_learned_filters_have_unit_norm_and_say_so(stand):
    atoms = stand.edge_atoms(3, 5)
    bank = bank_as_learned(
        stand.dictionary(atoms, basis=atoms), stand.survey(measurable=False), "raw"
    )
    np.testing.assert_allclose(np.linalg.norm(bank.taps, axis=(1, 2)), 1, atol=1e-6)
    assert any("noise is not known" in w for w in bank.warnings)


def test_fits_of_filters_go_with_them(stand):
    atoms = stand.edge_atoms(4, 2)
    one = KernelFit(0, "gd1", {"amplitude": 2.0, "x_px": 1.0, "theta_rad": 0.5}, {}, 0.9, 0.0,
                    "good", None, None)  # fmt: skip
    fits = KernelFits("filters", 12, (one, one), 144.0)
    dictionary = stand.dictionary(atoms, basis=atoms)
    kernel = bank_as_learned(dictionary, stand.survey(), fits=fits).kernels[0]
    assert kernel.parameters == {"x_px": 0.5, "y_px": -0.5, "theta_rad": 0.5}
    assert kernel.r2 == 0.9
    with pytest.raises(UsageError, match="not of this dictionary"):
        bank_as_learned(dictionary, stand.survey(), fits=stand.good_fits(2))
