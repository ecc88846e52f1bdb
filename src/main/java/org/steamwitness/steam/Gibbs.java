package org.steamwitness.steam;

/**
 * A dimensionless Gibbs energy gamma(pi, tau) and its derivatives, each multiplied by the variables it was derived by:
 * byPi is pi gamma_pi, byPiPi is pi^2 gamma_pipi, byPiTau is pi tau gamma_pitau. So written, the relations of Tables 3
 * and 12 of IAPWS R7-97(2012) are one and the same.
 */
record Gibbs(double value, double byPi, double byPiPi, double byTau, double byTauTau, double byPiTau) {

    /**
     * Derivatives by pi and tau of a function of a(pi) and b(tau), both linear: the factors are pi/a da/dpi and tau/b
     * db/dtau.
     */
    Gibbs scaled(double piFactor, double tauFactor) {
        return new Gibbs(
                value,
                piFactor * byPi,
                piFactor * piFactor * byPiPi,
                tauFactor * byTau,
                tauFactor * tauFactor * byTauTau,
                piFactor * tauFactor * byPiTau);
    }

    Gibbs plus(Gibbs other) {
        return new Gibbs(
                value + other.value,
                byPi + other.byPi,
                byPiPi + other.byPiPi,
                byTau + other.byTau,
                byTauTau + other.byTauTau,
                byPiTau + other.byPiTau);
    }
}
