namespace SpecLint.Cli;

/// <summary>What the program's exit code says; the codes stand in README.md.</summary>
internal enum ExitCode
{
    /// <summary>Nothing at or above the fail grade.</summary>
    Clear = 0,

    /// <summary>Findings at or above the fail grade, schema faults included.</summary>
    Findings = 1,

    /// <summary>Could not run: usage, unreadable file, bad rulebook; even if other files were reviewed.</summary>
    CouldNotRun = 2,

    /// <summary>A fault of the program itself.</summary>
    ProgramFault = 3,
}
