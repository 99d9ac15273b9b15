package freshet.nitrification;

import static org.assertj.core.api.Assertions.assertThatCode;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import freshet.method.Method;
import java.util.function.Consumer;

/** Shows that every constant of a method is held by reference values: 0.1 % off, and they must fail. */
final class Nudge {

    private Nudge() {}

    static void everyConstantMatters(Method method, Consumer<double[]> check) {
        assertThatCode(() -> check.accept(method.values())).doesNotThrowAnyException();
        for (int i = 0; i < method.values().length; i++) {
            double[] nudged = method.values();
            if (nudged[i] != 0) {
                nudged[i] *= 1.001;
                assertThatThrownBy(() -> check.accept(nudged))
                        .as(method.constants().get(i).symbol())
                        .isInstanceOf(AssertionError.class);
            }
        }
    }
}
