package sill.trace;

import java.util.List;

/**
 * One given, result, plot or check.
 *
 * @param kind what it is
 * @param at its address
 * @param name the name others use it by; empty when it has none
 * @param label what a reader knows it by: the name, a check's text, a bare expression; never empty
 * @param shown its value or verdict in brief; may be empty
 * @param uses names it is made from directly
 * @param dependsOn all names it rests on, down to the givens
 */
public record TraceNode(
        TraceKind kind, String at, String name, String label, String shown, List<String> uses, List<String> dependsOn) {
    public TraceNode {
        uses = List.copyOf(uses);
        dependsOn = List.copyOf(dependsOn);
    }
}
