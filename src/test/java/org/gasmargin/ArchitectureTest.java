package org.gasmargin;

import static com.tngtech.archunit.library.Architectures.layeredArchitecture;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import org.junit.jupiter.api.Test;

/**
 * Holds the arrows between the rooms: cli → worksheet → rules → process → flow, vessel → gas →
 * units.
 */
class ArchitectureTest {
  private static final JavaClasses CLASSES =
      new ClassFileImporter()
          .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
          .importPackages("org.gasmargin");

  @Test
  void roomsUseOnlyRoomsBelowThem() {
    layeredArchitecture()
        .consideringOnlyDependenciesInLayers()
        .layer("cli")
        .definedBy("org.gasmargin.cli..")
        .layer("job")
        .definedBy("org.gasmargin.job..")
        .layer("worksheet")
        .definedBy("org.gasmargin.worksheet..")
        .layer("rules")
        .definedBy("org.gasmargin.rules..")
        .layer("process")
        .definedBy("org.gasmargin.process..")
        .layer("flow")
        .definedBy("org.gasmargin.flow..")
        .layer("vessel")
        .definedBy("org.gasmargin.vessel..")
        .layer("gas")
        .definedBy("org.gasmargin.gas..")
        .layer("yaml")
        .definedBy("org.gasmargin.yaml..")
        .layer("units")
        .definedBy("org.gasmargin.units..")
        .withOptionalLayers(true)
        .whereLayer("cli")
        .mayNotBeAccessedByAnyLayer()
        .whereLayer("job")
        .mayOnlyBeAccessedByLayers("cli")
        .whereLayer("worksheet")
        .mayOnlyBeAccessedByLayers("cli")
        .whereLayer("rules")
        .mayOnlyBeAccessedByLayers("cli", "worksheet", "job")
        .whereLayer("process")
        .mayOnlyBeAccessedByLayers("cli", "worksheet", "job", "rules")
        .whereLayer("flow")
        .mayOnlyBeAccessedByLayers("cli", "worksheet", "job", "rules", "process")
        .whereLayer("vessel")
        .mayOnlyBeAccessedByLayers("cli", "worksheet", "job", "rules", "process")
        .whereLayer("gas")
        .mayOnlyBeAccessedByLayers("cli", "worksheet", "job", "rules", "process", "flow", "vessel")
        .whereLayer("yaml")
        .mayOnlyBeAccessedByLayers("cli", "job", "rules")
        .check(CLASSES);
  }
}
