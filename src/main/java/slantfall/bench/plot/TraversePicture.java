package slantfall.bench.plot;

import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.layout.Pane;
import javafx.scene.layout.Region;
import slantfall.declare.Assessment;
import slantfall.declare.Profile;
import slantfall.quantity.UnitSystem;

/** Traverses drawn plainly. */
final class TraversePicture implements Picture {

    private final Canvas canvas = new Canvas();
    private final Pane pane = new Pane(canvas);
    private Assessment shown;

    TraversePicture() {
        pane.setMinSize(100, 80);
        pane.setFocusTraversable(true);
        canvas.widthProperty().bind(pane.widthProperty());
        canvas.heightProperty().bind(pane.heightProperty());
        canvas.widthProperty().addListener((o, a, b) -> draw());
        canvas.heightProperty().addListener((o, a, b) -> draw());
    }

    @Override
    public Region node() {
        return pane;
    }

    @Override
    public void show(Assessment assessment, UnitSystem units) {
        shown = assessment;
        draw();
    }

    private void draw() {
        GraphicsContext g = canvas.getGraphicsContext2D();
        g.clearRect(0, 0, canvas.getWidth(), canvas.getHeight());
        Profile profile = shown.profiles().traverses();
        int n = profile.columns().size();
        for (int i = 0; i < n; i++) {
            column(g, profile, i, n);
        }
    }

    private void column(GraphicsContext g, Profile profile, int i, int n) {
        double[] y = profile.axis().values();
        double[] x = profile.columns().get(i).values();
        double w = canvas.getWidth() / n;
        double h = canvas.getHeight();
        double top = 0;
        for (double v : x) {
            top = Math.max(top, Math.abs(v));
        }
        double[] px = new double[x.length];
        double[] py = new double[x.length];
        for (int k = 0; k < x.length; k++) {
            px[k] = i * w + 20 + (w - 40) * (x[k] / top + 1) / 2;
            py[k] = h - 20 - (h - 40) * y[k] / y[y.length - 1];
        }
        g.strokePolyline(px, py, px.length);
        g.fillText(profile.columns().get(i).name(), i * w + 20, 14);
    }
}
