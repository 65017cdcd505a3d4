package eddyledger.bench;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import javax.xml.stream.XMLInputFactory;
import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;
import org.apache.poi.openxml4j.exceptions.OpenXML4JException;
import org.apache.poi.openxml4j.opc.OPCPackage;
import org.apache.poi.ss.usermodel.CellStyle;
import org.apache.poi.ss.util.CellReference;
import org.apache.poi.xssf.eventusermodel.XSSFReader;
import org.apache.poi.xssf.model.StylesTable;
import org.apache.poi.xssf.streaming.SXSSFCell;
import org.apache.poi.xssf.streaming.SXSSFRow;
import org.apache.poi.xssf.streaming.SXSSFSheet;
import org.apache.poi.xssf.streaming.SXSSFWorkbook;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** The cells of a workbook as a list, and the library's quickest way to write them. */
final class BareWorkbook {
  private static final int WINDOW = 200;

  private final StylesTable styles;
  private final List<List<BareRow>> sheets = new ArrayList<>();

  private record BareCell(int column, int style, String formula, double number, String text) {}

  private record BareRow(int number, float height, List<BareCell> cells) {}

  private BareWorkbook(StylesTable styles) {
    this.styles = styles;
  }

  static BareWorkbook like(byte[] bytes) throws IOException {
    try (OPCPackage file = OPCPackage.open(new ByteArrayInputStream(bytes))) {
      XSSFReader reader = new XSSFReader(file);
      BareWorkbook bare = new BareWorkbook(reader.getStylesTable());
      Iterator<InputStream> sheets = reader.getSheetsData();
      while (sheets.hasNext()) {
        try (InputStream sheet = sheets.next()) {
          bare.sheets.add(rows(sheet));
        }
      }
      return bare;
    } catch (OpenXML4JException | XMLStreamException e) {
      throw new IOException(e);
    }
  }

  private static List<BareRow> rows(InputStream sheet) throws XMLStreamException {
    XMLStreamReader xml = XMLInputFactory.newFactory().createXMLStreamReader(sheet);
    List<BareRow> rows = new ArrayList<>();
    while (xml.hasNext()) {
      if (xml.next() == XMLStreamConstants.START_ELEMENT) {
        if (xml.getLocalName().equals("row")) {
          String height = xml.getAttributeValue(null, "ht");
          int number = Integer.parseInt(xml.getAttributeValue(null, "r"));
          rows.add(
              new BareRow(
                  number, height == null ? 0f : Float.parseFloat(height), new ArrayList<>()));
        } else if (xml.getLocalName().equals("c")) {
          rows.get(rows.size() - 1).cells().add(cell(xml));
        }
      }
    }
    return rows;
  }

  private static BareCell cell(XMLStreamReader xml) throws XMLStreamException {
    int column = new CellReference(xml.getAttributeValue(null, "r")).getCol();
    int style = Integer.parseInt(xml.getAttributeValue(null, "s"));
    String type = xml.getAttributeValue(null, "t");
    String formula = null;
    String value = null;
    while (true) {
      int event = xml.next();
      if (event == XMLStreamConstants.END_ELEMENT && xml.getLocalName().equals("c")) {
        break;
      }
      if (event == XMLStreamConstants.START_ELEMENT) {
        switch (xml.getLocalName()) {
          case "f" -> formula = xml.getElementText();
          case "v", "t" -> value = xml.getElementText();
          default -> {}
        }
      }
    }
    boolean text = "inlineStr".equals(type) || "str".equals(type);
    double number = text || value == null ? Double.NaN : Double.parseDouble(value);
    return new BareCell(column, style, formula, number, text ? value : null);
  }

  long cells() {
    return sheets.stream().flatMap(List::stream).mapToLong(row -> row.cells().size()).sum();
  }

  /** Writes all cells; no planning, no widths, no print set-up. */
  byte[] write() throws IOException {
    try (SXSSFWorkbook workbook = new SXSSFWorkbook(new XSSFWorkbook(), WINDOW)) {
      List<CellStyle> copies = new ArrayList<>();
      for (int i = 0; i < styles.getNumCellStyles(); i++) {
        CellStyle copy = workbook.createCellStyle();
        copy.cloneStyleFrom(styles.getStyleAt(i));
        copies.add(copy);
      }
      for (List<BareRow> rows : sheets) {
        SXSSFSheet sheet = workbook.createSheet();
        for (BareRow planned : rows) {
          SXSSFRow row = sheet.createRow(planned.number() - 1);
          if (planned.height() > 0f) {
            row.setHeightInPoints(planned.height());
          }
          for (BareCell cell : planned.cells()) {
            write(row.createCell(cell.column()), cell, copies);
          }
        }
      }
      ByteArrayOutputStream bytes = new ByteArrayOutputStream();
      workbook.write(bytes);
      return bytes.toByteArray();
    }
  }

  private static void write(SXSSFCell cell, BareCell planned, List<CellStyle> copies) {
    cell.setCellStyle(copies.get(planned.style()));
    if (planned.formula() != null) {
      cell.setCellFormula(planned.formula());
    }
    if (planned.text() != null) {
      cell.setCellValue(planned.text());
    } else if (!Double.isNaN(planned.number())) {
      cell.setCellValue(planned.number());
    }
  }
}
