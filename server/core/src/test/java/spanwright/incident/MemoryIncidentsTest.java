package spanwright.incident;

import java.time.Clock;

class MemoryIncidentsTest extends IncidentBookContract {

    @Override
    protected IncidentBook empty(Clock clock) {
        return new MemoryIncidents(clock);
    }
}
