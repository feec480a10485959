"""Spellings of names in ASCII, Unicode and LaTeX."""

GREEK = {
    "alpha": "α", "beta": "β", "gamma": "γ", "delta": "δ", "Delta": "Δ", "epsilon": "ε", "theta": "θ", "lambda": "λ", "mu": "μ",
    "phi": "φ", "psi": "ψ", "omega": "ω", "Omega": "Ω", "tau": "τ", "chi": "χ", "eta": "η", "kappa": "κ", "nu": "ν", "xi": "ξ", "rho": "ρ",
}
VARIANTS = {"phi": [r"\varphi", "ϕ"], "epsilon": [r"\varepsilon", "ϵ"], "mu": ["µ"], "theta": [r"\vartheta"]}
DIGITS = str.maketrans("0123456789", "₀₁₂₃₄₅₆₇₈₉")
RAISED = {2: "²", 3: "³", 4: "⁴"}
VULGAR = {(1, 2): "½", (1, 4): "¼", (3, 4): "¾", (1, 3): "⅓", (2, 3): "⅔"}

OPS = {
    "ascii": {
        "sx": ["sigma_x", "sigma_1", "sigma_x"], "sy": ["sigma_y", "sigma_2", "sigma_y"], "sz": ["sigma_z", "sigma_3", "sigma_z"],
        "Sx": ["S_x", "Sx"], "Sy": ["S_y", "Sy"], "Sz": ["S_z", "Sz"], "Sp": ["S_+"], "Sm": ["S_-"],
        "sp": ["sigma_+"], "sm": ["sigma_-"], "one": ["I", "sigma_0"],
    },
    "uni": {
        "sx": ["σ_x", "σx", "σ₁"], "sy": ["σ_y", "σy", "σ₂"], "sz": ["σ_z", "σz", "σ₃"], "Sx": ["S_x", "Sx"], "Sy": ["S_y", "Sy"],
        "Sz": ["S_z", "Sz"], "Sp": ["S₊", "S_+"], "Sm": ["S₋", "S_−"], "sp": ["σ_+", "σ₊"], "sm": ["σ_-", "σ₋"], "one": ["𝟙", "I", "σ_0", "σ₀"],
    },
    "tex": {
        **{"s" + c: [rf"\sigma_{c}", rf"\sigma_{{{c}}}", rf"\sigma_{d}", rf"\hat\sigma_{c}", rf"\hat{{\sigma}}_{d}", rf"\hat{{\sigma}}_{c}"] for c, d in zip("xyz", "123")},
        **{"S" + c: [rf"S_{c}", rf"S_{{{c}}}", rf"\hat{{S}}_{c}", rf"\hat S_{c}"] for c in "xyz"},
        "Sp": ["S_+", "S_{+}", r"\hat{S}_+"], "Sm": ["S_-", "S_{-}", r"\hat{S}_-"], "sp": [r"\sigma_+"], "sm": [r"\sigma_-"],
        "one": [r"\mathbb{1}", r"\mathbb{I}", "I", r"\mathbf{1}", r"\sigma_0"],
    },
}

LABELS = {
    "ascii": {"+": ["+", "+z", "up", "0", "+"], "-": ["-", "-z", "down", "1", "-"], "+x": ["+x"], "-x": ["-x"], "+y": ["+y"], "-y": ["-y"]},
    "uni": {"+": ["+", "↑", "0"], "-": ["−", "↓", "1", "-"], "+x": ["+x"], "-x": ["-x", "−x"], "+y": ["+y"], "-y": ["-y", "−y"]},
    "tex": {"+": ["+", r"\uparrow", "0"], "-": ["-", r"\downarrow", "1"], "+x": ["+x"], "-x": ["-x"], "+y": ["+y"], "-y": ["-y"]},
}


def symbol_text(name, mode, rng):
    """One spelling of a declared name."""
    base, _, sub = name.partition("_")
    if mode == "ascii":
        head = base
        if sub and len(base) == 1 and sub.isdigit() and rng.random() < 0.3:
            return base + sub
    elif mode == "uni":
        head = GREEK.get(base, base)
        if base in VARIANTS and rng.random() < 0.15:
            head = VARIANTS[base][-1] if not VARIANTS[base][-1].startswith("\\") else head
        if sub and sub.isdigit() and rng.random() < 0.6:
            return head + sub.translate(DIGITS)
    else:
        head = "\\" + base if base in GREEK else base
        if base in VARIANTS and rng.random() < 0.2:
            head = VARIANTS[base][0]
        if sub and rng.random() < 0.5:
            return f"{head}_{{{sub}}}"
    return f"{head}_{sub}" if sub else head
