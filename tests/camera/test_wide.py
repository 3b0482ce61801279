"""Shading, fixed spots, lost depth, and several cameras in one folder.

Folders are random crops of seven photographs and three textures.
"""

import numpy as np
import pytest

from patchlab.camera import find_marks, survey
from patchlab.camera.wide import lost_bits, shading
from patchlab.errors import InputError

HEIGHT, WIDTH = 200, 260
SHOWN = ("camera.png", "coins.png", "flower.jpg", "ihc.png", "moon.png", "motorcycle_right.png",
         "retina.jpg", "grass.png", "gravel.png", "brick.png")  # fmt: skip
NEW = {"posterised_depth", "fixed_spots", "vignetting"}
CAMERAS = [(8, 0.5), (8, 0.2), (10, 1.0)]


def corners(lost):
    y, x = np.mgrid[:HEIGHT, :WIDTH]
    cy, cx = (HEIGHT - 1) / 2, (WIDTH - 1) / 2
    return 1 - lost * ((y - cy) ** 2 + (x - cx) ** 2) / (cy**2 + cx**2)


def folder(bench, seed, lost=0.0, spots=0, step=1):
    """Ten crops through a camera that shades, has spots, or drops codes."""
    rng = np.random.default_rng(seed)
    bits, gain = CAMERAS[seed % len(CAMERAS)]
    contract = bench.contract(bits, black=8)
    at = rng.integers(0, (HEIGHT, WIDTH), (spots, 2))
    frames = []
    for k in range(10):
        light = bench.light(SHOWN[rng.integers(len(SHOWN))])
        y, x = (rng.integers(0, n - m + 1) for n, m in zip(light.shape, (HEIGHT, WIDTH)))  # noqa: B905
        light = light[y : y + HEIGHT, x : x + WIDTH] * corners(lost)
        codes = bench.expose(light, contract, gain, 1.5, rng.integers(1 << 30))
        codes[at[:, 0], at[:, 1]] += contract.white / 4
        codes = step * np.round(np.clip(codes, 0, contract.white) / step)
        codes = np.minimum(codes, contract.white)
        frames.append(bench.frame(codes, contract, f"{k}.png"))
    return frames


def found(frames):
    return {m.name: m for m in find_marks(frames, None) if m.name in NEW}


@pytest.mark.parametrize("seed", range(4))
def test_clean_folders_have_none_of_them(bench, seed):
    marks = found(folder(bench, seed))
    assert set(marks) == NEW
    assert not any(m.found for m in marks.values())


@pytest.mark.parametrize("seed", range(10, 13))
def test_each_is_found_alone(bench, seed):
    for name, words in (
        ("vignetting", {"lost": 0.5}),
        ("fixed_spots", {"spots": 8}),
        ("posterised_depth", {"step": 4}),
    ):
        marks = found(folder(bench, seed, **words))
        assert [m.name for m in marks.values() if m.found] == [name]
        assert marks[name].value > marks[name].threshold
        assert marks[name].remedy


def test_the_light_lost_is_told(bench):
    marks = found(folder(bench, 21, lost=0.5))
    assert marks["vignetting"].value == pytest.approx(0.42, abs=0.12)


def test_shading_near_the_threshold_cannot_be_told():
    assert shading(np.log(1 - np.full(10, 0.25)))[1] is None
    assert shading(np.log(1 - np.full(10, 0.35))) == (pytest.approx(0.35), True)
    assert shading(np.log(1 - np.full(10, 0.15))) == (pytest.approx(0.15), False)
    assert shading(np.full(10, np.nan)) == (0.0, None)
    assert shading(np.full(5, -0.5))[1] is None


def test_lost_bits_count_the_codes_between():
    full = np.full(4096, 1000)
    assert lost_bits(full) == 0
    coarse = np.zeros(4096, int)
    coarse[::16] = 1000
    assert lost_bits(coarse) == pytest.approx(4, abs=0.05)
    dim = np.zeros(65536, int)
    dim[300:400:9] = 3  # too few to say that the codes between are missing
    assert lost_bits(dim) == 0
    assert lost_bits(None) == 0


def test_two_cameras_in_one_folder_are_told_by_size_and_noise(bench):
    contract = bench.contract(8, black=8)
    first = bench.folder([x[:280, :300] for x in bench.photos(6)], contract, 0.5, 1.0)
    second = bench.folder([x[:260, :300] for x in bench.photos(6)], contract, 2.0, 3.0, seed=2)
    other = [bench.frame(f.pixels, contract, f"b{f.path}") for f in second]
    frames = first + other
    with pytest.raises(InputError, match=r"300 x 280 \(00.png\).*300 x 260 \(b00.png\).*differ"):
        survey(lambda: frames, contract)
    assert survey(lambda: frames, contract, mixed=True).frames == 12
    same = bench.folder([x[:260, :300] for x in bench.photos(6)], contract, 0.5, 1.0, seed=2)
    assert survey(lambda: first + same, contract).noise.gain == pytest.approx(0.5, rel=0.05)


def test_two_cameras_of_one_size_are_told_by_their_frames(bench):
    contract = bench.contract(8, black=8)
    light = [x[:280, :300] for x in bench.photos(10)]
    frames = bench.folder(light[:5], contract, 0.5, 1.0)
    other = bench.folder(light[5:], contract, 2.0, 2.0, seed=3)
    other = [bench.frame(f.pixels, contract, f"b{f.path}") for f in other]
    with pytest.raises(InputError, match=r"of different cameras or settings.*factor of [12]\."):
        survey(lambda: frames + other, contract)
    alone = bench.folder(light, contract, 0.5, 1.0, seed=3)
    assert survey(lambda: alone, contract).noise.measurable
