package sill.sheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Pattern;
import sill.worksheet.Problem;

/**
 * The translation of one sheet, from its source to the class that is evaluated. Cells with a problem, and those that rest on
 * them, are left out of that class, so that all others run.
 */
public final class Translation {
    private final Program program;
    private final Names names;
    private final Map<String, String> types;
    private final Attribution attribution;
    private final Dependencies dependencies;
    private final List<Problem> problems = new ArrayList<>();
    private final Set<Integer> brokenCells = new HashSet<>();
    private final Set<Place> brokenChecks = new HashSet<>();
    private final Set<Snippet> brokenImports = new HashSet<>();
    private final Set<String> missingGivens = new HashSet<>();
    private final Map<String, Pattern> unavailable = new LinkedHashMap<>();

    private Translation(SheetSource source, Compiler compiler, Splitter splitter) {
        program = new ProgramReader(new SnippetParser(compiler), splitter).read(source);
        names = Names.of(program);
        source.givens().stream()
                .filter(given -> given.type() == SheetSource.GivenType.MISSING)
                .forEach(given -> missingGivens.add(given.name()));
        findFaults();
        types = new TypeFinder(compiler).find(program);
        findUnavailable();
        attribution = Attribution.of(new ClassText(program, types, brokenCells, brokenChecks), compiler);
        attribution.types().forEach(types::putIfAbsent);
        dependencies = new Dependencies(program, names, attribution.usages());
        attribution
                .errors()
                .forEach(error -> complain(attribution.text(), error.offset(), error.code(), error.message()));
        OrderRules.problems(names, attribution.usages()).forEach(this::add);
        captionFaults();
    }

    /** Translates a sheet. */
    public static Translation of(SheetSource source, Compiler compiler, Splitter splitter) {
        return new Translation(source, compiler, splitter);
    }

    /**
     * Takes a complaint about the class that {@link #sheet} gave: its cell or check is left out of the next one.
     *
     * @return whether something was found to leave out
     */
    public boolean leaveOut(TranslatedSheet.Code code, int offset, String message) {
        int before = brokenCells.size() + brokenChecks.size();
        complain(code.mapped(), offset, "", message);
        return brokenCells.size() + brokenChecks.size() > before;
    }

    /** The sheet as far as it can run. */
    public TranslatedSheet sheet() {
        Set<Integer> cells = new HashSet<>(brokenCells);
        Set<Place> checks = new HashSet<>(brokenChecks);
        List<TranslatedSheet.Step> steps = new ArrayList<>();
        for (Program.CellCode cell : program.cells()) {
            Map<String, Integer> needs = needs(cell.snippets());
            if (isLost(needs, cells)) {
                cells.add(cell.number());
            }
            steps.add(step(cell, needs, !cells.contains(cell.number())));
        }
        for (Program.CheckCode check : program.checks()) {
            Place place = check.line().place();
            Map<String, Integer> needs = needs(check.snippet().stream().toList());
            if (isLost(needs, cells)) {
                checks.add(place);
            }
            steps.add(step(check, needs, !checks.contains(place)));
        }
        steps.sort(Comparator.comparing(TranslatedSheet.Step::place));
        ClassText text = new ClassText(program, types, cells, checks);
        List<String> imports = new ArrayList<>();
        // Each import that the evaluator is given costs it as much as some lines of Java.
        Program.IMPORTS.stream()
                .filter(attribution.imports()::contains)
                .forEach(name -> imports.add("import " + name + ";"));
        program.imports().stream()
                .filter(snippet -> !brokenImports.contains(snippet))
                .forEach(
                        snippet -> imports.add(snippet.span().of(snippet.piece().text())));
        problems.sort(Comparator.comparingInt(Problem::line).thenComparingInt(Problem::column));
        return new TranslatedSheet(
                ClassText.NAME,
                ClassText.FIRST_LINE,
                imports,
                new TranslatedSheet.Code(text.declaration()),
                steps,
                missingGivens,
                problems);
    }

    private boolean isLost(Map<String, Integer> needs, Set<Integer> lostCells) {
        return needs.entrySet().stream()
                .anyMatch(need -> lostCells.contains(need.getValue()) || missingGivens.contains(need.getKey()));
    }

    private void findFaults() {
        program.cells().forEach(cell -> cell.faults().forEach(this::add));
        program.checks().forEach(check -> check.faults().forEach(this::add));
        names.problems().forEach(this::add);
    }

    /** Names that later cells may mention and the class can't give: they wait, and what the compiler says of that is no news. */
    private void findUnavailable() {
        for (Names.Declaration declaration : names.declarations().values()) {
            Snippet snippet = declaration.snippet();
            boolean noGiven = missingGivens.contains(declaration.name());
            boolean lostMember = declaration.isMember() && brokenCells.contains(declaration.cell());
            boolean open = declaration.kind() == Names.Kind.RESULT
                    && !types.containsKey(declaration.name())
                    && snippet.variables().stream()
                            .anyMatch(v -> v.name().equals(declaration.name()) && v.typeIsOpen());
            if (noGiven || lostMember || open) {
                unavailable.put(
                        declaration.name(),
                        Pattern.compile("(?<![\\w$.])" + Pattern.quote(declaration.name()) + "\\b"));
            }
        }
    }

    private void complain(MappedText text, int offset, String code, String message) {
        MappedText.Origin origin = text.origin(offset);
        Snippet snippet = snippetAt(origin);
        if (snippet != null && !missing(snippet).isEmpty()) {
            return;
        }
        if (snippet != null && snippet.kind() == Snippet.Kind.IMPORT) {
            brokenImports.add(snippet);
        }
        add(Wording.problem(
                origin.piece(),
                origin.offset(),
                code,
                message,
                names.declarations().keySet().stream()
                        .filter(name -> !name.startsWith("$"))
                        .toList()));
    }

    private void add(Problem problem) {
        Optional<Place> check = program.checks().stream()
                .map(each -> each.line().place())
                .filter(place -> place.line() == problem.line() && place.column() <= problem.column())
                .reduce((earlier, later) -> later);
        if (check.isPresent()) {
            brokenChecks.add(check.get());
        } else {
            brokenCells.add(problem.cell());
        }
        if (!problems.contains(problem)) {
            problems.add(problem);
        }
    }

    private void captionFaults() {
        for (Program.CellCode cell : program.cells()) {
            for (Snippet snippet : cell.snippets()) {
                Caption caption = snippet.caption();
                if (!caption.fault().isEmpty()) {
                    Place place = snippet.piece().place(caption.at());
                    problems.add(Problem.error(
                            place.line(),
                            place.column(),
                            cell.number(),
                            cell.piece().where() + ", unit in brackets: " + caption.fault(),
                            caption.hint()));
                }
            }
        }
    }

    private Snippet snippetAt(MappedText.Origin origin) {
        List<Snippet> candidates = new ArrayList<>();
        program.cells().stream()
                .filter(cell -> cell.piece() == origin.piece())
                .forEach(cell -> candidates.addAll(cell.snippets()));
        program.checks().stream()
                .filter(check -> check.piece() == origin.piece())
                .forEach(check -> check.snippet().ifPresent(candidates::add));
        return candidates.stream()
                .filter(snippet -> origin.offset() >= snippet.span().start()
                        && origin.offset() <= snippet.span().end())
                .findFirst()
                .orElse(null);
    }

    /** The unavailable names of other snippets that a snippet mentions. */
    private Set<String> missing(Snippet snippet) {
        if (unavailable.isEmpty()) {
            return Set.of();
        }
        String code = CodeText.codeOnly(snippet.span().of(snippet.piece().text()));
        Set<String> missing = new LinkedHashSet<>();
        unavailable.forEach((name, word) -> {
            if (names.declarations().get(name).snippet() != snippet
                    && word.matcher(code).find()) {
                missing.add(name);
            }
        });
        return missing;
    }

    private Map<String, Integer> needs(List<Snippet> snippets) {
        Map<String, Integer> needs = new LinkedHashMap<>();
        for (Snippet snippet : snippets) {
            Set<String> needed = new LinkedHashSet<>(dependencies.needs(snippet));
            needed.addAll(missing(snippet));
            for (String name : needed) {
                int cell = names.declarations().get(name).cell();
                if (cell != snippet.cell()) {
                    needs.put(name, cell);
                }
            }
        }
        return needs;
    }

    private TranslatedSheet.Step step(Program.CellCode cell, Map<String, Integer> needs, boolean runs) {
        List<TranslatedSheet.ResultField> results = new ArrayList<>();
        for (Program.Field field : cell.fields()) {
            String type = field.isOpen() ? types.getOrDefault(field.field(), "") : field.type();
            if (!type.equals(ClassText.NO_VALUE)) {
                results.add(result(field, type, results.size() + 1));
            }
        }
        return new TranslatedSheet.Step(
                cell.number(),
                new Place(cell.piece().line() - 1, 1),
                cell.piece().where(),
                runs ? Optional.of(ClassText.cellMethod(cell.number())) : Optional.empty(),
                needs,
                results,
                Optional.empty());
    }

    private TranslatedSheet.Step step(Program.CheckCode check, Map<String, Integer> needs, boolean runs) {
        List<String> uses = check.snippet().map(dependencies::readBy).orElse(List.of());
        return new TranslatedSheet.Step(
                check.line().cell(),
                check.line().place(),
                check.piece().where(),
                runs ? Optional.of(ClassText.checkMethod(check.line().place())) : Optional.empty(),
                needs,
                List.of(),
                Optional.of(new TranslatedSheet.CheckNames(uses, dependencies.closure(uses))));
    }

    private TranslatedSheet.ResultField result(Program.Field field, String type, int index) {
        Snippet snippet = field.snippet();
        Span formula = snippet.variables().stream()
                .filter(variable -> variable.name().equals(field.name()))
                .findFirst()
                .map(Snippet.Variable::initialiser)
                .orElse(snippet.expression());
        List<String> uses = dependencies.uses(field.field());
        Caption caption = snippet.caption();
        return new TranslatedSheet.ResultField(
                field.field(),
                field.name(),
                index,
                snippet.piece().place(field.at()).line(),
                formula.of(snippet.piece().text()).strip().replaceAll("\\s+", " "),
                TypeNames.withoutPackages(type),
                caption.unit()
                        .map(unit -> unit.coherent().symbol())
                        .orElse(attribution.units().getOrDefault(field.field(), "")),
                caption.unit().map(unit -> unit.symbol()).orElse(""),
                caption.text(),
                uses,
                dependencies.closure(uses));
    }
}
