"""Banks of colour pixels in every target: scipy summed over the planes is the oracle."""

import dataclasses
import itertools

import numpy as np
import onnxruntime
import pytest
from scipy import ndimage, special

from patchlab import bank as banks
from patchlab import edges, export
from patchlab.bank.colour import colour_bank, colour_bank_as_learned, mosaic_bank
from patchlab.bank.given import bank_from_taps
from patchlab.bank.lattice import lattice_bank
from patchlab.bank.planes import opponent_mix
from patchlab.conventions import BORDERS, pixel_format
from patchlab.edges import threshold
from patchlab.errors import InputError, UsageError
from patchlab.export.onnx import conv_bound, emit, fed, reference_runner
from patchlab.families import noise_gain
from patchlab.pipeline.bundle import write_bundle
from patchlab.pipeline.desk import Desk
from patchlab.pipeline.loaded import load_bank
from patchlab.settings import Settings
from patchlab.types import Bank, InputContract, InputTable, NoiseModel, Survey

FORMATS = ("RGB8", "BGR12", "BayerRG8", "BayerGB12")


def table(pixels, noise_sd=1.0):
    form = pixel_format(pixels)
    codes = np.arange(1 << form.bits)
    values = 1.7 * np.sqrt(codes * (730 / 2**form.bits) + 0.3)
    contract = InputContract(pixels, 0, float(form.full_scale))
    return InputTable("stabilised", contract, values.astype(np.float32), noise_sd)


def picture(pixels, shape=(19, 23), seed=0):
    form = pixel_format(pixels)
    size = (*shape, form.planes)
    codes = np.random.default_rng(seed).integers(0, form.full_scale + 1, size)
    return form.joined(codes.astype(form.dtype))


def arbitrary(pixels, border="mirror101", seed=2):
    """Kernels of 5 x 5 without any symmetry, one with some, two that mirror each other."""
    planes = pixel_format(pixels).planes
    taps = np.random.default_rng(seed).standard_normal((4, 5, 5, planes))
    taps[1] = taps[0][:, ::-1]
    taps[2] = (taps[2] + taps[2][::-1, ::-1]) / 2
    bank = bank_from_taps(taps, pixels, "demo", border)
    return dataclasses.replace(bank, table=table(pixels))


def survey(pixels, sample_noise=()):
    return Survey(
        InputContract(pixels, 0, 255), NoiseModel(True), table(pixels),
        sample_noise=np.array(sample_noise, dtype=float),
    )  # fmt: skip


def opponent(pixels="RGB8", sample_noise=(), count=4, sizes=2):
    """One or two sizes on each of the opponent planes."""
    widths = ((0.9, 1.35), (1.6, 2.4))[:sizes]
    kernels, taps = lattice_bank((count,) * sizes, widths, ("odd",), None, 1.0)
    lattice = Bank("demo", kernels, taps, table(f"Mono{pixel_format(pixels).bits}"))
    return colour_bank(lattice, survey(pixels, sample_noise))


def by_scipy(bank, pixels):
    """Correlations of every plane by scipy, added."""
    form = bank.contract.format
    tabled = bank.table.values[form.split(pixels)].astype(np.float64)
    if bank.mix is not None:
        tabled = np.einsum("hws,ms->hwm", tabled, bank.mix.astype(np.float64))
    mode = BORDERS[bank.border].scipy
    return np.array([
        sum(ndimage.correlate(tabled[..., m], taps[..., m].astype(np.float64), mode=mode)
            for m in range(bank.planes))
        for taps in bank.taps
    ])  # fmt: skip


# ---------------------------------------------------------------- every engine


@pytest.mark.parametrize(("pixels", "border"), list(itertools.product(FORMATS, BORDERS)))
def test_oracle_engine_and_onnx_are_scipy_summed_over_planes(pixels, border):
    bank, codes = arbitrary(pixels, border), picture(pixels)
    wanted = by_scipy(bank, codes)
    np.testing.assert_allclose(banks.exact_responses(bank, codes), wanted, atol=1e-9)
    for kind in ("direct", "parity", "auto"):
        plan = banks.make_plan(bank, kind)
        error = np.abs(banks.responses(bank, codes, plan) - wanted).max(axis=(1, 2))
        assert (error <= plan.error_bound).all()
    model = emit(bank).files["demo.onnx"]
    session = onnxruntime.InferenceSession(model, providers=["CPUExecutionProvider"])
    (by_onnx,) = session.run(["responses"], {"image": fed(codes)})
    error = np.abs(by_onnx[0] - wanted).max(axis=(1, 2))
    assert (error <= conv_bound(bank)).all()


@pytest.mark.parametrize("pixels", ["RGB8", "BayerGR8"])
def test_the_reference_evaluator_agrees(pixels):
    bank, codes = arbitrary(pixels), picture(pixels, (6, 7))
    found = reference_runner(emit(bank).files["demo.onnx"])(codes)[0]
    error = np.abs(found - by_scipy(bank, codes)).max(axis=(1, 2))
    assert (error <= conv_bound(bank)).all()


@pytest.mark.parametrize(
    ("make", "border"),
    [
        (lambda: arbitrary("BayerGB12"), "wrap"),
        (lambda: arbitrary("RGB8"), "zero"),
        (lambda: opponent("BGR8", (2, 1, 1.4), sizes=1), "mirror101"),
    ],
)
def test_every_target_of_a_folder_is_proved(tmp_path, make, border):
    """Compiled library, runtime with it and without, ONNX, vectors, self-test in C."""
    bank = dataclasses.replace(make(), border=border)
    desk = Desk(tmp_path / "bank", Settings())
    done = write_bundle(desk.out, bank, desk, parents={}, inputs={})
    ran = {c.target for c in done.verification.checks if c.passed}
    assert done.verification.passed
    assert {"Python runtime, numpy", "Python runtime, library", "onnxruntime", "C self-test",
            "in-process engine"} <= ran  # fmt: skip
    assert any(target.startswith("compiled library") for target in ran)
    again = load_bank(desk.out, library=True)
    assert again.bank.taps.tobytes() == bank.taps.tobytes()
    assert (again.bank.mix is None) == (bank.mix is None)
    codes = picture(bank.contract.pixels, (40, 61))
    whole = again.responses(codes)
    wanted = by_scipy(bank, codes)
    assert (np.abs(whole - wanted).max(axis=(1, 2)) <= done.plan.error_bound).all()
    # bands, threads and rows that are padded or run upwards give the same bits
    np.testing.assert_array_equal(again.native.responses(codes, threads=3), whole)
    wide = np.zeros((codes.shape[0], codes.shape[1] + 3, *codes.shape[2:]), codes.dtype)
    wide[:, : codes.shape[1]] = codes
    np.testing.assert_array_equal(again.responses(wide[:, : codes.shape[1]]), whole)
    np.testing.assert_array_equal(again.responses(codes[::-1].copy()[::-1]), whole)


def test_an_impulse_in_one_sample_gives_the_flipped_taps_of_that_sample():
    bank = dataclasses.replace(
        arbitrary("RGB8"), table=InputTable("identity", InputContract("RGB8", 0, 255),
                                            np.arange(256, dtype=np.float32), None)
    )  # fmt: skip
    for sample in range(3):
        codes = np.zeros((11, 12, 3), np.uint8)
        codes[5, 6, sample] = 1
        found = banks.exact_responses(bank, codes)[:, 3:8, 4:9]
        np.testing.assert_allclose(found, bank.taps[:, ::-1, ::-1, sample], atol=1e-12)


def test_a_pixel_beyond_the_depth_and_pictures_that_do_not_fit_are_refused():
    bank = arbitrary("BayerGB12")
    codes = picture("BayerGB12")
    with pytest.raises(InputError, match="cells that are cut"):
        banks.responses(bank, codes[:-1])
    with pytest.raises(InputError, match="one plane"):
        banks.responses(bank, bank.contract.format.split(codes))
    with pytest.raises(InputError, match="smaller than"):
        banks.responses(bank, codes[:8])
    wrong = codes.copy()
    wrong[3, 3] = 5000
    with pytest.raises(InputError, match="beyond"):
        banks.responses(bank, wrong)
    with pytest.raises(InputError, match=r"\(h, w, 3\)"):
        banks.responses(arbitrary("RGB8"), picture("RGB8")[..., 0])


@pytest.mark.parametrize(
    ("shape", "pixels"), [((2, 5, 5), "RGB8"), ((2, 5, 5, 3), "BayerRG8"), ((2, 5, 5, 3), "Mono8")]
)
def test_taps_that_are_not_of_these_pixels_are_refused(shape, pixels):
    with pytest.raises(InputError, match="are not kernels"):
        bank_from_taps(np.ones(shape), pixels)


def test_fixed_point_and_tile_transforms_say_that_they_take_one_plane():
    bank = opponent()
    assert banks.make_plan(bank).detail["fixed"] is None
    with pytest.raises(UsageError, match="one plane"):
        banks.make_plan(bank, "fft")


# ---------------------------------------------------------------- opponent planes


@pytest.mark.parametrize("colours", ["RGB", "BGR"])
@pytest.mark.parametrize("noise", [None, (1.3, 1.0, 1.1)])
def test_opponent_planes_are_blind_to_grey_and_have_noise_of_their_own(colours, noise):
    sd = None if noise is None else np.array(noise)
    names, mix = opponent_mix(colours, sd)
    assert names == ("grey", "blue_yellow", "red_green")
    exact = mix.astype(np.float64)
    assert exact[1:].sum(axis=1).tolist() == [0, 0]
    spread = np.diag((np.ones(3) if sd is None else sd) ** 2)
    np.testing.assert_allclose(exact @ spread @ exact.T, np.eye(3), atol=2e-6)
    # no other weighting of unit noise answers more to grey
    best = np.sqrt(np.ones(3) @ np.linalg.inv(spread) @ np.ones(3))
    assert exact[0].sum() == pytest.approx(best, rel=1e-6)
    place = colours.index("B")
    assert abs(exact[1, place]) == np.abs(exact[1]).max()


def test_a_kernel_reads_one_plane_and_costs_what_a_grey_one_costs():
    bank = opponent()
    plan = banks.make_plan(bank)
    grey = banks.make_plan(
        dataclasses.replace(bank, kernels=bank.kernels[:8], taps=bank.taps[:8, ..., 0],
                            table=table("Mono8"), mix=None)
    )  # fmt: skip
    assert plan.multiplies == 3 * grey.multiplies + 9
    assert bank.scales == (0, 1, 2, 3, 4, 5)
    assert [k.name.partition("_step")[0] for k in bank.kernels[::8]] == [
        "grey", "blue_yellow", "red_green"
    ]  # fmt: skip
    for taps in bank.taps:
        assert noise_gain(taps.astype(float)) == pytest.approx(1, abs=1e-6)


def test_grey_pictures_give_nothing_on_the_colour_planes_exactly():
    """Weights are multiples of 2^-22 that sum to zero, so equal samples cancel to rounding."""
    bank = opponent()
    grey = np.repeat(picture("RGB8")[..., :1], 3, axis=2)
    planes = banks.responses(bank, grey)
    assert np.abs(planes[:8]).max() > 10
    assert np.abs(planes[8:]).max() < 1e-4
    assert np.abs(banks.exact_responses(bank, grey)[8:]).max() < 1e-12


def test_a_mosaic_edge_bank_is_nearly_blind_to_edges_without_colour():
    """A blurred grey edge at any place and turn, sampled by the mosaic: the opponent sets answer
    by aliasing alone, and to an edge of colour they answer fully."""
    kernels, taps = lattice_bank((4,), ((0.9, 1.35),), ("odd",), None, 1.0)
    lattice = Bank("demo", kernels, taps, table("Mono8"))
    noise = (1.2, 1.0, 1.0, 0.8)
    bank = mosaic_bank(lattice, survey("BayerRG8", noise))
    for k in bank.taps:
        assert noise_gain(k.astype(float)) == pytest.approx(1, abs=1e-6)
    assert np.abs(bank.taps.astype(np.float64).sum(axis=(1, 2))).max() == 0
    samples = bank.taps.astype(np.float64) @ bank.mix.astype(np.float64)
    y, x = np.mgrid[:40, :40] - 19.5
    form, worst = pixel_format("BayerRG8"), 0.0
    for turn in range(8):
        for place in (0.0, 0.3, 0.6):
            along = x * np.cos(np.pi * turn / 8) + y * np.sin(np.pi * turn / 8) - place
            edge = form.split((1 + special.erf(along / 0.8 / np.sqrt(2))) / 2)
            grey, colour = (answer(samples[part], edge) for part in (slice(4), slice(4, None)))
            worst = max(worst, colour / grey)
            red = edge * np.array([1.0, 0, 0, 0])  # an edge in red alone
            assert answer(samples[8:], red) > 0.3 * answer(samples[:4], red)
    assert worst < 0.04


def answer(taps, cells):
    """Largest response in the middle of a picture of cells (h, w, samples)."""
    found = [
        sum(ndimage.correlate(cells[..., c], k[..., c]) for c in range(cells.shape[2]))[7:13, 7:13]
        for k in taps
    ]
    return np.abs(found).max()


def test_mosaics_have_no_opponent_planes():
    with pytest.raises(UsageError, match="mosaic_bank"):
        opponent_mix("RGGB")


# ---------------------------------------------------------------- edges of colour


def test_an_edge_that_grey_cannot_see_is_found_on_a_colour_plane():
    """Red against green of one grey response: 60 noise units apart, and grey sees nothing."""
    bank = opponent(count=8)
    rng = np.random.default_rng(0)
    working = np.full((48, 64, 3), 30.0)
    working[:, 32:] += np.array([4.0, -4.0, 0.0])
    values = bank.table.values.astype(np.float64)
    noisy = working + rng.normal(size=working.shape)
    codes = np.abs(values[None] - noisy.reshape(-1, 1)).argmin(axis=1)
    codes = codes.reshape(working.shape).astype(np.uint8)
    respond = lambda pixels: banks.responses(bank, pixels)  # noqa: E731
    found, edgels = edges.detect_edgels(bank, codes, respond, threshold=6.0)
    assert edgels.size >= 20
    assert set(edgels["scale"]) <= {4, 5}  # red-green
    assert np.median(np.abs(edgels["x"] - 31.5)) < 0.3
    assert found.strength.shape == (48, 64)


def test_thresholds_hold_on_noise_of_all_planes():
    """The tail fitted on one draw of noise in three planes promises what another draw shows."""
    bank = opponent(sample_noise=(1.3, 1.0, 1.1))
    known = edges.calibrate(bank, megapixels=2.0, seed=1)
    level = np.array([edges.strength_for(known, 300.0)])
    fresh = threshold.count_on_noise(bank, level=level, megapixels=1.5, seed=9, key="fresh")
    rate = fresh.elements[0] / fresh.megapixels
    assert 200 < rate < 430
    grey = dataclasses.replace(
        bank, kernels=bank.kernels[:8], taps=bank.taps[:8, ..., 0], table=table("Mono8"), mix=None
    )
    assert edges.calibrate(grey, megapixels=1.0, seed=1).strength[2] < known.strength[2]


def test_noise_of_the_samples_gives_unit_responses():
    """White noise of the stated size in each sample, through mix and kernels."""
    noise = np.array([1.3, 1.0, 1.1])
    bank = opponent(sample_noise=noise)
    drawn = np.random.default_rng(4).normal(size=(160, 160, 3)) * noise
    working = np.einsum("hws,ms->hwm", drawn, bank.mix)
    for taps in bank.taps[::5]:
        response = sum(ndimage.correlate(working[..., m], taps[..., m]) for m in range(3))
        assert response.std() == pytest.approx(1, abs=0.06)


# ---------------------------------------------------------------- filters as they were learned


def test_learned_filters_are_exported_with_all_their_taps(stand):
    filters = np.random.default_rng(6).normal(size=(5, 6, 6, 4))
    filters -= filters.mean(axis=(1, 2), keepdims=True)
    known = stand.dictionary(filters, basis=filters)
    noise = np.array([1.2, 1.0, 1.0, 0.8])
    bank = colour_bank_as_learned(known, survey("BayerRG8", noise), "learned")
    assert bank.size == 7
    assert bank.planes == 4
    assert bank.kernels[0].parameters["x_px"] == -0.5
    assert not bank.taps[:, 6].any()
    samples = bank.taps.astype(np.float64) @ bank.mix.astype(np.float64)
    for taps, learned in zip(samples[:, :6, :6], filters, strict=True):
        cosine = (taps * learned).sum() / np.linalg.norm(taps) / np.linalg.norm(learned)
        assert cosine > 1 - 1e-9
        assert np.sqrt(((taps * noise) ** 2).sum()) == pytest.approx(1, abs=1e-5)
    assert np.abs(bank.taps.astype(np.float64).sum(axis=(1, 2))).max() == 0


def test_a_mosaic_bank_sees_every_cell_in_the_phase_it_was_learned_in():
    """A picture moved by one cell moves the responses by one; by one sample it does not."""
    bank = arbitrary("BayerRG8", "wrap")
    codes = picture("BayerRG8", (12, 14))
    still = banks.exact_responses(bank, codes)
    by_cell = banks.exact_responses(bank, np.roll(codes, 2, axis=1))
    np.testing.assert_allclose(by_cell, np.roll(still, 1, axis=2), atol=1e-9)
    by_sample = banks.exact_responses(bank, np.roll(codes, 1, axis=1))
    assert np.abs(by_sample - still).max() > 1
    assert still.shape == (4, 12, 14)
    assert export.emit(bank, banks.make_plan(bank))["demo.h"].count(b"cell of 2 x 2") == 1
