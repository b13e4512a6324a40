@echo off
rem Starts Sill on Windows, as engine/sill does elsewhere: finds the JDK of JAVA_HOME or PATH, builds through Maven when
rem Sill is not built or its sources differ from those it was built from, and keeps class-data-sharing archives.
rem What is said here goes to stderr; what Sill itself prints and its exit code pass through.
rem Paths stand in quotes and jumps replace blocks, since a folder may be called "Program Files (x86)".
setlocal EnableExtensions DisableDelayedExpansion

set "HERE=%~dp0"
if exist "%HERE%pom.xml" goto placed
rem Through a link: dir prints where it leads in brackets, relative to the link's folder.
pushd "%~dp0"
for /f "tokens=2 delims=[]" %%L in ('dir /a:l "%~nx0" 2^>nul ^| find "<SYMLINK>"') do for %%T in ("%%L") do set "HERE=%%~dpT"
popd
:placed
set "HERE=%HERE:~0,-1%"
for %%I in ("%HERE%\..") do set "ROOT=%%~fI"
set "TARGET=%HERE%\target"
set "JAR=%TARGET%\sill.jar"
set "ANOTHER=install a JDK 17 or newer and set JAVA_HOME to its folder"

rem ---- The JDK ----
if not defined JAVA_HOME goto java_on_path
set "ORIGIN=JAVA_HOME"
set "JDK=%JAVA_HOME:"=%"
if "%JDK:~-1%"=="\" set "JDK=%JDK:~0,-1%"
if exist "%JDK%\bin\java.exe" goto read_release
>&2 echo sill: JAVA_HOME is "%JDK%", but there is no bin\java.exe in that folder
>&2 echo   expected: JAVA_HOME to be the folder of a JDK 17 or newer
>&2 echo   mend: set JAVA_HOME to such a folder, or unset it to use the java on PATH
exit /b 3

:java_on_path
set "ORIGIN=PATH"
set "FOUND="
for %%I in (java.exe) do set "FOUND=%%~$PATH:I"
if defined FOUND goto java_found
>&2 echo sill: no Java found: JAVA_HOME is not set and there is no java on PATH
>&2 echo   expected: a JDK 17 or newer
>&2 echo   mend: install one and put its bin folder on PATH or set JAVA_HOME
exit /b 3

:java_found
for %%I in ("%FOUND%\..\..") do set "JDK=%%~fI"
if exist "%JDK%\release" goto read_release
rem A stand-in for the real java.exe; that one knows where it lies.
for /f "tokens=1,* delims== " %%A in ('call "%FOUND%" -XshowSettings:properties -version 2^>^&1') do if "%%A"=="java.home" set "JDK=%%B"

:read_release
set "VERSION="
set "RUNTIME="
set "MODULES="
if not exist "%JDK%\release" goto check_java
for /f "usebackq tokens=1,* delims==" %%A in ("%JDK%\release") do (
    if "%%A"=="JAVA_VERSION" set "VERSION=%%~B"
    if "%%A"=="JAVA_RUNTIME_VERSION" set "RUNTIME=%%~B"
    if "%%A"=="MODULES" set "MODULES=%%~B"
)

:check_java
if defined VERSION goto compare_version
>&2 echo sill: the Java in "%JDK%" (found by %ORIGIN%) does not tell its version
goto want_another
:compare_version
set "MAJOR=0"
for /f "tokens=1,2 delims=.+-_" %%A in ("%VERSION%") do (
    set "MAJOR=%%A"
    if "%%A"=="1" set "MAJOR=%%B"
)
if %MAJOR% GEQ 17 goto check_compiler
>&2 echo sill: the Java in "%JDK%" (found by %ORIGIN%) is version %VERSION%
:want_another
>&2 echo   expected: a JDK 17 or newer
>&2 echo   mend: %ANOTHER%
exit /b 3

:check_compiler
if exist "%JDK%\bin\javac.exe" goto check_modules
>&2 echo sill: the Java %VERSION% in "%JDK%" (found by %ORIGIN%) is a runtime without a compiler: it has no bin\javac.exe
>&2 echo   expected: a JDK, which compiles worksheets
>&2 echo   mend: %ANOTHER%
exit /b 3

:check_modules
if not defined MODULES goto check_build
set "MODULES= %MODULES% "
set "LACKS="
if "%MODULES: jdk.jshell =%"=="%MODULES%" set "LACKS=jdk.jshell"
if "%MODULES: jdk.compiler =%"=="%MODULES%" set "LACKS=jdk.compiler"
if not defined LACKS goto check_build
>&2 echo sill: the Java %VERSION% in "%JDK%" (found by %ORIGIN%) lacks the module %LACKS%
>&2 echo   expected: a full JDK, which compiles worksheets
>&2 echo   mend: %ANOTHER%
exit /b 3

rem ---- The build ----
:check_build
if not defined RUNTIME set "RUNTIME=%VERSION%"
set "CDS=%TARGET%\cds\%RUNTIME%"
call :is_built
if defined BUILT goto archives
where mvn >nul 2>nul
if not errorlevel 1 goto have_maven
>&2 echo sill: Sill must be built first, and there is no mvn on PATH
>&2 echo   expected: Apache Maven 3.8 or newer
>&2 echo   mend: install it, put its bin folder on PATH and start again
exit /b 3

:have_maven
if not exist "%TARGET%" md "%TARGET%" 2>nul
if exist "%TARGET%" goto build
>&2 echo sill: Sill must be built first, and "%TARGET%" cannot be written
>&2 echo   expected: a folder that the build can write
>&2 echo   mend: give yourself the right to write there, or clone Sill into a folder of yours
exit /b 3

:build
if exist "%JAR%" >&2 echo sill: the sources have changed; building with Maven
if not exist "%JAR%" >&2 echo sill: first use; building with Maven, which may take a minute
:try_build
rem The file stays open for this process alone while it builds, and is free again when the process ends, however it ends.
set "ENDED="
2>nul (9>"%TARGET%\building" (call :run_maven))
if defined ENDED goto build_ended
rem A second's wait that needs no keyboard.
ping -n 2 127.0.0.1 >nul
goto try_build
:build_ended
if "%ENDED%"=="well" goto archives
>&2 type "%TARGET%\build.log"
>&2 echo sill: the build failed; what Maven said stands above
>&2 echo   expected: the sources to compile
>&2 echo   mend: mend what Maven names, then start again (the build alone: mvn -B -pl engine -am package in "%ROOT%")
exit /b 3

rem ---- The start ----
:archives
set OPTIONS=-XX:+UseSerialGC -XX:TieredStopAtLevel=1 -Xmx384m -Xshare:auto -Xlog:disable -Dfile.encoding=UTF-8 -Djava.awt.headless=true
if not exist "%CDS%\made" call :make_archives
if not exist "%CDS%\parent.jsa" goto start_plainly
"%JDK%\bin\java.exe" %OPTIONS% "-XX:SharedArchiveFile=%CDS%\parent.jsa" "-Dsill.cds=%CDS%" -cp "%JAR%;%TARGET%\lib\*" sill.cli.Main %*
exit /b %ERRORLEVEL%
:start_plainly
"%JDK%\bin\java.exe" %OPTIONS% -cp "%JAR%;%TARGET%\lib\*" sill.cli.Main %*
exit /b %ERRORLEVEL%

rem ---- Parts ----

rem Sets BUILT when the jar is there and every source is as it was when the jar was built: robocopy, told to list only,
rem ends with 0 when its two folders do not differ.
:is_built
set "BUILT="
if not exist "%JAR%" exit /b 0
if not exist "%TARGET%\lib" exit /b 0
call :compare /l
if errorlevel 1 exit /b 0
set "BUILT=yes"
exit /b 0

rem Copies the sources to built-from, or with /l says by the exit code whether that would copy or delete anything.
:compare
set "DIFFERS=0"
robocopy "%ROOT%" "%TARGET%\built-from" pom.xml %1 /njh /njs /nfl /ndl /np >nul 2>nul
if errorlevel 1 set "DIFFERS=1"
for %%M in (engine stdlib) do (
    robocopy "%ROOT%\%%M" "%TARGET%\built-from\%%M" pom.xml %1 /njh /njs /nfl /ndl /np >nul 2>nul
    if errorlevel 1 set "DIFFERS=1"
    robocopy "%ROOT%\%%M\src\main" "%TARGET%\built-from\%%M\src\main" /mir %1 /njh /njs /nfl /ndl /np >nul 2>nul
    if errorlevel 1 set "DIFFERS=1"
)
exit /b %DIFFERS%

rem Sets ENDED to "well" or "badly". Another start may have built while this one waited.
:run_maven
call :is_built
set "ENDED=well"
if defined BUILT exit /b 0
set "ENDED=badly"
if exist "%TARGET%\lib" rd /s /q "%TARGET%\lib"
if exist "%TARGET%\cds" rd /s /q "%TARGET%\cds"
rem Before Maven reads them: a source saved meanwhile then counts as changed.
call :compare
set "JAVA_HOME=%JDK%"
pushd "%ROOT%"
call mvn -q -B -Dstyle.color=never -pl engine -am package -DskipTests -Dspotless.check.skip=true >"%TARGET%\build.log" 2>&1 <nul
if not errorlevel 1 set "ENDED=well"
popd
if "%ENDED%"=="badly" rd /s /q "%TARGET%\built-from"
exit /b 0

rem Runs a worksheet that holds something of everything and keeps the classes it loaded: those of this process in parent.jsa and, by sill.cds.train,
rem those of the worker in worker.jsa. One process makes them, beside, then renames. What goes wrong costs time, no more.
:make_archives
md "%CDS%.making" 2>nul
if errorlevel 1 exit /b 0
"%JDK%\bin\java.exe" %OPTIONS% "-XX:ArchiveClassesAtExit=%CDS%.making\parent.jsa" "-Dsill.cds.train=%CDS%.making" -cp "%JAR%;%TARGET%\lib\*" sill.cli.Main run "%HERE%\training.sill" --out "%CDS%.making" >nul 2>nul <nul
echo made>"%CDS%.making\made"
move "%CDS%.making" "%CDS%" >nul 2>nul
exit /b 0
