"""Kernel fits to a bank: chosen, planned, applied, written, and the slow obvious oracle."""

from patchlab.bank.apply import responses, strength
from patchlab.bank.choose import BankSettings, choose_bank, compare_banks
from patchlab.bank.colour import colour_bank, colour_bank_as_learned, mosaic_bank, one_plane
from patchlab.bank.disk import bank_files, read_bank, write_bank
from patchlab.bank.given import bank_as_learned, bank_from_taps
from patchlab.bank.native import NativeBank, as_edgels, load_native
from patchlab.bank.plan import describe, make_plan
from patchlab.bank.reference import responses as exact_responses
from patchlab.bank.reference import strength as exact_strength

__all__ = [
    "BankSettings",
    "NativeBank",
    "as_edgels",
    "bank_as_learned",
    "bank_files",
    "bank_from_taps",
    "choose_bank",
    "colour_bank",
    "colour_bank_as_learned",
    "compare_banks",
    "describe",
    "exact_responses",
    "exact_strength",
    "load_native",
    "make_plan",
    "mosaic_bank",
    "one_plane",
    "read_bank",
    "responses",
    "strength",
    "write_bank",
]
