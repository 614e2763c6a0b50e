package org.pofk.report;

import com.github.weisj.jsvg.SVGDocument;
import com.github.weisj.jsvg.parser.LoaderContext;
import com.github.weisj.jsvg.parser.SVGLoader;
import com.github.weisj.jsvg.view.ViewBox;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import javax.imageio.ImageIO;
import javax.swing.JComponent;

/** A chart as pixels, on a light ground: what {@link SvgChart} draws, in the fonts of the machine. */
public final class PngChart {
    private PngChart() {
    }

    /** As many pixels wide as asked, and as high as the chart then is. */
    public static byte[] of(Chart chart, int width) {
        System.setProperty("java.awt.headless", "true");
        SVGDocument svg = new SVGLoader().load(
                new ByteArrayInputStream(SvgChart.light(chart).getBytes(StandardCharsets.UTF_8)), null,
                LoaderContext.createDefault());
        if (svg == null) {
            throw new AssertionError("what was drawn of '" + TextWidth.text(chart.title()) + "' can't be read again");
        }
        int height = Math.max(1, Math.round(width * svg.size().height / svg.size().width));
        BufferedImage image = new BufferedImage(width, height, BufferedImage.TYPE_INT_RGB);
        Graphics2D graphics = image.createGraphics();
        graphics.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        graphics.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
        svg.render((JComponent) null, graphics, new ViewBox(0, 0, width, height));
        graphics.dispose();
        return encoded(image);
    }

    private static byte[] encoded(BufferedImage image) {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try {
            ImageIO.write(image, "png", bytes);
        } catch (IOException impossible) {
            throw new UncheckedIOException(impossible);
        }
        return bytes.toByteArray();
    }
}
