package manyskies.quadratic;

import manyskies.estimator.EstimatorContract;

class EeContractTest extends EstimatorContract {
    EeContractTest() {
        super(new QuadraticFactory.Ee());
    }
}
