def applied(matrix, x):
    """A matrix, as a list of from, to and weight, times the state."""
    after = [Fraction(0)] * len(x)
    for source, target, weight in matrix:
        after[target] += weight * x[source]
    return after


def stepped(x, moments):
    """The states just before and just after what is done in each of some steps."""
    pairs = [(x, x)]
    for move, done in moments:
        before = x if move is None else applied(moves[move], x)
        x = before
        for action in done:
            x = applied(actions[action], x)
        pairs.append((before, x))
    return pairs


def limit(x, cycles):
    """What S^(m * cycles) x tends to, exactly: r(M) x / r(1), where (x - 1) r(x) annihilates x and r's roots lie inside.

    Ends the run where they don't.
    """
    powers, rows = [x], []
    while True:
        row, combination = list(powers[-1]), [Fraction(0)] * (len(powers) - 1) + [Fraction(1)]
        for pivot, other, made in rows:
            factor = row[pivot] / other[pivot]
            if factor != 0:
                row = [a - factor * b for a, b in zip(row, other)]
                combination = [a - factor * b for a, b in zip(combination, padded(made, len(combination)))]
        place = next((i for i, a in enumerate(row) if a != 0), None)
        if place is None:
            break
        rows.append((place, row, combination))
        powers.append(stepped(powers[-1], cycle * cycles)[-1][1])
    rest, remainder = divided(combination, [Fraction(-1), Fraction(1)])
    if remainder:
        rest = combination  # one is no root: it tends to zero
    require("all roots but one of the polynomial that annihilates the state where cycles begin lie inside",
            inside(rest) if len(rest) > 1 else True)
    if remainder:
        return [Fraction(0)] * len(x)
    total = sum(rest)
    return [sum(r * p[i] for r, p in zip(rest, powers)) / total for i in range(len(x))]


def read(c, constant, x):
    return sum(a * b for a, b in zip(c, x)) + constant


def holds(text, values):
    """Whether each value is the one stated, or lies in the interval stated as low..high."""
    stated = [each.split("..") for each in text.split()]
    return len(stated) == len(values) and all(
        Fraction(each[0]) <= value <= Fraction(each[-1]) for each, value in zip(stated, values))


def summary(before, after):
    """The mean after what is done, the highest and the lowest value on either side."""
    seen = before[1:] + after[:-1]
    return [sum(after[:-1]) / (len(after) - 1), max(seen), min(seen)]
