// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/intake/decode_text.h"

#include <gtest/gtest.h>

#include <string>

namespace dampwright {
namespace {

using std::string_view_literals::operator""sv;

std::string codeOf(std::string_view bytes) {
  const auto decoded = decodeText(bytes, std::nullopt);
  return decoded ? "none" : decoded.error().code;
}

std::string utf16(std::string_view ascii, bool little) {
  std::string bytes;
  for (const char letter : ascii) {
    if (!little) bytes += '\0';
    bytes += letter;
    if (little) bytes += '\0';
  }
  return bytes;
}

TEST(DecodeText, Utf8StaysWhereItIsAndLosesItsMark) {
  const std::string bytes = "\xEF\xBB\xBFTime;Weg °";
  const auto decoded = decodeText(bytes, std::nullopt);
  ASSERT_TRUE(decoded);
  EXPECT_EQ(decoded.value().encoding, "utf-8");
  EXPECT_EQ(decoded.value().text(), "Time;Weg °");
  EXPECT_EQ(decoded.value().text().data(), bytes.data() + 3);  // not copied
}

TEST(DecodeText, Utf16IsKnownByItsMarkOrByItsZeros) {
  for (const bool little : {true, false}) {
    const std::string mark(little ? "\xFF\xFE" : "\xFE\xFF");
    const std::string body = utf16("Time,Load\n0,1\n", little);
    for (const std::string& bytes : {mark + body, body}) {
      const auto decoded = decodeText(bytes, std::nullopt);
      ASSERT_TRUE(decoded);
      EXPECT_EQ(decoded.value().encoding, little ? "utf-16le" : "utf-16be");
      EXPECT_EQ(decoded.value().text(), "Time,Load\n0,1\n");
    }
  }
}

TEST(DecodeText, Utf16LettersOutsideTheBasicPlaneAndHalvesOfThem) {
  const auto pair = decodeText("\xFF\xFE\x3D\xD8\x00\xDE"sv, std::nullopt);  // U+1F600
  ASSERT_TRUE(pair);
  EXPECT_EQ(pair.value().text(), "\xF0\x9F\x98\x80");
  const auto half = decodeText("\xFF\xFE\x3D\xD8\x41\x00\x42"sv, std::nullopt);
  ASSERT_TRUE(half);
  EXPECT_EQ(half.value().text(),
            "\xEF\xBF\xBD"
            "A");  // the odd last byte is still being written
}

TEST(DecodeText, WhatIsNotUtf8IsWindows1252) {
  const auto decoded = decodeText(
      "D\xE4mpfer \x80 \xB0"
      "C \x8D",
      std::nullopt);
  ASSERT_TRUE(decoded);
  EXPECT_EQ(decoded.value().encoding, "windows-1252");
  EXPECT_EQ(decoded.value().text(), "Dämpfer € °C \xEF\xBF\xBD");
}

TEST(DecodeText, OverlongFormsAndSurrogatesAreNotUtf8) {
  for (const char* bytes : {"\xC0\xAF,1",
                            "\xE0\x80\xAF,1",
                            "\xED\xA0\x80,1",
                            "\xF4\x90\x80\x80,1",
                            "\xF8\x88\x80\x80\x80,1",
                            "\x80,1",
                            "\xE2\x82,1"}) {
    const auto decoded = decodeText(bytes, std::nullopt);
    ASSERT_TRUE(decoded);
    EXPECT_EQ(decoded.value().encoding, "windows-1252") << bytes;
  }
}

TEST(DecodeText, ALetterCutShortByTheEndIsAllowed) {
  const auto decoded = decodeText("1,2\n3,4 \xE2\x82", std::nullopt);
  ASSERT_TRUE(decoded);
  EXPECT_EQ(decoded.value().encoding, "utf-8");
  EXPECT_EQ(decoded.value().text(), "1,2\n3,4 ");
}

TEST(DecodeText, BytesThatAreNoLettersOfAnAskedEncodingAreReplaced) {
  const auto decoded = decodeText("D\xE4mpfer \xC3\xA4", "utf-8");
  ASSERT_TRUE(decoded);
  EXPECT_EQ(decoded.value().text(), "D\xEF\xBF\xBDmpfer ä");
}

TEST(DecodeText, ZerosAtTheEndAreCutOffAndCounted) {
  const auto decoded = decodeText(std::string(5000, '1') + std::string(300, '\0'), std::nullopt);
  ASSERT_TRUE(decoded);
  EXPECT_EQ(decoded.value().text().size(), 5000u);
  EXPECT_EQ(decoded.value().zeroBytesAtEnd, 300);
}

TEST(DecodeText, AnAskedEncodingBeatsAllEvidence) {
  const auto decoded = decodeText("D\xC3\xA4", "windows-1252");
  ASSERT_TRUE(decoded);
  EXPECT_EQ(decoded.value().text(), "DÃ¤");
}

// What is no text.

TEST(DecodeText, AnEmptyFileIsSaidToBeEmpty) { EXPECT_EQ(codeOf(""), "file-empty"); }

TEST(DecodeText, PicturesDocumentsAndArchivesAreCalledByName) {
  EXPECT_EQ(codeOf("\x89PNG\r\n\x1a\n\0\0"sv), "file-is-picture");
  EXPECT_EQ(codeOf("\xFF\xD8\xFF\xE0"sv), "file-is-picture");
  EXPECT_EQ(codeOf("GIF89a,1"sv), "file-is-picture");
  EXPECT_EQ(codeOf("BM\x36\x10\x0E\0\0\0\0\0\x36\0"sv), "file-is-picture");
  EXPECT_EQ(codeOf("%PDF-1.7\n"sv), "file-is-document");
  EXPECT_EQ(codeOf("PK\x03\x04\x14"sv), "file-is-archive");
  EXPECT_EQ(codeOf("\xD0\xCF\x11\xE0\xA1\xB1\x1A\xE1"sv), "file-is-archive");
  EXPECT_EQ(codeOf("\x1F\x8B\x08"sv), "file-is-archive");
}

TEST(DecodeText, TextThatOnlyBeginsLikeThemIsText) {
  EXPECT_EQ(codeOf("BM;1;2;3;4;5;6"), "none");
  EXPECT_EQ(codeOf("%Pd 1"), "none");
}

TEST(DecodeText, ZerosThatPadFieldsAreBlanksAndCounted) {
  const auto decoded = decodeText("1,2\0\0,3\n4,5,6\n\0"sv, std::nullopt);
  ASSERT_TRUE(decoded);
  EXPECT_EQ(decoded.value().text(), "1,2  ,3\n4,5,6\n");
  EXPECT_EQ(decoded.value().zeroBytesInside, 2);
  EXPECT_EQ(decoded.value().zeroBytesAtEnd, 1);
}

TEST(DecodeText, ManyZerosOrOtherControlCharactersAreBinary) {
  EXPECT_EQ(codeOf("1,2\0\x01,3\n4,5,6\n"sv), "file-is-binary");
  EXPECT_EQ(codeOf("1\0\0\0,2\0\0"sv), "file-is-binary");
  EXPECT_EQ(codeOf(std::string(100, '\0')), "file-is-binary");
  EXPECT_EQ(codeOf("\0"sv), "file-is-binary");
}

TEST(DecodeText, AnUnknownEncodingIsRefusedWithTheChoices) {
  const auto decoded = decodeText("1,2", "klingon");
  ASSERT_FALSE(decoded);
  EXPECT_EQ(decoded.error().code, "option-not-understood");
}

}  // namespace
}  // namespace dampwright
