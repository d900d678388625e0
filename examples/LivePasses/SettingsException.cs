namespace LivePasses;

/// <summary>A setting that the service cannot start with.</summary>
internal sealed class SettingsException(string message) : Exception(message);
