package slantfall.store;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.DoubleFunction;
import slantfall.liquid.ViscosityFit;
import slantfall.quantity.EntryContext;
import slantfall.quantity.Kind;

/**
 * Measured viscosities against temperature in a file, with the fit through them.
 *
 * @param fit the fit
 * @param typed the points as typed
 * @param law law of the fit as asked for, empty for the automatic choice
 */
record Points(ViscosityFit fit, List<List<String>> typed, String law) {

    private static final String FORM = "Write two to ten pairs [[\"20 degC\", \"7.5 Pa s\"], …]";

    /**
     * Reads points.
     *
     * @param law node of the law's name, null for the automatic choice
     * @param context what a viscosity may lean on at a temperature [K]
     */
    static Points read(Node list, Node law, DoubleFunction<EntryContext> context) {
        List<ViscosityFit.Point> points = new ArrayList<>();
        List<List<String>> typed = new ArrayList<>();
        for (Node pair : Fields.list(list, FORM)) {
            List<Node> parts = Fields.list(pair, FORM);
            if (parts.size() != 2) {
                throw pair.problem("a point is a temperature and a viscosity", FORM);
            }
            double t = ValueReader.entryOf(parts.get(0), Kind.TEMPERATURE, EntryContext.none()).si();
            double mu = ValueReader.entryOf(parts.get(1), Kind.VISCOSITY, context.apply(t)).si();
            points.add(new ViscosityFit.Point(t, mu));
            typed.add(List.of(
                    ValueReader.text(parts.get(0), Kind.TEMPERATURE), ValueReader.text(parts.get(1), Kind.VISCOSITY)));
        }
        String word = law == null ? "" : Fields.text(law);
        return new Points(fit(points, word, law, list), typed, word);
    }

    private static ViscosityFit fit(List<ViscosityFit.Point> points, String word, Node law, Node list) {
        try {
            if (word.isEmpty()) {
                return ViscosityFit.automatic(points);
            }
            for (ViscosityFit.Kind kind : ViscosityFit.Kind.values()) {
                if (kind.key().equals(word)) {
                    return ViscosityFit.of(kind, points);
                }
            }
        } catch (IllegalArgumentException e) {
            throw new StoreProblem(list.place(), e.getMessage(), FORM, e);
        }
        String known = String.join(" or ", Arrays.stream(ViscosityFit.Kind.values()).map(ViscosityFit.Kind::key).toList());
        throw law.problem("there is no fit \"" + Place.shortened(word) + "\"", "Write " + known + ", or leave it out");
    }

    /** Writes the points as typed if they still read to the fit's own, else exactly. */
    static Node node(ViscosityFit fit, List<List<String>> typed, DoubleFunction<EntryContext> context) {
        if (!typed.isEmpty()) {
            Node list = Node.list();
            typed.forEach(pair -> list.add(Node.texts(pair)));
            if (readsTo(fit, list, context)) {
                return list;
            }
        }
        Node list = Node.list();
        for (ViscosityFit.Point point : fit.points()) {
            list.add(Node.list()
                    .add(ValueWriter.quantity(point.temperature(), "", Kind.TEMPERATURE, EntryContext.none()))
                    .add(ValueWriter.quantity(point.viscosity(), "", Kind.VISCOSITY, EntryContext.none())));
        }
        return list;
    }

    private static boolean readsTo(ViscosityFit fit, Node list, DoubleFunction<EntryContext> context) {
        try {
            return read(list, Node.text(fit.kind().key()), context).fit().points().equals(fit.points());
        } catch (StoreProblem e) {
            return false;
        }
    }
}
