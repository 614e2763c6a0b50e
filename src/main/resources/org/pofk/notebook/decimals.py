from decimal import Decimal, getcontext

getcontext().prec = 100


def arctan(x):
    if abs(x) > Decimal("0.1"):
        return 2 * arctan(x / (1 + (1 + x * x).sqrt()))
    total, power, i = Decimal(0), x, 1
    while power != 0 and abs(power) > Decimal("1e-110"):
        total += power / i
        power, i = -power * x * x, i + 2
    return total


pi = 4 * arctan(Decimal(1))


def arccos(x):
    return pi if x == -1 else 2 * arctan(((1 - x) / (1 + x)).sqrt())


def cos(x):
    x = Decimal(x) % (2 * pi)
    total, term, i = Decimal(0), Decimal(1), 0
    while abs(term) > Decimal("1e-110"):
        total += term
        term, i = -term * x * x / ((i + 1) * (i + 2)), i + 2
    return total


def sin(x):
    return cos(x - pi / 2)


def sqrt(x):
    return Decimal(x).sqrt()
