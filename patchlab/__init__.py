"""patchlab: learn a camera's own edge and feature kernels, export them compiled.

    import patchlab

    bank = patchlab.load_bank("first-bank", library=True)
    planes = bank.responses(picture)     # float32 (kernels, height, width)
    found = bank.edges(picture, rate=1)  # found.edges, found.strength, found.orientation

The names below come from their modules when they are first asked for, so the import is quick.
"""

from __future__ import annotations

from importlib import import_module
from typing import Any

__version__ = "0.1.0"

_HOME = {
    # a bank that stands in a folder
    "load_bank": "patchlab.pipeline.loaded",
    "LoadedBank": "patchlab.pipeline.loaded",
    # photographs to a bank, step by step
    "list_photos": "patchlab.images",
    "take_in": "patchlab.images",
    "survey": "patchlab.camera",
    "sample": "patchlab.images",
    "whitening": "patchlab.learn",
    "learn_ica": "patchlab.learn",
    "learn_sparse": "patchlab.learn",
    "Whitener": "patchlab.learn.estimators",
    "ICA": "patchlab.learn.estimators",
    "SparseCoder": "patchlab.learn.estimators",
    "fit_kernels": "patchlab.shapes",
    "choose_bank": "patchlab.bank",
    "bank_from_taps": "patchlab.bank",
    # a bank at work
    "make_plan": "patchlab.bank",
    "responses": "patchlab.bank",
    "exact_responses": "patchlab.bank",
    "detect": "patchlab.edges",
    # nouns and failures
    "Bank": "patchlab.types",
    "Dictionary": "patchlab.types",
    "EdgeMap": "patchlab.types",
    "Frame": "patchlab.types",
    "PatchSet": "patchlab.types",
    "PatchlabError": "patchlab.errors",
}

__all__ = sorted(_HOME)


def __getattr__(name: str) -> Any:
    """A public name, from its module (PEP 562)."""
    if name not in _HOME:
        raise AttributeError(f"module 'patchlab' has no attribute {name!r}")
    return getattr(import_module(_HOME[name]), name)


def __dir__() -> list[str]:
    return sorted({*globals(), *_HOME})
