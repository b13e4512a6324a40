package sill.study;

/** Samples in order of size, or something that stands for that. */
interface Ordered {
    /** How many samples. */
    long count();

    /** The value at a rank from 1 to the count; between whole ranks by a straight line. */
    double atRank(double rank);

    /** How many samples are at most a value that {@link #snapped} gave. */
    long atMost(double value);

    /** The nearest value for which {@link #atMost} is exact. */
    double snapped(double value);

    /** Ranks 1 ≤ r ≤ count − span: the one for which the values at r and r + span are closest; the first of equals. */
    double closest(double span);

    /** How far the value at a rank may lie from that of the sorted samples. */
    double resolution(double rank);

    /**
     * The quantile by probability, rank r standing for (r − 1/2) / count as in JCGM 101:2008 7.5.1 (clause from memory).
     */
    default double quantile(double probability) {
        return atRank(rank(probability));
    }

    /** The rank of a probability. */
    default double rank(double probability) {
        return Math.max(1, Math.min(count(), probability * count() + 0.5));
    }
}
