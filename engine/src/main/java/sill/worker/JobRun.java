package sill.worker;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import sill.sheet.Compiler;
import sill.sheet.Place;
import sill.sheet.TranslatedSheet;
import sill.sheet.Translation;
import sill.worksheet.Problem;

/** Does one {@link Job} in this process, from its text to the last report. */
final class JobRun {
    private final Compiler compiler;
    private final CapturedOutput output;
    private final Consumer<Report> reports;

    /**
     * @param output where {@code System.out} leads
     * @param reports takes each report as it comes
     */
    JobRun(Compiler compiler, CapturedOutput output, Consumer<Report> reports) {
        this.compiler = compiler;
        this.output = output;
        this.reports = reports;
    }

    void run(Job job, Evaluator evaluator) throws ReflectiveOperationException {
        reports.accept(new Report.Begun(0, new Place(1, 1)));
        GivenValues givens = GivenValues.of(job);
        Translation translation = Translation.of(givens.source(), compiler, evaluator.splitter());
        TranslatedSheet sheet = translation.sheet();
        Evaluator.Evaluation evaluation = evaluator.evaluate(sheet);
        while (evaluation.sheet() == null) {
            boolean less = false;
            for (Compiler.Complaint rejection : evaluation.rejections()) {
                less |= translation.leaveOut(sheet.code(), rejection);
            }
            if (!less) {
                throw new IllegalStateException("the sheet's class was refused: " + evaluation.rejections());
            }
            sheet = translation.sheet();
            evaluation = evaluator.evaluate(sheet);
        }
        List<Problem> problems = new ArrayList<>(givens.problems());
        problems.addAll(sheet.problems());
        reports.accept(new Report.Translated(problems));
        givens.set(evaluation.sheet());
        Studies studies = new StudyRunner(translation.slicer(), sheet, givens, job, reports);
        new StepRunner(sheet, evaluation.sheet(), job.leftOut(), output, studies, reports).run(givens.present());
    }
}
