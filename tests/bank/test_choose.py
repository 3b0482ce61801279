"""The chosen bank: its symmetry, its units, and how its sizes follow the camera."""

from __future__ import annotations

import math
import subprocess
import sys

import numpy as np
import pytest
from scipy.ndimage import correlate, gaussian_filter
from scipy.special import erf

from patchlab.bank import lattice, predict
from patchlab.bank.choose import BankSettings, choose_bank, choose_widths, compare_banks
from patchlab.bank.plan import strength_members
from patchlab.errors import UsageError
from patchlab.families import noise_gain, render
from patchlab.types import Bank


def chosen(stand, atoms=None, around=None, **settings):
    atoms = stand.edge_atoms(0) if atoms is None else atoms
    return choose_bank(
        stand.dictionary(atoms),
        stand.good_fits(80),
        around or stand.survey(),
        BankSettings(**settings),
    )


@pytest.fixture(scope="module")
def edges(stand):
    return chosen(stand, kernels=16)


@pytest.fixture(scope="module")
def features(stand):
    return chosen(stand, kernels=24, purpose="features")


@pytest.fixture(scope="module")
def lines(stand):
    return chosen(stand, kernels=24, lines=True)


@pytest.fixture(params=["edges", "features", "lines"])
def bank(request):
    return request.getfixturevalue(request.param)


# ---------------------------------------------------------------- the lattice


def test_mirrored_orientations_are_exact_mirror_images(bank):
    for scale in bank.scales:
        for parity in ("odd", "even"):
            members = bank.members(scale, parity)
            for j in range(1, len(members)):
                one, other = bank.taps[members[j]], bank.taps[members[len(members) - j]]
                np.testing.assert_array_equal(one, other[:, ::-1])


def test_parity_is_exact(bank):
    for kernel, taps in zip(bank.kernels, bank.taps, strict=True):
        sign = {"odd": -1, "even": 1}[kernel.parity]
        np.testing.assert_array_equal(taps, sign * taps[::-1, ::-1])


def test_axis_kernels_are_exactly_symmetric_about_both_axes(bank):
    for i, kernel in enumerate(bank.kernels):
        if kernel.orientation == 0:
            sign = {"odd": -1, "even": 1}[kernel.parity]
            np.testing.assert_array_equal(bank.taps[i], bank.taps[i][::-1])
            np.testing.assert_array_equal(bank.taps[i], sign * bank.taps[i][:, ::-1])


def test_a_quarter_turn_of_the_lattice_is_exact(edges):
    """theta to pi / 2 - theta exchanges x and y."""
    for scale in edges.scales:
        members = edges.members(scale, "odd")
        n = len(members)
        for j in range(n // 2 + 1):
            np.testing.assert_array_equal(edges.taps[members[j]], edges.taps[members[n // 2 - j]].T)


def test_taps_are_the_family_at_the_stated_parameters(bank):
    for kernel, taps in zip(bank.kernels, bank.taps, strict=True):
        drawn = render(kernel.family, kernel.parameters, bank.size)
        drawn = drawn - (drawn.mean() if kernel.parity == "odd" else 0)
        cos = (drawn * taps).sum() / np.linalg.norm(drawn) / np.linalg.norm(taps)
        assert cos > 0.999
        assert kernel.parameters["theta_rad"] == pytest.approx(
            math.pi * kernel.orientation / len(bank.members(kernel.scale, kernel.parity))
        )


def test_flat_light_gives_exactly_nothing(bank):
    """Zero DC: an illumination step of 1000 changes no response beyond its own rounding."""
    for taps in bank.taps.astype(np.float64):
        assert taps.sum() == 0
        assert taps.ravel()[::-1].sum() == 0
        assert math.fsum((1000.0 * taps).ravel()) == 0


def test_rounding_stays_within_units_of_the_last_place():
    kernel = render("gd2", {"theta_rad": 0.4, "sigma_u_px": 1.3, "sigma_v_px": 2.0}, 13)
    kernel -= kernel.mean()
    taps = lattice.exact_taps(kernel)
    away = np.abs(taps - kernel)
    c = 6
    assert away[c, c] < 30 * 2.0**-24 * np.abs(kernel).max()
    away[c, c] = 0
    assert away.max() <= 2.0**-23 * np.abs(kernel).max()


@pytest.mark.parametrize(
    ("budget", "kind", "kernels", "structure"),
    [
        (4, "STEPS", 4, (4,)), (5, "STEPS", 4, (4,)), (11, "STEPS", 8, (8,)),
        (12, "STEPS", 12, (6, 6)), (16, "STEPS", 16, (8, 8)), (24, "STEPS", 24, (8, 8, 8)),
        (8, "PAIRS", 8, (4,)), (12, "PAIRS", 12, (6,)), (16, "PAIRS", 16, (8,)),
        (24, "PAIRS", 24, (8, 4)), (16, "LINES", 16, (8,)), (24, "LINES", 24, (6, 6)),
    ],
)  # fmt: skip
def test_structure_follows_from_the_budget(budget, kind, kernels, structure):
    assert lattice.structure_for(budget, getattr(lattice, kind)) == (kernels, structure)


@pytest.mark.parametrize(("kind", "each"), [("STEPS", 1), ("PAIRS", 2), ("LINES", 2)])
def test_every_structure_counts_to_its_budget(kind, each):
    for kernels, structure in getattr(lattice, kind).items():
        assert each * sum(structure) == kernels


def test_an_odd_budget_is_rounded_down_and_said(stand):
    bank = chosen(stand, kernels=7)
    assert len(bank) == 6
    assert any("7 kernels were asked for" in w for w in bank.warnings)


def test_names_and_roles(edges, features, lines):
    assert [k.name for k in edges.kernels[:2]] == ["step_s0_o0", "step_s0_o1"]
    assert {k.name[:4] for k in features.kernels} == {"step", "line"}
    assert (edges.strength, features.strength, lines.strength) == ("step", "energy", "step")
    for bank in (edges, features, lines):
        for scale in range(len(bank.scales)):
            assert len(strength_members(bank, scale)) in (4, 6, 8)
        finest = [bank.kernels[bank.members(s, "odd")[0]] for s in bank.scales]
        across = [k.parameters["sigma_u_px"] for k in finest]
        assert across == sorted(across)


def test_support_holds_three_deviations(bank):
    widest = max(k.parameters[p] for k in bank.kernels for p in ("sigma_u_px", "sigma_v_px"))
    assert bank.radius >= min(3 * widest, 15)


# ---------------------------------------------------------------- units


def test_unit_noise_gain_on_white_noise(bank):
    for taps in bank.taps.astype(np.float64):
        assert noise_gain(taps) == pytest.approx(1, abs=1e-6)


def test_unit_noise_gain_on_coloured_noise_by_simulation(stand):
    """Noise smoothed along x more than along y, 0.9 Mpx: relative sd of an sd about 0.4 %."""
    row, col = np.array([0.25, 0.5, 0.25]), np.array([0.1, 0.8, 0.1])
    rx, ry = (np.convolve(k, k) / (k @ k) for k in (row, col))
    around = stand.survey(autocovariance=np.outer(ry, rx))
    bank = chosen(stand, around=around, kernels=16, purpose="features")
    white = np.random.default_rng(3).standard_normal((900, 1000))
    noise = correlate(white, np.outer(col, row), mode="wrap")
    noise /= np.linalg.norm(np.outer(col, row))
    for i in (0, 1, 4, 11):
        found = correlate(noise, bank.taps[i].astype(np.float64), mode="wrap").std()
        assert found == pytest.approx(1, abs=0.015)


def test_louder_noise_makes_smaller_taps():
    taps = lattice.lattice_taps("gd1", (1.2, 1.4), 8, 11, None, 4.0)
    assert np.linalg.norm(taps[1]) == pytest.approx(0.25, abs=1e-6)


def test_pairs_follow_the_rayleigh_conditions(features):
    """Equal gain and no correlation between even and odd (Rice 1945: the envelope's law)."""
    for scale in features.scales:
        odd, even = features.members(scale, "odd"), features.members(scale, "even")
        for i, j in zip(odd, even, strict=True):
            a, b = features.taps[i].astype(float), features.taps[j].astype(float)
            assert np.linalg.norm(a) == pytest.approx(np.linalg.norm(b), abs=1e-6)
            assert (a * b).sum() == pytest.approx(0, abs=1e-12)


def test_gain_is_the_response_to_a_unit_step(edges):
    """Blurred steps through the centre give a little less than the stated gain."""
    y, x = np.mgrid[-12:13, -12:13].astype(float)
    for kernel, taps in zip(edges.kernels, edges.taps, strict=True):
        t = kernel.parameters["theta_rad"]
        picture = 0.5 * (1 + erf((x * np.cos(t) + y * np.sin(t)) / (math.sqrt(2) * 0.2)))
        found = correlate(picture, taps.astype(float), mode="nearest")[12, 12]
        assert found == pytest.approx(kernel.gain, rel=0.03)
        assert kernel.gain > 1


def test_gradient_masks_against_published_norms():
    """Sobel / 8, Scharr / 32, Prewitt / 6 on white noise: arithmetic of the masks."""
    across = np.array([-1, 0, 1])
    for side, total, norm in (
        ((1, 2, 1), 8, 0.4330127), ((3, 10, 3), 32, 0.4800716), ((1, 1, 1), 6, 0.4082483),
    ):  # fmt: skip
        assert noise_gain(np.outer(side, across) / total) == pytest.approx(norm, abs=1e-7)


def canny_product(profile, slope):
    """Canny's signal-to-noise times localisation of an odd profile with this slope."""
    c = len(profile) // 2
    signal = profile[c + 1 :].sum() / np.linalg.norm(profile)
    return signal * slope[c] / np.linalg.norm(slope)


def test_canny_product_of_the_family():
    """sqrt(8 / 3 pi) = 0.9213 for the first derivative of a Gaussian (Canny 1986)."""
    kernel = render("gd1", {"theta_rad": 0.0, "sigma_u_px": 30.0, "sigma_v_px": 1.0}, 301)
    profile = kernel[150]
    assert canny_product(profile, np.gradient(profile)) == pytest.approx(0.9213, abs=0.003)


@pytest.mark.parametrize("across", [2.0, 2.5])
def test_canny_product_of_exported_taps(across):
    """Cut at three deviations, on the pixel grid: the slope by the family's own derivative."""
    taps = lattice.lattice_taps("gd1", (across, across), 4, lattice.support(across))[0]
    middle = len(taps) // 2
    u = np.arange(-middle, middle + 1) / across
    slope = (1 - u**2) * np.exp(-(u**2) / 2)
    slope *= taps[middle, middle + 1] / (u[middle + 1] * np.exp(-(u[middle + 1] ** 2) / 2))
    found = canny_product(taps[middle].astype(float), slope)
    assert found == pytest.approx(0.9213, abs=0.03)


# ---------------------------------------------------------------- the prediction


@pytest.mark.parametrize(("across", "along", "blur", "turn"), [
    (1.5, 1.8, 0.7, 0.0), (2.0, 3.0, 1.2, 0.1), (1.2, 1.2, 0.5, 0.3), (1.5, 3.0, 0.5, 0.4),
])  # fmt: skip
def test_step_gain_against_a_rendered_step(across, along, blur, turn):
    kernel = render("gd1", {"theta_rad": turn, "sigma_u_px": across, "sigma_v_px": along}, 31)
    picture = 0.5 * (1 + erf(np.arange(-15, 16.0) / (math.sqrt(2) * blur)))[None]
    found = (kernel * picture).sum() / np.linalg.norm(kernel)
    assert predict.step_gain(across, along, blur, turn) == pytest.approx(found, rel=0.01)


def test_location_sd_is_cannys_for_a_sharp_step():
    """1 / 0.867325 per row (Canny 1986), over the 2 sqrt(pi) l rows that the kernel weighs."""
    s, along = 1.7, 2.3
    rows = 2 * math.sqrt(math.pi) * along
    assert predict.location_sd(s, along, 0.0) == pytest.approx(
        math.sqrt(s / rows) / 0.867325, rel=1e-4
    )


def test_location_sd_by_simulation():
    across, along, blur, height = 1.5, 2.0, 0.8, 25.0
    kernel = render("gd1", {"theta_rad": 0.0, "sigma_u_px": across, "sigma_v_px": along}, 17)
    draw = np.random.default_rng(5)
    x = np.arange(-14, 15.0)
    step = height / 2 * (1 + erf(x / (math.sqrt(2) * blur)))
    found = []
    for _ in range(400):
        strip = step[None] + draw.standard_normal((17, 29))
        r = np.array([(kernel * strip[:, i : i + 17]).sum() for i in range(5, 8)])
        found.append((r[0] - r[2]) / (2 * (r[0] - 2 * r[1] + r[2])))
    expected = predict.location_sd(across, along, blur) / height
    assert np.std(found) == pytest.approx(expected, rel=0.15)


def test_rice_threshold_solves_the_rice_sum_of_the_kernels_own_spectrum():
    across = 1.5
    kernel = render("gd1", {"theta_rad": 0.0, "sigma_u_px": across, "sigma_v_px": 2.0}, 31)
    power = np.abs(np.fft.fft2(kernel, (256, 256))) ** 2
    w = np.abs(2 * np.pi * np.fft.fftfreq(256))[None, :]
    m1, m2 = ((power * w**k).sum() / power.sum() for k in (1, 2))
    t = predict.rice_threshold(across, 8, 100.0)
    rate = 8 * math.sqrt((m2 - m1**2) / (2 * math.pi)) * t * math.exp(-(t**2) / 2)
    assert 1e6 * rate == pytest.approx(100, rel=0.02)


def test_colour_gain_against_the_kernels_own_noise_gain():
    smooth = np.array([0.25, 0.5, 0.25])
    r = np.convolve(smooth, smooth) / (smooth @ smooth)
    colour = np.outer(r, r)
    ratios = []
    for theta in np.pi * np.arange(8) / 8:
        k = render("gd1", {"theta_rad": theta, "sigma_u_px": 1.6, "sigma_v_px": 2.0}, 21)
        ratios.append((noise_gain(k, colour) / noise_gain(k)) ** 2)
    found = predict.colour_gain(1.6, 2.0, colour)
    assert found == pytest.approx(math.sqrt(np.mean(ratios)), rel=0.01)
    assert found > 1.3  # smoothed noise is louder in a wide kernel than its own sd says


def test_chosen_widths_are_a_maximum_of_the_prediction(stand):
    around = stand.survey(electrons=60)
    given = predict.conditions(predict.tone_contrasts(around.table), 1.0, 0.7, 10.0)
    best = predict.best_widths((8, 8), given, (1.0, 1.5))
    for a, b in ((1.02, 1), (0.98, 1), (1, 1.02), (1, 0.98)):
        moved = (best.across[0] * a, best.across[1] * b)
        if predict.STEP[0] < moved[1] / moved[0] < predict.STEP[1]:
            assert predict.predicted_f(moved, (8, 8), given) < best.predicted + 1e-9


def test_a_coarser_size_adds_nothing_where_the_finest_finds_all():
    sure = predict.Conditions(np.full(4, 1e4), 0.7, 10.0)
    _, right = predict.found_and_right(1.2, 8, sure, 5.0)
    for coarse in (2.0, 3.5):
        assert predict.predicted_f((1.2, coarse), (8, 8), sure) == pytest.approx(right[0])


def test_prediction_keeps_the_order_that_was_measured():
    """Scenes with true edges: at 5000 electrons narrow wins, at 8 wide, a cascade at both."""

    def f(across, electrons):
        tones = 0.05 + 0.95 * (np.arange(64) + 0.5) / 64
        root = 2 * np.sqrt(tones * electrons + 4.375)
        heights = np.abs(root[:, None] - root[None]).ravel()
        given = predict.conditions(heights, 1.0, 0.8, 10.0)
        return predict.predicted_f(across, (8,) * len(across), given)

    assert f((1.2,), 5000) > f((1.6,), 5000) > f((2.2,), 5000)
    assert f((1.2,), 8) < f((1.6,), 8) < f((2.2,), 8)
    assert f((1.2, 2.2), 5000) > f((1.2,), 5000) - 1e-3
    assert f((1.2, 2.2), 8) > f((1.6,), 8)
    assert f((1.2,), 5000) == pytest.approx(0.972, abs=0.02)  # measured on such scenes
    assert f((2.2,), 5000) == pytest.approx(0.923, abs=0.02)


# ---------------------------------------------------------------- following the camera


@pytest.fixture(scope="module")
def atoms(stand):
    return stand.edge_atoms(1, 40)


def finest(atoms, around, patch_contrast=None, **settings):
    """Width across of the finest size, and the whole choice."""
    choice = choose_widths(atoms, around, BankSettings(**settings), patch_contrast=patch_contrast)
    return choice.widths[0][0], choice


@pytest.mark.parametrize("kernels", [8, 16])
def test_sizes_grow_with_blur_and_with_noise(stand, atoms, kernels):
    by_blur = [
        finest(atoms, stand.survey(blur, 60), kernels=kernels)[0] for blur in (0.0, 0.7, 1.2)
    ]
    assert by_blur[1] > 1.05 * by_blur[0]
    assert by_blur[2] > 1.1 * by_blur[1]
    by_light = [finest(atoms, stand.survey(0.7, e), kernels=kernels)[0] for e in (400, 60, 8)]
    # each serves dim exposures too, as far as its light goes
    assert by_light[1] > 1.05 * by_light[0]
    assert by_light[2] > 1.1 * by_light[1]


def test_smoothed_noise_asks_for_wider_kernels(stand, atoms):
    smooth = np.array([0.25, 0.5, 0.25])
    r = np.convolve(smooth, smooth) / (smooth @ smooth)
    white, coloured = stand.survey(0.7, 60), stand.survey(0.7, 60, autocovariance=np.outer(r, r))
    assert finest(atoms, coloured)[0] > 1.1 * finest(atoms, white)[0]


def test_fewer_false_edges_ask_for_wider_kernels(stand, atoms):
    around = stand.survey(0.7, 60)
    assert finest(atoms, around, false_edges=0.1)[0] > finest(atoms, around, false_edges=1000)[0]


def test_measured_contrasts_replace_the_prior(stand, atoms):
    spread = np.linspace(0.8, 1.2, 50, dtype=np.float32)
    found = [finest(atoms, stand.survey(), sd * spread) for sd in (2.0, 20.0)]
    assert found[0][0] > 1.2 * found[1][0]  # faint edges need wider kernels
    assert found[0][1].about["contrasts_from"] == "the patches"


def test_patches_that_were_not_normalised_tell_no_contrast(stand, atoms):
    ones = finest(atoms, stand.survey(), np.ones(50, np.float32))
    assert ones == finest(atoms, stand.survey())


def test_without_blur_or_noise_the_atoms_tell_the_size_and_it_is_said(stand):
    shown = stand.edge_atoms(2, 60, across=1.3, along=2.5)
    for around, lacking in (
        (stand.survey(blur=None), "blur"),
        (stand.survey(measurable=False), "noise"),
        (stand.survey(blur=None, measurable=False), "noise and blur"),
    ):
        width, choice = finest(shown, around)
        assert width == pytest.approx(1.3, rel=0.08)
        assert choice.widths[1][0] == pytest.approx(1.8 * width, abs=2e-3)
        assert any(f"camera's {lacking} could not be measured" in w for w in choice.warnings)


def test_without_noise_kernels_have_unit_norm_and_it_is_said(stand, atoms):
    bank = chosen(stand, atoms, stand.survey(measurable=False), kernels=8)
    np.testing.assert_allclose(np.linalg.norm(bank.taps, axis=(1, 2)), 1, atol=1e-6)
    assert any("unit norm" in w for w in bank.warnings)


def test_a_very_clean_camera_ends_on_the_bound_and_says_so(stand, atoms):
    width, choice = finest(atoms, stand.survey(0.0, 1e6))
    assert width == predict.ACROSS[0]
    assert any("sigma_u_px of size 0 ended on its bound" in w for w in choice.warnings)


def test_features_follow_the_atoms(stand):
    found = [
        finest(stand.edge_atoms(3, 60, across=a, along=2.2 * a), stand.survey(), purpose="features")
        for a in (0.9, 1.2, 1.6)
    ]
    np.testing.assert_allclose([f[0] for f in found], [0.9, 1.2, 1.6], rtol=0.08)


def made(stand, seed, **about):
    """A bank of chosen widths, without its coverage: cos between banks needs no more."""
    around = stand.survey(blur=about.pop("blur", 0.7))
    _, choice = finest(
        stand.edge_atoms(seed, 120, across=about.pop("across", 1.1)), around, **about
    )
    pair = about.get("purpose") == "features"
    kernels, taps = lattice.lattice_bank(
        choice.structure, choice.widths, ("odd", "even") if pair else ("odd",)
    )
    return Bank("made", kernels, taps, around.table)


@pytest.mark.parametrize(
    "about", [{"purpose": "edges"}, {"purpose": "features"}, {"purpose": "edges", "blur": None}]
)
def test_other_draws_of_atoms_give_the_same_bank(stand, about):
    first, second = (made(stand, seed, **about) for seed in (10, 11))
    assert compare_banks(first, second).min() > 0.95


def test_the_bank_is_not_steady_by_being_deaf(stand):
    first, second = (made(stand, 12, purpose="features", across=a) for a in (0.8, 1.7))
    assert compare_banks(first, second).min() < 0.95


def test_the_same_atoms_give_the_same_bytes(stand, edges):
    again = chosen(stand, kernels=16)
    assert again.taps.tobytes() == edges.taps.tobytes()
    assert again.kernels == edges.kernels


def test_photographs_that_show_no_edges_are_called_out(stand):
    noise = np.random.default_rng(4).standard_normal((80, 12, 12))
    noise -= noise.mean(axis=(1, 2), keepdims=True)
    bank = choose_bank(
        stand.dictionary(noise, basis=noise), stand.good_fits(80, "poor"), stand.survey()
    )
    assert any("0 of 80 atoms fit" in w for w in bank.warnings)
    assert any("no edge structure was learned" in w for w in bank.warnings)
    assert bank.coverage.learned < 0.15


def test_coverage_comes_with_its_nulls(edges, features):
    for bank in (edges, features):
        told = bank.coverage
        at_budget = told.curve[list(told.budget).index(len(bank))]
        assert at_budget > told.rotated + 0.2
        assert told.learned < at_budget + 0.02  # no bank covers more than the refined one
    assert features.coverage.learned > features.coverage.untrained - 0.01


# ---------------------------------------------------------------- settings


@pytest.mark.parametrize(
    "wrong",
    [
        {"kernels": 3}, {"kernels": 65}, {"purpose": "lines"}, {"false_edges": 0.01},
        {"false_edges": float("nan")}, {"border": "reflect"}, {"name": "2x"}, {"name": "double"},
        {"purpose": "features", "lines": True}, {"size": 8}, {"size": 1}, {"size": 65},
    ],
)  # fmt: skip
def test_wrong_settings_are_refused(wrong):
    with pytest.raises(UsageError):
        BankSettings(**wrong)


@pytest.mark.parametrize(
    "wrong",
    [
        {"purpose": "features", "kernels": 6},
        {"lines": True, "kernels": 6},
        {"widths": ((1.0, 1.0),)},
        {"widths": ((1.0, 1.0), (9.0, 1.0))},
    ],
)
def test_what_does_not_fit_the_structure_is_refused(stand, wrong):
    with pytest.raises(UsageError):
        chosen(stand, **wrong)


def test_widths_by_hand_are_taken(stand):
    bank = chosen(stand, widths=((2.2, 2.2), (1.2, 1.3)))
    assert [bank.kernels[i].parameters["sigma_u_px"] for i in (0, 8)] == [1.2, 2.2]


def test_size_by_hand_is_taken_and_a_cut_rim_is_said(stand, atoms):
    bank = chosen(stand, atoms, kernels=8, size=7, widths=((2.0, 2.0),))
    assert bank.size == 7
    assert any("1.5 standard deviations" in w for w in bank.warnings)
    assert noise_gain(bank.taps[1].astype(float)) == pytest.approx(1, abs=1e-6)


def test_comparing_banks_sees_shifts_and_signs_through(edges):
    moved = edges.taps.copy()
    moved[3] = -np.roll(moved[3], 1, axis=1)
    other = type(edges)(edges.name, edges.kernels, moved, edges.table)
    np.testing.assert_allclose(compare_banks(edges, edges), 1, atol=1e-9)
    assert compare_banks(edges, other).min() > 0.98
    blurred = np.array([gaussian_filter(t, 2.0) for t in edges.taps])
    assert compare_banks(type(edges)("b", edges.kernels, blurred, edges.table), edges).min() < 0.95


def test_choosing_needs_no_compiler_and_no_learner():
    code = (
        "import sys\n"
        "for name in ('numba', 'sklearn', 'skimage', 'patchlab.learn'): sys.modules[name] = None\n"
        "import patchlab.bank.choose, patchlab.bank.given\n"
    )
    done = subprocess.run([sys.executable, "-c", code], capture_output=True, text=True)
    assert done.returncode == 0, done.stderr
