package sill.stdlib;

import java.lang.annotation.Documented;
import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/**
 * The coherent SI unit of a parameter, a method's result or a record component, as a unit symbol such as {@code "V"} or
 * {@code "Ω"}; {@code "1"} for a pure number. The value itself is always a plain {@code double} in that unit.
 *
 * <p>A symbol that starts with a question mark stands for any unit; where one method names it twice, both are the same
 * unit. So {@code @Unit("?") nearest(@Unit("?") double x)} gives back what it was given. On a {@code String} parameter it
 * says that the text names that unit. On a function, {@code "V -> Ω"} says the unit of its argument and of its result.
 */
@Documented
@Retention(RetentionPolicy.RUNTIME)
@Target({ElementType.PARAMETER, ElementType.METHOD, ElementType.RECORD_COMPONENT})
public @interface Unit {
    /** The unit symbol. */
    String value();
}
