"""From photographs to a promise that holds: the camera is surveyed on frames of scenes, a bank
is made in units of the noise found, and the rate it promises is counted on flat fields.
"""

import dataclasses
from pathlib import Path

import numpy as np
import pytest
import skimage.data

from patchlab import bank as banks
from patchlab import camera, images
from patchlab.bank import lattice
from patchlab.conventions import REC709, srgb_decode
from patchlab.edges import assess, calibrate
from patchlab.errors import UsageError
from patchlab.images import demo
from patchlab.images.scenes import Camera, render_scene
from patchlab.types import Bank, Frame

SAMPLES = Path(__file__).parent.parent / "sample_images"
RATES = (100.0, 1000.0)


def bank_for(frames, contract):
    """A bank in units of the noise that a survey of these frames finds."""
    found = camera.survey(lambda: iter(frames), contract)
    colour, sd = found.noise.autocovariance, found.table.noise_sd
    widths = ((1.1, 1.32), (2.2, 2.64))
    kernels, taps = lattice.lattice_bank((8, 8), widths, ("odd",), colour, sd)
    bank = Bank("proof", kernels, taps, found.table, noise_autocovariance=colour)
    return dataclasses.replace(bank, thresholds=calibrate(bank, megapixels=2))


def false_rates(bank, device):
    """False elements per megapixel over ten grey levels, and groups at each level."""
    plan, draw = banks.make_plan(bank), np.random.default_rng(1)
    counts = [
        assess.count_flat(
            bank,
            device.capture(np.full((360, 360), grey * device.full_well), draw),
            lambda pixels: banks.responses(bank, pixels, plan),
            RATES,
        )
        for grey in np.linspace(0.03, 0.8, 10)
    ]
    area = sum(c.megapixels for c in counts)
    elements = np.sum([c.elements for c in counts], axis=0)
    return elements / area, np.array([c.groups[1] for c in counts])


def test_white_noise_found_in_photographs_keeps_the_promise_within_30_per_cent():
    listing = images.list_photos(SAMPLES)
    names = listing.files[::2]
    frames = [images.read_file(SAMPLES, f, images.ReadOptions())[0] for f in names]
    bank = bank_for(frames, frames[0].contract)
    assert bank.noise_autocovariance is None
    found, groups = false_rates(bank, demo.OMBREL_K2)
    np.testing.assert_allclose(found, RATES, rtol=0.3)
    assert assess.flatness(groups).flat


def test_coloured_noise_found_in_photographs_keeps_the_promise_within_a_factor_2():
    device = Camera(
        bits=10, gain=0.5, full_well=1900, read_noise=3.0, blur_sigma_px=0.8, neighbour=0.2
    )
    frames = [
        dataclasses.replace(
            render_scene(
                k, (240, 320), device, light=(300, 700, 1500)[k % 3], smallest=12.0, largest=110.0
            ).frame,
            path=f"{k}.png",
        )
        for k in range(9)
    ]
    bank = bank_for(frames, device.contract)
    assert bank.noise_autocovariance is not None
    found, _ = false_rates(bank, device)
    assert (found / RATES > 0.5).all()
    assert (found / RATES < 2).all()


def test_coloured_noise_under_texture_everywhere_is_refused():
    device = Camera(
        bits=10, gain=0.5, full_well=1900, read_noise=3.0, blur_sigma_px=0.8, neighbour=0.1
    )
    draw, frames = np.random.default_rng(0), []
    for name in ("astronaut", "chelsea", "coffee"):
        light = srgb_decode(getattr(skimage.data, name)() / 255.0) @ np.array(REC709)
        codes = device.capture(0.9 * device.full_well * light, draw)
        frames.append(Frame(f"{name}.png", codes, device.contract))
    with pytest.raises(UsageError, match="noise is not known"):
        bank_for(frames, device.contract)
