package sill.stdlib;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.function.DoublePredicate;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;

/** Closed forms against node equations, and what must hold for every circuit. */
class CircuitPropertyTest {
    private static final double ACCURACY = 1e-9;

    @Property(seed = "13")
    void dividerSolvesTheNetwork(
            @ForAll @Scale(6) @DoubleRange(min = -50, max = 50) double vIn,
            @ForAll("resistances") double rTop,
            @ForAll("resistances") double rBottom,
            @ForAll("resistances") double rLoad) {
        double free = Dividers.output(vIn, rTop, rBottom);
        double loaded = Dividers.output(vIn, rTop, rBottom, rLoad);
        near(network(vIn, rTop, rBottom).voltage(2), free);
        near(network(vIn, rTop, rBottom).resistor(2, 0, rLoad).voltage(2), loaded);
        assertThat(Math.abs(free)).isLessThanOrEqualTo(Math.abs(vIn));
        assertThat(Math.abs(loaded)).isLessThanOrEqualTo(Math.abs(free) * (1 + ACCURACY));
        // Thévenin: the load sees the free output behind the source resistance.
        near(Dividers.output(free, Dividers.sourceResistance(rTop, rBottom), rLoad), loaded);
        near(Dividers.parallel(rTop, rBottom), Dividers.sourceResistance(rTop, rBottom));
    }

    @Property(seed = "13")
    void noninvertingTripsWhereTheNetworkDoes(
            @ForAll @Scale(6) @DoubleRange(min = -15, max = 0) double vOutLow,
            @ForAll @Scale(6) @DoubleRange(min = 0.5, max = 20) double swing,
            @ForAll @Scale(6) @DoubleRange(min = 0, max = 1) double share,
            @ForAll("resistances") double rIn,
            @ForAll("resistances") double rFb) {
        double vOutHigh = vOutLow + swing;
        double vRef = Math.min(vOutHigh, vOutLow + share * swing);
        TripPoints trip = Comparators.noninverting(vRef, rIn, rFb, vOutLow, vOutHigh);
        double rising = crossing(vIn -> noninvertingPin(vIn, rIn, rFb, vOutLow) > vRef);
        double falling = crossing(vIn -> noninvertingPin(vIn, rIn, rFb, vOutHigh) > vRef);
        double scale = 40 * (1 + rIn / rFb);
        Figures.assertWithin("rising", rising, trip.rising(), ACCURACY * scale);
        Figures.assertWithin("falling", falling, trip.falling(), ACCURACY * scale);
        assertThat(trip.rising()).isGreaterThanOrEqualTo(vRef - ACCURACY * scale);
        assertThat(trip.falling()).isLessThanOrEqualTo(vRef + ACCURACY * scale);
        // The band is the output's swing as the input network divides it.
        Figures.assertWithin("band", swing * rIn / rFb, trip.band(), ACCURACY * scale);
        holdsTogether(trip);
    }

    @Property(seed = "13")
    void invertingTripsWhereTheNetworkDoes(
            @ForAll @Scale(6) @DoubleRange(min = -24, max = 24) double vSupply,
            @ForAll @Scale(6) @DoubleRange(min = -15, max = 0) double vOutLow,
            @ForAll @Scale(6) @DoubleRange(min = 0.5, max = 20) double swing,
            @ForAll("resistances") double rTop,
            @ForAll("resistances") double rBottom,
            @ForAll("resistances") double rFb) {
        double vOutHigh = vOutLow + swing;
        TripPoints trip = Comparators.inverting(vSupply, rTop, rBottom, rFb, vOutLow, vOutHigh);
        near(invertingPin(vSupply, rTop, rBottom, rFb, vOutHigh), trip.rising());
        near(invertingPin(vSupply, rTop, rBottom, rFb, vOutLow), trip.falling());
        assertThat(trip.rising()).isBetween(lowest(vSupply, vOutLow), highest(vSupply, vOutHigh));
        holdsTogether(trip);
    }

    @Property(seed = "13")
    void filterReachesTheLevelAtTheTime(
            @ForAll("resistances") double r,
            @ForAll("capacitances") double c,
            @ForAll @Scale(6) @DoubleRange(min = -10, max = 10) double vStart,
            @ForAll @Scale(6) @DoubleRange(min = 0.5, max = 10) double way,
            @ForAll @Scale(6) @DoubleRange(min = 0, max = 0.999) double share) {
        double vFinal = share > 0.5 ? vStart + way : vStart - way;
        double v = vStart + share * (vFinal - vStart);
        double time = Filters.timeToReach(r, c, vStart, vFinal, v);
        assertThat(time).isNotNegative();
        near(vFinal + (vStart - vFinal) * Math.exp(-time / (r * c)), v);
    }

    @Property(seed = "13")
    void filterPassesHalfThePowerAtItsCutoff(@ForAll("resistances") double r, @ForAll("capacitances") double c) {
        near(Math.sqrt(0.5), Filters.gain(Filters.cutoff(r, c), r, c));
        near(1 / (2 * Math.PI), Filters.cutoff(r, c) * Filters.timeConstant(r, c));
        // White noise of 1 V²/Hz through the filter: the integral of the squared gain, by the substitution f =
        // fc·tan(u).
        int steps = 1000;
        double integral = 0;
        for (int i = 0; i < steps; i++) {
            double u = (i + 0.5) / steps * Math.PI / 2;
            double f = Filters.cutoff(r, c) * Math.tan(u);
            double slope = Filters.cutoff(r, c) / (Math.cos(u) * Math.cos(u));
            integral += Math.pow(Filters.gain(f, r, c), 2) * slope * Math.PI / 2 / steps;
        }
        Figures.assertRelative("noise bandwidth", integral, Filters.noiseBandwidth(r, c), ACCURACY);
    }

    @Provide
    Arbitrary<Double> resistances() {
        return powers(0, 6);
    }

    @Provide
    Arbitrary<Double> capacitances() {
        return powers(-11, -4);
    }

    private static Arbitrary<Double> powers(double low, double high) {
        return Arbitraries.doubles()
                .between(low, high)
                .ofScale(6)
                .withoutEdgeCases()
                .map(power -> Math.pow(10, power));
    }

    private static void holdsTogether(TripPoints trip) {
        assertThat(trip.band()).isPositive();
        near(trip.rising(), trip.centre() + trip.band() / 2);
        near(trip.falling(), trip.centre() - trip.band() / 2);
    }

    private static NodalSolver network(double vIn, double rTop, double rBottom) {
        return new NodalSolver(2, 1).source(1, vIn).resistor(1, 2, rTop).resistor(2, 0, rBottom);
    }

    private static double noninvertingPin(double vIn, double rIn, double rFb, double vOut) {
        return new NodalSolver(3, 2)
                .source(1, vIn)
                .source(3, vOut)
                .resistor(1, 2, rIn)
                .resistor(2, 3, rFb)
                .voltage(2);
    }

    private static double invertingPin(double vSupply, double rTop, double rBottom, double rFb, double vOut) {
        return new NodalSolver(3, 2)
                .source(1, vSupply)
                .source(3, vOut)
                .resistor(1, 2, rTop)
                .resistor(2, 0, rBottom)
                .resistor(2, 3, rFb)
                .voltage(2);
    }

    /** The input voltage at which the pin crosses, by halving. */
    private static double crossing(DoublePredicate above) {
        double low = -1e8;
        double high = 1e8;
        for (int i = 0; i < 100; i++) {
            double middle = (low + high) / 2;
            if (above.test(middle)) {
                high = middle;
            } else {
                low = middle;
            }
        }
        return high;
    }

    private static double lowest(double a, double b) {
        return Math.min(0, Math.min(a, b));
    }

    private static double highest(double a, double b) {
        return Math.max(0, Math.max(a, b));
    }

    private static void near(double expected, double actual) {
        Figures.assertWithin("against the node equations", expected, actual, ACCURACY * (1 + Math.abs(expected)));
    }
}
