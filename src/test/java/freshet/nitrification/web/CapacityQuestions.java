package freshet.nitrification.web;

import freshet.http.Calculation;

/** The questions of the worked examples of capacity. */
final class CapacityQuestions {

    static final Calculation<?, ?> CAPACITY = new NitrificationCalculations().nitrificationCapacity();

    static final String A = "{'media':'moving-bed','media_area_m2':1000,'temperature_c':20,'tan_mg_per_l':1.5,"
            + "'dissolved_oxygen_mg_per_l':7,'ph':7.4,'alkalinity_mg_per_l_as_caco3':120}";
    static final String B = "{'media':'moving-bed','media_area_m2':1000,'temperature_c':14,'tan_mg_per_l':1.5,"
            + "'dissolved_oxygen_mg_per_l':4.5,'ph':6.9,'alkalinity_mg_per_l_as_caco3':40,'carbon_to_nitrogen':0.5,"
            + "'biofilter_flow_l_per_hour':16000,'tan_load_g_per_day':90}";
    static final String C = "{'media':'moving-bed','media_area_m2':1000,'temperature_c':24,'tan_mg_per_l':1,"
            + "'dissolved_oxygen_mg_per_l':6.5,'ph':7.8,'alkalinity_mg_per_l_as_caco3':150,'salinity':32,"
            + "'biofilter_flow_l_per_hour':6250,'tan_load_g_per_day':120}";
    static final String D = "{'reference_rate_g_per_m2_per_day':0.22,'reference_temperature_c':12,"
            + "'media_area_m2':600,'temperature_c':18,'tan_mg_per_l':0.8,'dissolved_oxygen_mg_per_l':7,'ph':7.1,"
            + "'alkalinity_mg_per_l_as_caco3':90,'tan_load_g_per_day':60}";
    static final String E = "{'media':'floating-bead','media_volume_m3':2,'temperature_c':26,'tan_mg_per_l':1,"
            + "'dissolved_oxygen_mg_per_l':5.5,'inflow_dissolved_oxygen_mg_per_l':5.5,'ph':7.4,"
            + "'alkalinity_mg_per_l_as_caco3':120,'biofilter_flow_l_per_hour':25000}";

    private CapacityQuestions() {}

    static Asked ask(String body) {
        return Asked.of(CAPACITY, body);
    }

    static String with(String body, String more) {
        return body.substring(0, body.length() - 1) + "," + more + "}";
    }
}
