package spanwright.http;

import io.javalin.http.Context;
import java.math.BigDecimal;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;

/** A request's parameters, read strictly: a parameter that a route does not know is a mistake, and is said to be one. */
final class Question {

    private static final Pattern WHOLE = Pattern.compile("-?[0-9]{1,9}");
    private static final Pattern DECIMAL = Pattern.compile("-?[0-9]{1,9}(\\.[0-9]{1,20})?");

    private final Context ctx;

    /** Refuses parameters other than those that the route knows. */
    Question(Context ctx, String... known) {
        this.ctx = ctx;
        Set<String> names = new TreeSet<>(Arrays.asList(known));
        for (String asked : ctx.queryParamMap().keySet()) {
            if (!names.contains(asked)) {
                String right = names.isEmpty() ? "There is none here." : "There are: " + String.join(", ", names) + ".";
                throw wrong(asked, "There is no parameter " + asked + ". " + right);
            }
        }
    }

    /** The problem of one wrong parameter. */
    static ProblemException wrong(String parameter, String sentence) {
        return new ProblemException(Problem.badRequest(sentence, parameter));
    }

    /** A step of the path. */
    String step(String name) {
        return ctx.pathParam(name);
    }

    /** A text that may be given once; null where it is not given. */
    @Nullable
    String text(String name) {
        List<String> values = ctx.queryParams(name);
        if (values.size() > 1) {
            throw wrong(name, "The parameter " + name + " is given " + values.size() + " times; it may be given once.");
        }
        return values.isEmpty() ? null : values.get(0);
    }

    /** Texts that may be given any number of times. */
    List<String> texts(String name) {
        return ctx.queryParams(name);
    }

    /** Whether a wish is given as {@code yes}; {@code no} and not given are the same. */
    boolean yes(String name) {
        String value = text(name);
        if (value == null || value.equals("no")) {
            return false;
        }
        if (value.equals("yes")) {
            return true;
        }
        throw wrong(name, name + " is yes or no, not '" + value + "'.");
    }

    /** A text that must be given and may not be blank, of so many characters at most. */
    String needed(String name, int longest) {
        String value = text(name);
        if (value == null || value.isBlank()) {
            throw wrong(name, "The parameter " + name + " is needed.");
        }
        if (value.length() > longest) {
            throw wrong(name, "The parameter " + name + " may be " + longest + " characters long at most.");
        }
        return value;
    }

    /** A whole number within bounds, both included; {@code otherwise} where it is not given. */
    int whole(String name, int least, int most, int otherwise) {
        return findWhole(name, least, most).orElse(otherwise);
    }

    /** A whole number within bounds, both included, if it is given. */
    Optional<Integer> findWhole(String name, int least, int most) {
        String value = text(name);
        return value == null ? Optional.empty() : Optional.of(whole(name, value, least, most));
    }

    /** A step of the path that is a whole number. */
    int wholeStep(String name, int least, int most) {
        return whole(name, step(name), least, most);
    }

    private static int whole(String name, String value, int least, int most) {
        if (WHOLE.matcher(value).matches()) {
            int number = Integer.parseInt(value);
            if (number >= least && number <= most) {
                return number;
            }
        }
        throw wrong(name, name + " is a whole number from " + least + " to " + most + ", not '" + value + "'.");
    }

    /** A plain decimal number, if it is given. */
    Optional<BigDecimal> findDecimal(String name) {
        String value = text(name);
        if (value == null) {
            return Optional.empty();
        }
        if (!DECIMAL.matcher(value).matches()) {
            throw wrong(name, name + " is a plain decimal number, not '" + value + "'.");
        }
        return Optional.of(new BigDecimal(value));
    }

    /** A number within bounds that must be given. */
    double neededNumber(String name, double least, double most) {
        double number = findDecimal(name)
                .orElseThrow(() -> wrong(name, "The parameter " + name + " is needed."))
                .doubleValue();
        if (number < least || number > most) {
            throw wrong(name, name + " lies from " + (long) least + " to " + (long) most + ", not at " + number + ".");
        }
        return number;
    }
}
