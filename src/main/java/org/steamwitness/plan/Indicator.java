package org.steamwitness.plan;

/**
 * A chemical or biological indicator as it was read.
 *
 * @param kind "chemical" or "biological", or what the plant calls it
 * @param lot its lot
 * @param result what was read
 * @param readBy who read it
 */
public record Indicator(String kind, String lot, String result, String readBy) {}
