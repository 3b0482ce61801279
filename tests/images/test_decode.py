import io
import struct
import warnings
import zlib

import cv2
import numpy as np
import pytest
import tifffile
from PIL import Image, ImageFile, ImageOps

from patchlab.conventions import srgb_decode, srgb_encode
from patchlab.errors import InputError, UsageError
from patchlab.images.decode import decode
from patchlab.images.develop import ReadOptions, upright
from patchlab.images.formats import png_bytes
from patchlab.types import InputContract


def grey(shape=(40, 50), top=255, seed=0):
    dtype = np.uint8 if top < 256 else np.uint16
    return np.random.default_rng(seed).integers(0, top + 1, shape).astype(dtype)


def pillow(array, kind, **options):
    out = io.BytesIO()
    image = array if isinstance(array, Image.Image) else Image.fromarray(array)
    image.save(out, kind, **options)
    return out.getvalue()


def tiff(array, **options):
    out = io.BytesIO()
    tifffile.imwrite(out, array, **options)
    return out.getvalue()


def npy(array):
    out = io.BytesIO()
    np.save(out, array)
    return out.getvalue()


def pgm(array, maxval):
    stored = array.astype(">u2" if maxval > 255 else "u1")
    return b"P5\n# a comment\n%d %d\n%d\n" % (*array.shape[::-1], maxval) + stored.tobytes()


def one(data, name="a", **options):
    (frame,) = decode(data, name, ReadOptions(**options))
    return frame


# ---------------------------------------------------------------- grey, exactly


@pytest.mark.parametrize("top", [255, 65535])
def test_lossless_grey_comes_back_exactly(top):
    a = grey(top=top)
    for data in (pillow(a, "PNG"), pillow(a, "TIFF"), tiff(a), tiff(a, compression="zlib"),
                 tiff(a, tile=(16, 16)), npy(a), pgm(a, top), png_bytes(a),
                 png_bytes(a, packed=True), tiff(a, byteorder=">")):  # fmt: skip
        frame = one(data)
        assert np.array_equal(frame.pixels, a)
        name = "Mono8" if top == 255 else "Mono16"
        assert frame.contract == InputContract(name, 0, top, "linear")
        assert frame.invalid is None


def test_lzw_tiff_goes_through_the_other_decoder():
    for top in (255, 65535):
        a = grey(top=top)
        assert np.array_equal(one(pillow(a, "TIFF", compression="tiff_lzw")).pixels, a)


def test_bmp_and_lossless_webp():
    a = grey()
    assert np.array_equal(one(pillow(a, "BMP")).pixels, a)
    frame = one(pillow(np.dstack([a] * 3), "WEBP", lossless=True))
    assert np.array_equal(frame.pixels, a)
    assert frame.contract.transfer == "srgb"


def test_jpeg_is_srgb_coded_and_close():
    ramp = np.tile(np.arange(0, 250, 5, dtype=np.uint8), (40, 1))
    frame = one(pillow(ramp, "JPEG", quality=95))
    assert frame.contract == InputContract("Mono8", 0, 255, "srgb")
    assert np.abs(frame.pixels.astype(int) - ramp).max() <= 3


@pytest.mark.parametrize(
    ("maxval", "name"), [(100, "Mono8"), (255, "Mono8"), (1000, "Mono10"), (1023, "Mono10"),
                         (4095, "Mono12"), (65535, "Mono16")]
)  # fmt: skip
def test_pgm_maxval_is_the_depth(maxval, name):
    a = grey(top=maxval)
    frame = one(pgm(a, maxval))
    assert (frame.contract.pixels, frame.contract.white) == (name, maxval)
    assert np.array_equal(frame.pixels, a)


def test_plain_pgm_and_a_stream_of_several():
    text = b"P2 3 2 15\n0 1 2\n13 14 15\n"
    assert one(text).pixels.tolist() == [[0, 1, 2], [13, 14, 15]]
    a, b = grey(seed=1), grey((5, 6), seed=2)
    first, second = decode(pgm(a, 255) + pgm(b, 255), "s.pgm")
    assert (first.path, second.path) == ("s.pgm#0", "s.pgm#1")
    assert np.array_equal(second.pixels, b)


def test_pages_become_frames_and_thumbnails_do_not():
    stack = grey((3, 20, 30), top=65535)
    frames = decode(tiff(stack, photometric="minisblack"), "dir/stack.tif")
    assert [f.path for f in frames] == [f"dir/stack.tif#{k}" for k in range(3)]
    assert all(np.array_equal(f.pixels, p) for f, p in zip(frames, stack, strict=True))
    out = io.BytesIO()
    with tifffile.TiffWriter(out) as writer:
        writer.write(stack[0])
        writer.write(stack[0, ::2, ::2], subfiletype=1)
    assert one(out.getvalue()).pixels.shape == (20, 30)


def test_npy_stacks_and_colour():
    assert len(decode(npy(grey((4, 9, 8))), "a.npy")) == 4
    assert decode(npy(grey((9, 8, 3))), "a.npy")[0].contract.transfer == "srgb"
    assert np.array_equal(one(npy(grey(top=65535).astype(">u2"))).pixels, grey(top=65535))


# ---------------------------------------------------------------- depth by declaration


def test_twelve_bits_in_a_sixteen_bit_file():
    a = grey(top=4095)
    plain = one(pillow(a, "PNG"))
    assert plain.contract.pixels == "Mono16"
    assert any("looks 12-bit; give --white 4095" in n for n in plain.notes)
    told = one(pillow(a, "PNG"), white=4095)
    assert told.contract == InputContract("Mono12", 0, 4095)
    assert not any("looks" in n for n in told.notes)
    assert one(pillow(a, "PNG"), pixels="Mono12").contract == told.contract
    shifted = one(tiff(a << 4))
    assert any("shifted" in n and "65520" in n for n in shifted.notes)


def test_depth_does_not_follow_the_largest_value():
    dark = np.full((20, 20), 7, np.uint16)
    assert one(tiff(dark)).contract.white == 65535
    assert one(tiff(dark.astype(np.uint8))).contract.white == 255


def test_levels_that_cannot_be():
    with pytest.raises(InputError, match="beyond Mono12"):
        one(tiff(grey(top=60000)), white=4095)
    with pytest.raises(InputError, match="8 bits"):
        one(pillow(grey(), "PNG"), white=4095)
    with pytest.raises(InputError, match="cannot be Mono12"):
        one(pillow(grey(), "PNG"), pixels="Mono12")
    with pytest.raises(InputError, match="not below"):
        one(pillow(grey(), "PNG"), black=300)
    for bad in ({"white": 5, "black": 9}, {"transfer": "gamma"}, {"pixel_limit": 0},
                {"white": float("nan")}, {"pixels": "Mono7"},
                {"pixels": "Mono8", "white": 300}):  # fmt: skip
        with pytest.raises(UsageError):
            ReadOptions(**bad)


def test_black_and_white_overrides_reach_the_contract():
    frame = one(tiff(grey(top=1000)), black=64, white=1000, transfer="srgb")
    assert frame.contract == InputContract("Mono10", 64, 1000, "srgb")


# ---------------------------------------------------------------- floats


def test_floats_stay_as_they_are_and_bad_ones_are_masked():
    a = np.linspace(-0.5, 2, 600).reshape(20, 30).astype(np.float32)
    a[3, 4], a[5, 6], a[7, 8] = np.nan, np.inf, -np.inf
    for data in (tiff(a), npy(a), npy(a.astype(np.float64))):
        frame = one(data)
        assert frame.contract == InputContract("float32", 0, 1)
        good = np.isfinite(a)
        assert np.array_equal(frame.invalid, ~good)
        assert np.array_equal(frame.pixels[good], a[good])
        assert np.isfinite(frame.pixels).all()
        assert any("not a finite number" in n for n in frame.notes)
    assert one(tiff(a), white=100, black=2).contract == InputContract("float32", 2, 100)


def test_float64_beyond_float32_is_invalid_not_a_warning():
    a = np.ones((9, 9))
    a[0, 0] = 1e300
    assert one(npy(a)).invalid.sum() == 1


# ---------------------------------------------------------------- colour


def test_srgb_values_of_the_standard():
    """IEC 61966-2-1:1999; values computed from its formula."""
    codes = np.array([1, 10, 11, 50, 64, 118, 127, 128, 187, 188, 200, 254, 255])
    light = [3.035270e-4, 0.003035270, 0.003346536, 0.03189603, 0.05126946, 0.1811642, 0.2122308,
             0.2158605, 0.4969330, 0.5028865, 0.5775804, 0.9911021, 1.0]  # fmt: skip
    contract = one(pillow(np.dstack([grey()] * 3), "PNG")).contract
    assert np.allclose(contract.light(codes), light, rtol=0, atol=1e-7)
    assert np.allclose(255 * srgb_encode(np.array([0.18, 0.5, 0.01])),
                       [117.6458, 187.5160, 25.4625], atol=1e-4)  # fmt: skip


def test_grey_in_colour_keeps_every_code():
    a = np.arange(256, dtype=np.uint8).reshape(16, 16)
    assert np.array_equal(one(pillow(np.dstack([a] * 3), "PNG")).pixels, a)
    b = grey(top=65535)
    assert np.array_equal(one(npy(np.dstack([b] * 3))).pixels, b)


def test_luminance_is_rec709_in_linear_light():
    rgb = np.array([[[255, 0, 0], [0, 255, 0], [0, 0, 255], [200, 100, 50]]], np.uint8)
    frame = one(pillow(rgb, "PNG"))
    light = srgb_decode(rgb / 255.0) @ [0.2126, 0.7152, 0.0722]
    assert np.array_equal(frame.pixels, np.rint(255 * srgb_encode(light)))
    assert frame.pixels[0, :3].tolist() == [127, 220, 76]
    assert np.array_equal(frame.invalid, [[True, True, True, False]])  # a channel is clipped
    linear = one(pillow(rgb, "PNG"), transfer="linear").pixels
    assert np.array_equal(linear, np.rint(rgb @ [0.2126, 0.7152, 0.0722]))


@pytest.mark.parametrize("levels", [{}, {"black": 16, "white": 235}, {"white": 200}, {"white": 40}])
def test_luminance_of_every_kind_of_colour(levels):
    rgb = grey((200, 300, 3), seed=4)
    rgb[0, :256] = np.arange(256)[:, None]
    frame = one(pillow(rgb, "PNG"), **levels)
    black, white = levels.get("black", 0), levels.get("white", 255)
    light = srgb_decode(np.clip((rgb - float(black)) / (white - black), 0, 1))
    unit = srgb_encode(light @ [0.2126, 0.7152, 0.0722])
    assert np.array_equal(frame.pixels, np.rint(black + unit * (white - black)))


def test_deep_colour_keeps_its_depth_and_is_linear():
    rgb = grey((33, 21, 3), top=60000)
    _, png = cv2.imencode(".png", rgb[..., ::-1])
    expected = np.rint(rgb @ np.array([0.2126, 0.7152, 0.0722]))
    planes = tiff(np.moveaxis(rgb, 2, 0).copy(), photometric="rgb", planarconfig="separate")
    for data in (png.tobytes(), tiff(rgb, photometric="rgb"), npy(rgb), planes):
        frame = one(data)
        assert frame.contract == InputContract("Mono16", 0, 65535, "linear")
        assert np.array_equal(frame.pixels, expected)


@pytest.mark.parametrize("kind", [cv2.IMWRITE_PNG_STRATEGY_DEFAULT, cv2.IMWRITE_PNG_STRATEGY_RLE])
def test_png_row_filters_against_opencv(kind):
    y, x = np.mgrid[:37, :29]
    smooth = np.stack([900 * x + 7 * y, 40 * x * y, 65000 - 300 * x - 5 * y], -1).astype(np.uint16)
    alpha = np.dstack([smooth, np.where(x > 3, 65535, 0).astype(np.uint16)])
    _, png = cv2.imencode(".png", alpha, [cv2.IMWRITE_PNG_STRATEGY, kind])
    frame = one(png.tobytes())
    back = cv2.imdecode(png, cv2.IMREAD_UNCHANGED)[..., 2::-1]
    assert np.array_equal(frame.pixels, np.rint(back @ np.array([0.2126, 0.7152, 0.0722])))
    assert np.array_equal(frame.invalid, x <= 3)


def test_all_five_png_filters():
    rgb = grey((60, 31, 3), top=65535)
    raw = rgb.astype(">u2").tobytes()
    rows = np.frombuffer(raw, np.uint8).reshape(60, 31 * 6).astype(int)
    packed = []
    for r in range(60):
        up = rows[r - 1] if r else np.zeros(186, int)
        left = np.concatenate([np.zeros(6, int), rows[r][:-6]])
        corner = np.concatenate([np.zeros(6, int), up[:-6]])
        guess = left + up - corner
        far = np.stack([abs(guess - left), abs(guess - up), abs(guess - corner)])
        paeth = np.choose(far.argmin(0), [left, up, corner])
        base = [0 * up, left, up, (left + up) // 2, paeth][r % 5]
        packed.append(bytes([r % 5]) + ((rows[r] - base) & 255).astype(np.uint8).tobytes())
    parts = [(b"IHDR", struct.pack(">IIBBBBB", 31, 60, 16, 2, 0, 0, 0)),
             (b"IDAT", zlib.compress(b"".join(packed))), (b"IEND", b"")]  # fmt: skip
    data = b"\x89PNG\r\n\x1a\n" + b"".join(
        struct.pack(">I", len(b)) + k + b + struct.pack(">I", zlib.crc32(k + b)) for k, b in parts
    )
    expected = np.rint(rgb @ np.array([0.2126, 0.7152, 0.0722]))
    assert np.array_equal(one(data).pixels, expected)


def test_palette_is_expanded():
    image = Image.new("P", (4, 1))
    image.putpalette([10, 10, 10, 200, 100, 50, 0, 0, 255] + [0] * 9)
    image.putdata([0, 1, 1, 2])
    frame = one(pillow(image, "PNG"))
    assert "palette expanded" in frame.notes
    light = srgb_decode(np.array([[10, 10, 10], [200, 100, 50]]) / 255.0)
    codes = np.rint(255 * srgb_encode(light @ [0.2126, 0.7152, 0.0722]))
    assert frame.pixels[0, :2].tolist() == codes.tolist()
    ramp = Image.new("P", (3, 1))
    ramp.putpalette([v for k in range(256) for v in (255 - k,) * 3])
    ramp.putdata([0, 5, 250])
    grey_frame = one(pillow(ramp, "PNG"))
    assert grey_frame.pixels.tolist() == [[255, 250, 5]]
    assert grey_frame.contract.transfer == "linear"
    table = np.zeros((3, 256), np.uint16)
    table[:] = np.arange(256)[::-1] * 257
    data = tiff(np.array([[0, 9]], np.uint8), photometric="palette", colormap=table)
    assert one(data).pixels.tolist() == [[255, 246]]


@pytest.mark.parametrize("mode", ["LA", "RGBA"])
def test_transparent_pixels_are_invalid(mode):
    alpha = np.full((6, 8), 255, np.uint8)
    alpha[2, 3], alpha[4, 5] = 0, 1
    planes = [np.full((6, 8), 90, np.uint8)] * (len(mode) - 1) + [alpha]
    frame = one(pillow(np.dstack(planes), "PNG"))
    assert np.argwhere(frame.invalid).tolist() == [[2, 3]]
    assert (frame.pixels == 90).all()
    if mode == "RGBA":
        data = tiff(np.dstack(planes), photometric="rgb", extrasamples=["unassalpha"])
        assert np.array_equal(one(data).invalid, alpha == 0)
        assert np.array_equal(one(npy(np.dstack(planes))).invalid, alpha == 0)


def test_transparent_key_of_a_png():
    a = grey()
    for top in (255, 65535):
        data = pillow(grey(top=top), "PNG", transparency=int(grey(top=top)[0, 0]))
        assert np.array_equal(one(data).invalid, grey(top=top) == grey(top=top)[0, 0])
    assert one(pillow(a, "PNG")).invalid is None


def test_cmyk_is_converted():
    ink = np.zeros((4, 4, 4), np.uint8)
    ink[0, 0], ink[0, 1], ink[0, 2] = (0, 0, 0, 255), (0, 0, 0, 55), (51, 51, 51, 0)
    image = Image.frombytes("CMYK", (4, 4), ink.tobytes())
    for data in (pillow(image, "TIFF"), tiff(ink, photometric="separated")):
        frame = one(data)
        assert frame.pixels[0].tolist() == [0, 200, 204, 255]
        assert any("CMYK" in n for n in frame.notes)
    near = one(pillow(image, "JPEG", quality=100, subsampling=0)).pixels.astype(int)
    assert np.abs(near[0] - [0, 200, 204, 255]).max() <= 4


def test_white_is_zero_is_inverted():
    a = grey()
    assert np.array_equal(one(tiff(a, photometric="miniswhite")).pixels, 255 - a)


# ---------------------------------------------------------------- orientation


@pytest.mark.parametrize("tag", range(1, 9))
def test_orientation_is_applied(tag):
    """Against Pillow's own transposition, an independent reading of the Exif tag."""
    a = grey((12, 20))
    exif = Image.Exif()
    exif[274] = tag
    data = pillow(a, "PNG", exif=exif)
    expected = np.asarray(ImageOps.exif_transpose(Image.open(io.BytesIO(data))))
    frame = one(data)
    assert np.array_equal(frame.pixels, expected)
    assert (f"orientation {tag} applied" in frame.notes) == (tag > 1)
    page = tiff(a, extratags=[(274, 3, 1, tag, True)])
    assert np.array_equal(one(page).pixels, expected)
    jpeg = pillow(a, "JPEG", quality=100, exif=exif)
    shown = ImageOps.exif_transpose(Image.open(io.BytesIO(jpeg)))
    assert np.array_equal(one(jpeg).pixels, np.asarray(shown))


def test_the_mask_turns_with_the_picture():
    alpha = np.full((5, 9), 255, np.uint8)
    alpha[0, 8] = 0
    exif = Image.Exif()
    exif[274] = 6  # the first row is the right-hand side
    frame = one(pillow(np.dstack([np.full_like(alpha, 9), alpha]), "PNG", exif=exif))
    assert np.argwhere(frame.invalid).tolist() == [[8, 4]]
    assert np.array_equal(upright(np.arange(6).reshape(2, 3), 1), np.arange(6).reshape(2, 3))


# ---------------------------------------------------------------- refusals

SAMPLES = {
    "png": pillow(grey(), "PNG"),
    "png16": png_bytes(grey(top=65535)),
    "jpeg": pillow(grey(), "JPEG"),
    "progressive": pillow(grey(), "JPEG", progressive=True),
    "webp": pillow(np.dstack([grey()] * 3), "WEBP"),
    "bmp": pillow(grey(), "BMP"),
    "tiff": tiff(grey()),
    "pillow tiff": pillow(grey(), "TIFF", compression="tiff_lzw"),
    "deflate tiff": tiff(grey(), compression="zlib"),
    "stack": tiff(grey((3, 20, 30)), photometric="minisblack"),
    "pgm": pgm(grey(), 255),
    "pgm16": pgm(grey(top=4095), 4095),
    "plain pgm": b"P2 3 2 255\n0 1 2 3 4 5",
    "npy": npy(grey(top=65535)),
}


# a cut number has no end of its own; tifffile leaves bytes behind a stack that nothing points to
SPARE = {"plain pgm": 1, "stack": 16}


@pytest.mark.parametrize("kind", SAMPLES)
def test_every_cut_is_noticed(kind):
    data = SAMPLES[kind]
    assert decode(data, "whole")
    size = len(data)
    ends = {size - SPARE.get(kind, 0) - cut for cut in (1, 2, 9)}
    for end in {*ends, size // 2, size // 3, min(24, size - 2), 9, 3}:
        with pytest.raises(InputError) as caught:
            decode(data[:end], "dir/cut.file")
        assert caught.value.where == "dir/cut.file"
        assert "0x" not in str(caught.value)


def test_a_tag_that_points_behind_the_end_is_noticed():
    data = bytearray(SAMPLES["tiff"])
    entry = data.find(struct.pack("<HHI", 282, 5, 1))  # horizontal resolution, a fraction
    data[entry + 8 : entry + 12] = struct.pack("<I", len(data) - 4)
    with pytest.raises(InputError, match="truncated"):
        decode(bytes(data), "a.tif")


def test_missing_end_of_a_preallocated_file():
    data = SAMPLES["jpeg"]
    with pytest.raises(InputError, match="truncated"):
        decode(data[: len(data) // 2] + bytes(len(data) // 2), "a.jpg")


def test_a_flipped_bit_in_a_png_is_noticed():
    data = bytearray(SAMPLES["png"])
    data[len(data) // 2] ^= 4
    with pytest.raises(InputError, match="corrupt"):
        decode(bytes(data), "a.png")


@pytest.mark.parametrize(
    "data", [b"", b"not a picture", b"P4\n8 1\n\0", b"\x89PNG\r\n\x1a\n", b"II*\0\0\0\0\0"]
)
def test_what_is_not_a_picture(data):
    with pytest.raises(InputError):
        decode(data, "a.png")


def test_no_pickle_and_no_odd_arrays():
    boxed = io.BytesIO()
    np.save(boxed, np.array([{"a": 1}], dtype=object), allow_pickle=True)
    for data in (boxed.getvalue(), npy(grey().astype(np.int32)), npy(grey() > 3),
                 npy(np.zeros((2, 2, 2, 2, 2), np.uint8)), npy(np.uint8(3)),
                 npy(np.zeros((0, 5), np.uint8)), npy(np.zeros((4, 4), complex))):  # fmt: skip
        with pytest.raises(InputError):
            decode(data, "a.npy")
    for array in (grey().astype(np.int16), grey().astype(np.uint32), grey() > 3):
        with pytest.raises(InputError):
            decode(tiff(array), "a.tif")


def bomb(width, height):
    head = struct.pack(">IIBBBBB", width, height, 8, 0, 0, 0, 0)
    parts = [(b"IHDR", head), (b"IDAT", zlib.compress(bytes(1000))), (b"IEND", b"")]
    return b"\x89PNG\r\n\x1a\n" + b"".join(
        struct.pack(">I", len(b)) + k + b + struct.pack(">I", zlib.crc32(k + b)) for k, b in parts
    )


def test_the_pixel_limit_comes_before_the_pixels():
    header_only = b"P5 40000 40000 255\n" + bytes(10)
    npy_head = io.BytesIO()
    np.lib.format.write_array_header_1_0(
        npy_head, {"descr": "|u1", "fortran_order": False, "shape": (40000, 40000)}
    )
    for data in (bomb(60000, 60000), header_only, npy_head.getvalue()):
        with pytest.raises(InputError, match=r"bomb\.file: .* above the limit"):
            decode(data, "bomb.file")
    for data in (SAMPLES["tiff"], SAMPLES["jpeg"], SAMPLES["webp"], SAMPLES["bmp"]):
        with pytest.raises(InputError, match="above the limit"):
            decode(data, "a", ReadOptions(pixel_limit=1999))
        assert decode(data, "a", ReadOptions(pixel_limit=2000))


def test_a_large_picture_below_the_limit_gives_no_warning():
    """Pillow warns from 89 million pixels and refuses from 179 million."""
    with warnings.catch_warnings():
        warnings.simplefilter("error")
        with pytest.raises(InputError, match="truncated"):
            decode(bomb(19000, 10000), "large.png")


def test_global_switches_of_the_decoders_are_left_as_found():
    limit = Image.MAX_IMAGE_PIXELS
    decode(SAMPLES["png"], "a")
    assert limit == Image.MAX_IMAGE_PIXELS
    ImageFile.LOAD_TRUNCATED_IMAGES = True
    try:
        with pytest.raises(InputError):
            decode(SAMPLES["jpeg"][:-40], "a")
        assert ImageFile.LOAD_TRUNCATED_IMAGES is True
    finally:
        ImageFile.LOAD_TRUNCATED_IMAGES = False


def test_the_content_tells_the_format_not_the_name():
    assert one(SAMPLES["png"], "really.jpg").contract.transfer == "linear"
