package org.steamwitness.plan;

import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** What decides how much heat a load takes up. */
public sealed interface LoadHeat {

    /**
     * A specific heat that somebody states.
     *
     * @param massKilogram mass of the load, above zero
     * @param joulePerKilogramKelvin its specific heat, above zero
     */
    record Stated(double massKilogram, double joulePerKilogramKelvin) implements LoadHeat {}

    /**
     * A food, by what it is made of.
     *
     * @param massKilogram mass of the load, above zero
     * @param shares of its mass, each 0 to 1, together 0.98 to 1.02
     */
    record Food(double massKilogram, Map<Component, Double> shares) implements LoadHeat {

        private static final double LEAST_SUM = 0.98;
        private static final double GREATEST_SUM = 1.02;

        /**
         * Checks the sum.
         *
         * @param massKilogram mass of the load
         * @param shares of its mass
         * @throws IllegalArgumentException if the shares don't make up the whole
         */
        public Food {
            double sum =
                    shares.values().stream().mapToDouble(Double::doubleValue).sum();
            if (!(sum >= LEAST_SUM && sum <= GREATEST_SUM)) {
                throw new IllegalArgumentException("the shares of the composition make up "
                        + Math.round(sum * 1000) / 10.0 + " %; expected 98 % to 102 %");
            }
            shares = Collections.unmodifiableMap(new EnumMap<>(shares));
        }
    }

    /**
     * A load of several materials.
     *
     * @param parts at least one
     */
    record Parts(List<Part> parts) implements LoadHeat {

        /**
         * Takes a copy.
         *
         * @param parts at least one
         */
        public Parts {
            parts = List.copyOf(parts);
        }
    }

    /**
     * One part of a load.
     *
     * @param massKilogram its mass, above zero
     * @param material what it is made of
     */
    record Part(double massKilogram, Material material) {}

    /** What a food is made of. */
    enum Component {
        /** Water. */
        WATER,
        /** Protein. */
        PROTEIN,
        /** Fat. */
        FAT,
        /** Carbohydrate without fibre. */
        CARBOHYDRATE,
        /** Fibre. */
        FIBRE,
        /** Ash. */
        ASH;

        /**
         * The word used in plans.
         *
         * @return such as "protein"
         */
        public String word() {
            return name().toLowerCase(Locale.ROOT);
        }
    }
}
