# The sheet without a window: what dampwright-batch hands over to dampwright.
add_library(dampwright_sheet_command STATIC sheet_command.h sheet_command.cpp)
add_library(dampwright::sheet_command ALIAS dampwright_sheet_command)
target_link_libraries(dampwright_sheet_command PUBLIC dampwright::batch_parts dampwright::sheet)
