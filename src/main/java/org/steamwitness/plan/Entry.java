package org.steamwitness.plan;

import java.util.Optional;

/** What was found under one key: a value, nothing, or something that had to be refused and has been reported. */
final class Entry<T> {

    private static final Entry<?> ABSENT = new Entry<>(null, false);
    private static final Entry<?> BROKEN = new Entry<>(null, true);

    private final T value;
    private final boolean broken;

    private Entry(T value, boolean broken) {
        this.value = value;
        this.broken = broken;
    }

    static <T> Entry<T> of(T value) {
        return new Entry<>(value, false);
    }

    @SuppressWarnings("unchecked")
    static <T> Entry<T> absent() {
        return (Entry<T>) ABSENT;
    }

    @SuppressWarnings("unchecked")
    static <T> Entry<T> broken() {
        return (Entry<T>) BROKEN;
    }

    boolean isBroken() {
        return broken;
    }

    /** The value; its absence or refusal has been reported already and ends the section. */
    T get() {
        if (value == null) {
            throw new IncompleteException();
        }
        return value;
    }

    Optional<T> optional() {
        return broken ? Optional.of(get()) : Optional.ofNullable(value);
    }

    /** The value if there is one, and nothing if it was refused. */
    Optional<T> kept() {
        return Optional.ofNullable(value);
    }

    T or(T otherwise) {
        return optional().orElse(otherwise);
    }

    /** A section cannot be completed; what is wrong has been reported. */
    static final class IncompleteException extends RuntimeException {

        private static final long serialVersionUID = 1L;

        IncompleteException() {
            super("an entry that was reported is needed here", null, false, false);
        }
    }
}
