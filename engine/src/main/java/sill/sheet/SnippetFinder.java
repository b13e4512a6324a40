package sill.sheet;

import java.util.IdentityHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/** Finds the snippet that stands at a place. */
final class SnippetFinder {
    private final Map<Piece, TreeMap<Integer, Snippet>> starts = new IdentityHashMap<>();

    SnippetFinder(Program program) {
        program.cells().forEach(cell -> cell.snippets().forEach(this::add));
        program.checks().forEach(check -> check.snippet().ifPresent(this::add));
    }

    private void add(Snippet snippet) {
        starts.computeIfAbsent(snippet.piece(), piece -> new TreeMap<>())
                .put(snippet.span().start(), snippet);
    }

    /** The snippet of a piece that begins at or before an offset and reaches to it. */
    Optional<Snippet> at(Piece piece, int offset) {
        return Optional.ofNullable(starts.getOrDefault(piece, new TreeMap<>()).floorEntry(offset))
                .map(Map.Entry::getValue)
                .filter(snippet -> offset <= snippet.span().end());
    }
}
