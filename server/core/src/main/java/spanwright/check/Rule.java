package spanwright.check;

import java.util.function.Consumer;

/** One rule of the records that a person must judge. */
interface Rule {

    /** Tells all that it finds. */
    void find(Checked checked, Consumer<Finding> found);
}
