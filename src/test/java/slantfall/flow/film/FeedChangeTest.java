package slantfall.flow.film;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Percentage.withPercentage;

import org.junit.jupiter.api.Test;

/** Fronts and fans conserve mass. */
class FeedChangeTest {

    private static final double GRAVITY = 5;
    private static final double NU = 2e-6;

    @Test
    void ontoADryWallAtTheMeanVelocity() {
        double h = 3e-4;
        double mean = NewtonianFilm.flow(GRAVITY, NU, 0, h) / h;
        assertThat(FeedChange.front(GRAVITY, NU, 0, h)).isCloseTo(mean, withPercentage(1e-9));
    }

    @Test
    void aSmallStepTravelsAsASmallWave() {
        double h = 3e-4;
        assertThat(FeedChange.front(GRAVITY, NU, h, h * 1.0001))
                .isCloseTo(FeedChange.edge(GRAVITY, NU, h), withPercentage(0.02));
        assertThat(FeedChange.front(GRAVITY, NU, h, h)).isEqualTo(FeedChange.edge(GRAVITY, NU, h));
    }

    /** The liquid in the fan is what came in and what went out: ∫h dx between the edges = (h₂u₂ − q₂) − (h₁u₁ − q₁) over t. */
    @Test
    void theFanHoldsWhatFlowedIn() {
        double thin = 2e-4;
        double thick = 5e-4;
        double time = 3;
        double from = FeedChange.edge(GRAVITY, NU, thin) * time;
        double to = FeedChange.edge(GRAVITY, NU, thick) * time;
        int steps = 20000;
        double step = (to - from) / steps;
        double held = 0;
        for (int i = 0; i < steps; i++) {
            held += FeedChange.fanThickness(GRAVITY, NU, from + (i + 0.5) * step, time) * step;
        }
        double flowIn = NewtonianFilm.flow(GRAVITY, NU, 0, thin) * time - thin * from;
        double flowOut = NewtonianFilm.flow(GRAVITY, NU, 0, thick) * time - thick * to;
        assertThat(held).isCloseTo(flowIn - flowOut, withPercentage(1e-5));
    }
}
