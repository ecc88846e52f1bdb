/** The stretches of the run, each with one purpose. */
package org.steamwitness.evaluate.phase;
