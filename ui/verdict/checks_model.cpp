// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/verdict/checks_model.h"

#include <QStringList>
#include <algorithm>

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

}  // namespace

ChecksModel::ChecksModel(QObject* parent) : QAbstractTableModel(parent) {}

void ChecksModel::setVerdict(const std::optional<Verdict>& verdict) {
  beginResetModel();
  checks_ = verdict ? verdict->checks : std::vector<CheckVerdict>{};
  std::stable_sort(checks_.begin(), checks_.end(), [](const auto& a, const auto& b) {
    return pressing(a.verdict) < pressing(b.verdict);
  });
  endResetModel();
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
