namespace PassReport;

/// <summary>What is wrong with a file, in one line that says where; ends the run.</summary>
internal sealed class FileFault : Exception
{
    public FileFault(string file, string where, string what)
        : base($"{Path.GetFileName(file)}{(where.Length == 0 ? "" : ", " + where)}: {what}")
    {
    }
}
