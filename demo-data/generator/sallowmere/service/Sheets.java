package sallowmere.service;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import sallowmere.folder.Table;
import sallowmere.glass.Ends;
import sallowmere.glass.Glasswork;
import sallowmere.glass.TakeUp;
import sallowmere.town.District;
import sallowmere.town.TerminalSite;

/** The fourteen sheets that wait to be posted: drops that crews report, each sheet a job of planned joints. */
public final class Sheets {
    /** The day on which the demo stands. */
    public static final LocalDate TODAY = LocalDate.of(2026, 12, 1);

    private static final int[] DAYS = {47, 41, 36, 33, 29, 25, 22, 18, 15, 12, 9, 6, 4, 1};

    private Sheets() {}

    /** Adds the sheets' joints and lists the sheets, oldest first. */
    public static Table waiting(List<District> districts, List<TakeUp> takeUps, Glasswork glass, Random random) {
        Table sheets = new Table("unposted-sheets.csv", "job", "crew", "received_on", "days", "enclosure", "drops");
        List<Integer> order = new ArrayList<>();
        for (int i = 0; i < DAYS.length; i++) {
            order.add(i % districts.size());
        }
        for (int i = 0; i < DAYS.length; i++) {
            District district = districts.get(order.get(i));
            TerminalSite terminal =
                    district.terminals().get((i * 5 + 2) % district.terminals().size());
            List<Integer> used = takeUps.get(order.get(i)).usedPorts(terminal);
            int first = used.get(used.size() - 1) + 1;
            int drops = Math.min(1 + random.nextInt(2), terminal.ports() - first + 1);
            String job = "J-2026-" + (412 + i * 3);
            int fiber = terminal.firstFiber() + first - 1;
            Ends ends = Ends.back(terminal.cable(), fiber, fiber + drops - 1);
            glass.plannedPigtails(terminal.code(), "D", first, ends, job);
            sheets.add(
                    job, "crew " + (1 + random.nextInt(6)), TODAY.minusDays(DAYS[i]), DAYS[i], terminal.code(), drops);
        }
        return sheets;
    }
}
