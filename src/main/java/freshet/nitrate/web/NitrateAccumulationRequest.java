package freshet.nitrate.web;

import freshet.quantity.Flat;

record NitrateAccumulationRequest(@Flat NitrateInputs inputs) {}
