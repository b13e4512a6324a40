package sill.tests.benchmark;

import java.io.IOException;
import java.net.MalformedURLException;
import java.net.URL;
import java.net.URLClassLoader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BiConsumer;
import java.util.stream.Stream;
import sill.study.Findings;
import sill.study.Model;
import sill.study.Progress;
import sill.study.Sampling;
import sill.study.Studied;
import sill.study.Study;
import sill.study.StudyPlan;
import sill.tests.Clone;

/**
 * A sheet's slice, repeated by the engine's study as the worker has it repeated. A model is loaded once and stays, as in a
 * worker, which studies its cell once: else the JVM would compile the slice anew for each run.
 */
final class SheetStudy {
    private final StudySheet sheet;
    private final Path classes;
    private final String slice;
    private final List<Model> models = new ArrayList<>();

    /**
     * One that is compiled already.
     *
     * @param classes folder of the slice's class files
     * @param slice name of its class
     */
    SheetStudy(StudySheet sheet, Path classes, String slice) {
        this.sheet = sheet;
        this.classes = classes;
        this.slice = slice;
    }

    Path classes() {
        return classes;
    }

    String slice() {
        return slice;
    }

    /** Cuts the slice out of a sheet and leaves its class files below a folder. */
    static SheetStudy of(StudySheet sheet, Path folder) throws IOException {
        Path classes = Files.createDirectories(folder.resolve(sheet.studied().get(0)));
        List<Path> stdlib = libraries().stream()
                .filter(jar -> jar.toString().contains("sill-stdlib"))
                .toList();
        return new SheetStudy(sheet, classes, sheet.compile(classes, stdlib).className());
    }

    /** Jars that the engine needs. */
    static List<Path> libraries() throws IOException {
        try (Stream<Path> jars = Files.list(Clone.root().resolve("engine/target/lib"))) {
            return jars.sorted().toList();
        }
    }

    /** Samples, or looks for the worst case where it is not said how to sample. */
    List<Findings> run(Optional<Sampling> sampling, int cores) throws InterruptedException {
        List<Studied> studied = sheet.studied().stream().map(Studied::of).toList();
        StudyPlan plan = new StudyPlan(sheet.givens(), studied, sampling.isEmpty(), false, sampling, cores);
        while (models.size() < cores) {
            models.add(model());
        }
        return Study.run(plan, models.iterator()::next, Progress.NONE);
    }

    private Model model() {
        try {
            // Not closed, for classes may be loaded later. State is static, so each model has a loader of its own.
            URLClassLoader loader =
                    new URLClassLoader(new URL[] {classes.toUri().toURL()});
            @SuppressWarnings("unchecked")
            BiConsumer<double[], double[]> calculation = (BiConsumer<double[], double[]>)
                    loader.loadClass(slice).getConstructor().newInstance();
            return calculation::accept;
        } catch (ReflectiveOperationException | MalformedURLException e) {
            throw new IllegalStateException("a slice's class is as it was written", e);
        }
    }
}
