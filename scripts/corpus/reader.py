"""A plain second reader of the answer language, for verifying that the texts of the corpus mean what their labels say.

It follows sections 1 and 2 by recursive descent on a Unicode form of the text, at one point of the domain: reference functions are worked
out as they are met. It takes no care of errors and knows no diagnostics.
"""

import re
from fractions import Fraction

import functions
from names import GREEK
from tree import N, q
from unicode_form import KETS, NAMED, RAISED, REFERENCE, VULGAR, unicode_form
from values import Points, evaluate, tag

class Reader:
    """Reads one text at one point; `symbols` are the declared names, `env` their values."""

    def __init__(self, text, symbols, env, kind):
        self.s = unicode_form(text)
        self.env, self.kind, self.sign = env, kind, 1
        self.i = 0
        self.bars = 0
        self.nested = False
        self.names = self.dictionary(symbols)
        self.longest = max(map(len, self.names))

    def dictionary(self, symbols):
        names = {"i": N("i"), "pi": N("pi"), "π": N("pi"), "hbar": N("hbar"), "ħ": N("hbar"), "I": N("op", "one"), "𝟙": N("op", "one"), "σ_0": N("op", "one"), "sigma_0": N("op", "one")}
        names["h"] = 2 * N("pi") * N("hbar")
        for k, x in enumerate("xyz", 1):
            for head in ("σ", "sigma", "σ_", "sigma_"):
                names[head + x] = N("op", "s" + x)
            names[f"σ_{k}"] = names[f"sigma_{k}"] = N("op", "s" + x)
            names["S_" + x] = names["S" + x] = N("op", "S" + x)
        for x, y in (("+", "p"), ("-", "m")):
            names["S_" + x] = N("op", "S" + y)
            names["σ_" + x] = names["sigma_" + x] = N("op", "s" + y)
        for name in symbols:
            base, _, sub = name.partition("_")
            for head in {base, GREEK.get(base, base)}:
                names[head + "_" + sub if sub else head] = N("sym", name)
                if sub.isdigit():
                    names[head + sub] = N("sym", name)
        if "e" not in symbols:
            names["e"] = N("euler")
        names["ℯ"] = N("euler")
        return names

    # --- small steps --------------------------------------------------------------------------------------------------

    def space(self):
        while self.i < len(self.s) and self.s[self.i] == " ":
            self.i += 1

    def peek(self):
        self.space()
        return self.s[self.i] if self.i < len(self.s) else ""

    def take(self, sign):
        self.space()
        if self.s.startswith(sign, self.i):
            self.i += len(sign)
            return True
        return False

    def need(self, sign):
        if not self.take(sign):
            raise SyntaxError(f"expected {sign} at {self.i} in {self.s}")

    def word(self):
        """The longest name, function or operator that starts here, not consumed: (text, node or function name)."""
        self.space()
        best = ("", None)
        for size in range(min(self.longest, len(self.s) - self.i), 0, -1):
            piece = self.s[self.i : self.i + size]
            if piece in self.names:
                best = (piece, self.names[piece])
                break
        for f in NAMED + REFERENCE:
            if len(f) > len(best[0]) and self.s.startswith(f, self.i) and (f not in REFERENCE or self.s[self.i + len(f) : self.i + len(f) + 1] == "("):
                best = (f, f)
        return best

    def ket_here(self):
        m = re.compile(r"\|\s*([+-]?[xyz]?|up|down|[01↑↓]|uparrow|downarrow)\s*[>⟩]").match(self.s, self.i)
        return m if m and m[1] in KETS else None

    def bra_here(self):
        m = re.compile(r"[<⟨]\s*([+-]?[xyz]?|up|down|[01↑↓])\s*\|").match(self.s, self.i)
        return m if m and m[1] in KETS else None

    def value(self, n):
        return evaluate(n, Points(self.env))

    # --- grammar ------------------------------------------------------------------------------------------------------

    def expr(self):
        total = None
        while True:
            ch = self.peek()
            factor = {"-": -1, "±": self.sign, "∓": -self.sign}.get(ch, 1)
            if ch and ch in "+-±∓":
                self.i += 1
                if ch == "+" and self.peek() == "-" and total is None or ch == "+" and self.s[self.i : self.i + 1] == "-":
                    self.i += 1
                    factor = self.sign
            elif total is not None:
                return total
            body = self.term()
            body = body if factor == 1 else -body
            total = body if total is None else total + body

    def term(self):
        left = self.factor()
        while True:
            ch = self.peek()
            if ch and ch in "*·×":
                self.i += 1
                left = left * self.factor()
            elif ch == "/":
                self.i += 1
                left = left / self.factor()
            elif self.starts():
                left = left * self.factor()
            else:
                return left

    def starts(self):
        """Whether a factor starts here, without a product sign."""
        ch = self.peek()
        if not ch or ch in "+-±∓)]},;:&⏎⟧=^>⟩":
            return False
        if ch == "|":
            return bool(self.ket_here()) or not self.bars
        return True

    def factor(self):
        if self.take("-"):
            return -self.factor()
        return self.powered(self.atom())

    def powered(self, base):
        while True:
            ch = self.peek()
            if ch in RAISED:
                self.i += 1
                base = base ** q(RAISED[ch])
            elif ch == "†":
                self.i += 1
                base = N("dag", base)
            elif ch == "^":
                self.i += 1
                if self.take("T"):
                    base = N("transpose", base)
                elif self.take("†") or self.take("dagger"):
                    base = N("dag", base)
                elif self.peek() == "*":
                    self.i += 1
                    base = N("fn", "conj", base)
                else:
                    e = self.exponent()
                    base = self.raised(base, e)
            else:
                return base

    def raised(self, base, e):
        if base.k == "euler":
            return N("fn", "exp", e)
        if tag(self.value(base)) == "m" and self.value(e) == -1:
            return N("inv", base)
        return base**e

    def exponent(self):
        if self.take("{"):
            e = self.expr()
            self.need("}")
            return e
        if self.take("-"):
            return -self.exponent()
        m = re.compile(r"[0-9]+(\.[0-9]+)?").match(self.s, self.i)
        if m:
            self.i = m.end()
            return self.powered(q(Fraction(m[0])))
        return self.powered(self.atom())

    def group(self):
        """An argument of a LaTeX command: a braced expression, one digit or one atom."""
        if self.take("{"):
            e = self.expr()
            self.need("}")
            return e
        ch = self.peek()
        if ch in '0123456789':
            self.i += 1
            return q(int(ch))
        return self.atom()

    def atom(self):
        ch = self.peek()
        m = re.compile(r"([0-9]+(?:\.[0-9]+)?|\.[0-9]+)(?:[eE]([+-]?[0-9]+))?").match(self.s, self.i)
        if m:
            self.i = m.end()
            n = Fraction(m[1]) * Fraction(10) ** int(m[2] or 0)
            if self.i < len(self.s) and self.s[self.i] in VULGAR:
                n += VULGAR[self.s[self.i]]
                self.i += 1
            return q(n)
        if ch in VULGAR:
            self.i += 1
            return q(VULGAR[ch])
        if ch == "⁄":
            self.i += 1
            top = self.group()
            return top / self.group()
        if ch == "√":
            self.i += 1
            if self.take("{"):
                self.i -= 1
                return N("fn", "sqrt", self.group())
            return N("fn", "sqrt", self.powered(self.atom()))
        if ch == "|":
            m = self.ket_here()
            if m:
                self.i = m.end()
                return N("ket", KETS[m[1]])
            self.i += 1
            self.bars += 1
            inner = self.expr()
            self.bars -= 1
            self.need("|")
            return N("fn", "abs", inner)
        m = self.bra_here()
        if m:
            self.i = m.end()
            left = N("bra", KETS[m[1]])
            m = re.compile(r"\s*([+-]?[xyz]?|up|down|[01↑↓])\s*[>⟩]").match(self.s, self.i)
            if m and m[1] in KETS:
                self.i = m.end()
                return left * N("ket", KETS[m[1]])
            return left
        if ch in "([{":
            return self.bracket()
        if ch == "⟦":
            return self.environment()
        if self.s.startswith("overline", self.i):
            self.i += 8
            return N("fn", "conj", self.group())
        text, what = self.word()
        if what is None:
            raise SyntaxError(f"nothing known at {self.i} in {self.s}")
        self.i += len(text)
        return self.function(what) if isinstance(what, str) else what

    def function(self, name):
        if name in REFERENCE:
            args = self.arguments()
            return N("const", functions.work_out(name, [self.value(x) for x in args], self.env))
        name = {"arcsin": "asin", "arccos": "acos", "arctan": "atan", "log": "ln"}.get(name, name)
        power = None
        if self.peek() in RAISED:
            power = q(RAISED[self.peek()])
            self.i += 1
        elif self.take("^"):
            power = self.exponent()
            if power.k == "neg" and name in ("sin", "cos", "tan"):
                name, power = "a" + name, None
        if self.peek() in ("(", "{"):
            args = self.arguments() if self.peek() == "(" else [self.group()]
        else:
            args = [self.run()]
        if name == "atan2":
            out = N("fn", name, *args)
        else:
            out = N("fn", name, args[0])
        return out if power is None else out**power

    def arguments(self):
        self.need("(")
        bars, self.bars = self.bars, 0
        args = [self.expr()]
        while self.take(","):
            args.append(self.expr())
        self.bars = bars
        self.need(")")
        return args

    def run(self):
        """The argument of a bare function: an unwritten product, with a /number."""
        sign = self.take("-")
        left = self.powered(self.atom())
        while True:
            ch = self.peek()
            if ch == "/" and re.compile(r"/\s*\d").match(self.s, self.i):
                self.i += 1
                left = left / self.powered(self.atom())
                continue
            text, what = self.word()
            stop = isinstance(what, str) or (isinstance(what, N) and what.k in ("op", "euler"))
            if not self.starts() or stop or ch in "√|<⟨[⟦" or ch in "*·×/":
                return -left if sign else left
            left = left * self.powered(self.atom())

    def bracket(self):
        opened = self.peek()
        self.i += 1
        bars, self.bars = self.bars, 0
        outer, self.nested = self.nested, opened == "["
        rows = [[self.expr()]]
        while True:
            if self.take(","):
                rows[-1].append(self.expr())
            elif self.take(";"):
                rows.append([self.expr()])
            else:
                break
        self.bars, self.nested = bars, outer
        self.need({"(": ")", "[": "]", "{": "}"}[opened])
        if len(rows) == 1 and len(rows[0]) == 1:
            only = rows[0][0]
            return N("list", [only]) if opened == "[" and self.nested and tag(self.value(only)) == "s" else only
        if len(rows) > 1:
            return N("mat", *rows[0], *rows[1]) if len(rows[0]) == 2 else N("col", rows[0][0], rows[1][0])
        row = rows[0]
        if all(x.k == "list" for x in row) and opened == "[":
            inner = [x.a[0] for x in row]
            return N("mat", *inner[0], *inner[1]) if len(inner[0]) == 2 else N("col", inner[0][0], inner[1][0])
        tags = [x.k if x.k == "list" else tag(self.value(x)) for x in row]
        if "m" in tags and len(row) == 2 and opened in "[{":
            return N("comm" if opened == "[" else "acomm", *row)
        if opened == "{":
            return N("set", *row)
        return N("list", row)

    def environment(self):
        self.need("⟦")
        rows = [[self.expr()]]
        while True:
            if self.take("&"):
                rows[-1].append(self.expr())
            elif self.take("⏎"):
                rows.append([self.expr()])
            else:
                break
        self.need("⟧")
        return N("mat", *rows[0], *rows[1]) if len(rows[0]) == 2 else N("col", rows[0][0], rows[1][0])
