package manyskies.response;

/** How a product of two modes depends on the angle 2 phi12 between them. */
enum Angle {
    ONE(0, 1),
    COS(2, 1),
    SIN(2, 1),
    MINUS_SIN(2, -1);

    private final int spin;
    private final int sign;

    Angle(int spin, int sign) {
        this.spin = spin;
        this.sign = sign;
    }

    boolean isOdd() {
        return this == SIN || this == MINUS_SIN;
    }

    /** The same function with the two modes exchanged. */
    Angle exchanged() {
        return switch (this) {
            case SIN -> MINUS_SIN;
            case MINUS_SIN -> SIN;
            default -> this;
        };
    }

    /** Whether the product with another angle is even in phi12, so that its integral is not zero. */
    boolean isEvenWith(Angle other) {
        return isOdd() == other.isOdd();
    }

    /**
     * Coefficient of cos(n phi12) in the even product with another angle; n = |s - s'| or s + s'.
     * cos cos = (cos 0 + cos 4 phi12) / 2, sin sin = (cos 0 - cos 4 phi12) / 2.
     */
    double coefficient(Angle other, int n) {
        double half = 0.5 * sign * other.sign;
        double sum = isOdd() ? -half : half;
        return (n == Math.abs(spin - other.spin) ? half : 0) + (n == spin + other.spin ? sum : 0);
    }
}
