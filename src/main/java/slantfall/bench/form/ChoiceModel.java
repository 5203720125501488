package slantfall.bench.form;

import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleObjectProperty;
import slantfall.bench.model.Desk;
import slantfall.declare.Assessment;
import slantfall.declare.Choice;

/** A word of the set-up. */
public final class ChoiceModel {

    private final Desk desk;
    private final Choice choice;
    private final ObjectProperty<Choice.Option> option = new SimpleObjectProperty<>();
    private final ReadOnlyStringWrapper badge = new ReadOnlyStringWrapper("");
    private boolean showing;

    ChoiceModel(Desk desk, Choice choice) {
        this.desk = desk;
        this.choice = choice;
        refresh(desk.assessment());
        option.addListener((o, a, chosen) -> {
            if (!showing && chosen != null) {
                desk.session().choose(choice.key(), chosen.key());
            }
        });
    }

    /** What it chooses between. */
    public Choice choice() {
        return choice;
    }

    /** The option taken; setting it changes the set-up. */
    public ObjectProperty<Choice.Option> optionProperty() {
        return option;
    }

    /** "default" while the user chose none. */
    public ReadOnlyStringProperty badgeProperty() {
        return badge.getReadOnlyProperty();
    }

    void refresh(Assessment assessment) {
        String key = assessment.setUp().structure().choice(choice);
        showing = true;
        choice.options().stream().filter(o -> o.key().equals(key)).findFirst().ifPresent(option::set);
        showing = false;
        badge.set(assessment.setUp().choices().containsKey(choice.key()) ? "" : Standing.DEFAULT.word());
    }
}
