package spanwright.plants;

import java.util.List;
import spanwright.circuits.PortRange;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.records.RecordsView;
import spanwright.records.Refusal;

/**
 * A small plant drawn by hand, a line a thing, entered by the rules. Words in brackets may be left out:
 *
 * <pre>
 * structure H1 lon lat
 * span H1 H2 [length] [lon lat lon lat ...]      the bends between
 * cable F-1 fibers [tube=12] [type=G.652.D] [over=1.5] [own=1.4] [ink=yellow] [planned] : H1 [+slack] length H2 [+slack] length H3
 * mark F-1 row [in] [out] [ft] [ink]             - for a mark not read
 * enclosure E1 H1 [tray=1.5] [planned] : F-1 [F-2/row] [F-1/row(1-3,5)] ...
 * splitter E1 S1 1x4 [loss] [5=7.5 ...]
 * panel E1 P 12
 * splice E1 : F-1 back 1-3 = D-1 ahead 1-3 [mechanical] [loss=0.05] [tray=T1] [trust=verified] [job=J]
 * term E1/P/1-3 = F-1 ahead 1-3 [direct] [loss=0.05] [trust=verified]
 * jumper E1/P/1 = E1/Q/1 [length]
 * state E1 : F-1 back 1-3 = stored [trust=verified]
 * flag F-1 1-3 dead
 * circuit C-1 E1/P/1-2 E9/P/3-4 [nm=1550] [budget=B+] [retired]
 * planning item expected [limit [sd]]
 * reel F-1 nm loss [index]
 * measured "F-1 ahead 3 @ E4" nm [ab|ba] loss
 * </pre>
 */
public final class Drawing {

    private final Board board = new Board();
    private final DrawnRoutes routes = new DrawnRoutes(board);
    private final DrawnJoints joints = new DrawnJoints(board);
    private final DrawnServices services = new DrawnServices(board);

    private Drawing() {}

    /** The snapshot of a drawing, as posting 1. */
    public static Snapshot of(String text) {
        Drawing drawing = new Drawing();
        text.lines().map(String::strip).filter(line -> !line.isEmpty()).forEach(drawing::line);
        return drawing.board.build();
    }

    /** The snapshot of a drawing as if a planned job were built. */
    public static Snapshot asIf(String job, String text) {
        SnapshotEditor editor = of(text).edit();
        editor.build(job);
        return editor.build(1);
    }

    /** Why the first line that a rule refuses is refused, or else the whole; nothing where all is right. */
    public static List<Refusal> refusals(String text) {
        try {
            of(text);
            return List.of();
        } catch (RefusedDrawing refused) {
            return refused.refusals();
        }
    }

    /** The ports written as {@code E1/P/1-2}. */
    public static PortRange ports(RecordsView records, String text) {
        return Board.ports(records, text);
    }

    private void line(String line) {
        Words words = new Words(line);
        switch (words.next()) {
            case "structure" -> routes.structure(words);
            case "span" -> routes.span(words);
            case "cable" -> routes.cable(words);
            case "mark" -> routes.mark(words);
            case "enclosure" -> routes.enclosure(words);
            case "splitter" -> joints.splitter(words);
            case "panel" -> joints.panel(words);
            case "splice" -> joints.splice(words);
            case "term" -> joints.termination(words);
            case "jumper" -> joints.jumper(words);
            case "state" -> joints.state(words);
            case "flag" -> joints.flag(words);
            case "circuit" -> services.circuit(words);
            case "planning" -> services.planning(words);
            case "reel" -> services.reel(words);
            case "measured" -> services.measured(words);
            default -> throw new IllegalArgumentException(line);
        }
    }
}
