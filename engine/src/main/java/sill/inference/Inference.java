package sill.inference;

import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.MethodTree;
import com.sun.source.tree.ReturnTree;
import com.sun.source.tree.StatementTree;
import com.sun.source.util.Trees;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import sill.units.Dimension;

/**
 * Infers the dimensions of one sheet. The cells' methods run in their order, then the checks', then what nothing has called.
 */
public final class Inference implements Walker {
    private static final String CELL = "$cell";
    private static final String CHECK = "$check";

    private final SheetTree tree;
    private final Seeds seeds;
    private final SlipLog log = new SlipLog();
    private final Rules rules;
    private final Fields fields;
    private final Calls calls;
    private final Statements statements;
    private final Expressions expressions;
    private final Map<String, Dimension> checks = new HashMap<>();

    private Inference(Trees trees, CompilationUnitTree unit, Seeds seeds) {
        this.tree = new SheetTree(trees, unit, seeds.source());
        this.seeds = seeds;
        Wording wording = new Wording(tree, seeds);
        fields = new Fields(seeds);
        rules = new Rules(tree, wording, log);
        Targets targets = new Targets(tree, fields, wording, log);
        calls = new Calls(tree, seeds, fields, wording, log, targets, this);
        statements = new Statements(tree, fields, targets, this);
        expressions = new Expressions(tree, rules, targets, calls, statements, this);
    }

    /**
     * Infers a sheet.
     *
     * @param unit the sheet's class, attributed: its cells' methods are named {@code $cell…} and its checks' {@code $check…}
     */
    public static Inferred of(Trees trees, CompilationUnitTree unit, Seeds seeds) {
        Inference inference = new Inference(trees, unit, seeds);
        inference.run();
        return inference.inferred();
    }

    @Override
    public Value value(ExpressionTree expression, Environment env) {
        return expression.accept(expressions, env);
    }

    @Override
    public boolean run(StatementTree statement, Environment env) {
        return statement.accept(statements, env);
    }

    private void run() {
        List<MethodTree> members = new ArrayList<>();
        for (MethodTree method : tree.methods()) {
            String name = method.getName().toString();
            if (name.startsWith(CELL)) {
                run(method.getBody(), Environment.ofBody(new Environment.Frame(Quantity.UNKNOWN, -1)));
            } else if (name.startsWith(CHECK)) {
                check(name, method);
            } else if (!name.startsWith("$")) {
                members.add(method);
            }
        }
        calls.bodies().callUncalled(members);
        calls.behaviours().applyUnused();
    }

    private void check(String name, MethodTree method) {
        StatementTree last = method.getBody().getStatements().get(0);
        if (!(last instanceof ReturnTree statement) || statement.getExpression() == null) {
            return;
        }
        Environment env = Environment.ofBody(new Environment.Frame(Quantity.UNKNOWN, -1));
        Operand found = operand(statement.getExpression(), env);
        found.quantity().known().ifPresent(dimension -> checks.put(name, dimension));
        Dimension limit = seeds.limits().get(name);
        if (limit != null && !found.quantity().fits(Quantity.of(limit))) {
            rules.limit(found, limit);
        }
    }

    private Inferred inferred() {
        Map<String, Dimension> dimensions = new LinkedHashMap<>();
        Map<String, Map<String, Dimension>> components = new LinkedHashMap<>();
        fields.byName().forEach((name, value) -> {
            if (value instanceof Components parts && parts.ofMap()) {
                parts.part(Components.VALUE).quantity().known().ifPresent(dimension -> dimensions.put(name, dimension));
            } else if (value instanceof Components parts) {
                components.put(name, known(parts));
            } else {
                value.quantity().known().ifPresent(dimension -> dimensions.put(name, dimension));
            }
        });
        return new Inferred(dimensions, components, checks, log.all());
    }

    private static Map<String, Dimension> known(Components record) {
        Map<String, Dimension> known = new LinkedHashMap<>();
        record.parts()
                .forEach((name, part) -> part.quantity().known().ifPresent(dimension -> known.put(name, dimension)));
        return known;
    }
}
