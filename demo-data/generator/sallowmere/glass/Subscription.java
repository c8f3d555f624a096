package sallowmere.glass;

import sallowmere.town.District;
import sallowmere.town.TerminalSite;

/**
 * One subscriber's way from a splitter to a drop.
 *
 * @param district the district
 * @param number the subscriber's number in the district, from 1
 * @param terminal the terminal
 * @param port its drop port
 * @param splitter number of the splitter
 * @param output the splitter's output
 */
public record Subscription(District district, int number, TerminalSite terminal, int port, int splitter, int output) {

    /** The port at the headend. */
    public String headendPort() {
        int fiber = district.tube() * 12 - 12 + splitter;
        return "HE-1/" + district.trunk().name() + "/" + fiber;
    }

    /** The drop port. */
    public String dropPort() {
        return terminal.code() + "/D/" + port;
    }
}
