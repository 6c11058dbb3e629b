package plusward.journeys;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import javax.imageio.ImageIO;

/**
 * A picture of two eyes behind two lenses, 1200 by 900 pixels and 0.08 mm a pixel: lines of 350 pixels for 28 mm, pupils of 60
 * pixels for 4.8 mm.
 *
 * @param rightBelow pixels of the right line below its pupil centre, the child's right eye on the picture's left
 * @param leftBelow pixels of the left line below its pupil centre
 * @param degrees how far the head is rolled in the picture
 */
record DrawnFace(int rightBelow, int leftBelow, double degrees) {

    /** Tops at −2.0 and −3.0 mm. */
    static final DrawnFace RAISED_RIGHT = new DrawnFace(25, 37, 0);

    /** Over the 10° that are measured. */
    static final DrawnFace TILTED = new DrawnFace(25, 25, 12);

    private static final double MM = 28 / 350.0;
    private static final int RADIUS = 30;

    int width() {
        return 1200;
    }

    int height() {
        return 900;
    }

    double rightOffset() {
        return -rightBelow * MM;
    }

    double leftOffset() {
        return -leftBelow * MM;
    }

    double pupil() {
        return 2 * RADIUS * MM;
    }

    /** The five places of the right eye in the order in which they are marked. */
    List<double[]> right() {
        return eye(325, rightBelow);
    }

    List<double[]> left() {
        return eye(875, leftBelow);
    }

    private List<double[]> eye(int x, int below) {
        return List.of(
                rolled(x - 175, 450 + below),
                rolled(x + 175, 450 + below),
                rolled(x, 450 - RADIUS),
                rolled(x, 450 + RADIUS),
                rolled(x, 450));
    }

    private double[] rolled(double x, double y) {
        double angle = Math.toRadians(degrees);
        double right = x - 600;
        double down = y - 450;
        return new double[] {
            600 + right * Math.cos(angle) - down * Math.sin(angle),
            450 + right * Math.sin(angle) + down * Math.cos(angle)
        };
    }

    Path drawnInto(Path file) throws IOException {
        BufferedImage image = new BufferedImage(width(), height(), BufferedImage.TYPE_INT_RGB);
        Graphics2D pen = image.createGraphics();
        pen.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        pen.setColor(new Color(0xd9b99b));
        pen.fillRect(0, 0, width(), height());
        pen.rotate(Math.toRadians(degrees), 600, 450);
        draw(pen, 325, rightBelow);
        draw(pen, 875, leftBelow);
        pen.dispose();
        ImageIO.write(image, "png", file.toFile());
        return file;
    }

    private static void draw(Graphics2D pen, int x, int below) {
        pen.setStroke(new BasicStroke(3));
        pen.setColor(new Color(0x5b3a1e));
        pen.draw(new Ellipse2D.Double(x - 240, 250, 480, 400));
        pen.setColor(Color.WHITE);
        pen.fill(new Ellipse2D.Double(x - 130, 385, 260, 130));
        pen.setColor(new Color(0x6b8fa3));
        pen.fill(new Ellipse2D.Double(x - 62, 388, 124, 124));
        pen.setColor(Color.BLACK);
        pen.fill(new Ellipse2D.Double(x - RADIUS, 450 - RADIUS, 2 * RADIUS, 2 * RADIUS));
        pen.draw(new Line2D.Double(x - 175, 450 + below, x + 175, 450 + below));
    }
}
