@echo off
rem Starts Gapwright on Windows with a Java 17 or later. Arguments go to the workbench.
set java=javaw
if defined JAVA_HOME set java=%JAVA_HOME%\bin\javaw
for %%j in ("%~dp0plugins\org.eclipse.equinox.launcher_*.jar") do start "" "%java%" -Xms64m -Xmx2g -jar "%%j" -nosplash %*
