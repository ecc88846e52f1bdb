package org.steamwitness.quantity;

/** A text that should hold a quantity does not; the message says what was expected. */
public final class QuantityException extends IllegalArgumentException {

    private static final long serialVersionUID = 1L;

    /**
     * Says what was written and what was expected.
     *
     * @param message in words, for the person who wrote the text
     */
    public QuantityException(String message) {
        super(message);
    }
}
