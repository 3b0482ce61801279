"""The note beside the test vectors: what a port has to give, and how."""

from __future__ import annotations

from patchlab.types import Bank


def readme(bank: Bank) -> str:
    """``vectors/README.md`` of a bank."""
    return _README.format(border=bank.border, name=bank.name, colours=_colours(bank))


def _colours(bank: Bank) -> str:
    """What a port of a colour bank has to know; nothing for one plane."""
    form = bank.contract.format
    if form.planes == 1:
        return ""
    how = f"(rows, columns, {form.planes})" if form.interleaved else "a mosaic of 2 x 2 cells"
    mix = "" if bank.mix is None else (
        " (`mix.npy` (planes, samples): a working plane is the weighted sum of a pixel's samples "
        "after the table)"
    )  # fmt: skip
    return (
        f" Here pixels have the samples {form.colours}: a picture is {how}, and a response is the "
        f"sum over the working planes{mix}."
    )


_README = """\
# Test vectors of the bank {name}

A port is right when, for every case of `cases.json`,

    |your response - expected| <= tolerance of that kernel

at every pixel, the rim included. All arrays are little-endian `.npy` files in row-major
order; any language can read them (a short text header, then the numbers).

- `*.image.npy`: the picture, (rows, columns), in the bank's own pixels.{colours}
- `*.responses.npy`: float64 (kernels, rows, columns), kernels in the order of `cases.json`.
- `*.counts.npy`: int16 (kernels, rows, columns), where the bank has a fixed-point part. A
  fixed-point port must give these very numbers.
- `*.strength.npy`, `*.orientation.npy`: (scales, rows, columns), where the bank has them.
  Orientation is the number of the strongest orientation. Where two
  orientations are within twice the strength's tolerance of each other, either may win.
- `edgels_*.npy`, where the bank finds edges: a picture, and float64 rows x, y, theta, strength,
  sd, scale, kind, width of the edge elements that `cases.json` lists with their thresholds. A
  port finds the same elements, in the same order, within the tolerance that stands there.

How to compute them:

1. Put each pixel through the input table (`input_table.npy`: working value = table[code];
   for float32 pixels the formula in `bank.json`).
2. Extend the table's output (not the pixels) by the border rule `{border}`.
3. Correlate, without flipping the kernel, in float32 or better:
   `r(y, x) = sum over j, i of k(j, i) * p(y + j - c, x + i - c)`, c the kernel's middle.

Work through the cases in this order. `impulse` shows a flipped kernel or a shifted anchor at
once: the answer around the impulse is the kernel turned by half a turn. `corners` shows a
wrong border. `noise` shows everything else. `worst` holds the largest products. `wide` and
`checkerboard` show errors of tiles and of pictures barely larger than the kernels.
"""
