add_executable(dampwright gui_main.cpp gui_options.h gui_options.cpp unattended.h unattended.cpp)
target_compile_definitions(dampwright PRIVATE
  DAMPWRIGHT_SAMPLE_RUNS="${CMAKE_SOURCE_DIR}/sample_runs")
target_link_libraries(dampwright PRIVATE dampwright::common dampwright::main_window
  dampwright::sheet dampwright::sheet_command)
