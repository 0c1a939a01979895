package lodebook.ui.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.util.List;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.survey.FaultKind;
import lodebook.assembly.survey.MeasureNext;
import lodebook.assembly.survey.NamedFault;
import lodebook.ui.words.Words;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/// Why one more reading would help, in words.
class SurveyWordsTest {
  private static final ProbePoint POINT = new ProbePoint(4, Spot.CENTRE, Component.RADIAL);

  @Test
  void anEmptyPocketAsksToLook() {
    assertEquals(
        "an empty pocket there would read nearly the same: look, or read there (slot 4 missing)",
        say(MeasureNext.Why.EMPTY_POCKET_ALIKE, List.of(new NamedFault(4, FaultKind.MISSING))));
  }

  @ParameterizedTest
  @EnumSource
  void everyReasonHasWords(MeasureNext.Why why) {
    assertFalse(say(why, List.of()).isBlank());
  }

  @ParameterizedTest
  @EnumSource
  void everyFaultHasWords(FaultKind kind) {
    String said = say(MeasureNext.Why.PARTS_EXPLANATIONS, List.of(new NamedFault(4, kind)));
    assertEquals("it parts the likeliest explanations (slot 4 ", said.substring(0, 44));
  }

  private static String say(MeasureNext.Why why, List<NamedFault> faults) {
    return SurveyWords.why(new MeasureNext(POINT, why, faults), Words.english());
  }
}
