"""Photographs that ship with scikit-image and scikit-learn, and cameras simulated on them."""

import io
from pathlib import Path

import imageio.v3 as iio
import numpy as np
import pytest
import skimage.data
import sklearn.datasets
from scipy import ndimage

from patchlab.conventions import REC709, srgb_decode, srgb_encode
from patchlab.types import Frame, InputContract

SKIMAGE = Path(skimage.data.__file__).parent
SKLEARN = Path(sklearn.datasets.__file__).parent / "images"
PHOTOS = (
    "astronaut.png", "chelsea.png", "coffee.png", "motorcycle_left.png", "rocket.jpg",
    "china.jpg", "camera.png", "coins.png", "flower.jpg", "ihc.png", "moon.png",
    "motorcycle_right.png", "retina.jpg",
)  # fmt: skip
TEXTURES = ("brick.png", "grass.png", "gravel.png")


class Bench:
    """A bench of simulated cameras."""

    def __init__(self):
        self._light = {}

    def light(self, name, limit=512):
        """A photograph in linear light, 0 to 1, its middle at most ``limit`` pixels wide."""
        if name not in self._light:
            folder = SKLEARN if name in ("china.jpg", "flower.jpg") else SKIMAGE
            light = srgb_decode(iio.imread(folder / name) / 255.0)
            light = light[..., :3] @ np.array(REC709) if light.ndim == 3 else light
            y, x = (max(0, (n - limit) // 2) for n in light.shape)
            self._light[name] = light[y : y + limit, x : x + limit]
        return self._light[name]

    def photos(self, count=13, start=0):
        return [self.light(PHOTOS[(start + i) % len(PHOTOS)]) for i in range(count)]

    def textures(self):
        return [self.light(name) for name in TEXTURES]

    @staticmethod
    def contract(bits, black=0.0, transfer="linear"):
        return InputContract(f"Mono{bits}", black, 2**bits - 1, transfer)

    @staticmethod
    def frame(codes, contract, path="a.png"):
        return Frame(path, np.asarray(codes).astype(contract.format.dtype), contract)

    def expose(self, light, contract, gain, read, seed, blur=0.7, post=None):
        """Codes of a sensor: photons, electrons, read noise, what the camera does, rounding."""
        rng = np.random.default_rng(seed)
        top = contract.white - contract.black
        blurred = ndimage.gaussian_filter(light, blur) if blur else light
        electrons = rng.poisson(np.maximum(0.9 * top / gain * blurred, 0))
        codes = gain * electrons + read * rng.standard_normal(light.shape)
        if contract.transfer == "srgb":
            codes = top * srgb_encode(np.clip(codes / top, 0, 1))
        if post is not None:
            codes = post(codes)
        return np.clip(np.round(codes + contract.black), 0, 2**contract.format.bits - 1)

    def folder(self, lights, contract, gain, read, seed=0, blur=None, post=None):
        blurs = np.random.default_rng(seed).uniform(0.5, 1.2, len(lights))
        return [
            self.frame(
                self.expose(x, contract, gain, read, 1000 * seed + i, blur or blurs[i], post),
                contract,
                f"{i:02d}.png",
            )
            for i, x in enumerate(lights)
        ]

    @staticmethod
    def jpeg(quality):
        """What a JPEG file of 8-bit codes keeps."""

        def squeeze(codes):
            plane = np.clip(np.round(codes), 0, 255).astype(np.uint8)
            data = iio.imwrite("<bytes>", plane, extension=".jpg", quality=quality)
            return iio.imread(io.BytesIO(data), extension=".jpg").astype(np.float64)

        return squeeze


@pytest.fixture(scope="session")
def bench():
    return Bench()
