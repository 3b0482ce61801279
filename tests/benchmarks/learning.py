"""Time to objective: our independent components beside the libraries that are installed.

    python tests/benchmarks/learning.py [--photos FOLDER] [-o OUT] [--case 12,100,100000 ...]

`pip install python-picard` adds that library; `--threads 2` times ours on two threads as well.

One run, peers and ours in turn, on the same whitened patches, BLAS on one thread. The
objective is the mean negative log-likelihood of the learning patches (logistic-like
density 1 / (pi cosh y), free scales, log|det W| included), in float64; the held-out value
is the log-likelihood of the other tenth. Prints a table; OUT gets learning.json and
learning.png.
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

from patchlab.learn import whiten
from patchlab.learn.incremental import course
from patchlab.learn.likelihood import Likelihood, Rows
from patchlab.learn.solver import Orthogonal, Solver, State
from patchlab.learn.trust import split
from patchlab.learn.whiten import threads

MARKERS = {"FastICA float32": "o", "FastICA float64": "s", "picard float64": "^"}
CASES = ((12, 100, 100_000), (16, 160, 100_000))


class Gains(Orthogonal):
    """Rotations held fast: fits the free scales of a peer's components."""

    def gradient(self, at):
        return np.diag(np.diag(super().gradient(at)))


class Case:
    """One set of patches: learning and held-out rows, and how a W is judged."""

    def __init__(self, planes, size: int, components: int, count: int) -> None:
        patches = draw(planes, size, count)
        self.through = whiten(patches, rank=components)
        self.rows = Rows.of(patches.patches, self.through)
        self.train, self.held = split(count, 0)
        self.known = Likelihood(self.rows.whitened(self.train), np.ones(components))
        self.fresh = Likelihood(self.rows.whitened(self.held), np.ones(components))
        self.k = components

    def judged(self, W: np.ndarray) -> tuple[float, float]:
        start = W / np.linalg.norm(W, axis=1, keepdims=True) * np.pi / 2
        best = Solver(self.known, Gains(), 1e-9 * self.k, 100).run(State(start)).W
        return self.known(best).value, -self.fresh(best).value


def clock(jobs: int) -> float:
    return time.process_time() if jobs == 1 else time.perf_counter()


def ours(case: Case, seed: int, jobs: int = 1, wall: bool = False) -> dict[str, Any]:
    """The steps of ``learn_ica`` with one start, the clock stopped while they are judged."""
    now = time.perf_counter if wall else lambda: clock(jobs)
    start = np.random.default_rng(seed).standard_normal((case.k, case.k))
    with threads(jobs) as mapper:
        began = now()
        objective = Likelihood(case.rows.whitened(case.train), np.ones(case.k), mapper)
        W = course(objective, np.linalg.qr(start)[0] * np.pi / 2)
        curve = [(now() - began, 0.0)]
        first = objective(W).value
        curve[0] = (curve[0][0], first)

        def after(state: State) -> None:
            curve.append((now() - began, state.curve[-1]))

        state = Solver(objective, Orthogonal(), 1e-6 * case.k, 1000, after).run(State(W))
    value, held = state.curve[-1], -case.fresh(state.W).value
    return {"seconds": curve[-1][0], "value": value, "held_out": held, "curve": curve}


def fastica(case: Case, seed: int, dtype: type) -> dict[str, Any]:
    from sklearn.decomposition import FastICA

    z = case.known.rows.data.astype(dtype)
    began = time.process_time()
    found = FastICA(whiten=False, random_state=seed).fit(z)
    seconds = time.process_time() - began
    value, held = case.judged(found.components_.astype(np.float64))
    return {"seconds": seconds, "value": value, "held_out": held, "steps": found.n_iter_}


def picard(case: Case, seed: int) -> dict[str, Any]:
    from picard import picard as solve

    z = case.known.rows.data.astype(np.float64).T
    options = {"whiten": False, "centering": False, "ortho": True, "random_state": seed}
    began = time.process_time()
    _, W, _ = solve(z, **options, fastica_it=20, max_iter=60)
    seconds = time.process_time() - began
    value, held = case.judged(W)
    return {"seconds": seconds, "value": value, "held_out": held}


def peers(wanted: list[str]) -> dict[str, Any]:
    known = {
        "FastICA float32": lambda case, seed: fastica(case, seed, np.float32),
        "FastICA float64": lambda case, seed: fastica(case, seed, np.float64),
    }
    try:
        import picard as _  # noqa: F401

        known["picard float64"] = picard
    except ImportError:
        print("python-picard is not installed: left out")
    return {name: run for name, run in known.items() if not wanted or name in wanted}


def run_case(case: Case, others: dict[str, Any], repeats: int) -> dict[str, list[Any]]:
    found: dict[str, list[Any]] = {name: [] for name in ("ours", *others)}
    for seed in range(repeats):  # in turn, so that a busy machine slows all alike
        found["ours"].append(ours(case, seed))
        for name, run in others.items():
            found[name].append(run(case, seed))
    return found


def reached(curve, value: float) -> float:
    return min((t for t, v in curve if v <= value), default=float("inf"))


def rows_of(found: dict[str, list[Any]]) -> list[dict[str, Any]]:
    out = []
    for name, results in found.items():
        line = {
            "who": name,
            "seconds": min(r["seconds"] for r in results),
            "value": float(np.mean([r["value"] for r in results])),
            "held_out": float(np.mean([r["held_out"] for r in results])),
        }
        if name != "ours":
            to = [
                reached(mine["curve"], theirs["value"])
                for mine, theirs in zip(found["ours"], results, strict=True)
            ]
            line["ours_to_its_value"] = min(to)
            line["ratio"] = line["seconds"] / line["ours_to_its_value"]
        out.append(line)
    return out


def plot(path: Path, everything: dict[str, dict[str, list[Any]]]) -> None:
    from matplotlib.figure import Figure

    figure = Figure(figsize=(5.5 * len(everything), 3.6), layout="constrained")
    for axes, (title, found) in zip(
        figure.subplots(1, len(everything), squeeze=False)[0], everything.items(), strict=True
    ):
        for r in found["ours"]:
            best = min(v for _, v in r["curve"])
            axes.loglog(*zip(*[(t, v - best + 1e-4) for t, v in r["curve"]], strict=True), "C2")
            for name, marker in MARKERS.items():
                for i, p in enumerate(found.get(name, [])):
                    label = "" if i else name
                    axes.plot(
                        p["seconds"], p["value"] - best + 1e-4, marker, color="C1", label=label
                    )
        axes.plot([], [], "C2", label="ours")
        axes.legend(fontsize=7)
        axes.set(xlabel="seconds", ylabel="objective above our end, nats", title=title)
    figure.savefig(path)


def main() -> None:
    parser = argparse.ArgumentParser(description=__doc__.splitlines()[0])
    parser.add_argument("--photos", type=Path)
    parser.add_argument("-o", "--out", type=Path)
    parser.add_argument("--case", action="append", help="size,components,patches")
    parser.add_argument("--peer", action="append", default=[])
    parser.add_argument("--repeats", type=int, default=2)
    parser.add_argument("--threads", type=int, default=0, help="also ours on so many, by the wall")
    options = parser.parse_args()
    cases = [tuple(map(int, c.split(","))) for c in options.case or []] or CASES
    planes, others, everything, table = pictures(options.photos), peers(options.peer), {}, []
    with warnings.catch_warnings(), threadpool_limits(1):
        warnings.simplefilter("ignore")
        for size, components, count in cases:
            case = Case(planes, size, components, count)
            title = f"{count} patches {size}x{size}, {components} components"
            ours(case, 99)  # compile
            everything[title] = run_case(case, others, options.repeats)
            print(f"\n{title}\n{'':18}seconds   objective   held out   ours there by   ratio")
            for line in rows_of(everything[title]):
                table.append({"case": title, **line})
                there = line.get("ours_to_its_value")
                ratio = "" if there is None else f"{there:13.2f} s {line['ratio']:7.1f}"
                print(
                    f"{line['who']:18}{line['seconds']:7.2f} {line['value']:11.3f}"
                    f"{line['held_out']:11.3f}  {ratio}"
                )
            if options.threads:
                pair = [
                    [ours(case, s, jobs, wall=True)["seconds"] for s in range(options.repeats)]
                    for jobs in (1, options.threads)
                ]
                ratio = min(pair[0]) / min(pair[1])
                print(f"{options.threads} threads: {ratio:.2f} times one, by the wall")
                table.append({"case": title, "threads": options.threads, "speedup": ratio})
    if options.out:
        options.out.mkdir(parents=True, exist_ok=True)
        (options.out / "learning.json").write_text(json.dumps(table, indent=1) + "\n")
        plot(options.out / "learning.png", everything)


if __name__ == "__main__":
    main()
