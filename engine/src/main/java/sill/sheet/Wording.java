package sill.sheet;

import java.util.Collection;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import sill.words.NearestWord;
import sill.words.Quoted;
import sill.worksheet.Problem;

/** Puts what the compiler complains of into words for the worksheet's author. */
final class Wording {
    /** The key of a complaint that is not the compiler's: its words stand as they are. */
    static final String OURS = "";

    private static final Pattern SYMBOL = Pattern.compile("symbol:\\s+(\\w+) ([^\\s(]+)(.*)");
    private static final Pattern LOCATION = Pattern.compile("location: .*?(?:of type|class|interface|enum) (.+)");
    private static final Pattern WRONG_TYPE =
            Pattern.compile("incompatible types: (?:bad [^\\n]*\\n\\s*)?([^\\n]+?) cannot be converted to ([^\\n]+)");
    private static final Pattern LOSSY = Pattern.compile(
            "incompatible types: (?:bad [^\\n]*\\n\\s*)?possible lossy conversion from (\\w+) to (\\w+)");
    private static final Pattern ARGUMENTS = Pattern.compile(
            "(?:method|constructor) (\\S+) in .*cannot be applied.*\\s+required: (.+)\\s+found:\\s+(.+)\\s+reason");

    private static final Pattern OPERANDS =
            Pattern.compile("bad operand types for binary operator '(.+)'\\s+first type: +(.+)\\s+second type: +(.+)");
    private static final Pattern OVERLOAD = Pattern.compile("(?:method|constructor) (\\S+\\(.*\\)) is not applicable");
    private static final Pattern EXPECTED = Pattern.compile("(.+) expected");
    private static final int LONGEST = 300;

    private Wording() {}

    /** A sentence as it goes on behind the name of a cell. */
    static String within(String sentence) {
        return sentence.isEmpty() ? "" : Character.toLowerCase(sentence.charAt(0)) + sentence.substring(1);
    }

    /** The name that a complaint calls unknown; empty when it is about something else. */
    static String unknownName(Compiler.Complaint complaint) {
        Matcher symbol = SYMBOL.matcher(complaint.message());
        return complaint.code().startsWith("compiler.err.cant.resolve") && symbol.find() ? symbol.group(2) : "";
    }

    /** Whether a complaint is about an unknown type. */
    static boolean isAboutType(Compiler.Complaint complaint) {
        Matcher symbol = SYMBOL.matcher(complaint.message());
        return symbol.find() && symbol.group(1).equals("class");
    }

    /** A complaint as a problem of a piece, at an offset of it. */
    static Problem problem(Piece piece, int offset, Compiler.Complaint complaint, String hint) {
        Place place = piece.place(offset);
        String said = unknownName(complaint).isEmpty() ? said(complaint) : unknown(complaint.message());
        return Problem.error(place.line(), place.column(), piece.cell(), piece.where() + ": " + said, hint);
    }

    /** What an unknown name may have been meant to be; empty when no known word is near. */
    static String meant(String unknown, Collection<String> known) {
        List<String> others =
                known.stream().filter(word -> !word.equals(unknown)).toList();
        return NearestWord.hint(unknown, others, "");
    }

    private static String unknown(String message) {
        Matcher symbol = SYMBOL.matcher(message);
        Matcher location = LOCATION.matcher(message);
        symbol.find();
        String kind = symbol.group(1).equals("class") ? "type" : symbol.group(1);
        String found = "found the " + kind + " " + Quoted.of(symbol.group(2) + readable(symbol.group(3)));
        boolean inType = location.find() && !location.group(1).contains(ClassText.NAME);
        return found
                + (inType
                        ? ", which " + readable(location.group(1)) + " does not have"
                        : ", expected one that is declared above");
    }

    private static String said(Compiler.Complaint complaint) {
        String message = complaint.message();
        Matcher match;
        if (!complaint.code().startsWith("compiler.")) {
            return message;
        } else if ((match = LOSSY.matcher(message)).find()) {
            return "found " + match.group(1) + ", expected " + match.group(2) + ", which may hold less";
        } else if ((match = WRONG_TYPE.matcher(message)).find()) {
            return "found " + readable(match.group(1)) + ", expected " + readable(match.group(2));
        } else if ((match = ARGUMENTS.matcher(message)).find()) {
            return "found " + match.group(1) + brackets(match.group(3)) + ", expected " + match.group(1)
                    + brackets(match.group(2));
        } else if ((match = OPERANDS.matcher(message)).find()) {
            return "found " + readable(match.group(2)) + " " + match.group(1) + " " + readable(match.group(3))
                    + ", which has no meaning";
        } else if (message.startsWith("no suitable ")) {
            return overloads(message);
        } else if ((match = EXPECTED.matcher(message)).matches()) {
            return "expected " + match.group(1).replace("<identifier>", "a name");
        }
        String line = readable(message.lines().map(String::strip).collect(Collectors.joining(" ")));
        return line.length() <= LONGEST ? line : line.substring(0, LONGEST) + "…";
    }

    private static String overloads(String message) {
        String first = message.lines().findFirst().orElse("");
        String forms = OVERLOAD.matcher(message)
                .results()
                .map(form -> readable(form.group(1)).replace(",", ", "))
                .collect(Collectors.joining(" or "));
        return "found "
                + readable(first.substring(first.lastIndexOf(" for ") + 5)).replace(",", ", ") + ", expected " + forms;
    }

    private static String brackets(String types) {
        return "(" + (types.equals("no arguments") ? "" : readable(types.replace(",", ", "))) + ")";
    }

    /** Types without packages, and the class that the sheet becomes by the name its author knows. */
    private static String readable(String words) {
        return words.replaceAll("(in |of )?class \\$Sheet\\b", "$1this worksheet")
                .replace("$Sheet.", "")
                .replaceAll("\\b(?:[a-z]\\w*\\.)+(?=[A-Z])", "")
                .strip();
    }

    /** How to mend what is not about an unknown name; empty when nothing sensible can be said. */
    static String hint(Compiler.Complaint complaint) {
        return switch (complaint.code()) {
            case "compiler.err.expected",
                    "compiler.err.expected2",
                    "compiler.err.expected3",
                    "compiler.err.premature.eof" -> "Complete the Java at this place.";
            case "compiler.err.unreported.exception.need.to.catch.or.throw" ->
                "Catch it, or declare the method with 'throws'.";
            case "compiler.err.local.variables.referenced.from.lambda" -> "Copy it to a variable of its own first.";
            default ->
                LOSSY.matcher(complaint.message()).find()
                        ? "Declare it as the wider type, or convert on purpose with a cast or Math.round."
                        : "";
        };
    }
}
