package manyskies.response;

import java.util.ArrayList;
import java.util.List;
import manyskies.estimator.LegField;
import manyskies.estimator.SeparableTerm;

/**
 * A separable term broken into products of two single fields: L.l1 U_l1 V_l2 h(2 phi12).
 *
 * @param gradient U
 * @param plain V
 * @param angle h
 */
record ElementaryTerm(LegField gradient, LegField plain, Angle angle) {

    static List<ElementaryTerm> of(List<SeparableTerm> terms) {
        List<ElementaryTerm> out = new ArrayList<>();
        for (SeparableTerm term : terms) {
            if (term.kind() == SeparableTerm.Kind.SCALAR) {
                add(out, term.gradientE(), term.plainE(), Angle.ONE);
            } else {
                add(out, term.gradientE(), term.plainE(), Angle.COS);
                add(out, term.gradientB(), term.plainB(), Angle.COS);
                add(out, term.gradientE(), term.plainB(), Angle.SIN);
                add(out, term.gradientB(), term.plainE(), Angle.MINUS_SIN);
            }
        }
        return out;
    }

    private static void add(List<ElementaryTerm> out, LegField u, LegField v, Angle angle) {
        if (u != null && v != null) {
            out.add(new ElementaryTerm(u, v, angle));
        }
    }
}
