package freshet.nitrite.web;

import freshet.nitrite.ChlorideProtection;
import freshet.nitrite.ChlorideSalt;
import freshet.quantity.ChlorideRatio;
import freshet.quantity.Choice;
import freshet.quantity.Mineral;
import freshet.quantity.Nitrite;
import freshet.quantity.Purity;
import freshet.quantity.Together;
import freshet.quantity.Volume;
import jakarta.validation.constraints.NotNull;
import org.jspecify.annotations.Nullable;

@Together(given = "volume_l", needs = "chemical")
@Together(given = "chemical", needs = "volume_l")
record NitriteProtectionRequest(
        @NotNull @Nitrite Double no2NMgPerL,
        @NotNull @Mineral("Chloride now") Double chlorideMgPerL,
        @NotNull @ChlorideRatio(RATIO) Double chlorideToNo2NMassRatio,

        @Volume("Volume of water to be salted; needed with chemical") @Nullable
        Double volumeL,

        @Choice("Salt that would bring the missing chloride; needs volume_l") @Nullable
        ChlorideSalt chemical,

        @Purity("Purity of the chemical; by default 100; only with chemical") @Nullable
        Double purityPercent) {

    /** Tells the published figures on the basis of this input, because each of them is quoted on another. */
    static final String RATIO =
            "Wanted ratio of chloride to nitrite, mg/L Cl per mg/L NO2-N, neither molar nor per NO2."
                    + " Published figures on this basis: 40.5 kept channel catfish free of methaemoglobin (16 molar, Tomasso et"
                    + " al. 1979); catfish ponds 10 if the test kit reads NO2-N, 32.8 if it reads NO2 (10 as quoted, SRAC"
                    + " Publication 462); British Columbia guideline 33.3 short-term and 100 as 30-day mean; EIFAC 1984 at low"
                    + " chloride 100 for salmonids and 50 for coarse fish";

    ChlorideProtection protection() {
        return new ChlorideProtection(no2NMgPerL, chlorideMgPerL, chlorideToNo2NMassRatio);
    }
}
