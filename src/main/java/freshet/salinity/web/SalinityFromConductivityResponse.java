package freshet.salinity.web;

import freshet.quantity.Reported;

record SalinityFromConductivityResponse(
        @Reported("Practical salinity, PSS-78") double salinity,

        @Reported("Density at the temperature of the water and one atmosphere")
        double densityKgPerM3) {}
