package org.steamwitness.plan;

import java.time.LocalTime;
import java.time.OffsetDateTime;
import java.util.List;
import java.util.Optional;
import org.steamwitness.quantity.QuantityText;

/** Understands the keys of a run sheet. */
final class RunSheetReader {

    private static final String A_TIME = "a time of day such as 08:12 or 08:12:30";

    private RunSheetReader() {}

    static RunSheet runSheet(Section at) {
        Entry<Integer> format = at.need("run-format").whole(1, 1);
        Entry<String> run = at.need("run").text();
        Entry<PlanUsed> planUsed = at.need("plan-used").section(RunSheetReader::planUsed);
        Entry<String> equipment = at.need("equipment").text();
        Entry<String> zone = at.may("zone").text();
        Entry<Double> atmosphere =
                at.may("atmosphere").parsed("a pressure such as 1008 hPa", QuantityText::atmospherePascal);
        Entry<RunSheet.Product> product = at.may("product").section(RunSheetReader::product);
        Entry<RunSheet.InitialTemperature> initial =
                at.may("initial-temperature").section(RunSheetReader::initialTemperature);
        Entry<Marks> marks = at.may("marks").section(RunSheetReader::marks);
        Entry<RunSheet.Entered> entered = at.need("entered").section(RunSheetReader::entered);
        format.get();
        Marks made = marks.or(Marks.NONE);
        return new RunSheet(
                run.get(),
                planUsed.get().id(),
                planUsed.get().revision(),
                equipment.get(),
                zone.optional(),
                atmosphere.optional(),
                product.optional(),
                initial.optional(),
                made.steamOn(),
                made.ventClosed(),
                made.steamOff(),
                entered.get());
    }

    private static PlanUsed planUsed(Section at) {
        Entry<String> id = at.need("id").text();
        Entry<Integer> revision = at.need("revision").whole(1, 9999);
        return new PlanUsed(id.get(), revision.get());
    }

    private static RunSheet.Product product(Section at) {
        Entry<String> name = at.need("name").text();
        Entry<String> code = at.may("code").text();
        Entry<List<String>> lots = at.may("lots").list(Slot::text);
        Entry<String> container = at.may("container").text();
        Entry<Integer> count = at.may("count").whole(1, 10_000_000);
        return new RunSheet.Product(
                name.get(), code.optional(), lots.or(List.of()), container.optional(), count.optional());
    }

    private static RunSheet.InitialTemperature initialTemperature(Section at) {
        Entry<Double> value = at.need("value").parsed("a temperature such as 68.0 degC", QuantityText::kelvin);
        Entry<LocalTime> time = at.may("at").parsed(A_TIME, LocalTime::parse);
        Entry<String> instrument = at.may("instrument").text();
        return new RunSheet.InitialTemperature(value.get(), time.optional(), instrument.optional());
    }

    private static Marks marks(Section at) {
        Entry<LocalTime> steamOn = at.may("steam-on").parsed(A_TIME, LocalTime::parse);
        Entry<LocalTime> ventClosed = at.may("vent-closed").parsed(A_TIME, LocalTime::parse);
        Entry<LocalTime> steamOff = at.may("steam-off").parsed(A_TIME, LocalTime::parse);
        return new Marks(steamOn.optional(), ventClosed.optional(), steamOff.optional());
    }

    private static RunSheet.Entered entered(Section at) {
        Entry<String> by = at.need("by").text();
        Entry<OffsetDateTime> time =
                at.need("at").parsed("a time such as 2026-03-14T10:31+00:00", OffsetDateTime::parse);
        Entry<String> written = at.need("at").text();
        time.get();
        return new RunSheet.Entered(by.get(), written.get());
    }

    private record PlanUsed(String id, int revision) {}

    private record Marks(Optional<LocalTime> steamOn, Optional<LocalTime> ventClosed, Optional<LocalTime> steamOff) {
        static final Marks NONE = new Marks(Optional.empty(), Optional.empty(), Optional.empty());
    }
}
