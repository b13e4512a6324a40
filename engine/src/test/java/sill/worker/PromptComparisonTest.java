package sill.worker;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import jdk.jshell.JShell;
import jdk.jshell.Snippet;
import jdk.jshell.SnippetEvent;
import jdk.jshell.SourceCodeAnalysis.CompletionInfo;
import jdk.jshell.VarSnippet;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import sill.values.Datum;
import sill.values.Result;
import sill.values.RunResult;

/**
 * The JDK's own prompt is the reference: the same lines, typed into it and written into a cell, give the same variables with the
 * same types and the same values. The pieces of Java stand in {@code spec/prompt.txt}.
 */
class PromptComparisonTest {
    private static final int PIECES = 80;
    private static final List<String> IMPORTS = List.of(
            "import java.util.*;",
            "import java.util.function.*;",
            "import java.util.stream.*;",
            "import java.math.*;",
            "import static java.lang.Math.*;");

    /** Where both sides leave a value's text: the prompt's engine shares this process. */
    private static final String SHOWN = "sill.test.shown";

    private JShell shell;

    /** A fresh prompt for each piece: what an earlier one declared would change how newer prompts type a later one. */
    private void open() {
        shell = JShell.builder().executionEngine("local").build();
        IMPORTS.forEach(shell::eval);
    }

    @AfterAll
    static void forget() {
        System.clearProperty(SHOWN);
    }

    @Test
    void everyPieceIsSeen() throws IOException {
        assertThat(pieces()).hasSize(PIECES);
    }

    @TestFactory
    Stream<DynamicTest> sameVariablesTypesAndValues() throws IOException {
        return pieces().stream()
                .map(piece -> DynamicTest.dynamicTest(piece.replace('\n', '⏎'), () -> {
                    Map<String, String> expected = atThePrompt(piece);
                    assertThat(expected).isNotEmpty();
                    assertThat(inACell(piece, expected.keySet().stream().toList()))
                            .isEqualTo(expected);
                }));
    }

    private static List<String> pieces() throws IOException {
        try (InputStream file = PromptComparisonTest.class.getResourceAsStream("/spec/prompt.txt")) {
            String text = new String(file.readAllBytes(), StandardCharsets.UTF_8);
            return Arrays.stream(text.split("(?m)^---\n"))
                    .skip(1)
                    .map(String::stripTrailing)
                    .toList();
        }
    }

    /** Variables to type and value, from typing the lines one by one. */
    private Map<String, String> atThePrompt(String piece) {
        open();
        try {
            return typed(piece);
        } finally {
            shell.close();
        }
    }

    private Map<String, String> typed(String piece) {
        String typed = "";
        for (String line : piece.split("\n")) {
            typed = type(typed + line + "\n");
        }
        assertThat(typed).as("what the prompt still waits for").isBlank();
        Map<String, String> variables = new TreeMap<>();
        for (VarSnippet variable : shell.variables().toList()) {
            if (!variable.name().startsWith("$")) {
                evaluate("System.setProperty(\"" + SHOWN + "\", " + show(variable.name()) + ")");
                variables.put(
                        variable.name(), readable(variable.typeName()) + " = " + shown(System.getProperty(SHOWN)));
            }
        }
        return variables;
    }

    /** Evaluates what is complete and gives back the rest. */
    private String type(String source) {
        CompletionInfo info = shell.sourceCodeAnalysis().analyzeCompletion(source);
        if (!info.completeness().isComplete()) {
            return source;
        }
        evaluate(info.source());
        return info.remaining().isBlank() ? "" : type(info.remaining());
    }

    private void evaluate(String source) {
        for (SnippetEvent event : shell.eval(source)) {
            if (event.causeSnippet() == null) {
                assertThat(event.exception()).as(source).isNull();
                assertThat(event.status())
                        .as(source
                                + shell.diagnostics(event.snippet())
                                        .map(d -> d.getMessage(java.util.Locale.ENGLISH))
                                        .toList())
                        .isNotEqualTo(Snippet.Status.REJECTED);
            }
        }
    }

    private static Map<String, String> inACell(String piece, List<String> variables) {
        StringBuilder cell = new StringBuilder(Sheets.calculation(piece)).append('\n');
        for (String name : variables) {
            cell.append(show(name)).append("\n");
        }
        RunResult run = Sheets.here(cell.toString());
        assertThat(run.problems()).isEmpty();
        List<Result> shown = run.results().stream()
                .skip(run.results().size() - variables.size())
                .toList();
        Map<String, String> values = new TreeMap<>();
        for (Result result : run.results()) {
            int at = variables.indexOf(result.name());
            if (at >= 0) {
                Datum value = shown.get(at).value();
                values.put(result.name(), readable(result.type()) + " = " + shown(((Datum.Text) value).value()));
            }
        }
        return values;
    }

    private static String show(String name) {
        return "java.util.Arrays.deepToString(new Object[] {" + name + "})";
    }

    /** Without the address in memory that is all some values show. */
    private static String shown(String text) {
        return text.replaceAll("(REPL\\S*|\\[[A-Z])@[0-9a-f]+", "…");
    }

    private static String readable(String type) {
        return type.replaceAll("\\s", "").replaceAll("\\b(?:[a-z]\\w*\\.)+(?=[A-Z])", "");
    }
}
