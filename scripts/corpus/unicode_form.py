"""One spelling for the second reader: LaTeX commands become signs, environments become brackets, variants become the plain letter."""

import re
from fractions import Fraction

from names import GREEK

COMMANDS = {
    "hbar": "ħ", "cdot": "·", "times": "×", "pm": "±", "mp": "∓", "rangle": "⟩", "langle": "⟨", "uparrow": "↑", "downarrow": "↓", "pi": "π", "dagger": "†",
    "varphi": "φ", "varepsilon": "ε", "vartheta": "θ", **{k: v for k, v in GREEK.items()}, "sigma": "σ",
}
NAMED = "arcsin arccos arctan asinh acosh atanh asin acos atan2 atan sinh cosh tanh sin cos tan sec csc cot exp ln log sqrt abs conj Re Im".split()
REFERENCE = "commutator anticommutator eigenvalues eigenpairs trace determinant adjoint pauli expectation variance uncertainty probability projector density bloch purity entropy spinor rotation propagator evolve heisenberg larmor rabi thermal".split()
VULGAR = {"½": Fraction(1, 2), "¼": Fraction(1, 4), "¾": Fraction(3, 4), "⅓": Fraction(1, 3), "⅔": Fraction(2, 3)}
RAISED = {"²": 2, "³": 3, "⁴": 4}
KETS = {"+": "+", "+z": "+", "up": "+", "0": "+", "↑": "+", "-": "-", "-z": "-", "down": "-", "1": "-", "↓": "-", "+x": "+x", "-x": "-x", "+y": "+y", "-y": "-y"}
SUB = str.maketrans("₀₁₂₃₄₅₆₇₈₉₊₋", "0123456789+-")


def unicode_form(text):
    """One spelling: LaTeX commands become signs, environments become brackets."""
    s = text.replace("$", "").replace("−", "-").replace("ℏ", "ħ").replace("ϕ", "φ").replace("ϵ", "ε").replace("µ", "μ").replace("**", "^")
    s = re.sub(r"\\(left|right|displaystyle|quad)(?![a-zA-Z])|\\[,;!]", " ", s)
    s = re.sub(r"\\hat\s*\{?\s*(S|\\sigma)\s*\}?", r" \1", s)
    s = s.replace(r"\mathrm{i}", " i ").replace(r"\mathrm{e}", "ℯ")
    s = re.sub(r"\\(mathbb|mathbf)\{(1|I)\}", " 𝟙 ", s)
    s = re.sub(r"\\ket\{(.*?)\}", r"|\1⟩", s)
    s = re.sub(r"\\bra\{(.*?)\}", r"⟨\1|", s)
    s = re.sub(r"\\begin\{(\w+)\}(\{\w+\})?", "⟦", s)
    s = re.sub(r"\\end\{\w+\}", "⟧", s).replace("\\\\", "⏎").replace("\\{", "{").replace("\\}", "}")
    s = re.sub(r"\\([a-zA-Z]+)", lambda m: {"frac": "⁄", "tfrac": "⁄", "dfrac": "⁄", "sqrt": "√"}.get(m[1]) or COMMANDS.get(m[1], " " + m[1] + " "), s)
    s = re.sub(r"_\{(\w|[+-]|±|1,2)\}", r"_\1", s)
    s = re.sub("[₀-₉₊₋]", lambda m: "_" + m[0].translate(SUB), s)
    return re.sub(r"\s+", " ", s).strip().rstrip(".")
