using Docs;

string folder = args.Length > 0 ? args[0] : "src/Docs/generated/families";
Directory.CreateDirectory(folder);
foreach (Family family in Family.All)
{
    File.WriteAllText(Path.Combine(folder, family.File + ".md"), family.Page());
    for (int i = 0; i < family.Spreads.Count; i++) family.Spreads[i].Draw(Path.Combine(folder, family.PictureFile(i)));
    Console.WriteLine($"wrote {family.File}.md: {family.Models.Count} models");
}
