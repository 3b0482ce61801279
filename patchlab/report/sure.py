"""How sure the learner is, drawn and in words."""

from __future__ import annotations

import numpy as np
from matplotlib.figure import Figure

from patchlab.report.plots import AMBER, SLATE, TEAL, _figure
from patchlab.types import ComponentChoice, Dictionary


def measured(known: Dictionary) -> bool:
    """Whether the dictionary says anything of how sure it is."""
    both = np.concatenate([known.over_restarts, known.over_resamples])
    return bool(np.isfinite(both).any())


def how_sure(known: Dictionary) -> bytes:
    """Left: how well each component is found again. Right: frequencies, restart by restart."""
    from patchlab import learn  # only here: edges are drawn without the learner

    def draw(figure: Figure) -> None:
        left, right = figure.subplots(1, 2)
        for values, colour, label in (
            (known.over_resamples, TEAL, "learned anew on halves"),
            (known.over_restarts, AMBER, "from another start"),
        ):
            if np.isfinite(values).any():
                share = np.linspace(0, 100, values.size)
                left.plot(share, np.sort(values)[::-1], color=colour, label=label)
        left.set(
            xlabel="% of the components", ylabel="mean |cos|", title="Components", ylim=(0, 1.02)
        )
        left.legend()
        sets = known.pooled_atoms.reshape(-1, *known.atoms.shape)
        for i, atoms in enumerate(sets):
            at = np.sort(learn.shape_numbers(atoms)["frequency"])
            colour = TEAL if i == 0 else SLATE
            right.step(at, np.linspace(0, 100, at.size), color=colour, lw=1.6 if i == 0 else 0.9)
        right.set(
            xlabel="frequency, cycles per pixel",
            ylabel="% of the components below",
            title="The crowd of shapes, a line a restart",
        )

    return _figure(draw, 8.4, 3.1)


def component_choice(choice: ComponentChoice) -> bytes:
    """The curve by which the number of components was chosen."""

    def draw(figure: Figure) -> None:
        left, right = figure.subplots(1, 2)
        left.errorbar(choice.counts, choice.gain, choice.error, color=TEAL, marker=".", capsize=2)
        left.set(
            xlabel="components", ylabel="nats per pixel", title="Held-out gain over normal values"
        )
        right.plot(choice.counts, choice.found_again, ".-", color=SLATE)
        right.set(
            xlabel="components",
            ylabel="median |cos|",
            title="Learned anew on halves",
            ylim=(0, 1.02),
        )
        for axes in (left, right):
            axes.axvline(choice.chosen, color=AMBER, ls="--", lw=1)

    return _figure(draw, 8.4, 2.9)


def in_words(known: Dictionary) -> str:
    """What the picture says, in a sentence or two."""
    from patchlab import learn

    said = []
    starts = len(known.pooled_atoms) // len(known)
    for values, where in (
        (known.over_restarts, f"in the other {starts - 1} of {starts} starts"),
        (known.over_resamples, "when learned anew on random halves of the patches"),
    ):
        if np.isfinite(values).any():
            share = 100 * float(np.mean(values > 0.9))
            said.append(
                f"{share:.0f} % of the components are found again at |cos| above 0.9 {where}."
            )
    spread = learn.shape_spread(known)
    if spread:
        told = ", ".join(f"{n} {s['distance']:.2f} ({s['chance']:.2f})" for n, s in spread.items())
        said.append(
            "Their shapes as a crowd differ between starts by (in brackets, what chance exceeds "
            f"once in twenty): {told}."
        )
    return " ".join(said)
