/**
 * Invented runs, simulated without any code of the program: steam comes from the table of IAPWS-95 among the test's
 * reference values. A plant keeps books of mass and energy through a cycle; instruments and a logger write the log; the
 * truth is told from the plant itself.
 */
package simulation;
