/** One description of each picture, for screen and paper alike. It draws what was evaluated and computes nothing. */
package org.steamwitness.chart;
