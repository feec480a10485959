"""Spellings typed by hand: every class of section 1, and the reading rules of section 2, in answers that agree."""

from emit import Topic
from tree import *

SYMBOLS = {"theta": "real", "phi": "real", "t": "real", "omega": "positive", "omega_0": "positive", "omega_1": "positive", "B": "real", "gamma": "positive", "a": "real", "b": "real", "a_0": "real", "a_1": "real", "x": "real", "y": "real", "m": "positive", "Delta": "real", "epsilon": "real", "mu": "positive"}


def spellings():
    t = Topic("spellings", "spell", SYMBOLS)
    th, ph, tt, w, w0, w1, B, g, a, b, a0, a1, x, y, m, Dl, ep, mu = syms("theta phi t omega omega_0 omega_1 B gamma a b a_0 a_1 x y m Delta epsilon mu")

    def say(kind, n, *texts, why, options=None, symbols=None, proof=None, form=None):
        t.agree(kind, n, *[raw(s, n) for s in texts], why=why, options=options, symbols=symbols, proof=proof, form=form)

    S = "scalar"
    say(S, hbar * w / 2, "hbar omega/2", "hbar*omega/2", "ħω/2", "ℏω/2", "½ħω", "½ ħ ω", "1/2 ħω", "1/2 hbar omega", "0.5ħω", "\\frac{\\hbar\\omega}{2}", "\\frac12\\hbar\\omega", "\\tfrac{1}{2}\\hbar\\omega", "\\dfrac{\\hbar \\omega}{2}", "\\frac{1}{2} ħω", "ħ·ω/2", "ħ×ω/2", "\\hbar\\cdot\\omega/2", "\\hbar\\times\\omega\\,/\\,2", "$\\frac{\\hbar\\omega}{2}$", "\\left(\\frac{\\hbar\\omega}{2}\\right)", "\\displaystyle\\frac{\\hbar\\omega}{2}", "E = ħω/2", "E=\\frac{\\hbar\\omega}{2}.", "hbaromega/2", "(hbar/2) omega", "(hbar omega)/2", "ħ\\omega/2", "hbar ω / 2", "\\hbar\\;\\omega\\!/2", "hbar*omega*2^-1", "ħω·2^{-1}", "h ω/(4π)", "h*omega/(4*pi)", "\\frac{h\\omega}{4\\pi}", "ħω/2.", why="half a quantum")
    say(S, w0 * tt / 2, "omega_0 t/2", "omega0 t/2", "omega_0*t/2", "ω_0 t/2", "ω₀t/2", "ω₀ t / 2", "\\omega_0 t/2", "\\omega_{0}t/2", "\\frac{\\omega_0 t}{2}", "½ω₀t", "t omega_0/2", "\\tfrac12\\omega_0 t", "0.5*ω0*t", why="subscripts")
    say(S, a0 + a1, "a_0 + a_1", "a0 + a1", "a₀ + a₁", "a_{0}+a_{1}", "a0+a1", "a_1+a_0", why="subscripts of Latin letters")
    say(S, ep * ph * mu, "epsilon*phi*mu", "εφμ", "ϵ ϕ µ", "\\varepsilon\\varphi\\mu", "\\epsilon\\phi\\mu", "ε·φ·μ", "εϕµ", why="variant Greek")
    say(S, cos(th) ** 2, "cos(theta)^2", "cos^2(theta)", "cos²θ", "cos² θ", "cos^2 θ", "\\cos^2\\theta", "\\cos^{2}\\theta", "\\cos^2(\\theta)", "\\cos(\\theta)^2", "(cos θ)^2", "(\\cos\\theta)^2", "cos(θ)²", "cos(theta)**2", "cos(theta)*cos(theta)", "cos θ cos θ", "\\cos^2{\\theta}", "\\left(\\cos\\theta\\right)^{2}", "cos^2 theta", why="powers of functions")
    say(S, cos(th / 2), "cos(theta/2)", "cos(θ/2)", "cos θ/2", "\\cos\\frac{\\theta}{2}", "\\cos\\tfrac{\\theta}{2}", "\\cos(\\theta/2)", "\\cos\\left(\\frac{\\theta}{2}\\right)", "\\cos{\\frac{\\theta}{2}}", "cos(½θ)", "cos(0.5 θ)", "\\cos\\frac\\theta2", why="half angle; a bare function takes /2")
    say(S, sin(2 * th) * cos(ph), "sin(2theta)cos(phi)", "sin 2θ cos φ", "\\sin2\\theta\\cos\\phi", "\\sin(2\\theta)\\cos\\phi", "sin(2θ)·cos(φ)", "cos φ sin 2θ", "sin 2 θ cos φ", why="a function stops at the next one")
    say(S, sin(w * tt), "sin(omega t)", "sin ωt", "sin(ωt)", "\\sin\\omega t", "\\sin(\\omega t)", "sin ω t", "\\sin{\\omega t}", "sin(omega*t)", why="a bare function takes the product")
    say(S, 2 * sin(th / 2) * cos(th / 2), "2 sin(θ/2) cos(θ/2)", "2\\sin\\frac{\\theta}{2}\\cos\\frac{\\theta}{2}", "2 sin θ/2 cos θ/2", "2*sin(theta/2)*cos(theta/2)", "2sin(θ/2)cos(θ/2)", "\\sin\\theta", why="products of bare functions")
    say(S, exp(i * ph), "e^(i phi)", "exp(i phi)", "e^{iφ}", "e^{i\\varphi}", "\\mathrm{e}^{\\mathrm{i}\\phi}", "\\exp(i\\phi)", "\\exp\\left(i\\phi\\right)", "exp(iφ)", "e^(iφ)", "e^{i \\phi}", "cos φ + i sin φ", "\\cos\\phi + i\\sin\\phi", "e**(i*phi)", why="phases")
    say(S, exp(-(x**2)), "e^(-x^2)", "exp(-x^2)", "e^{-x^2}", "e^-x^2", "e^{-x²}", "1/e^(x^2)", why="a leading minus binds looser than a power, in the exponent too")
    say(S, -(x**2), "-x^2", "−x²", "-(x^2)", "-x*x", "- x**2", "-{x}^{2}", why="a leading minus binds looser than a power")
    say(S, N("pow", q(2), N("pow", q(3), q(2))), "2^3^2", "2^9", "512", "2**3**2", "2^{3^2}", why="powers bind to the right", symbols={})
    say(S, x ** q(10), "x^10", "x^{10}", "x**10", "(x^5)^2", why="all the digits of a bare exponent")
    say(S, sqrt(q(2)) / 2, "sqrt(2)/2", "√2/2", "√(2)/2", "\\sqrt{2}/2", "\\frac{\\sqrt{2}}{2}", "\\frac{\\sqrt2}{2}", "\\sqrt2/2", "1/√2", "1/sqrt(2)", "\\frac{1}{\\sqrt2}", "\\frac1{\\sqrt2}", "2^(-1/2)", "2^{-1/2}", "(1/2)^(1/2)", "\\sqrt{\\frac12}", "√½", "sqrt(1/2)", "√2·½", why="square roots", symbols={})
    say(S, sqrt(q(2)) * x, "√2 x", "√2x", "sqrt(2) x", "\\sqrt2 x", "\\sqrt{2}x", "x√2", "x \\sqrt 2", why="the root takes one atom")
    say(S, sqrt(x**2 + y**2), "√(x²+y²)", "sqrt(x^2+y^2)", "\\sqrt{x^2+y^2}", "(x^2+y^2)^(1/2)", "(x^2 + y^2)^{1/2}", "\\left(x^2+y^2\\right)^{\\frac{1}{2}}", "(x²+y²)^0.5", "(x^2+y^2)^{0.5}", "|x + i y|", "\\left|x+iy\\right|", "abs(x+iy)", why="square root of a sum")
    say(S, absv(x), "|x|", "abs(x)", "\\left|x\\right|", "\\left| x \\right|", "√(x²)", "|-x|", "sqrt(x^2)", why="modulus")
    say(S, asin(x / 2), "asin(x/2)", "arcsin(x/2)", "\\arcsin(x/2)", "sin^-1(x/2)", "\\sin^{-1}(x/2)", "\\arcsin\\frac{x}{2}", why="inverse sine", symbols={"x": {"between": ["-1", "1"]}})
    say(S, atan(y), "atan(y)", "arctan(y)", "arctan y", "\\arctan y", "tan^-1 y", "\\tan^{-1}y", "tan^{-1}(y)", why="inverse tangent")
    say(S, ln(1 + x**2), "ln(1+x^2)", "log(1+x²)", "\\ln(1+x^2)", "\\log\\left(1+x^2\\right)", "ln(x^2+1)", why="natural logarithm")
    say(S, 1 / cos(th), "sec(theta)", "sec θ", "\\sec\\theta", "1/cos θ", "\\frac{1}{\\cos\\theta}", "(cos θ)^-1", "cos(θ)^(-1)", why="secant and the inverse of a cosine")
    z = sym("z")
    cz = {"z": "complex"}
    say(S, conj(z), "conj(z)", "\\overline{z}", "z^*", "\\overline z", "Re(z) - i Im(z)", why="conjugation", symbols=cz, proof="z* = Re z - i Im z")
    say(S, absv(z) ** 2, "|z|^2", "|z|²", "abs(z)^2", "z z^*", "z^* z", "z*conj(z)", "\\overline{z}z", "\\left|z\\right|^2", "\\left|z\\right|^{2}", "Re(z)^2+Im(z)^2", why="modulus squared", symbols=cz)
    say(S, x / (2 * y), "x/(2y)", "\\frac{x}{2y}", "x/2/y", "½x/y", "(x/2)/y", "x/(2*y)", "\\frac{x/2}{y}", why="quotients", symbols={"x": "real", "y": "positive"})
    say(S, x * y / 2, "x y/2", "xy/2", "x/2 y", "x/2*y", "x/2·y", "1/2 xy", "1/2*x*y", "\\frac{xy}{2}", "\\frac12xy", "½xy", why="products after a slash go left to right")
    say(S, q(1, 1000) * x, "1e-3 x", "1e-3*x", "10^-3 x", "10^{-3}x", "1×10^-3 x", "0.001x", "x/1000", "1\\cdot10^{-3}\\,x", why="small numbers")
    say(S, a * b, "ab", "a b", "a*b", "a·b", "ba", "a\\,b", "a \\cdot b", "a\\times b", "(a)(b)", "a(b)", why="products of letters")
    say(S, i * x, "ix", "i x", "i*x", "xi", "x i", "\\mathrm{i}x", "\\mathrm{i} x", why="the imaginary unit beside a letter")
    say(S, pi * x / 2, "pi x/2", "πx/2", "\\pi x/2", "\\frac{\\pi}{2}x", "π/2 x", "½πx", "pi/2*x", "\\frac{\\pi x}2", why="pi")
    say(S, cos(x) * hbar / 2, "ħ/2 cos x", "ħ/2 cos(x)", "\\frac{\\hbar}{2}\\cos x", "(ħ/2)cos(x)", "cos(x) ħ/2", "½ħcos(x)", "½ħ cos x", "hbar cos(x)/2", why="a function after a quotient")
    say(S, 1 - 2 * sin(x) ** 2, "1-2sin²x", "1 - 2 sin^2 x", "1-2\\sin^2 x", "cos 2x", "\\cos 2x", "\\cos(2x)", "cos²x − sin²x", "\\cos^2x-\\sin^2x", why="a bare function in a sum")
    say(S, (1 + cos(w * tt)) / 2, "(1+cos ωt)/2", "\\frac{1+\\cos\\omega t}{2}", "½(1+cos(ωt))", "1/2 (1 + cos(ωt))", "1/2+1/2 cos(ωt)", "\\frac{1}{2}\\left(1+\\cos(\\omega t)\\right)", "cos²(ωt/2)", "\\cos^2\\frac{\\omega t}{2}", "\\cos^2(\\omega t/2)", "cos(omega t/2)^2", "P = cos²(ωt/2)", why="a probability")
    O = "operator"
    say(O, Sx, "Sx", "S_x", "\\hat{S}_x", "\\hat S_x", "ħ/2 σ_x", "ħ/2 σx", "hbar/2 sigma_x", "\\frac{\\hbar}{2}\\sigma_x", "½ħσ_x", "ħσ₁/2", "\\tfrac{\\hbar}{2}\\hat{\\sigma}_1", "hbar*sigma_1/2", "ħ/2 [[0,1],[1,0]]", "\\frac{\\hbar}{2}\\begin{pmatrix}0&1\\\\1&0\\end{pmatrix}", "[0, ħ/2; ħ/2, 0]", "[[0,hbar/2],[hbar/2,0]]", "\\begin{bmatrix}0&\\hbar/2\\\\\\hbar/2&0\\end{bmatrix}", "\\begin{pmatrix}0 & \\frac{\\hbar}{2} \\\\ \\frac{\\hbar}{2} & 0\\end{pmatrix}", "\\left(\\begin{array}{cc}0&\\hbar/2\\\\ \\hbar/2&0\\end{array}\\right)", "(S_+ + S_-)/2", "½(S₊ + S₋)", "\\frac{1}{2}(S_++S_-)", "ħ/2 (|+><-| + |-><+|)", "ħ/2 (|↑⟩⟨↓| + |↓⟩⟨↑|)", "\\frac{\\hbar}{2}\\left(|+\\rangle\\langle-| + |-\\rangle\\langle+|\\right)", "\\frac\\hbar2(\\ket{+}\\bra{-}+\\ket{-}\\bra{+})", "S_x = ħ/2 σ_x", "hbar/2 (|up><down| + |down><up|)", "ħ/2 (|0><1|+|1><0|)", why="S_x")
    say(O, i * hbar * Sz, "iħS_z", "iħSz", "i hbar S_z", "i\\hbar S_z", "i\\hbar\\hat{S}_z", "i*hbar*Sz", "[S_x, S_y] = iħS_z", "\\frac{i\\hbar^2}{2}\\begin{pmatrix}1&0\\\\0&-1\\end{pmatrix}", "\\frac{i\\hbar^2}{2}\\sigma_z", "iħ²/2 σ_z", "½iħ²σz", "S_xS_y - S_yS_x", "SxSy − SySx", "2S_xS_y", "[Sx,Sy]", "\\left[\\hat{S}_x,\\hat{S}_y\\right]", "-[S_y,S_x]", "(iħ²/2) [1, 0; 0, -1]", "[[iħ²/2, 0], [0, −iħ²/2]]", "$i\\hbar S_z$", "\\mathrm{i}\\hbar S_{z}", "S_z i ħ", why="the commutator of S_x and S_y")
    say(O, one, "I", "𝟙", "1", "σ_0", "\\mathbb{1}", "\\mathbb{I}", "\\mathbf{1}", "[[1,0],[0,1]]", "σ_x²", "sigma_x^2", "\\sigma_y^2", "σ_zσ_z", "|+><+| + |-><-|", "|↑⟩⟨↑| + |↓⟩⟨↓|", "\\begin{smallmatrix}1&0\\\\0&1\\end{smallmatrix}", "\\begin{matrix}1&0\\\\0&1\\end{matrix}", "{σ_x, σ_x}/2", "\\frac12\\{\\sigma_x,\\sigma_x\\}", why="the identity")
    say(O, comm(comm(Sx, Sy), Sz), "[[S_x,S_y],S_z]", "[[Sx, Sy], Sz]", "0", "[[0,0],[0,0]]", "[iħS_z, S_z]", why="nested brackets are a commutator")
    say(O, acomm(sx, sx), "{σ_x, σ_x}", "\\{\\sigma_x, \\sigma_x\\}", "2", "2I", "2\\mathbb{1}", "2𝟙", "2σ_x²", "{sigma_x,sigma_x}", why="anticommutator")
    say(O, dag(Sp), "S_+^†", "S_+^dagger", "S_+^\\dagger", "S₊†", "(S_+)^†", "S_-", "S₋", "(S_x + iS_y)^†", "(Sx + i Sy)^dagger", "\\left(S_x+iS_y\\right)^\\dagger", "S_x - iS_y", "ħ|-><+|", "\\hbar|-\\rangle\\langle+|", why="adjoint of a ladder operator")
    say(O, exp(-(i * th * sx / 2)), "exp(-i*theta*sigma_x/2)", "e^{-iθσ_x/2}", "e^(-iθσ_x/2)", "\\exp(-i\\theta\\sigma_x/2)", "e^{-i\\theta\\sigma_x/2}", "\\exp\\left(-\\frac{i\\theta}{2}\\sigma_x\\right)", "\\mathrm{e}^{-\\mathrm{i}\\theta\\sigma_x/2}", "e^{-iθS_x/ħ}", "\\cos\\frac{\\theta}{2}\\,\\mathbb{1} - i\\sin\\frac{\\theta}{2}\\,\\sigma_x", "cos(θ/2) − i sin(θ/2) σ_x", "cos(θ/2) I - i σ_x sin(θ/2)", "[[cos(θ/2), -i sin(θ/2)], [-i sin(θ/2), cos(θ/2)]]", "\\begin{pmatrix}\\cos\\frac{\\theta}{2} & -i\\sin\\frac{\\theta}{2}\\\\ -i\\sin\\frac{\\theta}{2} & \\cos\\frac{\\theta}{2}\\end{pmatrix}", "[cos θ/2, -i sin θ/2; -i sin θ/2, cos θ/2]", "(e^{iθσ_x/2})^{-1}", "exp(iθσ_x/2)^†", why="a rotation")
    say(O, ket("+x") * bra("+x"), "|+x><+x|", "|+x⟩⟨+x|", "|+x\\rangle\\langle+x|", "\\ket{+x}\\bra{+x}", "½(1+σ_x)", "\\frac{1}{2}(\\mathbb{1}+\\sigma_x)", "(I + sigma_x)/2", "1/2 [[1,1],[1,1]]", "½[1,1;1,1]", "\\frac12\\begin{pmatrix}1&1\\\\1&1\\end{pmatrix}", "(|+>+|->)(<+|+<-|)/2", "½(|+⟩+|−⟩)(⟨+|+⟨−|)", why="a projector")
    say(O, tr(mat(1, i, 2, 3)), "[[1,i],[2,3]]^T", "[[1,2],[i,3]]", "[1, 2; i, 3]", "\\begin{pmatrix}1&i\\\\2&3\\end{pmatrix}^T", why="transpose")
    say(O, inv(mat(1, 2, 3, 4)), "[[1,2],[3,4]]^-1", "[[1,2],[3,4]]^{-1}", "\\begin{pmatrix}1&2\\\\3&4\\end{pmatrix}^{-1}", "[[-2, 1], [3/2, -1/2]]", "-1/2 [[4,-2],[-3,1]]", "[-2, 1; 1.5, -0.5]", why="inverse")
    say(O, sx * sy * sz, "σ_xσ_yσ_z", "σxσyσz", "sigma_x sigma_y sigma_z", "\\sigma_x\\sigma_y\\sigma_z", "\\sigma_1\\sigma_2\\sigma_3", "σ₁σ₂σ₃", "i", "iI", "i\\mathbb{1}", "i𝟙", "sigma_1*sigma_2*sigma_3", why="a product")
    K = "state"
    say(K, ket("+x"), "|+x>", "|+x⟩", "\\ket{+x}", "|+x\\rangle", "(|+> + |->)/sqrt(2)", "(|+⟩+|−⟩)/√2", "1/√2 (|+> + |->)", "1/√2(|+⟩ + |−⟩)", "\\frac{1}{\\sqrt{2}}(|+\\rangle+|-\\rangle)", "\\frac{1}{\\sqrt2}\\left(|\\uparrow\\rangle + |\\downarrow\\rangle\\right)", "(|up> + |down>)/sqrt(2)", "(|↑⟩+|↓⟩)/√2", "(|0>+|1>)/√2", "\\frac{\\ket{0}+\\ket{1}}{\\sqrt{2}}", "(1,1)/√2", "1/sqrt(2) (1, 1)", "[1/√2, 1/√2]", "[1, 1]^T/√2", "\\frac{1}{\\sqrt{2}}\\begin{pmatrix}1\\\\1\\end{pmatrix}", "[[1],[1]]/sqrt(2)", "[1; 1]/√2", "|+>/√2 + |->/√2", "(1/√2)|+> + (1/√2)|->", "√½ |+> + √½ |->", "(|+z> + |-z>)/√2", "√2/2 (1, 1)", "2^(-1/2) (|+> + |->)", why="eigenstate of S_x")
    say(K, ket("+y"), "|+y>", "(|+> + i|->)/√2", "(|+⟩ + i|−⟩)/√2", "\\frac{1}{\\sqrt{2}}\\left(|+\\rangle + i|-\\rangle\\right)", "1/√2 (1, i)", "(1, i)/sqrt(2)", "\\frac{1}{\\sqrt{2}}\\begin{pmatrix}1\\\\i\\end{pmatrix}", "[1/√2; i/√2]", "\\begin{pmatrix} \\frac{1}{\\sqrt{2}} \\\\ \\frac{i}{\\sqrt{2}} \\end{pmatrix}", "(|↑⟩ + i |↓⟩)/√2", "|+>/sqrt(2) + i|->/sqrt(2)", why="eigenstate of S_y")
    say(K, col(cos(th / 2), exp(i * ph) * sin(th / 2)), "cos(θ/2)|+> + e^{iφ} sin(θ/2)|->", "cos θ/2 |+> + e^{iφ} sin θ/2 |->", "\\cos\\frac{\\theta}{2}|+\\rangle + e^{i\\phi}\\sin\\frac{\\theta}{2}|-\\rangle", "\\cos(\\theta/2)\\ket{+}+\\mathrm{e}^{\\mathrm{i}\\varphi}\\sin(\\theta/2)\\ket{-}", "(cos(θ/2), e^{iφ} sin(θ/2))", "[cos(theta/2), exp(i*phi)*sin(theta/2)]", "\\begin{pmatrix}\\cos\\frac{\\theta}{2}\\\\e^{i\\phi}\\sin\\frac{\\theta}{2}\\end{pmatrix}", "cos(θ/2)|↑⟩ + sin(θ/2)e^{iφ}|↓⟩", "[[cos(θ/2)], [sin(θ/2) e^(iφ)]]", "cos(theta/2)|up> + exp(i phi) sin(theta/2)|down>", why="spin up along a direction")
    say(K, Sp * ket("-"), "S_+|->", "S₊|−⟩", "\\hat{S}_+|-\\rangle", "ħ|+>", "\\hbar\\ket{+}", "(ħ, 0)", "ħ(1,0)", "(S_x + iS_y)|->", why="ladder operator on a ket")
    say(S, bra("+") * Sx * ket("-"), "<+|S_x|->", "⟨+|S_x|−⟩", "\\langle+|S_x|-\\rangle", "\\bra{+}S_x\\ket{-}", "ħ/2", "<+|(ħ/2 σ_x)|->", "⟨↑|S_x|↓⟩", "<up|Sx|down>", "\\langle\\uparrow|\\hat{S}_x|\\downarrow\\rangle", "<0|S_x|1>", why="a matrix element")
    say(S, absv(bra("+") * Sx * ket("-")) ** 2, "|<+|S_x|->|^2", "|⟨+|S_x|−⟩|²", "abs(<+|S_x|->)^2", "ħ²/4", "hbar^2/4", "\\left|\\langle+|S_x|-\\rangle\\right|^2", "(ħ/2)²", "<-|S_x|+><+|S_x|->", why="the modulus of a matrix element, squared")
    say(S, absv(bra("+x") * ket("+")) ** 2, "|<+x|+>|^2", "|⟨+x|+⟩|²", "1/2", "½", "\\frac12", "0.5", "\\left|\\langle+x|+\\rangle\\right|^2", "|1/√2|^2", "<+x|+><+|+x>", why="a probability")
    V = "vector"
    say(V, vec(sin(th), 0, cos(th)), "(sin θ, 0, cos θ)", "(sin(theta), 0, cos(theta))", "(\\sin\\theta, 0, \\cos\\theta)", "\\left(\\sin\\theta,\\,0,\\,\\cos\\theta\\right)", "(2 sin θ/2 cos θ/2, 0, cos θ)", "n = (sin θ, 0, cos θ)", why="a direction")
    say("pauli", vec(a0, a1, 0, b), "(a_0, a_1, 0, b)", "(a0, a1, 0, b)", "(a₀, a₁, 0, b)", "\\left(a_0, a_1, 0, b\\right)", "a_0 I + a_1 σ_x + b σ_z", "a0 + a1 σx + bσz", "[[a0+b, a1],[a1, a0-b]]", "\\begin{pmatrix}a_0+b&a_1\\\\a_1&a_0-b\\end{pmatrix}", "a_0\\mathbb{1}+a_1\\sigma_x+b\\sigma_z", why="Pauli coefficients")
    E = "eigenvalues"
    say(E, values(a + b, a - b), "a ± b", "a±b", "a +- b", "a \\pm b", "{a+b, a-b}", "a+b, a-b", "\\{a+b,\\,a-b\\}", "E_± = a ± b", "E_\\pm = a \\pm b", "\\lambda_{1,2} = a \\pm b", "\\lambda_\\pm=a\\pm b", "E_+ = a + b, E_- = a - b", "a ∓ b", "a \\mp b", "$a\\pm b$", "\\left\\{a+b, a-b\\right\\}", "(2a ± 2b)/2", "a ± |b|", why="plus-minus")
    G = "eigenpairs"
    say(G, pairs(hbar / 2, ket("+x"), -(hbar / 2), ket("-x")), "ħ/2: |+x>; -ħ/2: |-x>", "hbar/2: (1,1)/sqrt(2); -hbar/2: (1,-1)/sqrt(2)", "-ħ/2: (|+> - |->)/√2; ħ/2: (|+> + |->)/√2", "\\frac{\\hbar}{2}: \\ket{+x}; -\\frac{\\hbar}{2}: \\ket{-x}", "½ħ: [1; 1]; −½ħ: [1; −1]", why="eigenpairs")
    e_sym = {"e": "positive", "B": "positive", "m": "positive", "t": "real"}
    e = sym("e")
    say(S, e * B * tt / m, "e B t/m", "eBt/m", "\\frac{eBt}{m}", "\\frac{e B}{m} t", "e*B*t/m", "(e/m)Bt", why="e is declared as a charge", symbols=e_sym)
    say(S, exp(i * e * B * tt / m), "exp(i e B t/m)", "\\mathrm{e}^{i e B t/m}", "\\exp\\left(\\frac{ieBt}{m}\\right)", "cos(eBt/m) + i sin(eBt/m)", why="e is declared as a charge: Euler is exp", symbols=e_sym)
    w_p = {"x": "real", "x'": "real"}
    xp = sym("x'")
    say(S, x + xp, "x + x'", "x'+x", "x' + x", why="a prime belongs to a declared name", symbols=w_p)
    return t


def topics():
    return [spellings()]
