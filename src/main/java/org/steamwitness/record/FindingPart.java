package org.steamwitness.record;

import java.util.List;

/**
 * Something that the reader must know.
 *
 * @param id its number in the record
 * @param kind which entry of the catalogue
 * @param severity note, review or blocks
 * @param place where
 * @param facts by name
 * @param text in words
 * @param remedy what to do
 */
public record FindingPart(
        String id, String kind, String severity, Given<String> place, List<Fact> facts, String text, String remedy) {

    /**
     * One fact.
     *
     * @param name its name
     * @param value its value
     */
    public record Fact(String name, String value) {}
}
