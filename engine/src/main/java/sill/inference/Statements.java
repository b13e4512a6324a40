package sill.inference;

import com.sun.source.tree.AssertTree;
import com.sun.source.tree.AssignmentTree;
import com.sun.source.tree.BlockTree;
import com.sun.source.tree.CaseTree;
import com.sun.source.tree.CatchTree;
import com.sun.source.tree.DoWhileLoopTree;
import com.sun.source.tree.EnhancedForLoopTree;
import com.sun.source.tree.ExpressionStatementTree;
import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.ForLoopTree;
import com.sun.source.tree.IfTree;
import com.sun.source.tree.LabeledStatementTree;
import com.sun.source.tree.ReturnTree;
import com.sun.source.tree.StatementTree;
import com.sun.source.tree.SwitchExpressionTree;
import com.sun.source.tree.SwitchTree;
import com.sun.source.tree.SynchronizedTree;
import com.sun.source.tree.ThrowTree;
import com.sun.source.tree.TryTree;
import com.sun.source.tree.VariableTree;
import com.sun.source.tree.WhileLoopTree;
import com.sun.source.tree.YieldTree;
import com.sun.source.util.SimpleTreeVisitor;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import java.util.function.Consumer;

/** Runs statements; each answers whether what follows it in its block is surely not reached. */
final class Statements extends SimpleTreeVisitor<Boolean, Environment> {
    /** More than the kinds of a quantity: a loop that changes something in each round has an end all the same. */
    private static final int MOST_ROUNDS = 8;

    private final SheetTree tree;
    private final Fields fields;
    private final Targets targets;
    private final Walker walker;
    private final Deque<Value> yielded = new ArrayDeque<>();

    Statements(SheetTree tree, Fields fields, Targets targets, Walker walker) {
        super(false);
        this.tree = tree;
        this.fields = fields;
        this.targets = targets;
        this.walker = walker;
    }

    private boolean run(StatementTree statement, Environment env) {
        return walker.run(statement, env);
    }

    @Override
    public Boolean visitBlock(BlockTree block, Environment env) {
        return runAll(block.getStatements(), env);
    }

    private boolean runAll(List<? extends StatementTree> statements, Environment env) {
        boolean ended = false;
        for (StatementTree statement : statements) {
            ended |= run(statement, env);
        }
        return ended;
    }

    @Override
    public Boolean visitVariable(VariableTree variable, Environment env) {
        Operand given = variable.getInitializer() == null
                ? new Operand(Quantity.ANY, null)
                : walker.operand(variable.getInitializer(), env);
        int start = tree.start(variable);
        fields.slot(start).ifPresent(field -> targets.show(field, given, start));
        tree.element(variable).ifPresent(element -> targets.set(element, given, start, env));
        return false;
    }

    @Override
    public Boolean visitExpressionStatement(ExpressionStatementTree statement, Environment env) {
        Operand shown = walker.operand(statement.getExpression(), env);
        int start = tree.start(statement);
        if (!(shown.tree() instanceof AssignmentTree)) {
            fields.slot(start).ifPresent(field -> targets.show(field, shown, start));
        }
        return false;
    }

    @Override
    public Boolean visitReturn(ReturnTree statement, Environment env) {
        if (statement.getExpression() != null) {
            env.frame().give(walker.value(statement.getExpression(), env));
        }
        return true;
    }

    @Override
    public Boolean visitThrow(ThrowTree statement, Environment env) {
        walker.value(statement.getExpression(), env);
        return true;
    }

    @Override
    public Boolean visitYield(YieldTree statement, Environment env) {
        give(walker.value(statement.getValue(), env));
        return true;
    }

    private void give(Value value) {
        // A yield outside a switch is a problem that the compiler tells; here it gives nothing to anyone.
        if (!yielded.isEmpty()) {
            yielded.push(Value.join(yielded.pop(), value));
        }
    }

    @Override
    public Boolean visitAssert(AssertTree statement, Environment env) {
        walker.value(statement.getCondition(), env);
        return false;
    }

    @Override
    public Boolean visitLabeledStatement(LabeledStatementTree statement, Environment env) {
        return run(statement.getStatement(), env);
    }

    @Override
    public Boolean visitSynchronized(SynchronizedTree statement, Environment env) {
        return run(statement.getBlock(), env);
    }

    @Override
    public Boolean visitIf(IfTree statement, Environment env) {
        walker.value(statement.getCondition(), env);
        Environment first = env.branch();
        Environment second = env.branch();
        boolean firstEnds = run(statement.getThenStatement(), first);
        boolean secondEnds = statement.getElseStatement() != null && run(statement.getElseStatement(), second);
        if (firstEnds && !secondEnds) {
            env.take(second);
        } else if (secondEnds && !firstEnds) {
            env.take(first);
        } else {
            env.takeEither(first, second);
        }
        return firstEnds && secondEnds;
    }

    @Override
    public Boolean visitWhileLoop(WhileLoopTree loop, Environment env) {
        repeat(env, round -> {
            walker.value(loop.getCondition(), round);
            run(loop.getStatement(), round);
        });
        return false;
    }

    @Override
    public Boolean visitDoWhileLoop(DoWhileLoopTree loop, Environment env) {
        repeat(env, round -> {
            run(loop.getStatement(), round);
            walker.value(loop.getCondition(), round);
        });
        return false;
    }

    @Override
    public Boolean visitForLoop(ForLoopTree loop, Environment env) {
        runAll(loop.getInitializer(), env);
        repeat(env, round -> {
            if (loop.getCondition() != null) {
                walker.value(loop.getCondition(), round);
            }
            run(loop.getStatement(), round);
            runAll(loop.getUpdate(), round);
        });
        return false;
    }

    @Override
    public Boolean visitEnhancedForLoop(EnhancedForLoopTree loop, Environment env) {
        Value element = walker.value(loop.getExpression(), env);
        repeat(env, round -> {
            tree.element(loop.getVariable())
                    .ifPresent(variable -> targets.step(variable, element, tree.start(loop.getVariable()), round));
            run(loop.getStatement(), round);
        });
        return false;
    }

    private void repeat(Environment env, Consumer<Environment> body) {
        for (int i = 0; i < MOST_ROUNDS; i++) {
            int before = fields.changes();
            Environment round = env.branch();
            body.accept(round);
            if (!env.takeToo(round) && fields.changes() == before) {
                return;
            }
        }
    }

    @Override
    public Boolean visitTry(TryTree statement, Environment env) {
        statement.getResources().forEach(resource -> {
            if (resource instanceof StatementTree declaration) {
                run(declaration, env);
            }
        });
        Environment tried = env.branch();
        boolean ends = run(statement.getBlock(), tried);
        env.takeToo(tried);
        for (CatchTree each : statement.getCatches()) {
            Environment caught = env.branch();
            ends &= run(each.getBlock(), caught);
            env.takeToo(caught);
        }
        return statement.getFinallyBlock() != null && run(statement.getFinallyBlock(), env) || ends;
    }

    @Override
    public Boolean visitSwitch(SwitchTree choice, Environment env) {
        walker.value(choice.getExpression(), env);
        cases(choice.getCases(), false, env);
        return false;
    }

    /** A switch expression's value. */
    Value choose(SwitchExpressionTree choice, Environment env) {
        walker.value(choice.getExpression(), env);
        yielded.push(Quantity.ANY);
        cases(choice.getCases(), true, env);
        return yielded.pop();
    }

    private void cases(List<? extends CaseTree> cases, boolean gives, Environment env) {
        Environment after = env.branch();
        for (CaseTree each : cases) {
            // With what the case before left, as it may have fallen through.
            Environment own = after.branch();
            if (each.getBody() instanceof ExpressionTree value) {
                Value given = walker.value(value, own);
                if (gives) {
                    give(given);
                }
            } else if (each.getBody() instanceof StatementTree body) {
                run(body, own);
            } else if (each.getStatements() != null) {
                runAll(each.getStatements(), own);
            }
            after.takeToo(own);
        }
        env.takeToo(after);
    }
}
