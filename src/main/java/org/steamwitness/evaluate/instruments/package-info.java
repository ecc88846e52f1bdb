/** What the log tells of its own sensors and of its sampling, before anything is concluded from them. */
package org.steamwitness.evaluate.instruments;
