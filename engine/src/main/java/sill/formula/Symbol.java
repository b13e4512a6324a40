package sill.formula;

import java.util.Map;

/**
 * A name as a symbol: a letter or word, with an index made from what follows its first part in camel case or behind an
 * underscore. Greek letters are written as such.
 *
 * @param base a letter or a word
 * @param index empty for none
 */
record Symbol(String base, String index) {
    private static final Map<String, String> GREEK = Map.ofEntries(
            Map.entry("alpha", "α"),
            Map.entry("beta", "β"),
            Map.entry("gamma", "γ"),
            Map.entry("delta", "δ"),
            Map.entry("epsilon", "ε"),
            Map.entry("zeta", "ζ"),
            Map.entry("eta", "η"),
            Map.entry("theta", "θ"),
            Map.entry("iota", "ι"),
            Map.entry("kappa", "κ"),
            Map.entry("lambda", "λ"),
            Map.entry("mu", "μ"),
            Map.entry("nu", "ν"),
            Map.entry("xi", "ξ"),
            Map.entry("pi", "π"),
            Map.entry("rho", "ρ"),
            Map.entry("sigma", "σ"),
            Map.entry("tau", "τ"),
            Map.entry("upsilon", "υ"),
            Map.entry("phi", "φ"),
            Map.entry("chi", "χ"),
            Map.entry("psi", "ψ"),
            Map.entry("omega", "ω"),
            Map.entry("Gamma", "Γ"),
            Map.entry("Delta", "Δ"),
            Map.entry("Theta", "Θ"),
            Map.entry("Lambda", "Λ"),
            Map.entry("Xi", "Ξ"),
            Map.entry("Pi", "Π"),
            Map.entry("Sigma", "Σ"),
            Map.entry("Phi", "Φ"),
            Map.entry("Psi", "Ψ"),
            Map.entry("Omega", "Ω"));

    /** The symbol of a Java name. */
    static Symbol of(String name) {
        int end = firstPart(name);
        String first = name.substring(0, end);
        String rest = name.substring(name.startsWith("_", end) ? end + 1 : end);
        if (first.isEmpty() || rest.isEmpty() && end < name.length()) {
            // A name that starts or ends with an underscore keeps it: it would be another's symbol without.
            return new Symbol(name, "");
        }
        return new Symbol(GREEK.getOrDefault(first, first), index(rest));
    }

    /** Whether it is more than one letter. */
    boolean isWord() {
        return base.codePointCount(0, base.length()) > 1;
    }

    /** The end of the first part: where the case rises, a digit or an underscore stands. */
    private static int firstPart(String name) {
        if (name.isEmpty() || !Character.isLetter(name.charAt(0))) {
            return 0;
        }
        int end = 1;
        if (Character.isUpperCase(name.charAt(0)) && end < name.length() && Character.isUpperCase(name.charAt(1))) {
            boolean humps = name.length() > 2 && Character.isLowerCase(name.charAt(2));
            // VRef is a V with an index, VCC an abbreviation.
            while (!humps && end < name.length() && Character.isUpperCase(name.charAt(end))) {
                end++;
            }
            return end;
        }
        while (end < name.length()
                && Character.isLetter(name.charAt(end))
                && !Character.isUpperCase(name.charAt(end))) {
            end++;
        }
        return end;
    }

    private static String index(String rest) {
        if (rest.length() > 1 && Character.isUpperCase(rest.charAt(0))) {
            String letter = GREEK.get(Character.toLowerCase(rest.charAt(0)) + rest.substring(1));
            if (letter != null) {
                return letter;
            }
        }
        return GREEK.getOrDefault(rest, rest);
    }
}
