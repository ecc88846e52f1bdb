package simulation;

/**
 * Lethality of a place, integrated over its true temperature second by second.
 *
 * @param channel the probe that sits there
 * @param reference degC
 * @param z kelvin
 * @param minutesToSteamOff minutes at the reference until the steam was shut
 * @param minutes minutes at the reference over the whole run
 */
public record TrueLethality(String channel, double reference, double z, double minutesToSteamOff, double minutes) {

    static TrueLethality of(History history, String channel, int spot, double reference, double z, double steamOff) {
        double sum = 0;
        double before = 0;
        for (int i = 1; i < history.moments().size(); i++) {
            double first = rate(history.moments().get(i - 1).spots().get(spot), reference, z);
            double second = rate(history.moments().get(i).spots().get(spot), reference, z);
            double middle = Math.sqrt(first * second);
            sum += (first + 4 * middle + second) / 6 / 60;
            if (history.moments().get(i).seconds() <= steamOff) {
                before = sum;
            }
        }
        return new TrueLethality(channel, reference, z, before, sum);
    }

    private static double rate(double celsius, double reference, double z) {
        return StrictMath.pow(10, (celsius - reference) / z);
    }
}
