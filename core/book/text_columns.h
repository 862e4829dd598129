// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QSqlQuery>
#include <QString>
#include <string>
#include <string_view>

namespace dampwright {

/// UTF-8 to a bound value. Never a null string: the columns are NOT NULL.
inline QString text(std::string_view utf8) {
  return utf8.empty() ? QString("")
                      : QString::fromUtf8(utf8.data(), static_cast<qsizetype>(utf8.size()));
}

/// A text column of the row that the query stands on.
inline std::string column(const QSqlQuery& query, int index) {
  return query.value(index).toString().toStdString();
}

}  // namespace dampwright
