package manyskies.quadratic;

import manyskies.estimator.EstimatorContract;

class JointContractTest extends EstimatorContract {
    JointContractTest() {
        super(new JointFactory());
    }
}
