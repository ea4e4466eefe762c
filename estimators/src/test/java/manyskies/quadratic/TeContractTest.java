package manyskies.quadratic;

import manyskies.estimator.EstimatorContract;

class TeContractTest extends EstimatorContract {
    TeContractTest() {
        super(new QuadraticFactory.Te());
    }
}
