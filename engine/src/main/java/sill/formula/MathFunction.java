package sill.formula;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The functions of {@link Math} that are mathematics on real numbers, by the signs and names of ISO 80000-2. What rounds to a
 * type, such as {@code floorDiv} or {@code toIntExact}, is not here.
 */
public enum MathFunction {
    SQRT("sqrt", "", 1),
    CBRT("cbrt", "", 1),
    POW("pow", "", 2),
    HYPOT("hypot", "", 2),
    EXP("exp", "exp", 1),
    EXPM1("expm1", "", 1),
    LOG("log", "ln", 1),
    LOG10("log10", "lg", 1),
    LOG1P("log1p", "", 1),
    ABS("abs", "", 1),
    FLOOR("floor", "", 1),
    CEIL("ceil", "", 1),
    SIGNUM("signum", "sgn", 1),
    ROUND("round", "round", 1),
    RINT("rint", "rint", 1),
    MAX("max", "max", 2),
    MIN("min", "min", 2),
    SIN("sin", "sin", 1),
    COS("cos", "cos", 1),
    TAN("tan", "tan", 1),
    ASIN("asin", "arcsin", 1),
    ACOS("acos", "arccos", 1),
    ATAN("atan", "arctan", 1),
    ATAN2("atan2", "arctan2", 2),
    SINH("sinh", "sinh", 1),
    COSH("cosh", "cosh", 1),
    TANH("tanh", "tanh", 1),
    TO_RADIANS("toRadians", "", 1),
    TO_DEGREES("toDegrees", "", 1);

    private static final Map<String, MathFunction> BY_NAME = new HashMap<>();

    static {
        for (MathFunction function : values()) {
            BY_NAME.put(function.javaName, function);
        }
    }

    private final String javaName;
    private final String printed;
    private final int arity;

    MathFunction(String javaName, String printed, int arity) {
        this.javaName = javaName;
        this.printed = printed;
        this.arity = arity;
    }

    /** The function that Java's mathematics calls by this name with so many arguments. */
    public static Optional<MathFunction> named(String javaName, int arguments) {
        return Optional.ofNullable(BY_NAME.get(javaName)).filter(function -> function.arity == arguments);
    }

    /** Its name before brackets; empty for one that has a sign of its own. */
    String printed() {
        return printed;
    }

    double value(List<Double> arguments) {
        double x = arguments.get(0);
        double y = arity == 2 ? arguments.get(1) : 0;
        return switch (this) {
            case SQRT -> StrictMath.sqrt(x);
            case CBRT -> StrictMath.cbrt(x);
            case POW -> StrictMath.pow(x, y);
            case HYPOT -> StrictMath.hypot(x, y);
            case EXP -> StrictMath.exp(x);
            case EXPM1 -> StrictMath.expm1(x);
            case LOG -> StrictMath.log(x);
            case LOG10 -> StrictMath.log10(x);
            case LOG1P -> StrictMath.log1p(x);
            case ABS -> StrictMath.abs(x);
            case FLOOR -> StrictMath.floor(x);
            case CEIL -> StrictMath.ceil(x);
            case SIGNUM -> StrictMath.signum(x);
            // Java rounds to a long, half up.
            case ROUND -> Math.round(x);
            case RINT -> StrictMath.rint(x);
            case MAX -> StrictMath.max(x, y);
            case MIN -> StrictMath.min(x, y);
            case SIN -> StrictMath.sin(x);
            case COS -> StrictMath.cos(x);
            case TAN -> StrictMath.tan(x);
            case ASIN -> StrictMath.asin(x);
            case ACOS -> StrictMath.acos(x);
            case ATAN -> StrictMath.atan(x);
            case ATAN2 -> StrictMath.atan2(x, y);
            case SINH -> StrictMath.sinh(x);
            case COSH -> StrictMath.cosh(x);
            case TANH -> StrictMath.tanh(x);
            case TO_RADIANS -> StrictMath.toRadians(x);
            case TO_DEGREES -> StrictMath.toDegrees(x);
        };
    }
}
