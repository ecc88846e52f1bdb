package simulation;

import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import simulation.plant.Flow;
import simulation.plant.Ledger;

/**
 * All that is true of a run. Seconds count from the first row of the log by a true clock; phases are half-open.
 *
 * @param run its name
 * @param variant what kind of run it is
 * @param seed what it was jittered by
 * @param faulty whether the variant's fault was imposed
 * @param start the log's first row, in the clock of the logger
 * @param interval seconds between rows
 * @param atmosphere Pa
 * @param spots names of the places, in the order of the moments
 * @param phases in order
 * @param attempts stretches in the band of the hold phase
 * @param faults what was imposed
 * @param lethality of the product or load probes
 * @param leakPascalPerSecond true rate at which leaking air alone raises the pressure; NaN if no test was made
 * @param expected verdict
 * @param figures what else is true, by name with its unit
 * @param history second by second
 * @param balance how far the books close
 */
public record Truth(
        String run,
        String variant,
        long seed,
        boolean faulty,
        LocalDateTime start,
        double interval,
        double atmosphere,
        List<String> spots,
        List<Span> phases,
        List<Span> attempts,
        List<Fault> faults,
        List<TrueLethality> lethality,
        double leakPascalPerSecond,
        Expected expected,
        Map<String, Double> figures,
        History history,
        Balance balance) {

    /** The longest stretch in the band of the hold phase; 0 if there was none. */
    public double longestHold() {
        return attempts.stream().mapToDouble(Span::length).max().orElse(0);
    }

    /** What a flow came to over a phase. */
    public double over(Span phase, Flow flow) {
        return to(phase).of(flow) - history.at(phase.from()).ledger().of(flow);
    }

    private Ledger to(Span phase) {
        return history.at(phase.to()).ledger();
    }

    /** All of it but the seconds, as text. */
    public String json() {
        Map<String, Object> all = new LinkedHashMap<>();
        all.put("run", run);
        all.put("variant", variant);
        all.put("seed", seed);
        all.put("fault-imposed", faulty);
        all.put("first-row", start.toString());
        all.put("interval-s", interval);
        all.put("atmosphere-Pa", atmosphere);
        all.put("expected", Map.of("verdict", expected.words()));
        all.put("exit-code", expected.exitCode());
        List<Object> faultList = new ArrayList<>();
        for (Fault fault : faults) {
            Map<String, Object> map = new LinkedHashMap<>();
            map.put("kind", fault.kind());
            map.put("place", fault.place());
            map.put("from-s", fault.from());
            map.put("to-s", fault.to());
            map.put("size", fault.size());
            map.put("unit", fault.unit());
            faultList.add(map);
        }
        all.put("faults", faultList);
        all.put("longest-hold-s", longestHold());
        all.put("hold-attempts", attempts.stream().map(Truth::span).toList());
        all.put("lethality", lethality.stream().map(Truth::lethal).toList());
        all.put("leak-Pa-per-s", leakPascalPerSecond);
        all.put("figures", figures);
        all.put("balance", balance.asMap());
        all.put("phases", phases.stream().map(this::phase).toList());
        return Json.of(all);
    }

    private static Map<String, Object> span(Span span) {
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("from-s", span.from());
        map.put("to-s", span.to());
        return map;
    }

    private static Map<String, Object> lethal(TrueLethality lethality) {
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("channel", lethality.channel());
        map.put("reference-degC", lethality.reference());
        map.put("z-K", lethality.z());
        map.put("to-steam-off-min", lethality.minutesToSteamOff());
        map.put("whole-run-min", lethality.minutes());
        return map;
    }

    private Map<String, Object> phase(Span phase) {
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("phase", phase.name());
        map.put("from-s", phase.from());
        map.put("to-s", phase.to());
        map.put("start", moment(history.at(phase.from())));
        map.put("end", moment(history.at(phase.to())));
        map.put("energy", energy(phase));
        return map;
    }

    private Map<String, Object> moment(Moment moment) {
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("chamber-degC", moment.gas().celsius());
        map.put("pressure-Pa", moment.gas().pascal());
        map.put("air-share", moment.gas().airShare());
        map.put("vapour-kg", moment.gas().vapourKg());
        map.put("liquid-kg", moment.gas().liquidKg());
        map.put("air-kg", moment.gas().airKg());
        map.put("vapour-quality", moment.gas().quality());
        for (int i = 0; i < spots.size(); i++) {
            map.put(spots.get(i) + "-degC", moment.spots().get(i));
        }
        return map;
    }

    /** Energies of a phase in joule, masses in kilogram. */
    public Map<String, Double> energy(Span phase) {
        Moment first = history.at(phase.from());
        Moment last = history.at(phase.to());
        Map<String, Double> map = new LinkedHashMap<>();
        map.put("contents-dU-J", last.contentsJoule() - first.contentsJoule());
        map.put("water-dU-J", last.waterJoule() - first.waterJoule());
        map.put("air-dU-J", last.contentsJoule() - last.waterJoule() - first.contentsJoule() + first.waterJoule());
        map.put("metal-J", last.metalJoule() - first.metalJoule());
        map.put("load-J", last.loadJoule() - first.loadJoule());
        map.put("sump-dH-J", last.sumpJoule() - first.sumpJoule());
        map.put("sump-kg", last.sumpKg() - first.sumpKg());
        map.put("contents-water-kg", last.waterKg() - first.waterKg());
        for (Flow flow : Flow.values()) {
            double amount = over(phase, flow);
            if (amount != 0) {
                map.put(key(flow), amount);
            }
        }
        return map;
    }

    private static String key(Flow flow) {
        String name = flow.name();
        int unit = name.lastIndexOf('_');
        return name.substring(0, unit).toLowerCase(java.util.Locale.ROOT).replace('_', '-')
                + (name.endsWith("KG") ? "-kg" : "-J");
    }
}
