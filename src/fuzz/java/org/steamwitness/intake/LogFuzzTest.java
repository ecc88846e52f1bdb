package org.steamwitness.intake;

import com.code_intelligence.jazzer.junit.FuzzTest;
import java.util.List;
import java.util.Optional;
import org.steamwitness.quantity.Datum;
import org.steamwitness.quantity.Progress;
import org.steamwitness.quantity.TemperatureUnit;
import org.steamwitness.trace.QuantityKind;
import org.steamwitness.trace.ReadingRules;
import org.steamwitness.trace.ReadingRules.ColumnRule;

/** Whatever the bytes are, there is an answer and no exception. */
class LogFuzzTest {

    private static final ReadingRules RULES = new ReadingRules(List.of(new ColumnRule(
            "chamber", "T1", QuantityKind.TEMPERATURE, "degC", Datum.ABSOLUTE, TemperatureUnit.CELSIUS::toKelvin)));

    @FuzzTest(maxDuration = "5m")
    void readsAnything(byte[] bytes) {
        LogReader reader = new LogReader("run.csv", RULES, Optional.empty(), Progress.UNWATCHED);
        Intake read = reader.read(bytes);
        Intake survey = reader.survey(bytes);
        if (read == null || survey == null) {
            throw new IllegalStateException("no answer");
        }
    }
}
