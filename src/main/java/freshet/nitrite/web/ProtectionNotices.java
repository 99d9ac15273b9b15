package freshet.nitrite.web;

import freshet.answer.Notice;
import freshet.http.media.SixDigits;
import freshet.nitrite.ChlorideProtection;
import freshet.nitrite.ChlorideRatios;
import freshet.nitrite.ChlorideSalt;
import freshet.nitrite.SaltDose;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** What a reader must know who relies on chloride or doses it. */
record ProtectionNotices(NitriteProtectionRequest request, ChlorideProtection protection, Optional<SaltDose> dose) {

    /** All of them, the most serious first; never more than five. */
    List<Notice> all() {
        List<Notice> notices = new ArrayList<>();
        dose.filter(salt -> salt.days() > 0).ifPresent(salt -> notices.add(pace(salt)));
        basis(notices);
        notices.add(new Notice(
                "species-not-protected",
                "protected",
                "Chloride protects some species only (not largemouth bass); sick fish bear less. Bring nitrite down as"
                        + " well."));
        if (!protection.suffices()) {
            salt(notices);
        }
        absent(notices);
        return notices;
    }

    private static Notice pace(SaltDose salt) {
        String detail = "Dissolve it first and spread it over hours, at most 1 g/L of salt a day";
        return salt.days() > 1
                ? new Notice(
                        "salt-over-days",
                        "dose_g",
                        detail + ": at least " + SixDigits.text(salt.days()) + " days. Lower nitrite by other means.")
                : new Notice("salt-over-hours", "dose_g", detail + ".");
    }

    private void basis(List<Notice> notices) {
        double full = ChlorideRatios.published().full();
        if (protection.massRatio() < full) {
            notices.add(new Notice(
                    "ratio-below-full-protection",
                    "chloride_to_no2_n_mass_ratio",
                    "Full protection of channel catfish took 16 molar, which is " + SixDigits.text(rounded(full))
                            + " here (Cl : NO2-N by mass): check the basis of your figure."));
        }
    }

    private void salt(List<Notice> notices) {
        ChlorideSalt chemical = request.chemical();
        if (chemical == null || chemical == ChlorideSalt.SODIUM_CHLORIDE) {
            notices.add(new Notice(
                    "sodium-and-plants",
                    "chloride_deficit_mg_per_l",
                    "Sodium from sodium chloride builds up and harms plants; they suffer above about 0.5 to 1 g/L of"
                            + " salt."));
            return;
        }
        if (chemical == ChlorideSalt.POTASSIUM_CHLORIDE) {
            notices.add(new Notice(
                    "potassium-high", "chemical", "Much potassium harms fish: keep the dose small and watch them."));
        }
        if (dose.filter(SaltDose::harmsPlants).isPresent()) {
            notices.add(new Notice(
                    "salt-and-plants",
                    "dissolved_salt_rise_mg_per_l",
                    "Plants suffer above about 0.5 to 1 g/L of salt."));
        }
    }

    private void absent(List<Notice> notices) {
        if (protection.presentMassRatio().isEmpty()) {
            notices.add(new Notice("no-nitrite", "present_mass_ratio", "Without nitrite there is no ratio to it."));
        }
        if (dose.isEmpty() && request.purityPercent() != null) {
            notices.add(new Notice(
                    "input-not-used", "purity_percent", "It belongs to chemical and volume_l, which were not given."));
        }
    }

    private static double rounded(double ratio) {
        return Math.rint(10 * ratio) / 10;
    }
}
