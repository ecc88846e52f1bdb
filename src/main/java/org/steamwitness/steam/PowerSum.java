package org.steamwitness.steam;

import java.util.List;

/**
 * A sum of n_i a^I_i b^J_i over the rows of a coefficient table, with its first and second derivatives: the form that
 * Eqs. (7), (16) and (17) of IAPWS R7-97(2012) share. Powers are whole and taken by multiplication, and the rows are
 * added in the order of the table, so that every machine gives the same bytes.
 */
final class PowerSum {

    private final List<Term> terms;

    /** Takes the rows of one table in the order of their numbers. */
    PowerSum(Term... terms) {
        this.terms = List.of(terms);
        for (int row = 0; row < terms.length; row++) {
            if (terms[row].number() != row + 1) {
                throw new IllegalArgumentException("row " + (row + 1) + " is numbered " + terms[row].number());
            }
        }
    }

    List<Term> terms() {
        return terms;
    }

    /** The sum and its derivatives by a and b; both variables exceed zero. */
    Gibbs at(double a, double b) {
        double sum = 0;
        double byA = 0;
        double byAA = 0;
        double byB = 0;
        double byBB = 0;
        double byAB = 0;
        for (Term term : terms) {
            double value = term.n() * power(a, term.i()) * power(b, term.j());
            sum += value;
            byA += term.i() * value;
            byAA += term.i() * (term.i() - 1) * value;
            byB += term.j() * value;
            byBB += term.j() * (term.j() - 1) * value;
            byAB += term.i() * term.j() * value;
        }
        return new Gibbs(sum, byA, byAA, byB, byBB, byAB);
    }

    private static double power(double base, int exponent) {
        double result = 1;
        double square = base;
        for (int left = Math.abs(exponent); left > 0; left /= 2) {
            if (left % 2 == 1) {
                result *= square;
            }
            square *= square;
        }
        return exponent < 0 ? 1 / result : result;
    }

    /** One row of a table: its number, the exponents I and J, the coefficient n. */
    record Term(int number, int i, int j, double n) {}
}
