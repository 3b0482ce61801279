"""Early stopping: held-out patches end learning before it overfits, and only then."""

import numpy as np
import pytest

from patchlab.learn import Checkpoint, learn_ica, watch, whiten
from patchlab.learn.likelihood import Likelihood, Rows
from patchlab.learn.solver import Orthogonal, Solver, State
from patchlab.learn.trust import split


@pytest.fixture(scope="module")
def few(make_set, raw_photos):
    """Patches 8x8, five for each of sixty components, a quarter of them held out."""
    return make_set(raw_photos[:400], normalise=True)


@pytest.fixture(scope="module")
def many(make_set, raw_photos):
    return make_set(raw_photos[:4000], normalise=True)


@pytest.fixture
def unwatched(monkeypatch):
    def learn(*args, **options):
        with monkeypatch.context() as patch:
            patch.setattr(watch.Watcher, "judge", lambda self, state: (self._look(state), state)[1])
            return learn_ica(*args, **options)

    return learn


def test_few_patches_and_many_components_stop_before_overfitting(
    few, make_set, raw_photos, unwatched
):
    w = whiten(few, rank=60, held_out=0)
    stopped = learn_ica(few, w, restarts=1, tolerance=1e-7)
    whole = unwatched(few, w, restarts=1, tolerance=1e-7)
    assert whole.converged
    assert whole.stopped_at is None
    assert not stopped.converged
    assert stopped.stopped_at == stopped.iterations == len(stopped.curve) - 1
    assert not any("did not converge" in line for line in stopped.warnings)
    assert any(f"at step {stopped.stopped_at}, before" in line for line in stopped.warnings)
    assert np.isnan(stopped.over_resamples).all()
    fresh = Rows.of(make_set(raw_photos[5000:15000], normalise=True).patches, w).whitened()
    known = Rows.of(few.patches, w).whitened(np.sort(split(len(few), 0)[0]))
    assert score(stopped, known, fresh) > score(whole, known, fresh) + 1  # nobody watched these


class Gains(Orthogonal):
    """Rotations held fast: fits the free scales of components."""

    def gradient(self, at):
        return np.diag(np.diag(super().gradient(at)))


def score(d, known, fresh):
    """Log-likelihood of fresh rows, the components' scales fitted on the known ones."""
    ones, W = np.ones(len(d)), d.filters.reshape(len(d), -1) @ d.whitening.D * np.pi / 2
    fitted = Solver(Likelihood(known, ones), Gains(), 1e-9 * len(d), 100).run(State(W))
    return -Likelihood(fresh, ones)(fitted.W).value


def test_ample_patches_do_not_stop_and_keep_their_bytes(many, unwatched):
    w = whiten(many, rank=30, held_out=0)
    one, other = (f(many, w, restarts=2) for f in (learn_ica, unwatched))
    assert one.converged
    assert one.stopped_at is None
    assert one.atoms.tobytes() == other.atoms.tobytes()


def test_the_second_curve_is_the_held_out_likelihood(few):
    w = whiten(few, rank=60, held_out=0)
    d = learn_ica(few, w, restarts=1, tolerance=1e-7)
    steps, seen = d.held_out_curve.T
    assert np.array_equal(steps[:-1], watch.EVERY * np.arange(len(steps) - 1))
    assert d.log_likelihood == pytest.approx(seen.max(), abs=1e-4)
    assert steps[seen.argmax()] == d.stopped_at


@pytest.mark.parametrize("density", ["tanh", "adaptive"])
def test_resumed_before_the_stop_it_ends_with_the_same_bytes(few, density):
    options = {"restarts": 2, "tolerance": 1e-7, "density": density}
    w, kept = whiten(few, rank=60, held_out=0), []
    whole = learn_ica(few, w, **options, checkpoint=kept.append)
    assert whole.stopped_at is not None
    assert any(c.watch.bad for c in kept)
    for where in kept[1 :: max(len(kept) // 4, 1)]:
        again = Checkpoint.from_arrays(where.arrays())
        other = learn_ica(few, w, **options, resume=again)
        assert other.atoms.tobytes() == whole.atoms.tobytes()
        assert other.held_out_curve.tobytes() == whole.held_out_curve.tobytes()
        assert other.stopped_at == whole.stopped_at


class Told:
    """Stands for the likelihood of held-out patches: says what was written for each step."""

    def __init__(self, levels):
        self.rows, self.levels = range(64), levels

    def values(self, W, edges):
        return -(self.levels[int(W[0, 0])] + 0.01 * np.cos(np.arange(len(edges) - 1)))


def walk(levels, outcome=""):
    """The state after steps with these held-out levels, began at 0."""
    watcher = watch.Watcher(Told(levels), watch.Watch(0.0))
    for look in range(len(levels)):
        step = look * watch.EVERY
        last = outcome if look == len(levels) - 1 else ""
        state = State(
            np.full((1, 1), float(look)), iterations=step, curve=(0.0,) * (step + 1), outcome=last
        )
        state = watcher.judge(state)
        if state.outcome:
            break
    return state


@pytest.mark.parametrize(
    ("levels", "outcome", "ended", "at"),
    [
        ([1, 2, *[1.7] * 6], "", "overfitting", 5),  # six bad looks: back to the best
        ([1, 2, *[1.7] * 5], "", "", 30),  # five may still turn
        ([1, 2, *[1.7] * 5, 1.9, *[1.7] * 5], "", "", 60),  # one good look in between
        ([1, 2, *[1.85] * 9], "", "", 50),  # less than a tenth of the gain
        ([1, 2, 1.7], "converged", "overfitting", 5),  # learning ends so
        ([1, 2, 1.9], "converged", "converged", 10),
        ([-1, *[-2] * 6], "", "overfitting", 0),  # nothing was ever gained
    ],
)
def test_the_rule(levels, outcome, ended, at):
    state = walk(levels, outcome)
    assert state.outcome == ended
    assert state.iterations == at
    assert len(state.curve) == at + 1
    assert state.W[0, 0] == at / watch.EVERY


def test_a_loss_within_its_own_error_is_none():
    told = Told([1.0, 0.5])
    told.values = lambda W, edges: (
        -np.where(np.arange(len(edges) - 1) == 0, 16 * (W[0, 0] == 0), 0.0)
    )
    watcher = watch.Watcher(told, watch.Watch(0.0))
    for look in (0, 1):
        watcher.judge(State(np.full((1, 1), float(look)), iterations=5 * look))
    assert watcher.watch.bad == 0


@pytest.mark.parametrize(
    ("n", "held"), [(50_000, 5000), (6000, 600), (3000, 500), (800, 200), (12, 3)]
)
def test_how_many_are_held_out(n, held):
    kept, out = split(n, 0)
    assert out.size == held
    assert np.array_equal(np.sort(np.concatenate([kept, out])), np.arange(n))


def test_what_is_held_out_is_held_out_of_the_whitening_too(many, make_set, raw_photos):
    rows = raw_photos[:4000].copy()
    kept, out = split(4000, 3)
    rows[out] = raw_photos[-out.size :]
    other = make_set(rows, normalise=True)
    one, two = (whiten(p, rank=20, held_out=3) for p in (many, other))
    assert one.K.tobytes() == two.K.tobytes()
    assert one.samples == kept.size
    assert whiten(many, rank=20).K.tobytes() != whiten(other, rank=20).K.tobytes()
