package org.steamwitness.quantity;

/** How long work tells of its advance and learns that it is no longer wanted; polled about every 65,000 rows. */
public interface Progress {

    /** Nobody watches and nobody cancels. */
    Progress UNWATCHED = new Progress() {
        @Override
        public void step(String what, double fraction) {
            // nobody watches
        }

        @Override
        public boolean cancelled() {
            return false;
        }
    };

    /**
     * Tells what is being done.
     *
     * @param what the present step, in words
     * @param fraction how much of the whole is done, 0 to 1
     */
    void step(String what, double fraction);

    /**
     * Asks whether the work should stop.
     *
     * @return true when nobody wants the result any more
     */
    boolean cancelled();
}
