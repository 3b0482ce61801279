"""Small pieces of C text: literals that survive the round trip, arrays, templates.

Numbers never pass through the locale, and every float32 or float64 is written
with enough digits (9 or 17) to be read back bit for bit.
"""

from __future__ import annotations

import math
import re
import textwrap
from collections.abc import Iterable, Mapping
from importlib import resources
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.errors import UsageError
from patchlab.store import LICENCE

_IDENTIFIER = re.compile(r"[A-Za-z][A-Za-z0-9_]{0,62}")


def identifier(name: str, what: str) -> str:
    """A name that may stand in C text, or a refusal.

    >>> identifier("edges_8", "bank name")
    'edges_8'
    """
    if not isinstance(name, str) or not _IDENTIFIER.fullmatch(name):
        raise UsageError(
            f"the {what} {name!r} is not a C identifier",
            remedy="use letters, digits and _, a letter first, 63 at most",
        )
    return name


def float_literal(value: float) -> str:
    """A float32 as a C literal that reads back to the same bits.

    >>> float_literal(np.float32(0.1)), float_literal(3.0)
    ('0.100000001f', '3.0f')
    """
    return _with_point(format(float(np.float32(value)), ".9g")) + "f"


def double_literal(value: float) -> str:
    """A float64 as a C literal that reads back to the same bits."""
    return _with_point(format(float(value), ".17g"))


def _with_point(text: str) -> str:
    if not math.isfinite(float(text)):
        raise UsageError("a number that is not finite cannot be written as C")
    return text if "." in text or "e" in text else text + ".0"


def numbers(values: NDArray[Any], *, indent: int = 4) -> str:
    """The inside of an array initialiser: float32, float64 or unsigned codes, wrapped."""
    flat = np.ravel(values)
    if flat.dtype == np.float32:
        words = [float_literal(v) for v in flat]
    elif flat.dtype == np.float64:
        words = [double_literal(v) for v in flat]
    else:
        words = [str(int(v)) for v in flat]
    margin = " " * indent
    return textwrap.fill(
        ", ".join(words), 96, initial_indent=margin, subsequent_indent=margin,
        break_long_words=False, break_on_hyphens=False,
    )  # fmt: skip


def licence(prefix: str) -> str:
    """The licence notice as comment lines."""
    return "\n".join(prefix + line for line in textwrap.wrap(LICENCE, 84))


def template(name: str) -> str:
    """One of the text templates beside this module."""
    return resources.files(__package__).joinpath("templates", name).read_text("utf-8")


def fill(text: str, values: Mapping[str, object]) -> bytes:
    """Put values in the place of every @TOKEN@; an unknown token is an error."""

    def value(match: re.Match[str]) -> str:
        return str(values[match.group(1)])

    return re.sub(r"@([A-Za-z0-9_]+)@", value, text).encode("utf-8")


def lines(rows: Iterable[str], indent: int = 0) -> str:
    """Rows joined to indented lines."""
    return "\n".join(" " * indent + row if row else row for row in rows)
