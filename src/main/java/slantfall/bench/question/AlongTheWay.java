package slantfall.bench.question;

import javafx.scene.Node;
import slantfall.bench.plot.CoursePicture;
import slantfall.bench.look.Theme;
import slantfall.bench.model.Desk;
import slantfall.declare.Assessment;

/** What changes from the inlet to the outlet. */
public final class AlongTheWay implements Question {

    private final Desk desk;
    private final Theme theme;
    private CoursePicture picture;

    /** Asks a desk. */
    public AlongTheWay(Desk desk, Theme theme) {
        this.desk = desk;
        this.theme = theme;
    }

    @Override
    public String key() {
        return "courses";
    }

    @Override
    public String words() {
        return "What happens along the way?";
    }

    @Override
    public Node node() {
        if (picture == null) {
            picture = new CoursePicture(desk, theme);
        }
        return picture;
    }

    @Override
    public void show(Assessment assessment) {
        picture.renew();
    }
}
