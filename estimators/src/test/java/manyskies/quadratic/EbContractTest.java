package manyskies.quadratic;

import manyskies.estimator.EstimatorContract;

class EbContractTest extends EstimatorContract {
    EbContractTest() {
        super(new QuadraticFactory.Eb());
    }
}
