"""Raw buffers by their PFNC names, and Bayer mosaics.

The worked bytes: GenICam Pixel Format Naming Convention for the unpacked and the ``p``
formats, a camera maker's manual for Mono12Packed; Mono10Packed's middle byte (two low bits
of each pixel in bits 0-1 and 4-5) is from memory.
"""

import json
import tomllib

import cv2
import numpy as np
import pytest

from patchlab import images, store
from patchlab.cli import main
from patchlab.errors import InputError, UsageError
from patchlab.images import RawLayout, ReadOptions, SampleSettings, decode, list_photos, take_in
from patchlab.images.bayer import colours, green
from patchlab.images.pfnc import FORMATS, PATTERNS, unpack
from patchlab.images.sample import sample_frame
from patchlab.types import Frame, InputContract, InputTable

CV = {"RG": cv2.COLOR_BayerBG2RGB, "GR": cv2.COLOR_BayerGB2RGB,
      "GB": cv2.COLOR_BayerGR2RGB, "BG": cv2.COLOR_BayerRG2RGB}  # fmt: skip


def pack(codes, name):
    """Bytes of a buffer, bit by bit: slow and plain."""
    form, flat = FORMATS[name], [int(c) for c in codes.ravel()]
    if form.packing == "plain":
        return np.array(flat, "u1" if form.room == 8 else "<u2").tobytes()
    if form.packing == "stream":
        bits = [c >> k & 1 for c in flat for k in range(form.bits)]
        return np.packbits(bits, bitorder="little").tobytes()
    low, out = form.bits - 8, bytearray()
    for k in range(0, len(flat), 2):
        pair = flat[k : k + 2]
        middle = sum((c & (1 << low) - 1) << 4 * j for j, c in enumerate(pair))
        out += bytes([pair[0] >> low, middle, *(c >> low for c in pair[1:])])
    return bytes(out)


@pytest.mark.parametrize(
    ("name", "codes", "stored"),
    [
        ("Mono12Packed", [0xABC, 0x123], "ab3c12"),
        ("Mono12p", [0xABC, 0x123], "bc3a12"),
        ("Mono10p", [1, 2, 3, 4], "0108300001"),
        ("Mono10p", [0x3FF, 0x000, 0x155, 0x2AA], "ff035095aa"),
        ("Mono10Packed", [0x3FF, 0x001], "ff1300"),
        ("Mono10", [0x3FF, 1], "ff030100"),
        ("Mono12", [0xABC, 0x123], "bc0a2301"),
        ("Mono16", [0xABCD, 1], "cdab0100"),
        ("Mono8", [7, 200], "07c8"),
        ("BayerRG12p", [0xABC, 0x123], "bc3a12"),
    ],
)
def test_worked_bytes(name, codes, stored):
    found = unpack(bytes.fromhex(stored), RawLayout(name, len(codes), 1))
    assert found.tolist() == [codes]
    assert found.dtype == (np.uint8 if name == "Mono8" else np.uint16)


@pytest.mark.parametrize("name", sorted(FORMATS))
@pytest.mark.parametrize("shape", [(5, 7), (6, 8)])
def test_every_format_comes_back(name, shape):
    form = FORMATS[name]
    codes = np.random.default_rng(len(name)).integers(0, 1 << form.bits, shape)
    layout = RawLayout(name, shape[1], shape[0])
    data = pack(codes, name)
    assert len(data) == layout.size
    assert np.array_equal(unpack(data, layout), codes)
    # a header, and rows padded to 32 bytes
    rows = b"".join(pack(row, name).ljust(32, b"\xee") for row in codes)
    padded = RawLayout(name, shape[1], shape[0], offset=3, row_bytes=32)
    assert np.array_equal(unpack(b"abc" + rows, padded), codes)
    frame = decode(data, "a.raw", ReadOptions(raw=layout, bayer="mosaic"))[0]
    assert np.array_equal(frame.pixels, codes)
    assert frame.contract.pixels == f"Mono{form.bits}"
    assert frame.contract.white == (1 << form.bits) - 1
    assert frame.contract.transfer == "linear"
    assert frame.contract.plane == (f"Bayer{form.pattern} mosaic" if form.pattern else "")


@pytest.mark.parametrize("extra", [-1, 1])
def test_a_wrong_size_is_refused_with_both_sizes(extra):
    layout = RawLayout("Mono12p", 64, 48)
    data = bytes(layout.size + extra)
    with pytest.raises(InputError, match=rf"holds {len(data)} bytes.*64 x 48.*take 4608"):
        decode(data, "a.raw", ReadOptions(raw=layout))


@pytest.mark.parametrize(
    ("words", "said"),
    [
        (("Mono12q", 4, 4), "unknown raw format 'Mono12q'; known are Mono12"),
        (("Mono8", 0, 4), "holds nothing"),
        (("Mono8", 4, 4, -1), "offset"),
        (("Mono16", 4, 4, 0, 7), "too few for a row of 4"),
    ],
)
def test_wrong_layouts_are_refused(words, said):
    with pytest.raises(UsageError, match=said):
        RawLayout(*words)


def test_a_code_beyond_an_unpacked_format_is_refused():
    with pytest.raises(InputError, match="4096 is beyond Mono12"):
        decode(b"\x00\x10\x01\x00", "a.raw", ReadOptions(raw=RawLayout("Mono12", 2, 1)))


# ---------------------------------------------------------------- sidecars


def test_sidecars_go_before_options_and_the_file_s_own_before_the_folder_s(tmp_path):
    codes = np.arange(48).reshape(6, 8)
    (tmp_path / "raw.toml").write_text('format = "Mono8"\nwidth = 8\nheight = 6\n')
    for name in ("a.raw", "b.raw", "c.raw"):
        (tmp_path / name).write_bytes(pack(codes, "Mono8"))
    (tmp_path / "b.raw").write_bytes(b"x" + pack(codes, "Mono8"))
    (tmp_path / "b.raw.toml").write_text('format="Mono8"\nwidth=8\nheight=6\noffset=1\n')
    intake = take_in(list_photos(tmp_path), ReadOptions(raw=RawLayout("Mono8", 48, 1)))
    assert [r.path for r in intake.frames] == ["a.raw", "b.raw"]  # c is a's copy
    for frame in images.iterate(intake):
        assert np.array_equal(frame.pixels, codes)
        assert frame.notes == ("raw buffer: Mono8, 8 x 6",)


@pytest.mark.parametrize(
    ("text", "said"),
    [
        ("format = ", "raw.toml is not valid TOML"),
        ('format = "Mono8"\nwidth = 8\n', "raw.toml: height is missing"),
        ('format = "Mono8"\nwidth = 8\nheigth = 6\n', "raw.toml: unknown key 'heigth'"),
        ('format = "Mono8"\nwidth = "8"\nheight = 6\n', "width takes a value of type int"),
        ('format = "Mono9"\nwidth = 8\nheight = 6\n', "unknown raw format 'Mono9'"),
        (None, "nothing says what this raw buffer holds"),
    ],
)
def test_a_bad_sidecar_is_told_with_its_name(tmp_path, text, said):
    (tmp_path / "a.raw").write_bytes(bytes(48))
    if text is not None:
        (tmp_path / "raw.toml").write_text(text)
    with pytest.raises(InputError, match=said):
        take_in(list_photos(tmp_path))


# ---------------------------------------------------------------- Bayer


@pytest.mark.parametrize("pattern", PATTERNS)
def test_colours_are_opencv_s(pattern):
    mosaic = np.random.default_rng(3).integers(0, 4096, (20, 26)).astype(np.uint16)
    ours = colours(mosaic, pattern)
    theirs = cv2.cvtColor(mosaic, CV[pattern])
    assert np.array_equal(ours[1:-1, 1:-1], theirs[1:-1, 1:-1])


@pytest.mark.parametrize("pattern", PATTERNS)
def test_a_coloured_tile_keeps_its_colours(pattern):
    # red 10, green 20, blue 30 laid out by hand
    first, second = {"RG": ("RG", "GB"), "GR": ("GR", "BG"), "GB": ("GB", "RG"),
                     "BG": ("BG", "GR")}[pattern]  # fmt: skip
    value = {"R": 10, "G": 20, "B": 30}
    tile = np.array([[value[c] for c in first], [value[c] for c in second]], np.uint8)
    mosaic = np.tile(tile, (4, 5))
    assert (colours(mosaic, pattern) == [10, 20, 30]).all()
    assert (green(mosaic, pattern) == 20).all()
    data = pack(mosaic, f"Bayer{pattern}8")
    layout = RawLayout(f"Bayer{pattern}8", 10, 8)
    shapes = {"green": (4, 5), "luminance": (8, 10), "mosaic": (8, 10)}
    for plane, shape in shapes.items():
        frame = decode(data, "a.raw", ReadOptions(raw=layout, bayer=plane))[0]
        assert frame.pixels.shape == shape
        assert frame.contract.plane == f"Bayer{pattern} {plane}"
    lum = decode(data, "a.raw", ReadOptions(raw=layout, bayer="luminance"))[0]
    assert (lum.pixels == round(0.2126 * 10 + 0.7152 * 20 + 0.0722 * 30)).all()


def test_the_green_lattice_sits_in_the_red_rows():
    mosaic = np.arange(48, dtype=np.uint16).reshape(6, 8)
    assert green(mosaic, "RG")[0].tolist() == [1, 3, 5, 7]
    assert green(mosaic, "GB")[0].tolist() == [9, 11, 13, 15]


def test_patches_of_a_mosaic_begin_on_even_rows_and_columns():
    contract = InputContract("Mono8", 0, 255, "linear", "BayerRG mosaic")
    pixels = np.random.default_rng(0).integers(1, 250, (40, 50)).astype(np.uint8)
    table = InputTable("identity", contract, np.arange(256, dtype=np.float32), None)
    settings = SampleSettings(size=9)
    part = sample_frame(Frame("a", pixels, contract), table, settings, 10_000)
    assert (part.origin % 2 == 0).all()
    assert len(np.unique(part.origin, axis=0)) == len(part.origin) == 16 * 21
    y, x = part.origin[7]
    cut = pixels[y : y + 9, x : x + 9].astype(float)
    assert np.allclose(part.patches[7].reshape(9, 9) * part.contrast[7] + part.dc[7], cut, 1e-4)


def test_two_patterns_in_one_folder_are_an_error(tmp_path):
    for name in ("BayerRG8", "BayerGB8"):
        (tmp_path / f"{name}.raw").write_bytes(np.arange(64, dtype=np.uint8) + len(name[:7]))
        side = f'format = "{name}"\nwidth = 8\nheight = 8\n'
        (tmp_path / f"{name}.raw.toml").write_text(side)
    (tmp_path / "BayerGB8.raw").write_bytes(bytes(range(1, 65)))
    with pytest.raises(InputError, match="several colour patterns"):
        take_in(list_photos(tmp_path))


# ---------------------------------------------------------------- the command


@pytest.fixture(scope="module")
def buffers(tmp_path_factory):
    """Eight BayerGB12p buffers of noise steps."""
    folder = tmp_path_factory.mktemp("buffers")
    rng = np.random.default_rng(5)
    for k in range(8):
        steps = np.kron(rng.uniform(200, 3000, (6, 8)), np.ones((24, 24)))
        codes = np.rint(rng.normal(steps, np.sqrt(steps + 30))).clip(0, 4095).astype(int)
        (folder / f"{k}.raw").write_bytes(pack(codes, "BayerGB12p"))
    return folder


GIVEN = ["--raw-format", "BayerGB12p", "--raw-width", "192", "--raw-height", "144"]


def test_the_bank_s_contract_says_which_plane(buffers, tmp_path, capsys):
    words = ["run", str(buffers), "-o", str(tmp_path / "run"), *GIVEN, "--jobs", "1", "--json"]
    words += [
        "--patches",
        "1500",
        "--patch-size",
        "8",
        "--components",
        "12",
        "--restarts",
        "1",
        "--max-iterations",
        "20",
    ]
    words += ["--as-learned", "--no-library", "--table", "linear", "--flat-fraction", "0"]
    with pytest.raises(SystemExit) as stop:
        main(words)
    assert stop.value.code == 0, capsys.readouterr().err
    head = json.loads((tmp_path / "run" / "bank" / "bank.json").read_text())
    assert head["input"]["plane"] == "BayerGB green"
    assert head["input"]["pixels"] == "Mono12"
    assert "BayerGB green" in (tmp_path / "run" / "bank" / "run.h").read_text()
    survey, _ = store.load(tmp_path / "run" / "survey", "survey")
    assert survey.contract.plane == "BayerGB green"


@pytest.mark.parametrize(
    ("words", "code", "said"),
    [
        (["--raw-format", "BayerGB12p"], 2, "go together"),
        ([*GIVEN[:-1], "145"], 3, "192 x 145 pixels of BayerGB12p take"),
        (["--raw-format", "Bayer12", *GIVEN[2:]], 2, "unknown raw format"),
        (["--bayer", "red"], 2, "red"),
    ],
)
def test_wrong_words_are_refused(buffers, capsys, words, code, said):
    with pytest.raises(SystemExit) as stop:
        main(["survey", str(buffers), "--jobs", "1", *words])
    assert stop.value.code == code
    assert said in capsys.readouterr().err


def test_the_sidecar_in_the_docs_is_one(tmp_path):
    text = images.pfnc.__doc__.split("::\n\n")[1].split("\n\n")[0]
    (tmp_path / "a.raw.toml").write_text("\n".join(line.strip() for line in text.splitlines()))
    assert tomllib.loads((tmp_path / "a.raw.toml").read_text())["row_bytes"] == 2904
    assert images.pfnc.sidecar(tmp_path / "a.raw") == RawLayout("Mono12p", 1936, 1216, 0, 2904)
