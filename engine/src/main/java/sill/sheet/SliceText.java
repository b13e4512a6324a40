package sill.sheet;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** Writes the class of a slice. */
final class SliceText {
    /** The class's name; a worksheet can't declare it by accident. */
    static final String NAME = "$Slice";

    private final Program program;
    private final Map<String, String> types;
    private final SlicePlan plan;
    private final Map<String, Snippet> targets;
    private final List<Slice.Output> outputs;
    private final List<String> varied;
    private final List<String> held = new ArrayList<>();
    private final StringBuilder text = new StringBuilder();

    /** @param targets the expressions that are studied, by their fields in the sheet's class */
    SliceText(
            Program program,
            Map<String, String> types,
            SlicePlan plan,
            Map<String, Snippet> targets,
            List<Slice.Output> outputs,
            List<String> varied) {
        this.program = program;
        this.types = types;
        this.plan = plan;
        this.targets = targets;
        this.outputs = outputs;
        this.varied = varied;
    }

    /** Givens that the slice reads and that do not vary; known once the unit is written. */
    List<String> held() {
        return held;
    }

    /** The compilation unit. */
    String unit() {
        Translation.IMPORTS.forEach(name -> add("import ", name, ";\n"));
        program.imports().forEach(snippet -> add(of(snippet, snippet.span()), snippet.isWhole() ? "\n" : ";\n"));
        add("public class ", NAME, " implements java.util.function.BiConsumer<double[], double[]> {\n");
        fields();
        plan.members().forEach(member -> add(member.isStatic() ? "" : "static ", of(member, member.span()), "\n"));
        add("""
                public void accept(double[] $in, double[] $out) {
                try { $run($in, $out); }
                catch (RuntimeException | Error $thrown) { throw $thrown; }
                catch (Throwable $thrown) { throw new java.lang.reflect.UndeclaredThrowableException($thrown); }
                }
                private static void $run(double[] $in, double[] $out) throws Throwable {
                """);
        for (int i = 0; i < varied.size(); i++) {
            add(plan.isField(varied.get(i)) ? "" : "double ", varied.get(i), " = $in[", String.valueOf(i), "];\n");
        }
        plan.statements().forEach(this::statement);
        outputs();
        return add("}\n}\n").toString();
    }

    private void fields() {
        Set<String> names = new HashSet<>();
        for (SheetSource.GivenField given : program.presentGivens()) {
            boolean varies = varied.contains(given.name());
            if (varies ? plan.isField(given.name()) : plan.isMentioned(given.name())) {
                add("public static ", given.type().java(), " ", given.name(), ";\n");
                names.add(given.name());
                if (!varies) {
                    held.add(given.name());
                }
            }
        }
        for (Program.CellCode cell : program.cells()) {
            for (Program.Field field : cell.fields()) {
                boolean wanted = plan.isNeeded(field.field()) || plan.isMentioned(field.field());
                if (!field.isBare() && wanted && plan.isField(field.field()) && names.add(field.field())) {
                    add("static ", type(field.field(), field.type()), " ", field.field(), ";\n");
                }
            }
        }
    }

    private void statement(Snippet snippet) {
        switch (snippet.kind()) {
            case VARIABLES ->
                snippet.variables().stream()
                        .filter(variable -> plan.isNeeded(variable.name()))
                        .forEach(variable -> variable(snippet, variable));
            case CALL -> add(of(snippet, snippet.expression()), ";\n");
            case STATEMENT -> add(of(snippet, snippet.span()), snippet.isWhole() ? "\n" : ";\n");
            default -> {
                // A bare expression that is no statement changes nothing.
            }
        }
    }

    private void variable(Snippet snippet, Snippet.Variable variable) {
        String type = type(variable.name(), variable.type());
        add(plan.isField(variable.name()) ? "" : type + " ", variable.name(), " = ");
        if (variable.arrayInitialiser()) {
            add("new ", type);
        }
        add(variable.hasInitialiser() ? of(snippet, variable.initialiser()) : initial(type), ";\n");
    }

    /** What a field without a value of its own holds; each repetition is to start from it. */
    private static String initial(String type) {
        return switch (type) {
            case "boolean" -> "false";
            case "byte", "short", "int", "long", "char", "float", "double" -> "(" + type + ") 0";
            default -> "null";
        };
    }

    private void outputs() {
        int at = 0;
        for (Slice.Output output : outputs) {
            Snippet target = targets.get(output.field());
            String expression = of(target, target.expression());
            if (output.components().isEmpty()) {
                add("$out[", String.valueOf(at++), "] = ", expression, ";\n");
            } else {
                add("{ var $record = ", expression, ";\n");
                for (String component : output.components()) {
                    add("$out[", String.valueOf(at++), "] = $record.", component, "();\n");
                }
                add("}\n");
            }
        }
    }

    private String type(String field, String written) {
        return written.equals(Snippet.OPEN) ? types.getOrDefault(field, written) : written;
    }

    private static String of(Snippet snippet, Span span) {
        return span.of(snippet.piece().text());
    }

    private StringBuilder add(String... parts) {
        for (String part : parts) {
            text.append(part);
        }
        return text;
    }
}
