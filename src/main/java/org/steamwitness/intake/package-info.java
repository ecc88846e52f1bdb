/** Turns a logger's bytes into a trace, tells how, and what it refused. */
package org.steamwitness.intake;
