"""How matrices, kets, brackets and sets are written: the second half of the writer."""

from dataclasses import dataclass

from names import LABELS

ADD, MUL, POW, ATOM = 1, 2, 4, 5


@dataclass
class T:
    """A text, how tightly it binds, whether it must come last in a product, whether it holds an open slash."""

    s: str
    p: int = ATOM
    tail: bool = False
    slash: bool = False


class Objects:
    """Mixed into the writer; each method writes one kind of node."""

    def w_mat(self, n, tail):
        a, b, c, d = (self.w(x).s for x in n.a)
        if self.m() == "tex":
            env = self.one("pmatrix", "pmatrix", "bmatrix", "array", "matrix")
            body = f"{a} & {b} \\\\ {c} & {d}"
            if env == "array":
                return T(rf"\left(\begin{{array}}{{cc}} {body} \end{{array}}\right)")
            if env == "matrix":
                return T(rf"\left(\begin{{matrix}} {body} \end{{matrix}}\right)")
            return T(rf"\begin{{{env}}} {body} \end{{{env}}}")
        return T(f"[[{a}, {b}], [{c}, {d}]]" if self.chance(0.7) else f"[{a}, {b}; {c}, {d}]")

    def w_col(self, n, tail):
        a, b = (self.w(x).s for x in n.a)
        if self.m() == "tex":
            env = self.one("pmatrix", "bmatrix", "pmatrix")
            return T(rf"\begin{{{env}}} {a} \\ {b} \end{{{env}}}")
        forms = [f"[[{a}], [{b}]]", f"[{a}; {b}]"]
        if self.state:
            forms += [f"({a}, {b})"] * 3 + [f"[{a}, {b}]", f"[{a}, {b}]^T"]
        return T(self.one(*forms))

    def w_ket(self, n, tail):
        mode = self.m()
        label = self.one(*LABELS[mode][n.a[0]])
        if mode == "tex":
            return T(rf"\ket{{{label}}}" if self.chance(0.5) else rf"|{label}\rangle")
        return T(f"|{label}⟩" if mode == "uni" else f"|{label}>")

    def w_bra(self, n, tail):
        mode = self.m()
        label = self.one(*LABELS[mode][n.a[0]])
        if mode == "tex":
            return T(rf"\bra{{{label}}}" if self.chance(0.5) else rf"\langle{' ' if label[0].isalpha() else ''}{label}|")
        return T(f"⟨{label}|" if mode == "uni" else f"<{label}|")

    def w_dag(self, n, tail):
        b = self.at(n.a[0], ATOM)
        return T(b.s + {"ascii": "^dagger", "uni": self.one("†", "^†"), "tex": r"^\dagger"}[self.m()], POW)

    def w_transpose(self, n, tail):
        return T(self.at(n.a[0], ATOM).s + "^T", POW)

    def w_inv(self, n, tail):
        return T(self.at(n.a[0], ATOM).s + ("^{-1}" if self.m() == "tex" else self.one("^-1", "^(-1)")), POW)

    def w_comm(self, n, tail):
        a, b = (self.w(x).s for x in n.a)
        return T(rf"\left[{a}, {b}\right]" if self.m() == "tex" and self.chance(0.5) else f"[{a}, {b}]")

    def w_acomm(self, n, tail):
        a, b = (self.w(x).s for x in n.a)
        return T(rf"\{{{a}, {b}\}}" if self.m() == "tex" else f"{{{a}, {b}}}")

    def w_set(self, n, tail):
        a, b = (self.w(x).s for x in n.a)
        forms = [f"{{{a}, {b}}}", f"{a}, {b}"] if self.m() != "tex" else [rf"\{{{a}, {b}\}}", f"{a}, {b}", rf"\left\{{{a}, {b}\right\}}"]
        if self.labels and self.chance(0.2):
            forms = [f"E_+ = {a}, E_- = {b}"]
        return T(self.one(*forms), 0)

    def w_pm(self, n, tail):
        centre, x = n.a
        body = self.at(x, MUL).s
        mode = self.m()
        sign = {"ascii": "+-", "uni": "±", "tex": r"\pm "}[mode]
        head = ""
        if centre is not None:
            head = self.w(centre).s + " "
        elif self.chance(0.25):
            head = {"ascii": "E_+- = ", "uni": "E_± = ", "tex": self.one(r"\lambda_\pm = ", r"E_\pm = ", r"\lambda_{1,2} = ")}[mode] if mode != "ascii" else ""
        gap = " " if centre is not None else ""
        return T(f"{head}{sign}{gap}{body}".replace("  ", " "), 0)

    def w_pairs(self, n, tail):
        v1, s1, v2, s2 = (self.w(x).s for x in n.a)
        return T(f"{v1}: {s1}; {v2}: {s2}", 0)

    def w_tuple(self, n, tail):
        body = ", ".join(self.w(x).s for x in n.a)
        return T(rf"\left({body}\right)" if self.m() == "tex" and self.chance(0.5) else f"({body})")
