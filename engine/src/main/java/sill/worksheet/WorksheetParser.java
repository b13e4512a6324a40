package sill.worksheet;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** Cuts a worksheet into its parts and hands each to its reader. */
final class WorksheetParser {
    private static final String BYTE_ORDER_MARK = "\ufeff";

    private final String text;
    private final List<SourceLine> lines;
    private final ProblemList problems = new ProblemList();
    private final Set<Integer> unreadable = new HashSet<>();
    private final GivenParser givens = new GivenParser(problems);
    private final CheckParser checks = new CheckParser(problems);
    private final List<Cell> cells = new ArrayList<>();

    private WorksheetParser(String text) {
        this.text = text.startsWith(BYTE_ORDER_MARK) ? text.substring(1) : text;
        this.lines = SourceLine.split(this.text);
    }

    static Worksheet parse(String text) {
        return new WorksheetParser(text).parse();
    }

    private Worksheet parse() {
        if (lines.stream().allMatch(SourceLine::isBlank)) {
            VersionLine.reportEmpty(problems);
            return new Worksheet(text, new TitleBlock(Map.of()), List.of(), problems.inTextOrder());
        }
        int first = nextHeader(0);
        reportControls(0, first);
        int start = VersionLine.check(lines.get(0), problems) ? 1 : 0;
        TitleBlock titleBlock =
                TitleBlockParser.parse(readable(Math.min(start, first), first), unreadable.isEmpty(), problems);
        while (first < lines.size()) {
            int next = nextHeader(first + 1);
            problems.enterCell(cells.size() + 1);
            reportControls(first, next);
            cells.add(cell(first, next));
            first = next;
        }
        CrossReferences.check(cells, problems);
        return new Worksheet(text, titleBlock, cells, problems.inTextOrder());
    }

    private int nextHeader(int from) {
        int at = from;
        while (at < lines.size() && !lines.get(at).isHeader()) {
            at++;
        }
        return at;
    }

    private void reportControls(int from, int to) {
        for (SourceLine line : lines.subList(from, to)) {
            if (ControlCharacters.report(line, problems)) {
                unreadable.add(line.number());
            }
        }
    }

    private List<SourceLine> readable(int from, int to) {
        return lines.subList(from, to).stream()
                .filter(line -> !unreadable.contains(line.number()))
                .toList();
    }

    private Cell cell(int header, int next) {
        int number = cells.size() + 1;
        int line = lines.get(header).number();
        CellHeader head = CellHeader.read(lines.get(header), problems);
        String caption = head.caption();
        String source = source(header + 1, next);
        List<SourceLine> body = readable(header + 1, next).stream()
                .filter(each -> !CellHeader.reportIndented(each, head.kind(), problems))
                .toList();
        return switch (head.kind()) {
            case NOTE -> new Cell.Note(number, caption, line, source);
            case CALC -> new Cell.Calculation(number, caption, line, source);
            case GIVEN -> {
                GivenParser.Lines read = givens.parse(body);
                yield new Cell.Givens(number, caption, line, source, read.givens(), read.wrong());
            }
            case TOLERANCE ->
                new Cell.Tolerance(number, caption, line, source, ToleranceParser.parse(line, body, problems));
            case CHECK -> new Cell.Checks(number, caption, line, source, checks.parse(body));
        };
    }

    private String source(int from, int to) {
        int end = to;
        while (end > from && lines.get(end - 1).isBlank()) {
            end--;
        }
        List<String> texts =
                lines.subList(from, end).stream().map(SourceLine::text).toList();
        return String.join("\n", texts);
    }
}
