package eddyledger.window;

import eddyledger.app.Examples;
import eddyledger.app.FaultReport;
import eddyledger.app.Projects;
import eddyledger.app.RecentFiles;
import eddyledger.app.Tables;
import eddyledger.app.Workbooks;
import java.util.prefs.Preferences;

/**
 * What the window works with.
 *
 * @param projects opens and saves projects
 * @param tables writes CSV
 * @param workbooks writes workbooks
 * @param recent files opened lately
 * @param examples examples that come with the program
 * @param faults keeps what is known of internal faults
 * @param memory where the window keeps its own settings
 */
public record Services(
    Projects projects,
    Tables tables,
    Workbooks workbooks,
    RecentFiles recent,
    Examples examples,
    FaultReport faults,
    Preferences memory) {}
