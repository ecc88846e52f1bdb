/** How uncertain one sample is, and what is made of many: JCGM 100:2008, with common and random parts kept apart. */
package org.steamwitness.evaluate.uncertainty;
