package org.steamwitness.plan;

/** The closed JSON Schemas (draft 2020-12) of plan and run sheet, for editors that check while people type. */
public final class PublishedSchema {

    private PublishedSchema() {}

    /**
     * The shape of a plan.
     *
     * @return a JSON Schema
     */
    public static String ofPlan() {
        return Preset.resource("schema/plan-1.schema.json");
    }

    /**
     * The shape of a run sheet.
     *
     * @return a JSON Schema
     */
    public static String ofRunSheet() {
        return Preset.resource("schema/run-1.schema.json");
    }
}
