"""Value slips, judged by numbers alone: which changes of the reference's value give the answer's value at every point."""

import random

import mpmath

from label import agree_at, as_kind, environment
from values import Points, evaluate, tag, times

AXES = {"yxz": (1, 0, 2), "zyx": (2, 1, 0), "xzy": (0, 2, 1), "yzx": (1, 2, 0), "zxy": (2, 0, 1)}


def scaled(v, f):
    if tag(v) == "s":
        return v * f
    return times(f, v) if tag(v) in ("m", "k") else (v[0], [e * f for e in v[1]])


def coefficients(m):
    """Pauli coefficients (a0, a1, a2, a3) of a 2x2 matrix."""
    (a, b), (c, d) = m[1]
    return [(a + d) / 2, (b + c) / 2, mpmath.mpc(0, 1) * (b - c) / 2, (a - d) / 2]


def matrix(c):
    i = mpmath.mpc(0, 1)
    return ("m", [[c[0] + c[3], c[1] - i * c[2]], [c[1] + i * c[2], c[0] - c[3]]])


def conjugate(v):
    if tag(v) == "s":
        return mpmath.conj(v)
    if tag(v) == "m":
        return ("m", [[mpmath.conj(e) for e in row] for row in v[1]])
    return (v[0], [mpmath.conj(e) for e in v[1]])


def changes(kind, v, hbar):
    """Named changes of the reference's value that fit the kind."""
    out = []
    if kind in ("scalar", "operator", "pauli", "eigenvalues", "vector"):
        out += [("sign", scaled(v, -1)), ("factor-half", scaled(v, mpmath.mpf(1) / 2)), ("factor-two", scaled(v, 2))]
        out += [("hbar-power", scaled(v, hbar)), ("hbar-power", scaled(v, 1 / hbar))]
    if kind == "state":
        out += [("sign", scaled(v, -1)), ("conjugated", conjugate(v))]
    if kind in ("scalar", "operator"):
        out.append(("conjugated", conjugate(v)))
    if kind == "operator":
        (a, b), (c, d) = v[1]
        out.append(("transposed", ("m", [[a, c], [b, d]])))
    if kind in ("operator", "pauli"):
        c = coefficients(v)
        out.append(("missing-constant", matrix([mpmath.mpf(0), *c[1:]])))
        out += [("axes-permuted", matrix([c[0], *(c[1 + k] for k in p)])) for p in AXES.values()]
    if kind == "vector":
        out += [("axes-permuted", ("t", [v[1][k] for k in p])) for p in AXES.values()]
    if kind == "eigenvalues":
        centre = sum(v[1]) / 2
        out.append(("centred-eigenvalues", ("set", [e - centre for e in v[1]])))
        out += [("one-eigenvalue", ("set", [e])) for e in v[1]]
    if kind == "eigenpairs":
        (v1, s1), (v2, s2) = v[1]
        out.append(("states-swapped", ("pairs", [(v1, s2), (v2, s1)])))
    return out


def value_slips(kind, ref, ans, symbols, options, fix=None):
    """Ids of the value slips that turn the reference into the answer at eight points."""
    rng = random.Random(5)
    left = None
    done = 0
    for _ in range(40):
        if done == 8:
            break
        env = environment(symbols, rng, fix)
        try:
            r, a = as_kind(kind, evaluate(ref, Points(env))), as_kind(kind, evaluate(ans, Points(env)))
            here = [k for k, (_, v) in enumerate(changes(kind, r, env["hbar"])) if agree_at(kind, v, a, options)]
        except ZeroDivisionError:
            continue
        ids = [name for name, _ in changes(kind, r, env["hbar"])]
        left = set(here) if left is None else left & set(here)
        done += 1
    found = {ids[k] for k in left or ()}
    if kind == "state" and not options.get("requireNormalised") and not found:
        return found
    return found
