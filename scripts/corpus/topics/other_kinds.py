"""Pauli coefficients, vectors, eigenpairs, choices."""

from emit import Topic
from tree import *

SYMBOLS = {"theta": "real", "phi": "real", "t": "real", "omega": "positive", "omega_0": "positive", "omega_1": "positive", "B": "real", "gamma": "positive", "a": "real", "b": "real", "c": "real", "d": "real", "Delta": "real", "v": "positive", "E_0": "real", "r": {"between": ["0", "1"]}, "p": {"between": ["0", "1"]}, "x": "real", "y": "real", "z": "real", "u": "positive", "tau": "positive"}


def pauli():
    t = Topic("pauli", "pauli", SYMBOLS)
    A, D = t.agree, t.differ
    K = "pauli"
    w0, w1, Dl, g, B, a, b, c, d, th, ph, r = syms("omega_0 omega_1 Delta gamma B a b c d theta phi r")
    m = mat(3, 1 - 2 * i, 1 + 2 * i, -1)
    A(K, vec(1, 1, 2, 2), m, one + sx + 2 * sy + 2 * sz, vec(1, 1, 2, 2), 1 + sx + 2 * sy + 2 * sz, why="a Hermitian matrix", n=4)
    D(K, vec(1, 1, 2, 2), vec(0, 1, 2, 2), sx + 2 * sy + 2 * sz, vec(1, 2, 1, 2), vec(1, 2, 2, 1), vec(2, 2, 4, 4), vec(half(), half(), 1, 1), vec(-1, -1, -2, -2), vec(1, 1, -2, 2), vec(1, 1, 2, -2), vec(3, 1, 2, -1), vec(1, 1, 2 * i, 2), why="a Hermitian matrix, wrong", n=2)
    A(K, vec(0, w1 / 2 * hbar, 0, w0 / 2 * hbar), hbar / 2 * (w1 * sx + w0 * sz), w1 * Sx + w0 * Sz, hbar / 2 * mat(w0, w1, w1, -w0), vec(0, hbar * w1 / 2, 0, hbar * w0 / 2), why="a driven spin", n=3)
    D(K, vec(0, hbar * w1 / 2, 0, hbar * w0 / 2), vec(0, hbar * w0 / 2, 0, hbar * w1 / 2), vec(0, w1 / 2, 0, w0 / 2), vec(0, hbar * w1, 0, hbar * w0), vec(0, hbar * w1 / 2, hbar * w0 / 2, 0), vec(0, 0, hbar * w1 / 2, hbar * w0 / 2), -(hbar / 2 * (w1 * sx + w0 * sz)), vec(0, hbar * w1 / 4, 0, hbar * w0 / 4), why="a driven spin, wrong", n=2)
    A(K, vec((a + d) / 2, b, c, (a - d) / 2), mat(a, b - i * c, b + i * c, d), (a + d) / 2 * one + b * sx + c * sy + (a - d) / 2 * sz, vec(half() * (a + d), b, c, half() * (a - d)), why="the general decomposition", n=3)
    D(K, vec((a + d) / 2, b, c, (a - d) / 2), vec(a + d, 2 * b, 2 * c, a - d), vec((a + d) / 2, b, -c, (a - d) / 2), vec((a - d) / 2, b, c, (a + d) / 2), vec(0, b, c, (a - d) / 2), vec((a + d) / 2, c, b, (a - d) / 2), mat(a, b + i * c, b - i * c, d), why="the general decomposition, wrong", n=2)
    A(K, sx * sy, vec(0, 0, 0, i), i * sz, mat(i, 0, 0, -i), why="an operator as reference", n=3)
    A(K, comm(Sx, Sy), vec(0, 0, 0, i * hbar**2 / 2), i * hbar * Sz, why="an operator as reference", n=3)
    D(K, comm(Sx, Sy), vec(0, 0, 0, -(i * hbar**2 / 2)), vec(0, 0, 0, hbar**2 / 2), vec(0, 0, 0, i * hbar**2), vec(i * hbar**2 / 2, 0, 0, 0), why="an operator as reference, wrong", n=2)
    A(K, ket("+x") * bra("+x"), vec(half(), half(), 0, 0), (one + sx) / 2, half() * mat(1, 1, 1, 1), why="a projector", n=3)
    D(K, ket("+x") * bra("+x"), vec(half(), 0, half(), 0), vec(1, 1, 0, 0), vec(0, half(), 0, 0), vec(half(), -half(), 0, 0), why="a projector, wrong", n=2)
    A(K, raw("pauli([[1, 2], [2, 3]])", vec(2, 2, 0, -1)), vec(2, 2, 0, -1), 2 * one + 2 * sx - sz, mat(1, 2, 2, 3), why="computed reference", n=3)
    D(K, raw("pauli([[1, 2], [2, 3]])", vec(2, 2, 0, -1)), vec(2, 2, 0, 1), vec(0, 2, 0, -1), vec(4, 4, 0, -2), vec(2, 0, 2, -1), vec(2, -1, 0, 2), why="computed reference, wrong", n=2)
    A(K, raw("pauli(density((|+> + i|->)/sqrt(2)))", vec(half(), 0, half(), 0)), vec(half(), 0, half(), 0), (one + sy) / 2, why="computed reference", n=3)
    n_s = vec(0, sin(th) * cos(ph), sin(th) * sin(ph), cos(th))
    A(K, n_s, sin(th) * cos(ph) * sx + sin(th) * sin(ph) * sy + cos(th) * sz, mat(cos(th), exp(-(i * ph)) * sin(th), exp(i * ph) * sin(th), -cos(th)), why="a direction", n=3)
    D(K, n_s, vec(0, sin(th) * sin(ph), sin(th) * cos(ph), cos(th)), vec(0, cos(th) * cos(ph), cos(th) * sin(ph), sin(th)), vec(0, sin(th) * cos(ph), -(sin(th) * sin(ph)), cos(th)), vec(1, sin(th) * cos(ph), sin(th) * sin(ph), cos(th)), why="a direction, wrong", n=2)
    A(K, exp(-(i * th * sz / 2)), vec(cos(th / 2), 0, 0, -(i * sin(th / 2))), mat(exp(-(i * th / 2)), 0, 0, exp(i * th / 2)), why="complex coefficients of a rotation", n=3)
    D(K, exp(-(i * th * sz / 2)), vec(cos(th), 0, 0, -(i * sin(th))), vec(cos(th / 2), 0, 0, i * sin(th / 2)), vec(cos(th / 2), 0, 0, -sin(th / 2)), vec(cos(th / 2), -(i * sin(th / 2)), 0, 0), why="a rotation, wrong", n=2)
    A(K, sp, vec(0, half(), i / 2, 0), (sx + i * sy) / 2, mat(0, 1, 0, 0), why="a ladder operator", n=2)
    A(K, q(2), vec(2, 0, 0, 0), 2 * one, mat(2, 0, 0, 2), why="a multiple of the identity", n=2)
    A(K, inv(one + 2 * sx), vec(-q(1, 3), q(2, 3), 0, 0), (2 * sx - 1) / 3, why="an inverse", n=3)
    D(K, inv(one + 2 * sx), vec(1, half(), 0, 0), vec(q(1, 3), -q(2, 3), 0, 0), vec(-q(1, 3), -q(2, 3), 0, 0), why="an inverse, wrong", n=2)
    A(K, -(g * B * Sz) - q(0), vec(0, 0, 0, -(g * B * hbar / 2)), -(g * hbar * B / 2 * sz), why="Zeeman", n=3)
    return t


def vectors():
    t = Topic("vectors", "vec", SYMBOLS)
    A, D = t.agree, t.differ
    K = "vector"
    th, ph, w, tt, r, B, g, p, x, y, z = syms("theta phi omega t r B gamma p x y z")
    n = vec(sin(th) * cos(ph), sin(th) * sin(ph), cos(th))
    A(K, n, vec(cos(ph) * sin(th), sin(ph) * sin(th), cos(th)), vec(2 * sin(th / 2) * cos(th / 2) * cos(ph), sin(th) * sin(ph), 2 * cos(th / 2) ** 2 - 1), vec(half() * (sin(th + ph) + sin(th - ph)), sin(th) * sin(ph), cos(th)), why="a Bloch vector", n=4)
    A(K, raw("bloch(spinor(theta, phi))", n), n, vec(sin(th) * cos(ph), sin(th) * sin(ph), cos(th / 2) ** 2 - sin(th / 2) ** 2), why="computed reference", n=4)
    D(K, n, vec(sin(th) * sin(ph), sin(th) * cos(ph), cos(th)), vec(sin(th / 2) * cos(ph), sin(th / 2) * sin(ph), cos(th / 2)), vec(sin(th) * cos(ph), sin(th) * sin(ph), -cos(th)), vec(cos(th) * cos(ph), cos(th) * sin(ph), sin(th)), vec(cos(th), sin(th) * sin(ph), sin(th) * cos(ph)), vec(-(sin(th) * cos(ph)), -(sin(th) * sin(ph)), -cos(th)), vec(sin(th) * cos(ph), -(sin(th) * sin(ph)), cos(th)), vec(half() * sin(th) * cos(ph), half() * sin(th) * sin(ph), half() * cos(th)), vec(sin(th), sin(th), cos(th)), vec(sin(th) * exp(i * ph), sin(th) * sin(ph), cos(th)), why="a Bloch vector, wrong", n=2)
    S = vec(hbar / 2 * sin(th) * cos(ph + w * tt), hbar / 2 * sin(th) * sin(ph + w * tt), hbar / 2 * cos(th))
    A(K, S, vec(half() * hbar * sin(th) * cos(w * tt + ph), half() * hbar * sin(th) * sin(w * tt + ph), half() * hbar * cos(th)), vec(hbar * sin(th) * cos(ph + w * tt) / 2, hbar * sin(th) * sin(ph + w * tt) / 2, hbar * cos(th) / 2), why="precession", n=4)
    D(K, S, vec(hbar / 2 * sin(th) * cos(ph - w * tt), hbar / 2 * sin(th) * sin(ph - w * tt), hbar / 2 * cos(th)), vec(half() * sin(th) * cos(ph + w * tt), half() * sin(th) * sin(ph + w * tt), half() * cos(th)), vec(hbar * sin(th) * cos(ph + w * tt), hbar * sin(th) * sin(ph + w * tt), hbar * cos(th)), vec(hbar / 2 * sin(th) * sin(ph + w * tt), hbar / 2 * sin(th) * cos(ph + w * tt), hbar / 2 * cos(th)), vec(hbar / 2 * sin(th) * cos(ph), hbar / 2 * sin(th) * sin(ph), hbar / 2 * cos(th)), vec(hbar / 2 * sin(th) * cos(ph + w * tt), hbar / 2 * sin(th) * sin(ph + w * tt), q(0)), why="precession, wrong", n=2)
    A(K, vec(half(), 0, half()), vec(lit("0.5"), 0, lit("0.5")), vec(q(2, 4), 0, q(1, 2)), why="an equal mixture", n=3)
    A(K, raw("bloch([[3/4, 1/4], [1/4, 1/4]])", vec(half(), 0, half())), vec(half(), 0, half()), why="computed reference", n=3)
    D(K, vec(half(), 0, half()), vec(1, 0, 1), vec(half(), half(), 0), vec(0, half(), half()), vec(-half(), 0, -half()), vec(q(1, 4), 0, q(1, 4)), vec(1 / sqrt(2), 0, 1 / sqrt(2)), why="an equal mixture, wrong", n=2)
    A(K, vec(1 / sqrt(2), 0, 1 / sqrt(2)), vec(sqrt(2) / 2, 0, sqrt(2) / 2), vec(cos(pi / 4), 0, sin(pi / 4)), why="a diagonal direction", n=4)
    D(K, vec(1 / sqrt(2), 0, 1 / sqrt(2)), vec(lit("0.707"), 0, lit("0.707")), why="rounded decimals", slips=["rounded-decimal"])
    D(K, vec(1 / sqrt(2), 0, 1 / sqrt(2)), vec(half(), 0, half()), vec(1 / sqrt(2), 1 / sqrt(2), 0), vec(0, 1 / sqrt(2), 1 / sqrt(2)), vec(-(1 / sqrt(2)), 0, -(1 / sqrt(2))), vec(sqrt(2), 0, sqrt(2)), why="a diagonal direction, wrong", n=2)
    A(K, vec(0, 2 * hbar / 5, -(3 * hbar / 10)), vec(0, q(2, 5) * hbar, -(q(3, 10) * hbar)), vec(q(0), lit("0.4") * hbar, -(lit("0.3") * hbar)), why="spin of (1, 2i)/sqrt 5", n=4)
    D(K, vec(0, 2 * hbar / 5, -(3 * hbar / 10)), vec(0, 4 * hbar / 5, -(3 * hbar / 5)), vec(0, q(2, 5), -q(3, 10)), vec(0, -(2 * hbar / 5), -(3 * hbar / 10)), vec(2 * hbar / 5, 0, -(3 * hbar / 10)), vec(0, 2 * hbar / 5, 3 * hbar / 10), vec(0, 2 * i * hbar / 5, -(3 * hbar / 10)), vec(0, -(3 * hbar / 10), 2 * hbar / 5), why="spin of (1, 2i)/sqrt 5, wrong", n=2)
    torque = vec(g * B * y, -(g * B * x), 0)
    A(K, torque, vec(B * g * y, -(x * g * B), 0), why="gamma S x B for B along z", n=4)
    D(K, torque, vec(-(g * B * y), g * B * x, 0), vec(g * B * x, -(g * B * y), 0), vec(g * B * y, g * B * x, 0), vec(B * y, -(B * x), 0), vec(0, g * B * y, -(g * B * x)), why="the torque, wrong", n=2)
    cross = vec(y * 3 - z * 2, z * 1 - x * 3, x * 2 - y * 1)
    A(K, cross, vec(3 * y - 2 * z, z - 3 * x, 2 * x - y), vec(-(2 * z) + 3 * y, -(3 * x) + z, -y + 2 * x), why="a cross product with (1, 2, 3)", n=3)
    D(K, cross, vec(2 * z - 3 * y, 3 * x - z, y - 2 * x), vec(3 * y - 2 * z, 3 * x - z, 2 * x - y), vec(x, 2 * y, 3 * z), why="a cross product, wrong", n=2)
    A(K, vec(r * cos(w * tt), -(r * sin(w * tt)), sqrt(1 - r**2)), vec(r * cos(w * tt), r * sin(-(w * tt)), sqrt((1 - r) * (1 + r))), vec(r * (exp(i * w * tt) + exp(-(i * w * tt))) / 2, -(r * sin(w * tt)), sqrt(1 - r**2)), why="precession with positive gamma", n=3)
    D(K, vec(r * cos(w * tt), -(r * sin(w * tt)), sqrt(1 - r**2)), vec(r * cos(w * tt), r * sin(w * tt), sqrt(1 - r**2)), vec(r * cos(w * tt), -(r * sin(w * tt)), 1 - r**2), vec(r * sin(w * tt), -(r * cos(w * tt)), sqrt(1 - r**2)), vec(r * cos(w * tt), -(r * sin(w * tt)), 1 - r), why="precession with positive gamma, wrong", n=2)
    A(K, vec(0, 0, 2 * p - 1), vec(0, 0, p - (1 - p)), vec(0, 0, 1 - 2 * (1 - p)), why="a mixture", n=3)
    D(K, vec(0, 0, 2 * p - 1), vec(0, 0, 1 - 2 * p), vec(0, 0, p), vec(2 * p - 1, 0, 0), vec(0, 2 * p - 1, 0), vec(0, 0, p - half()), why="a mixture, wrong", n=2)
    return t


def eigenpairs():
    t = Topic("eigenpairs", "pairs", SYMBOLS)
    A, D = t.agree, t.differ
    K = "eigenpairs"
    th, ph, w, v, E0, a, b = syms("theta phi omega v E_0 a b")
    P, M = ket("+"), ket("-")
    h = hbar / 2
    A(K, pairs(h, ket("+x"), -h, ket("-x")), pairs(h, (P + M) / sqrt(2), -h, (P - M) / sqrt(2)), pairs(-h, col(1, -1), h, col(1, 1)), pairs(h, P + M, -h, M - P), pairs(h, col(1, 1) / sqrt(2), -h, col(-1, 1) / sqrt(2)), why="S_x", n=3)
    A(K, pairs(h, ket("+y"), -h, ket("-y")), pairs(h, col(1, i), -h, col(1, -i)), pairs(h, col(-i, 1), -h, col(i, 1)), pairs(-h, (P - i * M) / sqrt(2), h, (P + i * M) / sqrt(2)), why="S_y", n=3)
    A(K, pairs(q(1), P, q(-1), M), pairs(q(-1), col(0, 1), q(1), col(1, 0)), pairs(q(1), ket("+"), q(-1), -ket("-")), pairs(q(1), 3 * P, q(-1), i * M), why="sigma_z", n=3)
    A(K, pairs(E0 + v, ket("+x"), E0 - v, ket("-x")), pairs(E0 - v, col(1, -1) / sqrt(2), E0 + v, col(1, 1) / sqrt(2)), pairs(E0 + v, col(1, 1), E0 - v, col(-1, 1)), why="two coupled levels", n=3)
    A(K, raw("eigenpairs([[E_0, v], [v, E_0]])", pairs(E0 + v, ket("+x"), E0 - v, ket("-x"))), pairs(E0 + v, P + M, E0 - v, P - M), why="computed reference", n=3)
    A(K, raw("eigenpairs(sigma_y)", pairs(q(1), ket("+y"), q(-1), ket("-y"))), pairs(q(-1), col(1, -i), q(1), col(1, i)), pairs(q(1), col(1, i) / sqrt(2), q(-1), col(i, 1) / sqrt(2)), why="computed reference", n=3)
    sp_, sm_ = col(cos(th / 2), exp(i * ph) * sin(th / 2)), col(sin(th / 2), -(exp(i * ph) * cos(th / 2)))
    A(K, pairs(q(1), sp_, q(-1), sm_), pairs(q(1), col(exp(-(i * ph / 2)) * cos(th / 2), exp(i * ph / 2) * sin(th / 2)), q(-1), col(-(exp(-(i * ph / 2)) * sin(th / 2)), exp(i * ph / 2) * cos(th / 2))), pairs(q(1), col(1 + cos(th), exp(i * ph) * sin(th)), q(-1), col(1 - cos(th), -(exp(i * ph) * sin(th)))), pairs(q(-1), col(-(exp(-(i * ph)) * sin(th / 2)), cos(th / 2)), q(1), sp_), why="spin along a direction", n=3)
    A(K, pairs(q(4), col(1 - 2 * i, 1), q(-2), col(1, -(1 + 2 * i))), pairs(q(4), col(5, 1 + 2 * i), q(-2), col(-1, 1 + 2 * i)), pairs(q(-2), col(1 - 2 * i, -5), q(4), col(1 - 2 * i, 1)), why="[[3, 1-2i], [1+2i, -1]]", n=3)
    A(K, pairs(q(3), col(1, 1), q(3), col(1, -1)), pairs(q(3), P, q(3), M), pairs(q(3), col(1, 2), q(3), col(i, 1)), why="degenerate: any two independent states", n=3, proof="two independent states span the plane")
    D(K, pairs(q(3), P, q(3), M), pairs(q(3), P, q(3), 2 * P), pairs(q(3), P, q(2), M), pairs(q(3), P + M, q(3), -P - M), why="degenerate, but the states do not span, or a value is wrong", n=2, quiet=True)
    unit = {"requireNormalised": True}
    A(K, pairs(h, ket("+x"), -h, ket("-x")), pairs(h, (P + M) / sqrt(2), -h, (M - P) / sqrt(2)), pairs(-h, i * col(1, -1) / sqrt(2), h, col(1, 1) / sqrt(2)), why="normalised", options=unit, n=3)
    D(K, pairs(h, ket("+x"), -h, ket("-x")), pairs(h, P + M, -h, P - M), pairs(h, col(1, 1), -h, col(1, -1)), pairs(h, (P + M) / sqrt(2), -h, P - M), why="not normalised", options=unit, slips=["not-normalised"], n=2)
    D(K, pairs(h, ket("+x"), -h, ket("-x")), pairs(-h, P + M, h, P - M), pairs(h, ket("-x"), -h, ket("+x")), why="states swapped", n=3)
    D(K, pairs(h, ket("+x"), -h, ket("-x")), pairs(h, ket("+y"), -h, ket("-y")), pairs(h, P, -h, M), pairs(h, ket("+x"), -h, ket("+x")), why="wrong states", n=2, quiet=True)
    D(K, pairs(h, ket("+x"), -h, ket("-x")), pairs(hbar, ket("+x"), -hbar, ket("-x")), pairs(half(), ket("+x"), -half(), ket("-x")), why="wrong values", n=2, quiet=True)
    D(K, pairs(E0 + v, ket("+x"), E0 - v, ket("-x")), pairs(E0 + v, P - M, E0 - v, P + M), why="states swapped", n=3)
    D(K, pairs(E0 + v, ket("+x"), E0 - v, ket("-x")), pairs(v, P + M, -v, P - M), pairs(E0 + v, P, E0 - v, M), pairs(E0 + 2 * v, P + M, E0 - 2 * v, P - M), why="centre lost, wrong states or values", n=2, quiet=True)
    D(K, pairs(q(1), sp_, q(-1), sm_), pairs(q(-1), sp_, q(1), sm_), why="states swapped", n=3)
    D(K, pairs(q(1), sp_, q(-1), sm_), pairs(q(1), col(cos(th), exp(i * ph) * sin(th)), q(-1), col(sin(th), -(exp(i * ph) * cos(th)))), why="full for half angle", slips=["double-angle"], n=2)
    D(K, pairs(q(1), ket("+y"), q(-1), ket("-y")), pairs(q(1), col(1, -i), q(-1), col(1, i)), why="states swapped", n=3)
    D(K, pairs(q(4), col(1 - 2 * i, 1), q(-2), col(1, -(1 + 2 * i))), pairs(q(-2), col(1 - 2 * i, 1), q(4), col(1, -(1 + 2 * i))), why="states swapped", n=2)
    D(K, pairs(q(4), col(1 - 2 * i, 1), q(-2), col(1, -(1 + 2 * i))), pairs(q(4), col(1 + 2 * i, 1), q(-2), col(1, -(1 - 2 * i))), pairs(q(3), col(1 - 2 * i, 1), q(-3), col(1, -(1 + 2 * i))), why="conjugated states, or values about zero", n=2, quiet=True)
    return t


def choices():
    t = Topic("choices", "choice", {})
    two = {"choices": ["clockwise", "counterclockwise"]}
    src = "by definition of the kind"
    for text in ("clockwise", "Clockwise", "  clockwise ", "CLOCKWISE"):
        t.plain("agrees", "choice", "clockwise", text, "trimmed and case-folded", src, options=two)
        t.plain("differs", "choice", "counterclockwise", text, "the other choice", src, options=two)
    yes = {"choices": ["yes", "no", "only for B = 0"]}
    for text in ("yes", "Yes", "YES "):
        t.plain("agrees", "choice", "yes", text, "trimmed and case-folded", src, options=yes)
        t.plain("differs", "choice", "no", text, "another choice", src, options=yes)
    for text in ("only for B = 0", "Only for B = 0", " only for b = 0 "):
        t.plain("agrees", "choice", "only for B = 0", text, "a label with spaces and a sign", src, options=yes)
        t.plain("differs", "choice", "yes", text, "another choice", src, options=yes)
    greek = {"choices": ["σ_x", "σ_y", "σ_z"]}
    t.plain("agrees", "choice", "σ_x", "Σ_X", "case-folding of Greek letters", src, options=greek)
    t.plain("differs", "choice", "σ_x", "σ_y", "another choice", src, options=greek)
    for text in ("maybe", "", "clockwis", "clockwise or counterclockwise"):
        t.plain("unreadable", "choice", "clockwise", text, "no label of the list", src, options=two)
    return t


def topics():
    return [pauli(), vectors(), eigenpairs(), choices()]
