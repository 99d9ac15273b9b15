package freshet.nitrite.web;

import freshet.nitrite.NitriteSpeciation;
import freshet.quantity.Reported;

record NitriteSpeciationResponse(
        @Reported("Nitrous acid, HNO2, as N") double hno2NMgPerL,
        @Reported("Nitrite ion, NO2-, as N") double nitriteIonNMgPerL,

        @Reported("Share of total nitrite that is nitrous acid, 0 to 1")
        double hno2Fraction,

        @Reported("pKa of nitrous acid at infinite dilution")
        double pka) {

    static NitriteSpeciationResponse of(NitriteSpeciation speciation) {
        return new NitriteSpeciationResponse(
                speciation.hno2NMgPerL(), speciation.ionNMgPerL(), speciation.hno2Fraction(), speciation.pKa());
    }
}
