package org.steamwitness.intake;

import java.nio.charset.Charset;
import java.time.ZoneId;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.steamwitness.finding.Finding;
import org.steamwitness.finding.FindingKind;
import org.steamwitness.finding.Position;
import org.steamwitness.quantity.Progress;
import org.steamwitness.trace.ReadingRules;

/**
 * Reads the delimited text of any logger: finds out how it is written, says what it found, and lets the plan overrule
 * each point. No maker's format is built in.
 */
public final class LogReader {

    private final String file;
    private final ReadingRules rules;
    private final Optional<ZoneId> zone;
    private final Progress progress;

    /**
     * Prepares to read one log.
     *
     * @param file base name of the log, for messages
     * @param rules which columns are wanted and what of the log's form is told
     * @param zone zone of the log's clock, for the steps of summer time; empty if not known
     * @param progress is told of the advance
     */
    public LogReader(String file, ReadingRules rules, Optional<ZoneId> zone, Progress progress) {
        this.file = file;
        this.rules = rules;
        this.zone = zone;
        this.progress = progress;
    }

    /**
     * Reads the log.
     *
     * @param bytes the log as it is
     * @return its trace and how it was read, or why it can't be evaluated
     */
    public Intake read(byte[] bytes) {
        return opened(bytes, (text, form) -> new LogIntake(file, text, form, rules, zone, true).read(progress));
    }

    /**
     * Reads every column that is understood, without a plan: names, quantities, units and datums are those that the
     * headers suggest.
     *
     * @param bytes the log as it is
     * @return its trace and how it was read, or why it can't be understood
     */
    public Intake survey(byte[] bytes) {
        return opened(bytes, (text, form) -> {
            ReadingRules suggested = new ReadingRules(Suggestion.rules(form), rules.told());
            return new LogIntake(file, text, form, suggested, zone, false).read(progress);
        });
    }

    private Intake opened(byte[] bytes, Step step) {
        if (bytes.length == 0) {
            return unreadable(FindingKind.LOG_EMPTY, Map.of());
        }
        Encoding.Found encoding = encoding(bytes);
        if (encoding instanceof Encoding.Found.NoText none) {
            return unreadable(FindingKind.LOG_NOT_TEXT, Map.of("why", none.why()));
        }
        if (encoding instanceof Encoding.Found.Undecided open) {
            return unreadable(FindingKind.ENCODING_UNDECIDED, Map.of("why", open.why()));
        }
        LogText text = new LogText(bytes, ((Encoding.Found.Known) encoding).encoding());
        FormFinder.Found form = new FormFinder(file, text, rules.told()).find();
        if (form instanceof FormFinder.Found.Unclear unclear) {
            return progress.cancelled() ? new Intake.Cancelled() : new Intake.Unreadable(List.of(unclear.why()));
        }
        return step.read(text, ((FormFinder.Found.Known) form).form());
    }

    private Encoding.Found encoding(byte[] bytes) {
        Encoding.Found found = Encoding.of(bytes);
        if (rules.told().encoding().isEmpty()) {
            return found;
        }
        String name = rules.told().encoding().get();
        int skipped = found instanceof Encoding.Found.Known known
                        && known.encoding().charset().name().equals(name)
                ? known.encoding().skipped()
                : 0;
        return new Encoding.Found.Known(new Encoding(Charset.forName(name), name, skipped, "the plan says so"));
    }

    private Intake.Unreadable unreadable(FindingKind kind, Map<String, String> facts) {
        return new Intake.Unreadable(List.of(new Finding(kind, Position.ofFile(file), facts)));
    }

    /** What follows once the form is known. */
    @FunctionalInterface
    private interface Step {
        Intake read(LogText text, LogForm form);
    }
}
