package spanwright.fault;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import spanwright.fault.NotPlaced.Part;
import spanwright.loss.GlassValues;
import spanwright.network.Snapshot;
import spanwright.records.EndNames;
import spanwright.records.Records;
import spanwright.trace.Path;
import spanwright.trace.Tracer;

/** Finds where distances read on an OTDR lie in one snapshot. One thread's; made for one answer. */
public final class FaultFinder {

    private final Records records;
    private final Tracer tracer;
    private final GlassValues values;
    private final Placing placing;
    private final EndNames names;

    /** A finder in that snapshot. */
    public FaultFinder(Snapshot snapshot) {
        this.records = snapshot.records();
        this.tracer = new Tracer(snapshot);
        this.values = new GlassValues(records);
        this.placing = new Placing(records);
        this.names = new EndNames(records);
    }

    /**
     * Places a reading.
     *
     * @param start key of the end where the shot begins: a port's front, through its rear; or an end, into its glass
     * @param to key of an end that the path reaches, or null: one place an output that leads somewhere
     */
    public FaultAnswer find(long start, @Nullable Long to, Reading reading) {
        List<Path> paths = tracer.fromEnd(start);
        if (paths.isEmpty()) {
            return new NotPlaced(
                    Part.START,
                    "no glass in service begins at " + names.anywhere(start)
                            + "; name a port or an end that is in use");
        }
        List<Path> wanted = to == null
                ? Outputs.leadingSomewhere(paths)
                : paths.stream().filter(path -> Outputs.reaches(path, to)).toList();
        if (wanted.isEmpty()) {
            return new NotPlaced(
                    Part.TO,
                    "the path from " + names.anywhere(start) + " does not reach "
                            + names.anywhere(Objects.requireNonNull(to)));
        }
        return places(wanted, reading);
    }

    /**
     * Places a reading from each end of one break, or of a damaged length.
     *
     * @param start key of the end where the near shot begins
     * @param to key of an end that its path reaches, or null
     * @param farStart key of the end where the far shot begins, on the same fiber or on another of the same cable
     */
    public FaultAnswer find(long start, @Nullable Long to, Reading reading, long farStart, Reading far) {
        FaultAnswer near = find(start, to, reading);
        if (!(near instanceof FaultPlaces places)) {
            return near;
        }
        FaultAnswer other = find(farStart, null, far);
        if (!(other instanceof FaultPlaces farPlaces)) {
            return new NotPlaced(Part.FAR, "from the far end: " + ((NotPlaced) other).sentence());
        }
        if (places.places().size() > 1) {
            return new NotPlaced(Part.TO, "the near shot has a place an output; name the port that it is toward");
        }
        return Between.find(places.places().get(0), farPlaces.places())
                .<FaultAnswer>map(between -> new FaultPlaces(places.places(), between))
                .orElseGet(() -> new NotPlaced(
                        Part.FAR,
                        "the shot from " + names.anywhere(farStart) + " ends in no cable that the path from "
                                + names.anywhere(start) + " runs in; shoot a fiber of the same cable"));
    }

    private FaultAnswer places(List<Path> paths, Reading reading) {
        GlassIndex index = new GlassIndex(values, reading.index(), reading.wavelength());
        List<GlassParts> glass =
                paths.stream().map(path -> GlassParts.of(path, index)).toList();
        for (KnownEvent event : reading.events()) {
            if (glass.stream()
                    .noneMatch(parts -> parts.comesTo(event.enclosure().id()))) {
                return new NotPlaced(
                        Part.EVENT,
                        "the path does not come to " + event.enclosure().code()
                                + "; a known event is a joint of the path that was shot");
            }
        }
        return places(glass, reading, index);
    }

    private FaultAnswer places(List<GlassParts> glass, Reading reading, GlassIndex index) {
        List<FaultPlace> places = new ArrayList<>();
        Set<List<Integer>> met = new HashSet<>();
        for (GlassParts parts : glass) {
            PathShot shot = PathShot.of(parts, reading, index);
            if (shot.refusal() != null) {
                return shot.refusal();
            }
            // Before a splitter all of its outputs share one place.
            if (met.add(shot.branch())) {
                places.add(shot.place(placing, index));
            }
        }
        return new FaultPlaces(places, null);
    }
}
