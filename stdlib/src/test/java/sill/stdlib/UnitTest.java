package sill.stdlib;

import static org.assertj.core.api.Assertions.assertThat;

import java.lang.reflect.Method;
import java.lang.reflect.Parameter;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** Helpers say the unit of every number they take and give. */
class UnitTest {
    private static final Set<Class<?>> HELPERS =
            Set.of(Dividers.class, Comparators.class, TripPoints.class, Filters.class, Series.class, MarkingCode.class);

    @Test
    void everyNumberHasAUnit() {
        List<String> without = new ArrayList<>();
        int numbers = 0;
        for (Method method : Helpers.methods()) {
            if (!HELPERS.contains(method.getDeclaringClass())) {
                continue;
            }
            if (isNumber(method.getReturnType())) {
                numbers++;
                if (method.getAnnotation(Unit.class) == null) {
                    without.add(method + ": result");
                }
            }
            for (Parameter parameter : method.getParameters()) {
                if (isNumber(parameter.getType())) {
                    numbers++;
                    if (parameter.getAnnotation(Unit.class) == null) {
                        without.add(method + ": " + parameter.getName());
                    }
                }
            }
        }
        assertThat(without).isEmpty();
        assertThat(numbers).isGreaterThanOrEqualTo(60);
    }

    @Test
    void recordComponentsCarryTheirUnit() {
        assertThat(TripPoints.class.getRecordComponents())
                .hasSize(2)
                .allSatisfy(component ->
                        assertThat(component.getAnnotation(Unit.class).value()).isEqualTo("V"));
    }

    private static boolean isNumber(Class<?> type) {
        return type == double.class || type == double[].class;
    }
}
