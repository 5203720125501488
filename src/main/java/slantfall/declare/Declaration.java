package slantfall.declare;

import java.util.ArrayList;
import java.util.List;
import java.util.NoSuchElementException;
import java.util.Optional;
import java.util.Set;
import slantfall.liquid.Liquid;
import slantfall.liquid.Property;

/**
 * What an arrangement offers under one structure.
 *
 * @param key key of the arrangement
 * @param name words for people
 * @param summary one sentence
 * @param settings numbers the user chooses, in the order shown; the liquid's own are not among them
 * @param choices words the user chooses
 * @param liquidSettings the liquid's own numbers that matter here
 * @param readings computed quantities, in the order of the evaluator's output
 * @param panels questions that the checks answer
 * @param checks criteria, in the order of the evaluator's margins
 * @param essentials keys of at most four settings that a new set-up is asked for
 * @param uses properties of the liquid that some reading or check needs
 */
public record Declaration(
        String key,
        String name,
        String summary,
        List<Setting> settings,
        List<Choice> choices,
        List<Setting> liquidSettings,
        List<Reading> readings,
        List<Panel> panels,
        List<CheckInfo> checks,
        List<String> essentials,
        Set<Property> uses) {

    /** Prefix of the liquid's own numbers. */
    public static final String LIQUID = "liquid.";

    public Declaration {
        settings = List.copyOf(settings);
        choices = List.copyOf(choices);
        liquidSettings = List.copyOf(liquidSettings);
        readings = List.copyOf(readings);
        panels = List.copyOf(panels);
        checks = List.copyOf(checks);
        essentials = List.copyOf(essentials);
        uses = Set.copyOf(uses);
    }

    /** The words and lists of an arrangement, completed with the numbers of a liquid. */
    public static Declaration of(Face face, Liquid liquid) {
        List<Setting> fromLiquid = new ArrayList<>();
        for (String coordinate : liquid.coordinates(face.uses())) {
            fromLiquid.add(LiquidSettings.of(coordinate));
        }
        return new Declaration(
                face.key(),
                face.name(),
                face.summary(),
                face.settings(),
                face.choices(),
                fromLiquid,
                face.readings(),
                face.panels(),
                face.checks(),
                face.essentials(),
                face.uses());
    }

    /** Inputs of the evaluator in order: the settings that the assessment uses, then the liquid's own numbers. */
    public List<Setting> coordinates() {
        List<Setting> all = new ArrayList<>(settings.stream().filter(Setting::inAssessment).toList());
        all.addAll(liquidSettings);
        return List.copyOf(all);
    }

    /** Every number a file may set, those of single questions included. */
    public List<Setting> allSettings() {
        List<Setting> all = new ArrayList<>(settings);
        all.addAll(liquidSettings);
        return List.copyOf(all);
    }

    /** The setting of a key, if there is one. */
    public Optional<Setting> setting(String settingKey) {
        return allSettings().stream().filter(s -> s.key().equals(settingKey)).findFirst();
    }

    /** The choice of a key, if there is one. */
    public Optional<Choice> choice(String choiceKey) {
        return choices.stream().filter(c -> c.key().equals(choiceKey)).findFirst();
    }

    /** The reading of a key, if there is one. */
    public Optional<Reading> reading(String readingKey) {
        return readings.stream().filter(r -> r.key().equals(readingKey)).findFirst();
    }

    /** The panel of a key. */
    public Panel panel(String panelKey) {
        return panels.stream()
                .filter(p -> p.key().equals(panelKey))
                .findFirst()
                .orElseThrow(() -> new NoSuchElementException("panel " + panelKey));
    }

    /** Place of a reading in the evaluator's output. */
    public int readingIndex(String readingKey) {
        for (int i = 0; i < readings.size(); i++) {
            if (readings.get(i).key().equals(readingKey)) {
                return i;
            }
        }
        throw new NoSuchElementException("reading " + readingKey);
    }

    /** Place of a check's margin in the evaluator's output. */
    public int marginIndex(String checkKey) {
        for (int i = 0; i < checks.size(); i++) {
            if (checks.get(i).key().equals(checkKey)) {
                return readings.size() + i;
            }
        }
        throw new NoSuchElementException("check " + checkKey);
    }

    /** Length of the evaluator's output. */
    public int outputs() {
        return readings.size() + checks.size();
    }

    /**
     * What an arrangement says of itself.
     *
     * @param uses properties of the liquid that some reading or check needs
     */
    public record Face(
            String key,
            String name,
            String summary,
            List<Setting> settings,
            List<Choice> choices,
            List<Reading> readings,
            List<Panel> panels,
            List<CheckInfo> checks,
            List<String> essentials,
            Set<Property> uses) {}
}
