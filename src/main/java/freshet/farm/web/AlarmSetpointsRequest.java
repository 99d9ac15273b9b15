package freshet.farm.web;

import freshet.farm.AlarmProfile;
import freshet.farm.AlarmVariable;
import freshet.quantity.Choice;
import freshet.quantity.Default;
import freshet.quantity.Flat;
import freshet.quantity.Mineral;
import freshet.quantity.RefreshPercent;
import freshet.quantity.Sample;
import freshet.quantity.TotalAmmonia;
import java.util.List;
import org.jspecify.annotations.Nullable;

record AlarmSetpointsRequest(
        @Flat Sample sample,

        @Choice("Published limits for a kind of water; or give limits of your own") @Nullable
        AlarmProfile profile,

        @Flat OwnLimits own,

        @TotalAmmonia("Present total ammonia as N, which may bind pH") @Nullable
        Double tanMgPerL,

        @Mineral("Dissolved chloride, which protects from nitrite") @Nullable
        Double chlorideMgPerL,

        @Flat SensorUncertainties uncertainties,

        @Default("25") @RefreshPercent Double refreshPercent,

        @Default("tan,no2_n,no3_n,ph,temperature,dissolved_oxygen,alkalinity")
        @Choice("What the controller watches, with commas between")
        List<AlarmVariable> variables) {}
