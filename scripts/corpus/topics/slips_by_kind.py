"""Every slip of the catalogue on every kind it fits: each exercise is spoilt by each change, in several forms of the right answer."""

from emit import Topic
from label import numeric
from tree import *

SYMBOLS = {"theta": "real", "phi": "real", "t": "real", "omega": "positive", "omega_0": "positive", "omega_1": "positive", "B": "positive", "gamma": "positive", "g": "positive", "a": "real", "b": "real", "Delta": "real", "v": "positive", "E_0": "real", "mu": "positive", "k": "positive", "T": "positive", "epsilon": "real"}
th, ph, tt, w, w0, w1, B, g, a, b, Dl, v, E0, mu, k, T, ep = syms("theta phi t omega omega_0 omega_1 B gamma a b Delta v E_0 mu k T epsilon")
X, Y, Z = mat(0, 1, 1, 0), mat(0, -i, i, 0), mat(1, 0, 0, -1)
h2 = hbar**2
c, s = cos(th / 2), sin(th / 2)

EXERCISES = {
    "scalar": [
        [hbar * w / 2, half() * hbar * w],
        [hbar * g * B, g * B * hbar],
        [hbar / 2 * cos(th), half() * hbar * cos(th)],
        [hbar / 2 * sin(th), hbar * sin(th) / 2],
        [i * hbar / 2, half() * i * hbar],
        [-(i * hbar * w / 2), -(half() * i * hbar * w)],
        [h2 / 4, (hbar / 2) ** 2],
        [hbar * sqrt(Dl**2 + w1**2), hbar * sqrt(w1**2 + Dl**2)],
        [sqrt(a**2 + v**2) / 2, half() * sqrt(v**2 + a**2)],
        [cos(th) ** 2, cos(th) * cos(th)],
        [sin(th / 2) ** 2, sin(half() * th) ** 2],
        [exp(i * th) / 2, half() * exp(i * th)],
        [(a + i * b) / 2, half() * a + half() * i * b],
        [hbar * w0 * (1 + cos(th)), hbar * w0 + hbar * w0 * cos(th)],
        [3 * h2 / 4, q(3, 4) * h2],
        [mu * B / (k * T), B * mu / (T * k)],
    ],
    "operator": [
        [i * hbar * Sz, i * h2 / 2 * sz, i * h2 / 2 * Z, mat(i * h2 / 2, 0, 0, -(i * h2 / 2))],
        [comm(Sz, Sx), i * hbar * Sy, i * h2 / 2 * sy, h2 / 2 * mat(0, 1, -1, 0)],
        [w0 * Sz, hbar * w0 / 2 * sz, hbar * w0 / 2 * Z],
        [w0 * Sz + w1 * Sx, hbar / 2 * (w0 * sz + w1 * sx), hbar / 2 * mat(w0, w1, w1, -w0)],
        [-(g * B * Sy), -(g * B * hbar / 2 * sy), g * B * hbar / 2 * mat(0, i, -i, 0)],
        [ep * one + v * sx, mat(ep, v, v, ep), ep + v * sx],
        [E0 + a * sx + b * sy, mat(E0, a - i * b, a + i * b, E0), E0 * one + a * sx + b * sy],
        [(one + sy) / 2, half() * mat(1, -i, i, 1), half() + sy / 2],
        [(sx + sy) / sqrt(2), mat(0, 1 - i, 1 + i, 0) / sqrt(2)],
        [exp(i * th) * ket("+") * bra("-"), mat(0, exp(i * th), 0, 0), exp(i * th) * sp],
        [Sp, Sx + i * Sy, hbar * mat(0, 1, 0, 0)],
        [comm(sx, sy), 2 * i * sz, mat(2 * i, 0, 0, -(2 * i))],
        [c * one - i * s * sx, mat(c, -(i * s), -(i * s), c)],
        [a * sx + b * sz, mat(b, a, a, -b)],
    ],
    "pauli": [
        [vec(E0, v, 0, a), mat(E0 + a, v, v, E0 - a), E0 + v * sx + a * sz],
        [vec(0, hbar * w1 / 2, 0, hbar * w0 / 2), w1 * Sx + w0 * Sz],
        [vec(half(), half() * sin(th), 0, half() * cos(th)), (one + sin(th) * sx + cos(th) * sz) / 2],
        [vec(2, 1, -1, 3), mat(5, 1 + i, 1 - i, -1)],
        [vec(1, 0, q(1, 2), q(1, 3)), one + sy / 2 + sz / 3],
    ],
    "vector": [
        [vec(sin(th), 0, cos(th))],
        [vec(hbar / 2 * cos(w * tt), hbar / 2 * sin(w * tt), 0), vec(hbar * cos(w * tt) / 2, hbar * sin(w * tt) / 2, q(0))],
        [vec(q(1, 3), q(2, 3), -q(2, 3))],
        [vec(a, 2 * b, 3), vec(a, b + b, 3)],
        [vec(0, hbar / 2, 0), vec(0, half() * hbar, 0)],
    ],
    "eigenvalues": [
        [values(E0 + hbar * w / 2, E0 - hbar * w / 2), pm(E0, hbar * w / 2)],
        [values(ep + sqrt(a**2 + v**2), ep - sqrt(a**2 + v**2)), pm(ep, sqrt(a**2 + v**2))],
        [values(hbar * g * B / 2, -(hbar * g * B / 2)), pm(None, hbar * g * B / 2)],
        [values(q(5), q(-1)), pm(q(2), q(3))],
        [values(1 + i, 1 - i), pm(q(1), i)],
        [values(hbar / 2 * sqrt(w0**2 + w1**2), -(hbar / 2 * sqrt(w0**2 + w1**2))), pm(None, hbar / 2 * sqrt(w0**2 + w1**2))],
    ],
    "state": [
        [col(c, exp(i * ph) * s), c * ket("+") + exp(i * ph) * s * ket("-")],
        [(ket("+") + i * ket("-")) / sqrt(2), col(1, i) / sqrt(2)],
        [col(q(3, 5), q(4, 5) * i), q(3, 5) * ket("+") + q(4, 5) * i * ket("-")],
        [col(cos(w * tt / 2), -(i * sin(w * tt / 2))), cos(w * tt / 2) * ket("+") - i * sin(w * tt / 2) * ket("-")],
        [(2 * ket("+") - ket("-")) / sqrt(5), col(2, -1) / sqrt(5)],
    ],
}


def scale(kind, n, f):
    """`n` multiplied by a factor, entry by entry where people write it so."""
    if n.k == "tuple":
        return vec(*[product(f, x) for x in n.a])
    if n.k == "set":
        return values(*[product(f, x) for x in n.a])
    if n.k == "pm":
        return pm(None if n.a[0] is None else product(f, n.a[0]), product(f, n.a[1]))
    if n.k == "mat":
        return mat(*[product(f, x) for x in n.a])
    if n.k == "col":
        return col(*[product(f, x) for x in n.a])
    return product(f, n)


def product(f, x):
    if x.k == "num" and x.a[0] == 0:
        return x
    if f.k == "neg" and f.a[0].k == "num" and f.a[0].a[0] == 1:
        return -x
    if x.k == "num" and x.a[0] == 1:
        return f
    return -product(f, x.a[0]) if x.k == "neg" else f * x


def swap(table):
    return lambda n: change(n, lambda m: table.get((m.k, m.a[0] if m.a else None)))


def without_i(n):
    """A tree with every i left out."""
    if n.k == "raw":
        return without_i(n.a[1])
    if n.k == "i":
        return q(1)
    parts = [without_i(p) if isinstance(p, N) else p for p in n.a]
    if n.k == "mul":
        parts = [p for p, old in zip(parts, n.a) if old.k != "i"] or [q(1)]
        return parts[0] if len(parts) == 1 else N("mul", *parts)
    return N(n.k, *parts)


def functions(n):
    return change(n, lambda m: N("fn", {"sin": "cos", "cos": "sin"}[m.a[0]], m.a[1]) if m.k == "fn" and m.a[0] in ("sin", "cos") else None)


def angle(factor):
    return lambda n: change(n, lambda m: (th / 2 if factor == 0.5 else 2 * th) if m.k == "sym" and m.a[0] == "theta" else None)


def rootless(n):
    return change(n, lambda m: m.a[1] if m.k == "fn" and m.a[0] == "sqrt" else None)


def reordered(n):
    return change(n, lambda m: comm(m.a[1], m.a[0]) if m.k == "comm" else None)


TO_PAULI = swap({("op", "S" + x): N("op", "s" + x) for x in "xyz"})
TO_SPIN = swap({("op", "s" + x): N("op", "S" + x) for x in "xyz"})

FORMS = [
    ("missing-i", without_i, ("scalar", "operator", "state", "pauli", "eigenvalues")),
    ("sine-cosine", functions, ("scalar", "operator", "state", "vector", "pauli")),
    ("half-angle", angle(0.5), ("scalar", "operator", "state", "vector", "pauli")),
    ("double-angle", angle(2), ("scalar", "operator", "state", "vector", "pauli")),
    ("missing-root", rootless, ("scalar", "operator", "state", "eigenvalues")),
    ("commutator-order", reordered, ("operator",)),
    ("pauli-for-spin", TO_PAULI, ("operator", "pauli")),
    ("spin-for-pauli", TO_SPIN, ("operator", "pauli")),
]

FACTORS = [("sign", q(-1)), ("factor-half", half()), ("factor-two", q(2)), ("hbar-power", hbar), ("hbar-power", 1 / hbar)]
PAIRS = [(("sign", "factor-half"), -half()), (("sign", "factor-two"), q(-2)), (("sign", "hbar-power"), -hbar), (("factor-half", "hbar-power"), hbar / 2), (("factor-two", "hbar-power"), 2 / hbar)]


def differs(kind, ref, ans):
    return numeric(kind, ref, ans, SYMBOLS, {})[1] > 0


def equal(kind, x, y):
    good, bad, _ = numeric(kind, x, y, SYMBOLS, {})
    return good >= 8 and not bad


def single():
    t = Topic("slips-single", "slip", SYMBOLS)
    for kind, exercises in EXERCISES.items():
        for ref, *forms in exercises:
            forms = [ref, *forms]
            for number, form in enumerate(forms):
                if kind != "state":
                    for name, f in FACTORS:
                        ans = scale(kind, form, f)
                        if differs(kind, ref, ans):
                            t.differ(kind, ref, ans, why=f"{name} on a right answer", slips=[name], n=1 if number else 2)
                elif differs(kind, ref, scale(kind, form, q(-1))):
                    t.differ(kind, ref, scale(kind, form, q(-1)), why="sign on a right answer", slips=["sign"], n=2)
            for name, spoil, kinds in FORMS:
                if kind not in kinds:
                    continue
                wrong = spoil(ref)
                if not differs(kind, ref, wrong):
                    continue
                t.differ(kind, ref, wrong, why=f"{name} in the author's form", slips=[name], n=2)
                for form in forms[1:]:
                    other = spoil(form)
                    if equal(kind, wrong, other):
                        t.differ(kind, ref, other, why=f"{name} in another form of the same value", slips=[name], n=1)
    for ref in (hbar * w, g * B, w0 - w, sqrt(Dl**2 + w1**2), E0 / hbar):
        t.differ("scalar", ref, ref / (2 * pi), 2 * pi * ref, why="frequency for angular frequency, or the other way", slips=["missing-two-pi"], n=2)
    for n in (pm(None, hbar * w), values(hbar * w, -(hbar * w))):
        t.differ("eigenvalues", values(hbar * w, -(hbar * w)), scale("eigenvalues", n, 1 / (2 * pi)) if n.k == "set" else pm(None, hbar * w / (2 * pi)), why="frequency for angular frequency", slips=["missing-two-pi"], n=2)
    permuted(t)
    return t


def permuted(t):
    axes = [(1, 0, 2), (2, 1, 0), (0, 2, 1), (1, 2, 0), (2, 0, 1)]
    A = [a, 2 * b, 3 * v]
    for order in axes:
        p = [A[k] for k in order]
        why = "axes permuted"
        t.differ("vector", vec(*A), vec(*p), why=why, slips=["axes-permuted"], n=2)
        t.differ("pauli", vec(E0, *A), vec(E0, *p), E0 + p[0] * sx + p[1] * sy + p[2] * sz, why=why, slips=["axes-permuted"], n=1)
        t.differ("operator", a * sx + 2 * b * sy + 3 * v * sz, p[0] * sx + p[1] * sy + p[2] * sz, mat(p[2], p[0] - i * p[1], p[0] + i * p[1], -p[2]), why=why, slips=["axes-permuted"], n=1)
        numbers = [q(1), q(2), q(2)]
        if [numbers[k] for k in order] != numbers:
            t.differ("vector", vec(1, 2, 4), vec(*[[1, 2, 4][k] for k in order]), why=why, slips=["axes-permuted"], n=1)


def double():
    t = Topic("slips-pairs", "pair", SYMBOLS)
    for kind, exercises in EXERCISES.items():
        if kind in ("state",):
            continue
        for ref, *forms in exercises:
            for names, f in PAIRS:
                ans = scale(kind, (forms or [ref])[0], f)
                if differs(kind, ref, ans) and not singly(kind, ref, ans):
                    t.differ(kind, ref, ans, why="two slips at once", pair=list(names), n=1)
            if kind in ("scalar", "operator"):
                for other, f in (("sign", q(-1)), ("factor-half", half()), ("factor-two", q(2)), ("hbar-power", hbar)):
                    for name, spoil, _ in FORMS[:3] + FORMS[6:7]:
                        wrong = spoil(ref)
                        ans = scale(kind, wrong, f)
                        if differs(kind, ref, wrong) and differs(kind, ref, ans) and not singly(kind, ref, ans):
                            t.differ(kind, ref, ans, why="two slips at once", pair=[other, name], n=1, quiet=True)
    return t


def singly(kind, ref, ans):
    """Whether one slip alone explains the answer."""
    from slips import value_slips

    table = {k: v for k, v in SYMBOLS.items()}
    if value_slips(kind, ref, ans, table, {}):
        return True
    return any(kind in kinds and equal(kind, spoil(ref), ans) for _, spoil, kinds in FORMS)


def topics():
    return [single(), double()]
