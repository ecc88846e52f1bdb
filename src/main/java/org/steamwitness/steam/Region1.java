package org.steamwitness.steam;

import org.steamwitness.steam.PowerSum.Term;

/**
 * Liquid water: IAPWS R7-97(2012), region 1, Eq. (7), constants of Table 2. From 273.15 K to 623.15 K and from the
 * saturation line to 100 MPa.
 */
public final class Region1 {

    /** Lowest temperature, in kelvin. */
    public static final double LOWEST_KELVIN = 273.15;

    /** Highest temperature, in kelvin. */
    public static final double HIGHEST_KELVIN = 623.15;

    /** Highest absolute pressure, in pascal. */
    public static final double HIGHEST_PASCAL = 100e6;

    private static final double REDUCING_KELVIN = 1386;
    private static final double REDUCING_PASCAL = 16.53e6;

    static final PowerSum TABLE_2 = new PowerSum(
            new Term(1, 0, -2, 0.14632971213167e0),
            new Term(2, 0, -1, -0.84548187169114e0),
            new Term(3, 0, 0, -0.37563603672040e1),
            new Term(4, 0, 1, 0.33855169168385e1),
            new Term(5, 0, 2, -0.95791963387872e0),
            new Term(6, 0, 3, 0.15772038513228e0),
            new Term(7, 0, 4, -0.16616417199501e-1),
            new Term(8, 0, 5, 0.81214629983568e-3),
            new Term(9, 1, -9, 0.28319080123804e-3),
            new Term(10, 1, -7, -0.60706301565874e-3),
            new Term(11, 1, -1, -0.18990068218419e-1),
            new Term(12, 1, 0, -0.32529748770505e-1),
            new Term(13, 1, 1, -0.21841717175414e-1),
            new Term(14, 1, 3, -0.52838357969930e-4),
            new Term(15, 2, -3, -0.47184321073267e-3),
            new Term(16, 2, 0, -0.30001780793026e-3),
            new Term(17, 2, 1, 0.47661393906987e-4),
            new Term(18, 2, 3, -0.44141845330846e-5),
            new Term(19, 2, 17, -0.72694996297594e-15),
            new Term(20, 3, -4, -0.31679644845054e-4),
            new Term(21, 3, 0, -0.28270797985312e-5),
            new Term(22, 3, 6, -0.85205128120103e-9),
            new Term(23, 4, -5, -0.22425281908000e-5),
            new Term(24, 4, -2, -0.65171222895601e-6),
            new Term(25, 4, 10, -0.14341729937924e-12),
            new Term(26, 5, -8, -0.40516996860117e-6),
            new Term(27, 8, -11, -0.12734301741641e-8),
            new Term(28, 8, -6, -0.17424871230634e-9),
            new Term(29, 21, -29, -0.68762131295531e-18),
            new Term(30, 23, -31, 0.14478307828521e-19),
            new Term(31, 29, -38, 0.26335781662795e-22),
            new Term(32, 30, -39, -0.11947622640071e-22),
            new Term(33, 31, -40, 0.18228094581404e-23),
            new Term(34, 32, -41, -0.93537087292458e-25));

    private Region1() {}

    /**
     * Liquid at a temperature and a pressure. A pressure that falls short of the saturation pressure by less than a
     * part in 1e9 counts as equal to it.
     *
     * @param kelvin temperature, 273.15 K to 623.15 K
     * @param pascal absolute pressure, from saturation at {@code kelvin} to 100 MPa
     * @return the state of the liquid
     * @throws OutOfRangeException if either lies outside its range or is NaN; below the saturation pressure there is
     *     steam, and the metastable liquid is not given
     */
    public static SinglePhase at(double kelvin, double pascal) {
        OutOfRangeException.within("liquid, region 1: temperature", kelvin, LOWEST_KELVIN, HIGHEST_KELVIN, "K");
        double boiling = Saturation.pascalAt(kelvin);
        if (!(pascal >= boiling * (1 - Saturation.ROUNDING) && pascal <= HIGHEST_PASCAL)) {
            throw new OutOfRangeException(
                    "liquid, region 1, at " + kelvin + " K: absolute pressure", pascal, boiling, HIGHEST_PASCAL, "Pa");
        }
        return unguarded(kelvin, pascal);
    }

    /** Eq. (7) without a look at the range. */
    static SinglePhase unguarded(double kelvin, double pascal) {
        double pi = pascal / REDUCING_PASCAL;
        double tau = REDUCING_KELVIN / kelvin;
        double a = 7.1 - pi;
        double b = tau - 1.222;
        return new SinglePhase(kelvin, pascal, TABLE_2.at(a, b).scaled(-pi / a, tau / b));
    }
}
