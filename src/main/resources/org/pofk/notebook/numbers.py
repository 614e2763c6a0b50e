from fractions import Fraction
from math import comb
import sys

if hasattr(sys, "set_int_max_str_digits"):
    sys.set_int_max_str_digits(0)  # coefficients may have thousands of digits


def numbers(text):
    """Exact numbers, written with blanks between them."""
    return [Fraction(each) for each in text.split()]


def require(claim, holds):
    """Ends the run where a claim doesn't hold."""
    if not holds:
        raise AssertionError("doesn't hold: " + claim)
    print(claim)
