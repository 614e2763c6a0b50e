path = [start]  # x(0), x(1), ... as far as computed


def step(x):
    """The state one step later."""
    after = [Fraction(0)] * len(x)
    for source, target, weight in moves:
        after[target] += weight * x[source]
    return after


def terms(c, constant, count):
    """y(0), y(1), ... of y(k) = c x(k) + constant."""
    while len(path) < count:
        path.append(step(path[-1]))
    return [sum(a * b for a, b in zip(c, x)) + constant for x in path[:count]]


def along(edges, places):
    """The places that are reached along the edges."""
    seen, waiting = set(places), list(places)
    while waiting:
        here = waiting.pop()
        for source, target in edges:
            if source == here and target not in seen:
                seen.add(target)
                waiting.append(target)
    return seen


def annihilated_by_degree(c, constant):
    """n: the states that the start reaches and that reach what is read, one more for a constant.

    By Cayley and Hamilton the characteristic polynomial of their matrix annihilates y(k).
    """
    edges = [(source, target) for source, target, weight in moves]
    reached = along(edges, [i for i, value in enumerate(start) if value != 0])
    read = along([(target, source) for source, target in edges], [i for i, value in enumerate(c) if value != 0])
    return len(reached & read) + (1 if constant != 0 else 0)
