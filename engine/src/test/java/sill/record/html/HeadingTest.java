package sill.record.html;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import sill.record.DesignRecord.Verdict;
import sill.record.Records;
import sill.worksheet.Problem;

class HeadingTest {
    @Test
    void theVerdictInWords() {
        assertThat(Heading.outcomeSentence(Records.ofChecks())).isEqualTo("The worksheet states no checks.");
        assertThat(Heading.outcomeSentence(Records.ofChecks(Records.check(Verdict.HOLDS))))
                .isEqualTo("The one check holds.");
        assertThat(Heading.outcomeSentence(
                        Records.ofChecks(Records.check(Verdict.HOLDS), Records.check(Verdict.HOLDS))))
                .isEqualTo("All 2 checks hold.");
        assertThat(Heading.outcomeSentence(
                        Records.ofChecks(Records.check(Verdict.HOLDS), Records.check(Verdict.FAILS))))
                .isEqualTo("1 of 2 checks holds, 1 fails.");
        assertThat(Heading.outcomeSentence(Records.ofChecks(Records.check(Verdict.NOT_JUDGED))))
                .isEqualTo("The one check is not judged.");
        assertThat(Heading.outcomeSentence(Records.ofChecks(Records.check(Verdict.FAILS))))
                .isEqualTo("The one check fails.");
        assertThat(Heading.outcomeSentence(Records.ofProblems(
                        "", Problem.error(5, 1, 1, "wrong", ""), Problem.warning(5, 1, 1, "odd", ""))))
                .isEqualTo("The worksheet states no checks; the worksheet has 1 problem.");
    }
}
