"""Verification: right targets pass, wrong ones fail, absent ones are never called right."""

from __future__ import annotations

import io
import sys
from dataclasses import replace

import numpy as np
import pytest
from scipy import ndimage

from patchlab import store
from patchlab.bank import apply, reference
from patchlab.bank.plan import make_plan
from patchlab.conventions import BORDERS
from patchlab.errors import UsageError, VerificationError
from patchlab.export.build import BuildError, target_name
from patchlab.export.onnx import conv_bound, emit
from patchlab.export.vectors import magnitudes, make_cases, vector_files
from patchlab.export.verify import Target, lines, verify
from patchlab.families import render, without_dc
from patchlab.types import Bank, InputContract, InputTable, Kernel, Plan

SELFTEST = {"demo_selftest.c": b"int main(void) { return 0; }\n", "demo.h": b"/* */\n"}


@pytest.fixture(autouse=True)
def narrow_probes(monkeypatch):
    """A few hundred columns prove the same here, and quicker."""
    monkeypatch.setattr("patchlab.export.vectors.WIDEST_TILE", 1000)


def make(border="mirror101", strength="step", size=5):
    """Two scales of two odd and two even kernels without symmetry; a bent table."""
    contract = InputContract("Mono8", 0, 255)
    values = np.sqrt(np.arange(256) * 2.7 + 0.3).astype(np.float32)
    taps = np.random.default_rng(8).standard_normal((8, size, size)).astype(np.float32)
    kernels = tuple(
        Kernel(f"k{i}", "gabor", ("odd", "even")[i % 2], i // 4, i // 2 % 2, {}, 1.0)
        for i in range(8)
    )
    table = InputTable("stabilised", contract, values, 1.0)
    return Bank("demo", kernels, taps, table, border, strength=strength)


def plan_of(bank):
    return Plan("direct", (), 0.0, 0.0, conv_bound(bank))


def oracle(bank, pixels):
    working = bank.table.apply(pixels).astype(np.float64)
    mode = BORDERS[bank.border].scipy
    return np.stack(
        [ndimage.correlate(working, k.astype(np.float64), mode=mode) for k in bank.taps]
    )


def engine(bank):
    """An honest float32 engine, one tap after the other."""

    def responses(pixels):
        r, (h, w) = bank.radius, pixels.shape
        padded = np.pad(bank.table.apply(pixels), r, mode=BORDERS[bank.border].numpy)
        out = np.zeros((len(bank), h, w), dtype=np.float32)
        for j in range(bank.size):
            for i in range(bank.size):
                out += bank.taps[:, j, i, None, None] * padded[j : j + h, i : i + w]
        return out

    def edges(pixels, place):
        planes = responses(pixels)
        odd = np.abs(planes[[4 * place, 4 * place + 2]])
        even = np.abs(planes[[4 * place + 1, 4 * place + 3]])
        sizes = {"step": odd, "line": even, "energy": np.sqrt(odd * odd + even * even)}
        size = sizes[bank.strength]
        return size.max(axis=0), size.argmax(axis=0).astype(np.uint8)

    return Target("engine", responses, edges)


def export(folder, bank, extra=None, onnx_of=None):
    plan = plan_of(bank)
    files = dict(vector_files(bank, make_cases(bank, plan, oracle)))
    files |= emit(onnx_of or bank).files
    files |= extra or {}
    return store.write_artefact(folder, "bank", files, manifest="bank.json")


def run(folder, bank, head, **more):
    return verify(folder, bank, plan_of(bank), head, oracle=oracle, **more)


def check(found, target, what):
    (one,) = [c for c in found.checks if c.target == target and c.what == what]
    return one


@pytest.mark.parametrize("strength", ["step", "line", "energy"])
@pytest.mark.parametrize("border", BORDERS)
def test_an_honest_bank_passes_everything(tmp_path, border, strength):
    bank = make(border, strength)
    head = export(tmp_path / "bank", bank)
    found = run(tmp_path / "bank", bank, head, engines={"x": engine(bank)})
    assert found.passed
    assert found.error() is None
    for target in ("engine", "onnxruntime", "onnx reference"):
        mine = {c.what: c for c in found.checks if c.target == target}
        assert list(mine) == [
            "responses, interior",
            "responses, border",
            "strength, scale 0",
            "orientation, scale 0",
            "strength, scale 1",
            "orientation, scale 1",
        ]
        assert all(c.passed for c in mine.values())
        assert mine["responses, border"].ratio > 1e-3  # the bound means something
    assert check(found, "compiled library", "responses").passed is None
    assert check(found, "C self-test", "own vectors").passed is None
    assert found.worst.ratio == max(c.ratio for c in found.checks if "responses," in c.what)


# ---------------------------------------------------------------- mutations


def flipped(target, bank):
    turned = replace(bank, taps=np.ascontiguousarray(bank.taps[:, ::-1, ::-1]))
    return replace(target, responses=engine(turned).responses)


def transposed(target, bank):
    turned = replace(bank, taps=np.ascontiguousarray(bank.taps.swapaxes(1, 2)))
    return replace(target, responses=engine(turned).responses)


def shifted(target, bank):
    return replace(target, responses=lambda p: np.roll(target.responses(p), 1, axis=2))


def other_border(target, bank):
    wrong = "mirror" if bank.border == "mirror101" else "mirror101"
    return replace(target, responses=engine(replace(bank, border=wrong)).responses)


def pads_pixels_before_the_table(target, bank):
    def responses(pixels):
        r = bank.radius
        padded = np.pad(pixels, r, mode=BORDERS[bank.border].numpy)
        return engine(bank).responses(padded)[:, r:-r, r:-r].copy()

    return replace(target, responses=responses)


def last_column(target, bank):
    def responses(pixels):
        out = target.responses(pixels)
        out[:, :, -1] = out[:, :, -2]
        return out

    return replace(target, responses=responses)


def far_column(target, bank):
    """Wrong only beyond column 256, where no stored vector reaches."""

    def responses(pixels):
        out = target.responses(pixels)
        out[:, :, 256:] = 0
        return out

    return replace(target, responses=responses)


def one_tap_rounded(target, bank):
    taps = bank.taps.copy()
    taps[3, 2, 2] = np.float16(taps[3, 2, 2])
    return replace(target, responses=engine(replace(bank, taps=taps)).responses)


def kernels_swapped(target, bank):
    order = [1, 0, *range(2, 8)]
    return replace(target, responses=lambda p: target.responses(p)[order])


def not_a_number(target, bank):
    def responses(pixels):
        out = target.responses(pixels)
        out[0, 0, 0] = np.nan
        return out

    return replace(target, responses=responses)


def float64(target, bank):
    return replace(target, responses=lambda p: target.responses(p).astype(np.float64))


def cropped(target, bank):
    return replace(target, responses=lambda p: target.responses(p)[:, :-1])


def raises(target, bank):
    def responses(pixels):
        raise RuntimeError("segment 7 is missing")

    return replace(target, responses=responses)


MUTATIONS = (flipped, transposed, shifted, other_border, last_column, far_column,
             one_tap_rounded, kernels_swapped, not_a_number, float64, cropped, raises)  # fmt: skip


@pytest.mark.parametrize("border", BORDERS)
@pytest.mark.parametrize("mutate", MUTATIONS, ids=lambda m: m.__name__)
def test_a_wrong_engine_is_caught(tmp_path, mutate, border):
    bank = make(border)
    head = store.write_artefact(
        tmp_path / "bank",
        "bank",
        dict(vector_files(bank, make_cases(bank, plan_of(bank), oracle))),
        manifest="bank.json",
    )
    wrong = mutate(engine(bank), bank)
    found = run(tmp_path / "bank", bank, head, engines={"x": wrong})
    assert not found.passed
    assert {c.target for c in found.failed} == {"engine"}
    assert isinstance(found.error(), VerificationError)
    assert "FAILED" in "\n".join(lines(found))


def test_padding_before_the_table_is_caught_where_it_matters(tmp_path):
    """Only the zero border can tell, because the table sends code 0 elsewhere."""
    bank = make("zero")
    head = export(tmp_path / "bank", bank)
    wrong = pads_pixels_before_the_table(engine(bank), bank)
    found = run(tmp_path / "bank", bank, head, engines={"x": wrong})
    assert check(found, "engine", "responses, border").passed is False
    assert check(found, "engine", "responses, interior").passed


def wrong_strength(edges, pixels, place):
    strength, orientation = edges(pixels, place)
    return strength * np.float32(1.0001), orientation


def wrong_winner(edges, pixels, place):
    strength, orientation = edges(pixels, place)
    return strength, 1 - orientation


def unknown_winner(edges, pixels, place):
    strength, orientation = edges(pixels, place)
    return strength, orientation + np.uint8(7)


def other_scale(edges, pixels, place):
    return edges(pixels, 1 - place)


@pytest.mark.parametrize("mutate", [wrong_strength, wrong_winner, unknown_winner, other_scale])
def test_wrong_edges_are_caught(tmp_path, mutate):
    bank = make()
    head = export(tmp_path / "bank", bank)
    honest = engine(bank)
    wrong = replace(honest, edges=lambda p, s: mutate(honest.edges, p, s))
    found = run(tmp_path / "bank", bank, head, engines={"x": wrong})
    assert not found.passed
    assert {c.target for c in found.failed} == {"engine"}


def test_a_near_tie_may_go_either_way(tmp_path):
    """Two equal kernels: float32 may name either of them."""
    bank = make()
    taps = bank.taps.copy()
    taps[2] = taps[0]
    bank = replace(bank, taps=taps)
    head = export(tmp_path / "bank", bank)
    honest = engine(bank)

    def edges(pixels, place):
        strength, orientation = honest.edges(pixels, place)
        return strength, np.ones_like(orientation) if place == 0 else orientation

    assert run(tmp_path / "bank", bank, head, engines={"x": replace(honest, edges=edges)}).passed


# ---------------------------------------------------------------- the folder


def test_a_changed_file_is_named(tmp_path):
    bank = make()
    head = export(tmp_path / "bank", bank)
    path = tmp_path / "bank" / "vectors" / "noise.image.npy"
    data = bytearray(path.read_bytes())
    data[-1] ^= 1
    path.write_bytes(data)
    found = run(tmp_path / "bank", bank, head)
    assert not found.passed
    hashes = check(found, "folder", "hashes")
    assert hashes.worst_error == 1
    assert "vectors/noise.image.npy was changed" in hashes.note
    assert check(found, "oracle, float64", "stored vectors").passed is False


def test_a_missing_file_and_a_changed_manifest_are_named(tmp_path):
    bank = make()
    head = export(tmp_path / "bank", bank)
    (tmp_path / "bank" / "vectors" / "README.md").unlink()
    found = run(tmp_path / "bank", bank, {**head, "seed": 5})
    note = check(found, "folder", "hashes").note
    assert "vectors/README.md cannot be read" in note
    assert "the manifest was changed" in note
    assert not found.passed


def test_vectors_of_another_bank_are_caught_although_their_hashes_fit(tmp_path):
    bank = make()
    other = replace(bank, taps=bank.taps * np.float32(1 + 1e-6))
    head = export(tmp_path / "bank", other)
    found = run(tmp_path / "bank", bank, head)
    assert check(found, "folder", "hashes").passed
    assert check(found, "oracle, float64", "stored vectors").passed is False


def test_wrong_stored_strength_is_caught_although_its_hash_fits(tmp_path):
    bank = make()
    name = "vectors/noise.strength.npy"
    files = vector_files(bank, make_cases(bank, plan_of(bank), oracle))
    values = np.load(io.BytesIO(files[name]))
    values[1, 2, 3] *= 1 + 1e-9
    head = export(tmp_path / "bank", bank, extra={name: store.npy_bytes(values)})
    found = run(tmp_path / "bank", bank, head)
    assert check(found, "oracle, float64", "stored vectors").passed
    assert check(found, "oracle, float64", "stored strength").passed is False


def test_onnx_of_another_bank_is_caught_although_its_hash_fits(tmp_path):
    bank = make()
    flipped_bank = replace(bank, taps=np.ascontiguousarray(bank.taps[:, ::-1, ::-1]))
    head = export(tmp_path / "bank", bank, onnx_of=flipped_bank)
    found = run(tmp_path / "bank", bank, head, engines={"x": engine(bank)})
    assert {c.target for c in found.failed} == {"onnxruntime", "onnx reference"}


def test_a_damaged_onnx_file_fails_and_does_not_end_the_run(tmp_path):
    bank = make()
    head = export(tmp_path / "bank", bank, extra={"demo.onnx": b"not a graph"})
    found = run(tmp_path / "bank", bank, head, engines={"x": engine(bank)})
    assert {c.target for c in found.failed} == {"onnxruntime", "onnx reference"}
    assert check(found, "engine", "responses, interior").passed


@pytest.mark.parametrize(
    ("package", "target"), [("onnxruntime", "onnxruntime"), ("onnx", "onnx reference")]
)
def test_an_absent_runtime_is_told_not_passed(tmp_path, monkeypatch, package, target):
    bank = make()
    head = export(tmp_path / "bank", bank)
    monkeypatch.setitem(sys.modules, package, None)
    found = run(tmp_path / "bank", bank, head)
    absent = check(found, target, "responses")
    assert absent.passed is None
    assert "not installed" in absent.note
    assert found.passed  # the other one still ran


def test_nothing_run_is_not_a_pass(tmp_path):
    bank = make()
    head = store.write_artefact(tmp_path / "bank", "bank", {"a": b"b"}, manifest="bank.json")
    found = run(tmp_path / "bank", bank, head)
    assert not found.failed
    assert not found.passed
    assert "no target" in str(found.error())
    assert lines(found)[-1].startswith("nothing was proven")


# ---------------------------------------------------------------- library and self-test

LIBRARY = f"lib/{target_name()}/libdemo.so"


def test_a_library_is_opened_and_compared(tmp_path):
    bank = make()
    head = export(tmp_path / "bank", bank, extra={LIBRARY: b"\x7fELF"})
    opened = []

    def open_library(path):
        opened.append(path)
        return engine(bank)

    found = run(tmp_path / "bank", bank, head, open_library=open_library)
    assert opened == [tmp_path / "bank" / LIBRARY]
    assert check(found, f"compiled library {LIBRARY}", "responses, border").passed
    wrong = run(tmp_path / "bank", bank, head, open_library=lambda _: flipped(engine(bank), bank))
    assert not wrong.passed


def test_a_changed_library_is_never_loaded(tmp_path):
    bank = make()
    head = export(tmp_path / "bank", bank, extra={LIBRARY: b"\x7fELF"})
    (tmp_path / "bank" / LIBRARY).write_bytes(b"\x7fELG")
    opened = []
    found = run(tmp_path / "bank", bank, head, open_library=opened.append)
    assert not opened
    assert "was changed" in str(
        check(found, f"compiled library {LIBRARY}", "responses and edges").note
    )
    assert not found.passed


def test_libraries_of_other_machines_or_unasked_are_not_run(tmp_path):
    bank = make()
    other = "lib/riscv64-plan9/libdemo.so"
    head = export(tmp_path / "bank", bank, extra={LIBRARY: b"1", other: b"2"})
    found = run(tmp_path / "bank", bank, head)
    assert check(found, f"compiled library {other}", "responses").note == (
        "built for another machine"
    )
    assert "not asked for" in check(found, f"compiled library {LIBRARY}", "responses").note
    named = run(tmp_path / "bank", bank, head, library=other, open_library=lambda _: engine(bank))
    assert check(named, f"compiled library {other}", "responses, border").passed


def test_a_library_that_cannot_load_fails(tmp_path):
    bank = make()
    head = export(tmp_path / "bank", bank, extra={LIBRARY: b"1"})

    def open_library(path):
        raise OSError("invalid ELF header")

    found = run(tmp_path / "bank", bank, head, open_library=open_library)
    assert [c.note for c in found.failed] == ["impulse: invalid ELF header"]


def test_the_self_test_counts(tmp_path):
    bank = make()
    head = export(tmp_path / "bank", bank, extra=SELFTEST)
    asked = []

    def passes(folder):
        asked.append(folder)
        return True, "all 2 cases hold"

    def no_compiler(folder):
        raise UsageError("no C compiler was found")

    def breaks(folder):
        raise BuildError("the C compiler failed", where="cc")

    good = run(tmp_path / "bank", bank, head, run_selftest=passes)
    assert asked == [tmp_path / "bank"]
    assert good.passed
    assert check(good, "C self-test", "own vectors").note == "all 2 cases hold"
    bad = run(tmp_path / "bank", bank, head, run_selftest=lambda _: (False, "differs"))
    assert [c.note for c in bad.failed] == ["differs"]
    idle = run(tmp_path / "bank", bank, head, run_selftest=no_compiler)
    assert check(idle, "C self-test", "own vectors").passed is None
    assert idle.passed
    assert not run(tmp_path / "bank", bank, head, run_selftest=breaks).passed


def test_a_changed_source_is_never_compiled(tmp_path):
    bank = make()
    head = export(tmp_path / "bank", bank, extra=SELFTEST)
    (tmp_path / "bank" / "demo.h").write_bytes(b"/* other */\n")
    asked = []
    found = run(tmp_path / "bank", bank, head, run_selftest=asked.append)
    assert not asked
    assert check(found, "C self-test", "own vectors").passed is False


# ---------------------------------------------------------------- what a person reads


def test_the_table(tmp_path):
    bank = make()
    head = export(tmp_path / "bank", bank)
    heard = []
    found = run(
        tmp_path / "bank",
        bank,
        head,
        engines={"x": engine(bank)},
        progress=lambda stage, done, total, note="": heard.append((stage, done, total)),
    )
    table = lines(found)
    assert len(table) == len(found.checks) + 2
    assert table[0].split() == ["target", "what", "worst", "error", "bound", "ratio"]
    assert any("not run: none is in the folder" in line for line in table)
    ran = sum(c.passed is not None for c in found.checks)
    assert table[-1] == f"{ran} checks hold; {len(found.checks) - ran} not run"
    assert heard[-1] == ("verify", 5, 5)


def test_slow_targets_are_spared_large_pictures(tmp_path, monkeypatch):
    bank = make()
    head = export(tmp_path / "bank", bank)
    sizes = []

    def counting(pixels):
        sizes.append(pixels.size)
        return engine(bank).responses(pixels)

    slow = Target("slow", counting, slow=True)
    monkeypatch.setattr("patchlab.export.compare.SLOW_PRODUCTS", 8 * 25 * 100)
    found = run(tmp_path / "bank", bank, head, engines={"x": slow})
    assert max(sizes) <= 100
    assert check(found, "slow", "responses, interior").passed
    assert check(found, "slow", "strength").passed is None
    monkeypatch.setattr("patchlab.export.compare.SLOW_PRODUCTS", 1)
    none = run(tmp_path / "bank", bank, head, engines={"x": slow})
    assert check(none, "slow", "responses").passed is None


# ---------------------------------------------------------------- with the package's own bank


def lattice(border, strength):
    """Four mirrored orientations, odd and even, as the chooser lays them."""
    taps, kernels = [], []
    for turn, theta in enumerate(np.pi * np.arange(4) / 4):
        for family, parity in (("gd1", "odd"), ("gd2", "even")):
            shape = {"theta_rad": theta, "sigma_u_px": 1.3, "sigma_v_px": 1.9}
            taps.append(without_dc(render(family, shape, 9)))
            kernels.append(Kernel(f"{parity}{turn}", family, parity, 0, turn, shape, 1.0))
    values = np.sqrt(np.arange(4096) * 0.4 + 2.0).astype(np.float32)
    table = InputTable("stabilised", InputContract("Mono12", 0, 4095), values, 1.0)
    return Bank("own", tuple(kernels), np.float32(taps), table, border, strength=strength)


@pytest.mark.parametrize("strength", ["step", "line", "energy"])
@pytest.mark.parametrize("border", BORDERS)
def test_own_oracle_plan_and_engine_agree(tmp_path, border, strength):
    bank = lattice(border, strength)
    plan = make_plan(bank)
    cases = make_cases(bank, plan, reference.responses)
    for case in cases[:3]:
        values, numbers = reference.strength(bank, case.pixels, 0)
        np.testing.assert_allclose(case.strength[0], values, rtol=1e-12)
        near = np.sort(magnitudes(bank, case.expected, 0), axis=0)
        clear = near[-1] - near[-2] > 1e-9
        assert np.array_equal(case.orientation[0][clear], numbers[clear])
    files = {**vector_files(bank, cases), **emit(bank).files}
    head = store.write_artefact(tmp_path / "bank", "bank", files, manifest="bank.json")
    own = Target("in-process", lambda pixels: apply.responses(bank, pixels))
    found = verify(
        tmp_path / "bank", bank, plan, head, oracle=reference.responses, engines={"x": own}
    )
    assert found.passed, lines(found)
    assert check(found, "in-process", "responses, border").ratio > 1e-3
