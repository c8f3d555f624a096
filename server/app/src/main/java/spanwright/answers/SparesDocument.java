package spanwright.answers;

import spanwright.planning.SpareOption;

/** The document of spare fibers from one structure to another. */
public final class SparesDocument {

    private final SparesReply reply;

    /** Of an answer. */
    public SparesDocument(SparesReply reply) {
        this.reply = reply;
    }

    /** Writes its members. */
    public void write(Json json) {
        json.whole("posting", reply.view().posting());
        json.list("options", reply.options(), this::option);
    }

    private void option(Json json, SpareOption option) {
        json.list("fibers", list -> option.runs().forEach(run -> texts(list, reply.glass(run))));
        json.list("ends", list -> option.runs().forEach(run -> texts(list, reply.ends(run))));
        json.flag("same_tube", option.sameTube())
                .whole("new_splices", option.cost().splices());
        json.whole("new_jumpers", option.jumpers()).texts("enclosures_opened", reply.opened(option));
        json.metres("glass_m", option.glass()).decibels("loss_db", option.loss());
        json.flag("verified", option.verified())
                .whole("unverified_joints", option.cost().unverified());
        json.texts("spans", reply.spans(option));
    }

    private static void texts(Json json, Iterable<String> texts) {
        json.listHere(item -> texts.forEach(item::textHere));
    }
}
