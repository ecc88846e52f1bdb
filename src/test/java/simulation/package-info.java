/**
 * Invented runs, simulated without any code of the program: steam comes from the table of IAPWS-95 among the test's
 * reference values.
 */
package simulation;
