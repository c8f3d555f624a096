package sallowmere.story;

import java.nio.file.Path;
import sallowmere.check.Journey;
import sallowmere.check.Network;
import sallowmere.folder.Table;

/** Story 3: Oxbarrow Seed Works asks for four dark fibers side by side, and a second pair by another way. */
final class SeedWorks {
    private SeedWorks() {}

    static void write(Path folder, Network network) {
        Table truth = new Table("tube-20.csv", "fiber", "truth");
        for (int fiber = 229; fiber <= 240; fiber++) {
            truth.add(
                    fiber,
                    switch (fiber) {
                        case 233 -> "dead";
                        case 236 -> "reserved, lapsed 2026-03-31";
                        case 238 -> "jumper at HE-1, no circuit";
                        default -> "spare";
                    });
        }
        truth.write(folder);
        Facts facts = new Facts();
        facts.add("from", "HE-1");
        facts.add("to", "CAB-11");
        facts.add("fibers side by side", "229-232");
        facts.add("other spare fibers", "234-235 237 239-240");
        // Tube 8 takes the way that tube 20 would take: headend, C-S03, C-S06, LAT-11, CAB-11.
        Journey first = network.from("HE-1/FDR-S/96");
        facts.add("glass of the first path", first.glass(), "m");
        facts.add("loss of the first path at 1550", first.loss(0.22), "dB");
        Journey around = network.from("HE-1/FDR-N/1");
        Journey south = network.from("HE-1/FDR-S/12");
        double toTap = first.events().get("C-S06");
        double back = south.glass() - toTap + first.glass() - toTap;
        facts.add("glass of the second path, about", around.glass() + back, "m");
        facts.add("shared by both", "EV-1 C-S06 LAT-11");
        facts.add("shared by FDR-S and RNG-E", "MH-8 BR-1 MH-9 (Wendlecote Bridge, 210 m)");
        facts.write(folder);
    }
}
