package manyskies.command;

import java.nio.file.Path;
import manyskies.estimator.Estimators;
import manyskies.specification.Specification;
import manyskies.specification.SpecificationException;
import manyskies.specification.SpecificationReader;

/** Reads the specification a command names. */
final class SpecificationFile {
    private SpecificationFile() {}

    static Specification read(Services services, Path file) throws SpecificationException {
        return SpecificationReader.read(
                services.folder().resolve(file), Estimators.installed().keySet());
    }
}
