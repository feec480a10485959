"""Quantities with units. The labels are exact arithmetic on decimal fractions of SI units."""

from fractions import Fraction

from emit import Topic

PI = Fraction(314159265358979323846264338327950288, 10**35)

# unit: factor to SI, exponents of (kg, m, s, A, K), angle
UNITS = {
    "Hz": (1, (0, 0, -1, 0, 0), "cycle"), "kHz": (10**3, (0, 0, -1, 0, 0), "cycle"), "MHz": (10**6, (0, 0, -1, 0, 0), "cycle"), "GHz": (10**9, (0, 0, -1, 0, 0), "cycle"),
    "rad/s": (1, (0, 0, -1, 0, 0), "radian"), "s^-1": (1, (0, 0, -1, 0, 0), "radian"),
    "T": (1, (1, 0, -2, -1, 0), ""), "mT": (Fraction(1, 10**3), (1, 0, -2, -1, 0), ""), "µT": (Fraction(1, 10**6), (1, 0, -2, -1, 0), ""),
    "s": (1, (0, 0, 1, 0, 0), ""), "ms": (Fraction(1, 10**3), (0, 0, 1, 0, 0), ""), "µs": (Fraction(1, 10**6), (0, 0, 1, 0, 0), ""), "ns": (Fraction(1, 10**9), (0, 0, 1, 0, 0), ""),
    "J": (1, (1, 2, -2, 0, 0), ""), "eV": (Fraction("1.602176634e-19"), (1, 2, -2, 0, 0), ""), "meV": (Fraction("1.602176634e-22"), (1, 2, -2, 0, 0), ""),
    "K": (1, (0, 0, 0, 0, 1), ""), "mK": (Fraction(1, 10**3), (0, 0, 0, 0, 1), ""), "J/T": (1, (0, 2, 0, 1, 0), ""), "A m^2": (1, (0, 2, 0, 1, 0), ""),
    "m": (1, (0, 1, 0, 0, 0), ""), "nm": (Fraction(1, 10**9), (0, 1, 0, 0, 0), ""), "kg": (1, (1, 0, 0, 0, 0), ""), "J s": (1, (1, 2, -1, 0, 0), ""),
    "MHz/T": (10**6, (-1, 0, 1, 1, 0), "cycle"), "rad/(s T)": (1, (-1, 0, 1, 1, 0), "radian"),
}


def parse(text):
    number, unit = text.split(" ", 1)
    return Fraction(number), unit


def figures(number):
    digits = number.lower().split("e")[0].replace("-", "").replace(".", "").lstrip("0")
    return len(digits)


def judged(reference, answer, tolerance):
    """agrees or differs, and why."""
    (r, ru), (a, au) = parse(reference), parse(answer)
    (rf, rd, ra), (af, ad, aa) = UNITS[ru], UNITS[au]
    if rd != ad:
        return "differs", "another dimension"
    if ra != aa and {ra, aa} == {"cycle", "radian"} and not (au == "s^-1" and ra == "radian"):
        return "differs", "Hz and rad/s are different units"
    gap = abs(Fraction(af) / Fraction(rf) * a - r)
    if "relative" in tolerance:
        return ("agrees" if gap <= Fraction(str(tolerance["relative"])) * abs(r) else "differs"), f"relative gap {float(gap / abs(r)):.3g}"
    if "absolute" in tolerance:
        return ("agrees" if gap <= Fraction(str(tolerance["absolute"])) else "differs"), f"gap {float(gap):.3g} {ru}"
    n = tolerance["significantFigures"]
    e = 0
    while abs(r) >= Fraction(10) ** (e + 1):
        e += 1
    while abs(r) < Fraction(10) ** e:
        e -= 1
    if figures(answer.split(" ")[0]) < n:
        return "differs", "too few figures"
    return ("agrees" if gap <= Fraction(10) ** (e - n + 1) / 2 else "differs"), f"gap {float(gap):.3g} {ru}"


def spelled(answer):
    """Ways to write a number and its unit."""
    number, unit = answer.split(" ", 1)
    out = [answer]
    if "e" in number:
        head, power = number.split("e")
        power = str(int(power))
        out += [f"{head}×10^{power} {unit}", f"{head}\\cdot10^{{{power}}}\\,\\text{{{unit}}}", f"{head} \\times 10^{{{power}}} \\text{{ {unit}}}", f"{head}*10^({power}) {unit}"]
    else:
        out += [f"{number}\\,\\text{{{unit}}}", f"${number}\\;\\text{{{unit}}}$", f"{number}{unit}" if unit[0] not in "eE" else answer]
    if number.startswith("-"):
        out.append("−" + answer[1:])
    return [x for x in dict.fromkeys(out) if "^" not in unit or "text" not in x]


CASES = [
    # reference, tolerance, answers with the slips they show
    ("63.87 MHz", {"relative": 0.001}, ["63.87 MHz", "63.8700 MHz", "63.9 MHz", "63870 kHz", "6.387e7 Hz", "0.06387 GHz", "63.85 MHz"], {"64.5 MHz": [], "638.7 MHz": ["power-of-ten"], "63.87 kHz": ["power-of-ten"], "6.387 MHz": ["power-of-ten"], "63.87 GHz": ["power-of-ten"], "127.74 MHz": ["factor-two"], "31.935 MHz": ["factor-half"], "-63.87 MHz": ["sign"], "63.87 T": [], "63.87 J": [], "63.87 s": [], "401.3 MHz": ["missing-two-pi"], "10.165 MHz": ["missing-two-pi"], "60.1 MHz": []}),
    ("42.577 MHz/T", {"relative": 0.0005}, ["42.577 MHz/T", "42.58 MHz/T", "42.5775 MHz/T"], {"42.577 MHz": [], "85.154 MHz/T": ["factor-two"], "21.2885 MHz/T": ["factor-half"], "4.2577 MHz/T": ["power-of-ten"], "28.025 MHz/T": [], "-42.577 MHz/T": ["sign"]}),
    ("2.675e8 rad/(s T)", {"relative": 0.001}, ["2.675e8 rad/(s T)", "2.6752e8 rad/(s T)"], {"2.675e7 rad/(s T)": ["power-of-ten"], "1.3375e8 rad/(s T)": ["factor-half"], "5.35e8 rad/(s T)": ["factor-two"], "4.2574e7 rad/(s T)": ["missing-two-pi"]}),
    ("4.013e8 rad/s", {"relative": 0.001}, ["4.013e8 rad/s", "4.013e8 s^-1", "401300000 rad/s", "4.0131e8 rad/s"], {"4.013e8 Hz": [], "401.3 MHz": [], "63.87 MHz": [], "6.387e7 rad/s": ["missing-two-pi"], "4.013e7 rad/s": ["power-of-ten"], "-4.013e8 rad/s": ["sign"], "8.026e8 rad/s": ["factor-two"], "2.0065e8 rad/s": ["factor-half"]}),
    ("28.025 GHz", {"relative": 0.0001}, ["28.025 GHz", "28025 MHz", "2.8025e10 Hz", "28.0249 GHz"], {"28.025 MHz": ["power-of-ten"], "28.05 GHz": [], "14.0125 GHz": ["factor-half"], "56.05 GHz": ["factor-two"], "2.8025e10 rad/s": [], "1.761e11 rad/s": [], "1.76086e11 Hz": ["missing-two-pi"], "28.025 T": [], "28.025 eV": []}),
    ("0.3390 T", {"absolute": 0.0005}, ["0.339 T", "0.3390 T", "339 mT", "0.3393 T", "339.2 mT", "3.39e-1 T", "3.390e5 µT"], {"0.340 T": [], "3.390 T": ["power-of-ten"], "339 T": ["power-of-ten"], "0.678 T": ["factor-two"], "0.1695 T": ["factor-half"], "-0.339 T": ["sign"], "0.339 K": [], "0.339 J": []}),
    ("1.857e-23 J", {"relative": 0.001}, ["1.857e-23 J", "1.8570e-23 J", "1.159e-4 eV", "0.1159 meV"], {"1.857e-22 J": ["power-of-ten"], "9.285e-24 J": ["factor-half"], "3.714e-23 J": ["factor-two"], "1.857e-23 eV": ["wrong-unit"], "115.9 eV": [], "1.345 K": [], "-1.857e-23 J": ["sign"], "1.80e-23 J": []}),
    ("1.159e-4 eV", {"relative": 0.001}, ["1.159e-4 eV", "0.1159 meV", "0.0001159 eV", "1.857e-23 J"], {"1.159e-4 J": ["wrong-unit"], "1.159e-3 eV": ["power-of-ten"], "5.795e-5 eV": ["factor-half"], "2.318e-4 eV": ["factor-two"], "1.159e-4 K": [], "1.159 meV": ["power-of-ten"]}),
    ("9.285e-24 J/T", {"relative": 0.001}, ["9.285e-24 J/T", "9.2848e-24 J/T", "9.285e-24 A m^2"], {"9.285e-24 J": [], "9.285e-23 J/T": ["power-of-ten"], "-9.285e-24 J/T": ["sign"], "1.857e-23 J/T": ["factor-two"], "4.6425e-24 J/T": ["factor-half"], "5.051e-27 J/T": []}),
    ("1.345 K", {"absolute": 0.001}, ["1.345 K", "1.3455 K", "1345 mK", "1.345e0 K"], {"1.350 K": [], "13.45 K": ["power-of-ten"], "0.6725 K": ["factor-half"], "2.690 K": ["factor-two"], "1.345 J": [], "1.345 T": []}),
    ("25.0 µs", {"absolute": 0.05}, ["25 µs", "25.0 µs", "0.025 ms", "2.5e-5 s", "25000 ns", "25.04 µs"], {"25.2 µs": [], "25 ms": ["power-of-ten"], "2.5 µs": ["power-of-ten"], "50.0 µs": ["factor-two"], "12.5 µs": ["factor-half"], "25 s": ["power-of-ten"], "25 m": [], "25 kHz": []}),
    ("63.87 MHz", {"significantFigures": 4}, ["63.87 MHz", "63.870 MHz", "63.8663 MHz", "63.872 MHz", "6.387e7 Hz", "6.3870e1 MHz"], {"63.9 MHz": [], "64 MHz": [], "63.86 MHz": [], "63.88 MHz": [], "63.8 MHz": [], "6.387 MHz": ["power-of-ten"], "127.7 MHz": []}),
    ("0.3390 T", {"significantFigures": 3}, ["0.339 T", "0.3390 T", "339 mT", "0.3388 T", "0.3394 T", "3.39e-1 T"], {"0.34 T": [], "0.3 T": [], "0.338 T": [], "0.340 T": [], "3.39 T": ["power-of-ten"], "0.339 K": []}),
    ("2.0023e0 T", {"significantFigures": 5}, ["2.0023 T", "2.00231 T", "2.00228 T", "2002.3 mT"], {"2.002 T": [], "2.00 T": [], "2.0024 T": [], "2.0022 T": []}),
    ("1.055e-34 J s", {"relative": 0.001}, ["1.055e-34 J s", "1.0546e-34 J s", "1.0545718e-34 J s"], {"6.626e-34 J s": ["missing-two-pi"], "1.055e-34 J": [], "1.055e-33 J s": ["power-of-ten"], "1.055e-34 kg": []}),
    ("632.8 nm", {"absolute": 0.1}, ["632.8 nm", "6.328e-7 m", "632.85 nm"], {"633 nm": [], "63.28 nm": ["power-of-ten"], "632.8 m": ["power-of-ten"], "6.328e-7 s": []}),
    ("-29.165 MHz", {"relative": 0.0005}, ["-29.165 MHz", "-29.16 MHz", "-2.9165e7 Hz"], {"29.165 MHz": ["sign"], "-58.33 MHz": ["factor-two"], "-14.5825 MHz": ["factor-half"], "-2.9165 MHz": ["power-of-ten"]}),
]


def quantities():
    t = Topic("quantities", "qty", {})
    for reference, tolerance, right, wrong in CASES:
        options = {"tolerance": tolerance}
        for answer in right:
            verdict, why = judged(reference, answer, tolerance)
            if verdict != "agrees":
                t.doubts.append(f"quantities: {reference} {answer} {tolerance}: {why}")
                continue
            for text in spelled(answer)[:3]:
                t.plain("agrees", "quantity", reference, text, f"within the tolerance: {why}", "exact decimal arithmetic in SI units", options=options)
        for answer, slips in wrong.items():
            verdict, why = judged(reference, answer, tolerance)
            if verdict != "differs":
                t.doubts.append(f"quantities: {reference} {answer} {tolerance} should differ: {why}")
                continue
            same_number, other_dimension = answer.split(" ")[0] == reference.split(" ")[0], why == "another dimension"
            slips = slips or (["wrong-unit"] if same_number and other_dimension else [])
            for text in spelled(answer)[:2]:
                t.plain("differs", "quantity", reference, text, why, "exact decimal arithmetic in SI units", options=options, slips=slips)
        number = right[0].split(" ")[0]
        t.plain("differs", "quantity", reference, number, "no unit", "by definition of the kind", options=options)
    more = [
        ("agrees", "2.5e-5 s", "25 μs", {"relative": 0.001}, "Greek mu for micro"),
        ("agrees", "4.013e8 rad/s", "4.013e8 rad s^-1", {"relative": 0.001}, "unit spelled as a product"),
        ("agrees", "4.013e8 rad/s", "4.013×10^8 s^{-1}", {"relative": 0.001}, "s^-1 takes the reference's meaning against rad/s"),
        ("agrees", "9.285e-24 J/T", "9.285e-24 J T^-1", {"relative": 0.001}, "unit spelled as a product"),
        ("agrees", "100 kHz", "10^5 Hz", {"relative": 0.001}, "a bare power of ten"),
        ("agrees", "100 kHz", "1e5 Hz", {"relative": 0.001}, "scientific notation"),
        ("agrees", "0.5 T", "1/2 T", {"relative": 0.001}, "a fraction before the unit"),
        ("agrees", "0.5 T", "½ T", {"relative": 0.001}, "a vulgar fraction before the unit"),
        ("agrees", "3.1416 T", "π T", {"relative": 0.0001}, "pi before the unit"),
        ("agrees", "0.70711 T", "1/sqrt(2) T", {"relative": 0.0001}, "a root before the unit"),
        ("agrees", "0.70711 T", "\\frac{1}{\\sqrt{2}}\\,\\text{T}", {"relative": 0.0001}, "a root before the unit, in LaTeX"),
        ("agrees", "6.2832e6 rad/s", "2π×10^6 rad/s", {"relative": 0.0001}, "two pi written out"),
        ("differs", "6.2832e6 rad/s", "1e6 rad/s", {"relative": 0.0001}, "two pi missing"),
        ("differs", "6.2832e6 rad/s", "1 MHz", {"relative": 0.0001}, "the same frequency in the other unit"),
        ("differs", "1 MHz", "6.283185307e6 rad/s", {"relative": 0.0001}, "the same frequency in the other unit"),
        ("differs", "0.5 T", "0.5 mT", {"relative": 0.001}, "a prefix too many"),
        ("differs", "0.5 T", "0.5", {"relative": 0.001}, "no unit"),
        ("agrees", "0.5 T", "B = 0.5 T", {"relative": 0.001}, "a name and a sign of equality at the left"),
        ("agrees", "0.5 T", "0.5 T.", {"relative": 0.001}, "a full stop at the end"),
    ]
    slips = {"1e6 rad/s": ["missing-two-pi"], "0.5 mT": ["power-of-ten"]}
    for verdict, reference, answer, tolerance, why in more:
        t.plain(verdict, "quantity", reference, answer, why, "exact decimal arithmetic in SI units", options={"tolerance": tolerance}, slips=slips.get(answer) if verdict == "differs" else None)
    for answer, why in (("63,87 MHz", "a decimal comma"), ("63 870 kHz", "a space inside a number"), ("63.87 foo", "no such unit"), ("MHz", "no number"), ("63.87 MHz + B", "a symbol")):
        t.plain("unreadable", "quantity", "63.87 MHz", answer, why, "by definition of the kind", options={"tolerance": {"relative": 0.001}})
    return t


def tolerances():
    """Scalars with a tolerance, where the caller gives one."""
    t = Topic("scalar-tolerance", "tol", {})
    src = "exact decimal arithmetic against mpmath"
    rel, ab, fig = {"tolerance": {"relative": 0.01}}, {"tolerance": {"absolute": 0.001}}, {"tolerance": {"significantFigures": 3}}
    rows = [
        ("agrees", "1/sqrt(2)", "0.707", rel), ("agrees", "1/sqrt(2)", "0.71", rel), ("differs", "1/sqrt(2)", "0.72", rel), ("agrees", "1/sqrt(2)", "sqrt(2)/2", rel), ("differs", "1/sqrt(2)", "0.6", rel),
        ("agrees", "pi/4", "0.785", ab), ("agrees", "pi/4", "0.7850", ab), ("differs", "pi/4", "0.78", ab), ("differs", "pi/4", "0.787", ab), ("agrees", "pi/4", "π/4", ab), ("agrees", "pi/4", "0.786", ab),
        ("agrees", "sqrt(3)/2", "0.866", fig), ("agrees", "sqrt(3)/2", "0.8660", fig), ("differs", "sqrt(3)/2", "0.87", fig), ("differs", "sqrt(3)/2", "0.867", fig), ("differs", "sqrt(3)/2", "0.865", fig), ("agrees", "sqrt(3)/2", "8.66e-1", fig),
        ("agrees", "tanh(0.667313)", "0.583", fig), ("differs", "tanh(0.667313)", "0.58", fig), ("differs", "tanh(0.667313)", "0.667", fig), ("agrees", "exp(-2*pi*0.09)", "0.568", fig), ("differs", "exp(-2*pi*0.09)", "0.432", fig),
        ("agrees", "ln(2)", "0.69", rel), ("differs", "ln(2)", "0.30", rel), ("differs", "ln(2)", "1", rel), ("agrees", "pi", "22/7", rel), ("agrees", "pi", "355/113", ab), ("differs", "pi", "22/7", ab), ("agrees", "pi", "3.14", fig), ("differs", "pi", "3.1", fig), ("differs", "pi", "3.15", fig),
        ("agrees", "0.400875", "0.401", fig), ("differs", "0.400875", "0.400", fig), ("differs", "0.400875", "0.40", fig), ("differs", "0.400875", "-0.401", fig), ("agrees", "1e6", "1.00e6", fig), ("differs", "1e6", "1.01e6", fig),
    ]
    for verdict, reference, answer, options in rows:
        t.plain(verdict, "scalar", reference, answer, "a tolerance is given", src, options=options)
    return t


def topics():
    return [quantities(), tolerances()]
