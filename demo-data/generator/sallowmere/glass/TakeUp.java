package sallowmere.glass;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import java.util.stream.Collectors;
import sallowmere.town.District;
import sallowmere.town.TerminalSite;

/** Who of a district took service: 135 subscribers of 240 premises, on which port and which splitter's output. */
public final class TakeUp {
    /** Subscribers of each district. */
    public static final int SUBSCRIBERS = 135;

    private final List<Subscription> subscriptions;

    private TakeUp(List<Subscription> subscriptions) {
        this.subscriptions = List.copyOf(subscriptions);
    }

    /** Draws lots for a district. */
    public static TakeUp draw(District district, Random random) {
        Map<Integer, List<Integer>> ports = ports(district, random);
        List<int[]> drops = new ArrayList<>();
        ports.forEach((terminal, used) -> used.forEach(port -> drops.add(new int[] {terminal, port})));
        List<int[]> outputs = outputs(district.splitters(), random);
        List<int[]> shuffled = new ArrayList<>(drops);
        Collections.shuffle(shuffled, random);
        List<Subscription> subscriptions = new ArrayList<>();
        for (int[] drop : drops) {
            int[] output = outputs.get(shuffled.indexOf(drop));
            TerminalSite terminal = district.terminals().get(drop[0]);
            subscriptions.add(
                    new Subscription(district, subscriptions.size() + 1, terminal, drop[1], output[0], output[1]));
        }
        return new TakeUp(subscriptions);
    }

    /** Ports in use by terminal: the first ones mostly, now and then one left free between. */
    private static Map<Integer, List<Integer>> ports(District district, Random random) {
        Map<Integer, List<Integer>> used = new TreeMap<>();
        int left = SUBSCRIBERS;
        for (int i = 0; i < district.terminals().size(); i++) {
            int ports = district.terminals().get(i).ports();
            int wanted = (int) Math.round(ports * (0.42 + 0.26 * random.nextDouble()));
            List<Integer> list = new ArrayList<>();
            for (int port = 1; port <= ports - 2 && list.size() < wanted; port++) {
                if (random.nextInt(14) > 0) {
                    list.add(port);
                }
            }
            used.put(i, list);
            left -= list.size();
        }
        for (int i = 0; left != 0; i = (i + 5) % district.terminals().size()) {
            left += adjust(used.get(i), district.terminals().get(i).ports(), left);
        }
        return used;
    }

    /** Adds or takes away one port and says how the number still wanted changes by it. */
    private static int adjust(List<Integer> used, int ports, int left) {
        int last = used.get(used.size() - 1);
        if (left > 0 && last < ports - 2) {
            used.add(last + 1);
            return -1;
        }
        if (left < 0 && used.size() > 3) {
            used.remove(used.size() - 1);
            return 1;
        }
        return 0;
    }

    /** Outputs in use, spread over the splitters, here and there one skipped. */
    private static List<int[]> outputs(int splitters, Random random) {
        List<int[]> outputs = new ArrayList<>();
        for (int output = 1; output <= 32 && outputs.size() < SUBSCRIBERS; output++) {
            for (int splitter = 1; splitter <= splitters && outputs.size() < SUBSCRIBERS; splitter++) {
                boolean must = (32 - output) * splitters < SUBSCRIBERS - outputs.size();
                if (must || random.nextInt(10) > 0) {
                    outputs.add(new int[] {splitter, output});
                }
            }
        }
        return outputs;
    }

    /** All subscriptions, by terminal and port. */
    public List<Subscription> subscriptions() {
        return subscriptions;
    }

    /** The ports in use of a terminal, rising. */
    public List<Integer> usedPorts(TerminalSite terminal) {
        return subscriptions.stream()
                .filter(subscription -> subscription.terminal() == terminal)
                .map(Subscription::port)
                .sorted()
                .collect(Collectors.toList());
    }
}
