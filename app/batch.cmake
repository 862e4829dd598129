# The batch program; its parts are a library so that dampwright reads the same command line for the sheet.
add_library(dampwright_batch_parts STATIC
  batch_request.h batch_request.cpp batch_files.h batch_files.cpp batch_verbs.h batch_columns.cpp batch_measure.cpp
  batch_judge.cpp batch_sheet.cpp)
add_library(dampwright::batch_parts ALIAS dampwright_batch_parts)
target_link_libraries(dampwright_batch_parts
  PUBLIC dampwright::common dampwright::intake dampwright::measure dampwright::verdict dampwright::records
         dampwright::words
  PRIVATE CLI11::CLI11)
add_executable(dampwright-batch batch_main.cpp)
target_link_libraries(dampwright-batch PRIVATE dampwright::batch_parts)
