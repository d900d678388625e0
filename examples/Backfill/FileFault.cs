namespace Backfill;

/// <summary>What is wrong with a file or a folder, in one line that names it.</summary>
internal sealed class FileFault : Exception
{
    public FileFault(string file, string what)
        : this($"{Path.GetFileName(file.TrimEnd(Path.DirectorySeparatorChar))}: {what}")
    {
    }

    public FileFault(string what)
        : base(what)
    {
    }
}
