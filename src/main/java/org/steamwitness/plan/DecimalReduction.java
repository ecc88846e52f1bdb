package org.steamwitness.plan;

/**
 * How fast something dies or fades at the reference temperature of a lethality: the decimal reduction time D. A
 * lethality F reduces it by F/D powers of ten. Data of the plan, with the plan's own source; the program knows none.
 *
 * @param of what is reduced, such as a spore or a vitamin
 * @param seconds D at the reference temperature
 * @param source where D comes from
 */
public record DecimalReduction(String of, double seconds, String source) {

    /**
     * Checks the time.
     *
     * @param of what is reduced
     * @param seconds D at the reference temperature
     * @param source where D comes from
     * @throws IllegalArgumentException if D is not above zero
     */
    public DecimalReduction {
        if (!(seconds > 0)) {
            throw new IllegalArgumentException("a decimal reduction time must exceed zero");
        }
    }

    /**
     * Powers of ten by which a lethality reduces it.
     *
     * @param equivalentSeconds the lethality, seconds at the reference temperature
     * @return F/D
     */
    public double powersOfTen(double equivalentSeconds) {
        return equivalentSeconds / seconds;
    }
}
