package spanwright.architecture;

import java.util.ArrayList;
import java.util.List;
import org.assertj.core.api.Assertions;

/**
 * Packages in steps: each may use those of the steps before its own, and no other. A package that does not exist (yet)
 * may stand in an order.
 */
public final class PackageOrder {

    private final Program program;
    private final List<List<String>> steps;

    PackageOrder(Program program, List<List<String>> steps) {
        this.program = program;
        this.steps = steps;
    }

    /** The same order with one more step; packages of one step do not use each other. */
    public PackageOrder then(String... packages) {
        List<List<String>> more = new ArrayList<>(steps);
        more.add(List.of(packages));
        return new PackageOrder(program, List.copyOf(more));
    }

    /** Fails where a package uses one of its own step or of a later one. */
    public void holds() {
        for (int step = 0; step < steps.size(); step++) {
            List<String> notBefore = steps.subList(step, steps.size()).stream()
                    .flatMap(List::stream)
                    .toList();
            for (String user : steps.get(step)) {
                program.forbids(
                        user,
                        notBefore.stream().filter(name -> !name.equals(user)).toArray(String[]::new));
            }
        }
    }

    /** Fails where the program has a package that the order does not name. */
    public void namesEveryPackage() {
        Assertions.assertThat(steps.stream().flatMap(List::stream)).containsAll(program.packages());
    }
}
