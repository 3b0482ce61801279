"""One list of settings: ranges, TOML, and names that do not slip."""

import dataclasses

import pytest

from patchlab.errors import UsageError
from patchlab.settings import Settings, from_toml, to_toml


def test_toml_round_trip():
    settings = Settings(patch_size=16, lines=True, purpose="features", seed=7, white=4095.0)
    assert Settings(**from_toml(to_toml(settings))) == settings
    assert Settings(**from_toml(to_toml(Settings()))) == Settings()


def test_an_unknown_key_is_an_error_with_the_nearest_known_one():
    with pytest.raises(UsageError, match="patch_size"):
        from_toml("patchsize = 12")
    with pytest.raises(UsageError, match="TOML"):
        from_toml("patch_size = = 3")


@pytest.mark.parametrize(
    "wrong",
    [
        {"patch_size": 7}, {"patch_size": 33}, {"patch_size": 12.5}, {"patch_size": True},
        {"kernels": 3}, {"purpose": "corners"}, {"max_bad": 1.5}, {"border": "reflect"},
        {"name": "1bank"}, {"name": "a-b"}, {"white": 10.0, "black": 20.0}, {"seed": -1},
        {"retain": float("nan")}, {"lines": 1}, {"table": "gamma"},
    ],
    ids=str,
)  # fmt: skip
def test_wrong_values_are_refused(wrong):
    with pytest.raises(UsageError, match=next(iter(wrong)).replace("_", "-")):
        Settings(**wrong)


def test_every_setting_has_a_meaning_and_a_group():
    for f in dataclasses.fields(Settings):
        assert f.metadata["help"].endswith(".")
        assert f.metadata["group"]


def test_a_limit_is_told_as_a_person_would_type_it():
    with pytest.raises(UsageError, match=r"it takes 500 to 10000000$"):
        Settings(patches=20_000_000)
    with pytest.raises(UsageError, match=r"it takes 0\.5 to 1$"):
        Settings(retain=0.2)
