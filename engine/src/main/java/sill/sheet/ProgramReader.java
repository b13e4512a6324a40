package sill.sheet;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sill.worksheet.Problem;

/** Splits and parses the cells and checks of a sheet into a {@link Program}. */
final class ProgramReader {
    private final SnippetParser parser;
    private final Splitter splitter;

    ProgramReader(SnippetParser parser, Splitter splitter) {
        this.parser = parser;
        this.splitter = splitter;
    }

    Program read(SheetSource source) {
        return new Program(source.givens(), cells(source.cells()), checks(source.checks()));
    }

    private List<Program.CellCode> cells(List<SheetSource.CodeCell> cells) {
        List<SnippetParser.Raw> raws = new ArrayList<>();
        List<SnippetParser.Raw> studied = new ArrayList<>();
        Map<SheetSource.CodeCell, Piece> pieces = new LinkedHashMap<>();
        for (SheetSource.CodeCell cell : cells) {
            Piece piece = Piece.of(cell);
            pieces.put(cell, piece);
            String code = CodeText.codeOnly(piece.text());
            for (Span span : cell.studied()) {
                studied.add(new SnippetParser.Raw(piece, code, span, Caption.NONE));
            }
            for (Span span : cell.studied().isEmpty() ? splitter.split(piece.text()) : List.<Span>of()) {
                raws.add(new SnippetParser.Raw(piece, code, span, caption(piece, code, span)));
            }
        }
        List<SnippetParser.Parsed> all = new ArrayList<>(parser.parse(raws));
        all.addAll(parser.parseExpressions(studied));
        Map<Integer, List<SnippetParser.Parsed>> byCell = new HashMap<>();
        for (SnippetParser.Parsed parsed : all) {
            byCell.computeIfAbsent(parsed.raw().piece().cell(), cell -> new ArrayList<>())
                    .add(parsed);
        }
        List<Program.CellCode> read = new ArrayList<>();
        pieces.forEach((cell, piece) ->
                read.add(cell(piece, !cell.studied().isEmpty(), byCell.getOrDefault(piece.cell(), List.of()))));
        return read;
    }

    private static Program.CellCode cell(Piece piece, boolean study, List<SnippetParser.Parsed> parsed) {
        List<Snippet> snippets = new ArrayList<>();
        List<Problem> faults = new ArrayList<>();
        Map<String, Integer> lost = new LinkedHashMap<>();
        for (SnippetParser.Parsed each : parsed) {
            if (each.snippet().isPresent()) {
                snippets.add(each.snippet().get());
            } else {
                SnippetParser.Raw raw = each.raw();
                faults.add(problem(
                        piece, Brackets.fault(raw.codeOnly(), raw.span()).orElse(each.fault())));
                lost.putAll(LostNames.in(raw.codeOnly(), raw.span()));
            }
        }
        int comment = CodeText.unclosedComment(piece.text());
        if (comment >= 0) {
            faults.add(problem(piece, new SnippetParser.Fault(comment, Wording.OURS, "found '/*' without its '*/'")));
            lost.putAll(
                    LostNames.in(piece.text(), new Span(comment, piece.text().length())));
        }
        return new Program.CellCode(piece, study, List.copyOf(snippets), List.copyOf(faults), lost);
    }

    private List<Program.CheckCode> checks(List<SheetSource.CheckLine> lines) {
        List<SnippetParser.Raw> raws = new ArrayList<>();
        for (SheetSource.CheckLine line : lines) {
            Piece piece = Piece.of(line);
            Span all = new Span(0, piece.text().length());
            raws.add(new SnippetParser.Raw(piece, CodeText.codeOnly(piece.text()), all, Caption.NONE));
        }
        List<Program.CheckCode> checks = new ArrayList<>();
        List<SnippetParser.Parsed> parsed = parser.parseExpressions(raws);
        for (int i = 0; i < lines.size(); i++) {
            Piece piece = raws.get(i).piece();
            Optional<Snippet> snippet = parsed.get(i).snippet();
            List<Problem> faults = snippet.isPresent()
                    ? List.of()
                    : List.of(problem(piece, parsed.get(i).fault()));
            checks.add(new Program.CheckCode(lines.get(i), piece, snippet, faults));
        }
        return checks;
    }

    private static Problem problem(Piece piece, SnippetParser.Fault fault) {
        Compiler.Complaint complaint = new Compiler.Complaint(fault.offset(), fault.code(), fault.message());
        return Wording.problem(piece, fault.offset(), complaint, Wording.hint(complaint));
    }

    /** The comment behind a snippet, on the line it ends on. */
    private static Caption caption(Piece piece, String code, Span span) {
        int end = CodeText.endOfCode(code, span.start(), span.end());
        int lineEnd = piece.text().indexOf('\n', end);
        String rest = piece.text().substring(end, lineEnd < 0 ? piece.text().length() : lineEnd);
        // With a second snippet on the line the comment belongs to that one.
        String codeBehind = code.substring(end, end + rest.length()).strip();
        int slashes = rest.indexOf("//");
        if (slashes < 0 || !(codeBehind.isEmpty() || codeBehind.equals(";"))) {
            return Caption.NONE;
        }
        return Caption.read(rest.substring(slashes + 2), end + slashes + 2);
    }
}
