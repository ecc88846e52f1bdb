package simulation;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import org.junit.jupiter.api.Test;

class IndependenceTest {

    @Test
    void theSimulationSharesNothingWithTheProgram() {
        JavaClasses simulation = new ClassFileImporter().importPackages("simulation");
        noClasses()
                .that()
                .resideInAPackage("simulation..")
                .should()
                .dependOnClassesThat()
                .resideInAPackage("org.steamwitness..")
                .check(simulation);
    }
}
