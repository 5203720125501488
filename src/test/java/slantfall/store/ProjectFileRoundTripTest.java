package slantfall.store;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import slantfall.catalogue.Catalogue;
import slantfall.declare.Arrangement;
import slantfall.declare.CheckInfo;
import slantfall.declare.Declaration;
import slantfall.declare.Entries;
import slantfall.declare.HouseRule;
import slantfall.declare.LiquidBase;
import slantfall.declare.LiquidSettings;
import slantfall.declare.Reading;
import slantfall.declare.Requirement;
import slantfall.declare.SetUp;
import slantfall.declare.Setting;
import slantfall.declare.Tolerance;
import slantfall.declare.Value;
import slantfall.quantity.Display;
import slantfall.quantity.EntryContext;
import slantfall.quantity.EntryReader;
import slantfall.quantity.QuantityProblem;
import slantfall.quantity.Unit;
import slantfall.quantity.UnitSystem;

/** Any set-up, written and read, is the same again. */
class ProjectFileRoundTripTest {

    private static final Presets PRESETS = Presets.load();

    @Property(tries = 400)
    void aTypedSetUpComesBackEqual(@ForAll long seed) {
        SetUp setUp = random(new Random(seed), true);
        String text = ProjectFile.write(setUp);
        ProjectFile.Opened back = ProjectFile.read(text, "round trip");
        assertThat(back.setUp()).isEqualTo(setUp);
        assertThat(ProjectFile.write(back.setUp())).isEqualTo(text);
    }

    @Property(tries = 400)
    void numbersFromASliderComeBackBitForBit(@ForAll long seed) {
        SetUp setUp = random(new Random(seed), false);
        SetUp back = ProjectFile.read(ProjectFile.write(setUp), "round trip").setUp();
        setUp.values().forEach((key, value) -> {
            Value other = back.values().get(key);
            assertThat(other.si()).as(key).isEqualTo(value.si());
            value.tolerance().ifPresent(t -> {
                assertThat(other.known().low()).as(key).isEqualTo(t.low());
                assertThat(other.known().high()).as(key).isEqualTo(t.high());
                assertThat(other.known().shape()).as(key).isEqualTo(t.shape());
            });
        });
        assertThat(back.values().keySet()).isEqualTo(setUp.values().keySet());
    }

    @Property(tries = 100)
    void theOrderInTheFileDoesNotMatter(@ForAll long seed) {
        Random random = new Random(seed);
        SetUp setUp = random(random, true);
        Node shuffled = shuffled(NodeReader.read(ProjectFile.write(setUp), "x"), random);
        assertThat(ProjectFile.read(NodeWriter.compact(shuffled), "x").setUp()).isEqualTo(setUp);
    }

    private static Node shuffled(Node node, Random random) {
        if (!node.is(Node.Sort.OBJECT)) {
            return node;
        }
        List<String> names = new ArrayList<>(node.members().keySet());
        Collections.shuffle(names, random);
        Node other = Node.object();
        names.forEach(n -> other.put(n, shuffled(node.get(n), random)));
        return other;
    }

    private static SetUp random(Random random, boolean typed) {
        List<Arrangement> arrangements = Catalogue.all();
        Arrangement arrangement = arrangements.get(random.nextInt(arrangements.size()));
        boolean preset = random.nextBoolean();
        LiquidBase base = preset
                ? LiquidBase.of(PRESETS.all().get(random.nextInt(PRESETS.all().size())))
                : LiquidBase.measured();
        SetUp setUp = SetUp.blank(arrangement.key(), base).titled(random.nextBoolean() ? "" : "Räume \"x\" \\ \u2028\t" + random.nextInt());
        for (Setting s : LiquidSettings.list()) {
            boolean first = LiquidReader.FIRST.contains(LiquidReader.key(s));
            Declaration d = arrangement.declare(setUp.structure());
            setUp = with(setUp, s, random, typed, first ? EntryContext.none() : Entries.context(setUp, d));
        }
        Declaration declaration = arrangement.declare(setUp.structure());
        List<Setting> settings = new ArrayList<>(declaration.settings());
        settings.sort((a, b) -> Boolean.compare(b.key().equals("width"), a.key().equals("width")));
        for (Setting s : settings) {
            setUp = with(setUp, s, random, typed, Entries.context(setUp, declaration));
        }
        for (var choice : declaration.choices()) {
            if (random.nextBoolean()) {
                setUp = setUp.withChoice(choice.key(), choice.options().get(random.nextInt(choice.options().size())).key());
            }
        }
        return rules(setUp, declaration, random);
    }

    private static SetUp rules(SetUp setUp, Declaration d, Random random) {
        List<Requirement> requirements = new ArrayList<>();
        for (Reading r : d.readings()) {
            if (random.nextInt(4) == 0) {
                String low = text(random.nextDouble(), r.kind(), random);
                double si = EntryReader.read(low, r.kind(), EntryContext.none()).si();
                requirements.add(new Requirement(r.key(), si, Double.NaN, random.nextInt(200) / 100.0, "why", low, ""));
            }
        }
        Map<String, HouseRule> rules = new LinkedHashMap<>();
        CheckInfo check = d.checks().get(random.nextInt(d.checks().size()));
        rules.put(check.panel(), new HouseRule(check.panel(), check.key(), 0.125, "12.5 %"));
        List<SetUp.Correlated> correlated = List.of(
                new SetUp.Correlated(d.settings().get(0).key(), "liquid.density", random.nextDouble() * 2 - 1));
        return new SetUp(setUp.title(), setUp.arrangement(), setUp.base(), setUp.values(), setUp.choices(), requirements,
                rules, correlated, new SetUp.Remarks("note " + random.nextInt(), Map.of("/later", "[1e2, {\"a\": 0.10}]")));
    }

    private static SetUp with(SetUp setUp, Setting s, Random random, boolean typed, EntryContext context) {
        if (random.nextInt(3) == 0) {
            return setUp;
        }
        double si = inside(s, random);
        if (!typed) {
            return setUp.with(s.key(), random.nextBoolean() ? Value.of(si) : new Value(si, "", range(s, si, random)));
        }
        String text = text(si, s.kind(), random);
        double read;
        try {
            read = EntryReader.read(text, s.kind(), context).si();
        } catch (QuantityProblem e) {
            throw new AssertionError("the test types only what can be read: " + e.getMessage(), e);
        }
        if (!s.possible().contains(read)) {
            return setUp;
        }
        return setUp.with(s.key(), random.nextBoolean() ? Value.typed(read, text) : spread(read, text, s, random));
    }

    private static Value spread(double si, String text, Setting s, Random random) {
        String half = text(Math.abs(si) * 0.1 + 1e-6, s.kind() == slantfall.quantity.Kind.TEMPERATURE
                ? slantfall.quantity.Kind.TEMPERATURE_DIFFERENCE
                : s.kind() == slantfall.quantity.Kind.PRESSURE_ABSOLUTE
                        ? slantfall.quantity.Kind.PRESSURE_DIFFERENCE
                        : s.kind(), random);
        if (s.kind() == slantfall.quantity.Kind.FRACTION || s.kind() == slantfall.quantity.Kind.RATIO) {
            half = "3 % of value";
        }
        double width = EntryReader.plusMinus(half, s.kind(), si, EntryContext.none());
        Tolerance.Shape shape = Tolerance.Shape.values()[random.nextInt(3)];
        return new Value(si, text, new Tolerance(shape, si - width, si + width, List.of(half)));
    }

    private static Tolerance range(Setting s, double si, Random random) {
        double other = inside(s, random);
        Tolerance.Shape[] shapes = Tolerance.Shape.values();
        return new Tolerance(shapes[random.nextInt(shapes.length)], Math.min(si, other), Math.max(si, other), List.of());
    }

    private static double inside(Setting s, Random random) {
        double low = Math.max(s.usual().low(), 1e-12);
        double high = s.usual().high();
        return low + (high - low) * (0.01 + 0.98 * random.nextDouble());
    }

    private static String text(double si, slantfall.quantity.Kind kind, Random random) {
        UnitSystem system = UnitSystem.values()[random.nextInt(3)];
        Unit unit = Display.unit(kind, system, si);
        String number = Double.toString(unit.fromSi(si));
        return kind.dimensionless() && unit.symbol().equals("1") ? number : number + " " + unit.symbol();
    }
}
