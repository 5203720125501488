package slantfall.bench.form;

import java.util.List;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import slantfall.bench.model.Desk;
import slantfall.declare.Assessment;
import slantfall.declare.Panel;
import slantfall.declare.Reading;
import slantfall.declare.Requirement;

/** The user's own rules: bounds on readings, and the check of each panel to design by. */
public final class LimitsModel {

    private final Desk desk;
    private final ObservableList<RequirementModel> requirements = FXCollections.observableArrayList();
    private final ObservableList<HouseRuleModel> houseRules = FXCollections.observableArrayList();
    private List<String> panels = List.of();

    /** Follows a desk. */
    public LimitsModel(Desk desk) {
        this.desk = desk;
        desk.follow(this::refresh);
    }

    /** Bounds given or being given. */
    public ObservableList<RequirementModel> requirements() {
        return requirements;
    }

    /** One per panel. */
    public ObservableList<HouseRuleModel> houseRules() {
        return houseRules;
    }

    /** Readings that have no bound yet. */
    public List<Reading> free() {
        return desk.declaration().readings().stream().filter(r -> find(r.key()) == null).toList();
    }

    /** Begins a bound on a reading. */
    public RequirementModel add(Reading reading) {
        RequirementModel model = new RequirementModel(desk, reading);
        requirements.add(model);
        return model;
    }

    /** Takes a bound away, whether it was finished or not. */
    public void remove(RequirementModel model) {
        requirements.remove(model);
        model.remove();
    }

    private void refresh(Assessment assessment) {
        List<Requirement> wanted = assessment.setUp().requirements();
        requirements.removeIf(m -> wanted.stream().noneMatch(r -> r.reading().equals(m.reading().key())) && !draft(m));
        for (Requirement r : wanted) {
            RequirementModel model = find(r.reading());
            if (model == null && assessment.declaration().reading(r.reading()).isPresent()) {
                model = add(assessment.declaration().reading(r.reading()).get());
            }
            if (model != null) {
                model.show(r);
            }
        }
        refreshHouse(assessment);
    }

    /** One that was begun and holds no bound yet, or a wrong one. */
    private boolean draft(RequirementModel m) {
        boolean known = desk.declaration().reading(m.reading().key()).isPresent();
        boolean empty = m.atLeastProperty().get().isBlank() && m.atMostProperty().get().isBlank();
        return known && (empty || !m.problemProperty().get().isEmpty());
    }

    private void refreshHouse(Assessment assessment) {
        List<String> keys = assessment.declaration().panels().stream().map(Panel::key).toList();
        String arrangement = assessment.declaration().key();
        List<String> shape = new java.util.ArrayList<>(List.of(arrangement));
        shape.addAll(keys);
        if (!shape.equals(panels)) {
            panels = shape;
            houseRules.setAll(assessment.declaration().panels().stream()
                    .map(p -> new HouseRuleModel(desk, p))
                    .toList());
        }
        houseRules.forEach(h -> h.refresh(assessment));
    }

    private RequirementModel find(String reading) {
        return requirements.stream().filter(m -> m.reading().key().equals(reading)).findFirst().orElse(null);
    }
}
