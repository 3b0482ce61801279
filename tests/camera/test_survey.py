import numpy as np
import pytest
from scipy import ndimage

from patchlab import store
from patchlab.camera import measure_noise, survey
from patchlab.errors import InputError, Interrupted
from patchlab.types import InputContract, Survey


@pytest.fixture(scope="module")
def folder(bench):
    contract = bench.contract(8, black=8)
    lights = bench.photos(10)
    lights[4] = ndimage.gaussian_filter(lights[4], 2.5)
    return bench.folder(lights, contract, 0.5, 1.0, blur=0.7)


@pytest.fixture(scope="module")
def found(folder):
    return survey(lambda: iter(folder), folder[0].contract)


def test_a_survey_tells_everything(found):
    assert isinstance(found, Survey)
    assert found.frames == 10
    assert found.noise.gain == pytest.approx(0.5, rel=0.05)
    assert found.table.kind == "stabilised"
    assert found.table.noise_sd == 1
    assert 0.6 < found.blur_sigma_px < 1.1
    assert 1.6 < found.spectrum_exponent < 3.2
    assert found.spectrum_frequency.shape == found.spectrum_power.shape
    assert found.distrusted == (("04.png", "blurred"),)
    assert found.edge_widths_px.size > 20
    assert found.noise.points.shape[1] == 2


def test_the_noise_floor_joins_the_spectrum(found):
    # beyond the frequency told, the folder's power stays within a factor of the noise's
    over = found.spectrum_frequency > 0.45
    assert found.noise_power < 1.3 * found.spectrum_power[over].min()
    if found.noise_overtakes_cpp is not None:
        at = np.interp(found.noise_overtakes_cpp, found.spectrum_frequency, found.spectrum_power)
        assert at <= 2 * found.noise_power * 1.05


def test_a_survey_survives_the_disk(found, tmp_path):
    store.save(tmp_path / "survey", "survey", found)
    again, _ = store.load(tmp_path / "survey", "survey")
    assert store.pack(again)[1] == store.pack(found)[1]
    assert again.marks == found.marks
    assert again.distrusted == found.distrusted


def test_the_same_frames_give_the_same_bytes(folder, found):
    again = survey(lambda: list(folder), folder[0].contract)
    assert store.pack(again) == store.pack(found)


def test_a_folder_that_cannot_tell_gets_a_linear_table(bench):
    contract = bench.contract(8)
    frames = bench.folder(bench.textures(), contract, 0.1, 0.3)
    found = survey(lambda: frames, contract)
    assert not found.noise.measurable
    assert found.table.kind == "linear"
    assert found.table.noise_sd is None
    assert found.noise_power is None
    with pytest.raises(InputError, match="--table linear"):
        survey(lambda: frames, contract, kind="stabilised")


def test_static_and_dark_frames_are_preferred(bench):
    contract = bench.contract(12, black=100)
    frames = bench.folder(bench.photos(3), contract, 0.5, 2.0)
    light = bench.light("astronaut.png")
    scene = [
        bench.frame(bench.expose(light, contract, 0.5, 2.0, k), contract, str(k)) for k in range(2)
    ]
    dark = bench.folder([np.zeros((128, 128))] * 3, contract, 0.5, 2.0)
    found = survey(lambda: frames, contract, static=[scene], dark=dark)
    assert found.noise.source == "static"
    assert found.noise.gain == pytest.approx(0.5, rel=0.03)
    assert found.noise.read_noise == pytest.approx(2.0, rel=0.03)
    assert {m.found for m in found.marks} == {None}


def test_a_callback_may_stop_it(folder):
    def stop(stage, done, total, note=""):
        raise Interrupted(f"{stage} {done}")

    with pytest.raises(Interrupted, match="survey 1"):
        survey(lambda: folder, folder[0].contract, progress=stop)


@pytest.mark.parametrize("bits", [10, 12])
def test_codes_far_below_the_white_level_ask_for_it(bench, bits):
    wide = bench.contract(16)
    frames = bench.folder(bench.photos(3), bench.contract(bits), 0.5, 1.0)
    frames = [bench.frame(f.pixels, wide, f.path) for f in frames]
    told = survey(lambda: frames, wide)
    (note,) = told.notes
    assert f"if the camera has {bits} bits, give --white {2**bits - 1}" in note
    assert told.contract == wide  # told, not decided
    frames[1].pixels[5, 5] = 2**12
    assert survey(lambda: frames, wide).notes == ()


@pytest.mark.parametrize("shape", [(20, 20), (12, 200), (2, 300), (31, 31)])
def test_frames_too_small_to_measure_in_leave_a_survey_without_numbers(bench, shape):
    contract = bench.contract(8)
    rng = np.random.default_rng(3)
    frames = [bench.frame(rng.integers(20, 200, shape), contract, f"{k:02d}.png") for k in range(9)]
    told = survey(lambda: frames, contract)
    assert told.noise.reason == "not measurable here: every frame is smaller than 32 x 32 pixels"
    assert told.blur_sigma_px is None
    assert told.blur_note == told.noise.reason
    assert len(told.marks) == 12
    assert {mark.found for mark in told.marks} == {None}
    assert told.table.kind == "linear"
    assert (told.frames, told.distrusted) == (9, ())


def test_small_frames_among_larger_ones_are_passed_over(bench, folder, found):
    tiny = bench.frame(np.full((20, 20), 90), folder[0].contract, "tiny.png")
    told = survey(lambda: [*folder, tiny], folder[0].contract)
    assert told.noise.gain == found.noise.gain
    assert told.blur_sigma_px == found.blur_sigma_px
    assert [m.name for m in told.marks] == [m.name for m in found.marks]


@pytest.mark.parametrize("top", [1e30, 3e38])
def test_enormous_floats_are_refused_without_a_warning(bench, top):
    contract = InputContract("float32", 0.0, 1.0)
    frames = [bench.frame(top * light, contract) for light in bench.photos(2)]
    told = survey(lambda: frames, contract)
    assert not told.noise.measurable
    assert told.noise.reason.startswith("not measurable here")
    assert told.table.kind == "identity"


def test_one_enormous_value_does_not_hide_the_noise(bench):
    contract = InputContract("float32", 0.0, 1.0)
    eight = bench.contract(8)
    frames = [
        bench.frame(f.pixels / 255, contract, f.path)
        for f in bench.folder(bench.photos(10), eight, 0.5, 1.0, blur=0.7)
    ]
    before = measure_noise(frames)
    assert before.measurable
    frames[0].pixels[100, 100] = 1e30
    after = measure_noise(frames)
    assert after.gain == pytest.approx(before.gain, rel=0.01)
