package freshet.quantity;

import static org.assertj.core.api.Assertions.assertThat;

import freshet.acidity.PhScale;
import freshet.answer.Fault;
import freshet.answer.Refusal;
import freshet.http.binding.Names;
import freshet.http.binding.Request;
import freshet.http.binding.Shape;
import jakarta.validation.Validation;
import jakarta.validation.Validator;
import jakarta.validation.ValidatorFactory;
import java.nio.charset.StandardCharsets;
import java.util.Set;
import java.util.SplittableRandom;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;

/** The annotations mean to any Jakarta Validation implementation what they mean to the binder. */
class JakartaValidationTest {

    private static final Shape<Sample> SHAPE = Shape.of(Sample.class);

    @Test
    void theBinderAndAValidatorFindTheSameFaults() {
        SplittableRandom random = new SplittableRandom(380);
        try (ValidatorFactory factory = Validation.buildDefaultValidatorFactory()) {
            int faulty = 0;
            for (int i = 0; i < 3000; i++) {
                Sample sample = new Sample(
                        maybe(random, -1, 15), maybe(random, -5, 65), random.nextDouble(-3, 50), PhScale.NBS);
                Set<String> validated = validated(factory.getValidator(), sample);
                assertThat(bound(sample)).as(sample.toString()).isEqualTo(validated);
                faulty += validated.isEmpty() ? 0 : 1;
            }
            assertThat(faulty).isBetween(500, 2900);
        }
    }

    private static Set<String> validated(Validator validator, Sample sample) {
        return validator.validate(sample).stream()
                .map(violation -> Names.snake(violation.getPropertyPath().toString()))
                .collect(Collectors.toCollection(TreeSet::new));
    }

    private static Set<String> bound(Sample sample) {
        String json = "{" + member("ph", sample.ph()) + member("temperature_c", sample.temperatureC()) + "\"salinity\":"
                + sample.salinity() + "}";
        try {
            Request.fromJson(SHAPE, json.getBytes(StandardCharsets.UTF_8), null);
            return Set.of();
        } catch (Refusal refusal) {
            return refusal.faults().stream().map(Fault::field).collect(Collectors.toCollection(TreeSet::new));
        }
    }

    private static String member(String name, @Nullable Double value) {
        return value == null ? "" : "\"" + name + "\":" + value + ",";
    }

    private static @Nullable Double maybe(SplittableRandom random, double from, double to) {
        return random.nextInt(8) == 0 ? null : random.nextDouble(from, to);
    }
}
