package org.steamwitness.plan;

import java.util.OptionalDouble;
import org.steamwitness.trace.Column;
import org.steamwitness.trace.Place;
import org.steamwitness.trace.QuantityKind;

/**
 * A planned channel tied to its samples.
 *
 * @param name its name in the record
 * @param kind what it measures
 * @param place where its sensor sits
 * @param contact what touches the sensor
 * @param values samples in kelvin or absolute pascal, NaN where missing
 * @param lag the sensor's lag, as stated
 * @param commonUncertainty standard uncertainty that all samples share, in kelvin or pascal; empty if not stated
 * @param sharedUncertainty the part of it that is the same error in all channels with such a part; zero if not stated
 */
public record BoundChannel(
        String name,
        QuantityKind kind,
        Place place,
        Contact contact,
        Column values,
        PlannedChannel.Lag lag,
        OptionalDouble commonUncertainty,
        double sharedUncertainty) {

    /**
     * Tells whether the sensor stands in the chamber's steam, so that saturation applies to it.
     *
     * @return true for temperatures with steam contact
     */
    public boolean inSteam() {
        return kind == QuantityKind.TEMPERATURE && place.steamContact() && contact == Contact.STEAM;
    }

    /**
     * Tells whether the sensor measures a product.
     *
     * @return true for product probes
     */
    public boolean inProduct() {
        return kind == QuantityKind.TEMPERATURE && place == Place.PRODUCT;
    }
}
