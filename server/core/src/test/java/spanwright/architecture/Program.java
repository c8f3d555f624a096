package spanwright.architecture;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.assertj.core.api.Assertions;

/**
 * The compiled program below one root package, and what may be asked of its structure. Every question throws an
 * {@link AssertionError} naming the offending classes.
 */
public final class Program {

    private static final Pattern EMPTY_WORD =
            Pattern.compile("(.*[a-z0-9])?(Utils?|Utility|Utilities|Common|Helpers?|Managers?|Impl)([A-Z0-9].*)?");
    private static final List<String> EMPTY_PACKAGES =
            List.of("util", "utils", "common", "helper", "helpers", "manager", "managers", "impl");
    private static final ImportOption WITHOUT_TESTS = location ->
            ImportOption.Predefined.DO_NOT_INCLUDE_TESTS.includes(location) && !location.contains("-tests.jar");

    private final String root;
    private final JavaClasses classes;

    private Program(String root, JavaClasses classes) {
        this.root = root;
        this.classes = classes;
    }

    /** The program below {@code root}, its tests left out. */
    public static Program under(String root) {
        return new Program(
                root, new ClassFileImporter().withImportOption(WITHOUT_TESTS).importPackages(root));
    }

    /** Everything below {@code root}, classes of the tests too. */
    static Program withTestsUnder(String root) {
        return new Program(root, new ClassFileImporter().importPackages(root));
    }

    /** Begins an order of packages: these use none of the program's others. */
    public PackageOrder first(String... packages) {
        return new PackageOrder(this, List.of()).then(packages);
    }

    /** No package reaches itself through others; each subpackage counts as a package. */
    public void hasNoPackageCycles() {
        slices().matching(root + ".(**)").should().beFreeOfCycles().check(classes);
    }

    /** No class uses anything from these packages (ArchUnit patterns such as {@code java.sql..}). */
    public void usesNothingOf(String... outside) {
        noClasses().should().dependOnClassesThat().resideInAnyPackage(outside).check(classes);
    }

    /** Begins a rule on who may use what lies outside the program: only these packages of it. */
    public Only only(String... packages) {
        return outside -> noClasses()
                .that()
                .resideOutsideOfPackages(below(packages))
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage(outside)
                .allowEmptyShould(true)
                .check(classes);
    }

    /** Of these packages none uses another, in either direction. */
    public void keepsApart(String... siblings) {
        for (String sibling : siblings) {
            String[] others = Arrays.stream(siblings)
                    .filter(other -> !other.equals(sibling))
                    .toArray(String[]::new);
            forbids(sibling, others);
        }
    }

    /** Nothing outside of {@code top} uses it. */
    public void hasOnTop(String top) {
        noClasses()
                .that()
                .resideOutsideOfPackage(below(top)[0])
                .should()
                .dependOnClassesThat()
                .resideInAPackage(below(top)[0])
                .allowEmptyShould(true)
                .check(classes);
    }

    /** Packages and classes are named for what they are about: no {@code util}, {@code Helper} and the like. */
    public void isNamedInWordsOfItsTrade() {
        List<String> empty = new ArrayList<>();
        for (JavaClass type : classes) {
            if (EMPTY_WORD.matcher(type.getSimpleName()).matches()
                    || Stream.of(type.getPackageName().split("\\.", -1)).anyMatch(EMPTY_PACKAGES::contains)) {
                empty.add(type.getName());
            }
        }
        Assertions.assertThat(empty).as("types named without meaning").isEmpty();
    }

    /** The names of the packages directly below the root, in alphabetical order. */
    List<String> packages() {
        TreeSet<String> names = new TreeSet<>();
        for (JavaClass type : classes) {
            String name = type.getPackageName();
            if (name.startsWith(root + ".")) {
                names.add(name.substring(root.length() + 1).split("\\.", 2)[0]);
            }
        }
        return List.copyOf(names);
    }

    /** No class below {@code user} uses a class below any of {@code used}. */
    void forbids(String user, String... used) {
        if (used.length > 0) {
            noClasses()
                    .that()
                    .resideInAPackage(below(user)[0])
                    .should()
                    .dependOnClassesThat()
                    .resideInAnyPackage(below(used))
                    .allowEmptyShould(true)
                    .check(classes);
        }
    }

    private String[] below(String... packages) {
        return Arrays.stream(packages).map(name -> root + "." + name + "..").toArray(String[]::new);
    }

    /** The second half of a rule begun with {@link Program#only}. */
    @FunctionalInterface
    public interface Only {

        /** Fails if another package uses anything from these (ArchUnit patterns such as {@code java.sql..}). */
        void use(String... outside);
    }
}
