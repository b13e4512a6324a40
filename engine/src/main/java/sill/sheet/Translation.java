package sill.sheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.IdentityHashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import sill.words.Quoted;
import sill.worksheet.Problem;

/**
 * The translation of one sheet, from its source to the class that is evaluated. Cells with a problem, and those that rest on
 * them, are left out of that class, so that all others run.
 */
public final class Translation {
    /** Imported in every worksheet without asking. */
    public static final List<String> IMPORTS = List.of(
            "sill.stdlib.*",
            "java.util.*",
            "java.util.function.*",
            "java.util.stream.*",
            "java.math.*",
            "static java.lang.Math.*");

    private final Program program;
    private final Names names;
    private final SheetUnits units;
    private final Map<String, String> types;
    private final Attribution attribution;
    private final Dependencies dependencies;
    private final Steadiness steadiness;
    private final Set<Problem> problems = new LinkedHashSet<>();
    private final Set<Integer> brokenCells = new HashSet<>();
    private final Set<Snippet> brokenImports = new HashSet<>();
    private final TreeMap<Place, Place> checkPlaces = new TreeMap<>();
    private final Set<Place> brokenChecks = new HashSet<>();
    private final Set<String> missingGivens = new HashSet<>();
    private final Set<String> unavailable = new HashSet<>();
    private final Map<Snippet, Set<String>> waits = new IdentityHashMap<>();
    private final Map<String, String> hints = new HashMap<>();
    private final SnippetFinder snippets;
    private final Compiler compiler;

    private Translation(SheetSource source, Compiler compiler, Splitter splitter) {
        this.compiler = compiler;
        program = new ProgramReader(new SnippetParser(compiler), splitter).read(source);
        names = Names.of(program);
        snippets = new SnippetFinder(program);
        source.checks().forEach(check -> checkPlaces.put(check.place(), check.place()));
        units = new SheetUnits(program);
        source.givens().stream()
                .filter(given -> given.type() == SheetSource.GivenType.MISSING)
                .forEach(given -> missingGivens.add(given.name()));
        program.cells().forEach(cell -> cell.faults().forEach(this::add));
        program.checks().forEach(check -> check.faults().forEach(this::add));
        names.problems().forEach(this::add);
        types = new TypeFinder(compiler).find(program);
        findUnavailable();
        attribution = Attribution.of(ClassText.whole(program, types, names.again()), compiler, units);
        attribution.types().forEach(types::putIfAbsent);
        dependencies = new Dependencies(program, names, attribution.usages(), snippets);
        steadiness = new Steadiness(program, types, attribution.usages());
        attribution.errors().forEach(error -> complain(attribution.text(), error));
        OrderRules.problems(names, attribution.usages()).forEach(this::add);
        findOpenTypes();
        captionFaults();
        problems.addAll(units.problems(attribution.inferred(), attribution.text()));
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
    public boolean leaveOut(TranslatedSheet.Code code, Compiler.Complaint complaint) {
        int before = brokenCells.size() + brokenChecks.size();
        complain(code.mapped(), complaint);
        return brokenCells.size() + brokenChecks.size() > before;
    }

    /** The sheet as far as it can run. */
    public TranslatedSheet sheet() {
        Set<Integer> cells = new HashSet<>(brokenCells);
        Set<Place> checks = new HashSet<>(brokenChecks);
        List<TranslatedSheet.Step> steps = new ArrayList<>();
        for (Program.CellCode cell : program.cells()) {
            Map<String, Integer> needs = needs(cell.snippets());
            if (brokenCells.contains(cell.number())) {
                // It would not run if all it waits on did.
                needs = Map.of();
            } else if (isLost(needs, cells)) {
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
        ClassText text = ClassText.running(program, types, cells, checks);
        List<String> imports = new ArrayList<>();
        program.imports().stream()
                .filter(snippet -> !brokenImports.contains(snippet))
                .forEach(snippet -> imports.add(
                        CodeText.oneLine(snippet.span().of(snippet.piece().text())) + (snippet.isWhole() ? "" : ";")));
        List<Problem> sorted = new ArrayList<>(problems);
        sorted.sort(Comparator.comparingInt(Problem::line).thenComparingInt(Problem::column));
        return new TranslatedSheet(
                ClassText.NAME,
                ClassText.FIRST_LINE,
                imports,
                new TranslatedSheet.Code(text.declaration()),
                steps,
                missingGivens,
                sorted);
    }

    /** What cuts slices out of the sheet as it runs. */
    public Slicer slicer() {
        return new Slicer(program, types, dependencies, compiler);
    }

    private boolean isLost(Map<String, Integer> needs, Set<Integer> lostCells) {
        return needs.entrySet().stream()
                .anyMatch(need -> lostCells.contains(need.getValue()) || missingGivens.contains(need.getKey()));
    }

    /** Names that the class can't give: what uses them waits, and what the compiler says of that is no news. */
    private void findUnavailable() {
        unavailable.addAll(missingGivens);
        for (Names.Declaration declaration : names.declarations().values()) {
            if (declaration.kind() == Names.Kind.LOST) {
                unavailable.add(declaration.name());
            }
        }
        unavailable.addAll(program.openVariables().keySet());
        unavailable.removeAll(types.keySet());
    }

    private void complain(MappedText text, Compiler.Complaint complaint) {
        MappedText.Origin origin = text.origin(complaint.offset());
        Optional<Snippet> snippet = snippets.at(origin.piece(), origin.offset());
        String unknown = Wording.unknownName(complaint);
        if (snippet.isPresent() && unavailable.contains(unknown)) {
            waits.computeIfAbsent(snippet.get(), each -> new LinkedHashSet<>()).add(unknown);
            return;
        }
        snippet.filter(each -> each.kind() == Snippet.Kind.IMPORT).ifPresent(brokenImports::add);
        // The same slip may stand on many lines, and a search among many names takes its time.
        String hint = unknown.isEmpty()
                ? Wording.hint(complaint)
                : hints.computeIfAbsent(unknown, name -> Wording.meant(name, knownWords(complaint)));
        add(Wording.problem(origin.piece(), origin.offset(), complaint, hint));
    }

    /** What a misspelt name may have been meant to be, the worksheet's own names first. */
    private List<String> knownWords(Compiler.Complaint complaint) {
        boolean type = Wording.isAboutType(complaint);
        List<String> words = new ArrayList<>();
        for (Names.Declaration declaration : names.declarations().values()) {
            if (!declaration.name().startsWith("$") && (!type || declaration.kind() == Names.Kind.TYPE)) {
                words.add(declaration.name());
            }
        }
        words.addAll(type ? attribution.known().types() : attribution.known().names());
        return words;
    }

    /** Each check line is left out alone, a calculation cell as a whole. */
    private void add(Problem problem) {
        Place place = checkPlaces.floorKey(new Place(problem.line(), problem.column()));
        if (place != null && place.line() == problem.line()) {
            brokenChecks.add(place);
        } else {
            brokenCells.add(problem.cell());
        }
        problems.add(problem);
    }

    /** Where nothing explains why a type could not be found, its author can still help. */
    private void findOpenTypes() {
        program.openVariables().forEach((name, field) -> {
            Snippet snippet = field.snippet();
            if (!types.containsKey(name) && !brokenCells.contains(snippet.cell()) && !waits.containsKey(snippet)) {
                add(Wording.problem(
                        snippet.piece(),
                        field.typeSpan().start(),
                        Compiler.Complaint.ours("found no type for " + Quoted.of(name)),
                        "Write it in place of 'var'."));
            }
        });
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
                            cell.piece().where() + ": " + Wording.within(caption.fault()),
                            caption.hint()));
                }
            }
        }
    }

    private Map<String, Integer> needs(List<Snippet> snippets) {
        Map<String, Integer> needs = new LinkedHashMap<>();
        for (Snippet snippet : snippets) {
            Set<String> needed = new LinkedHashSet<>(dependencies.needs(snippet));
            needed.addAll(waits.getOrDefault(snippet, Set.of()));
            for (String name : dependencies.inOrder(needed)) {
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
                cell.isStudy(),
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
                false,
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
                snippet.piece().place(field.typeSpan().start()).line(),
                CodeText.oneLine(formula.of(snippet.piece().text())),
                TypeNames.withoutPackages(type),
                SheetUnits.unit(field, attribution.inferred()),
                SheetUnits.components(field, attribution.inferred()),
                caption.unit().map(unit -> unit.symbol()).orElse(""),
                caption.text(),
                uses,
                dependencies.closure(uses),
                Optional.ofNullable(attribution.formulas().get(field.field()))
                        .filter(read -> steadiness.holds(field.field(), snippet, read))
                        .map(FormulaReader.Formula::expression));
    }
}
