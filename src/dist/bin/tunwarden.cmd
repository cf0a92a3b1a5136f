@echo off
rem Starts Tunwarden with the Java of JAVA_HOME, or else the java on the path; 17 or newer.
rem From Java 19 on, the first start makes an archive of loaded classes for faster later starts.
setlocal
set "TUN_HOME=%~dp0.."
if defined JAVA_HOME (set "TUN_JAVA=%JAVA_HOME%\bin\java.exe") else (set "TUN_JAVA=java.exe")
set "TUN_CACHE=%LOCALAPPDATA%\Tunwarden"
if not exist "%TUN_CACHE%" mkdir "%TUN_CACHE%" 2>nul
set "TUN_COMPILER=-XX:TieredStopAtLevel=1"
if "%~1"=="report" set "TUN_COMPILER=-XX:TieredStopAtLevel=4"
if "%~1"=="headless" set "TUN_COMPILER=-XX:TieredStopAtLevel=4"
"%TUN_JAVA%" -XX:+IgnoreUnrecognizedVMOptions -XX:+AutoCreateSharedArchive ^
  "-XX:SharedArchiveFile=%TUN_CACHE%\tunwarden-@version@.jsa" -Xshare:auto -Xlog:disable ^
  -XX:+UseSerialGC %TUN_COMPILER% --enable-native-access=ALL-UNNAMED ^
  "-DjSerialComm.library.path=%TUN_HOME%\lib\native" ^
  %TUNWARDEN_JAVA_OPTIONS% -cp "%TUN_HOME%\lib\tunwarden.jar" tunwarden.app.Main %*
exit /b %ERRORLEVEL%
