package lodebook.assembly.survey;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Map;
import org.junit.jupiter.api.Test;

class PriorsTest {
  @Test
  void eachNameSettlesItsOwn() {
    for (String name : Priors.DEFAULT.byName().keySet()) {
      Priors settled = Priors.DEFAULT.with(Map.of(name, 0.25));
      assertEquals(0.25, settled.byName().get(name));
      Map<String, Double> others = settled.byName();
      others.put(name, Priors.DEFAULT.byName().get(name));
      assertEquals(Priors.DEFAULT.byName(), others);
    }
  }

  @Test
  void otherNamesAreNoPriors() {
    assertEquals(Priors.DEFAULT, Priors.DEFAULT.with(Map.of("shop", 0.25)));
    assertEquals(0.0015, Priors.DEFAULT.byName().get("prior-wild-reading"));
  }
}
