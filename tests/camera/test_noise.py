import numpy as np
import pytest
from scipy import ndimage

from patchlab.camera import measure_noise, measure_noise_dark, measure_noise_static
from patchlab.camera.flat import flat_blocks, flat_law
from patchlab.camera.pixels import Region, diagonal_band, regions
from patchlab.conventions import srgb_encode
from patchlab.errors import InputError
from patchlab.types import InputContract

# EMVA 1288 cameras: bits, DN per electron, read noise in DN
CAMERAS = [(8, 0.5, 1.0), (8, 0.1, 1.0), (10, 1.0, 3.0), (12, 2.0, 4.0)]


def smooth(codes):
    return ndimage.uniform_filter(codes, 3)


def sharpen(codes):
    return codes + 0.5 * (codes - ndimage.gaussian_filter(codes, 1.0))


def sensor_sd(noise, bench_gain, read, contract, power=1.0):
    """Ratio of the told to the true sd from 10 % of the range up."""
    span = contract.white - contract.black
    levels = contract.black + span * np.linspace(0.1, 0.8, 8)
    truth = np.sqrt(power * (bench_gain * (levels - contract.black) + read**2) + 1 / 12)
    return np.interp(levels, noise.levels, noise.sd) / truth


@pytest.mark.parametrize(("sd", "variance"), [(0.5, 0.341), (1.0, 1.082), (2.0, 4.10)])
def test_rounding_adds_a_twelfth_where_noise_is_half_a_code_and_more(sd, variance):
    # the quantiser's law; at 0.1 to 0.3 codes it fails, which is why faint noise is refused
    draws = np.random.default_rng(1).normal(0.37, sd, 400_000)
    assert np.var(np.round(draws)) == pytest.approx(variance, rel=0.02)
    assert variance == pytest.approx(sd**2 + 1 / 12, rel=0.03)


def donoho_sd(plane):
    """Donoho and Johnstone 1994: median |HH| / 0.6744898 of Daubechies' four-tap wavelet."""
    r = np.sqrt(3)
    high = np.array([1 - r, -(3 - r), 3 + r, -(1 + r)]) / (4 * np.sqrt(2))
    across = ndimage.correlate1d(ndimage.correlate1d(plane, high, 0), high, 1)
    return np.median(np.abs(across[::2, ::2])) / 0.6744898


def test_the_diagonal_band_has_unit_gain_and_is_blind_to_planes():
    # Immerkaer 1996
    noise = np.random.default_rng(2).normal(0, 2.0, (1024, 1024)).astype(np.float32)
    band = diagonal_band(noise)[1:-1, 1:-1]
    assert np.sqrt(np.pi / 2) * np.abs(band).mean() == pytest.approx(2.0, rel=0.005)
    assert np.sqrt((band**2).mean()) == pytest.approx(donoho_sd(noise), rel=0.01)
    y, x = np.mgrid[:40, :50].astype(np.float32)
    assert np.abs(diagonal_band(3 * x - 2 * y + 7)[2:-2, 2:-2]).max() < 1e-4


@pytest.mark.parametrize(("bits", "gain", "read"), CAMERAS)
def test_gain_and_read_noise_come_back_from_photographs(bench, bits, gain, read):
    contract = bench.contract(bits, black=2.0 ** (bits - 5))
    noise = measure_noise(bench.folder(bench.photos(11), contract, gain, read, seed=bits))
    assert noise.measurable, noise.reason
    assert noise.gain == pytest.approx(gain, rel=0.05)
    assert noise.read_noise == pytest.approx(read, rel=0.1)
    assert abs(noise.gain - gain) < 3.5 * noise.gain_error
    assert noise.gain_error < 0.05 * noise.gain
    assert noise.autocovariance is None
    assert np.abs(sensor_sd(noise, gain, read, contract) - 1).max() < 0.03


def test_float_pixels_give_the_law_in_their_own_units(bench):
    # one DN of a 12-bit range is 1/4095 here
    contract = InputContract("float32", 0.0, 1.0)
    sensor = bench.contract(12, black=200.0)
    frames = [
        bench.frame((f.pixels - 200.0) / 3895, contract, f.path)
        for f in bench.folder(bench.photos(10), sensor, 2.0, 4.0)
    ]
    noise = measure_noise(frames)
    assert noise.measurable, noise.reason
    assert noise.gain == pytest.approx(2.0 / 3895, rel=0.06)


@pytest.mark.parametrize(("bits", "gain", "read"), [(8, 0.5, 1.0), (12, 1.0, 6.0)])
def test_a_folder_of_nothing_but_texture_is_refused(bench, bits, gain, read):
    contract = bench.contract(bits, black=2.0 ** (bits - 5))
    noise = measure_noise(bench.folder(3 * bench.textures(), contract, gain, read))
    assert not noise.measurable
    assert noise.reason.startswith("not measurable here")
    assert noise.gain is None
    assert noise.sd.size == 0


@pytest.mark.parametrize("quality", [95, 80])
def test_compression_below_its_noise_is_refused(bench, quality):
    contract = bench.contract(8)
    frames = bench.folder(bench.photos(10), contract, 0.05, 1.0, post=bench.jpeg(quality))
    noise = measure_noise(frames)
    assert not noise.measurable
    assert "compression" in noise.reason or "texture" in noise.reason


def test_noise_below_a_code_is_refused(bench):
    contract = bench.contract(8, black=8)
    noise = measure_noise(bench.folder(bench.photos(8), contract, 0.0005, 0.1))
    assert not noise.measurable


def test_coded_pixels_give_a_curve(bench):
    # truth by the delta method: sd of the code is the slope of the coding times sd in light
    contract = bench.contract(8, transfer="srgb")
    gain, read = 0.5, 1.0
    noise = measure_noise(bench.folder(bench.photos(11), contract, gain, read))
    assert noise.measurable, noise.reason
    assert noise.gain is None
    use = (noise.levels > 60) & (noise.levels < 230)
    codes = np.arange(256.0)
    light = contract.light(codes)
    slope = np.interp(noise.levels[use], codes, np.gradient(codes, light))
    here = np.interp(noise.levels[use], codes, light)
    truth = np.sqrt((slope / 255) ** 2 * (gain * 255 * here + read**2) + 1 / 12)
    ratio = noise.sd[use] / truth
    assert ratio.min() > 0.92
    assert ratio.max() < 1.08
    assert np.median(ratio) == pytest.approx(1.0, abs=0.03)


def test_smoothed_noise_is_told_with_its_colour(bench):
    contract = bench.contract(10, black=32)
    noise = measure_noise(bench.folder(bench.photos(11), contract, 1.0, 3.0, post=smooth))
    assert noise.measurable, noise.reason
    assert noise.gain is None
    assert noise.autocovariance[3, 4] == pytest.approx(2 / 3, abs=0.12)
    assert noise.autocovariance[3, 3] == 1
    np.testing.assert_allclose(noise.autocovariance, noise.autocovariance[::-1, ::-1], atol=1e-12)
    assert np.abs(sensor_sd(noise, 1.0, 3.0, contract, power=1 / 9) - 1).max() < 0.08


def test_sharpened_noise_has_negative_neighbours_and_no_gain(bench):
    contract = bench.contract(10, black=32)
    noise = measure_noise(bench.folder(bench.photos(11), contract, 1.0, 3.0, post=sharpen))
    assert noise.measurable, noise.reason
    assert noise.gain is None
    assert noise.autocovariance[3, 4] < -0.03
    impulse = np.zeros((65, 65))
    impulse[32, 32] = 1
    power = float((sharpen(impulse) ** 2).sum())
    assert np.abs(sensor_sd(noise, 1.0, 3.0, contract, power) - 1).max() < 0.05


def test_flat_blocks_of_white_noise_are_white(bench):
    codes = np.random.default_rng(5).normal(500, 5, (720, 720)).astype(np.float32)
    blocks, looked = flat_blocks(Region("a", codes, np.ones(codes.shape, bool)))
    law = flat_law(blocks, looked, share=0.2)
    off = law.autocovariance.copy()
    off[3, 3] = 0
    assert np.abs(off).max() < 0.03
    assert law.agreeing > 0.95
    assert np.median(law.variance) == pytest.approx(25, rel=0.04)


def test_the_measurement_does_not_depend_on_the_order_of_frames(bench):
    contract = bench.contract(8, black=8)
    frames = bench.folder(bench.photos(5), contract, 2.0, 1.5)
    one, two = measure_noise(frames), measure_noise(frames[::-1])
    assert one.gain == pytest.approx(two.gain, rel=1e-9)
    assert measure_noise(iter(frames)).gain == one.gain


def test_mixed_cameras_are_an_error(bench):
    one, two = bench.contract(8), bench.contract(8, black=4)
    frames = [bench.frame(np.full((64, 64), 9), c, f"{c.black}.png") for c in (one, two)]
    with pytest.raises(InputError, match=r"^4\.png"):
        measure_noise(frames)
    with pytest.raises(InputError, match="no frame"):
        measure_noise([])


def test_large_frames_are_measured_on_aligned_tiles(bench):
    frame = bench.frame(np.full((1600, 2400), 100), bench.contract(8))
    found = list(regions(frame))
    assert len(found) == 8
    assert sum(r.codes.size for r in found) <= 1 << 21
    assert all(r.codes.shape == (512, 512) for r in found)


def test_pixels_near_a_clip_or_a_mask_are_not_used(bench):
    codes = np.full((64, 64), 100)
    codes[30, 30] = 255
    region = next(regions(bench.frame(codes, bench.contract(8))))
    assert not region.usable[26:35, 26:35].any()
    assert region.usable[25, 30]
    assert not region.usable[:8].any()


@pytest.mark.parametrize(("bits", "gain", "read"), [(10, 0.25, 2.0), (12, 1.0, 6.0)])
def test_static_pairs(bench, bits, gain, read):
    contract = bench.contract(bits, black=2.0 ** (bits - 5))
    scenes = [
        [bench.frame(bench.expose(x, contract, gain, read, 10 * i + k), contract, f"{i}{k}")
         for k in range(2)]
        for i, x in enumerate(bench.photos(4))
    ]  # fmt: skip
    noise = measure_noise_static(scenes)
    assert noise.measurable, noise.reason
    assert noise.source == "static"
    assert noise.gain == pytest.approx(gain, rel=0.02)
    assert noise.read_noise == pytest.approx(read, rel=0.1)
    assert noise.autocovariance is None


def test_standard_errors_of_static_pairs_are_honest(bench):
    # two standard errors hold the truth 95 times in 100; 20 of 24 and fewer comes once in 40
    inside = 0
    for k, (bits, gain, read) in enumerate([(8, 0.5, 1.0), (8, 0.2, 1.5), (10, 1.0, 3.0)] * 4):
        contract = bench.contract(bits, black=2.0 ** (bits - 4))
        light = [x[:256, :256] for x in bench.photos(3, start=k)]
        scenes = [
            [bench.frame(bench.expose(x, contract, gain, read, 100 * k + 2 * i + j), contract)
             for j in range(2)]
            for i, x in enumerate(light)
        ]  # fmt: skip
        noise = measure_noise_static(scenes)
        inside += abs(noise.gain - gain) < 2 * noise.gain_error
        inside += abs(noise.read_noise - read) < 2 * noise.read_noise_error
    assert inside >= 20


def test_static_pairs_of_coded_pixels_give_a_curve(bench):
    contract = bench.contract(8, transfer="srgb")
    scenes = [
        [bench.frame(bench.expose(x, contract, 0.5, 1.0, 2 * i + j), contract) for j in range(2)]
        for i, x in enumerate(bench.photos(3))
    ]
    noise = measure_noise_static(scenes)
    assert noise.measurable
    assert noise.gain is None
    # sd of the code by the slope of the sRGB curve, at 0.2 of the light (0.9 exposed)
    light = np.array([0.2, 0.201])
    slope = np.diff(srgb_encode(light))[0] / 0.001
    sd = np.hypot(slope * np.sqrt(0.5 * 0.2 * 255 + 1), np.sqrt(1 / 12))
    at = 255 * srgb_encode(light)[0]
    assert np.interp(at, noise.levels, noise.sd) == pytest.approx(sd, rel=0.05)


def test_static_pairs_tell_smoothed_noise_and_refuse_flat_scenes(bench):
    contract = bench.contract(10, black=32)
    rng = np.random.default_rng(3)
    flat = [
        bench.frame(np.round(smooth(rng.normal(500, 30, (300, 300)))), contract, str(k))
        for k in range(2)
    ]
    assert not measure_noise_static([flat]).measurable
    light = bench.light("astronaut.png")
    scene = [
        bench.frame(bench.expose(light, contract, 1.0, 3.0, k, post=smooth), contract, str(k))
        for k in range(3)
    ]
    noise = measure_noise_static([scene])
    assert noise.autocovariance[3, 4] == pytest.approx(2 / 3, abs=0.03)
    with pytest.raises(InputError, match="two frames"):
        measure_noise_static([scene[:1]])
    small = bench.frame(np.full((64, 64), 9), contract, "small")
    with pytest.raises(InputError, match="64 x 64"):
        measure_noise_static([[scene[0], small]])


def test_dark_frames(bench):
    contract = bench.contract(12, black=100)
    dark = np.zeros((256, 256))
    frames = bench.folder([dark] * 4, contract, 1.0, 2.5)
    noise = measure_noise_dark(frames)
    assert noise.read_noise == pytest.approx(2.5, rel=0.02)
    assert abs(noise.read_noise - 2.5) < 4 * noise.read_noise_error
    assert noise.levels[0] == pytest.approx(100, abs=0.1)
    assert measure_noise_dark(frames[:1]).read_noise == pytest.approx(2.5, rel=0.03)
    quiet = bench.folder([dark] * 2, contract, 1.0, 0.2)
    assert "quantisation" in measure_noise_dark(quiet).reason
    clipped = bench.folder([dark] * 2, bench.contract(12), 1.0, 2.5)
    assert "black level" in measure_noise_dark(clipped).reason
