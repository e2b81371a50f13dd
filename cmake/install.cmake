# The library for other programs, its headers and its pkg-config file. The library is static: it is
# small beside its dependencies, and before version 1.0 it promises no binary interface.

install(TARGETS backsaw ARCHIVE DESTINATION ${CMAKE_INSTALL_LIBDIR})
install(DIRECTORY ${PROJECT_SOURCE_DIR}/editor DESTINATION ${CMAKE_INSTALL_DATADIR}/backsaw)
install(DIRECTORY ${PROJECT_SOURCE_DIR}/include/ DESTINATION ${CMAKE_INSTALL_INCLUDEDIR}
    FILES_MATCHING PATTERN "*.h")
configure_file(${PROJECT_SOURCE_DIR}/cmake/backsaw.pc.in ${PROJECT_BINARY_DIR}/backsaw.pc @ONLY)
install(FILES ${PROJECT_BINARY_DIR}/backsaw.pc DESTINATION ${CMAKE_INSTALL_LIBDIR}/pkgconfig)
