@echo off
rem Starts pofk from any folder. Java is the one of JAVA_HOME where that is set, else the one on the path.
setlocal
set "POFK_JAVA=java"
if defined JAVA_HOME set "POFK_JAVA=%JAVA_HOME%\bin\java"
"%POFK_JAVA%" -Xshare:auto -XX:+UseSerialGC %POFK_JAVA_OPTIONS% -jar "%~dp0..\lib\pofk.jar" %*
exit /b %ERRORLEVEL%
