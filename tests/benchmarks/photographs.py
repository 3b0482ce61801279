"""What the benchmarks learn from: the photographs that scikit-image and scikit-learn ship.

They are NASA public domain, CC0 and CC BY 2.0; nothing of them is kept in this repository.
"""

from pathlib import Path

import numpy as np

from patchlab.conventions import REC709, srgb_decode
from patchlab.types import PatchSet

NAMES = (
    "astronaut", "camera", "chelsea", "coffee", "coins", "rocket", "brick", "grass", "gravel",
)  # fmt: skip


def pictures(folder: Path | None = None) -> list[np.ndarray]:
    """Linear luminance in [0, 1] of the shipped photographs, or of a folder's files."""
    if folder is not None:
        import imageio.v3 as imageio

        files = [p for p in sorted(folder.iterdir()) if not p.name.startswith(".")]
        planes = [np.asarray(imageio.imread(p)) for p in files]
    else:
        import skimage.data
        from sklearn.datasets import load_sample_images

        planes = [getattr(skimage.data, name)() for name in NAMES]
        planes += load_sample_images().images
    return [_luminance(p) for p in planes]


def _luminance(plane: np.ndarray) -> np.ndarray:
    linear = srgb_decode(plane / np.iinfo(plane.dtype).max)
    return linear[..., :3] @ np.array(REC709) if linear.ndim == 3 else linear


def draw(planes: list[np.ndarray], size: int, count: int, seed: int = 0) -> PatchSet:
    """``count`` patches: logarithm of light, DC removed, flattest 30 % dropped, normalised."""
    r = np.random.default_rng(seed)
    each = int(np.ceil(count / 0.7 / len(planes)))
    kept, means, contrasts = [], [], []
    for plane in planes:
        tone = np.log(plane + 0.01)
        y = r.integers(0, plane.shape[0] - size + 1, each)
        x = r.integers(0, plane.shape[1] - size + 1, each)
        windows = np.lib.stride_tricks.sliding_window_view(tone, (size, size))
        rows = windows[y, x].reshape(each, -1)
        dc, sd = rows.mean(axis=1), rows.std(axis=1)
        best = np.argsort(-sd)[: int(each * 0.7) + 1]
        kept.append(((rows - dc[:, None])[best] / sd[best, None]).astype(np.float32))
        means.append(dc[best])
        contrasts.append(sd[best])
    order = r.permutation(sum(map(len, kept)))[:count]
    return PatchSet(
        np.ascontiguousarray(np.concatenate(kept)[order]),
        size,
        np.zeros(count, np.int32),
        np.zeros((count, 2), np.int32),
        np.concatenate(means)[order].astype(np.float32),
        np.concatenate(contrasts)[order].astype(np.float32),
        ("shipped",),
        {},
    )
