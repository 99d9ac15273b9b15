package freshet.catalogue;

import freshet.method.Constant;
import freshet.quantity.Alkalinity;
import freshet.quantity.Alternative;
import freshet.quantity.Feed;
import freshet.quantity.FlowPerDay;
import freshet.quantity.Nitrate;
import freshet.quantity.Nitrite;
import freshet.quantity.Temperature;
import freshet.quantity.TotalAmmonia;
import freshet.quantity.Volume;
import java.lang.annotation.Annotation;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;

/** The factors of all alternative inputs, read from the quantities that declare them. */
final class Conversions {

    private static final List<Class<? extends Annotation>> QUANTITIES = List.of(
            TotalAmmonia.class,
            Nitrite.class,
            Nitrate.class,
            Alkalinity.class,
            Temperature.class,
            Volume.class,
            FlowPerDay.class,
            Feed.class);

    private Conversions() {}

    static List<Constant> all() {
        return QUANTITIES.stream().flatMap(Conversions::of).toList();
    }

    private static Stream<Constant> of(Class<? extends Annotation> quantity) {
        return Arrays.stream(quantity.getAnnotationsByType(Alternative.class))
                .map(other ->
                        new Constant(other.by() + " to " + other.replacing(), shown(other.factor()), "1", note(other)));
    }

    /** Without the last digits, which only show that the factor is a double. */
    private static double shown(double factor) {
        return BigDecimal.valueOf(factor).round(new MathContext(12)).doubleValue();
    }

    private static String note(Alternative other) {
        return other.offset() == 0 ? "" : "after adding " + (long) other.offset();
    }
}
