/** Pure functions from a trace and a bound plan to results; one sub-package a question. */
package org.steamwitness.evaluate;
