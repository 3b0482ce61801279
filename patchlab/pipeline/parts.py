"""Aligned pictures of one kind of object to their parts, beside principal components."""

from __future__ import annotations

from collections.abc import Callable
from pathlib import Path
from typing import Any

import numpy as np

from patchlab import images, learn, store
from patchlab.errors import InputError
from patchlab.progress import Progress, silent
from patchlab.types import F64, Parts

MOST = 2**27
"""Pixels of all pictures together, at most: they are held in memory in float64."""


def find_parts(
    pictures: images.Place,
    out: Path,
    *,
    samples: Any = "pixels",
    components: int | None = None,
    seed: int = 0,
    jobs: int = 1,
    force: bool = False,
    pages: Callable[[Parts, Parts], dict[str, bytes]] = lambda independent, principal: {},
    progress: Progress = silent,
) -> tuple[Parts, Parts]:
    """Learn independent and principal components of a folder of aligned pictures; save both.

    Parameters
    ----------
    pictures : folder or address of pictures of one size, the object in one place and one light
    out : folder of the artefact; may be ``RUN/parts``, for the page of that run
    samples, components, seed : of :func:`patchlab.learn.learn_parts`
    pages : independent and principal ones to further files, for people
    jobs, force, progress : as everywhere

    Returns
    -------
    independent, principal : Parts

    Raises
    ------
    InputError : pictures of several sizes, too few, or too large together.
    """
    intake = images.take_in(
        images.list_photos(pictures), keep_copies=True, jobs=jobs, progress=progress
    )
    stack = _stack(intake)
    progress("parts", 0, 2)
    independent = learn.learn_parts(
        stack, samples=samples, components=components, seed=seed, jobs=jobs
    )
    progress("parts", 1, 2)
    principal = learn.learn_parts(stack, samples=samples, components=len(independent), method="pca")
    progress("parts", 2, 2)
    about = {"samples": samples, "components": components}
    store.save(
        out,
        "parts",
        (independent, principal),
        settings=about,
        seed=seed,
        inputs=intake.inputs,
        force=force,
        extra={"codes.csv": _table(intake, independent), **pages(independent, principal)},
    )
    return independent, principal


def _stack(intake: images.Intake) -> F64:
    shapes = {record.shape for record in intake.frames}
    if len(shapes) > 1:
        told = ", ".join(f"{w} x {h}" for h, w in sorted(shapes))
        raise InputError(
            f"aligned pictures have one size, these have {told}",
            where=str(intake.root),
            remedy="cut them to the object first",
        )
    if len(intake.frames) * intake.largest > MOST:
        raise InputError(
            f"{len(intake.frames)} pictures of {intake.largest} pixels are too much at once",
            remedy=f"scale them down: {MOST:,} pixels in all",
        )
    light = intake.contract.light
    return np.stack([light(frame.pixels) for frame in images.iterate(intake)])


def _table(intake: images.Intake, found: Parts) -> bytes:
    """How much of each component every picture holds, as CSV."""
    names = ",".join(f"part_{j + 1}" for j in range(len(found)))
    lines = [f"picture,light,{names}"]
    for record, light, codes in zip(intake.frames, found.light, found.codes, strict=True):
        quoted = '"' + record.path.replace('"', '""') + '"'
        lines.append(",".join([quoted, *(f"{v:.9g}" for v in (light, *codes))]))
    return ("\n".join(lines) + "\n").encode()


def told(independent: Parts, principal: Parts) -> dict[str, Any]:
    """Both as plain data: what the command prints."""

    def one(found: Parts) -> dict[str, Any]:
        return {
            "locality": [float(f"{v:.4g}") for v in found.locality],
            "mean_locality": float(f"{found.locality.mean():.4g}"),
            "contribution": [float(f"{v:.4g}") for v in found.contribution],
            "kurtosis": [float(f"{v:.4g}") for v in found.kurtosis],
        }

    return {
        "pictures": len(independent.codes),
        "size": list(independent.mean.shape),
        "samples": independent.samples,
        "components": len(independent),
        "converged": independent.converged,
        "independent": one(independent),
        "principal": one(principal),
        "warnings": list(independent.warnings),
    }
