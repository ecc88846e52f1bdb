/** Measured values held against limits with their uncertainty, and the verdict on all of them. */
package org.steamwitness.evaluate.criteria;
