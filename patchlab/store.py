"""Artefacts on disk: folders with a manifest, whole or not there at all.

An artefact is a folder of files and one JSON manifest that names its format,
version, settings, inputs, parents and the SHA-256 of every file. Files are made
in a hidden sibling folder, which is renamed into place, so a reader never sees
half an artefact. Arrays are ``.npy`` without pickle. The same content gives the
same bytes: no time, no machine name, no path of the machine is written.
"""

from __future__ import annotations

import dataclasses
import hashlib
import io
import json
import math
import os
import platform
import shutil
import tempfile
from collections.abc import Callable, Iterator, Mapping
from contextlib import contextmanager
from pathlib import Path, PurePosixPath
from typing import Any, BinaryIO

import numpy as np

import patchlab.types as nouns
from patchlab.errors import InputError, UsageError, VerificationError

FORMAT = "patchlab"
VERSION = "1.0"
WORTH_MAPPING = 1 << 20
"""Smaller files are simply read."""
LICENCE = (
    "The content of this folder is its maker's own. The parts that come from patchlab's "
    "templates are granted to everyone for any use, without conditions or attribution."
)


def shown(value: object, most: int = 60) -> str:
    """A value from a file, fit for a sentence: short, in one line, printable.

    >>> shown("two\\nlines"), shown("long " * 40, 12)
    ('two?lines', 'long long lo...')
    """
    text = str(value)
    clean = "".join(c if c.isprintable() else "?" for c in text[:most])
    return clean if len(text) <= most else clean + "..."


def sha256(data: bytes) -> str:
    """Hex digest of some bytes."""
    return hashlib.sha256(data).hexdigest()


def canonical_json(value: Any) -> bytes:
    """JSON with sorted keys, readable, the same bytes for the same value."""
    text = json.dumps(value, sort_keys=True, indent=1, ensure_ascii=False, allow_nan=False)
    return (text + "\n").encode()


def npy_bytes(array: np.ndarray[Any, Any]) -> bytes:
    """An array as the bytes of a ``.npy`` file (no pickle)."""
    array = np.ascontiguousarray(array)
    if array.dtype.hasobject:
        raise ValueError("an array of objects is not written")
    head = io.BytesIO()
    np.lib.format.write_array_header_1_0(head, np.lib.format.header_data_from_array_1_0(array))
    flat: Any = array.reshape(-1)
    body = memoryview(flat).cast("B") if array.size else b""
    return b"".join([head.getvalue(), body])  # one copy only


def npy_array(data: bytes, where: str) -> np.ndarray[Any, Any]:
    """The array in the bytes of a ``.npy`` file (no pickle).

    Raises
    ------
    InputError : the bytes are no such file.
    """
    try:
        _check_npy_size(data)
        return np.lib.format.read_array(io.BytesIO(data), allow_pickle=False)
    except Exception as error:  # numpy's reader raises many kinds over a damaged header
        raise InputError(f"is not an array ({type(error).__name__})", where=where) from None


def _check_npy_size(data: bytes) -> None:
    """Refuse a header that promises other than what follows, before memory is taken for it."""
    _check_npy_header(io.BytesIO(data), len(data))


def _check_npy_header(file: BinaryIO, length: int) -> None:
    version = np.lib.format.read_magic(file)
    read = {
        (1, 0): np.lib.format.read_array_header_1_0,
        (2, 0): np.lib.format.read_array_header_2_0,
    }
    shape, _, dtype = read[version](file)
    if math.prod(shape) * dtype.itemsize != length - file.tell():
        raise ValueError("its header does not fit its size")


def environment() -> dict[str, str]:
    """Versions that numbers may depend on; no name of a person or a machine."""
    import scipy

    from patchlab import __version__

    return {
        "patchlab": __version__,
        "python": platform.python_version(),
        "numpy": np.__version__,
        "scipy": scipy.__version__,
        "system": f"{platform.system()} {platform.machine()}",
    }


# ---------------------------------------------------------------- nouns to files and back

_NOUNS: dict[str, type] = {
    name: value
    for name, value in vars(nouns).items()
    if isinstance(value, type)
    and dataclasses.is_dataclass(value)
    and value.__module__ == nouns.__name__
}


def pack(noun: Any) -> tuple[Any, dict[str, bytes]]:
    """A noun as plain JSON data and the ``.npy`` files of its arrays."""
    files: dict[str, bytes] = {}

    def plain(value: Any, name: str) -> Any:
        if dataclasses.is_dataclass(value) and not isinstance(value, type):
            fields = {
                f.name: plain(getattr(value, f.name), f"{name}.{f.name}" if name else f.name)
                for f in dataclasses.fields(value)
            }
            return {"is": type(value).__name__, **fields}
        if isinstance(value, np.ndarray):
            files[f"{name}.npy"] = npy_bytes(value)
            return {"array": f"{name}.npy"}
        if isinstance(value, Mapping):
            return {str(k): plain(v, f"{name}.{k}") for k, v in value.items()}
        if isinstance(value, list | tuple):
            return [plain(v, f"{name}.{i}") for i, v in enumerate(value)]
        if isinstance(value, np.generic):
            value = value.item()
        if isinstance(value, float) and not np.isfinite(value):
            return {"number": str(value)}
        return value

    return plain(noun, ""), files


def unpack(data: Any, array: Callable[[str], np.ndarray[Any, Any]]) -> Any:
    """Rebuild a noun from :func:`pack`'s data and its arrays; runs no code from the data."""
    if isinstance(data, list):
        return tuple(unpack(v, array) for v in data)
    if not isinstance(data, dict):
        return data
    if set(data) == {"array"}:
        return array(data["array"])
    if set(data) == {"number"}:
        return float(data["number"])
    values = {k: unpack(v, array) for k, v in data.items() if k != "is"}
    if "is" not in data:
        return values
    if data["is"] not in _NOUNS:
        raise InputError(f"unknown kind of content {shown(data['is'])!r}", remedy="update patchlab")
    try:
        return _NOUNS[data["is"]](**values)
    except (TypeError, ValueError) as error:
        raise InputError(f"damaged content: {shown(error, 200)}") from None


# ---------------------------------------------------------------- folders


def _safe(name: str) -> PurePosixPath:
    path = PurePosixPath(name)
    leads_out = path.is_absolute() or ".." in path.parts or not path.parts
    if leads_out or set("\\:") & set(name) or not name.isprintable() or len(name) > 300:
        raise VerificationError(
            f"a file name {shown(name)!r} in the manifest leads out of the folder"
        )
    return path


def write_artefact(
    folder: Path,
    kind: str,
    files: Mapping[str, bytes],
    *,
    body: Mapping[str, Any] | None = None,
    settings: Mapping[str, Any] | None = None,
    seed: int | None = None,
    inputs: Mapping[str, str] | None = None,
    parents: Mapping[str, str] | None = None,
    manifest: str = "manifest.json",
    force: bool = False,
) -> dict[str, Any]:
    """Write an artefact whole, or leave everything as it was.

    Parameters
    ----------
    folder : where it will stand
    kind : what it is ("patches", "dictionary", "bank", ...)
    files : relative path to bytes
    body : further entries of the manifest
    settings, seed, inputs, parents : where it came from; inputs are relative path to SHA-256,
        parents are kind to content id
    manifest : the manifest's file name
    force : replace an artefact of the same kind that stands there

    Returns
    -------
    dict : the manifest as written

    Raises
    ------
    UsageError : something stands there already and may not be replaced.
    """
    folder = Path(folder)
    hashes = {str(_safe(name)): sha256(data) for name, data in sorted(files.items())}
    head: dict[str, Any] = {
        **(body or {}),
        "format": FORMAT,
        "version": VERSION,
        "kind": kind,
        "settings": dict(settings or {}),
        "seed": seed,
        "inputs": dict(inputs or {}),
        "parents": dict(parents or {}),
        "environment": environment(),
        "licence": LICENCE,
        "files": hashes,
    }
    head["id"] = sha256(canonical_json(head))[:16]

    if folder.exists():
        standing = folder.is_dir() and ((folder / manifest).is_file() or not any(folder.iterdir()))
        if not standing:
            raise UsageError(
                "this is not an artefact of patchlab, so it is left alone",
                where=str(folder),
                remedy="choose another output folder",
            )
        if any(folder.iterdir()) and not force:
            raise UsageError(
                "the output exists already", where=str(folder), remedy="use --force to replace it"
            )
    folder.parent.mkdir(parents=True, exist_ok=True)
    work = Path(tempfile.mkdtemp(prefix=f".{folder.name}.", dir=folder.parent))
    try:
        for name, data in files.items():
            target = work / _safe(name)
            target.parent.mkdir(parents=True, exist_ok=True)
            with _naming(folder / name):
                target.write_bytes(data)
        (work / manifest).write_bytes(canonical_json(head))
        os.chmod(work, 0o755)
        if folder.exists():
            old = Path(tempfile.mkdtemp(prefix=f".{folder.name}.", dir=folder.parent))
            os.replace(folder, old / "old")
            os.replace(work, folder)
            shutil.rmtree(old, ignore_errors=True)
        else:
            os.replace(work, folder)
    finally:
        shutil.rmtree(work, ignore_errors=True)
    return head


@contextmanager
def _naming(path: Path) -> Iterator[None]:
    """Give a failing write the file's own name: a full disk names none."""
    try:
        yield
    except OSError as error:
        raise OSError(error.errno, error.strerror or str(error), str(path)) from None


def write_file(path: Path, data: bytes) -> None:
    """Write one file whole: a temporary name beside it, then a rename."""
    path.parent.mkdir(parents=True, exist_ok=True)
    handle, name = tempfile.mkstemp(prefix=f".{path.name}.", dir=path.parent)
    try:
        with _naming(path), os.fdopen(handle, "wb") as out:
            out.write(data)
        os.chmod(name, 0o644)
        os.replace(name, path)
    except BaseException:
        Path(name).unlink(missing_ok=True)
        raise


def _check_plain(path: Path) -> None:
    if path.exists() and not path.is_file():  # a pipe or a device would never end
        raise VerificationError("is not a plain file", where=str(path))


def read_manifest(folder: Path, kind: str, *, manifest: str = "manifest.json") -> dict[str, Any]:
    """Read and check a manifest.

    Raises
    ------
    InputError : no such artefact, damaged, of another kind, or of a newer major version.
    VerificationError : a file name in it leads out of the folder.
    """
    path = Path(folder) / manifest
    try:
        _check_plain(path)
        head = json.loads(path.read_bytes())
    except FileNotFoundError:
        raise InputError(f"there is no {kind} here", where=str(folder)) from None
    except (OSError, ValueError, RecursionError) as error:
        reason = shown(error, 200)
        raise InputError(f"cannot read the manifest: {reason}", where=str(path)) from None
    if not isinstance(head, dict) or head.get("format") != FORMAT:
        raise InputError("this manifest is not patchlab's", where=str(path))
    if str(head.get("version", "")).split(".")[0] != VERSION.split(".")[0]:
        raise InputError(
            f"format version {shown(head.get('version'))} is not known here (this is {VERSION})",
            where=str(path),
            remedy="update patchlab",
        )
    if head.get("kind") != kind:
        raise InputError(f"this is a {shown(head.get('kind'))}, not a {kind}", where=str(folder))
    if not isinstance(head.get("files"), dict):
        raise InputError("the manifest lists no files", where=str(path))
    for name in head["files"]:
        _safe(name)
    return head


def read_file(folder: Path, head: Mapping[str, Any], name: str) -> bytes:
    """Read one file of an artefact after checking its hash.

    Raises
    ------
    VerificationError : it is missing, changed, or not in the manifest.
    """
    path = _known(folder, head, name)
    try:
        _check_plain(path)
        data = path.read_bytes()
    except OSError as error:
        raise VerificationError(f"cannot be read ({error.strerror})", where=str(path)) from None
    _check_hash(sha256(data), head, name, path)
    return data


def _known(folder: Path, head: Mapping[str, Any], name: str) -> Path:
    path = Path(folder) / _safe(name)
    if name not in head["files"]:
        raise VerificationError("the manifest does not know this file", where=str(path))
    return path


def _check_hash(found: str, head: Mapping[str, Any], name: str, path: Path) -> None:
    if found != head["files"][name]:
        raise VerificationError(
            "was changed after it was written (its hash differs)",
            where=str(path),
            remedy="export the bank again, or restore the file",
        )


def _size(path: Path) -> int:
    return path.stat().st_size if path.is_file() else 0


def map_array(folder: Path, head: Mapping[str, Any], name: str) -> np.ndarray[Any, Any]:
    """An array of an artefact, mapped into memory, not read; its hash is checked all the same.

    Raises
    ------
    InputError : the file is no array.
    VerificationError : it is missing, changed, or not in the manifest.
    """
    path = _known(folder, head, name)
    try:
        _check_plain(path)
        with path.open("rb") as file:
            _check_hash(hashlib.file_digest(file, "sha256").hexdigest(), head, name, path)
            file.seek(0)
            _check_npy_header(file, path.stat().st_size)
        return np.asarray(np.lib.format.open_memmap(path, mode="r"))
    except OSError as error:
        raise VerificationError(f"cannot be read ({error.strerror})", where=str(path)) from None
    except (ValueError, KeyError) as error:
        raise InputError(f"is not an array ({error})", where=str(path)) from None


def save(folder: Path, kind: str, noun: Any, **about: Any) -> dict[str, Any]:
    """Write a noun as an artefact; ``about`` is passed to :func:`write_artefact`.

    Extra files may be given as ``extra={name: bytes}``.
    """
    data, files = pack(noun)
    files |= about.pop("extra", {})
    files["content.json"] = canonical_json(data)
    return write_artefact(folder, kind, files, **about)


def load(folder: Path, kind: str, *, mapped: bool = False) -> tuple[Any, dict[str, Any]]:
    """Read a noun and its manifest; every file's hash is checked as it is read.

    With ``mapped``, larger arrays are mapped into memory and read as they are used.
    """
    head = read_manifest(folder, kind)
    data = read_file(folder, head, "content.json")

    def array(name: str) -> np.ndarray[Any, Any]:
        if mapped and _size(_known(folder, head, name)) > WORTH_MAPPING:
            return map_array(folder, head, name)
        return npy_array(read_file(folder, head, name), name)

    try:
        content = json.loads(data)
        return unpack(content, array), head
    except (KeyError, TypeError, ValueError, AttributeError, RecursionError) as error:
        raise InputError(
            f"damaged content ({type(error).__name__})", where=str(folder / "content.json")
        ) from None
