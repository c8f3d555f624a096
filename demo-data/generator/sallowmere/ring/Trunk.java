package sallowmere.ring;

import java.util.ArrayList;
import java.util.List;
import sallowmere.geo.Curve;
import sallowmere.plant.Cable;
import sallowmere.plant.Plant;
import sallowmere.plant.Row;
import sallowmere.plant.Structure;

/** A feeder or the ring: reels joined end to end along a road. */
public final class Trunk {
    /** Metres of sheath coiled at a handhole or a butt closure: 100 ft. */
    public static final double COIL = 30.48;

    /** Metres of sheath in an aerial storage loop: 60 ft. */
    public static final double AERIAL_COIL = 18.288;

    private final String name;
    private final Curve road;
    private final List<Cable> reels;

    private Trunk(String name, Curve road, List<Cable> reels) {
        this.name = name;
        this.road = road;
        this.reels = List.copyOf(reels);
    }

    /** Lays reels along the legs from a start; each reel's end gets a coil of its own. */
    static Trunk lay(Plant plant, String name, Curve road, Structure start, List<Leg> legs, List<Reel> makes) {
        List<Cable> reels = new ArrayList<>();
        int reel = 0;
        Cable cable = begin(plant, name, reel, makes.get(0), start);
        reels.add(cable);
        for (Leg leg : legs) {
            boolean ends = leg.to().code().equals(makes.get(reel).end());
            boolean butt = ends && reel + 1 < makes.size();
            cable.go(leg.span(), leg.sheath(), butt ? leg.coil() + COIL : leg.coil());
            if (butt) {
                reel++;
                cable = begin(plant, name, reel, makes.get(reel), leg.to());
                reels.add(cable);
            }
        }
        if (reels.size() != makes.size()) {
            throw new IllegalStateException(name + ": " + reels.size() + " reels laid of " + makes.size());
        }
        return new Trunk(name, road, reels);
    }

    private static Cable begin(Plant plant, String name, int reel, Reel make, Structure start) {
        String code = name + "-" + (reel + 1);
        return plant.cable(
                new Cable(code, make.type(), name, make.overlength(), make.installed(), make.marking(), start, 0));
    }

    /** Its name, of which its reels are part. */
    public String name() {
        return name;
    }

    /** The road it follows. */
    public Curve road() {
        return road;
    }

    /** Its reels in order. */
    public List<Cable> reels() {
        return reels;
    }

    /** One of its reels, counted from one. */
    public Cable reel(int number) {
        return reels.get(number - 1);
    }

    /** The structure nearest to some kilometres of route from its start. */
    public Structure at(double kilometres) {
        double left = kilometres * 1000;
        for (Cable reel : reels) {
            if (left <= reel.last().route() || reel == reels.get(reels.size() - 1)) {
                return reel.rows().get(reel.seqNear(left)).structure();
            }
            left -= reel.last().route();
        }
        throw new IllegalStateException("no reels");
    }

    /** The reel that visits a structure; where two meet, the earlier. */
    public Cable reelAt(Structure structure) {
        return reels.stream()
                .filter(reel -> reel.rows().stream().anyMatch(row -> row.structure() == structure))
                .findFirst()
                .orElseThrow(() -> new IllegalStateException(name + " does not visit " + structure.code()));
    }

    /** Metres of route from its start to a structure. */
    public double routeTo(Structure structure) {
        double before = 0;
        for (Cable reel : reels) {
            for (Row row : reel.rows()) {
                if (row.structure() == structure) {
                    return before + row.route();
                }
            }
            before += reel.last().route();
        }
        throw new IllegalStateException(name + " does not visit " + structure.code());
    }
}
