package sill.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import sill.words.Quoted;
import sill.worksheet.Problem;

/** A name is used only after it is declared, and settled when its cell ends. */
final class OrderRules {
    private OrderRules() {}

    /** The uses that break these rules, each a problem of its cell. */
    static List<Problem> problems(Names names, List<Usage> usages) {
        Map<String, Names.Declaration> declarations = names.declarations();
        List<Problem> problems = new ArrayList<>();
        for (Usage usage : usages) {
            Names.Declaration declared = declarations.get(usage.name());
            if (declared == null
                    || declared.kind() == Names.Kind.LOST
                    || usage.name().startsWith("$")) {
                continue;
            }
            int cell = usage.piece().cell();
            if (declared.cell() < cell) {
                if (usage.how() == Usage.How.ASSIGNED) {
                    problems.add(problem(
                            usage,
                            "assigned, expected it to stay as it is; it is the " + declared.where(),
                            "Give the new value a name of its own."));
                }
            } else if (declared.cell() > cell || isTooEarly(usage, declared)) {
                problems.add(problem(
                        usage,
                        "before its declaration; it is the " + declared.where(),
                        "Move the declaration above its first use."));
            }
        }
        return problems;
    }

    /** Within its own cell a method or type may be used anywhere, as in a class; a value only behind its declaration. */
    private static boolean isTooEarly(Usage usage, Names.Declaration declared) {
        if (declared.isMember() || declared.kind() == Names.Kind.GIVEN) {
            return false;
        }
        if (usage.offset() < declared.offset()) {
            return true;
        }
        // Its own initialiser may mention it only where the text runs later: a lambda that calls itself.
        return usage.how() == Usage.How.READ
                && !usage.deferred()
                && declared.snippet().variables().stream()
                        .anyMatch(variable -> variable.name().equals(usage.name())
                                && usage.offset() >= variable.initialiser().start()
                                && usage.offset() < variable.initialiser().end());
    }

    private static Problem problem(Usage usage, String message, String hint) {
        Place place = usage.piece().place(usage.offset());
        return Problem.error(
                place.line(),
                place.column(),
                usage.piece().cell(),
                usage.piece().where() + ": found " + Quoted.of(usage.name()) + " " + message,
                hint);
    }
}
