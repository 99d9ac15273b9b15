package freshet.nitrification.web;

import freshet.answer.Notice;
import freshet.nitrification.FilterWater;
import freshet.nitrification.Rate;
import java.util.ArrayList;
import java.util.List;

/** What the reader of any answer on a biofilter must know. */
final class BiofilterNotices {

    private final List<Notice> notices = new ArrayList<>();

    /** Below 2 mg/L at the media. */
    BiofilterNotices oxygen(FilterWater water) {
        return when(
                water.oxygenCritical(),
                "oxygen-critical",
                "dissolved_oxygen_mg_per_l",
                "Below 2 mg/L at the media little is oxidized and NH3 keeps rising; fish are in danger from oxygen first.");
    }

    /** What the spread of the rate means, or that there is none. */
    BiofilterNotices spread(Rate rate, boolean measured, String field) {
        if (rate.lower().isEmpty()) {
            return when(
                    true,
                    "no-published-spread",
                    field,
                    "At the temperature of the measurement nothing published spreads; a mature, untreated film is assumed.");
        }
        return when(
                true,
                "published-spread",
                field,
                measured
                        ? "Lower and upper span published effects of temperature only; a mature, untreated film is assumed;"
                                + " nitrite may lag."
                        : "Published rates spread five- to tenfold; a mature, untreated film is assumed; TAN only, nitrite"
                                + " may lag.");
    }

    /** A measured rate that is raised, and an estimate that its spread does not hold. */
    BiofilterNotices measured(Rate rate, boolean measured) {
        return when(
                        measured && rate.aboveReference(),
                        "above-measured-rate",
                        rate.perVolume() ? ReferenceInputs.PER_VOLUME : ReferenceInputs.PER_AREA,
                        "The rate is put above the one that was measured: confirm it by measurement before relying on it.")
                .when(
                        measured && rate.aboveSpread(),
                        "above-published-spread",
                        "temperature_method",
                        "This temperature_method credits more than the published spread of films does.");
    }

    /** Films grown at low pH. */
    BiofilterNotices lowPh(FilterWater water) {
        return when(
                water.favoursAcclimatedFilm(),
                "acclimated-film",
                "ph",
                "Films grown at this pH may lose little: measure the rate. Never raise pH for capacity before the rise of"
                        + " NH3 is known.");
    }

    BiofilterNotices inputs(InputNotUsed notUsed) {
        notices.addAll(notUsed.notices());
        return this;
    }

    BiofilterNotices when(boolean holds, String code, String field, String detail) {
        if (holds) {
            notices.add(new Notice(code, field, detail));
        }
        return this;
    }

    List<Notice> inOrder() {
        return notices;
    }
}
