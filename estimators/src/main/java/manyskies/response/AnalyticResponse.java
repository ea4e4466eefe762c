package manyskies.response;

import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import manyskies.estimator.Belief;
import manyskies.estimator.BilinearWeight;
import manyskies.estimator.LegField;
import manyskies.estimator.SeparableTerm;
import manyskies.field.SkyField;
import manyskies.field.SkyTransform;
import manyskies.spectrum.ModeSpectra;

/**
 * Response and Gaussian noise of separable estimators, on the estimator's own grid.
 *
 * <p>With g_L = (1/A) sum w(l1, l2) X_l1 Y_l2 and {@code <X_l1 Y_l2> = f(l1, l2) phi_L} at first
 * order in phi,
 *
 * <pre>
 *   R_L   = integral d^2l1/(2 pi)^2  w f
 *   N_L^ab = integral d^2l1/(2 pi)^2  w_a(l1,l2) [w_b(l1,l2) C1^{xa xb} C2^{ya yb}
 *                                               + w_b(l2,l1) C1^{xa yb} C2^{ya xb}]
 * </pre>
 *
 * <p>and N0^ab = N^ab / (R^a R^b). Hu and Okamoto 2002 (astro-ph/0111606). Units: for legs filtered
 * by inverse variances R and N are of 1 / sr; N0 is of C_L^phiphi, sr. One thread at a time.
 */
public final class AnalyticResponse {
    private final SkyTransform transform;
    private final Map<Key, LensAndCurl> made = new HashMap<>();

    /** An integral: of the noise of two lists of terms, or of the response of one. */
    private record Key(List<SeparableTerm> a, List<SeparableTerm> b, ModeSpectra c) {}

    /** How lensing turns one field into another: the source, the result and the angle. */
    private record Channel(SkyField from, SkyField to, Angle angle) {}

    private static final List<Channel> LENSING =
            List.of(
                    new Channel(SkyField.T, SkyField.T, Angle.ONE),
                    new Channel(SkyField.E, SkyField.E, Angle.COS),
                    new Channel(SkyField.B, SkyField.B, Angle.COS),
                    new Channel(SkyField.E, SkyField.B, Angle.SIN),
                    new Channel(SkyField.B, SkyField.E, Angle.MINUS_SIN));

    private AnalyticResponse(SkyTransform transform) {
        this.transform = transform;
    }

    /**
     * The responses of a belief's estimators, shared by all of them: what has been computed once
     * for some terms is not computed again.
     */
    public static AnalyticResponse of(Belief belief) {
        return belief.shared(AnalyticResponse.class, b -> new AnalyticResponse(b.transform()));
    }

    /**
     * R_L of an estimator on a sky whose fields respond with the given spectra.
     *
     * @param weight the estimator's weight
     * @param c spectra in the response functions f (lensed gradient ones to be exact)
     */
    public LensAndCurl response(BilinearWeight weight, ModeSpectra c) {
        Sum sum = new Sum();
        for (BilinearWeight.Part part : weight.parts()) {
            sum.add(
                    made.computeIfAbsent(
                            new Key(part.terms(), List.of(), c), key -> response(part.terms(), c)),
                    part,
                    ONE);
        }
        return sum.total();
    }

    private LensAndCurl response(List<SeparableTerm> terms, ModeSpectra c) {
        Convolution convolution = new Convolution(transform);
        for (ElementaryTerm term : ElementaryTerm.of(terms)) {
            for (Channel channel : LENSING) {
                addResponse(convolution, term, channel, c);
            }
        }
        return convolution.result();
    }

    /**
     * f = L.l1 C1^{X m} h_{m Y}(phi12) + L.l2 C2^{Y m} h_{m X}(phi21): the second field lensed out
     * of a field m that is correlated with the first, and the other way round.
     */
    private void addResponse(Convolution to, ElementaryTerm term, Channel channel, ModeSpectra c) {
        LegField from = unit(channel.from());
        to.addDirect(
                term.gradient().covariance(from, c),
                term.plain().coefficient(channel.to()),
                term.angle(),
                channel.angle());
        to.addExchanged(
                term.gradient().coefficient(channel.to()),
                term.plain().covariance(from, c),
                term.angle(),
                channel.angle());
    }

    private LegField unit(SkyField field) {
        double[] one = new double[transform.space().size()];
        Arrays.fill(one, 1);
        return LegField.of(field, one);
    }

    /**
     * N_L^ab, the covariance of two unnormalised estimators on Gaussian skies.
     *
     * @param a one weight
     * @param b the other
     * @param c true total spectra of the beam-deconvolved sky, uK^2 sr
     */
    public LensAndCurl noise(BilinearWeight a, BilinearWeight b, ModeSpectra c) {
        Sum sum = new Sum();
        for (BilinearWeight.Part partA : a.parts()) {
            for (BilinearWeight.Part partB : b.parts()) {
                sum.add(noise(partA.terms(), partB.terms(), c), partA, partB);
            }
        }
        return sum.total();
    }

    private LensAndCurl noise(List<SeparableTerm> a, List<SeparableTerm> b, ModeSpectra c) {
        LensAndCurl exchanged = made.get(new Key(b, a, c)); // the same number
        return exchanged != null
                ? exchanged
                : made.computeIfAbsent(new Key(a, b, c), key -> integrateNoise(a, b, c));
    }

    private LensAndCurl integrateNoise(
            List<SeparableTerm> a, List<SeparableTerm> b, ModeSpectra c) {
        Convolution convolution = new Convolution(transform);
        for (ElementaryTerm s : ElementaryTerm.of(a)) {
            for (ElementaryTerm t : ElementaryTerm.of(b)) {
                convolution.addDirect(
                        s.gradient().covariance(t.gradient(), c),
                        s.plain().covariance(t.plain(), c),
                        s.angle(),
                        t.angle());
                convolution.addExchanged(
                        s.gradient().covariance(t.plain(), c),
                        s.plain().covariance(t.gradient(), c),
                        s.angle(),
                        t.angle());
            }
        }
        return convolution.result();
    }

    private static final BilinearWeight.Part ONE =
            new BilinearWeight.Part(new double[0], new double[0], List.of());

    /** Adds up parts under their factors. */
    private final class Sum {
        private final double[] lens = new double[transform.space().size()];
        private final double[] curl = new double[lens.length];

        void add(LensAndCurl term, BilinearWeight.Part a, BilinearWeight.Part b) {
            add(lens, term.lens(), a.gradientFactor(), b.gradientFactor());
            add(curl, term.curl(), a.curlFactor(), b.curlFactor());
        }

        private void add(double[] sum, double[] term, double[] a, double[] b) {
            for (int mode = 0; mode < sum.length; mode++) {
                double factor = (a.length == 0 ? 1 : a[mode]) * (b.length == 0 ? 1 : b[mode]);
                sum[mode] += factor * term[mode];
            }
        }

        LensAndCurl total() {
            return new LensAndCurl(lens, curl);
        }
    }
}
