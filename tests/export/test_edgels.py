"""Edgels of the compiled code: the very elements that Python finds, in the same places."""

from __future__ import annotations

import re
import subprocess
from dataclasses import replace
from pathlib import Path

import numpy as np
import pytest

from patchlab import bank as banks
from patchlab import edges, export, load_bank
from patchlab.bank.native import NativeBank
from patchlab.bank.plan import make_plan
from patchlab.errors import InputError, UsageError
from patchlab.export import build, c99, edgel_vectors, patchlab_bank
from patchlab.export.compare import Target
from patchlab.export.vectors import array_in
from patchlab.images import ReadOptions, read_file
from patchlab.pipeline import detect as job
from patchlab.pipeline.edgel_rules import edgel_cases, edgel_finder, edgel_rules
from patchlab.store import sha256
from patchlab.types import EDGEL, InputContract, InputTable
from tests.bank.banks import lattice_bank
from tests.edges.conftest import build_bank, root_table
from tests.export.folders import BANKS, TABLE, scene, write

ROOT = Path(__file__).parents[2]
RGB = InputContract("Mono8", 10, 240, "srgb")
CODES = np.arange(256.0)
SMOOTH = np.convolve([1, 2, 1], [1, 2, 1]) / 6
TWO = ("odd", "even")


def named(name, *, blur=None, octaves=0, **about):
    about.setdefault("table", root_table())
    known = {"blur_sigma_px": blur} if blur else {}
    return replace(build_bank(**about), name=name, provenance=known, octaves=octaves)


# a bank, the strength asked for steps (or its own kind), and for lines: every kind, format,
# table and border; some with a known blur, coloured noise, octaves
ASKED = {
    "step": (BANKS["step"], 42.0, 0.0),
    "both": (named("both", parities=TWO, blur=0.75), 5.0, 5.0),
    "lines_alone": (named("lines", parities=TWO), 0.0, 5.0),
    "line": (BANKS["line"], 0.2, 0.0),
    "energy": (BANKS["energy"], 6.0, 0.0),
    "coloured": (named("coloured", autocovariance=np.outer(SMOOTH, SMOOTH)), 5.0, 0.0),
    "srgb": (
        named("srgb", table=InputTable("stabilised", RGB, (9 * CODES**0.5).astype("f4"), 1.0)),
        6.0,
        0.0,
    ),
    "float": (named("plain", table=None), 0.03, 0.0),
    "root": (
        lattice_bank("root", count=4, size=9, pixels="float32", kind="stabilised", border="zero"),
        0.5,
        0.0,
    ),
    "twelve": (
        lattice_bank("twelve", families=("gd1", "gd2"), count=6, size=9, pixels="Mono12",
                     kind="stabilised", border="wrap"),
        20.0,
        30.0,
    ),
    "octaves": (
        named("octaves", scales=((1.1, 1.6), (2.2, 3.2), (4.4, 6.4)), parities=TWO, octaves=2,
              blur=0.8),
        4.0,
        0.0,
    ),
}  # fmt: skip


def compiled(bank, flags=None):
    """The bank's library; by default for one instruction set alone, which compiles quickly."""
    flags = ("-O1", f"-D{bank.name}_MAX_LANES=4") if flags is None else flags
    plan = make_plan(bank)
    data = build.compile_library(export.emit(bank, plan, edgel_rules(bank)), bank.name, flags=flags)
    return NativeBank(bank, plan, data, sha256(data))


def assert_same(got, expected, shape):
    """The same elements; places within 1e-6 px beside one rounding to float32."""
    assert got.dtype == EDGEL
    assert len(got) == len(expected)
    for name in ("strength", "scale", "kind"):
        np.testing.assert_array_equal(got[name], expected[name])
    step = 1e-6 + float(np.spacing(np.float32(max(shape))))
    for name in ("x", "y"):
        np.testing.assert_allclose(got[name].astype(float), expected[name], rtol=0, atol=step)
    turn = np.where(expected["kind"] == 0, 2 * np.pi, np.pi)
    off = np.abs(got["theta"].astype(float) - expected["theta"])
    assert (np.minimum(off, np.abs(turn - off)) < 2e-6).all()
    np.testing.assert_allclose(got["sd"], expected["sd"], rtol=1e-5)
    np.testing.assert_allclose(got["width"], expected["width"], rtol=1e-5, atol=1e-4)


@pytest.mark.parametrize("name", ASKED)
def test_they_are_those_that_python_finds(name):
    bank, high, lines = ASKED[name]
    native, find, total = compiled(bank), edgel_finder(bank), 0
    for shape in ((bank.size, bank.size + 2), (71, 90), (bank.size + 40, bank.size + 1)):
        pixels = scene(bank, shape)
        expected = find(pixels, native.responses(pixels), high, lines)
        assert_same(native.edgels(pixels, high, lines), expected, shape)
        total += len(expected)
    assert total > 60


@pytest.fixture(scope="module")
def shipped():
    """The bank made from the sample images, compiled as it is shipped."""
    bank, _, _ = banks.read_bank(ROOT / "filters" / "tessary_edges")
    return bank, compiled(bank, ())


def frame(bank, name):
    known = ReadOptions(white=255.0, black=0.0, transfer="linear", pixels=bank.contract.pixels)
    (found,) = read_file(ROOT / "sample_images", name, known)
    return found.pixels


@pytest.mark.parametrize("name", ["bed-01.png", "yard-03.png"])
def test_on_sample_images(shipped, name):
    bank, native = shipped
    pixels = np.ascontiguousarray(frame(bank, name)[60:263, 40:311])
    high = edges.strength_for(bank.thresholds, 10.0)
    expected = edgel_finder(bank)(pixels, native.responses(pixels), high, 0.0)
    assert len(expected) > 1500
    assert_same(native.edgels(pixels, high), expected, pixels.shape)


@pytest.mark.parametrize("spread", [1.0, 14.0])
def test_on_white_noise(shipped, spread):
    """On the noise of the table, and on much more; low thresholds, so that there are many."""
    bank, native = shipped
    noise = np.random.default_rng(5).normal(bank.table.values[90], spread, (170, 211))
    pixels = np.rint(np.interp(noise, bank.table.values, np.arange(256))).astype(np.uint8)
    expected = edgel_finder(bank)(pixels, native.responses(pixels), 2.6 * spread, 0.0)
    assert len(expected) > 700
    assert_same(native.edgels(pixels, 2.6 * spread), expected, pixels.shape)


def test_levels_that_differ_by_a_rounding_do_not_choose_the_way(shipped):
    """Far above the table's noise some fits begin with equal levels on either side: no edge."""
    bank, native = shipped
    noise = np.random.default_rng(0).normal(120, 25, (240, 320))
    pixels = np.clip(noise, 0, 255).astype(np.uint8)
    expected = edgel_finder(bank)(pixels, native.responses(pixels), 4.2, 0.0)
    assert len(expected) > 5000
    assert_same(native.edgels(pixels, 4.2), expected, pixels.shape)


def test_layouts_and_repetition_change_no_bit(shipped):
    bank, native = shipped
    pixels = frame(bank, "bed-01.png")[:90, :130]
    first = native.edgels(np.ascontiguousarray(pixels), 5.0)
    for other in (pixels, np.ascontiguousarray(pixels[::-1])[::-1], np.asfortranarray(pixels)):
        np.testing.assert_array_equal(native.edgels(other, 5.0), first)


def test_what_does_not_fit_is_refused(shipped):
    _, native = shipped
    pixels = np.zeros((40, 40), np.uint8)
    for high, lines in ((0.0, 0.0), (-1.0, 0.0), (np.nan, 0.0), (5.0, 5.0), (5.0, np.inf)):
        with pytest.raises(UsageError, match="threshold"):
            native.edgels(pixels, high, lines)
    with pytest.raises(InputError, match="smaller"):
        native.edgels(pixels[:5], 5.0)
    assert len(native.edgels(pixels, 5.0)) == 0


def test_a_bank_without_oriented_kernels_has_none():
    bank = BANKS["arbitrary"]
    assert edgel_rules(bank) is None
    assert edgel_cases(bank, make_plan(bank)) == ()
    native = compiled(bank)
    assert not native.has_edgels
    with pytest.raises(UsageError, match="no edgels"):
        native.edgels(np.zeros((20, 20), np.uint8), 1.0)


# ---------------------------------------------------------------- the C itself


@pytest.mark.parametrize("name", ["both", "coloured", "octaves", "root"])
def test_c_and_cpp_compile_clean(name, tmp_path):
    bank, _, _ = ASKED[name]
    build._unpack(tmp_path, c99.emit(bank, make_plan(bank), edgel_rules(bank)))
    compiler = build.find_compiler().command
    strict = [*build.STRICT, "-O1", "-fsyntax-only"]
    build._run(tmp_path, [*compiler, "-std=c99", *strict, f"{bank.name}.c"])
    build._run(tmp_path, [*compiler, "-x", "c++", "-std=c++17", *strict, f"{bank.name}.c"])


def readme_example():
    """The C example of the README."""
    text = (ROOT / "README.md").read_text(encoding="utf-8")
    (example,) = [b for b in re.findall(r"```c\n(.*?)```", text, re.DOTALL) if "_edgels(" in b]
    return example


def test_the_readmes_example_runs_beside_a_second_bank(tmp_path):
    one = replace(BANKS["step"], name="first_bank")
    other = replace(named("second_bank", parities=TWO), thresholds=TABLE)
    pixels = scene(one, (80, 90))
    for bank in (one, other):
        build._unpack(tmp_path, export.emit(bank, make_plan(bank), edgel_rules(bank)))
    rows = ", ".join(str(v) for v in pixels.ravel())
    program = (
        '#include "first_bank.h"\n#include "second_bank.h"\n'
        "#include <stdio.h>\n#include <stdlib.h>\n"
        f"static const first_bank_pixel image[] = {{{rows}}};\n"
        f"int main(void)\n{{\n    const int width = 90, height = 80;\n{readme_example()}"
        "    if (second_bank_edgels(image, 90, width, height, 9.0, 9.0, NULL, 0, &count, NULL)\n"
        "        != second_bank_NO_SCRATCH) free(memory);\n    return done;\n}\n"
    )
    (tmp_path / "main.c").write_text(program)
    lanes = [f"-D{bank.name}_MAX_LANES=4" for bank in (one, other)]
    command = [*build.find_compiler().command, *build.FLAGS, "-O1", *lanes, "-o", "main", "main.c"]
    build._run(tmp_path, [*command, "first_bank.c", "second_bank.c", "-lm"])
    said = subprocess.run([tmp_path / "main"], capture_output=True, text=True, check=True).stdout
    native = compiled(one)
    expected = native.edgels(pixels, float(np.float32(42.0)))
    assert len(expected) > 50
    assert said.splitlines() == [f"{e['x']:.3f} {e['y']:.3f} +- {e['sd']:.3f} px" for e in expected]


# ---------------------------------------------------------------- vectors and targets


def as_target(native, edgels=None):
    return Target("mine", native.responses, native.edges, edgels=edgels or native.edgels)


def test_stored_edgels_come_back_and_are_compared():
    bank = ASKED["both"][0]
    plan, native, find = make_plan(bank), compiled(bank), edgel_finder(bank)
    cases = edgel_cases(bank, plan, crop=scene(bank, (300, 300)))
    assert cases[0].name == "scene"
    files, entries = edgel_vectors.edgel_files(cases)
    files |= {"vectors/cases.json": export.vector_files(
        bank, export.make_cases(bank, plan, banks.exact_responses, small=True), {"cases": entries}
    )["vectors/cases.json"]}  # fmt: skip
    again = edgel_vectors.load_edgel_cases(files.__getitem__, array_in)
    for case, back in zip(cases, again, strict=True):
        np.testing.assert_array_equal(back.expected, case.expected)
        np.testing.assert_array_equal(back.pixels, case.pixels)
        assert (back.threshold, back.line_threshold) == (case.threshold, case.line_threshold)
    checks = list(edgel_vectors.edgel_checks(as_target(native), again, find))
    assert [c.passed for c in checks] == [True, True]
    assert checks[0].worst_error < edgel_vectors.TOLERANCE_PX / 2


def moved(native, column, by):
    def edgels(*asked):
        found = native.edgels(*asked)
        found[column][1] += by
        return found

    return edgels


@pytest.mark.parametrize(("column", "by"), [("x", 1e-4), ("kind", 1), ("scale", 1)])
def test_a_target_that_differs_fails(column, by):
    bank = ASKED["step"][0]
    plan, native = make_plan(bank), compiled(bank)
    cases, find = edgel_cases(bank, plan), edgel_finder(bank)
    checks = list(
        edgel_vectors.edgel_checks(as_target(native, moved(native, column, by)), cases, find)
    )
    assert checks[1].passed is False

    def fewer(*asked):
        return native.edgels(*asked)[1:]

    assert not any(
        c.passed for c in edgel_vectors.edgel_checks(as_target(native, fewer), cases, find)
    )

    def broken(*asked):
        raise UsageError("no such thing")

    (check,) = edgel_vectors.edgel_checks(as_target(native, broken), cases, find)
    assert check.passed is False
    assert "no such thing" in check.note


# ---------------------------------------------------------------- in the folder


@pytest.fixture(scope="module")
def folder(tmp_path_factory):
    return write(tmp_path_factory.mktemp("edgels") / "bank", BANKS["step"])


def test_the_runtime_and_the_loaded_bank_give_them(folder):
    pixels = scene(BANKS["step"])
    mine = load_bank(folder, library=True).edgels(pixels, rate=10.0)
    assert len(mine) > 100
    found = patchlab_bank.load(folder).edgels(pixels, rate=10.0)
    for name in EDGEL.names:
        np.testing.assert_array_equal(found[name], mine[name])
    with pytest.raises(patchlab_bank.BankError, match="edgels take a compiled library"):
        patchlab_bank.load(folder, library=False).edgels(pixels)
    with pytest.raises(patchlab_bank.BankError, match="threshold"):
        patchlab_bank.load(folder).edgels(pixels, line_threshold=3.0)
    slow = load_bank(folder).edgels(pixels, rate=10.0)  # numpy's responses differ in the last bits
    assert len(slow) == len(mine)
    np.testing.assert_allclose(slow["x"], mine["x"], atol=2e-3)


def test_detect_writes_the_same_with_and_without_the_compiled_edgels(folder, tmp_path, monkeypatch):
    import cv2

    (tmp_path / "photos").mkdir()
    cv2.imwrite(str(tmp_path / "photos" / "a.png"), scene(BANKS["step"]))
    request = job.Request(rate=10.0)
    job.detect(folder, tmp_path / "photos", tmp_path / "fast", request)
    monkeypatch.setattr(job, "compiled_edgels", lambda *asked: None)
    job.detect(folder, tmp_path / "photos", tmp_path / "slow", request)
    fast, slow = (
        np.genfromtxt(tmp_path / kind / "edgels.csv", delimiter=",", names=True, dtype=None)
        for kind in ("fast", "slow")
    )
    assert len(fast) == len(slow) > 100
    for name in ("x_px", "y_px", "sd_px"):
        np.testing.assert_allclose(fast[name], slow[name], rtol=1e-6)
