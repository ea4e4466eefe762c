package manyskies;

import static com.tngtech.archunit.base.DescribedPredicate.describe;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.AccessTarget.MethodCallTarget;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.JavaMethodCall;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption.DoNotIncludeTests;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** The package map of all modules, and what no package may do. DEVELOPERS.md draws the map. */
class ArchitectureTest {
    private static final JavaClasses CLASSES =
            new ClassFileImporter()
                    .withImportOption(new DoNotIncludeTests())
                    .importPackages("manyskies");

    /** Package to the packages of ours that it may use. */
    private static final Map<String, Set<String>> MAP = map();

    private static Map<String, Set<String>> map() {
        Map<String, Set<String>> map = new TreeMap<>();
        // estimators: mathematics
        map.put("field", Set.of());
        map.put("spectrum", Set.of("field"));
        map.put("flat", Set.of("field"));
        map.put("filter", Set.of("field", "spectrum"));
        map.put("estimator", Set.of("field", "spectrum", "filter"));
        map.put("quadratic", Set.of("field", "spectrum", "filter", "estimator"));
        map.put("response", with(map, "quadratic"));
        map.put("combine", with(map, "response"));
        map.put("statistic", Set.of("field", "spectrum"));
        // sim-worker: one realisation
        Set<String> estimators = Set.copyOf(map.keySet());
        map.put("specification", Set.of("spectrum"));
        map.put("random", Set.of());
        map.put("sky", union(estimators, Set.of("random")));
        map.put("instrument", union(estimators, Set.of("random", "specification")));
        map.put("result", Set.of("specification", "spectrum"));
        map.put("realisation", Set.copyOf(map.keySet()));
        map.put("picture", Set.of("field", "flat", "result"));
        // notebooks-free-reports: pages, from numbers alone
        map.put("figure", Set.of());
        map.put("report", Set.of("figure", "statistic"));
        // sim-driver
        map.put("farm", Set.of("realisation", "result", "specification"));
        map.put("aggregate", Set.of("result", "specification", "field", "spectrum", "statistic"));
        map.put("command", Set.copyOf(map.keySet()));
        return map;
    }

    private static Set<String> with(Map<String, Set<String>> map, String name) {
        return union(map.get(name), Set.of(name));
    }

    private static Set<String> union(Set<String> a, Set<String> b) {
        return Stream.of(a, b).flatMap(Set::stream).collect(Collectors.toUnmodifiableSet());
    }

    @Test
    void everyPackageStandsInTheMap() {
        Set<String> found = new TreeSet<>();
        CLASSES.forEach(c -> found.add(c.getPackageName().replace("manyskies.", "")));
        assertThat(found).contains("field", "result", "farm", "command"); // sees every module
        assertThat(MAP.keySet()).containsAll(found);
    }

    static Set<String> packages() {
        return MAP.keySet();
    }

    @ParameterizedTest
    @MethodSource("packages")
    void aPackageUsesWhatTheMapAllows(String name) {
        Set<String> allowed = MAP.get(name);
        String[] ours =
                union(allowed, Set.of(name)).stream()
                        .map(ArchitectureTest::full)
                        .toArray(String[]::new);
        noClasses()
                .that()
                .resideInAPackage(full(name))
                .should()
                .dependOnClassesThat(
                        resideInAnyPackage("manyskies..")
                                .and(DescribedPredicate.not(resideInAnyPackage(ours))))
                .because("the map allows it " + new TreeSet<>(allowed))
                .allowEmptyShould(true)
                .check(CLASSES);
    }

    private static String full(String name) {
        return "manyskies." + name;
    }

    @Test
    void packagesFormNoCycle() {
        slices().matching("manyskies.(*)..").should().beFreeOfCycles().check(CLASSES);
    }

    @ParameterizedTest
    @CsvSource({
        "org.jtransforms.., flat",
        "org.visnow.., flat",
        "org.apache.commons.rng.., random",
        "org.snakeyaml.., specification",
        "org.apache.parquet.., result",
        "org.apache.hadoop.., result",
        "nom.tam.., picture",
        "org.apache.spark.., farm",
        "scala.., farm",
        "picocli.., command",
    })
    void aLibraryHasOneHome(String library, String home) {
        noClasses()
                .that()
                .resideOutsideOfPackage(full(home))
                .should()
                .dependOnClassesThat()
                .resideInAPackage(library)
                .check(CLASSES);
    }

    /** Maps are written by one class or package: whichever it is, only one. */
    @Test
    void fitsIsWrittenInOnePackage() {
        Set<String> users =
                CLASSES.stream()
                        .filter(c -> uses(c, "nom.tam."))
                        .map(JavaClass::getPackageName)
                        .collect(Collectors.toSet());
        assertThat(users).hasSizeLessThan(2);
    }

    private static boolean uses(JavaClass c, String library) {
        return c.getDirectDependenciesFromSelf().stream()
                .anyMatch(d -> d.getTargetClass().getPackageName().startsWith(library));
    }

    @Test
    void randomNumbersHaveNamesNotState() {
        noClasses()
                .should()
                .dependOnClassesThat()
                .haveFullyQualifiedName("java.util.Random")
                .orShould()
                .dependOnClassesThat()
                .haveFullyQualifiedName("java.util.concurrent.ThreadLocalRandom")
                .orShould()
                .dependOnClassesThat()
                .haveFullyQualifiedName("java.util.SplittableRandom")
                .orShould()
                .callMethod(Math.class, "random")
                .because("every random number is addressed by names, in manyskies.random")
                .check(CLASSES);
    }

    @Test
    void onlyTheFarmAndTheCommandsReadClocks() {
        noClasses()
                .that()
                .resideOutsideOfPackages("manyskies.farm", "manyskies.command")
                .should()
                .callMethodWhere(readsAClock())
                .because("a realisation and a table are pure functions; pass a Clock in")
                .check(CLASSES);
    }

    private static DescribedPredicate<JavaMethodCall> readsAClock() {
        return describe("reads a clock", call -> isClock(call.getTarget()));
    }

    private static boolean isClock(MethodCallTarget target) {
        String owner = target.getOwner().getFullName();
        String name = target.getName();
        boolean now = name.equals("now") && target.getRawParameterTypes().isEmpty();
        boolean system = name.equals("currentTimeMillis") || name.equals("nanoTime");
        boolean time = now || name.startsWith("system");
        return (owner.equals("java.lang.System") && system)
                || (owner.startsWith("java.time.") && time);
    }

    @Test
    void mathematicsTouchesNoFiles() {
        noClasses()
                .that()
                .resideInAnyPackage(
                        "manyskies.field",
                        "manyskies.flat",
                        "manyskies.filter",
                        "manyskies.estimator",
                        "manyskies.quadratic",
                        "manyskies.response",
                        "manyskies.combine",
                        "manyskies.statistic")
                .should()
                .dependOnClassesThat()
                .resideInAPackage("java.nio.file..")
                .orShould()
                .dependOnClassesThat()
                .haveNameMatching("java\\.io\\.(File|Random).*")
                .allowEmptyShould(true)
                .check(CLASSES);
    }
}
