package freshet.nitrite.web;

import freshet.answer.Answer;
import freshet.method.Validity;
import freshet.nitrite.ChlorideProtection;
import freshet.nitrite.ChlorideSalt;
import freshet.nitrite.SaltDose;
import java.util.Optional;
import java.util.OptionalDouble;

/** Puts together the answer on chloride against nitrite. */
final class ProtectionAnswer {

    private ProtectionAnswer() {}

    static Answer<NitriteProtectionResponse> to(NitriteProtectionRequest request) {
        ChlorideProtection protection = request.protection();
        Optional<SaltDose> dose = dose(request, protection);
        return new Answer<>(
                response(protection, dose),
                ChlorideProtection.METHOD,
                Validity.WITHIN,
                new ProtectionNotices(request, protection, dose).all());
    }

    private static NitriteProtectionResponse response(ChlorideProtection protection, Optional<SaltDose> dose) {
        return new NitriteProtectionResponse(
                protection.suffices(),
                protection.presentMassRatio(),
                protection.requiredMgPerL(),
                protection.deficitMgPerL(),
                protection.no2NLimitMgPerL(),
                dose.map(SaltDose::grams).map(OptionalDouble::of).orElse(OptionalDouble.empty()),
                dose.map(SaltDose::dissolvedSaltRiseMgPerL)
                        .map(OptionalDouble::of)
                        .orElse(OptionalDouble.empty()));
    }

    private static Optional<SaltDose> dose(NitriteProtectionRequest request, ChlorideProtection protection) {
        Double volume = request.volumeL();
        ChlorideSalt salt = request.chemical();
        if (volume == null || salt == null) {
            return Optional.empty();
        }
        Double percent = request.purityPercent();
        double purity = percent == null ? 1 : percent / 100;
        return Optional.of(new SaltDose(protection.deficitMgPerL(), volume, salt, purity));
    }
}
