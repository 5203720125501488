package slantfall.figure;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import slantfall.declare.Profile;
import slantfall.figure.Pen.Lettering;
import slantfall.quantity.Kind;
import slantfall.quantity.Show;

/**
 * The middle of the bench in one picture: the layout at true scale, the close-up with its traverses on the same wall-normal
 * axis, the course along the slot below.
 */
public final class Board {

    private static final double TITLE = 20;
    /** Height from which there is room for courses below [px]. */
    private static final double COURSE_FROM = 430;

    private Board() {}

    /**
     * Draws a scene.
     *
     * @return what can be dragged and what the pointer can read
     */
    public static Drawn draw(Pen pen, Rect area, Scene scene) {
        Optional<Strip> strip = Drawings.strip(scene);
        if (strip.isEmpty()) {
            pen.text(Lettering.of(Ink.FAINT, 0), "This arrangement has no drawing.", area.midX(), area.midY());
            return new Drawn(List.of(), null, null);
        }
        return new Sheet(TidyPen.on(pen, area), scene, strip.get()).draw(area);
    }

    /** A small layout alone, for choosing an arrangement. */
    public static void card(Pen pen, Rect area, Scene scene) {
        Drawings.strip(scene).ifPresent(s -> new LayoutFigure(scene, s, area.inset(4, 4, 4, 4)).draw(pen));
    }

    /** The picture in words, for readers who cannot see it. */
    public static String words(Scene scene) {
        return Drawings.strip(scene)
                .map(s -> scene.assessment().declaration().name() + " at " + Show.value(s.angle(), Kind.ANGLE, scene.units(), 3)
                        + ", thickness " + Show.value(s.inletDepth(), Kind.LENGTH, scene.units(), 3) + "; "
                        + new TraverseFigure(scene, new Span(0, 1)).words())
                .orElse("no drawing");
    }

    /**
     * What came of drawing.
     *
     * @param handles what can be dragged
     * @param reading area in which the pointer reads values across the liquid, null if none
     * @param frame axes of that area, null if none
     */
    public record Drawn(List<Handle> handles, Rect reading, Reader frame) {

        /** The handle nearest to a point within a radius, null if none. */
        public Handle at(double x, double y, double radius) {
            Handle best = null;
            double nearest = radius;
            for (Handle h : handles) {
                double distance = Math.hypot(h.x() - x, h.y() - y);
                if (distance <= nearest) {
                    nearest = distance;
                    best = h;
                }
            }
            return best;
        }
    }

    /** Reads the distance from the wall at a height of the picture. */
    @FunctionalInterface
    public interface Reader {

        /** Distance from the wall at a height [px to m]. */
        double distance(double py);
    }

    private record Sheet(TidyPen pen, Scene scene, Strip strip) {

        Drawn draw(Rect area) {
            Profile courses = scene.assessment().profiles().courses();
            boolean course = !courses.columns().isEmpty() && area.h() > COURSE_FROM;
            double layoutHeight = area.h() * (course ? 0.3 : 0.38);
            double courseHeight = course ? Math.min(160, 0.25 * area.h()) : 0;
            Rect top = new Rect(area.x(), area.y() + TITLE, area.w(), layoutHeight - TITLE);
            Rect middle = new Rect(
                    area.x(), area.y() + layoutHeight + TITLE, area.w(), area.h() - layoutHeight - courseHeight - TITLE);
            title("Layout, true scale and angle", area.x() + 8, area.y() + 14, area.w() - 16);
            List<Handle> handles = new ArrayList<>(new LayoutFigure(scene, strip, top).draw(pen));
            Drawn drawn = middle(middle, handles);
            if (course) {
                new CourseFigure(scene).draw(
                        pen, new Rect(area.x(), area.bottom() - courseHeight, area.w(), courseHeight));
            }
            handles.forEach(h -> pen.disc(Ink.HANDLE, h.x(), h.y(), 5.5, true));
            return drawn;
        }

        private Drawn middle(Rect middle, List<Handle> handles) {
            double split = middle.x() + 0.47 * middle.w();
            double height = Math.max(20, middle.h() - 18 - Frame.BELOW);
            Rect close = new Rect(middle.x() + 52, middle.y() + 18, split - middle.x() - 62, height);
            Span up = scene.holds().hold("wall", CloseUpFigure.wanted(strip));
            CloseUpFigure figure = new CloseUpFigure(scene, strip, close, up);
            title("Close-up, " + figure.stretch(), middle.x() + 8, middle.y() + 2, split - middle.x() - 8);
            Rect right = new Rect(split + 10, close.y(), middle.right() - split - 22, height);
            title("Traverses at half length", right.x(), middle.y() + 2, right.w());
            handles.addAll(figure.draw(pen));
            new TraverseFigure(scene, up).draw(pen, right, false);
            Rect reading = new Rect(close.x(), close.y(), right.right() - close.x(), height);
            return new Drawn(handles, reading, new Frame(right, new Span(0, 1), up)::valueY);
        }

        private void title(String text, double x, double y, double room) {
            Lettering heavy = Lettering.of(Ink.TEXT, -1).heavy();
            pen.text(heavy, pen.fit(heavy, text, room), x, y);
        }
    }
}
