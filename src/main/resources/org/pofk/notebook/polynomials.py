# A polynomial is the list of its coefficients by ascending power; zero is the empty list.


def trimmed(p):
    p = list(p)
    while p and p[-1] == 0:
        p.pop()
    return p


def times(p, q):
    product = [Fraction(0)] * (len(p) + len(q))
    for i, a in enumerate(p):
        for j, b in enumerate(q):
            product[i + j] += a * b
    return trimmed(product)


def divided(p, q):
    """Quotient and remainder."""
    rest, quotient = trimmed(p), [Fraction(0)] * max(len(p) - len(q) + 1, 0)
    while len(rest) >= len(q):
        shift, factor = len(rest) - len(q), rest[-1] / q[-1]
        quotient[shift] = factor
        for i, a in enumerate(q):
            rest[shift + i] -= factor * a
        rest = trimmed(rest)
    return trimmed(quotient), rest


def modulo(p, q):
    return divided(p, q)[1]


def inverse(p, q):
    """The inverse of p modulo q, by Euclid."""
    (a, u), (b, v) = (q, []), (modulo(p, q), [Fraction(1)])
    while len(b) > 1:
        quotient, rest = divided(a, b)
        product = times(quotient, v)
        width = max(len(u), len(product))
        difference = [x - y for x, y in zip(padded(u, width), padded(product, width))]
        (a, u), (b, v) = (b, v), (rest, trimmed(difference))
    if not b:
        raise AssertionError("a denominator that vanishes at a pole")
    return [x / b[0] for x in v]


def padded(p, width):
    return list(p) + [Fraction(0)] * (width - len(p))


def multiplied_out(factors):
    product = [Fraction(1)]
    for q, multiplicity in factors:
        for _ in range(multiplicity):
            product = times(product, q)
    return product
