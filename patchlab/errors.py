"""Failures a person can act on: each says what, where, and what to do.

The exit code of the command line travels with the error, so no caller maps
exceptions to codes a second time.
"""

from __future__ import annotations


class PatchlabError(Exception):
    """Root of every failure patchlab raises on purpose.

    Parameters
    ----------
    what : str
        One clear sentence without a full stop: what went wrong.
    where : str, optional
        The file, frame, option or kernel it concerns.
    remedy : str, optional
        What the person can do about it.
    """

    exit_code = 1

    def __init__(self, what: str, *, where: str = "", remedy: str = "") -> None:
        super().__init__(what, where, remedy)
        self.what, self.where, self.remedy = what, where, remedy

    def __str__(self) -> str:
        """One sentence: "where: what; remedy"."""
        head = f"{self.where}: {self.what}" if self.where else self.what
        return f"{head}; {self.remedy}" if self.remedy else head


class UsageError(PatchlabError):
    """A wrong parameter or option: found before any picture is opened."""

    exit_code = 2


class InputError(PatchlabError):
    """The photographs, or a file given, cannot serve."""

    exit_code = 3


class QualityError(PatchlabError):
    """The work was done but stays below the quality asked for (``--strict``)."""

    exit_code = 4


class VerificationError(PatchlabError):
    """Two computations that must agree do not, or a stored file was changed."""

    exit_code = 5


class Interrupted(PatchlabError):  # noqa: N818 - a stop asked for is not an error
    """The person stopped the work; what was finished is kept."""

    exit_code = 130
