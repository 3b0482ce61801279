"""Random damage to a bank's folder: every reader refuses with one sentence, or reads it right.

PATCHLAB_FUZZ=20000 python -m pytest tests/fuzz     # a long run; the plain one is short
"""

from __future__ import annotations

import json
import os
import shutil
import struct

import numpy as np
import pytest
from hypothesis import HealthCheck, Phase, given, settings
from hypothesis import strategies as st

from patchlab import export, store
from patchlab.bank import read_bank
from patchlab.bank.disk import check_files
from patchlab.errors import PatchlabError
from patchlab.export import patchlab_bank
from patchlab.store import canonical_json, npy_bytes, sha256
from patchlab.types import InputContract, InputTable, NoiseModel, Survey
from tests.export.folders import BANKS, write

EVIL = '*/ int evil; system("x"); /* '
LONG = os.environ.get("PATCHLAB_FUZZ")
fuzz = settings(
    max_examples=int(LONG or 50),
    deadline=None,
    derandomize=LONG is None,
    database=None,
    phases=[Phase.generate, Phase.shrink] if LONG else [Phase.generate],
    suppress_health_check=[HealthCheck.function_scoped_fixture, HealthCheck.too_slow],
)

leaves = st.one_of(
    st.none(),
    st.booleans(),
    st.integers(-3, 300),
    st.sampled_from([2**31, 2**63, -(2**70), 10**400, 1e300, -0.0, 0.5, 1e-320]),
    st.sampled_from(
        ["", EVIL, "a\nb\x1b[31m", "../../etc/passwd", "/dev/zero", "\ud800", "A" * 5000, "int",
         "step", "odd", "zero", "float32", "Mono16", "1.0", "2.0", "\0"]
    ),
    st.text(max_size=8),
)  # fmt: skip
values = st.recursive(
    leaves, lambda s: st.lists(s, max_size=3) | st.dictionaries(st.text(max_size=4), s, max_size=3),
    max_leaves=6,
)  # fmt: skip


@pytest.fixture(scope="module")
def original(tmp_path_factory):
    return write(tmp_path_factory.mktemp("bank") / "b", BANKS["step"], library=False)


@pytest.fixture
def folder(original, tmp_path):
    return tmp_path / "b"


def fresh(original, folder):
    shutil.rmtree(folder, ignore_errors=True)
    shutil.copytree(original, folder)
    return json.loads((folder / "bank.json").read_bytes())


def seal(folder, head, manifest="bank.json"):
    """Write a manifest with an id that fits, as far as its content has one."""
    head.pop("id", None)
    try:
        head["id"] = sha256(canonical_json(head))[:16]
        (folder / manifest).write_bytes(canonical_json(head))
    except ValueError:  # a lone surrogate, which no UTF-8 file can hold
        (folder / manifest).write_text(json.dumps(head))


def places(data, path=()):
    """Every place in a JSON value."""
    yield path
    inside = data.items() if isinstance(data, dict) else ()
    inside = enumerate(data) if isinstance(data, list) else inside
    for key, value in inside:
        yield from places(value, (*path, key))


def change(head, draw):
    """Replace, remove or double one entry of a manifest."""
    *path, last = draw(st.sampled_from([p for p in places(head) if p]))
    inside = head
    for key in path:
        inside = inside[key]
    what = draw(st.sampled_from(["replace", "replace", "remove", "double"]))
    if what == "replace":
        inside[last] = draw(values)
    elif what == "remove":
        del inside[last]
    elif isinstance(inside, list):
        inside.insert(last, inside[last])
    else:
        inside[f"{last}_"] = inside[last]


def one_sentence(error):
    text = str(error)
    assert 10 < len(text) < 1000, text
    assert "\n" not in text
    assert text.isprintable(), repr(text)


def survives(folder):
    """Both readers, and what is done with a bank that they take."""
    try:
        bank, plan, head = read_bank(folder)
        check_files(folder, head)
        export.vectors.edges_lacking(bank)
        source = b"".join(export.emit(bank, plan).values())
        assert b"evil" not in source
    except PatchlabError as error:
        one_sentence(error)
    try:
        loaded = patchlab_bank.load(folder, library=False)
        loaded.responses(np.zeros((40, 40), loaded.dtype))
        loaded.edges(np.zeros((40, 40), loaded.dtype), threshold=1.0)
    except patchlab_bank.BankError as error:
        one_sentence(error)


@fuzz
@given(data=st.data())
def test_a_changed_manifest(original, folder, data):
    head = fresh(original, folder)
    for _ in range(data.draw(st.integers(1, 2))):
        change(head, data.draw)
    seal(folder, head)
    survives(folder)


@fuzz
@given(data=st.data())
def test_changed_bytes_under_a_hash_that_fits(original, folder, data):
    head = fresh(original, folder)
    name = data.draw(st.sampled_from(["kernels.npy", "input_table.npy", "edges.json"]))
    raw = bytearray((folder / name).read_bytes())
    for _ in range(data.draw(st.integers(1, 4))):
        at = data.draw(st.integers(0, min(len(raw) - 1, 200)))
        raw[at] = data.draw(st.integers(0, 255))
    cut = data.draw(st.integers(0, len(raw)) | st.just(len(raw)))
    (folder / name).write_bytes(bytes(raw[:cut]))
    head["files"][name] = sha256(bytes(raw[:cut]))
    seal(folder, head)
    survives(folder)


@fuzz
@given(data=st.data())
def test_other_rules_for_edges(original, folder, data):
    head = fresh(original, folder)
    rules = json.loads((folder / "edges.json").read_bytes())
    change(rules, data.draw)
    text = json.dumps(rules).encode()
    (folder / "edges.json").write_bytes(text)
    head["files"]["edges.json"] = sha256(text)
    seal(folder, head)
    survives(folder)


@fuzz
@given(raw=st.binary(max_size=200) | st.text(max_size=200).map(str.encode))
def test_bytes_that_are_no_manifest(original, folder, raw):
    fresh(original, folder)
    (folder / "bank.json").write_bytes(raw)
    with pytest.raises(PatchlabError) as caught:
        read_bank(folder)
    one_sentence(caught.value)
    with pytest.raises(patchlab_bank.BankError) as refused:
        patchlab_bank.load(folder)
    one_sentence(refused.value)


@fuzz
@given(data=st.data())
def test_changed_artefacts_of_a_run(tmp_path, data):
    folder = tmp_path / "s"
    contract = InputContract("Mono8", 0, 255)
    noise = NoiseModel(True, gain=0.5, levels=np.arange(4.0), sd=np.ones(4))
    table = InputTable("identity", contract, np.arange(256, dtype=np.float32), 1.0)
    store.save(folder, "survey", Survey(contract, noise, table), force=True)
    head = json.loads((folder / "manifest.json").read_bytes())
    content = json.loads((folder / "content.json").read_bytes())
    change(content, data.draw)
    text = json.dumps(content).encode()
    (folder / "content.json").write_bytes(text)
    head["files"]["content.json"] = sha256(text)
    seal(folder, head, "manifest.json")
    try:
        store.load(folder, "survey")
    except PatchlabError as error:
        one_sentence(error)


# ---------------------------------------------------------------- single blows


def absurd(shape):
    """A small file whose header promises a large array."""
    header = f"{{'descr': '<f4', 'fortran_order': False, 'shape': {shape}, }}"
    header = header.ljust(117) + "\n"
    return b"\x93NUMPY\x01\x00" + struct.pack("<H", len(header)) + header.encode() + b"\0" * 64


@pytest.mark.parametrize(
    "data",
    [
        absurd((16, 99999, 99999)),
        absurd((2**62, 3, 3)),
        absurd((16, -11, -11)),
        absurd(()),
        npy_bytes(np.zeros((16, 11, 11), np.float32)) + b"more",
        npy_bytes(np.zeros((16, 11, 11), "V4")),
    ],
)
def test_absurd_sizes_take_no_memory(original, folder, data):
    head = fresh(original, folder)
    (folder / "kernels.npy").write_bytes(data)
    head["files"]["kernels.npy"] = sha256(data)
    seal(folder, head)
    with pytest.raises(PatchlabError, match=r"array|kernels|kernel"):
        read_bank(folder)
    with pytest.raises(patchlab_bank.BankError):
        patchlab_bank.load(folder)


@pytest.mark.parametrize("name", ["kernels.npy", "bank.json"])
def test_a_pipe_in_the_place_of_a_file_is_not_waited_for(original, folder, name):
    fresh(original, folder)
    (folder / name).unlink()
    os.mkfifo(folder / name)
    with pytest.raises(PatchlabError, match=r"not a plain file|cannot read|no bank"):
        read_bank(folder)
    with pytest.raises(patchlab_bank.BankError, match=r"not a plain file|no bank|cannot be read"):
        patchlab_bank.load(folder)


def test_a_manifest_nested_without_end(folder):
    folder.mkdir()
    (folder / "bank.json").write_text("[" * 200_000)
    with pytest.raises(PatchlabError, match="cannot read the manifest"):
        read_bank(folder)
