"""Scalars of the course: probabilities, expectation values, uncertainties, Rabi and precession formulas, thermal states."""

from emit import Topic
from tree import *

SYMBOLS = {"theta": "real", "phi": "real", "t": "real", "omega": "positive", "omega_0": "positive", "omega_1": "positive", "Delta": "real", "B": "positive", "B_0": "positive", "gamma": "positive", "k": "positive", "T": "positive", "beta": "positive", "a": "real", "v": "positive", "g": "positive", "mu": "positive", "tau": "positive", "p": {"between": ["0", "1"]}, "r": {"between": ["0", "1"]}, "N": "positive"}


def rabi():
    t = Topic("scalar-rabi", "rabi", SYMBOLS)
    A, D = t.agree, t.differ
    w, w0, w1, Dl, tt = syms("omega omega_0 omega_1 Delta t")
    W2 = w1**2 + Dl**2
    W = sqrt(W2)
    P = w1**2 / (w1**2 + Dl**2) * sin(sqrt(w1**2 + Dl**2) * tt / 2) ** 2
    A("scalar", P, w1**2 / (Dl**2 + w1**2) * sin(half() * tt * sqrt(Dl**2 + w1**2)) ** 2, w1**2 * sin(tt * W / 2) ** 2 / W2, (w1 / W) ** 2 * sin(W * tt / 2) ** 2, w1**2 / (2 * W2) * (1 - cos(W * tt)), 1 / (1 + (Dl / w1) ** 2) * sin(w1 * tt / 2 * sqrt(1 + Dl**2 / w1**2)) ** 2, 1 - (1 - w1**2 / W2 * sin(W * tt / 2) ** 2), why="Rabi's formula", n=4)
    D("scalar", P, w1**2 / W2 * cos(W * tt / 2) ** 2, why="cosine for sine", slips=["sine-cosine"], n=4)
    D("scalar", P, w1**2 / W2 * sin(W * tt) ** 2, why="full for half angle", n=3)
    D("scalar", P, w1 / W * sin(W * tt / 2) ** 2, Dl**2 / W2 * sin(W * tt / 2) ** 2, sin(W * tt / 2) ** 2, w1**2 / W2, w1**2 / W2 * sin(W * tt / 2), w1**2 / W2 * sin(w1 * tt / 2) ** 2, why="a wrong amplitude or frequency", n=3)
    D("scalar", P, w1**2 / W2 * sin(W2 * tt / 2) ** 2, why="square root left out", slips=["missing-root"], n=3)
    D("scalar", P, 1 - w1**2 / W2 * sin(W * tt / 2) ** 2, why="the survival probability", n=3)
    D("scalar", P, w1**2 / (2 * W2) * sin(W * tt / 2) ** 2, 2 * w1**2 / W2 * sin(W * tt / 2) ** 2, why="a factor of two", n=2)
    Om = defined("Omega", sqrt(Dl**2 + w1**2))
    defs = {"definitions": {"Omega": "sqrt(Delta^2 + omega_1^2)"}}
    sy = {"Delta": "real", "omega_1": "positive"}
    A("scalar", P, w1**2 / Om**2 * sin(Om * tt / 2) ** 2, (w1 / Om) ** 2 * sin(Om * tt / 2) ** 2, w1**2 / (2 * Om**2) * (1 - cos(Om * tt)), (1 - Dl**2 / Om**2) * sin(Om * tt / 2) ** 2, why="with a definition of Omega", options=defs, symbols=sy, n=4)
    D("scalar", P, w1**2 / Om**2 * cos(Om * tt / 2) ** 2, w1 / Om * sin(Om * tt / 2) ** 2, w1**2 / Om * sin(Om * tt / 2) ** 2, (1 - Dl / Om) * sin(Om * tt / 2) ** 2, why="wrong, with a definition of Omega", options=defs, symbols=sy, n=2)
    A("scalar", Om**2 - Dl**2, w1**2, (Om - Dl) * (Om + Dl), why="the definition used", options=defs, symbols=sy, n=2)
    A("scalar", sqrt(Om**2 - Dl**2), w1, why="the definition used", options=defs, symbols=sy, n=2)
    D("scalar", sqrt(Om**2 - w1**2), Dl, why="the detuning may be negative", options=defs, symbols=sy, n=2)
    A("scalar", sqrt(Om**2 - w1**2), absv(Dl), why="the modulus of the detuning", options=defs, symbols=sy, n=2)
    res = sin(w1 * tt / 2) ** 2
    A("scalar", res, (1 - cos(w1 * tt)) / 2, 1 - cos(w1 * tt / 2) ** 2, half() - cos(w1 * tt) / 2, why="resonance", n=4)
    D("scalar", res, sin(w1 * tt) ** 2, why="full for half angle", slips=["double-angle"], n=3)
    D("scalar", res, cos(w1 * tt / 2) ** 2, (1 + cos(w1 * tt)) / 2, why="the other state", slips=["sine-cosine"], n=3)
    D("scalar", res, (1 - cos(w1 * tt)) / 4, 1 - cos(w1 * tt), (1 - cos(w1 * tt / 2)) / 2, sin(w1 * tt / 2), why="a factor or an angle", n=2)
    A("scalar", pi / w1, pi * 1 / w1, pi * w1 ** (-q(1)), why="length of a pi pulse", n=3)
    D("scalar", pi / w1, 2 * pi / w1, pi / (2 * w1), 1 / w1, w1 / pi, pi * w1, why="length of a pi pulse, wrong", n=2)
    A("scalar", w1**2 / W2, 1 / (1 + Dl**2 / w1**2), 1 - Dl**2 / W2, w1**2 / (Dl**2 + w1**2), (1 + (Dl / w1) ** 2) ** (-q(1)), why="largest transition probability", n=3)
    D("scalar", w1**2 / W2, w1 / W, Dl**2 / W2, w1**2 / (w1**2 - Dl**2), w1**2 / (w1 + Dl) ** 2, 1 / (1 + Dl / w1), why="largest transition probability, wrong", n=2)
    A("scalar", sqrt((w - w0) ** 2 + w1**2), sqrt((w0 - w) ** 2 + w1**2), sqrt(w**2 - 2 * w * w0 + w0**2 + w1**2), ((w - w0) ** 2 + w1**2) ** half(), why="generalised Rabi frequency", n=3)
    D("scalar", sqrt((w - w0) ** 2 + w1**2), (w - w0) ** 2 + w1**2, why="square root left out", slips=["missing-root"], n=3)
    D("scalar", sqrt((w - w0) ** 2 + w1**2), sqrt((w + w0) ** 2 + w1**2), absv(w - w0) + w1, sqrt((w - w0) ** 2 - w1**2), sqrt(w**2 - w0**2 + w1**2), why="wrong combination", n=2)
    Dt = Dl * tt
    A("scalar", cos(Dt / 2) ** 2, (1 + cos(Dt)) / 2, 1 - sin(Dt / 2) ** 2, absv(1 + exp(i * Dt)) ** 2 / 4, why="Ramsey fringes", n=3)
    D("scalar", cos(Dt / 2) ** 2, sin(Dt / 2) ** 2, (1 - cos(Dt)) / 2, why="Ramsey fringes, the other outcome", slips=["sine-cosine"], n=3)
    al, aa = syms("alpha a")
    A("scalar", exp(-(2 * pi * aa**2 / al)), 1 / exp(2 * pi * aa**2 / al), exp(-(pi * aa**2 / al)) ** 2, why="Landau and Zener", symbols={"alpha": "positive"}, n=3)
    D("scalar", exp(-(2 * pi * aa**2 / al)), 1 - exp(-(2 * pi * aa**2 / al)), exp(-(pi * aa**2 / al)), exp(-(2 * pi * aa / al)), exp(2 * pi * aa**2 / al), why="Landau and Zener, wrong", symbols={"alpha": "positive"}, n=2)
    return t


def precession():
    t = Topic("scalar-precession", "prec", SYMBOLS)
    A, D = t.agree, t.differ
    th, ph, tt, w0, g, B = syms("theta phi t omega_0 gamma B")
    X = hbar / 2 * sin(th) * cos(ph + w0 * tt)
    A("scalar", X, half() * hbar * sin(th) * cos(w0 * tt + ph), hbar / 2 * sin(th) * (cos(ph) * cos(w0 * tt) - sin(ph) * sin(w0 * tt)), hbar * sin(th / 2) * cos(th / 2) * cos(ph + w0 * tt), hbar / 4 * (sin(th + ph + w0 * tt) + sin(th - ph - w0 * tt)), why="precessing x component", n=4)
    D("scalar", X, hbar / 2 * sin(th) * cos(ph - w0 * tt), why="precession the other way", n=3)
    D("scalar", X, hbar / 2 * sin(th) * sin(ph + w0 * tt), hbar / 2 * cos(th) * cos(ph + w0 * tt), why="another component", n=2, quiet=True)
    D("scalar", X, half() * sin(th) * cos(ph + w0 * tt), hbar * sin(th) * cos(ph + w0 * tt), -(hbar / 2 * sin(th) * cos(ph + w0 * tt)), hbar / 4 * sin(th) * cos(ph + w0 * tt), why="hbar, a factor, or the sign", n=3)
    D("scalar", X, hbar / 2 * sin(th / 2) * cos(ph + w0 * tt), hbar / 2 * sin(th) * cos(ph + 2 * w0 * tt), why="an angle halved or doubled", n=2, quiet=True)
    A("scalar", cos(w0 * tt / 2) ** 2, (1 + cos(w0 * tt)) / 2, half() * (1 + cos(w0 * tt)), 1 - sin(w0 * tt / 2) ** 2, absv((1 + exp(i * w0 * tt)) / 2) ** 2, why="probability to stay in |+x>", n=4)
    D("scalar", cos(w0 * tt / 2) ** 2, cos(w0 * tt) ** 2, why="half lost", slips=["double-angle"], n=3)
    D("scalar", cos(w0 * tt / 2) ** 2, sin(w0 * tt / 2) ** 2, (1 - cos(w0 * tt)) / 2, why="the other probability", slips=["sine-cosine"], n=3)
    D("scalar", cos(w0 * tt / 2) ** 2, (1 + cos(w0 * tt / 2)) / 2, (1 + cos(2 * w0 * tt)) / 2, (1 + sin(w0 * tt)) / 2, why="wrong angle or function", n=2)
    Y = hbar / 2 * sin(w0 * tt)
    A("scalar", Y, hbar * sin(w0 * tt) / 2, half() * hbar * sin(w0 * tt), hbar * sin(w0 * tt / 2) * cos(w0 * tt / 2), hbar / (4 * i) * (exp(i * w0 * tt) - exp(-(i * w0 * tt))), why="<S_y> of a precessing spin", n=4)
    D("scalar", Y, hbar / 2 * cos(w0 * tt), why="cosine for sine", slips=["sine-cosine"], n=3)
    D("scalar", Y, hbar / 2 * sin(w0 * tt / 2), why="half angle", slips=["half-angle"], n=2)
    D("scalar", Y, -(hbar / 2 * sin(w0 * tt)), sin(w0 * tt) / 2, hbar * sin(w0 * tt), hbar / 4 * sin(w0 * tt), hbar**2 / 2 * sin(w0 * tt), why="sign, hbar or a factor", n=3)
    A("scalar", g * B, B * g, g * B * 1, why="Larmor frequency", n=2)
    D("scalar", g * B, g * B / (2 * pi), why="frequency for angular frequency", n=4)
    D("scalar", g * B, 2 * pi * g * B, hbar * g * B, g / B, g * B / 2, g * B**2, why="Larmor frequency, wrong", n=2)
    A("scalar", 2 * pi / (g * B), pi * 2 / (B * g), 1 / (g * B / (2 * pi)), why="Larmor period", n=3)
    D("scalar", 2 * pi / (g * B), 1 / (g * B), why="2 pi missing", n=3)
    D("scalar", 2 * pi / (g * B), pi / (g * B), g * B / (2 * pi), 2 * pi * g / B, why="Larmor period, wrong", n=2)
    A("scalar", -(pi * (1 - cos(th))), pi * (cos(th) - 1), -(2 * pi * sin(th / 2) ** 2), pi * cos(th) - pi, why="Berry phase", n=3)
    D("scalar", -(pi * (1 - cos(th))), pi * (1 - cos(th)), -(2 * pi * (1 - cos(th))), -(pi * (1 + cos(th))), -(pi * (1 - sin(th))), -((1 - cos(th)) / 2), why="Berry phase, wrong", n=2)
    T1, M0, Mz = syms("T_1 M_0 M_z")
    sy = {"T_1": "positive", "M_0": "positive", "M_z": "real"}
    A("scalar", M0 * (1 - 2 * exp(-(tt / T1))), M0 - 2 * M0 * exp(-(tt / T1)), M0 * (1 - 2 / exp(tt / T1)), why="inversion recovery", symbols=sy, n=3)
    A("scalar", T1 * ln(q(2)), -(T1 * ln(half())), T1 * log(q(2)), why="null of the inversion recovery", symbols=sy, n=3)
    D("scalar", M0 * (1 - 2 * exp(-(tt / T1))), M0 * (1 - exp(-(tt / T1))), M0 * (2 * exp(-(tt / T1)) - 1), M0 * (1 - 2 * exp(tt / T1)), why="inversion recovery, wrong", symbols=sy, n=2)
    D("scalar", T1 * ln(q(2)), T1 / ln(q(2)), lit("0.693") * T1, T1 / 2, why="null, wrong or rounded", symbols=sy, n=2)
    return t


def measurement():
    t = Topic("scalar-measurement", "meas", {**SYMBOLS, "alpha": "complex", "beta": "complex"})
    A, D = t.agree, t.differ
    th, ph, p, r = syms("theta phi p r")
    P, M = ket("+"), ket("-")
    br = lambda l, o, k: bra(l) * o * ket(k)
    A("scalar", hbar / 2, br("+x", Sx, "+x"), br("+", Sx, "-"), br("+", Sz, "+"), half() * hbar, lit("0.5") * hbar, why="matrix elements", n=4)
    A("scalar", -(i * hbar / 2), br("+", Sy, "-"), why="matrix element of S_y", n=4)
    A("scalar", q(0), br("+", Sx, "+"), br("+", sz, "-"), bra("+") * M, why="vanishing matrix elements", n=3)
    A("scalar", half(), absv(bra("+") * ket("+x")) ** 2, absv(bra("-y") * ket("+x")) ** 2, absv(bra("+") * ket("-y")) ** 2, lit("0.5"), why="probabilities one half", n=3)
    A("scalar", 1 / sqrt(2), bra("+") * ket("+x"), bra("+") * ket("-x"), sqrt(2) / 2, why="amplitude", n=3)
    A("scalar", (1 + i) / 2, bra("+x") * ket("+y"), half() + i / 2, exp(i * pi / 4) / sqrt(2), why="amplitude", n=3)
    A("scalar", hbar**2 / 4, br("+", Sx**2, "+"), bra("+") * Sx * Sx * P, absv(br("+", Sx, "-")) ** 2, (hbar / 2) ** 2, why="mean square", n=3)
    A("scalar", hbar, bra("+") * Sp * M, why="matrix element of S_+", n=3)
    D("scalar", -(i * hbar / 2), i * hbar / 2, br("-", Sy, "+"), why="conjugated", n=3)
    D("scalar", -(i * hbar / 2), hbar / 2, -(hbar / 2), why="i lost", n=2)
    D("scalar", -(i * hbar / 2), -(i / 2), -(i * hbar), br("+", sy, "-"), why="hbar or a factor", n=2)
    D("scalar", hbar / 2, -(hbar / 2), br("-", Sz, "-"), why="sign", n=2)
    D("scalar", hbar / 2, half(), br("+", sx, "-"), hbar, hbar / 4, hbar**2 / 2, why="hbar or a factor", n=2)
    D("scalar", half(), bra("+") * ket("+x"), q(1, 4), q(1), why="an amplitude, not a probability, or a factor", n=2)
    D("scalar", (1 + i) / 2, (1 - i) / 2, (1 + i) / sqrt(2), half(), 1 + i, why="amplitude, wrong", n=2)
    D("scalar", hbar**2 / 4, hbar / 2, hbar**2 / 2, hbar**2, q(1, 4), why="mean square, wrong", n=2)
    spin = N("col", cos(th / 2), exp(i * ph) * sin(th / 2))
    A("scalar", raw("expectation(S_x, spinor(theta, phi))", hbar / 2 * sin(th) * cos(ph)), hbar / 2 * sin(th) * cos(ph), hbar * sin(th / 2) * cos(th / 2) * cos(ph), half() * hbar * cos(ph) * sin(th), why="computed reference", n=3)
    A("scalar", raw("expectation(S_z, spinor(theta, phi))", hbar / 2 * cos(th)), hbar / 2 * cos(th), hbar / 2 * (cos(th / 2) ** 2 - sin(th / 2) ** 2), why="computed reference", n=3)
    A("scalar", raw("probability(|+>, spinor(theta, phi))", cos(th / 2) ** 2), cos(th / 2) ** 2, (1 + cos(th)) / 2, why="computed reference", n=3)
    A("scalar", raw("probability(|+x>, spinor(theta, phi))", (1 + sin(th) * cos(ph)) / 2), (1 + sin(th) * cos(ph)) / 2, half() + half() * sin(th) * cos(ph), absv(cos(th / 2) + exp(i * ph) * sin(th / 2)) ** 2 / 2, why="computed reference", n=3)
    A("scalar", raw("uncertainty(S_z, spinor(theta, phi))", hbar / 2 * absv(sin(th))), hbar / 2 * absv(sin(th)), hbar / 2 * sqrt(1 - cos(th) ** 2), hbar / 2 * sqrt(sin(th) ** 2), why="computed reference; theta is any real number", n=2, proof="sqrt(u^2) = |u|")
    D("scalar", raw("uncertainty(S_z, spinor(theta, phi))", hbar / 2 * absv(sin(th))), hbar / 2 * sin(th), why="negative for some theta", n=2)
    A("scalar", raw("variance(S_z, spinor(theta, phi))", hbar**2 / 4 * sin(th) ** 2), hbar**2 / 4 * sin(th) ** 2, hbar**2 / 4 * (1 - cos(th) ** 2), hbar**2 / 4 - (hbar / 2 * cos(th)) ** 2, why="computed reference", n=3)
    D("scalar", raw("variance(S_z, spinor(theta, phi))", hbar**2 / 4 * sin(th) ** 2), hbar**2 / 4 * cos(th) ** 2, hbar / 2 * absv(sin(th)), hbar**2 / 4, hbar**2 / 2 * sin(th) ** 2, why="variance, wrong", n=2)
    D("scalar", raw("probability(|+x>, spinor(theta, phi))", (1 + sin(th) * cos(ph)) / 2), (1 + sin(th) * sin(ph)) / 2, (1 - sin(th) * cos(ph)) / 2, (1 + cos(th)) / 2, 1 + sin(th) * cos(ph), why="probability, wrong", n=2)
    D("scalar", raw("expectation(S_x, spinor(theta, phi))", hbar / 2 * sin(th) * cos(ph)), hbar / 2 * sin(th) * sin(ph), sin(th) * cos(ph) / 2, hbar * sin(th) * cos(ph), hbar / 2 * cos(th) * cos(ph), why="expectation, wrong", n=2)
    A("scalar", raw("purity((I + r*sigma_z)/2)", (1 + r**2) / 2), (1 + r**2) / 2, half() + r**2 / 2, ((1 + r) / 2) ** 2 + ((1 - r) / 2) ** 2, why="purity", n=3)
    D("scalar", raw("purity((I + r*sigma_z)/2)", (1 + r**2) / 2), (1 - r**2) / 2, (1 + r) / 2, 1 + r**2, why="purity, wrong", n=2)
    A("scalar", raw("determinant((I + r*sigma_x)/2)", (1 - r**2) / 4), (1 - r**2) / 4, (1 - r) / 2 * ((1 + r) / 2), why="determinant", n=3)
    A("scalar", raw("entropy(I/2)", ln(q(2))), ln(q(2)), -ln(half()), why="nats", n=2)
    D("scalar", raw("entropy(I/2)", ln(q(2))), q(1), lit("0.693147"), why="bits for nats, or rounded", n=1)
    A("scalar", raw("trace(S_x^2)", hbar**2 / 2), hbar**2 / 2, why="trace", n=2)
    A("scalar", q(1, 3), raw("1/3", q(1, 3)), absv((1 + i) / sqrt(6)) ** 2, why="P(S_z = +) of (1 + i, 2)/sqrt 6", n=2)
    A("scalar", q(5, 6), absv((3 + i) / sqrt(12)) ** 2, 1 - q(1, 6), why="P(S_x = +) of (1 + i, 2)/sqrt 6", n=2)
    D("scalar", q(5, 6), q(1, 6), lit("0.833"), lit("0.83"), q(5, 3), q(2, 3), why="the other outcome, rounded, or wrong", n=1)
    al, be = syms("alpha beta")
    unit = {"assume": ["abs(alpha)^2 + abs(beta)^2 = 1"]}

    def fix(env):
        import mpmath

        n = mpmath.sqrt(abs(env["alpha"]) ** 2 + abs(env["beta"]) ** 2)
        return {**env, "alpha": env["alpha"] / n, "beta": env["beta"] / n}

    cx = {"alpha": "complex", "beta": "complex"}
    hand = "substitute |beta|^2 = 1 - |alpha|^2"
    kw = {"options": unit, "symbols": cx, "fix": fix}
    A("scalar", absv(al) ** 2, 1 - absv(be) ** 2, al * conj(al), 1 - be * conj(be), (1 + absv(al) ** 2 - absv(be) ** 2) / 2, why="normalised amplitudes", proof=hand, n=3, **kw)
    A("scalar", absv(al) ** 2 + absv(be) ** 2, q(1), why="normalised amplitudes", proof=hand, **kw)
    A("scalar", hbar / 2 * (absv(al) ** 2 - absv(be) ** 2), hbar / 2 * (2 * absv(al) ** 2 - 1), hbar * (absv(al) ** 2 - half()), hbar / 2 * (1 - 2 * absv(be) ** 2), why="<S_z> of normalised amplitudes", proof=hand, n=3, **kw)
    A("scalar", absv(al + be) ** 2 / 2, half() + re(conj(al) * be), (1 + 2 * re(conj(al) * be)) / 2, why="P(+x) of normalised amplitudes", proof=hand + " in |a + b|^2 = |a|^2 + |b|^2 + 2 Re(a* b)", n=2, **kw)
    D("scalar", absv(al) ** 2, absv(be) ** 2, al**2, absv(al), why="another probability, or no modulus", n=3, **kw)
    D("scalar", hbar / 2 * (absv(al) ** 2 - absv(be) ** 2), hbar / 2 * (absv(al) ** 2 + absv(be) ** 2), hbar / 2, hbar / 2 * (1 - 2 * absv(al) ** 2), hbar * (2 * absv(al) ** 2 - 1), why="<S_z>, wrong", n=2, **kw)
    D("scalar", absv(al + be) ** 2 / 2, absv(al - be) ** 2 / 2, half(), absv(al + be) ** 2, why="P(+x), wrong", n=2, **kw)
    D("scalar", absv(al) ** 2, 1 - absv(be) ** 2, why="without the assumption", symbols=cx, n=2)
    return t


def thermal():
    t = Topic("scalar-thermal", "therm", SYMBOLS)
    A, D = t.agree, t.differ
    w, k, T, be, g, B, mu, N_ = syms("omega k T beta gamma B mu N")
    x = hbar * w / (2 * k * T)
    A("scalar", tanh(x), (1 - exp(-(2 * x))) / (1 + exp(-(2 * x))), (exp(2 * x) - 1) / (exp(2 * x) + 1), (exp(x) - exp(-x)) / (exp(x) + exp(-x)), 1 - 2 / (exp(hbar * w / (k * T)) + 1), tanh(half() * hbar * w / (k * T)), why="polarisation", n=3)
    A("scalar", 1 / (1 + exp(hbar * w / (k * T))), exp(-x) / (2 * cosh(x)), half() * (1 - tanh(x)), exp(-(hbar * w / (k * T))) / (1 + exp(-(hbar * w / (k * T)))), why="upper level", n=3)
    A("scalar", -(hbar * w / 2 * tanh(x)), -(hbar * w / 2) * ((exp(x) - exp(-x)) / (exp(x) + exp(-x))), hbar * w / 2 - hbar * w / (1 + exp(-(hbar * w / (k * T)))), why="mean energy", n=3)
    A("scalar", k * x**2 / cosh(x) ** 2, k * (hbar * w / (2 * k * T)) ** 2 * sec(i * x) ** 2, 4 * k * x**2 / (exp(x) + exp(-x)) ** 2, k * x**2 * (1 - tanh(x) ** 2), k * (hbar * w / (k * T)) ** 2 * exp(hbar * w / (k * T)) / (1 + exp(hbar * w / (k * T))) ** 2, why="Schottky heat capacity", n=2)
    A("scalar", exp(-(hbar * g * B / (k * T))), 1 / exp(hbar * g * B / (k * T)), (1 - tanh(hbar * g * B / (2 * k * T))) / (1 + tanh(hbar * g * B / (2 * k * T))), why="Boltzmann ratio", n=3)
    A("scalar", N_ * mu * tanh(mu * B / (k * T)), N_ * mu * (exp(mu * B / (k * T)) - exp(-(mu * B / (k * T)))) / (exp(mu * B / (k * T)) + exp(-(mu * B / (k * T)))), mu * N_ * tanh(B * mu / (k * T)), why="magnetisation", n=3)
    A("scalar", tanh(be * hbar * w / 2), (exp(be * hbar * w) - 1) / (exp(be * hbar * w) + 1), why="with beta", n=3)
    D("scalar", tanh(x), tanh(hbar * w / (k * T)), x, 1 - x, tanh(w / (2 * k * T)), tanh(x) / 2, -tanh(x), 1 / tanh(x), tanh(hbar * w * k * T / 2), why="polarisation, wrong", n=3)
    D("scalar", 1 / (1 + exp(hbar * w / (k * T))), 1 / (1 + exp(-(hbar * w / (k * T)))), 1 / (exp(hbar * w / (k * T)) - 1), exp(-(hbar * w / (k * T))), 1 / (1 + exp(x)), why="upper level, wrong", n=3)
    D("scalar", -(hbar * w / 2 * tanh(x)), hbar * w / 2 * tanh(x), -(hbar * w * tanh(x)), -(w / 2 * tanh(x)), -(hbar * w / 4 * tanh(x)), -(hbar * w / 2), -(hbar * w / 2 / tanh(x)), why="mean energy, wrong", n=2)
    D("scalar", k * x**2 / cosh(x) ** 2, x**2 / cosh(x) ** 2, k * x / cosh(x) ** 2, k * x**2 / cosh(x), k * x**2 / sinh(x) ** 2, why="heat capacity, wrong", n=2)
    D("scalar", exp(-(hbar * g * B / (k * T))), exp(hbar * g * B / (k * T)), exp(-(hbar * g * B / (2 * k * T))), 1 - hbar * g * B / (k * T), exp(-(g * B / (k * T))), why="Boltzmann ratio, wrong", n=2)
    D("scalar", N_ * mu * tanh(mu * B / (k * T)), N_ * mu**2 * B / (k * T), mu * tanh(mu * B / (k * T)), N_ * tanh(mu * B / (k * T)), N_ * mu * tanh(mu * B / (2 * k * T)), why="magnetisation, wrong or only its limit", n=2)
    D("scalar", tanh(be * hbar * w / 2), tanh(be * w / 2), tanh(be * hbar * w), why="with beta, wrong", n=2)
    return t


def topics():
    return [rabi(), precession(), measurement(), thermal()]
