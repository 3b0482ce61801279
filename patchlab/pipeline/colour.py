"""What a run does otherwise when the pixels have colours.

The camera is surveyed on one plane, green; then the noise of every sample is measured through
the table that came of it. Learning is the same on longer rows. Components are told as a spatial
profile times a direction of colour.
"""

from __future__ import annotations

from collections.abc import Callable, Iterable, Iterator, Sequence
from dataclasses import replace

import numpy as np

from patchlab import camera, images, shapes
from patchlab.errors import UsageError
from patchlab.pipeline.measure import Extras
from patchlab.progress import Progress
from patchlab.settings import Settings
from patchlab.types import Dictionary, Frame, InputContract, KernelFits, Survey, TableKind

Frames = Callable[[], Iterable[Frame]]


def check(contract: InputContract, settings: Settings) -> None:
    """Refuse, before the work, what a bank of colour pixels cannot be.

    Raises
    ------
    UsageError : the WebAssembly loader, which takes one plane.
    """
    form = contract.format
    if form.planes > 1 and "wasm32" in settings.target.split(","):
        raise UsageError(
            "the loader of the WebAssembly module takes pictures of one plane",
            remedy="leave wasm32 out of --target, or add --planes luminance",
        )


def survey(
    frames: Frames,
    contract: InputContract,
    extras: Extras,
    *,
    kind: TableKind | None,
    mixed: bool,
    progress: Progress,
) -> Survey:
    """Survey a camera on its photographs, in green where they have colours.

    Parameters
    ----------
    frames : gives the photographs anew at each call
    contract : what they are
    extras : further frames that were given
    kind, mixed, progress : as :func:`patchlab.camera.survey`
    """
    form = contract.format
    mono = replace(contract, pixels=f"Mono{form.bits}") if form.planes > 1 else contract
    found = camera.survey(
        lambda: map(images.one_plane, frames()),
        mono,
        kind=kind,
        static=_scenes(extras.static_frames()),
        dark=_all(extras.dark_frames()),
        edge=None if (edge := extras.edge_frame()) is None else images.one_plane(edge),
        mixed=mixed,
        progress=progress,
    )
    return found if form.planes == 1 else _with_samples(found, contract, frames)


def _all(frames: Iterable[Frame] | None) -> Iterable[Frame] | None:
    return None if frames is None else map(images.one_plane, frames)


def _scenes(scenes: Iterable[Sequence[Frame]] | None) -> Iterator[Sequence[Frame]] | None:
    if scenes is None:
        return None
    return ([images.one_plane(frame) for frame in scene] for scene in scenes)


def _with_samples(found: Survey, contract: InputContract, frames: Frames) -> Survey:
    """The survey of one plane as that of the whole pixels."""
    notes: tuple[str, ...] = ("the camera was surveyed in green",)
    noise = np.empty(0)
    if found.noise.measurable:
        samples = range(contract.format.planes)
        each = ({s: images.one_plane(frame, s) for s in samples} for frame in frames())
        noise, note = camera.sample_noise(each, found.table, len(samples))
        notes = (*notes, note) if note else notes
    return replace(
        found,
        contract=contract,
        table=replace(found.table, contract=contract),
        sample_noise=noise,
        notes=(*found.notes, *notes),
    )


def fit(dictionary: Dictionary, colours: str, progress: Progress) -> tuple[KernelFits, ...]:
    """Fits of atoms and filters; of colour ones their profiles, each with its direction."""
    both = (("atoms", dictionary.atoms), ("filters", dictionary.filters))
    if dictionary.planes == 1:
        return tuple(shapes.fit_kernels(tiles, of, progress=progress) for of, tiles in both)  # type: ignore[arg-type]
    return tuple(
        shapes.fit_colour_kernels(tiles, of, colours, progress=progress)  # type: ignore[arg-type]
        for of, tiles in both
    )


def profiles(dictionary: Dictionary) -> Dictionary:
    """The dictionary with the spatial profile in the place of every colour component."""
    if dictionary.planes == 1:
        return dictionary
    pooled = shapes.separate(dictionary.pooled_atoms).profiles
    norms = np.sqrt((pooled**2).sum(axis=(1, 2), keepdims=True))
    return replace(
        dictionary,
        filters=shapes.separate(dictionary.filters).profiles,
        atoms=shapes.separate(dictionary.atoms).profiles,
        pooled_atoms=pooled / np.maximum(norms, 1e-300),
    )
