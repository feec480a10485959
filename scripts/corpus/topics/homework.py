"""Drawn homework: each exercise with many draws, worked by exact arithmetic here, answered right, with a slip, or plainly wrong."""

import random
from fractions import Fraction

from emit import Topic
from tree import *

F = Fraction
SYMBOLS = {"omega": "positive", "omega_0": "positive", "omega_1": "positive", "t": "real", "theta": "real", "a": "real", "b": "real", "v": "positive", "E_0": "real", "B": "positive", "gamma": "positive", "lambda": "real", "Delta": "real"}
w, tt, th, a, b, v, E0, B, g, lam, Dl = syms("omega t theta a b v E_0 B gamma lambda Delta")
SIG = {"x": sx, "y": sy, "z": sz}
SPIN = {"x": Sx, "y": Sy, "z": Sz}
KETS = ("+", "-", "+x", "-x", "+y", "-y")


def number(f):
    return node(F(f))


def gauss(re_, im_):
    """A complex rational as people write it."""
    re_, im_ = F(re_), F(im_)
    if im_ == 0:
        return number(re_)
    size = abs(im_)
    part = i if size == 1 else number(size) * i
    if re_ == 0:
        return -part if im_ < 0 else part
    return number(re_) - part if im_ < 0 else number(re_) + part


def term(c, x):
    """c x, with c = 1 and c = -1 left away."""
    c = F(c)
    if abs(c) == 1:
        return x if c > 0 else -x
    return number(c) * x if c > 0 else -(number(-c) * x)


def total(parts):
    parts = [p for p in parts if p is not None]
    return parts[0] if len(parts) == 1 else N("add", *parts) if parts else q(0)


def surd(n):
    """sqrt(n) with the square taken out."""
    k = max(d for d in range(1, int(n**0.5) + 1) if n % (d * d) == 0)
    rest = n // (k * k)
    if rest == 1:
        return number(k)
    return sqrt(q(rest)) if k == 1 else k * sqrt(q(rest))


def matrices():
    """Sums, products and commutators with drawn numbers."""
    t = Topic("homework-operators", "hwop", SYMBOLS)
    r = random.Random(342)
    eps = {("x", "y"): ("z", 1), ("y", "z"): ("x", 1), ("z", "x"): ("y", 1), ("y", "x"): ("z", -1), ("z", "y"): ("x", -1), ("x", "z"): ("y", -1)}
    for _ in range(24):
        p, s = r.sample("xyz", 2)
        m, n = r.choice((1, 2, 3, 4)), r.choice((1, 2, 3, 5))
        axis, sign = eps[(p, s)]
        ref = comm(term(m, SPIN[p]), term(n, SPIN[s]))
        c = F(m * n * sign)
        A = lambda k: term(k, i * hbar * SPIN[axis])
        Bf = lambda k: term(k / 2, i * hbar**2 * SIG[axis])
        t.agree("operator", ref, A(c), Bf(c), why="a commutator with drawn factors", n=1)
        t.differ("operator", ref, A(-c), Bf(-c), why="order of the commutator", slips=["commutator-order", "sign"], n=1)
        t.differ("operator", ref, term(c, i * hbar * SIG[axis]), term(c, hbar * SPIN[axis]), term(c, i * SPIN[axis]), why="sigma for S, i lost, or hbar lost", n=1)
        t.differ("operator", ref, A(c + 1), A(F(m + n) * sign if m + n != m * n else c + 2), why="a wrong number: no slip", n=1, quiet=True)
    for _ in range(20):
        e = [[(r.randint(-3, 3), r.randint(-2, 2)) for _ in range(2)] for _ in range(2)]
        f = [[(r.randint(-3, 3), r.randint(-2, 2)) for _ in range(2)] for _ in range(2)]
        mul = lambda x, y: (x[0] * y[0] - x[1] * y[1], x[0] * y[1] + x[1] * y[0])
        prod = [[tuple(sum(mul(e[j][k], f[k][l])[z] for k in (0, 1)) for z in (0, 1)) for l in (0, 1)] for j in (0, 1)]
        M = lambda x: mat(*[gauss(*x[j][l]) for j in (0, 1) for l in (0, 1)])
        ref = M(e) * M(f)
        t.agree("operator", ref, M(prod), why="a matrix product", n=2)
        bad = [row[:] for row in prod]
        j, l = r.randrange(2), r.randrange(2)
        bad[j][l] = (bad[j][l][0] + r.choice((1, -1, 2)), bad[j][l][1])
        t.differ("operator", ref, M(bad), M(f) * M(e), why="one element wrong, or the factors exchanged", n=1)
        dagger = [[(e[l][j][0], -e[l][j][1]) for l in (0, 1)] for j in (0, 1)]
        t.agree("operator", dag(M(e)), M(dagger), why="an adjoint", n=1)
        star = [[(e[j][l][0], -e[j][l][1]) for l in (0, 1)] for j in (0, 1)]
        t.differ("operator", dag(M(e)), M(star), why="conjugated, not transposed", slips=["transposed"], n=1)
    for _ in range(20):
        a0, a1, a2, a3 = (r.randint(-3, 3) for _ in range(4))
        m = mat(number(a0 + a3), gauss(a1, -a2), gauss(a1, a2), number(a0 - a3))
        parts = lambda c: total([number(c[0]) * one if c[0] not in (0, 1) else one if c[0] else None, *[term(c[k], SIG[x]) if c[k] else None for k, x in zip((1, 2, 3), "xyz")]])
        c = (a0, a1, a2, a3)
        t.agree("operator", m, parts(c), why="Pauli decomposition with drawn numbers", n=2)
        t.agree("pauli", m, vec(*c), parts(c), why="Pauli decomposition with drawn numbers", n=1)
        wrong = (a0, a1, -a2, a3) if a2 else (a0 + 1, a1, a2, a3)
        t.differ("pauli", m, vec(*wrong), vec(a0, a1 + 1, a2, a3), vec(2 * a0, 2 * a1, 2 * a2, 2 * a3) if any(c) else vec(1, 0, 0, 0), why="a sign, a number, or the half forgotten", n=1)
    for _ in range(12):
        k, n = r.choice((2, 3, 4, 6)), r.choice((1, 2, 3))
        ang = pi * number(F(n, k)) if n > 1 else pi / k
        x = r.choice("xyz")
        c, s = cos(pi * number(F(n, 2 * k))), sin(pi * number(F(n, 2 * k)))
        ref = exp(-(i * ang * SIG[x] / 2))
        t.agree("operator", ref, c * one - i * s * SIG[x], why="a rotation by a drawn angle", n=2)
        t.differ("operator", ref, c * one + i * s * SIG[x], c * one - s * SIG[x], s * one - i * c * SIG[x] if 2 * n != k else 2 * c * one, why="the other sense, i lost, or sine and cosine exchanged", n=1)
    return t


def spectra():
    """Eigenvalues of drawn matrices."""
    t = Topic("homework-eigenvalues", "hweig", SYMBOLS)
    r = random.Random(7)
    K = "eigenvalues"
    for _ in range(26):
        p, s, x, y = r.randint(-4, 4), r.randint(-4, 4), r.randint(-3, 3), r.randint(-3, 3)
        disc = (p - s) ** 2 + 4 * (x * x + y * y)
        if disc == 0:
            continue
        m = f"[[{p}, {x}{-y:+d}i], [{x}{y:+d}i, {s}]]"
        root = surd(disc)
        centre = F(p + s, 2)
        ref = raw(f"eigenvalues({m})", values(number(centre) + sqrt(q(disc)) / 2, number(centre) - sqrt(q(disc)) / 2))
        right = pm(number(centre), root / 2) if centre else pm(None, root / 2)
        t.agree(K, ref, right, values((number(p + s) + sqrt(q(disc))) / 2, (number(p + s) - sqrt(q(disc))) / 2), why="a drawn Hermitian matrix", n=2)
        t.differ(K, ref, pm(number(centre), root) if centre else pm(None, root), why="the half forgotten under the root", n=1)
        if centre:
            t.differ(K, ref, pm(None, root / 2), why="centre left out", n=1)
            t.differ(K, ref, pm(number(-centre), root / 2), pm(number(centre + 1), root / 2), why="wrong centre", n=1)
        t.differ(K, ref, number(centre) + root / 2, why="one of two", n=1)
    for _ in range(14):
        k, n = r.randint(1, 5), r.randint(1, 5)
        ref = values(hbar * w / 2 * sqrt(q(k * k + n * n)), -(hbar * w / 2 * sqrt(q(k * k + n * n))))
        ref = raw(f"eigenvalues(hbar*omega/2*({k}*sigma_z + {n}*sigma_x))", ref)
        root = surd(k * k + n * n)
        t.agree(K, ref, pm(None, hbar * w / 2 * root), pm(None, root * hbar * w / 2), pm(None, hbar * w * sqrt(number(F(k * k + n * n, 4)))), why="a drawn Hamiltonian", n=1)
        t.differ(K, ref, pm(None, hbar * w * root), pm(None, hbar * w / 2 * (k + n)), pm(None, hbar * w / 2 * (k * k + n * n)), pm(None, w / 2 * root), why="the half, the root or hbar lost", n=1)
    return t


def expectations():
    """Probabilities, expectation values and uncertainties in drawn states."""
    t = Topic("homework-expectations", "hwexp", SYMBOLS)
    r = random.Random(11)
    for _ in range(30):
        (p, s), (x, y) = (r.randint(-3, 3), r.randint(-2, 2)), (r.randint(-3, 3), r.randint(-2, 2))
        n2 = p * p + s * s + x * x + y * y
        if (p, s) == (0, 0) or (x, y) == (0, 0):
            continue
        re_ = p * x + s * y
        im_ = p * y - s * x
        bloch = {"x": F(2 * re_, n2), "y": F(2 * im_, n2), "z": F(p * p + s * s - x * x - y * y, n2)}
        ket_text = f"({p}{s:+d}i, {x}{y:+d}i)/sqrt({n2})"
        for axis in "xyz":
            e = bloch[axis]
            ref = raw(f"expectation(S_{axis}, {ket_text})", number(e) * hbar / 2 if e >= 0 else -(number(-e) * hbar / 2))
            right = term(e / 2, hbar) if e else q(0)
            t.agree("scalar", ref, right, why="an expectation value in a drawn state", n=1)
            if e:
                t.differ("scalar", ref, term(e, hbar), term(-e / 2, hbar), number(e / 2), why="a factor two, a sign, or hbar lost", n=1)
            t.differ("scalar", ref, term(e / 2 + F(1, n2), hbar), why="an arithmetic slip", n=1, quiet=True)
        e = bloch["z"]
        ref = raw(f"probability(|+>, {ket_text})", number(F(p * p + s * s, n2)))
        t.agree("scalar", ref, number(F(p * p + s * s, n2)), 1 - number(F(x * x + y * y, n2)), why="a probability in a drawn state", n=1)
        if p * p + s * s != x * x + y * y:
            t.differ("scalar", ref, number(F(x * x + y * y, n2)), why="the other outcome", n=1)
        t.differ("scalar", ref, number(F(p * p + s * s, n2 + 1)), sqrt(number(F(p * p + s * s, n2))), why="normalised wrongly, or an amplitude", n=1, quiet=True)
        e = bloch["x"]
        if abs(e) < 1 and e:
            ref = raw(f"uncertainty(S_x, {ket_text})", hbar / 2 * sqrt(number(1 - e * e)))
            t.agree("scalar", ref, hbar * sqrt(number(1 - e * e)) / 2, hbar * sqrt(number((1 - e * e) / 4)), sqrt(hbar**2 / 4 - (number(abs(e)) * hbar / 2) ** 2), why="an uncertainty in a drawn state", n=1)
            t.differ("scalar", ref, hbar**2 / 4 * number(1 - e * e), hbar / 2 * number(1 - e * e), hbar / 2, why="the variance, or the root lost", n=1)
        norm = {"upToScale": True, "requireNormalised": True}
        vect = col(gauss(p, s), gauss(x, y))
        ref = raw(f"({p}{s:+d}i, {x}{y:+d}i)", vect)
        t.agree("state", ref, vect / sqrt(q(n2)), col(gauss(p, s) / sqrt(q(n2)), gauss(x, y) / sqrt(q(n2))), why="normalise a drawn state", options=norm, n=1)
        if n2 != 1:
            t.differ("state", ref, vect / n2, vect, why="normalised by the square, or not at all", options=norm, slips=["not-normalised"], n=1)
        t.differ("state", ref, col(gauss(p, s), gauss(-x, -y)) / sqrt(q(n2)), why="a sign in one component", options=norm, n=1)
    return t


def evolutions():
    """Longer symbolic answers."""
    t = Topic("homework-evolution", "hwev", SYMBOLS)
    r = random.Random(5)
    W = sqrt(Dl**2 + v**2)
    ref = cos(W * tt / 2) * one - i * sin(W * tt / 2) * ((Dl * sz + v * sx) / W)
    alt = mat(cos(W * tt / 2) - i * Dl / W * sin(W * tt / 2), -(i * v / W * sin(W * tt / 2)), -(i * v / W * sin(W * tt / 2)), cos(W * tt / 2) + i * Dl / W * sin(W * tt / 2))
    t.agree("operator", ref, alt, exp(-(i * tt / 2 * (Dl * sz + v * sx))), exp(-(i * tt * (Dl * Sz + v * Sx) / hbar)), why="evolution of a driven spin", n=6)
    t.differ("operator", ref, exp(i * tt / 2 * (Dl * sz + v * sx)), why="the other sense", n=3)
    t.differ("operator", ref, mat(cos(W * tt / 2), -(i * v / W * sin(W * tt / 2)), -(i * v / W * sin(W * tt / 2)), cos(W * tt / 2)), cos(W * tt / 2) * one - i * sin(W * tt / 2) * (Dl * sz + v * sx), cos(W * tt) * one - i * sin(W * tt) * ((Dl * sz + v * sx) / W), why="a term, a root or a half lost", n=3, quiet=True)
    state = col(cos(W * tt / 2) - i * Dl / W * sin(W * tt / 2), -(i * v / W * sin(W * tt / 2)))
    t.agree("state", exp(-(i * tt / 2 * (Dl * sz + v * sx))) * ket("+"), state, (cos(W * tt / 2) - i * Dl / W * sin(W * tt / 2)) * ket("+") - i * v / W * sin(W * tt / 2) * ket("-"), why="a driven spin that starts up", n=5)
    t.differ("state", exp(-(i * tt / 2 * (Dl * sz + v * sx))) * ket("+"), col(cos(W * tt / 2) + i * Dl / W * sin(W * tt / 2), i * v / W * sin(W * tt / 2)), why="conjugated", n=3)
    t.differ("state", exp(-(i * tt / 2 * (Dl * sz + v * sx))) * ket("+"), col(cos(W * tt / 2), -(i * sin(W * tt / 2))), col(cos(W * tt / 2) - i * v / W * sin(W * tt / 2), -(i * Dl / W * sin(W * tt / 2))), why="detuning lost, or exchanged with the drive", n=3, quiet=True)
    P = v**2 / (v**2 + Dl**2) * sin(W * tt / 2) ** 2
    t.agree("scalar", raw("rabi(v, Delta, t)", P), P, v**2 / (2 * (Dl**2 + v**2)) * (1 - cos(W * tt)), absv(-(i * v / W * sin(W * tt / 2))) ** 2, why="computed reference", n=4)
    t.differ("scalar", raw("rabi(v, Delta, t)", P), 1 - P, v**2 / (v**2 + Dl**2) * cos(W * tt / 2) ** 2, v / W * sin(W * tt / 2), P / 2, why="another probability or an amplitude", n=3)
    ev = raw("evolve(hbar*omega/2*sigma_z, t, |+x>)", col(exp(-(i * w * tt / 2)), exp(i * w * tt / 2)) / sqrt(2))
    t.agree("state", ev, (exp(-(i * w * tt / 2)) * ket("+") + exp(i * w * tt / 2) * ket("-")) / sqrt(2), col(exp(-(i * w * tt / 2)), exp(i * w * tt / 2)) / sqrt(2), cos(w * tt / 2) * ket("+x") - i * sin(w * tt / 2) * ket("-x"), why="computed reference", n=4)
    t.differ("state", ev, (exp(i * w * tt / 2) * ket("+") + exp(-(i * w * tt / 2)) * ket("-")) / sqrt(2), (exp(-(i * w * tt)) * ket("+") + exp(i * w * tt) * ket("-")) / sqrt(2), (ket("+") + exp(i * w * tt) * ket("-")) / sqrt(2), why="sense, half, or a phase", n=3)
    he = raw("heisenberg(S_x, hbar*omega/2*sigma_z, t)", Sx * cos(w * tt) - Sy * sin(w * tt))
    t.agree("operator", he, Sx * cos(w * tt) - Sy * sin(w * tt), hbar / 2 * mat(0, exp(i * w * tt), exp(-(i * w * tt)), 0), hbar / 2 * (exp(i * w * tt) * sp + exp(-(i * w * tt)) * sm), why="computed reference", n=4)
    t.differ("operator", he, Sx * cos(w * tt) + Sy * sin(w * tt), Sx * sin(w * tt) - Sy * cos(w * tt), Sx * cos(w * tt / 2) - Sy * sin(w * tt / 2), sx * cos(w * tt) - sy * sin(w * tt), why="sense, function, half, or sigma for S", n=3)
    ro = raw("rotation((0, 0, 1), theta)", exp(-(i * th * sz / 2)))
    t.agree("operator", ro, mat(exp(-(i * th / 2)), 0, 0, exp(i * th / 2)), cos(th / 2) - i * sz * sin(th / 2), why="computed reference", n=4)
    t.differ("operator", ro, mat(exp(i * th / 2), 0, 0, exp(-(i * th / 2))), mat(exp(-(i * th)), 0, 0, exp(i * th)), why="sense or half", n=3)
    pr = raw("propagator(-gamma*B*S_z, t)", exp(i * g * B * tt * sz / 2))
    t.agree("operator", pr, mat(exp(i * g * B * tt / 2), 0, 0, exp(-(i * g * B * tt / 2))), cos(g * B * tt / 2) * one + i * sin(g * B * tt / 2) * sz, exp(i * g * B * tt * Sz / hbar), why="computed reference", n=4)
    t.differ("operator", pr, mat(exp(-(i * g * B * tt / 2)), 0, 0, exp(i * g * B * tt / 2)), mat(exp(i * g * B * tt), 0, 0, exp(-(i * g * B * tt))), mat(exp(i * g * B * tt / 2), 0, 0, exp(i * g * B * tt / 2)), why="sign of the charge, half, or one phase", n=3)
    for _ in range(10):
        k, n = r.randint(1, 4), r.randint(1, 4)
        H = raw(f"commutator({k}*S_x + {n}*S_y, S_z)", comm(k * Sx + n * Sy, Sz))
        t.agree("operator", H, i * hbar * (n * Sx - k * Sy), i * hbar**2 / 2 * (n * sx - k * sy), hbar**2 / 2 * mat(0, gauss(-k, n), gauss(k, n), 0), why="a commutator of sums", n=2)
        t.differ("operator", H, i * hbar * (k * Sx - n * Sy) if k != n else i * hbar * (n * Sx + k * Sy), i * hbar * (k * Sy - n * Sx), i * hbar * (n * sx - k * sy), why="exchanged, order, or sigma for S", n=1)
    return t


def topics():
    return [matrices(), spectra(), expectations(), evolutions()]
