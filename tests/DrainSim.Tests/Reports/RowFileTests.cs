using System.Text;
using DrainSim.Reports.Files;

namespace DrainSim.Tests.Reports;

/// <summary>A table written row by row that goes on after a stop at any byte.</summary>
public sealed class RowFileTests : IDisposable
{
    private const string Header = "case,value\n";
    private const int Count = 7;

    private readonly string folder = Directory.CreateTempSubdirectory("drainsim-test-").FullName;

    private string Table => Path.Combine(folder, "a.sweep.csv");

    private static string Whole => Header + string.Concat(Enumerable.Range(1, Count).Select(Row));

    public void Dispose() => Directory.Delete(folder, recursive: true);

    [Fact]
    public void Cut_at_any_byte_it_goes_on_to_the_same_table()
    {
        byte[] whole = Encoding.UTF8.GetBytes(Whole);
        for (int length = 0; length <= whole.Length; length++)
        {
            using (RowFile.Open(Table, Header, Count, "origin", goesOn: false))
            {
            }

            File.WriteAllBytes(Table + ".partial", whole[..length]);
            WriteRest(goesOn: true);
            Assert.Equal(Whole, File.ReadAllText(Table));
            File.Delete(Table);
        }
    }

    [Fact]
    public void A_part_without_a_header_goes_on_too()
    {
        using (RowFile part = RowFile.Open(Table, "", 3, "origin", goesOn: false))
        {
            part.Append(Row(4));
            part.Append("5,hal");
        }

        using RowFile again = RowFile.Open(Table, "", 3, "origin", goesOn: true);
        Assert.Equal(1, again.Finished);
        again.Append(Row(5));
        again.Append(Row(6));
        again.Complete();
        Assert.Equal(Row(4) + Row(5) + Row(6), File.ReadAllText(Table));
    }

    [Fact]
    public void A_finished_table_is_not_run_again()
    {
        WriteRest(goesOn: false);
        using RowFile again = RowFile.Open(Table, Header, Count, "origin", goesOn: true);
        Assert.Equal(Count, again.Finished);
        again.Complete();
        Assert.Equal(Whole, File.ReadAllText(Table));
    }

    [Fact]
    public void Rows_of_another_origin_are_not_gone_on_with_and_stay()
    {
        WriteRest(goesOn: false);
        Assert.Throws<InvalidDataException>(() => RowFile.Open(Table, Header, Count, "another", goesOn: true));
        Assert.Throws<InvalidDataException>(() => RowFile.Open(Table, "case,other\n", Count, "origin", goesOn: true));
        Assert.Equal(Whole, File.ReadAllText(File.Exists(Table) ? Table : Table + ".partial"));
    }

    [Fact]
    public void More_rows_than_the_study_has_are_refused()
    {
        WriteRest(goesOn: false);
        Assert.Throws<InvalidDataException>(() => RowFile.Open(Table, Header, Count - 1, "origin", goesOn: true));
    }

    [Fact]
    public void Two_cannot_write_one_table()
    {
        using (RowFile first = RowFile.Open(Table, Header, Count, "origin", goesOn: false))
        {
            IOException fault = Assert.Throws<IOException>(() => RowFile.Open(Table, Header, Count, "origin", goesOn: true));
            Assert.Contains("another run", fault.Message, StringComparison.Ordinal);
        }

        WriteRest(goesOn: true);
    }

    private static string Row(int number) => $"{number},\"v{number}\"\n";

    private void WriteRest(bool goesOn)
    {
        using RowFile file = RowFile.Open(Table, Header, Count, "origin", goesOn);
        for (int i = (int)file.Finished + 1; i <= Count; i++)
            file.Append(Row(i));
        file.Complete();
    }
}
