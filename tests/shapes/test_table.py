"""Fits as a table and as data: every number comes back bit for bit."""

import csv
import io
import json
import math

import numpy as np
import pytest

from patchlab import store
from patchlab.families import PARAMETERS
from patchlab.shapes.table import COLUMNS, fits_csv, fits_json
from patchlab.types import KernelFit, KernelFits


@pytest.fixture
def fits():
    rng = np.random.default_rng(5)

    def one(index, family, octaves):
        names = PARAMETERS[family]
        values = dict(zip(names, map(float, rng.standard_normal(len(names))), strict=True))
        errors = dict(zip(names, map(float, rng.random(len(names)) / 3), strict=True))
        return KernelFit(
            index, family, values, errors, float(rng.random()), -12.1, "poor", octaves, None
        )

    wave, ring = one(0, "gabor", 0.1 + 0.2), one(1, "centre_surround", None)
    undetermined = {**ring.errors, "ratio": math.inf}
    ring = KernelFit(**{**vars(ring), "errors": undetermined})
    return KernelFits("atoms", 12, (wave, ring), 57.25)


def test_the_table_comes_back_bit_for_bit(fits):
    data = fits_csv(fits)
    rows = list(csv.DictReader(io.StringIO(data.decode())))
    assert tuple(rows[0]) == COLUMNS
    assert b"\r" not in data
    for fit, row in zip(fits.fits, rows, strict=True):
        assert int(row["index"]) == fit.index
        assert row["of"] == "atoms"
        assert row["family"] == fit.family
        assert float(row["r2"]) == fit.r2
        for name, value in fit.parameters.items():
            assert float(row[name]) == value
            assert float(row[f"{name}_error"]) == fit.errors[name]
    assert float(rows[0]["bandwidth_octaves"]) == 0.1 + 0.2
    assert rows[1]["bandwidth_octaves"] == ""
    assert rows[1]["frequency_cpp"] == ""
    assert rows[1]["ratio_error"] == "inf"


def test_the_data_is_strict_json_and_comes_back_bit_for_bit(fits):
    data = json.loads(json.dumps(fits_json(fits), allow_nan=False))
    assert data["size_px"] == 12
    assert data["effective_samples"] == 57.25
    assert data["poor"] == 2
    assert data["median_r2"] == fits.median_r2
    for fit, entry in zip(fits.fits, data["fits"], strict=True):
        assert entry["parameters"] == fit.parameters
        assert entry["r2"] == fit.r2
    assert data["fits"][0]["errors"] == fits.fits[0].errors
    assert data["fits"][1]["errors"]["ratio"] is None
    assert data["fits"][1]["bandwidth_octaves"] is None


def test_no_fits_give_a_table_of_names_only():
    none = KernelFits("filters", 8, (), 64.0)
    assert fits_csv(none).decode() == ",".join(COLUMNS) + "\n"
    assert fits_json(none)["median_r2"] is None


def test_fits_are_kept_by_the_store(fits, tmp_path):
    extra = {"fits.csv": fits_csv(fits), "fits.json": store.canonical_json(fits_json(fits))}
    store.save(tmp_path / "fits", "fits", fits, extra=extra)
    again, _ = store.load(tmp_path / "fits", "fits")
    assert fits_csv(again) == extra["fits.csv"]
