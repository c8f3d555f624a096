package spanwright.fault;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.fault.GlassParts.JointPoint;

/**
 * Fits a path's glass to the known events of a shot: between two neighbouring ones, or the path's start and one, all
 * glass but tray glass is stretched evenly. One thread's, for one path.
 */
final class EventFit {

    /** How far two readings of one point may lie apart: a millimeter, as they are written. */
    private static final double SAME = 1e-3;

    private final GlassParts parts;
    private final double set;
    private final List<Anchor> anchors = new ArrayList<>();
    private final double[] stretch;
    private @Nullable String wrong;

    private EventFit(GlassParts parts, double set, double launch) {
        this.parts = parts;
        this.set = set;
        this.stretch = new double[parts.size()];
        Arrays.fill(stretch, 1);
        anchors.add(new Anchor(0, launch, null));
    }

    /** What comes of a fit: a ruler, or else why there is none. */
    record Fit(@Nullable GlassRuler ruler, @Nullable String wrong) {}

    /**
     * Fits.
     *
     * @param set what a meter on the instrument is worth in optical length
     * @param launch optical length of the launch fiber
     */
    static Fit of(GlassParts parts, List<KnownEvent> events, double set, double launch) {
        EventFit fit = new EventFit(parts, set, launch);
        events.stream()
                .sorted(Comparator.comparing(KnownEvent::reading))
                .takeWhile(event -> fit.wrong == null)
                .forEach(fit::add);
        return fit.wrong == null
                ? new Fit(new GlassRuler(parts, fit.anchors, fit.stretch), null)
                : new Fit(null, fit.wrong);
    }

    private void add(KnownEvent event) {
        double optical = event.reading().metres() * set;
        Optional<Integer> at = findJoint(event.enclosure().id(), optical);
        Anchor before = anchors.get(anchors.size() - 1);
        if (at.isEmpty()) {
            // It stands on the path behind another output.
            return;
        }
        Anchor here = new Anchor(at.get(), optical, event.enclosure());
        if (here.part() < before.part() || optical < before.optical()) {
            wrong = outOfOrder(event, before);
        } else {
            fit(before, here, event);
        }
    }

    /** Of several joints in one enclosure the one whose records' reading is nearest. */
    private Optional<Integer> findJoint(int enclosure, double optical) {
        return parts.joints().stream()
                .filter(joint -> joint.enclosure() == enclosure)
                .map(JointPoint::part)
                .min(Comparator.comparingDouble(part -> Math.abs(recorded(part) - optical)));
    }

    private double recorded(int part) {
        double optical = anchors.get(0).optical();
        for (int each = 0; each < part; each++) {
            optical += parts.part(each).optical();
        }
        return optical;
    }

    private void fit(Anchor before, Anchor here, KnownEvent event) {
        double tray = 0;
        double glass = 0;
        for (int part = before.part(); part < here.part(); part++) {
            if (parts.part(part).tray()) {
                tray += parts.part(part).optical();
            } else {
                glass += parts.part(part).optical();
            }
        }
        double read = here.optical() - before.optical() - tray;
        if (glass == 0) {
            wrong = Math.abs(read) <= SAME * set ? null : samePoint(event, before);
            return;
        }
        if (read <= 0) {
            wrong = outOfOrder(event, before);
            return;
        }
        for (int part = before.part(); part < here.part(); part++) {
            stretch[part] = parts.part(part).tray() ? 1 : read / glass;
        }
        anchors.add(here);
    }

    private String outOfOrder(KnownEvent event, Anchor before) {
        return before.enclosure() == null
                ? event.enclosure().code() + " is read at " + event.reading()
                        + ", within the launch fiber and the tray;" + " a known event is read beyond them"
                : "the path comes to " + before.enclosure().code() + " and "
                        + event.enclosure().code()
                        + " in another order, or too near each other, than they are read; each event's reading is"
                        + " beyond that of the joint before it";
    }

    private static String samePoint(KnownEvent event, Anchor before) {
        String where = before.enclosure() == null
                ? "where the shot begins"
                : "where " + before.enclosure().code() + " is";
        return "no glass lies between " + event.enclosure().code() + " and " + where
                + ", yet they are read apart; leave one of them out";
    }
}
