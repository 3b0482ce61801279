"""A bank on disk: round trips, the same bytes, and folders that were tampered with."""

from __future__ import annotations

import json
from dataclasses import replace

import numpy as np
import pytest

from patchlab.bank import apply
from patchlab.bank.disk import bank_files, check_files, read_bank, write_bank
from patchlab.bank.plan import make_plan
from patchlab.errors import InputError, PatchlabError, UsageError, VerificationError
from patchlab.store import canonical_json, npy_bytes, sha256
from patchlab.types import Coverage, Thresholds
from tests.bank.banks import lattice_bank, picture, random_bank

EXTRA = {"lattice.c": b"int x;\n", "vectors/a.npy": b"1"}


def rich_bank():
    bank = lattice_bank(count=4, size=7, pixels="Mono12", kind="stabilised", border="wrap")
    return replace(
        bank,
        thresholds=Thresholds(
            np.array([1.0, 10.0, 100.0]), np.array([5.3, 4.8, 4.3]), np.array([5.2, 4.7, 4.2]),
            0.7, 6.0, "white",
        ),
        coverage=Coverage(0.8, 0.5, 0.7, np.array([4, 8]), np.array([0.5, 0.8])),
        noise_autocovariance=np.eye(3),
        provenance={"seed": 3, "note": "from a test"},
        warnings=("a width ended on its bound",),
    )  # fmt: skip


@pytest.mark.parametrize(
    "bank",
    [
        rich_bank(),
        random_bank(),
        lattice_bank(pixels="float32", kind="stabilised"),
        lattice_bank(families=("gd1", "gd2"), strength="energy"),
    ],
)
@pytest.mark.parametrize("kind", ["auto", "direct"])
def test_what_is_read_is_what_was_written(tmp_path, bank, kind):
    plan = make_plan(bank, kind)
    head = write_bank(tmp_path / "b", bank, plan, EXTRA, seed=5, settings={"kernels": 16})
    again, plan_again, head_again = read_bank(tmp_path / "b")
    assert head == head_again
    check_files(tmp_path / "b", head)
    assert again.kernels == bank.kernels
    assert (again.name, again.border, again.strength) == (bank.name, bank.border, bank.strength)
    assert again.contract == bank.contract
    np.testing.assert_array_equal(again.taps, bank.taps)
    assert (again.provenance, again.warnings) == (bank.provenance, bank.warnings)
    for name in ("kind", "noise_sd", "slope", "offset", "scale", "valid_codes"):
        assert getattr(again.table, name) == getattr(bank.table, name)
    for name in ("thresholds", "coverage"):
        mine, theirs = getattr(bank, name), getattr(again, name)
        assert (mine is None) == (theirs is None)
        for key, value in vars(mine).items() if mine else ():
            np.testing.assert_array_equal(getattr(theirs, key), value)
    np.testing.assert_array_equal(again.noise_autocovariance, bank.noise_autocovariance)
    assert replace(plan_again, detail={}) == replace(plan, detail={})
    pixels = picture((20, 21), bank.contract.pixels)
    np.testing.assert_array_equal(
        apply.responses(again, pixels, plan_again), apply.responses(bank, pixels, plan)
    )


def test_the_same_bank_gives_the_same_bytes(tmp_path):
    for name in ("a", "b"):
        write_bank(tmp_path / name, rich_bank(), make_plan(rich_bank()), EXTRA)
    for path in sorted((tmp_path / "a").rglob("*.*")):
        assert path.read_bytes() == (tmp_path / "b" / path.relative_to(tmp_path / "a")).read_bytes()


def test_the_manifest_tells_people_what_they_need():
    bank = rich_bank()
    _, body = bank_files(bank, make_plan(bank))
    text = canonical_json(body).decode()
    assert body["kernels"][1]["parameters"].keys() == {"theta_rad", "sigma_u_px", "sigma_v_px"}
    assert body["input"]["pixels"] == "Mono12"
    assert body["input"]["bits"] == 12
    assert len(body["plan"]["error_bound"]) == len(bank)
    assert "correlation" in text


def test_a_standing_bank_is_kept_unless_forced(tmp_path):
    bank = random_bank()
    write_bank(tmp_path / "b", bank, make_plan(bank))
    with pytest.raises(UsageError, match="--force"):
        write_bank(tmp_path / "b", bank, make_plan(bank))
    write_bank(tmp_path / "b", random_bank(seed=9), make_plan(random_bank(seed=9)), force=True)
    np.testing.assert_array_equal(read_bank(tmp_path / "b")[0].taps, random_bank(seed=9).taps)


@pytest.mark.parametrize("name", ["", "2fast", "a b", "x;y", "../up", "é", "a" * 64, "int"])
def test_names_that_cannot_stand_in_c_are_refused(name):
    bank = random_bank()
    with pytest.raises(UsageError):
        bank_files(replace(bank, name=name), make_plan(bank))
    kernel = replace(bank.kernels[0], name=name)
    with pytest.raises(UsageError):
        bank_files(replace(bank, kernels=(kernel, *bank.kernels[1:])), make_plan(bank))


@pytest.mark.parametrize("name", ["bank.json", "kernels.npy", "input_table.npy"])
def test_an_export_cannot_take_the_banks_own_files(name):
    bank = random_bank()
    with pytest.raises(UsageError, match="own file"):
        bank_files(bank, make_plan(bank), {name: b""})


# ---------------------------------------------------------------- tampering


@pytest.fixture
def folder(tmp_path):
    bank = rich_bank()
    write_bank(tmp_path / "b", bank, make_plan(bank), EXTRA)
    return tmp_path / "b"


def one_sentence(error: PatchlabError) -> bool:
    return "\n" not in str(error) and 10 < len(str(error)) < 500


def reseal(folder, change):
    """Change the manifest as someone would who also repairs its content id."""
    head = json.loads((folder / "bank.json").read_bytes())
    head.pop("id")
    change(head)
    head["id"] = sha256(canonical_json(head))[:16]
    (folder / "bank.json").write_bytes(canonical_json(head))


def set_to(*path):
    *keys, last, value = path

    def change(head):
        for key in keys:
            head = head[key]
        head[last] = value

    return change


@pytest.mark.parametrize("name", ["kernels.npy", "input_table.npy", "autocovariance.npy"])
def test_a_changed_byte_is_found(folder, name):
    data = bytearray((folder / name).read_bytes())
    data[-1] ^= 1
    (folder / name).write_bytes(data)
    with pytest.raises(VerificationError, match="changed") as caught:
        read_bank(folder)
    assert one_sentence(caught.value)


def test_a_changed_extra_file_is_found(folder):
    _, _, head = read_bank(folder)
    (folder / "lattice.c").write_bytes(b"int y;\n")
    with pytest.raises(VerificationError, match="changed"):
        check_files(folder, head)


@pytest.mark.parametrize("name", ["kernels.npy", "input_table.npy"])
def test_a_missing_file_is_found(folder, name):
    (folder / name).unlink()
    with pytest.raises(VerificationError, match="cannot be read") as caught:
        read_bank(folder)
    assert one_sentence(caught.value)


def test_a_changed_manifest_is_found(folder):
    text = (folder / "bank.json").read_text().replace('"border": "wrap"', '"border": "zero"')
    (folder / "bank.json").write_text(text)
    with pytest.raises(VerificationError, match="content id"):
        read_bank(folder)


@pytest.mark.parametrize(
    "change",
    [
        set_to("name", 'x(); system("date"); int y'),
        set_to("name", "../../up"),
        set_to("name", 7),
        set_to("kernels", 0, "name", '"; abort(); "'),
        set_to("kernels", 0, "parity", "sideways"),
        set_to("kernels", 0, "parameters", "theta_rad", "east"),
        set_to("kernels", 0, "parameters", None),
        set_to("kernels", []),
        set_to("kernels", None),
        set_to("border", "nowhere"),
        set_to("strength", "will"),
        set_to("input", "pixels", "Mono7"),
        set_to("input", "pixels", "Mono8"),
        set_to("input", "white", -5.0),
        set_to("input", "table", "kind", "exec"),
        set_to("input", "table", "valid_codes", [1]),
        set_to("thresholds", "rate_", 1),
        set_to("thresholds", "strength", [1.0]),
        set_to("plan", "asked", "import os"),
        set_to("plan", "error_bound", [1e9] * 8),
        set_to("plan", "error_bound", "large"),
        set_to("plan", None),
        set_to("interface", 12),
        set_to("version", "2.0"),
        set_to("version", None),
        set_to("format", "zip"),
        set_to("kind", "patches"),
        set_to("files", {"../../etc/passwd": "0" * 64}),
        set_to("files", {"/etc/passwd": "0" * 64}),
        set_to("files", {"C:\\x": "0" * 64}),
        set_to("files", []),
        set_to("plan", "tolerance", -1.0),
        set_to("plan", "tolerance", "none"),
        set_to("plan", "prices_ns", None),
        set_to("plan", "prices_ns", "load", -1.0),
        set_to("plan", "prices_ns", "load", 1e300),
        set_to("plan", "prices_ns", "more", 1.0),
    ],
)
def test_hostile_manifests_are_refused(folder, change):
    before = json.loads((folder / "bank.json").read_bytes())
    reseal(folder, change)
    if json.loads((folder / "bank.json").read_bytes())["thresholds"].get("rate_"):
        read_bank(folder)  # an entry that is not known is not in the way
        return
    assert json.loads((folder / "bank.json").read_bytes()) != before
    with pytest.raises((InputError, VerificationError)) as caught:
        read_bank(folder)
    assert one_sentence(caught.value)


@pytest.mark.parametrize(
    "taps",
    [
        np.zeros((8, 7, 7), dtype=np.float64),
        np.zeros((8, 7, 6), dtype=np.float32),
        np.zeros((7, 7), dtype=np.float32),
        np.full((8, 7, 7), np.nan, dtype=np.float32),
        np.zeros((9, 7, 7), dtype=np.float32),
    ],
)
def test_kernels_of_another_kind_are_refused(folder, taps):
    data = npy_bytes(taps)
    (folder / "kernels.npy").write_bytes(data)
    reseal(folder, set_to("files", "kernels.npy", sha256(data)))
    with pytest.raises(InputError):
        read_bank(folder)


@pytest.mark.parametrize(
    "data",
    [
        b"",
        b"\x93NUMPY\x01\x00\xff\xff",
        npy_bytes(np.zeros(3))[:-4],
        npy_bytes(np.zeros(3)).replace(b"(3,)", b"(300"),
        npy_bytes(np.zeros(300)).replace(b"(300,)", b"(9" + b"9" * 10 + b",)")[:128],
        b"\x80\x04\x95pickle",
    ],
)
def test_files_that_are_no_arrays_are_refused(folder, data):
    (folder / "kernels.npy").write_bytes(data)
    reseal(folder, set_to("files", "kernels.npy", sha256(data)))
    with pytest.raises(InputError):
        read_bank(folder)


def test_no_bank_here(tmp_path):
    with pytest.raises(InputError, match="no bank"):
        read_bank(tmp_path)
    (tmp_path / "bank.json").write_bytes(b"{")
    with pytest.raises(InputError, match="cannot read"):
        read_bank(tmp_path)


@pytest.mark.parametrize(("key", "value"), [("layout", 0), ("environment", {"patchlab": "0.0.1"})])
def test_a_bank_of_another_layout_says_so(folder, key, value):
    def older(head):
        head[key] = value
        head["interface"] = 12

    reseal(folder, older)
    with pytest.raises(VerificationError, match="was exported by another patchlab"):
        read_bank(folder)
