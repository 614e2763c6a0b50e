def satisfies(recurrence, y, windows):
    """Whether the sum of D_i y(k+i) is zero at k = 0 ... windows - 1."""
    return all(sum(d * y[k + i] for i, d in enumerate(recurrence)) == 0 for k in range(windows))


def expanded(numerator, denominator, count):
    """The first coefficients of 1, 1/z, 1/z^2, ... in numerator / denominator, the denominator monic."""
    degree, y = len(denominator) - 1, []
    for k in range(count):
        value = numerator[degree - k] if 0 <= degree - k < len(numerator) else Fraction(0)
        y.append(value - sum(denominator[degree - i] * y[k - i] for i in range(1, min(k, degree) + 1)))
    return y


def traces(q):
    """The sums of the powers 0, 1, ... of the roots of q, by Newton's identities; q is monic."""
    degree = len(q) - 1
    sums = [Fraction(degree)]
    for k in range(1, degree):
        sums.append(-k * q[degree - k] - sum(q[degree - i] * sums[k - i] for i in range(1, k)))
    return sums


def part(q, coefficients, count):
    """What q adds at k = 0, 1, ...: binomial(k, p) times the trace of R_p x^(k-p) in Q[x]/(q), over all p."""
    weights, values = traces(q), [Fraction(0)] * count
    for p, coefficient in enumerate(coefficients):
        if isinstance(coefficient, tuple):  # a quotient, not yet reduced
            coefficient = times(coefficient[0], inverse(coefficient[1], q))
        power = modulo(coefficient, q)
        for k in range(p, count):
            values[k] += comb(k, p) * sum(w * a for w, a in zip(weights, power))
            power = modulo([Fraction(0)] + power, q)
    return values


def closed_form(impulses, parts, count):
    """The closed form at k = 0, 1, ..., exactly."""
    values = padded(impulses, count)[:count]
    for q, coefficients in parts:
        values = [a + b for a, b in zip(values, part(q, coefficients, count))]
    return values
