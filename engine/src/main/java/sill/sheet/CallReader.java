package sill.sheet;

import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.MemberSelectTree;
import com.sun.source.tree.MethodInvocationTree;
import com.sun.source.tree.MethodTree;
import com.sun.source.tree.NewClassTree;
import com.sun.source.tree.ReturnTree;
import com.sun.source.util.Trees;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import javax.lang.model.element.Element;
import javax.lang.model.element.ElementKind;
import javax.lang.model.element.ExecutableElement;
import javax.lang.model.element.Modifier;
import javax.lang.model.element.RecordComponentElement;
import javax.lang.model.element.TypeElement;
import javax.lang.model.element.VariableElement;
import javax.lang.model.type.TypeMirror;
import sill.formula.Expression;
import sill.formula.Expression.Defined;
import sill.formula.Expression.Form;
import sill.formula.Expression.Kind;
import sill.formula.Expression.Parameter;
import sill.formula.FormulaText;
import sill.formula.MathFunction;

/**
 * Reads calls: functions of mathematics, helpers by the form they state, the worksheet's own methods by what they return,
 * components of records.
 */
final class CallReader {
    private static final String STDLIB = "sill.stdlib.";

    private final Trees trees;
    private final FormulaReader reader;
    private final Set<Element> open = new HashSet<>();
    private final Set<Element> parameters = new HashSet<>();

    CallReader(Trees trees, FormulaReader reader) {
        this.trees = trees;
        this.reader = reader;
    }

    /** Whether it is a parameter of a method whose form is being read. */
    boolean isParameter(Element element) {
        return parameters.contains(element);
    }

    Expression call(MethodInvocationTree call) {
        if (!(reader.element(call) instanceof ExecutableElement method)
                || !(method.getEnclosingElement() instanceof TypeElement owner)) {
            throw new FormulaReader.NoMathematics();
        }
        String type = owner.getQualifiedName().toString();
        String name = method.getSimpleName().toString();
        if (type.equals("java.lang.Math") || type.equals("java.lang.StrictMath")) {
            return function(name, call);
        } else if (isAccessor(method, owner)) {
            return new Expression.Component(receiver(call), name);
        } else if (type.startsWith(STDLIB)) {
            return helper(method, owner, call);
        } else if (owner.getSimpleName().contentEquals(ClassText.NAME)) {
            return own(method, call);
        }
        throw new FormulaReader.NoMathematics();
    }

    private Expression function(String name, MethodInvocationTree call) {
        MathFunction function =
                MathFunction.named(name, call.getArguments().size()).orElseThrow(FormulaReader.NoMathematics::new);
        if (!NumberTypes.isNumber(reader.type(call))) {
            throw new FormulaReader.NoMathematics();
        }
        List<Expression> arguments = new ArrayList<>();
        for (ExpressionTree argument : call.getArguments()) {
            arguments.add(reader.number(argument));
        }
        return new Expression.Function(function, arguments);
    }

    private static boolean isAccessor(ExecutableElement method, TypeElement owner) {
        if (owner.getKind() != ElementKind.RECORD || !method.getParameters().isEmpty()) {
            return false;
        }
        for (RecordComponentElement component : owner.getRecordComponents()) {
            if (component.getSimpleName().contentEquals(method.getSimpleName())) {
                return true;
            }
        }
        return false;
    }

    private Expression receiver(MethodInvocationTree call) {
        if (call.getMethodSelect() instanceof MemberSelectTree select) {
            return reader.expression(select.getExpression());
        }
        throw new FormulaReader.NoMathematics();
    }

    private Expression helper(ExecutableElement method, TypeElement owner, MethodInvocationTree call) {
        List<String> forms = Annotations.texts(method, STDLIB + "Formula");
        String name = method.getSimpleName().toString();
        boolean isStatic = method.getModifiers().contains(Modifier.STATIC);
        if (forms.isEmpty()) {
            return plain(method, owner, isStatic, call);
        } else if (isStatic) {
            List<Expression> arguments = reader.expressions(call.getArguments());
            List<Parameter> parameters = parameters(method);
            boolean array = method.isVarArgs() && !isNumberList(call, parameters.size());
            if (array || !namesAreKnown(parameters)) {
                throw new FormulaReader.NoMathematics();
            }
            return new Defined(Kind.HELPER, name, parameters, arguments, forms(forms, method, parameters));
        }
        List<Parameter> components = components(owner);
        return new Defined(Kind.OF_RECORD, name, components, List.of(receiver(call)), forms(forms, method, components));
    }

    /** A helper without a form, alone or asked of a constant. */
    private Expression plain(ExecutableElement method, TypeElement owner, boolean isStatic, MethodInvocationTree call) {
        String qualifier = "";
        if (!isStatic) {
            Element of = call.getMethodSelect() instanceof MemberSelectTree select
                    ? reader.element(select.getExpression())
                    : owner;
            if (of.getKind() != ElementKind.ENUM_CONSTANT) {
                throw new FormulaReader.NoMathematics();
            }
            qualifier = of.getSimpleName().toString();
        }
        if (!NumberTypes.isNumber(reader.type(call))) {
            throw new FormulaReader.NoMathematics();
        }
        return new Expression.Call(
                method.getSimpleName().toString(), qualifier, reader.expressions(call.getArguments()));
    }

    /** Whether the last parameter, which takes several values, is given them one by one. */
    private boolean isNumberList(MethodInvocationTree call, int parameters) {
        return call.getArguments().stream()
                .skip(parameters - 1L)
                .allMatch(argument -> NumberTypes.isNumber(reader.type(argument)));
    }

    /** Without the compiler's option that keeps them, parameters are called {@code arg0} and so on. */
    private static boolean namesAreKnown(List<Parameter> parameters) {
        return parameters.stream().noneMatch(parameter -> parameter.name().matches("arg\\d+"));
    }

    private static List<Parameter> parameters(ExecutableElement method) {
        List<Parameter> parameters = new ArrayList<>();
        for (VariableElement parameter : method.getParameters()) {
            boolean last = parameters.size() == method.getParameters().size() - 1;
            parameters.add(
                    new Parameter(parameter.getSimpleName().toString(), unit(parameter), method.isVarArgs() && last));
        }
        return parameters;
    }

    private static List<Parameter> components(TypeElement record) {
        List<Parameter> components = new ArrayList<>();
        for (RecordComponentElement component : record.getRecordComponents()) {
            components.add(new Parameter(component.getSimpleName().toString(), unit(component), false));
        }
        return components;
    }

    private static List<Form> forms(List<String> texts, ExecutableElement method, List<Parameter> parameters) {
        String several = "";
        for (Parameter parameter : parameters) {
            several = parameter.several() ? parameter.name() : several;
        }
        List<Form> forms = new ArrayList<>();
        for (String text : texts) {
            int equals = text.indexOf('=');
            String component = equals < 0 ? "" : text.substring(0, equals).strip();
            Expression body = FormulaText.parse(text.substring(equals + 1).strip(), several);
            forms.add(new Form(component, body, component.isEmpty() ? unit(method) : unit(method, component)));
        }
        return forms;
    }

    private static String unit(Element annotated) {
        List<String> symbol = Annotations.texts(annotated, STDLIB + "Unit");
        return symbol.isEmpty() ? "" : symbol.get(0);
    }

    /** The unit of a component of a method's result. */
    private static String unit(ExecutableElement method, String component) {
        if (method.getReturnType() instanceof javax.lang.model.type.DeclaredType type
                && type.asElement() instanceof TypeElement record) {
            for (Parameter each : components(record)) {
                if (each.name().equals(component)) {
                    return each.unit();
                }
            }
        }
        return "";
    }

    /** A method of the worksheet: by what it returns, if that is all it does; else by its name. */
    private Expression own(ExecutableElement method, MethodInvocationTree call) {
        TypeMirror type = reader.type(call);
        boolean known = NumberTypes.isNumber(type) || NumberTypes.isTruth(type) || NumberTypes.isRecord(type);
        if (!known || method.isVarArgs() || !method.getTypeParameters().isEmpty()) {
            throw new FormulaReader.NoMathematics();
        }
        List<Expression> arguments = reader.expressions(call.getArguments());
        String name = method.getSimpleName().toString();
        return body(method)
                .map(body -> (Expression)
                        new Defined(Kind.METHOD, name, parameters(method), arguments, List.of(new Form("", body, ""))))
                .orElseGet(() -> new Expression.Call(name, "", arguments));
    }

    private Optional<Expression> body(ExecutableElement method) {
        MethodTree tree = trees.getTree(method);
        boolean returns = tree != null
                && tree.getBody() != null
                && tree.getBody().getStatements().size() == 1
                && tree.getBody().getStatements().get(0) instanceof ReturnTree;
        if (!returns || !open.add(method)) {
            return Optional.empty();
        }
        parameters.addAll(method.getParameters());
        try {
            ReturnTree last = (ReturnTree) tree.getBody().getStatements().get(0);
            return Optional.of(reader.expression(last.getExpression()));
        } catch (FormulaReader.NoMathematics e) {
            return Optional.empty();
        } finally {
            open.remove(method);
        }
    }

    /** A new record: its components are its arguments, which the value itself confirms later. */
    Expression made(NewClassTree made) {
        if (made.getClassBody() != null
                || !NumberTypes.isRecord(reader.type(made))
                || !(reader.element(made) instanceof ExecutableElement constructor)
                || !(constructor.getEnclosingElement() instanceof TypeElement record)) {
            throw new FormulaReader.NoMathematics();
        }
        List<Parameter> components = components(record);
        if (components.size() != made.getArguments().size()) {
            throw new FormulaReader.NoMathematics();
        }
        List<Form> forms = new ArrayList<>();
        for (Parameter component : components) {
            forms.add(new Form(component.name(), new Expression.Name(component.name()), component.unit()));
        }
        String name = record.getSimpleName().toString();
        return new Defined(Kind.RECORD, name, components, reader.expressions(made.getArguments()), forms);
    }
}
