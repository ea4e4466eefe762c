package manyskies.spectrum;

/**
 * Second method: change of spectra by lensing to first order in C^PP, flat sky, by brute force.
 *
 * <p>dC_l = -l^2 R C_l + int d^2L/(2pi)^2 g [l'.L]^2 C_l' C^PP_L p, l' = l - L, R = int L^3 dL/(4pi)
 * C^PP; g = 1 for lensed spectra and l.l'/l^2 for lensed-gradient ones; p = 1 (TT), cos 2a (TE),
 * cos^2 2a (EE to EE), sin^2 2a (EE to BB), a the angle between l and l'. Challinor and Lewis 2005
 * (astro-ph/0502425) and Lewis, Challinor and Hanson 2011 (1101.2234) give these limits. Full-sky
 * tables are read at |l| - 1/2.
 */
final class PerturbedSpectra {
    private static final int ANGLES = 128; // of the half circle; the other half is the same

    private final Spectra unlensed;
    private final boolean gradient;
    private final int firstLens;

    PerturbedSpectra(Spectra unlensed, boolean gradient) {
        this(unlensed, gradient, 2);
    }

    /** With lenses below some L left out. */
    PerturbedSpectra(Spectra unlensed, boolean gradient, int firstLens) {
        this.unlensed = unlensed;
        this.gradient = gradient;
        this.firstLens = firstLens;
    }

    /** Change of TT, TE, EE or BB at a multipole. */
    double change(Spectrum name, int multipole) {
        Spectrum source = name == Spectrum.BB ? Spectrum.EE : name;
        double l = multipole + 0.5;
        double convolved = 0;
        double meanSquare = 0;
        for (int n = firstLens; n <= unlensed.lmax(); n++) {
            double lens = n + 0.5;
            double power = unlensed.at(Spectrum.PP, n) * lens / (2 * Math.PI);
            meanSquare += power * lens * lens;
            convolved += power * ring(name, source, l, lens);
        }
        double loss =
                name == Spectrum.BB ? 0 : l * l * meanSquare / 2 * unlensed.at(name, multipole);
        return convolved - loss;
    }

    /** Mean over the direction of L. */
    private double ring(Spectrum name, Spectrum source, double l, double lens) {
        double sum = 0;
        for (int i = 0; i < ANGLES; i++) {
            double angle = Math.PI * (i + 0.5) / ANGLES;
            double x = l - lens * Math.cos(angle);
            double y = -lens * Math.sin(angle);
            double square = x * x + y * y;
            double product = l * lens * Math.cos(angle) - lens * lens; // l'.L
            double spectrum = unlensed.at(source, Math.sqrt(square) - 0.5);
            double cosine = (x * x - y * y) / square;
            sum += product * product * spectrum * rotation(name, cosine) * (gradient ? x / l : 1);
        }
        return sum / ANGLES;
    }

    private static double rotation(Spectrum name, double cosine) {
        return switch (name) {
            case TT -> 1;
            case TE -> cosine;
            case EE -> cosine * cosine;
            default -> 1 - cosine * cosine;
        };
    }
}
