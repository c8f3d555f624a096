package spanwright.network;

import spanwright.journal.Change;
import spanwright.records.Records;

/** The records and their network at one posting, or as a view would have them. Immutable. */
public final class Snapshot {

    private static final Snapshot EMPTY = new Snapshot(Records.empty(), Network.empty());

    private final Records records;
    private final Network network;

    Snapshot(Records records, Network network) {
        this.records = records;
        this.network = network;
    }

    /** Of nothing, at posting 0. */
    public static Snapshot empty() {
        return EMPTY;
    }

    /** Of whole records: the network is built from them afresh. */
    public static Snapshot of(Records records) {
        NetworkEditor network = new NetworkEditor(Network.empty(), records);
        records.cables().list().forEach(cable -> network.follow(Change.add(cable)));
        records.panels().list().forEach(panel -> network.follow(Change.add(panel)));
        records.splitters().list().forEach(splitter -> network.follow(Change.add(splitter)));
        network.renew();
        records.joints().list().forEach(joint -> network.follow(Change.add(joint)));
        records.circuits().list().forEach(circuit -> network.follow(Change.add(circuit)));
        return new Snapshot(records, network.build());
    }

    /** The records. */
    public Records records() {
        return records;
    }

    /** Their network. */
    public Network network() {
        return network;
    }

    /** Begins the next snapshot, which shares with this one all that does not change. */
    public SnapshotEditor edit() {
        return new SnapshotEditor(this);
    }
}
