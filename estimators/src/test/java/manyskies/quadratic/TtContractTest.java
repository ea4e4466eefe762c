package manyskies.quadratic;

import manyskies.estimator.EstimatorContract;

class TtContractTest extends EstimatorContract {
    TtContractTest() {
        super(new QuadraticFactory.Tt());
    }
}
