package org.steamwitness.plan;

/**
 * What a calibration says has to be added to a sensor's reading.
 *
 * @param at the reading, in kelvin, or in pascal from the channel's datum
 * @param add what to add there, in kelvin or pascal
 */
public record SensorCorrection(double at, double add) {}
