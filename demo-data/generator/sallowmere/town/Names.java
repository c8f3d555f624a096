package sallowmere.town;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;

/** Invented street names, none twice in one town. */
final class Names {
    private static final List<String> STEMS = List.of(
            "Alder",
            "Kiln",
            "Sluice",
            "Tallow",
            "Heron",
            "Quarry",
            "Osier",
            "Chandler",
            "Larch",
            "Tanner",
            "Foundry",
            "Wicket",
            "Marsh",
            "Cooper",
            "Linden",
            "Granary",
            "Otter",
            "Saddler",
            "Thistle",
            "Weaver",
            "Barley",
            "Cutler",
            "Fuller",
            "Hazel",
            "Juniper",
            "Lantern",
            "Mallow",
            "Pippin",
            "Rushes",
            "Sexton",
            "Teasel",
            "Wren",
            "Yarrow",
            "Bellows",
            "Cinder",
            "Drover",
            "Fallow",
            "Gosling",
            "Hopyard",
            "Ivy",
            "Kestrel",
            "Mason",
            "Nettle",
            "Orchard",
            "Packhorse",
            "Reed",
            "Smithy",
            "Tiller",
            "Wagon",
            "Willow");
    private static final List<String> KINDS =
            List.of("Street", "Lane", "Road", "Row", "Way", "Rise", "Close", "Walk", "Hill", "Green");

    private final List<String> left = new ArrayList<>();

    Names(Random random) {
        for (String stem : STEMS) {
            for (String kind : KINDS) {
                left.add(stem + " " + kind);
            }
        }
        Collections.shuffle(left, random);
    }

    String next() {
        return left.remove(left.size() - 1);
    }
}
