// SPDX-License-Identifier: GPL-3.0-or-later
// One recording as invented loggers of many countries would write it.
#include <gtest/gtest.h>

#include "tests/core/intake/made_encoding.h"
#include "tests/core/intake/made_text.h"

namespace dampwright {
namespace {

struct Logger {
  const char* country;
  const char* head;
  const char* between;
  char decimal;
  const char* encoding;
  const char* found;  ///< encoding as it is called by us
};

std::ostream& operator<<(std::ostream& out, const Logger& logger) { return out << logger.country; }

class Languages : public testing::TestWithParam<Logger> {};

TEST_P(Languages, TheRecordingIsTheSameEverywhere) {
  const Logger& logger = GetParam();
  const std::string text = madeRun({.head = logger.head,
                                    .between = logger.between,
                                    .lineEnd = "\r\n",
                                    .decimal = logger.decimal});
  const auto reading = readMade(encoded(text, logger.encoding));
  ASSERT_TRUE(reading) << reading.error().code;
  const Source& source = reading.value().source;
  EXPECT_EQ(source.encoding, logger.found);
  EXPECT_EQ(source.rows, 400);
  ASSERT_EQ(source.columns.size(), 3u);
  constexpr Role roles[] = {Role::Time, Role::Displacement, Role::Force};
  for (std::size_t i = 0; i < 3; ++i) {
    EXPECT_EQ(source.columns[i].role, roles[i]) << source.columns[i].name;
    EXPECT_TRUE(source.columns[i].why == "role-by-name") << source.columns[i].name;
    EXPECT_FALSE(source.columns[i].assumed) << source.columns[i].unit;
  }
  ASSERT_TRUE(reading.value().trace.has_value());
  const Trace& trace = *reading.value().trace;
  for (std::size_t i = 0; i < 400; ++i) {
    const double phase = 4 * pi * static_cast<double>(i) / madeRate;
    ASSERT_NEAR(trace.time[i], static_cast<double>(i) / madeRate, 5.1e-5) << i;  // half a digit
    ASSERT_NEAR(
        std::abs(trace.displacement[i]), std::abs(madeStroke / 2 * std::sin(phase)), 5.1e-7);
    ASSERT_NEAR(
        std::abs(trace.force[i]), std::abs(madeGas + madePeakForce * std::cos(phase)), 5.1e-3);
  }
}

INSTANTIATE_TEST_SUITE_P(
    Loggers,
    Languages,
    testing::Values(
        Logger{"English",
               "Elapsed Time (sec),Shaft Position (mm),Load Cell (N)\n",
               ",",
               '.',
               "UTF-8",
               "utf-8"},
        Logger{"German",
               "Prüfstand;3\n\nMeßzeit [s];Dämpferweg [mm];Dämpferkraft [N]\n",
               ";",
               ',',
               "WINDOWS-1252",
               "windows-1252"},
        Logger{"GermanWords",
               "Zeit in Sekunden;Hub in Millimeter;Kraft in Newton\n",
               ";",
               ',',
               "UTF-8",
               "utf-8"},
        Logger{"French",
               "N° d'essai;12\nFréquence d'échantillonnage;200 Hz\nTemps (s);Déplacement du vérin "
               "(mm);Force de compression (N)\n",
               ";",
               ',',
               "WINDOWS-1252",
               "windows-1252"},
        Logger{"FrenchTwo",
               "Temps écoulé [s]\tCourse amortisseur [mm]\tEffort [N]\n",
               "\t",
               ',',
               "UTF-16LE",
               "utf-16le"},
        Logger{"Italian",
               "Unità;SI\nTempo (s);Spostamento stelo (mm);Forza ammortizzatore (N)\n",
               ";",
               ',',
               "WINDOWS-1252",
               "windows-1252"},
        Logger{"ItalianTwo", "Tempo;Corsa;Carico\nsecondi;mm;N\n", ";", ',', "UTF-8", "utf-8"},
        Logger{"Spanish",
               "Tiempo (s);Posición del vástago (mm);Fuerza de compresión (N)\n",
               ";",
               ',',
               "WINDOWS-1252",
               "windows-1252"},
        Logger{"SpanishTwo",
               "Tiempo [segundos];Carrera [mm];Célula de carga [N]\n",
               ";",
               ',',
               "UTF-8",
               "utf-8"},
        Logger{"Portuguese",
               "Duração (s);Posição (mm);Força no amortecedor (N)\n",
               ";",
               ',',
               "WINDOWS-1252",
               "windows-1252"},
        Logger{"PortugueseTwo",
               "Tempo (s);Curso do êmbolo (mm);Força (N)\n",
               ";",
               ',',
               "UTF-16BE",
               "utf-16be"},
        Logger{
            "Dutch", "Tijd (s);Verplaatsing (mm);Kracht (N)\n", ";", ',', "WINDOWS-1252", "utf-8"},
        Logger{
            "DutchTwo", "Tijd [sec];Zuigerslag [mm];Belasting [N]\n", ";", ',', "UTF-8", "utf-8"},
        Logger{
            "Japanese", "試験番号：12\n時間(s),変位(mm),荷重(N)\n", ",", '.', "CP932", "shift-jis"},
        Logger{"JapaneseWide",
               "時間（秒）,ストローク（㎜）,減衰力（Ｎ）\n",
               ",",
               '.',
               "CP932",
               "shift-jis"},
        Logger{"JapaneseHalf",
               "経過時間[秒]\tｽﾄﾛｰｸ[mm]\tﾛｰﾄﾞｾﾙ荷重[ニュートン]\n",
               "\t",
               '.',
               "CP932",
               "shift-jis"},
        Logger{"JapaneseUtf16",
               "時刻[s],ダンパーの変位[ミリメートル],力[N]\n",
               ",",
               '.',
               "UTF-16LE",
               "utf-16le"},
        Logger{"Chinese", "时间(s),位移(mm),阻尼力(N)\n", ",", '.', "GB18030", "gb18030"},
        Logger{
            "ChineseUnits", "时间（秒）,行程（毫米）,载荷（牛）\n", ",", '.', "GB18030", "gb18030"},
        Logger{"ChineseUnitRow",
               "试验台：三号\n时间\t位移\t力\n秒\t毫米\t牛顿\n",
               "\t",
               '.',
               "GB18030",
               "gb18030"},
        Logger{"Traditional", "時間（秒）,位移（公厘）,載荷（牛頓）\n", ",", '.', "UTF-8", "utf-8"},
        Logger{"TraditionalGb", "時間(s);衝程(mm);負荷(N)\n", ";", '.', "GB18030", "gb18030"}),
    [](const testing::TestParamInfo<Logger>& logger) { return std::string(logger.param.country); });

TEST(LanguagesRate, APreambleInAnyLanguageGivesTheSampleRate) {
  for (const char* line : {"Sampling rate: 200 Hz",
                           "Abtastrate;200",
                           "Fréquence d'échantillonnage : 200 Hz",
                           "Frequenza di campionamento;0,2 kHz",
                           "Frecuencia de muestreo (Hz);200",
                           "Taxa de amostragem: 200 Hz",
                           "Bemonsteringsfrequentie = 200 Hz",
                           "サンプリング周波数：200Hz",
                           "サンプリング周期(ms)：5",
                           "采样频率:200 Hz",
                           "採樣間隔：5 毫秒"}) {
    const std::string text = std::string(line) + "\nTravel (mm);Load (N)\n";
    std::string rows;
    for (int i = 0; i < 400; ++i) {
      const double phase = 4 * pi * i / madeRate;
      rows +=
          inForm(25 * std::sin(phase), 3, ',') + ";" + inForm(800 * std::cos(phase), 2, ',') + "\n";
    }
    const auto reading = readMade(text + rows);
    ASSERT_TRUE(reading) << line;
    ASSERT_TRUE(reading.value().trace.has_value()) << line;
    EXPECT_NEAR(reading.value().trace->time[200], 1, 1e-12) << line;
  }
}

}  // namespace
}  // namespace dampwright
