package spanwright.boot;

import java.nio.file.Path;

/** The cases that the repository holds. */
final class Cases {

    static final Path ROOT = Path.of(System.getProperty("repository.root", "../.."));
    static final Path WORKED = ROOT.resolve("demo-data/cases/good/worked");
    static final Path WORKED_LATER = ROOT.resolve("demo-data/cases/good/worked-later");
    static final Path WORKED_OTDR = ROOT.resolve("demo-data/cases/good/worked-otdr");
    static final Path DEMO = ROOT.resolve("demo-data/sallowmere");

    private Cases() {}
}
