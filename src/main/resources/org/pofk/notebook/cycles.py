cycle_path = []  # the states of cycle 0, 1, ... as far as stepped, just before and just after what is done


def cycle_of(m):
    """The pairs of states in cycle m."""
    while len(cycle_path) <= m:
        cycle_path.append(stepped(cycle_path[-1][-1][1] if cycle_path else begin, cycle))
    return cycle_path[m]


def over_cycles(c, constant, count, reading):
    """What is read of an output in cycles 0, 1, ...; reading takes its values before and after, step by step."""
    return [reading([read(c, constant, x) for x, _ in cycle_of(m)], [read(c, constant, x) for _, x in cycle_of(m)])
            for m in range(count)]


def mean(before, after):
    return sum(after[:-1]) / (len(after) - 1)


def taking_part(constant):
    """n: the states that moves and actions lead to from where cycles begin, one more for a constant.

    Each matrix of a cycle maps their span into itself, so S does, and by Cayley and Hamilton its characteristic
    polynomial there annihilates what is read of the cycles.
    """
    edges = [(source, target) for matrix in moves + actions for source, target, weight in matrix]
    seen = {i for i, value in enumerate(begin) if value != 0}
    waiting = list(seen)
    while waiting:
        here = waiting.pop()
        for source, target in edges:
            if source == here and target not in seen:
                seen.add(target)
                waiting.append(target)
    return len(seen) + (1 if constant != 0 else 0)


def at_steps(c, constant, steps):
    """What is read at the end of some steps, ascending, after what is done there."""
    values, x, k = [], start, 0
    for last in steps:
        while k < last:
            k += 1
            here = preamble[k - 1] if k <= len(preamble) else cycle[(k - len(preamble) - 1) % len(cycle)]
            x = stepped(x, [here])[-1][1]
        values.append(read(c, constant, x))
    return values


def stretch(c, constant, pairs, first, last):
    """What is read after step first of a cycle, and before what is done at the steps behind it up to last."""
    return [read(c, constant, pairs[first][1])] + [read(c, constant, x) for x, _ in pairs[first + 1:last + 1]]
