package freshet.nitrate.web;

import freshet.quantity.Default;
import freshet.quantity.Flat;
import freshet.quantity.Points;

record NitrateTrajectoryRequest(
        @Flat NitrateInputs inputs, @Default("31") @Points Integer points) {}
