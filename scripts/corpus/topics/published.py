"""Published values as checks: the reference is computed by the checker from the statement, the answer is the published value.

`published-values.json` holds the rows as published, each with its source and how sure it is.
"""

import json
import os

from emit import FOLDER, Topic

with open(os.path.join(os.path.dirname(__file__), "..", "published-values.json"), encoding="utf-8") as f:
    ROWS = json.load(f)["rows"]

A = {"theta": "real", "phi": "real"}
V = {"a_1": "real", "a_2": "real", "a_3": "real", "b_1": "real", "b_2": "real", "b_3": "real"}
V1 = {k: v for k, v in V.items() if k[0] == "a"}
H4 = {"p": "real", "q": "real", "r": "real", "s": "real"}
R3 = {k: {"between": ["-1/2", "1/2"]} for k in "xyz"}
AS, BS = "(a_1*sigma_x + a_2*sigma_y + a_3*sigma_z)", "(b_1*sigma_x + b_2*sigma_y + b_3*sigma_z)"
CROSS = "((a_2*b_3 - a_3*b_2)*sigma_x + (a_3*b_1 - a_1*b_3)*sigma_y + (a_1*b_2 - a_2*b_1)*sigma_z)"
N = "(sin(theta)*cos(phi)*sigma_x + sin(theta)*sin(phi)*sigma_y + cos(theta)*sigma_z)"
NV = "(sin(theta)*cos(phi), sin(theta)*sin(phi), cos(theta))"
RHO = "(I + x*sigma_x + y*sigma_y + z*sigma_z)/2"
CHI = "(1+i, 2)/sqrt(6)"
CHI2 = "(3i, 4)/5"
TH = {"theta": "real"}
W0 = {"omega_0": "positive", "t": "real"}
RAB = {"omega_1": "positive", "Delta": "real", "t": "real"}
REL = lambda x: {"tolerance": {"relative": x}}
ABS = lambda x: {"tolerance": {"absolute": x}}

# row, kind, reference, answer, symbols, options
CHECKS = [
    ("A001", "operator", "sigma_x", "[[0,1],[1,0]]", {}, {}),
    ("A001", "operator", "sigma_y", "[[0,-i],[i,0]]", {}, {}),
    ("A001", "operator", "sigma_z", "[[1,0],[0,-1]]", {}, {}),
    *[("A002", "operator", f"sigma_{x}^2", "I", {}, {}) for x in "xyz"],
    ("A003", "operator", "sigma_x*sigma_y", "i sigma_z", {}, {}),
    ("A003", "operator", "sigma_y*sigma_z", "i sigma_x", {}, {}),
    ("A003", "operator", "sigma_z*sigma_x", "i sigma_y", {}, {}),
    ("A004", "operator", "sigma_y*sigma_x", "-i sigma_z", {}, {}),
    ("A006", "operator", "commutator(sigma_x, sigma_y)", "2 i sigma_z", {}, {}),
    ("A006", "operator", "commutator(sigma_y, sigma_z)", "2 i sigma_x", {}, {}),
    ("A006", "operator", "commutator(sigma_z, sigma_x)", "2 i sigma_y", {}, {}),
    *[("A007", "operator", f"anticommutator(sigma_{x}, sigma_{y})", "2 I" if x == y else "0", {}, {}) for x, y in ("xx", "xy", "yz", "zx", "zz")],
    *[("A008", "scalar", f"trace(sigma_{x})", "0", {}, {}) for x in "xyz"],
    *[("A008", "scalar", f"determinant(sigma_{x})", "-1", {}, {}) for x in "xyz"],
    *[("A008", "eigenvalues", f"eigenvalues(sigma_{x})", "{1, -1}", {}, {}) for x in "xyz"],
    ("A009", "operator", "sigma_x*sigma_y*sigma_z", "i I", {}, {}),
    ("A010", "operator", "sigma_x*sigma_y*sigma_x", "-sigma_y", {}, {}),
    ("A010", "operator", "sigma_z*sigma_x*sigma_z", "-sigma_x", {}, {}),
    ("A011", "operator", AS + "*" + BS, "(a_1*b_1 + a_2*b_2 + a_3*b_3)*I + i*" + CROSS, V, {}),
    ("A012", "operator", AS + "^2", "(a_1^2 + a_2^2 + a_3^2) I", V1, {}),
    ("A013", "operator", f"commutator({AS}, {BS})", "2*i*" + CROSS, V, {}),
    ("A014", "operator", f"anticommutator({AS}, {BS})", "2*(a_1*b_1 + a_2*b_2 + a_3*b_3)*I", V, {}),
    ("A015", "scalar", "trace(sigma_x*sigma_x)", "2", {}, {}),
    ("A015", "scalar", "trace(sigma_x*sigma_y)", "0", {}, {}),
    ("A015", "scalar", "trace(sigma_x*sigma_y*sigma_z)", "2 i", {}, {}),
    ("A016", "scalar", "trace(sigma_x*sigma_y*sigma_x*sigma_y)", "-2", {}, {}),
    ("A016", "scalar", "trace(sigma_x*sigma_x*sigma_y*sigma_y)", "2", {}, {}),
    *[("A018", "operator", f"sigma_x*sigma_{j}*sigma_x + sigma_y*sigma_{j}*sigma_y + sigma_z*sigma_{j}*sigma_z", f"-sigma_{j}", {}, {}) for j in "xyz"],
    ("A019", "operator", "commutator(S_x, S_y)", "i hbar S_z", {}, {}),
    ("A019", "operator", "S_x^2 + S_y^2 + S_z^2", "(3/4) hbar^2 I", {}, {}),
    ("A020", "operator", "anticommutator(S_x, S_x)", "hbar^2/2 I", {}, {}),
    ("A020", "operator", "anticommutator(S_x, S_z)", "0", {}, {}),
    ("A021", "operator", "S_+", "hbar [[0,1],[0,0]]", {}, {}),
    ("A021", "operator", "S_-", "hbar [[0,0],[1,0]]", {}, {}),
    ("A022", "state", "S_+|->", "hbar|+>", {}, {}),
    ("A022", "state", "S_-|+>", "hbar|->", {}, {}),
    ("A023", "operator", "commutator(S_+, S_-)", "2 hbar S_z", {}, {}),
    ("A023", "operator", "commutator(S_z, S_+)", "hbar S_+", {}, {}),
    ("A023", "operator", "commutator(S_z, S_-)", "-hbar S_-", {}, {}),
    ("A023", "operator", "S_+^2", "0", {}, {}),
    ("A024", "state", "sigma_x|+>", "|->", {}, {}),
    ("A024", "state", "sigma_x|->", "|+>", {}, {}),
    ("A024", "state", "sigma_y|+>", "i|->", {}, {}),
    ("A024", "state", "sigma_y|->", "-i|+>", {}, {}),
    ("A024", "state", "sigma_z|->", "-|->", {}, {}),
    ("A026", "pauli", "pauli([[p, q - i*r], [q + i*r, s]])", "((p+s)/2, q, r, (p-s)/2)", H4, {}),
    ("A027", "eigenvalues", "eigenvalues(a_0*I + a_1*sigma_x + a_2*sigma_y + a_3*sigma_z)", "a_0 +- sqrt(a_1^2+a_2^2+a_3^2)", {"a_0": "real", **V1}, {}),
    ("A028", "scalar", "trace(a_0*I + a_1*sigma_x + a_2*sigma_y + a_3*sigma_z)", "2 a_0", {"a_0": "real", **V1}, {}),
    ("A028", "scalar", "determinant(a_0*I + a_1*sigma_x + a_2*sigma_y + a_3*sigma_z)", "a_0^2 - (a_1^2 + a_2^2 + a_3^2)", {"a_0": "real", **V1}, {}),
    ("A028", "scalar", "trace((a_0*I + a_1*sigma_x + a_2*sigma_y + a_3*sigma_z)^2)", "2*(a_0^2 + a_1^2 + a_2^2 + a_3^2)", {"a_0": "real", **V1}, {}),
    ("A029", "pauli", "pauli([[3, 1-2i], [1+2i, -1]])", "(1, 1, 2, 2)", {}, {}),
    ("A029", "eigenvalues", "eigenvalues([[3, 1-2i], [1+2i, -1]])", "{4, -2}", {}, {}),
    ("A030", "eigenvalues", "eigenvalues([[1, 2], [2, 3]])", "2 +- sqrt(5)", {}, {}),
    ("A031", "operator", "exp([[0,1],[1,0]])", "[[cosh(1), sinh(1)], [sinh(1), cosh(1)]]", {}, {}),
    ("A032", "operator", N, "[[cos(theta), exp(-i*phi)*sin(theta)], [exp(i*phi)*sin(theta), -cos(theta)]]", A, {}),
    ("A033", "state", "spinor(theta, phi)", "(cos(theta/2), exp(i*phi)*sin(theta/2))", A, {"upToPhase": True}),
    ("A033", "eigenpairs", f"eigenpairs{N}", "1: (cos(theta/2), exp(i*phi)*sin(theta/2)); -1: (sin(theta/2), -exp(i*phi)*cos(theta/2))", A, {}),
    ("A034", "state", "(sin(theta/2), -exp(i*phi)*cos(theta/2))", "(-exp(-i*phi)*sin(theta/2), cos(theta/2))", A, {"upToPhase": True}),
    ("A035", "eigenpairs", "eigenpairs(sigma_x)", "1: (1,1)/sqrt(2); -1: (1,-1)/sqrt(2)", {}, {"requireNormalised": True}),
    ("A035", "eigenpairs", "eigenpairs(sigma_y)", "1: (1,i)/sqrt(2); -1: (1,-i)/sqrt(2)", {}, {"requireNormalised": True}),
    ("A037", "state", "spinor(pi/3, pi/4)", "(sqrt(3)/2, (1+i)/(2*sqrt(2)))", {}, {}),
    ("A038", "operator", "projector(|+>)^2", "(I + sigma_z)/2", {}, {}),
    ("A038", "scalar", "trace(projector(spinor(theta, phi)))", "1", A, {}),
    ("A038", "operator", "projector(|+x>)*projector(|-x>)", "0", {}, {}),
    ("A038", "operator", "projector(|+y>) + projector(|-y>)", "I", {}, {}),
    ("A039", "operator", "projector(spinor(theta, phi))", "[[cos(theta/2)^2, exp(-i*phi)*sin(theta)/2], [exp(i*phi)*sin(theta)/2, sin(theta/2)^2]]", A, {}),
    ("A040", "scalar", "probability(|+>, spinor(theta, phi))", "cos(theta/2)^2", A, {}),
    *[("A041", "scalar", f"probability(|+>, spinor({angle}, 0))", value, {}, {}) for angle, value in (("0", "1"), ("pi/6", "(2+sqrt(3))/4"), ("pi/4", "(2+sqrt(2))/4"), ("pi/3", "3/4"), ("pi/2", "1/2"), ("2*pi/3", "1/4"), ("3*pi/4", "(2-sqrt(2))/4"), ("pi", "0"))],
    ("A042", "scalar", "probability(spinor(theta, 0), |+>)*probability(|->, spinor(theta, 0))", "sin(theta)^2/4", TH, {}),
    ("A043", "scalar", "cos(pi/4)^4", "1/4", {}, {}),
    ("A043", "scalar", "cos(pi/6)^6", "27/64", {}, {}),
    ("A043", "scalar", "cos(pi/20)^20", "0.7805", {}, ABS(0.00005)),
    ("A044", "operator", f"rotation({NV}, a)", "cos(a/2) I - i sin(a/2) " + N, {**A, "a": "real"}, {}),
    ("A046", "operator", "rotation((1, 0, 0), theta)", "[[cos(theta/2), -i*sin(theta/2)], [-i*sin(theta/2), cos(theta/2)]]", TH, {}),
    ("A046", "operator", "rotation((0, 1, 0), theta)", "[[cos(theta/2), -sin(theta/2)], [sin(theta/2), cos(theta/2)]]", TH, {}),
    ("A046", "operator", "rotation((0, 0, 1), theta)", "[[exp(-i*theta/2), 0], [0, exp(i*theta/2)]]", TH, {}),
    ("A047", "operator", "rotation((0, 0, 1), 2*pi)", "-1", {}, {}),
    ("A047", "operator", "rotation((1, 0, 0), 4*pi)", "1", {}, {}),
    ("A048", "operator", "rotation((1, 0, 0), pi)", "-i sigma_x", {}, {}),
    ("A048", "operator", "rotation((0, 1, 0), pi)", "-i sigma_y", {}, {}),
    ("A048", "operator", "rotation((0, 0, 1), pi)", "-i sigma_z", {}, {}),
    ("A049", "state", "rotation((0, 1, 0), pi/2)|+>", "|+x>", {}, {}),
    ("A049", "state", "rotation((1, 0, 0), pi/2)|+>", "(1, -i)/sqrt(2)", {}, {}),
    ("A051", "scalar", "trace(rotation((0, 0, 1), a)*rotation((1, 0, 0), b))/2", "cos(a/2)*cos(b/2)", {"a": "real", "b": "real"}, {}),
    ("A051", "scalar", "trace(rotation((0, 0, 1), a)*rotation((0, 0, 1), b))/2", "cos(a/2)*cos(b/2) - sin(a/2)*sin(b/2)", {"a": "real", "b": "real"}, {}),
    ("A052", "operator", "rotation((0,0,1), alpha)*rotation((0,1,0), beta)*rotation((0,0,1), gamma)", "[[exp(-i*(alpha+gamma)/2)*cos(beta/2), -exp(-i*(alpha-gamma)/2)*sin(beta/2)], [exp(i*(alpha-gamma)/2)*sin(beta/2), exp(i*(alpha+gamma)/2)*cos(beta/2)]]", {"alpha": "real", "beta": "real", "gamma": "real"}, {}),
    ("A053", "scalar", "<+|rotation((0,1,0), theta)|+>", "cos(theta/2)", TH, {}),
    ("A053", "scalar", "<+|rotation((0,1,0), theta)|->", "-sin(theta/2)", TH, {}),
    ("A053", "scalar", "<-|rotation((0,1,0), theta)|+>", "sin(theta/2)", TH, {}),
    ("A056", "operator", "rotation((0,0,1), phi)*sigma_x*adjoint(rotation((0,0,1), phi))", "cos(phi) sigma_x + sin(phi) sigma_y", {"phi": "real"}, {}),
    ("A058", "operator", "(sigma_x + sigma_z)/sqrt(2)", "[[1,1],[1,-1]]/sqrt(2)", {}, {}),
    ("A058", "operator", "(sigma_x + sigma_z)/sqrt(2)*sigma_x*(sigma_x + sigma_z)/sqrt(2)", "sigma_z", {}, {}),
    ("A058", "operator", "i*rotation((1/sqrt(2), 0, 1/sqrt(2)), pi)", "(sigma_x + sigma_z)/sqrt(2)", {}, {}),
    ("A063", "vector", "bloch(spinor(theta, phi))", NV, A, {}),
    ("A064", "scalar", "expectation(S_x, (1, 2i)/sqrt(5))", "0", {}, {}),
    ("A064", "scalar", "expectation(S_y, (1, 2i)/sqrt(5))", "(2/5) hbar", {}, {}),
    ("A064", "scalar", "expectation(S_z, (1, 2i)/sqrt(5))", "-(3/10) hbar", {}, {}),
    ("A065", "scalar", f"probability(|+>, {CHI})", "1/3", {}, {}),
    ("A065", "scalar", f"probability(|+x>, {CHI})", "5/6", {}, {}),
    ("A065", "scalar", f"expectation(S_x, {CHI})", "hbar/3", {}, {}),
    ("A066", "scalar", f"expectation(S_x, {CHI2})", "0", {}, {}),
    ("A066", "scalar", f"expectation(S_y, {CHI2})", "-(12/25) hbar", {}, {}),
    ("A066", "scalar", f"expectation(S_z, {CHI2})", "-(7/50) hbar", {}, {}),
    ("A066", "scalar", f"uncertainty(S_x, {CHI2})", "hbar/2", {}, {}),
    ("A066", "scalar", f"uncertainty(S_y, {CHI2})", "(7/50) hbar", {}, {}),
    ("A066", "scalar", f"uncertainty(S_z, {CHI2})", "(12/25) hbar", {}, {}),
    ("A067", "scalar", "variance(S_x, spinor(theta, phi))", "(hbar^2/4)*(1 - (sin(theta)*cos(phi))^2)", A, {}),
    ("A068", "scalar", "variance(S_x, spinor(theta, phi)) + variance(S_y, spinor(theta, phi)) + variance(S_z, spinor(theta, phi))", "hbar^2/2", A, {}),
    ("A069", "scalar", f"variance(S_x, {RHO}) + variance(S_y, {RHO}) + variance(S_z, {RHO})", "(hbar^2/4)*(3 - x^2 - y^2 - z^2)", R3, {}),
    ("A071", "scalar", "uncertainty(S_x, |+>)*uncertainty(S_y, |+>)", "hbar^2/4", {}, {}),
    ("A072", "scalar", "uncertainty(S_x, spinor(pi/3, pi/4))*uncertainty(S_y, spinor(pi/3, pi/4))", "(5/32) hbar^2", {}, {}),
    ("A074", "scalar", f"trace({RHO})", "1", R3, {}),
    ("A074", "scalar", f"determinant({RHO})", "(1 - x^2 - y^2 - z^2)/4", R3, {}),
    ("A074", "scalar", f"purity({RHO})", "(1 + x^2 + y^2 + z^2)/2", R3, {}),
    ("A078", "operator", "projector(|+>)/2 + projector(|+x>)/2", "[[3/4,1/4],[1/4,1/4]]", {}, {}),
    ("A078", "vector", "bloch(projector(|+>)/2 + projector(|+x>)/2)", "(1/2, 0, 1/2)", {}, {}),
    ("A078", "scalar", "purity(projector(|+>)/2 + projector(|+x>)/2)", "3/4", {}, {}),
    ("A078", "eigenvalues", "eigenvalues(projector(|+>)/2 + projector(|+x>)/2)", "{(2+sqrt(2))/4, (2-sqrt(2))/4}", {}, {}),
    ("A078", "scalar", "entropy(projector(|+>)/2 + projector(|+x>)/2)", "0.416496", {}, ABS(0.000001)),
    ("A079", "operator", "projector(|+>)/2 + projector(|->)/2", "(|+x><+x| + |-x><-x|)/2", {}, {}),
    ("A079", "scalar", "purity(I/2)", "1/2", {}, {}),
    ("A079", "scalar", "entropy(I/2)", "ln 2", {}, {}),
    ("A081", "vector", f"bloch({RHO})", "(x, y, z)", R3, {}),
    ("A083", "scalar", "expectation(S_x, evolve(omega_0*S_z, t, spinor(theta, phi)))", "(hbar/2) sin(theta) cos(phi + omega_0 t)", {**A, **W0}, {}),
    ("A083", "scalar", "expectation(S_y, evolve(omega_0*S_z, t, spinor(theta, phi)))", "(hbar/2) sin(theta) sin(phi + omega_0 t)", {**A, **W0}, {}),
    ("A083", "scalar", "expectation(S_z, evolve(omega_0*S_z, t, spinor(theta, phi)))", "(hbar/2) cos(theta)", {**A, **W0}, {}),
    ("A084", "scalar", "expectation(S_x, evolve(-gamma*B*S_z, t, spinor(theta, phi)))", "(hbar/2) sin(theta) cos(phi - gamma B t)", {**A, "gamma": "positive", "B": "positive", "t": "real"}, {}),
    ("A084", "scalar", "expectation(S_y, evolve(-gamma*B*S_z, t, spinor(theta, phi)))", "(hbar/2) sin(theta) sin(phi - gamma B t)", {**A, "gamma": "positive", "B": "positive", "t": "real"}, {}),
    ("A085", "scalar", "probability(|+x>, evolve(omega_0*S_z, t, |+x>))", "cos(omega_0 t/2)^2", W0, {}),
    ("A085", "scalar", "probability(|-x>, evolve(omega_0*S_z, t, |+x>))", "sin(omega_0 t/2)^2", W0, {}),
    ("A085", "scalar", "expectation(S_y, evolve(omega_0*S_z, t, |+x>))", "(hbar/2) sin(omega_0 t)", W0, {}),
    ("A087", "scalar", "rabi(omega_1, Delta, t)", "omega_1^2/(omega_1^2+Delta^2)*sin(sqrt(omega_1^2+Delta^2)*t/2)^2", RAB, {}),
    ("A087", "scalar", "probability(|->, evolve(hbar/2*(omega_1*sigma_x - Delta*sigma_z), t, |+>))", "omega_1^2/(omega_1^2+Delta^2)*sin(sqrt(omega_1^2+Delta^2)*t/2)^2", RAB, {}),
    *[("A090", "scalar", f"rabi(omega_1, {d}, pi/(omega_1*{root}))", value, {"omega_1": "positive"}, {}) for d, root, value in (("0", "1", "1"), ("omega_1", "sqrt(2)", "1/2"), ("sqrt(3)*omega_1", "2", "1/4"), ("2*omega_1", "sqrt(5)", "1/5"))],
    ("A094", "scalar", "rabi(2*pi*1000, 2*pi*1000, 0.00025)", "0.401424967", {}, ABS(1e-9)),
    ("A096", "scalar", "exp(-2*pi*0.3^2)", "0.568084", {}, ABS(1e-6)),
    ("A097", "operator", "rotation((1,0,0), pi)*rotation((0,0,1), phi)*rotation((1,0,0), pi)*rotation((0,0,1), phi)", "-1", {"phi": "real"}, {}),
    ("A098", "scalar", "probability(|->, rotation((1,0,0), pi/2)*rotation((0,0,1), Delta*T)*rotation((1,0,0), pi/2)|+>)", "cos(Delta T/2)^2", {"Delta": "real", "T": "positive"}, {}),
    ("T012", "scalar", "(1 - exp(-2*x))/(1 + exp(-2*x))", "tanh x", {"x": "real"}, {}),
    ("T014", "scalar", "trace(exp(-epsilon*sigma_z/(2*k*T)))", "2 cosh(epsilon/(2 k T))", {"epsilon": "positive", "k": "positive", "T": "positive"}, {}),
    ("T014", "scalar", "expectation(epsilon/2*sigma_z, thermal(epsilon/2*sigma_z, k*T))", "-(epsilon/2) tanh(epsilon/(2 k T))", {"epsilon": "positive", "k": "positive", "T": "positive"}, {}),
    ("E011", "scalar", "tan(t/2)", "(1-cos(t))/sin(t)", {"t": "real"}, {}),
    ("E012", "scalar", "sin(t)", "2*tan(t/2)/(1+tan(t/2)^2)", {"t": "real"}, {}),
    ("E013", "scalar", "cos(t)^4 - sin(t)^4", "cos 2t", {"t": "real"}, {}),
    ("E015", "scalar", "cos(4*t)", "8cos^4 t-8cos^2 t+1", {"t": "real"}, {}),
    ("E016", "scalar", "sin(u) + cos(u)", "√2 sin(u+π/4)", {"u": "real"}, {}),
    ("E017", "scalar", "sin(u)^2 - sin(v)^2", "sin(u+v)sin(u-v)", {"u": "real", "v": "real"}, {}),
    ("E018", "scalar", "2*sin(u)*sin(v)", "cos(u-v)-cos(u+v)", {"u": "real", "v": "real"}, {}),
    ("E020", "scalar", "|1 + exp(i*t)|^2", "4 cos^2(t/2)", {"t": "real"}, {}),
    ("E038", "scalar", "4*atan(1/5) - atan(1/239)", "pi/4", {}, {}),
    ("E039", "scalar", "sqrt(2+sqrt(3))", "(√6+√2)/2", {}, {}),
    ("E041", "scalar", "cos(pi/12)", "(√6+√2)/4", {}, {}),
    ("E042", "scalar", "cos(pi/5)", "(1+√5)/4", {}, {}),
    ("E043", "scalar", "sqrt(5+2*sqrt(6))", "√2+√3", {}, {}),
]

UNEQUAL = [
    ("E025", "scalar", "sin(t/2)", "sqrt((1-cos(t))/2)", {"t": "real"}, {}),
    ("E027", "operator", "exp(-i*t/2)*I", "I", {"t": "real"}, {}),
    ("E030", "operator", "S_z", "sigma_z", {}, {}),
    ("E031", "scalar", "262537412640768744", "exp(pi*sqrt(163))", {}, {}),
    ("E033", "scalar", "pi", "22/7", {}, {}),
    ("E034", "scalar", "pi", "355/113", {}, {}),
    ("E036", "scalar", "10", "10 tanh(28/15 π)", {}, {}),
    ("A004", "operator", "sigma_y*sigma_x", "i sigma_z", {}, {}),
    ("A047", "operator", "rotation((0, 0, 1), 2*pi)", "1", {}, {}),
    ("A049", "state", "rotation((1, 0, 0), pi/2)|+>", "(1, i)/sqrt(2)", {}, {"upToPhase": True}),
    ("A084", "scalar", "expectation(S_y, evolve(-gamma*B*S_z, t, spinor(theta, phi)))", "(hbar/2) sin(theta) sin(phi + gamma B t)", {**A, "gamma": "positive", "B": "positive", "t": "real"}, {}),
]

GYRO = {"p": "42.577478461e6", "e": "28024.9513861e6", "q": "42.57638543e6", "n": "29.1646935e6"}
QUANTITIES = [
    ("N006", "e", "0.34", "9.528483 GHz"), ("N007", "e", "1.0", "28.024951 GHz"), ("N008", "e", "0.35", "9.808733 GHz"), ("N009", "e", "3.35", "93.883587 GHz"),
    ("N010", "p", "1.0", "42.577478 MHz"), ("N011", "q", "1.0", "42.576385 MHz"), ("N012", "p", "1.5", "63.866218 MHz"), ("N013", "q", "1.5", "63.864578 MHz"),
    ("N014", "p", "3.0", "127.732435 MHz"), ("N015", "q", "3.0", "127.729156 MHz"), ("N016", "p", "7.0", "298.042349 MHz"), ("N017", "q", "7.0", "298.034698 MHz"),
    ("N018", "p", "9.4", "400.228298 MHz"), ("N019", "q", "9.4", "400.218023 MHz"), ("N020", "p", "11.7", "498.156498 MHz"), ("N021", "q", "11.7", "498.143710 MHz"),
    ("N022", "p", "14.1", "600.342446 MHz"), ("N023", "q", "14.1", "600.327035 MHz"), ("N024", "p", "5e-5", "2128.873923 Hz"), ("N025", "n", "1.0", "29.164693 MHz"),
]
POLARISATIONS = [
    ("T001", "p", "1.5", "300", "5.108492e-6"), ("T002", "p", "1.5", "310.15", "4.941311e-6"), ("T003", "p", "3.0", "300", "1.021698e-5"), ("T004", "p", "7.0", "300", "2.383963e-5"), ("T005", "p", "9.4", "298.15", "3.221185e-5"), ("T006", "p", "2.5", "1", "2.554240e-3"),
    ("T007", "e", "0.34", "300", "7.621583e-4"), ("T008", "e", "0.34", "4.2", "5.438617e-2"), ("T009", "e", "2.5", "1", "9.330212e-1"), ("T010", "e", "3.35", "1.2", "9.542581e-1"), ("T011", "e", "1.0", "1", "5.866172e-1"),
]
OTHER_QUANTITIES = [
    ("N027", "9.5e9/28024.9513861e6 T", "0.3389836 T", 1e-6), ("N028", "400/42.577478461 T", "9.394638 T", 1e-6), ("N028", "500/42.577478461 T", "11.743298 T", 1e-6), ("N028", "600/42.577478461 T", "14.091957 T", 1e-6),
    ("N029", "6.62607015e-34*28024.9513861e6 J", "1.85695294e-23 J", 1e-8), ("N029", "6.62607015e-34*28024.9513861e6 J", "1.15901886e-4 eV", 1e-8), ("N030", "6.62607015e-34*1.5*42.577478461e6 J", "4.23182039e-26 J", 1e-8),
    ("N003", "2*pi*42.577478461e6 rad/(s T)", "2.6752218708e8 rad/(s T)", 1e-9), ("N026", "1.5*(42.577478461e6 - 42.57638543e6) Hz", "1639.5 Hz", 1e-4), ("N026", "3*(42.577478461e6 - 42.57638543e6) Hz", "3279.1 Hz", 1e-4),
]

# the current value against the one before it: equal to seven figures, not to all that are printed
CONSTANTS = [
    ("C005", "9.2740100657e-24 J/T", "9.2740100783e-24 J/T"), ("C007", "1.39962449171e10 Hz/T", "1.39962449361e10 Hz/T"), ("C009", "5.0507837393e-27 J/T", "5.0507837461e-27 J/T"),
    ("C010", "7.6225932188 MHz/T", "7.6225932291 MHz/T"), ("C012", "-9.2847646917e-24 J/T", "-9.2847647043e-24 J/T"), ("C015", "28024.9513861 MHz/T", "28024.9514242 MHz/T"),
    ("C017", "1.41060679545e-26 J/T", "1.41060679736e-26 J/T"), ("C018", "2.6752218708e8 rad/(s T)", "2.6752218744e8 rad/(s T)"), ("C019", "42.577478461 MHz/T", "42.577478518 MHz/T"), ("C026", "29.1646935 MHz/T", "29.1646931 MHz/T"),
]


def lines():
    out = []

    def add(row, kind, reference, answer, symbols, options, verdict="agrees"):
        source = ROWS[row]
        out.append({"id": f"{row}-{sum(o['row'] == row for o in out) + 1}", "row": row, "kind": kind, "reference": reference, "answer": answer, "symbols": symbols, **({"options": options} if options else {}), "verdict": verdict, "why": source["quantity"], "expected": source["expected"], "source": source["source"], "confidence": source["confidence"]})

    for check in CHECKS:
        add(*check)
    for check in UNEQUAL:
        add(*check, verdict="differs")
    for row, who, field, value in QUANTITIES:
        number, unit = value.split(" ")
        scale = {"GHz": "1e9", "MHz": "1e6", "Hz": "1"}[unit]
        add(row, "quantity", f"{GYRO[who]}*{field}/{scale} {unit}", value, {}, REL(1e-7 if unit != "Hz" else 1e-9))
    for row, who, field, temperature, value in POLARISATIONS:
        add(row, "scalar", f"tanh(6.62607015e-34*{GYRO[who]}*{field}/(2*1.380649e-23*{temperature}))", value, {}, REL(1e-6))
    for row, reference, value, gap in OTHER_QUANTITIES:
        add(row, "quantity", reference, value, {}, REL(gap))
    for row, now, before in CONSTANTS:
        add(row, "quantity", now, before, {}, REL(1e-7))
        add(row, "quantity", now, before, {}, REL(1e-10), verdict="differs")
    add("C002", "quantity", "6.62607015e-34/(2*pi) J s", "1.054571817e-34 J s", {}, REL(1e-9))
    return out


class Published(Topic):
    """Writes its lines in a folder of their own."""

    def write(self):
        found = lines()
        with open(os.path.join(FOLDER, "published", "physics.jsonl"), "w", encoding="utf-8") as f:
            f.writelines(json.dumps(line, ensure_ascii=False) + "\n" for line in found)
        return {"published": len(found), "rows": len({line["row"] for line in found})}


def topics():
    return [Published("published", "pub")]
