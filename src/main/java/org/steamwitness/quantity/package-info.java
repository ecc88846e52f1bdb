/** Units as text, temperature against temperature difference, gauge against absolute, rounding for people. */
package org.steamwitness.quantity;
