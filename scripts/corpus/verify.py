"""Reads every line of the corpus with the second reader and checks its label at points of the domain; prints what does not fit."""

import glob
import json
import os
import random
import re
import sys

import mpmath

from label import agree_at, environment
from reader import Reader
from unicode_form import unicode_form
from values import Points, evaluate, tag

FOLDER = os.path.join(os.path.dirname(__file__), "..", "..", "tests", "corpus")

def value(text, line, env):
    """The value of a text as an answer of the line's kind."""
    kind, symbols = line["kind"], {**line["symbols"], **line.get("options", {}).get("definitions", {})}
    s = unicode_form(text)
    if kind == "eigenpairs" and not s.startswith("eigenpairs"):
        halves = [half.split(":") for half in s.split(";")] if s.count(":") == 2 and s.count(";") == 1 else regroup(s)
        return ("pairs", [(read(v, symbols, env, kind), read(w, symbols, env, kind)) for v, w in halves])
    if kind == "eigenvalues":
        s = re.sub(r"(E|λ|lambda)_?(\+-|±|\+|-|1,2|\{\\pm\}) *= *", "", s)
        out = []
        for sign in (1, -1):
            found = read(s, symbols, env, kind, sign, many=True)
            out.append(found)
        if "±" in s or "∓" in s or "+-" in s:
            return ("set", [x for v in out for x in v])
        first = out[0]
        return ("set", first[0][1] if len(first) == 1 and tag(first[0]) == "set" else first)
    if "=" in s:
        s = s.split("=")[1]
    v = read(s, symbols, env, kind)
    if kind in ("vector", "pauli") and tag(v) == "k":
        return ("t", v[1])
    if kind == "pauli" and tag(v) == "t" and len(v[1]) != 4:
        raise SyntaxError("not four")
    return v


def regroup(s):
    """Pairs whose states hold a semicolon of their own."""
    first, second, third = s.split(":")
    cut = second.rindex(";")
    return [(first, second[:cut]), (second[cut + 1 :], third)]


def read(s, symbols, env, kind, sign=1, many=False):
    r = Reader(s, symbols, env, kind)
    r.sign = sign
    found = [r.expr()]
    while many and r.take(","):
        found.append(r.expr())
    if r.peek():
        raise SyntaxError(f"left over at {r.i}: {r.s[r.i:]} in {r.s}")
    values = [evaluate(n, Points(env)) for n in found]
    return values if many else values[0]


def environments(line, count):
    rng = random.Random(11)
    for _ in range(count):
        env = environment(line["symbols"], rng)
        if "assume" in line.get("options", {}):
            n = mpmath.sqrt(abs(env["alpha"]) ** 2 + abs(env["beta"]) ** 2)
            env["alpha"], env["beta"] = env["alpha"] / n, env["beta"] / n
        for name, text in line.get("options", {}).get("definitions", {}).items():
            env[name] = read(text, line["symbols"], env, "scalar")
        yield env


def problem(line):
    """What is wrong with a line, or None."""
    options, kind = line.get("options", {}), line["kind"]
    agreeing = differing = 0
    for env in environments(line, 12 if line["verdict"] == "differs" else 4):
        try:
            r, a = value(line["reference"], line, env), value(line["answer"], line, env)
        except ZeroDivisionError:
            continue
        if "tolerance" in options:
            t, gap = options["tolerance"], abs(r - a)
            ok = gap <= t["relative"] * abs(r) if "relative" in t else gap <= t["absolute"] if "absolute" in t else gap <= mpmath.mpf(10) ** (mpmath.floor(mpmath.log10(abs(r))) - t["significantFigures"] + 1) / 2
            if "significantFigures" in t and line["verdict"] == "differs":
                return None
        else:
            ok = agree_at(kind, r, a, options)
        agreeing += ok
        differing += not ok
        if differing and line["verdict"] == "differs":
            return None
    wanted = {"agrees": differing == 0 and agreeing > 0, "differs": differing > 0, "undecided": "allowed" in line or differing > 0}[line["verdict"]]
    return None if wanted else f"{agreeing} agree, {differing} differ"


def main():
    bad = total = 0
    for path in sorted(glob.glob(os.path.join(FOLDER, "**", "*.jsonl"), recursive=True)):
        if len(sys.argv) > 1 and sys.argv[1] not in path or "notation" in path:
            continue
        with open(path, encoding="utf-8") as f:
            for text in f:
                line = json.loads(text)
                if line["kind"] in ("quantity", "choice") or line["verdict"] == "unreadable":
                    continue
                total += 1
                try:
                    found = problem(line)
                except Exception as error:
                    found = f"{type(error).__name__}: {error}"
                if found:
                    bad += 1
                    print(line["id"], line["verdict"], line["reference"], " | ", line["answer"], " | ", found, flush=True)
    print(f"{total} lines read, {bad} do not fit")
    return 1 if bad else 0


if __name__ == "__main__":
    sys.exit(main())
