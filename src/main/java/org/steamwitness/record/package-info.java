/**
 * The record: its data, as {@code record.json} holds them, and their signed carrier, the PDF made from data and a
 * template. What can't be given is withheld with its reason, never null, never NaN.
 */
package org.steamwitness.record;
