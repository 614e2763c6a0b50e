def delta(k):
    return 1 if k == 0 else 0


def binomial(k, p):
    return comb(k, p)


def agrees(formula, y, last, bound):
    """Whether a formula is within the bound at k = 0 ... last; roots and cosines are computed to 100 digits."""
    for k in range(last + 1):
        value = formula(k)
        computed = Fraction(1, 10 ** 60) * max(1, abs(y[k])) if not isinstance(value, (int, Fraction)) else 0
        if abs(Fraction(value) - y[k]) > bound + computed:
            return False
    return True
