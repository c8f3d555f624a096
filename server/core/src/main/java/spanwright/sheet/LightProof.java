package spanwright.sheet;

import org.jspecify.annotations.Nullable;
import spanwright.plant.Trust;
import spanwright.splicing.JointFacts;

/**
 * Crossed fibers pass a splice's loss test, and only light sent end to end proves that none is crossed: without it no
 * joint of a range becomes verified.
 */
final class LightProof {

    private LightProof() {}

    /** Whether a line says verified without light, of what was not verified before. */
    static boolean lacks(JointWords words, @Nullable JointFacts before) {
        boolean already = before != null && before.trust() == Trust.VERIFIED;
        return words.trust() == Trust.VERIFIED && words.light() == null && !already;
    }

    /** The words with the trust that their light warrants. */
    static JointWords weigh(JointWords words, @Nullable JointFacts before) {
        if (lacks(words, before)) {
            return with(words, Trust.POSTED);
        }
        boolean proven = words.light() != null && (words.trust() == null || words.trust() == Trust.VERIFIED);
        return proven ? with(words, Trust.VERIFIED) : words;
    }

    private static JointWords with(JointWords words, Trust trust) {
        return new JointWords(
                words.tray(),
                words.method(),
                words.direct(),
                words.loss(),
                trust,
                trust == Trust.VERIFIED && words.seen() == null ? words.light() : words.seen(),
                words.splicedOn(),
                words.splicedBy(),
                words.until(),
                words.job(),
                words.length(),
                words.light());
    }
}
