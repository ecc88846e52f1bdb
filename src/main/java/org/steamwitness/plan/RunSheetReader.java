package org.steamwitness.plan;

import java.time.LocalTime;
import java.util.List;
import org.steamwitness.quantity.AmountText;
import org.steamwitness.quantity.QuantityText;

/** Understands the keys of a run sheet. */
final class RunSheetReader {

    private RunSheetReader() {}

    static RunSheet runSheet(Section at) {
        Entry<Integer> format = at.need("run-format").whole(1, 1);
        Entry<String> run = at.need("run").text();
        Entry<PlanUsed> planUsed = at.need("plan-used").section(RunSheetReader::planUsed);
        Entry<String> equipment = at.need("equipment").text();
        Entry<LogPart> logPart = at.may("log-part").section(RunSheetReader::logPart);
        Entry<EnteredClocks> clocks = at.may("clocks").section(RunSheetReader::clocks);
        Entry<String> zone = at.may("zone").text();
        Entry<Double> atmosphere =
                at.may("atmosphere").parsed("a pressure such as 1008 hPa", QuantityText::atmospherePascal);
        Entry<RunSheet.Product> product = at.may("product").section(RunSheetReader::product);
        Entry<RunSheet.InitialTemperature> initial =
                at.may("initial-temperature").section(RunSheetReader::initialTemperature);
        Entry<WeighedWater> water = at.may("water").section(RunSheetReader::water);
        Entry<EnteredMarks> marks = at.may("marks").section(MarksReader::marks);
        Entry<List<HandReading>> readings = at.may("readings").anyNumber(HandReadingReader::reading);
        Entry<List<PlacedProbe>> probes = at.may("probes").anyNumber(RunSheetReader::probe);
        Entry<List<Indicator>> indicators = at.may("indicators").anyNumber(RunSheetReader::indicator);
        Entry<List<Correction>> corrections = at.may("corrections").anyNumber(CorrectionReader::correction);
        Entry<List<RunEvent>> events = at.may("events").anyNumber(RunSheetReader::event);
        Entry<RunSheet.Entered> entered = at.need("entered").section(RunSheetReader::entered);
        format.get();
        return new RunSheet(
                run.get(),
                planUsed.get().id(),
                planUsed.get().revision(),
                equipment.get(),
                logPart.optional(),
                zone.optional(),
                clocks.optional(),
                atmosphere.optional(),
                product.optional(),
                initial.optional(),
                water.optional(),
                marks.or(EnteredMarks.NONE),
                readings.or(List.of()),
                probes.or(List.of()),
                indicators.or(List.of()),
                corrections.or(List.of()),
                events.or(List.of()),
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
        Entry<LocalTime> time = at.may("at").parsed(MarksReader.A_TIME, LocalTime::parse);
        Entry<String> instrument = at.may("instrument").text();
        return new RunSheet.InitialTemperature(value.get(), time.optional(), instrument.optional());
    }

    private static LogPart logPart(Section at) {
        Entry<LocalTime> from = MarksReader.time(at.need("from"));
        Entry<LocalTime> to = MarksReader.time(at.need("to"));
        return new LogPart(from.get(), to.get());
    }

    private static EnteredClocks clocks(Section at) {
        Entry<LocalTime> log = MarksReader.time(at.need("log"));
        Entry<LocalTime> wall = MarksReader.time(at.need("wall"));
        return new EnteredClocks(log.get(), wall.get());
    }

    private static WeighedWater water(Section at) {
        Entry<Double> before = at.may("before").parsed("a mass such as 1.20 kg", AmountText::massKilogram);
        Entry<Double> after = at.may("after").parsed("a mass such as 0.93 kg", AmountText::massKilogram);
        return new WeighedWater(before.optional(), after.optional());
    }

    private static PlacedProbe probe(Section at) {
        Entry<String> channel = at.need("channel").text();
        Entry<String> serial = at.may("serial").text();
        Entry<String> position = at.may("position").text();
        return new PlacedProbe(channel.get(), serial.optional(), position.optional());
    }

    private static Indicator indicator(Section at) {
        Entry<String> kind = at.need("kind").text();
        Entry<String> lot = at.need("lot").text();
        Entry<String> result = at.need("result").text();
        Entry<String> readBy = at.need("read-by").text();
        return new Indicator(kind.get(), lot.get(), result.get(), readBy.get());
    }

    private static RunEvent event(Section at) {
        Entry<LocalTime> time = MarksReader.time(at.need("at"));
        Entry<String> what = at.need("what").text();
        return new RunEvent(time.get(), what.get());
    }

    private static RunSheet.Entered entered(Section at) {
        Entry<String> by = at.need("by").text();
        Entry<String> time = CorrectionReader.instant(at.need("at"));
        return new RunSheet.Entered(by.get(), time.get());
    }

    private record PlanUsed(String id, int revision) {}
}
