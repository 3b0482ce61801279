"""Learning: PatchSet to Whitening to Dictionary.

``whiten`` removes the patch mean and decorrelates; ``learn_ica``, ``learn_sparse`` and
``learn_pca`` turn whitened patches into a dictionary of filters and atoms.
"""

from patchlab.learn.checkpoint import Checkpoint
from patchlab.learn.coding import lasso
from patchlab.learn.components import choose_components
from patchlab.learn.ica import learn_ica
from patchlab.learn.order import amari_index, match
from patchlab.learn.parts import learn_parts, locality
from patchlab.learn.pca import learn_pca
from patchlab.learn.sparse import SparseState, encode, learn_sparse, penalty_from_noise
from patchlab.learn.sure import crowd_distance, shape_numbers, shape_spread
from patchlab.learn.whiten import Moments, moments, noise_covariance, whiten, whitening

__all__ = [
    "Checkpoint",
    "Moments",
    "SparseState",
    "amari_index",
    "choose_components",
    "crowd_distance",
    "encode",
    "lasso",
    "learn_ica",
    "learn_parts",
    "learn_pca",
    "learn_sparse",
    "locality",
    "match",
    "moments",
    "noise_covariance",
    "penalty_from_noise",
    "shape_numbers",
    "shape_spread",
    "whiten",
    "whitening",
]
