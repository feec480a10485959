"""The reference functions of section 8 at one point, for the second reader."""

import mpmath

from values import Points, adjoint, exponential, plus, tag, times

I = mpmath.mpc(0, 1)


def trace(m):
    return m[1][0][0] + m[1][1][1]


def dot_sigma(n):
    x, y, z = n
    return ("m", [[z, x - I * y], [x + I * y, -z]])


def matrix(v):
    return v if tag(v) == "m" else ("m", [[v, 0], [0, v]])


def state(v):
    return ("k", v[1]) if tag(v) in ("k", "list", "t") else v


def density(v, b):
    v = state(v)
    return times(v, adjoint(v, b)) if tag(v) == "k" else matrix(v)


def eigen(m):
    (p, r), (s, t) = m[1]
    centre, root = (p + t) / 2, mpmath.sqrt(((p - t) / 2) ** 2 + r * s)
    return centre + root, centre - root


def eigenvector(m, value):
    (p, r), (s, t) = m[1]
    if abs(r) + abs(value - p) > mpmath.mpf(10) ** -60:
        return ("k", [r, value - p])
    return ("k", [value - t, s])


def bloch(rho):
    return ("t", [trace(times(rho, dot_sigma(n))) for n in ((1, 0, 0), (0, 1, 0), (0, 0, 1))])


def work_out(name, args, env):
    """The value of a reference function at a point."""
    b = Points(env)
    h = env["hbar"]
    first = args[0]
    if name == "commutator":
        return plus(times(*args), times(-1, times(args[1], first)))
    if name == "anticommutator":
        return plus(times(*args), times(args[1], first))
    if name == "eigenvalues":
        return ("set", list(eigen(matrix(first))))
    if name == "eigenpairs":
        return ("pairs", [(v, eigenvector(first, v)) for v in eigen(first)])
    if name == "trace":
        return trace(matrix(first))
    if name == "determinant":
        (p, r), (s, t) = matrix(first)[1]
        return p * t - r * s
    if name == "adjoint":
        return adjoint(first, b)
    if name == "pauli":
        return first
    if name in ("expectation", "variance", "uncertainty"):
        rho = density(args[1], b)
        mean = trace(times(rho, first))
        if name == "expectation":
            return mean
        var = trace(times(rho, times(first, first))) - mean**2
        return var if name == "variance" else mpmath.sqrt(mpmath.re(var))
    if name == "probability":
        return trace(times(density(first, b), density(args[1], b)))
    if name in ("projector", "density"):
        return density(first, b)
    if name == "bloch":
        return bloch(density(first, b))
    if name == "purity":
        return trace(times(matrix(first), matrix(first)))
    if name == "entropy":
        return -sum(v * mpmath.log(v) for v in eigen(matrix(first)) if abs(v) > mpmath.mpf(10) ** -60)
    if name == "spinor":
        return ("k", [mpmath.cos(first / 2), mpmath.exp(I * args[1]) * mpmath.sin(first / 2)])
    if name == "rotation":
        return exponential(times(-I * args[1] / 2, dot_sigma(first[1])), b)
    if name == "propagator":
        return exponential(times(-I * args[1] / h, first), b)
    if name == "evolve":
        return times(exponential(times(-I * args[1] / h, first), b), state(args[2]))
    if name == "heisenberg":
        u = exponential(times(-I * args[2] / h, args[1]), b)
        return times(adjoint(u, b), times(first, u))
    if name == "rabi":
        w = mpmath.sqrt(first**2 + args[1] ** 2)
        return first**2 / w**2 * mpmath.sin(w * args[2] / 2) ** 2
    if name == "thermal":
        rho = exponential(times(-1 / args[1], first), b)
        return times(1 / trace(rho), rho)
    raise ValueError(name)
