"""Photographs that are not in a folder: any address that fsspec reads (http, s3, ...).

An :class:`Address` has what reading needs of a path, so a folder and an address are read by
the same code. fsspec comes with the extra ``cluster``; some kinds of address take a package of
their own besides (s3fs for ``s3://``).
"""

from __future__ import annotations

from dataclasses import dataclass
from pathlib import Path
from typing import Any, Protocol
from urllib.parse import quote, unquote

from patchlab.errors import InputError, UsageError

MARK = "://"


class Place(Protocol):
    """What reading needs of a path: ``pathlib.Path`` and :class:`Address` have it."""

    @property
    def name(self) -> str:
        """The last part."""

    def __truediv__(self, name: str, /) -> Place:
        """What lies below."""

    def with_name(self, name: str, /) -> Place:
        """What lies beside."""

    def exists(self) -> bool:
        """Whether there is anything."""

    def is_dir(self) -> bool:
        """Whether it is a folder."""

    def is_file(self) -> bool:
        """Whether it is a file."""

    def read_bytes(self) -> bytes:
        """The file's content; raises OSError."""


def place(text: str | Place) -> Place:
    """A path of this machine, or an address where the text holds ``://``.

    Examples
    --------
    >>> place("frames") / "a.png" == Path("frames/a.png")
    True
    >>> str(place("s3://bucket/frames/") / "a.png")
    's3://bucket/frames/a.png'
    """
    if not isinstance(text, str):
        return text
    return Address(text.rstrip("/")) if MARK in text else Path(text)


@dataclass(frozen=True)
class Address:
    """A folder or file behind an address; it travels to other processes as its text."""

    url: str

    def __str__(self) -> str:
        return self.url

    @property
    def name(self) -> str:
        """The last part."""
        last = self.url.rsplit("/", 1)[-1]
        return unquote(last) if self._quoted else last

    @property
    def _quoted(self) -> bool:
        """Names on the web are written with percent signs; frames are keyed by what they mean."""
        return self.url.startswith(("http://", "https://"))

    def __truediv__(self, name: str) -> Address:
        return Address(f"{self.url}/{quote(name) if self._quoted else name}")

    def with_name(self, name: str) -> Address:
        """What lies beside."""
        return Address(self.url.rsplit("/", 1)[0]) / name

    def exists(self) -> bool:
        """Whether there is anything; a kind of address that lists nothing has only files."""
        return self.is_file() or bool(self.listed())

    def is_dir(self) -> bool:
        """Whether something lies below."""
        return not self.is_file()

    def is_file(self) -> bool:
        """Whether it is a file by the server's word."""
        system, path = self._system()
        return bool(_asked(self.url, lambda: system.isfile(path) and not system.isdir(path)))

    def read_bytes(self) -> bytes:
        """The file's content, whole.

        Raises
        ------
        OSError : it is not there, or the server refuses.
        """
        system, path = self._system()
        try:
            return bytes(system.cat_file(path))
        except OSError:
            raise
        except Exception as error:  # every kind of server has its own
            raise OSError(0, f"{type(error).__name__}: {error}") from None

    def listed(self) -> tuple[str, ...]:
        """Relative paths of everything below, sorted.

        Raises
        ------
        InputError : the server cannot list it.
        """
        system, path = self._system()
        found = _asked(self.url, lambda: system.find(path + "/"))
        root = path.rstrip("/") + "/"
        below = (name[name.index(root) + len(root) :] for name in found if root in name)
        return tuple(sorted({unquote(n) if self._quoted else n for n in below if n}))

    def _system(self) -> tuple[Any, str]:
        try:
            from fsspec.core import url_to_fs
        except ImportError:
            raise UsageError(
                "addresses need fsspec",
                where=self.url,
                remedy="pip install 'patchlab-bank[cluster]'",
            ) from None
        try:
            system, path = url_to_fs(self.url)
        except (ImportError, ValueError) as error:
            raise UsageError(str(error), where=self.url) from None
        return system, str(path)


def _asked(url: str, ask: Any) -> Any:
    try:
        return ask()
    except FileNotFoundError:
        return ()
    except Exception as error:
        raise InputError(f"cannot be listed ({type(error).__name__}: {error})", where=url) from None
