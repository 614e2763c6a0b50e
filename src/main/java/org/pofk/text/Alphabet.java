package org.pofk.text;

import java.util.Map;

/** The characters that output may use. */
public enum Alphabet {
    /** Everything: −, ·, √, π. */
    UNICODE {
        @Override
        public String write(String text) {
            return text;
        }
    },
    /**
     * For screens that show nothing else: signs and Greek letters standing alone are written in ASCII. Letters inside
     * names that users gave stay as they are, so that no two names become one.
     */
    ASCII {
        @Override
        public String write(String text) {
            return transliterated(text);
        }
    };

    private static final Map<Integer, String> SIGNS = Map.ofEntries(
            sign('−', "-"), sign('–', "-"), sign('—', "--"), sign('·', "*"), sign('×', "x"), sign('⋅', "*"),
            sign('√', "sqrt"), sign('Σ', "sum"), sign('∑', "sum"), sign('∏', "product"), sign('°', " deg"),
            sign('≤', "<="), sign('≥', ">="), sign('≠', "!="), sign('≈', "~"), sign('≡', "=="), sign('±', "+/-"),
            sign('∞', "infinity"), sign('→', "->"), sign('←', "<-"), sign('↔', "<->"), sign('…', "..."),
            sign('“', "\""), sign('”', "\""), sign('„', "\""), sign('‘', "'"), sign('’', "'"), sign('•', "*"),
            sign('²', "^2"), sign('³', "^3"), sign('¹', "^1"), sign('⁰', "^0"), sign('⁻', "^-"), sign('½', "1/2"),
            sign('\u00a0', " "), sign('\u2009', " "), sign('\u202f', " "), sign('ᵀ', "^T"), sign('∈', "in"),
            sign('✓', "ok"), sign('✗', "x"), sign('⟨', "<"), sign('⟩', ">"), sign('║', "|"), sign('│', "|"),
            sign('─', "-"), sign('∂', "d"), sign('§', "section "));
    private static final Map<Integer, String> GREEK = Map.ofEntries(
            sign('α', "alpha"), sign('β', "beta"), sign('γ', "gamma"), sign('δ', "delta"), sign('ε', "epsilon"),
            sign('ζ', "zeta"), sign('η', "eta"), sign('θ', "theta"), sign('ι', "iota"), sign('κ', "kappa"),
            sign('λ', "lambda"), sign('μ', "mu"), sign('ν', "nu"), sign('ξ', "xi"), sign('π', "pi"),
            sign('ρ', "rho"), sign('σ', "sigma"), sign('τ', "tau"), sign('υ', "upsilon"), sign('φ', "phi"),
            sign('χ', "chi"), sign('ψ', "psi"), sign('ω', "omega"), sign('Γ', "Gamma"), sign('Δ', "Delta"),
            sign('Θ', "Theta"), sign('Λ', "Lambda"), sign('Ξ', "Xi"), sign('Π', "Pi"), sign('Φ', "Phi"),
            sign('Ψ', "Psi"), sign('Ω', "Omega"));

    /** The text in this alphabet. */
    public abstract String write(String text);

    private static Map.Entry<Integer, String> sign(char sign, String ascii) {
        return Map.entry((int) sign, ascii);
    }

    private static String transliterated(String text) {
        StringBuilder ascii = new StringBuilder();
        int before = ' ';
        int c;
        for (int i = 0; i < text.length(); i += Character.charCount(c)) {
            c = text.codePointAt(i);
            int behind = i + Character.charCount(c);
            boolean alone = !partOfWord(before) && (behind >= text.length() || !partOfWord(text.codePointAt(behind)));
            ascii.append(SIGNS.getOrDefault(c, alone && GREEK.containsKey(c) ? GREEK.get(c) : Character.toString(c)));
            before = c;
        }
        return ascii.toString();
    }

    private static boolean partOfWord(int c) {
        return Character.isLetter(c) || c == '_';
    }
}
