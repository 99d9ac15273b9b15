package freshet.farm.web;

import freshet.quantity.Default;
import freshet.quantity.Percent;
import freshet.quantity.UncertaintyOfConcentration;
import freshet.quantity.UncertaintyOfPh;
import freshet.quantity.UncertaintyOfTemperature;

/** Standard uncertainties of the sensors and kits; defaults are judgements for calibrated ones. */
record SensorUncertainties(
        @Default("0.1") @UncertaintyOfPh Double phStandardUncertainty,

        @Default("0.5") @UncertaintyOfTemperature Double temperatureStandardUncertaintyC,

        @Default("10") @Percent("Relative standard uncertainty of total ammonia")
        Double tanRelativeStandardUncertaintyPercent,

        @Default("10") @Percent("Relative standard uncertainty of nitrite")
        Double no2NRelativeStandardUncertaintyPercent,

        @Default("10") @Percent("Relative standard uncertainty of nitrate")
        Double no3NRelativeStandardUncertaintyPercent,

        @Default("0.2") @UncertaintyOfConcentration("Standard uncertainty of dissolved oxygen")
        Double dissolvedOxygenStandardUncertaintyMgPerL,

        @Default("5") @Percent("Relative standard uncertainty of alkalinity")
        Double alkalinityRelativeStandardUncertaintyPercent,

        @Default("10") @Percent("Relative standard uncertainty of chloride")
        Double chlorideRelativeStandardUncertaintyPercent) {}
