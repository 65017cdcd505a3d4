package eddyledger.window;

import java.awt.GraphicsEnvironment;
import org.junit.jupiter.api.extension.ConditionEvaluationResult;
import org.junit.jupiter.api.extension.ExecutionCondition;
import org.junit.jupiter.api.extension.ExtensionContext;

/** Skips tests of the window where there is no display, unless one is required. */
final class DisplayCondition implements ExecutionCondition {
  /** Environment variable that makes a missing display a failure. */
  static final String REQUIRED = "EDDYLEDGER_REQUIRE_DISPLAY";

  @Override
  public ConditionEvaluationResult evaluateExecutionCondition(ExtensionContext context) {
    if (!GraphicsEnvironment.isHeadless()) {
      return ConditionEvaluationResult.enabled("there is a display");
    }
    if (Boolean.parseBoolean(System.getenv(REQUIRED))) {
      throw new IllegalStateException("a display is required for the tests of the window");
    }
    String why = "There is no display: " + context.getDisplayName() + " is skipped.";
    System.out.println(why);
    return ConditionEvaluationResult.disabled(why);
  }
}
