package manyskies.estimator;

/**
 * One separable piece of an estimator: a filtered field times the gradient of a weighted one.
 *
 * <p>A scalar term contributes v = V grad U, a polarised one v = Re[P_V^* grad P_U], where P is the
 * spin-2 field of a gradient and a curl part; the estimate is g = -div v. In modes, with l1 that of
 * U and l2 that of V,
 *
 * <pre>  g_L = (1/A) sum L.l1 U_l1 V_l2 h(2 phi12)</pre>
 *
 * with h = 1 (scalar), and for polarised parts cos (E of U with E of V, B with B), sin (E of U with
 * B of V), -sin (B of U with E of V). See Okamoto and Hu 2003 (astro-ph/0301031).
 *
 * @param kind scalar or polarised
 * @param order which leg feeds U and which V
 * @param gradientE U, or the E part of U; null for none
 * @param gradientB the B part of U; null for none
 * @param plainE V, or the E part of V; null for none
 * @param plainB the B part of V; null for none
 */
public record SeparableTerm(
        Kind kind,
        Order order,
        LegField gradientE,
        LegField gradientB,
        LegField plainE,
        LegField plainB) {

    /** Spin of the two fields of a term. */
    public enum Kind {
        /** Two fields of spin 0. */
        SCALAR,
        /** Two fields of spin 2. */
        POLARISED
    }

    /** Which leg feeds the field under the gradient. */
    public enum Order {
        /** U from leg a, V from leg b. */
        FORWARD,
        /** U from leg b, V from leg a. */
        REVERSED,
        /** The mean of both. */
        SYMMETRIC
    }

    /** V grad U of two scalars. */
    public static SeparableTerm scalar(Order order, LegField u, LegField v) {
        return new SeparableTerm(Kind.SCALAR, order, u, null, v, null);
    }

    /** Re[P_V^* grad P_U] of two spin-2 fields, parts null where absent. */
    public static SeparableTerm polarised(
            Order order, LegField uE, LegField uB, LegField vE, LegField vB) {
        return new SeparableTerm(Kind.POLARISED, order, uE, uB, vE, vB);
    }
}
