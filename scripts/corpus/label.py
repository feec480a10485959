"""Labels: whether two trees agree as answers of a kind, by 60-digit values at points of the domain and by exact proof in SymPy."""

import random
import signal
from contextlib import contextmanager
from fractions import Fraction

import mpmath
import sympy

from tree import walk
from values import Exact, Points, evaluate, plus, scalar_matrix, tag, times

POINTS = 10
CLOSE = mpmath.mpf(10) ** -55

PROOFS = {}


def names(n):
    found = {p.a[0] for p in walk(n) if p.k == "sym"}
    return found


def ends(domain):
    """The ends of an interval, as exact multiples of pi or plain fractions."""
    out = []
    for text in domain["between"]:
        out.append(eval(text, {"__builtins__": {}}, {"pi": mpmath.pi * 1}))
    return out


def sample(domain, rng):
    f = lambda lo, hi: mpmath.mpf(rng.randint(lo, hi)) / 1009
    if domain == "real" or domain == "nonzero":
        return f(101, 7400) * rng.choice((1, -1))
    if domain in ("positive", "nonnegative"):
        return f(150, 3100)
    if domain == "integer":
        return mpmath.mpf(rng.randint(-6, 6))
    if domain == "complex":
        return mpmath.mpc(f(-2000, 2000), f(-2000, 2000))
    lo, hi = ends(domain)
    return lo + (hi - lo) * f(20, 989)


def exact_symbol(name, domain):
    kw = {"real": {"real": True}, "nonzero": {"real": True, "nonzero": True}, "positive": {"positive": True}, "nonnegative": {"nonnegative": True}, "integer": {"integer": True}, "complex": {}}
    if isinstance(domain, dict):
        lo, hi = ends(domain)
        return sympy.Symbol(name, positive=True) if lo >= 0 else sympy.Symbol(name, real=True)
    return sympy.Symbol(name, **kw[domain])


def environment(symbols, rng, fix=None):
    env = {n: sample(d, rng) for n, d in sorted(symbols.items())}
    env["hbar"] = sample("positive", rng)
    return fix(env) if fix else env


# --- comparison of values ---------------------------------------------------------------------------------------------


def as_kind(kind, v):
    """A value in the shape that the kind compares."""
    if kind in ("operator", "pauli"):
        if tag(v) == "t":
            a0, a1, a2, a3 = v[1]
            i = sympy.I if isinstance(a0, sympy.Basic) else mpmath.mpc(0, 1)
            return ("m", [[a0 + a3, a1 - i * a2], [a1 + i * a2, a0 - a3]])
        return scalar_matrix(v) if tag(v) == "s" else v
    if kind == "eigenvalues" and tag(v) == "s":
        return ("set", [v])
    return v


def entries(v):
    if tag(v) == "s":
        return [v]
    return [e for row in v[1] for e in row] if tag(v) == "m" else list(v[1])


def same(x, y):
    return abs(x - y) <= CLOSE * (abs(x) + abs(y)) or (abs(x) < CLOSE and abs(y) < CLOSE)


def close(xs, ys):
    """Component by component, against the size of the whole."""
    scale = max([abs(e) for e in xs + ys] + [mpmath.mpf(10) ** -10])
    return all(abs(p - r) <= CLOSE * scale for p, r in zip(xs, ys))


def norm2(xs):
    return sum(abs(x) ** 2 for x in xs)


def agree_at(kind, ref, ans, options):
    """Whether two values at one point agree as answers of the kind."""
    ref, ans = as_kind(kind, ref), as_kind(kind, ans)
    if kind == "eigenvalues":
        r, a = ref[1], ans[1]
        return len(r) == len(a) and (close(r, a) or close(r, a[::-1]))
    if kind == "eigenpairs":
        (v1, s1), (v2, s2) = ref[1]
        (w1, t1), (w2, t2) = ans[1]
        unit = not options.get("requireNormalised") or all(abs(norm2(entries(t)) - 1) < CLOSE for t in (t1, t2))
        if same(v1, v2):
            return unit and same(w1, v1) and same(w2, v1) and not parallel(entries(t1), entries(t2))
        straight = same(v1, w1) and same(v2, w2) and parallel(entries(s1), entries(t1)) and parallel(entries(s2), entries(t2))
        crossed = same(v1, w2) and same(v2, w1) and parallel(entries(s1), entries(t2)) and parallel(entries(s2), entries(t1))
        return unit and (straight or crossed)
    r, a = entries(ref), entries(ans)
    if len(r) != len(a):
        return False
    if kind == "state" and norm2(a) < CLOSE:
        return False
    if options.get("requireNormalised") and abs(norm2(a) - 1) > CLOSE:
        return False
    if options.get("upToScale"):
        return parallel(r, a)
    if options.get("upToPhase"):
        return parallel(r, a) and same(norm2(r), norm2(a))
    return close(r, a)


def parallel(r, a):
    big = max(range(len(r)), key=lambda k: abs(r[k]))
    if abs(r[big]) < CLOSE:
        return max(abs(x) for x in a) < CLOSE
    f = a[big] / r[big]
    return abs(f) > CLOSE and close([f * x for x in r], a)


# --- numeric label ----------------------------------------------------------------------------------------------------


def numeric(kind, ref, ans, symbols, options, seed=1, fix=None, wanted=POINTS):
    """(points agreeing, points differing, first witness): points where a side is undefined are passed over."""
    rng = random.Random(seed)
    agreeing, differing, witness = 0, 0, None
    tries = 0
    while agreeing + differing < wanted and tries < 60:
        tries += 1
        env = environment(symbols, rng, fix)
        try:
            r, a = evaluate(ref, Points(env)), evaluate(ans, Points(env))
        except ZeroDivisionError:
            continue
        if agree_at(kind, r, a, options):
            agreeing += 1
        else:
            differing += 1
            witness = witness or (env, r, a)
    return agreeing, differing, witness


# --- exact label ------------------------------------------------------------------------------------------------------


@contextmanager
def limit(seconds):
    """Ends what takes more than this much processor time, so that a busy machine does not change what is proved."""

    def stop(*_):
        raise TimeoutError

    old = signal.signal(signal.SIGVTALRM, stop)
    signal.setitimer(signal.ITIMER_VIRTUAL, seconds)
    try:
        yield
    finally:
        signal.setitimer(signal.ITIMER_VIRTUAL, 0)
        signal.signal(signal.SIGVTALRM, old)


WAYS = [
    ("expand", lambda e: sympy.expand(e)),
    ("expand of functions", lambda e: sympy.expand(sympy.expand_func(sympy.expand_trig(sympy.expand(e))))),
    ("rewrite to exponentials", lambda e: sympy.expand(sympy.powsimp(sympy.expand(sympy.together(e.rewrite(sympy.exp)).as_numer_denom()[0])))),
    ("common numerator", lambda e: sympy.expand(sympy.numer(sympy.together(sympy.expand_trig(e))))),
    ("simplify", lambda e: sympy.simplify(e)),
    ("expand_complex", lambda e: sympy.simplify(sympy.expand_complex(e))),
    ("radsimp", lambda e: sympy.simplify(sympy.radsimp(sympy.sqrtdenest(sympy.expand(e))))),
    ("minimal polynomial", lambda e: sympy.Integer(0) if not e.free_symbols and sympy.minimal_polynomial(e) == sympy.Symbol("x") else e),
    ("trigsimp", lambda e: sympy.trigsimp(sympy.expand_trig(e))),
    ("square root squared", lambda e: sympy.simplify(sympy.powdenest(e, force=False).rewrite(sympy.cos))),
    ("exponentials", lambda e: sympy.simplify(e.rewrite(sympy.exp))),
]


def zero(e):
    """The name of the way that shows `e` to be zero, or None."""
    e = sympy.sympify(e)
    if e == 0:
        return "identical"
    key = sympy.srepr(e)
    if key in PROOFS:
        return PROOFS[key]
    found = None
    for name, way in WAYS:
        try:
            with limit(4):
                if way(e) == 0:
                    found = name
                    break
        except TimeoutError:
            continue
        except Exception:
            continue
    PROOFS[key] = found
    return found


def residuals(kind, ref, ans, options):
    """Expressions that vanish exactly when the two agree."""
    ref, ans = as_kind(kind, ref), as_kind(kind, ans)
    if kind == "eigenvalues":
        (r1, r2), (a1, a2) = ref[1], ans[1]
        return [r1 + r2 - a1 - a2, r1 * r2 - a1 * a2]
    if kind == "eigenpairs":
        out = []
        (v1, s1), (v2, s2) = ref[1]
        for swap in (False, True):
            (w1, t1), (w2, t2) = reversed(ans[1]) if swap else ans[1]
            here = [v1 - w1, v2 - w2, cross(s1, t1), cross(s2, t2)]
            if options.get("requireNormalised"):
                here += [sum(e * sympy.conjugate(e) for e in entries(t)) - 1 for t in (t1, t2)]
            out.append(here)
        return out
    r, a = entries(ref), entries(ans)
    out = [x - y for x, y in zip(r, a)]
    loose = options.get("upToPhase") or options.get("upToScale")
    if loose:
        out = [r[p] * a[s] - r[s] * a[p] for p in range(len(r)) for s in range(p)]
    total = lambda xs: sum(e * sympy.conjugate(e) for e in xs)
    if options.get("upToPhase") and not options.get("upToScale"):
        out.append(total(r) - total(a))
    if options.get("requireNormalised"):
        out.append(total(a) - 1)
    return out


def cross(s, t):
    (p, r), (x, y) = entries(s), entries(t)
    return p * y - r * x


def exact(kind, ref, ans, symbols, options, substitute=None):
    """How SymPy shows that the two agree, or None. `substitute` maps a symbol to what an assumption makes of it."""
    env = {n: exact_symbol(n, d) for n, d in symbols.items()}
    env["hbar"] = sympy.Symbol("hbar", positive=True)
    try:
        with limit(20):
            r, a = evaluate(ref, Exact(env)), evaluate(ans, Exact(env))
    except TimeoutError:
        return None
    found = residuals(kind, r, a, options)
    groups = found if found and isinstance(found[0], list) else [found]
    for group in groups:
        if substitute:
            group = [sympy.sympify(e).subs(substitute(env)) for e in group]
        ways = [zero(e) for e in group]
        if all(ways):
            return sorted(set(ways), key=ways.index)
    return None
