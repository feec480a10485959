"""The language document's own examples, properties asked for beside the verdict, author-defined slips, and slips on rarer kinds."""

from emit import Topic
from tree import *

SYMBOLS = {"theta": "real", "phi": "real", "t": "real", "omega": "positive", "omega_0": "positive", "omega_1": "positive", "a": "real", "b": "real", "v": "positive", "E_0": "real", "T_1": "positive", "M_0": "positive"}
th, ph, tt, w, w0, w1, a, b, v, E0, T1, M0 = syms("theta phi t omega omega_0 omega_1 a b v E_0 T_1 M_0")


def examples():
    t = Topic("document-examples", "doc", {})
    src = "section 7 of the answer language"
    w_ = {"omega": "positive"}
    say = t.plain
    say("agrees", "operator", "i hbar S_z", "\\frac{i\\hbar^2}{2}\\begin{pmatrix}1&0\\\\0&-1\\end{pmatrix}", "an example of the document", src)
    say("differs", "operator", "i hbar S_z", "-i hbar S_z", "an example of the document", src, slips=["sign", "conjugated", "commutator-order"])
    say("differs", "operator", "exp(-i pi sigma_z)", "I", "an example of the document", src, slips=["sign"])
    say("agrees", "operator", "exp(-i pi sigma_z)", "I", "an example of the document", src, options={"upToPhase": True})
    say("agrees", "eigenvalues", "{hbar omega/2, -hbar omega/2}", "±ħω/2", "an example of the document", src, symbols=w_)
    say("agrees", "state", "|+y>", "(-i, 1)/sqrt(2)", "an example of the document", src, options={"upToPhase": True})
    say("differs", "state", "|+y>", "(1, i)", "an example of the document", src, options={"upToScale": True, "requireNormalised": True}, slips=["not-normalised"])
    say("agrees", "scalar", "cos(theta)^2", "cos²θ", "an example of the document", src, symbols={"theta": "real"})
    say("differs", "scalar", "x", "sqrt(x^2)", "an example of the document", src, symbols={"x": "real"})
    say("unreadable", "scalar", "hbar omega/2", "hbar omega/2 +", "an example of the document", src, symbols=w_)
    say("agrees", "operator", "i*hbar*S_z", "[S_x, S_y]", "the request of section 6", src, symbols=w_, options={"upToPhase": False})
    return t


PROPERTIES = [
    # operator, hermitian, unitary
    (sx, "yes", "yes"), (Sx, "yes", "no"), (Sp, "no", "no"), (i * sz, "no", "yes"), ((sx + sz) / sqrt(2), "yes", "yes"), (exp(-(i * th * sx / 2)), "no", "yes"),
    ((one + sz) / 2, "yes", "no"), (a * sx + b * sz, "yes", "no"), (mat(1, i, i, 1), "no", "no"), (mat(1, i, -i, 1), "yes", "no"), (comm(Sx, Sy), "no", "no"),
    (mat(exp(i * ph), 0, 0, exp(-(i * ph))), "no", "yes"), (ket("+x") * bra("+x"), "yes", "no"), (mat(0, exp(i * ph), exp(-(i * ph)), 0), "yes", "yes"), (mat(cos(th), -sin(th), sin(th), cos(th)), "no", "yes"),
]


def properties():
    """reportHermitian and reportUnitary add evidence about the answer and never change the verdict."""
    t = Topic("operator-properties", "prop", SYMBOLS)
    asked = {"reportHermitian": True, "reportUnitary": True}
    for operator, hermitian, unitary in PROPERTIES:
        t.agree("operator", operator, operator, why="properties of the answer", options=asked, n=2, properties=(hermitian, unitary))
        other = 2 * operator
        t.differ("operator", operator, other, why="properties of a wrong answer", options=asked, n=1, properties=(hermitian, "no"), slips=["factor-two"])
    return t


def author_slips():
    """Wrong answers foreseen by the author: their ids come first."""
    t = Topic("author-slips", "auth", SYMBOLS)

    def foresee(kind, ref, wrong, name, text, *forms):
        options = {"slips": [{"id": name, "expression": text}]}
        t.differ(kind, ref, wrong, *forms, why="the author foresaw it", options=options, slips=[name], n=3)
        t.agree(kind, ref, ref, why="an author-defined slip does not touch a right answer", options=options, n=1)

    foresee("scalar", cos(th / 2) ** 2, (1 + cos(th)) / 3, "thirds", "(1 + cos(theta))/3", q(1, 3) + cos(th) / 3)
    foresee("scalar", M0 * (1 - exp(-(tt / T1))), M0 * (1 - 2 * exp(-(tt / T1))), "inversion-for-saturation", "M_0*(1 - 2*exp(-t/T_1))")
    foresee("scalar", hbar / 2 * sin(th) * cos(ph), hbar / 2 * cos(th), "z-for-x", "hbar/2*cos(theta)", half() * hbar * cos(th))
    foresee("operator", i * hbar * Sz, i * hbar * (Sx + Sy), "sum-of-arguments", "i*hbar*(S_x + S_y)", i * hbar**2 / 2 * (sx + sy))
    foresee("operator", w0 * Sz + w1 * Sx, w0 * Sx + w1 * Sz, "fields-exchanged", "omega_0*S_x + omega_1*S_z", hbar / 2 * (w0 * sx + w1 * sz))
    foresee("eigenvalues", values(E0 + v, E0 - v), values(E0, v), "read-off-the-matrix", "{E_0, v}", values(v, E0))
    foresee("state", ket("+x"), (ket("+") + ket("-")) / 2, "halves", "(|+> + |->)/2", half() * col(1, 1))
    foresee("state", col(cos(th / 2), exp(i * ph) * sin(th / 2)), col(cos(th / 2), sin(th / 2)), "phase-forgotten", "(cos(theta/2), sin(theta/2))", cos(th / 2) * ket("+") + sin(th / 2) * ket("-"))
    foresee("vector", vec(sin(th), 0, cos(th)), vec(1, 0, 1), "angle-forgotten", "(1, 0, 1)")
    foresee("pauli", vec(E0, v, 0, a), vec(E0, 0, v, a), "y-for-x", "(E_0, 0, v, a)", E0 + v * sy + a * sz)
    return t


def rarer():
    t = Topic("slips-rarer", "rare", SYMBOLS)
    D = t.differ
    D("pauli", w1 * Sx + w0 * Sz, w1 * sx + w0 * sz, vec(0, w1, 0, w0), why="sigma for S in the author's form", slips=["pauli-for-spin"], n=2)
    D("pauli", w1 * sx + w0 * sz, w1 * Sx + w0 * Sz, vec(0, hbar * w1 / 2, 0, hbar * w0 / 2), why="S for sigma in the author's form", slips=["spin-for-pauli"], n=2)
    D("operator", (sx + sz) / sqrt(2), lit("0.707") * (sx + sz), mat(lit("0.7071"), lit("0.7071"), lit("0.7071"), -lit("0.7071")), why="rounded decimals", slips=["rounded-decimal"], n=2)
    D("operator", exp(-(i * pi * sy / 6)), mat(lit("0.866"), -lit("0.5"), lit("0.5"), lit("0.866")), why="rounded decimals", slips=["rounded-decimal"], n=2)
    D("pauli", vec(half(), 0, sqrt(3) / 4, 0), vec(lit("0.5"), 0, lit("0.433"), 0), why="rounded decimal", slips=["rounded-decimal"], n=2)
    D("vector", vec(q(1, 3), q(2, 3), -q(2, 3)), vec(lit("0.333"), lit("0.667"), -lit("0.667")), why="rounded decimals", slips=["rounded-decimal"], n=3)
    D("eigenvalues", values(1 + sqrt(2), 1 - sqrt(2)), values(lit("2.414"), -lit("0.414")), values(-lit("0.4142"), lit("2.4142")), why="rounded decimals", slips=["rounded-decimal"], n=3)
    D("eigenvalues", values((2 + sqrt(2)) / 4, (2 - sqrt(2)) / 4), values(lit("0.854"), lit("0.146")), why="rounded decimals", slips=["rounded-decimal"], n=3)
    D("state", col(sqrt(q(2, 3)), 1 / sqrt(3)), col(lit("0.816"), lit("0.577")), lit("0.816") * ket("+") + lit("0.577") * ket("-"), why="rounded decimals", slips=["rounded-decimal"], n=2)
    for ref, wrong in ((E0 * one + v * sx, v * sx), (3 + 2 * sz, 2 * sz), (half() * (one + sx), sx / 2), (w * hbar * (sz + half()), w * hbar * sz), (mat(2, 1, 1, 4), mat(-1, 1, 1, 1)), (mat(a, v, v, b), mat((a - b) / 2, v, v, (b - a) / 2))):
        D("operator", ref, wrong, why="the multiple of the identity left out", slips=["missing-constant"], n=3)
        D("pauli", ref, wrong, why="the multiple of the identity left out", slips=["missing-constant"], n=2)
    for ref, wrong in ((exp(i * th) * sp + exp(-(i * th)) * sm, exp(i * th / 2) * sp + exp(-(i * th / 2)) * sm), (cos(th) * sz + sin(th) * sx, cos(th / 2) * sz + sin(th / 2) * sx), (exp(-(i * th * sz / 2)), exp(-(i * th * sz / 4))), (mat(cos(th), sin(th), sin(th), -cos(th)), mat(cos(th / 2), sin(th / 2), sin(th / 2), -cos(th / 2)))):
        D("operator", ref, wrong, why="half the angle", slips=["half-angle"], n=3)
    D("vector", vec(sin(th), 0, cos(th)), vec(sin(th / 2), 0, cos(th / 2)), why="half the angle", slips=["half-angle"], n=3)
    D("vector", vec(sin(th), 0, cos(th)), vec(cos(th), 0, sin(th)), why="sine and cosine exchanged", slips=["sine-cosine"], n=3)
    D("pauli", vec(0, sin(th), 0, cos(th)), vec(0, sin(th / 2), 0, cos(th / 2)), why="half the angle", slips=["half-angle"], n=3)
    D("pauli", vec(0, sin(th), 0, cos(th)), vec(0, cos(th), 0, sin(th)), why="sine and cosine exchanged", slips=["sine-cosine"], n=3)
    D("operator", cos(th) * sz + sin(th) * sx, sin(th) * sz + cos(th) * sx, why="sine and cosine exchanged", slips=["sine-cosine"], n=3)
    for ref, wrong in ((hbar * w, hbar * w / (2 * pi)), (w0 * Sz, w0 * Sz / (2 * pi)), (values(hbar * w / 2, -(hbar * w / 2)), pm(None, hbar * w / (4 * pi))), (2 * pi * w * tt, w * tt), (sqrt(w0**2 + w1**2), sqrt(w0**2 + w1**2) / (2 * pi))):
        kind = "operator" if ref.a and any(p.k == "op" for p in walk(ref)) else "eigenvalues" if ref.k == "set" else "scalar"
        D(kind, ref, wrong, why="frequency for angular frequency", slips=["missing-two-pi"], n=2)
    h = hbar / 2
    for ref, wrong in ((pairs(h, ket("+"), -h, ket("-")), pairs(h, ket("-"), -h, ket("+"))), (pairs(E0 + v, ket("+y"), E0 - v, ket("-y")), pairs(E0 + v, col(1, -i), E0 - v, col(1, i))), (pairs(q(2), ket("+x"), q(0), ket("-x")), pairs(q(2), col(1, -1), q(0), col(1, 1))), (pairs(q(3), col(2, 1), q(-2), col(1, -2)), pairs(q(-2), col(2, 1), q(3), col(1, -2)))):
        D("eigenpairs", ref, wrong, why="states swapped", slips=["states-swapped"], n=3)
    unit = {"requireNormalised": True}
    D("eigenpairs", pairs(q(3), col(2, 1) / sqrt(5), q(-2), col(1, -2) / sqrt(5)), pairs(q(3), col(2, 1), q(-2), col(1, -2)), pairs(q(3), col(2, 1) / 5, q(-2), col(1, -2) / 5), why="not normalised", options=unit, slips=["not-normalised"], n=3)
    return t


def topics():
    return [examples(), properties(), author_slips(), rarer()]
