"""The page of a run: one HTML file with everything inside, and its pictures beside it."""

from __future__ import annotations

import base64
import time
from collections.abc import Callable, Mapping
from pathlib import Path
from typing import Any

import jinja2
import numpy as np

from patchlab import store
from patchlab.images.planes import one_plane
from patchlab.pipeline import use
from patchlab.progress import Progress, silent
from patchlab.report import assess, camera, colour, mosaic, parts, plots, sure
from patchlab.types import Frame, Survey

SHOWN = 96
"""Most components drawn in one mosaic; the page says how many there are."""


def write(run: Path, progress: Progress = silent) -> float:
    """Write the page of a finished run to ``RUN/report``; gives the seconds it took.

    Where nothing but the survey stands, the page is the survey's.

    Raises
    ------
    InputError : the folder holds no finished run.
    """
    start = time.perf_counter()
    if not any((run / room).exists() for room in ("patches", "bank")):
        return write_survey(run, progress)
    content = use.open_run(run)
    makers = _pictures(content)
    drawn = _drawn(makers, progress)
    page = _render(
        "page.html",
        drawn,
        c=content,
        shown=SHOWN,
        how_sure=sure.in_words(content.dictionary),
        about_parts=parts.in_words(*content.parts) if content.parts else "",
        colours=colour.in_words(content.atom_fits),
    )
    _keep(run, drawn, page, {"bank": content.bank_head["id"]})
    progress("page", 1, 1)
    return round(time.perf_counter() - start, 3)


def write_survey(run: Path, progress: Progress = silent) -> float:
    """Write the page of a survey alone to ``RUN/report``; gives the seconds it took.

    Raises
    ------
    InputError : the folder holds no survey.
    """
    start = time.perf_counter()
    content = use.open_survey(run)
    drawn = _drawn(_of_camera(content.survey, content.frame), progress)
    _keep(run, drawn, _render("survey.html", drawn, c=content), {"survey": content.head["id"]})
    progress("page", 1, 1)
    return round(time.perf_counter() - start, 3)


def _drawn(makers: Mapping[str, Callable[[], bytes]], progress: Progress) -> dict[str, bytes]:
    pictures = {}
    for done, (name, make) in enumerate(makers.items(), 1):
        pictures[name] = make()
        progress("page", done, len(makers) + 1)
    return pictures


def _keep(run: Path, drawn: Mapping[str, bytes], page: str, parents: Mapping[str, str]) -> None:
    files = {f"{name}.png": data for name, data in drawn.items()}
    files["index.html"] = page.encode()
    store.write_artefact(run / "report", "report", files, parents=parents, force=True)


def _of_camera(survey: Survey, frame: Frame | None) -> dict[str, Callable[[], bytes]]:
    """The pictures of the section on the camera."""
    makers: dict[str, Callable[[], bytes]] = {"table": lambda: plots.table_curve(survey)}
    if survey.noise.measurable:
        makers["noise"] = lambda: camera.noise_curve(survey)
        makers["autocovariance"] = lambda: plots.autocovariance(survey)
    if survey.spectrum_frequency.size:
        makers["spectrum"] = lambda: camera.spectrum(survey)
    if survey.edge_widths_px.size or survey.slanted_edge is not None:
        makers["spread"] = lambda: camera.edge_spread(survey)
    crops = None if frame is None else camera.mark_crops(survey, one_plane(frame))
    if crops is not None:
        makers["marks"] = lambda: crops
    return makers


def _pictures(c: use.RunContent) -> Mapping[str, Callable[[], bytes]]:
    """Every picture of the page by its name, made when called."""
    makers: dict[str, Callable[[], bytes]] = {
        **_of_camera(c.survey, c.frame),
        "whitening": lambda: plots.whitening_spectrum(c.dictionary.whitening),
        "convergence": lambda: plots.convergence(c.dictionary),
        "atoms": lambda: _beside_fits(c.dictionary.atoms, c.atom_fits),
        "filters": lambda: _beside_fits(c.dictionary.filters, c.filter_fits),
        "principal": lambda: _baseline(c),
        "quality": lambda: plots.fit_quality(c.atom_fits, c.filter_fits),
        "directions": lambda: plots.orientation_and_frequency(c.atom_fits),
        "sizes": lambda: plots.sizes(c.atom_fits, c.bank),
        "bank": lambda: mosaic.bank_sheet(c.bank, taps=colour.bank_taps(c.bank)),
    }
    if c.atom_fits.colours:
        makers["colours"] = lambda: colour.directions(c.atom_fits, c.filter_fits)
    if sure.measured(c.dictionary):
        makers["sure"] = lambda: sure.how_sure(c.dictionary)
    if c.flagged:
        makers["flagged"] = lambda: _flagged(c)
    choice = c.dictionary.choice
    if choice is not None:
        makers["choice"] = lambda: sure.component_choice(choice)
    if c.bank.coverage is not None:
        makers["coverage"] = lambda: plots.coverage_curve(c.bank)
    if c.bank.thresholds is not None:
        makers["thresholds"] = lambda: plots.thresholds(c.bank)
    if c.assessed is not None:
        drawn = c.assessed
        makers["assess_light"] = lambda: assess.PLOTS["light"][0](drawn)
        makers["assess_location"] = lambda: assess.PLOTS["location"][0](drawn)
    if c.parts is not None:
        pair = c.parts
        makers["parts"] = lambda: parts.side_by_side(*pair)
    if c.frame is not None and c.found is not None:
        frame, found, count = c.frame, c.found, c.orientations
        makers["edges"] = lambda: mosaic.before_and_after(frame, found, count)
        makers["key"] = lambda: plots.orientation_key(count)
    return makers


def _beside_fits(kernels: Any, fits: Any) -> bytes:
    from patchlab.families import render

    shown = kernels[:SHOWN]
    drawn = np.stack([render(f.family, f.parameters, fits.size) for f in fits.fits[:SHOWN]])
    if fits.colours:
        drawn = colour.drawn_fits(drawn, fits)
    return mosaic.mosaic(
        [colour.in_rgb(tiles, fits.colours) for tiles in (shown, drawn)],
        [
            f"{f.index + 1}  {f.family}  {f.r2:.2f}".replace("centre_surround", "c-s")
            for f in fits.fits[:SHOWN]
        ],
        verdicts=[f.verdict for f in fits.fits[:SHOWN]],
        zoom=max(1, 48 // fits.size),
        across=8,
    )


def _flagged(c: use.RunContent) -> bytes:
    """Atom and filter of each component that describes a mark."""
    shown = [n - 1 for n, *_ in c.flagged][:SHOWN]
    return mosaic.mosaic(
        [c.dictionary.atoms[shown], c.dictionary.filters[shown]],
        [f"{n}  {name.replace('_', ' ')}"[:17] for n, name, *_ in c.flagged[:SHOWN]],
        zoom=max(1, 48 // c.dictionary.atoms.shape[1]),
        across=8,
    )


def _baseline(c: use.RunContent) -> bytes:
    atoms = colour.in_rgb(c.baseline.atoms[:32], c.atom_fits.colours)
    labels = [str(i + 1) for i in range(len(atoms))]
    return mosaic.mosaic([atoms], labels, across=16, zoom=max(1, 48 // c.baseline.size))


def _render(template: str, pictures: Mapping[str, bytes], **content: Any) -> str:
    environment = jinja2.Environment(
        loader=jinja2.PackageLoader("patchlab.report", "."),
        autoescape=True,
        undefined=jinja2.StrictUndefined,
        trim_blocks=True,
        lstrip_blocks=True,
    )
    embedded = {
        name: "data:image/png;base64," + base64.b64encode(data).decode()
        for name, data in pictures.items()
    }
    return environment.get_template(template).render(pictures=embedded, **content)
