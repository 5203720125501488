package slantfall.bench.shell;

import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Optional;
import slantfall.bench.MemoryDisk;
import slantfall.bench.model.Desk;
import slantfall.bench.model.Pulse;
import slantfall.declare.Value;
import slantfall.session.BackgroundScheduler;
import slantfall.session.Session;

/**
 * Edits without end until it is killed: typed values and drags in turn, a save now and then, each committed edit told on
 * standard output after it was committed. Argument: the folder of the user.
 */
public final class EditLoop {

    private EditLoop() {}

    /** Entry point. */
    public static void main(String[] args) {
        Path home = Path.of(args[0]);
        Desk desk = new Desk(new Session(MemoryDisk.film()), Pulse.atOnce());
        Chooser chooser = new Chooser() {
            @Override
            public Optional<Path> open() {
                return Optional.empty();
            }

            @Override
            public Optional<Path> save(String suggestedName) {
                return Optional.of(home.resolve("work.slantfall.json"));
            }
        };
        FileLife files = new FileLife(desk, new StoreDesk(home), chooser, new Notices(), new BackgroundScheduler(Runnable::run));
        PrintStream out = new PrintStream(System.out, true, StandardCharsets.UTF_8);
        for (int edit = 1; ; edit++) {
            double length = 1 + edit * 1e-6;
            if (edit % 3 == 0) {
                Object drag = new Object();
                for (int tick = 0; tick < 5; tick++) {
                    desk.session().set("length", Value.of(2 + tick), drag);
                }
                desk.session().set("length", Value.of(length), drag);
                desk.session().endGesture();
            } else {
                desk.session().set("length", Value.of(length), null);
            }
            out.println(edit);
            if (edit % 10 == 0) {
                files.save();
                out.println("saved " + edit);
            }
        }
    }
}
