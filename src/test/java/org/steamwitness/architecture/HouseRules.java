package org.steamwitness.architecture;

import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.lang.syntax.elements.GivenClassesConjunction;
import java.io.File;
import java.io.FileDescriptor;
import java.io.FileInputStream;
import java.io.FileOutputStream;
import java.io.FileReader;
import java.io.FileWriter;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.io.RandomAccessFile;
import java.nio.channels.FileChannel;
import java.security.SecureRandom;
import java.text.Collator;
import java.text.DateFormat;
import java.text.DateFormatSymbols;
import java.text.DecimalFormat;
import java.text.DecimalFormatSymbols;
import java.text.Format;
import java.text.MessageFormat;
import java.text.NumberFormat;
import java.text.SimpleDateFormat;
import java.time.Clock;
import java.time.Instant;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.time.MonthDay;
import java.time.OffsetDateTime;
import java.time.OffsetTime;
import java.time.Year;
import java.time.YearMonth;
import java.time.ZoneId;
import java.time.ZonedDateTime;
import java.time.format.DateTimeFormatter;
import java.time.format.DateTimeFormatterBuilder;
import java.util.AbstractCollection;
import java.util.AbstractMap;
import java.util.Arrays;
import java.util.Calendar;
import java.util.Collection;
import java.util.Collections;
import java.util.Date;
import java.util.Formatter;
import java.util.GregorianCalendar;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.ResourceBundle;
import java.util.Scanner;
import java.util.SplittableRandom;
import java.util.TimeZone;
import java.util.UUID;
import java.util.concurrent.ThreadLocalRandom;
import java.util.random.RandomGenerator;
import java.util.stream.BaseStream;
import java.util.stream.Stream;

/** Same bytes in, same bytes out, on any machine; and only the faces speak. */
final class HouseRules {

    private static final List<Call> CONSOLE = List.of(
            Call.to(System.class, "out", "err", "in", "console"),
            Call.to(Throwable.class, "printStackTrace"),
            Call.to(Thread.class, "dumpStack"));

    /** A moment is handed in as a value, so even a clock that was handed in is not asked. */
    private static final List<Call> CLOCK = List.of(
            Call.to(System.class, "currentTimeMillis", "nanoTime"),
            Call.to(Clock.class, "system", "systemUTC", "systemDefaultZone"),
            Call.to(Clock.class, "tick", "tickMillis", "tickSeconds", "tickMinutes"),
            Call.to(Instant.class, "now"),
            Call.to(LocalDate.class, "now"),
            Call.to(LocalTime.class, "now"),
            Call.to(LocalDateTime.class, "now"),
            Call.to(OffsetDateTime.class, "now"),
            Call.to(OffsetTime.class, "now"),
            Call.to(ZonedDateTime.class, "now"),
            Call.to(Year.class, "now"),
            Call.to(YearMonth.class, "now"),
            Call.to(MonthDay.class, "now"),
            Call.making(Date.class).unlessGiven(long.class),
            Call.to(Calendar.class, "getInstance"),
            Call.making(GregorianCalendar.class).unlessGiven(int.class));

    private static final List<Call> ZONE = List.of(
            Call.to(ZoneId.class, "systemDefault"),
            Call.to(TimeZone.class, "getDefault", "setDefault"),
            Call.to(Clock.class, "systemDefaultZone"),
            Call.to(Calendar.class, "getInstance").unlessGiven(TimeZone.class),
            Call.making(GregorianCalendar.class).unlessGiven(TimeZone.class));

    private static final List<Call> LOCALE = List.of(
            Call.to(Locale.class, "getDefault", "setDefault"),
            Call.to(String.class, "format", "formatted", "toLowerCase", "toUpperCase")
                    .unlessGiven(Locale.class),
            Call.to(PrintStream.class, "format", "printf").unlessGiven(Locale.class),
            Call.to(PrintWriter.class, "format", "printf").unlessGiven(Locale.class),
            Call.making(Formatter.class).unlessGiven(Locale.class),
            Call.making(Scanner.class),
            Call.to(
                            NumberFormat.class,
                            "getInstance",
                            "getNumberInstance",
                            "getIntegerInstance",
                            "getPercentInstance",
                            "getCurrencyInstance",
                            "getCompactNumberInstance")
                    .unlessGiven(Locale.class),
            Call.making(DecimalFormat.class).unlessGiven(DecimalFormatSymbols.class),
            Call.to(DecimalFormatSymbols.class, "<init>", "getInstance").unlessGiven(Locale.class),
            Call.to(DateFormat.class, "getInstance", "getDateInstance", "getTimeInstance", "getDateTimeInstance")
                    .unlessGiven(Locale.class),
            Call.making(SimpleDateFormat.class).unlessGiven(Locale.class, DateFormatSymbols.class),
            Call.to(DateFormatSymbols.class, "<init>", "getInstance").unlessGiven(Locale.class),
            Call.making(MessageFormat.class).unlessGiven(Locale.class),
            Call.to(MessageFormat.class, "format").unlessGiven(Object.class, StringBuffer.class),
            Call.to(DateTimeFormatter.class, "ofPattern", "ofLocalizedDate", "ofLocalizedTime", "ofLocalizedDateTime")
                    .unlessGiven(Locale.class),
            Call.to(DateTimeFormatterBuilder.class, "toFormatter").unlessGiven(Locale.class),
            Call.to(Collator.class, "getInstance").unlessGiven(Locale.class),
            Call.to(ResourceBundle.class, "getBundle").unlessGiven(Locale.class));

    /** Square roots, roundings and comparisons are the same everywhere and stay allowed. */
    private static final List<Call> MATHEMATICS = List.of(Call.to(
            Math.class,
            "exp",
            "expm1",
            "pow",
            "log",
            "log10",
            "log1p",
            "cbrt",
            "hypot",
            "sin",
            "cos",
            "tan",
            "asin",
            "acos",
            "atan",
            "atan2",
            "sinh",
            "cosh",
            "tanh"));

    private static final List<Call> CHANCE = List.of(
            Call.to(Math.class, "random"),
            Call.to(StrictMath.class, "random"),
            Call.to(UUID.class, "randomUUID"),
            Call.to(SecureRandom.class, "getInstance", "getInstanceStrong"),
            Call.making(Random.class),
            Call.making(SplittableRandom.class),
            Call.to(ThreadLocalRandom.class, "current"),
            Call.to(RandomGenerator.class, "of", "getDefault"),
            Call.to(Collections.class, "shuffle"));

    private static final List<Call> PARALLEL = List.of(
            Call.to(Collection.class, "parallelStream"),
            Call.to(BaseStream.class, "parallel"),
            Call.to(Arrays.class, "parallelPrefix", "parallelSetAll", "parallelSort"));

    private static final DescribedPredicate<JavaClass> FILES = resideInAPackage("java.nio.file..")
            .or(kindOf(
                    "files",
                    File.class,
                    FileDescriptor.class,
                    FileInputStream.class,
                    FileOutputStream.class,
                    FileReader.class,
                    FileWriter.class,
                    RandomAccessFile.class,
                    FileChannel.class));

    /** Constant tables, lists and maps are declared by their interface or as arrays of numbers. */
    private static final DescribedPredicate<JavaClass> MADE_TO_CHANGE = kindOf(
                    "made to change",
                    AbstractCollection.class,
                    AbstractMap.class,
                    StringBuilder.class,
                    StringBuffer.class,
                    ThreadLocal.class,
                    Calendar.class,
                    Date.class,
                    Format.class,
                    Random.class)
            .or(resideInAPackage("java.util.concurrent.atomic"))
            .or(resideInAPackage("java.util.concurrent.locks"));

    private HouseRules() {}

    static List<Rule> all() {
        return List.of(
                new Rule("house.console", HouseRules::onlyTheFacesSpeak),
                new Rule("house.clock", HouseRules::noClock),
                new Rule("house.zone", HouseRules::noDefaultZone),
                new Rule("house.locale", HouseRules::noDefaultLocale),
                new Rule("house.files", HouseRules::noFiles),
                new Rule("house.mathematics", HouseRules::strictMathematics),
                new Rule("house.chance", HouseRules::noChance),
                new Rule("house.parallel", HouseRules::noParallelStreams),
                new Rule("house.statics", HouseRules::noStaticState));
    }

    private static ArchRule onlyTheFacesSpeak(String root) {
        return never("use the console", CONSOLE, root, "cli", "desk");
    }

    private static ArchRule noClock(String root) {
        return never("ask a clock", CLOCK, root, "run", "cli", "desk");
    }

    private static ArchRule noDefaultZone(String root) {
        return never("take the default zone", ZONE, root, "run", "cli", "desk");
    }

    private static ArchRule noDefaultLocale(String root) {
        return never("take the default locale", LOCALE, root, "desk");
    }

    private static ArchRule strictMathematics(String root) {
        return never("use Math where machines differ; StrictMath is the same on all", MATHEMATICS, root);
    }

    private static ArchRule noChance(String root) {
        return never("leave anything to chance", CHANCE, root);
    }

    private static ArchRule noParallelStreams(String root) {
        return never("work in parallel", PARALLEL, root);
    }

    /** Resources of the class path are read as streams and need no file. */
    private static ArchRule noFiles(String root) {
        return outside(root, "run", "archive", "cli", "desk")
                .should()
                .dependOnClassesThat(FILES)
                .as("outside run, archive, cli, desk no class may touch a file");
    }

    private static ArchRule noStaticState(String root) {
        return fields().that()
                .areStatic()
                .should()
                .beFinal()
                .andShould()
                .notHaveRawType(MADE_TO_CHANGE)
                .as("below " + root + " no static field may change");
    }

    private static ArchRule never(String what, List<Call> calls, String root, String... excepted) {
        String where = excepted.length == 0 ? "" : "outside " + String.join(", ", excepted) + " ";
        return outside(root, excepted)
                .should()
                .accessTargetWhere(Call.anyOf(what, calls))
                .as(where + "no class may " + what);
    }

    private static GivenClassesConjunction outside(String root, String... excepted) {
        return noClasses().that().resideOutsideOfPackages(ArchitectureRules.below(root, List.of(excepted)));
    }

    private static DescribedPredicate<JavaClass> kindOf(String described, Class<?>... types) {
        return DescribedPredicate.describe(described, type -> Stream.of(types).anyMatch(type::isAssignableTo));
    }
}
