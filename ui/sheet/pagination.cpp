// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/pagination.h"

namespace dampwright {

namespace {

class Paginator {
 public:
  explicit Paginator(const QRectF& body) : body_(body), y_(body.top()) {}

  void add(const SheetSection& section) {
    const double height = heightOf(section);
    const bool fitsHere = y_ + height <= body_.bottom();
    const bool fitsAPage = height <= body_.height();
    // A long section starts here only if a fair piece of it does.
    const bool muchLeft = body_.bottom() - y_ > body_.height() / 3;
    if (!fitsHere && (fitsAPage || !muchLeft)) nextPage();
    for (std::size_t from = 0; from < section.size();) {
      std::size_t to = from;
      while (to + 1 < section.size() && section[to].keepWithNext) ++to;
      addTogether(section, from, to + 1);
      from = to + 1;
    }
  }

  std::vector<SheetPage> pages() && { return std::move(pages_); }

 private:
  void nextPage() {
    if (pages_.back().empty()) return;
    pages_.emplace_back();
    y_ = body_.top();
  }

  void addTogether(const SheetSection& section, std::size_t from, std::size_t to) {
    double height = 0;
    for (std::size_t i = from; i < to; ++i) height += section[i].height;
    if (y_ + height > body_.bottom()) {
      nextPage();
      if (section[from].repeat) place(*section[from].repeat);
    }
    for (std::size_t i = from; i < to; ++i) {
      if (y_ + section[i].height > body_.bottom()) nextPage();
      place(section[i]);
    }
  }

  void place(const SheetBlock& block) {
    const bool isSpace = !block.paint;
    if ((isSpace || block.separates) && pages_.back().empty()) return;
    if (!isSpace) {
      pages_.back().push_back({{body_.left(), y_, body_.width(), block.height}, block});
    }
    y_ += block.height;
  }

  QRectF body_;
  double y_;
  std::vector<SheetPage> pages_ = std::vector<SheetPage>(1);
};

}  // namespace

std::vector<SheetPage> paginate(const std::vector<SheetSection>& sections, const QRectF& body) {
  Paginator paginator(body);
  for (const SheetSection& section : sections) paginator.add(section);
  return std::move(paginator).pages();
}

void paintBlocks(QPainter& painter, const SheetPage& page) {
  for (const PlacedBlock& placed : page) {
    painter.save();
    placed.block.paint(painter, placed.box);
    painter.restore();
  }
}

}  // namespace dampwright
