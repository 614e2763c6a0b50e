package org.pofk;

import static com.tngtech.archunit.library.Architectures.layeredArchitecture;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.library.Architectures.LayeredArchitecture;
import java.util.ArrayList;
import java.util.List;

/** Data flows one way: a package imports only packages above it in this list. */
@AnalyzeClasses(packages = "org.pofk", importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {
    private static final List<String> FROM_THE_TOP = List.of("text", "exact", "formula", "meaning", "chain", "transform",
            "modes", "steps", "longrun", "answer", "schedule", "claim", "slip", "input", "report", "cli");

    @ArchTest
    static final ArchRule PACKAGES_IMPORT_ONLY_PACKAGES_ABOVE_THEM = downward();

    private static ArchRule downward() {
        LayeredArchitecture rule = layeredArchitecture().consideringOnlyDependenciesInLayers();
        for (String room : FROM_THE_TOP) {
            rule = rule.layer(room).definedBy("org.pofk." + room);
        }
        for (int i = 0; i < FROM_THE_TOP.size(); i++) {
            List<String> below = new ArrayList<>(FROM_THE_TOP.subList(i + 1, FROM_THE_TOP.size()));
            rule = below.isEmpty()
                    ? rule.whereLayer(FROM_THE_TOP.get(i)).mayNotBeAccessedByAnyLayer()
                    : rule.whereLayer(FROM_THE_TOP.get(i)).mayOnlyBeAccessedByLayers(below.toArray(String[]::new));
        }
        return rule.allowEmptyShould(true);
    }
}
