// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/start/safety_dialog.h"

#include <QLabel>
#include <QPushButton>
#include <QVBoxLayout>

#include "ui/look/type.h"
#include "ui/text/cautions.h"

namespace dampwright {

SafetyDialog::SafetyDialog(QWidget* parent) : QDialog(parent) {
  setWindowTitle(tr("Safety"));
  auto* column = new QVBoxLayout(this);
  column->setContentsMargins(24, 20, 24, 16);
  column->setSpacing(10);
  auto* title = new QLabel(tr("Before a damper goes on the rig"));
  title->setFont(screenFont(TextSize::Job));
  column->addWidget(title);
  for (const QString& caution : cautions()) {
    auto* line = new QLabel(caution);
    line->setWordWrap(true);
    column->addWidget(line);
  }
  auto* later = new QLabel(tr("These words stand in the Help menu and on every sheet."));
  later->setObjectName(QStringLiteral("quiet"));
  column->addWidget(later);
  auto* understood = new QPushButton(tr("Understood"));
  understood->setObjectName(QStringLiteral("primary"));
  understood->setDefault(true);
  column->addWidget(understood, 0, Qt::AlignRight);
  constexpr int wide = 580;
  setMinimumWidth(wide);
  // By itself the dialog would leave room for narrower lines.
  resize(wide, column->totalHeightForWidth(wide));
  connect(understood, &QPushButton::clicked, this, &QDialog::accept);
}

}  // namespace dampwright
