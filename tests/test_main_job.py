"""The main job as a person runs it: child processes, exit codes, files, bad input."""

import json
import os
import shutil
import signal
import subprocess
import sys
import time
from pathlib import Path

import numpy as np
import pytest
from PIL import Image

from patchlab import store
from patchlab.images import make_sample_images

SMALL = ["--patches", "6000", "--restarts", "1", "--jobs", "1"]


def patchlab(*words, env=None, check=None, **kwargs):
    """Run the command line; gives the finished process."""
    done = subprocess.run(
        [sys.executable, "-m", "patchlab", *map(str, words)],
        capture_output=True,
        text=True,
        env={**os.environ, **(env or {})},
        timeout=300,
        **kwargs,
    )
    assert "Traceback" not in done.stderr, done.stderr
    if check is not None:
        assert done.returncode == check, done.stderr
    return done


def one_sentence(done):
    """The error of a failed command: one line on stderr that starts with the program's name."""
    lines = [line for line in done.stderr.splitlines() if line.startswith("patchlab: error: ")]
    assert len(lines) == 1, done.stderr
    return lines[0]


@pytest.fixture(scope="session")
def photos(tmp_path_factory):
    folder = tmp_path_factory.mktemp("photos dé 写真")
    make_sample_images(folder, 10)
    (folder / ".hidden.png").write_bytes(b"not to be read")
    return folder


@pytest.fixture(scope="session")
def first(photos, tmp_path_factory):
    """One run of the main job: its folder and its JSON."""
    out = tmp_path_factory.mktemp("runs") / "first-bank"
    done = patchlab("run", photos, "-o", out, "--json", *SMALL, check=0)
    return out, json.loads(done.stdout)


def test_run_tells_what_it_made(first):
    out, result = first
    assert result["frames"] == {"used": 10, "quarantined": 0}
    assert result["patches"] == 6000
    assert result["components"] >= 30
    assert result["converged"] is True
    assert result["fits"]["median_r2"] > 0.85
    assert result["fits"]["failed"] < 0.1 * result["components"]
    assert result["fits"]["good"] > 0.3 * result["components"]
    bank = result["bank"]
    assert Path(bank["path"]) == out / "bank"
    assert bank["kernels"] == 16
    assert 0 < bank["worst_error"] <= bank["error_bound"]
    assert 0.2 < bank["coverage"] <= bank["coverage_best"] < 1
    assert 0 < bank["coverage_rotated"] < bank["coverage_best"]
    assert bank["multiplies_per_pixel"] > 0
    assert set(result["seconds"]) >= {
        "reading",
        "survey",
        "patches",
        "dictionary",
        "fits",
        "bank",
        "export",
    }


def test_the_run_folder_holds_what_the_readme_says(first):
    out, _ = first
    assert sorted(p.name for p in out.iterdir()) == [
        "bank", "dictionary", "fits", "patches", "report", "run.json", "survey",
    ]  # fmt: skip
    bank = {p.relative_to(out / "bank").as_posix() for p in (out / "bank").rglob("*")}
    source = {f"first_bank{end}" for end in (".h", ".c", "_selftest.c", ".pc", ".onnx")}
    assert bank >= source | {"bank.json", "kernels.npy", "input_table.npy", "CMakeLists.txt"}
    assert any(name.startswith("lib/") and name.endswith(".so") for name in bank)
    assert {"fits_atoms.csv", "fits_filters.json"} <= {p.name for p in (out / "fits").iterdir()}


def test_the_page_stands_alone(first):
    out, _ = first
    page = (out / "report" / "index.html").read_text()
    assert len(page) < 5_000_000
    for outside in ("http://", "https://", "<script", 'src="/', "url("):
        assert outside not in page
    assert page.count("data:image/png;base64,") >= 12
    for name in ("atoms", "filters", "bank", "edges", "coverage"):
        with Image.open(out / "report" / f"{name}.png") as image:
            assert min(image.size) > 100


def test_verify_finds_every_target_equal_and_a_changed_byte(first, tmp_path):
    out, _ = first
    done = patchlab("verify", out, "--json", check=0)
    result = json.loads(done.stdout)
    ran = {c["target"] for c in result["checks"] if c["passed"]}
    assert result["passed"]
    for target in ("in-process engine", "onnxruntime", "C self-test"):
        assert target in ran
    assert any("library" in target for target in ran)
    copy = tmp_path / "bank"
    shutil.copytree(out / "bank", copy)
    source = copy / "first_bank.c"
    source.write_bytes(source.read_bytes() + b"/* */")
    assert patchlab("verify", copy).returncode == 5


def test_detect_writes_maps_and_edgels(first, photos, tmp_path):
    out, _ = first
    done = patchlab("detect", out, photos, "-o", tmp_path / "d", "--json", check=0)
    result = json.loads(done.stdout)
    assert len(result["images"]) == 10
    for image in result["images"]:
        name = image["path"].replace(".", "_")
        assert image["edgels"] > 100
        assert image["strength_threshold"] > 3
        for kind in ("strength", "orientation", "edges", "overlay"):
            assert (tmp_path / "d" / kind / f"{name}.png").is_file()
        table = (tmp_path / "d" / "edgels" / f"{name}.csv").read_text().splitlines()
        assert len(table) == image["edgels"] + 1
    assert patchlab("detect", out, photos, "-o", tmp_path / "d").returncode == 2


def test_a_picture_of_another_depth_is_refused_with_one_sentence(first, tmp_path):
    out, _ = first
    folder = tmp_path / "deep"
    folder.mkdir()
    Image.fromarray(np.full((80, 80), 40_000, np.uint16)).save(folder / "a.png")
    done = patchlab("detect", out, folder, "-o", tmp_path / "d", check=3)
    assert "Mono8" in one_sentence(done)


def test_the_same_run_gives_the_same_bytes_and_resume_takes_over(first, photos, tmp_path):
    out, _ = first
    again = tmp_path / "first-bank"
    patchlab("run", photos, "-o", again, *SMALL[:-1], "2", check=0)
    for stage in ("survey", "patches", "dictionary", "fits"):
        manifest = (again / stage / "manifest.json").read_bytes()
        assert manifest == (out / stage / "manifest.json").read_bytes(), stage
    assert (again / "bank" / "bank.json").read_bytes() == (out / "bank" / "bank.json").read_bytes()
    before = (again / "dictionary" / "manifest.json").stat().st_mtime_ns
    done = patchlab("run", photos, "-o", again, *SMALL, "--resume", check=0)
    assert "dictionary: kept" in done.stderr
    assert (again / "dictionary" / "manifest.json").stat().st_mtime_ns == before
    assert patchlab("run", photos, "-o", again, *SMALL).returncode == 2


def test_killed_and_resumed_ends_with_the_same_bank(first, photos, tmp_path):
    out, _ = first
    again = tmp_path / "first-bank"
    command = [sys.executable, "-m", "patchlab", "run", photos, "-o", again, *SMALL, "-q"]
    process = subprocess.Popen(command, stderr=subprocess.DEVNULL)
    deadline = time.monotonic() + 120
    while not (again / "patches").is_dir() and time.monotonic() < deadline:
        time.sleep(0.05)
    process.kill()
    process.wait()
    assert not (again / "bank").exists()
    patchlab("run", photos, "-o", again, *SMALL, "--resume", check=0)
    assert (again / "bank" / "bank.json").read_bytes() == (out / "bank" / "bank.json").read_bytes()
    assert not [p for p in again.iterdir() if p.name.startswith(".")]


def test_ctrl_c_keeps_finished_stages_and_says_how_to_go_on(photos, tmp_path):
    out = tmp_path / "stopped"
    command = [sys.executable, "-m", "patchlab", "run", photos, "-o", out, *SMALL]
    process = subprocess.Popen(command, stderr=subprocess.PIPE, text=True)
    deadline = time.monotonic() + 120
    while not (out / "survey").is_dir() and time.monotonic() < deadline:
        time.sleep(0.02)
    process.send_signal(signal.SIGINT)
    _, said = process.communicate(timeout=120)
    assert process.returncode == 130
    assert "--resume" in said
    assert "Traceback" not in said
    assert (out / "survey" / "manifest.json").is_file()


def test_without_a_compiler_the_job_ends_well(photos, tmp_path):
    env = {"PATH": str(tmp_path), "CC": ""}
    out = tmp_path / "no-compiler"
    done = patchlab("run", photos, "-o", out, "--json", *SMALL, env=env, check=0)
    result = json.loads(done.stdout)
    assert "not built" in result["bank"]["library"]
    assert (out / "bank" / "no_compiler.c").is_file()
    assert not (out / "bank" / "lib").exists()
    checks = json.loads(patchlab("verify", out, "--json", env=env, check=0).stdout)["checks"]
    assert any(c["target"] == "C self-test" and c["passed"] is None for c in checks)


def test_home_and_cache_that_cannot_be_written(photos, tmp_path):
    blocked = tmp_path / "file"
    blocked.write_text("a file where a folder would be")
    env = {"HOME": str(blocked), "XDG_CACHE_HOME": str(blocked / "cache"), "MPLCONFIGDIR": "",
           "LC_ALL": "C"}  # fmt: skip
    done = patchlab("survey", photos, "-o", tmp_path / "s", "--json", env=env, check=0)
    assert json.loads(done.stdout)["frames"]["used"] == 10


# ---------------------------------------------------------------- bad input


def frames(folder, *arrays):
    """A folder of PNG frames."""
    folder.mkdir()
    for i, array in enumerate(arrays):
        Image.fromarray(array).save(folder / f"{i}.png")
    return folder


def noise(shape, seed=0):
    """A picture of noise."""
    return np.random.default_rng(seed).integers(0, 255, shape).astype(np.uint8)


@pytest.mark.parametrize(
    ("make", "says"),
    [
        (lambda p: p / "nowhere", "nowhere"),
        (lambda p: frames(p / "empty"), "no picture"),
        (lambda p: frames(p / "flat", np.full((90, 90), 128, np.uint8)), "flat"),
        (lambda p: frames(p / "tiny", noise((6, 6))), "patch"),
    ],
    ids=["missing", "empty", "flat", "tiny"],
)
def test_photographs_that_cannot_serve_end_with_exit_3_and_one_sentence(tmp_path, make, says):
    done = patchlab("run", make(tmp_path), "-o", tmp_path / "out", *SMALL, check=3)
    assert says in one_sentence(done)
    assert not (tmp_path / "out" / "bank").exists()


def test_bad_files_are_quarantined_up_to_max_bad(photos, tmp_path):
    folder = tmp_path / "mixed"
    shutil.copytree(photos, folder)
    good = next(p for p in sorted(folder.iterdir()) if p.suffix == ".png" and p.name[0] != ".")
    (folder / "broken.png").write_bytes(good.read_bytes()[:500])
    (folder / "empty.png").write_bytes(b"")
    done = patchlab("survey", folder, "-o", tmp_path / "s", "--max-bad", "0.5", "--json", check=0)
    assert json.loads(done.stdout)["frames"] == {"used": 10, "quarantined": 2}
    done = patchlab("survey", folder, "-o", tmp_path / "t", check=3)
    assert "broken.png" in done.stderr
    assert "empty.png" in done.stderr


@pytest.mark.parametrize(
    "words",
    [
        ["--patch-size", "7"],
        ["--kernels", "zero"],
        ["--patchsize", "12"],
        ["--border", "reflect"],
        ["--max-memory", "0.25", "--patches", "5000000"],
        ["--config", "nowhere.toml"],
    ],
    ids=" ".join,
)
def test_wrong_words_end_with_exit_2_before_any_work(photos, tmp_path, words):
    patchlab("run", photos, "-o", tmp_path / "out", *words, check=2)
    assert not (tmp_path / "out" / "patches").exists()


def test_nothing_is_written_under_the_photographs(photos):
    done = patchlab("run", photos, "-o", photos / "out", *SMALL, check=2)
    assert "under the photographs" in one_sentence(done)
    assert not (photos / "out").exists()


def test_config_file_print_config_and_dry_run(photos, tmp_path):
    config = tmp_path / "camera.toml"
    config.write_text("patch_size = 10\nkernels = 8\n")
    words = ("run", photos, "-o", tmp_path / "o", "--config", config)
    done = patchlab(*words, "--kernels", "12", "--print-config", check=0)
    assert "patch_size = 10" in done.stdout
    assert "kernels = 12" in done.stdout
    config.write_text("patchsize = 10\n")
    done = patchlab("run", photos, "-o", tmp_path / "o", "--config", config, check=2)
    assert "patch_size" in one_sentence(done)
    done = patchlab("run", photos, "-o", tmp_path / "o", "--dry-run", "--json", check=0)
    assert json.loads(done.stdout)["files"] == 10
    assert not (tmp_path / "o").exists()


def test_a_bank_from_ones_own_kernels(tmp_path):
    taps = tmp_path / "mine.npy"
    kernels = np.stack([np.outer([1, 2, 1], [-1, 0, 1]), np.arange(9).reshape(3, 3)])
    np.save(taps, kernels)
    words = ("export", "--taps", taps, "--pixels", "Mono12", "-o", tmp_path / "mine", "--json")
    result = json.loads(patchlab(*words, check=0).stdout)
    assert (result["kernels"], result["size"], result["pixels"]) == (2, 3, "Mono12")
    assert np.array_equal(np.load(tmp_path / "mine" / "kernels.npy"), kernels.astype(np.float32))
    patchlab("verify", tmp_path / "mine", check=0)
    np.save(taps, kernels[:, :2, :2])
    assert patchlab(*words, "--force").returncode in (2, 3)


def test_compare_says_equal_and_different(first, tmp_path):
    out, _ = first
    same = json.loads(patchlab("compare", out / "bank", out / "bank", "--json", check=0).stdout)
    assert same["verdict"] == "bit-equal"
    np.save(tmp_path / "k.npy", np.random.default_rng(0).normal(size=(3, 7, 7)))
    patchlab("export", "--taps", tmp_path / "k.npy", "-o", tmp_path / "k", check=0)
    other = json.loads(patchlab("compare", out / "bank", tmp_path / "k", "--json", check=0).stdout)
    assert other["verdict"] == "different"


def test_the_page_shows_the_assessment_of_this_bank_only(first, tmp_path):
    out, result = first
    copy = tmp_path / "run"
    shutil.copytree(out, copy)

    def row(detector, picture, f):
        return {"detector": detector, "picture": picture, "setting": "10 a Mpx", "f": [f, f],
                "precision": [f, f], "recall": [f, f], "mean_f": f}  # fmt: skip

    rivals = [row("Other", kind, 0.5) for kind in ("raw", "stretched", "tabled")]
    step = {"contrast": 10.0, "rms_px": 0.05, "bound_px": 0.04, "ratio": 1.25}
    flat = {"asked": 10.0, "found": 11.5, "groups": 2.0, "flat": True}
    found = {
        "id": result["bank"]["id"], "rate": 10.0, "quick": False, "rates": [flat],
        "location": [step, {**step, "contrast": 20.0}],
        "detection": {
            "light_electrons": [400.0, 8.0],
            "ours": [row("this bank", "tabled", 0.7)], "fixed": rivals, "tuned": rivals,
            "lead": {"over_best_fixed_on_raw": 0.2, "over_best_fixed_on_stretched": 0.2,
                     "over_best_fixed_on_tabled": 0.2, "over_best_tuned": 0.2},
        },
    }  # fmt: skip

    def page(about):
        files = {"assess.json": json.dumps(about).encode()}
        store.write_artefact(copy / "assess", "assess", files, force=True)
        patchlab("report", copy, check=0)
        return (copy / "report" / "index.html").read_text(encoding="utf-8")

    shown = page(found)
    assert "Assessed on made pictures" in shown
    assert '<td class="n">11.5</td>' in shown
    assert (copy / "report" / "assess_light.png").is_file()
    assert "Assessed on made pictures" not in page({**found, "id": "another"})


# ---------------------------------------------------------------- nothing is lost


def test_force_removes_nothing_before_its_successor_stands(first, photos, tmp_path):
    copy = tmp_path / "run"
    shutil.copytree(first[0], copy)
    bank = (copy / "bank" / "bank.json").read_bytes()
    patchlab("run", tmp_path / "nowhere", "-o", copy, "--force", *SMALL, check=3)
    patchlab("run", photos, "-o", copy, "--force", "--dry-run", *SMALL, check=0)
    assert (copy / "bank" / "bank.json").read_bytes() == bank
    patchlab("survey", photos, "-o", copy, "--force", check=0)
    assert sorted(p.name for p in copy.iterdir()) == ["report", "survey"]


def test_folders_that_only_share_a_name_are_left_alone(photos, tmp_path):
    mine = tmp_path / "mine" / "report"
    mine.mkdir(parents=True)
    (mine / "thesis.txt").write_text("years of work")
    done = patchlab("run", photos, "-o", tmp_path / "mine", "--force", *SMALL, check=2)
    assert "left alone" in one_sentence(done)
    assert (mine / "thesis.txt").read_text() == "years of work"
    patchlab("scenes", "-o", mine, "--count", "1", check=2)
    assert [p.name for p in mine.iterdir()] == ["thesis.txt"]


def test_options_without_effect_and_taps_beyond_reach_are_refused(first, tmp_path):
    done = patchlab("export", first[0], "--pixels", "Mono12", "-o", tmp_path / "b", check=2)
    assert "--pixels" in one_sentence(done)
    np.save(tmp_path / "k.npy", np.full((1, 5, 5), 3e38))
    taps = ("export", "--taps", tmp_path / "k.npy", "-o", tmp_path / "k")
    assert "float32" in one_sentence(patchlab(*taps, check=3))
    assert "65535" not in one_sentence(patchlab(*taps, "--white", "70000", check=2))
    assert not (tmp_path / "k").exists()
