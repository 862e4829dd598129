// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/session/book_keeper.h"

#include <chrono>

namespace dampwright {

namespace {

constexpr std::chrono::seconds retryAfter{3};

// Trouble passes; a refusal is the book's last word and would be the same the next time.
bool isTrouble(const Error& error) { return error.code.starts_with("book-"); }

}  // namespace

Result<Book*> BookShelf::book() {
  if (!book_) {
    Result<Book> opened = Book::open(file_);
    if (!opened) return opened.error();
    book_.emplace(std::move(opened).value());
  }
  return &*book_;
}

BookShelf::Drained BookShelf::drain() {
  Drained drained;
  while (!waiting_.empty()) {
    const Result<Book*> open = book();
    if (!open) {
      drained.trouble = open.error();
      return drained;
    }
    const Result<Done> done = waiting_.front().write(*open.value());
    if (!done && isTrouble(done.error())) {
      drained.trouble = done.error();
      book_.reset();
      return drained;
    }
    drained.written.push_back(std::move(waiting_.front().written));
    waiting_.pop_front();
  }
  return drained;
}

BookKeeper::BookKeeper(const QString& file, QObject* parent)
    : QObject(parent), shelf_(std::make_shared<BookShelf>(file)) {
  retry_.setSingleShot(true);
  connect(&retry_, &QTimer::timeout, this, &BookKeeper::tryAgain);
}

BookKeeper::~BookKeeper() {
  // A connection is closed by the thread that opened it.
  jobs_.add(
      [shelf = std::move(shelf_)](const Progress&) {
        (void)shelf->drain();
        shelf->close();
        return Done{};
      },
      [](Done) {});
}

void BookKeeper::write(BookWrite write) {
  ++unwritten_;
  jobs_.add(
      [shelf = shelf_, write = std::move(write)](const Progress&) mutable {
        shelf->add(std::move(write));
        return shelf->drain();
      },
      [this](const BookShelf::Drained& drained) { takeHome(drained); });
}

void BookKeeper::tryAgain() {
  jobs_.add([shelf = shelf_](const Progress&) { return shelf->drain(); },
            [this](const BookShelf::Drained& drained) { takeHome(drained); });
}

void BookKeeper::takeHome(const BookShelf::Drained& drained) {
  unwritten_ -= static_cast<int>(drained.written.size());
  for (const auto& written : drained.written) {
    if (written) written();
  }
  const std::optional<Error> before = std::exchange(trouble_, drained.trouble);
  if (trouble_) {
    retry_.start(retryAfter);
    if (!before || before->code != trouble_->code) emit trouble(*trouble_);
  } else if (before && unwritten_ == 0) {
    emit well();
  }
  emit settled();
}

}  // namespace dampwright
