"""What stands in a folder of photographs: one walk through it, links included.

A link may lead to another place of the folder; one that leads out of it is passed over.
"""

from __future__ import annotations

import os
import stat
from dataclasses import dataclass
from pathlib import Path

from patchlab.errors import InputError
from patchlab.images.address import Address, Place, place
from patchlab.images.decode import SUFFIXES
from patchlab.types import Quarantined


@dataclass(frozen=True)
class Listing:
    """What stands in a folder.

    Parameters
    ----------
    root : the folder
    files : pictures by their names' endings: sorted relative paths, forward slashes
    hidden : dot files and dot folders passed over
    other : files of other kinds passed over
    unreadable : folders that cannot be listed, names that are not valid text
    outside : links that lead out of the folder, passed over
    """

    root: Place
    files: tuple[str, ...]
    hidden: int = 0
    other: int = 0
    unreadable: tuple[Quarantined, ...] = ()
    outside: int = 0


def list_photos(folder: str | Place) -> Listing:
    """List a folder's pictures, its subfolders included; or one picture alone.

    Parameters
    ----------
    folder : path of a folder, or of one file; or an address with ``://`` that fsspec reads

    Returns
    -------
    Listing : links within the folder are followed, each folder is visited once.

    Raises
    ------
    InputError : there is nothing at that path.
    """
    root = place(folder)
    if isinstance(root, Address):
        return _list_address(root)
    root = Path(str(root))
    if not root.exists():
        raise InputError("there is no such folder or file", where=str(folder))
    if root.is_file():
        return Listing(root.parent, (root.name,))
    walk = _Walk(root.resolve())
    walk.enter(root, "")
    return Listing(
        root,
        tuple(sorted(walk.files)),
        walk.hidden,
        walk.other,
        tuple(sorted(walk.unreadable, key=lambda q: q.path)),
        walk.outside,
    )


def _list_address(root: Address) -> Listing:
    """The same behind an address."""
    found = root.listed()
    if not found:
        if not root.is_file():
            raise InputError("there is no such folder or file", where=str(root))
        return Listing(Address(root.url.rsplit("/", 1)[0]), (root.name,))
    open_ones = [f for f in found if not any(p.startswith(".") for p in f.split("/"))]
    files = [f for f in open_ones if "." + f.rsplit(".", 1)[-1].lower() in SUFFIXES]
    return Listing(root, tuple(files), len(found) - len(open_ones), len(open_ones) - len(files))


class _Walk:
    """One walk through a tree, and what it has met so far."""

    def __init__(self, root: Path) -> None:
        self.root = root
        self.files: list[str] = []
        self.unreadable: list[Quarantined] = []
        self.hidden = self.other = self.outside = 0
        self._visited: set[tuple[int, int]] = set()

    def enter(self, folder: Path, prefix: str) -> None:
        """Take in one folder and everything below it, in order of name."""
        try:
            about = folder.stat()
            if (about.st_dev, about.st_ino) in self._visited:
                return
            self._visited.add((about.st_dev, about.st_ino))
            names = sorted(os.listdir(folder))
        except OSError as error:
            self._lost(prefix or ".", f"the folder cannot be listed ({error.strerror})")
            return
        for name in names:
            self._meet(folder / name, prefix + name)

    def _meet(self, path: Path, relative: str) -> None:
        if path.name.startswith("."):
            self.hidden += 1
        elif path.is_symlink() and not self._within(path):
            self.outside += 1
        elif not _is_text(relative):
            self._lost(relative, "the name is not valid text")
        elif path.is_dir():
            self.enter(path, relative + "/")
        elif path.suffix.lower() in SUFFIXES and not _special(path):
            self.files.append(relative)
        else:
            self.other += 1

    def _within(self, link: Path) -> bool:
        """Whether a link leads to a place in the folder."""
        try:
            return link.resolve().is_relative_to(self.root)
        except (OSError, RuntimeError):  # a link to itself leads nowhere: told when it is read
            return True

    def _lost(self, relative: str, reason: str) -> None:
        readable = relative.encode("utf-8", "backslashreplace").decode()
        self.unreadable.append(Quarantined(readable, reason))


def _is_text(name: str) -> bool:
    try:
        name.encode()
    except UnicodeEncodeError:  # bytes that are not UTF-8 come in as lone surrogates
        return False
    return True


def _special(path: Path) -> bool:
    """True for pipes, sockets and devices: opening one could wait forever."""
    try:
        return not stat.S_ISREG(path.stat().st_mode)
    except OSError:  # a broken link is listed: it will be told with its reason when read
        return False
