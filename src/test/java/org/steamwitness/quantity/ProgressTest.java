package org.steamwitness.quantity;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class ProgressTest {

    @Test
    void workThatNobodyWatchesIsNeverCancelled() {
        Progress.UNWATCHED.step("reading", 1);
        assertThat(Progress.UNWATCHED.cancelled()).isFalse();
    }
}
