package spanwright.answers;

import spanwright.quantity.Loss;
import spanwright.splicing.Joint;
import spanwright.splicing.Splitter;

final class Losses {
    static final Known NOTHING = new Known(Loss.ZERO, Loss.ZERO, "none", "Nothing is lost here");

    Losses(View view) {}

    Known joint(Joint joint) {
        return NOTHING;
    }

    Known splitter(Splitter splitter, int output) {
        return NOTHING;
    }

    record Known(Loss expected, Loss limit, String basis, String source) {}
}
