package sallowmere.service;

import java.util.List;
import sallowmere.folder.Table;
import sallowmere.glass.Subscription;
import sallowmere.glass.TakeUp;

/** The circuits: 31 from point to point, and one for each subscriber. */
public final class Circuits {
    private static final int VOICE_SHARE = 76;

    private final Table table = new Table(
            "circuits.csv",
            "circuit",
            "service",
            "customer",
            "priority",
            "customers_served",
            "wavelength_nm",
            "budget",
            "protection_group",
            "a",
            "z",
            "status");

    /** Gathers all circuits. */
    public static Table of(List<TakeUp> takeUps) {
        Circuits circuits = new Circuits();
        circuits.lifeSafety();
        circuits.government();
        circuits.businessSouth();
        circuits.businessNorth();
        circuits.lease();
        takeUps.forEach(circuits::subscribers);
        return circuits.table;
    }

    private void lifeSafety() {
        String emergency = "Kestrelby Emergency Communications";
        String hospital = "Sallowmere Memorial Hospital";
        protectedPair("RC-01", "911 trunks", emergency, 1);
        protectedPair("RC-02", "hospital", hospital, 3);
    }

    /** The working circuit on FDR-S and its protection around by FDR-N and RNG-E. */
    private void protectedPair(String code, String service, String customer, int first) {
        String fibers = first + "-" + (first + 1);
        table.add(
                code,
                service + "; federal restoration code",
                customer,
                1,
                1,
                "1550",
                "20",
                code,
                "HE-1/FDR-S/" + fibers,
                "HUT-S/FDR-S/" + fibers,
                "working");
        table.add(
                code + "P",
                service + ", protection",
                customer,
                1,
                1,
                "1550",
                "20",
                code,
                "HE-1/FDR-N/" + fibers,
                "HUT-S/RNG-E/" + fibers,
                "working");
    }

    private void government() {
        point("GOV-01", "sheriff radio", "Kestrelby County Sheriff", 1, "FDR-S", "13-14", "HUT-S");
        point("GOV-02", "courthouse", "Kestrelby County Courthouse", 1, "FDR-S", "15-16", "HUT-S");
        point("GOV-03", "water SCADA", "Sallowmere Water District, intake", 1, "FDR-S", "17", "HUT-S");
        point("GOV-04", "water SCADA", "Sallowmere Water District, treatment", 1, "FDR-S", "18", "HUT-S");
        point("GOV-05", "water SCADA", "Sallowmere Water District, Skarn tank", 1, "FDR-S", "19", "HUT-S");
    }

    private void businessSouth() {
        point("BIZ-01", "cell tower", "Larkmoor Wireless, Pinnock Hill", 2, "FDR-S", "20-21", "HUT-S");
        point("BIZ-02", "bank", "Thessle Valley Savings, Pinnock Ferry", 3, "FDR-S", "22-23", "HUT-S");
        point("BIZ-03", "cell tower", "Larkmoor Wireless, Gantry Mills", 2, "FDR-S", "25-26", "HUT-S");
        point("BIZ-04", "school", "Pinnock Ferry School", 3, "FDR-S", "27-28", "HUT-S");
        point("BIZ-05", "school", "Oxbarrow School", 3, "FDR-S", "29-30", "HUT-S");
        point("BIZ-06", "school", "Gantry Mills School", 3, "FDR-S", "31-32", "HUT-S");
        point("BIZ-07", "business", "Ferry Cold Storage", 3, "FDR-S", "33-34", "HUT-S");
        point("BIZ-08", "business", "Kestrelby Grain Elevators", 3, "FDR-S", "35-36", "HUT-S");
    }

    private void businessNorth() {
        point("BIZ-09", "cell tower", "Larkmoor Wireless, Bracken Ridge", 2, "FDR-N", "13-14", "HUT-N");
        point("BIZ-10", "cell tower", "Larkmoor Wireless, Fennick", 2, "FDR-N", "15-16", "HUT-N");
        point("BIZ-11", "bank", "Thessle Valley Savings, Bracken Forks", 3, "FDR-N", "17-18", "HUT-N");
        point("BIZ-12", "school", "Bracken Forks School", 3, "FDR-N", "19-20", "HUT-N");
        point("BIZ-13", "school", "Fennick School", 3, "FDR-N", "21-22", "HUT-N");
        point("BIZ-14", "school", "Corbel Junction School", 3, "FDR-N", "23-24", "HUT-N");
        point("BIZ-15", "library", "Kestrelby County Library, Bracken Forks", 3, "FDR-N", "25-26", "HUT-N");
        point("BIZ-16", "business", "Marl Hollow Clayworks", 3, "FDR-N", "27-28", "HUT-N");
        point("BIZ-17", "business", "Bracken Forks Sawmill", 3, "FDR-N", "29-30", "HUT-N");
        point("BIZ-18", "business", "Fennick Dairy", 3, "FDR-N", "31-32", "HUT-N");
        point("BIZ-19", "business", "Corbel Junction Freight", 3, "FDR-N", "33-34", "HUT-N");
        point("BIZ-20", "business", "Hotel at the Forks", 3, "FDR-N", "35-36", "HUT-N");
    }

    private void point(
            String code, String service, String customer, int priority, String feeder, String fibers, String hut) {
        table.add(
                code,
                service,
                customer,
                priority,
                1,
                fibers.contains("-") ? "1310" : "1310 1550",
                "14",
                "",
                "HE-1/" + feeder + "/" + fibers,
                hut + "/" + feeder + "/" + fibers,
                "working");
    }

    private void lease() {
        for (int i = 0; i < 2; i++) {
            table.add(
                    "LSE-0" + (i + 1),
                    "dark lease",
                    "Thornmere Rural Cooperative",
                    4,
                    1,
                    "1550",
                    "",
                    "",
                    "HE-1/FDR-S/" + (109 + 2 * i) + "-" + (110 + 2 * i),
                    "HUT-S/FDR-S/" + (37 + 2 * i) + "-" + (38 + 2 * i),
                    "working");
        }
    }

    private void subscribers(TakeUp takeUp) {
        for (Subscription subscription : takeUp.subscriptions()) {
            String number = subscription.district().number();
            String code = String.format("PON-%s-%03d", number, subscription.number());
            boolean voice = voice(subscription);
            table.add(
                    code,
                    voice ? "internet and voice" : "internet",
                    "account " + number + "-" + (1000 + subscription.number() * 7 % 997),
                    voice ? 4 : 5,
                    1,
                    "1310 1490",
                    "B+",
                    "",
                    subscription.headendPort(),
                    subscription.dropPort(),
                    "working");
        }
    }

    /** Three in four have a voice line; CAB-09 to CAB-12 have 410 together. */
    private static boolean voice(Subscription subscription) {
        int cabinet = subscription.district().plan().cabinet();
        int lines = cabinet <= 8 ? TakeUp.SUBSCRIBERS * VOICE_SHARE / 100 : cabinet <= 10 ? 103 : 102;
        return subscription.number() * 29 % TakeUp.SUBSCRIBERS < lines;
    }
}
