"""The survey as a person asks for it: further frames, its JSON, its refusals."""

import json
import shutil

import imageio.v3 as iio
import numpy as np
import pytest
from scipy.special import ndtr

from patchlab import store
from patchlab.cli import main
from patchlab.types import Survey

GAIN, READ, BLACK = 0.5, 1.5, 32


def save(folder, frames):
    folder.mkdir(parents=True)
    for frame in frames:
        iio.imwrite(folder / frame.path, frame.pixels)


def edge(sigma):
    """An edge that leans 5 degrees, 12-bit codes."""
    y, x = np.mgrid[:160, :160] - 79.5
    lean = np.radians(5)
    return np.rint(640 + 2800 * ndtr((x * np.cos(lean) + y * np.sin(lean)) / sigma))


@pytest.fixture(scope="module")
def camera(bench, tmp_path_factory):
    """A camera's folders: photographs, static scenes, dark frames, a slanted edge."""
    home = tmp_path_factory.mktemp("camera")
    contract = bench.contract(8, black=BLACK)
    save(home / "photos", bench.folder(bench.photos(3), contract, GAIN, READ, blur=0.7))
    for i, light in enumerate(bench.photos(3)):
        shots = [bench.expose(light, contract, GAIN, READ, 50 + 10 * i + k) for k in range(2)]
        pair = [bench.frame(shot, contract, f"{k}.png") for k, shot in enumerate(shots)]
        save(home / "static" / f"scene {i}", pair)
    height, width = iio.imread(home / "photos" / "00.png").shape
    dark = bench.folder([np.zeros((height, width))] * 3, contract, GAIN, READ, seed=9)
    save(home / "dark", dark)
    iio.imwrite(home / "edge.png", np.rint(edge(0.8) / 16).astype(np.uint8))
    return home


def run(capsys, *words):
    """Exit code, what was printed, what was said."""
    with pytest.raises(SystemExit) as stop:
        main(["survey", "--jobs", "1", "--black", str(BLACK), *map(str, words)])
    told = capsys.readouterr()
    return stop.value.code, told.out, told.err


def test_further_frames_better_the_law_and_the_json_tells_all(camera, capsys, tmp_path):
    words = ("--static", camera / "static", "--dark", camera / "dark")
    words += ("--slanted-edge", camera / "edge.png", "--json", "-o", tmp_path / "run")
    code, out, _ = run(capsys, camera / "photos", *words)
    assert code == 0
    told = json.loads(out)
    noise = told["noise"]
    assert noise["measurable"] is True
    assert noise["source"] == "static"
    assert noise["gain_dn_per_electron"] == pytest.approx(GAIN, rel=0.02)
    assert abs(noise["gain_dn_per_electron"] - GAIN) < 3 * noise["gain_standard_error"]
    assert noise["read_noise_dn"] == pytest.approx(READ, rel=0.02)
    assert abs(noise["read_noise_dn"] - READ) < 3 * noise["read_noise_standard_error"]
    assert told["blur"]["sigma_px"] == pytest.approx(0.8, rel=0.015)
    assert told["blur"]["slanted_edge"]["angle_deg"] == pytest.approx(-5, abs=0.05)
    assert told["spectrum"]["exponent"] > 1
    assert {"name", "found", "value", "threshold", "remedy"} <= set(told["marks"][0])
    assert any("dark frames" in note for note in told["notes"])
    kept, _ = store.load(tmp_path / "run" / "survey", "survey")
    assert isinstance(kept, Survey)
    assert kept.noise.gain == pytest.approx(noise["gain_dn_per_electron"], rel=1e-4)
    page = told.pop("page")
    assert json.loads((tmp_path / "run" / "survey" / "survey.json").read_text()) == told
    text = (tmp_path / "run" / "report" / "index.html").read_text()
    assert page == str(tmp_path / "run" / "report" / "index.html")
    assert text.count("data:image/png;base64,") >= 5
    assert "<script" not in text
    assert "http" not in text
    assert f"{noise['gain_dn_per_electron']:.4g}" in text
    assert "The read noise comes from the dark frames" in text


def test_a_survey_can_be_printed_only(camera, capsys):
    code, out, _ = run(capsys, camera / "photos")
    assert code == 0
    assert "gain 0." in out
    assert "block_grid" in out


def test_float_frames_get_the_root_as_a_formula(bench, capsys, tmp_path):
    # 500 electrons at full scale, read noise 1.2 electrons, in units of full scale
    contract = bench.contract(12)
    (tmp_path / "floats").mkdir()
    for k, light in enumerate(bench.photos(10)):
        codes = bench.expose(light, bench.contract(12, black=64), 8.0, 10.0, k)
        np.save(tmp_path / "floats" / f"{k}.npy", ((codes - 64) / 4095).astype(np.float32))
    words = ["survey", str(tmp_path / "floats"), "-o", str(tmp_path / "run"), "--jobs", "1"]
    with pytest.raises(SystemExit) as stop:
        main(words)
    assert stop.value.code == 0, capsys.readouterr().err
    found, _ = store.load(tmp_path / "run" / "survey", "survey")
    assert found.contract.pixels == "float32"
    assert found.noise.gain == pytest.approx(8 / contract.white, rel=0.05)
    assert found.table.kind == "stabilised"
    assert found.table.values is None
    rng = np.random.default_rng(3)
    for level in (0.02, 0.2, 0.8):
        codes = 8 * rng.poisson(level * 4095 / 8, 100_000) + 10 * rng.standard_normal(100_000)
        values = found.table.apply((codes / 4095).astype(np.float32))
        assert values.std() == pytest.approx(1, abs=0.03)


def drop_frame(home):
    (home / "static" / "scene 1" / "0.png").unlink()


def same_frame(home):
    shutil.copy(home / "static" / "scene 1" / "0.png", home / "static" / "scene 1" / "1.png")


def no_scene(home):
    shutil.rmtree(home / "static")
    (home / "static").mkdir()


def small_dark(home):
    iio.imwrite(home / "dark" / "small.png", np.full((64, 64), BLACK, np.uint8))


def deep_dark(home):
    shutil.rmtree(home / "dark")
    (home / "dark").mkdir()
    iio.imwrite(home / "dark" / "0.png", np.full((64, 64), BLACK, np.uint16))


def no_edge(home):
    iio.imwrite(home / "edge.png", np.full((64, 64), 90, np.uint8))


@pytest.mark.parametrize(
    ("spoil", "option", "name", "said"),
    [
        (drop_frame, "--static", "static", "scene 1: a static scene needs two frames, here is 1"),
        (same_frame, "--static", "static", "1 equal it byte for byte"),
        (no_scene, "--static", "static", "there is no static scene"),
        (None, "--static", "nowhere", "nowhere: there is no such folder"),
        (None, "--dark", "nowhere", "nowhere: there is no such folder"),
        (small_dark, "--dark", "dark", "small.png: this dark frame is 64 x 64 pixels"),
        (deep_dark, "--dark", "dark", "these dark frames are Mono16"),
        (no_edge, "--slanted-edge", "edge.png", "there is no edge in this picture"),
        (None, "--slanted-edge", "dark", "the slanted edge is one picture, not 3"),
    ],
)
def test_frames_that_cannot_serve_are_refused(camera, capsys, tmp_path, spoil, option, name, said):
    home = tmp_path / "home"
    shutil.copytree(camera, home)
    if spoil is not None:
        spoil(home)
    code, out, err = run(capsys, home / "photos", option, home / name, "-o", tmp_path / "out")
    assert code == 3
    assert out == ""
    assert said in err
