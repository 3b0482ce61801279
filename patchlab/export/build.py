"""Compiling a bank with the compiler of this machine, when there is one.

Nothing fails for want of a compiler: the C source is complete without a library.
What is compiled stays in a temporary folder under relative names, so the same
source and compiler give the same bytes.
"""

from __future__ import annotations

import os
import platform
import shlex
import shutil
import subprocess
import sys
import tempfile
from collections.abc import Mapping, Sequence
from dataclasses import dataclass
from importlib import util
from pathlib import Path

from patchlab.errors import PatchlabError

FLAGS = ("-std=c99", "-O3", "-fno-math-errno", "-ffp-contract=off")
"""How a bank is compiled. The source asks for fused multiply-adds itself where the processor has
them, so contraction by the compiler is off and its choices do not reach the numbers."""
STRICT = ("-Wall", "-Wextra", "-Wconversion", "-Wpedantic", "-Werror")
"""Warnings that the generated source keeps clear of."""
NO_COMPILER = (
    "no C compiler was found (CC, cc, gcc, clang): the C source is complete, the shared library "
    "was not built"
)


class BuildError(PatchlabError):
    """The compiler refused a source or ended badly."""


@dataclass(frozen=True)
class Compiler:
    """A working C compiler: the command it is called by and how it names itself."""

    command: tuple[str, ...]
    version: str


@dataclass(frozen=True)
class SelfTest:
    """How a self-test ended: ``passed`` is None when it could not be run, ``output`` says why."""

    passed: bool | None
    output: str


def find_compiler() -> Compiler | None:
    """The C compiler to use: the CC variable if set, else cc, gcc, clang, else ziglang's.

    Returns
    -------
    Compiler, or None when none of them runs. A CC that does not run is not replaced by another.
    """
    chosen = os.environ.get("CC", "").strip()
    candidates: list[tuple[str, ...]] = [("cc",), ("gcc",), ("clang",)]
    if chosen:
        candidates = [_words(chosen)]
    if not chosen and util.find_spec("ziglang") is not None:
        # that compiler builds for this very processor unless told otherwise
        candidates.append((sys.executable, "-m", "ziglang", "cc", "-mcpu=baseline"))
    for command in candidates:
        if command and shutil.which(command[0]):
            version = _version(command)
            if version:
                return Compiler(command, version)
    return None


def _words(command: str) -> tuple[str, ...]:
    try:
        return tuple(shlex.split(command))
    except ValueError:  # an open quotation mark
        return ()


def _version(command: Sequence[str]) -> str:
    try:
        done = subprocess.run(
            [*command, "--version"], capture_output=True, text=True, timeout=60, check=False,
            errors="replace",
        )  # fmt: skip
    except (OSError, subprocess.SubprocessError):
        return ""
    return done.stdout.splitlines()[0].strip() if done.returncode == 0 and done.stdout else ""


def target_name() -> str:
    """This machine as the name of a folder under ``lib``.

    >>> "-" in target_name()
    True
    """
    machine = platform.machine().lower().replace("amd64", "x86_64").replace("arm64", "aarch64")
    return f"{machine or 'unknown'}-{platform.system().lower() or 'unknown'}"


def library_name(name: str) -> str:
    """File name of a bank's shared library on this machine."""
    system = platform.system()
    if system == "Windows":
        return f"{name}.dll"
    return f"lib{name}.dylib" if system == "Darwin" else f"lib{name}.so"


def compile_library(
    files: Mapping[str, bytes],
    name: str,
    *,
    compiler: Compiler | None = None,
    flags: Sequence[str] = (),
) -> bytes | None:
    """Compile a bank to a shared library that runs on every machine of this kind.

    Parameters
    ----------
    files : the bundle's C files, relative path to bytes (``NAME.h`` and ``NAME.c`` among them)
    name : the bank's name
    compiler : the one to use; found when not given
    flags : further flags, last

    Returns
    -------
    bytes of the library, or None when there is no compiler (:data:`NO_COMPILER` says it). The
    code for newer instruction sets is inside and chosen when it runs; none is required.

    Raises
    ------
    BuildError : the compiler failed.
    """
    compiler = compiler or find_compiler()
    if compiler is None:
        return None
    shared = ["-shared", "-fvisibility=hidden"]
    if platform.system() == "Linux":
        shared += ["-fPIC", "-s", "-Wl,--build-id=none"]
    elif platform.system() == "Darwin":
        shared += ["-fPIC"]
    with tempfile.TemporaryDirectory(prefix="bank-") as folder:
        _unpack(Path(folder), files)
        out = library_name(name)
        _run(
            Path(folder),
            [*compiler.command, *FLAGS, *shared, *flags, "-o", out, f"{name}.c", "-lm"],
        )
        return (Path(folder) / out).read_bytes()


def run_selftest(
    files: Mapping[str, bytes],
    name: str,
    *,
    compiler: Compiler | None = None,
    flags: Sequence[str] = (),
) -> SelfTest:
    """Compile a bank with its self-test and run it.

    Parameters
    ----------
    files : ``NAME.h``, ``NAME.c`` and ``NAME_selftest.c`` among them
    name : the bank's name
    compiler : the one to use; found when not given
    flags : further compiler flags (sanitizers, warnings, -DNAME_MAX_LANES=1, ...)

    Returns
    -------
    SelfTest : passed, failed, or not run for want of a compiler

    Raises
    ------
    BuildError : the compiler failed.
    """
    compiler = compiler or find_compiler()
    if compiler is None:
        return SelfTest(None, NO_COMPILER)
    with tempfile.TemporaryDirectory(prefix="bank-") as folder:
        _unpack(Path(folder), files)
        program = Path(folder) / ("selftest.exe" if platform.system() == "Windows" else "selftest")
        sources = [f"{name}.c", f"{name}_selftest.c"]
        command = [*compiler.command, *FLAGS, *flags, "-o", program.name, *sources, "-lm"]
        _run(Path(folder), command)
        done = subprocess.run(
            [str(program)], capture_output=True, text=True, timeout=600, check=False,
            errors="replace",
        )  # fmt: skip
    return SelfTest(done.returncode == 0, done.stdout + done.stderr)


def _unpack(folder: Path, files: Mapping[str, bytes]) -> None:
    for path, data in files.items():
        if "/" not in path and "\\" not in path and path.endswith((".c", ".h")):
            (folder / path).write_bytes(data)


def _run(folder: Path, command: Sequence[str]) -> None:
    try:
        done = subprocess.run(
            list(command), cwd=folder, capture_output=True, text=True, timeout=1200, check=False,
            errors="replace", env={**os.environ, "LC_ALL": "C", "SOURCE_DATE_EPOCH": "0"},
        )  # fmt: skip
    except (OSError, subprocess.SubprocessError) as error:
        raise BuildError(f"the C compiler could not be run: {error}", where=command[0]) from None
    if done.returncode != 0:
        first = next((row for row in done.stderr.splitlines() if "error" in row), done.stderr)
        raise BuildError(f"the C compiler failed: {first[:500]}", where=command[0])
