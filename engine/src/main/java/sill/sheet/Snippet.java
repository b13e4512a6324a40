package sill.sheet;

import java.util.List;
import java.util.regex.Pattern;

/**
 * One snippet of a cell, parsed but not attributed.
 *
 * @param piece the cell's text
 * @param span where it stands in the piece
 * @param kind what it is
 * @param variables the variables it declares, for {@link Kind#VARIABLES}
 * @param expression the bare expression, for {@link Kind#EXPRESSION}
 * @param calls where a line break tells calls apart
 * @param bodies bodies of the methods it declares, for {@link Kind#METHOD} and {@link Kind#TYPE}
 * @param name the method or type it declares, for {@link Kind#METHOD} and {@link Kind#TYPE}
 * @param caption text of the comment behind it
 */
record Snippet(
        Piece piece,
        Span span,
        Kind kind,
        List<Variable> variables,
        Span expression,
        List<MappedText.Break> calls,
        List<Span> bodies,
        Name name,
        Caption caption) {

    private static final Pattern BLOCK =
            Pattern.compile("\\{|(?:for|while|do|if|switch|try|synchronized)\\b|\\w+\\s*:");
    private static final Pattern STATIC = Pattern.compile("\\bstatic\\b");

    /** What a snippet is. */
    enum Kind {
        IMPORT,
        VARIABLES,
        METHOD,
        TYPE,
        /** A statement other than a call. */
        STATEMENT,
        /** A call with a semicolon: shown when it has a value. */
        CALL,
        /** A bare expression that is no statement. */
        EXPRESSION
    }

    /** Stands for the type of a variable declared with {@code var}. */
    static final String OPEN = "var";

    /**
     * A declared variable.
     *
     * @param name its name
     * @param at offset of its name in the piece
     * @param type its type as the compiler prints it, {@link #OPEN} for none
     * @param typeSpan where the type stands
     * @param initialiser its initialiser; empty span when there is none
     * @param arrayInitialiser whether that is a list in braces
     */
    record Variable(String name, int at, String type, Span typeSpan, Span initialiser, boolean arrayInitialiser) {
        boolean typeIsOpen() {
            return type.equals(OPEN);
        }

        boolean hasInitialiser() {
            return initialiser.end() > initialiser.start();
        }
    }

    /** A member's name and its offset in the piece. */
    record Name(String text, int at) {
        static final Name NONE = new Name("", 0);
    }

    int cell() {
        return piece.cell();
    }

    /** Whether it needs no semicolon more; behind an endless loop over a block that would be a statement never reached. */
    boolean isWhole() {
        String text = span.of(piece.text());
        return text.endsWith(";") || (text.endsWith("}") && BLOCK.matcher(text).lookingAt());
    }

    /** Whether a member says {@code static} itself. */
    boolean isStatic() {
        String code = CodeText.codeOnly(span.of(piece.text()));
        int body = code.indexOf('{');
        return STATIC.matcher(body < 0 ? code : code.substring(0, body)).find();
    }

    boolean isMember() {
        return kind == Kind.METHOD || kind == Kind.TYPE;
    }
}
