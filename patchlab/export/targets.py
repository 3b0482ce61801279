"""Libraries for other machines: cross-compiled with the ziglang package of the registry.

Every target is built without a C library: the two functions that a bank needs of one
(memcpy, memset) are compiled in, so the result depends on nothing and runs with any.
"""

from __future__ import annotations

import sys
import tempfile
from collections.abc import Mapping
from dataclasses import dataclass
from importlib import util
from pathlib import Path

from patchlab.errors import UsageError
from patchlab.export.build import FLAGS, _run, _unpack
from patchlab.export.c_text import fill, licence, template
from patchlab.types import Bank, Plan

HOST = "host"


@dataclass(frozen=True)
class CrossTarget:
    """A machine that a library can be made for.

    Parameters
    ----------
    triple : the compiler's name for it
    file : name of the library, ``{}`` standing for the bank's
    flags : what it takes beside :data:`patchlab.export.build.FLAGS`
    """

    triple: str
    file: str
    flags: tuple[str, ...]


TARGETS = {
    "aarch64-linux": CrossTarget(
        "aarch64-linux-gnu",
        "lib{}.so",
        ("-shared", "-fPIC", "-fvisibility=hidden", "-Wl,--build-id=none"),
    ),
    "x86_64-linux": CrossTarget(
        "x86_64-linux-gnu",
        "lib{}.so",
        ("-shared", "-fPIC", "-fvisibility=hidden", "-Wl,--build-id=none"),
    ),
    "x86_64-windows": CrossTarget("x86_64-windows-gnu", "{}.dll", ("-shared", "-Wl,--no-entry")),
    "wasm32": CrossTarget(
        "wasm32-freestanding",
        "{}.wasm",
        (
            "-msimd128", "-fvisibility=hidden", "-Wl,--no-entry", "-Wl,--export-dynamic",
            "-Wl,--export=__heap_base", "-Wl,--strip-all",
        ),
    ),
}  # fmt: skip
"""By the name of the folder under ``lib``."""

_HEADERS = {
    "string.h": (
        "#include <stddef.h>\n"
        "void *memcpy(void *, const void *, size_t);\n"
        "void *memset(void *, int, size_t);\n"
    ),
    # one instruction on every processor here, as errno is not asked for
    "math.h": (
        "#define sqrt(x) __builtin_sqrt(x)\n#define sqrtf(x) __builtin_sqrtf(x)\n"
        "#define fabsf(x) __builtin_fabsf(x)\n"
    ),
    # the compiler's own header of vector intrinsics asks for it
    "stdlib.h": "#include <stddef.h>\nvoid *malloc(size_t);\nvoid free(void *);\n",
    "malloc.h": "#include <stdlib.h>\n",
}
_MEMORY = """\
#include <stddef.h>
__attribute__((visibility("hidden"))) void *memcpy(void *to, const void *from, size_t n)
{
    size_t i;
    for (i = 0; i < n; ++i) ((unsigned char *)to)[i] = ((const unsigned char *)from)[i];
    return to;
}
__attribute__((visibility("hidden"))) void *memset(void *to, int value, size_t n)
{
    size_t i;
    for (i = 0; i < n; ++i) ((unsigned char *)to)[i] = (unsigned char)value;
    return to;
}
"""


def parse_targets(text: str) -> tuple[str, ...]:
    """The targets in a comma-separated list, each once, in its order.

    >>> parse_targets("host, host")
    ('host',)

    Raises
    ------
    UsageError : an unknown one, or one that takes a compiler that is not installed.
    """
    wanted = tuple(dict.fromkeys(word.strip() for word in text.split(",") if word.strip()))
    for name in wanted:
        if name != HOST and name not in TARGETS:
            raise UsageError(
                f"there is no target {name!r}", remedy=f"choose of {', '.join((HOST, *TARGETS))}"
            )
    if set(wanted) - {HOST} and util.find_spec("ziglang") is None:
        raise UsageError(
            f"libraries for other machines ({', '.join(t for t in wanted if t != HOST)}) take a "
            "cross compiler, which is not installed",
            remedy="pip install 'patchlab-bank[compiler]'",
        )
    return wanted


def library_path(name: str, target: str) -> str:
    """Where the library of a target stands in the folder of a bank.

    >>> library_path("edges", "wasm32")
    'lib/wasm32/edges.wasm'
    """
    return f"lib/{target}/{TARGETS[target].file.format(name)}"


def cross_compile(
    files: Mapping[str, bytes], bank: Bank, plan: Plan, target: str
) -> dict[str, bytes]:
    """Compile a bank for another machine.

    Parameters
    ----------
    files : the bundle's C files, relative path to bytes
    bank, plan : what they were made from
    target : a key of :data:`TARGETS`

    Returns
    -------
    dict of relative path to bytes: the library and, for WebAssembly, a module that loads it.
    The same source and compiler give the same bytes.

    Raises
    ------
    BuildError : the compiler failed.
    """
    about = TARGETS[target]
    with tempfile.TemporaryDirectory(prefix="bank-") as work:
        folder = Path(work)
        _unpack(folder, files)
        for name, text in _HEADERS.items():
            (folder / "include").mkdir(exist_ok=True)
            (folder / "include" / name).write_text(text)
        (folder / "memory.c").write_text(_MEMORY)
        compiler = (sys.executable, "-m", "ziglang", "cc", "-target", about.triple)
        # a loop that copies must not be compiled to a call of itself
        _run(
            folder, [*compiler, *FLAGS, "-fno-builtin", "-c", "-fPIC", "-o", "memory.o", "memory.c"]
        )
        library = about.file.format(bank.name)
        _run(
            folder,
            [
                *compiler, *FLAGS, *about.flags, "-nostdlib", "-s", "-isystem", "include",
                "-o", library, f"{bank.name}.c", "memory.o",
            ],
        )  # fmt: skip
        made = {library_path(bank.name, target): (folder / library).read_bytes()}
    if target == "wasm32":
        made[f"lib/wasm32/{bank.name}.mjs"] = _loader(bank, plan)
    return made


def _loader(bank: Bank, plan: Plan) -> bytes:
    form = bank.contract.format
    arrays = {"uint8": "Uint8Array", "uint16": "Uint16Array", "float32": "Float32Array"}
    return fill(
        template("bank.mjs.in"),
        {
            "N": bank.name,
            "LICENCE": licence(" * "),
            "ARRAY": arrays[form.dtype],
            "PIXELS": form.name,
            "BYTES": form.bits // 8 if form.bits % 8 == 0 else 2,
            "NAMES": ", ".join(f'"{k.name}"' for k in bank.kernels),
            "SIZE": bank.size,
            "SCALES": len(plan.detail["strength"]),
            "ABI": plan.detail["abi"],
        },
    )
