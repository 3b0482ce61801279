"""Why a stage is made anew."""

import pytest

from patchlab.pipeline.desk import Desk
from patchlab.settings import Settings
from patchlab.types import NoiseModel

BEFORE = {
    "inputs": {"a.png": "1"},
    "settings": {"table": "auto", "white": None},
    "parents": {"survey": "x"},
    "body": {"recipe": 2, "photos": {"used": 1}},
}


@pytest.mark.parametrize(
    ("change", "said"),
    [
        ({}, "kept from before"),
        ({"inputs": {"a.png": "2"}}, "made anew (other photographs)"),
        ({"settings": {"table": "log", "white": None}}, "made anew (other settings: table)"),
        ({"parents": {"survey": "y"}}, "made anew (an earlier stage was made anew)"),
        (
            {"inputs": {"b.png": "1"}, "body": {"recipe": 1, "photos": {"used": 2}}},
            "made anew (other photographs; another version of patchlab)",
        ),
    ],
)
def test_a_resumed_run_says_what_is_made_anew_and_why(tmp_path, change, said):
    told = []
    desk = Desk(tmp_path, Settings(), resume=True, tell=told.append)
    desk.stage("survey", BEFORE, lambda: NoiseModel(False, "first"))
    assert told == []  # nothing stood there
    noun, _ = desk.stage("survey", {**BEFORE, **change}, lambda: NoiseModel(False, "second"))
    assert told == [f"  survey: {said}"]
    assert noun.reason == ("second" if change else "first")


def test_another_seed_is_named(tmp_path):
    told = []
    for seed in (0, 1):
        desk = Desk(tmp_path, Settings(seed=seed), resume=True, tell=told.append)
        desk.stage("survey", BEFORE, lambda: NoiseModel(False))
    assert told == ["  survey: made anew (another seed)"]
