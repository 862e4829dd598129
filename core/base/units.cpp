// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/base/units.h"

#include <array>
#include <cctype>
#include <string>

namespace dampwright {
namespace {

struct Spelling {
  std::string_view spelling;  ///< lower case
  Unit unit;
};

constexpr Unit second{"s", Quantity::Time, 1, 0};
constexpr Unit millisecond{"ms", Quantity::Time, 1e-3, 0};
constexpr Unit microsecond{"µs", Quantity::Time, 1e-6, 0};
constexpr Unit minute{"min", Quantity::Time, 60, 0};
constexpr Unit millimetre{"mm", Quantity::Length, 1e-3, 0};
constexpr Unit centimetre{"cm", Quantity::Length, 1e-2, 0};
constexpr Unit micrometre{"µm", Quantity::Length, 1e-6, 0};
constexpr Unit metre{"m", Quantity::Length, 1, 0};
constexpr Unit inch{"in", Quantity::Length, metresPerInch, 0};
constexpr Unit metrePerSecond{"m/s", Quantity::Velocity, 1, 0};
constexpr Unit millimetrePerSecond{"mm/s", Quantity::Velocity, 1e-3, 0};
constexpr Unit centimetrePerSecond{"cm/s", Quantity::Velocity, 1e-2, 0};
constexpr Unit inchPerSecond{"in/s", Quantity::Velocity, metresPerInch, 0};
constexpr Unit newton{"N", Quantity::Force, 1, 0};
constexpr Unit kilonewton{"kN", Quantity::Force, 1000, 0};
constexpr Unit decanewton{"daN", Quantity::Force, 10, 0};
constexpr Unit kilogramForce{"kgf", Quantity::Force, newtonsPerKilogramForce, 0};
constexpr Unit poundForce{"lbf", Quantity::Force, newtonsPerPoundForce, 0};
constexpr Unit celsius{"°C", Quantity::Temperature, 1, 0};
constexpr Unit fahrenheit{"°F", Quantity::Temperature, 5.0 / 9.0, -160.0 / 9.0};
constexpr Unit kelvin{"K", Quantity::Temperature, 1, -273.15};
constexpr Unit volt{"V", Quantity::Voltage, 1, 0};
constexpr Unit hertz{"Hz", Quantity::Frequency, 1, 0};

// Spellings in lower case. "m" is metre and never minute; "k" is kelvin; "kp" is the old kilopond.
constexpr std::array<Spelling, 65> spellings{{
    {"s", second},
    {"sec", second},
    {"secs", second},
    {"second", second},
    {"seconds", second},
    {"sek", second},
    {"ms", millisecond},
    {"msec", millisecond},
    {"millisecond", millisecond},
    {"milliseconds", millisecond},
    {"µs", microsecond},
    {"μs", microsecond},
    {"us", microsecond},
    {"usec", microsecond},
    {"min", minute},
    {"minute", minute},
    {"minutes", minute},
    {"mm", millimetre},
    {"millimetre", millimetre},
    {"millimeter", millimetre},
    {"cm", centimetre},
    {"µm", micrometre},
    {"μm", micrometre},
    {"um", micrometre},
    {"m", metre},
    {"metre", metre},
    {"meter", metre},
    {"in", inch},
    {"inch", inch},
    {"inches", inch},
    {"\"", inch},
    {"m/s", metrePerSecond},
    {"m/sec", metrePerSecond},
    {"m s-1", metrePerSecond},
    {"mm/s", millimetrePerSecond},
    {"mm/sec", millimetrePerSecond},
    {"cm/s", centimetrePerSecond},
    {"in/s", inchPerSecond},
    {"in/sec", inchPerSecond},
    {"inch/s", inchPerSecond},
    {"ips", inchPerSecond},
    {"n", newton},
    {"newton", newton},
    {"newtons", newton},
    {"kn", kilonewton},
    {"dan", decanewton},
    {"kgf", kilogramForce},
    {"kg", kilogramForce},
    {"kp", kilogramForce},
    {"lbf", poundForce},
    {"lb", poundForce},
    {"lbs", poundForce},
    {"°c", celsius},
    {"º c", celsius},
    {"degc", celsius},
    {"deg c", celsius},
    {"c", celsius},
    {"celsius", celsius},
    {"°f", fahrenheit},
    {"degf", fahrenheit},
    {"k", kelvin},
    {"v", volt},
    {"volt", volt},
    {"volts", volt},
    {"hz", hertz},
}};

}  // namespace

std::optional<Unit> unitFromSymbol(std::string_view symbol) {
  std::string lower;
  for (const char letter : symbol) {
    lower += static_cast<char>(std::tolower(static_cast<unsigned char>(letter)));
  }
  for (const Spelling& entry : spellings) {
    if (entry.spelling == lower) return entry.unit;
  }
  return std::nullopt;
}

}  // namespace dampwright
