package soakline.intake;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;

/** Writes the least that is a workbook: one sheet, with texts in place, numbers, and two date styles. */
final class Workbooks {

    /** Style numbers of a cell. */
    static final int DATE_TIME = 1;

    static final int CLOCK = 2;

    private static final String HEAD = "<?xml version=\"1.0\" encoding=\"UTF-8\" standalone=\"yes\"?>";
    private static final String MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
    private static final String OFFICE = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
    private static final String PACKAGE = "http://schemas.openxmlformats.org/package/2006/";

    private final StringBuilder rows = new StringBuilder();
    private boolean from1904;
    private boolean styled = true;
    private int row;

    Workbooks from1904() {
        from1904 = true;
        return this;
    }

    Workbooks withoutStyles() {
        styled = false;
        return this;
    }

    /** A row of texts and numbers; {@code new double[] {value, style}} is a number in a style; null leaves a cell out. */
    Workbooks row(Object... cells) {
        row++;
        rows.append("<row r=\"").append(row).append("\">");
        for (int i = 0; i < cells.length; i++) {
            String at = " r=\"" + (char) ('A' + i) + row + "\"";
            if (cells[i] instanceof double[] styled) {
                rows.append("<c" + at + " s=\"" + (int) styled[1] + "\"><v>" + styled[0] + "</v></c>");
            } else if (cells[i] instanceof Number number) {
                rows.append("<c" + at + "><v>" + number + "</v></c>");
            } else if (cells[i] != null) {
                rows.append("<c" + at + " t=\"inlineStr\"><is><t>" + cells[i] + "</t></is></c>");
            }
        }
        rows.append("</row>");
        return this;
    }

    /** Leaves a row out. */
    Workbooks gap() {
        row++;
        return this;
    }

    byte[] bytes() {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ZipOutputStream zip = new ZipOutputStream(bytes)) {
            String part = "<Override PartName=\"%s\" ContentType=\"application/vnd.openxmlformats-"
                    + "officedocument.spreadsheetml.%s+xml\"/>";
            String relation = "<Relationship Id=\"%s\" Type=\"" + OFFICE + "/%s\" Target=\"%s\"/>";
            String relations = "<Relationships xmlns=\"" + PACKAGE + "relationships\">";
            put(
                    zip,
                    "[Content_Types].xml",
                    "<Types xmlns=\"" + PACKAGE
                            + "content-types\"><Default Extension=\"xml\" ContentType=\"application/xml\"/>"
                            + part.formatted("/xl/workbook.xml", "sheet.main")
                            + (styled ? part.formatted("/xl/styles.xml", "styles") : "")
                            + part.formatted("/xl/worksheets/sheet1.xml", "worksheet") + "</Types>");
            put(
                    zip,
                    "_rels/.rels",
                    relations + relation.formatted("rId1", "officeDocument", "xl/workbook.xml") + "</Relationships>");
            put(
                    zip,
                    "xl/_rels/workbook.xml.rels",
                    relations
                            + relation.formatted("rId1", "worksheet", "worksheets/sheet1.xml")
                            + relation.formatted("rId2", "styles", "styles.xml") + "</Relationships>");
            put(
                    zip,
                    "xl/workbook.xml",
                    "<workbook xmlns=\"" + MAIN + "\" xmlns:r=\"" + OFFICE + "\"><workbookPr date1904=\""
                            + (from1904 ? 1 : 0)
                            + "\"/><sheets><sheet name=\"Log\" sheetId=\"1\" r:id=\"rId1\"/></sheets></workbook>");
            put(
                    zip,
                    "xl/styles.xml",
                    "<styleSheet xmlns=\"" + MAIN + "\"><numFmts count=\"1\"><numFmt numFmtId=\"164\" "
                            + "formatCode=\"dd\\.mm\\.yyyy\\ hh:mm\"/></numFmts><cellXfs count=\"3\"><xf numFmtId=\"0\"/>"
                            + "<xf numFmtId=\"164\"/><xf numFmtId=\"20\"/></cellXfs></styleSheet>");
            put(
                    zip,
                    "xl/worksheets/sheet1.xml",
                    "<worksheet xmlns=\"" + MAIN + "\"><sheetData>" + rows + "</sheetData></worksheet>");
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return bytes.toByteArray();
    }

    private static void put(ZipOutputStream zip, String name, String content) throws IOException {
        zip.putNextEntry(new ZipEntry(name));
        zip.write((HEAD + content).getBytes(StandardCharsets.UTF_8));
        zip.closeEntry();
    }
}
