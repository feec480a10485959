"""Writes a tree as a person might type it: ASCII, Unicode, LaTeX or a mixture, with the shape of the tree kept.

The texts follow section 1 and 2 of the answer language: whatever could be read in two ways is bracketed, but for what `loose`
allows (an unwritten product after a slash, read left to right).
"""

from names import OPS, RAISED, VULGAR, symbol_text
from tree import walk
from writer_objects import ADD, ATOM, MUL, POW, Objects, T

TRIG = {"sin", "cos", "tan", "sec", "csc", "cot", "sinh", "cosh", "tanh", "ln", "log"}
WORDS = {"pi", "hbar", "ln", "sin", "cos", "tan", "exp", "ab", "Re", "Im", "mu", "nu", "xi", "up"}


class Writer(Objects):
    """One style: `mode` is ascii, uni, tex or mix; `rng` makes the free choices; `loose` allows notation read by rule."""

    def __init__(self, mode, rng, loose=False, euler=True):
        self.mode, self.rng, self.loose, self.euler = mode, rng, loose, euler
        self.bars = False
        self.tight = rng.random() < 0.5
        self.stars = rng.random() < 0.6
        self.state = False
        self.labels = True

    def text(self, n, kind="scalar"):
        """The whole answer."""
        inside = list(walk(n))
        bare = {"abs": sum(p.k == "fn" and p.a[0] == "abs" for p in inside)}
        self.bars = bare["abs"] == 1 and not any(p.k in ("ket", "bra") for p in inside)
        self.state = kind in ("state", "eigenpairs")
        return self.w(n).s

    # --- choices ------------------------------------------------------------------------------------------------------

    def m(self):
        return self.rng.choice(("ascii", "uni", "tex")) if self.mode == "mix" else self.mode

    def one(self, *choices):
        return self.rng.choice(choices)

    def chance(self, p):
        return self.rng.random() < p

    def group(self, s):
        return rf"\left({s}\right)" if self.m() == "tex" and self.chance(0.5) else f"({s})"

    def at(self, n, level, tail=False):
        """A part that binds at least as tightly as `level`."""
        t = self.w(n, tail)
        return T(self.group(t.s)) if t.p < level else t

    # --- one function a kind of node ----------------------------------------------------------------------------------

    def w(self, n, tail=True):
        return getattr(self, "w_" + n.k)(n, tail)

    def w_raw(self, n, tail):
        return T(n.a[0], ADD)

    def w_num(self, n, tail):
        f = n.a[0]
        if f.denominator == 1:
            return T(str(f))
        p, r = f.numerator, f.denominator
        mode = self.m()
        if mode == "uni" and (p, r) in VULGAR and self.chance(0.6):
            return T(VULGAR[(p, r)], MUL)
        if mode == "tex":
            if p < 10 and r < 10 and self.chance(0.2):
                return T(f"\\frac{p}{r}", MUL)
            return T(f"{self.one(chr(92) + 'frac', chr(92) + 'tfrac', chr(92) + 'dfrac', chr(92) + 'frac')}{{{p}}}{{{r}}}", MUL)
        if r in (2, 4, 5, 8) and self.chance(0.25):
            return T(str(p / r), MUL)
        return T(f"{p}/{r}", MUL, slash=True)

    def w_lit(self, n, tail):
        return T(n.a[0])

    def w_sym(self, n, tail):
        return T(symbol_text(n.a[0], self.m(), self.rng))

    w_def = w_sym

    def w_i(self, n, tail):
        return T(r"\mathrm{i}" if self.m() == "tex" and self.chance(0.3) else "i")

    def w_pi(self, n, tail):
        return T({"ascii": "pi", "uni": "π", "tex": r"\pi"}[self.m()])

    def w_hbar(self, n, tail):
        return T({"ascii": "hbar", "uni": self.one("ħ", "ħ", "ℏ"), "tex": r"\hbar"}[self.m()])

    def w_op(self, n, tail):
        mode = self.m()
        return T(self.one(*OPS[mode][n.a[0]]))

    def w_add(self, n, tail):
        out = ""
        for k, part in enumerate(n.a):
            minus = part.k == "neg"
            body = self.at(part.a[0] if minus else part, MUL, True)
            sign = self.one("-", "−") if self.m() == "uni" else "-"
            if k == 0:
                out = (sign if minus else "") + body.s
            else:
                gap = "" if self.tight and self.chance(0.5) else " "
                out += f"{gap}{sign if minus else '+'}{gap}{body.s}"
        return T(out, ADD)

    def w_neg(self, n, tail):
        body = self.at(n.a[0], MUL, tail)
        sign = self.one("-", "−") if self.m() == "uni" else "-"
        return T(sign + body.s, ADD + 0.5, body.tail, body.slash)

    def w_div(self, n, tail):
        top, bottom = n.a
        if self.m() == "tex" and self.chance(0.9) and not any(p.k in ("ket", "bra", "col", "mat") for p in walk(n)):
            return T(f"{self.one(chr(92) + 'frac', chr(92) + 'frac', chr(92) + 'dfrac', chr(92) + 'tfrac')}{{{self.w(top).s}}}{{{self.w(bottom).s}}}", MUL)
        a = self.w(top, False)
        if a.p < MUL or a.tail:
            a = T(self.group(a.s))
        b = self.at(bottom, POW, False)
        return T(f"{a.s}/{b.s}", MUL, slash=True)

    def w_mul(self, n, tail):
        out, slash = None, False
        for k, part in enumerate(n.a):
            last = k == len(n.a) - 1
            follows_function = not last and n.a[k + 1].k == "fn" and n.a[k + 1].a[0] in TRIG
            body = self.w(part, (tail and last) or (follows_function and self.loose))
            if body.p < MUL and not (k == 0 and body.p > ADD and not last):
                body = T(self.group(body.s))
            if k and body.slash:
                body = T(self.group(body.s))
            if out is None:
                out = body
                slash = body.slash
                continue
            if n.a[k - 1].k == "bra" and out.s[-1] == "|" == body.s[0]:
                out = T(out.s[:-1], out.p)
            glue = self.glue(out, body, n.a[k - 1], part, slash)
            out = T(out.s + glue + body.s, min(MUL, out.p), body.tail)
        return T(out.s, min(MUL, out.p), out.tail, slash)

    def glue(self, left, right, before, after, slash):
        """What stands between two factors: a product sign, a space, or nothing."""
        l, r = left.s, right.s
        if left.tail:
            return " "
        if before.k == "bra" or after.k == "bra" or (after.k == "ket" and before.k == "op"):
            return ""
        signs = {"ascii": ["*"], "uni": ["·"], "tex": [r" \cdot ", r"\,"] if not slash else [r" \cdot "]}
        if not (has_state(before) or has_state(after) or r[0].isdigit()):
            signs = {**signs, "uni": ["·", "×"], "tex": signs["tex"] + [r" \times "]}
        sign = self.one(*signs[self.m()])
        if sign == "\\," and (r[0].isdigit() or r[0] in ".½¼¾⅓⅔"):
            sign = r" \cdot "
        spaced = f" {sign} " if sign in "*·×" and self.chance(0.3) else sign
        if r[0].isdigit() or r[0] in ".½¼¾⅓⅔" or (slash and not self.loose) or (self.stars and self.mode == "ascii" and self.chance(0.7)):
            return spaced
        if after.k == "num" or r[0] == "-" or r.startswith("\\frac") and l[-1].isdigit():
            return spaced
        if r[0] == "[" or l[-1] == "]" or "|" in l[-1] + r[0]:
            return self.one(" ", spaced) if sign not in "×" else " "
        free = ""
        if l[-1].isalnum() and r[0].isalnum():
            pair = l[-1] + r[0]
            ascii_pair = pair.isascii()
            digit = l[-1].isdigit() and ("_" in l[-3:] or before.k in ("sym", "op", "def"))
            long = word(l, -1) + word(r, 0)
            if digit or (l[-1].isdigit() and r[0] in "eE") or (ascii_pair and l[-1].isalpha() and (len(long) > 2 or long in WORDS)):
                free = " "
        if "\\" in l and l[-1].isalpha() and r[0].isalpha() and command_at_end(l):
            free = " "
        if l[-1] in "₀₁₂₃₄₅₆₇₈₉" and r[0].isascii() and not r[0].isalpha() and r[0] != "(":
            free = " "
        if before.k == "op" and after.k != "op" and r[0].isalpha():
            free = " "
        return self.one(free, " ", " ", spaced)

    def w_pow(self, n, tail):
        base, e = n.a
        if base.k == "fn" and base.a[0] in TRIG and e.k == "num" and e.a[0].denominator == 1 and e.a[0] > 1 and self.chance(0.7):
            return self.function(base, tail, int(e.a[0]))
        b = self.w(base, False)
        if b.p < ATOM or b.s.startswith("√"):
            b = T(self.group(b.s))
        return T(b.s + self.exponent(e), POW)

    def exponent(self, e):
        mode = self.m()
        if e.k == "num" and e.a[0].denominator == 1:
            v = int(e.a[0])
            if mode == "uni" and v in RAISED and self.chance(0.8):
                return RAISED[v]
            if mode == "ascii" and self.chance(0.2):
                return f"**{v}"
            return f"^{v}" if v < 10 and self.chance(0.7) else (f"^{{{v}}}" if mode == "tex" else f"^{v}")
        inner = self.w(e).s
        return f"^{{{inner}}}" if mode == "tex" or (mode == "uni" and self.chance(0.2)) else f"^({inner})"

    def w_fn(self, n, tail):
        name, args = n.a[0], n.a[1:]
        if name == "sqrt":
            return self.root(args[0])
        if name == "exp":
            return self.exponential(args[0])
        if name == "abs" and self.bars and self.chance(0.8):
            inner = self.w(args[0]).s
            return T(rf"\left|{inner}\right|" if self.m() == "tex" else f"|{inner}|")
        if name == "abs":
            return T(f"abs({self.w(args[0]).s})")
        if name == "conj":
            inner = self.w(args[0]).s
            mode = self.m()
            if mode == "tex":
                return T(rf"\overline{{{inner}}}")
            return T(f"{inner}^*", POW) if mode == "uni" and args[0].k == "sym" and tail else T(f"conj({inner})")
        if name in ("Re", "Im", "atan2"):
            return T(f"{name}({', '.join(self.w(x).s for x in args)})")
        return self.function(n, tail, None)

    def function(self, n, tail, power):
        name, arg = n.a
        mode = self.m()
        if name.startswith("a") and self.chance(0.5):
            name = "arc" + name[1:] if name in ("asin", "acos", "atan") else name
        head = "\\" + name if mode == "tex" and not name[:2] == "as" and name not in ("acos", "atan", "acosh", "atanh") else name
        if power:
            head += {"uni": RAISED.get(power, f"^{power}"), "tex": f"^{power}" if self.chance(0.7) else f"^{{{power}}}", "ascii": f"^{power}"}[mode]
        simple = arg.k in ("sym", "pi", "def") or (arg.k == "mul" and arg.a[0].k == "num" and len(arg.a) == 2 and arg.a[1].k in ("sym", "def"))
        if mode != "ascii" and tail and simple and self.chance(0.7):
            inner = Writer(mode, self.rng)
            inner.stars = False
            body = bare_argument(inner, arg)
            return T(f"{head} {body}", MUL, tail=True)
        if mode == "tex" and arg.k == "div" and arg.a[0].k == "sym" and arg.a[1].k == "num" and self.chance(0.5) and tail:
            return T(f"{head}\\frac{{{self.w(arg.a[0]).s}}}{{{self.w(arg.a[1]).s}}}", MUL, tail=True)
        inner = self.w(arg).s
        return T(head + (self.group(inner) if mode == "tex" else f"({inner})"))

    def root(self, x):
        mode = self.m()
        inner = self.w(x).s
        if mode == "tex":
            return T(rf"\sqrt{{{inner}}}")
        if mode == "uni":
            return T(f"√{inner}" if inner.isdigit() else f"√({inner})")
        if self.chance(0.12):
            b = self.at(x, ATOM)
            return T(f"{b.s}^(1/2)", POW)
        return T(f"sqrt({inner})")

    def exponential(self, x):
        mode = self.m()
        inner = self.w(x).s
        if self.euler and self.chance(0.55):
            if mode == "tex":
                return T(f"{self.one('e', chr(92) + 'mathrm{e}', 'e')}^{{{inner}}}", POW)
            return T(f"e^({inner})" if mode == "ascii" or self.chance(0.5) else f"e^{{{inner}}}", POW)
        return T((r"\exp" + self.group(inner)) if mode == "tex" else f"exp({inner})")


STATES = {"ket", "bra", "col", "raw"}
OPERATORS = {"op", "mat", "comm", "acomm", "dag", "inv", "transpose"}


def has_state(n):
    """Whether a subtree holds an operator, a matrix or a state."""
    return any(p.k in STATES | OPERATORS for p in walk(n))


def word(s, end):
    """The run of ASCII letters at an end of a text."""
    letters = ""
    for ch in reversed(s) if end else s:
        if not (ch.isascii() and ch.isalpha()):
            break
        letters = ch + letters if end else letters + ch
    return letters


def command_at_end(s):
    run = word(s, -1)
    return bool(run) and s[: -len(run)].endswith("\\")


def bare_argument(writer, arg):
    if arg.k == "mul":
        number, name = arg.a
        return f"{number.a[0]}{writer.w(name).s}" if number.a[0].denominator == 1 else f"({writer.w(arg).s})"
    return writer.w(arg).s
