namespace Backfill;

/// <summary>What is wrong with a file or a folder, in one line that names it.</summary>
internal sealed class FileFault(string file, string what) : Exception($"{Path.GetFileName(file.TrimEnd(Path.DirectorySeparatorChar))}: {what}");
