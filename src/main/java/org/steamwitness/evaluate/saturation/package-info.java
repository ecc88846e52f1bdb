/** Each steam-contact sample held against the saturation temperature of the measured pressure. */
package org.steamwitness.evaluate.saturation;
