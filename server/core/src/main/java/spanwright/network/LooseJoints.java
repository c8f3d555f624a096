package spanwright.network;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.paged.PagedRefs;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;

/**
 * The joints in the glass that name legs which are not in the network, such as those of planned plant: leg to joint
 * identities. Immutable.
 */
final class LooseJoints {

    private static final int[] NOTHING = new int[0];

    final List<PagedRefs<int[]>> byKind;
    final int count;

    LooseJoints(List<PagedRefs<int[]>> byKind, int count) {
        this.byKind = List.copyOf(byKind);
        this.count = count;
    }

    static LooseJoints empty() {
        return new LooseJoints(
                Stream.generate(PagedRefs::<int[]>empty)
                        .limit(LegKind.values().length)
                        .toList(),
                0);
    }

    int[] find(LegKind kind, int owner) {
        int[] joints = byKind.get(kind.ordinal()).find(owner);
        return joints == null ? NOTHING : joints;
    }

    Editor edit() {
        return new Editor(this);
    }

    /** One thread's; dead after {@link #build}. */
    static final class Editor {

        private final LooseJoints base;
        private final List<PagedRefs.@Nullable Editor<int[]>> byKind = new ArrayList<>();
        private int count;

        private Editor(LooseJoints base) {
            this.base = base;
            this.count = base.count;
            for (int kind = 0; kind < base.byKind.size(); kind++) {
                byKind.add(null);
            }
        }

        /** Whether no joint names a leg out of the network, which is the rule. */
        boolean isEmpty() {
            return count == 0;
        }

        int[] find(LegKind kind, int owner) {
            PagedRefs.Editor<int[]> edited = byKind.get(kind.ordinal());
            int[] joints = edited == null ? base.byKind.get(kind.ordinal()).find(owner) : edited.find(owner);
            return joints == null ? NOTHING : joints;
        }

        void add(Leg leg, int joint) {
            int[] joints = find(leg.kind(), leg.owner());
            int[] more = Arrays.copyOf(joints, joints.length + 1);
            more[joints.length] = joint;
            edited(leg.kind()).set(leg.owner(), more);
            count++;
        }

        void remove(Leg leg, int joint) {
            int[] joints = find(leg.kind(), leg.owner());
            int[] fewer = Arrays.stream(joints).filter(id -> id != joint).toArray();
            edited(leg.kind()).set(leg.owner(), fewer.length == 0 ? null : fewer);
            count -= joints.length - fewer.length;
        }

        private PagedRefs.Editor<int[]> edited(LegKind kind) {
            PagedRefs.Editor<int[]> editor = byKind.get(kind.ordinal());
            if (editor == null) {
                editor = base.byKind.get(kind.ordinal()).edit();
                byKind.set(kind.ordinal(), editor);
            }
            return editor;
        }

        LooseJoints build() {
            List<PagedRefs<int[]>> built = new ArrayList<>();
            for (int kind = 0; kind < byKind.size(); kind++) {
                PagedRefs.Editor<int[]> editor = byKind.get(kind);
                built.add(editor == null ? base.byKind.get(kind) : editor.build());
            }
            return new LooseJoints(built, count);
        }
    }
}
