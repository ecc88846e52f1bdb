package org.steamwitness.record;

/**
 * From what and by what a record was made.
 *
 * @param program name of the program
 * @param version its version
 * @param evaluation number of its rules; rises whenever a result of unchanged inputs changes
 * @param log the log
 * @param plan the plan
 * @param runSheet the run sheet
 * @param template the template of the printed record
 */
public record Provenance(
        String program,
        String version,
        int evaluation,
        FileIdentity log,
        FileIdentity plan,
        FileIdentity runSheet,
        FileIdentity template) {

    /**
     * Tells whether two records were made from the same files.
     *
     * @param other another record's provenance
     * @return true if log, plan, run sheet and template have the same bytes
     */
    public boolean sameFilesAs(Provenance other) {
        return log.sha256().equals(other.log.sha256())
                && plan.sha256().equals(other.plan.sha256())
                && runSheet.sha256().equals(other.runSheet.sha256())
                && template.sha256().equals(other.template.sha256());
    }
}
