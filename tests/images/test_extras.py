"""Camera raw (a DNG written here by hand) and video (encoded here)."""

import io
import sys

import av
import numpy as np
import pytest
import tifffile

from patchlab.errors import InputError
from patchlab.images import ReadOptions, decode, extras, iterate, list_photos, read_file, take_in

BLACK, WHITE = 64, 1023


def dng(mosaic, pattern=b"\x00\x01\x01\x02", black=(BLACK,) * 4):
    """A DNG (Adobe DNG specification 1.4): colour filter array, levels, a unit colour matrix."""
    unit = (1, 1, 0, 1, 0, 1, 0, 1, 1, 1, 0, 1, 0, 1, 0, 1, 1, 1)
    tags = [
        (50706, "B", 4, b"\x01\x04\x00\x00", True),  # DNGVersion
        (50708, "s", 0, "Ombrel K2 (invented)", True),  # UniqueCameraModel
        (33421, "H", 2, (2, 2), True),  # CFARepeatPatternDim
        (33422, "B", 4, pattern, True),  # CFAPattern: 0 red, 1 green, 2 blue
        (50713, "H", 2, (2, 2), True),  # BlackLevelRepeatDim
        (50714, "H", 4, black, True),  # BlackLevel
        (50717, "H", 1, WHITE, True),  # WhiteLevel
        (50721, "2i", 9, unit, True),  # ColorMatrix1
        (50728, "2I", 3, (1, 1, 1, 1, 1, 1), True),  # AsShotNeutral
        (50778, "H", 1, 21, True),  # CalibrationIlluminant1: D65
    ]
    buffer = io.BytesIO()
    tifffile.imwrite(
        buffer, mosaic, photometric=32803, extratags=tags, metadata=None, subfiletype=0
    )
    return buffer.getvalue()


@pytest.fixture(scope="module")
def mosaic():
    return np.random.default_rng(4).integers(70, 1000, (80, 96)).astype(np.uint16)


@pytest.mark.parametrize(
    ("pattern", "name"), [(b"\x00\x01\x01\x02", "RG"), (b"\x01\x02\x00\x01", "GB")]
)
def test_a_dng_gives_the_sensor_s_codes_and_levels(mosaic, pattern, name):
    data = dng(mosaic, pattern)
    frame = decode(data, "a.dng", ReadOptions(bayer="mosaic"))[0]
    assert np.array_equal(frame.pixels, mosaic)
    c = frame.contract
    assert (c.pixels, c.black, c.white, c.transfer) == ("Mono10", BLACK, WHITE, "linear")
    assert c.plane == f"Bayer{name} mosaic"
    green = decode(data, "a.DNG", ReadOptions())[0]
    start = {"RG": (0, 1), "GB": (1, 1)}[name]
    assert np.array_equal(green.pixels, mosaic[start[0] :: 2, start[1] :: 2])
    assert decode(data, "a.dng", ReadOptions(black=50))[0].contract.black == 50


def test_black_levels_of_the_colours_are_made_equal(mosaic):
    frame = decode(dng(mosaic, black=(64, 70, 70, 66)), "a.dng", ReadOptions(bayer="mosaic"))[0]
    assert frame.contract.black == 64
    moved = mosaic.astype(int)
    moved[::2, 1::2] -= 6
    moved[1::2, ::2] -= 6
    moved[1::2, 1::2] -= 2
    assert np.array_equal(frame.pixels, moved)
    assert any("made equal" in note for note in frame.notes)


def test_a_damaged_dng_is_put_aside(mosaic):
    with pytest.raises(InputError, match=r"a\.dng: the file is"):
        decode(dng(mosaic)[:900], "a.dng")


@pytest.mark.parametrize(
    ("package", "name", "extra"), [("rawpy", "a.dng", "raw"), ("av", "a.mkv", "video")]
)
def test_without_the_package_the_extra_is_named(monkeypatch, mosaic, package, name, extra):
    monkeypatch.setitem(sys.modules, package, None)
    with pytest.raises(InputError, match=rf"extra \[{extra}\].*patchlab-bank\[{extra}\]"):
        decode(dng(mosaic), name)


# ---------------------------------------------------------------- video


def film(pictures, codec, stored, given):
    """A small video of some pictures."""
    buffer = io.BytesIO()
    with av.open(buffer, "w", format="matroska") as container:
        stream = container.add_stream(codec, rate=10)
        stream.height, stream.width = pictures[0].shape[:2]
        stream.pix_fmt = stored
        for picture in pictures:
            frame = av.VideoFrame.from_ndarray(picture, format=given)
            container.mux(stream.encode(frame))
        container.mux(stream.encode(None))
    return buffer.getvalue()


def test_grey_video_keeps_its_codes(tmp_path):
    rng = np.random.default_rng(6)
    pictures = [rng.integers(0, 65536, (48, 64)).astype(np.uint16) for _ in range(5)]
    (tmp_path / "a.mkv").write_bytes(film(pictures, "ffv1", "gray16le", "gray16le"))
    intake = take_in(list_photos(tmp_path))
    frames = list(iterate(intake))
    assert [f.path for f in frames] == [f"a.mkv#{k}" for k in range(5)]
    for frame, picture in zip(frames, pictures, strict=True):
        assert np.array_equal(frame.pixels, picture)
        assert frame.contract.pixels == "Mono16"
        assert frame.contract.transfer == "linear"


def test_a_long_video_is_thinned_evenly_and_colour_is_srgb():
    pictures = [np.full((32, 48, 3), 40 + 2 * k, np.uint8) for k in range(80)]
    frames = decode(film(pictures, "ffv1", "bgr0", "rgb24"), "a.mkv")
    assert len(frames) == 32
    assert [int(f.pixels[0, 0]) for f in frames[:4]] == [40, 44, 50, 54]
    assert frames[0].contract.transfer == "srgb"
    assert frames[1].notes[0] == "frame 3 of 80 of a video"


def test_a_video_is_decoded_once_where_there_is_a_cache(tmp_path, monkeypatch):
    rng = np.random.default_rng(8)
    grey = [rng.integers(0, 4096, (48, 64)).astype(np.uint16) for _ in range(6)]
    colour = [rng.integers(0, 256, (32, 48, 3)).astype(np.uint8) for _ in range(4)]
    (tmp_path / "v").mkdir()
    (tmp_path / "v/a.mkv").write_bytes(film(grey, "ffv1", "gray12le", "gray12le"))
    (tmp_path / "v/b.mkv").write_bytes(film(colour, "ffv1", "bgr0", "rgb24"))
    told, decoded = [], extras._decoded
    monkeypatch.setattr(extras, "_decoded", lambda *a: told.append(1) or decoded(*a))
    options = {
        name: ReadOptions(cache=c) for name, c in (("no", None), ("yes", str(tmp_path / "c")))
    }
    reads = [
        [read_file(tmp_path / "v", name, options[which]) for name in ("a.mkv", "b.mkv")]
        for which in ("no", "yes", "yes")
    ]
    assert len(told) == 4  # the third reading decoded nothing
    for plain, *others in zip(*reads, strict=True):
        for other in others:
            assert [f.path for f in other] == [f.path for f in plain]
            for one, two in zip(plain, other, strict=True):
                assert np.array_equal(one.pixels, two.pixels)
                assert (one.contract, one.notes) == (two.contract, two.notes)
    monkeypatch.setattr(extras, "CACHE_LIMIT", 0)
    read_file(tmp_path / "v", "a.mkv", ReadOptions(cache=str(tmp_path / "full")))
    assert not (tmp_path / "full").exists()


def test_a_file_that_is_no_video_is_put_aside():
    with pytest.raises(InputError, match=r"a\.mp4: "):
        decode(b"not a video at all" * 20, "a.mp4")
