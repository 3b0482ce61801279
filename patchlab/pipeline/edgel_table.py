"""All edgels of a job in one table, CSV or parquet, a picture at a time.

Both are made from the pictures' own CSV files, so that what an interrupted job has left stands
in them too and memory does not grow with the number of pictures.
"""

from __future__ import annotations

import csv
import io
import os
from collections.abc import Iterable, Iterator
from pathlib import Path
from typing import Any, Literal

from patchlab import edges
from patchlab.errors import UsageError

TableFormat = Literal["csv", "parquet"]
ROW_GROUP = 65_536
"""Edgels that are gathered before a group of rows is written."""
_NAMES = ("kind",)
_WHOLE = ("scale",)

Part = tuple[str, Path]
"""A picture's name, and its own CSV file."""


def table_name(kind: TableFormat) -> str:
    """The table's file name."""
    return f"edgels.{kind}"


def require_format(kind: TableFormat) -> None:
    """Refuse parquet, before any work, where its package is missing.

    Raises
    ------
    UsageError : pyarrow is not installed.
    """
    if kind == "parquet":
        _pyarrow()


def _pyarrow() -> tuple[Any, Any]:
    try:
        import pyarrow
        from pyarrow import parquet
    except ImportError:
        raise UsageError(
            "parquet tables need the extra [parquet]",
            remedy='install it: pip install "patchlab-bank[parquet]", or take --table csv',
        ) from None
    return pyarrow, parquet


def write_table(out: Path, kind: TableFormat, parts: Iterable[Part]) -> None:
    """Write ``edgels.csv`` or ``edgels.parquet`` whole: a draft first, then renamed.

    Parameters
    ----------
    out : the job's folder
    kind : csv or parquet
    parts : pictures in order
    """
    name = table_name(kind)
    draft = out / f".{name}.part"
    if kind == "csv":
        with draft.open("w", encoding="utf-8", newline="\n") as table:
            table.writelines(_text(parts))
    else:
        _write_parquet(draft, parts)
    os.replace(draft, out / name)


def _text(parts: Iterable[Part]) -> Iterator[str]:
    yield ",".join(("picture", *edges.CSV_COLUMNS)) + "\n"
    for name, path in parts:
        cell = io.StringIO()
        csv.writer(cell, lineterminator="").writerow([name])
        own = path.read_text(encoding="utf-8")
        yield "".join(f"{cell.getvalue()},{row}\n" for row in own.splitlines()[1:])


def _write_parquet(path: Path, parts: Iterable[Part]) -> None:
    pyarrow, parquet = _pyarrow()
    word = pyarrow.dictionary(pyarrow.int32(), pyarrow.string())
    kinds = dict.fromkeys(("picture", *_NAMES), word) | {n: pyarrow.uint8() for n in _WHOLE}
    columns = ("picture", *edges.CSV_COLUMNS)
    schema = pyarrow.schema([(name, kinds.get(name, pyarrow.float32())) for name in columns])

    def group(rows: list[list[Any]]) -> Any:
        arrays = zip(*rows, strict=True) if rows else ([] for _ in columns)
        made = [pyarrow.array(list(a), f.type) for a, f in zip(arrays, schema, strict=True)]
        return pyarrow.Table.from_arrays(made, schema=schema)

    with parquet.ParquetWriter(path, schema) as writer:
        rows: list[list[Any]] = []
        for name, own in parts:
            with own.open(encoding="utf-8", newline="") as text:
                reader = csv.reader(text)
                next(reader)
                rows += [[name, *map(_value, edges.CSV_COLUMNS, row)] for row in reader]
            while len(rows) >= ROW_GROUP:
                writer.write_table(group(rows[:ROW_GROUP]))
                rows = rows[ROW_GROUP:]
        writer.write_table(group(rows))


def _value(column: str, text: str) -> Any:
    if column in _NAMES:
        return text
    return int(text) if column in _WHOLE else float(text)
