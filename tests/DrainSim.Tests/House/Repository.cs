namespace DrainSim.Tests.House;

/// <summary>The checkout that the tests were built from.</summary>
internal static class Repository
{
    /// <summary>The folder that holds the solution.</summary>
    public static string Root { get; } = Find();

    private static string Find()
    {
        for (DirectoryInfo? folder = new(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            if (File.Exists(Path.Combine(folder.FullName, "DrainSim.sln")))
                return folder.FullName;
        }

        throw new DirectoryNotFoundException("no folder above the tests holds DrainSim.sln");
    }
}
