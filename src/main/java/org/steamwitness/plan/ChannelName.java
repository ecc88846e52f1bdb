package org.steamwitness.plan;

import java.util.Locale;
import java.util.Set;

/** A short name for the channel of a column, made from its header. */
final class ChannelName {

    private static final int LONGEST = 24;

    private ChannelName() {}

    /** Lower case with hyphens, without a unit in brackets or behind "in", different from all names that are taken. */
    static String of(String header, Set<String> taken) {
        String bare = header.replaceAll("[(\\[{][^)\\]}]*[)\\]}]", " ").replaceFirst("(?<=\\S)\\s+in\\s+\\S+.*$", "");
        String name = bare.toLowerCase(Locale.ROOT)
                .replaceAll("[^\\p{L}\\p{Nd}]+", "-")
                .replaceAll("^-|-$", "");
        if (name.length() > LONGEST) {
            name = name.substring(0, LONGEST).replaceAll("-$", "");
        }
        String first = name.isEmpty() || name.matches("[\\p{Nd}-]+") ? "channel-" + name : name;
        first = first.replaceAll("-$", "");
        String free = first;
        for (int i = 2; taken.contains(free); i++) {
            free = first + "-" + i;
        }
        return free;
    }
}
