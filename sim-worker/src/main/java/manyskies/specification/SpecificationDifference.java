package manyskies.specification;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import manyskies.spectrum.Spectra;
import manyskies.spectrum.Spectrum;

/** What differs between two specifications, for people. */
public final class SpecificationDifference {
    private SpecificationDifference() {}

    /**
     * One line for each difference, in canonical order: "survey.beam: 1.5 arcmin -> 2 arcmin". Empty
     * if the specifications mean the same; the path of the spectra does not count.
     */
    public static List<String> between(Specification a, Specification b) {
        List<String> lines = new ArrayList<>();
        Map<String, String> ofB = Entries.of(b);
        Entries.of(a)
                .forEach(
                        (key, value) -> {
                            if (!value.equals(ofB.get(key))) {
                                lines.add(key + ": " + value + " -> " + ofB.get(key));
                            }
                        });
        addSpectra(a.unlensed(), b.unlensed(), lines);
        return lines;
    }

    private static void addSpectra(Spectra a, Spectra b, List<String> lines) {
        if (a.lmax() != b.lmax()) {
            lines.add("spectra: to l = " + a.lmax() + " -> to l = " + b.lmax());
        }
        for (Spectrum name : Spectrum.values()) {
            double[] ofA = a.values(name);
            double[] ofB = b.values(name);
            for (int l = 0; l <= Math.min(a.lmax(), b.lmax()); l++) {
                if (ofA[l] != ofB[l]) {
                    lines.add(
                            "spectra: "
                                    + name
                                    + " at l = "
                                    + l
                                    + " (the first of those that"
                                    + " differ): "
                                    + ofA[l]
                                    + " -> "
                                    + ofB[l]);
                    break;
                }
            }
        }
    }
}
