// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/encodings.h"

#include <gtest/gtest.h>

#include "core/intake/decode_text.h"
#include "tests/core/intake/made_encoding.h"

namespace dampwright {
namespace {

std::string foundIn(std::string_view text, const char* encoding) {
  const auto decoded = decodeText(encoded(text, encoding), std::nullopt);
  if (!decoded) return decoded.error().code;
  EXPECT_EQ(decoded.value().text(), text);
  return decoded.value().encoding;
}

TEST(Encodings, JapaneseNamesAreKnownByTheirWords) {
  EXPECT_EQ(foundIn("時間(s),変位(mm),荷重(N)\n0,1,2\n", "CP932"), "shift-jis");
  EXPECT_EQ(foundIn("ｽﾄﾛｰｸ(mm),ｶ(N)\n1,2\n", "CP932"), "shift-jis");
  EXPECT_EQ(foundIn("試験機：第三号\n1,2\n", "CP932"), "shift-jis");
}

TEST(Encodings, ChineseNamesAreKnownByTheirWords) {
  EXPECT_EQ(foundIn("时间(s),位移(mm),力(N)\n0,1,2\n", "GB18030"), "gb18030");
  EXPECT_EQ(foundIn("時間(s),位移(mm),載荷(N)\n0,1,2\n", "GB18030"), "gb18030");
  EXPECT_EQ(foundIn("减振器试验台：三号\n1,2\n", "GB18030"), "gb18030");
}

TEST(Encodings, WesternNamesStayWestern) {
  for (const char* text : {"D\xC3\xA4mpferweg (mm);Kraft (N)\n",
                           "Déplacement (mm);Force (N);Température (°C)\n",
                           "Força (N);Posição (mm);Aceleração (m/s²)\n",
                           "Öl °C;µm;Prüfstand Nr. 3\n",
                           "Año;Compresión;señal\n",
                           "Prüfer: Jörg Müßig; Maßstab 1:1\n",
                           "20 °C\n"}) {
    EXPECT_EQ(foundIn(text, "WINDOWS-1252"), "windows-1252") << text;
  }
}

TEST(Encodings, ALetterCutShortByTheEndIsLeftOut) {
  const std::string bytes = encoded("変位", "CP932");
  EXPECT_EQ(fromClean(bytes.substr(0, 3), WideEncoding::ShiftJis), "変");
}

TEST(Encodings, BytesThatAreNoLettersAreNotClean) {
  EXPECT_FALSE(fromClean("\xFF\xFF,1", WideEncoding::Gb18030).has_value());
  EXPECT_EQ(fromAny("\xFF"
                    "1",
                    WideEncoding::ShiftJis),
            "\xEF\xBF\xBD"
            "1");
}

TEST(Encodings, Utf16WithoutMarkIsKnownAlsoWithNamesOfOtherAlphabets) {
  for (const char* encoding : {"UTF-16LE", "UTF-16BE"}) {
    std::string text = "時間(s),変位(mm),荷重(N)\n";
    for (int i = 0; i < 40; ++i) text += "0.005,-12.5,800\n";
    EXPECT_EQ(foundIn(text, encoding), encoding[6] == 'L' ? "utf-16le" : "utf-16be");
  }
}

}  // namespace
}  // namespace dampwright
