import numpy as np
import pytest
from scipy import ndimage

from patchlab.camera import find_marks, measure_noise
from patchlab.camera.alike import likeness, near_duplicates, small_copy
from patchlab.camera.grid import GridMeter
from patchlab.camera.marks import missing_levels
from patchlab.camera.pixels import regions

CLEAN = {
    "block_grid", "row_noise", "column_noise", "interpolation_lattice", "clipped_levels",
    "missing_levels", "sharpening", "near_duplicates", "blurred_frames", "posterised_depth",
    "fixed_spots", "vignetting",
}  # fmt: skip


def stripes(axis, sd=1.0):
    def add(codes):
        shape = [1, 1]
        shape[axis] = codes.shape[axis]
        return codes + np.random.default_rng(7).normal(0, sd, shape)

    return add


def mosaic(codes):
    """One colour of a checkerboard, the other interpolated from its four neighbours."""
    y, x = np.indices(codes.shape)
    kernel = np.array([[0, 1, 0], [1, 4, 1], [0, 1, 0]]) / 4
    return ndimage.convolve(codes * ((x + y) % 2), kernel)


def sharpen(codes):
    return codes + (codes - ndimage.gaussian_filter(codes, 1.0))


def comb(codes):
    return 1.2 * np.round(codes - 2)


def bright(codes):
    return 2.5 * codes


@pytest.fixture(scope="module")
def judged(bench):
    """Marks of a folder of nine photographs by what the camera did to them."""

    def judge(post=None, transfer="linear", start=0, gain=0.5, count=9):
        black = 8 if transfer == "linear" else 0
        contract = bench.contract(8, black=black, transfer=transfer)
        frames = bench.folder(bench.photos(count, start), contract, gain, 1.0, start, 0.7, post)
        return {m.name: m for m in find_marks(frames, measure_noise(frames))}

    return judge


@pytest.mark.parametrize(("start", "transfer"), [(0, "linear"), (5, "srgb")])
def test_clean_folders_have_no_marks(judged, start, transfer):
    marks = judged(start=start, transfer=transfer)
    assert set(marks) == CLEAN
    for mark in marks.values():
        assert not mark.found, mark
        assert mark.effect
        assert mark.remedy


@pytest.mark.parametrize(
    ("post", "name"),
    [
        (stripes(0), "row_noise"),
        (stripes(1), "column_noise"),
        (mosaic, "interpolation_lattice"),
        (sharpen, "sharpening"),
        (comb, "missing_levels"),
        (bright, "clipped_levels"),
    ],
)
def test_tampered_folders_show_their_mark_alone(judged, post, name):
    marks = judged(post, start=5)
    assert marks[name].found is True
    others = {m.name for m in marks.values() if m.found} - {name}
    assert others <= {"clipped_levels"}  # stretched tones clip as well


@pytest.mark.parametrize("quality", [95, 50])
def test_block_compression_is_found(bench, judged, quality):
    marks = judged(bench.jpeg(quality), transfer="srgb", gain=0.1)
    assert marks["block_grid"].found is True
    assert marks["block_grid"].value > 1.2
    assert not marks["interpolation_lattice"].found
    assert not marks["row_noise"].found


def test_the_grid_s_phase_is_known(bench):
    contract = bench.contract(8)
    codes = bench.expose(bench.light("camera.png"), contract, 0.1, 1.0, 1)
    squeezed = bench.jpeg(75)(codes)[3:, 6:]
    meter = GridMeter()
    for region in regions(bench.frame(squeezed, contract)):
        meter.add(region)
    # blocks begin at rows 5, 13, ... and columns 2, 10, ...
    assert np.unravel_index(meter.phases.argmin(), (8, 8)) == (5, 2)


def test_few_frames_cannot_tell(bench):
    contract = bench.contract(8, black=8)
    frames = bench.folder(bench.photos(5), contract, 0.5, 1.0, post=stripes(0))
    marks = find_marks(frames, None)
    assert {m.found for m in marks} == {None}
    assert {m.name: m.value for m in marks}["row_noise"] > 0.05


def test_copies_and_blurred_frames_are_found(bench):
    contract = bench.contract(8, black=8)
    lights = bench.photos(10)
    lights[7] = ndimage.gaussian_filter(lights[7], 2.5)
    lights.append(lights[2])
    frames = bench.folder(lights, contract, 0.2, 1.0, blur=0.7)
    marks = {m.name: m for m in find_marks(frames, measure_noise(frames))}
    assert marks["near_duplicates"].value == pytest.approx(1 / 11)
    assert marks["blurred_frames"].value == pytest.approx(1 / 11)


def test_near_duplicates_keep_the_first(bench):
    contract = bench.contract(8, black=8)
    frames = bench.folder(bench.photos(2), contract, 0.2, 1.0, seed=1)
    again = bench.folder(bench.photos(2), contract, 0.2, 1.0, seed=2)
    copies = [small_copy(f) for f in (*frames, *again)]
    assert near_duplicates(copies).tolist() == [False, False, True, True]
    assert near_duplicates([]).tolist() == []


def test_a_copy_is_known_after_a_shift_and_in_another_light(bench):
    contract = bench.contract(8, black=8)
    light = bench.light("chelsea.png")
    frames = bench.folder([light[6:, 5:], 0.6 * light[:-6, :-5]], contract, 0.2, 1.0, blur=0.7)
    other = bench.folder([bench.light("coins.png")], contract, 0.2, 1.0, blur=0.7)
    one, two, three = (small_copy(f) for f in (*frames, *other))
    assert likeness(one, one) == pytest.approx(1)
    assert likeness(one, two) > 0.9
    assert likeness(one, three) < 0.5


def test_missing_levels_counts_only_what_is_due():
    full = np.full(256, 1000)
    assert missing_levels(full) == 0
    full[::5] = 0
    assert missing_levels(full) == pytest.approx(0.2, abs=0.03)
    rare = np.random.default_rng(1).poisson(0.5, 65536)
    assert missing_levels(rare) == 0
    twelve_in_sixteen = np.zeros(65536, int)
    twelve_in_sixteen[::16] = 5000
    assert missing_levels(twelve_in_sixteen) == pytest.approx(15 / 16, abs=0.01)
