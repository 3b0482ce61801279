"""Compilers: found, chosen by CC, absent; libraries that come out the same."""

from __future__ import annotations

import os
import stat
import sys

import pytest

from patchlab.bank.plan import make_plan
from patchlab.export import build, c99
from tests.bank.banks import random_bank


@pytest.fixture
def files():
    bank = random_bank(1, 3)
    return c99.emit(bank, make_plan(bank))


def script(path, text):
    path.write_text(f"#!{sys.executable}\n{text}\n")
    path.chmod(path.stat().st_mode | stat.S_IXUSR)
    return str(path)


def test_cc_is_honoured(tmp_path, monkeypatch):
    fake = script(tmp_path / "my cc", "import sys; print('fake', *sys.argv[1:])")
    monkeypatch.setenv("CC", f"'{fake}' -v2")
    found = build.find_compiler()
    assert found.command == (fake, "-v2")
    assert found.version == "fake -v2 --version"


@pytest.mark.parametrize("name", ["no-such-compiler", "'", "false"])
def test_a_cc_that_does_not_run_is_no_compiler(monkeypatch, name, files):
    monkeypatch.setenv("CC", name)
    assert build.find_compiler() is None
    assert build.compile_library(files, "arbitrary") is None
    result = build.run_selftest(files, "arbitrary")
    assert result.passed is None
    assert "C source is complete" in result.output


def test_without_any_compiler_nothing_fails(monkeypatch, files):
    monkeypatch.delenv("CC", raising=False)
    monkeypatch.setenv("PATH", os.devnull)
    monkeypatch.setattr(build.util, "find_spec", lambda name: None)
    assert build.find_compiler() is None
    assert build.compile_library(files, "arbitrary") is None


def test_the_same_source_gives_the_same_library(files):
    one, two = (build.compile_library(files, "arbitrary", flags=("-O1",)) for _ in range(2))
    assert one == two
    assert b"/tmp" not in one


def test_a_failing_compiler_says_why(files):
    broken = {**files, "arbitrary.c": b"int f(void) { return nothing; }\n"}
    with pytest.raises(build.BuildError, match="nothing"):
        build.compile_library(broken, "arbitrary")


def test_a_compiler_that_cannot_run(files, tmp_path):
    gone = build.Compiler((str(tmp_path / "gone"),), "gone 1.0")
    with pytest.raises(build.BuildError, match="could not be run"):
        build.compile_library(files, "arbitrary", compiler=gone)


def test_only_source_files_reach_the_compiler(files, tmp_path):
    odd = {**files, "../outside.c": b"#error", "notes.txt": b"x", "lib/a.c": b"#error"}
    assert build.compile_library(odd, "arbitrary", flags=("-O0",))
    assert not (tmp_path.parent / "outside.c").exists()


def test_names_of_libraries(monkeypatch):
    for system, name in [("Linux", "libx.so"), ("Darwin", "libx.dylib"), ("Windows", "x.dll")]:
        monkeypatch.setattr(build.platform, "system", lambda system=system: system)
        monkeypatch.setattr(build.platform, "machine", lambda: "AMD64")
        assert build.library_name("x") == name
        assert build.target_name() == f"x86_64-{system.lower()}"
