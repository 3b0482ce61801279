"""The generated C against the oracle, scipy and OpenCV, and against compilers."""

from __future__ import annotations

import ctypes
import os
import re
import subprocess
from dataclasses import replace

import cv2
import numpy as np
import pytest
from scipy import ndimage

from patchlab.bank import reference, tile_fft
from patchlab.bank.fixed import fixed_point
from patchlab.bank.native import NativeBank
from patchlab.bank.plan import make_plan
from patchlab.conventions import BORDERS
from patchlab.errors import InputError, UsageError, VerificationError
from patchlab.export import c99, c_fft
from patchlab.export.build import (
    FLAGS,
    STRICT,
    compile_library,
    find_compiler,
    library_name,
    run_selftest,
)
from patchlab.export.c_text import double_literal, float_literal
from patchlab.pipeline.edgel_rules import edgel_cases, edgel_rules
from patchlab.store import LICENCE, sha256
from patchlab.types import Thresholds
from tests.bank.banks import given_bank, lattice_bank, picture, random_bank

ONE_TO_NINE = np.arange(1.0, 10.0).reshape(3, 3)
SANITIZE = ("-O1", "-fsanitize=address,undefined", "-fno-sanitize-recover=all")


def case(bank, plan, name, shape, seed=1):
    pixels = picture(shape, bank.contract.pixels, seed)
    return name, pixels, reference.responses(bank, pixels), np.array(plan.error_bound)


def files_of(bank, kind="auto"):
    """The C files with a self-test: smallest size, one more, and odd sides past one chunk."""
    plan = make_plan(bank, kind)
    shapes = {
        "smallest": (bank.size, bank.size),
        "one_more": (bank.size + 1, bank.size),
        "wide": (bank.size + 2, 131),
    }
    cases = [case(bank, plan, name, shape) for name, shape in shapes.items()]
    rules, pictures = edgel_rules(bank), edgel_cases(bank, plan)
    assert bool(pictures) == (rules is not None)
    edgels = pictures[0] if pictures else None
    return plan, c99.emit(bank, plan, rules) | c99.emit_selftest(bank, plan, cases, edgels)


def native(bank, kind="auto", flags=("-O1",)):
    plan = make_plan(bank, kind)
    library = compile_library(c99.emit(bank, plan), bank.name, flags=flags)
    return plan, NativeBank(bank, plan, library, sha256(library))


# the banks whose self-tests are compiled: every basis, pixel type, table, border and strength
VARIANTS = {
    "step": (lattice_bank("step", count=4, size=9, pixels="Mono12", kind="stabilised"), "auto"),
    "energy": (
        lattice_bank(
            "energy", families=("gd1", "gd2"), widths=((1.2, 2.0),), count=8, size=7,
            strength="energy", border="edge",
        ),
        "auto",
    ),
    "line": (
        lattice_bank(
            "line", families=("gd2",), widths=((1.2, 2.0),), count=4, size=7, strength="line",
            pixels="float32", kind="stabilised", border="zero",
        ),
        "auto",
    ),
    "direct": (random_bank(7, 5, border="mirror"), "direct"),
    "parts": (random_bank(3, 5, border="wrap", pixels="Mono16"), "parity"),
    "padded": (
        given_bank(
            np.concatenate([
                np.pad(random_bank(2, 3).taps, ((0, 0), (2, 2), (3, 1))),
                np.pad(lattice_bank(widths=((1.0, 1.5),), count=2, size=5).taps,
                       ((0, 0), (1, 1), (1, 1))),
            ]),
            "padded",
        ),
        "auto",
    ),
    "small": (
        given_bank(
            [[[0.5]], [[-0.5]], [[0.0]], [[3.0]]], "small", pixels="float32", border="mirror"
        ),
        "parity",
    ),
}  # fmt: skip


@pytest.mark.parametrize("name", VARIANTS)
def test_compiles_clean_and_passes_its_selftest(name):
    bank, kind = VARIANTS[name]
    _, files = files_of(bank, kind)
    result = run_selftest(files, bank.name, flags=(*STRICT, "-O1"))
    assert result.passed, result.output
    assert result.output.count("\nok ") > 15
    assert "FAIL" not in result.output


@pytest.mark.parametrize("name", ["step", "energy", "direct"])
def test_sanitizers_have_nothing_to_say(name):
    bank, kind = VARIANTS[name]
    _, files = files_of(bank, kind)
    for lanes in (1, 16):
        flags = (*SANITIZE, f"-D{bank.name}_MAX_LANES={lanes}")
        result = run_selftest(files, bank.name, flags=flags)
        assert result.passed, result.output


@pytest.mark.parametrize("lanes", [1, 4, 8])
def test_every_instruction_set_stays_within_the_bound(lanes):
    bank = replace(VARIANTS["energy"][0], name="energy")
    _, files = files_of(bank)
    flags = (*STRICT, "-O1", f"-D{bank.name}_MAX_LANES={lanes}")
    result = run_selftest(files, bank.name, flags=flags)
    assert result.passed, result.output


def test_the_selftest_can_fail():
    bank, _ = VARIANTS["direct"]
    plan = make_plan(bank)
    name, pixels, expected, tolerance = case(bank, plan, "wrong", (6, 9))
    expected = expected.copy()
    expected[1, 2, 3] += 3 * tolerance[1]
    files = c99.emit(bank, plan) | c99.emit_selftest(
        bank, plan, [(name, pixels, expected, tolerance)]
    )
    result = run_selftest(files, bank.name, flags=("-O1",))
    assert result.passed is False
    assert "FAIL wrong: responses equal the reference" in result.output


# ---------------------------------------------------------------- numbers


@pytest.fixture(scope="module", params=BORDERS)
def asymmetric(request):
    """A bank of one asymmetric kernel, compiled; kernels that cannot hide a flip."""
    bank = given_bank([ONE_TO_NINE], "asymmetric", border=request.param)
    return request.param, native(bank)[1]


@pytest.mark.parametrize("at", [(0, 0), (0, 69), (6, 0), (6, 69), (3, 4), (0, 63), (6, 64)])
def test_impulse_for_every_border(asymmetric, at):
    border, compiled = asymmetric
    pixels = np.zeros((7, 70), dtype=np.uint8)
    pixels[at] = 1
    found = compiled.responses(pixels)[0]
    np.testing.assert_array_equal(
        found, ndimage.correlate(pixels.astype(float), ONE_TO_NINE, mode=BORDERS[border].scipy)
    )
    if border != "wrap":  # OpenCV's filter2D has no wrap
        rule = getattr(cv2, BORDERS[border].opencv)
        np.testing.assert_array_equal(
            found, cv2.filter2D(pixels, cv2.CV_32F, ONE_TO_NINE, borderType=rule)
        )
    if at == (3, 4):
        assert found[2:5, 3:6].tolist() == [[9, 8, 7], [6, 5, 4], [3, 2, 1]]


@pytest.fixture(scope="module")
def compiled():
    """A mirrored two-scale bank of Mono12 pixels."""
    bank = lattice_bank("compiled", count=4, size=9, pixels="Mono12", kind="stabilised")
    return bank, *native(bank)


def test_pictures_wider_than_a_tile(compiled):
    bank, plan, fast = compiled
    assert c99.RING_BYTES / 4 / bank.size < 6000
    pixels = picture((11, 6000), "Mono12")
    error = np.abs(fast.responses(pixels) - reference.responses(bank, pixels)).max(axis=(1, 2))
    assert (error <= plan.error_bound).all()


def test_large_pictures_take_the_streaming_stores(compiled):
    bank, plan, fast = compiled
    pixels = picture((401, 803), "Mono12")
    assert 4 * len(bank) * pixels.size > 8388608
    error = np.abs(fast.responses(pixels) - reference.responses(bank, pixels)).max(axis=(1, 2))
    assert (error <= plan.error_bound).all()


def test_bands_give_the_same_bits(compiled):
    _, _, fast = compiled
    pixels = picture((40, 77), "Mono12")
    whole = fast.responses(pixels)
    strength, turn = fast.edges(pixels, 1)
    for first, count in [(0, 1), (0, 40), (39, 1), (3, 17), (20, 20)]:
        rows = slice(first, first + count)
        band = fast.responses(pixels, rows=(first, count))
        np.testing.assert_array_equal(band, whole[:, rows])
        part, winner = fast.edges(pixels, 1, rows=(first, count))
        np.testing.assert_array_equal(part, strength[rows])
        np.testing.assert_array_equal(winner, turn[rows])


def test_any_strides(compiled):
    bank, _, fast = compiled
    pixels = picture((30, 77), "Mono12")
    whole = fast.responses(pixels)
    for view in (
        np.ascontiguousarray(pixels[::-1])[::-1],
        np.repeat(pixels, 3, axis=0)[::3],
        np.pad(pixels, ((2, 1), (3, 5)))[2:-1, 3:-5],
        np.asfortranarray(pixels),
    ):
        np.testing.assert_array_equal(fast.responses(view), whole)
    for store in (
        np.empty((len(bank), 33, 81), np.float32)[:, 2:32, 3:80],
        np.empty((len(bank), 30, 77), np.float32)[::-1],
        np.empty((len(bank), 30, 77), np.float32)[:, ::-1],
        np.empty((30, len(bank), 77), np.float32).transpose(1, 0, 2),
    ):
        assert fast.responses(pixels, out=store) is store
        np.testing.assert_array_equal(store, whole)


def test_nothing_is_written_beside_the_output(compiled):
    bank, _, fast = compiled
    around = np.full((len(bank), 34, 90), 7, dtype=np.float32)
    fast.responses(picture((30, 77), "Mono12"), out=around[:, 2:32, 4:81])
    around[:, 2:32, 4:81] = 7
    assert (around == 7).all()


@pytest.mark.parametrize(
    ("shape", "dtype", "words"),
    [((8, 30), np.uint16, "smaller"), ((30, 30), np.uint8, "Mono12"), ((30,), np.uint16, "plane")],
)
def test_pictures_that_do_not_fit_are_refused(compiled, shape, dtype, words):
    with pytest.raises(InputError, match=words):
        compiled[2].responses(np.zeros(shape, dtype))


def test_a_code_beyond_the_format_is_refused(compiled):
    pixels = picture((30, 30), "Mono12")
    pixels[29, 29] = 4096
    with pytest.raises(InputError, match="beyond the pixel format"):
        compiled[2].responses(pixels)
    with pytest.raises(InputError, match="beyond the pixel format"):
        compiled[2].edges(pixels, 0)


def test_wrong_scales_bands_and_outputs_are_refused(compiled):
    bank, _, fast = compiled
    pixels = picture((30, 30), "Mono12")
    with pytest.raises(UsageError, match="no such scale"):
        fast.edges(pixels, 2)
    for rows in [(-1, 2), (29, 2), (0, 31)]:
        with pytest.raises(UsageError, match="first_row"):
            fast.responses(pixels, rows=rows)
    for out in (np.empty((len(bank), 30, 30)), np.empty((len(bank), 30, 60), np.float32)[..., ::2]):
        with pytest.raises(UsageError, match="out must be"):
            fast.responses(pixels, out=out)


def test_every_code_has_its_own_message(compiled):
    bank, _, fast = compiled
    message = getattr(fast._library, f"{bank.name}_message")
    message.restype = ctypes.c_char_p
    found = [message(code).decode() for code in range(len(c99.CODES))]
    assert found == [text for _, text in c99.CODES]
    assert len(set(found)) == len(found)
    assert message(-1) == message(len(found)) == b"unknown code"


# ---------------------------------------------------------------- trust


def test_a_library_is_loaded_only_with_its_own_hash(compiled):
    bank, plan, _ = compiled
    with pytest.raises(VerificationError, match="changed"):
        NativeBank(bank, plan, b"not a library", sha256(b"something else"))
    with pytest.raises(InputError, match="does not load"):
        NativeBank(bank, plan, b"not a library", sha256(b"not a library"))


def test_a_library_of_another_bank_is_refused(compiled):
    bank, plan, _ = compiled
    library = compile_library(c99.emit(bank, plan), bank.name, flags=("-O0",))
    taps = bank.taps.copy()
    taps[0, 0, 0] += 1
    other = replace(bank, taps=taps)
    with pytest.raises(VerificationError, match="another bank"):
        NativeBank(other, make_plan(other), library, sha256(library))
    renamed = replace(bank, name="renamed")
    with pytest.raises(VerificationError, match="has no renamed_"):
        NativeBank(renamed, make_plan(renamed), library, sha256(library))


@pytest.mark.parametrize("name", ['x"; abort(); "', "a b", "../a", "é", "1a", "", "a" * 64])
def test_names_that_could_carry_code_are_refused(name):
    bank = random_bank(1, 3)
    plan = make_plan(bank)
    with pytest.raises(UsageError, match="C identifier"):
        c99.emit(replace(bank, name=name), plan)
    kernel = replace(bank.kernels[0], name=name)
    with pytest.raises(UsageError, match="C identifier"):
        c99.emit(replace(bank, kernels=(kernel,)), plan)
    pixels = picture((3, 3))
    with pytest.raises(UsageError):
        c99.emit_selftest(
            bank, plan, [(name, pixels, reference.responses(bank, pixels), np.ones(1))]
        )


# ---------------------------------------------------------------- text


def literals(source: str, array: str) -> np.ndarray:
    body = re.search(rf"{array}\[\d+\] = {{(.*?)}};", source, re.S).group(1)
    return np.array([np.float32(word.strip().rstrip("f")) for word in body.split(",")])


def test_literals_read_back_bit_for_bit():
    bank = lattice_bank(count=6, size=9, pixels="Mono12", kind="stabilised")
    plan = make_plan(bank)
    source = c99.emit(bank, plan)["lattice.c"].decode()
    np.testing.assert_array_equal(literals(source, "lattice_table"), bank.table.values)
    for number, group in enumerate(plan.detail["product_groups"]):
        taps = np.stack([plan.detail["coefficients"][p] for p in group], axis=-1)
        found = literals(source, f"lattice_group{number}_taps")
        assert found.tobytes() == taps.tobytes()


def test_literals_of_awkward_numbers():
    bits = np.random.default_rng(0).integers(0, 2**32, 20_000, dtype=np.uint32)
    values = bits.view(np.float32)
    awkward = np.array([0.0, -0.0, 1e-45, 3.4028235e38, 1.0, -7.0, 0.1], dtype=np.float32)
    for value in np.concatenate([values[np.isfinite(values)], awkward]):
        text = float_literal(value)
        assert re.fullmatch(r"-?\d+(\.\d+)?(e[+-]\d+)?f", text)
        assert "." in text or "e" in text
        assert np.float32(text[:-1]).tobytes() == value.tobytes()
    assert float(double_literal(0.1)) == 0.1
    for value in (np.nan, np.inf):
        with pytest.raises(UsageError, match="finite"):
            float_literal(value)


def test_every_file_tells_its_licence_and_the_same_bytes_come_out():
    bank, kind = VARIANTS["direct"]
    plan, files = files_of(bank, kind)
    assert files == files_of(bank, kind)[1]
    assert set(files) == {
        "arbitrary.h", "arbitrary.c", "arbitrary_selftest.c", "CMakeLists.txt", "arbitrary.pc",
    }  # fmt: skip
    for name, data in files.items():
        words = " ".join(re.sub(r"(?m)^ ?[*#]", " ", data.decode("ascii")).split())
        assert LICENCE in words, name
        assert not re.search(r"@[A-Za-z0-9_]+@", data.decode()), name
    assert "CAUTION" in files["arbitrary.h"].decode()
    assert len(plan.error_bound) == 7


def test_thresholds_stand_in_the_header():
    known = Thresholds(
        np.array([1.0, 10.0, 100.0]), np.array([5.3, 4.8, 4.3]), np.zeros(3), 0.7, 6.0, "white"
    )
    bank = replace(random_bank(1, 3), thresholds=known)
    header = c99.emit(bank, make_plan(bank))["arbitrary.h"].decode()
    assert "#define arbitrary_THRESHOLD_COUNT 3\n" in header
    words = re.search(r"_STRENGTH_THRESHOLDS \{(.*)\}", header).group(1)
    assert [np.float32(w.strip(" f")) for w in words.split(",")] == [
        np.float32(v) for v in known.strength
    ]
    without = c99.emit(replace(bank, thresholds=None), make_plan(bank))["arbitrary.h"].decode()
    assert "THRESHOLD_COUNT" not in without
    assert "STRENGTH_THRESHOLDS" not in without
    assert "GROUPS" not in header
    grouped = replace(known, groups=np.array([0.2, 1.4, 12.5]))
    both = replace(bank, thresholds=grouped, line_thresholds=known)
    header = c99.emit(both, make_plan(bank))["arbitrary.h"].decode()
    assert (
        "#define arbitrary_FALSE_GROUPS_PER_MEGAPIXEL {0.200000003f, 1.39999998f, 12.5f}" in header
    )
    words = re.search(r"_LINE_STRENGTH_THRESHOLDS \{(.*)\}", header).group(1)
    assert len(words.split(",")) == 3


# ---------------------------------------------------------------- programs


def program(folder, main, banks, command, suffix):
    """Compile a program with some banks, run it, and return what it prints."""
    sources = []
    for bank in banks:
        for name, data in c99.emit(bank, make_plan(bank)).items():
            (folder / name).write_bytes(data)
        sources.append(f"{bank.name}.c")
    (folder / f"main.{suffix}").write_text(main)
    subprocess.run(
        [*command, *STRICT, "-O1", "-o", "program", f"main.{suffix}", *sources, "-lm"],
        cwd=folder, check=True, timeout=300,
    )  # fmt: skip
    done = subprocess.run(
        [str(folder / "program")], check=True, capture_output=True, text=True, timeout=60
    )
    return done.stdout.split()


TWO = """
#include "first.h"
#include "second.h"
#include <stdio.h>
static float out[2 * 9 * 9];
static char scratch[1 << 20];
static const float limits[] = first_STRENGTH_THRESHOLDS;
int main(void)
{
    static first_pixel a[9 * 9];
    static second_pixel b[9 * 9];
    if (first_scratch_bytes(9, 9) > sizeof scratch) return 1;
    a[40] = 1;
    b[40] = 1;
    printf("%d ", first_responses(a, 9, 9, 9, out, 36, 324, scratch));
    printf("%g %g ", (double)out[40], (double)limits[first_THRESHOLD_COUNT - 1]);
    printf("%d ", second_responses(b, 18, 9, 9, out, 36, 324, scratch));
    printf("%g %s\\n", (double)out[40], second_kernel_name(1));
    return 0;
}
"""


def two_banks():
    known = Thresholds(np.array([1.0, 10.0]), np.array([5.5, 4.5]), np.zeros(2), 0.7, 6.0, "white")
    first = given_bank(np.arange(18.0).reshape(2, 3, 3), "first")
    second = given_bank(np.arange(50.0).reshape(2, 5, 5), "second", pixels="Mono16")
    return replace(first, thresholds=known), second


def test_two_banks_link_into_one_program(tmp_path):
    command = [*find_compiler().command, *FLAGS]
    assert program(tmp_path, TWO, two_banks(), command, "c") == [
        "0", "4", "4.5", "0", "12", "k1",
    ]  # fmt: skip


def test_the_same_program_as_cpp17(tmp_path):
    command = [*find_compiler().command, "-x", "c++", "-std=c++17"]
    assert program(tmp_path, TWO, two_banks(), command, "cpp") == [
        "0", "4", "4.5", "0", "12", "k1",
    ]  # fmt: skip


def test_strict_cpp17_takes_folds_tables_and_edges(tmp_path):
    bank, _ = VARIANTS["energy"]
    line, _ = VARIANTS["line"]
    main = """
    #include "energy.h"
    #include "line.h"
    #include <cstdio>
    int main() { std::printf("%d %d\\n", energy_scale_count(), line_kernel_count()); return 0; }
    """
    command = [*find_compiler().command, "-x", "c++", "-std=c++17"]
    assert program(tmp_path, main, (bank, line), command, "cpp") == ["1", "4"]


def test_the_library_shows_only_its_own_names(compiled, tmp_path):
    bank, plan, _ = compiled
    (tmp_path / library_name(bank.name)).write_bytes(
        compile_library(c99.emit(bank, plan), bank.name, flags=("-O0",))
    )
    nm = subprocess.run(
        ["nm", "-D", "--defined-only", library_name(bank.name)],
        cwd=tmp_path, capture_output=True, text=True, check=True, env={**os.environ, "LC_ALL": "C"},
    )  # fmt: skip
    names = {row.split()[-1] for row in nm.stdout.splitlines()}
    assert names == {
        f"compiled_{word}"
        for word in (
            "abi", "kernel_count", "kernel_name", "scale_count", "message", "scratch_bytes",
            "responses", "responses_rows", "edges", "edges_rows", "q_step",
            "edges_all", "edges_all_rows", "edges_above", "edges_above_rows",
            "responses_q", "responses_q_rows", "edges_q", "edges_q_rows",
        )
    }  # fmt: skip


# ---------------------------------------------------------------- fixed point


@pytest.mark.parametrize("lanes", [1, 4, 8, 16])
def test_fixed_point_gives_the_same_bits_on_every_instruction_set(lanes):
    bank = lattice_bank(
        "fixed", families=("gd1", "gd2"), widths=((1.2, 2.0),), count=4, size=9,
        pixels="Mono12", kind="stabilised", strength="energy", border="zero",
    )  # fmt: skip
    plan, compiled = native(bank, flags=("-O1", f"-Dfixed_MAX_LANES={lanes}"))
    fixed = plan.detail["fixed"]
    for shape in ((9, 9), (13, 201)):
        pixels = picture(shape, "Mono12")
        counts, ends = fixed.counts(pixels)
        found, saturated = compiled.responses_q(pixels)
        np.testing.assert_array_equal(found, counts)
        assert saturated == ends == 0
        strength, turn = compiled.edges_q(pixels, 0)
        members = plan.detail["strength"][0]
        squares = np.stack(
            [counts[e].astype(int) ** 2 + counts[o].astype(int) ** 2 for _, e, o in members]
        )
        best = np.sqrt(squares.max(axis=0).astype(np.float32)) * np.float32(fixed.step[0])
        np.testing.assert_array_equal(strength, best)
        np.testing.assert_array_equal(turn, squares.argmax(axis=0))


def test_fixed_point_of_the_worst_picture_and_of_saturation():
    bank = random_bank(3, 5)
    plan = make_plan(bank)
    d = plan.detail
    fine = fixed_point(bank, d["bases"], d["coefficients"], d["sums"], d["product_groups"], finer=3)
    plan = replace(plan, detail={**d, "fixed": fine})
    library = compile_library(c99.emit(bank, plan), bank.name, flags=("-O1",))
    compiled = NativeBank(bank, plan, library, sha256(library))
    for k in range(len(bank)):
        extreme = np.where(fine.taps[k] > 0, 255, 0).astype(np.uint8)
        for pixels in (extreme, 255 - extreme, np.tile(extreme, (3, 17))):
            counts, ends = fine.counts(pixels)
            found, saturated = compiled.responses_q(pixels)
            np.testing.assert_array_equal(found, counts)
            assert saturated == ends > 0


def test_fixed_point_is_refused_where_it_is_not(compiled_float):
    with pytest.raises(UsageError, match="12 bits"):
        compiled_float.responses_q(picture((9, 9), "float32"))


@pytest.fixture(scope="module")
def compiled_float():
    return native(random_bank(2, 3, pixels="float32"))[1]


# ---------------------------------------------------------------- tile transforms


def mixed_bank(border="mirror101"):
    mirrored = lattice_bank(widths=((1.5, 2.0),), count=4, size=11).taps
    taps = np.concatenate([mirrored[:2], random_bank(3, 11).taps, mirrored[2:]])
    return given_bank(taps, "mixed", pixels="Mono12", kind="stabilised", border=border)


@pytest.mark.parametrize("lanes", [1, 8, 16])
def test_tile_transforms_pass_the_selftest(lanes):
    bank = mixed_bank("wrap" if lanes == 8 else "zero")
    plan, files = files_of(bank)
    assert {"parity", "tile FFT"} <= set(plan.kind.split(" and "))
    flags = (*(SANITIZE if lanes == 1 else ("-O1",)), *STRICT, f"-Dmixed_MAX_LANES={lanes}")
    result = run_selftest(files, bank.name, flags=flags)
    assert result.passed, result.output


def test_tile_transforms_in_blocks_bands_and_strides():
    bank = random_bank(3, 9, border="mirror")
    plan, compiled = native(bank, "fft")
    assert plan.kind == "tile FFT"
    low, high = (np.uint8(v) for v in (0, 255))
    worst = np.where(np.tile(bank.taps[0], (15, 9)) > 0, high, low)
    for pixels in (worst, picture((57, 131)), picture((131, 9))):
        found = compiled.responses(pixels)
        error = np.abs(found - reference.responses(bank, pixels)).max(axis=(1, 2))
        assert (error <= plan.error_bound).all()
        h = len(pixels)
        for first, count in ((0, 1), (h - 1, 1), (55, 2), (13, h - 20)):
            band = compiled.responses(pixels, rows=(first, count))
            np.testing.assert_array_equal(band, found[:, first : first + count])
        out = np.empty((3, h, pixels.shape[1] + 7), dtype=np.float32)[:, :, 3:-4]
        np.testing.assert_array_equal(compiled.responses(pixels[::-1], out=out), compiled.responses(
            np.ascontiguousarray(pixels[::-1])))  # fmt: skip


def test_counted_work_is_the_work_that_is_written():
    code = c_fft._Code()
    c_fft._forward(code, list(range(c_fft.LENGTH)))
    turns = sum("(turn)" in row for row in code.rows)
    sums = sum(re.search(r" = v\d+ [+-] v", row) is not None for row in code.rows)
    multiplies, adds = tile_fft.work(1, 0)
    assert 2 * turns == multiplies * 64
    assert turns + sums == adds * 64


def test_a_code_beyond_the_format_is_found_by_tile_transforms():
    bank = random_bank(2, 9, pixels="Mono12")
    _, compiled = native(bank, "fft")
    pixels = picture((120, 70), "Mono12")
    pixels[100, 33] = 4096
    with pytest.raises(InputError, match="pixel code"):
        compiled.responses(pixels)
    compiled.responses(pixels, rows=(0, 96))
    with pytest.raises(InputError, match="pixel code"):
        compiled.responses(pixels, rows=(0, 97))


# ---------------------------------------------------------------- threads


@pytest.mark.parametrize("threads", [2, 3, 7])
def test_any_number_of_threads_gives_the_same_bits(compiled, threads):
    _, _, fast = compiled
    pixels = picture((131, 77), "Mono12")
    for rows in (None, (5, 120)):
        one, many = (fast.responses(pixels, rows=rows, threads=t) for t in (1, threads))
        np.testing.assert_array_equal(many, one)
        for call in (fast.edges, fast.edges_q):
            one, many = (call(pixels, 1, rows=rows, threads=t) for t in (1, threads))
            np.testing.assert_array_equal(many[0], one[0])
            np.testing.assert_array_equal(many[1], one[1])
        one, many = (fast.responses_q(pixels, rows=rows, threads=t) for t in (1, threads))
        np.testing.assert_array_equal(many[0], one[0])
        assert many[1] == one[1]


def test_threads_report_what_one_would(compiled):
    _, _, fast = compiled
    pixels = picture((60, 40), "Mono12")
    with pytest.raises(UsageError, match="at least one"):
        fast.responses(pixels, threads=0)
    with pytest.raises(UsageError, match="row_count"):
        fast.responses(pixels, rows=(30, 40), threads=2)
    pixels[59, 3] = 5000
    with pytest.raises(InputError, match="pixel code"):
        fast.responses(pixels, threads=3)


def test_the_selftest_tries_every_code_and_every_output():
    bank, kind = VARIANTS["step"]
    _, files = files_of(bank, kind)
    source = files["step_selftest.c"].decode()
    for code, _ in c99.CODES:
        assert f"step_{code}" in source, code
    output = run_selftest(files, bank.name, flags=("-O1",)).output
    for words in (
        "responses equal the reference",
        "bands and strides give the same bits",
        "strength equals the reference",
        "edges in bands and strides give the same bits",
        "edges above a threshold are those that are found without",
        "all scales in one pass give the same bits",
        "a wide picture of repetitions gives repetitions",
    ):
        assert len(re.findall(rf"^ok +\w+: {words}", output, re.MULTILINE)) >= 3, words
