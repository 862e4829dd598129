// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/verdict/checks_model.h"

#include <QStringList>
#include <algorithm>
#include <utility>

#include "ui/text/check_text.h"

namespace dampwright {

namespace {

int pressing(VerdictWord word) {
  switch (word) {
    case VerdictWord::Fail:
      return 0;
    case VerdictWord::TooCloseToCall:
      return 1;
    case VerdictWord::NotTested:
      return 2;
    case VerdictWord::Pass:
      return 3;
  }
  return 4;
}

bool asksTheSame(const std::vector<CheckVerdict>& a, const std::vector<CheckVerdict>& b) {
  return std::ranges::equal(a, b, {}, &CheckVerdict::check, &CheckVerdict::check);
}

}  // namespace

ChecksModel::ChecksModel(QObject* parent) : QAbstractTableModel(parent) {}

void ChecksModel::setVerdict(const std::optional<Verdict>& verdict) {
  std::vector<CheckVerdict> checks = verdict ? verdict->checks : std::vector<CheckVerdict>{};
  std::ranges::stable_sort(checks, {}, [](const auto& check) { return pressing(check.verdict); });
  if (asksTheSame(checks, checks_)) {
    checks_ = std::move(checks);
    if (!checks_.empty()) emit dataChanged(index(0, 0), index(rowCount() - 1, ColumnCount - 1));
  } else {
    beginResetModel();
    checks_ = std::move(checks);
    endResetModel();
  }
}

int ChecksModel::rowCount(const QModelIndex& parent) const {
  return parent.isValid() ? 0 : static_cast<int>(checks_.size());
}

int ChecksModel::columnCount(const QModelIndex& parent) const {
  return parent.isValid() ? 0 : ColumnCount;
}

QVariant ChecksModel::data(const QModelIndex& index, int role) const {
  if (!index.isValid()) return {};
  const CheckText text = checkText(check(index.row()));
  if (role == Qt::ToolTipRole) {
    QStringList lines{text.title, text.measured, text.limits, text.uncertainty, text.reason};
    lines.removeAll(QString());
    return lines.join(QLatin1Char('\n'));
  }
  if (role != Qt::DisplayRole && role != Qt::AccessibleTextRole) return {};
  switch (index.column()) {
    case Asked:
      return text.title + QStringLiteral(", ") + text.limits;
    case Measured:
      return text.measured;
    case Margin:
      return text.margin;
    default:
      return text.verdict;
  }
}

QVariant ChecksModel::headerData(int section, Qt::Orientation orientation, int role) const {
  if (orientation != Qt::Horizontal || role != Qt::DisplayRole) return {};
  switch (section) {
    case Asked:
      return tr("Check");
    case Measured:
      return tr("Measured");
    case Margin:
      return tr("Margin");
    default:
      return tr("Verdict");
  }
}

}  // namespace dampwright
