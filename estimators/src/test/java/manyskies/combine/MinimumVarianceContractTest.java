package manyskies.combine;

import manyskies.estimator.EstimatorContract;

class MinimumVarianceContractTest extends EstimatorContract {
    MinimumVarianceContractTest() {
        super(new MinimumVarianceFactory());
    }
}
