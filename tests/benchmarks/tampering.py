"""Folders of simulated cameras, clean and tampered with, made of real photographs.

The photographs are those that scikit-image, scikit-learn and matplotlib ship, in two halves
that share no scene: thresholds are set on one and shown on the other. A frame is a crop of a
photograph, reduced (so that what its own camera and file left in it is gone), exposed by a
simulated sensor and, in a tampered folder, given one mark of a stated strength.
"""

import io
from collections.abc import Callable
from dataclasses import dataclass, field, replace
from pathlib import Path

import cv2
import imageio.v3 as iio
import numpy as np
from scipy import ndimage

from patchlab.conventions import REC709, rng, srgb_decode, srgb_encode
from patchlab.types import Frame, InputContract

SETTING = ("astronaut.png", "coffee.png", "moon.png", "brick.png", "ihc.png",
           "motorcycle_left.png", "china.jpg", "coins.png", "hubble_deep_field.jpg")  # fmt: skip
SHOWING = ("camera.png", "chelsea.png", "rocket.jpg", "gravel.png", "grass.png",
           "retina.jpg", "flower.jpg", "grace_hopper.jpg")  # fmt: skip
SIZES = ((192, 256), (240, 320))
LEAST_SCALE = 1.1
SOFT = 1.5
"""Softness, in pixels, beyond which a photograph is a blurred frame among the others by itself."""
SUFFIXES = {".png", ".jpg", ".jpeg", ".tif", ".tiff", ".bmp", ".ppm"}

Plane = np.ndarray


def shipped(names: tuple[str, ...]) -> list[Plane]:
    """Linear light in [0, 1], (h, w, 3), of photographs inside installed packages."""
    import matplotlib.cbook
    import skimage.data
    import sklearn.datasets

    places = [
        Path(skimage.data.__file__).parent,
        Path(sklearn.datasets.__file__).parent / "images",
        Path(str(matplotlib.cbook._get_data_path("sample_data"))),
    ]
    return [_light(next(p / name for p in places if (p / name).exists())) for name in names]


def halves(folder: Path | None = None) -> tuple[list[Plane], list[Plane]]:
    """Photographs to set on and to show on; a folder's own go to one and the other in turn."""
    setting, showing = shipped(SETTING), shipped(SHOWING)
    if folder is not None:
        more = [p for p in sorted(folder.iterdir()) if p.suffix.lower() in SUFFIXES]
        for half, start in ((setting, 0), (showing, 1)):
            half += [x for x in map(_light, more[start::2]) if softness(x) < SOFT]
    return setting, showing


def softness(light: Plane) -> float:
    """Width of a photograph's sharper edges: rise over steepest step, as of a Gaussian edge."""
    tone = np.log(ndimage.gaussian_filter(light @ np.array(REC709, np.float32), 0.5) + 0.03)
    rise = ndimage.maximum_filter(tone, 13) - ndimage.minimum_filter(tone, 13)
    slope = np.hypot(*(ndimage.sobel(tone, axis) / 8 for axis in (0, 1)))
    strong = rise >= np.quantile(rise, 0.98)
    widths = rise[strong] / ndimage.maximum_filter(slope, 13)[strong]
    return float(np.quantile(widths, 0.2) / np.sqrt(2 * np.pi))


def _light(path: Path) -> Plane:
    plane = iio.imread(path)
    light = srgb_decode(plane / np.iinfo(plane.dtype).max)
    if light.ndim == 2:
        light = np.repeat(light[..., None], 3, axis=2)
    return light[..., :3].astype(np.float32)


# ---------------------------------------------------------------- one camera, one scene


@dataclass(frozen=True)
class Camera:
    """A sensor: full well in electrons, read noise in electrons, blur of its lens in pixels."""

    contract: InputContract
    well: float
    read: float
    blur: float
    shape: tuple[int, int]

    @property
    def top(self) -> float:
        return self.contract.white - self.contract.black

    def sd(self, light: float) -> float:
        """Noise in codes at a level of light, before any tone curve."""
        return float(np.sqrt(self.well * light + self.read**2)) * self.top / self.well


def _contract(bits: int, *, srgb: bool) -> InputContract:
    black = 0.0 if srgb else float(2 ** (bits - 5))
    return InputContract(f"Mono{bits}", black, 2.0**bits - 1, "srgb" if srgb else "linear")


def draw_camera(draw: np.random.Generator) -> Camera:
    """8 bits (half of them sRGB-coded), 10 or 12; 3 000 to 30 000 electrons, 3 to 15 of read
    noise; a lens blur of 0.3 to 0.8 px beyond what reducing leaves."""
    bits = int(draw.choice([8, 8, 10, 12]))
    contract = _contract(bits, srgb=bits == 8 and draw.random() < 0.5)
    well = float(np.exp(draw.uniform(np.log(3000), np.log(30000))))
    read = float(np.exp(draw.uniform(np.log(3), np.log(15))))
    shape = SIZES[draw.integers(len(SIZES))]
    return Camera(contract, well, read, float(draw.uniform(0.3, 0.8)), shape)


def scenes(photos: list[Plane], camera: Camera, count: int, draw: np.random.Generator):
    """Crops of light (h, w, 3), each photograph as rarely as can be, never one place twice."""
    h, w = camera.shape
    fits = [p for p in photos if _fit(p, h, w) >= LEAST_SCALE]
    order = [int(k) for _ in range(count) for k in draw.permutation(len(fits))][:count]
    made: list[Plane] = []
    seen: dict[int, list[tuple[float, float]]] = {}
    for k in order:
        plane = fits[k]
        scale = draw.uniform(LEAST_SCALE, min(2.5, _fit(plane, h, w)))
        room = np.array(plane.shape[:2]) - np.floor(scale * np.array([h, w])) - 1
        spots = draw.uniform(0, 1, (32, 2)) * np.maximum(room, 0)
        spot = max(spots, key=lambda s: _apart(s, seen.get(k, [])))
        seen.setdefault(k, []).append(tuple(spot))
        crop = reduced(plane, spot, scale, (h, w))
        # a place that was seen before is turned, so that it is another picture
        turn = len(seen[k]) - 1
        made.append(crop[:: -1 if turn & 2 else 1, :: -1 if turn & 1 else 1])
    return made


def _fit(plane: Plane, h: int, w: int) -> float:
    return min((plane.shape[0] - 1) / h, (plane.shape[1] - 1) / w)


def _apart(spot, others) -> float:
    return min((float(np.hypot(*np.subtract(spot, o))) for o in others), default=0.0)


def reduced(plane: Plane, corner, scale: float, shape: tuple[int, int]) -> Plane:
    """A crop at a coarser scale: low-pass first, then cubic convolution between the samples."""
    h, w = shape
    pad = 8
    top = np.maximum(np.floor(corner).astype(int) - pad, 0)
    end = np.ceil(np.asarray(corner) + scale * np.array([h, w])).astype(int) + pad
    part = plane[top[0] : end[0], top[1] : end[1]]
    part = ndimage.gaussian_filter(part, (0.45 * scale, 0.45 * scale, 0))
    y, x = np.asarray(corner) - top
    move = np.array([[scale, 0, x], [0, scale, y]])
    flags = cv2.INTER_CUBIC | cv2.WARP_INVERSE_MAP
    return cv2.warpAffine(part, move, (w, h), flags=flags, borderMode=cv2.BORDER_REFLECT).clip(0, 1)


# ---------------------------------------------------------------- a folder


@dataclass
class Folder:
    """What happens to frames on their way, in this order; each step takes (plane, frame index).

    Parameters
    ----------
    light : on linear light (h, w, 3)
    expose : light to codes above black, not rounded
    codes : on those, before any tone curve
    tones : after the tone curve
    file : on whole codes
    touched : frames that carry the mark, where it is theirs alone
    note, spots, grid : which way, how many and where
    """

    camera: Camera
    draw: np.random.Generator
    scenes: list[Plane]
    exposure: np.ndarray
    light: Callable[[Plane, int], Plane] = lambda x, _: x
    expose: Callable[[Plane, int], Plane] | None = None
    codes: Callable[[Plane, int], Plane] = lambda x, _: x
    tones: Callable[[Plane, int], Plane] = lambda x, _: x
    file: Callable[[Plane, int], Plane] = lambda x, _: x
    touched: set[int] = field(default_factory=set)
    note: str = ""
    spots: int = 0
    grid: tuple[int, int] | None = None

    def sensor(self, light: Plane) -> Plane:
        """Codes above black of light at each pixel: photons, read noise."""
        camera = self.camera
        electrons = self.draw.poisson(np.maximum(camera.well * light, 0))
        electrons = electrons + camera.read * self.draw.standard_normal(light.shape)
        return electrons * camera.top / camera.well

    def frame(self, i: int) -> Frame:
        camera, contract = self.camera, self.camera.contract
        light = self.light(self.exposure[i] * self.scenes[i], i)
        light = ndimage.gaussian_filter(light, (camera.blur, camera.blur, 0))
        if self.expose is not None:
            codes = self.expose(light, i)
        else:
            codes = self.sensor(light @ np.array(REC709))
        codes = self.codes(codes, i)
        if contract.transfer == "srgb":
            codes = camera.top * srgb_encode(np.clip(codes / camera.top, 0, 1))
        codes = self.tones(codes, i) + contract.black
        codes = self.file(_whole(codes, contract), i)
        return Frame(f"{i:02d}.png", _whole(codes, contract), contract)

    def frames(self) -> list[Frame]:
        return [self.frame(i) for i in range(len(self.scenes))]


def _whole(codes: Plane, contract: InputContract) -> Plane:
    top = 2**contract.format.bits - 1
    return np.clip(np.round(codes), 0, top).astype(contract.format.dtype)


@dataclass(frozen=True)
class Clean:
    """A camera and its scenes, to be copied into one clean and many tampered folders."""

    camera: Camera
    scenes: list[Plane]
    exposure: np.ndarray
    index: int
    side: str

    def folder(self, kind: str = "clean") -> Folder:
        """A copy with the mark ``kind``, a name in TAMPER, or none."""
        camera = self.camera
        if kind in ONLY_8_BIT and camera.contract.format.bits != 8:
            camera = replace(camera, contract=_contract(8, srgb=False))
        draw = rng(self.index, "marks", self.side, kind)
        made = Folder(camera, draw, list(self.scenes), self.exposure.copy())
        if kind != "clean":
            TAMPER[kind](made)
        return made


def clean(photos: list[Plane], index: int, side: str) -> Clean:
    """The ``index``-th folder of one half's photographs, 8 to 12 frames."""
    draw = rng(index, "marks", side)
    camera = draw_camera(draw)
    count = int(draw.integers(8, 13))
    exposure = draw.uniform(0.5, 0.9, count)
    return Clean(camera, scenes(photos, camera, count, draw), exposure, index, side)


# ---------------------------------------------------------------- marks


def block_grid(f: Folder) -> None:
    """JPEG of quality 50 to 90, 8 bits, the grid at any of its 64 places."""
    quality = int(f.draw.integers(50, 91))
    y, x = f.draw.integers(0, 8, 2)

    def file(codes: Plane, _: int) -> Plane:
        return jpeg(np.pad(codes, ((y, 0), (x, 0)), mode="reflect"), quality)[y:, x:]

    f.file, f.grid = file, (int(-y % 8), int(-x % 8))


def jpeg(codes: Plane, quality: int) -> Plane:
    """What a grey JPEG file keeps."""
    data = iio.imwrite("<bytes>", codes, extension=".jpg", quality=quality)
    return iio.imread(io.BytesIO(data), extension=".jpg")


def row_noise(f: Folder, axis: int = 0) -> None:
    """Offsets of rows, anew in every frame, of 0.3 to 1 of the pixels' noise at mid-grey."""
    sd = f.draw.uniform(0.3, 1.0) * f.camera.sd(0.5)
    shape = (f.camera.shape[0], 1) if axis == 0 else (1, f.camera.shape[1])
    fixed = f.draw.standard_normal(shape)

    def codes(plane: Plane, _: int) -> Plane:
        # rows differ anew in every frame, columns stay
        return plane + sd * (f.draw.standard_normal(shape) if axis == 0 else fixed)

    f.codes = codes


def column_noise(f: Folder) -> None:
    """The same for columns, one set of offsets for all frames."""
    row_noise(f, axis=1)


def interpolation_lattice(f: Folder) -> None:
    """A Bayer sensor's colours interpolated: bilinear, or along edges."""
    y, x = f.draw.integers(0, 2, 2)  # where red lies; its opposite is blue
    way = str(f.draw.choice(["", "_EA"]))
    code = getattr(cv2, f"COLOR_Bayer{_named(y, x)}2RGB{way}")

    def expose(light: Plane, _: int) -> Plane:
        channel = np.ones(light.shape[:2], int)
        channel[y::2, x::2] = 0
        channel[1 - y :: 2, 1 - x :: 2] = 2
        raw = f.sensor(np.take_along_axis(light, channel[..., None], 2)[..., 0])
        # in 16-bit codes with room below black
        step = f.camera.top / 40000
        whole = np.clip(np.round(raw / step) + 8000, 0, 65535).astype(np.uint16)
        return (cv2.cvtColor(whole, code) @ np.array(REC709) - 8000) * step

    f.expose = expose


def _named(y: int, x: int) -> str:
    """Name of a pattern by the colours at (1, 1) and (1, 2), as the library has it."""
    row = ["R" if (r % 2, c % 2) == (y, x) else "B" if (r % 2 != y and c % 2 != x) else "G"
           for r, c in ((1, 1), (1, 2))]  # fmt: skip
    return "".join(row)


def clipped_levels(f: Folder) -> None:
    """The exposure at which 2 to 10 % of all pixels clip."""
    light = np.stack(
        [e * (s @ np.array(REC709)) for e, s in zip(f.exposure, f.scenes, strict=True)]
    )
    f.exposure = f.exposure / np.quantile(light, 1 - f.draw.uniform(0.02, 0.1))


def missing_levels(f: Folder) -> None:
    """A file's codes stretched by 1.1 to 1.6."""
    stretch = f.draw.uniform(1.1, 1.6)
    low = int(f.draw.integers(0, 12))
    f.file = lambda codes, _: np.round((codes.astype(float) - low) * stretch)


def posterised_depth(f: Folder) -> None:
    """1 to 3 of the bits lost."""
    step = 2 ** int(f.draw.integers(1, 4))
    f.file = lambda codes, _: codes // step * step


def sharpening(f: Folder) -> None:
    """An unsharp mask of amount 1 and radius 1 px, on noise as the sensor gave it: 1 000 to
    4 000 electrons, so that it stands above what grain the photographs brought along."""
    well = float(np.exp(f.draw.uniform(np.log(1000), np.log(4000))))
    f.camera = replace(f.camera, well=well)
    f.tones = lambda codes, _: codes + (codes - ndimage.gaussian_filter(codes, 1.0))


def fixed_spots(f: Folder) -> None:
    """3 to 12 pixels a frame that are hot (a tenth to a half of the range too bright), dead (a
    half to nothing of the light), or under dust (Gaussian shadows of 1.5 to 3 px, 25 to 50 %)."""
    h, w = f.camera.shape
    count = int(f.draw.integers(3, 13))
    at = np.stack([f.draw.integers(12, h - 12, count), f.draw.integers(12, w - 12, count)], 1)
    way = str(f.draw.choice(["hot", "dead", "dust"]))
    amount = f.draw.uniform(0, 1, count)
    add, keep = np.zeros((h, w)), np.ones((h, w))
    for (y, x), a in zip(at, amount, strict=True):
        if way == "hot":
            add[y, x] = (0.1 + 0.4 * a) * f.camera.top
        elif way == "dead":
            keep[y, x] = 0.5 * a
        else:
            yy, xx = np.mgrid[:h, :w]
            size = f.draw.uniform(1.5, 3.0)
            keep *= 1 - (0.25 + 0.25 * a) * np.exp(-((yy - y) ** 2 + (xx - x) ** 2) / 2 / size**2)
    f.note, f.spots = way, count
    f.codes = lambda codes, _: codes * keep + add


def vignetting(f: Folder) -> None:
    """Corners that lose 40 to 60 % of the light, by the fourth power of the cosine."""
    h, w = f.camera.shape
    lost = f.draw.uniform(0.4, 0.6)
    y, x = np.mgrid[:h, :w]
    r2 = ((y - (h - 1) / 2) ** 2 + (x - (w - 1) / 2) ** 2) / (((h - 1) ** 2 + (w - 1) ** 2) / 4)
    # the fourth power of the cosine, at the angle that loses this much in the corners
    tangent = (1 - lost) ** -0.5 - 1
    shade = 1 / (1 + tangent * r2) ** 2
    f.light = lambda light, _: light * shade[..., None]


def near_duplicates(f: Folder) -> None:
    """1 to 3 scenes taken again: shifted by up to 2 px, the exposure up to 10 % off."""
    order = f.draw.permutation(len(f.scenes))
    for k in range(int(f.draw.integers(1, 4))):
        first, again = order[2 * k], order[2 * k + 1]
        shift = f.draw.uniform(-2, 2, 2)
        f.scenes[again] = ndimage.shift(f.scenes[first], (*shift, 0), order=1, mode="nearest")
        f.exposure[again] = f.exposure[first] * f.draw.uniform(0.9, 1.1)
        f.touched.add(int(max(first, again)))


def blurred_frames(f: Folder) -> None:
    """1 to 3 frames blurred by a further 2 to 3.5 px (one standard deviation)."""
    chosen = f.draw.choice(len(f.scenes), int(f.draw.integers(1, 4)), replace=False)
    sigma = f.draw.uniform(2.0, 3.5, len(f.scenes))
    f.touched = {int(i) for i in chosen}
    f.light = lambda light, i: (
        ndimage.gaussian_filter(light, (sigma[i], sigma[i], 0)) if i in f.touched else light
    )


TAMPER: dict[str, Callable[[Folder], None]] = {
    "block_grid": block_grid,
    "row_noise": row_noise,
    "column_noise": column_noise,
    "interpolation_lattice": interpolation_lattice,
    "clipped_levels": clipped_levels,
    "missing_levels": missing_levels,
    "sharpening": sharpening,
    "posterised_depth": posterised_depth,
    "fixed_spots": fixed_spots,
    "vignetting": vignetting,
    "near_duplicates": near_duplicates,
    "blurred_frames": blurred_frames,
}
ONLY_8_BIT = {"block_grid"}
