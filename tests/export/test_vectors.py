"""Test vectors: they catch what they are meant to catch, and stay small."""

from __future__ import annotations

import json

import numpy as np
import pytest
from hypothesis import given, settings
from hypothesis import strategies as st
from scipy import ndimage

from patchlab.conventions import BORDERS, gamma
from patchlab.errors import InputError
from patchlab.export.vectors import (
    edges_lacking,
    load_cases,
    magnitudes,
    make_cases,
    make_probes,
    orientations,
    strength_tolerance,
    vector_files,
)
from patchlab.types import Bank, InputContract, InputTable, Kernel, Plan

FORMATS = ("Mono8", "Mono10", "Mono12", "Mono16", "float32")


def make(pixels="Mono8", border="mirror101", size=7, count=4, parity="odd", **more):
    """Random kernels without symmetry under a square-root table (identity for float32)."""
    bits = 0 if pixels == "float32" else int(pixels[4:])
    contract = InputContract(pixels, 0, 2**bits - 1 if bits else 1)
    if bits:
        values = np.sqrt(np.arange(2**bits) * (700 / 2**bits) + 0.3).astype(np.float32)
        table = InputTable("stabilised", contract, values, 1.0)
    else:
        table = InputTable("identity", contract, None, None)
    taps = np.random.default_rng(size).standard_normal((count, size, size)).astype(np.float32)
    kernels = tuple(Kernel(f"k{i}", "gd1", parity, 0, i, {}, 1.0) for i in range(count))
    return Bank("demo", kernels, taps, table, border, **more)


def oracle(bank, pixels):
    working = bank.table.apply(pixels).astype(np.float64)
    mode = BORDERS[bank.border].scipy
    return np.stack(
        [ndimage.correlate(working, k.astype(np.float64), mode=mode) for k in bank.taps]
    )


def reach(bank):
    return np.abs(bank.taps.astype(np.float64)).sum(axis=(1, 2)) * bank.table.span


def plan_of(bank):
    bounds = tuple(float(b) for b in gamma(bank.size**2) * reach(bank))
    return Plan("direct", (), 0.0, 0.0, bounds)


def cases_of(bank, **more):
    return {c.name: c for c in make_cases(bank, plan_of(bank), oracle, **more)}


@pytest.mark.parametrize("border", BORDERS)
def test_the_impulse_case_shows_the_flipped_kernels(border):
    """Black level 0 under the identity: nothing but the impulse reaches the answer."""
    case = cases_of(make("float32", border))["impulse"]
    bank = make("float32", border)
    assert np.count_nonzero(case.pixels) == 1
    (y,), (x,) = np.nonzero(case.pixels)
    assert (y, x) == (4, 5)
    h, w = case.pixels.shape
    assert y != h - 1 - y
    assert x != w - 1 - x
    wanted = np.zeros((4, h, w))
    wanted[:, 1:8, 2:9] = bank.taps[:, ::-1, ::-1]
    assert np.array_equal(case.expected, wanted)


@pytest.mark.parametrize("pixels", FORMATS)
def test_every_picture_is_one_the_bank_takes(pixels):
    bank = make(pixels)
    form = bank.contract.format
    cases = cases_of(bank)
    for case in cases.values():
        assert case.pixels.dtype == np.dtype(form.dtype)
        assert case.pixels.flags.c_contiguous
        assert min(case.pixels.shape) >= bank.size
        assert case.pixels.min() >= 0
        assert case.pixels.max() <= form.full_scale
    assert cases["flat"].pixels.max() == form.full_scale
    used = len(np.unique(np.concatenate([c.pixels.ravel() for c in cases.values()])))
    assert used > min(200, form.full_scale // 2)


def test_sizes_cover_what_tiles_and_borders_get_wrong():
    shapes = [c.pixels.shape for c in cases_of(make()).values()]
    assert (7, 7) in shapes
    assert (8, 8) in shapes
    assert any(h % 2 and w % 2 and h != w for h, w in shapes)
    assert any(w > 6 * h for h, w in shapes)
    assert any(h > w for h, w in shapes)
    probes = make_probes(make(), plan_of(make()), oracle)
    assert max(c.pixels.shape[1] for c in probes) > 196_608 // (4 * 7)  # a ring in 192 kB
    assert max(c.pixels.shape[0] for c in probes) > 64


def test_another_border_changes_the_corner_case():
    """If two borders gave the same answers, the vectors could not tell them apart."""
    corners = {b: cases_of(make("Mono8", b))["corners"].expected for b in BORDERS}
    tolerance = max(plan_of(make()).error_bound)
    for a in BORDERS:
        for b in BORDERS:
            if a != b:
                assert np.abs(corners[a] - corners[b]).max() > 100 * tolerance


@pytest.mark.parametrize("pixels", FORMATS)
def test_the_worst_picture_drives_its_kernel_to_the_extremes(pixels):
    bank = make(pixels)
    k = int(np.argmax(plan_of(bank).error_bound))
    form = bank.contract.format
    ends = np.array([0, form.full_scale], dtype=form.dtype)
    values = bank.table.apply(ends).astype(np.float64)
    taps = bank.taps[k].astype(np.float64)
    largest = np.where(taps > 0, taps * values[1], taps * values[0]).sum()
    assert cases_of(bank)["worst"].expected[k].max() > 0.9 * largest


def test_a_falling_table_is_driven_by_its_values_not_its_codes():
    bank = make()
    falling = InputTable("log", bank.contract, bank.table.values[::-1].copy(), 1.0)
    turned = Bank("demo", bank.kernels, bank.taps, falling)
    a = cases_of(bank)["worst"].expected
    b = cases_of(turned)["worst"].expected
    k = int(np.argmax(plan_of(bank).error_bound))
    assert b[k].max() == pytest.approx(a[k].max(), rel=0.1)


@pytest.mark.parametrize("pixels", FORMATS)
def test_float32_sums_keep_the_bound_and_come_near_enough_to_mean_something(pixels):
    """Tap after tap in float32, on the pictures meant to be worst."""
    bank = make(pixels, size=11)
    worst = 0.0
    for case in (*cases_of(bank).values(), *make_probes(bank, plan_of(bank), oracle)):
        r, (h, w) = bank.radius, case.pixels.shape
        padded = np.pad(bank.table.apply(case.pixels), r, mode=BORDERS[bank.border].numpy)
        got = np.zeros(case.expected.shape, dtype=np.float32)
        for j in range(bank.size):
            for i in range(bank.size):
                got += bank.taps[:, j, i, None, None] * padded[j : j + h, i : i + w]
        ratio = np.abs(got - case.expected).max(axis=(1, 2)) / case.tolerance
        assert ratio.max() <= 1
        worst = max(worst, ratio.max())
    assert worst > 0.01  # measured 0.03 to 0.05


def test_strength_and_orientation_of_every_kind():
    parities = ("odd", "even", "odd", "even")
    kernels = tuple(
        Kernel(f"k{i}", "gabor", p, 1, (3, 3, 6, 6)[i], {}, 1.0) for i, p in enumerate(parities)
    )
    plain = make(count=4)
    for strength in ("step", "line", "energy"):
        bank = Bank("demo", kernels, plain.taps, plain.table, strength=strength)
        assert orientations(bank, 1) == (3, 6)
        case = cases_of(bank)["noise"]
        a, b, c, d = case.expected
        first, second = {
            "step": (np.abs(a), np.abs(c)),
            "line": (np.abs(b), np.abs(d)),
            "energy": (np.sqrt(a * a + b * b), np.sqrt(c * c + d * d)),
        }[strength]
        np.testing.assert_allclose(case.strength[0], np.maximum(first, second), rtol=1e-14)
        assert np.array_equal(case.orientation[0], np.where(first >= second, 3, 6))
        assert magnitudes(bank, case.expected, 1).shape == (2, *case.pixels.shape)


def test_strength_tolerance_bounds_float32_strength():
    kernels = tuple(
        Kernel(f"k{i}", "gabor", ("odd", "even")[i % 2], 0, i // 2, {}, 1.0) for i in range(4)
    )
    plain = make(size=11)
    bank = Bank("demo", kernels, plain.taps, plain.table, strength="energy")
    bounds = plan_of(bank).error_bound
    tolerance = strength_tolerance(bank, bounds, 0)
    assert tolerance >= max(np.hypot(bounds[0], bounds[1]), np.hypot(bounds[2], bounds[3]))
    assert tolerance < 1.1 * np.hypot(max(bounds), max(bounds))
    case = cases_of(bank)["worst"]
    shaken = (case.expected + np.array(bounds)[:, None, None]).astype(np.float32)
    float32 = np.sqrt(shaken[0::2] * shaken[0::2] + shaken[1::2] * shaken[1::2]).max(axis=0)
    assert np.abs(float32 - case.strength[0]).max() <= tolerance
    step = Bank("demo", make().kernels, plain.taps, plain.table)
    assert strength_tolerance(step, bounds, 0) == max(bounds)


def test_banks_without_strength_have_none():
    kernels = tuple(Kernel(f"k{i}", "given", "none", None, None, {}, 1.0) for i in range(4))
    bank = Bank("demo", kernels, make().taps, make().table)
    assert edges_lacking(bank) == "its kernels belong to no scale"
    assert cases_of(bank)["noise"].strength is None
    assert not [n for n in vector_files(bank, tuple(cases_of(bank).values())) if "strength" in n]


def test_what_makes_a_strength_impossible_is_said():
    bank = make()
    twins = tuple(Kernel(f"k{i}", "gd1", "odd", 0, i // 2, {}, 1.0) for i in range(4))
    assert "two odd kernels" in edges_lacking(Bank("demo", twins, bank.taps, bank.table))
    mixed = tuple(Kernel(f"k{i}", "gabor", ("odd", "even")[i % 2], 0, i, {}, 1.0) for i in range(4))
    energy = Bank("demo", mixed, bank.taps, bank.table, strength="energy")
    assert "different orientations" in edges_lacking(energy)
    assert "no even kernel" in edges_lacking(make(strength="line"))


def test_files_come_back_bit_for_bit_and_are_the_same_every_time():
    bank = make("Mono12", strength="line", parity="even")
    cases = tuple(cases_of(bank).values())
    files = vector_files(bank, cases)
    assert files == vector_files(bank, tuple(cases_of(bank).values()))
    assert all(name.startswith("vectors/") for name in files)
    back = load_cases(files.__getitem__)
    assert [c.name for c in back] == [c.name for c in cases]
    for a, b in zip(cases, back, strict=True):
        for field in ("pixels", "expected", "tolerance", "strength", "orientation",
                      "strength_tolerance"):  # fmt: skip
            left, right = getattr(a, field), getattr(b, field)
            assert left.dtype == right.dtype
            assert np.array_equal(left, right)
    head = json.loads(files["vectors/cases.json"])
    assert head["kernels"] == [k.name for k in bank.kernels]
    assert head["border"] == "mirror101"
    assert b"mirror101" in files["vectors/README.md"]


def test_plain_python_can_check_a_port_with_the_files_alone():
    """What the README of the vectors says, done by hand for one pixel."""
    bank = make("Mono8", "edge")
    files = vector_files(bank, tuple(cases_of(bank).values()))
    case = next(c for c in load_cases(files.__getitem__) if c.name == "noise")
    table, r = bank.table.values, bank.radius
    h, w = case.pixels.shape
    for y, x in ((0, 0), (h - 1, 2), (4, w // 2)):
        total = 0.0
        for j in range(bank.size):
            for i in range(bank.size):
                yy, xx = min(max(y + j - r, 0), h - 1), min(max(x + i - r, 0), w - 1)
                total += float(bank.taps[2, j, i]) * float(table[case.pixels[yy, xx]])
        assert abs(total - case.expected[2, y, x]) <= case.tolerance[2] * 1e-6


@pytest.mark.parametrize(("count", "size"), [(16, 11), (32, 15), (64, 31)])
def test_files_stay_small(count, size):
    bank = make(count=count, size=size)
    cases = make_cases(bank, plan_of(bank), lambda b, p: np.zeros((count, *p.shape)))
    names = [c.name for c in cases]
    assert names[:2] == ["impulse", "corners"]
    total = sum(map(len, vector_files(bank, cases).values()))
    minimum = 8 * (count + 1) * sum(c.pixels.size for c in cases[:2])
    assert total < max(1_500_000, 1.1 * minimum)
    if size == 11:
        assert len(cases) == 9


def test_the_small_set_for_the_c_self_test():
    small = cases_of(make(size=11), small=True)
    assert list(small) == ["impulse", "noise", "smallest"]
    assert sum(c.pixels.size for c in small.values()) < 520


def test_a_crop_is_taken_from_the_middle():
    bank = make()
    photo = np.arange(100 * 120, dtype=np.uint32).reshape(100, 120).astype(np.uint8)
    case = cases_of(bank, crop=photo)["crop"]
    assert np.array_equal(case.pixels, photo[30:70, 40:80])
    assert "crop" not in cases_of(bank, crop=photo[:5])


def test_damaged_vectors_are_refused():
    bank = make()
    files = dict(vector_files(bank, tuple(cases_of(bank).values())))
    for broken in (b"{", b"{}", b"[]", b"7", b'{"tolerance": [1], "cases": [{"name": "x"}]}'):
        with pytest.raises(InputError, match="damaged test vectors"):
            load_cases({**files, "vectors/cases.json": broken}.__getitem__)
    with pytest.raises(InputError, match="damaged test vectors"):
        load_cases({**files, "vectors/noise.image.npy": b"nothing"}.__getitem__)
    swapped = {**files, "vectors/noise.responses.npy": files["vectors/step.responses.npy"]}
    with pytest.raises(InputError, match="do not belong together"):
        load_cases(swapped.__getitem__)


@settings(max_examples=60, deadline=None, derandomize=True)
@given(st.data())
def test_no_bytes_make_the_loader_do_anything_but_refuse(data):
    """Changed headers (sizes, dtypes, nonsense) are refused in one way; changed numbers load."""
    bank = make(count=2, size=3)
    files = dict(vector_files(bank, tuple(cases_of(bank, small=True).values())))
    name = data.draw(st.sampled_from(sorted(n for n in files if not n.endswith(".md"))))
    changed = bytearray(files[name])
    for _ in range(data.draw(st.integers(1, 4))):
        changed[data.draw(st.integers(0, min(len(changed) - 1, 150)))] = data.draw(
            st.sampled_from(b"0123456789,(){}'\"<>fuOx\n\x00\xff")
        )
    refused = False
    try:
        cases = load_cases({**files, name: bytes(changed)}.__getitem__)
    except InputError:
        refused = True
    assert refused or [c.pixels.ndim for c in cases] == [2, 2, 2]


def test_an_oracle_of_the_wrong_shape_is_a_bug_of_the_caller():
    with pytest.raises(ValueError, match="oracle gave"):
        make_cases(make(), plan_of(make()), lambda b, p: np.zeros((1, 2, 3)))
