"""The stand-ins of the bank's tests, for colour too."""

from tests.bank.conftest import stand

__all__ = ["stand"]
