package manyskies.quadratic;

import manyskies.estimator.EstimatorContract;

class TbContractTest extends EstimatorContract {
    TbContractTest() {
        super(new QuadraticFactory.Tb());
    }
}
