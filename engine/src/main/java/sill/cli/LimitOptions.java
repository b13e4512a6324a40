package sill.cli;

import java.time.Duration;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.Option;
import picocli.CommandLine.TypeConversionException;
import sill.worker.Limits;

/** The options that say what a run may take. */
final class LimitOptions {
    @Option(
            names = "--time-limit",
            paramLabel = "TIME",
            defaultValue = "60s",
            converter = Time.class,
            description = "longest time for one cell: 500ms, 60s, 5min (default: 60s)")
    private Duration time;

    @Option(
            names = "--memory",
            paramLabel = "SIZE",
            defaultValue = "512m",
            converter = Memory.class,
            description = "memory for the cells: 512m, 2g (default: 512m)")
    private Integer megabytes;

    Limits limits() {
        return new Limits(time, megabytes);
    }

    static final class Time implements ITypeConverter<Duration> {
        private static final Pattern FORM = Pattern.compile("(\\d{1,9})(ms|s|min)");

        @Override
        public Duration convert(String text) {
            Matcher form = FORM.matcher(text);
            if (!form.matches() || Long.parseLong(form.group(1)) == 0) {
                throw new TypeConversionException(
                        "found \"" + text + "\", expected a whole number above 0 with ms, s or min, as in 60s");
            }
            long number = Long.parseLong(form.group(1));
            return switch (form.group(2)) {
                case "ms" -> Duration.ofMillis(number);
                case "s" -> Duration.ofSeconds(number);
                default -> Duration.ofMinutes(number);
            };
        }
    }

    static final class Memory implements ITypeConverter<Integer> {
        private static final Pattern FORM = Pattern.compile("(\\d{1,6})([mg])", Pattern.CASE_INSENSITIVE);
        private static final int LEAST = 64;
        private static final int MOST = 1 << 20;

        @Override
        public Integer convert(String text) {
            Matcher form = FORM.matcher(text);
            long megabytes = !form.matches()
                    ? 0
                    : Long.parseLong(form.group(1)) * (form.group(2).equalsIgnoreCase("g") ? 1024 : 1);
            if (megabytes < LEAST || megabytes > MOST) {
                throw new TypeConversionException(
                        "found \"" + text + "\", expected at least 64m, with m for MiB or g for GiB, as in 512m");
            }
            return (int) megabytes;
        }
    }
}
