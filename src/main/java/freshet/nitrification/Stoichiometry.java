package freshet.nitrification;

import freshet.method.Citation;
import freshet.method.Method;
import freshet.method.Seen;

/** The published equations of nitrification; coefficients are computed from them, never from printed roundings. */
public enum Stoichiometry {
    /** No growth of cells: {@code NH4+ + 2 O2 -> NO3- + 2 H+ + H2O}; the most that oxidation can consume. */
    CATABOLIC(
            new Reaction(2, 2, 0, 1, 2),
            Method.of(
                            "catabolic",
                            "Nitrification without growth of cells",
                            Citation.withoutDoi(
                                    "Stoichiometry of NH4+ + 2 O2",
                                    "Stoichiometry of ammonium oxidized to nitrate without growth of cells"),
                            Seen.PRINTED)
                    .accuracy(
                            "consumption is overstated by up to 9 % for oxygen and 1.5 % for alkalinity, since growing"
                                    + " cells take some nitrogen: safe for the supply of both"),
            "NH4+ + o O2 -> n NO3- + a H+ + H2O; the acid frees k CO2 from bicarbonate"),
    /** With growth, Haug and McCarty 1972. */
    HAUG_MCCARTY_1972(
            new Reaction(1.83, 1.98, 0.021, 0.98, 1.88),
            Method.of(
                            "haug-mccarty-1972",
                            "Nitrification with growth of cells",
                            Citation.withoutDoi(
                                    "Haug & McCarty 1972, J. WPCF 44:2086-2102",
                                    "Haug R.T., McCarty P.L. (1972) Nitrification with submerged filters. J. Water"
                                            + " Pollut. Control Fed. 44:2086-2102; taken over by US EPA (1975) Process"
                                            + " design manual for nitrogen control, EPA-625/1-75-007"),
                            Seen.SECONDARY)
                    .accuracy("published equations agree within 9 % for oxygen and 1.3 % for alkalinity")
                    .errata("its alkalinity, 7.07 g per g N, is often printed as 7.14, the value without growth"),
            "NH4+ + o O2 + a HCO3- -> x C5H7O2N + n NO3- + 1.041 H2O + k H2CO3"),
    /** With growth, Ebeling, Timmons and Bisogni 2006. */
    EBELING_2006(
            new Reaction(1.83, 1.97, 0.0244, 0.9756, 1.86),
            Method.of(
                            "ebeling-2006",
                            "Nitrification with growth of cells, as used for recirculating farms",
                            Citation.withDoi(
                                    "Ebeling et al. 2006",
                                    "Ebeling J.M., Timmons M.B., Bisogni J.J. (2006) Engineering analysis of the"
                                            + " stoichiometry of photoautotrophic, autotrophic, and heterotrophic"
                                            + " removal of ammonia-nitrogen in aquaculture systems. Aquaculture"
                                            + " 257:346-358",
                                    "10.1016/j.aquaculture.2006.03.019"),
                            Seen.MEMORY)
                    .accuracy("published equations agree within 9 % for oxygen and 1.3 % for alkalinity")
                    .errata("the source prints 0.976 nitrate; 0.9756 closes the nitrogen balance with its cells"),
            "NH4+ + o O2 + a HCO3- -> x C5H7O2N + n NO3- + 2.90 H2O + k CO2");

    private final Method method;
    private final Reaction reaction;

    Stoichiometry(Reaction reaction, Method described, String equation) {
        method = described.equation(equation + " (mol per mol ammonium)", reaction.constants());
        this.reaction = Reaction.of(method.values());
    }

    /** Its entry in the catalogue. */
    public Method method() {
        return method;
    }

    Reaction reaction() {
        return reaction;
    }
}
