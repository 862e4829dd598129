// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/sheet_document.h"

#include <QCoreApplication>
#include <algorithm>

#include "ui/look/palette.h"
#include "ui/sheet/closing_section.h"
#include "ui/sheet/damper_section.h"
#include "ui/sheet/opening_section.h"
#include "ui/sheet/page_head.h"

namespace dampwright {

namespace {

struct Sheet {
  Q_DECLARE_TR_FUNCTIONS(Sheet)
};

// From the roomiest to the tightest.
constexpr Arrangement arrangements[] = {{false, 78},
                                        {false, 70},
                                        {false, 63},
                                        {false, 57},
                                        {false, 52},
                                        {false, 47},
                                        {true, 66},
                                        {true, 60},
                                        {true, 54},
                                        {true, 49},
                                        {true, 45}};

// Pages that a sheet takes as a rule: one for one test, two for up to four, then two tests a page.
std::size_t usualPages(const SheetContent& content) {
  std::size_t tests = 0;
  for (const SheetItem& item : content.items) tests += std::max<std::size_t>(1, item.phases.size());
  return tests <= 1 ? 1 : std::max<std::size_t>(2, (tests + 1) / 2);
}

// A check list beside the plots can't be parted: it must stay well under a page.
bool compactFits(const SheetContent& content) {
  constexpr std::size_t mostChecks = 16;
  for (const SheetItem& item : content.items) {
    for (const SheetPhase& phase : item.phases) {
      if (phase.verdict && phase.verdict->checks.size() > mostChecks) return false;
    }
  }
  return true;
}

std::vector<SheetPage> laidOut(const SheetContent& content,
                               const QRectF& body,
                               const Arrangement& arrangement) {
  const CommonConditions common = commonConditions(content);
  std::vector<SheetSection> sections = {openingSection(content, common, body.width())};
  for (const SheetItem& item : content.items) {
    for (SheetSection& section : damperSections(item, arrangement, common, body.width())) {
      sections.push_back(std::move(section));
    }
  }
  sections.push_back(closingSection(content, body.width()));
  return paginate(sections, body);
}

}  // namespace

SheetDocument::SheetDocument(SheetContent content, PaperSize paper)
    : content_(std::make_shared<const SheetContent>(std::move(content))), paper_(paper) {
  const QRectF body = paperFormat(paper).body;
  const std::size_t usual = usualPages(*content_);
  const bool compact = compactFits(*content_);
  for (const Arrangement& arrangement : arrangements) {
    if (arrangement.compact && !compact) continue;
    std::vector<SheetPage> pages = laidOut(*content_, body, arrangement);
    if (pages_.empty() || pages.size() < pages_.size()) pages_ = std::move(pages);
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
