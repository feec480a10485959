"""The value of a tree: at points, in 80-digit arithmetic (mpmath), or exactly, in SymPy. One evaluator, two sets of numbers.

A scalar is a plain number; other values are tagged: ("m", rows), ("k", two), ("b", two), ("set", ...), ("t", ...).
"""

from fractions import Fraction

import mpmath
import sympy

mpmath.mp.dps = 80


class Points:
    """Numbers of mpmath at one point; `env` maps names to values."""

    def __init__(self, env):
        self.env = env
        self.i = mpmath.mpc(0, 1)
        self.pi = mpmath.pi * 1

    def num(self, f):
        return mpmath.mpf(f.numerator) / f.denominator

    def fn(self, name, args):
        m = mpmath
        table = {"ln": m.log, "abs": lambda z: abs(z), "conj": m.conj, "Re": m.re, "Im": m.im, "atan2": lambda y, x: m.atan2(m.re(y), m.re(x))}
        return (table.get(name) or getattr(m, name))(*args)

    def sqrt(self, x):
        return mpmath.sqrt(x)

    even_root = sqrt

    def tidy(self, x):
        return mpmath.mpf(0) if abs(x) < mpmath.mpf(10) ** -70 else x

    def conj(self, x):
        return mpmath.conj(x)


class Exact:
    """Numbers of SymPy; `env` maps names to SymPy symbols with their assumptions."""

    def __init__(self, env):
        self.env = env
        self.i = sympy.I
        self.pi = sympy.pi

    def num(self, f):
        return sympy.Rational(f.numerator, f.denominator)

    def fn(self, name, args):
        table = {"ln": sympy.log, "abs": sympy.Abs, "conj": sympy.conjugate, "Re": sympy.re, "Im": sympy.im}
        return (table.get(name) or getattr(sympy, name))(*args)

    def sqrt(self, x):
        return sympy.sqrt(sympy.factor(x))

    def even_root(self, x):
        """Either square root: for even functions only."""
        return sympy.powdenest(sympy.sqrt(sympy.factor(x)), force=True)

    def tidy(self, x):
        return sympy.simplify(x)

    def conj(self, x):
        return sympy.conjugate(x)


def evaluate(n, b):
    """The value of node `n` with the numbers `b` (Points or Exact)."""
    k, a = n.k, n.a
    if k in ("num", "lit"):
        return b.num(a[-1])
    if k == "sym":
        return b.env[a[0]]
    if k in ("def", "raw"):
        return evaluate(a[1], b)
    if k == "const":
        return a[0]
    if k == "list":
        found = [evaluate(x, b) for x in a[0]]
        return ("k" if len(found) == 2 else "t", found)
    if k == "euler":
        return b.fn("exp", [b.num(Fraction(1))])
    if k in ("i", "pi"):
        return getattr(b, k)
    if k == "hbar":
        return b.env["hbar"]
    if k == "op":
        return operator(a[0], b)
    if k in ("ket", "bra"):
        s = ket(a[0], b)
        return ("k", s) if k == "ket" else ("b", [b.conj(x) for x in s])
    parts = [evaluate(p, b) if p is not None else None for p in a if not isinstance(p, str)]
    if k == "add":
        total = parts[0]
        for p in parts[1:]:
            total = plus(total, p)
        return total
    if k == "neg":
        return times(b.num(Fraction(-1)), parts[0])
    if k == "mul":
        total = parts[0]
        for p in parts[1:]:
            total = times(total, p)
        return total
    if k == "div":
        return times(1 / parts[1], parts[0]) if tag(parts[0]) != "s" else parts[0] / parts[1]
    if k == "pow":
        return power(parts[0], parts[1])
    if k == "fn":
        return exponential(parts[0], b) if a[0] == "exp" and tag(parts[0]) == "m" else b.fn(a[0], parts)
    if k == "mat":
        return ("m", [[parts[0], parts[1]], [parts[2], parts[3]]])
    if k == "col":
        return ("k", parts)
    if k == "dag":
        return adjoint(parts[0], b)
    if k == "transpose":
        if tag(parts[0]) == "k":
            return parts[0]
        m = parts[0][1]
        return ("m", [[m[0][0], m[1][0]], [m[0][1], m[1][1]]])
    if k == "inv":
        return inverse(parts[0])
    if k in ("comm", "acomm"):
        sign = -1 if k == "comm" else 1
        return plus(times(parts[0], parts[1]), times(b.num(Fraction(sign)), times(parts[1], parts[0])))
    if k == "set":
        return ("set", parts)
    if k == "pm":
        centre = parts[0] if parts[0] is not None else b.num(Fraction(0))
        return ("set", [centre + parts[1], centre - parts[1]])
    if k == "pairs":
        return ("pairs", [(parts[0], parts[1]), (parts[2], parts[3])])
    if k == "tuple":
        return ("t", parts)
    raise ValueError(k)


def tag(v):
    return v[0] if isinstance(v, tuple) else "s"


def operator(name, b):
    zero, o, i = b.num(Fraction(0)), b.num(Fraction(1)), b.i
    h = b.env.get("hbar")
    table = {
        "sx": [[zero, o], [o, zero]],
        "sy": [[zero, -i], [i, zero]],
        "sz": [[o, zero], [zero, -o]],
        "sp": [[zero, o], [zero, zero]],
        "sm": [[zero, zero], [o, zero]],
        "one": [[o, zero], [zero, o]],
    }
    if name in table:
        return ("m", table[name])
    scale = h if name in ("Sp", "Sm") else h / 2
    return times(scale, ("m", table["s" + name[1]]))


def ket(label, b):
    o, zero, i = b.num(Fraction(1)), b.num(Fraction(0)), b.i
    r = 1 / b.sqrt(b.num(Fraction(2)))
    return {"+": [o, zero], "-": [zero, o], "+x": [r, r], "-x": [r, -r], "+y": [r, i * r], "-y": [r, -i * r]}[label]


def plus(x, y):
    if tag(x) == tag(y) == "s":
        return x + y
    if tag(x) == "s":
        x = scalar_matrix(x)
    if tag(y) == "s":
        y = scalar_matrix(y)
    if tag(x) != tag(y):
        raise ValueError("a sum of different kinds")
    if tag(x) == "m":
        return ("m", [[x[1][r][c] + y[1][r][c] for c in (0, 1)] for r in (0, 1)])
    return (tag(x), [p + s for p, s in zip(x[1], y[1])])


def scalar_matrix(x):
    return ("m", [[x, x * 0], [x * 0, x]])


def times(x, y):
    tx, ty = tag(x), tag(y)
    if tx == ty == "s":
        return x * y
    if tx == "s" or ty == "s":
        s, v = (x, y) if tx == "s" else (y, x)
        return (tag(v), [[s * e for e in row] for row in v[1]] if tag(v) == "m" else [s * e for e in v[1]])
    if (tx, ty) == ("m", "m"):
        return ("m", [[sum(x[1][r][k] * y[1][k][c] for k in (0, 1)) for c in (0, 1)] for r in (0, 1)])
    if (tx, ty) == ("m", "k"):
        return ("k", [sum(x[1][r][k] * y[1][k] for k in (0, 1)) for r in (0, 1)])
    if (tx, ty) == ("b", "m"):
        return ("b", [sum(x[1][k] * y[1][k][c] for k in (0, 1)) for c in (0, 1)])
    if (tx, ty) == ("b", "k"):
        return x[1][0] * y[1][0] + x[1][1] * y[1][1]
    if (tx, ty) == ("k", "b"):
        return ("m", [[x[1][r] * y[1][c] for c in (0, 1)] for r in (0, 1)])
    raise ValueError(f"product {tx} {ty}")


def power(x, y):
    if tag(x) == "s":
        return x**y
    count = int(y)
    base, total = (inverse(x), x) if count < 0 else (x, x)
    total = base
    for _ in range(abs(count) - 1):
        total = times(total, base)
    return total if count else times(0, x)


def inverse(x):
    (p, r), (s, t) = x[1]
    d = p * t - r * s
    return ("m", [[t / d, -r / d], [-s / d, p / d]])


def adjoint(x, b):
    if tag(x) == "s":
        return b.conj(x)
    if tag(x) == "m":
        return ("m", [[b.conj(x[1][c][r]) for c in (0, 1)] for r in (0, 1)])
    return ("b" if tag(x) == "k" else "k", [b.conj(e) for e in x[1]])


def exponential(x, b):
    """exp of a 2x2 matrix: e^a0 (cosh s + (sinh s)/s D), D the traceless part, s^2 = -det D (Cayley-Hamilton)."""
    (p, r), (s, t) = x[1]
    a0 = (p + t) / 2
    d = [[p - a0, r], [s, t - a0]]
    root = b.even_root(b.tidy(d[0][0] ** 2 + r * s))
    ratio = b.fn("sinh", [root]) / root if b.tidy(root) != 0 else b.num(Fraction(1))
    c = b.fn("cosh", [root])
    e = b.fn("exp", [a0])
    return ("m", [[e * (c + ratio * d[0][0]), e * ratio * r], [e * ratio * s, e * (c + ratio * d[1][1])]])
