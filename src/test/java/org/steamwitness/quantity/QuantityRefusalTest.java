package org.steamwitness.quantity;

import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class QuantityRefusalTest {

    private static final String PRESSURES = "Pa, hPa, kPa, MPa, bar, mbar, psi, kgf/cm2, atm, mmHg, inHg";

    /** Each row: the quantity asked for, the text, and the one message; PRESSURES stands for the units of pressure. */
    @ParameterizedTest(name = "{0}: {1}")
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            TEMPERATURE | 121,1 degC     | "121,1 degC" is not a temperature such as 121.1 degC; known units: degC, degF, K
            TEMPERATURE | 121.1          | "121.1" is not a temperature such as 121.1 degC; known units: degC, degF, K
            TEMPERATURE | 121.1 °C       | "121.1 °C" is not a temperature such as 121.1 degC; known units: degC, degF, K
            TEMPERATURE | 121.1 degC(g)  | "121.1 degC(g)" is not a temperature such as 121.1 degC; known units: degC, degF, K
            TEMPERATURE | 121.1 C        | "121.1 C": unknown unit C; expected a temperature such as 121.1 degC; known units: degC, degF, K
            TEMPERATURE | -300 degC      | "-300 degC" lies at or below absolute zero; expected a temperature such as 121.1 degC; known units: degC, degF, K
            TEMPERATURE | 0 K            | "0 K" lies at or below absolute zero; expected a temperature such as 121.1 degC; known units: degC, degF, K
            DIFFERENCE  | 1.8 degF       | "1.8 degF": a difference of temperatures is written in kelvin, here 1 K; expected a temperature difference such as 0.25 K; known units: K
            DIFFERENCE  | 1 degF         | "1 degF": a difference of temperatures is written in kelvin, here 0.555555555556 K; expected a temperature difference such as 0.25 K; known units: K
            DIFFERENCE  | 90 degF        | "90 degF": a difference of temperatures is written in kelvin, here 50 K; expected a temperature difference such as 0.25 K; known units: K
            DIFFERENCE  | -0.2 degC      | "-0.2 degC": a difference of temperatures is written in kelvin, here -0.2 K; expected a temperature difference such as 0.25 K; known units: K
            DIFFERENCE  | 1 degF(g)      | "1 degF(g)" is not a temperature difference such as 0.25 K; known units: K
            DIFFERENCE  | 1 degFoo       | "1 degFoo": unknown unit degFoo; expected a temperature difference such as 0.25 K; known units: K
            DIFFERENCE  | 1 mK           | "1 mK": unknown unit mK; expected a temperature difference such as 0.25 K; known units: K
            DURATION    | 15             | "15" is not a duration such as 15 min; known units: s, min, h
            DURATION    | 15 minutes     | "15 minutes": unknown unit minutes; expected a duration such as 15 min; known units: s, min, h
            DURATION    | -1 s           | "-1 s" is below zero; expected a duration such as 15 min; known units: s, min, h
            PRESSURE    | 3.0 bar        | "3.0 bar" does not say what it is counted from; write 3.0 bar(a) for absolute or 3.0 bar(g) for gauge
            PRESSURE    | 3.0 Bar(g)     | "3.0 Bar(g)": unknown unit Bar; expected a pressure with its datum such as 205 kPa(a) or 1.04 bar(g); known units: PRESSURES
            PRESSURE    | 3.0 bar(abs)   | "3.0 bar(abs)" is not a pressure with its datum such as 205 kPa(a) or 1.04 bar(g); known units: PRESSURES
            PRESSURE    | 15 psig        | "15 psig": unknown unit psig, write psi(g); expected a pressure with its datum such as 205 kPa(a) or 1.04 bar(g); known units: PRESSURES
            PRESSURE    | 2 bara         | "2 bara": unknown unit bara, write bar(a); expected a pressure with its datum such as 205 kPa(a) or 1.04 bar(g); known units: PRESSURES
            PRESSURE    | 2 barx         | "2 barx": unknown unit barx; expected a pressure with its datum such as 205 kPa(a) or 1.04 bar(g); known units: PRESSURES
            PRESSURE    | 2 ag           | "2 ag": unknown unit ag; expected a pressure with its datum such as 205 kPa(a) or 1.04 bar(g); known units: PRESSURES
            PRESSURE    | -5 kPa(a)      | "-5 kPa(a)" lies below vacuum; only a gauge pressure, (g), may be negative; expected a pressure with its datum such as 205 kPa(a) or 1.04 bar(g); known units: PRESSURES
            PRESSURE    | -1.21 bar(g)   | "-1.21 bar(g)" lies below vacuum under any atmosphere; expected a pressure with its datum such as 205 kPa(a) or 1.04 bar(g); known units: PRESSURES
            ATMOSPHERE  | 1008           | "1008" is not the pressure of the atmosphere such as 1008 hPa; known units: PRESSURES
            ATMOSPHERE  | 1.0 bar(g)     | "1.0 bar(g)" is a gauge pressure; the atmosphere is absolute, as 1008 hPa
            ATMOSPHERE  | 1008 kPa       | "1008 kPa" is no pressure of an atmosphere; expected 300 hPa to 1200 hPa, read at the place of the chamber and not reduced to sea level
            ATMOSPHERE  | 299 hPa        | "299 hPa" is no pressure of an atmosphere; expected 300 hPa to 1200 hPa, read at the place of the chamber and not reduced to sea level
            PRESSURE_DIFFERENCE | 0.02 bar(g) | "0.02 bar(g)" is not a pressure difference such as 0.02 bar; known units: PRESSURES
            MASS        | 0 kg           | "0 kg" is not above zero; expected a mass such as 640 kg; known units: kg, g, lb
            MASS        | 1 t            | "1 t": unknown unit t; expected a mass such as 640 kg; known units: kg, g, lb
            MASS        | 640            | "640" is not a mass such as 640 kg; known units: kg, g, lb
            VOLUME      | -1 m3          | "-1 m3" is not above zero; expected a volume such as 1.9 m3; known units: m3, dm3, l, ml
            VOLUME      | 1.9 m          | "1.9 m": unknown unit m; expected a volume such as 1.9 m3; known units: m3, dm3, l, ml
            LENGTH      | 0 mm           | "0 mm" is not above zero; expected a length such as 73 mm; known units: m, mm, ft
            LENGTH      | 2 in           | "2 in": unknown unit in; expected a length such as 73 mm; known units: m, mm, ft
            ALTITUDE    | -501 m         | "-501 m" lies outside -500 m to 9000 m; expected an altitude such as 350 m; known units: m, ft
            ALTITUDE    | 9000.1 m       | "9000.1 m" lies outside -500 m to 9000 m; expected an altitude such as 350 m; known units: m, ft
            SPECIFIC_HEAT | 0 kJ/(kg K)  | "0 kJ/(kg K)" is not above zero; expected a specific heat such as 3.55 kJ/(kg K); known units: kJ/(kg K), J/(kg K)
            SPECIFIC_HEAT | 3.55 kJ/kg K | "3.55 kJ/kg K" is not a specific heat such as 3.55 kJ/(kg K); known units: kJ/(kg K), J/(kg K)
            ENERGY      | -1 kJ          | "-1 kJ" is below zero; expected an energy such as 2.5 kWh; known units: kJ, MJ, kWh
            ENERGY      | 1 kW           | "1 kW": unknown unit kW; expected an energy such as 2.5 kWh; known units: kJ, MJ, kWh
            FRACTION    | 95             | "95" lies outside 0 to 1, which is 0 % to 100 %; expected a fraction such as 0.97 or a percentage such as 97 %; known units: %
            FRACTION    | -0.1           | "-0.1" lies outside 0 to 1, which is 0 % to 100 %; expected a fraction such as 0.97 or a percentage such as 97 %; known units: %
            FRACTION    | 100.1 %        | "100.1 %" lies outside 0 to 1, which is 0 % to 100 %; expected a fraction such as 0.97 or a percentage such as 97 %; known units: %
            FRACTION    | most           | "most" is not a fraction such as 0.97 or a percentage such as 97 %; known units: %
            TEMPERATURE_RATE | 3.6 degF/min | "3.6 degF/min": a difference of temperatures is written in kelvin, here 2 K/min; expected a rate of temperature such as 2.5 K/min; known units: K/min, K/s
            TEMPERATURE_RATE | 2 degC/s  | "2 degC/s": a difference of temperatures is written in kelvin, here 2 K/s; expected a rate of temperature such as 2.5 K/min; known units: K/min, K/s
            TEMPERATURE_RATE | 2 degC    | "2 degC": unknown unit degC; expected a rate of temperature such as 2.5 K/min; known units: K/min, K/s
            TEMPERATURE_RATE | 2 K/h     | "2 K/h": unknown unit K/h; expected a rate of temperature such as 2.5 K/min; known units: K/min, K/s
            PRESSURE_RATE | 0.3 bar(g)/min | "0.3 bar(g)/min" is not a rate of pressure such as 0.3 bar/min; known units: RATES
            PRESSURE_RATE | 0.3 bar      | "0.3 bar": unknown unit bar; expected a rate of pressure such as 0.3 bar/min; known units: RATES
            MASS_FLOW   | -1 kg/h        | "-1 kg/h" is below zero; expected a mass flow such as 120 kg/h; known units: kg/h, kg/min
            MASS_FLOW   | 1 kg/s         | "1 kg/s": unknown unit kg/s; expected a mass flow such as 120 kg/h; known units: kg/h, kg/min
            ROTATION    | -1 rpm         | "-1 rpm" is below zero; expected a rotation such as 12 1/min or 12 rpm; known units: 1/min, rpm
            ROTATION    | 121/min        | "121/min" is not a rotation such as 12 1/min or 12 rpm; known units: 1/min, rpm
            ROTATION    | 0.51/min       | "0.51/min" is not a rotation such as 12 1/min or 12 rpm; known units: 1/min, rpm
            POWER       | -1 W           | "-1 W" is below zero; expected a power such as 9 kW; known units: kW, W
            POWER       | 1 hp           | "1 hp": unknown unit hp; expected a power such as 9 kW; known units: kW, W
            HEAT_LOSS   | -28 W/K        | "-28 W/K" is below zero; expected a heat loss such as 28 W/K; known units: W/K
            HEAT_LOSS   | 28 W           | "28 W": unknown unit W; expected a heat loss such as 28 W/K; known units: W/K
            """)
    void saysWhatWasWrittenWhatWasExpectedAndWhichUnitsAreKnown(Reader reader, String text, String message) {
        String rates = PRESSURES.replaceAll("([A-Za-z0-9/]+)", "$1/min, $1/s");
        assertThatThrownBy(() -> reader.read(text))
                .isInstanceOf(QuantityException.class)
                .hasMessage(message.replace("PRESSURES", PRESSURES).replace("RATES", rates));
    }

    /** Numbers that other programs would read: exponents, hexadecimal, words, other digits and minus signs, no end. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                " ",
                "degC",
                "1e3 degC",
                "NaN degC",
                "Infinity K",
                "0x10 K",
                "1. K",
                ".5 K",
                "1  K",
                " 1 K",
                "1 K ",
                "1 K\n",
                "1 000 K",
                "1'000 K",
                "--1 K",
                "\u22121 K",
                "\u0661\u0662\u0661 K",
                "1\u00A0K",
                "1234567890123456 K",
                "1.1234567890123456 K",
                "1 K K",
                "1 K(x)"
            })
    void readsNoNumberButPlainDecimals(String text) {
        assertThatThrownBy(() -> QuantityText.kelvin(text))
                .isInstanceOf(QuantityException.class)
                .hasMessage("\"" + text + "\" is not a temperature such as 121.1 degC; known units: degC, degF, K");
    }
}
