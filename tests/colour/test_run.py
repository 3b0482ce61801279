"""Colour through the whole job: frames to a bank, its page, its edges, a comparison."""

import csv
import json

import numpy as np
import pytest
from click.testing import CliRunner

from patchlab import store
from patchlab.cli.commands import patchlab
from patchlab.conventions import pixel_format
from patchlab.images.formats import png_bytes
from patchlab.pipeline.loaded import load_bank

QUICK = ("--patch-size", "8", "--patches", "2000", "--restarts", "1", "--resamples", "0",
         "--max-iterations", "30", "--components", "12", "--jobs", "1")  # fmt: skip


def invoke(*words, code=0):
    result = CliRunner().invoke(patchlab, [str(w) for w in words], standalone_mode=False)
    error = result.exception
    assert (error is None) == (code == 0), error or result.output
    return error if code else result.stdout


def painted(seed, shape=(96, 128)):
    """Rectangles of many colours over one another, blurred a little, in photon noise."""
    rng = np.random.default_rng(seed)
    light = np.full((*shape, 3), 0.3)
    for _ in range(60):
        y, x = rng.integers(0, shape[0] - 8), rng.integers(0, shape[1] - 8)
        h, w = rng.integers(6, 40, 2)
        tone, tint = rng.uniform(0.1, 0.8), rng.normal(0, 0.12, 3)
        light[y : y + h, x : x + w] = np.clip(tone * (1 + tint), 0.03, 0.95)
    for axis in (0, 1):
        light = (np.roll(light, 1, axis) + 2 * light + np.roll(light, -1, axis)) / 4
    electrons = rng.poisson(900 * light) + 3 * rng.normal(size=light.shape)
    return np.clip(np.rint(0.25 * electrons), 0, 255).astype(np.uint8)


@pytest.fixture(scope="module")
def frames(tmp_path_factory):
    folder = tmp_path_factory.mktemp("frames")
    for k in range(4):
        (folder / f"{k}.png").write_bytes(png_bytes(painted(k)))
    return folder


@pytest.fixture(scope="module")
def run(frames, tmp_path_factory):
    out = tmp_path_factory.mktemp("run") / "tiles"
    told = invoke("run", frames, "-o", out, "--planes", "colour", "--transfer", "linear",
                  "--kernels", "4", *QUICK, "--json")  # fmt: skip
    return out, json.loads(told)


def test_a_run_on_colour_frames_ends_in_a_proved_bank_and_a_page(run):
    out, told = run
    assert told["bank"]["pixels"] == "RGB8"
    assert told["components"] == 12
    assert told["bank"]["worst_error"] <= told["bank"]["error_bound"]
    bank = load_bank(out).bank
    assert bank.planes == 3
    assert len(bank) == 12
    page = (out / "report" / "index.html").read_text()
    assert "one profile in one colour" in page
    assert (out / "report" / "colours.png").stat().st_size
    (atoms, _), _ = store.load(out / "fits", "fits")
    assert atoms.colours == "RGB"
    assert all(len(f.direction) == 3 for f in atoms.fits)
    rows = list(csv.DictReader((out / "fits" / "fits_atoms.csv").read_text().splitlines()))
    assert {row["colour_axis"] for row in rows} <= {"grey", "blue-yellow", "red-green"}


def test_edges_of_colour_frames_are_found_and_drawn(run, frames, tmp_path):
    out, _ = run
    words = ("detect", out, frames / "0.png", "-o", tmp_path / "edges")
    bank = load_bank(out).bank
    asked = () if bank.thresholds is not None else ("--threshold", "8")
    told = json.loads(invoke(*words, *asked, "--json"))
    assert told["images"][0]["edgels"] > 100
    assert (tmp_path / "edges" / "overlay" / "0_png.png").stat().st_size > 1000
    for words in (("bench", out / "bank"), ("assess", out), ("drift", out, frames)):
        assert f"{words[0]} takes banks of one plane" in str(invoke(*words, code=1))


def test_the_runtime_takes_a_picture_with_its_colours(run, frames):
    out, _ = run
    bank = load_bank(out)
    from patchlab import export

    module = export.open_runtime((out / "bank" / "patchlab_bank.py").read_bytes())
    codes = painted(9)
    alone = module.load(out / "bank", library=False)
    np.testing.assert_allclose(alone.responses(codes), bank.responses(codes), atol=1e-3)
    with pytest.raises(module.BankError, match=r"\(height, width, 3\)"):
        alone.responses(codes[..., 0])


def test_a_run_compares_equal_to_itself(run):
    out, _ = run
    for part in (out / "bank", out / "dictionary"):
        assert json.loads(invoke("compare", part, part, "--json"))["verdict"] == "bit-equal"


def test_a_mosaic_is_learned_in_cells_and_exported_as_learned(tmp_path):
    form = pixel_format("BayerRG8")
    photos = tmp_path / "photos"
    photos.mkdir()
    for k in range(3):
        codes = painted(k, (120, 140))
        mosaic = np.zeros((120, 140), np.uint8)
        for place, letter in enumerate(form.colours):
            row, column = divmod(place, 2)
            mosaic[row::2, column::2] = codes[row::2, column::2, "RGB".index(letter)]
        (photos / f"{k}.raw").write_bytes(mosaic.tobytes())
    (photos / "raw.toml").write_text('format = "BayerRG8"\nwidth = 140\nheight = 120\n')
    told = json.loads(invoke("run", photos, "-o", tmp_path / "run", "--planes", "colour",
                             "--kernels", "4", "--no-library", *QUICK, "--json"))  # fmt: skip
    assert told["bank"]["kernels"] == 12
    assert told["bank"]["worst_error"] <= told["bank"]["error_bound"]
    edges = load_bank(tmp_path / "run")
    assert edges.bank.contract.pixels == "BayerRG8"
    assert edges.responses(mosaic).shape == (12, 60, 70)
    invoke("export", tmp_path / "run", "-o", tmp_path / "own", "--as-learned", "--no-library")
    own = load_bank(tmp_path / "own").bank
    assert own.purpose == "learned"
    assert own.taps.shape == (12, 9, 9, 4)


def test_frames_to_try_colour_on_are_rendered(tmp_path):
    told = json.loads(invoke("scenes", "-o", tmp_path / "m", "--count", "1", "--pixels",
                             "BayerRG8", "--json"))  # fmt: skip
    assert told["frames"] == 1
    note = (tmp_path / "m" / "NOTE.md").read_text()
    assert note.startswith("# Sample images")
    assert "--planes colour" in note
    assert (tmp_path / "m" / "wall-01.raw").stat().st_size == 360 * 480
    assert 'format = "BayerRG8"' in (tmp_path / "m" / "raw.toml").read_text()
