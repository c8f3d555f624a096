package spanwright.network;

import spanwright.paged.PagedInts;

/** Joins ends in pairs and names the joints, noting which pieces that touches. One thread's. */
final class Links {

    static final int NONE = -1;

    private final PagedInts.Editor peer;
    private final PagedInts.Editor joint;
    private final TouchedPieces touched = new TouchedPieces();

    Links(PagedInts peer, PagedInts joint) {
        this.peer = peer.edit();
        this.joint = joint.edit();
        if (pieces() == 0) {
            touched.addAll();
        }
    }

    int peer(int end) {
        return peer.get(end);
    }

    int joint(int end) {
        return joint.get(end);
    }

    int pieces() {
        return peer.size() >> 1;
    }

    TouchedPieces touched() {
        return touched;
    }

    /** Makes room for fresh pieces at the end, with nothing joined. */
    void grow(int pieces) {
        int before = pieces();
        peer.grow(2 * pieces, NONE);
        joint.grow(2 * pieces, 0);
        if (touched.all()) {
            return;
        }
        for (int piece = before; piece < pieces; piece++) {
            touched.add(piece, pieces);
        }
    }

    /** Joins two free ends. */
    void connect(int one, int other) {
        peer.set(one, other);
        peer.set(other, one);
        touch(one);
        touch(other);
    }

    /** Parts an end from its peer, if it has one. */
    void part(int end) {
        int other = peer.get(end);
        if (other != NONE) {
            peer.set(end, NONE);
            peer.set(other, NONE);
            touch(end);
            touch(other);
        }
    }

    /** Writes which joint names an end, 0 for none. */
    void name(int end, int id) {
        joint.set(end, id);
    }

    /** Clears all ends of dying pieces. */
    void clear(int firstPiece, int count) {
        for (int end = 2 * firstPiece; end < 2 * (firstPiece + count); end++) {
            part(end);
            if (joint.get(end) != 0) {
                joint.set(end, 0);
            }
        }
        for (int piece = firstPiece; piece < firstPiece + count; piece++) {
            touched.add(piece, pieces());
        }
    }

    private void touch(int end) {
        touched.add(end >> 1, pieces());
    }

    /** A plain copy of all peers. */
    int[] peers() {
        int[] peers = new int[peer.size()];
        peer.copyTo(0, peers.length, peers);
        return peers;
    }

    PagedInts buildPeers() {
        return peer.build();
    }

    PagedInts buildJoints() {
        return joint.build();
    }
}
