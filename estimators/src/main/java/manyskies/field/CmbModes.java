package manyskies.field;

/**
 * The modes of one CMB sky, or of one observation of it, in uK sr.
 *
 * @param temperature T
 * @param gradient E
 * @param curl B
 */
public record CmbModes(Modes temperature, Modes gradient, Modes curl) {

    /** Checks that the three live in one space. */
    public CmbModes {
        temperature.requireSameSpace(gradient);
        temperature.requireSameSpace(curl);
    }

    /** The modes of one field. */
    public Modes of(SkyField field) {
        return switch (field) {
            case T -> temperature;
            case E -> gradient;
            case B -> curl;
        };
    }
}
