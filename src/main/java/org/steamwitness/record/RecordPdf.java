package org.steamwitness.record;

import com.openhtmltopdf.extend.OutputDevice;
import com.openhtmltopdf.outputdevice.helper.BaseRendererBuilder.FontStyle;
import com.openhtmltopdf.outputdevice.helper.ExternalResourceControlPriority;
import com.openhtmltopdf.pdfboxout.PdfBoxRenderer;
import com.openhtmltopdf.pdfboxout.PdfRendererBuilder;
import com.openhtmltopdf.pdfboxout.PdfRendererBuilder.PdfAConformance;
import com.openhtmltopdf.render.DefaultObjectDrawerFactory;
import com.openhtmltopdf.util.XRLog;
import java.awt.color.ColorSpace;
import java.awt.color.ICC_Profile;
import java.awt.geom.Rectangle2D;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.time.OffsetDateTime;
import java.time.format.DateTimeFormatter;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.apache.pdfbox.pdmodel.font.FontMappers;
import org.jfree.chart.JFreeChart;
import org.steamwitness.chart.ChartFonts;

/**
 * Writes {@code record.pdf}: the record's data in a template, with the run's picture as vectors, its evidence attached,
 * as PDF/A-3 and PDF/UA with embedded fonts. The same inputs and the same print time give the same bytes.
 */
public final class RecordPdf {

    private static final String FONTS = "/org/steamwitness/fonts/";
    private static final DateTimeFormatter PRINTED = DateTimeFormatter.ofPattern("uuuu-MM-dd HH:mm xxx", Locale.ROOT);

    private final Template template;

    /**
     * Prepares to print.
     *
     * @param template arranges the record's data
     */
    public RecordPdf(Template template) {
        this.template = template;
    }

    /**
     * Prints a record.
     *
     * @param record the record
     * @param picture the run's picture
     * @param evidence the files to attach, template and JSON left out
     * @param printedAt the time of printing
     * @return the PDF
     */
    public byte[] write(CycleRecord record, JFreeChart picture, List<Attachment> evidence, OffsetDateTime printedAt) {
        XRLog.setLoggingEnabled(false);
        FontMappers.set(new OwnFontsOnly());
        Map<String, Object> page = PageModel.of(record, PRINTED.format(printedAt));
        try (PdfBoxRenderer renderer = builder(template.filled(page), picture).buildPdfRenderer()) {
            renderer.createPDFWithoutClosing();
            byte[] json = RecordJson.write(record);
            PdfFinish finish = new PdfFinish(renderer.getPdfDocument(), printedAt);
            for (Attachment file : evidence) {
                finish.attach(file);
            }
            finish.attach(new Attachment(
                    template.name(), "application/xhtml+xml", Attachment.Relation.TEMPLATE, template.bytes()));
            finish.attach(new Attachment("record.json", "application/json", Attachment.Relation.RECORD, json));
            finish.identify(FileIdentity.of("record.json", json));
            ByteArrayOutputStream out = new ByteArrayOutputStream();
            renderer.getPdfDocument().save(out);
            return out.toByteArray();
        } catch (IOException impossibleInMemory) {
            throw new UncheckedIOException(impossibleInMemory);
        }
    }

    private PdfRendererBuilder builder(String xhtml, JFreeChart picture) {
        PdfRendererBuilder builder = new PdfRendererBuilder();
        builder.useFastMode();
        font(builder, "IBMPlexSans_400Regular.ttf", 400, FontStyle.NORMAL);
        font(builder, "IBMPlexSans_600SemiBold.ttf", 600, FontStyle.NORMAL);
        font(builder, "IBMPlexSans_400Regular_Italic.ttf", 400, FontStyle.ITALIC);
        builder.useFont(() -> resource("DejaVuSans.ttf"), "DejaVu Sans", 400, FontStyle.NORMAL, true);
        builder.usePdfAConformance(PdfAConformance.PDFA_3_A);
        builder.usePdfUaAccessibility(true);
        builder.useColorProfile(ICC_Profile.getInstance(ColorSpace.CS_sRGB).getData());
        DefaultObjectDrawerFactory drawers = new DefaultObjectDrawerFactory();
        drawers.registerDrawer(
                "run-chart",
                (element, x, y, width, height, device, context, dotsPerPixel) ->
                        draw(picture, new Box(x, y, width / dotsPerPixel, height / dotsPerPixel), device));
        builder.useObjectDrawerFactory(drawers);
        builder.useExternalResourceAccessControl(
                (uri, type) -> false, ExternalResourceControlPriority.RUN_BEFORE_RESOLVING_URI);
        builder.withHtmlContent(xhtml, null);
        return builder;
    }

    private static Map<java.awt.Shape, String> draw(JFreeChart picture, Box box, OutputDevice device) {
        device.drawWithGraphics(
                (float) box.x(),
                (float) box.y(),
                (float) box.width(),
                (float) box.height(),
                graphics -> picture.draw(graphics, new Rectangle2D.Double(0, 0, box.width(), box.height())));
        return Map.of();
    }

    private void font(PdfRendererBuilder builder, String file, int weight, FontStyle style) {
        builder.useFont(() -> resource(file), ChartFonts.FAMILY, weight, style, true);
    }

    private static java.io.InputStream resource(String file) {
        return RecordPdf.class.getResourceAsStream(FONTS + file);
    }

    private record Box(double x, double y, double width, double height) {}
}
