"""Expressions of the answer language as a tree that keeps the shape a person wrote.

A node is N(kind, *parts). Python's operators build nodes and never simplify, so that `a/b*c` stays what it is.
"""

from fractions import Fraction


class N:
    """One node: `k` names it, `a` holds its parts (nodes, names or exact numbers)."""

    __slots__ = ("k", "a")

    def __init__(self, k, *a):
        self.k = k
        self.a = a

    def __add__(self, o):
        return N("add", *_parts("add", self), *_parts("add", node(o)))

    def __radd__(self, o):
        return node(o) + self

    def __sub__(self, o):
        return self + (-node(o))

    def __rsub__(self, o):
        return node(o) - self

    def __mul__(self, o):
        return N("mul", *_parts("mul", self), *_parts("mul", node(o)))

    def __rmul__(self, o):
        return node(o) * self

    def __truediv__(self, o):
        return N("div", self, node(o))

    def __rtruediv__(self, o):
        return N("div", node(o), self)

    def __pow__(self, o):
        return N("pow", self, node(o))

    def __neg__(self):
        return self.a[0] if self.k == "neg" else N("neg", self)


def _parts(kind, n):
    return n.a if n.k == kind else (n,)


def node(x):
    """A node from a node or an exact number."""
    if isinstance(x, N):
        return x
    f = Fraction(x)
    return N("neg", N("num", -f)) if f < 0 else N("num", f)


def sym(name):
    return N("sym", name)


def syms(names):
    return [sym(n) for n in names.split()]


def lit(text):
    """A decimal literal, spelled as given, with its exact value."""
    return N("lit", text, Fraction(text.replace("−", "-")))


def raw(text, n):
    """A text written by hand, with the tree that it stands for."""
    return N("raw", text, n)


def defined(name, n):
    """A symbol that `options.definitions` gives a meaning."""
    return N("def", name, n)


def half(n=1):
    return node(Fraction(n, 2))


def q(a, b=1):
    return node(Fraction(a, b))


def fn(name):
    return lambda *args: N("fn", name, *[node(x) for x in args])


sin, cos, tan, sec, csc, cot = (fn(f) for f in "sin cos tan sec csc cot".split())
sinh, cosh, tanh, exp, ln, log, sqrt = (fn(f) for f in "sinh cosh tanh exp ln log sqrt".split())
asin, acos, atan, atan2, absv, conj, re, im = (fn(f) for f in "asin acos atan atan2 abs conj Re Im".split())
asinh, acosh, atanh = (fn(f) for f in "asinh acosh atanh".split())

i, pi, hbar = N("i"), N("pi"), N("hbar")
sx, sy, sz, Sx, Sy, Sz = (N("op", o) for o in "sx sy sz Sx Sy Sz".split())
Sp, Sm, sp, sm, one = (N("op", o) for o in "Sp Sm sp sm one".split())


def mat(a, b, c, d):
    return N("mat", *[node(x) for x in (a, b, c, d)])


def col(a, b):
    return N("col", node(a), node(b))


def ket(label):
    """A basis ket: `+ - +x -x +y -y` (`+` and `-` along z)."""
    return N("ket", label)


def bra(label):
    return N("bra", label)


def dag(a):
    return N("dag", a)


def tr(a):
    return N("transpose", a)


def inv(a):
    return N("inv", a)


def comm(a, b):
    return N("comm", a, b)


def acomm(a, b):
    return N("acomm", a, b)


def values(a, b):
    """Two eigenvalues."""
    return N("set", node(a), node(b))


def pm(centre, x):
    """Eigenvalues `centre ± x`; a centre of None is left away."""
    return N("pm", None if centre is None else node(centre), node(x))


def pairs(v1, s1, v2, s2):
    return N("pairs", node(v1), s1, node(v2), s2)


def vec(*parts):
    return N("tuple", *[node(x) for x in parts])


def walk(n):
    """Every node of a tree, root first; a text written by hand counts by what it stands for."""
    yield n
    for part in n.a:
        if isinstance(part, N):
            yield from walk(part)


def change(n, f):
    """The tree with `f` applied to every node from the leaves up; `f` returns a node or None for no change."""
    if n.k == "raw":
        return change(n.a[1], f)
    m = N(n.k, *[change(p, f) if isinstance(p, N) else p for p in n.a])
    return f(m) or m
