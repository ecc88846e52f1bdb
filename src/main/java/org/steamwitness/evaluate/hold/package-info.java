/** How long the band was held and what the probes showed meanwhile. */
package org.steamwitness.evaluate.hold;
