def inside(q):
    """Whether all roots of q lie inside the unit circle, decided exactly (Schur's reduction)."""
    q = trimmed(q)
    while len(q) > 1:
        if abs(q[0]) >= abs(q[-1]):
            return False
        q = [a / q[-1] for a in q]
        q = trimmed([a - q[0] * b for a, b in zip(q, reversed(q))][1:])
    return True


def long_run(parts, period):
    """What the closed form approaches at k = 0 ... period - 1 modulo the period."""
    values = [Fraction(0)] * period
    for q, coefficients in parts:
        if modulo([Fraction(0)] * period + [Fraction(1)], q) == [1]:  # roots of unity
            if len(coefficients) > 1:
                raise AssertionError("a repeated pole on the unit circle")
            values = [a + b for a, b in zip(values, part(q, coefficients, period))]
        elif not inside(q):
            raise AssertionError("a pole outside or on the unit circle")
    return values
