package clipramp.units;

import java.math.BigDecimal;
import java.util.OptionalDouble;

/** What may follow a value: tolerance and ratings, each at most once. */
final class Trailer {
    private final Scanner scanner;
    private final Refusals refusals;
    private final QuantityReader.Value value;
    private double minus;
    private double plus;
    private boolean minusSet;
    private boolean plusSet;
    private OptionalDouble watts = OptionalDouble.empty();
    private OptionalDouble volts = OptionalDouble.empty();

    Trailer(Scanner scanner, Refusals refusals, QuantityReader.Value value) {
        this.scanner = scanner;
        this.refusals = refusals;
        this.value = value;
        if (value.tolerance() > 0) {
            requireTolerance();
            below(value.tolerance());
            above(value.tolerance());
        }
    }

    Quantity read() {
        scanner.skipSpaces();
        while (!scanner.isAtEnd()) {
            item();
            scanner.skipSpaces();
        }
        return new Quantity(value.si(), value.expected().unit(), minus, plus, watts, volts);
    }

    private void item() {
        if (scanner.takes("±")) {
            scanner.skipSpaces();
            double share = share(unsigned());
            below(share);
            above(share);
            return;
        }
        char sign = scanner.peek();
        if (sign == '+' || sign == '-') {
            scanner.takes(String.valueOf(sign));
            scanner.skipSpaces();
            double share = share(unsigned());
            if (sign == '-') {
                below(share);
            } else {
                above(share);
            }
            return;
        }
        ratingOrBarePercent();
    }

    private void ratingOrBarePercent() {
        String number = unsigned();
        String rest = scanner.rest();
        String word = scanner.unitWord();
        if (word.equals("%")) {
            double share = percent(number);
            requireTolerance();
            below(share);
            above(share);
            return;
        }
        var asWatts = Unit.WATT.match(word).filter(m -> !m.spelling().isEmpty());
        var asVolts = Unit.VOLT.match(word).filter(m -> !m.spelling().isEmpty());
        if (!value.expected().ratings() || (asWatts.isEmpty() && asVolts.isEmpty())) {
            throw refusals.trailing(number + rest, value);
        }
        if (asWatts.isPresent()) {
            watts = once(watts, number, asWatts.get(), "W");
        } else {
            volts = once(volts, number, asVolts.orElseThrow(), "V");
        }
    }

    private OptionalDouble once(OptionalDouble before, String number, Unit.Match match, String unit) {
        double rating =
                new BigDecimal(number).scaleByPowerOfTen(match.exponent()).doubleValue();
        if (before.isPresent()) {
            throw refusals.because("one rating in " + unit, "The rating in " + unit + " stands twice: keep one.");
        }
        if (!(rating > 0) || Double.isInfinite(rating)) {
            throw refusals.because("a rating above 0 " + unit, "");
        }
        return OptionalDouble.of(rating);
    }

    private String unsigned() {
        char next = scanner.peek();
        if (next == '+' || next == '-') {
            throw refusals.because("one sign before a tolerance", "Write ±5 %, or -10 % +20 %.");
        }
        return scanner.number().orElseThrow(() -> refusals.trailing(scanner.rest(), value));
    }

    /** A tolerance as a fraction of the value; absolute ones need their unit. */
    private double share(String number) {
        requireTolerance();
        String word = scanner.unitWord();
        if (word.equals("%")) {
            return percent(number);
        }
        if (word.isEmpty()) {
            throw refusals.because("a tolerance with its unit", "±" + number + " %?");
        }
        Unit unit = value.expected().unit();
        Unit.Match match = unit.match(word)
                .orElseThrow(() -> refusals.because("a tolerance in % or " + unit.symbol(), "±" + number + " %?"));
        BigDecimal absolute = new BigDecimal(number).scaleByPowerOfTen(match.exponent());
        if (value.decimal().signum() == 0) {
            throw refusals.because("no tolerance on zero", "Leave the tolerance out.");
        }
        return absolute.doubleValue() / Math.abs(value.decimal().doubleValue());
    }

    private double percent(String number) {
        return new BigDecimal(number).scaleByPowerOfTen(-2).doubleValue();
    }

    private void requireTolerance() {
        if (!value.expected().tolerance()) {
            throw refusals.because(value.expected().inWords() + " without a tolerance", "Leave the tolerance out.");
        }
    }

    private void below(double share) {
        if (minusSet) {
            throw refusals.because("one tolerance", "The tolerance stands twice: keep one.");
        }
        if (!(share < 1)) {
            throw refusals.because("a tolerance under 100 % below", "");
        }
        minus = share;
        minusSet = true;
    }

    private void above(double share) {
        if (plusSet) {
            throw refusals.because("one tolerance", "The tolerance stands twice: keep one.");
        }
        if (!(share <= 10)) {
            throw refusals.because("a tolerance of 1000 % above at most", "");
        }
        plus = share;
        plusSet = true;
    }
}
