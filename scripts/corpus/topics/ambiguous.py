"""Notation that people read in two ways (section 2), and pairs that no engine need decide."""

from emit import Topic

SYMBOLS = {"e": "positive", "B": "positive", "m": "positive", "omega": "positive", "t": "real", "theta": "real", "phi": "real", "k": "positive", "T": "positive", "x": "real", "a": "positive", "b": "positive", "c": "positive", "tau": "positive", "gamma": "positive"}


def used(*names):
    return {n: SYMBOLS[n] for n in names}


ROWS = [
    # kind, symbols, answer, reference by the rule, reference by the other reading, a reference that neither gives, rule
    ("scalar", "B e m", "eB/2m", "e*B*m/2", "e*B/(2*m)", "e*B/m", "an unwritten product after a slash"),
    ("scalar", "B e m", "e B/2 m", "(e*B/2)*m", "e*B/(2*m)", "e*B/m", "an unwritten product after a slash"),
    ("scalar", "B gamma", "γB/2π", "gamma*B*pi/2", "gamma*B/(2*pi)", "gamma*B", "an unwritten product after a slash"),
    ("scalar", "tau", "1/2πτ", "pi*tau/2", "1/(2*pi*tau)", "1/(pi*tau)", "an unwritten product after a slash"),
    ("scalar", "omega k T", "ħω/2kT", "hbar*omega*k*T/2", "hbar*omega/(2*k*T)", "hbar*omega/(k*T)", "an unwritten product after a slash"),
    ("scalar", "omega k T", "tanh(ħω/2kT)", "tanh(hbar*omega*k*T/2)", "tanh(hbar*omega/(2*k*T))", "tanh(hbar*omega/(k*T))", "an unwritten product after a slash"),
    ("scalar", "omega k T", "\\tanh(\\hbar\\omega/2kT)", "tanh(hbar*omega*k*T/2)", "tanh(hbar*omega/(2*k*T))", "tanh(hbar*omega/(k*T))", "an unwritten product after a slash"),
    ("scalar", "omega k T", "exp(-hbar omega/k T)", "exp(-hbar*omega*T/k)", "exp(-hbar*omega/(k*T))", "exp(-omega/(k*T))", "an unwritten product after a slash"),
    ("scalar", "a b c", "a/bc", "a*c/b", "a/(b*c)", "a*b/c", "an unwritten product after a slash"),
    ("scalar", "a b c", "a / b c", "a*c/b", "a/(b*c)", "a*b/c", "an unwritten product after a slash"),
    ("scalar", "a b", "1/ab", "b/a", "1/(a*b)", "a/b", "an unwritten product after a slash"),
    ("scalar", "phi", "e^iφ", "exp(i)*phi", "exp(i*phi)", "exp(2*i*phi)", "an unbraced exponent"),
    ("scalar", "phi", "e^i phi", "exp(i)*phi", "exp(i*phi)", "exp(2*i*phi)", "an unbraced exponent"),
    ("scalar", "omega t", "e^-iωt", "exp(-i)*omega*t", "exp(-i*omega*t)", "exp(-2*i*omega*t)", "an unbraced exponent"),
    ("scalar", "omega t", "e^-iωt/2", "exp(-i)*omega*t/2", "exp(-i*omega*t/2)", "exp(-3*i*omega*t)", "an unbraced exponent"),
    ("scalar", "", "2^1/2", "1", "sqrt(2)", "2", "an unbraced exponent"),
    ("scalar", "", "2^-1/2", "1/4", "1/sqrt(2)", "2", "an unbraced exponent"),
    ("scalar", "x", "x^1/2", "x/2", "sqrt(x)", "x", "an unbraced exponent", {"x": "positive"}),
    ("scalar", "x", "e^x/2", "exp(x)/2", "exp(x/2)", "exp(2*x)", "an unbraced exponent"),
    ("scalar", "theta", "sin θ/2", "sin(theta/2)", "sin(theta)/2", "sin(theta)", "the extent of a bare function"),
    ("scalar", "theta", "\\sin\\theta/2", "sin(theta/2)", "sin(theta)/2", "sin(theta)", "the extent of a bare function"),
    ("scalar", "theta", "cos²θ/2", "cos(theta/2)^2", "cos(theta)^2/2", "cos(theta)", "the extent of a bare function"),
    ("scalar", "omega t", "cos ωt/2", "cos(omega*t/2)", "cos(omega*t)/2", "cos(omega*t)", "the extent of a bare function"),
    ("scalar", "theta phi", "sin θ cos φ/2", "sin(theta)*cos(phi/2)", "sin(theta)*cos(phi)/2", "sin(theta)*cos(phi)", "the extent of a bare function"),
    ("scalar", "theta t", "sin 2θ t", "sin(2*theta*t)", "sin(2*theta)*t", "sin(theta)*t", "the extent of a bare function"),
    ("scalar", "omega t", "ħ sin ωt/2", "hbar*sin(omega*t/2)", "hbar*sin(omega*t)/2", "hbar*sin(omega*t)", "the extent of a bare function"),
    ("scalar", "x", "ln x/2", "ln(x/2)", "ln(x)/2", "ln(x)", "the extent of a bare function", {"x": "positive"}),
    ("scalar", "x", "tanh x/2", "tanh(x/2)", "tanh(x)/2", "tanh(x)", "the extent of a bare function"),
    ("eigenvalues", "B e m", "±eB/2m", "{e*B*m/2, -e*B*m/2}", "{e*B/(2*m), -e*B/(2*m)}", "{e*B/m, -e*B/m}", "an unwritten product after a slash"),
    ("eigenvalues", "B e m", "± ħeB/2m", "{hbar*e*B*m/2, -hbar*e*B*m/2}", "{hbar*e*B/(2*m), -hbar*e*B/(2*m)}", "{e*B/m, -e*B/m}", "an unwritten product after a slash"),
    ("operator", "B e m", "-eB/2m σ_z", "-e*B*m/2*sigma_z", "-e*B/(2*m)*sigma_z", "-e*B/m*sigma_z", "an unwritten product after a slash"),
    ("operator", "theta", "e^-iθσ_x/2", "exp(-i)*theta/2*sigma_x", "exp(-i*theta*sigma_x/2)", "exp(-i*theta*sigma_y/2)", "an unbraced exponent"),
    ("operator", "phi", "[[0, e^-iφ], [e^iφ, 0]]", "[[0, exp(-i)*phi], [exp(i)*phi, 0]]", "[[0, exp(-i*phi)], [exp(i*phi), 0]]", "[[0, exp(-2*i*phi)], [exp(2*i*phi), 0]]", "an unbraced exponent"),
    ("state", "phi", "(|+> + e^iφ |->)/√2", "(|+> + exp(i)*phi*|->)/sqrt(2)", "(|+> + exp(i*phi)*|->)/sqrt(2)", "(|+> + exp(2*i*phi)*|->)/sqrt(2)", "an unbraced exponent"),
    ("vector", "theta", "(sin θ/2, 0, cos θ/2)", "(sin(theta/2), 0, cos(theta/2))", "(sin(theta)/2, 0, cos(theta)/2)", "(sin(theta), 0, cos(theta))", "the extent of a bare function"),
]


def ambiguous():
    t = Topic("ambiguous-notation", "amb", SYMBOLS)
    for kind, names, answer, by_rule, other, neither, rule, *domains in ROWS:
        symbols = {**used(*sorted(names.split())), **(domains[0] if domains else {})}
        src = "section 2 of the answer language, worked by hand"
        t.plain("agrees", kind, by_rule, answer, f"{rule}: the rule's reading agrees", src, symbols=symbols, ambiguous=True)
        t.plain("undecided", kind, other, answer, f"{rule}: the other common reading agrees", src, symbols=symbols, ambiguous=True)
        t.plain("differs", kind, neither, answer, f"{rule}: neither reading agrees", src, symbols=symbols)
    runs = [({"a": "real", "b": "real", "ab": "real"}, "ab", "ab", "a*b"), ({"x": "real", "y": "real", "xy": "real"}, "2xy", "2*xy", "2*x*y"), ({"d": "real", "x": "real", "dx": "real"}, "dx", "dx", "d*x")]
    for symbols, answer, longest, split in runs:
        t.plain("agrees", "scalar", longest, answer, "the longest declared name", "section 2, runs of letters", symbols=symbols)
        t.plain("undecided", "scalar", split, answer, "the other split of a run of letters", "section 2, runs of letters", symbols=symbols, ambiguous=True)
    return t


HARD = [
    # reference, answer, symbols, truth, why
    ("1", "(2+sqrt(5))^(1/3) - (sqrt(5)-2)^(1/3)", {}, "agrees", "cubes: ((1 ± √5)/2)³ = 2 ± √5"),
    ("-1/2", "cos(2*pi/7) + cos(4*pi/7) + cos(6*pi/7)", {}, "agrees", "sum of the real parts of the seventh roots of one"),
    ("1/8", "cos(pi/7)*cos(2*pi/7)*cos(3*pi/7)", {}, "agrees", "multiply by sin(π/7)"),
    ("sqrt(11)", "tan(3*pi/11) + 4*sin(2*pi/11)", {}, "agrees", "a known value; by Gauss sums"),
    ("sqrt(7)/8", "sin(pi/7)*sin(2*pi/7)*sin(3*pi/7)", {}, "agrees", "product of sines, ∏ sin(kπ/7) for k = 1..6 is 7/64"),
    ("1/2", "cos(pi/5) - cos(2*pi/5)", {}, "agrees", "exact values of 36 and 72 degrees"),
    ("sqrt(10+2*sqrt(5))/4", "sin(2*pi/5)", {}, "agrees", "exact value of 72 degrees"),
    ("pi/4", "5*atan(1/7) + 2*atan(3/79)", {}, "agrees", "Euler's formula of 1755"),
    ("pi", "16*atan(1/5) - 4*atan(1/239)", {}, "agrees", "Machin 1706"),
    ("pi", "ln(640320^3 + 744)/sqrt(163)", {}, "differs", "equal to 30 digits and no more"),
    ("sqrt(2)+sqrt(3)+sqrt(5)", "sqrt(10 + 2*sqrt(6) + 2*sqrt(10) + 2*sqrt(15))", {}, "agrees", "square both sides"),
    ("sqrt(16-2*sqrt(29)+2*sqrt(55-10*sqrt(29)))", "sqrt(22+2*sqrt(5)) - sqrt(11+2*sqrt(29)) + sqrt(5)", {}, "agrees", "Shanks 1974"),
    ("atan(sinh(x))", "2*atan(tanh(x/2))", {"x": "real"}, "agrees", "the Gudermannian function"),
    ("asin(x)", "atan(x/sqrt(1-x^2))", {"x": {"between": ["-1", "1"]}}, "agrees", "both have derivative 1/√(1-x²) and vanish at 0"),
    ("abs(x)", "acosh(cosh(x))", {"x": "real"}, "agrees", "acosh inverts cosh for nonnegative arguments"),
    ("theta", "atan2(sin(theta), cos(theta))", {"theta": {"between": ["-3", "3"]}}, "agrees", "the polar angle, within -π and π"),
    ("pi/2 - atan(x)", "atan(1/x)", {"x": "positive"}, "agrees", "complementary angles"),
    ("sin(10^20)", "sin(10^20 + 2*pi)", {}, "agrees", "a period"),
    ("0", "sin(10^15*pi)", {}, "agrees", "an integer multiple of π"),
    ("1", "exp(2*pi*i*10^12)", {}, "agrees", "an integer multiple of 2πi"),
    ("x", "x + 1e-60", {"x": "real"}, "differs", "off by 1e-60"),
    ("1", "tanh(200)", {}, "differs", "one minus 4e-174"),
    ("0", "exp(-1000)", {}, "differs", "5e-435, not zero"),
]


def hard():
    t = Topic("hard-constants", "hard", {})
    for reference, answer, symbols, truth, why in HARD:
        t.plain("undecided", "scalar", reference, answer, why, f"truth known: {truth}; see why", symbols=symbols, allowed=["undecided", truth])
    return t


UNREADABLE = [
    ("operator", "S_x", "|+>", "a state where an operator is asked for"),
    ("operator", "S_x", "(1, 0)", "a column where an operator is asked for"),
    ("operator", "S_x", "{hbar/2, -hbar/2}", "eigenvalues where an operator is asked for"),
    ("state", "|+x>", "<+x|", "a bra where a ket is asked for"),
    ("state", "|+x>", "(<+| + <-|)/sqrt(2)", "a bra where a ket is asked for"),
    ("state", "|+x>", "sigma_x", "an operator where a state is asked for"),
    ("state", "|+x>", "1/sqrt(2)", "a scalar where a state is asked for"),
    ("state", "|+x>", "(1, 1, 1)/sqrt(3)", "three components"),
    ("scalar", "hbar/2", "S_z", "an operator where a scalar is asked for"),
    ("scalar", "hbar/2", "|+>", "a state where a scalar is asked for"),
    ("scalar", "hbar/2", "+- hbar/2", "plus-minus in a scalar"),
    ("scalar", "hbar/2", "ħ/2 I", "I in a scalar place"),
    ("scalar", "hbar/2", "[[hbar/2, 0], [0, hbar/2]]", "a matrix where a scalar is asked for"),
    ("vector", "(1, 2, 3)", "(1, 2)", "two components"),
    ("vector", "(1, 2, 3)", "6", "a scalar where a vector is asked for"),
    ("eigenvalues", "{1, -1}", "{1, -1, 0}", "three values"),
    ("eigenvalues", "{1, -1}", "sigma_z", "an operator where eigenvalues are asked for"),
    ("eigenpairs", "1: |+>; -1: |->", "|+>, |->", "states without values"),
    ("eigenpairs", "1: |+>; -1: |->", "1, -1", "values without states"),
    ("pauli", "(1, 0, 0, 1)", "(1, 0, 1)", "three coefficients"),
    ("pauli", "(1, 0, 0, 1)", "|+>", "a state where an operator is asked for"),
    ("scalar", "1", "1/0", "an expression defined nowhere"),
    ("scalar", "1", "1/(2-2)", "an expression defined nowhere"),
    ("operator", "I", "[[1,1],[1,1]]^-1", "the inverse of a singular operator"),
    ("operator", "S_x", "sin(S_x)", "sine of an operator"),
    ("operator", "S_x", "sqrt(S_x)", "root of an operator"),
    ("operator", "S_x", "1/S_x", "division by an operator"),
    ("operator", "S_x", "commutator(S_y, S_z)/(i hbar)", "reference functions are not read in an answer"),
    ("scalar", "1/2", "probability(|+>, |+x>)", "reference functions are not read in an answer"),
    ("state", "|+>", "|+>|->", "two kets side by side"),
    ("scalar", "hbar/2", "⟨S_z⟩", "an expectation value without a state"),
    ("scalar", "hbar omega/2", "hbar omega/2 +", "a sum without its last term"),
    ("scalar", "hbar omega/2", "hbar omega/2)", "a bracket too many"),
    ("scalar", "hbar omega/2", "hbar*omega*kappa/2", "an undeclared name"),
    ("scalar", "hbar omega/2", "E = hbar omega/2 = 0.5 hbar omega", "a chain of equalities"),
    ("scalar", "0.5", "0,5", "a decimal comma"),
    ("scalar", "1000", "1 000", "a space inside a number"),
    ("scalar", "6", "2 3", "two numbers side by side"),
    ("scalar", "1", "", "nothing typed"),
]


def unreadable():
    t = Topic("unreadable", "bad", {})
    for kind, reference, answer, why in UNREADABLE:
        symbols = {"omega": "positive"} if "omega" in reference else {}
        allowed = ["unreadable", "differs"] if why.startswith(("three ", "two components")) else None
        t.plain("unreadable", kind, reference, answer, why, "sections 2 and 3 of the answer language", symbols=symbols, allowed=allowed)
    return t


def topics():
    return [ambiguous(), hard(), unreadable()]
