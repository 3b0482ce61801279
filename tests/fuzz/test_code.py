"""Random sizes, strides and pictures through the generated C, under sanitizers.

PATCHLAB_FUZZ=20000 python -m pytest tests/fuzz runs longer, from another seed each time.
"""

from __future__ import annotations

import os
import secrets
import subprocess
from dataclasses import replace
from pathlib import Path

import pytest

from patchlab import export
from patchlab.bank.plan import make_plan
from patchlab.export import build
from patchlab.export.c_text import fill
from patchlab.pipeline.edgel_rules import edgel_rules
from tests.bank.banks import random_bank
from tests.bank.test_halved import smooth
from tests.bank.test_separable import round_gabors
from tests.export.folders import BANKS

DRIVER = Path(__file__).with_name("bank_fuzz.c.in").read_text()
EDGELS = Path(__file__).with_name("edgels_fuzz.c.in").read_text()
TRY_EDGELS = """\
    edgels(plain, flip ? padded + (ptrdiff_t)(h - 1) * row : padded,
        flip ? -row * bytes : row * bytes, w, h);
    edgel_nonsense(plain);
"""
LONG = os.environ.get("PATCHLAB_FUZZ")


PLANS = {
    "halved": (smooth(25, 2.6, 3.0, 1), "halved"),
    "separable": (replace(round_gabors(9), name="round"), "separable"),
    "fft": (random_bank(3, 11, border="wrap"), "fft"),
}
EVERY = {**{name: (bank, "auto") for name, bank in BANKS.items()}, **PLANS}


@pytest.mark.parametrize("name", EVERY if LONG else ("energy", "line", "both", "halved"))
def test_no_access_goes_astray(name, tmp_path):
    bank, kind = EVERY[name]
    form = bank.contract.format
    values = {
        "N": bank.name,
        "SIZE": bank.size,
        "COUNT": len(bank),
        "TOP": form.full_scale if form.integer else 1000,
        "SCALE": "" if form.integer else " / 1000.0f",
    }
    rules = edgel_rules(bank)
    values |= {"EDGELS": "", "TRY_EDGELS": "", "LINES": int(bool(rules and rules.lines))}
    if rules is not None:
        values["EDGELS"] = fill(EDGELS, values).decode()
        values["TRY_EDGELS"] = TRY_EDGELS
    build._unpack(tmp_path, export.emit(bank, make_plan(bank, kind), rules))
    (tmp_path / "fuzz.c").write_bytes(fill(DRIVER, values))
    compiler = build.find_compiler()
    assert compiler is not None
    words = [
        *compiler.command, *build.FLAGS, "-O1", "-g", "-fsanitize=address,undefined",
        "-fno-sanitize-recover=all", "-o", "fuzz", "fuzz.c", f"{bank.name}.c", "-lm",
    ]  # fmt: skip
    build._run(tmp_path, words)
    seed = secrets.randbits(31) if LONG else 7
    done = subprocess.run(
        [tmp_path / "fuzz", LONG or "25", str(seed)],
        capture_output=True, text=True, timeout=3600 if LONG else 300, check=False,
    )  # fmt: skip
    assert done.stdout == "ok\n", f"seed {seed}: {done.stdout}{done.stderr[-3000:]}"
