package sill.tests.worksheets;

import java.nio.file.Path;

/** The worksheets of the project and what a record of each holds. */
enum Design {
    CONDENSATE_LIFT("condensate-lift", 7, 2, 1),
    DOOR_HEATER("door-heater", 6, 2, 0),
    BATTERY_DISCONNECT("battery-disconnect", 8, 2, 1),
    CABINET_FAN("cabinet-fan", 5, 1, 0),
    WORKED_EXAMPLE("worked-example", 9, 2, 0);

    /** The folder of all worksheets. */
    static final Path FOLDER = Path.of("").toAbsolutePath().resolveSibling("worksheets");

    private final String title;
    private final int checks;
    private final int plots;
    private final int dataFiles;

    Design(String title, int checks, int plots, int dataFiles) {
        this.title = title;
        this.checks = checks;
        this.plots = plots;
        this.dataFiles = dataFiles;
    }

    /** The design whose folder has this name. */
    static Design named(String title) {
        for (Design design : values()) {
            if (design.title.equals(title)) {
                return design;
            }
        }
        throw new IllegalArgumentException("no design is named \"" + title + "\"");
    }

    Path sheet() {
        return FOLDER.resolve(title).resolve(title + ".sill");
    }

    int checks() {
        return checks;
    }

    int plots() {
        return plots;
    }

    int dataFiles() {
        return dataFiles;
    }

    @Override
    public String toString() {
        return title;
    }
}
