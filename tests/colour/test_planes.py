"""Pixels with colours: how they are stored, read, drawn as patches, and surveyed."""

import io

import numpy as np
import pytest
from PIL import Image

from patchlab import camera, images
from patchlab.conventions import COLOUR_FORMATS, pixel_format, rgb_weights
from patchlab.errors import InputError, UsageError
from patchlab.images.coloured import expose_colour, glazed
from patchlab.images.demo import tile_works
from patchlab.images.planes import one_plane
from patchlab.images.sample import SampleSettings, sample
from patchlab.images.scenes import Camera, dead_leaves
from patchlab.learn import noise_covariance, whiten
from patchlab.types import Frame, InputContract, InputTable


def png(array):
    out = io.BytesIO()
    Image.fromarray(array).save(out, "PNG")
    return out.getvalue()


def read(array, **options):
    return images.decode(png(array), "a.png", images.ReadOptions(planes="colour", **options))[0]


def frame(pixels, name="RGB8", path="f"):
    form = pixel_format(name)
    return Frame(path, pixels, InputContract(name, 0.0, float(form.full_scale)))


def identity(name):
    form = pixel_format(name)
    values = np.arange(1 << form.bits, dtype=np.float32)
    return InputTable("identity", InputContract(name, 0.0, float(form.full_scale)), values, None)


@pytest.fixture(scope="module")
def picture():
    return np.random.default_rng(3).integers(20, 230, (40, 50, 3)).astype(np.uint8)


@pytest.mark.parametrize("name", COLOUR_FORMATS)
def test_a_stored_picture_is_its_samples(name):
    form = pixel_format(name)
    samples = np.arange(3 * 5 * form.planes).reshape(3, 5, form.planes).astype(form.dtype)
    stored = form.joined(samples)
    assert stored.shape == form.stored((3, 5))
    assert form.size_of(stored) == (3, 5)
    np.testing.assert_array_equal(form.split(stored), samples)


def test_a_cell_is_read_row_by_row():
    mosaic = np.arange(24, dtype=np.uint16).reshape(4, 6)
    cells = pixel_format("BayerGR12").split(mosaic)
    for place in range(4):
        np.testing.assert_array_equal(cells[..., place], mosaic[place // 2 :: 2, place % 2 :: 2])


def test_weights_take_every_format_to_the_same_colours(picture):
    wanted = picture[:4, :4].astype(float)
    for name, order in (("RGB8", [0, 1, 2]), ("BGR8", [2, 1, 0])):
        found = wanted[..., order] @ rgb_weights(pixel_format(name).colours).T
        np.testing.assert_array_equal(found, wanted)
    cell = rgb_weights("GBRG") @ np.array([10.0, 3.0, 200.0, 20.0])
    np.testing.assert_allclose(cell, [200, 15, 3])


def test_a_colour_file_keeps_its_samples_in_the_order_asked_for(picture):
    kept = read(picture)
    assert kept.contract.pixels == "RGB8"
    assert kept.contract.transfer == "srgb"
    assert kept.shape == (40, 50)
    np.testing.assert_array_equal(kept.pixels, picture)
    np.testing.assert_array_equal(read(picture, pixels="BGR8").pixels, picture[..., ::-1])


def test_a_clipped_sample_makes_its_pixel_invalid(picture):
    clipped = picture.copy()
    clipped[7, 9, 2] = 255
    where = np.argwhere(read(clipped).invalid)
    assert where.tolist() == [[7, 9]]


def test_a_mosaic_is_read_as_cells():
    codes = np.arange(8 * 12, dtype=np.uint16)
    layout = images.RawLayout("BayerGB12", 12, 8)
    options = images.ReadOptions(planes="colour", raw=layout)
    (kept,) = images.decode(codes.astype("<u2").tobytes(), "a.raw", options)
    assert kept.contract.pixels == "BayerGB12"
    assert kept.shape == (4, 6)
    np.testing.assert_array_equal(kept.pixels, codes.reshape(8, 12))
    np.testing.assert_array_equal(one_plane(kept).pixels, codes.reshape(8, 12)[::2, ::2])
    np.testing.assert_array_equal(one_plane(kept, 1).pixels, codes.reshape(8, 12)[::2, 1::2])


@pytest.mark.parametrize("orientation", range(1, 9))
def test_orientation_turns_all_samples_alike(picture, orientation):
    exif = Image.Exif()
    exif[274] = orientation
    out = io.BytesIO()
    Image.fromarray(picture).save(out, "PNG", exif=exif)
    options = images.ReadOptions(planes="colour")
    turned = images.decode(out.getvalue(), "a.png", options)[0].pixels
    alone = io.BytesIO()
    Image.fromarray(picture[..., 1].copy()).save(alone, "PNG", exif=exif)
    np.testing.assert_array_equal(
        turned[..., 1], images.decode(alone.getvalue(), "g.png")[0].pixels
    )


@pytest.mark.parametrize(
    ("array", "options", "told"),
    [
        (np.zeros((20, 20), np.uint8), {}, "no colours"),
        (np.zeros((20, 20, 3), np.uint8), {"pixels": "BayerRG8"}, "cannot be BayerRG8"),
    ],
)
def test_pictures_without_the_colours_asked_for_are_refused(array, options, told):
    with pytest.raises(InputError, match=told):
        read(array, **options)


def test_colour_pixels_need_colour_planes():
    with pytest.raises(UsageError, match="--planes colour"):
        images.ReadOptions(pixels="RGB8")


# ---------------------------------------------------------------- patches


def test_a_row_holds_the_patch_with_its_samples_side_by_side(picture):
    settings = SampleSettings(size=8, patches=40, flat_fraction=0.0, normalise=False)
    found = sample([frame(picture)], identity("RGB8"), settings, count_frames=1)
    assert found.planes == 3
    assert found.dc.shape == (len(found), 3)
    for row, dc, (y, x) in zip(found.patches, found.dc, found.origin, strict=True):
        tile = picture[y : y + 8, x : x + 8].astype(np.float64)
        np.testing.assert_allclose(row.reshape(8, 8, 3) + dc, tile, atol=1e-4)


def test_the_mean_of_every_plane_is_gone_exactly(picture):
    settings = SampleSettings(size=8, patches=600, flat_fraction=0.0)
    pictures = [frame(picture), frame(picture[::-1].copy(), path="g")]
    found = sample(pictures, identity("RGB8"), settings, count_frames=2)
    assert np.abs(found.patches.reshape(-1, 64, 3).mean(axis=1)).max() < 1e-6
    known = whiten(found, retain=1.0)
    planes = np.tile(np.eye(3), (64, 1))
    assert np.abs(known.K @ planes).max() < 1e-12 * np.abs(known.K).max()
    assert known.rank == 3 * 63
    assert known.planes == 3
    assert known.spectrum[-3:].tolist() == [0, 0, 0]


def test_one_colour_everywhere_is_flat_whatever_the_colour():
    flat = np.broadcast_to(np.array([200, 90, 30], np.uint8), (30, 30, 3)).copy()
    with pytest.raises(InputError, match="flat"):
        sample([frame(flat)], identity("RGB8"), SampleSettings(size=8), count_frames=1)


def test_equal_planes_draw_the_patches_of_one_plane(picture):
    """Three equal planes say what one says: the same places, the same normalised patches."""
    grey = picture[..., 0].copy()
    settings = SampleSettings(size=8, patches=100)
    one = sample(
        [Frame("f", grey, InputContract("Mono8", 0, 255))], identity("Mono8"), settings,
        count_frames=1,
    )  # fmt: skip
    all_three = sample([frame(np.stack([grey] * 3, 2))], identity("RGB8"), settings, count_frames=1)
    np.testing.assert_array_equal(one.origin, all_three.origin)
    for plane in np.moveaxis(all_three.patches.reshape(-1, 64, 3), 2, 0):
        np.testing.assert_allclose(plane, one.patches, atol=2e-6)


def test_noise_of_patches_is_that_of_every_sample(picture):
    settings = SampleSettings(size=8, patches=300, normalise=False)
    found = sample([frame(picture)], identity("RGB8"), settings, count_frames=1)
    sds = np.array([1.0, 2.0, 0.5])
    covariance = noise_covariance(found, 1.0, None, sds)
    np.testing.assert_allclose(np.diag(covariance).reshape(64, 3), np.tile(sds**2, (64, 1)))
    drawn = np.random.default_rng(0).normal(size=(4000, 64, 3)) * sds
    measured = np.cov(drawn.reshape(4000, -1).T)
    assert np.abs(measured - covariance).max() < 0.45  # five standard errors of the largest


# ---------------------------------------------------------------- the camera


def test_glazes_of_no_strength_leave_three_equal_scenes():
    scene = tile_works("wall", 1)
    red, green, blue = glazed(scene, 0.0)
    assert red == green == blue
    tones = [[leaf.paint.tone for leaf in s.leaves] for s in glazed(scene, 0.7)]
    assert np.abs(np.diff(tones, axis=0)).max() > 0.1


def test_a_mosaic_takes_each_sample_where_it_lies():
    """Without noise, a place of the mosaic is that place of the colour picture."""
    scene = dead_leaves(4, (24, 32), smallest=6.0, largest=20.0)
    quiet = Camera(bits=12, gain=4.0, full_well=1000.0, read_noise=0.0, neighbour=0.0)
    frame, clean = expose_colour(scene, quiet, light=1e-9 + 900.0, pixels="BayerGB12")
    cells = frame.contract.format.split(frame.pixels).astype(float)
    for place, letter in enumerate("GBRG"):
        row, column = divmod(place, 2)
        wanted = 4.0 * clean[row::2, column::2, "RGB".index(letter)]
        spread = 4.0 * np.sqrt(wanted / 4.0)  # photon noise
        assert np.abs((cells[..., place] - wanted) / spread).max() < 5
    with pytest.raises(UsageError, match="gives no RGB8"):
        expose_colour(scene, quiet, light=900.0, pixels="RGB8")


def test_noise_of_amplified_colours_is_measured_through_the_table():
    """A white balance by gains of 1.69 and 1 makes noise of sd 1.3 and 1 where photons rule."""
    gains, rng = np.array([1.69, 1.0, 1.0]), np.random.default_rng(2)
    frames = []
    for k in range(3):
        electrons = np.kron(rng.uniform(60, 800, (10, 12)), np.ones((40, 40)))[..., None] / gains
        noisy = rng.poisson(electrons) + 2.0 * rng.normal(size=electrons.shape)
        codes = np.clip(np.rint(0.25 * gains * noisy), 0, 255).astype(np.uint8)
        frames.append(frame(codes, path=str(k)))
    mono = [one_plane(f) for f in frames]
    law = camera.measure_noise(mono)
    assert law.measurable
    table = camera.make_table("stabilised", mono[0].contract, law)
    each = ({s: one_plane(f, s) for s in range(3)} for f in frames)
    found, note = camera.sample_noise(each, table, 3)
    np.testing.assert_allclose(found, [1.3, 1.0, 1.0], rtol=0.06)
    assert not note
