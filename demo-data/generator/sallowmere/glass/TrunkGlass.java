package sallowmere.glass;

import sallowmere.folder.Figures;
import sallowmere.plant.Cable;
import sallowmere.plant.Plant;
import sallowmere.plant.Structure;
import sallowmere.ring.Ring;
import sallowmere.ring.Trunk;

/** What lies in the headend, the huts, and the closures of the feeders and the ring. */
public final class TrunkGlass {
    private static final double TRAY = 1.5;
    /** Tube 20 of FDR-S, first fiber: the one that was tested end to end, which found 233 dead. */
    private static final int TESTED = 229;

    private static final String TESTED_ON = "2025-06-12";

    private final Plant plant;
    private final Ring ring;
    private final Glasswork glass;

    private TrunkGlass(Plant plant, Ring ring, Glasswork glass) {
        this.plant = plant;
        this.ring = ring;
        this.glass = glass;
    }

    /** Fills all but the tap closures, which belong to the districts. */
    public static void fill(Plant plant, Ring ring, Glasswork glass) {
        TrunkGlass trunks = new TrunkGlass(plant, ring, glass);
        trunks.headend();
        trunks.butts();
        trunks.access();
        trunks.hut("HUT-N", ring.north(), true);
        trunks.hut("HUT-S", ring.south(), false);
    }

    private void headend() {
        glass.enclosure("HE-1", plant.structureOf("HE-1"), "frame", TRAY, "");
        for (Trunk trunk : new Trunk[] {ring.north(), ring.south()}) {
            Cable reel = trunk.reel(1);
            glass.pass("HE-1", reel, 0);
            glass.panel("HE-1", trunk.name(), 288, "SC/APC");
            for (int first = 1; first <= 288; first += 12) {
                Ends ends = Ends.ahead(reel, first, first + 11);
                if (first <= 25) {
                    glass.pigtailsTrusted("HE-1", trunk.name(), first, ends, Trust.VERIFIED);
                } else if (trunk == ring.south() && first == TESTED) {
                    glass.pigtailsTested("HE-1", trunk.name(), first, ends, TESTED_ON);
                } else {
                    glass.pigtails("HE-1", trunk.name(), first, ends);
                }
            }
        }
        glass.panel("HE-1", "XC", 24, "SC/APC");
        glass.jumper("HE-1/FDR-S/238", "HE-1/XC/7", "12");
    }

    private void butts() {
        butt("C-N02", ring.north().reel(1), ring.north().reel(2), "2009-06-12", 0);
        butt("C-N07", ring.north().reel(2), ring.north().reel(3), "2009-07-03", 0);
        butt("C-S03", ring.south().reel(1), ring.south().reel(2), "2011-09-20", 0);
        butt("C-E01", ring.east().reel(1), ring.east().reel(2), "2013-05-14", 0);
        // The sixth ribbon was laid upside down: 61 meets 72.
        butt("C-E02", ring.east().reel(2), ring.east().reel(3), "2013-06-04", 61);
    }

    private void butt(String code, Cable from, Cable to, String on, int flipped) {
        glass.enclosure(code, to.rows().get(0).structure(), "closure", TRAY, "reel change, butt closure");
        int end = from.rows().size() - 1;
        glass.pass(code, from, end);
        glass.pass(code, to, 0);
        from.readAt(end);
        to.readAt(0);
        for (int first = 1; first <= from.type().fibers(); first += 12) {
            Ends ahead = first == flipped ? Ends.ahead(to, first + 11, first) : Ends.ahead(to, first, first + 11);
            Ends back = Ends.back(from, first, first + 11);
            int tray = (first + 11) / 12;
            if (first == 1) {
                glass.spliceTrusted(code, tray, back, ahead, on, Trust.VERIFIED);
            } else if (from == ring.south().reel(1) && first == TESTED) {
                glass.spliceTested(code, tray, back, ahead, on, TESTED_ON);
            } else {
                glass.splice(code, tray, back, ahead, on);
            }
        }
    }

    private void access() {
        remade("C-N05", ring.north().at(7.9), "2015-10-08");
        remade("C-N09", ring.north().at(11.5), "2017-03-15");
        remade("C-N13", ring.north().at(5.8), "2019-08-27");
        closed("C-N11", ring.north(), ring.north().at(2.6));
        closed("C-N12", ring.north(), ring.north().at(3.5));
        closed("C-N14", ring.north(), ring.north().at(13.4));
        closed("C-S08", ring.south(), plant.structureOf("HH-S012"));
        closed("C-S09", ring.south(), plant.structureOf("HH-S017"));
        closed("C-S10", ring.south(), plant.structureOf("HH-S055"));
        closed("C-S11", ring.south(), plant.structureOf("HH-S064"));
        closed("C-S1I", ring.south(), plant.structureOf("HH-S067"));
        double[] kilometres = {1.6, 3.4, 7.8, 9.6, 13.4, 15.6};
        for (int i = 0; i < kilometres.length; i++) {
            closed(Figures.code("C-E", i + 3, 2), ring.east(), ring.east().at(kilometres[i]));
        }
    }

    /** An access closure whose ninth tube was cut for a tap since given up, and joined straight again. */
    private void remade(String code, Structure at, String on) {
        Cable reel = ring.north().reelAt(at);
        int seq = reel.seqAt(at);
        glass.enclosure(code, at, "closure", TRAY, "access; tube 9 cut and joined straight again");
        glass.pass(code, reel, seq);
        reel.readAt(seq);
        glass.splice(code, 1, Ends.back(reel, 97, 108), Ends.ahead(reel, 97, 108), on);
    }

    private void closed(String code, Trunk trunk, Structure at) {
        Cable reel = trunk.reelAt(at);
        int seq = reel.seqAt(at);
        glass.enclosure(code, at, "closure", TRAY, "access, all tubes uncut");
        glass.pass(code, reel, seq);
        reel.readAt(seq);
    }

    /** A hut: four tubes of the feeder and four of the ring on panels, the rest stored. */
    private void hut(String code, Trunk feeder, boolean north) {
        glass.enclosure(code, plant.structureOf(code), "frame", TRAY, "");
        Cable in = feeder.reels().get(feeder.reels().size() - 1);
        Cable ring = north ? this.ring.east().reel(1) : this.ring.east().reel(3);
        glass.pass(code, in, in.rows().size() - 1);
        glass.pass(code, ring, north ? 0 : ring.rows().size() - 1);
        in.readAt(in.rows().size() - 1);
        ring.readAt(north ? 0 : ring.rows().size() - 1);
        glass.panel(code, feeder.name(), 48, "SC/APC");
        glass.panel(code, "RNG-E", 48, "SC/APC");
        int[] tubes = {1, 2, 3, 10};
        for (int i = 0; i < tubes.length; i++) {
            int first = tubes[i] * 12 - 11;
            Trust trust = tubes[i] < 3 ? Trust.VERIFIED : Trust.POSTED;
            glass.pigtailsTrusted(code, feeder.name(), i * 12 + 1, Ends.back(in, first, first + 11), trust);
        }
        for (int first = 1; first <= 48; first += 12) {
            Ends ends = north ? Ends.ahead(ring, first, first + 11) : Ends.back(ring, first, first + 11);
            glass.pigtailsTrusted(code, "RNG-E", first, ends, first == 1 ? Trust.VERIFIED : Trust.POSTED);
        }
        glass.state(code, Ends.back(in, 37, 108), "stored");
        glass.state(code, Ends.back(in, 121, 252), "stored");
        glass.state(code, Ends.back(in, 253, 264), "unknown");
        glass.state(code, Ends.back(in, 265, 288), "stored");
        glass.state(code, north ? Ends.ahead(ring, 49, 144) : Ends.back(ring, 49, 144), "stored");
        if (north) {
            for (int port = 1; port <= 4; port++) {
                glass.jumper("HUT-N/FDR-N/" + port, "HUT-N/RNG-E/" + port, "5");
            }
        } else {
            glass.panel(code, "OLT", 8, "SC/APC");
        }
    }
}
