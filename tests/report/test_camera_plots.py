"""The survey's plots are pictures, and show the mark where it is."""

import io
from dataclasses import replace

import imageio.v3 as iio
import numpy as np
import pytest
from PIL import Image
from scipy import ndimage
from scipy.special import ndtr

from patchlab.camera import make_table, slanted_edge
from patchlab.report import camera
from patchlab.types import Frame, InputContract, Mark, NoiseModel, Survey

CONTRACT = InputContract("Mono8", 8, 255)
LEVELS = np.linspace(8, 240, 30)
LAW = NoiseModel(
    True, gain=0.5, gain_error=0.01, read_noise=1.5, read_noise_error=0.05, levels=LEVELS,
    sd=np.sqrt(0.5 * (LEVELS - 8) + 2.3), points=np.stack([LEVELS, 0.7 * LEVELS**0.5], 1),
)  # fmt: skip
FREQUENCY = np.linspace(0, 0.5, 65)
SURVEY = Survey(
    CONTRACT, LAW, make_table("stabilised", CONTRACT, LAW), 0.8, "", 2.1, 0.2,
    spectrum_frequency=FREQUENCY, spectrum_power=1e-3 / (FREQUENCY + 1e-3) ** 2 + 1e-3,
    noise_power=1e-3, noise_overtakes_cpp=0.4, edge_widths_px=np.linspace(0.7, 1.6, 90),
)  # fmt: skip


def size(data):
    with Image.open(io.BytesIO(data)) as image:
        assert np.asarray(image.convert("L")).std() > 5
        return image.size


def marked(*names):
    return replace(SURVEY, marks=tuple(Mark(n, True, 1.0, 0.5, "", "") for n in names))


@pytest.fixture(scope="module")
def frame():
    rng = np.random.default_rng(2)
    scene = ndimage.gaussian_filter(rng.standard_normal((200, 240)), 5) * 250 + 120
    codes = np.clip(scene + rng.normal(0, 2, scene.shape), 0, 255).astype(np.uint8)
    squeezed = iio.imread(iio.imwrite("<bytes>", codes, extension=".jpg", quality=40))
    return Frame("a", np.ascontiguousarray(squeezed[3:, 6:]), CONTRACT)


@pytest.mark.parametrize("draw", [camera.noise_curve, camera.spectrum, camera.edge_spread])
def test_each_plot_is_a_picture_whatever_is_known(draw):
    assert min(size(draw(SURVEY))) > 250
    curve = replace(LAW, gain=None, gain_error=None, read_noise=None, read_noise_error=None)
    bare = replace(SURVEY, noise=curve, noise_power=None, noise_overtakes_cpp=None,
                   spectrum_exponent=None, blur_sigma_px=None)  # fmt: skip
    assert draw(bare) != draw(SURVEY)


def test_a_slanted_edge_is_drawn_with_its_transfer():
    y, x = np.mgrid[:90, :90] - 44.5
    plane = 30 + 180 * ndtr((x + 0.09 * y) / 0.8)
    edge = slanted_edge(Frame("e", np.rint(plane).astype(np.uint8), CONTRACT))
    width, height = size(camera.edge_spread(replace(SURVEY, slanted_edge=edge)))
    assert width > 2 * height


def test_marks_are_shown_on_crops_and_only_those_a_crop_can_show(frame):
    assert camera.mark_crops(SURVEY, frame) is None
    assert camera.mark_crops(marked("near_duplicates", "vignetting"), frame) is None
    one, three = (
        size(camera.mark_crops(marked(*names), frame))
        for names in (["block_grid"], ["block_grid", "clipped_levels", "fixed_spots"])
    )
    assert three[0] > 1.5 * one[0]


def test_the_grid_is_ticked_where_it_is(frame):
    assert camera.grid_phase(frame) == (5, 2)


def test_the_crop_of_spots_holds_the_spot(frame):
    pixels = frame.pixels.copy()
    pixels[150, 40] = 255
    spotted = replace(frame, pixels=pixels)
    codes = pixels.astype(float)
    mark = Mark("fixed_spots", True, 1.0, 0.5, "", "")
    rows, cols = camera._where(mark, codes, codes, spotted)
    assert rows.start <= 150 < rows.stop
    assert cols.start <= 40 < cols.stop
