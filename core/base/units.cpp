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
constexpr Unit nanosecond{"ns", Quantity::Time, 1e-9, 0};
constexpr Unit minute{"min", Quantity::Time, 60, 0};
constexpr Unit hour{"h", Quantity::Time, 3600, 0};
constexpr Unit day{"d", Quantity::Time, 86400, 0};
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

// Spellings in lower case and without accents. "m" is metre and never minute; "k" is kelvin; "kp"
// is the old kilopond. The degree sign comes as other logger's encodings leave it, too.
constexpr auto spellings = std::to_array<Spelling>({
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
    {"ns", nanosecond},
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
    {"ºc", celsius},
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
    // German, French, Italian, Spanish, Portuguese, Dutch
    {"sekunde", second},
    {"sekunden", second},
    {"seconde", second},
    {"secondes", second},
    {"seconden", second},
    {"secondi", second},
    {"segundo", second},
    {"segundos", second},
    {"seg", second},
    {"millisekunden", millisecond},
    {"millisecondes", millisecond},
    {"millisecondi", millisecond},
    {"milliseconden", millisecond},
    {"milisegundos", millisecond},
    {"mseg", millisecond},
    {"msek", millisecond},
    {"microseconds", microsecond},
    {"mikrosekunden", microsecond},
    {"mins", minute},
    {"minuten", minute},
    {"minuti", minute},
    {"minutos", minute},
    {"h", hour},
    {"hr", hour},
    {"hours", hour},
    {"d", day},
    {"day", day},
    {"days", day},
    {"millimetres", millimetre},
    {"millimeters", millimetre},
    {"millimetro", millimetre},
    {"millimetri", millimetre},
    {"milimetro", millimetre},
    {"milimetros", millimetre},
    {"centimetre", centimetre},
    {"centimeter", centimetre},
    {"metri", metre},
    {"metros", metre},
    {"metres", metre},
    {"meters", metre},
    {"zoll", inch},
    {"pouce", inch},
    {"pouces", inch},
    {"pollici", inch},
    {"pulgadas", inch},
    {"polegadas", inch},
    {"mm.s-1", millimetrePerSecond},
    {"mm·s-1", millimetrePerSecond},
    {"mm s-1", millimetrePerSecond},
    {"mm*s-1", millimetrePerSecond},
    {"mm/sek", millimetrePerSecond},
    {"mm/seg", millimetrePerSecond},
    {"mm/second", millimetrePerSecond},
    {"mm s^-1", millimetrePerSecond},
    {"mmps", millimetrePerSecond},
    {"m.s-1", metrePerSecond},
    {"m·s-1", metrePerSecond},
    {"m s^-1", metrePerSecond},
    {"m/sek", metrePerSecond},
    {"m/seg", metrePerSecond},
    {"m/second", metrePerSecond},
    {"in./s", inchPerSecond},
    {"inches/s", inchPerSecond},
    {"cm/sec", centimetrePerSecond},
    {"kilonewton", kilonewton},
    {"kilonewtons", kilonewton},
    {"dekanewton", decanewton},
    {"newtone", newton},
    {"kg-f", kilogramForce},
    {"kg f", kilogramForce},
    {"kilogramm", kilogramForce},
    {"kilogram-force", kilogramForce},
    {"lb-f", poundForce},
    {"lbs-f", poundForce},
    {"pounds", poundForce},
    {"pound", poundForce},
    {"pound-force", poundForce},
    {"degrees c", celsius},
    {"deg. c", celsius},
    {"deg_c", celsius},
    {"grad c", celsius},
    {"grad celsius", celsius},
    {"° c", celsius},
    {"c°", celsius},
    {"oc", celsius},
    {"degree celsius", celsius},
    {"degrees celsius", celsius},
    {"°celsius", celsius},
    {"deg f", fahrenheit},
    {"deg. f", fahrenheit},
    {"degrees f", fahrenheit},
    {"f°", fahrenheit},
    {"fahrenheit", fahrenheit},
    {"degrees fahrenheit", fahrenheit},
    {"kelvin", kelvin},
    // a degree sign that went through a wrong encoding: twice UTF-8, code page 437, Mac, none
    {"a°c", celsius},
    {"\xC3\xB8"
     "c",
     celsius},
    {"\xC2\xA1"
     "c",
     celsius},
    {"\xEF\xBF\xBD"
     "c",
     celsius},
    {"?c", celsius},
    {"a°f", fahrenheit},
    {"\xC3\xB8"
     "f",
     fahrenheit},
    {"\xC2\xA1"
     "f",
     fahrenheit},
    {"\xEF\xBF\xBD"
     "f",
     fahrenheit},
    {"?f", fahrenheit},
    {"aµs", microsecond},
    {"aµm", micrometre},
    // Japanese, Chinese
    {"秒", second},
    {"ミリ秒", millisecond},
    {"毫秒", millisecond},
    {"マイクロ秒", microsecond},
    {"微秒", microsecond},
    {"分", minute},
    {"分钟", minute},
    {"分鐘", minute},
    {"ミリ", millimetre},
    {"ミリメートル", millimetre},
    {"毫米", millimetre},
    {"公厘", millimetre},
    {"センチメートル", centimetre},
    {"厘米", centimetre},
    {"公分", centimetre},
    {"微米", micrometre},
    {"メートル", metre},
    {"米", metre},
    {"公尺", metre},
    {"インチ", inch},
    {"英寸", inch},
    {"英吋", inch},
    {"ミリ/秒", millimetrePerSecond},
    {"毫米/秒", millimetrePerSecond},
    {"公厘/秒", millimetrePerSecond},
    {"mm/秒", millimetrePerSecond},
    {"m/秒", metrePerSecond},
    {"メートル/秒", metrePerSecond},
    {"米/秒", metrePerSecond},
    {"公尺/秒", metrePerSecond},
    {"厘米/秒", centimetrePerSecond},
    {"ニュートン", newton},
    {"牛", newton},
    {"牛顿", newton},
    {"牛頓", newton},
    {"キロニュートン", kilonewton},
    {"千牛", kilonewton},
    {"千牛顿", kilonewton},
    {"千牛頓", kilonewton},
    {"キログラム", kilogramForce},
    {"公斤", kilogramForce},
    {"公斤力", kilogramForce},
    {"千克力", kilogramForce},
    {"磅", poundForce},
    {"磅力", poundForce},
    {"度", celsius},
    {"摄氏度", celsius},
    {"攝氏度", celsius},
    {"华氏度", fahrenheit},
    {"華氏度", fahrenheit},
});

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
