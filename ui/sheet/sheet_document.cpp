// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/sheet_document.h"

#include <QCoreApplication>
#include <algorithm>
#include <optional>
#include <utility>

#include "ui/look/palette.h"
#include "ui/sheet/closing_section.h"
#include "ui/sheet/damper_section.h"
#include "ui/sheet/opening_section.h"
#include "ui/sheet/page_head.h"
#include "ui/sheet/pair_section.h"

namespace dampwright {

namespace {

struct Sheet {
  Q_DECLARE_TR_FUNCTIONS(Sheet)
};

// How the tests are set on the page.
enum class Setting { ChecksBelow, ChecksBeside, InPairs };

struct Arrangement {
  Setting setting;
  double plotHeight;  // mm
};

// From the roomiest to the tightest.
constexpr Arrangement arrangements[] = {
    {Setting::ChecksBelow, 78},  {Setting::ChecksBelow, 70},  {Setting::ChecksBelow, 63},
    {Setting::ChecksBelow, 57},  {Setting::ChecksBelow, 52},  {Setting::ChecksBelow, 47},
    {Setting::ChecksBeside, 66}, {Setting::ChecksBeside, 60}, {Setting::ChecksBeside, 54},
    {Setting::ChecksBeside, 49}, {Setting::ChecksBeside, 45}, {Setting::InPairs, 60},
    {Setting::InPairs, 56},      {Setting::InPairs, 52},      {Setting::InPairs, 49},
    {Setting::InPairs, 46},      {Setting::InPairs, 43},      {Setting::InPairs, 40},
    {Setting::InPairs, 37},      {Setting::InPairs, 35}};

// Pages that a sheet takes as a rule: one for one test, two for up to four, then two tests a page.
std::size_t usualPages(std::size_t tests) {
  return tests <= 1 ? 1 : std::max<std::size_t>(2, (tests + 1) / 2);
}

// A check list beside the plots can't be parted: it must stay well under a page.
bool besideFits(const std::vector<SheetTest>& tests) {
  constexpr std::size_t mostChecks = 16;
  return std::ranges::all_of(tests, [](const SheetTest& test) {
    return test.phase == nullptr || !test.phase->verdict ||
           test.phase->verdict->checks.size() <= mostChecks;
  });
}

// What stands on the whole width of the page: one test, or a pair.
struct Part {
  SheetTest first;
  std::optional<SheetTest> second;
  double plotHeight;  // mm
};

std::vector<Part> partsOf(const std::vector<SheetTest>& tests, const Arrangement& arrangement) {
  std::vector<Part> parts;
  for (std::size_t i = 0; i < tests.size(); ++i) {
    parts.push_back({tests[i], std::nullopt, arrangement.plotHeight});
    if (arrangement.setting == Setting::InPairs && i + 1 < tests.size() &&
        belongTogether(tests[i], tests[i + 1])) {
      parts.back().second = tests[++i];
    }
  }
  return parts;
}

struct Layout {
  const SheetContent& content;
  QRectF body;
  CommonConditions common;

  std::vector<SheetPage> pages(const std::vector<Part>& parts, Checks checks) const {
    const double width = body.width();
    std::vector<SheetSection> sections = {openingSection(content, common, width)};
    for (const auto& [first, second, height] : parts) {
      sections.push_back(second ? pairSection(first, *second, height, common, width)
                                : testSection(first, checks, height, common, width));
    }
    sections.push_back(closingSection(content, width));
    return paginate(sections, body);
  }
};

// The first page of a car has more room than the last: its plots may be higher.
std::vector<SheetPage> grown(const Layout& layout,
                             std::vector<Part> parts,
                             Checks checks,
                             std::vector<SheetPage> pages) {
  constexpr double step = 2, highest = 60;  // mm
  for (Part& part : parts) {
    while (part.second && part.plotHeight + step <= highest) {
      part.plotHeight += step;
      std::vector<SheetPage> higher = layout.pages(parts, checks);
      if (higher.size() > pages.size()) {
        part.plotHeight -= step;
        break;
      }
      pages = std::move(higher);
    }
  }
  return pages;
}

}  // namespace

SheetDocument::SheetDocument(SheetContent content, PaperSize paper)
    : content_(std::make_shared<const SheetContent>(std::move(content))), paper_(paper) {
  const Layout layout{*content_, paperFormat(paper).body, commonConditions(*content_)};
  const std::vector<SheetTest> tests = testsOf(*content_);
  const std::size_t usual = usualPages(tests.size());
  const bool besideToo = besideFits(tests);
  for (const Arrangement& arrangement : arrangements) {
    const Checks checks =
        arrangement.setting == Setting::ChecksBelow || !besideToo ? Checks::Below : Checks::Beside;
    const std::vector<Part> parts = partsOf(tests, arrangement);
    std::vector<SheetPage> pages = layout.pages(parts, checks);
    if (!pages_.empty() && pages.size() >= pages_.size()) continue;
    pages_ = grown(layout, parts, checks, std::move(pages));
    if (pages_.size() <= usual) break;
  }
}

QString SheetDocument::title() const {
  return Sheet::tr("Damper test sheet, job %1").arg(QString::fromStdString(content_->job.number));
}

void SheetDocument::paintPage(QPainter& painter, int page) const {
  const PaperFormat format = paperFormat(paper_);
  painter.save();
  painter.setRenderHint(QPainter::Antialiasing);
  painter.fillRect(QRectF(QPointF(0, 0), format.size), printPalette().paper);
  paintPageHead(painter, format.head, *content_, page + 1, pageCount());
  paintBlocks(painter, pages_.at(static_cast<std::size_t>(page)));
  paintPageFoot(painter, format.foot, *content_, page + 1, pageCount());
  painter.restore();
}

}  // namespace dampwright
