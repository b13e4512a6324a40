package sill.formula;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Names and their symbols, by the table {@code formula/symbols.txt}. */
class SymbolTest {
    static List<String[]> names() throws IOException {
        return Files.readAllLines(Path.of("src/test/resources/formula/symbols.txt"), StandardCharsets.UTF_8).stream()
                .filter(line -> !line.startsWith("#"))
                .map(line -> line.split("\t", -1))
                .collect(Collectors.toList());
    }

    @Test
    void theTableIsRead() throws IOException {
        assertThat(names()).hasSizeGreaterThan(45);
    }

    @ParameterizedTest
    @MethodSource("names")
    void nameHasItsSymbol(String name, String base, String index) {
        assertThat(Symbol.of(name)).isEqualTo(new Symbol(base, index));
    }

    @Test
    void differentNamesOfASheetHaveDifferentSymbols() throws IOException {
        // An underscore and a rise of case may say the same thing, as in v_in and vIn: then the case still differs.
        assertThat(names().stream().map(row -> Symbol.of(row[0])).distinct()).hasSize(names().size());
    }
}
