package sill.inference;

import com.sun.source.tree.ArrayAccessTree;
import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.IdentifierTree;
import com.sun.source.tree.MemberSelectTree;
import com.sun.source.tree.MethodInvocationTree;
import javax.lang.model.element.Element;
import javax.lang.model.element.ElementKind;
import javax.lang.model.element.VariableElement;
import sill.units.Unit;

/** Gives variables and containers their values. */
final class Targets {
    private final SheetTree tree;
    private final Fields fields;
    private final Wording wording;
    private final SlipLog log;

    Targets(SheetTree tree, Fields fields, Wording wording, SlipLog log) {
        this.tree = tree;
        this.fields = fields;
        this.wording = wording;
        this.log = log;
    }

    /** A variable's value; unknown when it is none whose value is followed. */
    Value read(Element variable, Environment env) {
        if (tree.isField(variable)) {
            return fields.get(variable);
        } else if (variable.getKind() == ElementKind.FIELD) {
            return env.frame().self instanceof Components self
                    ? self.part(variable.getSimpleName().toString())
                    : Quantity.UNKNOWN;
        }
        return env.get(variable);
    }

    /** An assignment. */
    void assign(ExpressionTree target, Operand given, Environment env) {
        ExpressionTree inner = SheetTree.bare(target);
        if (inner instanceof ArrayAccessTree) {
            add(inner, given.value(), env);
            return;
        }
        Element variable = tree.element(inner).orElse(null);
        if (variable != null && (inner instanceof IdentifierTree || tree.isField(variable))) {
            set(variable, given, tree.start(inner), env);
        }
    }

    /** A declaration, or an assignment to a variable by its name. */
    void set(Element variable, Operand given, int offset, Environment env) {
        Value value = given.value() instanceof Quantity quantity ? quantity.named() : given.value();
        if (tree.isField(variable)) {
            boolean first = !fields.isSet(variable);
            Value stated = fields.stated(Fields.name(variable))
                    .map(unit -> asStated(Fields.name(variable), unit, given, offset, first))
                    .orElse(value);
            boolean surely = first || env.isOutermost();
            fields.set(variable, surely ? stated : Value.join(fields.get(variable), stated));
        } else if (variable.getKind() != ElementKind.FIELD) {
            env.set(variable, value);
        }
        wording.set(variable, offset);
    }

    /** A loop's variable, which stands for the elements themselves. */
    void step(Element variable, Value element, int offset, Environment env) {
        env.set(variable, element);
        wording.set(variable, offset);
    }

    /** A statement whose value the sheet shows, though no variable holds it. */
    void show(String field, Operand shown, int offset) {
        Value value = shown.value() instanceof Quantity quantity ? quantity.named() : shown.value();
        fields.show(
                field,
                fields.stated(field)
                        .map(unit -> asStated(field, unit, shown, offset, true))
                        .orElse(value));
    }

    /** Adds what an element may be to a container, however deep inside another. */
    void add(ExpressionTree container, Value element, Environment env) {
        ExpressionTree root = SheetTree.bare(container);
        boolean inMap = false;
        while (!(root instanceof IdentifierTree)) {
            if (root instanceof ArrayAccessTree access) {
                root = SheetTree.bare(access.getExpression());
            } else if (root instanceof MethodInvocationTree call) {
                root = SheetTree.bare(call.getMethodSelect());
            } else if (root instanceof MemberSelectTree select) {
                if (tree.element(select).filter(tree::isField).isPresent()) {
                    break;
                }
                root = SheetTree.bare(select.getExpression());
            } else {
                return;
            }
            inMap = true;
        }
        Element variable = tree.element(root).orElse(null);
        if (!(variable instanceof VariableElement)) {
            return;
        }
        Value before = read(variable, env);
        Value now = element;
        if (inMap && before instanceof Components map && map.ofMap() && !(element instanceof Components)) {
            now = Components.entry(map.part(Components.KEY), Value.join(map.part(Components.VALUE), element));
        }
        Value after = Value.join(before, now instanceof Quantity quantity ? quantity.named() : now);
        if (tree.isField(variable)) {
            fields.set(variable, stated(variable, after));
        } else if (variable.getKind() != ElementKind.FIELD) {
            env.alter(variable, after);
        }
    }

    /** An element that is made of bare numbers measures what the caption of its container states. */
    private Value stated(Element field, Value value) {
        boolean bare = value instanceof Quantity quantity && quantity.isMadeOfNumbers();
        return fields.stated(Fields.name(field))
                .filter(unit -> bare)
                .<Value>map(unit -> Quantity.of(unit.dimension()))
                .orElse(value);
    }

    private Value asStated(String name, Unit unit, Operand given, int offset, boolean first) {
        if (!(given.value() instanceof Quantity quantity)) {
            return given.value();
        }
        Quantity stated = Quantity.of(unit.dimension());
        if (quantity.fits(stated) || quantity.isMadeOfNumbers()) {
            return stated;
        }
        if (first) {
            log.add(new Slip(
                    name,
                    offset,
                    Rules.pair(stated, quantity),
                    "the caption states [" + unit.symbol() + "], found "
                            + (quantity.isPure() ? "a pure number" : "a value in " + quantity.said()) + ": "
                            + wording.said(given),
                    quantity.isPure() ? "" : "Correct the formula, or state [" + quantity.said() + "]."));
        } else {
            log.add(new Slip(
                    "",
                    offset,
                    Rules.pair(stated, quantity),
                    name + " is stated in " + stated.said() + ", found " + quantity.said() + ": " + wording.said(given),
                    ""));
        }
        return Quantity.UNKNOWN;
    }
}
