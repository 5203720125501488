package slantfall.figure;

import java.nio.file.Files;
import java.nio.file.Path;
import slantfall.catalogue.Catalogue;
import slantfall.declare.SetUp;
import slantfall.quantity.UnitSystem;
import slantfall.store.Examples;

/** Writes the board of every example as SVG; run by hand: {@code FigureShot FOLDER}. */
public final class FigureShot {

    private FigureShot() {}

    public static void main(String[] args) throws Exception {
        for (String name : Examples.list()) {
            SetUp setUp = Examples.open(name).setUp();
            SvgPen pen = new SvgPen(760, 720, Palette.LIGHT.colours());
            Board.draw(pen, new Rect(0, 0, 760, 720), Scene.still(Catalogue.named(setUp.arrangement()).assess(setUp), UnitSystem.TRADE));
            Files.writeString(Path.of(args[0], name + ".svg"), pen.text());
        }
    }
}
