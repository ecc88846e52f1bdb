package org.steamwitness.steam;

import org.steamwitness.steam.PowerSum.Term;

/**
 * Steam: IAPWS R7-97(2012), region 2, Eqs. (15) to (17), constants of Tables 10 and 11. From 273.15 K to 1073.15 K and
 * from 1 Pa to the saturation line, above 623.15 K to the boundary with region 3, above 863.15 K to 100 MPa.
 */
public final class Region2 {

    /** Lowest temperature, in kelvin. */
    public static final double LOWEST_KELVIN = 273.15;

    /** Highest temperature, in kelvin. */
    public static final double HIGHEST_KELVIN = 1073.15;

    /** Lowest absolute pressure, in pascal. The formula goes to any pressure above zero, sensors do not. */
    public static final double LOWEST_PASCAL = 1;

    /** Highest absolute pressure, in pascal. */
    public static final double HIGHEST_PASCAL = 100e6;

    private static final double REDUCING_KELVIN = 540;
    private static final double REDUCING_PASCAL = 1e6;

    static final PowerSum TABLE_10 = new PowerSum(
            new Term(1, 0, 0, -0.96927686500217e1),
            new Term(2, 0, 1, 0.10086655968018e2),
            new Term(3, 0, -5, -0.56087911283020e-2),
            new Term(4, 0, -4, 0.71452738081455e-1),
            new Term(5, 0, -3, -0.40710498223928e0),
            new Term(6, 0, -2, 0.14240819171444e1),
            new Term(7, 0, -1, -0.43839511319450e1),
            new Term(8, 0, 2, -0.28408632460772e0),
            new Term(9, 0, 3, 0.21268463753307e-1));

    static final PowerSum TABLE_11 = new PowerSum(
            new Term(1, 1, 0, -0.17731742473213e-2),
            new Term(2, 1, 1, -0.17834862292358e-1),
            new Term(3, 1, 2, -0.45996013696365e-1),
            new Term(4, 1, 3, -0.57581259083432e-1),
            new Term(5, 1, 6, -0.50325278727930e-1),
            new Term(6, 2, 1, -0.33032641670203e-4),
            new Term(7, 2, 2, -0.18948987516315e-3),
            new Term(8, 2, 4, -0.39392777243355e-2),
            new Term(9, 2, 7, -0.43797295650573e-1),
            new Term(10, 2, 36, -0.26674547914087e-4),
            new Term(11, 3, 0, 0.20481737692309e-7),
            new Term(12, 3, 1, 0.43870667284435e-6),
            new Term(13, 3, 3, -0.32277677238570e-4),
            new Term(14, 3, 6, -0.15033924542148e-2),
            new Term(15, 3, 35, -0.40668253562649e-1),
            new Term(16, 4, 1, -0.78847309559367e-9),
            new Term(17, 4, 2, 0.12790717852285e-7),
            new Term(18, 4, 3, 0.48225372718507e-6),
            new Term(19, 5, 7, 0.22922076337661e-5),
            new Term(20, 6, 3, -0.16714766451061e-10),
            new Term(21, 6, 16, -0.21171472321355e-2),
            new Term(22, 6, 35, -0.23895741934104e2),
            new Term(23, 7, 0, -0.59059564324270e-17),
            new Term(24, 7, 11, -0.12621808899101e-5),
            new Term(25, 7, 25, -0.38946842435739e-1),
            new Term(26, 8, 8, 0.11256211360459e-10),
            new Term(27, 8, 36, -0.82311340897998e1),
            new Term(28, 9, 13, 0.19809712802088e-7),
            new Term(29, 10, 4, 0.10406965210174e-18),
            new Term(30, 10, 10, -0.10234747095929e-12),
            new Term(31, 10, 14, -0.10018179379511e-8),
            new Term(32, 16, 29, -0.80882908646985e-10),
            new Term(33, 16, 50, 0.10693031879409e0),
            new Term(34, 18, 57, -0.33662250574171e0),
            new Term(35, 20, 20, 0.89185845355421e-24),
            new Term(36, 20, 35, 0.30629316876232e-12),
            new Term(37, 20, 48, -0.42002467698208e-5),
            new Term(38, 21, 21, -0.59056029685639e-25),
            new Term(39, 22, 53, 0.37826947613457e-5),
            new Term(40, 23, 39, -0.12768608934681e-14),
            new Term(41, 24, 26, 0.73087610595061e-28),
            new Term(42, 24, 40, 0.55414715350778e-16),
            new Term(43, 24, 58, -0.94369707241210e-6));

    private Region2() {}

    /**
     * Steam at a temperature and a pressure. A pressure that exceeds the saturation pressure by less than a part in
     * 1e9 counts as equal to it.
     *
     * @param kelvin temperature, 273.15 K to 1073.15 K
     * @param pascal absolute pressure, from 1 Pa to {@link #highestPascalAt(double)}
     * @return the state of the steam
     * @throws OutOfRangeException if either lies outside its range or is NaN; above the saturation pressure there is
     *     liquid, and the metastable steam is not given
     */
    public static SinglePhase at(double kelvin, double pascal) {
        double highest = highestPascalAt(kelvin);
        if (!(pascal >= LOWEST_PASCAL && pascal <= highest * (1 + Saturation.ROUNDING))) {
            throw new OutOfRangeException(
                    "steam, region 2, at " + kelvin + " K: absolute pressure", pascal, LOWEST_PASCAL, highest, "Pa");
        }
        return unguarded(kelvin, pascal);
    }

    /**
     * The pressure up to which steam is described at a temperature: saturation up to 623.15 K, then the boundary with
     * region 3, and 100 MPa above 863.15 K.
     *
     * @param kelvin temperature, 273.15 K to 1073.15 K
     * @return absolute pressure in pascal
     * @throws OutOfRangeException if {@code kelvin} lies outside that range or is NaN
     */
    public static double highestPascalAt(double kelvin) {
        OutOfRangeException.within("steam, region 2: temperature", kelvin, LOWEST_KELVIN, HIGHEST_KELVIN, "K");
        if (kelvin <= Boundary23.LOWEST_KELVIN) {
            return Saturation.pascalAt(kelvin);
        }
        return kelvin <= Boundary23.HIGHEST_KELVIN ? Boundary23.pascalAt(kelvin) : HIGHEST_PASCAL;
    }

    /**
     * The temperature from which steam is described at a pressure, the inverse of {@link #highestPascalAt(double)}:
     * 273.15 K below the saturation line, then saturation, then the boundary with region 3.
     *
     * @param pascal absolute pressure, 1 Pa to 100 MPa
     * @return temperature in kelvin
     * @throws OutOfRangeException if {@code pascal} lies outside that range or is NaN
     */
    public static double lowestKelvinAt(double pascal) {
        OutOfRangeException.within("steam, region 2: absolute pressure", pascal, LOWEST_PASCAL, HIGHEST_PASCAL, "Pa");
        if (pascal < Saturation.LOWEST_PASCAL) {
            return LOWEST_KELVIN;
        }
        return pascal < Boundary23.LOWEST_PASCAL ? Saturation.kelvinAt(pascal) : Boundary23.kelvinAt(pascal);
    }

    /** Eq. (15) without a look at the range. */
    static SinglePhase unguarded(double kelvin, double pascal) {
        double pi = pascal / REDUCING_PASCAL;
        double tau = REDUCING_KELVIN / kelvin;
        double b = tau - 0.5;
        Gibbs logarithm = new Gibbs(StrictMath.log(pi), 1, -1, 0, 0, 0);
        Gibbs ideal = logarithm.plus(TABLE_10.at(1, tau));
        return new SinglePhase(kelvin, pascal, ideal.plus(TABLE_11.at(pi, b).scaled(1, tau / b)));
    }
}
