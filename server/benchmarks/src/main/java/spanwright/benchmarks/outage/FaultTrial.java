package spanwright.benchmarks.outage;

import java.util.ArrayList;
import java.util.List;
import java.util.random.RandomGenerator;
import spanwright.benchmarks.outage.TrueRoute.Reel;
import spanwright.fault.FaultFinder;
import spanwright.fault.FaultPlace;
import spanwright.fault.FaultPlaces;
import spanwright.fault.KnownEvent;
import spanwright.fault.Reading;
import spanwright.quantity.Length;
import spanwright.quantity.Wavelength;

/**
 * One break on one drawn route, placed by the program.
 *
 * @param marked whether the marks of the reel were read
 * @param events how many known joints were told: 0, 1 before the break, 2 around it
 * @param within what the program says, m
 * @param off how far the true place is from the one told, along the route, m
 */
record FaultTrial(boolean marked, int events, double within, double off) {

    private static final int LEAST_REEL = 1;

    /** Draws and places one. */
    static FaultTrial of(RandomGenerator chance, Spread spread) {
        TrueRoute route = new TrueRoute(chance, spread);
        RecordedRoute records = new RecordedRoute(route, chance, spread);
        int reel = chance.nextInt(route.reels.size());
        Reel on = route.reels.get(reel);
        int row = chance.nextInt(1, on.places.size());
        double share = chance.nextDouble();
        double index = 1 + spread.index() * chance.nextGaussian();
        List<KnownEvent> events = events(route, records, reel, chance, spread, index);
        double read = route.glassTo(reel, row, share) * index + spread.breakCursor() * chance.nextGaussian();
        Reading reading = new Reading(
                Length.ofMetres(Math.max(0, read)), Length.ZERO, null, Wavelength.ofNanometres(1550), events);
        FaultPlaces found = (FaultPlaces) new FaultFinder(records.snapshot()).find(records.start(), null, reading);
        FaultPlace place = found.places().get(0);
        double told = place.where().position().lon() * TrueRoute.DEGREE;
        return new FaultTrial(
                on.marked,
                events.size(),
                place.uncertainty().within().metres(),
                Math.abs(told - route.place(reel, row, share)));
    }

    private static List<KnownEvent> events(
            TrueRoute route, RecordedRoute records, int reel, RandomGenerator chance, Spread spread, double index) {
        int wanted = chance.nextInt(3);
        List<KnownEvent> events = new ArrayList<>();
        if (wanted > 0 && reel >= LEAST_REEL) {
            events.add(event(route, records, reel, chance, spread, index));
        }
        // The joint behind the last reel is the bare end of the route: nothing to read.
        if (wanted > 1 && reel + 1 < route.reels.size()) {
            events.add(event(route, records, reel + 1, chance, spread, index));
        }
        return events;
    }

    private static KnownEvent event(
            TrueRoute route, RecordedRoute records, int reels, RandomGenerator chance, Spread spread, double index) {
        double read = route.glassTo(reels) * index + spread.eventCursor() * chance.nextGaussian();
        return new KnownEvent(records.closure(reels), Length.ofMetres(read));
    }
}
