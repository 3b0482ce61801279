"""Artefacts are whole, checked and the same bytes every time."""

import json
from dataclasses import replace
from pathlib import Path

import numpy as np
import pytest

from patchlab import store
from patchlab.errors import InputError, UsageError, VerificationError
from patchlab.types import InputContract, InputTable, NoiseModel, Survey


@pytest.fixture
def survey():
    contract = InputContract("Mono8", 0, 255)
    noise = NoiseModel(True, gain=0.5, levels=np.arange(4.0), sd=np.ones(4))
    table = InputTable("identity", contract, np.arange(256, dtype=np.float32), 1.0)
    return Survey(contract, noise, table, blur_sigma_px=0.8)


def test_a_noun_comes_back_as_it_was(tmp_path, survey):
    store.save(tmp_path / "s", "survey", survey, seed=3)
    back, head = store.load(tmp_path / "s", "survey")
    assert head["seed"] == 3
    assert back.contract == survey.contract
    assert back.table.valid_codes == (-np.inf, np.inf)
    np.testing.assert_array_equal(back.noise.levels, survey.noise.levels)
    np.testing.assert_array_equal(back.table.values, survey.table.values)
    assert back.table.values.dtype == np.float32


def test_the_same_content_gives_the_same_bytes(tmp_path, survey):
    a = store.save(tmp_path / "a", "survey", survey)
    b = store.save(tmp_path / "b", "survey", survey)
    c = store.save(tmp_path / "c", "survey", replace(survey, blur_sigma_px=0.9))
    assert a["id"] == b["id"] != c["id"]
    for file in (tmp_path / "a").iterdir():
        assert file.read_bytes() == (tmp_path / "b" / file.name).read_bytes()


def test_a_changed_byte_is_found(tmp_path, survey):
    store.save(tmp_path / "s", "survey", survey)
    path = tmp_path / "s" / "noise.sd.npy"
    data = bytearray(path.read_bytes())
    data[-1] ^= 1
    path.write_bytes(data)
    with pytest.raises(VerificationError, match="changed"):
        store.load(tmp_path / "s", "survey")
    path.unlink()
    with pytest.raises(VerificationError, match="cannot be read"):
        store.load(tmp_path / "s", "survey")


@pytest.fixture
def large(tmp_path):
    """An artefact with one array worth mapping and one that is not."""
    contract = InputContract("Mono8", 0, 255)
    noise = NoiseModel(True, levels=np.arange(300_000.0), sd=np.empty(0))
    table = InputTable("identity", contract, np.arange(256, dtype=np.float32), 1.0)
    store.save(tmp_path / "s", "survey", Survey(contract, noise, table))
    return tmp_path / "s"


def test_large_arrays_can_be_mapped(large):
    back, _ = store.load(large, "survey", mapped=True)
    assert isinstance(back.noise.levels.base, np.memmap)
    assert not back.noise.levels.flags.writeable
    np.testing.assert_array_equal(back.noise.levels, np.arange(300_000.0))
    assert back.noise.sd.size == 0
    assert back.table.values.base is None or not isinstance(back.table.values.base, np.memmap)


def test_what_is_mapped_is_checked_as_well(large):
    path = large / "noise.levels.npy"
    data = bytearray(path.read_bytes())
    data[-1] ^= 1
    path.write_bytes(data)
    with pytest.raises(VerificationError, match="changed"):
        store.load(large, "survey", mapped=True)
    path.unlink()
    with pytest.raises(VerificationError, match="cannot be read"):
        store.load(large, "survey", mapped=True)


@pytest.mark.parametrize("shape", [(3, 4), (0, 2), (5,), (2, 3, 4)])
@pytest.mark.parametrize("dtype", ["f4", "f8", "i2", "?", "U5", ">u2"])
def test_arrays_are_written_as_numpy_writes_them(shape, dtype):
    import io

    array = np.ones(shape).astype(dtype)
    wanted = io.BytesIO()
    np.save(wanted, array)
    assert store.npy_bytes(array) == wanted.getvalue()
    assert np.array_equal(store.npy_array(store.npy_bytes(array), "x"), array)


@pytest.mark.parametrize(
    ("entry", "value", "message"),
    [("version", "2.0", "version"), ("kind", "bank", "bank"), ("format", "other", "not patchlab")],
)
def test_a_manifest_from_elsewhere_is_refused(tmp_path, survey, entry, value, message):
    store.save(tmp_path / "s", "survey", survey)
    path = tmp_path / "s" / "manifest.json"
    head = json.loads(path.read_text())
    path.write_text(json.dumps({**head, entry: value}))
    with pytest.raises(InputError, match=message):
        store.load(tmp_path / "s", "survey")


@pytest.mark.parametrize("name", ["../x", "/etc/x", "a/../../x", "c:x", "..\\x"])
def test_a_file_name_that_leads_out_is_refused(tmp_path, name):
    store.write_artefact(tmp_path / "s", "bank", {"a": b"1"})
    path = tmp_path / "s" / "manifest.json"
    head = json.loads(path.read_text())
    path.write_text(json.dumps({**head, "files": {name: "0"}}))
    with pytest.raises(VerificationError, match="leads out"):
        store.read_manifest(tmp_path / "s", "bank")


def test_nothing_is_replaced_unasked(tmp_path):
    store.write_artefact(tmp_path / "s", "bank", {"a": b"1"})
    with pytest.raises(UsageError, match="--force"):
        store.write_artefact(tmp_path / "s", "bank", {"a": b"2"})
    assert (tmp_path / "s" / "a").read_bytes() == b"1"
    store.write_artefact(tmp_path / "s", "bank", {"b": b"2"}, force=True)
    assert sorted(p.name for p in (tmp_path / "s").iterdir()) == ["b", "manifest.json"]
    assert [p.name for p in tmp_path.iterdir()] == ["s"]


def test_a_folder_that_is_not_ours_is_left_alone_even_by_force(tmp_path):
    (tmp_path / "s").mkdir()
    (tmp_path / "s" / "thesis.txt").write_text("years of work")
    with pytest.raises(UsageError, match="left alone"):
        store.write_artefact(tmp_path / "s", "bank", {"a": b"1"}, force=True)
    assert (tmp_path / "s" / "thesis.txt").read_text() == "years of work"


def test_a_write_that_fails_leaves_nothing(tmp_path):
    with pytest.raises(TypeError):
        store.write_artefact(tmp_path / "s", "bank", {"a": b"1", "b": None})
    assert list(tmp_path.iterdir()) == []


def test_content_cannot_name_a_class_outside_the_nouns():
    with pytest.raises(InputError, match="unknown kind of content"):
        store.unpack({"is": "Popen", "args": "x"}, lambda name: b"")


def test_a_full_disk_is_told_with_the_files_name(tmp_path, monkeypatch):
    def full(self, data):
        raise OSError(28, "No space left on device")

    monkeypatch.setattr(Path, "write_bytes", full)
    with pytest.raises(OSError, match="No space left") as caught:
        store.write_artefact(tmp_path / "a", "patches", {"x.npy": b"1"})
    assert caught.value.filename == str(tmp_path / "a" / "x.npy")
    assert not (tmp_path / "a").exists()
