/** Lethality integrated along the measured temperatures. */
package org.steamwitness.evaluate.lethality;
