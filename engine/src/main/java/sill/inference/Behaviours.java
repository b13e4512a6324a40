package sill.inference;

import com.sun.source.tree.BlockTree;
import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.LambdaExpressionTree;
import com.sun.source.tree.MemberReferenceTree;
import com.sun.source.tree.Tree;
import com.sun.source.tree.VariableTree;
import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Lambdas and method references: made where they stand, inferred where they are used. */
final class Behaviours {
    private static final int DEEPEST = 24;

    private final SheetTree tree;
    private final Wording wording;
    private final SlipLog log;
    private final Walker walker;
    private final Calls calls;
    private final Map<Tree, Behaviour> unused = new LinkedHashMap<>();
    private final Map<Tree, Boolean> used = new IdentityHashMap<>();
    private int depth;

    Behaviours(SheetTree tree, Wording wording, SlipLog log, Walker walker, Calls calls) {
        this.tree = tree;
        this.wording = wording;
        this.log = log;
        this.walker = walker;
        this.calls = calls;
    }

    Behaviour of(LambdaExpressionTree lambda, Environment env) {
        Behaviour behaviour = new Behaviour(lambda, env, Quantity.UNKNOWN);
        if (!used.containsKey(lambda)) {
            unused.put(lambda, behaviour);
        }
        return behaviour;
    }

    Behaviour of(MemberReferenceTree reference, Value receiver, Environment env) {
        return new Behaviour(reference, env, receiver);
    }

    /** What a behaviour gives for its arguments. */
    Value apply(Behaviour behaviour, List<Operand> arguments, Tree call) {
        if (depth >= DEEPEST) {
            return Quantity.UNKNOWN;
        }
        depth++;
        try {
            if (behaviour.code() instanceof MemberReferenceTree reference) {
                return calls.refer(reference, behaviour, arguments, call);
            }
            LambdaExpressionTree lambda = (LambdaExpressionTree) behaviour.code();
            used.put(lambda, true);
            unused.remove(lambda);
            List<Value> values = arguments.stream().map(Operand::value).toList();
            Trial.Outcome outcome = Trial.run(values, given -> body(lambda, behaviour.captured(), given, call));
            log.addAll(outcome.slips());
            return outcome.value();
        } finally {
            depth--;
        }
    }

    /** Infers what nothing in the sheet calls, for arguments of which nothing is known. */
    void applyUnused() {
        while (!unused.isEmpty()) {
            Behaviour behaviour = unused.values().iterator().next();
            LambdaExpressionTree lambda = (LambdaExpressionTree) behaviour.code();
            List<Operand> arguments = new ArrayList<>();
            lambda.getParameters().forEach(parameter -> arguments.add(new Operand(Quantity.UNKNOWN, lambda)));
            apply(behaviour, arguments, lambda);
        }
    }

    private Trial.Outcome body(LambdaExpressionTree lambda, Environment captured, List<Value> arguments, Tree call) {
        log.open();
        Environment env = captured.ofLambda(new Environment.Frame(captured.frame().self, captured.frame().calledAt));
        for (int i = 0; i < lambda.getParameters().size(); i++) {
            VariableTree parameter = lambda.getParameters().get(i);
            Value value = i < arguments.size() ? arguments.get(i) : Quantity.UNKNOWN;
            tree.element(parameter).ifPresent(element -> {
                env.set(element, value);
                wording.called(element, tree.start(call));
            });
        }
        Value value;
        if (lambda.getBody() instanceof BlockTree block) {
            walker.run(block, env);
            value = env.frame().returned();
        } else {
            value = walker.value((ExpressionTree) lambda.getBody(), env);
        }
        return new Trial.Outcome(value, log.close());
    }
}
