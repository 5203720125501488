package slantfall.figure;

/** Single figures, for sheets and files; the {@link Board} shows them together. */
public final class Figures {

    private static final double TOP = 8;
    private static final double RIGHT = 16;

    private Figures() {}

    /** The incline at true scale and angle. */
    public static void layout(Pen pen, Rect area, Scene scene) {
        Drawings.strip(scene).ifPresentOrElse(s -> new LayoutFigure(scene, s, area).draw(pen), () -> none(pen, area));
    }

    /** The liquid in plate coordinates. */
    public static void closeUp(Pen pen, Rect area, Scene scene) {
        Rect inner = area.inset(TraverseFigure.LEFT, 20, RIGHT, Frame.BELOW);
        Drawings.strip(scene).ifPresentOrElse(s -> {
            CloseUpFigure figure = new CloseUpFigure(scene, s, inner, CloseUpFigure.wanted(s));
            TidyPen tidy = TidyPen.on(pen, area);
            tidy.text(Pen.Lettering.of(Ink.FAINT, 1), figure.stretch(), inner.right(), area.y() + 12);
            figure.draw(tidy);
        }, () -> none(pen, area));
    }

    /** Velocity, shear stress and shear rate across the liquid. */
    public static void traverses(Pen pen, Rect area, Scene scene) {
        double[] y = scene.assessment().profiles().traverses().axis().values();
        Span up = Span.around(0, y.length == 0 ? 0 : y[y.length - 1]);
        new TraverseFigure(scene, up).draw(TidyPen.on(pen, area), area.inset(0, TOP, RIGHT, Frame.BELOW), true);
    }

    /** Pressure and gap along the slot. */
    public static void courses(Pen pen, Rect area, Scene scene) {
        if (scene.assessment().profiles().courses().columns().isEmpty()) {
            none(pen, area);
        } else {
            new CourseFigure(scene).draw(TidyPen.on(pen, area), area);
        }
    }

    private static void none(Pen pen, Rect area) {
        pen.text(Pen.Lettering.of(Ink.FAINT, 0), "This arrangement has no such figure.", area.midX(), area.midY());
    }
}
