package freshet.ammonia.web;

import freshet.ammonia.AmmoniaUncertainty;
import freshet.answer.Notice;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;

/** The uncertainty of one speciation, from what the caller knows of his sensors. */
record SpeciationUncertainty(AmmoniaSpeciationRequest request, DissociationChoice choice) {

    /** Relative to un-ionized ammonia; empty where there is none. */
    OptionalDouble relative() {
        double tan = request.tanMgPerL();
        if (tan == 0) {
            return OptionalDouble.empty();
        }
        return OptionalDouble.of(AmmoniaUncertainty.relative(
                choice.water(),
                choice.dissociation(),
                new AmmoniaUncertainty.Sensors(
                        known(request.tanStandardUncertaintyMgPerL()) / tan,
                        known(request.phStandardUncertainty()),
                        known(request.temperatureStandardUncertaintyC()))));
    }

    private static double known(@Nullable Double uncertainty) {
        return uncertainty == null ? 0 : uncertainty;
    }

    /** What the reader must know, of the uncertainty first. */
    List<Notice> notices() {
        List<Notice> notices = new ArrayList<>();
        if (request.tanMgPerL() == 0) {
            notices.add(new Notice(
                    "no-relative-uncertainty",
                    "tan_mg_per_l",
                    "Without any ammonia there is no relative uncertainty; the bounds are left out."));
        }
        List<String> left = new ArrayList<>();
        note("tan_standard_uncertainty_mg_per_l", request.tanStandardUncertaintyMgPerL(), left);
        note("ph_standard_uncertainty", request.phStandardUncertainty(), left);
        note("temperature_standard_uncertainty_c", request.temperatureStandardUncertaintyC(), left);
        if (!left.isEmpty()) {
            notices.add(new Notice(
                    "uncertainty-incomplete",
                    left.get(0),
                    "Not given and so not counted: " + String.join(", ", left) + "."));
        }
        notices.addAll(choice.notices());
        return notices;
    }

    private static void note(String name, @Nullable Double given, List<String> left) {
        if (given == null) {
            left.add(name);
        }
    }
}
