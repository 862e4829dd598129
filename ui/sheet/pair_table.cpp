// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/pair_table.h"

#include <QCoreApplication>
#include <QPen>
#include <algorithm>
#include <array>
#include <memory>
#include <set>

#include "ui/look/palette.h"
#include "ui/look/stamp.h"
#include "ui/text/check_text.h"
#include "ui/text/names.h"

namespace dampwright {

namespace {

struct Sheet {
  Q_DECLARE_TR_FUNCTIONS(Sheet)
};

constexpr double points = smallestPoints;
constexpr double cellGap = 1.6, sideGap = 3.2, markWidth = 3.4;  // mm
constexpr double widestTarget = 21.5;  // mm: one with two tolerances takes two lines

// What is asked, then one such group for each test.
enum Column { Asked, Target, LimitColumn, Left, Columns = Left + 8 };
enum Part { Measured, K, Margin, Word, Parts };

int columnOf(int side, int part) { return Left + side * Parts + part; }
int partOf(int column) { return (column - Left) % Parts; }

using Texts = std::array<QString, Columns>;
using Sides = std::array<SheetTest, 2>;

struct Row {
  Texts texts;
  std::array<VerdictWord, 2> words{};
};

struct Frame {
  std::array<double, Columns> left{}, width{};
};

struct Table {
  std::vector<Row> rows;
  Texts head;
  QString sameK;  // empty: k stands in columns
  bool inWords = true;
  Frame frame;
};

QString kOf(const CheckText& text) { return text.coverage.section(QChar(0x00A0), -1); }

Row rowOf(const Sides& sides, std::size_t check) {
  Row row;
  for (int side = 0; side < 2; ++side) {
    const SheetPhase& phase = *sides[static_cast<std::size_t>(side)].phase;
    const CheckVerdict& judged = phase.verdict->checks[check];
    const CheckText text = checkText(judged);
    row.texts[Asked] = text.title;
    row.texts[Target] = text.target;
    row.texts[LimitColumn] = text.limits;
    row.texts[columnOf(side, Measured)] = text.measured;
    row.texts[columnOf(side, K)] = kOf(text);
    row.texts[columnOf(side, Margin)] = text.margin;
    row.texts[columnOf(side, Word)] = shownVerdictName(judged, finalityOf(phase));
    row.words[static_cast<std::size_t>(side)] = shownVerdict(judged, finalityOf(phase));
  }
  return row;
}

Texts headTexts() {
  Texts head = {Sheet::tr("Check"), Sheet::tr("Target"), Sheet::tr("Limits")};
  for (int side = 0; side < 2; ++side) {
    head[columnOf(side, Measured)] = Sheet::tr("Measured ± U");
    head[columnOf(side, K)] = Sheet::tr("k");
    head[columnOf(side, Margin)] = Sheet::tr("Margin");
    head[columnOf(side, Word)] = Sheet::tr("Verdict");
  }
  return head;
}

// The one k of all checks; empty where there are several, or none.
QString onlyK(const std::vector<Row>& rows) {
  std::set<QString> all;
  for (const Row& row : rows) {
    for (int side = 0; side < 2; ++side) all.insert(row.texts[columnOf(side, K)]);
  }
  all.erase(QString());
  return all.size() == 1 ? *all.begin() : QString();
}

bool isLeftOut(const Table& table, int column) {
  if (column < Left) return false;
  return partOf(column) == K && !table.sameK.isEmpty();
}

double natural(const Table& table, int column) {
  if (column >= Left && partOf(column) == Word && !table.inWords) return markWidth;
  double widest = 0;
  for (const Row& row : table.rows)
    widest = std::max(widest, textWidth(row.texts[column], paperText(points)));
  if (widest <= 0 || isLeftOut(table, column)) return 0;
  if (column == Target) widest = std::min(widest, widestTarget);
  if (column >= Left && partOf(column) == Word) {
    // "Too close to call" takes two lines rather than all other columns' room.
    widest = std::min(widest, textWidth(Sheet::tr("Not tested"), paperText(points)) + 0.3);
    widest += markWidth;
  }
  return std::max(widest, textWidth(table.head[column], paperQuiet(points))) + 0.3;
}

// False where the first column would be narrower than its titles.
bool takeWidths(Table& table, double width) {
  double used = 0;
  for (int column = Target; column < Columns; ++column) {
    table.frame.width[column] = natural(table, column);
    const double gap = column == columnOf(0, 0) || column == columnOf(1, 0) ? sideGap : cellGap;
    if (table.frame.width[column] > 0) used += table.frame.width[column] + gap;
  }
  const bool fits = width - used >= natural(table, Asked);
  table.frame.width[Asked] = width - used;
  double x = 0;
  for (int column = 0; column < Columns; ++column) {
    const bool next = column == columnOf(0, 0) || column == columnOf(1, 0);
    if (column > 0 && table.frame.width[column] > 0) x += next ? sideGap : cellGap;
    table.frame.left[column] = x;
    x += table.frame.width[column];
  }
  return fits;
}

Table tableOf(const Sides& sides, double width) {
  Table table;
  table.head = headTexts();
  for (std::size_t i = 0; i < sides[0].phase->verdict->checks.size(); ++i)
    table.rows.push_back(rowOf(sides, i));
  table.sameK = onlyK(table.rows);
  table.inWords = true;
  if (takeWidths(table, width)) return table;
  table.inWords = false;
  for (int side = 0; side < 2; ++side) table.head[columnOf(side, Word)].clear();
  takeWidths(table, width);
  return table;
}

using Cells = std::array<QStringList, Columns>;

enum class Line { Head, Check };

// A mark stands left of a check's word, and nothing left of the head's.
double markRoom(Line line, int column) {
  return line == Line::Check && column >= Left && partOf(column) == Word ? markWidth : 0;
}

Cells cellsOf(const Table& table, Line line, const Texts& texts, const TextStyle& style) {
  Cells cells;
  for (int column = 0; column < Columns; ++column) {
    if (table.frame.width[column] <= 0 || texts[column].isEmpty()) continue;
    const bool word = column >= Left && partOf(column) == Word;
    if (word && !table.inWords) continue;
    const double room = table.frame.width[column] - markRoom(line, column);
    cells[column] = wrapped(texts[column], room, style);
  }
  return cells;
}

double heightOf(const Cells& cells) {
  qsizetype lines = 1;
  for (const QStringList& cell : cells) lines = std::max(lines, cell.size());
  return lineHeight(paperText(points)) * static_cast<double>(lines) + 1.1;
}

void paintCells(QPainter& painter,
                const QRectF& box,
                const Frame& frame,
                Line line,
                const Cells& cells,
                const TextStyle& style) {
  for (int column = 0; column < Columns; ++column) {
    const bool words = column == Asked || (column >= Left && partOf(column) == Word);
    const double mark = markRoom(line, column);
    const double step = lineHeight(style);
    double y = box.center().y() - step * static_cast<double>(cells[column].size()) / 2;
    for (const QString& text : cells[column]) {
      drawText(painter,
               {box.left() + frame.left[column] + mark, y, frame.width[column] - mark, step},
               text,
               style,
               (words ? Qt::AlignLeft : Qt::AlignRight) | Qt::AlignVCenter);
      y += step;
    }
  }
}

void rule(QPainter& painter, const QRectF& box, const QColor& colour) {
  painter.setPen(QPen(colour, hairlineMm));
  painter.drawLine(box.bottomLeft(), box.bottomRight());
}

SheetBlock headBlock(const Table& table, const Sides& sides) {
  const TextStyle style = paperQuiet(points), name = paperBold(points);
  const Cells cells = cellsOf(table, Line::Head, table.head, style);
  const double step = lineHeight(name);
  const auto paint =
      [=, names = std::array{sideName(sides[0], sides[1]), sideName(sides[1], sides[0])}](
          QPainter& painter, const QRectF& box) {
        const QRectF first(box.left(), box.top(), box.width(), step);
        if (!table.sameK.isEmpty())
          drawText(painter, first, Sheet::tr("k = %1 in every check").arg(table.sameK), style);
        for (int side = 0; side < 2; ++side) {
          const double from = table.frame.left[columnOf(side, Measured)];
          const double to =
              table.frame.left[columnOf(side, Word)] + table.frame.width[columnOf(side, Word)];
          const QString text = elided(names[static_cast<std::size_t>(side)], to - from, name);
          drawText(painter, {box.left() + from, box.top(), to - from, step}, text, name);
        }
        paintCells(painter, box.adjusted(0, step, 0, 0), table.frame, Line::Head, cells, style);
        rule(painter, box, printPalette().ink);
      };
  return {step + heightOf(cells), paint, true, {}, false};
}

SheetBlock rowBlock(const Table& table, const Row& row) {
  const TextStyle style = paperText(points);
  const Cells cells = cellsOf(table, Line::Check, row.texts, style);
  const auto paint = [frame = table.frame, words = row.words, cells, style](QPainter& painter,
                                                                            const QRectF& box) {
    paintCells(painter, box, frame, Line::Check, cells, style);
    for (int side = 0; side < 2; ++side) {
      const double x = box.left() + frame.left[columnOf(side, Word)];
      paintMark(painter,
                {x, box.center().y() - 1.4, 2.8, 2.8},
                words[static_cast<std::size_t>(side)],
                printPalette().ink);
    }
    rule(painter, box, printPalette().hairline);
  };
  return {heightOf(cells), paint, false, {}, false};
}

SheetBlock legend() {
  const auto paint = [](QPainter& painter, const QRectF& box) {
    double x = box.left();
    for (const VerdictWord word : {VerdictWord::Pass,
                                   VerdictWord::Fail,
                                   VerdictWord::TooCloseToCall,
                                   VerdictWord::NotTested}) {
      paintMark(painter, {x, box.center().y() - 1.2, 2.4, 2.4}, word, printPalette().quiet);
      const TextStyle style = paperQuiet(points);
      drawText(painter, {x + 3.4, box.top(), 40, box.height()}, verdictName(word), style);
      x += 3.4 + textWidth(verdictName(word), style) + 5;
    }
  };
  return {lineHeight(paperQuiet(points)) + 0.6, paint, false, {}, false};
}

}  // namespace

bool sameChecks(const Verdict& left, const Verdict& right) {
  return std::ranges::equal(
      left.checks, right.checks, [](const CheckVerdict& a, const CheckVerdict& b) {
        return a.check == b.check && a.min == b.min && a.max == b.max;
      });
}

QString sideName(const SheetTest& test, const SheetTest& other) {
  return test.item == other.item ? phaseTitle(test.phase->phase, test.item->damper)
                                 : cornerName(test.item->corner);
}

SheetSection pairTable(const SheetTest& left, const SheetTest& right, double width) {
  const Sides sides = {left, right};
  const Table table = tableOf(sides, width);
  const auto head = std::make_shared<const SheetBlock>(headBlock(table, sides));
  SheetSection section = {*head};
  for (const Row& row : table.rows) {
    section.push_back(rowBlock(table, row));
    section.back().repeat = head;
  }
  if (!table.inWords) section.push_back(legend());
  section.push_back(space(1));
  return section;
}

}  // namespace dampwright
