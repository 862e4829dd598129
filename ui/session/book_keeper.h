// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QObject>
#include <QTimer>
#include <deque>
#include <functional>
#include <memory>
#include <optional>
#include <type_traits>
#include <utility>
#include <vector>

#include "core/book/book.h"
#include "ui/background/ordered_jobs.h"

namespace dampwright {

/// Something to be written, and what happens on the GUI thread when it is on the disk.
struct BookWrite {
  std::function<Result<Done>(Book&)> write;
  std::function<void()> written;
};

/// The job book and what waits to be written into it. Lives on the book's own thread.
class BookShelf {
 public:
  explicit BookShelf(QString file) : file_(std::move(file)) {}

  struct Drained {
    std::vector<std::function<void()>> written;
    std::optional<Error> trouble;  ///< what stopped it; the rest waits on
  };

  /// Opened when it is first needed, and again after trouble.
  Result<Book*> book();
  void add(BookWrite write) { waiting_.push_back(std::move(write)); }
  Drained drain();  ///< writes in order until all is written or one fails
  void close() { book_.reset(); }

 private:
  QString file_;
  std::optional<Book> book_;
  std::deque<BookWrite> waiting_;
};

/// The session's door to the job book: everything is written in order on a thread of its own; what
/// cannot be written is kept and tried again every few seconds until it can. Reads see every write
/// before them that succeeded.
class BookKeeper : public QObject {
  Q_OBJECT
 public:
  explicit BookKeeper(const QString& file, QObject* parent = nullptr);
  ~BookKeeper() override;  ///< tries once more to write what waits, then closes the book

  void write(BookWrite write);

  /// `read(book)` returns a Result, which comes home to `deliver`.
  template <class Read, class Deliver>
  void read(Read read, Deliver deliver) {
    using Answer = std::invoke_result_t<Read&, Book&>;
    ++reads_;
    jobs_.add(
        [shelf = shelf_, read = std::move(read)](const Progress&) mutable -> Answer {
          Result<Book*> book = shelf->book();
          if (!book) return book.error();
          return read(*book.value());
        },
        [this, deliver = std::move(deliver)](Answer answer) mutable {
          --reads_;
          deliver(std::move(answer));
          emit settled();
        });
  }

  bool busy() const { return reads_ > 0 || (unwritten_ > 0 && !trouble_); }
  bool hasUnwritten() const { return unwritten_ > 0; }

 signals:
  void trouble(const dampwright::Error& error);  ///< once for each new kind
  void well();                                   ///< after trouble: all is written
  void settled();                                ///< something came home

 private:
  void takeHome(const BookShelf::Drained& drained);
  void tryAgain();

  std::shared_ptr<BookShelf> shelf_;
  int reads_ = 0, unwritten_ = 0;
  std::optional<Error> trouble_;
  QTimer retry_;
  OrderedJobs jobs_;  // last: its destructor waits for the work that uses the rest
};

}  // namespace dampwright
