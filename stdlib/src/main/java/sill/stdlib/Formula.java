package sill.stdlib;

import java.lang.annotation.Documented;
import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/**
 * The closed form that a helper computes; the record prints it for a call.
 *
 * <p>It is Java-like arithmetic in the names of the method's parameters, or in the names of the record's components when
 * it stands on a record's method: numbers, {@code + - * /}, parentheses, {@code PI}, and the functions {@code sqrt},
 * {@code log}, {@code exp} and {@code pow}. {@code sum(term)} adds the term up over the values of a parameter that takes
 * any number of them.
 *
 * <p>A helper with one result has one form. A helper that returns a record has a form per component, in the order of the
 * components, each written {@code component = form}.
 */
@Documented
@Retention(RetentionPolicy.RUNTIME)
@Target(ElementType.METHOD)
public @interface Formula {
    /** The closed form, or one for each component of the result. */
    String[] value();
}
