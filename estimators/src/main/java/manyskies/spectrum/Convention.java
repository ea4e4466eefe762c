package manyskies.spectrum;

/** What the numbers of a table are; inside the program they are always C_l. */
enum Convention {
    /** C_l as it stands. */
    C_L {
        @Override
        double toCl(Spectrum name, int l, double value) {
            return value;
        }
    },
    /**
     * l(l+1) C_l / 2 pi for T, E, B; [l(l+1)]^2 C_l^PP / 2 pi for the potential; [l(l+1)]^(3/2)
     * C_l^XP / 2 pi for the cross-spectra with it.
     */
    D_L {
        @Override
        double toCl(Spectrum name, int l, double value) {
            double s = (double) l * (l + 1);
            double power =
                    switch (name) {
                        case TT, EE, BB, TE -> s;
                        case PP -> s * s;
                        case TP, EP -> s * Math.sqrt(s);
                    };
            return 2 * Math.PI * value / power;
        }
    };

    /** The C_l of one entry, l &ge; 2. */
    abstract double toCl(Spectrum name, int l, double value);
}
