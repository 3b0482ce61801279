"""A bank learned from real photographs, for the benchmark: filters as they are, no symmetry.

The photographs come with scikit-image (public domain and CC0); nothing of them is kept here.
"""

from __future__ import annotations

import numpy as np

from patchlab import bank as banks
from patchlab import camera, images, learn
from patchlab.conventions import REC709
from patchlab.types import Bank, Frame, InputContract, NoiseModel, Survey

NAMES = ("astronaut", "camera", "chelsea", "coffee", "coins", "rocket")
COMPONENTS = 32
SIZE = 12


def photographs() -> list[Frame]:
    """The photographs as 8-bit grey frames."""
    import skimage.data

    contract = InputContract("Mono8", 0.0, 255.0, transfer="srgb")
    frames = []
    for name in NAMES:
        plane = np.asarray(getattr(skimage.data, name)(), dtype=np.float64)
        grey = plane[..., :3] @ np.array(REC709) if plane.ndim == 3 else plane
        frames.append(Frame(f"{name}.png", np.rint(grey).astype(np.uint8), contract))
    return frames


def learned_bank() -> Bank:
    """32 filters of 12 x 12 (with a row and a column of zeros: 13 x 13), independent components."""
    frames = photographs()
    contract = frames[0].contract
    table = camera.make_table("log", contract, None)
    settings = images.SampleSettings(size=SIZE, patches=20_000, seed=0)
    patches = images.sample(frames, table, settings, count_frames=len(frames))
    dictionary = learn.learn_ica(
        patches, learn.whiten(patches), components=COMPONENTS, seed=0, restarts=1
    )
    survey = Survey(contract, NoiseModel(False, "not asked for"), table)
    return banks.bank_as_learned(dictionary, survey, "learned")
