/** What the reader must know, as typed facts, and the one catalogue of words for them. */
package org.steamwitness.finding;
