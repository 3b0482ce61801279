"""Targets: what is asked for, refused, and said where a tool is missing. For real builds see
``tests/targets/cross.py``."""

from __future__ import annotations

import json
import shutil

import numpy as np
import pytest

from patchlab import export
from patchlab.bank import read_bank
from patchlab.bank.plan import make_plan
from patchlab.cli import main
from patchlab.errors import UsageError
from patchlab.export import targets
from patchlab.pipeline import bundle
from patchlab.settings import Settings
from patchlab.store import LICENCE
from tests.export.folders import BANKS, put, write


@pytest.fixture
def with_compiler(monkeypatch):
    """As if the cross compiler were installed: what it would be asked is kept, not run."""
    asked = []

    def fake(folder, command):
        asked.append(command)
        (folder / command[command.index("-o") + 1]).write_bytes(b"made")

    monkeypatch.setattr(targets.util, "find_spec", lambda name: object())
    monkeypatch.setattr(targets, "_run", fake)
    return asked


def test_targets_are_read_from_words_with_commas(with_compiler):
    assert export.parse_targets("host") == ("host",)
    assert export.parse_targets(" wasm32, host,,wasm32 ") == ("wasm32", "host")
    assert export.parse_targets("") == ()
    with pytest.raises(UsageError, match="no target 'riscv'; choose of host, aarch64-linux"):
        export.parse_targets("host,riscv")


def test_without_the_cross_compiler_a_sentence_says_what_to_install(monkeypatch, tmp_path, capsys):
    monkeypatch.setattr(targets.util, "find_spec", lambda name: None)
    assert export.parse_targets("host") == ("host",)
    with pytest.raises(UsageError, match=r"wasm32.*pip install 'patchlab-bank\[compiler\]'"):
        export.parse_targets("host,wasm32")
    np.save(tmp_path / "taps.npy", np.eye(3, dtype=np.float32)[None])
    words = ["export", "--taps", str(tmp_path / "taps.npy"), "-o", str(tmp_path / "b")]
    with pytest.raises(SystemExit) as end:
        main([*words, "--target", "wasm32"])
    assert end.value.code == 2
    assert "pip install" in capsys.readouterr().err
    assert not (tmp_path / "b").exists()


@pytest.mark.parametrize("target", targets.TARGETS)
def test_what_the_compiler_is_asked(with_compiler, target):
    bank = BANKS["step"]
    plan = make_plan(bank)
    made = targets.cross_compile(export.emit(bank, plan), bank, plan, target)
    assert made[export.library_path("step", target)] == b"made"
    memory, library = with_compiler
    for command in (memory, library):
        assert targets.TARGETS[target].triple in command
        assert set(targets.FLAGS) <= set(command)
    assert "-fno-builtin" in memory
    assert "-nostdlib" in library
    assert library[-2:] == ["step.c", "memory.o"]


def test_the_loader_of_the_webassembly_module(with_compiler):
    for name, array, width in (
        ("step", "Uint8Array", 1),
        ("energy", "Uint16Array", 2),
        ("line", "Float32Array", 4),
    ):
        bank = BANKS[name]
        plan = make_plan(bank)
        made = targets.cross_compile(export.emit(bank, plan), bank, plan, "wasm32")
        text = made[f"lib/wasm32/{name}.mjs"].decode()
        assert f"new {array}(memory.buffer" in text
        assert f"width * {width}, width, height" in text
        assert str(plan.detail["abi"]) in text
        assert "@" not in text
        words = " ".join(text.replace(" * ", " ").split())
        assert " ".join(LICENCE.split()) in words


def test_targets_are_added_to_a_bank_that_stands(with_compiler, tmp_path, monkeypatch, capsys):
    monkeypatch.setattr("patchlab.export.vectors.WIDEST_TILE", 1000)
    monkeypatch.setattr("patchlab.export.wasm.find_node", lambda: None)
    folder = write(tmp_path / "b", BANKS["arbitrary"])
    before = read_bank(folder)[2]
    words = ["export", str(folder), "--no-library", "--target", "wasm32,x86_64-windows", "--json"]
    main_ends(words, 0)
    told = json.loads(capsys.readouterr().out)
    assert told["library"].endswith("; lib/wasm32/arbitrary.wasm; lib/x86_64-windows/arbitrary.dll")
    bank, plan, head = read_bank(folder)
    added = set(head["files"]) - set(before["files"])
    assert added == {
        "lib/wasm32/arbitrary.wasm", "lib/wasm32/arbitrary.mjs", "lib/x86_64-windows/arbitrary.dll",
    }  # fmt: skip
    assert {k: head["files"][k] for k in before["files"]} == before["files"]
    found = {c.target: c for c in bundle.prove(folder, bank, plan, head).checks}
    assert found["compiled library lib/x86_64-windows/arbitrary.dll"].passed is None
    module = found["WebAssembly lib/wasm32/arbitrary.wasm"]
    assert module.passed is None
    assert "Node" in module.note


def main_ends(words, code):
    with pytest.raises(SystemExit) as end:
        main(words)
    assert end.value.code == code


def test_a_module_that_is_changed_or_no_module_fails(with_compiler, tmp_path, monkeypatch):
    monkeypatch.setattr("patchlab.export.vectors.WIDEST_TILE", 1000)
    node = tmp_path / "node"
    node.write_text("#!/bin/sh\necho 'CompileError: not a module' >&2\nexit 1\n")
    node.chmod(0o755)
    monkeypatch.setattr("patchlab.export.wasm.find_node", lambda: str(node))
    folder = write(tmp_path / "b", BANKS["arbitrary"], library=False)
    put(folder, "lib/wasm32/arbitrary.wasm", b"no module")
    put(folder, "lib/wasm32/arbitrary.mjs", b"")

    def note():
        bank, plan, head = read_bank(folder)
        checks = bundle.prove(folder, bank, plan, head).checks
        (one,) = [c for c in checks if c.target.startswith("WebAssembly")]
        assert one.passed is False
        return one.note

    assert "CompileError: not a module" in note()
    (folder / "lib/wasm32/arbitrary.wasm").write_bytes(b"other")
    assert "was changed" in note()


def test_without_host_no_library_of_this_machine_is_built():
    bank = BANKS["arbitrary"]
    plan = make_plan(bank)
    files = export.emit(bank, plan)
    for settings in (Settings(target=""), Settings(library=False)):
        made, said = bundle.build_libraries(files, bank, plan, settings)
        assert made == {}
        assert "not asked for" in said
    assert shutil.which("cc")
    made, _ = bundle.build_libraries(files, bank, plan, Settings())
    assert list(made) == [bundle.own_library(bank)]
