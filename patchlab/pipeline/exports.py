"""Banks made after a run, or without one: a bank from standing fits, or from one's own kernels."""

from __future__ import annotations

import io
from pathlib import Path
from typing import Any

import numpy as np

from patchlab import bank as banks
from patchlab import store
from patchlab.conventions import pixel_format
from patchlab.errors import InputError, UsageError
from patchlab.export import parse_targets
from patchlab.pipeline import colour, tell
from patchlab.pipeline.bundle import add_libraries, write_bundle
from patchlab.pipeline.calibrate import chosen_costs
from patchlab.pipeline.desk import Desk, bank_name, may_write
from patchlab.pipeline.run import choose, standing_dictionary
from patchlab.settings import Settings, option_name


def export_run(desk: Desk, out: Path | None, *, force: bool) -> dict[str, Any]:
    """Choose and export a bank from a run's fits; to a bank's folder add the targets asked for."""
    if (desk.out / "bank.json").is_file():
        return tell.bank(add_libraries(desk.out, out or desk.out, desk, force=force))
    for name, value in desk.settings.plain("photos").items():
        if value != getattr(Settings(), name):
            raise UsageError(
                f"{option_name(name)} has no effect here: the run's own survey says it",
                remedy="run the survey again with it, or export --taps",
            )
    folder = out or desk.out / "bank"
    parse_targets(desk.settings.target)
    chosen_costs(desk.settings)
    may_write(folder, force)
    dictionary, _ = standing_dictionary(desk)
    fits, fits_head = store.load(desk.out / "fits", "fits")
    survey, survey_head = store.load(desk.out / "survey", "survey")
    colour.check(survey.contract, desk.settings)
    home = folder if out else desk.out
    patches, _ = store.load(desk.out / "patches", "patches")
    name = bank_name(home, desk.settings)
    bank = choose(dictionary, fits, survey, patches, name, desk)
    parents = {"fits": fits_head["id"], "survey": survey_head["id"]}
    inputs = survey_head["inputs"]
    return tell.bank(write_bundle(folder, bank, desk, parents=parents, inputs=inputs))


def export_taps(path: Path, desk: Desk, *, force: bool) -> dict[str, Any]:
    """Make a bank from kernels in a ``.npy`` file."""
    may_write(desk.out, force)
    s = desk.settings
    parse_targets(s.target)
    chosen_costs(s)
    try:
        data = path.read_bytes()
        taps = np.load(io.BytesIO(data), allow_pickle=False)
    except OSError as error:
        raise InputError(f"cannot be read: {error.strerror}", where=str(path)) from None
    except (ValueError, EOFError) as error:
        raise InputError(f"is no .npy file of numbers: {error}", where=str(path)) from None
    _check_levels(s)
    _check_reach(taps, path)
    bank = banks.bank_from_taps(
        taps,
        pixels=s.pixels or "Mono8",
        name=bank_name(desk.out, s),
        border=s.border,
        black=s.black or 0.0,
        white=s.white,
        where=str(path),
    )
    colour.check(bank.contract, s)
    inputs = {path.name: store.sha256(data)}
    return tell.bank(write_bundle(desk.out, bank, desk, parents={}, inputs=inputs))


def _check_levels(settings: Settings) -> None:
    """Refuse black and white levels that the pixel format does not have."""
    form = pixel_format(settings.pixels or "Mono8")
    for name, level in (("--white", settings.white), ("--black", settings.black)):
        if form.integer and level is not None and not 0 <= level <= form.full_scale:
            raise UsageError(
                f"{name} {level:g} is no code of {form.name}",
                remedy=f"its codes run from 0 to {form.full_scale}",
            )


def _check_reach(taps: Any, path: Path) -> None:
    """Refuse kernels whose sums float32 cannot hold."""
    if not (isinstance(taps, np.ndarray) and taps.size and np.issubdtype(taps.dtype, np.number)):
        return  # told by bank_from_taps
    size = np.abs(np.asarray(taps, dtype=np.complex128))
    if not np.isfinite(size).all():
        return
    total = float(size.sum()) if size.ndim < 3 else float(size.sum(axis=(1, 2)).max())
    if total > 1e30 or 0 < float(size.max()) < 1e-25:
        raise InputError(
            f"taps that sum to {total:.3g} leave float32 no room for responses",
            where=str(path),
            remedy="scale the kernels, to a norm near 1 for example",
        )
