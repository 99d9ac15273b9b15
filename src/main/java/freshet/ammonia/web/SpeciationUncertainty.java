package freshet.ammonia.web;

import freshet.ammonia.AmmoniaUncertainty;
import freshet.answer.Notice;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** The uncertainty of one speciation, from what the caller knows of his sensors. */
record SpeciationUncertainty(AmmoniaSpeciationRequest request, DissociationChoice choice) {

    /**
     * Standard uncertainties relative to their values.
     *
     * @param all of un-ionized ammonia
     * @param tan of total ammonia, a part of it
     */
    record Relative(double all, double tan) {

        AmmoniaUncertainty.Bounds bounds() {
            return AmmoniaUncertainty.bounds(all, tan);
        }
    }

    /** Relative to the values; empty where there is no ammonia. */
    Optional<Relative> relative() {
        if (request.tanMgPerL() == 0) {
            return Optional.empty();
        }
        double tan = known(request.tanStandardUncertaintyMgPerL()) / request.tanMgPerL();
        double all = AmmoniaUncertainty.relative(
                choice.water(),
                choice.dissociation(),
                new AmmoniaUncertainty.Sensors(
                        tan, known(request.phStandardUncertainty()), known(request.temperatureStandardUncertaintyC())));
        return Optional.of(new Relative(all, tan));
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
