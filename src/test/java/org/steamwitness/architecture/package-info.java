/**
 * The architecture as a test: arrows between packages, fences round libraries and the rules of the house. Each rule takes
 * the root package, so that it is held against the program and, in the same words, against a fixture that breaks it:
 * {@code fixtures.<rule>} mirrors the packages of the program, and {@link org.steamwitness.architecture.Violates} marks
 * what the rule must name there. What is not marked must pass.
 */
package org.steamwitness.architecture;
