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
from patchlab.pipeline import use
from patchlab.progress import Progress, silent
from patchlab.report import assess, camera, mosaic, plots, sure

SHOWN = 96
"""Most components drawn in one mosaic; the page says how many there are."""


def write(run: Path, progress: Progress = silent) -> float:
    """Write the page of a finished run to ``RUN/report``; gives the seconds it took.

    Raises
    ------
    InputError : the folder holds no finished run.
    """
    start = time.perf_counter()
    content = use.open_run(run)
    makers = _pictures(content)
    pictures = {}
    for done, (name, make) in enumerate(makers.items(), 1):
        pictures[name] = make()
        progress("page", done, len(makers) + 1)
    page = _render(content, pictures)
    files = {f"{name}.png": data for name, data in pictures.items()}
    files["index.html"] = page.encode()
    parents = {"bank": content.bank_head["id"]}
    store.write_artefact(run / "report", "report", files, parents=parents, force=True)
    progress("page", 1, 1)
    return round(time.perf_counter() - start, 3)


def _pictures(c: use.RunContent) -> Mapping[str, Callable[[], bytes]]:
    """Every picture of the page by its name, made when called."""
    makers: dict[str, Callable[[], bytes]] = {
        "table": lambda: plots.table_curve(c.survey),
        "whitening": lambda: plots.whitening_spectrum(c.dictionary.whitening),
        "convergence": lambda: plots.convergence(c.dictionary),
        "atoms": lambda: _beside_fits(c.dictionary.atoms, c.atom_fits),
        "filters": lambda: _beside_fits(c.dictionary.filters, c.filter_fits),
        "principal": lambda: _baseline(c),
        "quality": lambda: plots.fit_quality(c.atom_fits, c.filter_fits),
        "directions": lambda: plots.orientation_and_frequency(c.atom_fits),
        "sizes": lambda: plots.sizes(c.atom_fits, c.bank),
        "bank": lambda: mosaic.bank_sheet(c.bank),
    }
    if sure.measured(c.dictionary):
        makers["sure"] = lambda: sure.how_sure(c.dictionary)
    if c.flagged:
        makers["flagged"] = lambda: _flagged(c)
    choice = c.dictionary.choice
    if choice is not None:
        makers["choice"] = lambda: sure.component_choice(choice)
    if c.survey.noise.measurable:
        makers["noise"] = lambda: camera.noise_curve(c.survey)
        makers["autocovariance"] = lambda: plots.autocovariance(c.survey)
    if c.survey.spectrum_frequency.size:
        makers["spectrum"] = lambda: camera.spectrum(c.survey)
    if c.survey.edge_widths_px.size or c.survey.slanted_edge is not None:
        makers["spread"] = lambda: camera.edge_spread(c.survey)
    if c.frame is not None:
        crops = camera.mark_crops(c.survey, c.frame)
        if crops is not None:
            makers["marks"] = lambda: crops
    if c.bank.coverage is not None:
        makers["coverage"] = lambda: plots.coverage_curve(c.bank)
    if c.bank.thresholds is not None:
        makers["thresholds"] = lambda: plots.thresholds(c.bank)
    if c.assessed is not None:
        drawn = c.assessed
        makers["assess_light"] = lambda: assess.PLOTS["light"][0](drawn)
        makers["assess_location"] = lambda: assess.PLOTS["location"][0](drawn)
    if c.frame is not None and c.found is not None:
        frame, found, count = c.frame, c.found, c.orientations
        makers["edges"] = lambda: mosaic.before_and_after(frame, found, count)
        makers["key"] = lambda: plots.orientation_key(count)
    return makers


def _beside_fits(kernels: Any, fits: Any) -> bytes:
    from patchlab.families import render

    shown = kernels[:SHOWN]
    drawn = np.stack([render(f.family, f.parameters, fits.size) for f in fits.fits[:SHOWN]])
    return mosaic.mosaic(
        [shown, drawn],
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
    atoms = c.baseline.atoms[:32]
    labels = [str(i + 1) for i in range(len(atoms))]
    return mosaic.mosaic([atoms], labels, across=16, zoom=max(1, 48 // c.baseline.size))


def _render(c: use.RunContent, pictures: Mapping[str, bytes]) -> str:
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
    return environment.get_template("page.html").render(
        c=c, pictures=embedded, shown=SHOWN, how_sure=sure.in_words(c.dictionary)
    )
