package org.steamwitness.finding;

import java.util.Locale;

/**
 * The catalogue of findings: what each says, how much it weighs and what to do. Names in braces stand for facts, which
 * a {@link Finding} of this kind has to bring.
 */
public enum FindingKind {
    // the log can't be evaluated
    /** Bytes that are no text. */
    LOG_NOT_TEXT(
            Severity.BLOCKS,
            "The file is no text that could be a log: {why}.",
            "Export the log as delimited text and evaluate that file."),
    /** Text in an encoding that can't be told. */
    ENCODING_UNDECIDED(
            Severity.BLOCKS,
            "The character encoding of the log can't be told: {why}.",
            "Export it again in one encoding, or name it in the plan under reading.encoding."),
    /** Two delimiters fit. */
    DELIMITER_UNDECIDED(
            Severity.BLOCKS,
            "The log reads as rows with {one} and with {other} between the fields.",
            "Name the delimiter in the plan under reading.delimiter."),
    /** Day and month can't be told apart. */
    DATE_ORDER_UNDECIDED(
            Severity.BLOCKS,
            "Day and month of the log's dates can't be told apart: {why}; the first is \"{example}\".",
            "Say in the plan which comes first, under reading.time-format: day-month-year or month-day-year."),
    /** The times have several meanings. */
    TIME_UNDECIDED(
            Severity.BLOCKS,
            "The meaning of the log's times can't be told: {why}.",
            "Say in the plan how they are written, under reading.time-format."),
    /** Nothing that could be a sample. */
    LOG_EMPTY(
            Severity.BLOCKS,
            "The log holds no row that could be read as a sample.",
            "Check that the logger's export has finished and that the right file was named."),
    /** No column of times. */
    LOG_WITHOUT_TIME(
            Severity.BLOCKS,
            "No usable time base: {why}.",
            "Check that the log is delimited text with a column of times; name it in the plan under reading.time-columns."),
    /** A planned column is not there. */
    COLUMN_ABSENT(
            Severity.BLOCKS,
            "The plan's channel {channel} needs a column with the header \"{column}\"; the log has: {headers}.",
            "Name the header in the plan exactly as the log writes it, or the column's place as in #3."),
    /** A planned column stands twice. */
    COLUMN_TWICE(
            Severity.BLOCKS,
            "The header \"{column}\" of the plan's channel {channel} stands {times} times in the log.",
            "Let the logger export each channel under a header of its own."),
    /** Too much was refused. */
    TOO_MANY_ROWS_REFUSED(
            Severity.BLOCKS,
            "{refused} of {rows} rows were refused, more than the {share} % allowed; the first: line {line}, {reason}.",
            "Check that the log is whole and that the plan describes this log."),
    /** More than one cycle. */
    SEVERAL_CYCLES(
            Severity.BLOCKS,
            "The log holds {count} cycles: {cycles}.",
            "Enter in the run sheet which part of the log is this run, such as log-part with from 08:05 and to 10:10."),
    /** A part of the log that is not there. */
    PART_OUTSIDE_LOG(
            Severity.BLOCKS,
            "The run sheet's log-part {from} to {to} does not lie in the log, which runs from {first} to {last}.",
            "Correct log-part; its times are those of the log's clock."),
    /** A channel has no value at all. */
    CHANNEL_EMPTY(
            Severity.BLOCKS,
            "The channel {channel} has no sample that could be read.",
            "Check the column \"{column}\" of the log; if the channel is not in use, take it out of the plan."),

    // plan and run sheet can't be used
    /** A plan or run sheet does not keep its shape. */
    ENTRY_WRONG(Severity.BLOCKS, "{what}", "Correct the file at this place."),
    /** A question mark where a value has to stand. */
    OPEN_PLACE(
            Severity.BLOCKS,
            "open place: fill in {expected}",
            "Fill in what the equipment, the scheduled process or the run gives; the comments of the file say what."),
    /** The run sheet was filled in for another plan. */
    PLAN_DIFFERS(
            Severity.BLOCKS,
            "The run sheet was written for plan {sheet}, this is plan {plan}.",
            "Evaluate with the plan that was used, or correct the run sheet with a reason."),
    /** The run sheet was filled in for other equipment. */
    EQUIPMENT_DIFFERS(
            Severity.BLOCKS,
            "The run sheet names equipment {sheet}, the plan is for {plan}.",
            "Evaluate with the plan of the equipment that was used, or correct the run sheet."),

    /** The plan describes a process that this version can't evaluate at all. */
    PROCESS_NOT_EVALUATED(
            Severity.BLOCKS,
            "This version does not evaluate the process {process}.",
            "Evaluate the run by hand, or with a version that does."),
    /** The plan or the run sheet asks for something that this version does not judge. */
    DEMAND_NOT_JUDGED(
            Severity.BLOCKS, "This version does not judge what is asked for: {demand}.", "A person has to judge it."),

    // the record tells
    /** Rows that did not become samples. */
    ROWS_REFUSED(
            Severity.REVIEW,
            "{lines} refused: {column}: {reason}.",
            "Look at these lines of the log; missing samples are never filled in."),
    /** Rows or fields refused while the hold was running. */
    ROWS_REFUSED_IN_HOLD(
            Severity.BLOCKS,
            "{lines}, in the hold phase, refused in whole or in part.",
            "A person has to look at these lines and judge whether the hold phase is proven without them."),
    /** Missing samples while the hold was running. */
    SAMPLES_MISSING_IN_HOLD(
            Severity.BLOCKS,
            "{samples} samples of {channel} are missing in the hold phase.",
            "A person has to judge whether the hold phase is proven without them."),
    /** A channel that stands still from the first sample to the last. */
    CHANNEL_NEVER_CHANGES(
            Severity.BLOCKS,
            "The channel {channel} shows one value, {value}, in all of its {samples} samples.",
            "Look for a dead sensor or a logger that held its last value; a person has to judge the run."),
    /** Time between samples beyond the plan's longest gap. */
    GAP(
            Severity.REVIEW,
            "No sample for {duration} from {at}, longer than the plan's longest gap of {allowed}.",
            "Holding time and lethality over this gap count as nothing; find out why the logger stopped."),
    /** A gap inside the hold phase or at its end. */
    GAP_IN_HOLD(
            Severity.BLOCKS,
            "The hold is broken by a gap of {duration} from {at}.",
            "What happened in the gap is not known; a person has to judge the run."),
    /** The log stops while the hold is running. */
    LOG_ENDS_IN_HOLD(
            Severity.BLOCKS,
            "The log ends in the hold phase.",
            "The end of the hold is not in the log; look for the rest of the log."),
    /** More than one attempt at the hold. */
    HOLD_IN_ATTEMPTS(
            Severity.REVIEW,
            "The band was held in {count} attempts; the longest, from {from} to {to}, is judged, saturation in the others"
                    + " is not.",
            "See the attempts in the record; a person has to judge why the hold was interrupted."),
    /** A probe without samples. */
    PROBE_WITHOUT_SAMPLES(
            Severity.REVIEW,
            "{channel} has no samples for {duration} in all; its lethality counts nothing for that time.",
            "Look for a loose or broken probe; the lethality it reached may be larger than what is told."),
    /** A departure from saturation too short for an episode. */
    DEPARTURE_SHORT(
            Severity.REVIEW,
            "{channel} left saturation in the hold phase for {samples} samples, too short for an episode; at worst {worst}"
                    + " K at {at}.",
            "Look at these samples; a sensor's fault and a short dip look alike."),
    /** A mark and the log that do not agree. */
    MARK_DIFFERS(
            Severity.REVIEW,
            "The entered mark {mark} at {time} does not agree with the log: {what}.",
            "Check the entry and the clocks; the mark was used as it was entered."),
    /** A mark of the run sheet lies outside the log. */
    MARK_OUTSIDE_LOG(
            Severity.REVIEW,
            "The entered mark {mark} at {time} lies outside the log, which runs from {first} to {last}.",
            "Check the entry and the clock of the logger."),
    /** Marks that can't be placed. */
    MARKS_WITHOUT_CLOCK(
            Severity.REVIEW,
            "The log tells the time since its start alone, so that the entered marks can't be placed.",
            "Enter under clocks what the log and a clock on the wall showed at one moment."),
    /** The log's distance from UTC is not that of the zone. */
    ZONE_DIFFERS(
            Severity.REVIEW,
            "The log tells a distance of {log} from UTC, the zone {zone} has {expected} on that day.",
            "Check the zone of the run sheet; entered times were taken by the log's own clock."),
    /** The clock of the log differs from the one that entries are made by. */
    CLOCK_SET(
            Severity.NOTE,
            "The log's clock showed {log} when the clock on the wall showed {wall}; times of this record are the wall's.",
            "Nothing; line numbers lead to the log's own times."),
    /** Marks that come in an impossible order. */
    MARKS_OUT_OF_ORDER(
            Severity.BLOCKS, "The entered mark {later} comes before {earlier}.", "Check the entries of the run sheet."),
    /** A steam-contact probe left saturation beyond doubt. */
    EPISODE_CONFIRMED(
            Severity.REVIEW,
            "{channel} left saturation from {from} to {to} ({kind}), at worst {worst} K against a tolerance of"
                    + " {tolerance} K, beyond its uncertainty.",
            "See the saturation part of the record; a person has to judge the run."),
    /** A steam-contact probe may have left saturation. */
    EPISODE_POSSIBLE(
            Severity.REVIEW,
            "{channel} may have left saturation from {from} to {to} ({kind}), at worst {worst} K against a tolerance of"
                    + " {tolerance} K, within its uncertainty.",
            "These sensors cannot tell; a person has to judge the run."),
    /** Lines behind the last sample. */
    LINES_BEHIND(
            Severity.NOTE,
            "{lines} lines behind the last sample are no samples; the first: {reason}.",
            "Nothing, if the logger ends its logs with a summary; otherwise look at these lines."),
    /** Something of the log's form was assumed. */
    FORM_ASSUMED(
            Severity.REVIEW,
            "The {what} of the log was assumed to be {value}: {evidence}.",
            "Check that the values are plausible, and say it in the plan under reading."),
    /** A header that differs a little from the plan's. */
    COLUMN_ALIKE(
            Severity.NOTE,
            "The plan's channel {channel} names the column \"{column}\", the log \"{header}\"; no other is alike.",
            "Write the header in the plan as the log writes it."),
    /** The header stands again among the samples. */
    HEADER_REPEATED(
            Severity.NOTE, "The header stands {times} more times among the samples; it was passed over.", "Nothing."),
    /** Codes in place of samples. */
    FAULT_CODES(
            Severity.REVIEW,
            "{samples} samples of {channel} are codes or impossible values and count as missing: {codes}.",
            "Look for an open or overranged sensor."),
    /** A channel that is read less often than rows are written. */
    VALUES_HELD(
            Severity.NOTE,
            "{channel} is read every {every} rows; the values repeated in between are no samples.",
            "Check that the plan's longest gap suits this channel."),
    /** Rows that stand twice. */
    ROWS_DOUBLED(
            Severity.NOTE,
            "{rows} rows repeat time and values of the row before; they were passed over.",
            "Nothing, if the logger is known to do so."),
    /** Several rows under one time. */
    STAMPS_SPREAD(
            Severity.REVIEW,
            "{rows} rows share the time of the row before; they were spread evenly up to the next time.",
            "Let the logger write its times with seconds."),
    /** A clock that went back. */
    CLOCK_JUMP(
            Severity.BLOCKS,
            "The log's clock goes back by {back} s; how much time really passed is not known, later times run on from the"
                    + " row before.",
            "If it is one hour at the end of summer time, enter the zone in the run sheet; otherwise a person has to judge"
                    + " the run."),
    /** A clock that followed summer time. */
    CLOCK_SUMMER_TIME(
            Severity.NOTE,
            "The log's clock changed by one hour for summer time in the zone {zone}; the time base runs on.",
            "Nothing; times behind the change are shown by the clock before it."),
    /** Columns that nobody asked for. */
    COLUMNS_UNREAD(
            Severity.NOTE,
            "Columns of the log that no channel of the plan names: {columns}.",
            "Add them to the plan if they matter."),
    /** A channel of a quantity that enters no result. */
    CHANNEL_NOT_EVALUATED(
            Severity.NOTE,
            "The channel {channel} measures {quantity}, which this version reads and does not evaluate.",
            "Look at it in the log; limits on it are listed as undecided."),
    /** Entries that enter no result. */
    ENTRIES_KEPT(
            Severity.NOTE,
            "These entries of the run sheet enter no result of this version: {entries}.",
            "They stand in the attached run sheet; a person has to look at them."),
    /** Calibration is overdue on the day of the run. */
    CALIBRATION_OVERDUE(
            Severity.BLOCKS,
            "The calibration of {channel} (certificate {certificate}) was due on {due}; the run is of {date}.",
            "Have the sensor checked; a person has to judge the run by what that check finds."),
    /** Whether calibration was due can't be told. */
    DATE_UNKNOWN(
            Severity.REVIEW,
            "The log tells no date, so whether the calibration of {channel} was due is not known.",
            "Compare the date of the run with the due date."),
    /** The plan has not been put in force. */
    PLAN_IS_DRAFT(
            Severity.NOTE,
            "The plan is a draft: its criteria are shown, no verdict is given.",
            "Put the plan in force once it has been approved."),
    /** An entry that the plan requires is not there. */
    ENTRY_MISSING(
            Severity.BLOCKS,
            "The plan requires the entry {entry}, which the run sheet does not hold.",
            "Enter it with the time at which it is entered."),
    /** A character that no font of the record has. */
    GLYPH_MISSING(
            Severity.NOTE,
            "The printed record cannot show these characters: {characters}.",
            "The attached files and the JSON hold them whole.");

    private final Severity severity;
    private final String text;
    private final String remedy;

    FindingKind(Severity severity, String text, String remedy) {
        this.severity = severity;
        this.text = text;
        this.remedy = remedy;
    }

    /**
     * How much a finding of this kind weighs.
     *
     * @return note, review or blocks
     */
    public Severity severity() {
        return severity;
    }

    /**
     * The word used in records, such as "rows-refused".
     *
     * @return lower case with hyphens
     */
    public String word() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    String text() {
        return text;
    }

    String remedy() {
        return remedy;
    }
}
