def solved(rows, right):
    """The x for which rows x = right, by Gauss and Jordan."""
    rows = [list(row) + [value] for row, value in zip(rows, right)]
    for i in range(len(rows)):
        pivot = next(j for j in range(i, len(rows)) if rows[j][i] != 0)
        rows[i], rows[pivot] = rows[pivot], rows[i]
        rows[i] = [a / rows[i][i] for a in rows[i]]
        for j in range(len(rows)):
            if j != i and rows[j][i] != 0:
                rows[j] = [a - rows[j][i] * b for a, b in zip(rows[j], rows[i])]
    return [row[-1] for row in rows]


def seen_from_before(matrix, v):
    """What is expected of v after the moves of a matrix, by the state before them."""
    expected = [Fraction(0)] * len(v)
    for source, target, weight in matrix:
        expected[source] += weight * v[target]
    return expected


def backwards(moments, into, h, u, w):
    """From what holds behind some steps what holds before them; each step between adds one to T."""
    for move, done in reversed(moments):
        vectors = [h, [a + b for a, b in zip(u, h)], [a + 2 * b + c for a, b, c in zip(w, u, h)]]
        for action in reversed(done):
            vectors = [seen_from_before(actions[action], v) for v in vectors]
        if move is not None:
            vectors = [seen_from_before(moves[move], v) for v in vectors]
        h = vectors[0]
        u, w = [[Fraction(0) if i in into else a for i, a in enumerate(v)] for v in vectors[1:]]
    return h, u, w


def first_entrance(into, avoiding):
    """For each state at step 0: the probability of ever entering, and the means of T and its square where it is."""
    size = len(states)
    unit = [[Fraction(int(i == j)) for j in range(size)] for i in range(size)]
    s = [stepped(unit[i], cycle)[-1][1] for i in range(size)]  # from i to j over a cycle
    waiting, grown = set(into), True
    while grown:  # states from which the set is reached
        more = {i for i in range(size) if any(s[i][j] != 0 for j in waiting)} - set(avoiding)
        grown = not more <= waiting
        waiting |= more
    waiting = sorted(waiting - set(into))
    system = [[Fraction(int(i == j)) - s[i][j] for j in waiting] for i in waiting]
    zero = [Fraction(0)] * size

    def spread(x):
        v = list(zero)
        for i, value in zip(waiting, x):
            v[i] = value
        return v

    h = spread(solved(system, [sum(s[i][j] for j in into) for i in waiting]))
    h = [Fraction(1) if i in into else a for i, a in enumerate(h)]
    u = spread(solved(system, [backwards(cycle, into, h, zero, zero)[1][i] for i in waiting]))
    w = spread(solved(system, [backwards(cycle, into, h, u, zero)[2][i] for i in waiting]))
    return backwards(preamble, into, h, u, w)


def moments_of(h, u, w):
    """Probability, and mean and variance given that it happens, from the start."""
    probability, first, second = [sum(a * b for a, b in zip(start, v)) for v in (h, u, w)]
    if probability == 0:
        return [probability]
    return [probability, first / probability, second / probability - (first / probability) ** 2]
