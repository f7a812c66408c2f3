package planted.solve;

import com.fasterxml.jackson.databind.JsonNode;
import com.formdev.flatlaf.FlatLightLaf;
import net.miginfocom.layout.CC;
import org.apache.batik.svggen.SVGGraphics2D;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.ejml.data.DMatrixRMaj;
import org.jfree.chart.JFreeChart;
import picocli.CommandLine;

/** Uses every library that has a home elsewhere. */
record UsesForeignLibraries(
    DMatrixRMaj matrix,
    JsonNode json,
    JFreeChart chart,
    FlatLightLaf look,
    CommandLine line,
    CC constraint,
    PDDocument paper,
    SVGGraphics2D vectors) {}
