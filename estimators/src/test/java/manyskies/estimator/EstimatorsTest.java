package manyskies.estimator;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.Set;
import manyskies.field.SkyField;
import org.junit.jupiter.api.Test;

class EstimatorsTest {
    /** Another estimator that took the name tt. */
    static final class SameName implements EstimatorFactory {
        @Override
        public String name() {
            return "tt";
        }

        @Override
        public String summary() {
            return "none";
        }

        @Override
        public Set<SkyField> needs() {
            return Set.of(SkyField.T);
        }

        @Override
        public Estimator prepare(Belief belief) {
            throw new UnsupportedOperationException();
        }
    }

    @Test
    void ourSevenAreInstalledInOrderOfTheirNames() {
        assertThat(Estimators.installed().keySet())
                .containsExactly("eb", "ee", "joint", "mv", "tb", "te", "tt");
    }

    @Test
    void anUnknownNameListsWhatThereIs() {
        assertThatThrownBy(() -> Estimators.named("xx"))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage(
                        "no estimator 'xx' is installed;"
                                + " there are eb, ee, joint, mv, tb, te, tt");
    }

    @Test
    void twoOfOneNameAreNamed() {
        List<EstimatorFactory> both = List.of(Estimators.named("tt"), new SameName());
        assertThatThrownBy(() -> Estimators.byName(both))
                .isInstanceOf(IllegalStateException.class)
                .hasMessage(
                        "two estimators are called 'tt': manyskies.quadratic.QuadraticFactory$Tt and"
                                + " manyskies.estimator.EstimatorsTest$SameName; remove or rename"
                                + " one");
    }
}
