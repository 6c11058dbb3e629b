package plusward.visit;

import jakarta.persistence.Column;
import jakarta.persistence.Embeddable;
import jakarta.persistence.Embedded;
import java.util.EnumMap;
import java.util.Map;
import org.hibernate.annotations.EmbeddedColumnNaming;
import org.jspecify.annotations.Nullable;
import plusward.exam.Turn;
import plusward.exam.TurnCondition;
import plusward.exam.Turns;
import plusward.optics.Dioptres;

/** The columns of the turns of a visit, by condition, and of the trial plus. */
@Embeddable
record StoredTurns(
        @Embedded @EmbeddedColumnNaming("turn_sc_distance_%s") @Nullable
        StoredTurn scDistance,

        @Embedded @EmbeddedColumnNaming("turn_sc_near_%s") @Nullable
        StoredTurn scNear,

        @Embedded @EmbeddedColumnNaming("turn_cc_distance_%s") @Nullable
        StoredTurn ccDistance,

        @Embedded @EmbeddedColumnNaming("turn_cc_near_%s") @Nullable
        StoredTurn ccNear,

        @Embedded @EmbeddedColumnNaming("turn_add_near_%s") @Nullable
        StoredTurn addNear,

        @Embedded @EmbeddedColumnNaming("turn_trial_near_%s") @Nullable
        StoredTurn trialNear,

        @Column(name = "trial_plus_d") @Nullable Double trialPlus) {

    static StoredTurns of(Turns turns) {
        Dioptres trialPlus = turns.trialPlus();
        return new StoredTurns(
                StoredTurn.of(turns.at(TurnCondition.SC_DISTANCE)),
                StoredTurn.of(turns.at(TurnCondition.SC_NEAR)),
                StoredTurn.of(turns.at(TurnCondition.CC_DISTANCE)),
                StoredTurn.of(turns.at(TurnCondition.CC_NEAR)),
                StoredTurn.of(turns.at(TurnCondition.ADD_NEAR)),
                StoredTurn.of(turns.at(TurnCondition.TRIAL_NEAR)),
                trialPlus == null ? null : trialPlus.amount());
    }

    static Turns turns(@Nullable StoredTurns stored) {
        if (stored == null) {
            return Turns.NONE;
        }
        Map<TurnCondition, Turn> turns = new EnumMap<>(TurnCondition.class);
        for (TurnCondition condition : TurnCondition.values()) {
            Turn turn = StoredTurn.turn(stored.at(condition));
            if (turn != null) {
                turns.put(condition, turn);
            }
        }
        return new Turns(turns, stored.trialPlus == null ? null : Dioptres.of(stored.trialPlus));
    }

    private @Nullable StoredTurn at(TurnCondition condition) {
        return switch (condition) {
            case SC_DISTANCE -> scDistance;
            case SC_NEAR -> scNear;
            case CC_DISTANCE -> ccDistance;
            case CC_NEAR -> ccNear;
            case ADD_NEAR -> addNear;
            case TRIAL_NEAR -> trialNear;
        };
    }
}
