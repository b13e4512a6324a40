package sill.worksheet;

import java.util.Set;
import javax.lang.model.SourceVersion;
import sill.words.Quoted;

/** Reads the name before {@code =}. */
final class GivenName {
    private static final Set<String> TYPES = Set.of("var", "String", "Table");

    private GivenName() {}

    /** Reads a name and the equals sign behind it. */
    static String read(Cursor cursor) throws TextException {
        cursor.skipSpace();
        int start = cursor.position();
        while (!cursor.atEnd() && cursor.peek() != '=') {
            cursor.skip(1);
        }
        if (cursor.atEnd()) {
            cursor.moveTo(start);
            throw TextException.expected("'name = value'", cursor, "");
        }
        String name = cursor.between(start, cursor.position());
        if (!isName(name)) {
            throw new TextException(start, "Found " + found(name) + ", expected a name", mend(name));
        }
        cursor.skip(1);
        return name;
    }

    /** Whether Java takes it for the name of a variable. */
    static boolean isName(String text) {
        return SourceVersion.isName(text, SourceVersion.RELEASE_17) && text.indexOf('.') < 0;
    }

    private static String found(String name) {
        return name.isEmpty() ? "nothing before '='" : Quoted.of(name);
    }

    private static String mend(String name) {
        if (SourceVersion.isKeyword(name, SourceVersion.RELEASE_17)) {
            return "The word belongs to Java; choose another, such as '" + name + "1'.";
        }
        if (startsWithType(name)) {
            return "A given has no type in front of its name.";
        }
        String joined = joined(name);
        return isName(joined)
                ? "A name is letters and digits in one word, such as " + Quoted.of(joined) + "."
                : "A name is letters and digits in one word and starts with a letter.";
    }

    private static boolean startsWithType(String name) {
        String word = new Cursor(name).word();
        boolean type = SourceVersion.isKeyword(word, SourceVersion.RELEASE_17) || TYPES.contains(word);
        return type && word.length() < name.length();
    }

    /** The words of a text in one, each after the first with a capital. */
    private static String joined(String text) {
        StringBuilder joined = new StringBuilder();
        boolean capital = false;
        for (int at = 0; at < Math.min(text.length(), 60); at++) {
            char c = text.charAt(at);
            if (Character.isJavaIdentifierPart(c) && !Character.isIdentifierIgnorable(c)) {
                joined.append(capital ? Character.toUpperCase(c) : c);
                capital = false;
            } else {
                capital = joined.length() > 0;
            }
        }
        return joined.toString();
    }
}
