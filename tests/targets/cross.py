"""Built and run for real: other machines, WebAssembly, CMake and pkg-config.

These take tools that pip alone does not bring, so ``.ci/run targets`` fetches them and runs
this file; the plain test run does not collect it.
"""

from __future__ import annotations

import os
import re
import shutil
import struct
import subprocess
import sys
from pathlib import Path

import numpy as np
import pytest

from patchlab import export
from patchlab.bank import apply, reference
from patchlab.bank.disk import write_bank
from patchlab.bank.native import NativeBank
from patchlab.bank.plan import make_plan
from patchlab.export import build, patchlab_bank
from patchlab.export.edgel_vectors import edgel_checks
from patchlab.export.targets import TARGETS, cross_compile
from patchlab.pipeline import bundle
from patchlab.pipeline.edgel_rules import edgel_cases, edgel_finder, edgel_rules
from patchlab.settings import Settings
from patchlab.store import sha256
from tests.bank.banks import picture
from tests.export.folders import BANKS


def sources(bank):
    """The C files, with a self-test on the smallest picture and on a wide one."""
    plan = make_plan(bank)
    cases = [
        (name, pixels, reference.responses(bank, pixels), np.array(plan.error_bound))
        for name, pixels in (
            ("smallest", picture((bank.size, bank.size), bank.contract.pixels)),
            ("wide", picture((bank.size + 2, 131), bank.contract.pixels)),
        )
    ]
    pictures = edgel_cases(bank, plan)
    edgels = pictures[0] if pictures else None
    source = export.emit(bank, plan, edgel_rules(bank))
    return plan, {**source, **export.emit_selftest(bank, plan, cases, edgels)}


def tool(name):
    found = shutil.which(name)
    assert found, f"{name} is needed here; .ci/run targets fetches it"
    return found


def run(*words, **more):
    done = subprocess.run(
        list(map(str, words)), capture_output=True, text=True, timeout=600, check=False, **more
    )
    assert done.returncode == 0, done.stdout + done.stderr
    return done.stdout


# ---------------------------------------------------------------- other machines


@pytest.mark.parametrize("target", TARGETS)
def test_the_same_source_gives_the_same_library(target):
    bank = BANKS["arbitrary"]
    plan, files = sources(bank)
    one, two = (cross_compile(files, bank, plan, target) for _ in range(2))
    assert one == two
    assert all(len(data) > 1000 for data in one.values())
    assert not any(b"/tmp" in data for data in one.values())


@pytest.mark.parametrize("name", BANKS)
def test_a_linux_library_needs_nothing_and_gives_the_bits_of_the_host_library(name):
    if build.target_name() != "x86_64-linux":
        pytest.fail("this check is written for an x86-64 Linux machine")
    bank = BANKS[name]
    plan, files = sources(bank)
    own = build.compile_library(files, bank.name)
    (cross,) = cross_compile(files, bank, plan, "x86_64-linux").values()
    pixels = picture((40, 77), bank.contract.pixels)
    there, here = (NativeBank(bank, plan, data, sha256(data)) for data in (cross, own))
    np.testing.assert_array_equal(there.responses(pixels), here.responses(pixels))
    assert b"libc.so" not in cross


def test_a_machine_without_a_compiler_uses_the_one_of_the_extra(monkeypatch):
    monkeypatch.delenv("CC", raising=False)
    monkeypatch.setenv("PATH", str(Path(sys.executable).parent))
    if shutil.which("cc") or shutil.which("gcc") or shutil.which("clang"):
        pytest.fail("the folder of this Python holds a C compiler")
    bank = BANKS["step"]
    plan, files = sources(bank)
    compiler = build.find_compiler()
    assert "ziglang" in compiler.command
    data = build.compile_library(files, bank.name)
    pixels = picture((30, 30))
    got = NativeBank(bank, plan, data, sha256(data)).responses(pixels)
    bound = np.array(plan.error_bound)[:, None, None]
    assert (np.abs(got - reference.responses(bank, pixels)) <= bound).all()


@pytest.mark.parametrize("name", ["step", "energy", "both"])
def test_qemu_runs_the_selftest_of_aarch64(name, tmp_path):
    bank = BANKS[name]
    _, files = sources(bank)
    compiler = (sys.executable, "-m", "ziglang", "cc", "-target", "aarch64-linux-musl", "-static")
    build._unpack(tmp_path, files)
    words = [*compiler, *build.FLAGS, "-o", "selftest", f"{bank.name}.c",
             f"{bank.name}_selftest.c", "-lm"]  # fmt: skip
    run(*words, cwd=tmp_path)
    said = run(tool("qemu-aarch64"), tmp_path / "selftest")
    assert said.splitlines()[-1] == "ok: 0 checks failed"


def exports_and_imports(data):
    """Names a Windows library gives, and what it takes (PE/COFF specification, Microsoft)."""
    (head,) = struct.unpack_from("<I", data, 0x3C)
    assert data[head : head + 4] == b"PE\0\0"
    machine, sections = struct.unpack_from("<HH", data, head + 4)
    (optional,) = struct.unpack_from("<H", data, head + 20)
    directory = head + 24 + 112
    table = head + 24 + optional

    def place(address):
        for i in range(sections):
            size, start, _, raw = struct.unpack_from("<IIII", data, table + 40 * i + 8)
            if start <= address < start + size:
                return address - start + raw
        raise AssertionError("an address outside every section")

    rva, _ = struct.unpack_from("<II", data, directory)
    count, _, names = struct.unpack_from("<III", data, place(rva) + 24)
    found = []
    for i in range(count):
        (name,) = struct.unpack_from("<I", data, place(names) + 4 * i)
        at = place(name)
        found.append(data[at : data.index(b"\0", at)].decode())
    return machine, found, struct.unpack_from("<II", data, directory + 8)


def test_the_windows_library_gives_the_interface_and_takes_nothing():
    bank = BANKS["step"]
    plan, files = sources(bank)
    (data,) = cross_compile(files, bank, plan, "x86_64-windows").values()
    machine, names, imports = exports_and_imports(data)
    assert machine == 0x8664
    declared = set(re.findall(r"step_API [^;]*?(step_\w+)\(", files["step.h"].decode()))
    assert declared <= set(names)
    assert {"step_responses", "step_edges_rows"} <= declared
    assert imports == (0, 0)


# ---------------------------------------------------------------- WebAssembly


def test_webassembly_finds_the_edgels_that_python_finds():
    tool("node")
    bank = BANKS["both"]
    plan, files = sources(bank)
    made = cross_compile(files, bank, plan, "wasm32")
    target = export.wasm_target(bank, *(made[f"lib/wasm32/both.{end}"] for end in ("wasm", "mjs")))
    checks = list(edgel_checks(target, edgel_cases(bank, plan), edgel_finder(bank)))
    assert [c.passed for c in checks] == [True, True]


@pytest.mark.parametrize("name", BANKS)
def test_webassembly_in_node_equals_the_oracle_and_the_plain_code(name, tmp_path):
    tool("node")
    bank = BANKS[name]
    plan, files = sources(bank)
    files = {**files, **cross_compile(files, bank, plan, "wasm32")}
    loader, module = (files[f"lib/wasm32/{bank.name}.{end}"] for end in ("mjs", "wasm"))
    target = export.wasm_target(bank, module, loader)
    pixels = picture((31, 67), bank.contract.pixels)
    got = target.responses(pixels)
    bound = np.array(plan.error_bound)[:, None, None]
    assert (np.abs(got - reference.responses(bank, pixels)) <= bound).all()
    plain = build.compile_library(files, bank.name, flags=(f"-D{bank.name}_MAX_LANES=1",))
    native = NativeBank(bank, plan, plain, sha256(plain))
    np.testing.assert_array_equal(got, native.responses(pixels))
    for place in range(len(bank.scales)):
        for a, b in zip(target.edges(pixels, place), native.edges(pixels, place), strict=True):
            np.testing.assert_array_equal(a, b)


def test_webassembly_refuses_with_the_words_of_the_c_code():
    bank = BANKS["energy"]
    plan, files = sources(bank)
    made = cross_compile(files, bank, plan, "wasm32")
    target = export.wasm_target(bank, made["lib/wasm32/energy.wasm"], made["lib/wasm32/energy.mjs"])
    pixels = picture((30, 30), "Mono12")
    with pytest.raises(Exception, match="width is smaller than a kernel"):
        target.responses(pixels[:, :3].copy())
    with pytest.raises(Exception, match="no such scale"):
        target.edges(pixels, 5)
    with pytest.raises(Exception, match="a picture is a Uint16Array"):
        target.responses(np.concatenate([pixels, pixels], axis=1).astype(np.uint8))
    other = re.sub(rb"abi\(\) !== \d+", b"abi() !== 7", made["lib/wasm32/energy.mjs"])
    target = export.wasm_target(bank, made["lib/wasm32/energy.wasm"], other)
    with pytest.raises(Exception, match="belongs to another bank"):
        target.responses(pixels)


def test_verify_runs_every_target_that_can_run_here(tmp_path, monkeypatch):
    monkeypatch.setattr("patchlab.export.vectors.WIDEST_TILE", 1000)
    bank = BANKS["step"]
    plan, files = sources(bank)
    files |= export.runtime_files(bundle.edge_rules(bank))
    settings = Settings(target="host,wasm32,aarch64-linux")
    library, said = bundle.build_libraries(files, bank, plan, settings)
    assert said.endswith("; lib/wasm32/step.wasm; lib/aarch64-linux/libstep.so")
    head = write_bank(tmp_path / "b", bank, plan, {**files, **library})
    found = bundle.prove(tmp_path / "b", bank, plan, head)
    assert found.passed
    by_name = {}
    for check in found.checks:
        by_name.setdefault(check.target, []).append(check.passed)
    assert by_name["WebAssembly lib/wasm32/step.wasm"] == [True] * 6
    assert by_name["compiled library lib/aarch64-linux/libstep.so"] == [None]
    assert patchlab_bank.load(tmp_path / "b").compiled is not None


# ---------------------------------------------------------------- CMake and pkg-config

MAIN = """\
#include <step.h>
#include <stdio.h>
#include <stdlib.h>

int main(void)
{
    enum { W = 40, H = 30 };
    static unsigned char picture[H][W];
    static float planes[step_KERNEL_COUNT][H][W];
    void *scratch = malloc(step_scratch_bytes(W, H));
    int x, y, code;
    for (y = 0; y < H; ++y) for (x = 0; x < W; ++x) picture[y][x] = (unsigned char)(7 * x ^ 5 * y);
    code = step_responses(&picture[0][0], W, W, H, &planes[0][0][0], 4 * W, 4 * W * H, scratch);
    free(scratch);
    if (code != step_OK || step_abi() != step_ABI) return 1;
    printf("%.9g %.9g\\n", planes[3][10][20], planes[9][29][39]);
    return 0;
}
"""
CONSUMER = """\
cmake_minimum_required(VERSION 3.10)
project(consumer C)
{how}
add_executable(consumer main.c)
target_link_libraries(consumer PRIVATE step)
"""


@pytest.fixture(scope="module")
def expected():
    """The two numbers that every consumer prints, from the in-process engine's bits."""
    y, x = np.mgrid[:30, :40]
    planes = apply.responses(BANKS["step"], ((7 * x) ^ (5 * y)).astype(np.uint8))
    bound = make_plan(BANKS["step"]).error_bound
    return (planes[3, 10, 20], bound[3]), (planes[9, 29, 39], bound[9])


def agrees(said, expected):
    for word, (value, bound) in zip(said.split(), expected, strict=True):
        assert abs(float(word) - value) <= 2 * bound


def build_with_cmake(source, to, *options):
    run(tool("cmake"), "-G", "Ninja", "-S", source, "-B", to, *options)
    run(tool("cmake"), "--build", to)


@pytest.fixture(scope="module", params=["OFF", "ON"], ids=["static", "shared"])
def installed(request, tmp_path_factory):
    """The bank built by its own CMakeLists, tested by ctest, installed, then moved."""
    tool("ninja")
    root = tmp_path_factory.mktemp("cmake")
    _, files = sources(BANKS["step"])
    (root / "bank").mkdir()
    for name, data in files.items():
        (root / "bank" / name).write_bytes(data)
    build_with_cmake(root / "bank", root / "built", f"-DBUILD_SHARED_LIBS={request.param}")
    assert "100% tests passed" in run(tool("ctest"), cwd=root / "built")
    run(tool("cmake"), "--install", root / "built", "--prefix", root / "first")
    (root / "first").rename(root / "moved here")
    return root


def consume(root, name, how, *options):
    folder = root / name
    folder.mkdir()
    (folder / "main.c").write_text(MAIN)
    (folder / "CMakeLists.txt").write_text(CONSUMER.format(how=how))
    build_with_cmake(folder, folder / "built", *options)
    return run(folder / "built" / "consumer")


def test_a_project_takes_the_bank_as_a_folder(installed, expected):
    said = consume(installed, "folder", f"add_subdirectory({installed / 'bank'} bank)")
    agrees(said, expected)


def test_a_project_finds_the_installed_package(installed, expected):
    said = consume(
        installed, "package", "find_package(step REQUIRED)",
        f"-DCMAKE_PREFIX_PATH={installed / 'moved here'}",
    )  # fmt: skip
    agrees(said, expected)


def test_pkg_config_tells_how_to_compile_and_link(installed, expected, tmp_path):
    prefix = installed / "moved here"
    command = shutil.which("pkg-config") or tool("pkgconf")
    where = {**os.environ, "PKG_CONFIG_PATH": str(prefix / "lib" / "pkgconfig")}
    words = run(command, "--cflags", "--libs", "step", env=where).strip()
    (tmp_path / "main.c").write_text(MAIN)
    script = f"{tool('cc')} -o consumer main.c {words} -Wl,-rpath,'{prefix}/lib'"
    run("sh", "-c", script, cwd=tmp_path)
    agrees(run(tmp_path / "consumer"), expected)
