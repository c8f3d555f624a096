package sallowmere.town;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import sallowmere.folder.Figures;
import sallowmere.plant.Cable;

/** Hangs the terminals on a distribution cable: six on a large one, two on a small one, the last at its end. */
final class Terminals {
    private static final double[] LARGE = {0.27, 0.42, 0.57, 0.72, 0.86, 1};
    private static final double[] SMALL = {0.52, 1};
    // The drop that a fence anchor hits hangs on a terminal about 170 m from its cabinet.
    private static final String NEAR_CABINET = "DST-02C";
    private static final double NEAR = 170;

    private Terminals() {}

    static List<TerminalSite> place(String number, Cable cable, int before, Random random) {
        boolean large = cable.type().fibers() == 96;
        List<Integer> sizes = new ArrayList<>(large ? List.of(12, 24, 12, 12, 24, 12) : List.of(24, 24));
        Collections.shuffle(sizes, random);
        double[] fractions = large ? LARGE : SMALL;
        List<TerminalSite> sites = new ArrayList<>();
        int fiber = 1;
        cable.readAt(0);
        for (int i = 0; i < fractions.length; i++) {
            boolean near = i == 0 && cable.code().equals(NEAR_CABINET);
            int seq = cable.seqNear(near ? NEAR : cable.last().route() * fractions[i]);
            String code = Figures.code("DT-" + number + "-", before + i + 1, 2);
            sites.add(new TerminalSite(code, cable, seq, fiber, sizes.get(i)));
            cable.readAt(seq);
            fiber += sizes.get(i);
        }
        return sites;
    }
}
