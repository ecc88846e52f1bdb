package org.steamwitness.record;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.time.OffsetDateTime;
import java.time.format.DateTimeFormatter;
import java.util.Calendar;
import java.util.GregorianCalendar;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import org.apache.pdfbox.cos.COSArray;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDDocumentNameDictionary;
import org.apache.pdfbox.pdmodel.PDEmbeddedFilesNameTreeNode;
import org.apache.pdfbox.pdmodel.common.PDMetadata;
import org.apache.pdfbox.pdmodel.common.filespecification.PDComplexFileSpecification;
import org.apache.pdfbox.pdmodel.common.filespecification.PDEmbeddedFile;

/** Attaches files to a rendered document and gives it dates and an identity that come from outside, not from a clock. */
final class PdfFinish {

    private static final DateTimeFormatter XMP_DATE =
            DateTimeFormatter.ofPattern("uuuu-MM-dd'T'HH:mm:ssxxx", Locale.ROOT);

    private final PDDocument document;
    private final OffsetDateTime printedAt;
    private final Map<String, PDComplexFileSpecification> files = new TreeMap<>();

    PdfFinish(PDDocument document, OffsetDateTime printedAt) {
        this.document = document;
        this.printedAt = printedAt;
    }

    void attach(Attachment attachment) throws IOException {
        PDEmbeddedFile embedded =
                new PDEmbeddedFile(document, new ByteArrayInputStream(attachment.bytes()), COSName.FLATE_DECODE);
        embedded.setSubtype(attachment.mediaType());
        embedded.setSize(attachment.bytes().length);
        embedded.setCreationDate(calendar());
        embedded.setModDate(calendar());
        String name = files.containsKey(attachment.name())
                ? attachment.relation().words() + " " + attachment.name()
                : attachment.name();
        PDComplexFileSpecification file = new PDComplexFileSpecification();
        file.setFile(name);
        file.setFileUnicode(name);
        file.setFileDescription(attachment.relation().words());
        file.setEmbeddedFile(embedded);
        file.setEmbeddedFileUnicode(embedded);
        file.getCOSObject().setName("AFRelationship", attachment.relation().pdfName());
        files.put(name, file);
    }

    /** Lists the attached files and replaces every trace of the machine's clock. */
    void identify(FileIdentity record) throws IOException {
        PDEmbeddedFilesNameTreeNode tree = new PDEmbeddedFilesNameTreeNode();
        tree.setNames(files);
        PDDocumentNameDictionary names = new PDDocumentNameDictionary(document.getDocumentCatalog());
        names.setEmbeddedFiles(tree);
        document.getDocumentCatalog().setNames(names);
        COSArray associated = new COSArray();
        files.values().forEach(file -> associated.add(file.getCOSObject()));
        document.getDocumentCatalog().getCOSObject().setItem(COSName.getPDFName("AF"), associated);
        document.setDocumentId(Long.parseUnsignedLong(record.sha256().substring(0, 15), 16));
        document.getDocumentInformation().setCreationDate(calendar());
        document.getDocumentInformation().setModificationDate(calendar());
        PDMetadata metadata = document.getDocumentCatalog().getMetadata();
        String xmp = new String(metadata.toByteArray(), StandardCharsets.UTF_8)
                .replaceAll("(<xmp:(\\w*Date)>)[^<]*", "$1" + XMP_DATE.format(printedAt));
        metadata.importXMPMetadata(xmp.getBytes(StandardCharsets.UTF_8));
    }

    private Calendar calendar() {
        return GregorianCalendar.from(printedAt.toZonedDateTime());
    }
}
