"""Parts of objects beside principal components: one picture, one small page."""

from __future__ import annotations

import base64

import jinja2
import numpy as np

from patchlab.report.mosaic import mosaic
from patchlab.types import Parts

SHOWN = 48
"""Most pairs drawn."""


def side_by_side(independent: Parts, principal: Parts) -> bytes:
    """Each pair: a principal component, an independent one, and how local either is."""
    shown = min(len(independent), SHOWN)
    w = independent.mean.shape[1]
    zoom = max(1, min(4, 190 // w))
    labels = [
        f"{i + 1}  local {principal.locality[i]:.2f} | {independent.locality[i]:.2f}"
        for i in range(shown)
    ]
    pictures = [principal.images[:shown], independent.images[:shown]]
    return mosaic(pictures, labels, across=max(1, 1100 // (2 * w * zoom + 20)), zoom=zoom)


def in_words(independent: Parts, principal: Parts) -> str:
    """What the picture says, in a few sentences."""
    n, (h, w) = len(independent.codes), independent.mean.shape
    side = "every pixel a sample" if independent.samples == "pixels" else "every picture a sample"
    return (
        f"{n} aligned pictures of {w} x {h} pixels, {len(independent)} components, {side}. "
        f"Independent components have a mean locality of {independent.locality.mean():.2f}, "
        f"principal components of {principal.locality.mean():.2f} "
        "(1: a single pixel; 0: spread evenly over the picture)."
    )


def parts_pages(independent: Parts, principal: Parts) -> dict[str, bytes]:
    """The files for people: ``parts.png`` and a page, ``index.html``."""
    sheet = side_by_side(independent, principal)
    examples = mosaic([independent.mean[None] - np.median(independent.mean)], ["mean picture"])
    environment = jinja2.Environment(
        loader=jinja2.PackageLoader("patchlab.report", "."),
        autoescape=True,
        undefined=jinja2.StrictUndefined,
    )
    page = environment.get_template("parts.html").render(
        p=independent,
        q=principal,
        words=in_words(independent, principal),
        sheet=_data(sheet),
        mean=_data(examples),
    )
    return {"parts.png": sheet, "index.html": page.encode()}


def _data(png: bytes) -> str:
    return "data:image/png;base64," + base64.b64encode(png).decode()
