// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <variant>
#include <vector>

namespace dampwright::bench {

enum class Wave { Sine, Crank, Triangle };

/// Cycles at one peak speed. The crosshead starts at rest at the lower end, speeds up over `ramp`,
/// runs evenly, slows down over `ramp` and stops at the lower end after `turns` whole turns.
struct BlockPlan {
  double speed = 0.1;    ///< m/s, largest of the even part
  double stroke = 0.05;  ///< m, peak to peak
  int turns = 5;         ///< ramps included; their share must leave an even part
  Wave wave = Wave::Sine;
  double mid = 0;          ///< m, mid-stroke
  double ramp = 0.3;       ///< s
  double strokeDrift = 0;  ///< [1] share by which the stroke grows over the even part
  double midDrift = 0;     ///< m by which mid-stroke moves over the even part
  std::optional<double> endSpeed =
      std::nullopt;  ///< m/s, the speed glides evenly to this one: a sweep
};

struct HoldPlan {
  double position = 0;  ///< m
  double duration = 2;  ///< s
};

/// What the crosshead does, step after step, with a standstill between them.
struct DrivePlan {
  std::vector<std::variant<BlockPlan, HoldPlan>> steps;
  double rodRatio = 0.2;    ///< crank radius over rod length, for Wave::Crank
  double dwell = 0.5;       ///< s of standstill before the first step, between steps and at the end
  double moveSpeed = 0.02;  ///< m/s, mean speed from one step's place to the next
  double cornerShare = 0.1;  ///< share of a triangle's half stroke time that turns round, (0, 1)
};

/// Sine blocks of one stroke in the order given: a slow block, then the speeds.
DrivePlan speedsPlan(
    double stroke, double slowSpeed, int slowTurns, const std::vector<double>& speeds, int turns);

struct DrivePoint {
  double x = 0, v = 0, a = 0;  ///< m, m/s, m/s²
};

/// The even part of a block as it really runs, times from the start of the drive.
struct DriveBlock {
  BlockPlan plan;
  double start = 0, end = 0;  ///< s
  /// s, where the crosshead passes its lower end in the even part; also where it rests there before
  /// and after, if the ramp is a small part of a turn
  std::vector<double> lowerTurnings;
};

/// The motion of the crosshead in closed form.
class Drive {
 public:
  explicit Drive(const DrivePlan& plan);

  double duration() const { return duration_; }
  DrivePoint at(double time) const;
  const std::vector<DriveBlock>& blocks() const { return blocks_; }

 private:
  /// One piece of motion: a turning phase (rate and its growth), or a move between two places.
  struct Piece {
    double start = 0, end = 0;
    bool turning = false;
    double from = 0, to = 0;                 // a move
    BlockPlan plan;                          // a turning piece
    double phase = 0, rate = 0, growth = 0;  // rad, rad/s, rad/s²
    double drifted = 0, driftPerSecond = 0;  // share of the block's drifts
  };

  void moveTo(double place);
  void stand(double seconds);
  void turn(const BlockPlan& plan);
  Piece addTurning(Piece state, double seconds, double rateAtEnd, double driftPerSecond);
  DrivePoint turningAt(const Piece& piece, double time) const;

  DrivePlan plan_;
  std::vector<Piece> pieces_;
  std::vector<DriveBlock> blocks_;
  double duration_ = 0;
  double place_ = 0;
};

}  // namespace dampwright::bench
