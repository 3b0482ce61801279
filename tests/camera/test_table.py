import numpy as np
import pytest
from scipy import stats

from patchlab.camera import default_kind, make_table, noise_of_table
from patchlab.camera.table import code_probabilities, sd_of
from patchlab.errors import InputError, UsageError
from patchlab.types import InputContract, NoiseModel

CAMERAS = [
    (8, 0.5, 1.0), (8, 2.0, 1.5), (8, 0.1, 1.0), (8, 0.5, 0.3), (10, 0.25, 2.0), (10, 1.0, 3.0),
    (10, 0.05, 1.2), (12, 0.25, 2.5), (12, 1.0, 6.0), (12, 2.0, 1.0), (16, 1.0, 3.0),
]  # fmt: skip


def contract_of(bits, pedestal=True, transfer="linear"):
    return InputContract(f"Mono{bits}", 2.0 ** (bits - 4) if pedestal else 0.0, 2**bits - 1,
                         transfer)  # fmt: skip


def law(gain, read):
    return NoiseModel(True, gain=gain, gain_error=0.0, read_noise=read, read_noise_error=0.0)


def levels_of(contract, low, high, count=60):
    span = contract.white - contract.black
    return contract.black + span * np.geomspace(low, high, count)


@pytest.mark.parametrize("pedestal", [True, False])
@pytest.mark.parametrize(("bits", "gain", "read"), CAMERAS)
def test_noise_has_unit_sd_at_every_level(bits, gain, read, pedestal):
    contract, noise = contract_of(bits, pedestal), law(gain, read)
    table = make_table("stabilised", contract, noise)
    sd = noise_of_table(table, noise, levels_of(contract, 0.01, 0.85))
    limit = 0.06 if bits == 8 and gain > 1 else 0.03
    assert np.abs(sd - 1).max() < limit
    assert (np.diff(table.values) > 0).all()
    assert table.noise_sd == 1.0
    assert table.values[int(contract.black)] == pytest.approx(0, abs=1e-4)


def test_unit_sd_by_drawing_pixels():
    contract, noise = contract_of(10), law(1.0, 3.0)
    table = make_table("stabilised", contract, noise)
    rng = np.random.default_rng(4)
    for electrons in (10, 100, 700):
        codes = rng.poisson(electrons, 200_000) + 3 * rng.standard_normal(200_000)
        codes = np.clip(np.round(codes + contract.black), 0, 1023).astype(np.uint16)
        assert table.apply(codes).std() == pytest.approx(1.0, abs=0.015)


def test_exact_probabilities_agree_with_drawn_pixels_and_sum_to_one():
    contract, noise = contract_of(8), law(2.0, 1.5)
    for electrons in (0.0, 3.0, 60.0, 118.0):
        level = contract.black + 2 * electrons
        codes, p = code_probabilities(noise, contract, level)
        assert p.sum() == pytest.approx(1)
        rng = np.random.default_rng(1)
        drawn = 2 * rng.poisson(electrons, 300_000) + 1.5 * rng.standard_normal(300_000)
        drawn = np.clip(np.round(drawn + contract.black), 0, 255)
        assert p @ codes == pytest.approx(drawn.mean(), abs=0.15)
        spread = np.sqrt(p @ (codes - p @ codes) ** 2)
        assert spread == pytest.approx(drawn.std(), rel=0.01)


def test_the_gaussian_above_a_thousand_electrons_joins_the_exact_law():
    contract, noise = contract_of(12), law(1.0, 6.0)
    for step, electrons in ((-1, 999.9), (1, 1000.1)):
        codes, p = code_probabilities(noise, contract, contract.black + electrons)
        assert np.sqrt(p @ (codes - p @ codes) ** 2) == pytest.approx(
            np.sqrt(electrons + 36 + 1 / 12), rel=1e-3
        ), step


def test_far_from_black_the_table_is_the_generalised_anscombe_transform():
    # Foi et al. 2008: 2/a sqrt(a z + 3 a^2 / 8 + b), up to a constant
    contract, noise = contract_of(12), law(0.25, 2.5)
    table = make_table("stabilised", contract, noise)
    z = np.arange(200, 3000)
    b = 2.5**2 + 1 / 12
    closed = 2 / 0.25 * np.sqrt(0.25 * z + 0.375 * 0.25**2 + b)
    values = table.values[z + int(contract.black)]
    offset = values - closed
    assert np.ptp(offset) < 0.01 * np.ptp(closed)


def test_a_bent_law_is_followed_too():
    contract = contract_of(8, pedestal=False, transfer="srgb")
    levels = np.linspace(5, 250, 24)
    noise = NoiseModel(True, levels=levels, sd=1.5 + 4 * np.exp(-levels / 60))
    table = make_table("stabilised", contract, noise)
    inner = np.linspace(30, 215, 40)
    assert np.abs(noise_of_table(table, noise, inner) - 1).max() < 0.03
    span = table.values[200] - table.values[50]
    fine = np.linspace(50, 200, 3001)
    wanted = np.trapezoid(1 / np.interp(fine, levels, noise.sd), fine)
    assert span == pytest.approx(wanted, rel=0.03)


def test_linear_and_log_tables_do_not_depend_on_depth():
    tables = {b: make_table("linear", InputContract(f"Mono{b}", 0, 2**b - 1), None)
              for b in (8, 16)}  # fmt: skip
    np.testing.assert_allclose(tables[8].values, tables[16].values[::257], rtol=1e-6)
    assert tables[8].values[[0, 255]] == pytest.approx([0, 255])
    coded = make_table("linear", contract_of(8, False, "srgb"), None)
    # IEC 61966-2-1: code 118 is .1811642 of white
    assert coded.values[118] == pytest.approx(255 * 0.1811642, rel=1e-6)
    log = make_table("log", InputContract("Mono8", 0, 255), None)
    assert log.values[[0, 255]] == pytest.approx([0, 255])
    np.testing.assert_allclose(np.diff(np.expm1(log.values / 255 * np.log(256))), 1, atol=1e-2)


@pytest.mark.parametrize("kind", ["identity", "linear", "log"])
def test_the_noise_of_other_tables_is_told_as_well(kind):
    contract, noise = contract_of(12), law(1.0, 6.0)
    table = make_table(kind, contract, noise)
    levels = contract.black + (contract.white - contract.black) * np.linspace(0.05, 0.85, 33)
    slope = np.gradient(table.values.astype(float))
    first_order = np.interp(levels, np.arange(4096), slope) * sd_of(noise, contract, levels)
    assert table.noise_sd == pytest.approx(np.median(first_order), rel=0.02)
    assert make_table(kind, contract, None).noise_sd is None


def test_codes_within_three_sd_of_saturation_are_not_trusted():
    contract, noise = contract_of(12), law(1.0, 6.0)
    low, high = make_table("stabilised", contract, noise).valid_codes
    assert low == 1
    last = np.sqrt(high - contract.black + 36 + 1 / 12)
    assert high + 3 * last <= 4095 < high + 1 + 3 * last + 1
    assert make_table("linear", contract_of(8, False), None).valid_codes == (0, 254)


def test_float_pixels_take_the_root_formula():
    contract = InputContract("float32", 0.0, 1.0)
    noise = law(1 / 4000, 1 / 1000)
    table = make_table("stabilised", contract, noise)
    rng = np.random.default_rng(2)
    for level in (0.05, 0.3, 0.8):
        p = rng.poisson(level * 4000, 200_000) / 4000 + rng.normal(0, 1e-3, 200_000)
        assert table.apply(p.astype(np.float32)).std() == pytest.approx(1, abs=0.02)
    np.testing.assert_allclose(
        noise_of_table(table, noise, np.array([0.05, 0.3, 0.8])), 1, atol=0.02
    )
    for kind in ("linear", "log"):
        with pytest.raises(UsageError, match="float32"):
            make_table(kind, contract, noise)


def test_a_float_root_follows_a_curve_as_well():
    contract = InputContract("float32", 0.0, 1.0)
    levels = np.linspace(0.02, 0.95, 20)
    noise = NoiseModel(True, levels=levels, sd=np.sqrt(levels / 3000 + 1e-6))
    table = make_table("stabilised", contract, noise)
    assert np.abs(noise_of_table(table, noise, levels[2:]) - 1).max() < 0.03


def test_no_noise_law_no_stabilised_table():
    contract = contract_of(8)
    unknown = NoiseModel(False, "not measurable here: all texture")
    for noise in (None, unknown):
        with pytest.raises(InputError, match="--table linear"):
            make_table("stabilised", contract, noise)
        assert default_kind(noise, contract) == "linear"
    assert default_kind(law(1, 1), contract) == "stabilised"
    assert default_kind(None, InputContract("float32", 0, 1)) == "identity"
    with pytest.raises(UsageError, match="unknown table"):
        make_table("cube", contract, None)


def test_poisson_weights_are_scipys():
    # with next to no read noise and a gain of one, the codes are the electrons
    contract = InputContract("Mono8", 0, 255)
    codes, p = code_probabilities(law(1.0, 0.01), contract, 20.0)
    np.testing.assert_allclose(p[:60], stats.poisson.pmf(codes[:60], 20.0), atol=1e-6)
