"""From pairs of trees to labelled lines: checks every label by the second method before a line is written."""

import json
import os
import pickle
import random
import re
import zlib
from collections import Counter

import mpmath

import label
from label import numeric
from slips import value_slips
from tree import walk
from writer import Writer

MODES = ("ascii", "uni", "tex", "mix")
FOLDER = os.path.join(os.path.dirname(__file__), "..", "..", "tests", "corpus")


class Topic:
    """Collects the lines of one topic; `prefix` begins each id, `symbols` is the default table."""

    def __init__(self, name, prefix, symbols=None):
        self.name, self.prefix, self.symbols = name, prefix, symbols or {}
        self.lines = {"agrees": [], "differs": [], "undecided": [], "unreadable": []}
        self.seen = set()
        self.doubts = []

    # --- the three kinds of line --------------------------------------------------------------------------------------

    def agree(self, kind, ref, *answers, why, n=2, symbols=None, options=None, fix=None, substitute=None, proof=None, form=None, loose=True, modes=MODES, reftext=None, properties=None):
        """Answers that agree with `ref`: each is written `n` times in different spellings (a hand-written text once)."""
        symbols, options = self.table(symbols, ref, answers), options or {}
        for ans in answers:
            good, bad, witness = numeric(kind, ref, ans, symbols, options, fix=fix)
            if bad or good < 8:
                self.doubt("agree", kind, ref, ans, f"{good} agree, {bad} differ", witness)
                continue
            ways = label.exact(kind, ref, ans, symbols, options, substitute)
            if not ways and not proof:
                self.doubt("agree", kind, ref, ans, "no exact proof", None)
                continue
            method = f"SymPy ({', '.join(ways)})" if ways else f"by hand: {proof}"
            source = f"{method}; equal to 55 digits at {good} points of the domain"
            for text in self.spell(ans, kind, n, loose, modes, symbols):
                self.add("agrees", kind, self.reference(ref, kind, reftext, symbols), text, symbols, options, why=why, source=source, form=form, properties=properties)

    def differ(self, kind, ref, *answers, why, n=1, symbols=None, options=None, fix=None, slips=None, pair=None, exactly=False, form=None, modes=MODES, reftext=None, quiet=False, properties=None):
        """Answers that differ from `ref` at a point of the domain; value slips that fit there are found and added to `slips`."""
        symbols, options = self.table(symbols, ref, answers), options or {}
        for ans in answers:
            good, bad, witness = numeric(kind, ref, ans, symbols, options, fix=fix)
            if not bad:
                self.doubt("differ", kind, ref, ans, f"agrees at all {good} points", None)
                continue
            found = set(slips or []) | (set() if quiet else value_slips(kind, ref, ans, symbols, options, fix))
            for text in self.spell(ans, kind, n, False, modes, symbols):
                self.add(
                    "differs", kind, self.reference(ref, kind, reftext, symbols), text, symbols, options, why=why,
                    source="mpmath, 80 digits: " + shown(witness), slips=in_order(found), pair=pair, exactly=exactly, form=form, properties=properties,
                )

    def plain(self, verdict, kind, reference, answer, why, source, symbols=None, options=None, slips=None, pair=None, allowed=None, form=None, exactly=False, ambiguous=False):
        """A line whose label comes from a hand argument."""
        self.add(verdict, kind, reference, answer, symbols if symbols is not None else self.symbols, options or {}, why=why, source=source, slips=in_order(set(slips or [])), pair=pair, allowed=allowed, form=form, exactly=exactly, ambiguous=ambiguous)

    # --- parts --------------------------------------------------------------------------------------------------------

    def table(self, symbols, ref, answers):
        """The declared symbols that the two use."""
        table = {**self.symbols, **(symbols or {})}
        used = {p.a[0] for n in (ref, *answers) for p in walk(n) if p.k == "sym"}
        written = set(re.findall(r"[A-Za-z]+(?:_[A-Za-z0-9])?", ref.a[0])) if ref.k == "raw" else set()
        used |= written & set(table)
        missing = used - set(table)
        if missing:
            raise ValueError(f"{self.name}: undeclared {missing}")
        kept = {k: v for k, v in table.items() if k in used or (symbols and k in symbols)}
        return kept

    def reference(self, ref, kind, given, symbols):
        if given:
            return given
        if ref.k == "raw":
            return ref.a[0]
        writer = Writer("ascii", random.Random(7), euler="e" not in symbols)
        writer.labels = False
        return writer.text(ref, kind)

    def spell(self, ans, kind, n, loose, modes, symbols):
        if ans.k == "raw":
            return [ans.a[0]]
        out = []
        plain = Writer("ascii", random.Random(7)).text(ans, kind)
        rng = random.Random(zlib.crc32(f"{self.name} {kind} {plain}".encode()))
        start = rng.randrange(len(modes))
        for k in range(n * 3):
            mode = modes[(start + k) % len(modes)]
            writer = Writer(mode, rng, loose=loose and rng.random() < 0.5, euler="e" not in symbols)
            text = writer.text(ans, kind)
            if mode == "tex":
                text = decorate(text, rng)
            if text not in out:
                out.append(text)
            if len(out) == n:
                break
        return out

    def add(self, verdict, kind, reference, answer, symbols, options, why, source, slips=None, pair=None, exactly=False, allowed=None, form=None, ambiguous=False, properties=None):
        key = (kind, reference, answer, json.dumps(options, sort_keys=True), json.dumps(symbols, sort_keys=True))
        if key in self.seen:
            return
        self.seen.add(key)
        name = {"agrees": "agree", "differs": "differ", "undecided": "open", "unreadable": "unread"}[verdict]
        line = {"id": f"{self.prefix}-{name}-{zlib.crc32(repr(key).encode()):08x}", "kind": kind, "reference": reference, "answer": answer, "symbols": symbols}
        if options:
            line["options"] = options
        line["verdict"] = verdict
        if slips:
            line["slipsExactly" if exactly else "slips"] = list(slips)
        for name, value in (("pair", pair), ("allowed", allowed), ("form", form), ("ambiguous", ambiguous)):
            if value:
                line[name] = value
        if properties:
            line["hermitian"], line["unitary"] = properties
        line["why"], line["source"] = why, source
        self.lines[verdict].append(line)

    def doubt(self, wanted, kind, ref, ans, reason, witness):
        show = lambda n: Writer("ascii", random.Random(7)).text(n, kind)
        self.doubts.append(f"{self.name}: wanted {wanted} {kind}: {show(ref)}  |  {show(ans)}: {reason} {shown(witness) if witness else ''}")

    def write(self):
        """Writes the topic's files and returns how many lines each verdict has."""
        for verdict, lines in self.lines.items():
            path = os.path.join(FOLDER, "equivalence", verdict, f"{self.name}.jsonl")
            if not lines:
                continue
            os.makedirs(os.path.dirname(path), exist_ok=True)
            with open(path, "w", encoding="utf-8") as f:
                for line in lines:
                    f.write(json.dumps(line, ensure_ascii=False) + "\n")
        return Counter({v: len(lines) for v, lines in self.lines.items()})


ORDER = (
    "sign factor-half factor-two hbar-power missing-i conjugated transposed commutator-order half-angle double-angle sine-cosine missing-two-pi "
    "rounded-decimal axes-permuted missing-root missing-constant one-eigenvalue centred-eigenvalues states-swapped not-normalised pauli-for-spin "
    "spin-for-pauli power-of-ten wrong-unit"
).split()


def in_order(slips):
    """Slips in the order of the catalogue, after those that an author defined."""
    return sorted(slips, key=lambda s: ORDER.index(s) if s in ORDER else -1)


def decorate(text, rng):
    """Now and then the signs people put around mathematics."""
    r = rng.random()
    if r < 0.12 and "=" not in text:
        return f"${text}$"
    return text + "." if r < 0.17 else text


def shown(witness):
    """A witness in a few digits."""
    env, r, a = witness
    at = ", ".join(f"{k} = {mpmath.nstr(v, 6)}" for k, v in env.items())
    return f"at {at}: reference {digits(r)}, answer {digits(a)}"


def digits(v):
    if isinstance(v, tuple) and isinstance(v[0], str):
        return "(" + ", ".join(digits(x) for x in v[1]) + ")"
    if isinstance(v, (tuple, list)):
        return "[" + ", ".join(digits(x) for x in v) + "]"
    return mpmath.nstr(mpmath.chop(mpmath.mpc(v), 1e-30), 15).replace("(", "").replace(")", "")


def load_proofs(path):
    if path and os.path.exists(path):
        with open(path, "rb") as f:
            label.PROOFS.update(pickle.load(f))


def save_proofs(path):
    if path:
        with open(path, "wb") as f:
            pickle.dump(label.PROOFS, f)
