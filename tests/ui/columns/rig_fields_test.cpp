// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/columns/rig_fields.h"

#include <gtest/gtest.h>

#include <cstring>

namespace dampwright {
namespace {

const RigField& field(const char* label) {
  for (const RigField& one : rigFields()) {
    if (std::strcmp(one.label, label) == 0) return one;
  }
  ADD_FAILURE() << label;
  return rigFields().front();
}

TEST(RigFields, EachTypedValueComesBackAsItWasTyped) {
  for (const RigField& one : rigFields()) {
    const bool date = std::strcmp(one.unit, "YYYY-MM-DD") == 0;
    const QString text = date ? QStringLiteral("2031-01-10") : QStringLiteral("0.35");
    const auto draft = withTyped(one, {}, {}, text);
    ASSERT_TRUE(draft) << one.label;
    EXPECT_EQ(fieldText(one, *draft), text) << one.label;
  }
}

TEST(RigFields, UnitsAreTheOnesShown) {
  EXPECT_EQ(withTyped(field("Force delay"), {}, {}, "0.5")->rig.forceDelay, 0.0005);
  EXPECT_EQ(
      withTyped(field("Displacement limit of error"), {}, {}, "0.02")->rig.displacementAccuracy,
      0.02e-3);
  EXPECT_EQ(withTyped(field("Load cell capacity"), {}, {}, "5000")->rig.loadCell.capacity, 5000);
}

TEST(RigFields, WhatCannotBeIsRefused) {
  EXPECT_FALSE(withTyped(field("Force delay"), {}, {}, "soon"));
  EXPECT_FALSE(withTyped(field("Moving mass"), {}, {}, "-1"));
  EXPECT_FALSE(withTyped(field("Force scale"), {}, {}, "0"));
  EXPECT_FALSE(withTyped(field("Load cell calibrated"), {}, {}, "10.1.2031"));
  EXPECT_FALSE(withTyped(field("Load cell calibrated"), {}, {}, "2031-02-30"));
  EXPECT_TRUE(withTyped(field("Force delay"), {}, {}, "-0.2"));
}

TEST(RigFields, AnEmptyFieldIsNotKnown) {
  const auto filled = withTyped(field("Load cell zero drift"), {}, {}, "3");
  const auto emptied = withTyped(field("Load cell zero drift"), *filled, {}, " ");
  EXPECT_FALSE(emptied->rig.loadCell.zeroDrift);
  EXPECT_EQ(withTyped(field("Force scale"), {}, {}, "")->rig.force->scale, 1);
}

}  // namespace
}  // namespace dampwright
