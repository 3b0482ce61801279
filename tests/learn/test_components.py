"""The number of components, left to the data."""

import numpy as np
import pytest

from patchlab.errors import InputError, UsageError
from patchlab.learn import choose_components, whiten
from patchlab.learn.components import _within_one_error
from patchlab.settings import Settings, from_toml, to_toml


def test_what_is_normal_beyond_the_sources_is_left_out(make_set):
    """Eight heavy-tailed directions of large variance, the rest normal and small."""
    r = np.random.default_rng(0)
    mixing = np.linalg.qr(r.standard_normal((36, 36)))[0]
    values = np.concatenate([3 * r.laplace(size=(9000, 8)), r.normal(size=(9000, 28))], axis=1)
    patches = make_set(values @ mixing.T)
    found = choose_components(patches, whiten(patches, retain=1.0), seed=1)
    assert found.counts.tolist() == sorted(set(found.counts.tolist()))
    assert found.chosen == found.counts[found.counts >= 8].min()
    assert found.gain[0] < found.gain.max()
    assert found.found_again[0] > 0.95  # five of the eight, mixed as they come, or all of them
    assert str(found.chosen) in found.reason
    twice = choose_components(patches, whiten(patches, retain=1.0), seed=1, jobs=2)
    assert twice.gain.tobytes() == found.gain.tobytes()


def test_one_direction_is_no_choice(make_set):
    r = np.random.default_rng(1)
    patches = make_set(r.laplace(size=(200, 1)) @ r.standard_normal((1, 16)))
    with pytest.raises(InputError, match="fewer than two"):
        choose_components(patches, whiten(patches))


def test_the_rule_of_one_standard_error():
    base = np.random.default_rng(2).normal(size=400)
    near = base - 0.01 + np.tile([0.5, -0.5], 200)  # a gap of 0.01 with an error of 0.025
    far = base - 0.1 + np.tile([0.5, -0.5], 200)
    chosen, means, errors = _within_one_error([2, 4, 8], np.array([far, near, base]))
    assert chosen == 4
    assert errors == pytest.approx([0.025, 0.025, 0.0])
    assert means[2] - means[0] == pytest.approx(0.1)


def test_auto_is_a_setting():
    settings = Settings(components="auto")
    assert Settings(**from_toml(to_toml(settings))) == settings
    for wrong in ("some", 1, 2.5):
        with pytest.raises(UsageError, match="components"):
            Settings(components=wrong)
