"""Sparse codes and dictionaries: ours beside scikit-learn's, at equal optimality.

    python tests/benchmarks/coding.py [--photos FOLDER] [-o OUT.json] [--skip-learning]

Codes: 256 learned atoms over whitened patches of 12x12, penalty 1.2; microseconds a patch on one
thread (processor time, all in turn, least of five), and the worst violation of the
optimality (KKT) conditions over the patches, relative to the penalty. scikit-learn's
coordinate descent is run over the same Gram matrix at a falling tolerance until its own worst
violation is below the one asked for. Dictionaries: processor seconds to a held-out objective,
ours against MiniBatchDictionaryLearning over several batch sizes, coded by the same coder.
"""

import argparse
import json
import time
import warnings
from pathlib import Path
from typing import Any

import numpy as np
from photographs import draw, pictures
from threadpoolctl import threadpool_limits

from patchlab import learn
from patchlab.learn import sparse
from patchlab.learn.likelihood import Rows
from patchlab.learn.trust import split

ATOMS, PENALTY = 256, 1.2


def violation(z, B, codes, penalty) -> float:
    """Worst violation of the optimality conditions, relative to the penalty."""
    q = z.astype(np.float64) @ B - codes.astype(np.float64) @ (B.T @ B)
    on = codes != 0
    wrong = np.where(on, np.abs(q - penalty * np.sign(codes)), np.abs(q) - penalty)
    return float(wrong.max() / penalty)


def theirs(z, B, penalty, tolerance):
    from sklearn.linear_model import _cd_fast as cd_fast

    gram, target = B.T @ B, z @ B
    codes = np.zeros((len(z), B.shape[1]))
    random = np.random.mtrand._rand
    for i in range(len(z)):
        cd_fast.enet_coordinate_descent_gram(
            codes[i], penalty, 0.0, gram, target[i], z[i], 10_000, tolerance, random, False, False
        )
    return codes


def public(z, B, penalty):
    """As people call it; its tolerance cannot be set."""
    from sklearn.decomposition import sparse_encode

    return sparse_encode(z, np.ascontiguousarray(B.T), algorithm="lasso_cd", alpha=penalty)


def clocked(task) -> tuple[float, Any]:
    began = time.process_time()
    out = task()
    return time.process_time() - began, out


def coding(z, B, wanted: float) -> dict[str, float]:
    """Microseconds a patch of both at one worst violation."""
    wide, tolerance = z.astype(np.float64), 0.3
    while violation(wide, B, theirs(wide, B, PENALTY, tolerance), PENALTY) > wanted:
        tolerance /= 3
    kind = np.float32 if wanted >= 1e-4 else np.float64
    rows = z.astype(kind)
    learn.lasso(rows[:100], B, PENALTY, tolerance=wanted)
    ours, other, called = [], [], []
    for _ in range(5):
        called.append(clocked(lambda: public(wide, B, PENALTY)))
        ours.append(clocked(lambda: learn.lasso(rows, B, PENALTY, tolerance=wanted)))
        other.append(clocked(lambda: theirs(wide, B, PENALTY, tolerance)))
    mine, peer, call = (min(t for t, _ in x) / len(z) * 1e6 for x in (ours, other, called))
    return {
        "tolerance": wanted,
        "ours_us": mine,
        "its_kernel_us": peer,
        "ratio_to_kernel": peer / mine,
        "sparse_encode_us": call,
        "ratio_to_sparse_encode": call / mine,
        "our_violation": violation(wide, B, ours[0][1], PENALTY),
        "its_violation": violation(wide, B, other[0][1], PENALTY),
        "violation_of_sparse_encode": violation(wide, B, called[0][1], PENALTY),
        "active": float(np.count_nonzero(ours[0][1]) / len(z)),
    }


def held_out(z, B) -> float:
    codes = learn.lasso(z, B, PENALTY, tolerance=1e-4)
    return float(sparse.objective(z, B, codes, PENALTY).mean())


def dictionaries(patches, through) -> list[dict[str, Any]]:
    from sklearn.decomposition import MiniBatchDictionaryLearning

    train, held = split(len(patches), 0)
    rows = Rows.of(patches.patches, through)
    z, fresh = rows.whitened(train).data, rows.whitened(np.sort(held)).data
    curve = []

    def ours() -> None:
        with threadpool_limits(1):
            learner = sparse.Learner(
                patches.patches, through, ATOMS, PENALTY, 0, 1e-5, map
            )  # fmt: skip
            state, spent = learner.start(), 0.0
            while not state.outcome:
                began = time.process_time()
                state = learner.follow(state, learner.turn(state), 50)
                spent += time.process_time() - began
                curve.append((spent, held_out(fresh, state.B)))

    ours()
    lines = [{"who": "ours", "seconds": curve[-1][0], "objective": curve[-1][1]}]
    for batch in (256, 1024, 4096):
        options = {
            "n_components": ATOMS, "alpha": PENALTY, "batch_size": batch, "max_iter": 5,
            "fit_algorithm": "cd", "random_state": 0, "tol": 0.0, "max_no_improvement": None,
            "dict_init": z[:ATOMS].astype(np.float64)
            / np.linalg.norm(z[:ATOMS].astype(np.float64), axis=1, keepdims=True),
        }  # fmt: skip
        began = time.process_time()
        found = MiniBatchDictionaryLearning(**options).fit(z.astype(np.float64))
        spent = time.process_time() - began
        B = found.components_.T / np.linalg.norm(found.components_, axis=1)
        value = held_out(fresh, B)
        there = min((t for t, v in curve if v <= value), default=float("inf"))
        lines.append(
            {
                "who": f"MiniBatchDictionaryLearning, batch {batch}, {found.n_iter_} epochs",
                "seconds": spent,
                "objective": value,
                "ours_there_by": there,
                "ratio": spent / there,
            }
        )
    return lines


def main() -> None:
    parser = argparse.ArgumentParser(description=__doc__.splitlines()[0])
    parser.add_argument("--photos", type=Path)
    parser.add_argument("--skip-learning", action="store_true")
    parser.add_argument("-o", "--out", type=Path)
    options = parser.parse_args()
    patches = draw(pictures(options.photos), 12, 30_000)
    through = learn.whiten(patches, rank=100)
    table: dict[str, Any] = {"codes": [], "dictionaries": []}
    with warnings.catch_warnings(), threadpool_limits(1):
        warnings.simplefilter("ignore")
        learner = sparse.Learner(patches.patches, through, ATOMS, PENALTY, 0, 1e-2, map)
        state = learner.run(learner.start(), 50)
        z = learner.held
        for wanted in (1e-3, 1e-6):
            line = coding(z, state.B, wanted)
            table["codes"].append(line)
            print("  ".join(f"{k} {v:.3g}" for k, v in line.items()), flush=True)
        if not options.skip_learning:
            table["dictionaries"] = dictionaries(patches, through)
            for line in table["dictionaries"]:
                print("  ".join(f"{k} {v:.5g}" if k != "who" else v for k, v in line.items()))
    if options.out:
        options.out.write_text(json.dumps(table, indent=1) + "\n")


if __name__ == "__main__":
    main()
