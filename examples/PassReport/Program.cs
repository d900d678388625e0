Console.WriteLine("PassReport");
