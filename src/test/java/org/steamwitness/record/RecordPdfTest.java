package org.steamwitness.record;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.OffsetDateTime;
import java.util.Map;
import java.util.TreeMap;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDResources;
import org.apache.pdfbox.pdmodel.common.filespecification.PDComplexFileSpecification;
import org.apache.pdfbox.pdmodel.font.PDFont;
import org.apache.pdfbox.pdmodel.graphics.image.PDImageXObject;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.steamwitness.run.Outcome;
import org.verapdf.gf.foundry.VeraGreenfieldFoundryProvider;
import org.verapdf.pdfa.Foundries;
import org.verapdf.pdfa.PDFAParser;
import org.verapdf.pdfa.flavours.PDFAFlavour;
import org.verapdf.pdfa.results.ValidationResult;

class RecordPdfTest {

    private static final OffsetDateTime PRINTED = OffsetDateTime.parse("2026-03-14T10:40:00+00:00");

    private static Outcome.Evaluated sample;
    private static byte[] pdf;

    @BeforeAll
    static void print() throws IOException {
        VeraGreenfieldFoundryProvider.initialise();
        sample = Samples.saturatedSteam();
        pdf = sample.pdf().print(PRINTED);
    }

    @ParameterizedTest
    @EnumSource(
            value = PDFAFlavour.class,
            names = {"PDFA_3_A", "PDFA_3_B", "PDFA_3_U", "PDFUA_1"})
    void aValidatorFindsNothing(PDFAFlavour flavour) throws Exception {
        ValidationResult result = validated(pdf, flavour);
        assertThat(result.getTestAssertions()).isEmpty();
        assertThat(result.isCompliant()).isTrue();
    }

    /** The same document without its output intent and its identification: the validator has to find that. */
    @Test
    void theValidatorFindsWhatIsTakenAway() throws Exception {
        try (PDDocument document = Loader.loadPDF(pdf)) {
            document.getDocumentCatalog().getCOSObject().removeItem(COSName.OUTPUT_INTENTS);
            document.getDocumentCatalog().getCOSObject().removeItem(COSName.METADATA);
            ByteArrayOutputStream out = new ByteArrayOutputStream();
            document.save(out);
            ValidationResult result = validated(out.toByteArray(), PDFAFlavour.PDFA_3_A);
            assertThat(result.isCompliant()).isFalse();
            assertThat(result.getTestAssertions()).isNotEmpty();
        }
    }

    @Test
    void hasTwoPagesOfA4WithIdentityOnEach() throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf)) {
            assertThat(document.getNumberOfPages()).isEqualTo(2);
            for (int page = 1; page <= 2; page++) {
                assertThat(document.getPage(page - 1).getMediaBox().getHeight()).isBetween(841f, 842.5f);
                assertThat(text(document, page))
                        .contains("Run R2-0314 · R2 · plan R2-stew-73x111 rev. 3")
                        .contains("page " + page + " of 2")
                        .contains("printed 2026-03-14 10:40 +00:00");
            }
        }
    }

    @Test
    void showsVerdictCriteriaCautionsAndWhatWasNotJudged() throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf)) {
            String all = text(document, 1) + text(document, 2);
            assertThat(all).contains("Criteria of the plan: met", "Not judged, and why", "Signatures");
            sample.record().criteria().forEach(c -> assertThat(all).contains(c.what()));
            String oneLine = all.replaceAll("\\s+", " ");
            sample.record().cautions().forEach(c -> assertThat(oneLine).contains(c.text()));
            sample.record().notJudged().forEach(n -> assertThat(oneLine).contains(n.what() + ": " + n.why()));
            assertThat(all)
                    .doesNotContainIgnoringCase("released")
                    .doesNotContainIgnoringCase("sterile")
                    .doesNotContainIgnoringCase("accepted");
        }
    }

    @Test
    void carriesItsEvidenceByteForByte() throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf)) {
            Map<String, byte[]> attached = new TreeMap<>();
            Map<String, PDComplexFileSpecification> files =
                    document.getDocumentCatalog().getNames().getEmbeddedFiles().getNames();
            for (Map.Entry<String, PDComplexFileSpecification> file : files.entrySet()) {
                attached.put(file.getKey(), file.getValue().getEmbeddedFile().toByteArray());
            }
            assertThat(attached)
                    .containsOnlyKeys(
                            "R2-0314.csv",
                            "R2-0314.plan.yaml",
                            "R2-0314.run.yaml",
                            "cycle-record.xhtml",
                            "record.json");
            for (String name : new String[] {"R2-0314.csv", "R2-0314.plan.yaml", "R2-0314.run.yaml"}) {
                assertThat(attached.get(name)).isEqualTo(Files.readAllBytes(Path.of("sample-logs", name)));
            }
            assertThat(attached.get("record.json")).isEqualTo(RecordJson.write(sample.record()));
        }
    }

    @Test
    void embedsItsFontsAndDrawsTheChartAsVectors() throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf)) {
            for (PDPage page : document.getPages()) {
                PDResources resources = page.getResources();
                for (COSName name : resources.getFontNames()) {
                    PDFont font = resources.getFont(name);
                    assertThat(font.isEmbedded()).as(font.getName()).isTrue();
                }
                for (COSName name : resources.getXObjectNames()) {
                    assertThat(resources.getXObject(name)).isNotInstanceOf(PDImageXObject.class);
                }
            }
            assertThat(document.getPage(1).getContents().readAllBytes().length).isGreaterThan(20_000);
        }
    }

    @Test
    void theSameInputsAndPrintTimeGiveTheSameBytes() throws IOException {
        assertThat(Samples.saturatedSteam().pdf().print(PRINTED)).isEqualTo(pdf);
    }

    private static ValidationResult validated(byte[] document, PDFAFlavour flavour) throws Exception {
        try (PDFAParser parser =
                Foundries.defaultInstance().createParser(new ByteArrayInputStream(document), flavour)) {
            return Foundries.defaultInstance().createValidator(flavour, false).validate(parser);
        }
    }

    private static String text(PDDocument document, int page) throws IOException {
        PDFTextStripper stripper = new PDFTextStripper();
        stripper.setStartPage(page);
        stripper.setEndPage(page);
        return stripper.getText(document);
    }
}
