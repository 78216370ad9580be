@echo off
rem Starts Stirwright on Windows and hands it every argument unchanged. Needs no rights and no registry, and works from an
rem installation that cannot be written to: what a run writes goes to the user's own folder.
setlocal EnableExtensions DisableDelayedExpansion

set "home=%~dp0"
set "home=%home:~0,-1%"
set "alone="
if [%1]==[] set "alone=yes"

call :find_java
if not defined java (
  set "problem=needs Java 21 or later: install one or set JAVA_HOME"
  goto fail
)
set "framework="
for %%F in ("%home%\plugins\org.eclipse.osgi_*.jar") do set "framework=%%~fF"
set "starter="
for %%F in ("%home%\plugins\stirwright.start_*.jar") do (
  set "starter=%%~fF"
  set "build=%%~nF"
)
set "problem=the installation is not complete; unpack it again"
if not defined framework goto fail
if not defined starter goto fail

set "own=%LOCALAPPDATA%\Stirwright"
if not defined LOCALAPPDATA set "own=%TEMP%\Stirwright"
mkdir "%own%\run" 2>nul
set "problem=no folder to write to: set LOCALAPPDATA"
if not exist "%own%\run\" goto fail

rem Runs at the same time must not share the framework's state, so each has a folder of its own. Java holds the lock
rem beside it open (handle 9 below) for as long as it runs; a lock that can be deleted belonged to a run that ended.
for %%L in ("%own%\run\*.lock") do (
  del "%%~fL" 2>nul
  if not exist "%%~fL" rd /s /q "%%~dpnL" 2>nul
)
set "tries=0"
:take
set /a tries+=1
if %tries% GTR 50 goto fail
set "run=%own%\run\%RANDOM%%RANDOM%"
mkdir "%run%" 2>nul || goto take

rem Which starts open the window is decided by stirwright.start.Way; what stands here only sets the JVM up for it.
set "kind=console"
if defined alone set "kind=window"
if "%~1"=="open" if "%~3"=="" set "kind=window"
if "%~1"=="demo" if "%~2"=="--window" if "%~3"=="" set "kind=window"

rem See the start script of the other platforms for the reasons of these.
if %kind%==console set "flags=-Xms128m -Xmn96m -Xmx320m"
if %kind%==window set "flags=-Xms96m -Xmx1g"
if %kind%==window if %version% GEQ 24 set "flags=%flags% --enable-native-access=ALL-UNNAMED"

rem A class archive fits one Java and one build (the starter's name has its time) of one installation; old ones go.
set "key=%home:\=-%"
set "key=%key::=%"
set "key=%key:~-40%"
set "archive=%own%\%key%-%build%-%version%-%kind%.jsa"
if not exist "%archive%" del "%own%\%key%-*-%kind%.jsa" 2>nul

rem Without arguments, as from the desktop, no console stays open behind the window.
set "begin="
if defined alone (
  set "begin=start "Stirwright" /b"
  set "java=%java:java.exe=javaw.exe%"
)
%begin% "%java%" -XX:+IgnoreUnrecognizedVMOptions -Xlog:disable -XX:+UseSerialGC -XX:TieredStopAtLevel=1 %flags% ^
  -XX:+AutoCreateSharedArchive "-XX:SharedArchiveFile=%archive%" ^
  "-Dosgi.install.area=%home%/" "-Dosgi.framework=%framework%" ^
  "-Dosgi.sharedConfiguration.area=%home%/configuration/" "-Dosgi.configuration.area=%run%/" ^
  "-Dosgi.instance.area=@none" "-Dosgi.logfile=%own%\stirwright.log" ^
  -cp "%framework%;%starter%" stirwright.start.Main %* 9>"%run%.lock"
exit /b %ERRORLEVEL%

:fail
echo stirwright: %problem% 1>&2
if defined alone pause
exit /b 3

rem Sets java and version to the first Java that is new enough.
:find_java
set "java="
if defined JAVA_HOME call :try "%JAVA_HOME%"
for %%J in (java.exe) do if not "%%~$PATH:J"=="" call :try_program "%%~$PATH:J"
for %%P in ("%ProgramFiles%" "%LOCALAPPDATA%\Programs") do (
  for /d %%V in ("%%~P\Java\*" "%%~P\Eclipse Adoptium\*" "%%~P\Microsoft\jdk-*" "%%~P\Zulu\*" "%%~P\Amazon Corretto\*") do (
    call :try "%%~fV"
  )
)
for /d %%V in ("%USERPROFILE%\.jdks\*") do call :try "%%~fV"
exit /b

rem The release file is read because asking Java itself takes longer.
:try
if defined java exit /b
if not exist "%~1\bin\java.exe" exit /b
set "version=0"
if exist "%~1\release" for /f "usebackq tokens=1,2 delims==.-" %%K in ("%~1\release") do (
  if "%%K"=="JAVA_VERSION" set "version=%%L"
)
set "version=%version:"=%"
if %version% GEQ 21 set "java=%~1\bin\java.exe"
exit /b

rem A java.exe on the path may stand alone, without a release file above its folder.
:try_program
if defined java exit /b
for %%H in ("%~dp1..") do if exist "%%~fH\release" (
  call :try "%%~fH"
  exit /b
)
set "version=0"
for /f "tokens=2,3" %%K in ('call "%~1" -version 2^>^&1') do if "%%K"=="version" set "version=%%~L"
for /f "delims=.-" %%V in ("%version%") do set "version=%%V"
if %version% GEQ 21 set "java=%~1"
exit /b
