package org.pofk.formula;

import java.util.List;
import java.util.Optional;

/** Names in LaTeX mathematics: one letter in italics, Greek letters by command, words upright, all else as text. */
final class LatexNames {
    private static final String GREEK = "αβγδεζηθικλμνξπρστυφχψωΓΔΘΛΞΠΣΥΦΨΩ";
    private static final List<String> COMMANDS = List.of("alpha", "beta", "gamma", "delta", "varepsilon", "zeta", "eta",
            "theta", "iota", "kappa", "lambda", "mu", "nu", "xi", "pi", "rho", "sigma", "tau", "upsilon", "varphi",
            "chi", "psi", "omega", "Gamma", "Delta", "Theta", "Lambda", "Xi", "Pi", "Sigma", "Upsilon", "Phi", "Psi", "Omega");

    private LatexNames() {
    }

    /** The letter of a command. */
    static Optional<String> letter(String command) {
        int index = COMMANDS.indexOf(command);
        return index < 0 ? Optional.empty() : Optional.of(GREEK.substring(index, index + 1));
    }

    static boolean isGreek(int c) {
        return GREEK.indexOf(c) >= 0;
    }

    /** The commands for Greek letters. */
    static List<String> commands() {
        return COMMANDS;
    }

    /**
     * A name as it is set. One that reads as a constant, e or i or π, is marked as a name, which is seen only where the
     * text is read again.
     */
    static String write(String name) {
        if (name.equals("e") || name.equals("i")) {
            return "\\mathit{" + name + "}";
        }
        if (name.equals("π")) {
            return "\\mathit{\\pi}";
        }
        if (name.length() == 1 && GREEK.contains(name)) {
            return "\\" + COMMANDS.get(GREEK.indexOf(name));
        }
        if (name.matches("[A-Za-z]")) {
            return name;
        }
        return name.matches("[A-Za-z0-9]+") ? "\\mathrm{" + name + "}" : "\\text{" + LatexText.of(name) + "}";
    }
}
