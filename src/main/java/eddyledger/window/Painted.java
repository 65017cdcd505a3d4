package eddyledger.window;

import javax.accessibility.Accessible;
import javax.accessibility.AccessibleContext;
import javax.accessibility.AccessibleRole;
import javax.swing.JComponent;

/** A component that paints itself and can be read by a screen reader. */
abstract class Painted extends JComponent implements Accessible {
  private final transient AccessibleRole role;

  /** With the role it has for a screen reader. */
  Painted(AccessibleRole role) {
    this.role = role;
  }

  @Override
  public final AccessibleContext getAccessibleContext() {
    if (accessibleContext == null) {
      accessibleContext =
          new AccessibleJComponent() {
            @Override
            public AccessibleRole getAccessibleRole() {
              return role;
            }
          };
    }
    return accessibleContext;
  }
}
