package org.steamwitness.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Stroke;
import java.text.DecimalFormat;
import java.text.DecimalFormatSymbols;
import java.text.SimpleDateFormat;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Locale;
import java.util.TimeZone;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.DateAxis;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.block.BlockBorder;
import org.jfree.chart.plot.CombinedDomainXYPlot;
import org.jfree.chart.plot.IntervalMarker;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.ui.Layer;
import org.jfree.chart.ui.RectangleAnchor;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.TextAnchor;
import org.steamwitness.evaluate.Evaluation;
import org.steamwitness.evaluate.phase.Phase;
import org.steamwitness.evaluate.phase.PhaseName;
import org.steamwitness.evaluate.saturation.Departure;
import org.steamwitness.plan.BoundChannel;
import org.steamwitness.plan.BoundPlan;
import org.steamwitness.quantity.TemperatureUnit;
import org.steamwitness.trace.Column;
import org.steamwitness.trace.QuantityKind;
import org.steamwitness.trace.Trace;

/**
 * The run in one picture: temperatures with the saturation temperature of the measured pressure, departures from
 * saturation, and pressure, on one time axis with the phases behind them. Curves differ in dash as well as in colour.
 */
public final class RunChart {

    private static final double PASCAL_PER_KILOPASCAL = 1e3;
    private static final double MILLISECONDS = 1e3;
    private static final double NAMED_FROM = 0.15;
    private static final Color INK = new Color(0x22, 0x22, 0x22);
    private static final Color GRID = new Color(0xD8, 0xD8, 0xD8);
    private static final Color HOLD_SHADE = new Color(0xE9, 0xED, 0xF2);

    /** Told apart by people who do not see red and green alike, and by their lightness on a grey printer. */
    private static final List<Color> COLOURS = List.of(
            new Color(0x00, 0x3F, 0x7D),
            new Color(0xC4, 0x5A, 0x00),
            new Color(0x00, 0x8A, 0x6E),
            new Color(0x8E, 0x3B, 0x8A),
            new Color(0x6B, 0x6B, 0x00),
            new Color(0x3A, 0xA0, 0xD8));

    private static final List<float[]> DASHES = List.of(
            new float[] {},
            new float[] {6, 2},
            new float[] {2, 2},
            new float[] {8, 2, 2, 2},
            new float[] {10, 4},
            new float[] {4, 1, 1, 1});

    private final Trace trace;
    private final BoundPlan plan;
    private final Evaluation evaluation;
    private final Font small;
    private final double start;

    private RunChart(Trace trace, BoundPlan plan, Evaluation evaluation, ChartFonts fonts) {
        this.trace = trace;
        this.plan = plan;
        this.evaluation = evaluation;
        this.small = fonts.regular(7.5f);
        this.start = trace.clock().first().toInstant(ZoneOffset.UTC).toEpochMilli();
    }

    /**
     * Describes the picture.
     *
     * @param trace the samples
     * @param plan the bound plan
     * @param evaluation what was concluded
     * @param fonts the program's fonts
     * @return a chart that can be drawn at any size
     */
    public static JFreeChart of(Trace trace, BoundPlan plan, Evaluation evaluation, ChartFonts fonts) {
        return new RunChart(trace, plan, evaluation, fonts).chart();
    }

    private JFreeChart chart() {
        CombinedDomainXYPlot stack = new CombinedDomainXYPlot(timeAxis());
        stack.setGap(6);
        stack.add(temperatures(), 5);
        if (evaluation.saturation().notJudged().isEmpty()) {
            stack.add(departures(), 2);
        }
        plan.pressure().ifPresent(p -> stack.add(pressure(p), 2));
        JFreeChart chart = new JFreeChart(null, small, stack, true);
        chart.setBackgroundPaint(Color.WHITE);
        chart.setPadding(new org.jfree.chart.ui.RectangleInsets(2, 2, 2, 6));
        chart.getLegend().setItemFont(small);
        chart.getLegend().setItemPaint(INK);
        chart.getLegend().setFrame(BlockBorder.NONE);
        chart.getLegend().setPosition(RectangleEdge.BOTTOM);
        return chart;
    }

    private XYPlot temperatures() {
        XYPlot plot = plot("temperature, °C", true);
        plot.getRangeAxis().setUpperMargin(0.14);
        int index = 0;
        for (BoundChannel channel : plan.channels()) {
            if (channel.kind() == QuantityKind.TEMPERATURE) {
                add(plot, channel.name(), celsius(channel.values()), index, stroke(1f, index));
                index++;
            }
        }
        if (plan.pressure().isPresent()) {
            plot.setDataset(
                    index,
                    Thinned.of(
                            "saturation temperature of the measured pressure",
                            start,
                            trace.seconds(),
                            celsius(evaluation.saturation().saturationKelvin())));
            plot.setRenderer(index, renderer(Color.BLACK, new BasicStroke(0.5f)));
        }
        return plot;
    }

    private XYPlot departures() {
        XYPlot plot = plot("departure, K", false);
        NumberAxis axis = (NumberAxis) plot.getRangeAxis();
        evaluation.saturation().tolerance().ifPresent(tolerance -> {
            axis.setAutoRange(false);
            double reach =
                    Math.max(2.5 * Math.max(tolerance.airKelvin(), tolerance.superheatKelvin()), 1.15 * worstInHold());
            axis.setRange(-reach, reach);
            plot.addRangeMarker(line(-tolerance.airKelvin()));
            plot.addRangeMarker(line(tolerance.superheatKelvin()));
        });
        int index = 0;
        for (Departure departure : evaluation.saturation().departures()) {
            plot.setDataset(index, Thinned.of(departure.channel().name(), start, trace.seconds(), departure.kelvin()));
            XYLineAndShapeRenderer renderer = renderer(COLOURS.get(index % COLOURS.size()), stroke(1f, index));
            renderer.setDefaultSeriesVisibleInLegend(false);
            plot.setRenderer(index, renderer);
            index++;
        }
        return plot;
    }

    private XYPlot pressure(BoundChannel pressure) {
        XYPlot plot = plot("pressure, kPa abs", false);
        Column kilopascal = new Scaled(pressure.values(), 1 / PASCAL_PER_KILOPASCAL, 0);
        plot.setDataset(Thinned.of(pressure.name(), start, trace.seconds(), kilopascal));
        XYLineAndShapeRenderer renderer = renderer(INK, new BasicStroke(0.8f));
        renderer.setDefaultSeriesVisibleInLegend(false);
        plot.setRenderer(renderer);
        return plot;
    }

    private void add(XYPlot plot, String name, Column values, int index, Stroke stroke) {
        plot.setDataset(index, Thinned.of(name, start, trace.seconds(), values));
        plot.setRenderer(index, renderer(COLOURS.get(index % COLOURS.size()), stroke));
    }

    private XYPlot plot(String label, boolean named) {
        XYPlot plot = new XYPlot(null, null, valueAxis(label), null);
        plot.setBackgroundPaint(Color.WHITE);
        plot.setDomainGridlinePaint(GRID);
        plot.setRangeGridlinePaint(GRID);
        plot.setDomainGridlineStroke(new BasicStroke(0.4f));
        plot.setRangeGridlineStroke(new BasicStroke(0.4f));
        plot.setOutlinePaint(INK);
        plot.setOutlineStroke(new BasicStroke(0.5f));
        for (int i = 0; i < evaluation.phases().phases().size(); i++) {
            plot.addDomainMarker(shade(i, named), Layer.BACKGROUND);
        }
        return plot;
    }

    /** Phases carry their number, and their name where it fits. */
    private IntervalMarker shade(int index, boolean named) {
        Phase phase = evaluation.phases().phases().get(index);
        double from = start + trace.seconds().at(phase.from()) * MILLISECONDS;
        double to = start + trace.seconds().at(phase.to()) * MILLISECONDS;
        IntervalMarker marker = new IntervalMarker(from, to);
        marker.setPaint(phase.name() == PhaseName.HOLD ? HOLD_SHADE : Color.WHITE);
        marker.setAlpha(1);
        marker.setOutlinePaint(Color.GRAY);
        marker.setOutlineStroke(
                new BasicStroke(0.4f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_BEVEL, 1, new float[] {1, 2}, 0));
        if (named) {
            boolean wide = to - from > NAMED_FROM * trace.lastSeconds() * MILLISECONDS;
            marker.setLabel((index + 1) + (wide ? " " + phase.name().word() : ""));
            marker.setLabelBackgroundColor(Color.WHITE);
            marker.setLabelFont(small);
            marker.setLabelPaint(INK);
            marker.setLabelAnchor(RectangleAnchor.TOP);
            marker.setLabelTextAnchor(TextAnchor.TOP_CENTER);
        }
        return marker;
    }

    private static ValueMarker line(double value) {
        return new ValueMarker(
                value,
                INK,
                new BasicStroke(0.6f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_BEVEL, 1, new float[] {4, 3}, 0));
    }

    private DateAxis timeAxis() {
        TimeZone utc = TimeZone.getTimeZone(ZoneOffset.UTC);
        DateAxis axis = new DateAxis("time of day by the log's clock", utc, Locale.ROOT);
        SimpleDateFormat format = new SimpleDateFormat("HH:mm", Locale.ROOT);
        format.setTimeZone(utc);
        axis.setDateFormatOverride(format);
        axis.setLabelFont(small);
        axis.setTickLabelFont(small);
        axis.setTickLabelPaint(INK);
        axis.setLabelPaint(INK);
        axis.setLowerMargin(0);
        axis.setUpperMargin(0);
        return axis;
    }

    private NumberAxis valueAxis(String label) {
        NumberAxis axis = new NumberAxis(label);
        axis.setStandardTickUnits(NumberAxis.createStandardTickUnits(Locale.ROOT));
        axis.setNumberFormatOverride(new DecimalFormat("0.##", DecimalFormatSymbols.getInstance(Locale.ROOT)));
        axis.setAutoRangeIncludesZero(false);
        axis.setLabelFont(small);
        axis.setTickLabelFont(small);
        axis.setTickLabelPaint(INK);
        axis.setLabelPaint(INK);
        return axis;
    }

    private static XYLineAndShapeRenderer renderer(Color colour, Stroke stroke) {
        XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(true, false);
        renderer.setDrawSeriesLineAsPath(true);
        renderer.setSeriesPaint(0, colour);
        renderer.setSeriesStroke(0, stroke);
        renderer.setLegendLine(new java.awt.geom.Line2D.Double(0, 0, 22, 0));
        return renderer;
    }

    private static Stroke stroke(float width, int index) {
        float[] dash = DASHES.get(index % DASHES.size());
        return dash.length == 0
                ? new BasicStroke(width)
                : new BasicStroke(width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_BEVEL, 1, dash, 0);
    }

    private static Column celsius(Column kelvin) {
        return new Scaled(kelvin, 1, TemperatureUnit.CELSIUS.ofKelvin(0));
    }

    private record Scaled(Column from, double factor, double offset) implements Column {
        @Override
        public int size() {
            return from.size();
        }

        @Override
        public double at(int index) {
            return from.at(index) * factor + offset;
        }
    }

    /** The departure furthest from saturation in the hold phase, so that the picture shows it; zero if there is none. */
    private double worstInHold() {
        return evaluation
                .phases()
                .hold()
                .map(phase -> evaluation.saturation().in(phase).stream()
                        .flatMap(p -> p.figures().stream())
                        .mapToDouble(f -> Math.max(
                                Math.abs(f.lowest().kelvin()),
                                Math.abs(f.highest().kelvin())))
                        .max()
                        .orElse(0))
                .orElse(0.0);
    }
}
