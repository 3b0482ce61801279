"""The runtime in the bundle: the same numbers as every other target, with numpy alone."""

from __future__ import annotations

import ast
import json
import os
import shutil
import subprocess
import sys
import textwrap
import venv
from dataclasses import replace

import numpy as np
import pytest
from scipy.special import ndtr

from patchlab import edges
from patchlab.bank import load_native, read_bank, reference
from patchlab.bank.plan import make_plan
from patchlab.export import RUNTIME, patchlab_bank
from patchlab.export.patchlab_bank import BankError
from patchlab.pipeline import bundle
from patchlab.store import LICENCE
from tests.bank.banks import lattice_bank, picture
from tests.export.folders import BANKS, put, reseal, scene, write


@pytest.fixture(scope="module")
def folders(tmp_path_factory):
    root = tmp_path_factory.mktemp("banks")
    return {name: write(root / name, bank) for name, bank in BANKS.items()}


@pytest.mark.parametrize("name", BANKS)
def test_numpy_alone_gives_the_exact_values_rounded_once(folders, name):
    bank = BANKS[name]
    loaded = patchlab_bank.load(folders[name], library=False)
    pixels = picture((40, 33), bank.contract.pixels)
    got, exact = loaded.responses(pixels), reference.responses(bank, pixels)
    assert got.dtype == np.float32
    assert got.flags.c_contiguous
    assert (got == exact.astype(np.float32)).mean() > 0.9999
    np.testing.assert_array_less(
        np.abs(got - exact).max(axis=(1, 2)), np.array(make_plan(bank).error_bound)
    )


@pytest.mark.parametrize("name", BANKS)
def test_the_library_gives_the_bits_that_patchlab_gets_from_it(folders, name):
    loaded = patchlab_bank.load(folders[name])
    bank, plan, head = read_bank(folders[name])
    native = load_native(folders[name], bank, plan, head, bundle.own_library(bank))
    pixels = picture((40, 33), bank.contract.pixels)
    for image in (pixels, pixels[::-1], pixels[:, ::-1], pixels[::2], pixels.T):
        expected = native.responses(image)
        for threads in (1, 2, 5, 100):
            np.testing.assert_array_equal(loaded.responses(image, threads), expected)
    for place, scale in enumerate(loaded.scales):
        expected = native.edges(pixels, place)
        for threads in (1, 3):
            np.testing.assert_array_equal(loaded.strengths(pixels, scale, threads), expected)


@pytest.mark.parametrize("name", ["step", "energy", "line"])
@pytest.mark.parametrize("library", [False, True])
def test_edges_are_those_of_patchlab(folders, name, library):
    loaded = patchlab_bank.load(folders[name], library=library)
    pixels = scene(BANKS[name])
    level = float(np.quantile(loaded.strengths(pixels, 0)[0][20:-20, 20:-20], 0.95))
    found = loaded.edges(pixels, threshold=level)
    expected = edges.detect(BANKS[name], pixels, loaded.responses, threshold=level)
    assert 100 < found.edges.sum() < 0.2 * pixels.size
    assert found.threshold == level
    np.testing.assert_array_equal(found.edges, expected.edges)
    same = found.orientation == expected.orientation
    assert same.all() if library else same[found.edges].all() and same.mean() > 0.999  # ties
    np.testing.assert_array_equal(found.scale, expected.scale)
    # the root of squares has other roundings; float64 sums in another order leave 1e-14 for 0
    rtol, atol = (3e-7 if name == "energy" else 0), (0 if library else 1e-11)
    np.testing.assert_allclose(found.strength, expected.strength, rtol=rtol, atol=atol)


def test_octaves_follow_the_same_rules(tmp_path):
    widths = ((1.1, 1.4), (2.2, 2.8), (4.4, 5.6))
    bank = replace(lattice_bank("wide", count=6, widths=widths, size=37), octaves=2)
    loaded = patchlab_bank.load(write(tmp_path / "b", bank, library=False))
    y, x = np.mgrid[:130, :150]
    light = 90 + 25 * ndtr((x - 60 - 0.1 * y) / 4) + 20 * ndtr((y - 70) / 0.8)
    pixels = np.rint(light + np.random.default_rng(4).normal(0, 2, x.shape)).astype(np.uint8)
    level = float(np.quantile(loaded.strengths(pixels, 0)[0][20:-20, 20:-20], 0.9))
    found = loaded.edges(pixels, threshold=level)
    expected = edges.detect(bank, pixels, loaded.responses, threshold=level)
    assert set(found.scale[found.edges]) == {0, 1, 2}
    np.testing.assert_array_equal(found.edges, expected.edges)
    np.testing.assert_array_equal(found.scale, expected.scale)
    plain = edges.detect(replace(bank, octaves=0), pixels, loaded.responses, threshold=level)
    assert (plain.edges != expected.edges).any()


def test_a_promised_rate_becomes_the_threshold_that_patchlab_takes(folders):
    loaded = patchlab_bank.load(folders["step"])
    for rate in (0.1, 2.5, 10.0, 100.0):
        assert loaded.threshold(rate) == edges.strength_for(BANKS["step"].thresholds, rate)
    found = loaded.edges(scene(BANKS["step"]))
    assert found.threshold == loaded.threshold(10.0)
    assert loaded.edges(scene(BANKS["step"]), rate=1.0).threshold == loaded.threshold(1.0)


def test_hysteresis_follows_a_long_thread():
    strength = np.zeros((60, 60), np.float32)
    for y in range(0, 60, 4):  # a snake, all of it weak but its head
        strength[y, :] = 2
        strength[y : y + 4, -1 if y % 8 == 0 else 0] = 2
    strength[0, 0] = 9
    kept = patchlab_bank._hysteresis(strength, 1.0, 8.0)
    np.testing.assert_array_equal(kept, strength > 0)
    strength[30, :] = 0
    assert patchlab_bank._hysteresis(strength, 1.0, 8.0)[31:].sum() == 0


def test_it_tells_what_it_is(folders):
    loaded = patchlab_bank.load(folders["step"])
    assert repr(loaded) == "<bank step: 16 kernels of 11 x 11, Mono8, compiled>"
    assert loaded.kernels[:2] == ("odd_0_0", "odd_0_1")
    assert loaded.scales == (0, 1)
    assert loaded.angles[1] == pytest.approx(np.pi * np.arange(8) / 8)
    assert len(loaded.error_bound) == 16


# ---------------------------------------------------------------- refused


def refused(call, words):
    with pytest.raises(BankError, match=words) as caught:
        call()
    text = str(caught.value)
    assert "\n" not in text
    assert 10 < len(text) < 400


def test_pictures_and_requests_that_do_not_fit_get_one_sentence(folders):
    step = patchlab_bank.load(folders["step"])
    good = picture((30, 30))
    refused(lambda: step.responses(good.astype(np.uint16)), r"Mono8 pixels \(uint8\), not uint16")
    refused(lambda: step.edges(good.astype(np.float32)), "not float32")
    refused(lambda: step.responses(good[None]), "one plane")
    refused(lambda: step.responses(good.tolist()), "one plane")
    refused(lambda: step.responses(good[:10]), "smaller than the bank's 11 x 11")
    refused(lambda: step.strengths(good, 7), "no scale 7")
    refused(lambda: step.edges(good, rate=1e9), "ask for 0.1 to 100")
    refused(lambda: step.edges(good, rate=1.0, threshold=3.0), "not both")
    refused(lambda: step.edges(good, threshold=-1.0), "positive")
    refused(lambda: patchlab_bank.load(folders["energy"]).edges(
        picture((30, 30), "Mono12")), "no thresholds")  # fmt: skip
    refused(lambda: patchlab_bank.load(folders["arbitrary"]).edges(good), "find edges")


@pytest.mark.parametrize("library", [False, True])
def test_a_code_beyond_the_format_is_refused(folders, library):
    loaded = patchlab_bank.load(folders["energy"], library=library)
    pixels = picture((30, 30), "Mono12")
    pixels[15, 15] = 4096
    refused(lambda: loaded.responses(pixels), "beyond")


def test_changed_folders_are_refused(folders, tmp_path):
    def fresh():
        shutil.rmtree(tmp_path / "b", ignore_errors=True)
        return shutil.copytree(folders["step"], tmp_path / "b")

    own = bundle.own_library(BANKS["step"])
    for name in ("kernels.npy", "input_table.npy", own):
        data = bytearray((fresh() / name).read_bytes())
        data[len(data) // 2] ^= 1
        (tmp_path / "b" / name).write_bytes(data)
        refused(lambda: patchlab_bank.load(tmp_path / "b"), "was changed")
        (tmp_path / "b" / name).unlink()
        refused(lambda: patchlab_bank.load(tmp_path / "b"), "cannot be read")
    put(fresh(), own, b"no library")
    refused(lambda: patchlab_bank.load(tmp_path / "b"), "does not load here")
    (fresh() / "edges.json").write_text("{}")
    loaded = patchlab_bank.load(tmp_path / "b")
    refused(lambda: loaded.edges(picture((30, 30))), "was changed")
    put(fresh(), own, (folders["energy"] / bundle.own_library(BANKS["energy"])).read_bytes())
    refused(lambda: patchlab_bank.load(tmp_path / "b"), "no step_")


@pytest.mark.parametrize(
    ("key", "value"),
    [
        ("version", "2.0"),
        ("format", "zip"),
        ("kind", "patches"),
        ("files", None),
        ("name", '"; system("date"); "'),
        ("name", "../../up"),
        ("border", ["mirror"]),
        ("kernels", []),
        ("kernels", 3),
        ("input", {}),
        ("interface", 1),
    ],
)
def test_hostile_manifests_are_refused(folders, tmp_path, key, value):
    folder = shutil.copytree(folders["step"], tmp_path / "b")
    reseal(folder, lambda head: head.update({key: value}))
    refused(lambda: patchlab_bank.load(folder), ".")


def test_a_manifest_that_is_none(folders, tmp_path):
    refused(lambda: patchlab_bank.load(tmp_path), "no bank here")
    for text in ("{", "[]", "[" * 100_000, "{}"):
        (tmp_path / "bank.json").write_text(text)
        refused(lambda: patchlab_bank.load(tmp_path), "bank.json")
    folder = shutil.copytree(folders["step"], tmp_path / "b")
    text = (folder / "bank.json").read_text().replace('"mirror101"', '"zero"')
    (folder / "bank.json").write_text(text)
    refused(lambda: patchlab_bank.load(folder), "was changed")


def test_a_library_that_is_insisted_on_must_be_there(tmp_path):
    folder = write(tmp_path / "b", BANKS["step"], library=False)
    assert patchlab_bank.load(folder).compiled is None
    refused(lambda: patchlab_bank.load(folder, library=True), "compile step.c")


# ---------------------------------------------------------------- standing alone


def test_the_file_stands_alone_and_carries_its_licence(folders):
    source = (folders["step"] / RUNTIME).read_text()
    tree = ast.parse(source)
    names = {a.name for n in ast.walk(tree) if isinstance(n, ast.Import) for a in n.names}
    names |= {n.module or "" for n in ast.walk(tree) if isinstance(n, ast.ImportFrom)}
    roots = {name.split(".")[0] for name in names}
    assert roots - set(sys.stdlib_module_names) == {"numpy"}
    assert " ".join(LICENCE.split()) in " ".join((ast.get_docstring(tree) or "").split())


@pytest.fixture(scope="session")
def numpy_only(tmp_path_factory):
    """The Python of a fresh virtual environment that holds numpy and nothing else."""
    home = tmp_path_factory.mktemp("numpy only")
    venv.create(home, with_pip=False)
    python = home / ("Scripts" if os.name == "nt" else "bin") / "python"
    subprocess.run(
        [sys.executable, "-m", "pip", "--python", python, "install", "--quiet",
         "--disable-pip-version-check", "numpy"],
        check=True,
    )  # fmt: skip
    return python


CHILD = """
import importlib.util, json, sys
sys.path.insert(0, sys.argv[1])
import numpy as np
import patchlab_bank
assert importlib.util.find_spec("patchlab") is None
assert importlib.util.find_spec("scipy") is None
pixels = np.load(sys.argv[2])
for library in (False, True):
    bank = patchlab_bank.load(sys.argv[1], library=library)
    found = bank.edges(pixels)
    np.savez(f"{sys.argv[3]}_{library}.npz", responses=bank.responses(pixels), **found._asdict())
"""


def test_a_bank_runs_where_there_is_nothing_but_numpy(folders, numpy_only, tmp_path):
    pixels = scene(BANKS["step"])
    np.save(tmp_path / "image.npy", pixels)
    alone = {k: v for k, v in os.environ.items() if not k.startswith("PYTHON")}
    subprocess.run(
        [numpy_only, "-c", textwrap.dedent(CHILD), folders["step"], "image.npy", "out"],
        cwd=tmp_path, env=alone, check=True, timeout=120,
    )  # fmt: skip
    bound = np.array(make_plan(BANKS["step"]).error_bound)[:, None, None]
    for library in (False, True):
        here = patchlab_bank.load(folders["step"], library=library)
        there = np.load(tmp_path / f"out_{library}.npz")
        found = here.edges(pixels)
        assert (np.abs(there["responses"] - here.responses(pixels)) < bound).all()
        np.testing.assert_array_equal(there["edges"], found.edges)
        if library:
            np.testing.assert_array_equal(there["responses"], here.responses(pixels))
            np.testing.assert_array_equal(there["strength"], found.strength)


# ---------------------------------------------------------------- as a target


def targets(folder):
    bank, plan, head = read_bank(folder)
    return {
        (c.target, c.what): c
        for c in bundle.prove(folder, bank, plan, head).checks
        if c.target.startswith("Python runtime")
    }


def test_verify_runs_the_runtime(folders, tmp_path, monkeypatch):
    monkeypatch.setattr("patchlab.export.vectors.WIDEST_TILE", 1000)
    found = targets(folders["energy"])
    both = {"Python runtime, numpy", "Python runtime, library"}
    assert {target for target, _ in found} == both | {f"{name}, fixed point" for name in both}
    assert all(c.passed for c in found.values())
    assert ("Python runtime, numpy", "strength, scale 0") in found
    folder = shutil.copytree(folders["energy"], tmp_path / "b")
    source = (folder / RUNTIME).read_text()
    spoilt = source.replace("taps @ view", "taps * 1.001 @ view")
    assert spoilt != source
    put(folder, RUNTIME, spoilt.encode())
    found = targets(folder)
    assert found["Python runtime, numpy", "responses, interior"].passed is False
    assert found["Python runtime, library", "responses, interior"].passed is True
    put(folder, RUNTIME, b"import no_such_module")
    assert [c.passed for c in targets(folder).values()] == [False]
    (folder / RUNTIME).write_bytes(b"")
    assert "was changed" in json.dumps([c.note for c in targets(folder).values()])


@pytest.mark.parametrize("library", [False, True])
def test_elements_are_held_against_a_rival_where_the_rules_say_so(folders, tmp_path, library):
    folder = shutil.copytree(folders["energy"], tmp_path / "b")
    rules = json.loads((folder / "edges.json").read_bytes())
    pixels = scene(BANKS["energy"])
    rules["scales"][0] |= {"rival_kernels": [0, 1, 2, 3], "rival_share": 1.02}
    put(folder, "edges.json", json.dumps(rules).encode())
    free = patchlab_bank.load(folders["energy"], library=library).edges(pixels, threshold=8.0)
    held = patchlab_bank.load(folder, library=library).edges(pixels, threshold=8.0)
    odd = np.abs(patchlab_bank.load(folder, library=library).responses(pixels)[:4]).max(axis=0)
    assert 0 < held.edges.sum() < free.edges.sum()
    assert (held.strength >= 1.02 * odd)[held.edges].all()
    np.testing.assert_array_equal(held.strength, free.strength)
